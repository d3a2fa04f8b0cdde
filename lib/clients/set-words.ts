import { type MeasurementSet } from "@/lib/records/types";

export interface SetWords {
  /** "7 figures, taken by Efua". */
  sub: string;
  /** Whether it was put right, or puts another right; null for most. */
  mark: "Put right by a later set" | "Puts an earlier set right" | null;
}

/** What stands below a set's day in the list of all sets of its wearer. */
export function setWords(
  set: Pick<MeasurementSet, "id" | "figures" | "takenBy" | "correctsId">,
  all: readonly Pick<MeasurementSet, "correctsId">[],
): SetWords {
  const taken = set.figures.filter(({ typed }) => typed !== "").length;
  const figures = taken === 1 ? "1 figure" : `${taken} figures`;
  return {
    sub: set.takenBy ? `${figures}, taken by ${set.takenBy}` : figures,
    mark: all.some(({ correctsId }) => correctsId === set.id)
      ? "Put right by a later set"
      : set.correctsId !== null
        ? "Puts an earlier set right"
        : null,
  };
}
