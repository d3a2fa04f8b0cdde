/** A closed outline taken as a ring of named stretches: cut at a place, read from one place to another, put together. */
import { chainLength, distance, reversed, splitAt } from "@/lib/drafting/measure";
import { moveCurves, movePoint, type Rigid } from "@/lib/drafting/rigid";
import { type CubicBezier, type Edge, type Notch, type Piece, type Point } from "@/lib/drafting/types";

/** What an area or a drawing needs of a piece. */
export type Outline = Pick<Piece, "edges">;

/** A place on an outline: so many mm along one of its edges. */
export interface EdgePlace {
  readonly edge: string;
  readonly at: number;
}

/** Two ends this near are one point, mm. */
const SAME = 1e-6;

export function edgeOf(outline: Outline, name: string): Edge {
  const found = outline.edges.find((edge) => edge.name === name);
  if (!found) throw new Error(`The piece has no edge named ${name}`);
  return found;
}

export function startOf(curves: readonly CubicBezier[]): Point {
  return curves[0]![0];
}

export function endOf(curves: readonly CubicBezier[]): Point {
  return curves.at(-1)![3];
}

/** The stretch of one edge between two places on it, in the edge's own direction. */
export function stretchOf(edge: Edge, from: number, to: number): CubicBezier[] {
  const [, after] = from <= 0 ? [[], [...edge.curves]] : splitAt(edge.curves, from);
  const length = chainLength(edge.curves);
  if (to >= length - SAME) return after;
  return splitAt(after, to - Math.max(0, from))[0];
}

/**
 * The outline from one place to another, onward in its own direction and past its start where need be. Neighbouring
 * stretches of one edge stay one edge.
 */
export function along(outline: Outline, from: EdgePlace, to: EdgePlace): Edge[] {
  const { edges } = outline;
  const first = edges.findIndex((edge) => edge.name === from.edge);
  const last = edges.findIndex((edge) => edge.name === to.edge);
  if (first < 0 || last < 0)
    throw new Error(`The piece has no edge named ${first < 0 ? from.edge : to.edge}`);
  if (first === last && to.at >= from.at)
    return [{ name: from.edge, curves: stretchOf(edges[first]!, from.at, to.at) }];
  const found: Edge[] = [{ name: from.edge, curves: stretchOf(edges[first]!, from.at, Infinity) }];
  for (let i = (first + 1) % edges.length; i !== last; i = (i + 1) % edges.length) found.push(edges[i]!);
  found.push({ name: to.edge, curves: stretchOf(edges[last]!, 0, to.at) });
  return found.filter(({ curves }) => curves.length > 0);
}

/** The same edges moved; the names stay. */
export function moveEdges(edges: readonly Edge[], motion: Rigid): Edge[] {
  return edges.map(({ name, curves }) => ({ name, curves: moveCurves(curves, motion) }));
}

export function movePiece<P extends Piece>(piece: P, motion: Rigid): P {
  const { from, to } = piece.grain;
  return {
    ...piece,
    edges: moveEdges(piece.edges, motion),
    grain: { from: movePoint(from, motion), to: movePoint(to, motion) },
  };
}

/** Neighbouring stretches of the same name joined into one edge; empty ones left out. */
export function joinEdges(edges: readonly Edge[]): Edge[] {
  const joined: Edge[] = [];
  for (const { name, curves } of edges) {
    if (curves.length === 0) continue;
    const before = joined.at(-1);
    if (before?.name === name) joined[joined.length - 1] = { name, curves: [...before.curves, ...curves] };
    else joined.push({ name, curves });
  }
  return joined;
}

/** The same ring, begun where the edge `first` begins, every edge whole, wherever it was begun before. */
export function begunAt(ring: readonly Edge[], first: string): Edge[] {
  const at = Math.max(
    0,
    ring.findIndex(({ name }, i) => name === first && ring.at(i - 1)!.name !== first),
  );
  return joinEdges([...ring.slice(at), ...ring.slice(0, at)]);
}

/** One edge drawn anew between the same ends. @throws where an end has moved: the outline would open. */
export function withEdge<P extends Outline>(piece: P, name: string, curves: readonly CubicBezier[]): P {
  const before = edgeOf(piece, name).curves;
  if (distance(startOf(before), startOf(curves)) > SAME || distance(endOf(before), endOf(curves)) > SAME)
    throw new Error(`The new ${name} does not meet its neighbours`);
  return { ...piece, edges: piece.edges.map((edge) => (edge.name === name ? { name, curves } : edge)) };
}

/** Whether each edge starts where the one before ends. */
export function isClosed({ edges }: Outline): boolean {
  return edges.every((edge, i) => {
    const before = edges.at(i - 1)!;
    return distance(endOf(before.curves), startOf(edge.curves)) < SAME;
  });
}

/** The outline in a mirror held upright: front for back. Runs clockwise again; notches stand where they stood. */
export function mirrored<P extends Piece>(piece: P): P {
  const flip = ({ x, y }: Point): Point => ({ x: -x, y });
  const edges = piece.edges
    .map(({ name, curves }) => ({
      name,
      curves: reversed(curves.map(([a, b, c, d]): CubicBezier => [flip(a), flip(b), flip(c), flip(d)])),
    }))
    .reverse();
  const notches = piece.notches.map((notch): Notch => ({
    ...notch,
    at: chainLength(edgeOf(piece, notch.edge).curves) - notch.at,
  }));
  return {
    ...piece,
    edges,
    notches,
    grain: { from: flip(piece.grain.from), to: flip(piece.grain.to) },
  };
}
