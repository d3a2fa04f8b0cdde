import { sleeveSet } from "@/lib/figures/body-measures";
import { press, type Press } from "@/lib/measuring/press";
import { begin, type Begin, type Known, type Taking } from "@/lib/measuring/taking";
import { type MeasurementSet } from "@/lib/records/types";

export const ids = {
  wearer: "018f0000-0000-7000-8000-000000000001",
  set: "018f0000-0000-7000-8000-000000000002",
  old: "018f0000-0000-7000-8000-000000000003",
};

export const beginning: Begin = {
  setId: ids.set,
  wearerId: ids.wearer,
  keys: sleeveSet.measures,
  unit: "in",
  now: "2026-03-14T14:20:00.000Z",
  today: "2026-03-14",
  takenBy: "",
};

export const nothingKnown: Known = { previous: {}, on: "2026-03-14", bookUnit: "in" };

export const pressAll = (taking: Taking, presses: readonly Press[], known: Known = nothingKnown): Taking =>
  presses.reduce((state, key) => press(state, key, known), taking);

/** "14 4/8" as the pad has it pressed: digits, then the key of eighths (or of tenths, under 10). */
export function tap(whole: number, over: number, under: 8 | 16 | 10 = 8): Press[] {
  const digits = [...String(whole)].map((digit): Press => ({ do: "digit", digit: Number(digit) }));
  return [...digits, { do: "part", over, under }];
}

export const fresh = (over: Partial<Begin> = {}): Taking => begin({ ...beginning, ...over });

export function setOf(over: Partial<MeasurementSet> & { id: string }): MeasurementSet {
  return {
    workshopId: "018f0000-0000-7000-8000-0000000000ff",
    stamps: {},
    removedAt: null,
    wearerId: ids.wearer,
    takenOn: "2025-09-01",
    takenBy: "Efua",
    figures: [],
    note: "",
    correctsId: null,
    ...over,
  };
}
