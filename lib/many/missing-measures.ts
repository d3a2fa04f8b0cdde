import { type MeasureKey } from "@/lib/figures/body-measures";
import { type Reach } from "@/lib/sleeves/reach";

/**
 * The body measures that a set lacks for a sleeve of that reach, in the order they are taken. Of two that would do (the
 * hand or the wrist for a long hem, the armscye whole or in halves) the first is named.
 */
export function missingMeasures(figures: readonly { key: string }[], reach: Reach): MeasureKey[] {
  const has = (key: MeasureKey) => figures.some((figure) => figure.key === key);
  const armscye = has("armscyeGirth") || (has("armscyeFront") && has("armscyeBack"));
  const hem: Record<Reach, boolean> = {
    short: true,
    "three-quarter": has("elbowGirth"),
    long: has("handGirth") || has("wristGirth"),
  };
  const hemKey: MeasureKey = reach === "long" ? "handGirth" : "elbowGirth";
  const lacks: [MeasureKey, boolean][] = [
    ["armscyeGirth", !armscye],
    ["upperArmGirth", !has("upperArmGirth")],
    [hemKey, !hem[reach]],
    ["upperArmLength", reach !== "long" && !has("upperArmLength")],
    ["armLength", reach !== "short" && !has("armLength")],
  ];
  return lacks.flatMap(([key, isMissing]) => (isMissing ? [key] : []));
}
