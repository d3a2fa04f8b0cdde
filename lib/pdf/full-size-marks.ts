/** A piece as the lines that are drawn of it. Millimetres. */
import { bounds, distance, line } from "@/lib/drafting/measure";
import { type CubicBezier, type Point } from "@/lib/drafting/types";
import { type Rect, shiftCurve } from "@/lib/pdf/bezier-clip";
import { type Chain, type FullSizePiece } from "@/lib/pdf/full-size-document";

/** How a line is drawn, and so what it means. */
export type Weight = "cut" | "sew" | "fold" | "placement" | "guide" | "notch" | "grain";

export interface Mark {
  readonly weight: Weight;
  readonly curves: Chain;
}

/** The head of the grain arrow, mm. */
const ARROW = 5;

/** Where the piece lies in the draft. Notches are carried out to the line that is cut, by whoever made the document. */
export function marksOf(piece: FullSizePiece): Mark[] {
  const chains = (weight: Weight, all: readonly Chain[] = []): Mark[] =>
    all.filter((curves) => curves.length > 0).map((curves) => ({ weight, curves }));
  return [
    ...piece.lines.flatMap(({ kind, curves }) => chains(kind === "stitch" ? "sew" : kind, [curves])),
    ...chains(
      "grain",
      arrow(piece.grain).map(([from, to]) => [line(from, to)]),
    ),
    ...chains("sew", piece.stitch),
    ...chains("cut", piece.cutting),
    ...chains(
      "notch",
      piece.notches.map(([from, to]) => [line(from, to)]),
    ),
  ];
}

/** A shaft with a head at each end, drawn as strokes; nothing for a grain of no length. */
function arrow({ from, to }: { from: Point; to: Point }): [Point, Point][] {
  const length = distance(from, to);
  if (length < 1e-6) return [];
  const size = Math.min(ARROW, length / 3);
  const [ux, uy] = [((to.x - from.x) / length) * size, ((to.y - from.y) / length) * size];
  const head = ({ x, y }: Point, way: 1 | -1): [Point, Point][] =>
    [0.45, -0.45].map((side) => [
      { x: x + way * ux - side * uy, y: y + way * uy + side * ux },
      { x, y },
    ]);
  return [[from, to], ...head(from, 1), ...head(to, -1)];
}

/**
 * Closed outlines that hold the piece: what is cut along, or sewn along where no allowance is drawn. One that is open at
 * the fold of the cloth is closed by a straight line.
 */
export function outlinesOf({ cutting, stitch }: FullSizePiece): readonly Chain[] {
  const chains = cutting && cutting.length > 0 ? cutting : stitch;
  return chains
    .filter((curves) => curves.length > 0)
    .map((curves) => (isClosed(curves) ? curves : [...curves, line(curves.at(-1)![3], curves[0]![0])]));
}

export function boxOf(marks: readonly Mark[]): Rect {
  const { min, max } = bounds(marks.flatMap(({ curves }) => [...curves]));
  return { x: min.x, y: min.y, w: max.x - min.x, h: max.y - min.y };
}

export const moveChain = (curves: Chain, { x, y }: Point): CubicBezier[] =>
  curves.map((curve) => shiftCurve(curve, x, y));

export const moveMarks = (marks: readonly Mark[], by: Point): Mark[] =>
  marks.map(({ weight, curves }) => ({ weight, curves: moveChain(curves, by) }));

/** Whether a chain comes back to its start. */
export const isClosed = (curves: Chain): boolean =>
  curves.length > 0 && distance(curves[0]![0], curves.at(-1)![3]) < 1e-6;

/** A rectangle as four straight lines, clockwise from its upper left corner. */
export function rectangle({ x, y, w, h }: Rect): CubicBezier[] {
  const corners = [
    { x, y },
    { x: x + w, y },
    { x: x + w, y: y + h },
    { x, y: y + h },
  ];
  return corners.map((corner, i) => line(corner, corners[(i + 1) % 4]!));
}
