import { type MeasurementSet } from "@/lib/records/types";

/**
 * The set to compare with: the last standing one taken before this one, other than the one that it puts right.
 * @param standing sets that no later one puts right, newest first.
 */
export function setBefore(
  set: Pick<MeasurementSet, "id" | "takenOn" | "correctsId">,
  standing: readonly MeasurementSet[],
): MeasurementSet | null {
  return (
    standing.find(
      ({ id, takenOn }) =>
        id !== set.correctsId && (takenOn < set.takenOn || (takenOn === set.takenOn && id < set.id)),
    ) ?? null
  );
}
