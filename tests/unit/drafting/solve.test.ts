import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { capDepthShares, makeSleeve, solveCapDepth, usualHeadEase } from "@/lib/drafting";
import { findRoot } from "@/lib/drafting/solve";
import { child, draft, figures, human, inches, value } from "./helpers";

describe("findRoot", () => {
  it("finds roots of functions it has not seen, to the tolerance asked", () => {
    expect(Math.abs(findRoot((x) => x * x - 2, 0, 2, 1e-12) - Math.SQRT2)).toBeLessThan(2e-12);
    expect(Math.abs(findRoot((x) => 1 - Math.exp(x - 1), -5, 20, 1e-10) - 1)).toBeLessThan(2e-10);
    expect(Math.abs(findRoot((x) => Math.cbrt(x - 0.3), 0, 1, 1e-10) - 0.3)).toBeLessThan(2e-10);
    expect(findRoot((x) => x, 0, 1, 1e-9)).toBe(0);
  });
  it("refuses a bracket without a change of sign", () => {
    expect(() => findRoot((x) => x * x + 1, -1, 1, 1e-9)).toThrow(RangeError);
  });
});

describe("solveCapDepth", () => {
  it("finds the cap depth a sleeve was drawn with", () => {
    fc.assert(
      fc.property(human, fc.double({ min: 0, max: 40, noNaN: true }), (f, headEase) => {
        const armhole = draft(f).lengths.cap - headEase;
        const { capDepth } = value(solveCapDepth({ armhole, headEase, biceps: f.biceps }));
        // 1e-5 mm: the root-finder stops at 1e-7 mm of depth.
        expect(Math.abs(capDepth - f.capDepth)).toBeLessThan(1e-5);
      }),
      { numRuns: 150 },
    );
  });

  it("keeps marks that were given", () => {
    const marks = { front: child.front, back: child.back };
    const armhole = draft(child).lengths.cap - 30;
    const { capDepth } = value(solveCapDepth({ armhole, headEase: 30, biceps: child.biceps, marks }));
    // 1e-5 mm, as above.
    expect(Math.abs(capDepth - child.capDepth)).toBeLessThan(1e-5);
  });

  it("says when the biceps line is too wide, and by its own remedy is right", () => {
    const ask = { armhole: 400, headEase: 25, biceps: 500 };
    const result = solveCapDepth(ask);
    expect(result).toMatchObject({ ok: false, problems: [{ id: "biceps-too-wide", figure: "biceps" }] });
    if (result.ok) return;
    const length = result.problems[0]!.remedy.find((part) => typeof part === "object");
    // A tenth of a millimetre inside the width it names.
    expect(solveCapDepth({ ...ask, biceps: length!.mm - 0.1 }).ok).toBe(true);
  });

  it("says when the biceps line is too narrow, and by its own remedy is right", () => {
    const ask = { armhole: 600, headEase: 25, biceps: 200 };
    const result = solveCapDepth(ask);
    expect(result).toMatchObject({ ok: false, problems: [{ id: "biceps-too-narrow", figure: "biceps" }] });
    if (result.ok) return;
    const length = result.problems[0]!.remedy.find((part) => typeof part === "object");
    // A tenth of a millimetre inside the width it names.
    expect(solveCapDepth({ ...ask, biceps: length!.mm + 0.1 }).ok).toBe(true);
  });

  it("names the mark when the depth found does not suit the marks given", () => {
    const front = [0.5, -0.3, 0.9].map((out, i) => ({ share: [0.25, 0.55, 0.8][i]!, out: inches(out) }));
    const result = solveCapDepth({ armhole: inches(17), headEase: 25, biceps: inches(12), marks: { front } });
    expect(result).toMatchObject({
      ok: false,
      problems: [{ id: "mark-wiggle", figure: "frontMarks", mark: { side: "front", index: 1 } }],
    });
  });

  it("blames the marks, not the biceps line, when the usual marks would go in", () => {
    const front = child.front.map((m, i) => (i === 2 ? { ...m, out: inches(2.5) } : m));
    const armhole = draft(figures(inches(12), inches(1.5))).lengths.cap;
    const result = solveCapDepth({ armhole, headEase: 0, biceps: inches(12), marks: { front } });
    expect(result).toMatchObject({ ok: false, problems: [{ id: "marks-too-far", figure: "frontMarks" }] });
  });

  it("gives a sleeve whose cap is armhole and ease", () => {
    const made = makeSleeve({
      length: 580,
      biceps: 370,
      hem: 230,
      armhole: { front: 205, back: 215 },
      headEase: 32,
    });
    expect(made.ok).toBe(true);
    // 1e-5 mm: root-finder's tolerance carried to the length.
    if (made.ok) expect(Math.abs(made.draft.lengths.cap - 452)).toBeLessThan(1e-5);
  });
});

describe("head ease and shares", () => {
  it("asks for less ease in a small armhole and in knits", () => {
    // exact arithmetic on our own defaults; 1e-9 mm of float noise
    expect(usualHeadEase(inches(17))).toBeCloseTo(inches(1.25), 9);
    expect(usualHeadEase(inches(8))).toBeCloseTo(inches(0.625), 9);
    expect(usualHeadEase(inches(17), "knit")).toBeCloseTo(inches(0.5), 9);
  });
  it("a third of the armhole (memory: cap depth near a third of the armhole)", () => {
    // exact
    expect(capDepthShares(450)[0]).toMatchObject({ capDepth: 150, mark: "memory" });
  });
});
