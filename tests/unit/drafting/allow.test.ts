import { point, Polygon } from "@flatten-js/core";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type CubicBezier,
  makeStyle,
  type PatternPiece,
  type Piece,
  type Point,
  recipes,
} from "@/lib/drafting";
import { allow, type CornerRule } from "@/lib/drafting/allow";
import { CORNER_LIMIT } from "@/lib/drafting/corner";
import { line } from "@/lib/drafting/measure";
import { isClosed, mirrored } from "@/lib/drafting/outline";
import {
  areaOutside,
  awayFrom,
  clipperOffset,
  cornersOf,
  fineRing,
  hausdorff,
  perimeter,
  polygon,
  polyline,
  ringOf,
  shoelace,
  sleeve,
} from "./allow-witness";
import { human } from "./helpers";
import { blocks } from "./style-asks";

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const squareUnderarm: CornerRule = (first) => (first.startsWith("underarm") ? "squared" : "mitred");

/** Cubic quarter circles; they miss the circle by 2.7e-4 of its radius. */
function arcs(
  centre: Point,
  radius: number,
  from: number,
  quarters: number,
  clockwise: boolean,
): CubicBezier[] {
  const k = (4 / 3) * (Math.SQRT2 - 1) * radius;
  const way = clockwise ? 1 : -1;
  return Array.from({ length: quarters }, (_, i): CubicBezier => {
    const on = (angle: number, along: number): Point => ({
      x: centre.x + radius * Math.cos(angle) - way * along * Math.sin(angle),
      y: centre.y + radius * Math.sin(angle) + way * along * Math.cos(angle),
    });
    const [a, b] = [from + (way * i * Math.PI) / 2, from + (way * (i + 1) * Math.PI) / 2];
    return [on(a, 0), on(a, k), on(b, -k), on(b, 0)];
  });
}

function heading(a: Point, b: Point): number {
  return Math.atan2(b.y - a.y, b.x - a.x);
}

/** How sharply each corner of a piece turns, from finely sampled edges; positive to the right, outside a convex corner. */
function turnsOf({ edges }: Pick<Piece, "edges">): number[] {
  return edges.map(({ curves }, i) => {
    const before = polyline(edges.at(i - 1)!.curves, 400);
    const after = polyline(curves, 400);
    const turn = heading(after[0]!, after[1]!) - heading(before.at(-2)!, before.at(-1)!);
    return turn - 2 * Math.PI * Math.round(turn / (2 * Math.PI));
  });
}

/** No corner so sharp that its mitre would be cut off, with a little to spare. */
const keepsMitres = (piece: Pick<Piece, "edges">) =>
  turnsOf(piece).every((turn) => turn < 2 * Math.acos(1 / CORNER_LIMIT) - 0.05);

const crossesItself = (ring: readonly Point[]) => !new Polygon(ring.map(({ x, y }) => point(x, y))).isValid();

/** An edge carried on straight at both ends. */
function carriedOn(curves: readonly CubicBezier[], by: number): Point[] {
  const points = polyline(curves, 200);
  const on = (a: Point, b: Point): Point => {
    const size = Math.hypot(b.x - a.x, b.y - a.y);
    return { x: b.x + ((b.x - a.x) * by) / size, y: b.y + ((b.y - a.y) * by) / size };
  };
  const [first, last] = [curves[0]!, curves.at(-1)!];
  return [on(first[1], first[0]), ...points, on(last[2], last[3])];
}

describe("the cutting line against Clipper's offset of a fine polyline", () => {
  it("is the same line on any sleeve", () => {
    fc.assert(
      fc.property(human, real(3, 30), (f, width) => {
        const piece = sleeve(f);
        fc.pre(keepsMitres(piece));
        const ring = ringOf(allow(piece, width).cutting, 24);
        const theirs = clipperOffset(fineRing(piece), width, CORNER_LIMIT);
        const corners = cornersOf(piece);
        const clear = (p: Point) =>
          corners.every((c) => Math.hypot(p.x - c.x, p.y - c.y) > CORNER_LIMIT * width);
        expect(hausdorff(ring, theirs, clear)).toBeLessThan(0.05);
        // A chord at the end of a curve misses its direction by a thousandth; a long mitre shows that.
        expect(hausdorff(ring, theirs)).toBeLessThan(0.2);
        expect(Math.abs(shoelace(ring) - shoelace(theirs))).toBeLessThan(0.02 * perimeter(theirs));
      }),
      { numRuns: 30 },
    );
  });

  it("is the same line round hollows tighter than the allowance, and makes no loop there", () => {
    fc.assert(
      fc.property(real(2, 30), real(3, 30), real(0.1, 0.9), (radius, width, share) => {
        // Of just the allowance's radius it leaves a slit whose two sides lie on one another.
        fc.pre(Math.abs(radius - width) > 0.05);
        // A round bite out of the top of a sheet 200 mm wide.
        const middle = 40 + 120 * share;
        const p = (x: number, y: number): Point => ({ x, y });
        const bite = arcs(p(middle, 0), radius, Math.PI, 2, false);
        const piece: PatternPiece = {
          ...polygon([p(0, 0), p(200, 0), p(200, 150), p(0, 150)]),
          edges: [
            { name: "top", curves: [line(p(0, 0), bite[0]![0]), ...bite, line(bite[1]![3], p(200, 0))] },
            { name: "right", curves: [line(p(200, 0), p(200, 150))] },
            { name: "foot", curves: [line(p(200, 150), p(0, 150))] },
            { name: "left", curves: [line(p(0, 150), p(0, 0))] },
          ],
        };
        const { cutting } = allow(piece, width);
        const ring = ringOf(cutting, 24);
        expect(isClosed(cutting)).toBe(true);
        expect(crossesItself(ring)).toBe(false);
        expect(hausdorff(ring, clipperOffset(fineRing(piece), width, CORNER_LIMIT))).toBeLessThan(0.05);
      }),
      { numRuns: 60 },
    );
  });

  it("is the same line on outlines of straight edges, hollow corners and slots and all", () => {
    // A star-shaped outline round a point: radii by turns long and short.
    const star = fc.array(real(30, 150), { minLength: 5, maxLength: 12 });
    fc.assert(
      fc.property(star, real(2, 30), (radii, width) => {
        const corners = radii.map((r, i) => {
          const angle = (2 * Math.PI * i) / radii.length;
          return { x: r * Math.cos(angle), y: r * Math.sin(angle) };
        });
        const piece = polygon(corners);
        fc.pre(keepsMitres(piece));
        const { cutting } = allow(piece, width);
        const ring = ringOf(cutting, 1);
        expect(isClosed(cutting)).toBe(true);
        expect(hausdorff(ring, clipperOffset(corners, width, CORNER_LIMIT))).toBeLessThan(0.005);
      }),
      { numRuns: 200 },
    );
  });
});

describe("the area that an allowance adds", () => {
  it("to a smooth convex outline is perimeter × width + π·width² (Steiner)", () => {
    fc.assert(
      fc.property(real(20, 200), real(20, 200), real(2, 30), (across, up, width) => {
        // An oval: a circle drawn out one way.
        const curves = arcs({ x: 0, y: 0 }, 1, 0, 4, true).map((curve) =>
          curve.map(({ x, y }) => ({ x: x * across, y: y * up })),
        ) as unknown as CubicBezier[];
        const piece = { ...polygon([]), edges: [{ name: "rim", curves }] } as PatternPiece;
        const before = ringOf(piece, 400);
        const after = ringOf(allow(piece, width).cutting, 400);
        const added = perimeter(before) * width + Math.PI * width ** 2;
        expect(Math.abs(shoelace(after) - shoelace(before) - added)).toBeLessThan(0.01 * perimeter(before));
      }),
      { numRuns: 40 },
    );
  });

  it("to a convex polygon is perimeter × width + width² × the tangents of half its turns", () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(fc.integer({ min: 0, max: 23 }), { minLength: 4, maxLength: 9 }),
        real(1, 40),
        (hours, width) => {
          const corners = hours
            .sort((a, b) => a - b)
            .map((hour) => ({
              x: 120 * Math.cos((hour * Math.PI) / 12),
              y: 120 * Math.sin((hour * Math.PI) / 12),
            }));
          const piece = polygon(corners);
          fc.pre(shoelace(corners) > 0 && keepsMitres(piece));
          const tangents = turnsOf(piece).reduce((sum, turn) => sum + Math.tan(turn / 2), 0);
          const added = shoelace(ringOf(allow(piece, width).cutting, 1)) - shoelace(corners);
          expect(added).toBeCloseTo(perimeter(corners) * width + width ** 2 * tangents, 5);
        },
      ),
    );
  });
});

describe("the cutting line of any sleeve", () => {
  it("is closed, does not cross itself, holds the piece and keeps the names of the edges", () => {
    const width = fc.oneof(fc.constant(0), real(3, 40));
    fc.assert(
      fc.property(
        human,
        fc.array(width, { minLength: 5, maxLength: 5 }),
        fc.boolean(),
        (f, widths, square) => {
          const names = sleeve(f).edges.map(({ name }) => name);
          const allowances = Object.fromEntries(names.map((name, i) => [name, widths[i]!]));
          const piece = sleeve(f, { allowances });
          const { cutting } = allow(piece, 10, square ? squareUnderarm : undefined);
          const ring = ringOf(cutting, 16);
          expect(isClosed(cutting)).toBe(true);
          // Wider than the hollow beside it, the allowance of the cap may reach out past that of the underarm and back.
          expect([...new Set(cutting.edges.map(({ name }) => name))]).toEqual(names);
          expect(crossesItself(ring)).toBe(false);
          // mm²: chords of the two polylines against each other where there is no allowance.
          expect(areaOutside(ringOf(piece, 16), ring)).toBeLessThan(
            widths.includes(0) ? 1e-4 * perimeter(ring) : 1e-6,
          );
          const [most, corners] = [Math.max(...widths), cornersOf(piece)];
          const outline = ringOf(piece, 100);
          const least = Math.min(...widths);
          for (const { name, curves } of cutting.edges) {
            const own = piece.edges.find((edge) => edge.name === name)!;
            const stitch = polyline(own.curves, 200);
            for (const p of polyline(curves, 5)) {
              // Round a corner the two widths meet; everywhere else the edge has its own.
              const cornered = corners.some(
                (c) => Math.hypot(p.x - c.x, p.y - c.y) <= Math.hypot(CORNER_LIMIT, 1) * most + 1e-6,
              );
              if (cornered) expect(awayFrom(p, outline, true)).toBeGreaterThan(least - 0.01);
              else expect(Math.abs(awayFrom(p, stitch) - allowances[name]!)).toBeLessThan(0.01);
            }
          }
        },
      ),
      { numRuns: 60 },
    );
  });

  it("of one width lies at that width from its edge, or from the edge carried on, at every point", () => {
    fc.assert(
      fc.property(human, real(3, 30), (f, width) => {
        const piece = sleeve(f);
        fc.pre(keepsMitres(piece));
        const { cutting } = allow(piece, width);
        const outline = ringOf(piece, 150);
        for (const { name, curves } of cutting.edges) {
          const own = carriedOn(piece.edges.find((edge) => edge.name === name)!.curves, 3 * width);
          for (const p of polyline(curves, 6)) {
            expect(Math.abs(awayFrom(p, own) - width)).toBeLessThan(0.01);
            expect(awayFrom(p, outline, true)).toBeGreaterThan(width - 0.01);
          }
        }
      }),
      { numRuns: 30 },
    );
  });

  it("mirrored is that of the mirrored sleeve, notches too", () => {
    fc.assert(
      fc.property(human, real(3, 15), fc.boolean(), (f, width, square) => {
        const piece = sleeve(f, { allowances: { hem: 1.5 * width } });
        const rule = square ? squareUnderarm : undefined;
        const [here, there] = [allow(piece, width, rule), allow(mirrored(piece), width, rule)];
        const flip = ({ x, y }: Point) => ({ x: -x, y });
        expect(hausdorff(ringOf(here.cutting, 60), ringOf(there.cutting, 60).map(flip))).toBeLessThan(0.02);
        const ends = (a: typeof here) =>
          a.notches.flatMap(({ strokes }) => strokes.map(({ outer }) => outer));
        const flipped = ends(there).map(flip);
        for (const end of ends(here)) {
          const nearest = Math.min(...flipped.map((p) => Math.hypot(p.x - end.x, p.y - end.y)));
          expect(nearest).toBeLessThan(0.02);
        }
      }),
      { numRuns: 20 },
    );
  });

  it("grows with the sleeve: twice the piece and twice the width is twice the cutting line", () => {
    fc.assert(
      fc.property(human, real(3, 15), real(0.5, 3), (f, width, by) => {
        const piece = sleeve(f);
        const scaled = (p: Point) => ({ x: p.x * by, y: p.y * by });
        const larger = {
          ...piece,
          notches: [],
          edges: piece.edges.map(({ name, curves }) => ({
            name,
            curves: curves.map((curve) => curve.map(scaled) as unknown as CubicBezier),
          })),
        };
        const ring = ringOf(allow(piece, width).cutting, 60).map(scaled);
        expect(hausdorff(ring, ringOf(allow(larger, width * by).cutting, 60))).toBeLessThan(0.006 * (1 + by));
      }),
      { numRuns: 20 },
    );
  });
});

describe("the cutting line of every piece of every style", () => {
  it.each(recipes.map(({ id }) => id))(
    "of %s is closed, does not cross itself and holds the piece",
    (style) => {
      fc.assert(
        fc.property(blocks, real(5, 20), fc.boolean(), (block, width, square) => {
          const result = makeStyle({ style, block, values: {} });
          fc.pre(result.ok);
          if (!result.ok) return;
          for (const piece of result.parts.pieces) {
            const { cutting, notches } = allow(piece, width, square ? squareUnderarm : undefined);
            const ring = ringOf(cutting, 16);
            expect(isClosed(cutting)).toBe(true);
            expect(crossesItself(ring)).toBe(false);
            expect(areaOutside(ringOf(piece, 16), ring)).toBeLessThan(1e-4 * perimeter(ring));
            expect(notches).toHaveLength(piece.notches.length);
          }
        }),
        { numRuns: 8 },
      );
    },
  );
});
