import { type IsoDate, monthsBetween, readDay } from "@/lib/people/iso-date";

/** What is known of a wearer's birth: a month of a year, a year alone, or an age in whole years on a day. */
export interface BirthFacts {
  birthYear: number | null;
  /** 1 to 12. */
  birthMonth: number | null;
  ageYears: number | null;
  ageOn: IsoDate | null;
}

export interface Age {
  /** Whole years surely reached. Where it might be a year more, the younger is taken: care asks for it. */
  years: number;
  /** Whole months of life surely reached; only where the birth month is known. */
  months?: number;
  /** False where the birthday may or may not have come, so that `years` could be more. */
  certain: boolean;
}

/**
 * The wearer's age on a day. A birth month goes before a birth year, and that before an age told.
 * @returns undefined where nothing is known, or the wearer was not born yet.
 * @throws RangeError where a date is not a day.
 */
export function ageOn(wearer: BirthFacts, date: IsoDate): Age | undefined {
  const on = readDay(date);
  if (wearer.birthYear !== null && wearer.birthMonth !== null) {
    const begun = (on.year - wearer.birthYear) * 12 + on.month - wearer.birthMonth;
    if (begun < 0) return undefined;
    // The day of birth is not known: the month that holds it is only surely over in the next one.
    const months = Math.max(0, begun - 1);
    return { years: Math.floor(months / 12), months, certain: begun === 0 || begun % 12 !== 0 };
  }
  if (wearer.birthYear !== null) {
    const begun = on.year - wearer.birthYear;
    return begun < 0 ? undefined : { years: Math.max(0, begun - 1), certain: begun === 0 };
  }
  if (wearer.ageYears !== null && wearer.ageOn !== null) {
    const months = monthsBetween(wearer.ageOn, date);
    if (date === wearer.ageOn) return { years: wearer.ageYears, certain: true };
    if (date > wearer.ageOn) return { years: wearer.ageYears + Math.floor(months / 12), certain: false };
    const years = wearer.ageYears - Math.floor(-months / 12) - 1;
    return years < -1 ? undefined : { years: Math.max(0, years), certain: false };
  }
  return undefined;
}

/** Under 14: to 14 years is as far as EN 14682 and the US rules for nightwear reach (sources: care). */
export function isChild(age: Age): boolean {
  return age.years < 14;
}

/** Under 36 months, the bound of the small-parts rule, 16 CFR 1501 (sources: care). */
export function isUnderThree(age: Age): boolean {
  return age.years < 3;
}
