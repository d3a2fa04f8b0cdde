import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ageBand } from "@/lib/measuring/age-band";
import { chartOf } from "@/lib/measuring/chart";

const box = { width: 300, height: 160 };
const day = (n: number) => new Date(Date.UTC(2024, 0, 1) + n * 86_400_000).toISOString().slice(0, 10);

describe("a figure's history as a chart", () => {
  it("sets days across and lengths up, to scale", () => {
    const { dots, line, yTicks } = chartOf({
      points: [
        { on: "2026-01-01", mm: 152.4 },
        { on: "2026-01-11", mm: 158.75 },
        { on: "2026-01-31", mm: 165.1 },
      ],
      unit: "in",
      ...box,
    });
    // 10 days of 30 are a third of the way.
    expect(dots.map(({ x }) => x)).toEqual([0, 100, 300]);
    // 6 to 6 1/2 in, in steps of 1/8: the first at the foot, the second half-way, the last at the head.
    expect(yTicks.map(({ text }) => text)).toEqual(["6 in", "6 1/8 in", "6 1/4 in", "6 3/8 in", "6 1/2 in"]);
    for (const [i, y] of [160, 80, 0].entries()) expect(dots[i]!.y).toBeCloseTo(y, 9);
    expect(line).toBe("M0 160L100 80L300 0");
  });
  it("sets one figure in the middle, with a tape's marks about it", () => {
    const { dots, xTicks, yTicks } = chartOf({ points: [{ on: "2026-01-01", mm: 160 }], unit: "cm", ...box });
    expect(dots[0]!.x).toBe(150);
    expect(xTicks).toEqual([{ x: 150, text: "1 Jan 2026" }]);
    expect(yTicks.length).toBeGreaterThanOrEqual(3);
  });
  it("names months, and years where the time is long", () => {
    const ticks = (to: string) =>
      chartOf({
        points: [
          { on: "2025-11-20", mm: 150 },
          { on: to, mm: 160 },
        ],
        unit: "cm",
        ...box,
      }).xTicks.map(({ text }) => text);
    expect(ticks("2026-03-10")).toEqual(["Dec", "2026", "Feb", "Mar"]);
    expect(ticks("2029-03-10")).toEqual(["2026", "2027", "2028", "2029"]);
    expect(ticks("2025-11-30")).toEqual(["20 Nov 2025", "30 Nov 2025"]);
  });
  it("keeps every dot inside, ticks even and on the tape's own steps", () => {
    const points = fc
      .array(
        fc.record({
          n: fc.integer({ min: 0, max: 6000 }),
          mm: fc.double({ min: 60, max: 1900, noNaN: true }),
        }),
        {
          minLength: 1,
          maxLength: 20,
        },
      )
      .map((list) => list.sort((a, b) => a.n - b.n).map(({ n, mm }) => ({ on: day(n), mm })));
    fc.assert(
      fc.property(points, fc.constantFrom("in" as const, "cm" as const), (list, unit) => {
        const { dots, yTicks, xTicks } = chartOf({ points: list, unit, ...box });
        for (const { x, y } of dots) {
          expect(x).toBeGreaterThanOrEqual(0);
          expect(x).toBeLessThanOrEqual(box.width);
          expect(y).toBeGreaterThanOrEqual(-1e-3);
          expect(y).toBeLessThanOrEqual(box.height + 1e-3);
        }
        expect(yTicks.length).toBeGreaterThanOrEqual(3);
        expect(yTicks.length).toBeLessThanOrEqual(7);
        const finest = unit === "in" ? 25.4 / 8 : 1;
        for (const { mm } of yTicks)
          expect(Math.abs(mm / finest - Math.round(mm / finest))).toBeLessThan(1e-6);
        const gaps = yTicks.slice(1).map(({ y }, i) => yTicks[i]!.y - y);
        for (const gap of gaps) expect(gap).toBeCloseTo(gaps[0]!, 6);
        expect(xTicks.length).toBeGreaterThanOrEqual(1);
        expect(xTicks.length).toBeLessThanOrEqual(4);
        for (const { x } of xTicks) expect(x >= 0 && x <= box.width).toBe(true);
      }),
    );
  });
  it("refuses a history of nothing", () => {
    expect(() => chartOf({ points: [], unit: "in", ...box })).toThrow(RangeError);
  });
});

describe("the band of the age", () => {
  const born = { birthYear: 2020, birthMonth: 1, ageYears: null, ageOn: null };
  it("stands on the published figures at the middle of a year of age", () => {
    // NHANES 2015-16 at 6 years: P5 16.3, P50 18.5, P95 26.3 cm; upper-arm length 24.8 cm (calc).
    const band = ageBand("upperArmGirth", born, "2026-07-16", "2027-07-16")!;
    expect(band.points[0]!.lowMm).toBeCloseTo(163, 0);
    expect(band.points[0]!.midMm).toBeCloseTo(185, 0);
    expect(band.points[0]!.highMm).toBeCloseTo(263, 0);
    expect(band.say).toContain("NHANES 2015-16");
    const length = ageBand("upperArmLength", born, "2026-07-16", "2027-07-16")!;
    expect(length.points[0]!.midMm).toBeCloseTo(248, 0);
    expect(length.points[0]!.lowMm).toBeUndefined();
  });
  it("is not there for other measures, babies, the grown, or an age not known", () => {
    const from = "2026-01-01";
    const to = "2026-06-01";
    const unknown = { birthYear: null, birthMonth: null, ageYears: null, ageOn: null };
    expect(ageBand("wristGirth", born, from, to)).toBeNull();
    expect(ageBand("upperArmGirth", unknown, from, to)).toBeNull();
    expect(ageBand("upperArmGirth", { ...unknown, birthYear: 1980 }, from, to)).toBeNull();
    expect(ageBand("upperArmGirth", { ...unknown, ageYears: 0, ageOn: from }, from, to)).toBeNull();
    expect(ageBand("upperArmGirth", { ...unknown, ageYears: 6, ageOn: from }, from, to)).not.toBeNull();
  });
  it("is drawn behind the dots, its area only with both edges", () => {
    const points = [
      { on: "2026-01-01", mm: 180 },
      { on: "2026-12-01", mm: 190 },
    ];
    const drawn = (figure: "upperArmGirth" | "upperArmLength") =>
      chartOf({
        points,
        unit: "cm",
        ...box,
        band: ageBand(figure, born, points[0]!.on, points[1]!.on)!.points,
      }).band;
    expect(drawn("upperArmGirth")!.area).toMatch(/^M[\d.]+ [\d.]+(L[\d.]+ [\d.]+)+Z$/);
    expect(drawn("upperArmLength")).toMatchObject({ area: null });
  });
});
