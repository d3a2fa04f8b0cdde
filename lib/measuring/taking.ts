/** A set as it is being taken: a plain value, put down on the phone at each key and brought back as it was. */
import { fullSet, isMeasureKey, type MeasureKey } from "@/lib/figures/body-measures";
import { typedAgain, unitTyped } from "@/lib/measuring/entry";
import { type IsoDate } from "@/lib/people/iso-date";
import { type MeasurementSet, type Unit } from "@/lib/records/types";
import { type PreviousFigures } from "@/lib/measuring/previous";

export interface TakenHere {
  typed: string;
  mm: number;
  /** The unit it was typed in. */
  unit: Unit;
}

export interface Taking {
  shape: 1;
  /** The id that the set is going to be kept under: a set that is in the book already is not kept twice. */
  setId: string;
  wearerId: string;
  /** The set that is being put right, or null. */
  correctsId: string | null;
  /** The unit that the pad counts in. */
  unit: Unit;
  /** What is to be taken, in tape order. */
  keys: MeasureKey[];
  at: MeasureKey | "review";
  /** The figure at hand is taken, and a question about it waits for an answer. */
  held: boolean;
  entry: string;
  /** Why the entry cannot be taken, or null. */
  problem: string | null;
  taken: Partial<Record<MeasureKey, TakenHere>>;
  skipped: MeasureKey[];
  /** Signs of the questions that were answered with "It is right". */
  settled: string[];
  /** ISO date-time. */
  startedAt: string;
  takenOn: IsoDate;
  takenBy: string;
  note: string;
}

/** What the book says about the wearer. */
export interface Known {
  previous: PreviousFigures;
  /** Whole years on the day of taking, where known. */
  ageYears?: number;
  /** The day of taking. */
  on: IsoDate;
  /** The unit in which the book keeps a bare number. */
  bookUnit: Unit;
}

/** Under this name a half-taken set waits on the phone. */
export function takingKey(wearerId: string, correctsId: string | null): string {
  return correctsId === null ? `measure:${wearerId}` : `measure:${wearerId}:corrects:${correctsId}`;
}

export interface Begin {
  setId: string;
  wearerId: string;
  keys: readonly MeasureKey[];
  unit: Unit;
  /** Now, as an ISO date-time, and as a day. */
  now: string;
  today: IsoDate;
  takenBy: string;
}

const inTapeOrder = (keys: Iterable<MeasureKey>): MeasureKey[] => {
  const wanted = new Set(keys);
  return fullSet.measures.filter((key) => wanted.has(key));
};

/** A new set, at its first figure; with nothing to take, at the review. */
export function begin({ setId, wearerId, keys, unit, now, today, takenBy }: Begin): Taking {
  const ordered = inTapeOrder(keys);
  return {
    shape: 1,
    setId,
    wearerId,
    correctsId: null,
    unit,
    keys: ordered,
    at: ordered[0] ?? "review",
    held: false,
    entry: "",
    problem: null,
    taken: {},
    skipped: [],
    settled: [],
    startedAt: now,
    takenOn: today,
    takenBy,
    note: "",
  };
}

/** A new set that puts an old one right: it begins with the old one's figures and day, at the review. */
export function beginCorrection(
  old: MeasurementSet,
  { setId, unit, now }: Pick<Begin, "setId" | "unit" | "now">,
): Taking {
  const figures = old.figures.filter(({ key }) => isMeasureKey(key));
  const keys = figures.map(({ key }) => key as MeasureKey);
  return {
    ...begin({ setId, wearerId: old.wearerId, keys, unit, now, today: old.takenOn, takenBy: old.takenBy }),
    correctsId: old.id,
    at: "review",
    taken: Object.fromEntries(
      figures.map(({ key, mm, typed }) => {
        const again = typedAgain({ typed, mm }, unit);
        return [key, { typed: again, mm, unit: unitTyped(again, unit) }];
      }),
    ),
    note: old.note,
  };
}

/** The same with measures added, in tape order. */
export function withKeys(taking: Taking, keys: readonly MeasureKey[]): Taking {
  return { ...taking, keys: inTapeOrder([...taking.keys, ...keys]) };
}

export const takenCount = (taking: Pick<Taking, "taken" | "keys">): number =>
  taking.keys.filter((key) => taking.taken[key]).length;

/** Whether there is anything in it that would be missed. */
export function holdsSomething(taking: Taking): boolean {
  return takenCount(taking) > 0 || taking.entry !== "" || taking.note !== "" || taking.skipped.length > 0;
}
