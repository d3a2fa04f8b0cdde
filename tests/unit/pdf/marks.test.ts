import { describe, expect, it } from "vitest";
import { type MarksDocument, type StepDrawing } from "@/lib/pdf/marks-document";
import { marksPdf } from "@/lib/pdf/marks";
import { type MarksPaper, marksPapers } from "@/lib/pdf/papers";
import { drawStep } from "@/lib/pdf/step-drawing";
import { typesetter } from "@/lib/pdf/typesetter";
import { boxPainter, printFonts, printTools } from "./print-tools";
import { readPdf, wordsOf } from "@/tests/support/read-pdf";

const papers = Object.keys(marksPapers) as MarksPaper[];
// A4 and Letter: sources.md (seen). A5: half an A4 to the millimetre.
const sizes: Record<MarksPaper, [number, number]> = {
  a4: [595.276, 841.89],
  a5: [419.528, 595.276],
  letter: [612, 792],
};

const crown = { x: 0, y: 0 };
const underarm = { x: 152, y: 111 };
const capCurve = [crown, { x: 60, y: 0 }, { x: 90, y: 111 }, underarm] as const;
const drawing: StepDrawing = {
  viewBox: { x: -152, y: 0, w: 304, h: 381 },
  lines: [
    { d: [[crown, { x: 0, y: 381 }]], weight: "guide" },
    { d: [[{ x: -152, y: 111 }, underarm]], weight: "thin" },
    { d: [capCurve], weight: "new" },
    { d: [], weight: "cut" },
  ],
  points: [
    { ...crown, label: "A" },
    { ...underarm, label: "B", new: true },
    { x: 0, y: 381 },
  ],
};

const sheet = (count: number): MarksDocument => ({
  title: "Basic sleeve",
  subtitle: "Woven, cap depth 4 3/8 in",
  wearer: "Юлия, 9 years",
  date: "2025-12-01",
  figures: [
    { name: "Length", text: "15 in" },
    { name: "Cap depth", text: "4 3/8 in" },
    { name: "Biceps line", text: "12 1/16 in" },
  ],
  warnings: ["The figures are seven months old: measure again before you cut."],
  steps: Array.from({ length: count }, (_, i) => ({
    n: i + 1,
    text: `Step ${i + 1} of the cap: from the crown, square across 5 1/4 in each way, then join the two marks.`,
    drawing,
  })),
  checks: [
    { text: "The cap is 1 1/8 in longer than the armhole.", verdict: "good" },
    { text: "The hem is narrower than the hand.", verdict: "wrong" },
    { text: "The cap is flat.", verdict: "look" },
  ],
  lang: "en-GB",
  tape: "inch",
});

const read = async (doc: MarksDocument, paper: MarksPaper) =>
  readPdf(await marksPdf(doc, paper, printTools()));

describe.each(papers)("marks on %s", (paper) => {
  it("has every figure, step and check, inside the paper", async () => {
    const doc = sheet(25);
    const { pages, info } = await read(doc, paper);
    const [width, height] = sizes[paper];
    const words = wordsOf(pages);
    for (const text of [
      "Basic sleeve",
      "Юлия, 9 years",
      "4 ⅜ in",
      "12 ¹⁄₁₆ in",
      "Length",
      "Good",
      "Wrong",
      "Look",
    ])
      expect(words).toContain(text);
    expect(words).toContain("1 December 2025");
    for (let n = 1; n <= 25; n++) expect(words).toMatch(new RegExp(`\\bStep ${n} of\\b`));
    for (const page of pages) {
      expect(page.width).toBeCloseTo(width, 2);
      expect(page.height).toBeCloseTo(height, 2);
      for (const text of page.texts) {
        // 10 mm from the edge.
        expect(text.left, text.text).toBeGreaterThan(28.34);
        expect(text.right, text.text).toBeLessThan(width - 28.34);
        expect(text.baseline, text.text).toBeLessThan(height - 28.34);
      }
    }
    expect(info.Title).toBe("Basic sleeve, Юлия, 9 years");
  });

  it("draws curves as curves and nothing as a picture", async () => {
    const { pages } = await read(sheet(25), paper);
    expect(pages.flatMap(({ pictures }) => pictures)).toEqual([]);
    // One cap curve and three dots of four quarters a step.
    expect(pages.reduce((sum, { curves }) => sum + curves, 0)).toBe(25 * (1 + 3 * 4));
  });

  it("keeps a step and its drawing on one page", async () => {
    const { pages } = await read(sheet(25), paper);
    for (const { texts, curves } of pages) {
      const steps = texts.filter(({ text }) => /^Step \d+/.test(text)).length;
      expect(curves).toBe(steps * 13);
    }
  });
});

describe("pages of marks", () => {
  it("go on with the title, the wearer and the page", async () => {
    const { pages } = await read(sheet(25), "a5");
    pages.forEach((page, i) => {
      const words = wordsOf([page]);
      expect(words).toContain(`Page ${i + 1} of ${pages.length}`);
      if (i > 0) expect(words).toContain("Basic sleeve, continued");
    });
  });
});

describe("the drawing of a step", () => {
  const set = typesetter(printFonts, boxPainter());
  const block = drawStep(drawing, 100, 120, set);
  const paths = block.items.flatMap((item) => (item.kind === "path" && item.stroke ? [item] : []));

  it("keeps its proportions and fits", () => {
    const [guide] = paths;
    const [from, to] = guide!.steps.map(({ c }) => c);
    const scale = (to![1]! - from![1]!) / 381;
    const across = paths[1]!.steps.map(({ c }) => c[0]!);
    expect((across[1]! - across[0]!) / 304).toBeCloseTo(scale, 9);
    expect(block.height).toBeLessThanOrEqual(120 + 1e-9);
    for (const { steps } of paths)
      for (const { c } of steps)
        c.forEach((value, i) => {
          expect(value).toBeGreaterThanOrEqual(0);
          expect(value).toBeLessThanOrEqual(i % 2 ? block.height : 100);
        });
  });
  it("draws the line of the step last and heaviest", () => {
    const widths = paths.map(({ stroke }) => stroke!.width);
    expect(widths.at(-1)).toBe(Math.max(...widths));
    expect(widths.filter((width) => width === widths.at(-1))).toHaveLength(1);
    expect(paths.at(-1)!.steps.map(({ op }) => op)).toEqual(["m", "c"]);
  });
  it("names the points, the new one larger, no name on another", () => {
    const names = block.items.flatMap((item) => (item.kind === "text" ? [item] : []));
    expect(names.map(({ text }) => text).toSorted()).toEqual(["A", "B"]);
    const size = (text: string) => names.find((name) => name.text === text)!.size;
    expect(size("B")).toBeGreaterThan(size("A"));
    const crowded = drawStep(
      { ...drawing, points: Array.from({ length: 30 }, (_, i) => ({ x: i % 3, y: 200, label: `P${i}` })) },
      100,
      120,
      set,
    );
    const boxes = crowded.items.flatMap((item) =>
      item.kind === "text" ? [{ ...item, right: item.x + set.width(item.text, { size: item.size }) }] : [],
    );
    expect(boxes.length).toBeGreaterThan(0);
    boxes.forEach((one, i) => {
      for (const other of boxes.slice(i + 1)) {
        const apart =
          one.x >= other.right || other.x >= one.right || Math.abs(one.y - other.y) >= one.size * 0.7 - 1e-9;
        expect(apart).toBe(true);
      }
    });
  });
});
