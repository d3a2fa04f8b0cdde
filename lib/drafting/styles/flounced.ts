/** A plain sleeve down to a level, and below it a flounce cut as part of a ring. */
import { INCH } from "@/lib/drafting/guide";
import { bounds, chainLength } from "@/lib/drafting/measure";
import { edgeOf } from "@/lib/drafting/outline";
import { type PatternPiece, type StyleCheck, type StyleResult, type StyleStep } from "@/lib/drafting/pattern";
import { LEAST_RADIUS, type Ring, ringAngle, ringParts, ringPiece, ringRadius } from "@/lib/drafting/ring";
import { say } from "@/lib/drafting/say";
import { walk, type WalkedSeam } from "@/lib/drafting/seams";
import { closedRound } from "@/lib/drafting/styles/closed-round";
import {
  impossible,
  settled,
  type StyleContext,
  type StyleFigure,
  type StyleRecipe,
} from "@/lib/drafting/styles/context";
import { clothWidthFigure, edgeSize, pattern, underarmWalk } from "@/lib/drafting/styles/parts";
import { downTo, EMPTY, headSeam, outlined, setIn, work } from "@/lib/drafting/styles/plain-sleeve";
import { joinSteps } from "@/lib/drafting/styles/spread-steps";

/** The outer edge is a narrow hem: it is a curve. Common practice, no source. */
const NARROW_HEM = INCH / 4;
/** Cloth beside a ring for its allowances, both sides together. */
const BESIDE = INCH;
/** More joins than this are no flounce any more. */
const MOST_RINGS = 12;

export const flounced: StyleRecipe = {
  id: "flounced",
  name: "Flounced",
  look: "Plain to a seam, and below it a flounce that falls in soft folds without a gather.",
  replaces: ["hem-wrist", "hem-hand", "hem-arm"],
  figures: (ground, typed): StyleFigure[] => {
    const { biceps, capDepth, length } = ground.figures;
    const scale = Math.min(1, biceps / (12 * INCH));
    const depth: StyleFigure = {
      key: "depth",
      label: "Depth of the flounce",
      said: "the depth of the flounce",
      does: "Deeper, the folds fall longer.",
      kind: "length",
      usual: (length > 1.2 * biceps ? 4 : 2.5) * INCH * scale,
      low: 0.5 * INCH,
      high: 16 * INCH,
    };
    return [
      {
        key: "joinAt",
        label: "Flounce joined below the crown",
        said: "the level where the flounce is joined",
        does: "Higher up, the flounce falls from the upper arm; lower down, from the wrist.",
        kind: "length",
        // So that sleeve and flounce together are as long as the block, where there is arm enough.
        usual: Math.max(Math.min(length, capDepth + 0.75 * INCH), length - settled(depth, typed)),
        low: capDepth + 10,
        high: length,
      },
      depth,
      {
        key: "fullness",
        label: "Outer edge to inner edge",
        said: "the fullness of the flounce",
        does: "Higher, the edge of the flounce ripples more.",
        kind: "ratio",
        usual: 2,
        low: 1.1,
        high: 6,
      },
      clothWidthFigure(ground),
    ];
  },
  make: (context) => {
    const { figures, near, values } = context;
    const level = Math.min(figures.length, near(values.joinAt!));
    const { piece, steps } = downTo(context, level);
    const sleeve = pattern(
      {
        ...piece,
        notches: [
          ...piece.notches,
          { id: "footCentre", edge: "foot", at: edgeSize(piece, "foot") / 2, count: 1 },
        ],
      },
      "sleeve",
      "Sleeve",
    );
    const seam = edgeSize(sleeve, "foot");
    const depth = near(values.depth!);
    const radius = near(ringRadius(depth, values.fullness!));
    if (radius < LEAST_RADIUS - 1e-9) return tooTight({ fullness: values.fullness!, depth, radius });
    const parts = partsFor(context, { radius, depth, seam });
    if (parts === undefined)
      return impossible(
        "depth",
        "ring-too-wide",
        say`A flounce ${depth} deep does not fit on cloth ${values.clothWidth!} wide.`,
        say`Make it less deep, or take wider cloth.`,
      );
    const ring: Ring = { radius, depth, angle: ringAngle(seam, radius) / parts };
    const flounce = pattern(ringPiece(ring), "flounce", "Flounce", {
      cut: { count: 2 * parts, mirrored: false },
      allowances: { outer: NARROW_HEM },
    });
    return {
      ok: true,
      value: {
        pieces: [sleeve, flounce],
        gathers: [],
        seams: flounceSeams(context, sleeve, flounce, parts),
        checks: [
          ...closedRound(context, {
            words: "the seam of the flounce",
            round: seam,
            level,
            figure: "joinAt",
          }),
          sweep(flounce, parts),
        ],
        steps: [...steps, ...flounceSteps(context, sleeve, flounce, { ring, parts, seam })],
      },
    };
  },
};

interface Tight {
  readonly fullness: number;
  readonly depth: number;
  readonly radius: number;
}

function tooTight({ fullness, depth, radius }: Tight): StyleResult {
  // Down to a tenth, so that what is typed from the message will do.
  const most = Math.floor((1 + depth / LEAST_RADIUS) * 10) / 10;
  const deep = LEAST_RADIUS * (fullness - 1);
  return impossible(
    "fullness",
    "ring-too-tight",
    say`Its inner edge would be an arc of only ${radius} about its centre, too tight to sew.`,
    most >= 1.1
      ? say`Make the fullness ${`${most}`} or less, or the flounce ${deep} deep or more.`
      : say`Make the flounce ${deep} deep or more.`,
  );
}

/** How many rings: none may close on itself, and each must lie on the cloth. */
function partsFor(
  { values }: StyleContext,
  { radius, depth, seam }: { radius: number; depth: number; seam: number },
): number | undefined {
  const angle = ringAngle(seam, radius);
  for (let parts = ringParts(angle, radius); parts <= MOST_RINGS; parts++) {
    const { edges } = ringPiece({ radius, depth, angle: angle / parts });
    const { min, max } = bounds(edges.flatMap(({ curves }) => [...curves]));
    if (Math.min(max.x - min.x, max.y - min.y) + BESIDE <= values.clothWidth!) return parts;
  }
  return undefined;
}

function flounceSeams(
  context: StyleContext,
  sleeve: PatternPiece,
  flounce: PatternPiece,
  parts: number,
): WalkedSeam[] {
  return [
    ...headSeam(context),
    underarmWalk(sleeve, "underarm", "the sleeve"),
    walk({
      id: "flounce",
      sides: [
        {
          words: parts === 1 ? "the inner edge of the flounce" : "the inner edges of the flounce together",
          measured: parts * edgeSize(flounce, "inner"),
        },
        { words: "the lower edge of the sleeve", measured: edgeOf(sleeve, "foot") },
      ],
      joining: { how: "equal" },
    }),
    walk({
      id: "flounce-ends",
      sides: [
        { words: "one end of the flounce", measured: edgeOf(flounce, "endLeft") },
        { words: "the other", measured: edgeOf(flounce, "endRight") },
      ],
      joining: { how: "equal" },
    }),
  ];
}

/** What comes out, for her to know: no bounds are broken by it. */
function sweep(flounce: PatternPiece, parts: number): StyleCheck {
  const value = parts * chainLength(edgeOf(flounce, "outer").curves);
  return {
    id: "sweep",
    verdict: "good",
    figure: "fullness",
    value,
    phrase: say`The lower edge of the flounce measures ${value} all round.`,
    remedy: say`Nothing to change.`,
    source: "geometry: outer edge = (radius + depth) x angle",
    mark: "exact",
  };
}

interface Drawn {
  readonly ring: Ring;
  readonly parts: number;
  readonly seam: number;
}

function flounceSteps(
  context: StyleContext,
  sleeve: PatternPiece,
  flounce: PatternPiece,
  { ring: { radius, depth }, parts, seam }: Drawn,
): StyleStep[] {
  const sheet = { ...EMPTY, sheet: 1 };
  const [inner, end, outer] = ["inner", "endRight", "outer"].map((name) => edgeOf(flounce, name).curves);
  const centre = { x: 0, y: 0 };
  return [
    work(
      "cut",
      say`Cut the sleeve out along its lower edge, mark the middle of that edge, and add the seam allowances. Cut it twice in cloth, the second mirrored.`,
      outlined(sleeve),
    ),
    {
      stage: "draw",
      act: { act: "ring", piece: "flounce", part: "inner" },
      distance: radius,
      phrase: say`On fresh paper make a point. With a string or a compass, draw an arc ${radius} from it: the inner edge of the flounce. Draw a straight line out from the point across it: the first end.`,
      scene: {
        ...sheet,
        fresh: [{ weight: "cut", curves: [...inner!] }],
        measured: [{ from: centre, to: inner![0]![0] }],
        points: [{ ...centre, words: "point" }],
      },
    },
    {
      stage: "draw",
      act: { act: "ring", piece: "flounce", part: "outer" },
      distance: depth,
      phrase: say`Draw a second arc about the same point, everywhere ${depth} outside the first: the outer edge.`,
      scene: {
        ...sheet,
        fresh: [{ weight: "cut", curves: [...outer!] }],
        measured: [{ from: inner![0]![0], to: outer!.at(-1)![3] }],
      },
    },
    {
      stage: "draw",
      act: { act: "ring", piece: "flounce", part: "end" },
      distance: seam / parts,
      phrase:
        parts === 1
          ? say`With the tape on its edge, measure ${seam} along the inner arc from the first end: as much as the lower edge of the sleeve. There draw the second end, in line with the point.`
          : say`With the tape on its edge, measure ${seam / parts} along the inner arc from the first end: one of ${`${parts}`} equal parts of the lower edge of the sleeve, which is ${seam}. There draw the second end, in line with the point.`,
      scene: { ...sheet, fresh: [{ weight: "cut", curves: [...end!] }] },
    },
    {
      stage: "cut",
      act: { act: "allow", edge: "outer" },
      distance: NARROW_HEM,
      phrase:
        parts === 1
          ? say`Add ${NARROW_HEM} outside the outer arc, for a narrow hem, and the seam allowances to the other edges. Cut the flounce twice in cloth.`
          : say`Add ${NARROW_HEM} outside the outer arc, for a narrow hem, and the seam allowances to the other edges. Cut it ${`${2 * parts}`} times in cloth: ${`${parts}`} for each sleeve.`,
      scene: outlined(flounce, 1),
    },
    ...joinSteps([
      say`Close the underarm seam of each sleeve.`,
      parts === 1
        ? say`Sew the two ends of each flounce together.`
        : say`For each sleeve, sew ${`${parts}`} parts of the flounce together end to end, and close the round.`,
      say`Let the flounce hang overnight, level its edge if the cloth has stretched, and sew the narrow hem.`,
      say`Sew a line of short stitches just inside the seam line of the inner edge, and clip the allowance to it, so that the edge opens out straight.`,
      parts % 2 === 1
        ? say`Sew the flounce to the lower edge of the sleeve, right sides together: a join to the underarm seam, the middle opposite to the middle of the sleeve.`
        : say`Sew the flounce to the lower edge of the sleeve, right sides together: one join to the underarm seam, the join opposite to the middle of the sleeve.`,
      ...setIn(context),
    ]),
  ];
}
