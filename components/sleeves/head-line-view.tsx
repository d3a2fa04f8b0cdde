import { CircleCheck, Info, OctagonX, TriangleAlert } from "lucide-react";
import { type StyleCheck } from "@/lib/drafting";
import { type Fineness, type Unit } from "@/lib/records/types";
import { countLine, type HeadLine } from "@/lib/sleeves/head-line";
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
  /** How they stand is a second line, which leads to them. */
  checks?: readonly StyleCheck[];
}

/** Whether the sleeve goes in, before anything else. */
export function HeadLineView({ checks, fineness, line, unit }: HeadLineViewProps) {
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
      {checks && (
        <button
          type="button"
          onClick={() => document.getElementById("checks")?.scrollIntoView({ block: "start" })}
          className="ms-[1.45em] min-h-8 px-1 text-start text-sm text-chalk underline underline-offset-4"
        >
          Checks: {countLine(checks)}
        </button>
      )}
    </div>
  );
}
