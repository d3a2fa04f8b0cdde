/**
 * Changes written under an older schema are read by pure steps, one for each schema number (sync contract V1).
 * The journal itself is never rewritten.
 */
import { type Change, SCHEMA_NUMBER } from "./change";

/** `steps[n]` makes of a change of schema n + 1 one of schema n + 2. */
export type UpgradeStep = (change: Change) => Change;

const steps: readonly UpgradeStep[] = [
  // 1 to 2 brought a new table (`sums`) and more styles of sleeve: what schema 1 wrote is right as it is.
  (change) => change,
];

/**
 * The change as this version writes it. One from a newer version is given back as it is: fields that this
 * version does not know are kept beside the others and show after its update (V3).
 */
export function upgradeChange(
  change: Change,
  current: number = SCHEMA_NUMBER,
  through: readonly UpgradeStep[] = steps,
): Change {
  let upgraded = change;
  while (upgraded.schema < current) {
    const step = through[upgraded.schema - 1];
    if (!step) throw new Error(`No step leads from schema ${upgraded.schema}`);
    upgraded = { ...step(upgraded), schema: upgraded.schema + 1 };
  }
  return upgraded;
}
