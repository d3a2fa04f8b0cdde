/** A fair curve through points, as a hand draws it with the curve rule: no corner, bent no more than it must be. */
import { type CubicBezier, type Point } from "@/lib/drafting/types";

/**
 * Cubics through `points` that leave and arrive in the given directions (any length); left free to leave as it will, the
 * first of them bends evenly. Slopes solve the mock-curvature equations of J. D. Hobby, "Smooth, easy to compute
 * interpolating splines" (1986), tension 1. Wants two points or more, none the same as the one before.
 */
export function fairCurve(
  points: readonly Point[],
  leaving: Point | undefined,
  arriving: Point,
): CubicBezier[] {
  const angles = knotAngles(points, leaving, arriving);
  return angles.map((_, k) => segment(points, angles, k, Infinity));
}

/**
 * The same for points that turn one way all along, the arriving direction too: the curve then turns that way only. Slopes
 * are held between those of the two chords, and handles within the triangle of their tangents.
 */
export function bowCurve(
  points: readonly Point[],
  leaving: Point | undefined,
  arriving: Point,
): CubicBezier[] {
  const free = knotAngles(points, leaving, arriving);
  const held = free.map((knot, k) => {
    const after = free[k + 1];
    if (!after) return knot;
    // On to the next chord the direction has `theta` of its turn to go, and `phi` of it is done.
    const turned = -(knot.phi + after.theta);
    const phi = -turned * Math.min(1 - KEPT, Math.max(KEPT, -knot.phi / turned || 0));
    return { ...knot, phi };
  });
  const angles = held.map((knot, k) => {
    const before = held[k - 1];
    if (before) return { ...knot, theta: free[k]!.theta + free[k - 1]!.phi - before.phi };
    return leaving ? knot : { ...knot, theta: knot.phi };
  });
  return angles.map(({ theta, phi }, k) => segment(points, angles, k, Math.sin(theta + phi)));
}

/** A slope keeps this share of the turn away from either neighbouring chord, so that no curve ends up straight. */
const KEPT = 0.06;

/** A chord, and the angles that the curve over it makes with it at its start and at its end, radians. */
interface ChordAngles {
  readonly angle: number;
  readonly size: number;
  readonly theta: number;
  readonly phi: number;
}

function knotAngles(points: readonly Point[], leaving: Point | undefined, arriving: Point): ChordAngles[] {
  const chords = points.slice(1).map((point, i) => {
    const [dx, dy] = [point.x - points[i]!.x, point.y - points[i]!.y];
    return { angle: Math.atan2(dy, dx), size: Math.hypot(dx, dy) };
  });
  const n = chords.length;
  /** How the path turns at a point, for 1 to n - 1. */
  const turn = (k: number) => wrapped(chords[k]!.angle - chords[k - 1]!.angle);
  const first = leaving && wrapped(Math.atan2(leaving.y, leaving.x) - chords[0]!.angle);
  const last = wrapped(chords[n - 1]!.angle - Math.atan2(arriving.y, arriving.x));
  const thetas = slopes(
    chords.map((chord) => chord.size),
    chords.map((_, k) => (k === 0 ? 0 : turn(k))),
    first,
    last,
  );
  return chords.map((chord, k) => ({
    ...chord,
    theta: thetas[k]!,
    phi: k === n - 1 ? last : -turn(k + 1) - thetas[k + 1]!,
  }));
}

/** One cubic with Hobby's handles; where the sine of the whole turn is given, both stay within the triangle of tangents. */
function segment(
  points: readonly Point[],
  angles: readonly ChordAngles[],
  k: number,
  sine: number,
): CubicBezier {
  const { angle, size, theta, phi } = angles[k]!;
  const [a, b] = [points[k]!, points[k + 1]!];
  const within = (handle: number, other: number) =>
    Number.isFinite(sine) && other / sine > 0 ? Math.min(handle, other / sine) : handle;
  const out = size * within(hobby(theta, phi), Math.sin(phi));
  const back = size * within(hobby(phi, theta), Math.sin(theta));
  return [
    a,
    { x: a.x + out * Math.cos(angle + theta), y: a.y + out * Math.sin(angle + theta) },
    { x: b.x - back * Math.cos(angle - phi), y: b.y - back * Math.sin(angle - phi) },
    b,
  ];
}

/** Angles between each chord and the curve that leaves along it: a tridiagonal system, by the Thomas algorithm. */
function slopes(
  sizes: readonly number[],
  turns: readonly number[],
  first: number | undefined,
  last: number,
): number[] {
  const n = sizes.length;
  if (first === undefined && n === 1) return [last];
  // A free end meets its chord at the same angle as the other end of that curve does.
  const upper: number[] = [first === undefined ? 1 : 0];
  const right: number[] = [first ?? -turns[1]!];
  for (let k = 1; k < n; k++) {
    const [before, after] = [1 / sizes[k - 1]!, 1 / sizes[k]!];
    const next = k === n - 1 ? after * last : -after * turns[k + 1]!;
    const pivot = 2 * (before + after) - before * upper[k - 1]!;
    upper[k] = k === n - 1 ? 0 : after / pivot;
    right[k] = (-2 * before * turns[k]! + next - before * right[k - 1]!) / pivot;
  }
  const result = [...right];
  for (let k = n - 2; k >= 0; k--) result[k] = right[k]! - upper[k]! * result[k + 1]!;
  return result;
}

/** An angle brought between -π and π. */
function wrapped(angle: number): number {
  return angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));
}

/** Hobby's velocity function, tension 1: the length of a handle as a share of the chord. */
export function hobby(theta: number, phi: number): number {
  const [st, ct, sp, cp] = [Math.sin(theta), Math.cos(theta), Math.sin(phi), Math.cos(phi)];
  const shape = Math.SQRT2 * (st - sp / 16) * (sp - st / 16) * (ct - cp);
  const spread = 1 + ((Math.sqrt(5) - 1) / 2) * ct + ((3 - Math.sqrt(5)) / 2) * cp;
  return (2 + shape) / (3 * spread);
}

/** Radius of the tightest bend of a chain, mm, looked for at 33 places of each curve, both ends among them. */
export function tightestBend(curves: readonly CubicBezier[]): number {
  const places = Array.from({ length: 33 }, (_, i) => i / 32);
  return Math.min(...curves.flatMap((curve) => places.map((t) => bendAt(curve, t))));
}

/** |B′|³ / |B′ × B″|; infinite where the curve runs straight. */
function bendAt([a, b, c, d]: CubicBezier, t: number): number {
  const s = 1 - t;
  const rate = (k: "x" | "y") =>
    3 * (s * s * (b[k] - a[k]) + 2 * s * t * (c[k] - b[k]) + t * t * (d[k] - c[k]));
  const turn = (k: "x" | "y") => 6 * (s * (c[k] - 2 * b[k] + a[k]) + t * (d[k] - 2 * c[k] + b[k]));
  const [dx, dy] = [rate("x"), rate("y")];
  return Math.hypot(dx, dy) ** 3 / Math.abs(dx * turn("y") - dy * turn("x"));
}
