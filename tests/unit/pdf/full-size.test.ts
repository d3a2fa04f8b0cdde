import { svgPathProperties } from "svg-path-properties";
import { beforeAll, describe, expect, it } from "vitest";
import { edgeLength } from "@/lib/drafting";
import { type CubicBezier } from "@/lib/drafting/types";
import { type FullSizeDocument } from "@/lib/pdf/full-size-document";
import { layOut } from "@/lib/pdf/full-size-layout";
import { fullSizePdf } from "@/lib/pdf/full-size";
import { strokes } from "@/lib/pdf/full-size-strokes";
import { type FullSizePaper } from "@/lib/pdf/papers";
import { type ReadPath, type ReadPdf, readPdf, wordsOf } from "@/tests/support/read-pdf";
import { svgPath } from "../drafting/helpers";
import { fanDepth, fanInner, fanTurn, sample, sleeve, sleevePiece } from "./full-size-samples";
import { printTools } from "./print-tools";
import { cutAndLaid, loopsOf, nameOf, seamsOf, stitch, type StitchedSheet } from "./stitch-sheets";

const MM = 72 / 25.4;
const papers: FullSizePaper[] = ["a4", "letter", "a3", "roll-610", "roll-300"];
// A4 and Letter: sources.md (seen). A3: twice an A4 to the millimetre. Rolls: 1 in = 25.4 mm.
const sizes: Record<string, [width: number, height?: number]> = {
  a4: [595.276, 841.89],
  letter: [612, 792],
  a3: [841.89, 1190.551],
  "roll-610": [1729.134],
  "roll-300": [850.394],
};

const read = async (doc: FullSizeDocument, paper: FullSizePaper, only?: string[]): Promise<ReadPdf> =>
  readPdf(await fullSizePdf({ docs: [doc], paper, ...(only && { only }) }, printTools()));

const drawnAs =
  (weight: "cut" | "sew" | "notch") =>
  ({ stroked, width, dash, steps }: ReadPath): boolean =>
    stroked &&
    Math.abs(width - strokes[weight].width) < 1e-3 &&
    dash.length === (strokes[weight].dash ?? []).length &&
    steps.some(({ op }) => op === "c");

const lengthOf = (curves: readonly CubicBezier[]) => new svgPathProperties(svgPath(curves)).getTotalLength();

/** The loops of one kind of line on all islands. */
function loops(sheets: readonly StitchedSheet[], weight: "cut" | "sew"): CubicBezier[][] {
  const islands = [...new Set(sheets.map(({ island }) => island))];
  return islands.flatMap((island) =>
    loopsOf(
      cutAndLaid(
        sheets.filter((sheet) => sheet.island === island),
        drawnAs(weight),
      ),
      0.02,
    ),
  );
}

const sorted = (lengths: readonly number[]) => lengths.toSorted((a, b) => a - b);

function expectLengths(found: readonly number[], wanted: readonly number[]) {
  expect(found).toHaveLength(wanted.length);
  sorted(found).forEach((length, i) => expect(Math.abs(length - sorted(wanted)[i]!)).toBeLessThan(0.1));
}

describe.each(papers)("a pattern on %s", (paper) => {
  let pdf: ReadPdf;
  let sheets: StitchedSheet[];
  beforeAll(async () => {
    pdf = await read(sample(), paper);
    sheets = stitch(pdf.pages);
  });

  it("has the paper's own size and fonts of its own", () => {
    const [width, height] = sizes[paper]!;
    for (const page of pdf.pages) {
      expect(page.width).toBeCloseTo(width, 2);
      if (height) expect(page.height).toBeCloseTo(height, 2);
      else expect(page.height).toBeLessThanOrEqual(14400);
    }
    expect(pdf.pages.flatMap(({ pictures }) => pictures)).toEqual([]);
  });

  it("draws and writes inside the margins of 10 mm", () => {
    const edge = 10 * MM - 0.02;
    for (const { width, height, paths, texts } of pdf.pages) {
      for (const { text, left, right, baseline } of texts) {
        expect(left, text).toBeGreaterThan(edge);
        expect(right, text).toBeLessThan(width - edge);
        expect(baseline, text).toBeLessThan(height - edge);
      }
      for (const { steps } of paths)
        for (const { op, c } of steps) {
          // Handles may lie outside; the ends of a curve may not.
          const [x, y] = op === "h" ? [edge + 1, edge + 1] : [c.at(-2)!, c.at(-1)!];
          expect(Math.min(x - edge, y - edge, width - edge - x, height - edge - y)).toBeGreaterThan(0);
        }
    }
  });

  it("is joined by crosses that agree", () => {
    for (const { miss, crosses } of sheets) {
      expect(miss).toBeLessThan(0.01);
      expect(new Set(crosses.map(({ n }) => n)).size).toBe(crosses.length);
    }
    const all = sheets.flatMap(({ crosses }) => crosses.map(({ n }) => n));
    for (const n of new Set(all)) expect(all.filter((one) => one === n)).toHaveLength(2);
  });

  it("has every seam at its length when the sheets are cut and stitched", () => {
    const length = (name: string) => edgeLength(sleeve.draft.piece.edges.find((edge) => edge.name === name)!);
    const wanted = [
      length("capFront") + length("capBack"),
      length("underarmFront"),
      length("underarmBack"),
      length("hem"),
      // Arcs as Béziers miss the circle by less than 0.001 mm here.
      fanInner * fanTurn,
      (fanInner + fanDepth) * fanTurn,
      fanDepth,
      fanDepth,
    ];
    const seams = loops(sheets, "sew").flatMap((loop) => seamsOf(loop));
    expectLengths(seams.map(lengthOf), wanted);
  });

  it("has the line to cut along, heavier than the line to sew", () => {
    const sides = loops(sheets, "cut").flatMap((loop) => seamsOf(loop));
    const box = sleevePiece.cutting![0]!.map((side) => lengthOf([side]));
    expectLengths(sides.map(lengthOf), box);
    expect(strokes.cut.width).toBeGreaterThan(strokes.sew.width);
  });

  it("has the notches at their places on the cap", () => {
    const seams = loops(sheets, "sew").flatMap((loop) => seamsOf(loop));
    const cap = seams.find((seam) => {
      const { lengths } = sleeve.draft;
      return Math.abs(lengthOf(seam) - lengths.capFront - lengths.capBack) < 0.1;
    })!;
    const whole = new svgPathProperties(svgPath(cap));
    const island = sheets.filter((sheet) => sheet.page.paths.some(drawnAs("notch")))[0]!.island;
    const found = cutAndLaid(
      sheets.filter((sheet) => sheet.island === island),
      drawnAs("notch"),
    ).map(([start]) => {
      let best = { at: 0, off: Infinity };
      for (let at = 0; at <= whole.getTotalLength(); at += 0.02) {
        const p = whole.getPointAtLength(at);
        const off = Math.hypot(p.x - start.x, p.y - start.y);
        if (off < best.off) best = { at, off };
      }
      expect(best.off).toBeLessThan(0.1);
      return best.at;
    });
    const { capFront } = sleeve.draft.lengths;
    const wanted = sleeve.draft.piece.notches.flatMap(({ edge, at, count }) => {
      const along = edge === "capFront" ? at : capFront + at;
      return count === 1 ? [along] : [along - 3, along + 3];
    });
    expectLengths(found, wanted);
  });

  it("has squares of 50 mm and 2 in on the first sheet alone", () => {
    const squares = (page: ReadPdf["pages"][number]) =>
      page.paths.flatMap(({ steps, stroked, filled, width }) => {
        if (steps.map(({ op }) => op).join("") !== "mlllh" || !stroked || filled) return [];
        const [a, b, c, d] = steps.map(({ c: [x, y] }) => ({ x: x! / MM, y: y! / MM }));
        const sides = [b!.x - a!.x, c!.y - b!.y, c!.x - d!.x, d!.y - a!.y];
        return width === 0.5 && sides.every((side) => side > 40) ? [sides] : [];
      });
    const [first, ...rest] = pdf.pages;
    const found = squares(first!);
    expect(found).toHaveLength(2);
    for (const [i, side] of [50, 2 * 25.4].entries())
      for (const one of found[i]!) expect(Math.abs(one - side)).toBeLessThan(0.1);
    expect(rest.flatMap(squares)).toEqual([]);
  });

  it("says whose, what, when, how to cut, and which sheet it is", () => {
    const [first] = pdf.pages;
    const words = wordsOf([first!]);
    for (const said of [
      "Sunday sleeve",
      "Ama",
      "Plain sleeve",
      "1 December 2025",
      "Allowances drawn",
      "50 mm",
      "2 in",
    ])
      expect(words).toContain(said);
    const all = wordsOf(pdf.pages);
    for (const said of ["Cut 2, mirrored", "Cut 2", "Flounce", "Front", "Biceps line"])
      expect(all).toContain(said);
    expect(all.match(/Cut 2, mirrored/g)).toHaveLength(1);
    pdf.pages.forEach((page, i) =>
      expect(wordsOf([page])).toContain(`Sheet ${i + 1} of ${pdf.pages.length}`),
    );
    const names = pdf.pages.map(nameOf);
    expect(names[0]).toBe("A1");
    expect(new Set(names).size).toBe(names.length);
    for (const name of names) expect(wordsOf([first!])).toContain(name);
  });

  it("counts the sheets before they are made", () => {
    const { sheets: planned } = layOut(sample(), paper);
    expect(planned.map(({ name }) => name)).toEqual(pdf.pages.map(nameOf));
  });

  it("leaves out sheets with nothing on them, and keeps each piece together", () => {
    const { columns, rows } = layOut(sample(), paper);
    const hasInk = ({ paths, texts, height }: ReadPdf["pages"][number]) =>
      paths.some(({ steps }) => steps.some(({ op }) => op === "c")) ||
      texts.some(({ baseline, text }) => baseline < height - 16 * MM && !/^\d+$/.test(text));
    if (paper === "a4") expect(pdf.pages.length).toBeLessThan(columns * rows);
    // On these papers no sheet is wanted only as a bridge between others.
    expect(pdf.pages.filter((page) => !hasInk(page)).map(nameOf)).toEqual([]);
    // The fan, and what hangs on it, is one island: all its loops closed above.
    expect(Math.max(...sheets.map(({ island }) => island))).toBeLessThanOrEqual(2);
  });
});
