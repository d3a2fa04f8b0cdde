/** The mark-out as the screen and the sheet show it: each step with what it adds, over what is drawn by then. */
import {
  bounds,
  type CubicBezier,
  type LineName,
  type MadeSleeve,
  markSteps,
  type MarkStep,
  type Point,
  type PointName,
} from "@/lib/drafting";
import { type Phrase } from "@/lib/lengths/phrase";
import { type Box } from "@/lib/sleeves/drawing-view";

type Good = MadeSleeve & { ok: true };

interface DrawnPoint extends Point {
  name: PointName;
  words: string;
  /** Set by this step. */
  fresh: boolean;
}

export interface StepPicture {
  step: MarkStep;
  /** Lines of the steps before. */
  before: { name: LineName; curves: readonly CubicBezier[] }[];
  /** Lines of this step. */
  fresh: { name: LineName; curves: readonly CubicBezier[] }[];
  /** From where to where this step measures. */
  measured: { from: Point; to: Point }[];
  points: DrawnPoint[];
  /** What of the paper is worth showing: the cap alone, or the whole sleeve. */
  box: Box;
}

/** A point in a word or two, beside its dot. */
function pointWords(name: PointName): string {
  if (/^mark/u.test(name)) return `${name.replace(/\D/gu, "")}`;
  if (/^foot/u.test(name)) return "";
  const words: Partial<Record<PointName, string>> = {
    crown: "crown",
    capCentre: "cap line",
    elbowCentre: "elbow",
    hemCentre: "hem",
    underarmFront: "front underarm",
    underarmBack: "back underarm",
    elbowFront: "front elbow",
    elbowBack: "back elbow",
    hemFront: "front hem",
    hemBack: "back hem",
  };
  return words[name] ?? "";
}

/** Every step of a rounded sleeve with its picture. */
export function stepPictures(rounded: Good): StepPicture[] {
  const steps = markSteps(rounded.figures);
  if (!steps.ok) return [];
  const { points } = rounded.draft;
  const before: StepPicture["before"] = [];
  const set: PointName[] = ["crown"];
  return steps.value.map((step) => {
    const made = step.moves.map((move) => move.makes);
    const fresh = step.draws.map(({ curves, name }) => ({ name, curves }));
    const measured = step.moves.flatMap(({ from, makes }) => {
      const [a, b] = [points[from], points[makes]];
      return a && b ? [{ from: a, to: b }] : [];
    });
    const through = new Set(step.through.flat());
    const picture: StepPicture = {
      step,
      before: [...before],
      fresh,
      measured,
      points: [...new Set([...set, ...made])].flatMap((name) => {
        const at = points[name];
        const isFresh = made.includes(name) || through.has(name);
        return at ? [{ ...at, name, words: pointWords(name), fresh: isFresh }] : [];
      }),
      box: boxOfStep(rounded, step),
    };
    before.push(...fresh);
    set.push(...made);
    return picture;
  });
}

/** Steps that only touch the cap show the cap, larger. */
function boxOfStep({ draft, figures }: Good, step: MarkStep): Box {
  const names = [...step.moves.flatMap(({ from, makes }) => [from, makes]), ...step.through.flat()];
  const places = names.flatMap((name) => draft.points[name] ?? []);
  const inCap = (y: number) => y <= figures.capDepth + 0.001;
  const drawn = step.draws.flatMap(({ curves }) => [...curves]);
  const onlyCap =
    places.length > 0 &&
    places.every(({ y }) => inCap(y)) &&
    (drawn.length === 0 || inCap(bounds(drawn).max.y));
  const wide = Math.max(figures.biceps, onlyCap ? 0 : figures.hem, onlyCap ? 0 : (figures.elbow?.width ?? 0));
  return { x: -wide / 2, y: 0, w: wide, h: onlyCap ? figures.capDepth : figures.length };
}

/** What rounding the marks has moved, said so that it can be trusted: tenths of a millimetre, whatever the unit. */
export function roundingPhrase(exact: Good, rounded: Good, step: number): Phrase {
  const drift = rounded.draft.lengths.cap - exact.draft.lengths.cap;
  const size = Math.abs(drift);
  const moved =
    size < 0.05
      ? "as long as worked out"
      : `${size.toFixed(1)} mm ${drift > 0 ? "longer" : "shorter"} than worked out`;
  return [
    "Every mark is rounded to ",
    { mm: step },
    ` and the sleeve drawn again from the rounded marks: its cap seam comes out ${moved}. The checks here are of the rounded sleeve.`,
  ];
}
