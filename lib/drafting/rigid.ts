/** Rigid motions of the paper: turned about a point and moved, never bent, stretched or turned over. */
import { type CubicBezier, type Point } from "@/lib/drafting/types";

/** x′ = cos·x − sin·y + dx, y′ = sin·x + cos·y + dy. With y down, a positive angle turns clockwise as seen. */
export interface Rigid {
  readonly cos: number;
  readonly sin: number;
  readonly dx: number;
  readonly dy: number;
}

export const STILL: Rigid = { cos: 1, sin: 0, dx: 0, dy: 0 };

export function moveBy(dx: number, dy: number): Rigid {
  return { cos: 1, sin: 0, dx, dy };
}

/** A turn by `angle` about `centre`. */
export function turnAbout({ x, y }: Point, angle: number): Rigid {
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  return { cos, sin, dx: x - cos * x + sin * y, dy: y - sin * x - cos * y };
}

/** `first`, then `second`. Not named "then": a module with that export is taken for a promise when it is imported. */
export function afterwards(first: Rigid, second: Rigid): Rigid {
  const moved = movePoint({ x: first.dx, y: first.dy }, second);
  return {
    cos: first.cos * second.cos - first.sin * second.sin,
    sin: first.sin * second.cos + first.cos * second.sin,
    dx: moved.x,
    dy: moved.y,
  };
}

export function angleOf({ cos, sin }: Rigid): number {
  return Math.atan2(sin, cos);
}

export function movePoint({ x, y }: Point, { cos, sin, dx, dy }: Rigid): Point {
  return { x: cos * x - sin * y + dx, y: sin * x + cos * y + dy };
}

export function moveCurves(curves: readonly CubicBezier[], motion: Rigid): CubicBezier[] {
  // What does not move keeps its last digit.
  if (motion === STILL) return [...curves];
  return curves.map(([a, b, c, d]): CubicBezier => [
    movePoint(a, motion),
    movePoint(b, motion),
    movePoint(c, motion),
    movePoint(d, motion),
  ]);
}
