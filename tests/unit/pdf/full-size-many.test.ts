import fc from "fast-check";
import { svgPathProperties } from "svg-path-properties";
import { describe, expect, it } from "vitest";
import { edgeLength } from "@/lib/drafting";
import { line } from "@/lib/drafting/measure";
import { type CubicBezier, type Point } from "@/lib/drafting/types";
import { clip, part, pointOn } from "@/lib/pdf/bezier-clip";
import { type FullSizePiece } from "@/lib/pdf/full-size-document";
import { type FullSizeLayout, layOut, MOST_SHEETS } from "@/lib/pdf/full-size-layout";
import { fullSizePdf } from "@/lib/pdf/full-size";
import { fullSizeSvg } from "@/lib/pdf/full-size-svg";
import { OVERLAP } from "@/lib/pdf/full-size-tiles";
import { type FullSizePaper, fullSizePaper, isFullSizePaper } from "@/lib/pdf/papers";
import { PRINT_PROBLEM } from "@/lib/pdf/pdf-api";
import { type ReadPdf, readPdf, wordsOf } from "@/tests/support/read-pdf";
import { fanPiece, sample, sleeve } from "./full-size-samples";
import { printTools } from "./print-tools";
import { crossesOf, nameOf } from "./stitch-sheets";

const read = async (job: Parameters<typeof fullSizePdf>[0], more = {}): Promise<ReadPdf> =>
  readPdf(await fullSizePdf(job, printTools(more)));

describe("chosen sheets", () => {
  it("are printed alone, as they stand in the whole", async () => {
    const whole = await read({ docs: [sample()], paper: "a4" });
    const wanted = whole.pages.slice(2, 5).map(nameOf);
    const few = await read({ docs: [sample()], paper: "a4", only: wanted });
    expect(few.pages.map(nameOf)).toEqual(wanted);
    few.pages.forEach((page, i) => {
      expect(page.paths).toEqual(whole.pages[i + 2]!.paths);
      expect(wordsOf([page])).toBe(wordsOf([whole.pages[i + 2]!]));
    });
  });
  it("that are none are refused", () => {
    expect(() => fullSizePdf({ docs: [sample()], paper: "a4", only: ["Z9"] }, printTools())).toThrow(
      /Choose one or more/,
    );
  });
});

describe("what is to be cut in all", () => {
  it("stands after the contents, every line of it, and pushes the pages on where it is long", async () => {
    const docs = ["Ama", "Bibi"].map((wearer) => sample({ wearer, pieces: sample().pieces.slice(0, 1) }));
    const lines = Array.from({ length: 90 }, (_, i) => `Row ${i + 1} of the list`);
    const { pages } = await read({ docs, lists: [{ title: "Sleeve: cut 4 in all", lines }], paper: "a4" });
    const first = pages.findIndex((page) => wordsOf([page]).includes("50 mm"));
    expect(first).toBeGreaterThan(1);
    const front = wordsOf(pages.slice(0, first));
    for (const words of ["Sleeve: cut 4 in all", ...lines]) expect(front).toContain(words);
    expect(front).toContain(`${first + 1} to `);
  });
});

describe("a choir", () => {
  const names = ["Ama", "Юлия", "Nguyễn Thị Ánh", "Marisol"];
  const docs = names.map((wearer, i) =>
    sample({
      wearer,
      pieces: sample().pieces.slice(0, 1),
      warnings: i === 3 ? ["The walk fails: the underarm seams differ by 6 mm."] : [],
    }),
  );

  it.each<FullSizePaper>(["a4", "roll-914"])(
    "has contents that name each wearer and her pages on %s",
    async (paper) => {
      const steps: [number, number][] = [];
      const { pages, info } = await read(
        { docs, paper },
        { onProgress: (done: number, of: number) => steps.push([done, of]) },
      );
      const [front, ...rest] = pages;
      const each = layOut(docs[0]!, paper).sheets.length;
      // Every wearer's sleeve is the same, so are her sheets.
      expect(rest.length).toBeGreaterThanOrEqual(names.length * each);
      const words = wordsOf([front!]);
      let from = 2;
      for (const doc of docs) {
        const count = layOut(doc, paper).sheets.length;
        const to = from + count - 1;
        expect(words).toContain(`${doc.wearer} Sunday sleeve ${count > 1 ? `${from} to ${to}` : from}`);
        for (let page = from; page <= to; page++) {
          expect(wordsOf([pages[page - 1]!])).toContain(doc.wearer);
          expect(wordsOf([pages[page - 1]!])).toContain(`Page ${page} of ${pages.length}`);
        }
        // Two squares of her own.
        expect(wordsOf([pages[from - 1]!])).toContain("50 mm");
        from = to + 1;
      }
      expect(words).toContain("Look at its first sheet");
      expect(info.Title).toBe("Plain sleeve for 4");
      expect(steps.at(-1)![0]).toBe(steps.at(-1)![1]);
    },
  );

  it("says on the first sheet what fails", async () => {
    const { pages } = await read({ docs: [docs[3]!], paper: "a4" });
    expect(wordsOf([pages[0]!])).toContain("The walk fails: the underarm seams differ by 6 mm.");
  });
});

describe("what is too much", () => {
  const huge = (size: number): FullSizePiece => ({
    ...fanPiece(),
    stitch: [[line({ x: 0, y: 0 }, { x: size, y: size }), line({ x: size, y: size }, { x: 0, y: 0 })]],
  });
  it("is refused with a sentence", () => {
    const problem = (() => {
      try {
        return layOut(sample({ pieces: [huge(60000)] }), "a4");
      } catch (error) {
        return error as Error;
      }
    })() as Error;
    expect(problem.name).toBe(PRINT_PROBLEM);
    expect(Number(/\d+/.exec(problem.message)![0])).toBeGreaterThan(MOST_SHEETS);
    expect(() => layOut(sample({ pieces: [] }), "a4")).toThrow(/no piece/);
    expect(() => fullSizePaper("roll-20")).toThrow(RangeError);
    expect(["roll-750", "a4", "roll-20", "roll-x", "b5"].map(isFullSizePaper)).toEqual([
      true,
      true,
      false,
      false,
      false,
    ]);
  });
});

describe("a roll longer than a PDF page", () => {
  it("is cut at 14400 points, in rows that overlap", async () => {
    const long: FullSizePiece = {
      ...fanPiece(),
      stitch: [[line({ x: 0, y: 0 }, { x: 80, y: 6000 }), line({ x: 80, y: 6000 }, { x: 0, y: 0 })]],
      grain: { from: { x: 20, y: 0 }, to: { x: 20, y: 100 } },
    };
    const { pages } = await read({ docs: [sample({ pieces: [long] })], paper: "roll-610" });
    expect(pages.map(nameOf)).toEqual(["A1", "B1"]);
    expect(pages[0]!.height).toBeCloseTo(14400, 3);
    expect(pages[1]!.height).toBeLessThan(14400);
    expect(crossesOf(pages[0]!).map(({ n }) => n)).toEqual(crossesOf(pages[1]!).map(({ n }) => n));
  });
});

const coordinate = fc.double({ min: -300, max: 700, noNaN: true });
const anyPoint = fc.record({ x: coordinate, y: coordinate });
const anyCurve = fc.tuple(anyPoint, anyPoint, anyPoint, anyPoint).map((points): CubicBezier => points);

describe("curves cut at the edges of sheets", () => {
  it("lie inside, on the curve, and leave nothing out", () => {
    const rect = { x: 0, y: 0, w: 400, h: 300 };
    fc.assert(
      fc.property(anyCurve, (curve) => {
        const runs = clip([curve], rect);
        const length = (curves: readonly CubicBezier[]) => edgeLength({ name: "", curves });
        const inRect = ({ x, y }: Point, slack: number) =>
          x >= -slack && y >= -slack && x <= rect.w + slack && y <= rect.h + slack;
        for (const { curves, from } of runs)
          for (const one of curves) {
            expect(from).toBeLessThanOrEqual(length([curve]) + 1e-6);
            for (let t = 0; t <= 1; t += 1 / 16) expect(inRect(pointOn(one, t), 1e-6)).toBe(true);
          }
        // The share of evenly spread parameters that lies inside is the share that was kept.
        const shown = runs.flatMap(({ curves }) =>
          curves.flatMap((one) => Array.from({ length: 9 }, (_, i) => pointOn(one, i / 8))),
        );
        for (let t = 1 / 128; t < 1; t += 1 / 64) {
          const p = pointOn(curve, t);
          if (!inRect(p, -1)) continue;
          const near = runs.some(({ curves }) =>
            curves.some((one) => {
              for (let s = 0; s <= 1; s += 1 / 256) {
                const q = pointOn(one, s);
                if (Math.hypot(p.x - q.x, p.y - q.y) < 12) return true;
              }
              return false;
            }),
          );
          expect(near).toBe(true);
        }
        expect(shown.every((p) => inRect(p, 1e-6))).toBe(true);
      }),
      { numRuns: 150 },
    );
  });

  it("are parts of the curve itself", () => {
    fc.assert(
      fc.property(anyCurve, fc.double({ min: 0, max: 0.5, noNaN: true }), (curve, from) => {
        const half = part(curve, from, 0.8);
        for (const t of [0, 0.3, 1]) {
          const [p, q] = [pointOn(half, t), pointOn(curve, from + (0.8 - from) * t)];
          expect(Math.hypot(p.x - q.x, p.y - q.y)).toBeLessThan(1e-6);
        }
      }),
    );
  });
});

/** Whether the sheets that show a piece hang together side by side. */
function hangsTogether({ pieces, sheets }: FullSizeLayout): boolean {
  return pieces.every(({ marks, words }) => {
    const curves = marks.flatMap((mark) => [...mark.curves]);
    const mine = sheets.filter(
      ({ cell }) =>
        clip(curves, { x: cell.x + 1e-3, y: cell.y + 1e-3, w: cell.w - 2e-3, h: cell.h - 2e-3 }).length > 0 ||
        words.some(
          ({ box }) =>
            box.x >= cell.x && box.x < cell.x + cell.w && box.y >= cell.y && box.y < cell.y + cell.h,
        ),
    );
    const reached = new Set(mine.slice(0, 1));
    for (const one of reached)
      for (const other of sheets)
        if (Math.abs(one.spot[0] - other.spot[0]) + Math.abs(one.spot[1] - other.spot[1]) === 1)
          reached.add(other);
    return mine.every((sheet) => reached.has(sheet));
  });
}

describe("any pieces", () => {
  it("are on printed sheets whole, each piece's sheets hang together, and words lie on one sheet", () => {
    fc.assert(
      fc.property(
        fc.array(fc.array(anyPoint, { minLength: 3, maxLength: 6 }), { minLength: 1, maxLength: 4 }),
        fc.constantFrom<FullSizePaper>("a4", "letter", "a3", "roll-914", "roll-300"),
        (shapes, paper) => {
          const pieces = shapes.map((corners, i): FullSizePiece => ({
            ...fanPiece(),
            id: `p${i}`,
            stitch: [corners.map((corner, at) => line(corner, corners[(at + 1) % corners.length]!))],
            grain: { from: corners[0]!, to: corners[1]! },
            labels: [{ words: "Front", at: corners[2]! }],
          }));
          const layout = layOut(sample({ pieces }), paper);
          expect(hangsTogether(layout)).toBe(true);
          for (const { marks, words } of layout.pieces) {
            for (const curve of marks.flatMap((mark) => [...mark.curves]))
              for (let t = 0; t <= 1; t += 1 / 32) {
                const { x, y } = pointOn(curve, t);
                const held = layout.sheets.some(
                  ({ rect }) =>
                    x >= rect.x - 1e-6 &&
                    x <= rect.x + rect.w + 1e-6 &&
                    y >= rect.y - 1e-6 &&
                    y <= rect.y + rect.h + 1e-6,
                );
                expect(held).toBe(true);
              }
            for (const { box } of words)
              expect(
                layout.sheets.filter(
                  ({ cell }) =>
                    box.x >= cell.x - 1e-6 &&
                    box.y >= cell.y - 1e-6 &&
                    box.x + box.w <= cell.x + cell.w + 1e-6 &&
                    box.y + box.h <= cell.y + cell.h + 1e-6,
                ).length,
              ).toBeGreaterThan(0);
          }
          // Pieces lie apart.
          const boxes = layout.pieces.map(({ marks }) => marks.flatMap((mark) => mark.curves.flat()));
          boxes.forEach((one, i) => {
            for (const other of boxes.slice(i + 1)) {
              const gap = (key: "x" | "y") =>
                Math.max(
                  Math.min(...other.map((p) => p[key])) - Math.max(...one.map((p) => p[key])),
                  Math.min(...one.map((p) => p[key])) - Math.max(...other.map((p) => p[key])),
                );
              expect(Math.max(gap("x"), gap("y"))).toBeGreaterThan(OVERLAP - 1e-6);
            }
          });
        },
      ),
      { numRuns: 60 },
    );
  });
});

describe("the drawing file", () => {
  const svg = fullSizeSvg(sample({ wearer: "Ama & <Efua>" }));
  it("is in millimetres, one group with a title for each piece, curves as cubics", () => {
    const [, w, h] = /width="([\d.]+)mm" height="([\d.]+)mm"/.exec(svg)!;
    expect(svg).toContain(`viewBox="0 0 ${w} ${h}"`);
    expect(svg).toContain("<title>Sleeve, Cut 2, mirrored</title>");
    expect(svg).toContain("<title>Flounce, Cut 2</title>");
    expect(svg).toContain("Ama &amp; &lt;Efua&gt;");
    expect(svg).not.toContain("<Efua>");
    expect(svg.match(/<g id="piece-/g)).toHaveLength(2);
  });
  it("has the seams at their length and the squares at theirs", () => {
    const [, sewn] = /class="sew" d="([^"]+)"/.exec(svg.slice(svg.indexOf("<title>Sleeve,")))!;
    const { edges } = sleeve.draft.piece;
    const whole = edges.reduce((sum, edge) => sum + edgeLength(edge), 0);
    expect(Math.abs(new svgPathProperties(sewn!.replace(/Z$/, "")).getTotalLength() - whole)).toBeLessThan(
      0.1,
    );
    expect(
      [...svg.matchAll(/class="square"[^>]+width="([\d.]+)" height="([\d.]+)"/g)].map(([, w, h]) => [w, h]),
    ).toEqual([
      ["50", "50"],
      ["50.8", "50.8"],
    ]);
  });
});
