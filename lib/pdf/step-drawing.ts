/** The small drawing beside a step, in true curves. */
import { BLACK, type Block, type Colour, type Item, type PathStep } from "@/lib/pdf/blocks";
import { type DrawingPoint, type LineWeight, type StepDrawing } from "@/lib/pdf/marks-document";
import { CHALK } from "@/lib/pdf/signs";
import { type TextStyle, type Typesetter } from "@/lib/pdf/typesetter";
import { type Point } from "@/lib/drafting/types";

const strokes: Record<LineWeight, { width: number; colour: Colour; dash?: readonly number[] }> = {
  guide: { width: 0.5, colour: CHALK },
  thin: { width: 0.5, colour: BLACK },
  stitch: { width: 0.6, colour: BLACK, dash: [3, 2] },
  cut: { width: 1.1, colour: BLACK },
  new: { width: 2, colour: BLACK },
};
const backToFront: readonly LineWeight[] = ["guide", "thin", "stitch", "cut", "new"];

/** Room around the drawing for a label at its edge. */
const FRAME = 10;
const OLD_LABEL: TextStyle = { size: 7.5 };
const NEW_LABEL: TextStyle = { size: 9, bold: true };
/** Handles of a quarter circle, of its radius. */
const QUARTER = 0.5523;

/** As large as fits into `width` by `height`, upright, in the middle of `width`. */
export function drawStep({ viewBox, lines, points }: StepDrawing, width: number, height: number, set: Typesetter): Block {
  const scale = Math.min((width - 2 * FRAME) / viewBox.w, (height - 2 * FRAME) / viewBox.h);
  const left = (width - viewBox.w * scale) / 2;
  const at = ({ x, y }: Point): Point => ({
    x: left + (x - viewBox.x) * scale,
    y: FRAME + (y - viewBox.y) * scale,
  });
  const drawn = lines
    .filter(({ d }) => d.length > 0)
    .toSorted((a, b) => backToFront.indexOf(a.weight) - backToFront.indexOf(b.weight))
    .map(({ d, weight }): Item => ({ kind: "path", steps: pathOf(d, at), stroke: strokes[weight] }));
  const placed = points.map((point) => ({ ...point, ...at(point) }));
  const bounds = { x: 0, y: 0, width, height: viewBox.h * scale + 2 * FRAME };
  return {
    height: bounds.height,
    items: [...drawn, ...placed.map(dot), ...labels(placed, bounds, set)],
  };
}

function pathOf(d: StepDrawing["lines"][number]["d"], at: (point: Point) => Point): PathStep[] {
  const steps: PathStep[] = [];
  let pen: Point | undefined;
  for (const piece of d) {
    const [start, ...rest] = piece.map(at);
    if (!start) continue;
    if (!pen || Math.hypot(pen.x - start.x, pen.y - start.y) > 0.01) steps.push({ op: "m", c: [start.x, start.y] });
    steps.push({ op: rest.length === 3 ? "c" : "l", c: rest.flatMap(({ x, y }) => [x, y]) });
    pen = rest.at(-1);
  }
  return steps;
}

function dot({ x, y, new: isNew }: DrawingPoint): Item {
  const r = isNew ? 2.4 : 1.2;
  const k = r * QUARTER;
  const steps: PathStep[] = [
    { op: "m", c: [x + r, y] },
    { op: "c", c: [x + r, y + k, x + k, y + r, x, y + r] },
    { op: "c", c: [x - k, y + r, x - r, y + k, x - r, y] },
    { op: "c", c: [x - r, y - k, x - k, y - r, x, y - r] },
    { op: "c", c: [x + k, y - r, x + r, y - k, x + r, y] },
    { op: "h", c: [] },
  ];
  return { kind: "path", steps, fill: BLACK };
}

interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

const meet = (a: Box, b: Box): boolean =>
  a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;

/** New points are named first; a name that would lie on another is left out. */
function labels(points: readonly DrawingPoint[], bounds: Box, set: Typesetter): Item[] {
  const middle = bounds.x + bounds.width / 2;
  const taken: Box[] = [];
  return points
    .filter(({ label }) => label)
    .toSorted((a, b) => Number(b.new ?? false) - Number(a.new ?? false))
    .flatMap(({ x, y, label = "", new: isNew }) => {
      const style = isNew ? NEW_LABEL : OLD_LABEL;
      const width = set.width(label, style);
      const height = style.size * 0.8;
      const away = isNew ? 4 : 2.5;
      const rightFirst = x >= middle;
      const right = { x: x + away, y: y - height / 2 };
      const leftOf = { x: x - away - width, y: y - height / 2 };
      const spots = [
        ...(rightFirst ? [right, leftOf] : [leftOf, right]),
        { x: x - width / 2, y: y - away - height },
        { x: x - width / 2, y: y + away },
      ].map((spot) => ({ ...spot, width, height }));
      const free = spots.find(
        (spot) =>
          spot.x >= bounds.x &&
          spot.x + width <= bounds.x + bounds.width &&
          spot.y >= bounds.y &&
          spot.y + height <= bounds.y + bounds.height &&
          !taken.some((other) => meet(spot, other)),
      );
      if (!free) return [];
      taken.push(free);
      const [line] = set.lines(label, style, { x: free.x, width: width + 1 });
      // The line's own room is larger than its letters: put the letters' feet on the spot's lower edge.
      return (line?.items ?? []).map((item) => (item.kind === "path" ? item : { ...item, y: free.y + height }));
    });
}
