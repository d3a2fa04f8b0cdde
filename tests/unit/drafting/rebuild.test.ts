import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { markSteps, roundFigures, type PointName } from "@/lib/drafting";
import { EIGHTH, handCurve, print, read, redraw, tape } from "./hand";
import { child, draft, human, inches, value } from "./helpers";

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
      expect(Math.abs(tape(handCurve(names.map(at))) - drawn)).toBeLessThan(inches(1 / 16));
      expect(Math.abs(tape(handCurve(names.map(at))) - checks[i]!.tape)).toBeLessThan(inches(1 / 8));
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
          expect(Math.abs(tape(handCurve(names.map(at))) - drawn)).toBeLessThan(inches(1 / 8) + 0.01 * drawn);
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
