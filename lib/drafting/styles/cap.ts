/** The cap sleeve: only the cap, down to a curve between two points of the armhole; nothing goes round under the arm. */
import { bowCurve } from "@/lib/drafting/fair";
import { INCH } from "@/lib/drafting/guide";
import { chainLength, pointAt, reversed } from "@/lib/drafting/measure";
import { edgeOf, startOf, stretchOf } from "@/lib/drafting/outline";
import { type PatternPiece, type StyleResult, type StyleStep } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { walk, type WalkedSeam } from "@/lib/drafting/seams";
import {
  impossible,
  settled,
  type StyleContext,
  type StyleFigure,
  type StyleGround,
  type StyleRecipe,
} from "@/lib/drafting/styles/context";
import { headPlaces, pattern } from "@/lib/drafting/styles/parts";
import { EMPTY, headed, outlined, work } from "@/lib/drafting/styles/plain-sleeve";
import { joinSteps } from "@/lib/drafting/styles/spread-steps";
import { type Point } from "@/lib/drafting/types";

/** The lower edge falls by no more than this against the level, from either end to the centre: further, it would bulge. */
const STEEPEST = Math.tan((35 * Math.PI) / 180);
/** By so much where nothing else is wanted: an edge that lies flat round the arm. */
const USUAL_FALL = Math.tan((7 * Math.PI) / 180);
/** A depth read off a message in eighths of an inch is taken, though it was rounded. */
const SLACK = INCH / 16;

export const cap: StyleRecipe = {
  id: "cap",
  name: "Cap",
  look: "A small sleeve that lies on the shoulder, with nothing under the arm.",
  // It goes round no part of the arm.
  replaces: ["biceps-ease", "elbow", "hem-wrist", "hem-hand", "hem-arm", "underarms"],
  figures: (ground, typed): StyleFigure[] => {
    const { block, figures } = ground;
    const most = 0.8 * Math.min(block.lengths.capFront, block.lengths.capBack);
    // A little below the notches, so that they show which end is which.
    const usual = Math.max(10, Math.min(most, (figures.notches.front * 5) / 6));
    const ends: StyleFigure = {
      key: "ends",
      label: "Ends above the underarm",
      said: "the distance of its ends from the underarm",
      does: "Further up, the sleeve is shorter and more of the armhole stays free.",
      kind: "length",
      usual,
      low: 10,
      high: most,
    };
    const [front, back] = endPoints(ground, settled(ends, typed));
    return [
      ends,
      {
        key: "depth",
        label: "Depth at the centre",
        said: "the depth at the centre",
        does: "Deeper, the sleeve covers more of the shoulder and its edge is rounder.",
        kind: "length",
        usual: Math.max(15, Math.max(front.y, back.y) + USUAL_FALL * Math.min(-front.x, back.x)),
        low: 15,
        high: figures.length,
      },
    ];
  },
  make: (context) => {
    const { near, values } = context;
    const [ends, depth] = [near(values.ends!), near(values.depth!)];
    const stopped = outOfReach(context, ends, depth);
    if (stopped) return stopped;
    const piece = capPiece(context, ends, depth);
    return {
      ok: true,
      value: {
        pieces: [piece],
        gathers: [],
        seams: capSeams(context, piece, ends),
        checks: [],
        steps: capSteps(context, piece, { ends, depth }),
      },
    };
  },
};

function endPoints(ground: StyleGround, ends: number): [Point, Point] {
  const head = edgeOf(headed(ground), "head").curves;
  return [pointAt(head, ends).point, pointAt(head, headPlaces(ground).end - ends).point];
}

function outOfReach(ground: StyleGround, ends: number, depth: number): StyleResult | undefined {
  const [front, back] = endPoints(ground, ends);
  const least = Math.max(front.y, back.y);
  const most = Math.min(front.y - front.x * STEEPEST, back.y + back.x * STEEPEST);
  if (depth < least - SLACK)
    return impossible(
      "depth",
      "edge-hollow",
      say`The ends lie ${least} below the crown, and the sleeve would be only ${depth} deep at the centre: its edge would be hollow.`,
      say`Make it ${least} deep or more, or set its ends further from the underarm.`,
    );
  if (depth > most + SLACK)
    return impossible(
      "depth",
      "edge-bulges",
      say`The sleeve would be ${depth} deep at the centre, and its ends lie only ${Math.min(front.y, back.y)} below the crown: its edge would bulge out past them.`,
      say`Make it ${most} deep or less, or set its ends nearer the underarm.`,
    );
  return undefined;
}

function capPiece(ground: StyleGround, ends: number, depth: number): PatternPiece {
  const whole = headed(ground);
  const { end } = headPlaces(ground);
  const head = stretchOf(edgeOf(whole, "head"), ends, end - ends);
  const centre = { x: 0, y: depth };
  const [, back] = endPoints(ground, ends);
  const size = chainLength(head);
  return pattern(
    {
      name: "cap",
      edges: [
        { name: "head", curves: head },
        {
          name: "foot",
          // Each half bends evenly, and the two run level into each other.
          curves: [
            ...bowCurve([back, centre], undefined, { x: -1, y: 0 }),
            ...reversed(bowCurve([startOf(head), centre], undefined, { x: 1, y: 0 })),
          ],
        },
      ],
      // A notch that is cut off, or lies at the very end, is gone.
      notches: whole.notches
        .map((notch) => ({ ...notch, at: notch.at - ends }))
        .filter(({ at }) => at > 5 && at < size - 5),
      grain: { from: { x: 0, y: depth / 6 }, to: { x: 0, y: (depth * 5) / 6 } },
    },
    "cap",
    "Cap sleeve",
    // Each is faced with another like it: the lower edge is a curve, and cannot be laid on the fold.
    { cut: { count: 4, mirrored: true } },
  );
}

function capSeams(ground: StyleGround, piece: PatternPiece, ends: number): WalkedSeam[] {
  const { armhole } = ground.ask;
  if (!armhole) return [];
  return [
    walk({
      id: "head",
      sides: [
        { words: "the head from end to end", measured: edgeOf(piece, "head") },
        { words: "the armhole between them", measured: armhole.front + armhole.back - 2 * ends },
      ],
      joining: { how: "eased" },
    }),
  ];
}

function capSteps(
  context: StyleContext,
  piece: PatternPiece,
  { ends, depth }: { ends: number; depth: number },
): StyleStep[] {
  const [front, back] = endPoints(context, ends);
  const centre = { x: 0, y: depth };
  const foot = edgeOf(piece, "foot").curves;
  const { armhole } = context.ask;
  const ease = armhole
    ? chainLength(edgeOf(piece, "head").curves) - (armhole.front + armhole.back - 2 * ends)
    : 0;
  return [
    {
      stage: "draw",
      act: { act: "seam-marks", from: "underarm" },
      distance: ends,
      phrase: say`With the tape on its edge, measure ${ends} along the cap seam from each underarm point, and mark there the two ends of the sleeve.`,
      scene: { ...EMPTY, points: [front, back].map((point) => ({ ...point, words: "end" })) },
    },
    {
      stage: "draw",
      act: { act: "centre-mark" },
      distance: depth,
      phrase: say`From the crown, measure ${depth} down the centre line, and make a mark.`,
      scene: {
        ...EMPTY,
        measured: [{ from: { x: 0, y: 0 }, to: centre }],
        points: [{ ...centre, words: "centre" }],
      },
    },
    {
      stage: "draw",
      act: {
        act: "curve",
        edge: "foot",
        through: [{ named: "seamBack" }, { named: "centre" }, { named: "seamFront" }],
      },
      phrase: say`Draw the lower edge with the curve, an even bow from end to end through that mark, level where it crosses the centre line.`,
      scene: { ...EMPTY, fresh: [{ weight: "cut", curves: foot }] },
    },
    work(
      "cut",
      say`Trace the cap on to fresh paper, with the crown, the notches that lie on it and the grain. Write “front” at its front end, and add the seam allowances. Cut it four times in cloth, two of them mirrored: two sleeves, and a facing for each.`,
      outlined(piece, 1),
    ),
    ...joinSteps([
      say`Lay each sleeve on its facing, right sides together, and sew the lower edge. Trim the seam, clip it, turn right side out and press. From here on the two are one.`,
      say`On the armhole, measure ${ends} up from the underarm at the front and at the back, and make marks: the ends of the sleeve come there.`,
      ease > 1
        ? say`Sew one row of long stitches along the head, and ease in the ${ease} with it.`
        : say`Sew one row of long stitches along the head, to ease it by.`,
      piece.notches.length > 1
        ? say`Set the sleeve into the armhole: ends to the marks, notches to notches, crown to the shoulder seam.`
        : say`Set the sleeve into the armhole: ends to the marks, front to front, crown to the shoulder seam.`,
      say`Face or bind the whole armhole, under the arm too where there is no sleeve.`,
    ]),
  ];
}
