/** The mark-out as the screen and the sheet show it: the block's steps, then the style's, each over what is drawn by then. */
import {
  type CubicBezier,
  type LineName,
  markSteps,
  type MarkStep,
  type Point,
  type PointName,
} from "@/lib/drafting";
import { type StepStage } from "@/lib/drafting/pattern";
import { type Phrase } from "@/lib/lengths/phrase";
import { boxOfCurves } from "@/lib/sleeves/drawing-paths";
import { type Box } from "@/lib/sleeves/drawing-view";
import { type GoodSleeve } from "@/lib/sleeves/make-style-from-record";
import { stylePictures } from "@/lib/sleeves/style-pictures";

export interface DrawnLine {
  /** Along the outline, or only to draw by. */
  weight: "cut" | "guide";
  curves: readonly CubicBezier[];
}

export interface DrawnPoint extends Point {
  words: string;
  /** Set by this step. */
  fresh: boolean;
}

export interface StepPicture {
  step: {
    /** From 1. */
    n: number;
    stage: StepStage;
    phrase: MarkStep["phrase"];
    /** mm; the one distance of the step. */
    distance?: number;
  };
  /** Lines of the steps before. */
  before: DrawnLine[];
  /** Lines of this step. */
  fresh: DrawnLine[];
  /** From where to where this step measures. */
  measured: { from: Point; to: Point }[];
  points: DrawnPoint[];
  /** What of the paper is worth showing: the cap alone, or everything that comes on to the sheet. */
  box: Box;
}

export const stageNames: Readonly<Record<StepStage, string>> = {
  draw: "Draw",
  cut: "Cut and spread",
  sew: "At the machine",
};

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
export function stepPictures(rounded: GoodSleeve): StepPicture[] {
  const block = blockPictures(rounded);
  return block.length === 0 ? [] : [...block, ...stylePictures(rounded, block)];
}

function blockPictures(rounded: GoodSleeve): StepPicture[] {
  const steps = markSteps(rounded.figures);
  if (!steps.ok) return [];
  const { points } = rounded.draft;
  const before: DrawnLine[] = [];
  const set: PointName[] = ["crown"];
  return steps.value.map((step) => {
    const { distance, n, phrase } = step;
    const made = step.moves.map((move) => move.makes);
    const fresh = step.draws.map(({ curves, name }) => ({ weight: weightOf(name), curves }));
    const measured = step.moves.flatMap(({ from, makes }) => {
      const [a, b] = [points[from], points[makes]];
      return a && b ? [{ from: a, to: b }] : [];
    });
    const through = new Set(step.through.flat());
    const picture: StepPicture = {
      step: { n, stage: "draw", phrase, ...(distance !== undefined && { distance }) },
      before: [...before],
      fresh,
      measured,
      points: [...new Set([...set, ...made])].flatMap((name) => {
        const at = points[name];
        const isFresh = made.includes(name) || through.has(name);
        return at ? [{ ...at, words: pointWords(name), fresh: isFresh }] : [];
      }),
      box: boxOfStep(rounded, step),
    };
    before.push(...fresh);
    set.push(...made);
    return picture;
  });
}

/** The outline is cut along; everything else on the paper guides. */
function weightOf(name: LineName): DrawnLine["weight"] {
  return name === "hemLine" || /^(cap|underarm)(Front|Back)$/u.test(name) ? "cut" : "guide";
}

/** Steps that only touch the cap show the cap, larger. */
function boxOfStep({ draft, figures }: GoodSleeve, step: MarkStep): Box {
  const names = [...step.moves.flatMap(({ from, makes }) => [from, makes]), ...step.through.flat()];
  const places = names.flatMap((name) => draft.points[name] ?? []);
  const inCap = (y: number) => y <= figures.capDepth + 0.001;
  const drawn = step.draws.flatMap(({ curves }) => [...curves]);
  const lowest = drawn.length === 0 ? 0 : boxOfCurves(drawn).y + boxOfCurves(drawn).h;
  const onlyCap = places.length > 0 && places.every(({ y }) => inCap(y)) && inCap(lowest);
  const wide = Math.max(figures.biceps, onlyCap ? 0 : figures.hem, onlyCap ? 0 : (figures.elbow?.width ?? 0));
  return { x: -wide / 2, y: 0, w: wide, h: onlyCap ? figures.capDepth : figures.length };
}

/** What rounding the marks has moved, said so that it can be trusted: tenths of a millimetre, whatever the unit. */
export function roundingPhrase(exact: GoodSleeve, rounded: GoodSleeve, step: number): Phrase {
  const drift = rounded.draft.lengths.cap - exact.draft.lengths.cap;
  const size = Math.abs(drift);
  const moved =
    size < 0.05
      ? "as long as worked out"
      : `${size.toFixed(1)} mm ${drift > 0 ? "longer" : "shorter"} than worked out`;
  const seam = rounded.style === "plain" ? "its cap seam" : "the cap seam of the plain sleeve below it";
  return [
    "Every mark is rounded to ",
    { mm: step },
    ` and the sleeve drawn again from the rounded marks: ${seam} comes out ${moved}. The checks here are of the rounded sleeve.`,
  ];
}
