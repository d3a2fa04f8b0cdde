/** A flounce cut as part of a ring: the inner edge is sewn on, the longer outer edge falls in folds. */
import { INCH } from "@/lib/drafting/guide";
import { line } from "@/lib/drafting/measure";
import { type CubicBezier, type Piece, type Point } from "@/lib/drafting/types";

/** How far a cubic may lie off the arc it stands for, mm. */
const OFF_ARC = 1e-5;

/** More of a full circle than this is not cut in one. */
const WIDEST = (350 * Math.PI) / 180;

/** Cloth left between both straight ends along the inner arc, so that each has its seam allowance, mm. */
const GAP = INCH;

/** The tightest inner arc that goes under the machine's foot without tucks. Common practice, no source. */
export const LEAST_RADIUS = INCH;

export interface Ring {
  /** Of the inner arc, mm. */
  readonly radius: number;
  readonly depth: number;
  /** radians. */
  readonly angle: number;
}

/**
 * Inner radius of the ring whose outer edge is `ratio` times as long as its inner: from (r + d)·t = ratio·r·t. Ratio above 1.
 */
export function ringRadius(depth: number, ratio: number): number {
  return depth / (ratio - 1);
}

/** Its angle t, from r·t = seam; more than a full turn where one ring cannot do. */
export function ringAngle(seam: number, radius: number): number {
  return seam / radius;
}

/** How many equal rings are cut for so large an angle: each leaves room for the allowances of its two ends. */
export function ringParts(angle: number, radius: number): number {
  const most = Math.min(WIDEST, 2 * Math.PI - GAP / radius);
  return Math.max(1, Math.ceil(angle / most - 1e-9));
}

/**
 * Points at the angle `turn` from straight below the centre, towards the right of the paper. Each cubic touches its arc at
 * both ends: handles of 4/3·tan(θ/4) radii, which lie off it by 4/27·sin⁶(θ/4)/cos²(θ/4) radii at the most.
 */
export function arc(centre: Point, radius: number, from: number, to: number): CubicBezier[] {
  const pieces = Math.max(1, Math.ceil(Math.abs(to - from) / widestArc(radius)));
  const step = (to - from) / pieces;
  const handle = (4 / 3) * Math.tan(step / 4) * radius;
  const at = (turn: number): Point => ({
    x: centre.x + radius * Math.sin(turn),
    y: centre.y + radius * Math.cos(turn),
  });
  const ahead = (turn: number, by: number): Point => {
    const { x, y } = at(turn);
    return { x: x + by * Math.cos(turn), y: y - by * Math.sin(turn) };
  };
  const places = Array.from({ length: pieces + 1 }, (_, i) => from + i * step);
  return places
    .slice(1)
    .map((turn, i): CubicBezier => [
      at(places[i]!),
      ahead(places[i]!, handle),
      ahead(turn, -handle),
      at(turn),
    ]);
}

/** The largest θ whose cubic is good to `OFF_ARC`, a quarter turn at the most. */
function widestArc(radius: number): number {
  // cos²(θ/4) is over 0.85 up to a quarter turn.
  const sine = ((OFF_ARC / radius) * (27 / 4) * 0.85) ** (1 / 6);
  return Math.min(Math.PI / 2, 4 * Math.asin(Math.min(1, sine)));
}

/**
 * The ring as a piece, open side up, its centre at 0, 0. Edges "inner", "endRight", "outer", "endLeft"; a notch in the
 * middle of the inner edge. @throws RangeError where it would close on itself.
 */
export function ringPiece({ radius, depth, angle }: Ring): Piece {
  if (!(angle > 0 && angle < 2 * Math.PI)) throw new RangeError("A ring is cut from less than a full turn");
  const half = angle / 2;
  const centre = { x: 0, y: 0 };
  const inner = arc(centre, radius, -half, half);
  const outer = arc(centre, radius + depth, half, -half);
  const [left, right] = [inner[0]![0], inner.at(-1)![3]];
  return {
    name: "ring",
    edges: [
      { name: "inner", curves: inner },
      { name: "endRight", curves: [line(right, outer[0]![0])] },
      { name: "outer", curves: outer },
      { name: "endLeft", curves: [line(outer.at(-1)![3], left)] },
    ],
    notches: [{ id: "middle", edge: "inner", at: (radius * angle) / 2, count: 1 }],
    grain: { from: { x: 0, y: radius + depth / 5 }, to: { x: 0, y: radius + (depth * 4) / 5 } },
  };
}
