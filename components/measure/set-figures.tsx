import { AppLink } from "@/components/ui/app-link";
import { Card, CardHead } from "@/components/ui/card";
import { Length } from "@/components/ui/fraction";
import { Tape } from "@/components/ui/tape";
import { bodyMeasure, fullSet } from "@/lib/figures/body-measures";
import { formatLength } from "@/lib/lengths/format-length";
import { type PreviousFigure, type PreviousFigures } from "@/lib/measuring/previous";
import { formatDay } from "@/lib/people/format-day";
import { type Fineness, type MeasurementSet, type TakenFigure, type Unit } from "@/lib/records/types";
import { LengthChange } from "./length-change";

interface Units {
  unit: Unit;
  fineness: Fineness;
}

export interface SetFiguresProps extends Units {
  set: MeasurementSet;
  /** The figure before each of these. */
  previous: PreviousFigures;
  /** The set that this one puts right. */
  corrects: MeasurementSet | null;
}

/** Every figure of a set, each with its difference to the time before and leading to its own history. */
export function SetFigures({ set, previous, corrects, unit, fineness }: SetFiguresProps) {
  const count = set.figures.length;
  return (
    <Card aria-labelledby="figures" className="overflow-clip">
      <CardHead id="figures" title={count === 1 ? "1 figure" : `${count} figures`} />
      <ul className="-mx-4 grid grid-cols-[repeat(auto-fill,minmax(min(100%,9.5rem),1fr))]">
        {fullSet.measures.flatMap((key) => {
          const figure = set.figures.find((one) => one.key === key);
          if (!figure) return [];
          return [
            <li key={key} className="border-t border-line">
              <AppLink
                href={`/measure/history?wearer=${set.wearerId}&figure=${key}`}
                className="row-link grid h-full min-h-target content-start gap-1 px-4 py-3 text-ink no-underline"
              >
                <Length mm={figure.mm} unit={unit} fineness={fineness} size="card" />
                <span className="font-semibold">{bodyMeasure(key).name}</span>
                <About
                  figure={figure}
                  before={previous[key]}
                  wrong={corrects && (corrects.figures.find((one) => one.key === key) ?? "left out")}
                  unit={unit}
                  fineness={fineness}
                />
              </AppLink>
            </li>,
          ];
        })}
      </ul>
      <div className="-mx-4 mt-2 -mb-4">
        <Tape unit={unit} />
      </div>
    </Card>
  );
}

interface AboutProps extends Units {
  figure: TakenFigure;
  before: PreviousFigure | undefined;
  /** The figure that was put right; null where nothing is. */
  wrong: TakenFigure | "left out" | null;
}

function About({ figure: { typed, mm }, before, wrong, unit, fineness }: AboutProps) {
  return (
    <>
      {typed !== formatLength(mm, unit, fineness).figure && (
        <span className="text-sm text-soft">Typed {typed}</span>
      )}
      {wrong === "left out" && <span className="text-sm font-semibold text-thread">Was left out</span>}
      {wrong && wrong !== "left out" && wrong.mm !== mm && (
        <span className="text-sm font-semibold text-thread">
          Was <Length mm={wrong.mm} unit={unit} fineness={fineness} />
        </span>
      )}
      {before && (
        <span className="text-sm text-soft">
          <LengthChange fromMm={before.mm} toMm={mm} unit={unit} fineness={fineness} /> since{" "}
          {formatDay(before.takenOn)}
        </span>
      )}
    </>
  );
}
