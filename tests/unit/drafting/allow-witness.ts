/** What the tests of allowances measure without the engine (polylines, their distances, Clipper's offset), and their pieces. */
import ClipperLib from "clipper-lib";
import { type CubicBezier, type PatternPiece, type Piece, type Point } from "@/lib/drafting";
import { line } from "@/lib/drafting/measure";
import { pattern } from "@/lib/drafting/styles/parts";
import { type child, draft, sample } from "./helpers";

/**
 * Clipper works in whole numbers: fiftieths of a micrometre, the finest that a sleeve of 900 mm has before it turns to its
 * slow large numbers. Coarser ones turn the short chords at corners.
 */
const FINE = 5e4;

export function polyline(curves: readonly CubicBezier[], steps = 48): Point[] {
  return curves.flatMap((curve, i) => sample(curve, steps).slice(i === 0 ? 0 : 1));
}

/** The ring of a closed outline, its first point not repeated. */
export function ringOf(
  { edges }: { edges: readonly { curves: readonly CubicBezier[] }[] },
  steps = 48,
): Point[] {
  return polyline(
    edges.flatMap(({ curves }) => [...curves]),
    steps,
  ).slice(1);
}

/** The ring with its points close together at the ends of every curve, so that chords have the curves' directions there. */
export function fineRing({ edges }: { edges: readonly { curves: readonly CubicBezier[] }[] }): Point[] {
  const steps = 60;
  return edges.flatMap(({ curves }) =>
    curves.flatMap(([a, b, c, d]) =>
      Array.from({ length: steps }, (_, i): Point => {
        const share = (i + 1) / steps;
        const t = share * share * (3 - 2 * share);
        const s = 1 - t;
        const mix = (k: "x" | "y") =>
          s * s * s * a[k] + 3 * s * s * t * b[k] + 3 * s * t * t * c[k] + t * t * t * d[k];
        return { x: mix("x"), y: mix("y") };
      }),
    ),
  );
}

export function shoelace(ring: readonly Point[]): number {
  return ring.reduce((sum, p, i) => {
    const q = ring[(i + 1) % ring.length]!;
    return sum + (p.x * q.y - q.x * p.y) / 2;
  }, 0);
}

export function perimeter(ring: readonly Point[]): number {
  return ring.reduce((sum, p, i) => {
    const q = ring[(i + 1) % ring.length]!;
    return sum + Math.hypot(q.x - p.x, q.y - p.y);
  }, 0);
}

/** From a point to the nearest of a polyline. */
export function awayFrom(point: Point, line: readonly Point[], closed = false): number {
  let nearest = Infinity;
  for (let i = closed ? 0 : 1; i < line.length; i++) {
    const [a, b] = [line.at(i - 1)!, line[i]!];
    const [dx, dy] = [b.x - a.x, b.y - a.y];
    const size = dx * dx + dy * dy;
    const share = size === 0 ? 0 : ((point.x - a.x) * dx + (point.y - a.y) * dy) / size;
    const t = Math.max(0, Math.min(1, share));
    nearest = Math.min(nearest, (a.x + t * dx - point.x) ** 2 + (a.y + t * dy - point.y) ** 2);
  }
  return Math.sqrt(nearest);
}

/** Hausdorff distance of two closed polylines, measured at the vertices that count. */
export function hausdorff(
  one: readonly Point[],
  other: readonly Point[],
  counts: (point: Point) => boolean = () => true,
): number {
  const far = (from: readonly Point[], to: readonly Point[]) =>
    from.filter(counts).reduce((most, point) => Math.max(most, awayFrom(point, to, true)), 0);
  return Math.max(far(one, other), far(other, one));
}

const path = (points: readonly Point[]) =>
  points.map(({ x, y }) => ({ X: Math.round(x * FINE), Y: Math.round(y * FINE) }));

/** The largest ring of Clipper's mitred offset, clockwise on the paper. */
export function clipperOffset(ring: readonly Point[], width: number, limit: number): Point[] {
  const offset = new ClipperLib.ClipperOffset(limit);
  offset.AddPath(path(ring), ClipperLib.JoinType.jtMiter, ClipperLib.EndType.etClosedPolygon);
  const found: { X: number; Y: number }[][] = [];
  offset.Execute(found, width * FINE);
  const [largest] = found.sort(
    (a, b) => Math.abs(ClipperLib.Clipper.Area(b)) - Math.abs(ClipperLib.Clipper.Area(a)),
  );
  const points = largest!.map(({ X, Y }): Point => ({ x: X / FINE, y: Y / FINE }));
  return shoelace(points) > 0 ? points : points.reverse();
}

/** What of `one` lies outside `other`, mm². */
export function areaOutside(one: readonly Point[], other: readonly Point[]): number {
  const clipper = new ClipperLib.Clipper();
  clipper.AddPath(path(one), ClipperLib.PolyType.ptSubject, true);
  clipper.AddPath(path(other), ClipperLib.PolyType.ptClip, true);
  const found: { X: number; Y: number }[][] = [];
  const fill = ClipperLib.PolyFillType.pftNonZero;
  clipper.Execute(ClipperLib.ClipType.ctDifference, found, fill, fill);
  return found.reduce((sum, ring) => sum + Math.abs(ClipperLib.Clipper.Area(ring)), 0) / FINE ** 2;
}

export const sleeve = (f: typeof child, more: Partial<PatternPiece> = {}) =>
  pattern(draft(f).piece, "sleeve", "Sleeve", more);

/** A piece of straight edges e0, e1 ... between the corners. */
export function polygon(corners: readonly Point[], more: Partial<PatternPiece> = {}): PatternPiece {
  const edges = corners.map((corner, i) => ({
    name: `e${i}`,
    curves: [line(corner, corners[(i + 1) % corners.length]!)],
  }));
  const piece: Piece = { name: "polygon", edges, notches: [], grain: { from: corners[0]!, to: corners[1]! } };
  return { ...pattern(piece, "polygon", "Polygon"), ...more };
}

export const cornersOf = (piece: Pick<Piece, "edges">) => piece.edges.map(({ curves }) => curves[0]![0]);
