/** Béziers cut exactly at the edges of a rectangle: what stands on a sheet, and whether anything does. */
import { type CubicBezier, type Point } from "@/lib/drafting/types";
import { curveLength, lerp } from "@/lib/drafting/measure";

/** In the unit of the curves. */
export interface Rect {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
}

/** A stretch of a chain that lies inside a rectangle. */
export interface Run {
  readonly curves: readonly CubicBezier[];
  /** How far along the chain it starts. */
  readonly from: number;
}

const value = (a: number, b: number, c: number, d: number, t: number): number => {
  const s = 1 - t;
  return s * s * s * a + 3 * s * s * t * b + 3 * s * t * t * c + t * t * t * d;
};

/** Where the derivative of one coordinate is nothing, inside (0, 1). */
function turns(a: number, b: number, c: number, d: number): number[] {
  const [p, q, r] = [d - 3 * c + 3 * b - a, 2 * (c - 2 * b + a), b - a];
  const inside = (t: number) => t > 0 && t < 1;
  const scale = Math.abs(p) + Math.abs(q) + Math.abs(r);
  if (Math.abs(p) <= scale * 1e-12) return q === 0 ? [] : [-r / q].filter(inside);
  const root = q * q - 4 * p * r;
  if (root < 0) return [];
  // Without the difference of two nearly equal numbers.
  const half = -(q + (q < 0 ? -1 : 1) * Math.sqrt(root)) / 2;
  return [half / p, ...(half === 0 ? [] : [r / half])].filter(inside).sort((m, n) => m - n);
}

/** Every t in (0, 1) where one coordinate of a cubic passes `level`: bisection between its turns, so none is missed. */
function passes([a, b, c, d]: readonly [number, number, number, number], level: number): number[] {
  const marks = [0, ...turns(a, b, c, d), 1];
  const found: number[] = [];
  for (let i = 1; i < marks.length; i++) {
    let [low, high] = [marks[i - 1]!, marks[i]!];
    const below = value(a, b, c, d, low) < level;
    if (below === value(a, b, c, d, high) < level) continue;
    for (let step = 0; step < 60 && high - low > 1e-15; step++) {
      const middle = (low + high) / 2;
      if (value(a, b, c, d, middle) < level === below) low = middle;
      else high = middle;
    }
    found.push((low + high) / 2);
  }
  return found;
}

const across = ([a, b, c, d]: CubicBezier) => [a.x, b.x, c.x, d.x] as const;
const down = ([a, b, c, d]: CubicBezier) => [a.y, b.y, c.y, d.y] as const;

export function pointOn(curve: CubicBezier, t: number): Point {
  return { x: value(...across(curve), t), y: value(...down(curve), t) };
}

/** The part of a curve between two of its parameters, by de Casteljau. */
export function part(curve: CubicBezier, from: number, to: number): CubicBezier {
  const second = from <= 0 ? curve : halves(curve, from)[1];
  return to >= 1 ? second : halves(second, (to - from) / (1 - from))[0];
}

function halves([a, b, c, d]: CubicBezier, t: number): [CubicBezier, CubicBezier] {
  const [ab, bc, cd] = [lerp(a, b, t), lerp(b, c, t), lerp(c, d, t)];
  const [abc, bcd] = [lerp(ab, bc, t), lerp(bc, cd, t)];
  const middle = lerp(abc, bcd, t);
  return [
    [a, ab, abc, middle],
    [middle, bcd, cd, d],
  ];
}

/** The box of the handles: never smaller than the curve's. */
export function hull(curve: CubicBezier): Rect {
  const xs = across(curve);
  const ys = down(curve);
  const [x, y] = [Math.min(...xs), Math.min(...ys)];
  return { x, y, w: Math.max(...xs) - x, h: Math.max(...ys) - y };
}

export const meets = (a: Rect, b: Rect): boolean =>
  a.x <= b.x + b.w && b.x <= a.x + a.w && a.y <= b.y + b.h && b.y <= a.y + a.h;

export const holds = (outer: Rect, inner: Rect): boolean =>
  inner.x >= outer.x &&
  inner.y >= outer.y &&
  inner.x + inner.w <= outer.x + outer.w &&
  inner.y + inner.h <= outer.y + outer.h;

const has = ({ x, y, w, h }: Rect, p: Point): boolean => p.x >= x && p.x <= x + w && p.y >= y && p.y <= y + h;

/** The stretches of one curve inside a rectangle, its edges included, as pairs of parameters. */
function spans(curve: CubicBezier, rect: Rect): [from: number, to: number][] {
  const box = hull(curve);
  if (!meets(box, rect)) return [];
  if (holds(rect, box)) return [[0, 1]];
  const cuts = [
    ...passes(across(curve), rect.x),
    ...passes(across(curve), rect.x + rect.w),
    ...passes(down(curve), rect.y),
    ...passes(down(curve), rect.y + rect.h),
  ].sort((a, b) => a - b);
  const marks = [0, ...cuts, 1];
  const found: [number, number][] = [];
  for (let i = 1; i < marks.length; i++) {
    const [from, to] = [marks[i - 1]!, marks[i]!];
    if (to - from < 1e-12 || !has(rect, pointOn(curve, (from + to) / 2))) continue;
    const before = found.at(-1);
    if (before && before[1] === from) before[1] = to;
    else found.push([from, to]);
  }
  return found;
}

/** Whether any of the curves comes into a rectangle or touches its edge. */
export const touches = (curves: readonly CubicBezier[], rect: Rect): boolean =>
  curves.some((curve) => spans(curve, rect).length > 0);

const same = (a: Point, b: Point): boolean => Math.abs(a.x - b.x) < 1e-9 && Math.abs(a.y - b.y) < 1e-9;

/** The stretches of a chain inside a rectangle. A chain that lies inside whole is one run. */
export function clip(curves: readonly CubicBezier[], rect: Rect): Run[] {
  const runs: { curves: CubicBezier[]; from: number }[] = [];
  let along = 0;
  for (const curve of curves) {
    for (const [from, to] of spans(curve, rect)) {
      const piece = part(curve, from, to);
      const open = runs.at(-1);
      if (open && from === 0 && same(open.curves.at(-1)![3], piece[0])) open.curves.push(piece);
      else runs.push({ curves: [piece], from: along + (from === 0 ? 0 : curveLength(part(curve, 0, from))) });
    }
    along += curveLength(curve);
  }
  return runs;
}

/** Whether a point lies inside closed outlines: an odd number of them is crossed on the way out to the right. */
export function isInside(outlines: readonly (readonly CubicBezier[])[], { x, y }: Point): boolean {
  let crossed = 0;
  for (const curve of outlines.flat())
    for (const t of passes(down(curve), y)) if (pointOn(curve, t).x > x) crossed++;
  return crossed % 2 === 1;
}

export const shiftCurve = (curve: CubicBezier, dx: number, dy: number): CubicBezier => {
  const [a, b, c, d] = curve.map(({ x, y }) => ({ x: x + dx, y: y + dy }));
  return [a!, b!, c!, d!];
};
