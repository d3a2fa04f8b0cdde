/** The figures that the drafting form asks for: their keys in a sleeve's record, their names, and what each is. */
import { type FigureName } from "@/lib/drafting";

export type FigureKey =
  | "length"
  | "capDepth"
  | "armholeFront"
  | "armholeBack"
  | "armholeWhole"
  | "headEase"
  | "biceps"
  | "upperArm"
  | "bicepsEase"
  | "hem"
  | "hand"
  | "wrist"
  | "elbowDepth"
  | "elbowWidth"
  | "elbowGirth"
  | "beside"
  | "notchFront"
  | "notchBack";

export interface SleeveFigure {
  key: FigureKey;
  name: string;
  /** In the middle of a sentence: "the cap depth". */
  said: string;
  /** What it is, in one plain sentence. */
  how: string;
}

const figure = (key: FigureKey, name: string, said: string, how: string): SleeveFigure => ({
  key,
  name,
  said,
  how,
});

export const sleeveFigures: readonly SleeveFigure[] = [
  figure("length", "Sleeve length", "the sleeve length", "From the crown, down the middle, to the hem."),
  figure("capDepth", "Cap depth", "the cap depth", "From the crown straight down to the biceps line."),
  figure(
    "armholeFront",
    "Armhole, front",
    "the front armhole",
    "Along the seam line of the bodice front, shoulder seam to side seam.",
  ),
  figure(
    "armholeBack",
    "Armhole, back",
    "the back armhole",
    "Along the seam line of the bodice back, shoulder seam to side seam.",
  ),
  figure("armholeWhole", "Armhole", "the armhole", "Along the seam line of the bodice, all the way round."),
  figure(
    "headEase",
    "Head ease",
    "the head ease",
    "How much longer the cap seam is than the armhole, to be eased in.",
  ),
  figure("biceps", "Biceps line", "the biceps line", "Straight across the sleeve, underarm to underarm."),
  figure("upperArm", "Upper arm", "the upper arm", "Round the fullest part of the arm itself."),
  figure("bicepsEase", "Biceps ease", "the biceps ease", "Room for the arm to move, added to the upper arm."),
  figure("hem", "Hem round", "the hem round", "Straight across the lower edge, seam to seam."),
  figure("hand", "Hand", "the hand", "Round the knuckles: a closed hem must let it through."),
  figure("wrist", "Wrist", "the wrist", "Round the wrist bone."),
  figure(
    "elbowDepth",
    "Depth of the elbow",
    "the depth of the elbow",
    "From the crown down to the level of the elbow.",
  ),
  figure("elbowWidth", "Elbow line", "the elbow line", "Straight across the sleeve at the elbow."),
  figure("elbowGirth", "Elbow", "the elbow", "Round the bent elbow itself."),
  figure(
    "beside",
    "Beside the crown",
    "the start of the guide lines",
    "How far each side of the crown the guide lines start.",
  ),
  figure("notchFront", "Front notch", "the front notch", "Up the cap seam from the front underarm point."),
  figure("notchBack", "Back notches", "the back notches", "Up the cap seam from the back underarm point."),
];

const byKey: ReadonlyMap<string, SleeveFigure> = new Map(sleeveFigures.map((one) => [one.key, one]));

export function sleeveFigure(key: FigureKey): SleeveFigure {
  return byKey.get(key)!;
}

/** The fields that a problem or a check of the engine stands beside, the first that is on the form. */
export function fieldsFor(figureName: FigureName): readonly FigureKey[] {
  switch (figureName) {
    case "biceps":
      return ["biceps", "upperArm"];
    case "capDepth":
      return ["capDepth", "armholeWhole", "armholeFront"];
    case "armhole":
      return ["armholeWhole", "armholeFront"];
    case "armholeFront":
    case "armholeBack":
      return [figureName, "armholeWhole"];
    case "notches":
      return ["notchFront"];
    case "frontMarks":
    case "backMarks":
      return [];
    default:
      return [figureName];
  }
}
