import { memo } from "react";
import { CircleCheck, OctagonX } from "lucide-react";
import { type Gather } from "@/lib/drafting";
import { type WalkedSeam } from "@/lib/drafting/seams";
import { type Fineness, type Unit } from "@/lib/records/types";
import { ratioOf } from "@/lib/sleeves/head-line";
import { failingSeams } from "@/lib/sleeves/make-style-from-record";
import { Card, CardHead } from "@/components/ui/card";
import { Length, Phrase } from "@/components/ui/fraction";

export interface WalkListProps {
  seams: readonly WalkedSeam[];
  gathers: readonly Gather[];
  unit: Unit;
  fineness: Fineness;
}

/** Both sides of every seam set against each other, what does not meet first; then what is gathered, and how closely. */
export const WalkList = memo(function WalkList({ fineness, gathers, seams, unit }: WalkListProps) {
  const units = { unit, fineness };
  const failing = failingSeams({ seams });
  const sub =
    failing.length === 0
      ? `All ${seams.length} seams meet`
      : `${failing.length} of ${seams.length} do not meet`;
  return (
    <Card id="walk" className="checks-card" aria-labelledby="walk-title">
      <CardHead id="walk-title" title="The seams, walked" sub={sub} />
      <ul className="grid gap-3">
        {[...failing, ...seams.filter(({ agrees }) => agrees)].map((seam) => (
          <SeamItem key={seam.id} seam={seam} {...units} />
        ))}
      </ul>
      {gathers.length > 0 && (
        <>
          <h3 className="mt-5 mb-2 font-figure font-bold">Gathered</h3>
          <ul className="grid gap-2">
            {gathers.map((gather) => (
              <li
                key={gather.id}
                className="flex flex-wrap items-baseline justify-between gap-x-4 border-t border-line pt-2"
              >
                <span className="min-w-0 flex-1 basis-40">
                  <span className="block first-letter:uppercase">{gather.words}</span>
                  <span className="block text-sm text-soft">
                    <Length mm={gather.full} {...units} /> pulled up to{" "}
                    <Length mm={gather.pulledTo} {...units} />
                  </span>
                </span>
                <span className="figures text-lg font-bold">{ratioOf(gather)}</span>
              </li>
            ))}
          </ul>
        </>
      )}
    </Card>
  );
});

function SeamItem({ seam, ...units }: { seam: WalkedSeam; unit: Unit; fineness: Fineness }) {
  const { agrees, phrase, remedy } = seam;
  const Sign = agrees ? CircleCheck : OctagonX;
  const colour = agrees ? "text-moss" : "text-pin";
  return (
    <li className="grid gap-0.5 border-t border-line pt-2">
      <p className="flex items-start gap-2">
        <Sign aria-hidden="true" className={`mt-[0.15em] size-[1.2em] shrink-0 ${colour}`} />
        <span>
          <span className={`font-bold ${colour}`}>{agrees ? "Meets: " : "Does not meet: "}</span>
          <Phrase parts={[...phrase]} {...units} />
        </span>
      </p>
      {(!agrees || (seam.how !== "equal" && seam.how !== "gathered")) && (
        <p className="ps-[1.7em] font-semibold">
          <Phrase parts={[...remedy]} {...units} />
        </p>
      )}
    </li>
  );
}
