/** Where straight lines meet curves, from the cubics themselves. Lengths mm, directions of length one. */
import { Bezier } from "bezier-js";
import { distance, line } from "@/lib/drafting/measure";
import { type CubicBezier, type Point } from "@/lib/drafting/types";

/** Nearer than this to a line is on it, mm. */
const ON = 1e-9;

export function cross(a: Point, b: Point): number {
  return a.x * b.y - a.y * b.x;
}

export function dot(a: Point, b: Point): number {
  return a.x * b.x + a.y * b.y;
}

/** `by` times `direction` on from `point`. */
export function onward(point: Point, direction: Point, by: number): Point {
  return { x: point.x + direction.x * by, y: point.y + direction.y * by };
}

/** From `a` to `b`, of length one. */
export function toward(a: Point, b: Point): Point {
  const size = distance(a, b);
  return { x: (b.x - a.x) / size, y: (b.y - a.y) / size };
}

/** A straight line as far as drawing goes: both handles on the chord, to 1e-9 mm. */
export function isStraight([a, b, c, d]: CubicBezier): boolean {
  const size = distance(a, d);
  if (size === 0) return false;
  const chord = toward(a, d);
  const off = (p: Point) => Math.abs(cross(chord, { x: p.x - a.x, y: p.y - a.y }));
  return off(b) < ON && off(c) < ON;
}

/** The part of a curve between two of its parameters; a straight line stays one. */
export function part(curve: CubicBezier, from: number, to: number): CubicBezier {
  if (from <= 0 && to >= 1) return curve;
  const whole = new Bezier(curve.map(({ x, y }) => ({ x, y })));
  const [a, b, c, d] = whole.split(Math.max(0, from), Math.min(1, to)).points.map(({ x, y }): Point => ({
    x,
    y,
  }));
  return isStraight(curve) ? line(a!, d!) : [a!, b!, c!, d!];
}

/** The point of a curve at `t`, by de Casteljau. */
export function at([a, b, c, d]: CubicBezier, t: number): Point {
  const s = 1 - t;
  const [i, j, k, l] = [s * s * s, 3 * s * s * t, 3 * s * t * t, t * t * t];
  return { x: i * a.x + j * b.x + k * c.x + l * d.x, y: i * a.y + j * b.y + k * c.y + l * d.y };
}

/** Parameters at which a curve meets the endless line through `origin`, rising. A curve along the line meets it nowhere. */
export function lineTimes(curve: CubicBezier, origin: Point, direction: Point): number[] {
  // The distance from the line is itself a cubic; between its turning points it meets naught once at most.
  const [p, q, r, s] = curve.map((point) =>
    cross(direction, { x: point.x - origin.x, y: point.y - origin.y }),
  ) as [number, number, number, number];
  if ([p, q, r, s].every((off) => Math.abs(off) <= ON)) return [];
  const off = (t: number) => {
    const u = 1 - t;
    return u * u * u * p + 3 * u * u * t * q + 3 * u * t * t * r + t * t * t * s;
  };
  const stops = [0, ...turnings(q - p, r - q, s - r), 1];
  const found: number[] = [];
  const add = (t: number) => {
    if (found.length === 0 || t - found.at(-1)! > 1e-9) found.push(t);
  };
  for (const [i, low] of stops.entries()) {
    if (Math.abs(off(low)) <= ON) add(low);
    const high = stops[i + 1];
    if (high === undefined || Math.abs(off(low)) <= ON || Math.abs(off(high)) <= ON) continue;
    if (off(low) * off(high) < 0) add(halved(off, low, high));
  }
  return found;
}

/** Roots inside 0..1 of the quadratic with Bernstein coefficients a, b, c. */
function turnings(a: number, b: number, c: number): number[] {
  const [square, half] = [a - 2 * b + c, b - a];
  const size = Math.abs(a) + Math.abs(b) + Math.abs(c);
  if (Math.abs(square) < 1e-12 * size) return inside([-a / (2 * half)]);
  const under = half * half - square * a;
  if (under <= 0) return [];
  // Without cancelling: the larger root first, the other from their product.
  const large = -(half + Math.sign(half || 1) * Math.sqrt(under));
  return inside([large / square, a / large]);
}

function inside(ts: readonly number[]): number[] {
  return ts.filter((t) => t > 0 && t < 1).sort((m, n) => m - n);
}

function halved(off: (t: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  const rising = off(low) < 0;
  for (let step = 0; step < 60 && high - low > 1e-15; step++) {
    const middle = (low + high) / 2;
    if (off(middle) < 0 === rising) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** A place where a ray meets a chain. */
export interface Hit {
  readonly index: number;
  readonly t: number;
  readonly point: Point;
  /** From the ray's origin. */
  readonly distance: number;
}

/** Where the ray first meets the chain, more than `from` mm from its origin. */
export function firstHit(
  chain: readonly CubicBezier[],
  origin: Point,
  direction: Point,
  from = 1e-9,
): Hit | undefined {
  let nearest: Hit | undefined;
  for (const [index, curve] of chain.entries()) {
    for (const t of lineTimes(curve, origin, direction)) {
      const point = at(curve, t);
      const away = dot(direction, { x: point.x - origin.x, y: point.y - origin.y });
      if (away > from && (!nearest || away < nearest.distance)) nearest = { index, t, point, distance: away };
    }
  }
  return nearest;
}
