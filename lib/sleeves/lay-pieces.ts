/** The pieces of a style laid beside each other on one paper, as large as they can be shown together. */
import { type PatternPiece, type Point } from "@/lib/drafting";
import { boxOfCurves } from "@/lib/sleeves/drawing-paths";
import { type Box } from "@/lib/sleeves/drawing-view";

export interface LaidPiece {
  piece: PatternPiece;
  /** From the piece's own place to where it lies, mm. */
  by: Point;
  /** Where it lies, mm. */
  box: Box;
}

export interface LaidPieces {
  laid: LaidPiece[];
  box: Box;
}

/** A box grows by whole steps of this, mm, so that a small change of a figure does not lay everything anew. */
const boxStep = 25.4;

/** Room between pieces, of the longer side of the largest piece, where none is asked for. */
const gapShare = 0.14;

/**
 * Lays pieces in rows, in their order. Of all ways to break the rows the one that can be shown largest in a frame of
 * `aspect`, width to height, is taken. Between them and below the last is `gap`, mm.
 */
export function layPieces(pieces: readonly PatternPiece[], aspect: number, gap?: number): LaidPieces {
  const sizes = pieces.map(sizeOf);
  const between = gap ?? gapShare * Math.max(...sizes.map(({ w, h }) => Math.max(w, h)));
  let best: { rows: number[][]; scale: number } | undefined;
  for (const rows of rowsOf(pieces.length)) {
    const { h, w } = rowsBox(rows, sizes, between);
    const scale = Math.min(aspect / w, 1 / h);
    // A hair better is no reason to lay them otherwise.
    if (!best || scale > best.scale * 1.001) best = { rows, scale };
  }
  return placed(pieces, sizes, best!.rows, between);
}

interface PieceSize extends Box {
  /** The place that is kept for it: its box, up to the next step. */
  keptW: number;
  keptH: number;
}

function sizeOf(piece: PatternPiece): PieceSize {
  const box = boxOfCurves(piece.edges.flatMap(({ curves }) => curves));
  const up = (value: number) => Math.ceil(value / boxStep - 1e-9) * boxStep;
  return { ...box, keptW: up(box.w), keptH: up(box.h) };
}

/** Every way to break so many things into rows; with more than eight only even rows are tried. */
function rowsOf(count: number): number[][][] {
  const all = Array.from({ length: count }, (_, i) => i);
  if (count > 8)
    return all.map((i) => {
      const each = i + 1;
      return Array.from({ length: Math.ceil(count / each) }, (_, row) =>
        all.slice(row * each, (row + 1) * each),
      );
    });
  return Array.from({ length: 2 ** (count - 1) }, (_, breaks) => {
    const rows: number[][] = [[]];
    for (const i of all) {
      if (i > 0 && breaks & (1 << (i - 1))) rows.push([]);
      rows.at(-1)!.push(i);
    }
    return rows;
  });
}

const widthOf = (row: readonly number[], sizes: readonly PieceSize[], gap: number): number =>
  row.reduce((sum, i) => sum + sizes[i]!.keptW, 0) + gap * (row.length - 1);

const heightOf = (row: readonly number[], sizes: readonly PieceSize[]): number =>
  Math.max(...row.map((i) => sizes[i]!.keptH));

function rowsBox(rows: readonly number[][], sizes: readonly PieceSize[], gap: number) {
  return {
    w: Math.max(...rows.map((row) => widthOf(row, sizes, gap))),
    h: rows.reduce((sum, row) => sum + heightOf(row, sizes) + gap, 0),
  };
}

function placed(
  pieces: readonly PatternPiece[],
  sizes: readonly PieceSize[],
  rows: readonly number[][],
  gap: number,
): LaidPieces {
  const { h, w } = rowsBox(rows, sizes, gap);
  const laid: LaidPiece[] = [];
  let top = 0;
  for (const row of rows) {
    let left = (w - widthOf(row, sizes, gap)) / 2;
    for (const i of row) {
      const size = sizes[i]!;
      const box = { x: left + (size.keptW - size.w) / 2, y: top, w: size.w, h: size.h };
      laid.push({ piece: pieces[i]!, by: { x: box.x - size.x, y: box.y - size.y }, box });
      left += size.keptW + gap;
    }
    top += heightOf(row, sizes) + gap;
  }
  return { laid, box: { x: 0, y: 0, w, h } };
}
