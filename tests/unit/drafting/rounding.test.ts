import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { makeSleeve, remakeSleeve, roundFigures, type SleeveFigures } from "@/lib/drafting";
import { guideLine } from "@/lib/drafting/guide";
import { draft, human, inches } from "./helpers";

const STEPS = [inches(1 / 8), inches(1 / 16), 1];

const isMultiple = (n: number, step: number) => Math.abs(n / step - Math.round(n / step)) < 1e-6;

/** Every distance a hand measures. */
function distances(f: SleeveFigures): number[] {
  const marks = (["front", "back"] as const).flatMap((side) => {
    const { length } = guideLine(f, side);
    return f[side].flatMap(({ share, out }) => [share * length, out]);
  });
  return [f.length, f.capDepth, f.biceps / 2, f.hem / 2, f.beside, f.notches.front, f.notches.back, ...marks];
}

describe("roundFigures", () => {
  it("leaves every distance on a mark of the tape, none moved by more than half a step", () => {
    fc.assert(
      fc.property(human, fc.constantFrom(...STEPS), (f, step) => {
        const before = distances(f);
        for (const [i, d] of distances(roundFigures(f, step)).entries()) {
          expect(isMultiple(d, step)).toBe(true);
          // Half a step and 1e-9 mm of float noise.
          expect(Math.abs(d - before[i]!)).toBeLessThanOrEqual(step / 2 + 1e-9);
        }
      }),
    );
  });

  it("does nothing the second time", () => {
    fc.assert(
      fc.property(human, fc.constantFrom(...STEPS), (f, step) => {
        const once = roundFigures(f, step);
        const twice = distances(roundFigures(once, step));
        // 1e-9 mm of float noise.
        for (const [i, d] of distances(once).entries()) expect(twice[i]).toBeCloseTo(d, 9);
      }),
    );
  });

  it("moves each half of the cap by less than two steps, and still gives a fair seam", () => {
    fc.assert(
      fc.property(human, fc.constantFrom(...STEPS), (f, step) => {
        const [a, b] = [draft(f).lengths, draft(roundFigures(f, step)).lengths];
        // Two steps: half a step each of depth and half width along the seam, and as much again from the marks.
        expect(Math.abs(a.capFront - b.capFront)).toBeLessThan(2 * step);
        expect(Math.abs(a.capBack - b.capBack)).toBeLessThan(2 * step);
      }),
      { numRuns: 300 },
    );
  });

  it("keeps the walk of a solved sleeve within four steps, and reports the walk of the rounded one", () => {
    const ask = { length: 580, biceps: 371, hem: 233, armhole: { front: 205, back: 211 }, headEase: 32 };
    const made = makeSleeve(ask);
    if (!made.ok) throw new Error("this sleeve can be drawn");
    for (const step of STEPS) {
      const again = remakeSleeve(ask, roundFigures(made.figures, step));
      if (!again.ok) throw new Error("rounding must not spoil it");
      const ease = again.checks.find(({ id }) => id === "head-ease")!;
      // Exact: the check reads the redrawn seam, not the figures it was solved from.
      expect(ease.value).toBe(again.draft.lengths.cap - 416);
      // Four steps: two for each half.
      expect(Math.abs(ease.value - 32)).toBeLessThan(4 * step);
    }
  });
});
