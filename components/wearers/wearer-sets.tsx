import { Card, RowLink, Rows } from "@/components/ui/card";
import { setWords } from "@/lib/clients/set-words";
import { formatDay } from "@/lib/people/format-day";
import { type MeasurementSet } from "@/lib/records/types";

/** Every set ever taken; one that was put right says so. */
export function WearerSets({ sets }: { sets: MeasurementSet[] }) {
  if (sets.length === 0) return null;
  return (
    <section aria-labelledby="sets" className="grid gap-3">
      <h2 id="sets" className="font-figure text-lg font-bold">
        Measurement sets
      </h2>
      <Card flush aria-label="Measurement sets, newest first">
        <Rows>
          {sets.map((set) => {
            const { sub, mark } = setWords(set, sets);
            return (
              <RowLink
                key={set.id}
                href={`/measure/set?id=${set.id}`}
                title={formatDay(set.takenOn, { style: "long" })}
                sub={
                  <>
                    {sub}
                    {mark && <span className="block font-semibold text-thread">{mark}</span>}
                  </>
                }
              />
            );
          })}
        </Rows>
      </Card>
    </section>
  );
}
