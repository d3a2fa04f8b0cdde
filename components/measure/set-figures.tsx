import { AppLink } from "@/components/ui/app-link";
import { Card, CardHead } from "@/components/ui/card";
import { Length } from "@/components/ui/fraction";
import { Tape } from "@/components/ui/tape";
import { bodyMeasure } from "@/lib/figures/body-measures";
import { compareSets } from "@/lib/figures/compare-sets";
import { formatLength } from "@/lib/lengths/format-length";
import { formatDay } from "@/lib/people/format-day";
import { type Fineness, type MeasurementSet, type Unit } from "@/lib/records/types";

type Units = { unit: Unit; fineness: Fineness };

/** Every figure of a set, each with its difference to the set before and leading to its own history. */
export function SetFigures({
  set,
  before,
  corrects,
  unit,
  fineness,
}: {
  set: MeasurementSet;
  before: MeasurementSet | null;
  corrects: MeasurementSet | null;
} & Units) {
  const rows = compareSets(before ?? { takenOn: set.takenOn, figures: [] }, set).rows;
  const missed = rows.filter(({ afterMm }) => afterMm === undefined).map(({ key }) => bodyMeasure(key).name);
  const units = { unit, fineness };
  return (
    <Card aria-labelledby="figures" className="overflow-clip">
      <CardHead
        id="figures"
        title="Figures"
        sub={before ? `Beside each: against ${formatDay(before.takenOn)}` : "The first set of this wearer"}
      />
      <ul className="-mx-4 grid grid-cols-[repeat(auto-fill,minmax(min(100%,9.5rem),1fr))]">
        {rows.flatMap(({ key, afterMm, changeMm }) => {
          if (afterMm === undefined) return [];
          const typed = set.figures.find((figure) => figure.key === key)!.typed;
          const wrong = corrects?.figures.find((figure) => figure.key === key)?.mm;
          return [
            <li key={key} className="border-t border-line">
              <AppLink
                href={`/measure/history?wearer=${set.wearerId}&figure=${key}`}
                className="row-link grid h-full min-h-target content-start gap-1 px-4 py-3 text-ink no-underline"
              >
                <Length mm={afterMm} {...units} size="card" />
                <span className="font-semibold">{bodyMeasure(key).name}</span>
                <Difference changeMm={changeMm} {...units} />
                {typed !== formatLength(afterMm, unit, fineness).figure && (
                  <span className="text-sm text-soft">Typed: {typed}</span>
                )}
                {corrects && wrong !== afterMm && (
                  <span className="text-sm font-semibold text-thread">
                    {wrong === undefined ? "Was left out" : <>Was {<Length mm={wrong} {...units} />}</>}
                  </span>
                )}
              </AppLink>
            </li>,
          ];
        })}
      </ul>
      {missed.length > 0 && (
        <p className="mt-2 text-sm text-soft">Not taken this time: {missed.join(", ").toLowerCase()}.</p>
      )}
      <div className="-mx-4 mt-2 -mb-4">
        <Tape unit={unit} />
      </div>
    </Card>
  );
}

function Difference({ changeMm, unit, fineness }: { changeMm: number | undefined } & Units) {
  if (changeMm === undefined) return <span className="text-sm text-soft">Nothing to compare</span>;
  const { negative, whole, numerator } = formatLength(changeMm, unit, fineness);
  if (whole === 0 && numerator === 0) return <span className="text-sm text-soft">The same</span>;
  return (
    <span className="text-sm text-soft">
      <Length mm={Math.abs(changeMm)} unit={unit} fineness={fineness} /> {negative ? "less" : "more"}
    </span>
  );
}
