/** Offset curves: the line that runs at a given distance beside a chain of cubics, as cubics again. */
import { distance } from "@/lib/drafting/measure";
import { at, cross, dot, isStraight, onward, toward } from "@/lib/drafting/ray";
import { type CubicBezier, type Point } from "@/lib/drafting/types";

/** The cubics lie this near the true offset, mm; a tenth of what a printer can show. */
export const OFFSET_TOLERANCE = 0.005;
/** One cubic turns no further than this. */
const MOST_TURN = Math.PI / 4;

/** Left of the direction of travel: outside, where an outline runs clockwise on the paper. */
export function leftOf({ x, y }: Point): Point {
  return { x: y, y: -x };
}

/** The direction a curve leaves in; where a handle lies on the end it is that of the next one. */
export function leaving([a, ...rest]: CubicBezier): Point {
  const next = rest.find((point) => distance(a, point) > 1e-7);
  return toward(a, next ?? rest[2]!);
}

export function arriving([a, b, c, d]: CubicBezier): Point {
  const { x, y } = leaving([d, c, b, a]);
  return { x: -x, y: -y };
}

/**
 * The offset of one curve to the left of its direction by `width` mm. A straight line is only moved. Where the curve is
 * hollow more tightly than `width` the offset doubles back on itself, as the true one does; `outerRing` takes that off.
 */
export function offsetCurve(curve: CubicBezier, width: number): CubicBezier[] {
  if (width === 0) return [curve];
  if (isStraight(curve)) {
    const out = leftOf(toward(curve[0], curve[3]));
    return [curve.map((point) => onward(point, out, width)) as unknown as CubicBezier];
  }
  const stops = [0, ...cusps(curve, width), 1];
  return stops.slice(1).flatMap((to, i) => fitted(curve, width, [stops[i]!, to], 0));
}

interface Motion {
  readonly point: Point;
  /** First and second derivative by the parameter. */
  readonly first: Point;
  readonly second: Point;
}

function motionAt(curve: CubicBezier, t: number): Motion {
  const [a, b, c, d] = curve;
  const s = 1 - t;
  const rate = (k: "x" | "y") =>
    3 * (s * s * (b[k] - a[k]) + 2 * s * t * (c[k] - b[k]) + t * t * (d[k] - c[k]));
  const bend = (k: "x" | "y") => 6 * (s * (c[k] - 2 * b[k] + a[k]) + t * (d[k] - 2 * c[k] + b[k]));
  return {
    point: at(curve, t),
    first: { x: rate("x"), y: rate("y") },
    second: { x: bend("x"), y: bend("y") },
  };
}

/** Where the offset stands still and turns back: the hollow's radius is the width there. */
function cusps(curve: CubicBezier, width: number): number[] {
  const pace = (t: number) => {
    const { first, second } = motionAt(curve, t);
    return Math.hypot(first.x, first.y) ** 3 + width * cross(first, second);
  };
  const steps = 48;
  const found: number[] = [];
  for (let i = 0; i < steps; i++) {
    let [low, high] = [i / steps, (i + 1) / steps];
    if (pace(low) * pace(high) >= 0) continue;
    const forward = pace(low) > 0;
    for (let step = 0; step < 48; step++) {
      const middle = (low + high) / 2;
      if (pace(middle) > 0 === forward) low = middle;
      else high = middle;
    }
    found.push((low + high) / 2);
  }
  return found;
}

/** The true offset at `t`, and how fast it runs by the parameter. */
function offsetAt(curve: CubicBezier, width: number, t: number): { point: Point; rate: Point; ahead: Point } {
  const { point, first, second } = motionAt(curve, t);
  const speed = Math.hypot(first.x, first.y);
  const ahead =
    speed > 1e-6 ? { x: first.x / speed, y: first.y / speed } : t < 0.5 ? leaving(curve) : arriving(curve);
  // |B′| (1 + w·κ): faster round the outside of a bend, slower in a hollow.
  const pace = speed > 1e-6 ? speed + (width * cross(first, second)) / (speed * speed) : 0;
  return {
    point: onward(point, leftOf(ahead), width),
    rate: { x: ahead.x * pace, y: ahead.y * pace },
    ahead,
  };
}

/** A cubic with the offset's points and velocities at both ends; halved until it lies near enough everywhere. */
function fitted(
  curve: CubicBezier,
  width: number,
  [from, to]: [number, number],
  depth: number,
): CubicBezier[] {
  const [start, end] = [offsetAt(curve, width, from), offsetAt(curve, width, to)];
  const third = (to - from) / 3;
  const fit: CubicBezier = [
    start.point,
    onward(start.point, start.rate, third),
    onward(end.point, end.rate, -third),
    end.point,
  ];
  if (depth >= 14) return [fit];
  const near = [1 / 8, 1 / 4, 1 / 2, 3 / 4, 7 / 8].every(
    (share) =>
      distance(at(fit, share), offsetAt(curve, width, from + (to - from) * share).point) < OFFSET_TOLERANCE,
  );
  const middle = (from + to) / 2;
  const halfWay = offsetAt(curve, width, middle).ahead;
  const calm =
    dot(start.ahead, halfWay) > Math.cos(MOST_TURN / 2) && dot(halfWay, end.ahead) > Math.cos(MOST_TURN / 2);
  if (near && calm) return [fit];
  return [
    ...fitted(curve, width, [from, middle], depth + 1),
    ...fitted(curve, width, [middle, to], depth + 1),
  ];
}
