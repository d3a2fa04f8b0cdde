/** What the book says of a wearer on a day, gathered for the questions. */
import { previousFigures } from "@/lib/measuring/previous";
import { type Known } from "@/lib/measuring/taking";
import { ageOn, type BirthFacts } from "@/lib/people/age";
import { type MeasurementSet, type Unit } from "@/lib/records/types";

/** @throws RangeError where the set's day is not a day. */
export function knownOfSet(
  set: Pick<MeasurementSet, "id" | "takenOn">,
  wearer: BirthFacts | null,
  standing: readonly MeasurementSet[],
  bookUnit: Unit,
): Known {
  const ageYears = wearer ? ageOn(wearer, set.takenOn)?.years : undefined;
  return {
    previous: previousFigures(
      standing.filter(({ id }) => id !== set.id),
      set,
    ),
    ...(ageYears !== undefined && { ageYears }),
    on: set.takenOn,
    bookUnit,
  };
}
