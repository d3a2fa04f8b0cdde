/**
 * Where the words of a piece stand. Each has a box of a fixed size, so that the sheets can be counted before a font is
 * there; whoever draws fits the words into the box. A box lies on one sheet whole. Millimetres.
 */
import { type Point } from "@/lib/drafting/types";
import { holds, isInside, pointOn, type Rect, touches } from "@/lib/pdf/bezier-clip";
import { setFractions } from "@/lib/pdf/fractions";
import { type Chain, type FullSizeDocument, type FullSizePiece } from "@/lib/pdf/full-size-document";
import { boxOf, type Mark, moveChain, outlinesOf } from "@/lib/pdf/full-size-marks";

/** A line of words; `size` in points, the largest at which it is set. */
export interface Said {
  readonly words: string;
  readonly size: number;
  readonly bold?: boolean;
  /** Something to look out for: a notch stands before it. */
  readonly notched?: boolean;
}

export interface PlacedWords {
  readonly box: Rect;
  readonly said: readonly Said[];
}

/** What a sheet offers to words. */
export interface Rooms {
  /** The part of the sheet at a point that no other sheet covers. */
  readonly roomAt: (point: Point) => Rect;
  /** Whether something is drawn on that sheet already. */
  readonly isPrinted: (point: Point) => boolean;
}

/** Boxes for the name, the best first. */
const NAME_BOXES = [
  { w: 80, h: 26 },
  { w: 64, h: 21 },
  { w: 50, h: 18 },
  { w: 38, h: 15 },
  { w: 44, h: 9 },
  { w: 24, h: 9 },
];
/** Between the name and the lines around it. */
const CLEAR = 2;
/** Places tried across and down. */
const TRIED = 36;
const LABEL_SIZE = 9;
const LABEL_HEIGHT = 4.6;
const MM_A_POINT = 25.4 / 72;

/** Of the size of its letters, generously: how wide words are where no font is at hand. */
export const guessWidth = (words: string): number =>
  Array.from(words).reduce((sum, sign) => sum + (/^[\u0020-\u024f]$/u.test(sign) ? 0.6 : 1.05), 0);

export function nameOf(piece: FullSizePiece, { style, title, wearer }: FullSizeDocument): Said[] {
  const whose = [wearer, title, style].filter(
    (words, i, all) => words.trim() !== "" && all.indexOf(words) === i,
  );
  return [
    { words: piece.name, size: 15, bold: true },
    { words: piece.cutWords, size: 12, bold: true },
    { words: whose.join(", "), size: 9 },
  ].filter(({ words }) => words.trim() !== "");
}

/** `marks` are the piece's, where it lies; `by` is how far it was moved there. */
export function wordsOf(
  piece: FullSizePiece,
  doc: FullSizeDocument,
  marks: readonly Mark[],
  by: Point,
  rooms: Rooms,
): PlacedWords[] {
  const said = [
    ...piece.labels.map(({ words, at }) => ({ words, at: { x: at.x + by.x, y: at.y + by.y } })),
    ...piece.lines.map(({ words, curves }) => ({ words, at: besideLine(moveChain(curves, by)) })),
  ].filter(({ words }) => words.trim() !== "");
  const small = said.map(({ words: written, at }) => {
    const words = setFractions(written);
    const w = guessWidth(words) * LABEL_SIZE * MM_A_POINT;
    return placed(at, { w, h: LABEL_HEIGHT }, rooms, [{ words, size: LABEL_SIZE }]);
  });
  const outlines = outlinesOf(piece).map((curves) => moveChain(curves, by));
  const taken = small.map(({ box }) => box);
  return [...small, { box: nameBox(outlines, marks, taken, rooms), said: nameOf(piece, doc) }];
}

/** Just above the middle of a line. */
function besideLine(curves: Chain): Point {
  const { x, y } = pointOn(curves[Math.floor(curves.length / 2)]!, curves.length % 2 ? 0.5 : 0);
  return { x, y: y - LABEL_HEIGHT * 0.7 };
}

/** Centred on a point, moved no further than it must be to lie on that point's sheet whole. */
function placed(at: Point, size: { w: number; h: number }, rooms: Rooms, said: readonly Said[]): PlacedWords {
  const room = rooms.roomAt(at);
  const [w, h] = [Math.min(size.w, room.w), Math.min(size.h, room.h)];
  const keep = (value: number, low: number, high: number) => Math.min(Math.max(value, low), high);
  const box = {
    x: keep(at.x - w / 2, room.x, room.x + room.w - w),
    y: keep(at.y - h / 2, room.y, room.y + room.h - h),
    w,
    h,
  };
  return { box, said };
}

const grown = ({ x, y, w, h }: Rect, by: number): Rect => ({
  x: x - by,
  y: y - by,
  w: w + 2 * by,
  h: h + 2 * by,
});

const apart = (a: Rect, b: Rect): boolean =>
  a.x + a.w <= b.x || b.x + b.w <= a.x || a.y + a.h <= b.y || b.y + b.h <= a.y;

/**
 * The largest box that lies clear inside the piece, as near to its middle as can be, on a sheet that is printed anyway
 * where there is one. In a piece too narrow for any, the smallest in its middle, over the lines.
 */
function nameBox(
  outlines: readonly Chain[],
  marks: readonly Mark[],
  taken: readonly Rect[],
  rooms: Rooms,
): Rect {
  const whole = boxOf(marks);
  const lines = marks.flatMap(({ curves }) => [...curves]);
  const middle = { x: whole.x + whole.w / 2, y: whole.y + whole.h / 2 };
  const spots: { at: Point; off: number }[] = [];
  for (let i = 1; i < TRIED; i++)
    for (let j = 1; j < TRIED; j++) {
      const at = { x: whole.x + (whole.w * i) / TRIED, y: whole.y + (whole.h * j) / TRIED };
      const off = Math.hypot((at.x - middle.x) / whole.w, (at.y - middle.y) / whole.h);
      if (isInside(outlines, at)) spots.push({ at, off });
    }
  spots.sort((a, b) => a.off - b.off);
  // A smaller name is better than one more sheet.
  for (const printed of [true, false])
    for (const { w, h } of NAME_BOXES)
      for (const { at } of spots) {
        if (rooms.isPrinted(at) !== printed) continue;
        const box = { x: at.x - w / 2, y: at.y - h / 2, w, h };
        const clear = grown(box, CLEAR);
        const free = holds(rooms.roomAt(at), clear) && taken.every((other) => apart(clear, other));
        if (free && !touches(lines, clear)) return box;
      }
  const at = spots[0]?.at ?? middle;
  return placed(at, NAME_BOXES.at(-1)!, rooms, []).box;
}
