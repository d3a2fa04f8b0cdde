/**
 * Sheets over a field: which part of it each may show, where one is cut and laid on the next, and which of them are
 * printed. Millimetres, from the field's upper left corner.
 */
import { type CubicBezier, type Point } from "@/lib/drafting/types";
import { hull, type Rect, touches } from "@/lib/pdf/bezier-clip";
import { LONGEST_PAGE, MM, type Paper } from "@/lib/pdf/papers";

/** What a sheet shows beyond the line it shares with its neighbour, half on either side of the line. */
export const OVERLAP = 10;
/** Below the drawing, for the sheet's name. */
export const BAND = 6;
/** A line that only touches the shared line is on the sheet before already. */
const TOUCH = 1e-6;

export interface Grid {
  readonly columns: number;
  readonly rows: number;
  /** What one sheet shows; on a roll the last row may be shorter. */
  readonly shows: { readonly w: number; readonly h: number };
  readonly field: { readonly w: number; readonly h: number };
  readonly isRoll: boolean;
}

export type Spot = readonly [row: number, column: number];

/** What may be drawn on, below margins and above the sheet's name. */
export function roomOn({ width, height = LONGEST_PAGE, margin }: Paper): { w: number; h: number } {
  return {
    w: (width - margin.left - margin.right) / MM,
    h: (height - margin.top - margin.bottom) / MM - BAND,
  };
}

export function gridOver(field: { w: number; h: number }, paper: Paper): Grid {
  const shows = roomOn(paper);
  const count = (whole: number, one: number) =>
    Math.max(1, Math.ceil((whole - OVERLAP) / (one - OVERLAP) - 1e-9));
  const isRoll = paper.height === undefined;
  return { columns: count(field.w, shows.w), rows: count(field.h, shows.h), shows, field, isRoll };
}

/** Rows are letters, columns numbers: A1, A2, B1. After Z comes AA. */
export function spotName([row, column]: Spot): string {
  let letters = "";
  for (let left = row + 1; left > 0; left = Math.floor((left - 1) / 26))
    letters = String.fromCharCode(65 + ((left - 1) % 26)) + letters;
  return `${letters}${column + 1}`;
}

/** Everything a sheet shows. */
export function sheetRect({ field, isRoll, shows }: Grid, [row, column]: Spot): Rect {
  const y = row * (shows.h - OVERLAP);
  const h = isRoll ? Math.min(shows.h, field.h - y) : shows.h;
  return { x: column * (shows.w - OVERLAP), y, w: shows.w, h };
}

/** What is left of a sheet when it is cut along the lines it shares: together the cells are the field. */
export function cellRect(grid: Grid, spot: Spot): Rect {
  const [row, column] = spot;
  const { x, y, w, h } = sheetRect(grid, spot);
  const half = OVERLAP / 2;
  const [left, top] = [column > 0 ? half : 0, row > 0 ? half : 0];
  const right = column < grid.columns - 1 ? half : 0;
  const bottom = row < grid.rows - 1 ? half : 0;
  return { x: x + left, y: y + top, w: w - left - right, h: h - top - bottom };
}

/** The cell a point lies in; off the field, the nearest. */
export function spotAt({ columns, rows, shows }: Grid, { x, y }: Point): Spot {
  const index = (at: number, one: number, count: number) =>
    Math.min(Math.max(Math.floor((at - OVERLAP / 2) / (one - OVERLAP)), 0), count - 1);
  return [index(y, shows.h, rows), index(x, shows.w, columns)];
}

const indexOf = ({ columns }: Grid, [row, column]: Spot): number => row * columns + column;
const spotOf = ({ columns }: Grid, index: number): Spot => [Math.floor(index / columns), index % columns];

/** The sheets in whose cells curves are, found from the curves themselves. */
export function inkOn(grid: Grid, curves: readonly CubicBezier[]): Set<number> {
  const found = new Set<number>();
  for (const curve of curves) {
    const { x, y, w, h } = hull(curve);
    const [top, left] = spotAt(grid, { x: x - TOUCH, y: y - TOUCH });
    const [bottom, right] = spotAt(grid, { x: x + w, y: y + h });
    for (let row = top; row <= bottom; row++)
      for (let column = left; column <= right; column++) {
        const index = indexOf(grid, [row, column]);
        if (found.has(index)) continue;
        const cell = cellRect(grid, [row, column]);
        const [dx, dy] = [column > 0 ? TOUCH : 0, row > 0 ? TOUCH : 0];
        if (touches([curve], { x: cell.x + dx, y: cell.y + dy, w: cell.w - dx, h: cell.h - dy }))
          found.add(index);
      }
  }
  return found;
}

export const has = (grid: Grid, printed: ReadonlySet<number>, spot: Spot): boolean =>
  printed.has(indexOf(grid, spot));

export const add = (grid: Grid, printed: Set<number>, spot: Spot): unknown =>
  printed.add(indexOf(grid, spot));

/** In reading order. */
export const spotsOf = (grid: Grid, printed: ReadonlySet<number>): Spot[] =>
  [...printed].sort((a, b) => a - b).map((index) => spotOf(grid, index));

function beside({ columns, rows }: Grid, index: number): number[] {
  const column = index % columns;
  return [
    ...(column > 0 ? [index - 1] : []),
    ...(column < columns - 1 ? [index + 1] : []),
    ...(index >= columns ? [index - columns] : []),
    ...(index < columns * (rows - 1) ? [index + columns] : []),
  ];
}

/**
 * The sheets of one piece must hang together side by side, or what stands alone in its middle could not be laid in its
 * place. Adds the fewest empty sheets on the way from each island to the first; looks no further than the grid.
 */
export function join(grid: Grid, printed: Set<number>, piece: ReadonlySet<number>): void {
  for (;;) {
    const [start] = piece;
    if (start === undefined) return;
    const reached = flood(grid, start, printed);
    if ([...piece].every((index) => reached.has(index))) return;
    // From all that is reached, the nearest sheet of the piece that is not.
    const from = new Map<number, number>();
    const queue = [...reached];
    let goal: number | undefined;
    for (let at = 0; at < queue.length && goal === undefined; at++)
      for (const next of beside(grid, queue[at]!)) {
        if (reached.has(next) || from.has(next)) continue;
        from.set(next, queue[at]!);
        queue.push(next);
        if (piece.has(next)) goal = next;
      }
    if (goal === undefined) return;
    for (
      let index: number | undefined = goal;
      index !== undefined && !reached.has(index);
      index = from.get(index)
    )
      printed.add(index);
  }
}

function flood(grid: Grid, start: number, printed: ReadonlySet<number>): Set<number> {
  const reached = new Set([start]);
  const queue = [start];
  for (let at = 0; at < queue.length; at++)
    for (const next of beside(grid, queue[at]!))
      if (printed.has(next) && !reached.has(next)) {
        reached.add(next);
        queue.push(next);
      }
  return reached;
}
