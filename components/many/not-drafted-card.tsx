import { OctagonX } from "lucide-react";
import { ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Check } from "@/components/ui/field";
import { Phrase } from "@/components/ui/fraction";
import { type NotDrafted } from "@/lib/many/draft-many";
import { type Fineness, type Unit } from "@/lib/records/types";

export interface NotDraftedCardProps {
  not: readonly NotDrafted[];
  /** How many are chosen in all. */
  of: number;
  unit: Unit;
  fineness: Fineness;
  oldToo: boolean;
  onOldToo(old: boolean): void;
}

/** Who could not be drafted for, why, and the way to the tape. */
export function NotDraftedCard({ fineness, not, of, oldToo, onOldToo, unit }: NotDraftedCardProps) {
  const old = not.filter(({ cause }) => cause === "old").length;
  return (
    <Card aria-labelledby="not-drafted-title">
      {not.length > 0 && (
        <>
          <CardHead
            id="not-drafted-title"
            title="Not drafted"
            sub={`${not.length} of ${of}. The others go on without them.`}
          />
          <ul className="grid gap-3">
            {not.map(({ cause, wearer, why }) => (
              <li key={wearer.id} className="grid gap-2 border-t border-line pt-3">
                <p className="flex items-start gap-2">
                  <OctagonX aria-hidden="true" className="mt-[0.15em] size-[1.2em] shrink-0 text-pin" />
                  <span className="min-w-0">
                    <span className="font-bold wrap-anywhere text-pin">{wearer.name}</span>
                    <span className="block">
                      <Phrase parts={why} unit={unit} fineness={fineness} />
                    </span>
                  </span>
                </p>
                <div className="flex flex-wrap gap-2">
                  <ButtonLink href={`/measure?wearer=${wearer.id}`}>
                    {cause === "no-set" ? "Measure" : "Measure again"}
                    <span className="sr-only">: {wearer.name}</span>
                  </ButtonLink>
                  {cause !== "no-set" && (
                    <ButtonLink variant="quiet" href={`/sleeves/draft?wearer=${wearer.id}`}>
                      Draft alone
                      <span className="sr-only">: {wearer.name}</span>
                    </ButtonLink>
                  )}
                </div>
              </li>
            ))}
          </ul>
        </>
      )}
      {(old > 0 || oldToo) && (
        <Check
          className="mt-3"
          label="Draft from children’s old figures too"
          checked={oldToo}
          hint="They are still said to be old. Fit before cloth is cut."
          onChange={(event) => onOldToo(event.target.checked)}
        />
      )}
    </Card>
  );
}
