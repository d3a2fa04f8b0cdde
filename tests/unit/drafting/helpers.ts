import fc from "fast-check";
import { defaultBeside, defaultMarks, defaultNotches, draftBasicSleeve, INCH } from "@/lib/drafting";
import {
  type CubicBezier,
  type Point,
  type Result,
  type SleeveDraft,
  type SleeveFigures,
} from "@/lib/drafting";

export const inches = (n: number) => n * INCH;

/** A sleeve with the default marks. Lengths in mm. */
export function figures(
  biceps: number,
  capDepth: number,
  length = capDepth + 100,
  hem = biceps * 0.8,
): SleeveFigures {
  return {
    length,
    capDepth,
    biceps,
    hem,
    beside: defaultBeside(biceps),
    ...defaultMarks(biceps, capDepth),
    notches: defaultNotches(biceps),
  };
}

export function value<T>(result: Result<T>): T {
  if (!result.ok) throw new Error(JSON.stringify(result.problems));
  return result.value;
}

export const draft = (f: SleeveFigures): SleeveDraft => value(draftBasicSleeve(f));

/** The child's sleeve of the hand practice. */
export const child = figures(inches(12), inches(6.25), inches(8), inches(11));

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

/** Infant to large adult, from a flat cap to a deep one. */
export const human = fc
  .record({
    biceps: between(170, 620),
    cap: between(0.12, 0.6),
    under: between(30, 500),
    taper: between(0.5, 1.2),
  })
  .map(({ biceps, cap, under, taper }) =>
    figures(biceps, biceps * cap, biceps * cap + under, biceps * taper),
  );

/** Marks as a hand might change them: up to a fifth of the guide line along and a quarter inch in twelve out or in. */
export const anyMarks = fc
  .record({
    base: human,
    along: fc.array(between(-0.2, 0.2), { minLength: 6, maxLength: 6 }),
    out: fc.array(between(-1 / 48, 1 / 48), { minLength: 6, maxLength: 6 }),
  })
  .map(({ base, along, out }): SleeveFigures => {
    const moved = (marks: SleeveFigures["front"], from: number) =>
      marks
        .map((m, i) => ({ share: m.share + along[from + i]!, out: m.out + out[from + i]! * base.biceps }))
        .sort((a, b) => a.share - b.share);
    return { ...base, front: moved(base.front, 0), back: moved(base.back, 3) };
  });

/** Points evenly spread in the parameter, by de Casteljau, so that no library of the engine measures itself. */
export function sample(curve: CubicBezier, steps: number): Point[] {
  return Array.from({ length: steps + 1 }, (_, i) => {
    let points: Point[] = [...curve];
    const t = i / steps;
    while (points.length > 1) {
      points = points.slice(1).map((p, j) => ({
        x: points[j]!.x + (p.x - points[j]!.x) * t,
        y: points[j]!.y + (p.y - points[j]!.y) * t,
      }));
    }
    return points[0]!;
  });
}

/** Signed curvature at t, 1/mm, straight from the control points. */
export function curvature([a, b, c, d]: CubicBezier, t: number): number {
  const s = 1 - t;
  const first = (k: "x" | "y") =>
    3 * (s * s * (b[k] - a[k]) + 2 * s * t * (c[k] - b[k]) + t * t * (d[k] - c[k]));
  const second = (k: "x" | "y") => 6 * (s * (c[k] - 2 * b[k] + a[k]) + t * (d[k] - 2 * c[k] + b[k]));
  const [dx, dy] = [first("x"), first("y")];
  return (dx * second("y") - dy * second("x")) / Math.hypot(dx, dy) ** 3;
}

export function edge(d: SleeveDraft, name: SleeveDraft["piece"]["edges"][number]["name"]) {
  return d.piece.edges.find((e) => e.name === name)!;
}

export const svgPath = (curves: readonly CubicBezier[]) =>
  curves
    .map(([a, b, c, d], i) => `${i === 0 ? `M${a.x} ${a.y}` : ""}C${b.x} ${b.y} ${c.x} ${c.y} ${d.x} ${d.y}`)
    .join("");
