import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  INCH,
  markSteps,
  roundFigures,
  type LineName,
  type MarkStep,
  type Phrase,
  type Point,
  type PointName,
} from "@/lib/drafting";
import { child, draft, human, inches, value } from "./helpers";

const EIGHTH = inches(1 / 8);

/** A printed sheet: whole inches and eighths, as "5 3/8". */
function print(phrase: Phrase): string {
  const length = (mm: number) => {
    const eighths = Math.round(mm / EIGHTH);
    const [whole, rest] = [Math.floor(eighths / 8), eighths % 8];
    return [whole || rest === 0 ? `${whole}` : "", rest ? `${rest}/8` : ""].filter(Boolean).join(" ");
  };
  return phrase.map((part) => (typeof part === "string" ? part : length(part.mm))).join("");
}

function read(text: string): number[] {
  return [...text.matchAll(/(\d+) (\d)\/8|(\d)\/8|(\d+)/g)].map(([, whole, part, only, plain]) => {
    if (whole) return (Number(whole) + Number(part) / 8) * INCH;
    return only ? (Number(only) / 8) * INCH : Number(plain) * INCH;
  });
}

/** Draws the sleeve as a hand does, from the printed steps alone: nothing of the engine is called. */
function redraw(steps: readonly MarkStep[]) {
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
 * A curve of the hand through points, level at both ends: cubic Hermite by chord length, each slope that of the circle
 * through a point and its neighbours. Another method than the engine's, so the steps must carry the shape.
 */
function handCurve(points: readonly Point[]): number {
  const n = points.length;
  const chord = points.slice(1).map((p, i) => Math.hypot(p.x - points[i]!.x, p.y - points[i]!.y));
  const unit = (v: Point) => ({ x: v.x / Math.hypot(v.x, v.y), y: v.y / Math.hypot(v.x, v.y) });
  const slope = points.map((p, i) => {
    if (i === 0 || i === n - 1) return unit({ x: points[n - 1]!.x - points[0]!.x, y: 0 });
    const [a, b] = [chord[i - 1]!, chord[i]!];
    const [before, after] = [points[i - 1]!, points[i + 1]!];
    const mix = (k: "x" | "y") => ((p[k] - before[k]) * b) / a + ((after[k] - p[k]) * a) / b;
    return unit({ x: mix("x"), y: mix("y") });
  });
  let length = 0;
  for (let i = 0; i + 1 < n; i++) {
    let last = points[i]!;
    for (let s = 1; s <= 200; s++) {
      const t = s / 200;
      const [h0, h1] = [(1 + 2 * t) * (1 - t) ** 2, t * t * (3 - 2 * t)];
      const [g0, g1] = [t * (1 - t) ** 2 * chord[i]!, t * t * (t - 1) * chord[i]!];
      const k = (c: "x" | "y") =>
        h0 * points[i]![c] + g0 * slope[i]![c] + h1 * points[i + 1]![c] + g1 * slope[i + 1]![c];
      const next = { x: k("x"), y: k("y") };
      length += Math.hypot(next.x - last.x, next.y - last.y);
      last = next;
    }
  }
  return length;
}

describe("the mark-out", () => {
  const long = { ...child, length: 560, hem: 220, elbow: { depth: 320, width: 270 } };

  it.each([
    ["the child's", child],
    ["a long one with an elbow", long],
    ["one with guide lines from the crown itself", { ...child, beside: 0 }],
    [
      "one with a mark on the guide line",
      {
        ...child,
        back: [
          { share: 0.3, out: -8 },
          { share: 0.45, out: 0 },
          { share: 0.75, out: 15 },
        ],
      },
    ],
  ])("rebuilds %s sleeve from its printed steps", (_, f) => {
    const rounded = roundFigures(f, EIGHTH);
    const d = draft(rounded);
    const { points, curves, checks, at } = redraw(value(markSteps(rounded)));
    for (const [name, p] of points) {
      const drawn = d.points[name]!;
      // 1e-6 mm: printed eighths are the rounded figures exactly.
      expect(Math.hypot(p.x - drawn.x, p.y - drawn.y), name).toBeLessThan(1e-6);
    }
    expect(points.size).toBe(
      Object.keys(d.points).filter((n) => d.points[n as PointName] && !/^(notch|grain)/.test(n)).length -
        unprinted(rounded),
    );
    expect(curves).toHaveLength(2);
    expect(checks).toHaveLength(2);
    for (const [i, names] of curves.entries()) {
      const drawn = [d.lengths.capFront, d.lengths.capBack][i]!;
      // 1/16 in between a hand's curve and ours, and half an eighth more against the printed tape check.
      expect(Math.abs(handCurve(names.map(at)) - drawn)).toBeLessThan(inches(1 / 16));
      expect(Math.abs(handCurve(names.map(at)) - checks[i]!.tape)).toBeLessThan(inches(1 / 8));
    }
  });

  it("rebuilds any sleeve: marks exactly, each half of the cap within 1/8 in and 1 % by another hand's curve", () => {
    fc.assert(
      fc.property(human, (f) => {
        const rounded = roundFigures(f, EIGHTH);
        const d = draft(rounded);
        const { points, curves, at } = redraw(value(markSteps(rounded)));
        for (const [name, p] of points) {
          const drawn = d.points[name]!;
          // 1e-6 mm, as above.
          expect(Math.hypot(p.x - drawn.x, p.y - drawn.y), name).toBeLessThan(1e-6);
        }
        for (const [i, names] of curves.entries()) {
          const drawn = [d.lengths.capFront, d.lengths.capBack][i]!;
          expect(Math.abs(handCurve(names.map(at)) - drawn)).toBeLessThan(inches(1 / 8) + 0.01 * drawn);
        }
      }),
      { numRuns: 60 },
    );
  });

  it("has one distance a step, printed first, and uses nothing before it is drawn", () => {
    for (const step of value(markSteps(roundFigures(long, EIGHTH)))) {
      const printed = read(print(step.phrase));
      if (step.distance === undefined) continue;
      // Half an eighth: checks by the tape are printed to the nearest mark.
      expect(Math.abs(printed[0]! - step.distance), print(step.phrase)).toBeLessThanOrEqual(
        EIGHTH / 2 + 1e-9,
      );
    }
  });

  it("says where each curve crosses its guide line", () => {
    const steps = value(markSteps(roundFigures(child, EIGHTH))).filter(({ kind }) => kind === "curve");
    expect(steps).toHaveLength(2);
    for (const step of steps) expect(step.crossesAt).toBeGreaterThan(0);
  });

  it("sets front and back in one step where they are alike", () => {
    const steps = value(markSteps(roundFigures(child, EIGHTH)));
    const raise = steps.filter(({ kind, moves }) => kind === "square" && moves[0]!.makes.startsWith("mark"));
    // First mark: hollowed by different amounts; second raised by different amounts; third alike.
    expect(raise.map(({ bothSides }) => bothSides)).toEqual([false, false, false, false, true]);
  });
});

/** Feet that the hand never sets: a mark on the line is its own foot, and a guide line may start at the crown. */
function unprinted(f: typeof child): number {
  const onLine = [...f.front, ...f.back].filter(({ out }) => out === 0).length;
  return onLine + (f.beside === 0 ? 2 : 0);
}
