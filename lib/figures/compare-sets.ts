import { type MeasureKey, fullSet } from "@/lib/figures/body-measures";
import { type IsoDate, daysBetween } from "@/lib/people/iso-date";

/** What is compared of a measurement set. */
export interface ComparedSet {
  takenOn: IsoDate;
  figures: readonly { key: string; mm: number }[];
}

export interface ComparedFigure {
  key: MeasureKey;
  beforeMm?: number;
  afterMm?: number;
  /** After less before, where both have it. */
  changeMm?: number;
}

export interface SetComparison {
  /** Days from the earlier set to the later. */
  days: number;
  /** Measures that either set has, in the order of the full set. */
  rows: ComparedFigure[];
}

/** Two sets of one wearer side by side, the earlier first whichever way round they are given. */
export function compareSets(a: ComparedSet, b: ComparedSet): SetComparison {
  const [before, after] = b.takenOn < a.takenOn ? [b, a] : [a, b];
  const mmOf = (set: ComparedSet, key: MeasureKey) => set.figures.find((f) => f.key === key)?.mm;
  const rows = fullSet.measures.flatMap((key): ComparedFigure[] => {
    const beforeMm = mmOf(before, key);
    const afterMm = mmOf(after, key);
    if (beforeMm === undefined && afterMm === undefined) return [];
    return [
      {
        key,
        ...(beforeMm !== undefined && { beforeMm }),
        ...(afterMm !== undefined && { afterMm }),
        ...(beforeMm !== undefined && afterMm !== undefined && { changeMm: afterMm - beforeMm }),
      },
    ];
  });
  return { days: daysBetween(before.takenOn, after.takenOn), rows };
}
