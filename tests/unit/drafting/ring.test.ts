import fc from "fast-check";
import polygonClipping from "polygon-clipping";
import { describe, expect, it } from "vitest";
import { arc, LEAST_RADIUS, ringAngle, ringParts, ringPiece, ringRadius } from "@/lib/drafting/ring";
import { inches, sample } from "./helpers";
import { edgeOf, witnessLength } from "./style-asks";

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Radius from the tightest sewn to a skirt's, mm; angle up to 350 degrees. */
const rings = fc.record({ radius: real(25.4, 900), depth: real(10, 500), angle: real(0.05, 6.1) });

describe("an arc", () => {
  it("lies within 1e-4 mm of the true one, whatever its radius (geometry, exact)", () => {
    fc.assert(
      fc.property(real(5, 2000), real(-7, 7), real(0.01, 6.2), (radius, from, turn) => {
        const centre = { x: 30, y: -20 };
        const curves = arc(centre, radius, from, from + turn);
        for (const curve of curves)
          for (const { x, y } of sample(curve, 24))
            expect(Math.abs(Math.hypot(x - centre.x, y - centre.y) - radius)).toBeLessThan(1e-4);
        const [start, end] = [curves[0]![0], curves.at(-1)![3]];
        expect(start.x).toBeCloseTo(centre.x + radius * Math.sin(from), 9);
        expect(end.y).toBeCloseTo(centre.y + radius * Math.cos(from + turn), 9);
      }),
    );
  });

  it("has no corner where two of its cubics meet", () => {
    const curves = arc({ x: 0, y: 0 }, 700, -3, 3);
    expect(curves.length).toBeGreaterThan(4);
    for (let i = 1; i < curves.length; i++) {
      const [before, after] = [curves[i - 1]!, curves[i]!];
      const cross =
        (before[3].x - before[2].x) * (after[1].y - after[0].y) -
        (before[3].y - before[2].y) * (after[1].x - after[0].x);
      // mm² between two handles: float noise.
      expect(Math.abs(cross)).toBeLessThan(1e-6);
    }
  });
});

describe("a flounce as part of a ring", () => {
  it("measures r·t inside, (r + d)·t outside and d at both ends (geometry, exact)", () => {
    fc.assert(
      fc.property(rings, ({ radius, depth, angle }) => {
        const piece = ringPiece({ radius, depth, angle });
        // 0.01 mm, by svg-path-properties.
        expect(Math.abs(witnessLength(edgeOf(piece, "inner")) - radius * angle)).toBeLessThan(0.01);
        expect(Math.abs(witnessLength(edgeOf(piece, "outer")) - (radius + depth) * angle)).toBeLessThan(0.01);
        for (const end of ["endLeft", "endRight"])
          expect(Math.abs(witnessLength(edgeOf(piece, end)) - depth)).toBeLessThan(1e-6);
        expect(piece.notches[0]!.at).toBeCloseTo((radius * angle) / 2, 9);
      }),
    );
  });

  it("is closed, crosses itself nowhere, and has the area of its ring, t/2·((r + d)² - r²) (polygon-clipping)", () => {
    fc.assert(
      fc.property(rings, ({ radius, depth, angle }) => {
        const { edges } = ringPiece({ radius, depth, angle });
        for (const [i, { curves }] of edges.entries()) {
          const [end, start] = [edges.at(i - 1)!.curves.at(-1)![3], curves[0]![0]];
          expect(Math.hypot(end.x - start.x, end.y - start.y)).toBeLessThan(1e-9);
        }
        const points = edges
          .flatMap(({ curves }) => curves.flatMap((curve) => sample(curve, 60).slice(1)))
          .map(({ x, y }): [number, number] => [x, y]);
        const union = polygonClipping.union([points]);
        expect(union).toHaveLength(1);
        expect(union[0]).toHaveLength(1);
        const wanted = (angle / 2) * ((radius + depth) ** 2 - radius ** 2);
        // Clockwise on the paper is positive; a chord in sixty of a cubic loses next to nothing.
        expect(shoelace(points) / wanted).toBeCloseTo(1, 3);
      }),
      { numRuns: 60 },
    );
  });

  it("gets its radius from the fullness: outer : inner comes out as asked, and the inner edge as the seam", () => {
    fc.assert(
      fc.property(real(100, 900), real(20, 400), real(1.1, 6), (seam, depth, ratio) => {
        const radius = ringRadius(depth, ratio);
        const angle = ringAngle(seam, radius);
        expect(radius * angle).toBeCloseTo(seam, 9);
        expect(((radius + depth) * angle) / seam).toBeCloseTo(ratio, 9);
      }),
    );
    // A full circle: seam 2πr.
    expect(ringAngle(2 * Math.PI * 40, 40)).toBeCloseTo(2 * Math.PI, 12);
    // 2 : 1 on 2 1/2 in is a radius of 2 1/2 in.
    expect(ringRadius(inches(2.5), 2)).toBeCloseTo(inches(2.5), 12);
  });

  it("is cut in as few parts as leave 10 degrees and an inch between the ends", () => {
    fc.assert(
      fc.property(real(0.1, 40), real(LEAST_RADIUS, 500), (angle, radius) => {
        const fits = (parts: number) =>
          angle / parts <= (350 * Math.PI) / 180 + 1e-6 &&
          radius * (2 * Math.PI - angle / parts) >= 25.4 - 1e-6;
        const parts = ringParts(angle, radius);
        expect(fits(parts)).toBe(true);
        if (parts > 1) expect(fits(parts - 1)).toBe(false);
      }),
    );
  });

  it("is never a closed ring", () => {
    expect(() => ringPiece({ radius: 50, depth: 50, angle: 2 * Math.PI })).toThrow(RangeError);
    expect(() => ringPiece({ radius: 50, depth: 50, angle: 0 })).toThrow(RangeError);
  });

  it("grows with its figures", () => {
    const [one, three] = [1, 3].map((k) => ringPiece({ radius: 60 * k, depth: 80 * k, angle: 4 }));
    for (const name of ["inner", "outer", "endLeft"])
      expect(witnessLength(edgeOf(three!, name)) / witnessLength(edgeOf(one!, name))).toBeCloseTo(3, 6);
  });
});

function shoelace(points: readonly [number, number][]): number {
  return points.reduce((sum, [x, y], i) => {
    const [u, v] = points[(i + 1) % points.length]!;
    return sum + (x * v - u * y) / 2;
  }, 0);
}
