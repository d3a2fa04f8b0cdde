/**
 * A pattern laid out on sheets: where each piece lies, what every sheet shows, and how the sheets are joined. Pure, and
 * needs no font, so that the sheets can be counted before anything is made. Millimetres.
 */
import { type Point } from "@/lib/drafting/types";
import { isInside, type Rect } from "@/lib/pdf/bezier-clip";
import { type FullSizeDocument, type FullSizePiece } from "@/lib/pdf/full-size-document";
import { type Head, headOf } from "@/lib/pdf/full-size-head";
import { type PlacedWords, wordsOf } from "@/lib/pdf/full-size-labels";
import { boxOf, type Mark, marksOf, moveChain, moveMarks, outlinesOf } from "@/lib/pdf/full-size-marks";
import { type Nest, nest } from "@/lib/pdf/full-size-nest";
import {
  add,
  BAND,
  cellRect,
  type Grid,
  gridOver,
  has,
  inkOn,
  join,
  OVERLAP,
  roomOn,
  sheetRect,
  type Spot,
  spotAt,
  spotName,
  spotsOf,
} from "@/lib/pdf/full-size-tiles";
import { type FullSizePaper, fullSizePaper, MM } from "@/lib/pdf/papers";
import { printProblem } from "@/lib/pdf/pdf-api";

export interface PlacedPiece {
  readonly piece: FullSizePiece;
  /** How far it was moved from its draft. */
  readonly by: Point;
  /** Where they lie on the field. */
  readonly marks: readonly Mark[];
  readonly words: readonly PlacedWords[];
}

/** Two sheets show the same cross: laid on itself, they are in their places. */
export interface Cross {
  /** From 1, each once in a document. */
  readonly n: number;
  readonly at: Point;
}

export interface Sheet {
  readonly name: string;
  readonly spot: Spot;
  /** What of the field it shows. */
  readonly rect: Rect;
  /** The part that no other sheet covers. */
  readonly cell: Rect;
  readonly page: { readonly w: number; readonly h: number };
  readonly crosses: readonly Cross[];
  /** Sides where another sheet is joined. */
  readonly joined: readonly Side[];
}

export type Side = "left" | "right" | "top" | "bottom";

export interface FullSizeLayout {
  readonly paper: string;
  readonly isRoll: boolean;
  readonly columns: number;
  readonly rows: number;
  readonly field: { readonly w: number; readonly h: number };
  readonly head: Head;
  readonly pieces: readonly PlacedPiece[];
  /** Those that are printed, in reading order. */
  readonly sheets: readonly Sheet[];
  /** Cells that are left out although they lie inside a piece. */
  readonly plain: readonly Rect[];
}

/** Between pieces, mm. */
const GAP = 10;
/** From the edge of a sheet: a line on the very edge cannot be cut along. */
const EDGE = 2;
/** More is no pattern but a mistake in a figure. */
export const MOST_SHEETS = 400;
/** Widths of the field tried. */
const MOST_TRIED = 30;
/** Crosses on a shared side: two, and one more for every so many mm. */
const CROSS_EVERY = 500;

/** @throws PrintProblem where it would take more than `MOST_SHEETS`, or has no pieces. */
export function layOut(doc: FullSizeDocument, on: FullSizePaper): FullSizeLayout {
  if (doc.pieces.length === 0) throw printProblem("There is no piece to print. Draft the sleeve first.");
  const paper = fullSizePaper(on);
  const parts = doc.pieces.map((piece) => {
    const marks = marksOf(piece);
    return { piece, marks, box: boxOf(marks) };
  });
  const room = roomOn(paper);
  const head = headOf(doc, { x: EDGE, y: EDGE }, room.h - OVERLAP - 2 * EDGE);
  const sizes = [head.box, ...parts.map(({ box }) => box)];
  const best = widths(sizes, room.w)
    .map((width) => tried(nest(sizes, width, GAP, EDGE), parts, paper))
    .reduce((a, b) => (b.cost < a.cost - 1e-6 ? b : a));
  const { grid, moved } = best;
  const headInk = inkOn(grid, head.ink);
  const printed = new Set([...headInk, ...moved.flatMap(({ ink }) => [...ink])]);
  if (printed.size > MOST_SHEETS)
    throw printProblem(
      `This would take ${printed.size} sheets of ${paper.name}. Choose larger paper or a wide roll, or look for a figure that is far too large.`,
    );
  const pieces = moved.map(({ piece, marks, by, ink }): PlacedPiece => {
    const words = wordsOf(piece, doc, marks, by, {
      roomAt: (point) => cellRect(grid, spotAt(grid, point)),
      isPrinted: (point) => has(grid, printed, spotAt(grid, point)),
    });
    for (const { box } of words)
      for (const set of [printed, ink])
        add(grid, set, spotAt(grid, { x: box.x + box.w / 2, y: box.y + box.h / 2 }));
    join(grid, printed, ink);
    return { piece, by, marks, words };
  });
  return {
    paper: paper.name,
    isRoll: grid.isRoll,
    columns: grid.columns,
    rows: grid.rows,
    field: grid.field,
    head,
    pieces,
    sheets: sheetsOf(grid, printed, paper.width / MM, paper.margin.top / MM),
    plain: plainCells(grid, printed, pieces),
  };
}

/** Widths worth a try: of whole columns of sheets, from the widest piece's up to all pieces in a row. */
function widths(sizes: readonly { w: number }[], shows: number): number[] {
  const columns = (width: number) => Math.max(1, Math.ceil((width - OVERLAP) / (shows - OVERLAP) - 1e-9));
  const widest = columns(Math.max(...sizes.map(({ w }) => w)) + 2 * EDGE);
  const all = columns(sizes.reduce((sum, { w }) => sum + w + GAP, 2 * EDGE - GAP));
  const count = Math.min(all - widest + 1, MOST_TRIED);
  return Array.from({ length: count }, (_, i) => (widest + i) * (shows - OVERLAP) + OVERLAP);
}

interface Part {
  readonly piece: FullSizePiece;
  readonly marks: readonly Mark[];
  readonly box: Rect;
}

/** How much paper a nest would take, mm². */
function tried({ places, w, h }: Nest, parts: readonly Part[], paper: ReturnType<typeof fullSizePaper>) {
  const grid = gridOver({ w, h }, paper);
  const moved = parts.map(({ piece, marks, box }, i) => {
    const place = places[i + 1]!;
    const by = { x: place.x - box.x, y: place.y - box.y };
    const there = moveMarks(marks, by);
    return {
      piece,
      by,
      marks: there,
      ink: inkOn(
        grid,
        there.flatMap(({ curves }) => [...curves]),
      ),
    };
  });
  const printed = new Set(moved.flatMap(({ ink }) => [...ink]));
  // The head stands on the first sheet.
  printed.add(0);
  const cost = spotsOf(grid, printed).reduce((sum, spot) => sum + sheetRect(grid, spot).h * grid.shows.w, 0);
  return { grid, moved, cost };
}

function sheetsOf(grid: Grid, printed: ReadonlySet<number>, pageWidth: number, margin: number): Sheet[] {
  const spots = spotsOf(grid, printed);
  const sheets = new Map(
    spots.map((spot) => [spotName(spot), { crosses: [] as Cross[], joined: [] as Side[] }]),
  );
  let n = 0;
  const joint = (one: Spot, other: Spot, sides: readonly [Side, Side], places: (rect: Rect) => Point[]) => {
    if (!has(grid, printed, other)) return;
    const [a, b] = [sheets.get(spotName(one))!, sheets.get(spotName(other))!];
    a.joined.push(sides[0]);
    b.joined.push(sides[1]);
    for (const at of places(sheetRect(grid, one))) {
      const cross = { n: ++n, at };
      a.crosses.push(cross);
      b.crosses.push(cross);
    }
  };
  for (const [row, column] of spots) {
    if (column + 1 < grid.columns)
      joint([row, column], [row, column + 1], ["right", "left"], ({ x, y, w, h }) =>
        spread(h).map((at) => ({ x: x + w - OVERLAP / 2, y: y + at })),
      );
    if (row + 1 < grid.rows)
      joint([row, column], [row + 1, column], ["bottom", "top"], ({ x, y, w, h }) =>
        spread(w).map((at) => ({ x: x + at, y: y + h - OVERLAP / 2 })),
      );
  }
  return spots.map((spot): Sheet => {
    const rect = sheetRect(grid, spot);
    const name = spotName(spot);
    const page = { w: pageWidth, h: rect.h + BAND + 2 * margin };
    return { name, spot, rect, cell: cellRect(grid, spot), page, ...sheets.get(name)! };
  });
}

/** Even places along a side, none in its corners. */
function spread(length: number): number[] {
  const count = Math.max(2, Math.ceil(length / CROSS_EVERY));
  return Array.from({ length: count }, (_, i) => (length * (i + 0.5)) / count);
}

function plainCells(grid: Grid, printed: ReadonlySet<number>, pieces: readonly PlacedPiece[]): Rect[] {
  const cells: Rect[] = [];
  const outlines = pieces.map(({ piece, by }) => outlinesOf(piece).map((curves) => moveChain(curves, by)));
  for (let row = 0; row < grid.rows; row++)
    for (let column = 0; column < grid.columns; column++) {
      if (has(grid, printed, [row, column])) continue;
      const cell = cellRect(grid, [row, column]);
      const middle = { x: cell.x + cell.w / 2, y: cell.y + cell.h / 2 };
      if (outlines.some((outline) => isInside(outline, middle))) cells.push(cell);
    }
  return cells;
}
