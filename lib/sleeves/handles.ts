/** The handles of the drawing: dragging one changes a figure, rounded to the step. */
import { type Point, type SleeveDraft, type SleeveFigures } from "@/lib/drafting";
import { formatLength } from "@/lib/lengths/format-length";
import { parseLength } from "@/lib/lengths/parse-length";
import { stepOf } from "@/lib/lengths/units";
import { type Fineness, type Unit } from "@/lib/records/types";
import { toScreen, type View } from "@/lib/sleeves/drawing-view";

export type HandleName = "capDepth" | "biceps" | "hem" | "length";

export const handleNames: readonly HandleName[] = ["capDepth", "biceps", "hem", "length"];

/** Where a handle sits on the paper. */
export function handlePoint(name: HandleName, { points }: SleeveDraft): Point {
  switch (name) {
    case "capDepth":
      return points.crown!;
    case "biceps":
      return points.underarmBack!;
    case "hem":
      return points.hemBack!;
    case "length":
      return points.hemCentre!;
  }
}

/** The handle meant by a finger at a place of the screen: on a short sleeve their rooms overlap. */
export function nearestHandle(at: Point, draft: SleeveDraft, view: View): HandleName {
  const away = (name: HandleName) => {
    const { x, y } = toScreen(view, handlePoint(name, draft));
    return Math.hypot(x - at.x, y - at.y);
  };
  return handleNames.reduce((best, name) => (away(name) < away(best) ? name : best));
}

/**
 * The figure after its handle was dragged by so much, mm, to the nearest step and never below one step.
 * A width grows by twice what its one end moves; the cap grows as its crown goes up.
 */
export function draggedFigure(
  name: HandleName,
  figures: SleeveFigures,
  by: Point,
  unit: Unit,
  fineness: Fineness,
): number {
  const step = stepOf(unit, fineness);
  const wanted = {
    capDepth: figures.capDepth - by.y,
    biceps: figures.biceps + 2 * by.x,
    hem: figures.hem + 2 * by.x,
    length: figures.length + by.y,
  }[name];
  return Math.max(step, Math.round(wanted / step) * step);
}

/**
 * What is typed, one step more or less: on to the next step of the tape from a figure between two. A field that is
 * empty or cannot be read starts at `from`, where there is one.
 */
export function steppedText(
  typed: string,
  way: 1 | -1,
  unit: Unit,
  fineness: Fineness,
  from?: number,
): string | null {
  const step = stepOf(unit, fineness);
  const read = parseLength(typed, unit);
  const mm = read.ok ? read.mm : from;
  if (mm === undefined) return null;
  const at = mm / step;
  const near = Math.round(at);
  const on = Math.abs(at - near) < 1e-6 ? near + way : way > 0 ? Math.ceil(at) : Math.floor(at);
  return formatLength(Math.max(0, on) * step, unit, fineness).figure;
}

/** The same whole inches with another eighth, for the row of eighths; a field that cannot be read starts at 0. */
export function withEighth(typed: string, eighth: number): string {
  const read = parseLength(typed, "in");
  const whole = read.ok ? Math.floor(read.mm / 25.4 + 1e-9) : 0;
  return formatLength((whole + eighth / 8) * 25.4, "in", 8).figure;
}
