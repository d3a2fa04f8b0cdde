/** One figure through the sets of a wearer. */
import { fullSet, type MeasureKey } from "@/lib/figures/body-measures";
import { type IsoDate } from "@/lib/people/iso-date";
import { type MeasurementSet } from "@/lib/records/types";

export interface HistoryPoint {
  setId: string;
  on: IsoDate;
  /** Who held the tape. */
  by: string;
  mm: number;
}

/**
 * Every taking of one measure, oldest first.
 * @param standing sets that no later one puts right, newest first.
 */
export function figureHistory(standing: readonly MeasurementSet[], figure: MeasureKey): HistoryPoint[] {
  return standing
    .flatMap(({ id, takenOn, takenBy, figures }) => {
      const taken = figures.find(({ key }) => key === figure);
      return taken ? [{ setId: id, on: takenOn, by: takenBy, mm: taken.mm }] : [];
    })
    .reverse();
}

/** The measures that any of these sets has, in tape order. */
export function measuresTaken(standing: readonly MeasurementSet[]): MeasureKey[] {
  const taken = new Set(standing.flatMap(({ figures }) => figures.map(({ key }) => key)));
  return fullSet.measures.filter((key) => taken.has(key));
}
