import { Polygon, point } from "@flatten-js/core";
import fc from "fast-check";
import { svgPathProperties } from "svg-path-properties";
import { describe, expect, it } from "vitest";
import { area, bounds, edgeLength, pointAt, splitAt, type SleeveDraft } from "@/lib/drafting";
import { chainLength, crossings, line } from "@/lib/drafting/measure";
import { child, draft, edge, human, sample, svgPath } from "./helpers";

const outline = (d: SleeveDraft, steps: number) =>
  d.piece.edges.flatMap((e) => e.curves).flatMap((curve) => sample(curve, steps).slice(1));

describe("outline", () => {
  it("is closed, its edges in order, each starting where the last ends", () => {
    fc.assert(
      fc.property(human, (f) => {
        const { edges } = draft(f).piece;
        const curves = edges.flatMap((e) => e.curves);
        for (const [i, curve] of curves.entries()) {
          const next = curves[(i + 1) % curves.length]!;
          // 1e-9 mm of float noise.
          expect(Math.hypot(curve[3].x - next[0].x, curve[3].y - next[0].y)).toBeLessThan(1e-9);
        }
      }),
    );
  });

  it("does not cross itself (flatten-js)", () => {
    fc.assert(
      fc.property(human, (f) => {
        const polygon = new Polygon(outline(draft(f), 8).map(({ x, y }) => point(x, y)));
        expect(polygon.isValid()).toBe(true);
      }),
      { numRuns: 25 },
    );
  });

  it("has the area flatten-js finds for its polygon", () => {
    fc.assert(
      fc.property(human, (f) => {
        const d = draft(f);
        const polygon = new Polygon(outline(d, 200).map(({ x, y }) => point(x, y)));
        // 2e-5 of the area: what 200 chords a curve leave out.
        expect(Math.abs(area(d.piece) - polygon.area())).toBeLessThan(2e-5 * polygon.area());
      }),
      { numRuns: 25 },
    );
  });

  it("keeps every notch on its edge, one on the front and two on the back", () => {
    const d = draft(child);
    expect(d.piece.notches.map(({ edge: name, count }) => [name, count])).toEqual([
      ["capFront", 1],
      ["capBack", 2],
    ]);
    const [front, back] = d.piece.notches;
    expect(front!.at).toBe(child.notches.front);
    // 1e-9 mm: counted from the other end.
    expect(d.lengths.capBack - back!.at).toBeCloseTo(child.notches.back, 9);
  });

  it("goes through the elbow", () => {
    const d = draft({ ...child, length: 560, elbow: { depth: 320, width: 270 } });
    expect(edge(d, "underarmBack").curves[0]![3]).toEqual({ x: 135, y: 320 });
    expect(edge(d, "underarmFront").curves[0]![3]).toEqual({ x: -135, y: 320 });
    // 1e-9 mm: two mirrored sums.
    expect(d.lengths.underarmFront).toBeCloseTo(d.lengths.underarmBack, 9);
  });
});

describe("measures", () => {
  it("agrees with svg-path-properties on every edge", () => {
    fc.assert(
      fc.property(human, (f) => {
        for (const e of draft(f).piece.edges) {
          const other = new svgPathProperties(svgPath(e.curves)).getTotalLength();
          // A hundredth of a millimetre: the other library's quadrature has fewer points on a bend.
          expect(Math.abs(edgeLength(e) - other)).toBeLessThan(0.01);
        }
      }),
      { numRuns: 50 },
    );
  });

  it("agrees with a fine polyline, which is always the shorter", () => {
    const { curves } = edge(draft(child), "capFront");
    const points = curves.flatMap((c, i) => sample(c, 2000).slice(i === 0 ? 0 : 1));
    const chord = points
      .slice(1)
      .reduce((s, p, i) => s + Math.hypot(p.x - points[i]!.x, p.y - points[i]!.y), 0);
    const arc = chainLength(curves);
    // 1e-4 mm: 2000 chords a curve.
    expect(arc - chord).toBeGreaterThan(0);
    expect(arc - chord).toBeLessThan(1e-4);
  });

  it("splits so that the parts add up and the cut is where it was asked", () => {
    fc.assert(
      fc.property(human, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (f, share) => {
        const { curves } = edge(draft(f), "capBack");
        const whole = chainLength(curves);
        const [before, after] = splitAt(curves, whole * share);
        // 1e-6 mm: Newton stops at 1e-9, quadrature of the parts differs by less than 1e-6.
        expect(Math.abs(chainLength(before) - whole * share)).toBeLessThan(1e-6);
        expect(Math.abs(chainLength(before) + chainLength(after) - whole)).toBeLessThan(1e-6);
        const { point: at, direction } = pointAt(curves, whole * share);
        expect(Math.hypot(at.x - after[0]![0].x, at.y - after[0]![0].y)).toBeLessThan(1e-9);
        expect(Math.hypot(direction.x, direction.y)).toBeCloseTo(1, 12);
      }),
      { numRuns: 50 },
    );
  });

  it("clamps to the ends", () => {
    const curves = [line({ x: 0, y: 0 }, { x: 3, y: 4 })];
    expect(pointAt(curves, -1).point).toEqual({ x: 0, y: 0 });
    expect(pointAt(curves, 9).point).toEqual({ x: 3, y: 4 });
  });

  it("finds where the cap seam crosses its guide line: on both, in the hollow's order", () => {
    const d = draft(child);
    const { underarmFront: u, besideFront: top, markFront1: hollow, markFront2: raise } = d.points;
    const [first] = crossings(edge(d, "capFront").curves, u!, top!);
    const off = (p: { x: number; y: number }) =>
      (top!.x - u!.x) * (p.y - u!.y) - (top!.y - u!.y) * (p.x - u!.x);
    // On the line: 1e-6 mm, as the area over the line's length.
    expect(Math.abs(off(first!)) / Math.hypot(top!.x - u!.x, top!.y - u!.y)).toBeLessThan(1e-6);
    // Between the hollow mark and the first raised one.
    expect(first!.x).toBeGreaterThan(hollow!.x);
    expect(first!.x).toBeLessThan(raise!.x);
  });

  it("bounds the sleeve by its figures", () => {
    const box = bounds(draft(child).piece.edges.flatMap((e) => e.curves));
    // 1e-9 mm of float noise.
    expect(box.min.x).toBeCloseTo(-child.biceps / 2, 9);
    expect(box.min.y).toBeCloseTo(0, 9);
    expect(box.max.x).toBeCloseTo(child.biceps / 2, 9);
    expect(box.max.y).toBeCloseTo(child.length, 9);
  });
});
