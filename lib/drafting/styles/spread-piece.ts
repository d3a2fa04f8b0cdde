/**
 * The heart of every full style: a piece slashed from its head to its foot, opened, and both edges drawn anew. What lies
 * between the underarm points and the notches is only moved, never redrawn: it goes into the armhole as before.
 */
import { levelOn } from "@/lib/drafting/cut-across";
import { fairCurve } from "@/lib/drafting/fair";
import { chainLength, curveLength, distance, pointAt } from "@/lib/drafting/measure";
import { edgeOf, endOf, moveEdges, movePiece, startOf, stretchOf, withEdge } from "@/lib/drafting/outline";
import { type MarkPoint } from "@/lib/drafting/pattern";
import { angleOf, moveCurves, movePoint, type Rigid, afterwards } from "@/lib/drafting/rigid";
import {
  type Laid,
  layPanels,
  midpoint,
  type Slash,
  slashAndSpread,
  type SlashLine,
  slashTurn,
  type Spread,
} from "@/lib/drafting/slash";
import { type CubicBezier, type Edge, type Notch, type Piece, type Point } from "@/lib/drafting/types";

export interface SpreadAsk {
  /** Edges "head" (front underarm point to back), "underarmBack", "foot" (a straight line), "underarmFront". */
  readonly piece: Piece;
  /** Along the head: front notch, crown, back notch, mm. */
  readonly notchFront: number;
  readonly crown: number;
  readonly notchBack: number;
  readonly slashes: number;
  readonly headOpen: number;
  readonly footOpen: number;
  /** How far the crown is raised, and the middle of the foot lowered. */
  readonly raise: number;
  readonly drop: number;
  /** By how much more the foot is lowered in the middle of the back than in the middle of the front. Default 0. */
  readonly backDrop?: number;
  /** Edges that leave the underarm seams square, so that no point stands where these are closed. Default none. */
  readonly squared?: readonly ("head" | "foot")[];
  near(mm: number): number;
}

/** A pair of slashes alike on both sides, or the one on the centre line; all distances as the hand sets them out. */
export interface SlashMarks {
  /** Indices from 0 at the front; one for the centre. */
  readonly slashes: readonly number[];
  /** Along the cap seam from the crown, front and back alike. */
  readonly head: number;
  /** Along the foot from its centre. */
  readonly foot: number;
}

/** A mark set off the middle of a panel, or off the middle of the centre slash. */
export interface SetMark {
  readonly from: MarkPoint;
  /** Where that is on the sheet. */
  readonly at: Point;
  /** mm up at the head, down at the foot. */
  readonly by: number;
}

export interface SpreadPiece {
  readonly piece: Piece;
  readonly spread: Spread;
  /** From the outermost pair inwards. */
  readonly marks: readonly SlashMarks[];
  /** What the new edges run through, in the direction of each edge; the notches and the ends of the foot are not set. */
  readonly headSet: readonly SetMark[];
  readonly footSet: readonly SetMark[];
  /** Head between the notches and the whole foot, before and after, mm. */
  readonly lengths: {
    readonly headBefore: number;
    readonly head: number;
    readonly footBefore: number;
    readonly foot: number;
  };
  /** All panels together have turned by so much, radians. */
  readonly turn: number;
}

/** The crown and the middle of the foot rise and fall by a whole wave that is level at both ends: sin² of the way in. */
function swell(way: number): number {
  return Math.sin((Math.PI / 2) * way) ** 2;
}

/** The slash lines of an ask, before anything is opened. */
export function slashLines(ask: SpreadAsk): SlashLine[] {
  return setOut(ask).cuts.map(({ headPoint, footPoint }) => ({ head: headPoint, foot: footPoint }));
}

/** Total turn of the panels, radians, before anything is cut; infinite where a slash would be opened past its length. */
export function turnOf(ask: SpreadAsk, lines: readonly SlashLine[] = slashLines(ask)): number {
  try {
    return lines.reduce(
      (sum, { head, foot }) => sum + Math.abs(slashTurn(distance(head, foot), ask.headOpen, ask.footOpen)),
      0,
    );
  } catch {
    return Infinity;
  }
}

interface Cut {
  readonly slash: Slash;
  readonly headPoint: Point;
  readonly footPoint: Point;
}

/** Where the slashes go: the head divided evenly from notch to crown to notch, the foot evenly from end to end. */
function setOut(ask: SpreadAsk): { cuts: Cut[]; marks: SlashMarks[] } {
  const { piece, near, slashes: count } = ask;
  const head = edgeOf(piece, "head").curves;
  const foot = edgeOf(piece, "foot").curves;
  const reach = Math.min(ask.crown - ask.notchFront, ask.notchBack - ask.crown);
  const footLength = chainLength(foot);
  const cuts: Cut[] = new Array<Cut>(count);
  const marks: SlashMarks[] = [];
  for (let i = 0; i < Math.ceil(count / 2); i++) {
    const out = 1 - (2 * (i + 1)) / (count + 1);
    const alongHead = near(out * reach);
    const alongFoot = near((out * footLength) / 2);
    const pair = out === 0 ? [i] : [i, count - 1 - i];
    marks.push({ slashes: pair, head: alongHead, foot: alongFoot });
    for (const [n, index] of pair.entries()) {
      const way = n === 0 ? -1 : 1;
      const from = { edge: "head", at: ask.crown + way * alongHead };
      // The foot runs from the back to the front.
      const to = { edge: "foot", at: footLength / 2 - way * alongFoot };
      cuts[index] = {
        slash: { from, to, head: ask.headOpen, foot: ask.footOpen },
        headPoint: pointAt(head, from.at).point,
        footPoint: pointAt(foot, to.at).point,
      };
    }
  }
  return { cuts, marks };
}

/** Both edges drawn anew, without the outlines of the panels: what is asked again and again while a length is looked for. */
function drawAnew(ask: SpreadAsk) {
  const { cuts, marks } = setOut(ask);
  const laid = layPanels(
    cuts.map(({ headPoint, footPoint }) => ({ head: headPoint, foot: footPoint })),
    cuts.map(({ slash }) => slash),
  );
  const head = newHead(ask, cuts, laid);
  const foot = newFoot(ask, cuts, laid);
  const total = chainLength(head.curves);
  const tail = chainLength(edgeOf(ask.piece, "head").curves) - ask.notchBack;
  const lengths = {
    headBefore: ask.notchBack - ask.notchFront,
    head: total - tail - ask.notchFront,
    footBefore: chainLength(edgeOf(ask.piece, "foot").curves),
    foot: chainLength(foot.curves),
  };
  return { cuts, marks, laid, head, foot, lengths, notchBack: total - tail };
}

/** What `spreadPiece` would measure, sooner. @throws as it does. */
export function spreadLengths(ask: SpreadAsk): SpreadPiece["lengths"] {
  return drawAnew(ask).lengths;
}

/** @throws RangeError where a slash is opened wider than twice its length; ask `turnOf` before. */
export function spreadPiece(ask: SpreadAsk): SpreadPiece {
  const { cuts, foot, head, lengths, marks, notchBack } = drawAnew(ask);
  const spread = slashAndSpread(
    ask.piece,
    cuts.map(({ slash }) => slash),
  );
  const whole = withEdge(withEdge(spread.piece, "head", head.curves), "foot", foot.curves);
  const notches: Notch[] = [
    { id: "front", edge: "head", at: ask.notchFront, count: 1 },
    { id: "crown", edge: "head", at: head.crown, count: 1 },
    { id: "back", edge: "head", at: notchBack, count: 2 },
    { id: "footCentre", edge: "foot", at: foot.centre, count: 1 },
  ];
  return {
    piece: { ...whole, notches },
    spread,
    marks,
    headSet: head.set,
    footSet: foot.set,
    lengths,
    turn: spread.motions.reduce(
      (sum, motion, i) => sum + (i === 0 ? 0 : Math.abs(angleOf(motion) - angleOf(spread.motions[i - 1]!))),
      0,
    ),
  };
}

/**
 * Points a new edge runs through: the middle of every panel between two slashes, and the middle of an opened slash on the
 * centre line; on one or two slashes the outer panels too. Not the corners of the panels: they stand in steps where the
 * seam is steep, and a hand draws through the midst of them. Each is set off by its share of `most`.
 */
function edgePoints(
  ask: SpreadAsk,
  cuts: readonly Cut[],
  { lips, motions }: Laid,
  end: "head" | "foot",
): SetMark[] {
  const count = cuts.length;
  const { curves } = edgeOf(ask.piece, end);
  const most = end === "head" ? ask.raise : ask.drop;
  const place = (i: number) => (end === "head" ? cuts[i]!.slash.from.at : cuts[i]!.slash.to.at);
  const [first, last] = end === "head" ? [ask.notchFront, ask.notchBack] : [chainLength(curves), 0];
  const points: SetMark[] = [];
  for (let panel = 0; panel <= count; panel++) {
    const outer = panel === 0 || panel === count;
    if (!outer || count <= 2) {
      const before = panel === 0 ? first : place(panel - 1);
      const after = panel === count ? last : place(panel);
      const side = (2 * panel + 1) / (count + 1) - 1;
      points.push({
        from: { panel, end },
        by: ask.near(most * swell(1 - Math.abs(side)) + (end === "foot" ? moreAtBack(ask, side) : 0)),
        at: movePoint(pointAt(curves, (before + after) / 2).point, motions[panel]!),
      });
    }
    const open = end === "head" ? ask.headOpen : ask.footOpen;
    if (panel === (count - 1) / 2 && open > 0)
      points.push({
        from: { named: end === "head" ? "crown" : "footCentre" },
        by: ask.near(most),
        at: midpoint(lips[panel]![end].before, lips[panel]![end].after),
      });
  }
  return points;
}

/** `side` runs from -1 at the front end to 1 at the back; from the middle of the front to that of the back it swells. */
function moreAtBack({ backDrop = 0 }: SpreadAsk, side: number): number {
  return backDrop * swell(side < 0.5 ? Math.max(0, side + 0.5) : 2 - 2 * side);
}

/** The head from notch to notch, raised; outside the notches the old seam, moved. */
function newHead(ask: SpreadAsk, cuts: readonly Cut[], laid: Laid) {
  const head = edgeOf(ask.piece, "head");
  const [front, back] = [laid.motions[0]!, laid.motions.at(-1)!];
  const first = moveCurves(stretchOf(head, 0, ask.notchFront), front);
  const last = moveCurves(stretchOf(head, ask.notchBack, Infinity), back);
  const set = edgePoints(ask, cuts, laid, "head");
  const [leaving, arriving] = ask.squared?.includes("head")
    ? [squareAfter(ask.piece, "underarmFront", front), squareBefore(ask.piece, "underarmBack", back)]
    : [heading(head.curves, ask.notchFront, front), heading(head.curves, ask.notchBack, back)];
  const curves = fairCurve(
    [
      first.length > 0 ? endOf(first) : movePoint(startOf(head.curves), front),
      ...set.map(({ at, by }) => ({ x: at.x, y: at.y - by })),
      last.length > 0 ? startOf(last) : movePoint(endOf(head.curves), back),
    ],
    leaving,
    arriving,
  );
  return { curves: [...first, ...curves, ...last], crown: chainLength(first) + middleOf(curves), set };
}

/** The foot from its back end to its front, lowered. */
function newFoot(ask: SpreadAsk, cuts: readonly Cut[], laid: Laid) {
  const foot = edgeOf(ask.piece, "foot").curves;
  const [front, back] = [laid.motions[0]!, laid.motions.at(-1)!];
  const set = edgePoints(ask, cuts, laid, "foot").reverse();
  const [leaving, arriving] = ask.squared?.includes("foot")
    ? [squareAfter(ask.piece, "underarmBack", back), squareBefore(ask.piece, "underarmFront", front)]
    : [heading(foot, 0, back), heading(foot, chainLength(foot), front)];
  const curves = fairCurve(
    [
      movePoint(startOf(foot), back),
      ...set.map(({ at, by }) => ({ x: at.x, y: at.y + by })),
      movePoint(endOf(foot), front),
    ],
    leaving,
    arriving,
  );
  return { curves, centre: middleOf(curves), set };
}

/** How the outline runs on square to a moved edge behind it, a quarter turn clockwise as seen. */
function squareAfter(piece: Piece, edge: string, motion: Rigid): Point {
  const { x, y } = heading(edgeOf(piece, edge).curves, Infinity, motion);
  return { x: -y, y: x };
}

/** How the outline comes square to a moved edge before it. */
function squareBefore(piece: Piece, edge: string, motion: Rigid): Point {
  const { x, y } = heading(edgeOf(piece, edge).curves, 0, motion);
  return { x: y, y: -x };
}

function heading(curves: readonly CubicBezier[], at: number, motion: Rigid): Point {
  const { direction } = pointAt(curves, at);
  return movePoint(direction, { ...motion, dx: 0, dy: 0 });
}

/** Where a chain crosses the centre line, mm along it; its middle where it does not. */
function middleOf(curves: readonly CubicBezier[]): number {
  const turned = curves.map((curve) => curve.map(({ x, y }) => ({ x: y, y: x })) as unknown as CubicBezier);
  return levelOn(turned, 0) ?? curves.reduce((sum, curve) => sum + curveLength(curve), 0) / 2;
}

/** The block with its cap seam as one edge "head", its hem as "foot": what `spreadPiece` asks for. */
export function withHead(piece: Piece): Piece {
  const front = edgeOf(piece, "capFront").curves;
  const back = edgeOf(piece, "capBack").curves;
  const named = (edge: Edge): Edge => (edge.name === "hem" ? { name: "foot", curves: edge.curves } : edge);
  return {
    ...piece,
    edges: [{ name: "head", curves: [...front, ...back] }, ...piece.edges.slice(2).map(named)],
    notches: [],
  };
}

/** The whole of it moved rigidly: outline, panels, lips and marks. */
export function movedSpread(full: SpreadPiece, motion: Rigid): SpreadPiece {
  const move = (point: Point) => movePoint(point, motion);
  const both = ({ before, after }: { before: Point; after: Point }) => ({
    before: move(before),
    after: move(after),
  });
  const { spread } = full;
  return {
    ...full,
    piece: movePiece(full.piece, motion),
    spread: {
      ...spread,
      piece: movePiece(spread.piece, motion),
      panels: spread.panels.map(({ edges }) => ({ edges: moveEdges(edges, motion) })),
      motions: spread.motions.map((one) => afterwards(one, motion)),
      lips: spread.lips.map(({ head, foot }) => ({ head: both(head), foot: both(foot) })),
    },
    headSet: full.headSet.map((mark) => ({ ...mark, at: move(mark.at) })),
    footSet: full.footSet.map((mark) => ({ ...mark, at: move(mark.at) })),
  };
}
