import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { phraseText } from "@/lib/lengths/phrase";
import { stepOf } from "@/lib/lengths/units";
import { fieldsAsked, type SewingSum, sewingSum, sewingSums, type SumInputs, workSum } from "@/lib/sewing";
import { IN, markGroups, mm, problems, worked } from "./support";

/** Anything that a field may hold, a little beyond its bounds too. */
function anyInputs(sum: SewingSum): fc.Arbitrary<SumInputs> {
  return fc.record(
    Object.fromEntries(
      sum.fields.map((field) => {
        const usable: fc.Arbitrary<number | string> =
          field.kind === "choice"
            ? fc.constantFrom(...field.options.map(({ value }) => value))
            : field.kind === "count"
              ? fc.integer({ min: field.least - 1, max: Math.min(field.most, 60) })
              : fc.double({ min: field.least * 0.9, max: Math.min(field.most, 3000), noNaN: true });
        return [field.key, field.optional ? fc.option(usable, { nil: undefined, freq: 3 }) : usable];
      }),
    ),
  );
}

const numbersIn = (value: unknown): number[] =>
  typeof value === "number"
    ? [value]
    : typeof value === "object" && value !== null
      ? Object.values(value).flatMap(numbersIn)
      : [];

describe.each(sewingSums.map((sum) => [sum.id, sum] as const))("the sum %s", (_, sum) => {
  it("draws its example, and says what it is in words", () => {
    const result = worked(sum.id, sum.example);
    expect(result.drawing.paths.length).toBeGreaterThan(0);
    expect(result.results.some(({ main }) => main)).toBe(true);
    expect(result.steps.length).toBeGreaterThan(0);
    expect(phraseText([...sum.rule], "in").length).toBeGreaterThan(20);
    expect(sewingSum(sum.id)).toBe(sum);
  });

  it("gives whole figures or says what to type instead, whatever is put in", () => {
    let good = 0;
    fc.assert(
      fc.property(
        anyInputs(sum),
        fc.constantFrom(0, 1, stepOf("in", 8), stepOf("in", 16)),
        (inputs, step) => {
          const made = workSum(sum, inputs, step);
          if (!made.ok) {
            const keys = fieldsAsked(sum, inputs).map(({ key }) => key);
            for (const problem of made.problems) {
              expect(keys).toContain(problem.field);
              expect(phraseText([...problem.say], "in")).toMatch(/Type|Choose/);
              expect(numbersIn(problem.say).every(Number.isFinite)).toBe(true);
            }
            return;
          }
          good += 1;
          for (const number of numbersIn(made)) expect(Number.isFinite(number)).toBe(true);
          for (const result of made.results)
            if ("mm" in result) expect(result.mm).toBeGreaterThanOrEqual(-1e-6);
          for (const { d } of made.drawing.paths) expect(d).not.toMatch(/NaN|Infinity|undefined/);
          expect(made.drawing.box.w).toBeGreaterThan(0);
          expect(made.drawing.box.h).toBeGreaterThan(0);
        },
      ),
      { numRuns: 400 },
    );
    expect(good, "figures that work").toBeGreaterThan(20);
  });

  it("sets every mark on the tape's own steps, one after the other", () => {
    fc.assert(
      fc.property(anyInputs(sum), fc.constantFrom(1, stepOf("in", 8)), (inputs, step) => {
        const made = workSum(sum, inputs, step);
        if (!made.ok) return;
        for (const marks of markGroups(made)) {
          for (const at of marks) expect(Math.abs(at / step - Math.round(at / step))).toBeLessThan(1e-6);
          for (let i = 1; i < marks.length; i++)
            expect(marks[i]! - marks[i - 1]!).toBeGreaterThanOrEqual(-1e-6);
        }
      }),
      { numRuns: 200 },
    );
  });

  it("names every field that is missing, in words", () => {
    const needed = fieldsAsked(sum, {}).filter(({ optional }) => !optional);
    expect(problems(sum.id, {}).map(({ field }) => field)).toEqual(needed.map(({ key }) => key));
  });
});

describe("outside values", () => {
  // sources.md: "Ruffle 1.5 to 3 times: 15 in at 2.5 = 37 1/2 in", arithmetic, exact.
  it("ruffle: 15 in at 2.5 is 37 1/2 in", () => {
    const made = worked("ruffle", { seam: 15 * IN, ratio: 2.5, width: 45 * IN, join: IN / 4, ends: "open" });
    expect(mm(made, /before gathering/)).toBeCloseTo(37.5 * IN, 9);
    expect(mm(made, /^Cut it/)).toBeCloseTo(38 * IN, 9);
  });

  // sources.md: "Flounce as a ring: inner edge r·t = seam, outer (r+d)·t", geometry, exact.
  it.each([
    ["half", Math.PI],
    ["quarter", Math.PI / 2],
    ["three-quarter", 1.5 * Math.PI],
  ] as const)("ring: a %s has r·t on the seam and (r + d)·t at the edge", (part, t) => {
    const made = worked("ring-flounce", { seam: 400, depth: 90, part, rings: 2, allowance: 6, hem: 5 });
    const r = mm(made, /at the seam/);
    expect(r * t * 2).toBeCloseTo(400, 9);
    expect(mm(made, /Lower edge/)).toBeCloseTo((r + 90) * t * 2, 9);
    expect(mm(made, /inside/)).toBeCloseTo(r - 6, 9);
    expect(mm(made, /outside/)).toBeCloseTo(r + 95, 9);
  });

  it("ring: a whole one is slit, and what the join takes is in the round", () => {
    const made = worked("ring-flounce", {
      seam: 400,
      depth: 90,
      part: "whole",
      rings: 1,
      allowance: 6,
      hem: 0,
    });
    expect(mm(made, /at the seam/) * 2 * Math.PI).toBeCloseTo(412, 9);
  });

  // Ingalls, Text-Book on Domestic Art, 1911 (seen, year memory): cuff length = hand measurement, depth 3 in, placket 3 in.
  it("cuff: the hand measurement long, 3 in deep, placket 3 in", () => {
    const { fields } = sewingSum("cuff-band")!;
    const usual = (key: string) => (fields.find((field) => field.key === key)!.usual as { in: number }).in;
    const made = worked("cuff-band", {
      ...{ kind: "cuff", by: "hand", girth: 8 * IN, ease: usual("ease"), overlap: 0 },
      ...{ depth: usual("depth"), placket: usual("placket"), allowance: IN / 4, cut: "fold" },
    });
    expect(mm(made, /Cuff, finished/)).toBeCloseTo(8 * IN, 9);
    expect(mm(made, /Depth/)).toBeCloseTo(3 * IN, 9);
    expect(mm(made, /Placket/)).toBeCloseTo(3 * IN, 9);
    expect(mm(made, /Cut it deep/)).toBeCloseTo(6.5 * IN, 9);
  });

  // sources.md: "elastic = girth less 1 to 2 in", memory.
  it("elastic: girth less 1 in, and the lap", () => {
    const made = worked("elastic", { girth: 8 * IN, less: IN, overlap: IN / 2 });
    expect(mm(made, /Round, once/)).toBeCloseTo(7 * IN, 9);
    expect(mm(made, /Cut the elastic/)).toBeCloseTo(7.5 * IN, 9);
  });

  // Circumference of a circle: geometry, exact. A waist of 2π·4 in has a whole circle's radius of 4 in.
  it.each([
    ["whole", 4],
    ["three-quarter", 16 / 3],
    ["half", 8],
    ["quarter", 16],
  ])("circle skirt: waist 25.13 in, %s, radius %d in", (part, inches) => {
    const made = worked("circle-skirt", {
      ...{
        part,
        waist: 8 * Math.PI * IN,
        ease: 0,
        length: 20 * IN,
        hem: 0,
        allowance: IN / 2,
        width: 60 * IN,
      },
    });
    expect(mm(made, /Radius at the waist/)).toBeCloseTo(inches * IN, 6);
    expect(mm(made, /Radius at the hem/)).toBeCloseTo((inches + 20) * IN, 6);
  });

  // practice: full knife pleating, folds that just meet behind, takes three times the length.
  it("knife pleats that meet behind take three to one; box pleats that meet take three to one", () => {
    const knife = worked("pleats", { kind: "knife", length: 10 * IN, count: 10, depth: IN, end: 0 });
    expect(mm(knife, /Cloth across/)).toBeCloseTo(30 * IN, 9);
    const box = worked("pleats", { kind: "box", length: 10 * IN, count: 5, depth: IN, end: 0 });
    expect(mm(box, /Cloth across/)).toBeCloseTo(30 * IN, 9);
    expect(mm(box, /Face/)).toBeCloseTo(2 * IN, 9);
    expect(knife.cautions).toEqual([]);
    expect(box.cautions).toEqual([]);
  });
});
