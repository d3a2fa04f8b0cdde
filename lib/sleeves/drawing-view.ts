/** Where the paper lies on the screen: millimetres to pixels, for fitting, zooming and dragging. */
import { type Point } from "@/lib/drafting";

/** A pixel is `scale` × mm + the offset. */
export interface View {
  scale: number;
  x: number;
  y: number;
}

export interface Box {
  x: number;
  y: number;
  w: number;
  h: number;
}

export interface Size {
  width: number;
  height: number;
}

/** Room around the drawing for its labels, px. */
export interface Room {
  top: number;
  right: number;
  bottom: number;
  left: number;
}

/** The largest view that shows the whole box in the middle of what the room leaves. */
export function fitView(box: Box, size: Size, room: Room): View {
  const width = Math.max(1, size.width - room.left - room.right);
  const height = Math.max(1, size.height - room.top - room.bottom);
  const scale = Math.min(width / box.w, height / box.h);
  return {
    scale,
    x: room.left + (width - box.w * scale) / 2 - box.x * scale,
    y: room.top + (height - box.h * scale) / 2 - box.y * scale,
  };
}

export function toScreen(view: View, { x, y }: Point): Point {
  return { x: x * view.scale + view.x, y: y * view.scale + view.y };
}

export function toPaper(view: View, { x, y }: Point): Point {
  return { x: (x - view.x) / view.scale, y: (y - view.y) / view.scale };
}

/** Times larger than the view that fits, at the least and the most. */
const LEAST = 0.6;
const MOST = 12;

/** Zoomed by a factor about a point of the screen, which stays where it is. */
export function zoomAt(view: View, at: Point, factor: number, fitted: View): View {
  const scale = Math.min(fitted.scale * MOST, Math.max(fitted.scale * LEAST, view.scale * factor));
  const real = scale / view.scale;
  return { scale, x: at.x - (at.x - view.x) * real, y: at.y - (at.y - view.y) * real };
}

export function panned(view: View, dx: number, dy: number): View {
  return { ...view, x: view.x + dx, y: view.y + dy };
}

/**
 * Two fingers moved: the paper under each stays under it, without turning.
 * @returns the view after, limited as `zoomAt` is.
 */
export function pinched(view: View, before: [Point, Point], after: [Point, Point], fitted: View): View {
  const middle = ([a, b]: [Point, Point]) => ({ x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 });
  const apart = ([a, b]: [Point, Point]) => Math.hypot(b.x - a.x, b.y - a.y);
  const [from, to] = [middle(before), middle(after)];
  const moved = panned(view, to.x - from.x, to.y - from.y);
  return zoomAt(moved, to, apart(after) / Math.max(1, apart(before)), fitted);
}
