import { describe, expect, it } from "vitest";
import { bounds } from "@/lib/drafting";
import { clip } from "@/lib/pdf/bezier-clip";
import { outlinesOf } from "@/lib/pdf/full-size-marks";
import { type FullSizePiece } from "@/lib/pdf/full-size-document";
import { type SleeveAskRecord, type StyleId } from "@/lib/records/types";
import { type FullSizeAsk, fullSizeDocument } from "@/lib/sleeves/full-size";
import { type GoodSleeve, styleFromRecord } from "@/lib/sleeves/make-style-from-record";

const typed = (mm: number) => ({ mm, typed: String(mm) });
const record: SleeveAskRecord = {
  lengths: {
    length: typed(560),
    biceps: typed(340),
    hem: typed(230),
    capDepth: typed(140),
  } as unknown as SleeveAskRecord["lengths"],
  frontMarks: null,
  backMarks: null,
  hemOpens: true,
};

function good(style: StyleId = "plain"): GoodSleeve {
  const made = styleFromRecord({ style, ask: record });
  if (!made?.ok) throw new Error("The sample sleeve cannot be drawn.");
  return made;
}

const ask = (more: Partial<FullSizeAsk> = {}): FullSizeAsk => ({
  sleeve: { name: "Sunday sleeve", fineness: 8 },
  good: good(),
  allowance: 10,
  unit: "cm",
  wearerName: "Ama",
  author: "Thimble Lane",
  today: "2025-12-01",
  ...more,
});

describe("the pieces of a sleeve at full size", () => {
  it("are cut outside the line to sew by their allowances, notches between the two", () => {
    const [piece] = fullSizeDocument(ask()).pieces;
    const box = (chains: readonly FullSizePiece["stitch"][number][]) => bounds(chains.flat());
    const [sewn, cut] = [box(piece!.stitch), box(piece!.cutting!)];
    expect(sewn.min.y - cut.min.y).toBeCloseTo(10, 2);
    // The hem has its own.
    expect(cut.max.y - sewn.max.y).toBeCloseTo(31.75, 2);
    for (const [inner, outer] of piece!.notches)
      expect(Math.hypot(outer.x - inner.x, outer.y - inner.y)).toBeCloseTo(10, 1);
    expect(piece!.notches.length).toBeGreaterThanOrEqual(3);
    expect(piece!.cutWords).toBe("Cut 2, mirrored");
    expect(fullSizeDocument(ask()).allowances).toBe("Allowances drawn: 1 cm, but Sleeve, foot 3.2 cm.");
  });

  it("without allowances have no line to cut, and notches inside", () => {
    const doc = fullSizeDocument(ask({ allowance: null }));
    const [piece] = doc.pieces;
    expect(piece!.cutting).toBeUndefined();
    expect(doc.allowances).toMatch(/No allowances/);
    const { max, min } = bounds(piece!.stitch.flat());
    for (const [, end] of piece!.notches)
      expect(end.x > min.x && end.x < max.x && end.y > min.y && end.y < max.y).toBe(true);
  });

  it("say what fails, in the workshop's unit", () => {
    const made = good();
    const seam = { ...made.seams[0]!, agrees: false };
    const doc = fullSizeDocument(ask({ good: { ...made, seams: [seam] }, unit: "in" }));
    expect(doc.warnings[0]).toMatch(/fails/);
    expect(doc.warnings.length).toBeGreaterThan(1);
    expect(doc.warnings.join(" ")).toMatch(/\d in\b/);
    expect(fullSizeDocument(ask({ good: { ...made, seams: [], checks: [] } })).warnings).toEqual([]);
  });

  it("leave the fold open, so that nothing is cut or sewn along it", () => {
    const made = good();
    const onFold = { ...made.pieces[0]!, onFold: "underarmFront", cut: { count: 1, mirrored: false } };
    const [piece] = fullSizeDocument(ask({ good: { ...made, pieces: [onFold] } })).pieces;
    const fold = piece!.lines.find(({ kind }) => kind === "fold")!;
    expect(fold.words).toBe("Lay on the fold");
    expect(piece!.cutWords).toBe("Cut 1 on the fold");
    const [a, , , d] = fold.curves[0]!;
    const middle = { x: (a.x + d.x) / 2 - 1, y: (a.y + d.y) / 2 - 1, w: 2, h: 2 };
    for (const chain of [...piece!.stitch, ...piece!.cutting!]) expect(clip(chain, middle)).toEqual([]);
    for (const chain of outlinesOf(piece!)) expect(chain[0]![0]).toEqual(chain.at(-1)![3]);
  });
});
