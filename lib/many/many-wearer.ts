import { type MeasurementSet, type Wearer } from "@/lib/records/types";

/** Someone to draft for, with the set to work by: the newest that no later one puts right, or null before the first. */
export interface ManyWearer {
  wearer: Wearer;
  set: MeasurementSet | null;
}
