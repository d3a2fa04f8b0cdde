import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { stripOf } from "@/lib/drafting/strip";
import { inches } from "./helpers";

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const exact = (mm: number) => mm;
const eighth = (mm: number) => Math.round(mm / 3.175) * 3.175;

describe("a strip for gathering", () => {
  it("for 15 in at 2.5 times is 37 1/2 in (arithmetic, exact)", () => {
    const ask = { seam: inches(15), ratio: 2.5, allowance: inches(0.5), near: exact };
    const one = stripOf({ ...ask, clothWidth: inches(45) })!;
    expect(one.parts).toBe(1);
    expect(one.total).toBeCloseTo(inches(37.5), 12);
    // Cloth 36 in wide has 35 in between the seams: two parts of 18 3/4 in.
    const two = stripOf({ ...ask, clothWidth: inches(36) })!;
    expect(two.parts).toBe(2);
    expect(two.part).toBeCloseTo(inches(18.75), 12);
    expect(two.total).toBeCloseTo(inches(37.5), 12);
  });

  it("is just as wide as the cloth where it fills it", () => {
    const ask = { seam: 500, ratio: 2, allowance: 10, near: exact };
    expect(stripOf({ ...ask, clothWidth: 1020 })!.parts).toBe(1);
    expect(stripOf({ ...ask, clothWidth: 1019.9 })!.parts).toBe(2);
  });

  it("has as few equal parts as the cloth allows, each with its seams within the cloth's width", () => {
    fc.assert(
      fc.property(
        real(50, 900),
        real(1, 3),
        real(100, 1600),
        fc.boolean(),
        (seam, ratio, clothWidth, marks) => {
          const near = marks ? eighth : exact;
          const strip = stripOf({ seam, ratio, clothWidth, allowance: 12.7, near })!;
          const most = clothWidth - 25.4;
          expect(strip.part).toBeLessThanOrEqual(most + 1e-6);
          expect(strip.total).toBeCloseTo(strip.parts * strip.part, 9);
          // Half a mark for each part is all that rounding may take or add.
          expect(Math.abs(strip.total - seam * ratio)).toBeLessThanOrEqual(
            (marks ? (strip.parts * 3.175) / 2 : 0) + 1e-9,
          );
          if (strip.parts > 1) expect(near((seam * ratio) / (strip.parts - 1))).toBeGreaterThan(most - 3.175);
          if (strip.parts > 1 && !marks)
            expect((seam * ratio) / (strip.parts - 1)).toBeGreaterThan(most - 1e-6);
        },
      ),
    );
  });

  it("cannot be cut where nothing is left between its seams", () => {
    expect(stripOf({ seam: 300, ratio: 2, clothWidth: 60, allowance: 12.7, near: exact })).toBeUndefined();
  });
});
