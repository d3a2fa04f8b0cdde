import { type Fineness, type Unit } from "@/lib/records/types";

/** Exact: international yard, 1959. */
export const mmPerInch = 25.4;

/** No length typed for a body or a pattern is longer than this, 5 m, unless a form says so. */
export const longestMm = 5000;

/** The smallest step that is shown, in mm: 1/8 or 1/16 in, or 1 mm where the workshop counts in cm. */
export function stepOf(unit: Unit, fineness: Fineness = 8): number {
  return unit === "in" ? mmPerInch / fineness : 1;
}
