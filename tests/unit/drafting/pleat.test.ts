import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { area, type CubicBezier, type Piece, type Point } from "@/lib/drafting";
import { isClosed } from "@/lib/drafting/outline";
import { pleat, type PleatAsk } from "@/lib/drafting/pleat";
import { angleOf } from "@/lib/drafting/rigid";
import { withHead } from "@/lib/drafting/styles/spread-piece";
import { rectangle } from "@/lib/drafting/styles/parts";
import { awayFrom, polyline, ringOf, shoelace } from "./allow-witness";
import { draft, human } from "./helpers";
import { witnessLength } from "./style-asks";

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const down = { x: 0, y: 1 };

type Kind = { kind: "knife"; direction: "onward" | "back" } | { kind: "box" | "inverted" };
const kinds: fc.Arbitrary<Kind> = fc.constantFrom<Kind>(
  { kind: "knife", direction: "onward" },
  { kind: "knife", direction: "back" },
  { kind: "box" },
  { kind: "inverted" },
);

const edge = (piece: Pick<Piece, "edges">, name: string): readonly CubicBezier[] =>
  piece.edges.find((one) => one.name === name)!.curves;

/** Pleats in the head of any sleeve, straight down from it, with room for the underlay on both sides. */
const headPleats = fc
  .record({ f: human, share: real(0.35, 0.65), depth: real(0.01, 0.06), kind: kinds })
  .map(({ f, share, depth, kind }) => {
    const piece = withHead(draft(f).piece);
    const at = share * witnessLength(edge(piece, "head"));
    const ask: PleatAsk = {
      edge: "head",
      at,
      across: down,
      depth: depth * Math.min(f.biceps, f.hem),
      ...kind,
    };
    return { piece, ask };
  });

/** Where a point of the opened piece comes to lie when every fold is made, worked out from the upright folds alone. */
function folded(point: Point, folds: readonly number[]): Point {
  // Each fold turns over all the cloth beyond it, from the last to the first.
  const x = [...folds]
    .sort((a, b) => b - a)
    .reduce((lies, fold) => (point.x > fold ? 2 * fold - lies : lies), point.x);
  return { x, y: point.y };
}

describe("a pleat", () => {
  it("folded is the former piece: every point of the opened edges comes to lie on the old ones", () => {
    fc.assert(
      fc.property(headPleats, ({ piece, ask }) => {
        const { piece: opened, folds, motions } = pleat(piece, ask);
        const lines = folds.flatMap(({ fold, inner }) => [fold[0].x, inner[0].x]);
        const shift = motions[0]!.dx;
        for (const name of ["head", "foot"]) {
          const before = polyline(edge(piece, name), 300);
          for (const point of polyline(edge(opened, name), 12)) {
            const { x, y } = folded(point, lines);
            // 300 chords a curve leave out less than this.
            expect(awayFrom({ x: x - shift, y }, before)).toBeLessThan(0.005);
          }
        }
      }),
      { numRuns: 40 },
    );
  });

  it("measures folded what the edge measured before, and takes up the rest", () => {
    fc.assert(
      fc.property(headPleats, ({ piece, ask }) => {
        const { piece: opened, lengths } = pleat(piece, ask);
        const [before, after] = [piece, opened].map((p) => witnessLength(edge(p, "head")));
        expect(Math.abs(lengths.folded - before!)).toBeLessThan(1e-3);
        expect(Math.abs(lengths.flat - after!)).toBeLessThan(1e-3);
        expect(lengths.flat - lengths.takenUp).toBe(lengths.folded);
        // Level or steep, the folded stretch is at least as long as it is deep.
        const layers = ask.kind === "knife" ? 2 : 4;
        expect(lengths.takenUp).toBeGreaterThan(layers * ask.depth - 1e-6);
      }),
      { numRuns: 40 },
    );
  });

  it("opens into a closed piece that is wider by twice the depth for every fold, its panels only moved", () => {
    fc.assert(
      fc.property(headPleats, ({ piece, ask }) => {
        const { piece: opened, panels, motions, folds } = pleat(piece, ask);
        expect(isClosed(opened)).toBe(true);
        expect(opened.edges.map(({ name }) => name)).toEqual(piece.edges.map(({ name }) => name));
        for (const motion of motions) expect(angleOf(motion)).toBe(0);
        const total = motions.at(-1)!.dx - motions[0]!.dx;
        expect(total).toBeCloseTo(2 * ask.depth * folds.length, 9);
        expect(motions.at(-1)!.dx).toBeCloseTo(-motions[0]!.dx, 9);
        expect(panels.every(isClosed)).toBe(true);
        const sum = panels.reduce((all, panel) => all + shoelace(ringOf(panel, 200)), 0);
        expect(Math.abs(sum - shoelace(ringOf(piece, 200)))).toBeLessThan(1e-4 * sum);
        // Each fold of the underlay lies half way between the one on top and where that one comes to.
        for (const { fold, inner, onto } of folds) {
          expect(inner[0].x).toBeCloseTo((fold[0].x + onto[0].x) / 2, 8);
          expect(Math.abs(fold[0].x - onto[0].x)).toBeCloseTo(2 * ask.depth, 8);
          expect(fold[0].y).toBeCloseTo(onto[0].y, 8);
          expect(fold[1].y).toBeCloseTo(onto[1].y, 8);
        }
      }),
      { numRuns: 40 },
    );
  });

  it("keeps every notch at the same point of its panel", () => {
    fc.assert(
      fc.property(headPleats, ({ piece, ask }) => {
        const { piece: opened, motions, folds } = pleat(piece, ask);
        const before = polyline(edge(piece, "head"), 400);
        for (const [i, notch] of opened.notches.entries()) {
          const old = piece.notches[i]!;
          const [here, there] = [at(opened, notch), at(piece, old)];
          const after =
            here.x > Math.max(...folds.flatMap(({ fold, onto }) => [fold[0].x, onto[0].x])) - 1e-6;
          const first =
            here.x < Math.min(...folds.flatMap(({ fold, onto }) => [fold[0].x, onto[0].x])) + 1e-6;
          if (!after && !first) continue;
          const { dx } = after ? motions.at(-1)! : motions[0]!;
          expect(Math.hypot(here.x - dx - there.x, here.y - there.y)).toBeLessThan(1e-3);
          expect(awayFrom({ x: here.x - dx, y: here.y }, before)).toBeLessThan(0.005);
        }
      }),
      { numRuns: 30 },
    );
  });
});

/** By walking a fine polyline. */
function at(piece: Piece, { edge: name, at: mm }: { edge: string; at: number }): Point {
  const points = polyline(edge(piece, name), 2000);
  let left = mm;
  for (let i = 1; i < points.length; i++) {
    const [a, b] = [points[i - 1]!, points[i]!];
    const step = Math.hypot(b.x - a.x, b.y - a.y);
    if (left <= step) return { x: a.x + ((b.x - a.x) * left) / step, y: a.y + ((b.y - a.y) * left) / step };
    left -= step;
  }
  return points.at(-1)!;
}

describe("on a rectangle", () => {
  const band = { ...rectangle(200, 100), notches: [{ edge: "top", at: 150, count: 1 as const }] };
  const place = { edge: "top", at: 80, depth: 15 };

  it("a knife pleat takes up twice its depth, points where it is told and moves the notch on", () => {
    const onward = pleat(band, { ...place, kind: "knife", direction: "onward" });
    expect(area(onward.piece)).toBeCloseTo(230 * 100, 6);
    expect(onward.lengths.takenUp).toBeCloseTo(30, 9);
    expect(onward.piece.notches[0]!.at).toBeCloseTo(180, 9);
    // The band lies 15 to each side now: its fold, once 20 left of the middle, is at -35 and comes to -5.
    const xs = ({ folds }: typeof onward) =>
      folds.map(({ fold, inner, onto }) =>
        [fold[0].x, inner[0].x, onto[0].x].map((x) => Math.round(x * 1e6) / 1e6),
      );
    expect(xs(onward)).toEqual([[-35, -20, -5]]);
    expect(xs(pleat(band, { ...place, kind: "knife", direction: "back" }))).toEqual([[-5, -20, -35]]);
    expect(xs(pleat(band, { ...place, kind: "inverted" }))).toEqual([
      [-50, -35, -20],
      [10, -5, -20],
    ]);
    expect(xs(pleat(band, { ...place, kind: "box" }))).toEqual([
      [-35, -50, -65],
      [-5, 10, 25],
    ]);
  });

  it("is drawn as folds and the lines that they come to, from edge to edge", () => {
    const { lines } = pleat(band, { ...place, kind: "box" });
    expect(lines.map(({ kind }) => kind)).toEqual(["fold", "fold", "placement", "fold", "fold", "placement"]);
    for (const { curves } of lines) expect(witnessLength(curves)).toBeCloseTo(100, 6);
  });

  it("keeps the grain inside the panel it was drawn on", () => {
    const { piece } = pleat(band, { ...place, kind: "knife", direction: "onward" });
    expect([piece.grain.from.x, piece.grain.to.x]).toEqual([15, 15]);
  });

  it("cannot be deeper than the piece beside it, nor run out of the piece", () => {
    expect(() => pleat(band, { ...place, depth: 81, kind: "knife", direction: "onward" })).toThrow(
      RangeError,
    );
    expect(() => pleat(band, { ...place, depth: 81, kind: "knife", direction: "back" })).not.toThrow();
    expect(() => pleat(band, { ...place, depth: 0, kind: "box" })).toThrow(RangeError);
    expect(() => pleat(band, { ...place, across: { x: 0, y: -1 }, kind: "box" })).toThrow(RangeError);
  });
});
