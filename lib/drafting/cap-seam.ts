/**
 * The cap seam: one fair chain of cubics through the underarm point, the guide marks and the crown.
 *
 * Worked in the frame of one half: p runs inward from the underarm point, q upward from the cap line, so that
 * the front and the back are drawn by the same hand. Directions are slopes from the level. A seam a cutter would
 * cut leaves the underarm level, steepens through the hollow, turns over once, and flattens to the level at the
 * crown; hence slopes that rise to one peak and then fall. Everything here keeps to that shape.
 */
import { hobby } from "@/lib/drafting/fair";
import { distance } from "@/lib/drafting/measure";
import { type CubicBezier, type Point } from "@/lib/drafting/types";

/** A knot of the half: x is p, y is q. */
type Knot = Point;

/** Why no such seam runs through the knots. `index` counts knots from 0 at the underarm point. */
export interface CapFault {
  readonly kind: "above-crown" | "below-cap-line" | "overhang" | "wiggle" | "flat";
  readonly index: number;
}

/** The steepest chord that still leaves room to turn over before the upright, radians. */
const STEEPEST = Math.PI / 2 - 0.02;
/** A slope keeps this share of its room away from either neighbouring chord, so that no curve ends up straight. */
const MARGIN = 0.06;
/** A handle shorter than this share of its chord makes a corner that the eye sees and a curve rule cannot draw. */
const SHORTEST_HANDLE = 0.08;

interface Chords {
  readonly slope: number[];
  readonly size: number[];
}

function chordsOf(knots: readonly Knot[]): Chords {
  const slope: number[] = [];
  const size: number[] = [];
  for (let i = 0; i + 1 < knots.length; i++) {
    const dx = knots[i + 1]!.x - knots[i]!.x;
    const dy = knots[i + 1]!.y - knots[i]!.y;
    slope.push(Math.atan2(dy, dx));
    size.push(Math.hypot(dx, dy));
  }
  return { slope, size };
}

/** Fair chain from the underarm point to the crown, or the knot that stands in its way. */
export function capSeam(
  knots: readonly Knot[],
): { readonly chain: CubicBezier[] } | { readonly fault: CapFault } {
  const fault = knotFault(knots);
  if (fault) return { fault };
  const chain = capChain(knots);
  for (const [i, [a, b, c, d]] of chain.entries()) {
    const least = SHORTEST_HANDLE * distance(a, d);
    if (distance(c, d) < least) return { fault: { kind: "flat", index: Math.max(i, 1) } };
    if (distance(a, b) < least) return { fault: { kind: "flat", index: Math.min(i + 1, knots.length - 2) } };
  }
  const extra = secondTurn(chain);
  if (extra !== undefined)
    return { fault: { kind: "flat", index: Math.min(Math.max(extra, 1), knots.length - 2) } };
  return { chain };
}

/**
 * The curve on which the chain turns over a second time, if there is one. Exact: the bend of a cubic, B′ × B″, is a
 * quadratic of its parameter, so its signs on 0..1 are those at the two ends and at its peak.
 */
function secondTurn(chain: readonly CubicBezier[]): number | undefined {
  const signs: { readonly sign: number; readonly index: number }[] = [];
  for (const [index, [a, b, c, d]] of chain.entries()) {
    const [u, v, w] = [step(a, b), step(b, c), step(c, d)];
    const [start, middle, end] = [cross(u, v), cross(u, w) / 2, cross(v, w)];
    const curve = start - 2 * middle + end;
    const peak = (start - middle) / curve;
    const bends = [start, ...(peak > 0 && peak < 1 ? [start + (middle - start) * peak] : []), end];
    // Bends this small against the chord are straight to any eye, and their sign is float noise.
    const noise = 1e-6 * distance(a, d) ** 2;
    for (const bend of bends) {
      if (Math.abs(bend) > noise && Math.sign(bend) !== signs.at(-1)?.sign)
        signs.push({ sign: Math.sign(bend), index });
    }
  }
  return signs[2]?.index;
}

function step(a: Point, b: Point): Point {
  return { x: b.x - a.x, y: b.y - a.y };
}

function cross(a: Point, b: Point): number {
  return a.x * b.y - a.y * b.x;
}

function knotFault(knots: readonly Knot[]): CapFault | undefined {
  const top = knots.at(-1)!.y;
  for (let i = 1; i + 1 < knots.length; i++) {
    if (knots[i]!.y >= top) return { kind: "above-crown", index: i };
    if (knots[i]!.y <= 0) return { kind: "below-cap-line", index: i };
  }
  const { slope } = chordsOf(knots);
  let turned = false;
  for (const [i, s] of slope.entries()) {
    const upper = Math.min(i + 1, knots.length - 2);
    if (s > STEEPEST) return { kind: "overhang", index: upper };
    if (s <= 0) return { kind: "wiggle", index: upper };
    if (i === 0) continue;
    if (s < slope[i - 1]!) turned = true;
    // A second hollow above the turn: this mark stands too far in, or its neighbours too far out.
    else if (s > slope[i - 1]! && turned) return { kind: "wiggle", index: i };
  }
  return undefined;
}

/**
 * The chain from the underarm point to the crown, in the half's own frame. Always returns a chain, level at both
 * ends, with the knots as they come; `capSeam` says whether a cutter would have it.
 *
 * Slopes at the knots solve the mock-curvature equations of J. D. Hobby, "Smooth, easy to compute interpolating
 * splines" (1986), whose handle lengths are used too; then slopes are held between those of the neighbouring chords and
 * handles within the triangle of their tangents, which makes an extra wiggle impossible and not only unlikely.
 */
export function capChain(knots: readonly Knot[]): CubicBezier[] {
  const chords = chordsOf(knots);
  const slopes = holdShape(knotSlopes(chords), chords);
  const peak = steepest(chords);
  return chords.slope.map((slope, i) =>
    segment([knots[i]!, knots[i + 1]!], { slope, size: chords.size[i]!, turnsOver: i === peak }, [
      slopes[i]!,
      slopes[i + 1]!,
    ]),
  );
}

/** Tridiagonal system for the slopes, level at both ends, by the Thomas algorithm. */
function knotSlopes({ slope, size }: Chords): number[] {
  const n = slope.length;
  const result = new Array<number>(n + 1).fill(0);
  const upper: number[] = [0];
  const right: number[] = [0];
  for (let i = 1; i < n; i++) {
    const before = 1 / size[i - 1]!;
    const after = 1 / size[i]!;
    const pivot = 2 * (before + after) - before * upper[i - 1]!;
    upper[i] = after / pivot;
    right[i] = (3 * (slope[i - 1]! * before + slope[i]! * after) - before * right[i - 1]!) / pivot;
  }
  for (let i = n - 1; i > 0; i--) result[i] = right[i]! - upper[i]! * result[i + 1]!;
  return result;
}

/**
 * Below the steepest chord each slope lies between its two chords' slopes, rising; above it, falling. Of the two
 * ends of the steepest chord one may be steeper than it: then the seam turns over at that knot instead of inside.
 */
function holdShape(free: readonly number[], chords: Chords): number[] {
  const { slope } = chords;
  const held = [...free];
  const n = slope.length;
  const peak = steepest(chords);
  for (let i = 1; i < n; i++) {
    const before = slope[i - 1]!;
    const after = slope[i]!;
    const margin = MARGIN * Math.abs(after - before);
    const low = Math.min(before, after) + margin;
    const high = i === peak || i === peak + 1 ? Math.PI / 2 : Math.max(before, after) - margin;
    held[i] = Math.min(high, Math.max(low, free[i]!));
  }
  if (peak > 0 && peak + 1 < n && held[peak]! > slope[peak]! && held[peak + 1]! > slope[peak]!) {
    const milder = held[peak]! < held[peak + 1]! ? peak : peak + 1;
    held[milder] = slope[peak]!;
  }
  return held;
}

function steepest({ slope }: Chords): number {
  return slope.indexOf(Math.max(...slope));
}

/**
 * One cubic with Hobby's handle lengths, cut back where they would make a second turn or pass the upright. The
 * chord on which the seam turns over keeps its handles: there one turn is what is wanted.
 */
function segment(
  [a, b]: readonly [Knot, Knot],
  { slope, size, turnsOver }: { slope: number; size: number; turnsOver: boolean },
  [from, to]: readonly [number, number],
): CubicBezier {
  const theta = from - slope;
  const phi = slope - to;
  let first = size * hobby(theta, phi);
  let second = size * hobby(phi, theta);
  if (theta * phi > 0 && !turnsOver) {
    const turn = Math.sin(theta + phi);
    first = Math.min(first, (size * Math.sin(phi)) / turn);
    second = Math.min(second, (size * Math.sin(theta)) / turn);
  }
  const across = first * Math.cos(from) + second * Math.cos(to);
  const up = first * Math.sin(from) + second * Math.sin(to);
  const room = Math.min(1, (b.x - a.x) / across, (b.y - a.y) / up);
  if (room > 0) {
    first *= room;
    second *= room;
  }
  return [
    a,
    { x: a.x + first * Math.cos(from), y: a.y + first * Math.sin(from) },
    { x: b.x - second * Math.cos(to), y: b.y - second * Math.sin(to) },
    b,
  ];
}
