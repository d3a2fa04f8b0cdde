import { isMeasureKey, bodyMeasure } from "@/lib/figures/body-measures";
import { formatPlain } from "@/lib/lengths/format-length";
import { formatDay } from "@/lib/people/format-day";
import { type Fineness, type MeasurementSet, type Unit } from "@/lib/records/types";

/** A set as plain lines, to be sent in a message. @throws RangeError where its day is not a day. */
export function shareText(
  set: Pick<MeasurementSet, "takenOn" | "takenBy" | "figures" | "note">,
  wearer: string,
  unit: Unit,
  fineness: Fineness,
): string {
  const lines = set.figures.map(
    ({ key, mm }) => `${isMeasureKey(key) ? bodyMeasure(key).name : key}: ${formatPlain(mm, unit, fineness)}`,
  );
  const by = set.takenBy ? `, by ${set.takenBy}` : "";
  return [
    `Figures of ${wearer}`,
    `Taken ${formatDay(set.takenOn)}${by}`,
    "",
    ...lines,
    ...(set.note ? ["", set.note] : []),
  ].join("\n");
}
