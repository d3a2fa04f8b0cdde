/** Pleats: a piece opened along lines across it, so that folded it is the former piece again. Lengths mm. */
import { chainLength, curveLength, line, pointAt, reversed } from "@/lib/drafting/measure";
import { leftOf } from "@/lib/drafting/offset";
import {
  along,
  begunAt,
  edgeOf,
  type EdgePlace,
  endOf,
  moveEdges,
  type Outline,
  startOf,
} from "@/lib/drafting/outline";
import { type PatternLine } from "@/lib/drafting/pattern";
import { dot, firstHit, lineTimes, onward, part } from "@/lib/drafting/ray";
import { moveBy, moveCurves, movePoint, type Rigid } from "@/lib/drafting/rigid";
import { type CubicBezier, type Edge, type Piece, type Point } from "@/lib/drafting/types";

interface PleatPlace {
  /** The edge that is pleated, and the middle of the pleat on it. */
  readonly edge: string;
  readonly at: number;
  /** Which way the pleat runs into the piece, any length; absent: square to the edge there. */
  readonly across?: Point;
  /** Of the underlay: each fold lies so far over the cloth beneath it, and takes up twice as much. */
  readonly depth: number;
}

/**
 * A knife pleat's fold points onward along its edge, or back. The folds of a box pleat point away from each other, twice
 * `depth` apart, with their underlays meeting beneath; those of an inverted pleat meet on top.
 */
export type PleatAsk = PleatPlace &
  ({ readonly kind: "knife"; readonly direction: "onward" | "back" } | { readonly kind: "box" | "inverted" });

/** The fold that is seen, and the line it is brought to. Each from the pleated edge to the other end. */
export interface PleatFold {
  readonly fold: readonly [Point, Point];
  readonly onto: readonly [Point, Point];
  /** The fold beneath, half way between them. */
  readonly inner: readonly [Point, Point];
}

export interface Pleated {
  /** Edges keep their names; notches stay on their panels. */
  readonly piece: Piece;
  /** What lies on top when folded, in order along the edge, each moved and not turned. */
  readonly panels: readonly Outline[];
  readonly motions: readonly Rigid[];
  readonly folds: readonly PleatFold[];
  /** The same folds, to be drawn. */
  readonly lines: readonly PatternLine[];
  /** The pleated edge laid flat, what the folds take up of it, and what it measures folded: the same as before. */
  readonly lengths: { readonly flat: number; readonly takenUp: number; readonly folded: number };
}

/** One fold: where its line runs from edge to edge, and which panel the underlay lies beneath. */
interface Knife {
  readonly from: EdgePlace;
  readonly to: EdgePlace;
  /** How far the line stands from the middle of the pleat, negative before it. */
  readonly by: number;
  readonly beneath: "before" | "after";
}

/** The line of a pleat: a point on it, its direction into the piece, and the way from the panel before it to the one after. */
interface Across {
  readonly origin: Point;
  readonly down: Point;
  readonly away: Point;
}

/**
 * @throws RangeError where the depth is not more than 0, the line does not run into the piece, or there is less of the
 * piece beside it than an underlay is deep.
 */
export function pleat(piece: Piece, ask: PleatAsk): Pleated {
  if (!(ask.depth > 0)) throw new RangeError("The underlay of a pleat must be more than 0 deep");
  const from: EdgePlace = { edge: ask.edge, at: ask.at };
  const across = acrossAt(piece, ask);
  const to = farEnd(piece, across);
  const beside = (by: number) => {
    const { near, far } = meetings(piece, { from, to }, across, by);
    return { from: near.place, to: far.place };
  };
  switch (ask.kind) {
    case "knife":
      return laidOut(piece, ask, across, [
        { from, to, by: 0, beneath: ask.direction === "onward" ? "before" : "after" },
      ]);
    case "inverted":
      return laidOut(piece, ask, across, [
        { from, to, by: 0, beneath: "before" },
        { from, to, by: 0, beneath: "after" },
      ]);
    case "box":
      return laidOut(piece, ask, across, [
        { ...beside(-ask.depth), by: -ask.depth, beneath: "after" },
        { ...beside(ask.depth), by: ask.depth, beneath: "before" },
      ]);
  }
}

function acrossAt(piece: Piece, { edge, at, across }: PleatAsk): Across {
  const { point, direction } = pointAt(edgeOf(piece, edge).curves, at);
  const out = leftOf(direction);
  const inward = across ?? { x: -out.x, y: -out.y };
  const size = Math.hypot(inward.x, inward.y);
  if (!(dot(inward, out) < -1e-6 * size))
    throw new RangeError("A pleat must run from its edge into the piece");
  const down = { x: inward.x / size, y: inward.y / size };
  return { origin: point, down, away: leftOf(down) };
}

/** Where the line of the pleat leaves the piece. */
function farEnd(piece: Piece, { origin, down }: Across): EdgePlace {
  const hits = piece.edges.flatMap(({ name, curves }) => {
    const hit = firstHit(curves, origin, down, 1e-6);
    return hit ? [{ edge: name, at: lengthTo(curves, hit.index, hit.t), distance: hit.distance }] : [];
  });
  const [first, ...rest] = hits;
  if (!first) throw new RangeError("A pleat must run from its edge into the piece");
  const { edge, at } = rest.reduce((near, hit) => (hit.distance < near.distance ? hit : near), first);
  return { edge, at };
}

function lengthTo(curves: readonly CubicBezier[], index: number, t: number): number {
  return chainLength(curves.slice(0, index)) + (t > 0 ? curveLength(part(curves[index]!, 0, t)) : 0);
}

interface Meeting {
  readonly place: EdgePlace;
  /** The outline between this place and the pleat's line, in its own direction. */
  readonly strip: readonly CubicBezier[];
}

/** Where a line beside the pleat's, `by` mm before it (-) or after it (+), crosses the outline next to both its ends. */
function meetings(
  piece: Piece,
  { from, to }: Pick<Knife, "from" | "to">,
  { origin, down, away }: Across,
  by: number,
): { readonly near: Meeting; readonly far: Meeting } {
  const start = by > 0 ? from : to;
  const ring = along(piece, start, by > 0 ? to : from);
  const curves = ring.flatMap((edge) => edge.curves);
  const beside = onward(origin, away, by);
  const places = ring.flatMap((edge, k) => {
    const passed = ring.slice(0, k).reduce((sum, before) => sum + before.curves.length, 0);
    return edge.curves.flatMap((curve, i) =>
      lineTimes(curve, beside, down).map((t) => ({
        index: passed + i,
        t,
        place: {
          edge: edge.name,
          at: (k === 0 && edge.name === start.edge ? start.at : 0) + lengthTo(edge.curves, i, t),
        },
      })),
    );
  });
  const [first, last] = [places[0], places.at(-1)];
  if (!first || !last || first === last)
    throw new RangeError("The underlay of a pleat reaches past the piece beside it: make it less deep");
  const opening: Meeting = {
    place: first.place,
    strip: [...curves.slice(0, first.index), part(curves[first.index]!, 0, first.t)],
  };
  const closing: Meeting = {
    place: last.place,
    strip: [part(curves[last.index]!, last.t, 1), ...curves.slice(last.index + 1)],
  };
  return by > 0 ? { near: opening, far: closing } : { near: closing, far: opening };
}

/** The piece opened along one knife; what lies before its line stays, what lies after it moves on. */
function opened(piece: Piece, knife: Knife, middle: Across, depth: number) {
  const { from, to, beneath } = knife;
  const { down, away } = middle;
  const origin = onward(middle.origin, away, knife.by);
  const onto = moveBy(2 * depth * away.x, 2 * depth * away.y);
  const after = beneath === "after";
  const { near, far } = meetings(piece, knife, { origin, down, away }, after ? depth : -depth);
  // Both layers are the strip that they lie beneath: one turned over at the inner fold, the other as it is.
  const fold = onward(origin, away, after ? depth : 0);
  const turned = (strip: readonly CubicBezier[]) =>
    reversed(strip).map((curve) => curve.map((point) => over(point, fold, away)) as unknown as CubicBezier);
  const level = (strip: readonly CubicBezier[]) => (after ? [...strip] : moveCurves(strip, onto));
  const head = after
    ? [...level(near.strip), ...turned(near.strip)]
    : [...turned(near.strip), ...level(near.strip)];
  const foot = after
    ? [...turned(far.strip), ...level(far.strip)]
    : [...level(far.strip), ...turned(far.strip)];
  const ring: Edge[] = [
    ...along(piece, to, from),
    { name: from.edge, curves: head },
    ...moveEdges(along(piece, from, to), onto),
    { name: to.edge, curves: foot },
  ];
  const grown = { head: chainLength(head), foot: chainLength(foot) };
  const lips: [Point, Point] = [placePoint(piece, from), placePoint(piece, to)];
  const moved: [Point, Point] = [movePoint(lips[0], onto), movePoint(lips[1], onto)];
  const inner: [Point, Point] = after
    ? [endOf(near.strip), startOf(far.strip)]
    : [over(startOf(near.strip), fold, away), over(endOf(far.strip), fold, away)];
  return {
    piece: {
      ...piece,
      edges: begunAt(ring, piece.edges[0]!.name),
      notches: piece.notches.map((notch) => ({
        ...notch,
        at:
          notch.at +
          (notch.edge === from.edge && from.at < notch.at ? grown.head : 0) +
          (notch.edge === to.edge && to.at < notch.at ? grown.foot : 0),
      })),
    },
    fold: after ? { fold: moved, inner, onto: lips } : { fold: lips, inner, onto: moved },
    grown,
  };
}

/** Turned over about the line through `on` that `away` stands square to. */
function over(point: Point, on: Point, away: Point): Point {
  return onward(point, away, 2 * dot(away, { x: on.x - point.x, y: on.y - point.y }));
}

function placePoint(piece: Piece, { edge, at }: EdgePlace): Point {
  return pointAt(edgeOf(piece, edge).curves, at).point;
}

/** Opens from the last knife to the first, so that the places of those before it still hold; then sets all about the middle. */
function laidOut(piece: Piece, ask: PleatAsk, across: Across, knives: readonly Knife[]): Pleated {
  const step = 2 * ask.depth;
  const shift = (by: number) => moveBy(by * across.away.x, by * across.away.y);
  let whole = piece;
  let folds: PleatFold[] = [];
  let takenUp = 0;
  let last: { readonly to: EdgePlace; readonly foot: number } | undefined;
  for (const knife of [...knives].reverse()) {
    // At the far end the outline runs the other way: what was opened after it comes before it there.
    const pushed = last && last.to.edge === knife.to.edge && last.to.at <= knife.to.at ? last.foot : 0;
    const to = { ...knife.to, at: knife.to.at + pushed };
    const { piece: next, fold, grown } = opened(whole, { ...knife, to }, across, ask.depth);
    whole = next;
    folds = [fold, ...folds.map((one) => foldMoved(one, shift(step)))];
    last = { to, foot: grown.foot };
    if (knife.from.edge === ask.edge) takenUp += grown.head;
  }
  const half = (knives.length * step) / 2;
  const moves = [...knives.map((_, i) => i * step - half), half];
  const set = folds.map((one) => foldMoved(one, shift(-half)));
  const flat = chainLength(edgeOf(whole, ask.edge).curves);
  const top = panelsOf(piece, knives);
  const { from, to } = piece.grain;
  const { origin, away } = across;
  const grainBy = dot(away, { x: (from.x + to.x) / 2 - origin.x, y: (from.y + to.y) / 2 - origin.y });
  const grainMove = shift(moves[knives.filter(({ by }) => grainBy > by).length]!);
  return {
    piece: {
      ...whole,
      edges: moveEdges(whole.edges, shift(-half)),
      grain: { from: movePoint(from, grainMove), to: movePoint(to, grainMove) },
    },
    panels: top.map(({ edges, index }) => ({ edges: moveEdges(edges, shift(moves[index]!)) })),
    motions: top.map(({ index }) => shift(moves[index]!)),
    folds: set,
    lines: set.flatMap(drawn),
    lengths: { flat, takenUp, folded: flat - takenUp },
  };
}

/** What lies on top, as it lay before: cut along every knife; nothing lies between the two of an inverted pleat. */
function panelsOf(
  piece: Piece,
  knives: readonly Knife[],
): { readonly edges: Edge[]; readonly index: number }[] {
  const cut = (from: EdgePlace, to: EdgePlace): Edge => ({
    name: "pleat",
    curves: [line(placePoint(piece, from), placePoint(piece, to))],
  });
  const [first, last] = [knives[0]!, knives.at(-1)!];
  const between =
    first.by === last.by
      ? []
      : [
          ...along(piece, first.from, last.from),
          cut(last.from, last.to),
          ...along(piece, last.to, first.to),
          cut(first.to, first.from),
        ];
  return [
    { edges: [...along(piece, first.to, first.from), cut(first.from, first.to)], index: 0 },
    ...(between.length > 0 ? [{ edges: between, index: 1 }] : []),
    { edges: [...along(piece, last.from, last.to), cut(last.to, last.from)], index: knives.length },
  ];
}

function foldMoved({ fold, inner, onto }: PleatFold, motion: Rigid): PleatFold {
  const both = ([a, b]: readonly [Point, Point]) => [movePoint(a, motion), movePoint(b, motion)] as const;
  return { fold: both(fold), inner: both(inner), onto: both(onto) };
}

function drawn({ fold, inner, onto }: PleatFold): PatternLine[] {
  return [
    { kind: "fold", words: "Fold on top", curves: [line(...fold)] },
    { kind: "fold", words: "Fold beneath", curves: [line(...inner)] },
    { kind: "placement", words: "The fold comes here", curves: [line(...onto)] },
  ];
}
