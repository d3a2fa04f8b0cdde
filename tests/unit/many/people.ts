/** Invented wearers with measurement sets. */
import { type MeasureKey, sleeveSet } from "@/lib/figures/body-measures";
import { type ManyAsk } from "@/lib/many/draft-many";
import { type ManyWearer } from "@/lib/many/many-wearer";
import { emptyStyleForm } from "@/lib/sleeves/style-form";

export const TODAY = "2026-03-14";

export const ask = (more: Partial<ManyAsk> = {}): ManyAsk => ({
  ...emptyStyleForm,
  unit: "in",
  fineness: 8,
  reach: "long",
  oldToo: false,
  today: TODAY,
  ...more,
});

const head = { workshopId: "w", stamps: {}, removedAt: null };

/** A grown woman's sleeve set, inches, in the order of `sleeveSet`; 1 is about P50 of the US Army surveys (seen). */
const grown = [14.5, 11.4, 9.35, 6.06, 7.36, 12.25, 21.4];

export interface Person {
  name: string;
  /** Whole years today; left out where nobody asked. */
  age?: number;
  takenOn?: string;
  /** All figures times this. */
  size?: number;
  without?: readonly MeasureKey[];
}

export function person(
  n: number,
  { age, name, size = 1, takenOn = "2026-03-01", without = [] }: Person,
): ManyWearer {
  const id = `wearer-${n}`;
  const figures = sleeveSet.measures.flatMap((key, i) => {
    const mm = Math.round(grown[i]! * size * 8) * 3.175;
    return without.includes(key) ? [] : [{ key, typed: String(mm / 25.4), mm }];
  });
  return {
    wearer: {
      ...head,
      id,
      clientId: "c",
      name,
      birthYear: null,
      birthMonth: null,
      ageYears: age ?? null,
      ageOn: age === undefined ? null : TODAY,
      note: "",
    },
    set: { ...head, id: `set-${n}`, wearerId: id, takenOn, takenBy: "", figures, note: "", correctsId: null },
  };
}

export const unmeasured = (n: number, name: string): ManyWearer => ({ ...person(n, { name }), set: null });
