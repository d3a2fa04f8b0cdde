/** Seam allowances: the line a piece is cut along, outside the line it is stitched along. */
import { type Arm, mitred, squared, type Turn } from "@/lib/drafting/corner";
import { area, chainLength, distance, line, pointAt } from "@/lib/drafting/measure";
import { arriving, leaving, leftOf, offsetCurve } from "@/lib/drafting/offset";
import { edgeOf, joinEdges, type Outline } from "@/lib/drafting/outline";
import { type Corner, type PatternPiece } from "@/lib/drafting/pattern";
import { firstHit, isStraight, onward } from "@/lib/drafting/ray";
import { type CubicBezier, type Edge, type Notch, type Point } from "@/lib/drafting/types";
import { joined, outerRing, type Stretch } from "@/lib/drafting/untangle";

/** Offsets that end this near each other meet without a corner, mm. */
const MEETS = 1e-4;
/** Between the two strokes of a back notch, mm along the seam. Common practice, no source. */
export const STROKES_APART = 6;

/** What an allowance needs to know of a piece. */
export type Allowable = Pick<PatternPiece, "edges" | "notches" | "allowances" | "onFold">;

/**
 * How a corner is cut. Asked for both orders of the two edges that meet there: "squared" cuts square to `first`, the seam
 * that is sewn before `second`. Where both orders say so, the edge that comes before the other on the outline is first.
 */
export type CornerRule = (first: string, second: string) => Corner;

/** One stroke of a notch, square to the seam, from the stitch line to the cutting line. */
export interface NotchStroke {
  readonly inner: Point;
  readonly outer: Point;
}

export interface NotchStrokes {
  readonly notch: Notch;
  /** As many as the notch counts. */
  readonly strokes: readonly NotchStroke[];
}

export interface Allowed {
  /**
   * Closed, clockwise, crossing itself nowhere. Its edges are named after those they lie outside of, in the same order; a
   * name may come twice, or not at all, where allowances are so wide that one lies over another.
   */
  readonly cutting: Outline;
  readonly notches: readonly NotchStrokes[];
}

/** Width of the allowance outside an edge, mm: its own, or the usual one; none on the fold of the cloth. */
export function allowanceOf(piece: Allowable, edge: string, usual: number): number {
  return edge === piece.onFold ? 0 : (piece.allowances[edge] ?? usual);
}

/**
 * The cutting line `usual` mm (or each edge's own width) outside the piece, within `OFFSET_TOLERANCE` of the true offset.
 * @throws RangeError for a width below naught, or an outline that does not run clockwise.
 */
export function allow(piece: Allowable, usual: number, corners: CornerRule = () => "mitred"): Allowed {
  if (!(area(piece) > 0)) throw new RangeError("The outline of the piece must run clockwise on the paper");
  const cutting = { edges: cuttingEdges(sidesOf(piece, usual), corners) };
  return {
    cutting,
    notches: piece.notches.map((notch) => ({
      notch,
      strokes: strokesOf(piece, notch, allowanceOf(piece, notch.edge, usual), cutting),
    })),
  };
}

/** A stretch of stitch line without a corner, and what lies outside it. */
interface Side {
  readonly name: string;
  readonly width: number;
  readonly onFold: boolean;
  readonly stitch: readonly CubicBezier[];
  chain: readonly CubicBezier[];
}

function sidesOf(piece: Allowable, usual: number): Side[] {
  const sides: Side[] = [];
  for (const { name, curves } of piece.edges) {
    const width = allowanceOf(piece, name, usual);
    if (!(width >= 0)) throw new RangeError(`The seam allowance of ${name} must be 0 or more`);
    for (const curve of curves) {
      if (curve.every((point) => distance(point, curve[0]) < 1e-9)) continue;
      const chain = offsetCurve(curve, width);
      const last = sides.at(-1);
      if (last?.name === name && meet(last.chain, chain))
        sides[sides.length - 1] = {
          ...last,
          stitch: [...last.stitch, curve],
          chain: [...last.chain, ...chain],
        };
      else sides.push({ name, width, onFold: name === piece.onFold, stitch: [curve], chain });
    }
  }
  return sides;
}

function meet(before: readonly CubicBezier[], after: readonly CubicBezier[]): boolean {
  return distance(before.at(-1)![3], after[0]![0]) < MEETS;
}

function cuttingEdges(sides: readonly Side[], corners: CornerRule): Outline["edges"] {
  const turns = sides.map((side, i): Turn | undefined => {
    const next = sides[(i + 1) % sides.length]!;
    if (meet(side.chain, next.chain)) return undefined;
    const turn = turnAt(side, next, corners);
    side.chain = turn.before;
    next.chain = turn.after;
    return turn;
  });
  const ring = sides.flatMap(({ name, chain }, i): Stretch[] => {
    const turn = turns[i];
    const next = sides[(i + 1) % sides.length]!;
    const own = chain.map((curve) => ({ name, curve }));
    if (!turn) return own;
    const points = [chain.at(-1)![3], ...turn.tail, ...turn.head, next.chain[0]![0]];
    const round = points.slice(1).map((point, k): Stretch => ({
      name: k < turn.tail.length ? name : next.name,
      curve: line(points[k]!, point),
    }));
    return [...own, ...round];
  });
  const outer = outerRing(joined(ring));
  const edges = joinEdges(outer.map(({ name, curve }) => ({ name, curves: [curve] })));
  return startingWith(edges, sides[0]!.name).map(({ name, curves }) => ({
    name,
    curves: straightened(curves),
  }));
}

function turnAt(side: Side, next: Side, corners: CornerRule): Turn {
  const corner = next.stitch[0]![0];
  const before: Arm = { ...side, direction: arriving(side.stitch.at(-1)!) };
  const after: Arm = { ...next, direction: leaving(next.stitch[0]!) };
  if (side.name !== next.name) {
    if (corners(side.name, next.name) === "squared") return squared(corner, before, after, "before");
    if (corners(next.name, side.name) === "squared") return squared(corner, before, after, "after");
  }
  return mitred(corner, before, after);
}

/** The edges begun with the one named `first`, or the longest of its parts. */
function startingWith(edges: readonly Edge[], first: string): Edge[] {
  const [head, last] = [edges[0]!, edges.at(-1)!];
  const whole =
    edges.length > 1 && head.name === last.name
      ? [{ name: head.name, curves: [...last.curves, ...head.curves] }, ...edges.slice(1, -1)]
      : [...edges];
  const long = ({ name, curves }: Edge) => (name === first ? chainLength(curves) : -1);
  const at = whole.reduce((best, edge, i) => (long(edge) > long(whole[best]!) ? i : best), 0);
  return [...whole.slice(at), ...whole.slice(0, at)];
}

/** Straight lines that carry each other on made one. */
function straightened(curves: readonly CubicBezier[]): CubicBezier[] {
  const found: CubicBezier[] = [];
  for (const curve of curves) {
    const last = found.at(-1);
    const whole = last && isStraight(last) && isStraight(curve) ? line(last[0], curve[3]) : undefined;
    const forward = whole && distance(whole[0], whole[3]) - distance(curve[0], curve[3]) > 0;
    if (forward && isStraight([whole[0], last![3], last![3], whole[3]])) found[found.length - 1] = whole;
    else found.push(curve);
  }
  return found;
}

function strokesOf(piece: Allowable, notch: Notch, width: number, cutting: Outline): NotchStroke[] {
  const { curves } = edgeOf(piece, notch.edge);
  const length = chainLength(curves);
  const apart = notch.count === 2 ? Math.min(STROKES_APART, length) : 0;
  const first = Math.max(0, Math.min(notch.at - apart / 2, length - apart));
  const ring = cutting.edges.flatMap((edge) => edge.curves);
  return (notch.count === 2 ? [first, first + apart] : [first]).map((at) => {
    const { point, direction } = pointAt(curves, at);
    const out = leftOf(direction);
    if (width === 0) return { inner: point, outer: point };
    const hit = firstHit(ring, point, out);
    return { inner: point, outer: hit?.point ?? onward(point, out, width) };
  });
}
