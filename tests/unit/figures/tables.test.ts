import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { bodyMeasure, bodyMeasures, fullSet, isMeasureKey, sleeveSet } from "@/lib/figures/body-measures";
import { type AdultMeasure, adultMeasures, armByAge } from "@/lib/figures/reference-tables";
import { armFiguresAt, usualBounds } from "@/lib/figures/usual-bounds";

describe("body measures", () => {
  it("has every ISO 8559 name of the design, once, with a sentence and bounds", () => {
    // Measurement names: ISO 8559 (sources: bodies; seen as a list).
    const names = [
      ...[
        "Shoulder length",
        "Upper arm girth",
        "Elbow girth",
        "Wrist girth",
        "Hand girth",
        "Armscye girth",
        "Arm length",
      ],
      ...["Upper arm length", "Scye depth", "Back width", "Bust girth", "Cervical to waist"],
    ];
    for (const name of names) expect(bodyMeasures.filter((m) => m.name === name)).toHaveLength(1);
    expect(new Set(bodyMeasures.map((m) => m.key)).size).toBe(bodyMeasures.length);
    for (const m of bodyMeasures) {
      expect(m.how).toMatch(/^[A-Z][^.]*\.$/);
      expect(0 < m.leastMm && m.leastMm < m.mostMm).toBe(true);
    }
  });
  it("the sleeve set is part of the full set", () => {
    for (const key of sleeveSet.measures) expect(fullSet.measures).toContain(key);
    expect(isMeasureKey("wristGirth")).toBe(true);
    expect(isMeasureKey("toString")).toBe(false);
  });
});

describe("arm by age (NHANES 2015-16, calc; reference medians WHO and BMJ 2017;358:j3423, seen)", () => {
  it("stands as in the sources, at three rows picked out", () => {
    expect(armByAge.find((r) => r.fromAge === 6)).toMatchObject({
      meanCm: 19.4,
      p5Cm: 16.3,
      p50Cm: 18.5,
      p95Cm: 26.3,
      upperArmLengthCm: 24.8,
      medianCm: 17.4,
    });
    expect(armByAge.find((r) => r.fromAge === 13)).toMatchObject({
      p5Cm: 21.8,
      p95Cm: 35.9,
      upperArmLengthCm: 34.8,
    });
    expect(armByAge.find((r) => r.fromAge === 60)).toMatchObject({ toAge: 69, p5Cm: 24.9, p95Cm: 41.4 });
  });
  it("every row is in order, and holds its reference median", () => {
    for (const r of armByAge) {
      expect(r.p5Cm < r.p50Cm && r.p50Cm < r.p95Cm && r.p5Cm < r.meanCm && r.meanCm < r.p95Cm).toBe(true);
      if (r.medianCm !== undefined) expect(r.p5Cm < r.medianCm && r.medianCm < r.p95Cm).toBe(true);
    }
  });
  it("between two rows goes straight from one to the other", () => {
    expect(armFiguresAt(1)).toBeUndefined();
    expect(armFiguresAt(6.9)).toMatchObject({ p5Cm: 16.3 });
    expect(armFiguresAt(25)).toMatchObject({ p5Cm: 23.7, p95Cm: 41.5 });
    expect(armFiguresAt(100)).toMatchObject({ p5Cm: 23.0 });
    // From 29 (23.7) to 40 (25.3): 34 is 5/11 of the way.
    expect(armFiguresAt(34)!.p5Cm).toBeCloseTo(23.7 + (1.6 * 5) / 11, 9);
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 110 }), (age) => {
        const at = armFiguresAt(age)!;
        expect(at.p5Cm).toBeGreaterThanOrEqual(14.1);
        expect(at.p95Cm).toBeLessThanOrEqual(44.2);
        expect(at.p5Cm).toBeLessThan(at.p95Cm);
      }),
    );
  });
});

describe("usual bounds", () => {
  it("are P5 less 15 % to P95 plus 15 % of the age (sources: bodies, use)", () => {
    const { lowMm, highMm, mark } = usualBounds("upperArmGirth", 6);
    expect(lowMm).toBeCloseTo(163 * 0.85, 9); // NHANES 2015-16, calc
    expect(highMm).toBeCloseTo(263 * 1.15, 9);
    expect(mark).toBe("calc");
  });
  it("are of both sexes for an adult", () => {
    const { lowMm, highMm, mark, source } = usualBounds("wristGirth", 30);
    expect(lowMm).toBeCloseTo(142 * 0.85, 9); // ANSUR II, women P5, seen
    expect(highMm).toBeCloseTo(191 * 1.15, 9); // ANSUR II, men P95, seen
    expect([mark, source]).toEqual(["seen", "US Army survey, ANSUR II, women and men"]);
  });
  it("say so where a percentile is worked out from the spread", () => {
    const { highMm, mark, source } = usualBounds("armscyeGirth", 30);
    expect(highMm).toBeCloseTo((445.5 + 1.645 * 27.1) * 1.15, 9); // ANSUR 1989, men
    expect(mark).toBe("calc");
    expect(source).toMatch(/standard deviations/);
  });
  it("the normal spread is a fair stand-in: where a percentile is published, it is within a twentieth", () => {
    for (const { women } of Object.values<AdultMeasure>(adultMeasures)) {
      if (women.p95Mm !== undefined)
        expect(Math.abs((women.meanMm + 1.645 * women.sdMm) / women.p95Mm - 1)).toBeLessThan(0.05);
      if (women.p5Mm !== undefined)
        expect(Math.abs((women.meanMm - 1.645 * women.sdMm) / women.p5Mm - 1)).toBeLessThan(0.05);
    }
  });
  it("fall back to practice where no table reaches", () => {
    expect(usualBounds("wristGirth", 6)).toMatchObject({
      lowMm: bodyMeasure("wristGirth").leastMm,
      mark: "practice",
    });
    expect(usualBounds("upperArmGirth", 1)).toMatchObject({ mark: "practice" });
    expect(usualBounds("upperArmGirth", undefined)).toMatchObject({ mark: "practice", whose: "of anyone" });
    expect(usualBounds("upperArmLength", 6).lowMm).toBeCloseTo(248 * 0.75, 9); // NHANES mean length, calc; the quarter, practice
  });
  it("the published means of every age and adult measure are inside our own bounds of anyone", () => {
    for (const r of armByAge) {
      const { leastMm, mostMm } = bodyMeasure("upperArmGirth");
      expect(r.p5Cm * 8.5 > leastMm && r.p95Cm * 11.5 < mostMm).toBe(true);
    }
    for (const [key, { women }] of Object.entries(adultMeasures)) {
      const { leastMm, mostMm } = bodyMeasure(key as keyof typeof adultMeasures);
      expect(women.meanMm > leastMm && women.meanMm < mostMm, key).toBe(true);
    }
  });
});
