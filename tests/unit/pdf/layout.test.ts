import { describe, expect, it } from "vitest";
import fc from "fast-check";
import { type Block, space } from "@/lib/pdf/blocks";
import { type Group, paginate } from "@/lib/pdf/paginate";
import { splitGraphemes } from "@/lib/pdf/text-runs";
import { typesetter } from "@/lib/pdf/typesetter";
import { boxPainter, printFonts } from "./print-tools";
import { lettersOf } from "@/tests/support/read-pdf";

const set = typesetter(printFonts, boxPainter());
const style = { size: 10 };
const textOf = (block: Block) =>
  block.items.map((item) => (item.kind === "path" ? "" : item.text.replace(/[\u200e\u200f]/g, ""))).join("");
const linesOf = (text: string, width: number) => set.lines(text, style, { x: 0, width });

describe("breaking lines", () => {
  it("breaks at words and keeps every letter, within the width", () => {
    const alphabet = ["a", "Ê", "ж", "λ", " ", " ", "-", "ि", "न", "山", "🧵", "ع", "1", "½", "\n"];
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom(...alphabet), { maxLength: 60 }).map((letters) => letters.join("")),
        fc.integer({ min: 12, max: 200 }),
        (text, width) => {
          const lines = linesOf(text, width);
          expect(lettersOf(lines.map(textOf).join(""))).toBe(lettersOf(text));
          for (const line of lines) {
            // One letter wider than the column cannot be cut.
            const letters = splitGraphemes(textOf(line)).length;
            if (letters > 1) expect(line.width).toBeLessThanOrEqual(width + 0.02);
          }
        },
      ),
    );
  });

  it("does not break inside a word that fits on a line", () => {
    expect(linesOf("Bishop sleeve with cuff", 60).map(textOf)).toEqual(["Bishop sleeve", "with cuff"]);
  });

  it("breaks a word wider than its column between letters", () => {
    const lines = linesOf("Hochzeitskleiderschneiderei", 40).map(textOf);
    expect(lines.length).toBeGreaterThan(2);
    expect(lines.join("")).toBe("Hochzeitskleiderschneiderei");
  });

  it("keeps a figure with its fraction and its unit", () => {
    for (let width = 40; width < 140; width += 3)
      for (const line of linesOf("There, square across 5 ¼ in each way", width).map(textOf)) {
        expect(line).not.toMatch(/5$/);
        expect(line).not.toMatch(/^(¼|in\b)/);
      }
  });

  it("draws each line of a right-to-left paragraph with the paragraph's direction", () => {
    const pictures = linesOf("عباءة بأكمام Size twelve and more words", 90).flatMap(({ items }) =>
      items.flatMap((item) => (item.kind === "picture" ? [item.text] : [])),
    );
    expect(pictures.length).toBeGreaterThan(1);
    for (const text of pictures) expect(text.startsWith("\u200f")).toBe(true);
  });

  it("sets text to the right of its column, to the thousandth of a point", () => {
    const [line] = set.lines("$1,142.00", style, { x: 20, width: 100, align: "right" });
    const [item] = line!.items;
    expect(item?.kind === "text" && item.x + printFonts.width(item.text, 10, false)).toBeCloseTo(120, 3);
  });

  it("makes room above and below for tall pictures", () => {
    const [plain] = linesOf("abc", 100);
    const [tall] = linesOf("abc नंदिनी", 200);
    // The box painter: 1.05 of the size above the baseline, 0.35 below.
    expect(tall!.baseline).toBeCloseTo(10.5, 6);
    expect(tall!.height).toBeCloseTo(14, 6);
    expect(plain!.height).toBeLessThan(tall!.height);
  });
});

describe("dealing out pages", () => {
  const group = (heights: number[], more: Partial<Group> = {}): Group => ({
    parts: heights.map(space),
    ...more,
  });
  const heights = (groups: Group[], room = 100) =>
    paginate(groups, () => room).map(({ blocks }) => blocks.map(({ block }) => block.height));

  it("keeps a group together where a page can hold it", () => {
    expect(heights([group([60]), group([20, 30])])).toEqual([[60], [20, 30]]);
  });
  it("cuts a group that no page can hold, between its parts", () => {
    expect(heights([group([50]), group([40, 40, 40])])).toEqual([
      [50, 40],
      [40, 40],
    ]);
  });
  it("repeats a table's head on each page that goes on with it", () => {
    expect(
      heights([group([90]), group([20], { repeat: space(7) }), group([80], { repeat: space(7) })]),
    ).toEqual([[90], [7, 20], [7, 80]]);
  });
  it("leaves out the space above at the head of a page", () => {
    const [first, second] = paginate([group([90]), group([30], { gap: 15 })], () => 100);
    expect(first!.height).toBe(90);
    expect(second!.blocks[0]!.y).toBe(0);
  });
  it("gives each page its own room", () => {
    const pages = paginate([group([40]), group([40]), group([40])], (page) => (page === 0 ? 50 : 90));
    expect(pages.map(({ blocks }) => blocks.length)).toEqual([1, 2]);
  });
  it("loses no part, overlaps none, and overfills no page", () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.record({
            parts: fc.array(fc.integer({ min: 1, max: 40 }).map(space), { minLength: 1, maxLength: 8 }),
            gap: fc.integer({ min: 0, max: 30 }),
          }),
          { maxLength: 30 },
        ),
        (groups) => {
          const pages = paginate(groups, () => 100);
          const dealt = pages.flatMap(({ blocks }) => blocks.map(({ block }) => block));
          expect(dealt).toEqual(groups.flatMap(({ parts }) => parts));
          for (const { blocks, height } of pages) {
            expect(height).toBeLessThanOrEqual(100);
            blocks.slice(1).forEach(({ y }, i) => {
              expect(y).toBeGreaterThanOrEqual(blocks[i]!.y + blocks[i]!.block.height);
            });
          }
        },
      ),
    );
  });
});
