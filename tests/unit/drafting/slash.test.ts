import fc from "fast-check";
import ClipperLib from "clipper-lib";
import { applyToPoint, compose, inverse, rotate, translate } from "transformation-matrix";
import { describe, expect, it } from "vitest";
import { area, type Piece, type Point } from "@/lib/drafting";
import { cutAcross, levelOn } from "@/lib/drafting/cut-across";
import { fairCurve } from "@/lib/drafting/fair";
import { chainLength, distance, line } from "@/lib/drafting/measure";
import { edgeOf, isClosed, mirrored } from "@/lib/drafting/outline";
import { angleOf, movePoint, afterwards, turnAbout } from "@/lib/drafting/rigid";
import { slashAndSpread, slashTurn } from "@/lib/drafting/slash";
import { withHead } from "@/lib/drafting/styles/spread-piece";
import { child, curvature, draft, human, sample } from "./helpers";

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** A rectangle 200 x 300 mm, clockwise from the top left. */
const sheet: Piece = {
  name: "sheet",
  edges: [
    { name: "head", curves: [line({ x: -100, y: 0 }, { x: 100, y: 0 })] },
    { name: "right", curves: [line({ x: 100, y: 0 }, { x: 100, y: 300 })] },
    { name: "foot", curves: [line({ x: 100, y: 300 }, { x: -100, y: 300 })] },
    { name: "left", curves: [line({ x: -100, y: 300 }, { x: -100, y: 0 })] },
  ],
  notches: [{ edge: "head", at: 150, count: 2 }],
  grain: { from: { x: 0, y: 50 }, to: { x: 0, y: 250 } },
};

/** Slashes straight down the sheet at even places. */
const upright = (count: number, head: number, foot: number) =>
  Array.from({ length: count }, (_, i) => {
    const at = (200 * (i + 1)) / (count + 1);
    return { from: { edge: "head", at }, to: { edge: "foot", at: 200 - at }, head, foot };
  });

/** Slashes over a real sleeve, from its head to its hem. */
const sleeves = fc.record({
  f: human,
  count: fc.integer({ min: 1, max: 9 }),
  head: real(0, 60),
  foot: real(0, 60),
});
function overSleeve({
  f,
  count,
  head,
  foot,
}: {
  f: typeof child;
  count: number;
  head: number;
  foot: number;
}) {
  const piece = withHead(draft(f).piece);
  const along = (name: string, share: number) => ({
    edge: name,
    at: share * chainLength(edgeOf(piece, name).curves),
  });
  const slashes = Array.from({ length: count }, (_, i) => {
    const share = 0.2 + (0.6 * (i + 1)) / (count + 1);
    return { from: along("head", share), to: along("foot", 1 - share), head, foot };
  });
  return { piece, slashes };
}

describe("a rigid motion (transformation-matrix)", () => {
  it("is the matrix of the same turn, and keeps every distance", () => {
    fc.assert(
      fc.property(
        real(-500, 500),
        real(-500, 500),
        real(-3, 3),
        real(-500, 500),
        real(-500, 500),
        (x, y, angle, px, py) => {
          const motion = turnAbout({ x, y }, angle);
          const other = compose(translate(x, y), rotate(angle), inverse(translate(x, y)));
          const [moved, theirs] = [
            movePoint({ x: px, y: py }, motion),
            applyToPoint(other, { x: px, y: py }),
          ];
          expect(distance(moved, theirs)).toBeLessThan(1e-9);
          const twice = afterwards(motion, turnAbout({ x: py, y: px }, -angle));
          const origin = movePoint({ x: 0, y: 0 }, twice);
          expect(distance(movePoint({ x: px, y: py }, twice), origin)).toBeCloseTo(Math.hypot(px, py), 8);
        },
      ),
    );
  });
});

describe("a slash", () => {
  it("turns the panel so that the hinged opening at radius r is 2·r·sin(turn/2) (geometry, exact)", () => {
    fc.assert(
      fc.property(real(50, 600), real(0, 90), real(0.05, 1), (length, head, share) => {
        const turn = slashTurn(length, head, 0);
        expect(2 * length * Math.sin(turn / 2)).toBeCloseTo(head, 9);
        const slash = { from: { edge: "head", at: 100 }, to: { edge: "foot", at: 100 }, head, foot: 0 };
        const tall = { ...sheet, edges: sheet.edges.map((e) => stretched(e, length)) };
        const { lips, motions } = slashAndSpread(tall, [slash]);
        expect(distance(lips[0]!.foot.before, lips[0]!.foot.after)).toBeLessThan(1e-9);
        // Any point of the slash, at radius r from the hinge.
        const r = share * length;
        const [a, b] = motions.map((motion) => movePoint({ x: 0, y: length - r }, motion));
        expect(distance(a!, b!)).toBeCloseTo(2 * r * Math.sin(turn / 2), 9);
      }),
    );
  });

  it("opens by exactly what was asked at both ends, on any sleeve", () => {
    fc.assert(
      fc.property(sleeves, (ask) => {
        const { piece, slashes } = overSleeve(ask);
        const { lips } = slashAndSpread(piece, slashes);
        for (const { head, foot } of lips) {
          expect(distance(head.before, head.after)).toBeCloseTo(ask.head, 8);
          expect(distance(foot.before, foot.after)).toBeCloseTo(ask.foot, 8);
        }
      }),
    );
  });

  it("cannot be opened wider than twice its length", () => {
    expect(() => slashTurn(100, 201, 0)).toThrow(RangeError);
    expect(slashTurn(100, 30, 30)).toBe(0);
    expect(slashTurn(100, 0, 30)).toBeCloseTo(-slashTurn(100, 30, 0), 12);
  });

  it("in parallel moves each panel by the opening and turns none", () => {
    const { motions, piece } = slashAndSpread(sheet, upright(4, 25, 25));
    expect(motions.map(({ dx }) => dx)).toEqual([-50, -25, 0, 25, 50].map((x) => expect.closeTo(x, 9)));
    for (const motion of motions) expect(angleOf(motion)).toBeCloseTo(0, 12);
    expect(area(piece)).toBeCloseTo(300 * 300, 6);
    expect(chainLength(edgeOf(piece, "head").curves)).toBeCloseTo(300, 9);
  });

  it("carries a notch on with its panel", () => {
    const { piece } = slashAndSpread(sheet, upright(1, 30, 0));
    expect(piece.notches[0]!.at).toBe(180);
  });
});

describe("the panels", () => {
  it("keep their area between them, and the outline stays closed", () => {
    fc.assert(
      fc.property(sleeves, (ask) => {
        const { piece, slashes } = overSleeve(ask);
        const spread = slashAndSpread(piece, slashes);
        const sum = spread.panels.reduce((total, panel) => total + area(panel), 0);
        expect(sum).toBeCloseTo(area(piece), 5);
        expect(spread.panels.every(isClosed)).toBe(true);
        expect(isClosed(spread.piece)).toBe(true);
        expect(spread.piece.edges.map(({ name }) => name)).toEqual(piece.edges.map(({ name }) => name));
      }),
    );
  });

  it("nowhere lie on one another (clipper-lib)", () => {
    fc.assert(
      fc.property(sleeves, (ask) => {
        const { piece, slashes } = overSleeve(ask);
        const { panels } = slashAndSpread(piece, slashes);
        const rings = panels.map(({ edges }) =>
          edges.flatMap(({ curves }) => curves.flatMap((c) => sample(c, 12).slice(1))),
        );
        for (const [i, ring] of rings.slice(1).entries()) {
          // mm²: what rounding to a ten-thousandth of a millimetre leaves along a shared hinge.
          expect(commonArea(rings[i]!, ring)).toBeLessThan(0.1);
        }
      }),
      { numRuns: 40 },
    );
  });

  it("keep the length of the hinged edge", () => {
    fc.assert(
      fc.property(sleeves, (ask) => {
        const { piece, slashes } = overSleeve({ ...ask, foot: 0 });
        const { piece: opened } = slashAndSpread(piece, slashes);
        const [before, after] = [piece, opened].map((p) => chainLength(edgeOf(p, "foot").curves));
        expect(after).toBeCloseTo(before!, 8);
        const [head, wide] = [piece, opened].map((p) => chainLength(edgeOf(p, "head").curves));
        expect(wide! - head!).toBeCloseTo(ask.head * slashes.length, 7);
      }),
    );
  });

  it("lie mirrored where the slashes do", () => {
    const piece = withHead(draft(child).piece);
    const even = {
      ...piece,
      edges: [{ name: "head", curves: edgeOf(piece, "head").curves }, ...piece.edges.slice(1)],
    };
    const flipped = mirrored(mirrored(even));
    for (const [i, edge] of even.edges.entries())
      for (const [j, curve] of edge.curves.entries())
        for (const [k, p] of curve.entries())
          expect(distance(p, flipped.edges[i]!.curves[j]![k]!)).toBeLessThan(1e-12);
    const { motions } = slashAndSpread(sheet, upright(5, 40, 0));
    for (const [i, motion] of motions.entries())
      expect(angleOf(motion)).toBeCloseTo(-angleOf(motions[motions.length - 1 - i]!), 12);
  });
});

describe("cutting across", () => {
  it("loses no cloth: the two areas are the whole, and both sides of the cut are equally long", () => {
    fc.assert(
      fc.property(human, real(0.05, 0.95), (f, share) => {
        const piece = withHead(draft(f).piece);
        const level = f.capDepth + share * (f.length - f.capDepth);
        const { upper, lower } = cutAcross(piece, level);
        expect(area(upper) + area(lower)).toBeCloseTo(area(piece), 5);
        expect(isClosed(upper) && isClosed(lower)).toBe(true);
        expect(chainLength(edgeOf(upper, "foot").curves)).toBeCloseTo(
          chainLength(edgeOf(lower, "top").curves),
          9,
        );
        // What lies above the cut is as it was, to the last digit.
        expect(edgeOf(upper, "head").curves).toEqual(edgeOf(piece, "head").curves);
      }),
    );
  });

  it("says where the sleeve is not crossed", () => {
    expect(() => cutAcross(withHead(draft(child).piece), child.length + 1)).toThrow(RangeError);
  });

  it("finds the level on a curve too", () => {
    const curves = fairCurve(
      [
        { x: 0, y: 0 },
        { x: 40, y: 60 },
        { x: 60, y: 160 },
      ],
      { x: 1, y: 0.2 },
      { x: 0, y: 1 },
    );
    const at = levelOn(curves, 100)!;
    expect(at).toBeGreaterThan(0);
    expect(levelOn(curves, 161)).toBeUndefined();
  });
});

describe("a fair curve", () => {
  it("of points on a circle is the circle within a thousandth of its radius", () => {
    const at = (angle: number) => ({ x: 100 * Math.cos(angle), y: 100 * Math.sin(angle) });
    const angles = [0, 0.5, 0.9, 1.5, 2];
    const curves = fairCurve(angles.map(at), { x: 0, y: 1 }, { x: -Math.sin(2), y: Math.cos(2) });
    for (const curve of curves)
      for (const { x, y } of sample(curve, 20)) expect(Math.abs(Math.hypot(x, y) - 100)).toBeLessThan(0.1);
  });

  it("has no corner at a point, and leaves and arrives as it is told", () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(real(20, 90), real(-40, 40)), { minLength: 2, maxLength: 7 }),
        (steps) => {
          let x = 0;
          const points = steps.map(([dx, y]) => ({ x: (x += dx), y }));
          const curves = fairCurve(points, { x: 1, y: 0 }, { x: 1, y: 0 });
          const heading = ([, b]: (typeof curves)[number], from: { x: number; y: number }) =>
            Math.atan2(b.y - from.y, b.x - from.x);
          expect(heading(curves[0]!, curves[0]![0])).toBeCloseTo(0, 9);
          for (let i = 1; i < curves.length; i++) {
            const [before, after] = [curves[i - 1]!, curves[i]!];
            const incoming = Math.atan2(before[3].y - before[2].y, before[3].x - before[2].x);
            expect(incoming).toBeCloseTo(heading(after, after[0]), 7);
          }
          const [, , c, d] = curves.at(-1)!;
          expect(Math.atan2(d.y - c.y, d.x - c.x)).toBeCloseTo(0, 9);
          expect(Number.isFinite(curvature(curves[0]!, 0.5))).toBe(true);
        },
      ),
    );
  });
});

function stretched(edge: Piece["edges"][number], height: number): Piece["edges"][number] {
  const tall = ({ x, y }: { x: number; y: number }) => ({ x, y: (y / 300) * height });
  return {
    ...edge,
    curves: edge.curves.map(([a, b, c, d]) => [tall(a), tall(b), tall(c), tall(d)] as const),
  };
}

/** Ten-thousandths of a millimetre: Clipper works in whole numbers. */
const FINE = 1e4;

function commonArea(one: readonly Point[], other: readonly Point[]): number {
  const path = (points: readonly Point[]) =>
    points.map(({ x, y }) => ({ X: Math.round(x * FINE), Y: Math.round(y * FINE) }));
  const clipper = new ClipperLib.Clipper();
  clipper.AddPath(path(one), ClipperLib.PolyType.ptSubject, true);
  clipper.AddPath(path(other), ClipperLib.PolyType.ptClip, true);
  const found: { X: number; Y: number }[][] = [];
  const fill = ClipperLib.PolyFillType.pftNonZero;
  clipper.Execute(ClipperLib.ClipType.ctIntersection, found, fill, fill);
  return found.reduce((sum, ring) => sum + Math.abs(ClipperLib.Clipper.Area(ring)), 0) / FINE ** 2;
}
