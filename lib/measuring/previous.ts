import { isMeasureKey, type MeasureKey } from "@/lib/figures/body-measures";
import { type IsoDate } from "@/lib/people/iso-date";
import { type MeasurementSet } from "@/lib/records/types";

export interface PreviousFigure {
  mm: number;
  typed: string;
  takenOn: IsoDate;
}

export type PreviousFigures = Partial<Record<MeasureKey, PreviousFigure>>;

type Dated = Pick<MeasurementSet, "id" | "takenOn">;

const isEarlier = (a: Dated, b: Dated): boolean =>
  a.takenOn < b.takenOn || (a.takenOn === b.takenOn && a.id < b.id);

/**
 * Last time's figure of each measure: a short set after a full one leaves the others standing.
 * @param standing the sets to work by, newest first.
 * @param before only sets earlier than this one count; none: all do.
 */
export function previousFigures(standing: readonly MeasurementSet[], before?: Dated): PreviousFigures {
  const found: PreviousFigures = {};
  for (const set of standing) {
    if (before && !isEarlier(set, before)) continue;
    for (const { key, typed, mm } of set.figures) {
      if (isMeasureKey(key) && !found[key]) found[key] = { typed, mm, takenOn: set.takenOn };
    }
  }
  return found;
}
