/** Darts: a wedge stitched away from an edge of a piece. Lengths mm, angles radians. */
import { fairCurve } from "@/lib/drafting/fair";
import { chainLength, line, pointAt, reversed } from "@/lib/drafting/measure";
import { leftOf } from "@/lib/drafting/offset";
import { edgeOf, endOf, startOf, stretchOf, withEdge } from "@/lib/drafting/outline";
import { type PatternLine } from "@/lib/drafting/pattern";
import { cross, dot, firstHit, type Hit, onward, part, toward } from "@/lib/drafting/ray";
import { moveCurves, movePoint, turnAbout } from "@/lib/drafting/rigid";
import { findRoot } from "@/lib/drafting/solve";
import { type CubicBezier, type Notch, type Piece, type Point } from "@/lib/drafting/types";

export interface DartAsk {
  readonly edge: string;
  /** The middle of the dart's mouth, along the edge. */
  readonly at: number;
  /** By how much the edge is shorter when the dart is stitched. */
  readonly width: number;
  /** From the middle of the mouth to the tip. */
  readonly length: number;
  /** A point that the dart runs towards; absent: square to the edge. */
  readonly towards?: Point;
  /** Which way along the edge the folded wedge is pressed: the cap takes the shape of the edge there. Absent: back. */
  readonly pressed?: "onward" | "back";
}

export interface Darted {
  /** The edge is trued and capped; its name, its ends and the other edges are as before. */
  readonly piece: Piece;
  readonly tip: Point;
  /** From the edge to the tip, the one nearer the edge's start first; equally long. */
  readonly legs: readonly [readonly [Point, Point], readonly [Point, Point]];
  /** Between the legs. */
  readonly angle: number;
  /** The edge as it runs with the dart stitched, what comes after the dart turned on to what comes before. No corner. */
  readonly closed: readonly CubicBezier[];
  /** The edge before, with the dart stitched, and the cap between the legs. */
  readonly lengths: { readonly before: number; readonly stitched: number; readonly cap: number };
  readonly lines: readonly PatternLine[];
}

/** The trued stretch reaches so far to both sides of the stitched dart, in widths of it. Common practice, no source. */
const TRUED = 1.5;

/** A dart leans no further from square to its edge, radians: beyond, no smooth edge joins its two sides. */
const MOST_LEAN = Math.PI / 4;

/**
 * Legs are equal because both end in one point of the trued edge; the mouth is a little more or less than `width`, so that
 * the stitched edge, trued, is shorter by `width` exactly.
 * @throws RangeError where a figure is not more than 0, the dart leaves the piece or leans by more than 45 degrees, or the
 * edge ends too near it.
 */
export function dart(piece: Piece, ask: DartAsk): Darted {
  const { curves } = edgeOf(piece, ask.edge);
  const tip = tipOf(piece, ask);
  const before = chainLength(curves);
  const reach = Math.min(TRUED * ask.width, ask.at - ask.width, before - ask.at - ask.width);
  if (reach < ask.width / 4)
    throw new RangeError(
      "The edge ends too near the dart: move the dart away from the end, or make it narrower",
    );
  const miss = (mouth: number) =>
    chainLength(stitched(curves, { ask, tip, mouth, reach }).whole) - (before - ask.width);
  const [least, most] = [ask.width / 2, 2 * ask.width];
  if (!(miss(least) > 0 && miss(most) < 0))
    throw new RangeError("The dart is too wide for its length: make it longer, or narrower");
  const mouth = findRoot(miss, least, most, 1e-10);
  const { whole, angle, aim, start, trued, end } = stitched(curves, { ask, tip, mouth, reach });
  const top = mustHit(trued, tip, aim);
  const [first, second] = cut(trued, top);
  const turnBack = turnAbout(tip, angle);
  const cap = capped([...start, ...first], [...second, ...end], {
    tip,
    aim,
    angle,
    pressed: ask.pressed ?? "back",
  });
  const rest = stretchOf({ name: ask.edge, curves }, ask.at + mouth / 2 + reach, Infinity);
  const opened = [...start, ...first, ...cap.curves, ...moveCurves(second, turnBack), ...rest];
  const other = movePoint(top.point, turnBack);
  const lengths = { before, stitched: chainLength(whole), cap: chainLength(cap.curves) };
  const carried = ({ edge, at }: Notch): number => {
    if (edge !== ask.edge) return at;
    const [from, to] = [ask.at - mouth / 2, ask.at + mouth / 2];
    if (at <= from - reach) return at;
    if (at >= to + reach) return at - before + lengths.stitched + lengths.cap;
    const leg = from - reach + chainLength(first);
    if (at < from) return from - reach + ((at - from + reach) / reach) * chainLength(first);
    // One in the mouth is where the stitched dart ends.
    if (at <= to) return leg;
    return leg + lengths.cap + ((at - to) / reach) * chainLength(second);
  };
  return {
    piece: {
      ...withEdge(piece, ask.edge, opened),
      notches: piece.notches.map((notch) => ({ ...notch, at: carried(notch) })),
    },
    tip,
    legs: [
      [top.point, tip],
      [other, tip],
    ],
    angle,
    closed: whole,
    lengths,
    lines: [
      { kind: "stitch", words: "Dart", curves: [line(top.point, tip)] },
      { kind: "stitch", words: "Dart", curves: [line(other, tip)] },
      {
        kind: "fold",
        words: "Fold of the dart",
        curves: [line(cap.peak, tip)],
      },
    ],
  };
}

function tipOf(piece: Piece, { edge, at, width, length, towards }: DartAsk): Point {
  if (!(width > 0 && length > 0))
    throw new RangeError("The width and the length of a dart must be more than 0");
  const { point, direction } = pointAt(edgeOf(piece, edge).curves, at);
  const out = leftOf(direction);
  const down = towards ? toward(point, towards) : { x: -out.x, y: -out.y };
  const leaves = piece.edges.some(({ curves }) => {
    const hit = firstHit(curves, point, down, 1e-6);
    return hit !== undefined && hit.distance <= length;
  });
  if (!(-dot(down, out) > Math.cos(MOST_LEAN)))
    throw new RangeError("The dart leans too far to one side: point it more nearly square to the edge");
  if (leaves)
    throw new RangeError(
      "The tip of the dart lies outside the piece: make the dart shorter, or turn it inward",
    );
  return onward(point, down, length);
}

interface Mouth {
  readonly ask: DartAsk;
  readonly tip: Point;
  /** Along the edge as it was. */
  readonly mouth: number;
  readonly reach: number;
}

/** The edge with the dart stitched: as it was, trued over the seam, and the rest turned about the tip. */
function stitched(curves: readonly CubicBezier[], { ask, tip, mouth, reach }: Mouth) {
  const edge = { name: ask.edge, curves };
  const [from, to] = [ask.at - mouth / 2, ask.at + mouth / 2];
  const aim = toward(tip, pointAt(curves, from).point);
  const aimed = toward(tip, pointAt(curves, to).point);
  const angle = Math.atan2(cross(aim, aimed), dot(aim, aimed));
  const start = stretchOf(edge, 0, from - reach);
  const end = moveCurves(stretchOf(edge, to + reach, Infinity), turnAbout(tip, -angle));
  const leave = pointAt(curves, from - reach);
  const arrive = pointAt(curves, to + reach);
  const trued = fairCurve(
    [leave.point, movePoint(arrive.point, turnAbout(tip, -angle))],
    leave.direction,
    turned(arrive.direction, -angle),
  );
  return { whole: [...start, ...trued, ...end], angle, aim, start, trued, end };
}

function turned(direction: Point, angle: number): Point {
  return movePoint(direction, turnAbout({ x: 0, y: 0 }, angle));
}

function mustHit(chain: readonly CubicBezier[], origin: Point, direction: Point): Hit {
  const hit = firstHit(chain, origin, direction);
  if (!hit)
    throw new RangeError(
      "The edge ends too near the dart: move the dart away from the end, or make it narrower",
    );
  return hit;
}

function cut(chain: readonly CubicBezier[], { index, t }: Hit): [CubicBezier[], CubicBezier[]] {
  return [
    [...chain.slice(0, index), part(chain[index]!, 0, t)],
    [part(chain[index]!, t, 1), ...chain.slice(index + 1)],
  ];
}

interface Wedge {
  readonly tip: Point;
  /** From the tip along the first leg. */
  readonly aim: Point;
  readonly angle: number;
  readonly pressed: "onward" | "back";
}

/**
 * The edge between the legs: folded on its middle line and pressed to one side, the wedge lies under the stitched edge
 * there. So one half is that stretch of the edge, the other the same turned over.
 */
function capped(
  before: readonly CubicBezier[],
  after: readonly CubicBezier[],
  { tip, aim, angle, pressed }: Wedge,
): { readonly curves: CubicBezier[]; readonly peak: Point } {
  if (pressed === "back") {
    const [, strip] = cut(before, mustHit(before, tip, turned(aim, -angle / 2)));
    const turn = turnAbout(tip, angle);
    return {
      curves: [...over(strip, tip, aim), ...moveCurves(strip, turn)],
      peak: movePoint(startOf(strip), turn),
    };
  }
  const middle = turned(aim, angle / 2);
  const [strip] = cut(after, mustHit(after, tip, middle));
  return { curves: [...strip, ...over(strip, tip, middle)], peak: endOf(strip) };
}

/** Turned over about the line through `tip`, and run backwards. */
function over(strip: readonly CubicBezier[], tip: Point, along: Point): CubicBezier[] {
  const flip = (point: Point): Point => {
    const v = { x: point.x - tip.x, y: point.y - tip.y };
    const twice = 2 * dot(v, along);
    return { x: tip.x + twice * along.x - v.x, y: tip.y + twice * along.y - v.y };
  };
  return reversed(strip.map(([a, b, c, d]): CubicBezier => [flip(a), flip(b), flip(c), flip(d)]));
}
