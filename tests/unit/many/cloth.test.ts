import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { allow } from "@/lib/drafting/allow";
import { bounds } from "@/lib/drafting/measure";
import { moveCurves, turnAbout } from "@/lib/drafting/rigid";
import { clothRows } from "@/lib/many/cloth-rows";
import { type CutPiece, cutList } from "@/lib/many/cut-list";
import { draftedOf, draftMany } from "@/lib/many/draft-many";
import { manyText } from "@/lib/many/many-text";
import { pieceSize } from "@/lib/many/piece-size";
import { bought, shopLength } from "@/lib/many/shop-length";
import { simpleNeeds, usualWidths } from "@/lib/many/simple-widths";
import { examplePieces, styleChoices } from "@/lib/sleeves/styles";
import { ask, person } from "./people";

const piece = (id: string, ...sizes: [across: number, along: number, count: number][]): CutPiece => ({
  id,
  name: id,
  count: sizes.reduce((sum, [, , count]) => sum + count, 0),
  onFold: false,
  sizes: sizes.map(([across, along, count]) => ({ across, along, count, wearers: ["Ama"] })),
});

const length = (pieces: CutPiece[], width: number) => {
  const [need] = simpleNeeds(pieces, [width]);
  return need!.ok ? need!.mm : NaN;
};

describe("the room a piece takes", () => {
  it.each(styleChoices.map(({ id }) => id))(
    "%s: holds the line it is cut along, with little to spare",
    (style) => {
      for (const one of examplePieces(style))
        for (const width of [0, 6, 15]) {
          const { from, to } = one.grain;
          const upright = turnAbout({ x: 0, y: 0 }, Math.PI / 2 - Math.atan2(to.y - from.y, to.x - from.x));
          const cut = allow(one, width).cutting.edges.flatMap(({ curves }) => moveCurves(curves, upright));
          const { max, min } = bounds(cut);
          const { across, along } = pieceSize(one, width);
          const spare = 2 * Math.max(width, ...Object.values(one.allowances)) + 1e-6;
          // Offsets are within a hundredth of a millimetre.
          for (const [room, needed] of [
            [across, max.x - min.x],
            [along, max.y - min.y],
          ] as const) {
            expect(room).toBeGreaterThanOrEqual(needed - 0.02);
            expect(room).toBeLessThanOrEqual(needed + spare);
          }
        }
    },
  );

  it("is opened out on the fold", () => {
    const [sleeve] = examplePieces("plain");
    const half = { ...sleeve!, onFold: "underarmBack" };
    expect(pieceSize(half, 0).across).toBeCloseTo(2 * pieceSize(sleeve!, 0).across, 6);
    expect(pieceSize(half, 0).along).toBeCloseTo(pieceSize(sleeve!, 0).along, 6);
  });
});

describe("the cut list", () => {
  const people = [1, 1, 1.1].map((size, n) => person(n, { name: ["Ama", "Bibi", "Cadi"][n]!, size }));
  const drafted = draftedOf(draftMany(people, ask({ style: "bishop" })));
  const list = cutList(drafted, 6.35, 3.175);

  it("counts every piece of everyone, equal sizes together", () => {
    expect(drafted).toHaveLength(3);
    expect(list.map(({ count, name }) => [name, count])).toEqual([
      ["Sleeve", 6],
      ["Cuff", 6],
    ]);
    expect(list[0]!.sizes.map(({ count, wearers }) => [count, wearers])).toEqual([
      [4, ["Ama", "Bibi"]],
      [2, ["Cadi"]],
    ]);
    for (const { count, sizes } of list) expect(sizes.reduce((sum, size) => sum + size.count, 0)).toBe(count);
  });

  it("is sent as words with the cloth, and who is not counted", () => {
    const text = manyText("Bishop for 3", {
      pieces: list,
      cloth: clothRows(list, null, 0, "in"),
      left: [
        { drafted: false, wearer: person(7, { name: "Dilys" }).wearer, set: null, cause: "no-set", why: [] },
      ],
      unit: "in",
      fineness: 8,
    });
    expect(text).toMatch(/^Bishop for 3\n\nSleeve: cut 6 in all\n4 of .* in × .* in: Ama and Bibi\n/u);
    expect(text).toMatch(/44\/45 in wide: [\d.]+ m or [\d /]+ yd/u);
    expect(text).toMatch(/Not counted: Dilys$/u);
  });
});

describe("cloth by simple widths", () => {
  it("lays as many beside each other as the width has room for", () => {
    expect(length([piece("a", [300, 500, 4])], 900)).toBe(1000);
    expect(length([piece("a", [300, 500, 4])], 1200)).toBe(500);
    // The short ones lie beside the long one.
    expect(length([piece("a", [600, 500, 1]), piece("b", [300, 100, 1])], 900)).toBe(500);
    expect(length([], 900)).toBe(0);
  });

  it("names what is wider than the cloth", () => {
    const pieces = [piece("flounce", [1000, 500, 2]), piece("cuff", [200, 80, 2])];
    expect(simpleNeeds(pieces, [900, 1100])).toEqual([
      { ok: false, tooWide: ["flounce"] },
      { ok: true, mm: 1080 },
    ]);
  });

  const pieces = fc
    .array(
      fc.tuple(
        fc.integer({ min: 20, max: 900 }),
        fc.integer({ min: 20, max: 700 }),
        fc.integer({ min: 1, max: 6 }),
      ),
      {
        minLength: 1,
        maxLength: 12,
      },
    )
    .map((sizes) => sizes.map((size, i) => piece(`p${i}`, size)));

  it("is never less than the pieces' area or the longest piece, never more than a row for each, and no more on wider cloth", () => {
    fc.assert(
      fc.property(pieces, (all) => {
        const widths = usualWidths.map(({ mm }) => mm);
        const needs = simpleNeeds(all, widths).map((need) => (need.ok ? need.mm : Infinity));
        const boxes = all.flatMap(({ sizes }) => sizes);
        const area = boxes.reduce((sum, { across, along, count }) => sum + across * along * count, 0);
        const longest = Math.max(...boxes.map(({ along }) => along));
        const each = boxes.reduce((sum, { along, count }) => sum + along * count, 0);
        for (const [i, need] of needs.entries()) {
          expect(need).toBeGreaterThanOrEqual(longest);
          expect(need).toBeGreaterThanOrEqual(area / widths[i]! - 1e-6);
          expect(need).toBeLessThanOrEqual(each);
          if (i > 0) expect(need).toBeLessThanOrEqual(needs[i - 1]!);
        }
      }),
    );
  });
});

describe("what to buy", () => {
  it("is rounded up to the shop's step, a tenth of a metre or an eighth of a yard (memory)", () => {
    expect(shopLength(1000)).toEqual({ metres: "1.0 m", yards: "1 1/8 yd" });
    expect(shopLength(1000.1).metres).toBe("1.1 m");
    // 36 in exactly.
    expect(shopLength(914.4)).toEqual({ metres: "1.0 m", yards: "1 yd" });
    expect(shopLength(914.5).yards).toBe("1 1/8 yd");
    expect(shopLength(0.3 * 1000)).toMatchObject({ metres: "0.3 m" });
  });

  it("is enough after it has shrunk (need/(1 - s))", () => {
    expect(bought(950, 0.05)).toBeCloseTo(1000, 9);
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 20_000, noNaN: true }),
        fc.double({ min: 0, max: 0.3, noNaN: true }),
        (need, s) => {
          const metres = Number.parseFloat(shopLength(bought(need, s)).metres);
          expect(metres * 1000 * (1 - s)).toBeGreaterThanOrEqual(need - 1e-3);
          expect(metres * 1000 - bought(need, s)).toBeLessThan(100 + 1e-6);
        },
      ),
    );
  });

  it("stands first at her own width, and takes it that cloth shrinks across as well", () => {
    const four = [piece("a", [300, 500, 4])];
    const rows = clothRows(four, 1200, 0.05, "cm");
    expect(rows[0]).toMatchObject({ width: "120 cm", own: true, buy: { metres: "1.1 m" } });
    expect(clothRows(four, null, 0, "in").map(({ width }) => width)).toEqual([
      "36 in",
      "44/45 in",
      "54 in",
      "58–60 in",
    ]);
  });
});
