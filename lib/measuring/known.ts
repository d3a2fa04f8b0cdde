/** What the book says of a wearer on the day of taking, gathered for the questions. */
import { previousFigures } from "@/lib/measuring/previous";
import { type Known } from "@/lib/measuring/taking";
import { ageOn, type BirthFacts } from "@/lib/people/age";
import { type IsoDate } from "@/lib/people/iso-date";
import { type MeasurementSet, type Unit } from "@/lib/records/types";

export interface KnownAsk {
  wearer: BirthFacts;
  /** The sets to work by, newest first. */
  standing: readonly MeasurementSet[];
  /** The set that is looked at or put right: only what was known before it counts. None: a new set, today. */
  before?: Pick<MeasurementSet, "id" | "takenOn">;
  today: IsoDate;
  bookUnit: Unit;
}

/** @throws RangeError where a date is not a day. */
export function knownOf({ wearer, standing, before, today, bookUnit }: KnownAsk): Known {
  const on = before?.takenOn ?? today;
  const ageYears = ageOn(wearer, on)?.years;
  return {
    previous: previousFigures(standing, before),
    ...(ageYears !== undefined && { ageYears }),
    on,
    bookUnit,
  };
}
