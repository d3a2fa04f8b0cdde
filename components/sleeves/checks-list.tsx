import { memo } from "react";
import { CircleCheck, OctagonX, TriangleAlert } from "lucide-react";
import { type StyleCheck, type Verdict } from "@/lib/drafting";
import { type Fineness, type Unit } from "@/lib/records/types";
import { boundsPhrase, sortedChecks, sourceLine } from "@/lib/sleeves/head-line";
import { Card, CardHead } from "@/components/ui/card";
import { Phrase } from "@/components/ui/fraction";

const signs: Record<Verdict, { Sign: typeof CircleCheck; colour: string; word: string }> = {
  good: { Sign: CircleCheck, colour: "text-moss", word: "Good" },
  look: { Sign: TriangleAlert, colour: "text-thread", word: "Look" },
  wrong: { Sign: OctagonX, colour: "text-pin", word: "Wrong" },
};

export interface ChecksListProps {
  checks: readonly StyleCheck[];
  unit: Unit;
  fineness: Fineness;
  sub?: string;
}

/** The checks a cutter makes, what is wrong first; those that are good fold away. */
export const ChecksList = memo(function ChecksList({ checks, fineness, sub, unit }: ChecksListProps) {
  const { good, look, wrong } = sortedChecks(checks);
  const units = { unit, fineness };
  return (
    <Card id="checks" className="checks-card" aria-labelledby="checks-title">
      <CardHead id="checks-title" title="Checks before cutting" sub={sub} />
      {wrong.length + look.length > 0 && (
        <ul className="grid gap-3">
          {[...wrong, ...look].map((check) => (
            <CheckItem key={check.id} check={check} {...units} />
          ))}
        </ul>
      )}
      {good.length > 0 && (
        <details className="mt-2">
          <summary className="min-h-target py-2 font-semibold">
            {good.length === 1 ? "1 check is good" : `${good.length} checks are good`}
          </summary>
          <ul className="grid gap-3">
            {good.map((check) => (
              <CheckItem key={check.id} check={check} {...units} />
            ))}
          </ul>
        </details>
      )}
    </Card>
  );
});

function CheckItem({ check, fineness, unit }: { check: StyleCheck; fineness: Fineness; unit: Unit }) {
  const { Sign, colour, word } = signs[check.verdict];
  const units = { unit, fineness };
  const within = boundsPhrase(check);
  return (
    <li className="grid gap-0.5 border-t border-line pt-2">
      <p className="flex items-start gap-2">
        <Sign aria-hidden="true" className={`mt-[0.15em] size-[1.2em] shrink-0 ${colour}`} />
        <span>
          <span className={`font-bold ${colour}`}>{word}: </span>
          <Phrase parts={[...check.phrase]} {...units} />
        </span>
      </p>
      {check.verdict !== "good" && (
        <p className="ps-[1.7em] font-semibold">
          <Phrase parts={[...check.remedy]} {...units} />
        </p>
      )}
      <p className="ps-[1.7em] text-sm text-soft">
        {within.length > 0 && (
          <>
            <Phrase parts={within} {...units} />{" "}
          </>
        )}
        {sourceLine(check)}.
      </p>
    </li>
  );
}
