/** The one call the screen makes: from what the form gives to a drawn and checked sleeve, or what is in the way. */
import { draftBasicSleeve, type SleeveDraft } from "@/lib/drafting/basic-sleeve";
import { checkSleeve, type Check } from "@/lib/drafting/checks";
import { defaultBeside, defaultMarks, defaultNotches } from "@/lib/drafting/guide";
import { ordinal, say } from "@/lib/drafting/say";
import { solveCapDepth, usualHeadEase } from "@/lib/drafting/solve";
import {
  type DraftProblem,
  type FigureName,
  type GuideMark,
  type Result,
  type Side,
  type SleeveAsk,
  type SleeveFigures,
} from "@/lib/drafting/types";

export type MadeSleeve =
  | {
      readonly ok: true;
      readonly figures: SleeveFigures;
      readonly draft: SleeveDraft;
      readonly checks: readonly Check[];
    }
  | { readonly ok: false; readonly problems: readonly DraftProblem[] };

/**
 * What can be a sleeve at all, mm: wide enough for an infant and for the largest adult, narrow enough to catch
 * inches typed as centimetres. Common practice, no source.
 */
const LIMITS: readonly (readonly [
  FigureName,
  string,
  number,
  number,
  (ask: SleeveAsk) => number | undefined,
])[] = [
  ["length", "The sleeve length", 50, 1200, (ask) => ask.length],
  ["biceps", "The biceps line", 80, 1200, (ask) => ask.biceps],
  ["hem", "The hem", 50, 2500, (ask) => ask.hem],
  ["capDepth", "The cap depth", 15, 600, (ask) => ask.capDepth],
  ["armholeFront", "The front armhole", 50, 700, (ask) => ask.armhole?.front],
  ["armholeBack", "The back armhole", 50, 700, (ask) => ask.armhole?.back],
  ["headEase", "The head ease", 0, 150, (ask) => ask.headEase],
  ["elbowDepth", "The depth of the elbow", 50, 900, (ask) => ask.elbowDepth],
  ["elbowWidth", "The elbow line", 60, 1500, (ask) => ask.elbowWidth],
  ["upperArm", "The upper arm", 60, 900, (ask) => ask.upperArm],
  ["elbowGirth", "The elbow", 60, 800, (ask) => ask.elbowGirth],
  ["wrist", "The wrist", 50, 400, (ask) => ask.wrist],
  ["hand", "The hand", 60, 500, (ask) => ask.hand],
  ["notches", "The front notch", 5, 700, (ask) => ask.notches?.front],
  ["notches", "The back notch", 5, 700, (ask) => ask.notches?.back],
];

/** Drafts and checks a sleeve. Throws on nothing a form can send. */
export function makeSleeve(ask: SleeveAsk): MadeSleeve {
  const figures = figuresOf(ask);
  if (!figures.ok) return figures;
  const drawn = drawSleeve(figures.value);
  if (!drawn.ok) return drawn;
  return {
    ok: true,
    figures: figures.value,
    draft: drawn.value,
    checks: checkSleeve(ask, figures.value, drawn.value),
  };
}

/** The same sleeve from figures that are already settled, such as rounded ones. */
export function remakeSleeve(ask: SleeveAsk, figures: SleeveFigures): MadeSleeve {
  const drawn = drawSleeve(figures);
  if (!drawn.ok) return drawn;
  return { ok: true, figures, draft: drawn.value, checks: checkSleeve(ask, figures, drawn.value) };
}

function drawSleeve(figures: SleeveFigures): Result<SleeveDraft> {
  const problems = figureProblems(figures);
  if (problems.length > 0) return { ok: false, problems };
  const drawn = draftBasicSleeve(figures);
  if (!drawn.ok) return drawn;
  const late = (["front", "back"] as const).flatMap((side) => notchProblem(figures, drawn.value, side));
  return late.length > 0 ? { ok: false, problems: late } : drawn;
}

function figuresOf(ask: SleeveAsk): Result<SleeveFigures> {
  const typed = LIMITS.flatMap(([figure, words, low, high, read]) => {
    const value = read(ask);
    return value === undefined ? [] : limitProblem(figure, words, low, high, value);
  });
  if (typed.length > 0) return { ok: false, problems: typed };
  const beside = ask.beside ?? defaultBeside(ask.biceps);
  const given = [
    ...besideProblem(beside, ask.biceps),
    ...markProblems(ask.frontMarks ?? [], "front", ask.biceps),
    ...markProblems(ask.backMarks ?? [], "back", ask.biceps),
  ];
  if (given.length > 0) return { ok: false, problems: given };
  const depth = capDepthOf(ask, beside);
  if (!depth.ok) return depth;
  const { capDepth } = depth.value;
  const marks = defaultMarks(ask.biceps, capDepth);
  return {
    ok: true,
    value: {
      length: ask.length,
      capDepth,
      biceps: ask.biceps,
      hem: ask.hem,
      ...elbowOf(ask, capDepth),
      beside,
      front: ask.frontMarks ?? marks.front,
      back: ask.backMarks ?? marks.back,
      notches: ask.notches ?? defaultNotches(ask.biceps),
    },
  };
}

function capDepthOf(ask: SleeveAsk, beside: number): Result<{ readonly capDepth: number }> {
  if (ask.capDepth !== undefined) return { ok: true, value: { capDepth: ask.capDepth } };
  if (!ask.armhole) {
    return {
      ok: false,
      problems: [
        {
          id: "cap-depth-missing",
          figure: "capDepth",
          phrase: say`There is neither a cap depth nor an armhole to find it from.`,
          remedy: say`Type the cap depth, or the front and back of the armhole.`,
        },
      ],
    };
  }
  const armhole = ask.armhole.front + ask.armhole.back;
  const marks = {
    ...(ask.frontMarks && { front: ask.frontMarks }),
    ...(ask.backMarks && { back: ask.backMarks }),
  };
  return solveCapDepth({
    armhole,
    headEase: ask.headEase ?? usualHeadEase(armhole, ask.cloth),
    biceps: ask.biceps,
    beside,
    marks,
  });
}

/** The elbow is drawn where the sleeve passes it. With no width given the underarm seams stay straight there. */
function elbowOf(
  { biceps, hem, length, elbowDepth, elbowWidth }: SleeveAsk,
  capDepth: number,
): Pick<SleeveFigures, "elbow"> {
  if (elbowDepth === undefined || elbowDepth >= length) return {};
  const straight = biceps + ((hem - biceps) * (elbowDepth - capDepth)) / (length - capDepth);
  return { elbow: { depth: elbowDepth, width: elbowWidth ?? straight } };
}

function limitProblem(
  figure: FigureName,
  words: string,
  low: number,
  high: number,
  value: number,
): DraftProblem[] {
  if (value >= low && value <= high) return [];
  const phrase = Number.isFinite(value) ? say`${words} is ${value}.` : say`${words} is not a length.`;
  return [{ id: `${figure}-range`, figure, phrase, remedy: say`Type a length between ${low} and ${high}.` }];
}

function besideProblem(beside: number, biceps: number): DraftProblem[] {
  if (beside >= 0 && beside <= biceps / 8) return [];
  return [
    {
      id: "beside-range",
      figure: "beside",
      phrase: Number.isFinite(beside)
        ? say`The guide lines start ${beside} beside the crown.`
        : say`The start of the guide lines is not a length.`,
      remedy: say`Type a length between ${0} and ${biceps / 8}.`,
    },
  ];
}

function markProblems(marks: readonly GuideMark[], side: Side, biceps: number): DraftProblem[] {
  const figure = side === "front" ? "frontMarks" : "backMarks";
  return marks.flatMap(({ share, out }, index): DraftProblem[] => {
    const name = `The ${ordinal(index)} ${side} mark`;
    const before = index === 0 ? 0 : marks[index - 1]!.share;
    if (!(share > before && share < 1)) {
      return [
        {
          id: "mark-order",
          figure,
          mark: { side, index },
          phrase: say`${name} is not between ${index === 0 ? "the underarm point" : "the mark before it"} and the top of the guide line.`,
          remedy: say`Set the marks in order from the underarm up.`,
        },
      ];
    }
    if (!(Math.abs(out) <= biceps / 4)) {
      return [
        {
          id: "mark-far",
          figure,
          mark: { side, index },
          phrase: Number.isFinite(out)
            ? say`${name} is ${Math.abs(out)} from the guide line.`
            : say`${name} has no length.`,
          remedy: say`Set it no further than ${biceps / 4} from the line.`,
        },
      ];
    }
    return [];
  });
}

function figureProblems({ length, capDepth, elbow }: SleeveFigures): DraftProblem[] {
  const problems: DraftProblem[] = [];
  if (length < capDepth + 10) {
    problems.push({
      id: "length-under-cap",
      figure: "length",
      phrase: say`The cap is ${capDepth} deep and the whole sleeve ${length} long, so no underarm seam is left.`,
      remedy: say`Make the sleeve ${capDepth + 10} or longer, or the cap flatter.`,
    });
  }
  if (elbow && elbow.depth <= capDepth) {
    problems.push({
      id: "elbow-in-cap",
      figure: "elbowDepth",
      phrase: say`The elbow is ${elbow.depth} below the crown and the cap ${capDepth} deep.`,
      remedy: say`Measure the elbow from the crown of the sleeve, over the shoulder bone: more than ${capDepth}.`,
    });
  }
  return problems;
}

function notchProblem(figures: SleeveFigures, draft: SleeveDraft, side: Side): DraftProblem[] {
  const notch = figures.notches[side];
  const seam = side === "front" ? draft.lengths.capFront : draft.lengths.capBack;
  if (notch < seam) return [];
  return [
    {
      id: "notch-off-seam",
      figure: "notches",
      phrase: say`The ${side} of the cap is ${seam} long, and its notch is set ${notch} up from the underarm.`,
      remedy: say`Set the notch between the underarm point and the crown.`,
    },
  ];
}
