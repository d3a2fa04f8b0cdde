/** What a cutter would find out at the machine: the parts make the whole, with rounded marks too. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { phraseText } from "@/lib/lengths/phrase";
import { stepOf } from "@/lib/lengths/units";
import { sewingSum, upToStep, workSum } from "@/lib/sewing";
import { squareForStrip, stripFromSquare } from "@/lib/sewing/bias-strip";
import { skirtLayout } from "@/lib/sewing/circle-skirt";
import { count, IN, markGroups, mm, problems, worked } from "./support";

const steps = fc.constantFrom(1, stepOf("in", 8), stepOf("in", 16));
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("ruffle", () => {
  it("the strips, joined, come to the full length, and no strip is longer than the cloth is wide", () => {
    fc.assert(
      fc.property(
        between(50, 9000),
        between(1, 4),
        between(300, 1600),
        between(0, 20),
        (seam, ratio, width, join) => {
          const made = worked("ruffle", { seam, ratio, width, join, ends: "open" });
          const strips = count(made, /Strips to cut/);
          const last = mm(made, /^(Last strip, cut|Cut it)$/);
          const sewn = (strips - 1) * (width - 2 * join) + last - 2 * join;
          expect(sewn).toBeCloseTo(seam * ratio, 6);
          expect(last).toBeLessThanOrEqual(width + 1e-6);
          expect(last).toBeGreaterThan(2 * join - 1e-6);
          expect(count(made, /Joins/)).toBe(strips - 1);
          // One strip fewer would not do.
          expect((strips - 1) * (width - 2 * join)).toBeLessThan(seam * ratio + 1e-6);
          expect(worked("ruffle", { seam, ratio, width, join, ends: "round" }).results).toContainEqual({
            label: "Joins",
            count: strips,
          });
        },
      ),
    );
  });

  it("cut to the mark above, it is never short and never a whole step over", () => {
    fc.assert(
      fc.property(between(10, 1143), steps, (cut, step) => {
        expect(upToStep(cut, step)).toBeGreaterThanOrEqual(cut - 1e-5);
        expect(upToStep(cut, step)).toBeLessThan(cut + step + 1e-5);
      }),
    );
  });

  it("says so where the cloth is taken by its allowances", () => {
    const [problem] = problems("ruffle", { seam: 100, ratio: 2, width: 60, join: 30, ends: "open" });
    expect(problem!.field).toBe("width");
  });
});

describe("pleats", () => {
  it("folded by the rounded marks, the cloth comes to exactly the rounded length", () => {
    fc.assert(
      fc.property(
        fc.constantFrom("knife", "box", "inverted"),
        between(100, 3000),
        fc.integer({ min: 1, max: 40 }),
        between(4, 60),
        between(0, 30),
        steps,
        (kind, length, pleats, depth, end, step) => {
          const made = workSum(sewingSum("pleats")!, { kind, length, count: pleats, depth, end }, step);
          if (!made.ok) return;
          const [marks] = markGroups(made);
          const across = mm(made, /Cloth across/);
          // Between the two marks of a fold lie its two layers, taken out of the finished length.
          let taken = 0;
          if (kind === "knife") for (let i = 0; i < pleats; i++) taken += marks![2 * i + 1]! - marks![2 * i]!;
          if (kind === "box")
            for (let i = 0; i < pleats; i++)
              taken += marks![4 * i + 1]! - marks![4 * i]! + (marks![4 * i + 3]! - marks![4 * i + 2]!);
          if (kind === "inverted")
            for (let i = 0; i < pleats; i++) taken += marks![3 * i + 2]! - marks![3 * i]!;
          const ends = 2 * Math.round(end / step + 1e-6) * step;
          expect(Math.abs(across - taken - ends - length)).toBeLessThanOrEqual(step / 2 + 1e-5);
          expect(marks!.at(-1)!).toBeLessThanOrEqual(across - ends / 2 + 1e-6);
          expect(marks![0]!).toBeGreaterThanOrEqual(ends / 2 - 1e-6);
        },
      ),
      { numRuns: 500 },
    );
  });

  it("refuses folds that reach under the next pleat, and more pleats than can be marked", () => {
    const base = { kind: "box", length: 200, end: 0 };
    expect(problems("pleats", { ...base, count: 10, depth: 30 })[0]!.field).toBe("depth");
    expect(problems("pleats", { ...base, count: 300, depth: 2 })[0]!.field).toBe("count");
    const deep = worked("pleats", { ...base, kind: "knife", count: 10, depth: 30 });
    expect(deep.cautions).toHaveLength(1);
  });
});

describe("buttons", () => {
  it("the last one lands, no mark is off by more than half a step, and no gap by more than one", () => {
    fc.assert(
      fc.property(
        between(0, 60),
        between(200, 1500),
        fc.integer({ min: 2, max: 14 }),
        steps,
        (first, span, n, step) => {
          const last = first + span;
          const made = worked("buttons", { first, last, count: n, who: "older" }, step);
          const [marks] = markGroups(made);
          expect(marks).toHaveLength(n);
          expect(Math.abs(marks!.at(-1)! - last)).toBeLessThanOrEqual(step / 2 + 1e-5);
          marks!.forEach((at, i) =>
            expect(Math.abs(at - first - (i * span) / (n - 1))).toBeLessThanOrEqual(step / 2 + 1e-5),
          );
          const gaps = marks!.slice(1).map((at, i) => at - marks![i]!);
          for (const gap of gaps) expect(Math.abs(gap - span / (n - 1))).toBeLessThanOrEqual(step + 1e-5);
          expect(gaps.reduce((sum, gap) => sum + gap, 0)).toBeCloseTo(marks!.at(-1)! - marks![0]!, 6);
          expect(mm(made, /First to last/)).toBeCloseTo(marks!.at(-1)! - marks![0]!, 9);
        },
      ),
    );
  });

  it("says which gaps are unlike, to the eighth", () => {
    const made = worked("buttons", { first: IN, last: 16 * IN, count: 8, who: "older" }, stepOf("in", 8));
    const said = made.steps.map((step) => phraseText([...step], "in")).join(" ");
    // 15 in over 7 gaps is 2 1/7: six of 2 1/8 and one of 2 1/4 make 15.
    expect(said).toContain("6 gaps are 2 1/8 in and 1 gap is 2 1/4 in");
    expect(6 * 2.125 + 2.25).toBe(15);
  });

  it("minds small parts unless someone older is said, and refuses buttons that touch", () => {
    const base = { first: 10, last: 200, count: 4 };
    expect(worked("buttons", base).cautions[0]!.source).toBe("16 CFR 1501");
    expect(worked("buttons", { ...base, who: "small" }).cautions).toHaveLength(1);
    expect(worked("buttons", { ...base, who: "older" }).cautions).toEqual([]);
    expect(problems("buttons", { ...base, count: 30, diameter: 15, thick: 3 })[0]!.field).toBe("count");
    expect(problems("buttons", { ...base, last: 5 })[0]!.field).toBe("last");
  });
});

describe("bias strip", () => {
  it("never comes to more than side × side ÷ width", () => {
    fc.assert(
      fc.property(between(100, 1500), between(10, 120), between(0, 15), (side, wide, allowance) => {
        const { length, rounds } = stripFromSquare(side, wide, allowance);
        expect(length).toBeLessThanOrEqual((side * side) / wide + 1e-6);
        // Without seams, what is lost is less than one round.
        const bare = stripFromSquare(side, wide, 0);
        expect((side * side) / wide - bare.length).toBeLessThan(side * Math.SQRT2 + 1e-6);
        expect(rounds).toBeLessThanOrEqual(bare.rounds);
      }),
    );
  });

  it("the square for a wanted strip gives it, and one a little smaller does not", () => {
    fc.assert(
      fc.property(between(200, 20_000), between(10, 120), between(0, 15), (length, wide, allowance) => {
        const side = squareForStrip(length, wide, allowance);
        expect(stripFromSquare(side + 1e-6, wide, allowance).length).toBeGreaterThanOrEqual(length - 1e-3);
        expect(stripFromSquare(side - 0.01, wide, allowance).length).toBeLessThan(length);
      }),
    );
  });

  it("a square cut to the next mark still gives it", () => {
    fc.assert(
      fc.property(between(200, 20_000), between(10, 100), steps, (length, wide, step) => {
        const made = worked("bias-strip", { from: "length", length, wide, allowance: 6 }, step);
        expect(mm(made, /that it gives/)).toBeGreaterThanOrEqual(length - 1e-3);
      }),
    );
  });
});

describe("ring flounce", () => {
  it("takes as many rings as the cloth's width asks, and no more", () => {
    const ask = { seam: 3000, depth: 150, part: "whole", allowance: 6, hem: 6, width: 900 };
    const made = worked("ring-flounce", ask);
    const rings = count(made, /^Rings$/);
    expect(rings).toBe(2);
    expect(mm(made, /Cloth across/)).toBeLessThanOrEqual(900);
    const one = worked("ring-flounce", { ...ask, rings: 1 });
    expect(phraseText([...one.cautions[0]!.say], "cm")).toContain("2 rings would fit");
  });

  it("says how many rings are too many", () => {
    const ask = { seam: 200, depth: 50, part: "whole", allowance: 6, hem: 6, rings: 20 };
    const [problem] = problems("ring-flounce", ask);
    expect(problem!.field).toBe("rings");
    const most = Number(/Type (\d+)/.exec(phraseText([...problem!.say], "in"))![1]);
    worked("ring-flounce", { ...ask, rings: most });
    expect(problems("ring-flounce", { ...ask, rings: most + 1 })[0]!.field).toBe("rings");
  });
});

describe("circle skirt", () => {
  it("lies on its cloth: the pieces are no more than the cloth, and it says where they do not go in", () => {
    const area = { whole: Math.PI, "three-quarter": 0.75 * Math.PI, half: Math.PI / 2, quarter: Math.PI / 4 };
    fc.assert(
      fc.property(
        fc.constantFrom("whole", "three-quarter", "half", "quarter") as fc.Arbitrary<keyof typeof area>,
        between(200, 1500),
        between(300, 1600),
        (part, radius, width) => {
          const layout = skirtLayout(part, radius, width);
          expect(layout === null).toBe(radius > width + 1e-9);
          if (layout) expect(layout.length * width).toBeGreaterThanOrEqual(area[part] * radius * radius);
        },
      ),
    );
    const narrow = { part: "half", waist: 700, ease: 0, length: 900, hem: 20, allowance: 10, width: 900 };
    expect(phraseText([...worked("circle-skirt", narrow).cautions[0]!.say], "cm")).toMatch(/^Too narrow/);
  });
});

describe("elastic and cuff", () => {
  it("elastic is never so short that it would not go on, and a child's arm is minded", () => {
    const ask = { girth: 180, less: 25, overlap: 12 };
    expect(problems("elastic", { ...ask, less: 100 })[0]!.field).toBe("less");
    expect(worked("elastic", ask).cautions.map(({ mark }) => mark)).toEqual(["practice"]);
    expect(phraseText([...worked("elastic", ask).cautions[0]!.say], "in")).toContain("child's arm");
    expect(worked("elastic", { ...ask, who: "grown" }).cautions).toEqual([]);
    expect(worked("elastic", { ...ask, less: 50, who: "grown" }).cautions).toHaveLength(1);
  });

  it("a closed band by the wrist is told to go over the hand", () => {
    const band = { kind: "band", by: "wrist", girth: 150, ease: 10, depth: 40, allowance: 6, cut: "two" };
    const made = worked("cuff-band", band);
    expect(mm(made, /Band, finished/)).toBeCloseTo(160, 9);
    expect(made.cautions).toHaveLength(1);
    expect(problems("cuff-band", { ...band, edge: 120 })[0]!.field).toBe("edge");
  });
});
