/** A closed ring that crosses itself, brought back to its simple outer boundary. */
import { distance } from "@/lib/drafting/measure";
import { at, cross, isStraight, part } from "@/lib/drafting/ray";
import { type CubicBezier, type Point } from "@/lib/drafting/types";

/** A curve of a ring and the name of the edge it belongs to. */
export interface Stretch {
  readonly name: string;
  readonly curve: CubicBezier;
}

/** Crossings are looked for on polylines this near the curves, mm, nearer on tiny ones, and then found on the curves. */
const FLAT = 0.002;
/**
 * The polylines' points are moved by up to so much, mm: strands that lie on one another, or end on one another, then cross
 * a whole number of times and not by halves. Far less than any line is wide, far more than float noise.
 */
const JITTER = 1e-6;

interface Chord {
  readonly a: Point;
  readonly b: Point;
  /** Place on the ring: number of the curve and its parameter, added. */
  readonly from: number;
  readonly to: number;
}

/** A place on the ring as the polyline has it, which gives the order, and on the curve itself. */
interface Place {
  readonly rough: number;
  readonly exact: number;
}

/**
 * Runs clockwise along the ring from a place on its outside and changes over to the other strand at every crossing: that
 * way the outside stays on the left, so that loops at tight hollows and strands under other strands fall away. What
 * encloses a hole is filled. A ring that does not cross itself comes back as it is.
 */
export function outerRing(ring: readonly Stretch[]): Stretch[] {
  const chords = flattened(ring);
  const jumps = crossingsOf(ring, chords)
    .flatMap(([one, other]) => [
      { at: one, to: other },
      { at: other, to: one },
    ])
    .sort((m, n) => m.at.rough - n.at.rough);
  if (jumps.length === 0) return [...ring];
  const start = outermost(chords);
  const kept: Stretch[] = [];
  let place: Place = { rough: start, exact: start };
  for (let guard = 0; guard <= jumps.length; guard++) {
    const from = place.rough;
    const next = jumps.find(({ at }) => at.rough > from) ?? jumps[0]!;
    const to = next.at.rough;
    const passes = to > from ? from < start && start <= to : from < start || start <= to;
    if (passes && (guard > 0 || to === from))
      return joined([...kept, ...between(ring, place, { rough: start, exact: start })]);
    kept.push(...between(ring, place, next.at));
    place = next.to;
  }
  throw new Error("The cutting line does not come back to where it started");
}

function flattened(ring: readonly Stretch[]): Chord[] {
  const points = ring.flatMap(({ curve }, i) => {
    const [a, b, c, d] = curve;
    const bend = Math.max(
      Math.hypot(a.x - 2 * b.x + c.x, a.y - 2 * b.y + c.y),
      Math.hypot(b.x - 2 * c.x + d.x, b.y - 2 * c.y + d.y),
    );
    // A chord of 1/n of a cubic lies within 6·bend / 8n² of it.
    const flat = Math.min(FLAT, FLAT * (distance(a, b) + distance(b, c) + distance(c, d)));
    const n = isStraight(curve) ? 1 : Math.max(2, Math.ceil(Math.sqrt((0.75 * bend) / flat)));
    return Array.from({ length: n }, (_, k) => ({ place: i + k / n, point: at(curve, k / n) }));
  });
  const moved = points.map(({ place, point }, i) => ({
    place,
    point: { x: point.x + jitter(2 * i), y: point.y + jitter(2 * i + 1) },
  }));
  return moved.map(({ place, point }, i): Chord => {
    const next = moved[i + 1] ?? { place: ring.length, point: moved[0]!.point };
    return { a: point, b: next.point, from: place, to: next.place };
  });
}

/** Always the same for the same number, and without a pattern that outlines share: the golden ratio's multiples. */
function jitter(n: number): number {
  return (((n + 1) * 0.6180339887498949) % 1) * 2 * JITTER - JITTER;
}

/** A place that no strand lies outside of: farthest in some direction; the start of a curve where one is to be had. */
function outermost(chords: readonly Chord[]): number {
  let found: number | undefined;
  for (let k = 0; k < 16; k++) {
    const angle = (k * Math.PI) / 8 - Math.PI / 2;
    const [x, y] = [Math.cos(angle), Math.sin(angle)];
    const out = ({ a }: Chord) => a.x * x + a.y * y;
    const { from } = chords.reduce((best, chord) => (out(chord) > out(best) ? chord : best));
    if (Number.isInteger(from)) return from;
    found ??= from;
  }
  return found!;
}

function crossingsOf(ring: readonly Stretch[], chords: readonly Chord[]): [Place, Place][] {
  const low = ({ a, b }: Chord) => Math.min(a.x, b.x);
  const order = chords.map((chord, index) => ({ chord, index })).sort((p, q) => low(p.chord) - low(q.chord));
  const found: [Place, Place][] = [];
  for (const [i, p] of order.entries()) {
    const right = Math.max(p.chord.a.x, p.chord.b.x);
    for (let j = i + 1; j < order.length && low(order[j]!.chord) <= right; j++) {
      const q = order[j]!;
      const apart = Math.abs(p.index - q.index);
      if (apart <= 1 || apart === chords.length - 1) continue;
      const rough = chordsCross(p.chord, q.chord);
      if (rough) found.push(refined(ring, rough));
    }
  }
  return found;
}

function chordsCross(p: Chord, q: Chord): [number, number] | undefined {
  const u = { x: p.b.x - p.a.x, y: p.b.y - p.a.y };
  const v = { x: q.b.x - q.a.x, y: q.b.y - q.a.y };
  const gap = { x: q.a.x - p.a.x, y: q.a.y - p.a.y };
  const turn = cross(u, v);
  if (turn === 0) return undefined;
  const [s, t] = [cross(gap, v) / turn, cross(gap, u) / turn];
  if (!(s >= 0 && s < 1 && t >= 0 && t < 1)) return undefined;
  return [p.from + s * (p.to - p.from), q.from + t * (q.to - q.from)];
}

function placed(ring: readonly Stretch[], place: number): { point: Point; rate: Point } {
  const whole = wrapped(place, ring.length);
  const index = Math.min(Math.floor(whole), ring.length - 1);
  const t = whole - index;
  const [a, b, c, d] = ring[index]!.curve;
  const s = 1 - t;
  const rate = (k: "x" | "y") =>
    3 * (s * s * (b[k] - a[k]) + 2 * s * t * (c[k] - b[k]) + t * t * (d[k] - c[k]));
  return { point: at(ring[index]!.curve, t), rate: { x: rate("x"), y: rate("y") } };
}

/** Newton's steps on both places at once. Where strands only touch, the polylines' crossing is near enough. */
function refined(ring: readonly Stretch[], rough: readonly [number, number]): [Place, Place] {
  let [one, other] = rough;
  for (let step = 0; step < 20; step++) {
    const [p, q] = [placed(ring, one), placed(ring, other)];
    const gap = { x: q.point.x - p.point.x, y: q.point.y - p.point.y };
    if (Math.hypot(gap.x, gap.y) < 1e-9) break;
    const turn = cross(p.rate, q.rate);
    one += cross(gap, q.rate) / turn;
    other += cross(gap, p.rate) / turn;
    // Also where the two run side by side and the step is no number.
    if (!(Math.abs(one - rough[0]) < 0.1 && Math.abs(other - rough[1]) < 0.1)) {
      [one, other] = rough;
      break;
    }
  }
  return [
    { rough: rough[0], exact: one },
    { rough: rough[1], exact: other },
  ];
}

const wrapped = (place: number, round: number) => ((place % round) + round) % round;

/** The ring from one place onward to another, past its start where need be. */
function between(ring: readonly Stretch[], from: Place, to: Place): Stretch[] {
  const round = ring.length;
  const rough = wrapped(to.rough - from.rough, round);
  const exact = wrapped(to.exact - from.exact, round);
  // Two crossings so near each other that the curves have them the other way round.
  if (exact - rough > round / 2) return [];
  const start = wrapped(from.exact, round);
  const end = start + exact;
  const found: Stretch[] = [];
  for (let i = Math.floor(start); i < end; i++) {
    const { name, curve } = ring[i % round]!;
    const [low, high] = [Math.max(0, start - i), Math.min(1, end - i)];
    if (high - low > 1e-9) found.push({ name, curve: part(curve, low, high) });
  }
  return found;
}

/** Each curve made to start where the one before ends, to the last digit. */
export function joined(ring: readonly Stretch[]): Stretch[] {
  const real = ring.filter(({ curve: [a, b, c, d] }) => [b, c, d].some((point) => distance(a, point) > 1e-7));
  return real.map(({ name, curve: [a, b, c, d] }, i) => {
    const start = real.at(i - 1)!.curve[3];
    const shift = { x: start.x - a.x, y: start.y - a.y };
    return { name, curve: [start, { x: b.x + shift.x, y: b.y + shift.y }, c, d] };
  });
}
