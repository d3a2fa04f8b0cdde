import { CircleCheck, Info, OctagonX, TriangleAlert } from "lucide-react";
import { type Fineness, type Unit } from "@/lib/records/types";
import { type HeadLine } from "@/lib/sleeves/head-line";
import { Phrase } from "@/components/ui/fraction";

const signs = {
  good: { Sign: CircleCheck, colour: "text-moss", says: "Good: " },
  look: { Sign: TriangleAlert, colour: "text-thread", says: "Look: " },
  wrong: { Sign: OctagonX, colour: "text-pin", says: "Wrong: " },
  plain: { Sign: Info, colour: "text-chalk", says: "" },
} as const;

export interface HeadLineViewProps {
  line: HeadLine;
  unit: Unit;
  fineness: Fineness;
  /** A second line: how the other checks stand. */
  sub?: string;
}

/** Whether the sleeve goes in, before anything else. */
export function HeadLineView({ fineness, line, sub, unit }: HeadLineViewProps) {
  const { Sign, colour, says } = signs[line.verdict];
  return (
    <div className="leading-snug">
      <p className={`flex items-start gap-2 font-semibold ${colour}`}>
        <Sign aria-hidden="true" className="mt-[0.1em] size-[1.2em] shrink-0" />
        <span>
          <span className="sr-only">{says}</span>
          <Phrase parts={line.phrase} unit={unit} fineness={fineness} />
        </span>
      </p>
      {sub && <p className="ps-[1.7em] text-sm text-soft">{sub}</p>}
    </div>
  );
}
