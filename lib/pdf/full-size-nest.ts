/** Lays pieces side by side on one great sheet, never turned: each keeps its grain upright. */
import { type Point } from "@/lib/drafting/types";

export interface Size {
  readonly w: number;
  readonly h: number;
}

export interface Nest extends Size {
  /** Upper left corners, in the order of the sizes. */
  readonly places: readonly Point[];
}

interface Shelf {
  x: number;
  h: number;
  readonly items: { readonly index: number; readonly x: number }[];
}

/**
 * Shelves: the first size stands first of all; the others go, the highest first, on the first shelf with room. A size
 * wider than `width` has a shelf to itself and stands out. `gap` is kept between neighbours, and from the edges `edge`.
 */
export function nest(sizes: readonly Size[], width: number, gap: number, edge: number): Nest {
  const order = sizes.map((_, i) => i);
  order.sort((a, b) => (a === 0 ? -1 : b === 0 ? 1 : sizes[b]!.h - sizes[a]!.h || a - b));
  const shelves: Shelf[] = [];
  for (const index of order) {
    const { w, h } = sizes[index]!;
    let shelf = shelves.find(({ x }) => x + w + edge <= width + 1e-9);
    if (!shelf) shelves.push((shelf = { x: edge, h: 0, items: [] }));
    shelf.items.push({ index, x: shelf.x });
    shelf.x += w + gap;
    shelf.h = Math.max(shelf.h, h);
  }
  const places: Point[] = new Array<Point>(sizes.length);
  let y = edge;
  for (const { h, items } of shelves) {
    for (const { index, x } of items) places[index] = { x, y };
    y += h + gap;
  }
  return {
    places,
    w: Math.max(...shelves.map(({ x }) => x)) - gap + edge,
    h: y - gap + edge,
  };
}
