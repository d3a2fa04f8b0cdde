import { type MeasureKey } from "@/lib/figures/body-measures";
import { type IsoDate } from "@/lib/people/iso-date";
import { type MeasurementSet } from "@/lib/records/types";

export interface PastFigure {
  setId: string;
  takenOn: IsoDate;
  takenBy: string;
  mm: number;
}

/**
 * One figure's takings, oldest first.
 * @param standing the sets to work by, newest first: one that was put right is not part of the history.
 */
export function figureHistory(standing: readonly MeasurementSet[], measure: MeasureKey): PastFigure[] {
  return standing
    .flatMap(({ id, takenOn, takenBy, figures }) => {
      const figure = figures.find(({ key }) => key === measure);
      return figure ? [{ setId: id, takenOn, takenBy, mm: figure.mm }] : [];
    })
    .reverse();
}
