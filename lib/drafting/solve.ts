/** Finding the cap depth whose cap seam goes into the armhole. */
import { capHalf } from "@/lib/drafting/basic-sleeve";
import { capChain } from "@/lib/drafting/cap-seam";
import { defaultBeside, defaultMarks, halfKnots, INCH } from "@/lib/drafting/guide";
import { chainLength } from "@/lib/drafting/measure";
import { say } from "@/lib/drafting/say";
import { type DraftProblem, type GuideMark, type Phrase, type Result, type Side } from "@/lib/drafting/types";

/** Found cap depths lie between these shares of the biceps line: flatter is a strip, deeper a spike. */
const FLATTEST = 0.1;
const DEEPEST = 0.85;
/** Well below anything a tape can show, mm. */
const TOLERANCE = 1e-7;

/**
 * A root of `f` between `low` and `high`, where it changes sign, by the ITP method (I. F. D. Oliveira and
 * R. H. C. Takahashi, 2021): as fast as the secant on smooth functions, never slower than halving plus one step.
 */
export function findRoot(f: (x: number) => number, low: number, high: number, tolerance: number): number {
  let [a, b] = [low, high];
  let [fa, fb] = [f(a), f(b)];
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (fa * fb > 0) throw new RangeError("findRoot needs a change of sign between its two ends");
  const rising = Math.sign(fb);
  const k1 = 0.2 / (b - a);
  const halvings = Math.ceil(Math.log2((b - a) / (2 * tolerance))) + 1;
  for (let step = 0; b - a > 2 * tolerance; step++) {
    const middle = (a + b) / 2;
    const secant = (fb * a - fa * b) / (fb - fa);
    const inward = Math.sign(middle - secant);
    const nudge = k1 * (b - a) ** 2;
    const pulled = nudge <= Math.abs(middle - secant) ? secant + inward * nudge : middle;
    const radius = tolerance * 2 ** (halvings - step) - (b - a) / 2;
    const x = Math.abs(pulled - middle) <= radius ? pulled : middle - inward * radius;
    const y = f(x);
    if (y === 0) return x;
    if (y * rising > 0) [b, fb] = [x, y];
    else [a, fa] = [x, y];
  }
  return (a + b) / 2;
}

export interface CapDepthAsk {
  /** The whole armhole, front and back. */
  readonly armhole: number;
  readonly headEase: number;
  readonly biceps: number;
  readonly beside?: number;
  /** A side left out keeps the default marks, which follow each cap depth tried. */
  readonly marks?: Partial<Readonly<Record<Side, readonly GuideMark[]>>>;
}

function capFigures({ biceps, beside, marks }: CapDepthAsk, capDepth: number) {
  const usual = defaultMarks(biceps, capDepth);
  return {
    biceps,
    capDepth,
    beside: beside ?? defaultBeside(biceps),
    front: marks?.front ?? usual.front,
    back: marks?.back ?? usual.back,
  };
}

function capSeamLength(ask: CapDepthAsk, capDepth: number): number {
  const figures = capFigures(ask, capDepth);
  return (
    chainLength(capChain(halfKnots(figures, "front"))) + chainLength(capChain(halfKnots(figures, "back")))
  );
}

/**
 * The cap depth, mm, whose whole cap seam measures armhole + ease. Fails, naming the figure in the way: a biceps line
 * too wide or too narrow for the armhole, or a guide mark that the depth found does not suit.
 */
export function solveCapDepth(ask: CapDepthAsk): Result<{ readonly capDepth: number }> {
  const { biceps } = ask;
  const target = ask.armhole + ask.headEase;
  const capLength = (capDepth: number) => {
    const figures = capFigures(ask, capDepth);
    return (
      chainLength(capChain(halfKnots(figures, "front"))) + chainLength(capChain(halfKnots(figures, "back")))
    );
  };
  const miss = (capDepth: number) => capLength(capDepth) - target;

  let high = DEEPEST * biceps;
  const longest = capLength(high);
  if (longest < target) {
    return {
      ok: false,
      problems: [
        {
          id: "biceps-too-narrow",
          figure: "biceps",
          phrase: say`The armhole with its ease is ${target}. Over a biceps line of ${biceps} even a very deep cap measures only ${longest}.`,
          remedy: say`Make the biceps line ${(biceps * target) / longest} or wider, or measure the armhole again.`,
        },
      ],
    };
  }
  // Down from the deep end, so that fixed marks which are senseless on a flat cap cannot hide the depth wanted.
  let low = high;
  while (miss(low) > 0) {
    high = low;
    if (low <= FLATTEST * biceps) return { ok: false, problems: [tooLong(ask, capLength(low))] };
    low = Math.max(FLATTEST * biceps, low * 0.75);
  }
  const capDepth = low === high ? low : findRoot(miss, low, high, TOLERANCE);
  const figures = {
    ...capFigures(ask, capDepth),
    length: capDepth * 2,
    hem: biceps,
    notches: { front: 0, back: 0 },
  };
  const unfair = (["front", "back"] as const).flatMap((side) => {
    const seam = capHalf(figures, side);
    return seam.ok ? [] : seam.problems;
  });
  if (unfair.length === 0) return { ok: true, value: { capDepth } };
  return {
    ok: false,
    problems: unfair.map((problem) => ({
      ...problem,
      phrase: [...say`This armhole asks for a cap ${capDepth} deep. On it, `, ...lowerFirst(problem.phrase)],
    })),
  };
}

function lowerFirst([first, ...rest]: Phrase) {
  return typeof first === "string" ? [first[0]!.toLowerCase() + first.slice(1), ...rest] : [first!, ...rest];
}

/** Even the flattest cap is longer than armhole and ease: the given marks are at fault if the default ones would do. */
function tooLong({ biceps, headEase, armhole, beside, marks }: CapDepthAsk, shortest: number): DraftProblem {
  const target = armhole + headEase;
  const usual = capSeamLength({ biceps, headEase, armhole, beside }, FLATTEST * biceps);
  if (usual < target) {
    return {
      id: "marks-too-far",
      figure: marks?.front ? "frontMarks" : "backMarks",
      phrase: say`The armhole with ${headEase} of ease is ${target}. With these marks even the flattest cap measures ${shortest}.`,
      remedy: say`Raise and hollow the marks less, or take the usual ones.`,
    };
  }
  return {
    id: "biceps-too-wide",
    figure: "biceps",
    phrase: say`The armhole with ${headEase} of ease is ${target}. Over a biceps line of ${biceps} even the flattest cap measures ${shortest}.`,
    remedy: say`Make the biceps line ${(biceps * target) / shortest} or narrower, or measure the armhole again.`,
  };
}

/** Head ease when none is asked for: 1 1/4 in woven, 1/2 in knit; less in proportion in an armhole under 16 in. */
export function usualHeadEase(armhole: number, cloth: "woven" | "knit" = "woven"): number {
  const full = cloth === "knit" ? INCH / 2 : INCH * 1.25;
  return full * Math.min(1, armhole / FULL_ARMHOLE);
}

/** Armhole from which the published ease for adults is taken whole. Common practice, no source. */
export const FULL_ARMHOLE = 16 * INCH;

/** Shares of the armhole that hands use for the cap depth, to show beside the one found. Recalled, not read in a source. */
export function capDepthShares(
  armhole: number,
): readonly { words: string; capDepth: number; mark: "memory" }[] {
  return [{ words: "a third of the armhole", capDepth: armhole / 3, mark: "memory" }];
}
