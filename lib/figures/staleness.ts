import { type IsoDate, monthsBetween } from "@/lib/people/iso-date";

export interface Staleness {
  stale: boolean;
  /** Whole months since the tape was taken; 0 where the day is still to come. */
  months: number;
  /** How many months a set is good for at this age. */
  goodForMonths: number;
  /** What to do, where it is stale. */
  say?: string;
  source: string;
  mark: "practice";
}

/** Months that a set is good for, up to and with an age in years. Common practice, no source. */
const goodFor = [
  { toAge: 1, months: 2 },
  { toAge: 5, months: 3 },
  { toAge: 12, months: 4 },
  { toAge: 17, months: 6 },
  { toAge: Infinity, months: 12 },
] as const;

/** As for a child of school age, since it may be one. */
const whereAgeIsUnknown = 6;

/**
 * Whether a measurement set is too old to cut from.
 * @param ageYears the wearer's age today, in years, where known.
 * @throws RangeError where a date is not a day.
 */
export function staleness(takenOn: IsoDate, ageYears: number | undefined, today: IsoDate): Staleness {
  const months = Math.max(0, monthsBetween(takenOn, today));
  const goodForMonths =
    ageYears === undefined
      ? whereAgeIsUnknown
      : goodFor.find(({ toAge }) => Math.floor(ageYears) <= toAge)!.months;
  const stale = months >= goodForMonths;
  const who =
    ageYears === undefined
      ? "the age is not known"
      : ageYears < 18
        ? ageYears < 1
          ? "a baby grows fast"
          : `a child of ${Math.floor(ageYears)} grows`
        : "figures change in a year";
  return {
    stale,
    months,
    goodForMonths,
    ...(stale && {
      say: `These figures are ${months} months old, and ${who}. Measure again before cutting.`,
    }),
    source: "common practice, no source",
    mark: "practice",
  };
}
