import { describe, expect, it } from "vitest";
import { mmPerInch } from "@/lib/lengths/units";
import { roundingPhrase, stepPictures } from "@/lib/sleeves/mark-out";
import { marksDocument, type MarksSheet } from "@/lib/sleeves/marks-document";
import { child, marked, record, woman } from "./helpers";

const sheet = (ask: typeof child, more: Partial<MarksSheet> = {}): MarksSheet => ({
  sleeve: { name: "Blue sleeve", ask, fineness: 8 },
  ...marked(ask, more.unit ?? "in"),
  unit: "in",
  wearerName: "Mina Varro",
  author: "Table by the window",
  today: "2026-03-14",
  ...more,
});

describe("the sheet of marks", () => {
  it("says the steps of the rounded sleeve, every length in eighths", () => {
    const doc = marksDocument(sheet(woman));
    const { rounded } = marked(woman);
    expect(doc.steps.length).toBeGreaterThan(15);
    expect(doc.steps.map(({ n }) => n)).toEqual(doc.steps.map((_, i) => i + 1));
    expect(doc.steps[0]!.text).toBe(
      "Draw a line down the paper, 21 3/8 in long. Its top is the crown, its foot the hem.",
    );
    expect(rounded.figures.length / (mmPerInch / 8)).toBeCloseTo(21.375 * 8, 6);
    expect(doc).toMatchObject({
      title: "Blue sleeve",
      wearer: "Mina Varro",
      date: "2026-03-14",
      tape: "inch",
    });
    expect(doc.figures.find(({ name }) => name === "Biceps line")!.text).toMatch(/ in$/u);
  });

  it("is in centimetres where the workshop is", () => {
    const doc = marksDocument(sheet(child, { unit: "cm" }));
    expect(doc.steps[0]!.text).toContain("24.1 cm");
    expect(JSON.stringify(doc)).not.toMatch(/\d in\b/u);
  });

  it("says that a sleeve fails, and why, before its first step", () => {
    const failing = record({
      length: 9.5,
      capDepth: 6.25,
      biceps: 12,
      hem: 11,
      armholeFront: 10,
      armholeBack: 10,
    });
    const { warnings } = marksDocument(sheet(failing, { stale: "These figures are 9 months old." }));
    expect(warnings[0]).toBe("This sleeve fails. Change it before cloth is cut.");
    expect(warnings.join(" ")).toContain("The cap seam is 18 5/8 in");
    expect(warnings).toContain("These figures are 9 months old.");
    expect(marksDocument(sheet(child)).warnings).toHaveLength(1);
  });

  it("gives each check with its verdict, and what to do where it is not good", () => {
    const { checks } = marksDocument(sheet(woman));
    const { rounded } = marked(woman);
    const walked = rounded.seams.map(({ agrees }) => (agrees ? "good" : "wrong"));
    const verdicts = [...walked, ...rounded.checks.map(({ verdict }) => verdict)];
    expect(checks.map(({ verdict }) => verdict)).toEqual(verdicts);
  });

  it("draws each step over those before it, with its own line new and all points in its box", () => {
    const doc = marksDocument(sheet(child));
    let drawn = 0;
    const { rounded } = marked(child);
    for (const { drawing } of doc.steps.slice(0, -rounded.steps.length)) {
      const { h, w, x, y } = drawing.viewBox;
      const old = drawing.lines.filter(({ weight }) => weight !== "new").length;
      // Where only the cap is shown, what lies below it is left out.
      if (h > rounded.figures.capDepth + 1) {
        expect(old).toBeGreaterThanOrEqual(drawn);
        drawn = old;
      }
      const ends = drawing.lines.flatMap(({ d }) => d.flatMap((c) => [c[0], c.at(-1)!]));
      for (const end of ends) expect(end.y).toBeLessThanOrEqual(y + h * 1.06 + 1e-6);
      for (const point of drawing.points.filter((one) => one.new)) {
        expect(point.x).toBeGreaterThanOrEqual(x - 1e-6);
        expect(point.x).toBeLessThanOrEqual(x + w + 1e-6);
        expect(point.y).toBeGreaterThanOrEqual(y - 1e-6);
        expect(point.y).toBeLessThanOrEqual(y + h + 1e-6);
      }
    }
    const curve = doc.steps.find(({ text }) => text.startsWith("Draw the front of the cap"))!;
    expect(
      curve.drawing.lines.some(({ d, weight }) => weight === "new" && d.some((c) => c.length === 4)),
    ).toBe(true);
  });
});

describe("the mark-out on the screen", () => {
  it("shows the cap alone, larger, for the steps that only touch it", () => {
    const { rounded } = marked(woman);
    const pictures = stepPictures(rounded);
    expect(pictures[0]!.box.h).toBeCloseTo(rounded.figures.length, 9);
    const hollow = pictures.find(
      ({ measured, step }) => measured.length === 1 && step.phrase.join("").includes("hollow"),
    )!;
    expect(hollow.box.h).toBeCloseTo(rounded.figures.capDepth, 9);
    expect(hollow.measured).toHaveLength(1);
  });

  it("says what rounding moved, in tenths of a millimetre", () => {
    const { exact, rounded, step } = marked(woman);
    const text = roundingPhrase(exact, rounded, step)
      .map((part) => (typeof part === "string" ? part : part.mm))
      .join("");
    expect(text).toMatch(/its cap seam comes out (\d+\.\d mm (longer|shorter) than|as long as) worked out/u);
    expect(Math.abs(rounded.draft.lengths.cap - exact.draft.lengths.cap)).toBeLessThan(4 * step);
  });
});
