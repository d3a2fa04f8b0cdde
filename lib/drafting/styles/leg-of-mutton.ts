/**
 * Leg-of-mutton in one piece: the upper sleeve cut into panels that rise in an arch over the lower, hinged at both underarm
 * seams, so that everything below the level where the fullness starts stays as it was drafted.
 */
import { cutAcross } from "@/lib/drafting/cut-across";
import { INCH } from "@/lib/drafting/guide";
import { chainLength, distance, line, pointAt } from "@/lib/drafting/measure";
import { edgeOf, endOf, startOf, stretchOf } from "@/lib/drafting/outline";
import { type Gather, type StyleStep } from "@/lib/drafting/pattern";
import { afterwards, moveBy, movePoint, type Rigid, turnAbout } from "@/lib/drafting/rigid";
import { say } from "@/lib/drafting/say";
import { panelMotions } from "@/lib/drafting/slash";
import { findRoot } from "@/lib/drafting/solve";
import {
  impossible,
  type StyleContext,
  type StyleFigure,
  type StyleRecipe,
} from "@/lib/drafting/styles/context";
import {
  edgeSize,
  gatherCheck,
  gatherOf,
  headGoal,
  headPlaces,
  pattern,
  underarmWalk,
} from "@/lib/drafting/styles/parts";
import {
  movedSpread,
  slashLines,
  type SpreadAsk,
  type SpreadPiece,
  spreadPiece,
  turnOf,
  withHead,
} from "@/lib/drafting/styles/spread-piece";
import {
  edgeSteps,
  gatherSteps,
  joinSteps,
  panelLines,
  slashSteps,
} from "@/lib/drafting/styles/spread-steps";
import { count, headWalk, WIDEST_TURN } from "@/lib/drafting/styles/statement";
import { type CubicBezier, type Edge, type Piece, type Point } from "@/lib/drafting/types";

/** A grown sleeve of this biceps line takes the published figures whole; a smaller one less in proportion. */
const GROWN = 340;

/** How far above and below the hinge the underarm seam is drawn anew, so that it runs on without a corner: of the biceps line. */
const SMOOTHED = 1 / 9;

export const legOfMutton: StyleRecipe = {
  id: "leg-of-mutton",
  name: "Leg-of-mutton",
  look: "Full and high at the shoulder, running down into a close lower arm, all in one piece.",
  figures: ({ figures: { biceps, capDepth, length } }): StyleFigure[] => {
    const scale = Math.min(1, biceps / GROWN);
    const lowest = length - 10;
    const highest = capDepth + 15;
    return [
      {
        key: "fullDown",
        label: "Fullness starts below the crown",
        said: "the level where the fullness starts",
        does: "Lower down, the sleeve narrows more gradually.",
        kind: "length",
        // Published for a grown sleeve: about 25 cm below the crown.
        usual: Math.min(lowest, Math.max(highest, 250 * scale)),
        low: highest,
        high: Math.max(highest, lowest),
      },
      count("slashes", 5),
      {
        key: "headOpen",
        label: "Opening at the head",
        said: "the opening of each slash at the head",
        does: "Wider, the head is fuller.",
        kind: "length",
        // Published: five cuts of 5 cm.
        usual: 50 * scale,
        low: 0,
        high: 4 * INCH,
      },
      {
        key: "raise",
        label: "Raise the crown",
        said: "the raise of the crown",
        does: "Higher, the head stands up from the shoulder before it falls.",
        kind: "length",
        // Published: the crown raised by 6 cm.
        usual: 60 * scale,
        low: 0,
        high: 6 * INCH,
      },
    ];
  },
  make: (context) => {
    const { block, cloth, figures, near, values } = context;
    const level = near(values.fullDown!);
    if (level < figures.capDepth + 5 || level > figures.length - 5)
      return impossible(
        "fullDown",
        "full-down",
        say`The fullness would start ${level} below the crown; the cap is ${figures.capDepth} deep and the sleeve ${figures.length} long.`,
        say`Let it start between ${figures.capDepth + 15} and ${figures.length - 10} below the crown, or make the sleeve longer.`,
      );
    const parts = cutAcross(withHead(block.piece), level);
    const ask = arched({
      piece: parts.upper,
      ...headPlaces(context),
      slashes: values.slashes!,
      headOpen: near(values.headOpen!),
      footOpen: 0,
      raise: values.raise!,
      drop: 0,
      near,
    });
    const turn = turnOf(ask);
    if (turn > WIDEST_TURN)
      return impossible(
        "headOpen",
        "turned-in",
        say`Opened by ${ask.headOpen} at the head, the ${ask.slashes} panels turn so far that the underarm seams come out level.`,
        say`Open them less, slash fewer times, or let the fullness start lower down.`,
      );
    const full = overLower(spreadPiece(ask), parts.lower);
    const piece = pattern(whole(full, parts.lower, figures.biceps * SMOOTHED), "sleeve", "Sleeve", {
      panels: full.spread.panels,
    });
    const goal = headGoal(context);
    const head = gatherOf(
      "head",
      ["sleeve", "head"],
      "the head from notch to notch",
      full.lengths.head,
      goal,
    );
    return {
      ok: true,
      value: {
        pieces: [piece],
        gathers: [head],
        seams: [headWalk(full, goal, context), underarmWalk(piece, "underarm", "the sleeve")],
        checks: [gatherCheck(head, cloth, "headOpen")],
        steps: legSteps(context, { ask, full, piece, lower: parts.lower, level, head }),
      },
    };
  },
};

/** The opening at the feet for which the arch of panels still reaches from underarm to underarm. */
function arched(ask: SpreadAsk): SpreadAsk {
  if (ask.headOpen === 0) return ask;
  const lines = slashLines(ask);
  const foot = edgeOf(ask.piece, "foot").curves;
  const [back, front] = [startOf(foot), endOf(foot)];
  const wanted = distance(front, back);
  const miss = (footOpen: number) => {
    if (turnOf({ ...ask, footOpen }, lines) > 2 * WIDEST_TURN) return -wanted;
    const motions = panelMotions(
      lines,
      lines.map(() => ({ head: ask.headOpen, foot: footOpen })),
    );
    return distance(movePoint(front, motions[0]!), movePoint(back, motions.at(-1)!)) - wanted;
  };
  return { ...ask, footOpen: findRoot(miss, 0, ask.headOpen, 1e-10) };
}

/** The arch set down on the lower part, end on end. */
function overLower(full: SpreadPiece, lower: Piece): SpreadPiece {
  const foot = edgeOf(full.piece, "foot").curves;
  const top = edgeOf(lower, "top").curves;
  return movedSpread(full, onto([endOf(foot), startOf(foot)], [startOf(top), endOf(top)]));
}

/** The rigid motion that lays the first of `from` on the first of `to`, and the second in its direction. */
function onto([a, b]: readonly [Point, Point], [c, d]: readonly [Point, Point]): Rigid {
  const turn = Math.atan2(d.y - c.y, d.x - c.x) - Math.atan2(b.y - a.y, b.x - a.x);
  return afterwards(turnAbout(a, turn), moveBy(c.x - a.x, c.y - a.y));
}

function whole(full: SpreadPiece, lower: Piece, wanted: number): Piece {
  const upper = full.piece;
  const reach = Math.min(
    wanted,
    0.6 * edgeSize(upper, "underarmFront"),
    0.6 * edgeSize(lower, "underarmFront"),
  );
  const front = smoothed(edgeOf(lower, "underarmFront"), edgeOf(upper, "underarmFront"), reach);
  const edges: Edge[] = [
    edgeOf(upper, "head"),
    {
      name: "underarmBack",
      curves: asLong(edgeOf(upper, "underarmBack"), edgeOf(lower, "underarmBack"), reach, chainLength(front)),
    },
    edgeOf(lower, "foot"),
    { name: "underarmFront", curves: front },
  ];
  const crown = upper.notches.find(({ id }) => id === "crown")!;
  const top = pointAt(edges[0]!.curves, crown.at).point;
  const { to } = lower.grain;
  return {
    name: "sleeve",
    edges,
    notches: upper.notches.filter(({ edge }) => edge === "head"),
    grain: { from: { x: 0, y: top.y + (to.y - top.y) / 20 }, to },
  };
}

/**
 * The back underarm, drawn to the length of the front: where the two halves of the cap differ a little the hinges turn by
 * a little more on one side, and the curve past the hinge takes that up.
 */
function asLong(first: Edge, second: Edge, reach: number, length: number): CubicBezier[] {
  const miss = (by: number) => chainLength(smoothed(first, second, by)) - length;
  const [least, most] = [reach * 0.3, reach * 1.5];
  if (miss(least) * miss(most) >= 0) return smoothed(first, second, reach);
  return smoothed(first, second, findRoot(miss, least, most, 1e-6));
}

/** Two edges end to end, the corner between them drawn over by one curve. */
function smoothed(first: Edge, second: Edge, reach: number): CubicBezier[] {
  const before = chainLength(first.curves);
  const head = stretchOf(first, 0, before - reach);
  const tail = stretchOf(second, reach, Infinity);
  const [a, b] = [pointAt(first.curves, before - reach), pointAt(second.curves, reach)];
  // Handles of two thirds of the way to the corner: the parabola that touches both sides.
  const curve: CubicBezier = [
    a.point,
    along(a.point, a.direction, (2 / 3) * reach),
    along(b.point, b.direction, (-2 / 3) * reach),
    b.point,
  ];
  return [...head, curve, ...tail];
}

function along(point: Point, direction: Point, by: number): Point {
  return { x: point.x + direction.x * by, y: point.y + direction.y * by };
}

interface Drawn {
  readonly ask: SpreadAsk;
  readonly full: SpreadPiece;
  readonly piece: Piece;
  readonly lower: Piece;
  readonly level: number;
  readonly head: Gather;
}

function legSteps({ block }: StyleContext, { ask, full, piece, lower, level, head }: Drawn): StyleStep[] {
  const top = edgeOf(lower, "top").curves;
  const low = { weight: "guide" as const, curves: lower.edges.flatMap((edge) => [...edge.curves]) };
  const sheet = { sheet: 1, measured: [], points: [] };
  const outline = { weight: "cut" as const, curves: piece.edges.flatMap((edge) => [...edge.curves]) };
  return [
    {
      stage: "draw",
      act: { act: "across" },
      distance: level,
      phrase: say`From the crown, measure ${level} down the centre line. There, square across to both underarm seams: the fullness starts at this line.`,
      scene: {
        sheet: 0,
        fresh: [{ weight: "guide", curves: [line(startOf(top), endOf(top))] }],
        measured: [{ from: block.points.crown!, to: { x: 0, y: level } }],
        points: [],
      },
    },
    ...slashSteps(ask, full),
    {
      stage: "cut",
      act: { act: "work" },
      phrase: say`Cut the sleeve out of the paper. Cut each slash from the head down to the line, then along the line from the middle outwards, and stop ${INCH / 4} before each underarm seam: the two uncut bridges are hinges. Number the panels from the front.`,
      scene: { sheet: 0, fresh: [], measured: [], points: [] },
    },
    {
      stage: "draw",
      act: { act: "open", end: "head", slashes: full.spread.lips.map((_, i) => i) },
      distance: ask.headOpen,
      phrase: say`Tape the lower part to fresh paper. Let the panels rise over it in an even arch from hinge to hinge, and open each slash ${ask.headOpen} at the head. Tape them down.`,
      scene: {
        ...sheet,
        fresh: [low, ...panelLines(full)],
        measured: full.spread.lips.map(({ head }) => ({ from: head.before, to: head.after })),
      },
    },
    ...edgeSteps(full, "head"),
    {
      stage: "draw",
      act: { act: "work" },
      phrase: say`Draw the underarm seams with the curve past the hinges, so that they run on without a corner.`,
      scene: {
        ...sheet,
        fresh: [
          {
            ...outline,
            curves: [...edgeOf(piece, "underarmFront").curves, ...edgeOf(piece, "underarmBack").curves],
          },
        ],
      },
    },
    {
      stage: "draw",
      act: { act: "work" },
      phrase: say`Mark the notches where they were, one in front and two behind, and the crown on the new head. The grain is the centre line of the lower part.`,
      scene: { ...sheet, fresh: [outline] },
    },
    {
      stage: "cut",
      act: { act: "work" },
      phrase: say`Trace the sleeve on to fresh paper and add the seam allowances. Cut it twice in cloth, the second mirrored.`,
      scene: { ...sheet, fresh: [outline] },
    },
    ...gatherSteps([head]),
    ...joinSteps([
      say`Close the underarm seam from the armhole to the hem.`,
      say`Set the sleeve into the armhole: underarm to underarm, notches to notches, crown to the shoulder seam; below the notches it goes in flat.`,
    ]),
  ];
}
