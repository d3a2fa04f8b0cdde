/** Lengths, points and areas, all taken from the Béziers themselves and never from a drawn polyline. */
import { Bezier } from "bezier-js";
import { type CubicBezier, type Edge, type Piece, type Point } from "@/lib/drafting/types";

function bezier([a, b, c, d]: CubicBezier): Bezier {
  return new Bezier(a.x, a.y, b.x, b.y, c.x, c.y, d.x, d.y);
}

export function lerp(a: Point, b: Point, t: number): Point {
  return { x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t };
}

export function distance(a: Point, b: Point): number {
  return Math.hypot(b.x - a.x, b.y - a.y);
}

/** A straight line as a cubic, handles at the thirds so that its parameter runs evenly. */
export function line(a: Point, b: Point): CubicBezier {
  return [a, lerp(a, b, 1 / 3), lerp(a, b, 2 / 3), b];
}

export function reversed(curves: readonly CubicBezier[]): CubicBezier[] {
  return curves.map(([a, b, c, d]): CubicBezier => [d, c, b, a]).reverse();
}

/** Abscissae and weights of the quadrature, from bezier-js. Its curve objects are too slow to make for every length. */
const { Tvalues, Cvalues } = Bezier.getUtils();

/** dB/dt. */
function velocity([a, b, c, d]: CubicBezier, t: number): Point {
  const s = 1 - t;
  const [p, q, r] = [3 * s * s, 6 * s * t, 3 * t * t];
  return {
    x: p * (b.x - a.x) + q * (c.x - b.x) + r * (d.x - c.x),
    y: p * (b.y - a.y) + q * (c.y - b.y) + r * (d.y - c.y),
  };
}

export function pointOn([a, b, c, d]: CubicBezier, t: number): Point {
  const s = 1 - t;
  const [p, q, r, u] = [s * s * s, 3 * s * s * t, 3 * s * t * t, t * t * t];
  return { x: p * a.x + q * b.x + r * c.x + u * d.x, y: p * a.y + q * b.y + r * c.y + u * d.y };
}

/** Arc length of a curve up to the parameter `t`, mm, by 24-point Gauss-Legendre quadrature. */
export function lengthUpTo(curve: CubicBezier, t: number): number {
  let sum = 0;
  for (const [i, at] of Tvalues.entries()) {
    const { x, y } = velocity(curve, (t / 2) * (at + 1));
    sum += Cvalues[i]! * Math.hypot(x, y);
  }
  return (t / 2) * sum;
}

/** Curves are never changed, so each is measured once. */
const measured = new WeakMap<CubicBezier, number>();

/** Arc length of one curve, mm. */
export function curveLength(curve: CubicBezier): number {
  let length = measured.get(curve);
  if (length === undefined) {
    length = lengthUpTo(curve, 1);
    measured.set(curve, length);
  }
  return length;
}

/** Arc length of a chain, mm. */
export function chainLength(curves: readonly CubicBezier[]): number {
  return curves.reduce((sum, curve) => sum + curveLength(curve), 0);
}

export function edgeLength(edge: Edge): number {
  return chainLength(edge.curves);
}

/** A place on a chain: which curve, and its parameter there. */
export interface Place {
  readonly index: number;
  readonly t: number;
}

/**
 * The place `at` mm along a chain; lengths off either end give that end. Newton steps on the arc length, kept
 * inside a shrinking bracket so that a slow start of a curve cannot throw them out. Good to 1e-9 mm.
 */
export function placeAt(curves: readonly CubicBezier[], at: number): Place {
  let left = Math.max(0, at);
  for (const [index, curve] of curves.entries()) {
    const length = curveLength(curve);
    if (left > length && index < curves.length - 1) {
      left -= length;
      continue;
    }
    if (left <= 0) return { index, t: 0 };
    if (left >= length) return { index, t: 1 };
    let low = 0;
    let high = 1;
    let t = left / length;
    for (let step = 0; step < 60; step++) {
      const miss = lengthUpTo(curve, t) - left;
      if (Math.abs(miss) < 1e-9) break;
      if (miss > 0) high = t;
      else low = t;
      const { x, y } = velocity(curve, t);
      const newton = t - miss / Math.hypot(x, y);
      t = newton > low && newton < high ? newton : (low + high) / 2;
    }
    return { index, t };
  }
  return { index: 0, t: 0 };
}

/** The point at a place, and the unit direction the chain runs in there. */
export function pointAt(curves: readonly CubicBezier[], at: number): { point: Point; direction: Point } {
  const { index, t } = placeAt(curves, at);
  const { x, y } = velocity(curves[index]!, t);
  const size = Math.hypot(x, y);
  return { point: pointOn(curves[index]!, t), direction: { x: x / size, y: y / size } };
}

/** A chain cut in two, `at` mm along. Nothing moves: the two halves run over the same line. */
export function splitAt(curves: readonly CubicBezier[], at: number): [CubicBezier[], CubicBezier[]] {
  const { index, t } = placeAt(curves, at);
  const before = curves.slice(0, index);
  const after = curves.slice(index + 1);
  if (t <= 0) return [before, curves.slice(index)];
  if (t >= 1) return [curves.slice(0, index + 1), after];
  const [left, right] = splitCurve(curves[index]!, t);
  return [
    [...before, left],
    [right, ...after],
  ];
}

/** De Casteljau's cut of one curve at its parameter `t`. */
export function splitCurve([a, b, c, d]: CubicBezier, t: number): [CubicBezier, CubicBezier] {
  const [ab, bc, cd] = [lerp(a, b, t), lerp(b, c, t), lerp(c, d, t)];
  const [abc, bcd] = [lerp(ab, bc, t), lerp(bc, cd, t)];
  const middle = lerp(abc, bcd, t);
  return [
    [a, ab, abc, middle],
    [middle, bcd, cd, d],
  ];
}

/** Where a chain crosses the straight line from `a` to `b`, ends of the chain left out. In the chain's order. */
export function crossings(curves: readonly CubicBezier[], a: Point, b: Point): Point[] {
  const found: Point[] = [];
  const last = curves.length - 1;
  for (const [index, curve] of curves.entries()) {
    const whole = bezier(curve);
    for (const t of [...whole.lineIntersects({ p1: a, p2: b })].sort((m, n) => m - n)) {
      if ((index === 0 && t < 1e-6) || (index === last && t > 1 - 1e-6)) continue;
      const { x, y } = whole.get(t);
      const before = found.at(-1);
      if (!before || distance(before, { x, y }) > 1e-6) found.push({ x, y });
    }
  }
  return found;
}

/** Smallest upright box around a chain. */
export function bounds(curves: readonly CubicBezier[]): { min: Point; max: Point } {
  const boxes = curves.map((curve) => bezier(curve).bbox());
  return {
    min: { x: Math.min(...boxes.map((b) => b.x.min)), y: Math.min(...boxes.map((b) => b.y.min)) },
    max: { x: Math.max(...boxes.map((b) => b.x.max)), y: Math.max(...boxes.map((b) => b.y.max)) },
  };
}

/**
 * Area of a closed piece, mm², exact: Green's theorem, ½∮(x dy − y dx), in closed form for cubics. Positive
 * when the outline runs clockwise on the paper.
 */
export function area(piece: Pick<Piece, "edges">): number {
  let sum = 0;
  for (const edge of piece.edges) {
    for (const [a, b, c, d] of edge.curves) {
      sum += 6 * (cross(a, b) + cross(c, d)) + 3 * (cross(a, c) + cross(b, c) + cross(b, d)) + cross(a, d);
    }
  }
  return sum / 20;
}

function cross(a: Point, b: Point): number {
  return a.x * b.y - a.y * b.x;
}
