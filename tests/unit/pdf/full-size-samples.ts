/** A basic sleeve and a very wide fan as documents at full size. */
import { makeSleeve } from "@/lib/drafting";
import { bounds, line, pointAt } from "@/lib/drafting/measure";
import { edgeOf } from "@/lib/drafting/outline";
import { type CubicBezier, type Piece, type Point } from "@/lib/drafting/types";
import { type FullSizeDocument, type FullSizePiece, type Stroke } from "@/lib/pdf/full-size-document";

const made = makeSleeve({ length: 560, biceps: 340, hem: 230, capDepth: 140 });
if (!made.ok) throw new Error("The sample sleeve cannot be drawn.");
export const sleeve = made;

/** Six millimetres straight into the piece, which lies on the right hand of its outline. */
function notchStrokes(piece: Piece): Stroke[] {
  return piece.notches.flatMap(({ edge, at, count }) =>
    (count === 1 ? [0] : [-3, 3]).map((off): Stroke => {
      const { point: p, direction: d } = pointAt(edgeOf(piece, edge).curves, at + off);
      return [p, { x: p.x - d.y * 6, y: p.y + d.x * 6 }];
    }),
  );
}

const { piece } = made.draft;
const outline = piece.edges.flatMap(({ curves }) => [...curves]);
const { min, max } = bounds(outline);

/** 15 mm outside the box of the sleeve: something to cut along. */
const boxAround: CubicBezier[] = [
  [min.x - 15, min.y - 15],
  [max.x + 15, min.y - 15],
  [max.x + 15, max.y + 15],
  [min.x - 15, max.y + 15],
].map(([x, y], i, corners) => {
  const [nextX, nextY] = corners[(i + 1) % 4]!;
  return line({ x: x!, y: y! }, { x: nextX!, y: nextY! });
});

export const sleevePiece: FullSizePiece = {
  id: "sleeve",
  name: "Sleeve",
  cutWords: "Cut 2, mirrored",
  stitch: [outline],
  cutting: [boxAround],
  notches: notchStrokes(piece),
  grain: piece.grain,
  lines: [
    {
      kind: "guide",
      words: "Biceps line",
      curves: [line({ x: -170, y: 140 }, { x: 170, y: 140 })],
    },
  ],
  labels: [{ words: "Front", at: { x: -120, y: 170 } }],
};

/** Part of a ring as Béziers, each of a sixteenth turn at most. */
function arc(radius: number, from: number, to: number): CubicBezier[] {
  const count = Math.ceil(Math.abs(to - from) / (Math.PI / 8));
  const step = (to - from) / count;
  const handle = (4 / 3) * Math.tan(step / 4) * radius;
  const at = (angle: number, out: number): Point => ({
    x: radius * Math.cos(angle) - out * Math.sin(angle),
    y: radius * Math.sin(angle) + out * Math.cos(angle),
  });
  return Array.from({ length: count }, (_, i): CubicBezier => {
    const [a, b] = [from + i * step, from + (i + 1) * step];
    return [at(a, 0), at(a, handle), at(b, -handle), at(b, 0)];
  });
}

export const fanInner = 300;
export const fanDepth = 520;
export const fanTurn = (150 * Math.PI) / 180;

/** Part of a ring, 1.6 m across: some sheets lie inside it whole. */
export function fanPiece(): FullSizePiece {
  const [left, right] = [Math.PI / 2 + fanTurn / 2, Math.PI / 2 - fanTurn / 2];
  const inner = arc(fanInner, left, right);
  const outer = arc(fanInner + fanDepth, right, left);
  const between = (a: CubicBezier[], b: CubicBezier[]) => line(a.at(-1)![3], b[0]![0]);
  return {
    id: "flounce",
    name: "Flounce",
    cutWords: "Cut 2",
    stitch: [[...inner, between(inner, outer), ...outer, between(outer, inner)]],
    notches: [],
    grain: { from: { x: 0, y: fanInner + 40 }, to: { x: 0, y: fanInner + fanDepth - 40 } },
    lines: [],
    labels: [],
  };
}

export const sample = (more: Partial<FullSizeDocument> = {}): FullSizeDocument => ({
  title: "Sunday sleeve",
  style: "Plain sleeve",
  wearer: "Ama",
  date: "2025-12-01",
  allowances: "Allowances drawn: 1.5 cm all round.",
  warnings: [],
  pieces: [sleevePiece, fanPiece()],
  author: "Thimble Lane",
  ...more,
});
