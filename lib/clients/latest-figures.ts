import { bodyMeasure, fullSet, type MeasureKey } from "@/lib/figures/body-measures";
import { staleness } from "@/lib/figures/staleness";
import { type IsoDate } from "@/lib/people/iso-date";
import { type MeasurementSet } from "@/lib/records/types";

export interface LatestFigure {
  key: MeasureKey;
  name: string;
  mm: number;
  takenOn: IsoDate;
  /** Too old to cut from, at this age. */
  stale: boolean;
}

export interface LatestFigures {
  /** In the order of the full set. */
  figures: LatestFigure[];
  /** What to do about the oldest of those that are too old, or null. */
  staleSay: string | null;
}

/**
 * The last taking of each body measure: a short set after a full one leaves the other figures standing, with their
 * own day.
 * @param standing the sets to work by, newest first.
 * @param ageYears the wearer's age today, where known.
 * @throws RangeError where a date is not a day.
 */
export function latestFigures(
  standing: readonly Pick<MeasurementSet, "takenOn" | "figures">[],
  ageYears: number | undefined,
  today: IsoDate,
): LatestFigures {
  const figures = fullSet.measures.flatMap((key): LatestFigure[] => {
    for (const { takenOn, figures: taken } of standing) {
      const figure = taken.find((one) => one.key === key);
      if (!figure) continue;
      const { stale } = staleness(takenOn, ageYears, today);
      return [{ key, name: bodyMeasure(key).name, mm: figure.mm, takenOn, stale }];
    }
    return [];
  });
  const old = figures.filter(({ stale }) => stale).sort((a, b) => (a.takenOn < b.takenOn ? -1 : 1))[0];
  if (!old) return { figures, staleSay: null };
  const { say } = staleness(old.takenOn, ageYears, today);
  const some = figures.some(({ stale }) => !stale);
  return { figures, staleSay: some ? say!.replace("These figures", "Some of these figures") : say! };
}
