import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type CubicBezier, type Piece, type Point } from "@/lib/drafting";
import { dart, type DartAsk } from "@/lib/drafting/dart";
import { isClosed } from "@/lib/drafting/outline";
import { withHead } from "@/lib/drafting/styles/spread-piece";
import { rectangle } from "@/lib/drafting/styles/parts";
import { awayFrom, polyline, ringOf, shoelace } from "./allow-witness";
import { draft, human } from "./helpers";
import { witnessLength } from "./style-asks";

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const edge = (piece: Pick<Piece, "edges">, name: string): readonly CubicBezier[] =>
  piece.edges.find((one) => one.name === name)!.curves;

const apart = (a: Point, b: Point) => Math.hypot(b.x - a.x, b.y - a.y);

/** Darts in the head and in the hem of any sleeve, square to the edge or a little aslant. */
const darts = fc
  .record({
    f: human,
    name: fc.constantFrom("head", "foot"),
    share: real(0.4, 0.6),
    width: real(0.02, 0.08),
    slender: real(2, 4),
    slant: real(-0.4, 0.4),
    pressed: fc.constantFrom("onward" as const, "back" as const),
  })
  .map(({ f, name, share, width: part, slender, slant, pressed }) => {
    const piece = withHead(draft(f).piece);
    const long = witnessLength(edge(piece, name));
    const width = part * Math.min(f.hem, f.biceps, f.length * 2);
    const points = polyline(edge(piece, name), 400);
    // Straight in from the middle of the mouth, turned by the slant.
    let left = share * long;
    const before = points.findIndex((p, i) => i > 0 && (left -= apart(points[i - 1]!, p)) <= 0) - 1;
    const [a, b] = [points[before]!, points[before + 1]!];
    const inward = turned({ x: a.y - b.y, y: b.x - a.x }, { x: 0, y: 0 }, slant);
    const ask: DartAsk = {
      edge: name,
      at: share * long,
      width,
      length: Math.min(width * slender, f.length * 0.6),
      pressed,
      ...(slant > 0 ? { towards: { x: b.x + 1000 * inward.x, y: b.y + 1000 * inward.y } } : {}),
    };
    return { piece, ask };
  });

function turned({ x, y }: Point, about: Point, angle: number): Point {
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  return {
    x: about.x + c * (x - about.x) - s * (y - about.y),
    y: about.y + s * (x - about.x) + c * (y - about.y),
  };
}

/** The largest corner between two curves of a chain, radians. */
function corner(curves: readonly CubicBezier[]): number {
  return curves.slice(1).reduce((most, [a, b], i) => {
    const [, , c, d] = curves[i]!;
    const turn = Math.atan2(b.y - a.y, b.x - a.x) - Math.atan2(d.y - c.y, d.x - c.x);
    return Math.max(most, Math.abs(turn - 2 * Math.PI * Math.round(turn / (2 * Math.PI))));
  }, 0);
}

describe("a dart", () => {
  it("makes the edge shorter by its width exactly, and leaves it without a corner", () => {
    fc.assert(
      fc.property(darts, ({ piece, ask }) => {
        const { closed, lengths } = dart(piece, ask);
        const before = witnessLength(edge(piece, ask.edge));
        expect(Math.abs(witnessLength(closed) - (before - ask.width))).toBeLessThan(1e-3);
        expect(lengths.before - lengths.stitched).toBeCloseTo(ask.width, 7);
        // What the sleeve's own seam has between its curves.
        expect(corner(closed)).toBeLessThan(corner(edge(piece, ask.edge)) + 1e-6);
      }),
      { numRuns: 60 },
    );
  });

  it("has two legs of one length, from the trued edge to a tip inside the piece", () => {
    fc.assert(
      fc.property(darts, ({ piece, ask }) => {
        const { piece: with_, legs, tip, angle } = dart(piece, ask);
        const [one, other] = legs.map(([from, to]) => apart(from, to));
        expect(one).toBeCloseTo(other!, 8);
        const line = polyline(edge(with_, ask.edge), 200);
        for (const [from] of legs) expect(awayFrom(from, line)).toBeLessThan(0.01);
        // Turned by its angle the first leg is the second.
        expect(apart(turned(legs[0][0], tip, angle), legs[1][0])).toBeLessThan(1e-8);
        expect(angle).toBeGreaterThan(0);
        const ring = ringOf(piece, 60);
        const winds = ring.reduce((sum, p, i) => {
          const q = ring[(i + 1) % ring.length]!;
          const turn = Math.atan2(q.y - tip.y, q.x - tip.x) - Math.atan2(p.y - tip.y, p.x - tip.x);
          return sum + turn - 2 * Math.PI * Math.round(turn / (2 * Math.PI));
        }, 0);
        expect(winds).toBeCloseTo(2 * Math.PI, 6);
      }),
      { numRuns: 60 },
    );
  });

  it("stitched is the closed edge, and the cap folded and pressed lies under it", () => {
    fc.assert(
      fc.property(darts, ({ piece, ask }) => {
        const { piece: with_, legs, tip, angle, closed } = dart(piece, ask);
        const seam = polyline(closed, 300);
        const start = Math.atan2(legs[0][0].y - tip.y, legs[0][0].x - tip.x);
        for (const point of polyline(edge(with_, ask.edge), 12)) {
          const raw = Math.atan2(point.y - tip.y, point.x - tip.x) - start;
          const past = raw - 2 * Math.PI * Math.round(raw / (2 * Math.PI));
          // Farther round the tip than that the edge is as it was, and its angle says no more which side it is on.
          if (Math.abs(past) > 2) continue;
          // From the first leg on: before it as it lies; past the second leg turned back; between, folded on the middle.
          const fold =
            ask.pressed === "onward"
              ? past < angle / 2
                ? past
                : angle - past
              : past < angle / 2
                ? -past
                : past - angle;
          const to = past <= 0 ? past : past >= angle ? past - angle : fold;
          expect(awayFrom(turned(point, tip, to - past), seam)).toBeLessThan(0.01);
        }
      }),
      { numRuns: 60 },
    );
  });

  it("keeps the piece closed, its other edges and the ends of its own as they were", () => {
    fc.assert(
      fc.property(darts, ({ piece, ask }) => {
        const { piece: with_ } = dart(piece, ask);
        expect(isClosed(with_)).toBe(true);
        for (const { name, curves } of piece.edges)
          if (name !== ask.edge) expect(edge(with_, name)).toEqual(curves);
        // Truing takes or gives a sliver only.
        const [before, after] = [piece, with_].map((p) => shoelace(ringOf(p, 60)));
        expect(Math.abs(after! - before!)).toBeLessThan(2 * ask.width ** 2);
      }),
      { numRuns: 30 },
    );
  });
});

describe("on a straight edge", () => {
  const band = {
    ...rectangle(300, 200),
    notches: [
      { edge: "top", at: 20, count: 1 as const },
      { edge: "top", at: 150, count: 1 as const },
      { edge: "top", at: 280, count: 2 as const },
    ],
  };
  const ask: DartAsk = { edge: "top", at: 150, width: 30, length: 90 };

  it("is even on both sides, its tip square below the middle of its mouth", () => {
    const { tip, legs, lines, angle, lengths } = dart(band, ask);
    expect([tip.x, tip.y]).toEqual([expect.closeTo(0, 9), expect.closeTo(90, 9)]);
    expect(legs[0][0].x).toBeCloseTo(-legs[1][0].x, 6);
    expect(legs[0][0].y).toBeCloseTo(legs[1][0].y, 6);
    // Truing the peak shortens the edge a little, so the mouth is a little less than 30.
    expect(2 * Math.tan(angle / 2) * 90).toBeGreaterThan(24);
    expect(2 * Math.tan(angle / 2) * 90).toBeLessThan(30);
    expect(lines.map(({ kind }) => kind)).toEqual(["stitch", "stitch", "fold"]);
    // The cap rises to a peak over the fold.
    expect(lines[2]!.curves[0]![0].x).toBeCloseTo(0, 6);
    expect(lengths.cap).toBeGreaterThan(24);
  });

  it("keeps the notches beside it; one in its mouth stands where the dart ends", () => {
    const { piece, legs, lengths } = dart(band, ask);
    const [first, middle, last] = piece.notches.map(({ at }) => at);
    expect(first).toBe(20);
    expect(last! - (lengths.stitched + lengths.cap)).toBeCloseTo(-20, 8);
    const points = polyline(edge(piece, "top"), 2000);
    let left = middle!;
    const found = points.slice(1).find((p, i) => (left -= apart(points[i]!, p)) <= 0)!;
    expect(apart(found, legs[0][0])).toBeLessThan(0.1);
  });

  it("cannot leave the piece, nor be wider than it has room or length for", () => {
    expect(() => dart(band, { ...ask, length: 201 })).toThrow(RangeError);
    expect(() => dart(band, { ...ask, towards: { x: 0, y: -50 } })).toThrow(RangeError);
    expect(() => dart(band, { ...ask, towards: { x: 100, y: 90 } })).toThrow(RangeError);
    expect(() => dart(band, { ...ask, at: 20 })).toThrow(RangeError);
    expect(() => dart(band, { ...ask, width: 0 })).toThrow(RangeError);
    expect(() => dart(band, { ...ask, width: 80, length: 20 })).toThrow(RangeError);
  });
});
