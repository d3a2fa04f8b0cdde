import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Point } from "@/lib/drafting";
import { allow, type CornerRule, STROKES_APART } from "@/lib/drafting/allow";
import { CORNER_LIMIT } from "@/lib/drafting/corner";
import { line } from "@/lib/drafting/measure";
import { pattern, rectangle } from "@/lib/drafting/styles/parts";
import { awayFrom, cornersOf, polygon, polyline, ringOf, shoelace, sleeve } from "./allow-witness";
import { child, human } from "./helpers";

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("corners", () => {
  it("of a rectangle are mitred to the last digit, each edge with its own width", () => {
    const piece = pattern(rectangle(200, 100), "band", "Band", {
      allowances: { top: 10, right: 20, left: 0 },
    });
    const { cutting } = allow(piece, 15);
    expect(cutting.edges.map(({ name, curves }) => [name, curves])).toEqual([
      ["top", [line({ x: -100, y: -10 }, { x: 120, y: -10 })]],
      ["right", [line({ x: 120, y: -10 }, { x: 120, y: 115 })]],
      ["bottom", [line({ x: 120, y: 115 }, { x: -100, y: 115 })]],
      ["left", [line({ x: -100, y: 115 }, { x: -100, y: -10 })]],
    ]);
  });

  it("squared end square to the seam sewn first, and as far along it on both pieces of that seam", () => {
    fc.assert(
      fc.property(real(0.6, 2.5), real(5, 20), real(5, 20), (angle, seam, crossing) => {
        // A seam 300 mm long at the right of one piece and the left of another; at its foot they meet in one straight line.
        const slant = { x: 200 * Math.cos(angle), y: 200 * Math.sin(angle) };
        const left = polygon([
          { x: -150, y: -300 },
          { x: 0, y: -300 },
          { x: 0, y: 0 },
          { x: -slant.y, y: slant.x },
        ]);
        const right = polygon([
          { x: 0, y: -300 },
          { x: 150, y: -300 },
          { x: slant.y, y: -slant.x },
          { x: 0, y: 0 },
        ]);
        fc.pre(shoelace(cornersOf(left)) > 0 && shoelace(cornersOf(right)) > 0);
        fc.pre(Math.hypot(crossing / Math.sin(angle), seam) < CORNER_LIMIT * Math.max(seam, crossing));
        const first =
          (name: string): CornerRule =>
          (one) =>
            one === name ? "squared" : "mitred";
        const one = allow({ ...left, allowances: { e1: seam } }, crossing, first("e1"));
        const other = allow({ ...right, allowances: { e3: seam } }, crossing, first("e3"));
        const foot = { x: 0, y: crossing / Math.sin(angle) };
        const ends = [one, other].map(({ cutting }) => ringOf(cutting, 1));
        for (const [i, side] of [1, -1].entries()) {
          const near = (p: Point) => Math.min(...ends[i]!.map((q) => Math.hypot(p.x - q.x, p.y - q.y)));
          expect(near(foot)).toBeLessThan(1e-6);
          expect(near({ x: side * seam, y: foot.y })).toBeLessThan(1e-6);
        }
      }),
    );
  });

  it("on the fold of the cloth do not reach past the fold", () => {
    fc.assert(
      fc.property(real(-80, 80), real(-80, 80), real(3, 25), (up, down, width) => {
        // The fold runs up the left side; above and below the seams leave it at a slant.
        const piece = polygon(
          [
            { x: 0, y: 0 },
            { x: 120, y: up },
            { x: 120, y: 200 + down },
            { x: 0, y: 200 },
          ],
          { onFold: "e3" },
        );
        const ring = ringOf(allow(piece, width).cutting, 1);
        expect(Math.min(...ring.map(({ x }) => x))).toBeGreaterThan(-1e-9);
        // The seams go on to the fold at their full width.
        const [above, below] = [width * Math.hypot(1, up / 120), width * Math.hypot(1, down / 120)];
        for (const y of [-above, 200 + below])
          expect(Math.min(...ring.map((p) => Math.hypot(p.x, p.y - y)))).toBeLessThan(1e-6);
      }),
    );
  });

  it("on the fold stay behind it where the seam runs almost along it, too", () => {
    const piece = polygon(
      [
        { x: 0, y: 0 },
        { x: 20, y: -100 },
        { x: 120, y: 200 },
        { x: 0, y: 200 },
      ],
      { onFold: "e3" },
    );
    const ring = ringOf(allow(piece, 5).cutting, 1);
    expect(Math.min(...ring.map(({ x }) => x))).toBeGreaterThan(-1e-9);
    // 5 mm outside a seam that leaves the fold at the angle whose tangent is 20 in 100.
    expect(Math.min(...ring.filter(({ x }) => x < 1e-9).map(({ y }) => y))).toBeCloseTo(
      (-5 * Math.hypot(20, 100)) / 20,
      6,
    );
  });

  it("too sharp for a mitre are cut off at the limit, square to the line that halves them", () => {
    const piece = polygon([
      { x: 0, y: 0 },
      { x: 300, y: 40 },
      { x: 0, y: 80 },
    ]);
    const ring = ringOf(allow(piece, 10).cutting, 1);
    expect(Math.max(...ring.map(({ x }) => x))).toBeCloseTo(300 + 10 * CORNER_LIMIT, 9);
    expect(ring.filter(({ x }) => x > 324.99)).toHaveLength(2);
  });

  it("between two widths on a smooth seam step out square", () => {
    const p = (x: number, y: number): Point => ({ x, y });
    const piece = polygon([p(0, 0), p(100, 0), p(200, 0), p(200, 100), p(0, 100)], {
      allowances: { e1: 25 },
    });
    const ring = ringOf(allow(piece, 10).cutting, 1);
    for (const corner of [p(100, -10), p(100, -25)])
      expect(Math.min(...ring.map((q) => Math.hypot(q.x - corner.x, q.y - corner.y)))).toBeLessThan(1e-9);
  });
});

describe("notches", () => {
  it("stand square to the seam, from the stitch line to the cutting line, one stroke or two", () => {
    fc.assert(
      fc.property(human, real(3, 25), (f, width) => {
        const piece = sleeve(f);
        const { cutting, notches } = allow(piece, width);
        const cut = ringOf(cutting, 60);
        expect(notches.map(({ notch }) => notch)).toEqual(piece.notches);
        for (const { notch, strokes } of notches) {
          expect(strokes).toHaveLength(notch.count);
          const curves = piece.edges.find(({ name }) => name === notch.edge)!.curves;
          const seam = polyline(curves, 400);
          for (const { inner, outer } of strokes) {
            expect(awayFrom(inner, seam)).toBeLessThan(0.01);
            expect(awayFrom(outer, cut, true)).toBeLessThan(0.01);
            const size = Math.hypot(outer.x - inner.x, outer.y - inner.y);
            // In a hollow tighter than the allowance the cutting line lies nearer than its width along the stroke.
            expect(size).toBeLessThan(width + 0.01);
            const away = seam.map((p) => Math.hypot(p.x - inner.x, p.y - inner.y));
            const nearest = away.indexOf(Math.min(...away));
            const [a, b] = [seam[Math.max(0, nearest - 1)]!, seam[Math.min(seam.length - 1, nearest + 1)]!];
            const along = ((b.x - a.x) * (outer.x - inner.x) + (b.y - a.y) * (outer.y - inner.y)) / size;
            // Half a step of 400 on the curve turns by less than this.
            expect(Math.abs(along) / Math.hypot(b.x - a.x, b.y - a.y)).toBeLessThan(0.01);
          }
          if (notch.count === 2) {
            const [one, other] = strokes.map(({ inner }) => inner);
            const apart = Math.hypot(other!.x - one!.x, other!.y - one!.y);
            expect(apart).toBeGreaterThan(STROKES_APART * 0.9);
            expect(apart).toBeLessThan(STROKES_APART + 1e-9);
          }
        }
      }),
      { numRuns: 30 },
    );
  });

  it("of two strokes at the end of an edge stay on it; without an allowance a stroke has no length", () => {
    const band = rectangle(200, 100);
    const notches = [
      { edge: "top", at: 1, count: 2 as const },
      { edge: "left", at: 40, count: 1 as const },
    ];
    const piece = pattern({ ...band, notches }, "band", "Band", { allowances: { left: 0 } });
    const [top, left] = allow(piece, 10).notches;
    const near = (x: number, y: number) => ({ x: expect.closeTo(x, 9), y: expect.closeTo(y, 9) });
    expect(top!.strokes).toEqual([
      { inner: near(-100, 0), outer: near(-100, -10) },
      { inner: near(-94, 0), outer: near(-94, -10) },
    ]);
    expect(left!.strokes).toEqual([{ inner: near(-100, 60), outer: near(-100, 60) }]);
  });
});

describe("what cannot be", () => {
  it("is refused: a width below nothing, an outline the wrong way round", () => {
    expect(() => allow(sleeve(child), -1)).toThrow(RangeError);
    expect(() => allow(sleeve(child, { allowances: { hem: NaN } }), 10)).toThrow(RangeError);
    const wrong = [...cornersOf(rectangle(200, 100))].reverse();
    expect(() => allow(polygon(wrong), 10)).toThrow(RangeError);
  });

  it("leaves the piece as it was where nothing is allowed", () => {
    const piece = sleeve(child);
    expect(allow(piece, 0).cutting.edges).toEqual(piece.edges);
  });
});
