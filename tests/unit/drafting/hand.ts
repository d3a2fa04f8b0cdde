/** Draws from printed steps alone, as a hand does. Nothing of the engine is called. */
import { INCH, type LineName, type MarkStep, type Phrase, type Point, type PointName } from "@/lib/drafting";

export const EIGHTH = INCH / 8;

/** A printed sheet: whole inches and eighths, as "5 3/8". */
export function print(phrase: Phrase): string {
  const length = (mm: number) => {
    const eighths = Math.round(mm / EIGHTH);
    const [whole, rest] = [Math.floor(eighths / 8), eighths % 8];
    return [whole || rest === 0 ? `${whole}` : "", rest ? `${rest}/8` : ""].filter(Boolean).join(" ");
  };
  return phrase.map((part) => (typeof part === "string" ? part : length(part.mm))).join("");
}

export function read(text: string): number[] {
  return [...text.matchAll(/(\d+) (\d)\/8|(\d)\/8|(\d+)/g)].map(([, whole, part, only, plain]) => {
    if (whole) return (Number(whole) + Number(part) / 8) * INCH;
    return only ? (Number(only) / 8) * INCH : Number(plain) * INCH;
  });
}

/** Draws the sleeve as a hand does, from the printed steps alone: nothing of the engine is called. */
export function redraw(steps: readonly MarkStep[]) {
  const points = new Map<PointName, Point>([["crown", { x: 0, y: 0 }]]);
  const lines = new Map<LineName, Point>([["centre", { x: 0, y: 1 }]]);
  const curves: PointName[][] = [];
  const checks: { through: PointName[]; tape: number }[] = [];
  const at = (name: PointName) => {
    const found = points.get(name);
    if (!found) throw new Error(`${name} is used before it is on the paper`);
    return found;
  };
  for (const step of steps) {
    const [distance] = read(print(step.phrase));
    for (const move of step.moves) {
      if (move.makes.startsWith("notch")) continue;
      const from = at(move.from);
      let way = lines.get(move.line);
      if (!way) throw new Error(`${move.line} is used before it is drawn`);
      if (move.how === "along" && move.toward) {
        const to = at(move.toward);
        const sense = Math.sign((to.x - from.x) * way.x + (to.y - from.y) * way.y);
        way = { x: way.x * sense, y: way.y * sense };
      }
      if (move.how === "square") {
        const square = { x: way.y, y: -way.x };
        // The sleeve lies below its guide lines, so raised is the square that goes up.
        const sense =
          move.side === "front" || move.side === "back"
            ? Math.sign(square.x) * (move.side === "front" ? -1 : 1)
            : -Math.sign(square.y) * (move.side === "raised" ? 1 : -1);
        way = { x: square.x * sense, y: square.y * sense };
      }
      points.set(move.makes, { x: from.x + way.x * distance!, y: from.y + way.y * distance! });
    }
    if (step.kind === "join") {
      for (const [i, names] of step.through.entries()) {
        const [a, b] = [at(names[0]!), at(names.at(-1)!)];
        const size = Math.hypot(b.x - a.x, b.y - a.y);
        lines.set(step.draws[i]!.name, { x: (b.x - a.x) / size, y: (b.y - a.y) / size });
      }
    }
    if (step.kind === "curve") curves.push([...step.through[0]!]);
    if (step.kind === "check" && step.through.length > 0)
      checks.push({ through: [...step.through[0]!], tape: distance! });
  }
  return { points, curves, checks, at };
}

/**
 * A curve of the hand through points, as a fine polyline: cubic Hermite by chord length, each slope that of the circle through
 * a point and its neighbours. Level at both ends unless told otherwise. Another method than the engine's, so the steps must
 * carry the shape.
 */
export function handCurve(points: readonly Point[], leaving?: Point, arriving?: Point): Point[] {
  const n = points.length;
  const chord = points.slice(1).map((p, i) => Math.hypot(p.x - points[i]!.x, p.y - points[i]!.y));
  const unit = (v: Point) => ({ x: v.x / Math.hypot(v.x, v.y), y: v.y / Math.hypot(v.x, v.y) });
  const level = unit({ x: points[n - 1]!.x - points[0]!.x, y: 0 });
  const slope = points.map((p, i) => {
    if (i === 0) return unit(leaving ?? level);
    if (i === n - 1) return unit(arriving ?? level);
    const [a, b] = [chord[i - 1]!, chord[i]!];
    const [before, after] = [points[i - 1]!, points[i + 1]!];
    const mix = (k: "x" | "y") => ((p[k] - before[k]) * b) / a + ((after[k] - p[k]) * a) / b;
    return unit({ x: mix("x"), y: mix("y") });
  });
  const drawn: Point[] = [points[0]!];
  for (let i = 0; i + 1 < n; i++) {
    for (let s = 1; s <= 200; s++) {
      const t = s / 200;
      const [h0, h1] = [(1 + 2 * t) * (1 - t) ** 2, t * t * (3 - 2 * t)];
      const [g0, g1] = [t * (1 - t) ** 2 * chord[i]!, t * t * (t - 1) * chord[i]!];
      const k = (c: "x" | "y") =>
        h0 * points[i]![c] + g0 * slope[i]![c] + h1 * points[i + 1]![c] + g1 * slope[i + 1]![c];
      drawn.push({ x: k("x"), y: k("y") });
    }
  }
  return drawn;
}

export function tape(points: readonly Point[]): number {
  return points.slice(1).reduce((sum, p, i) => sum + Math.hypot(p.x - points[i]!.x, p.y - points[i]!.y), 0);
}

/** The point so far along a polyline, and the direction it runs in there. */
export function tapeAt(points: readonly Point[], at: number): { point: Point; direction: Point } {
  let left = at;
  for (let i = 0; i + 1 < points.length; i++) {
    const [a, b] = [points[i]!, points[i + 1]!];
    const size = Math.hypot(b.x - a.x, b.y - a.y);
    if (left <= size || i === points.length - 2) {
      const direction = { x: (b.x - a.x) / size, y: (b.y - a.y) / size };
      return { point: { x: a.x + direction.x * left, y: a.y + direction.y * left }, direction };
    }
    left -= size;
  }
  throw new Error("a polyline wants two points");
}
