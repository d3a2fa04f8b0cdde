/** Cutting a sleeve in two, square across its centre line. */
import { curveLength, lengthUpTo, line, pointOn } from "@/lib/drafting/measure";
import { along, begunAt, edgeOf, type EdgePlace, joinEdges, startOf } from "@/lib/drafting/outline";
import { type CubicBezier, type Piece } from "@/lib/drafting/types";

/**
 * Where a chain crosses the level `y`, mm along it: the first curve with an end on either side of it, halved down to the
 * last digit of its parameter. Undefined where there is none.
 */
export function levelOn(curves: readonly CubicBezier[], y: number): number | undefined {
  let before = 0;
  for (const curve of curves) {
    const [start, end] = [curve[0].y - y, curve[3].y - y];
    if (start === 0) return before;
    if (end === 0) return before + curveLength(curve);
    if (start * end < 0) {
      let [low, high] = [0, 1];
      for (let step = 0; step < 60 && high - low > 1e-15; step++) {
        const middle = (low + high) / 2;
        if ((pointOn(curve, middle).y - y) * start > 0) low = middle;
        else high = middle;
      }
      return before + lengthUpTo(curve, (low + high) / 2);
    }
    before += curveLength(curve);
  }
  return undefined;
}

/**
 * The pieces above and below the level `y`. Both keep the names of the edges; where they part, the upper has the edge
 * "foot" and the lower the edge "top". Notches stay with their edge; one that is cut off from it is gone.
 * @throws RangeError where the line does not cross both underarm edges.
 */
export function cutAcross(piece: Piece, y: number): { readonly upper: Piece; readonly lower: Piece } {
  const front = sidePlace(piece, "underarmFront", y);
  const back = sidePlace(piece, "underarmBack", y);
  const above = along(piece, front, back);
  const below = along(piece, back, front);
  const left = startOf(above[0]!.curves);
  const right = startOf(below[0]!.curves);
  const upper = joinEdges([...above, { name: "foot", curves: [line(right, left)] }]);
  const lower = joinEdges([{ name: "top", curves: [line(left, right)] }, ...below]);
  const { from, to } = piece.grain;
  const room = Math.min(10, Math.abs(y - from.y) / 4, Math.abs(to.y - y) / 4);
  return {
    upper: {
      ...piece,
      edges: begunAt(upper, piece.edges[0]!.name),
      notches: piece.notches.filter(({ edge }) =>
        above.some((one) => one.name === edge && !/^underarm/.test(edge)),
      ),
      grain: { from, to: { ...to, y: y - room } },
    },
    lower: {
      ...piece,
      edges: lower,
      notches: piece.notches.filter(({ edge }) =>
        below.some((one) => one.name === edge && !/^underarm/.test(edge)),
      ),
      grain: { from: { ...from, y: y + room }, to },
    },
  };
}

function sidePlace(piece: Piece, edge: string, y: number): EdgePlace {
  const at = levelOn(edgeOf(piece, edge).curves, y);
  if (at === undefined) throw new RangeError(`The level ${y} does not cross ${edge}`);
  return { edge, at };
}
