/**
 * The body measures that a seamstress takes for an upper garment. Names follow ISO 8559 (seen as a list; the definitions are from
 * memory). `armscyeFront` and `armscyeBack` are the two halves of the armscye girth, as the tape meets them: a drafted
 * cap is walked against each half. The bounds are common practice, no source: the smallest newborn to the largest adult.
 */

export type MeasureKey =
  | "shoulderLength"
  | "armscyeGirth"
  | "armscyeFront"
  | "armscyeBack"
  | "upperArmGirth"
  | "elbowGirth"
  | "wristGirth"
  | "handGirth"
  | "upperArmLength"
  | "armLength"
  | "scyeDepth"
  | "backWidth"
  | "bustGirth"
  | "cervicalToWaist";

export interface BodyMeasure {
  key: MeasureKey;
  name: string;
  /** Where the tape goes, one plain sentence. */
  how: string;
  kind: "girth" | "length";
  /** Beyond these a figure is more likely mistyped than measured, in mm. */
  leastMm: number;
  mostMm: number;
}

const measure = (
  key: MeasureKey,
  name: string,
  kind: BodyMeasure["kind"],
  leastMm: number,
  mostMm: number,
  how: string,
): BodyMeasure => ({ key, name, how, kind, leastMm, mostMm });

/** In tape order: from the neck down the arm, then its lengths, then the body. */
export const bodyMeasures: readonly BodyMeasure[] = [
  measure(
    "shoulderLength",
    "Shoulder length",
    "length",
    45,
    200,
    "From where the neck meets the shoulder, along the top, to the shoulder bone.",
  ),
  measure(
    "armscyeGirth",
    "Armscye girth",
    "girth",
    130,
    700,
    "Round the whole arm at its root: over the shoulder bone, down the front, under the arm and up the back.",
  ),
  measure(
    "armscyeFront",
    "Armscye, front half",
    "length",
    60,
    350,
    "From the shoulder bone down the front of the armscye to the middle of the underarm.",
  ),
  measure(
    "armscyeBack",
    "Armscye, back half",
    "length",
    60,
    350,
    "From the shoulder bone down the back of the armscye to the middle of the underarm.",
  ),
  measure(
    "upperArmGirth",
    "Upper arm girth",
    "girth",
    80,
    600,
    "Round the fullest part of the upper arm, the arm hanging loose.",
  ),
  measure("elbowGirth", "Elbow girth", "girth", 80, 500, "Round the elbow, over its point, the arm bent."),
  measure("wristGirth", "Wrist girth", "girth", 65, 260, "Round the wrist, over the wrist bone."),
  measure(
    "handGirth",
    "Hand girth",
    "girth",
    75,
    320,
    "Round the hand over the knuckles, the thumb left out.",
  ),
  measure(
    "upperArmLength",
    "Upper arm length",
    "length",
    80,
    480,
    "From the shoulder bone to the point of the elbow, the arm bent.",
  ),
  measure(
    "armLength",
    "Arm length",
    "length",
    140,
    850,
    "From the shoulder bone, over the bent elbow, to the wrist bone.",
  ),
  measure(
    "scyeDepth",
    "Scye depth",
    "length",
    60,
    350,
    "From the bone at the nape, straight down the middle of the back, to the level of the underarms.",
  ),
  measure(
    "backWidth",
    "Back width",
    "length",
    120,
    600,
    "Straight across the back, from one arm crease to the other, half-way down the armscye.",
  ),
  measure(
    "bustGirth",
    "Bust girth",
    "girth",
    280,
    1900,
    "Round the fullest part of the bust or chest, the tape level and not tight.",
  ),
  measure(
    "cervicalToWaist",
    "Cervical to waist",
    "length",
    110,
    600,
    "From the bone at the nape, straight down the middle of the back, to the waist.",
  ),
];

const byKey: ReadonlyMap<string, BodyMeasure> = new Map(bodyMeasures.map((m) => [m.key, m]));

export function isMeasureKey(key: string): key is MeasureKey {
  return byKey.has(key);
}

export function bodyMeasure(key: MeasureKey): BodyMeasure {
  return byKey.get(key)!;
}

export interface MeasureGroup {
  key: "sleeve" | "full";
  name: string;
  measures: readonly MeasureKey[];
}

export const sleeveSet: MeasureGroup = {
  key: "sleeve",
  name: "Sleeve set",
  measures: [
    "armscyeGirth",
    "upperArmGirth",
    "elbowGirth",
    "wristGirth",
    "handGirth",
    "upperArmLength",
    "armLength",
  ],
};

export const fullSet: MeasureGroup = {
  key: "full",
  name: "Full set",
  measures: bodyMeasures.map((m) => m.key),
};
