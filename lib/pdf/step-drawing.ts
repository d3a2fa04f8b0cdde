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
export function drawStep(
  { viewBox, lines, points }: StepDrawing,
  width: number,
  height: number,
  set: Typesetter,
): Block {
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
    items: [...drawn, ...placed.map(dot), ...labels(placed, drawn, bounds, set)],
  };
}

function pathOf(d: StepDrawing["lines"][number]["d"], at: (point: Point) => Point): PathStep[] {
  const steps: PathStep[] = [];
  let pen: Point | undefined;
  for (const piece of d) {
    const [start, ...rest] = piece.map(at);
    if (!start) continue;
    if (!pen || Math.hypot(pen.x - start.x, pen.y - start.y) > 0.01)
      steps.push({ op: "m", c: [start.x, start.y] });
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

/** Points along the drawn lines, close enough together that no letter slips between them. */
function inkOf(lines: readonly Item[]): Point[] {
  const ink: Point[] = [];
  for (const item of lines) {
    if (item.kind !== "path") continue;
    let pen: Point = { x: 0, y: 0 };
    for (const { op, c } of item.steps) {
      const through = [pen];
      for (let i = 0; i < c.length; i += 2) through.push({ x: c[i]!, y: c[i + 1]! });
      const end = through.at(-1)!;
      if (op !== "m") {
        const reach = through
          .slice(1)
          .reduce((sum, p, i) => sum + Math.hypot(p.x - through[i]!.x, p.y - through[i]!.y), 0);
        const count = Math.ceil(reach / 2);
        for (let i = 0; i <= count; i++) ink.push(between(through, i / Math.max(count, 1)));
      }
      pen = end;
    }
  }
  return ink;
}

/** The point of a Bézier of any degree, by de Casteljau. */
function between(points: readonly Point[], t: number): Point {
  if (points.length === 1) return points[0]!;
  const next = points.slice(1).map((p, i) => ({
    x: points[i]!.x + (p.x - points[i]!.x) * t,
    y: points[i]!.y + (p.y - points[i]!.y) * t,
  }));
  return between(next, t);
}

const inside = ({ x, y }: Point, box: Box): boolean =>
  x >= box.x && x <= box.x + box.width && y >= box.y && y <= box.y + box.height;

/**
 * New points are named first. Each name stands where the fewest lines run through it; one that would lie on
 * another name is left out.
 */
function labels(
  points: readonly DrawingPoint[],
  drawn: readonly Item[],
  bounds: Box,
  set: Typesetter,
): Item[] {
  const middle = bounds.x + bounds.width / 2;
  const ink = [...inkOf(drawn), ...points];
  const taken: Box[] = [];
  return points
    .filter(({ label }) => label)
    .toSorted((a, b) => Number(b.new ?? false) - Number(a.new ?? false))
    .flatMap(({ x, y, label = "", new: isNew }) => {
      const style = isNew ? NEW_LABEL : OLD_LABEL;
      const width = set.width(label, style);
      const height = style.size * 0.7;
      const away = isNew ? 3.6 : 2.4;
      const outward = x >= middle ? 1 : -1;
      const spot = (across: number, down: number): Box => ({
        x: x + across * (away + width / 2) - width / 2,
        y: y + down * (away + height / 2) - height / 2,
        width,
        height,
      });
      const hits = (box: Box) => ink.filter((dot) => inside(dot, box)).length;
      const [best] = [outward, -outward]
        .flatMap((side) => [spot(side, 0), spot(side, -0.8), spot(side, 0.8)])
        .concat(spot(0, -1), spot(0, 1))
        .filter(
          (box) =>
            inside(box, bounds) &&
            inside({ x: box.x + width, y: box.y + height }, bounds) &&
            !taken.some((other) => meet(box, other)),
        )
        .map((box) => ({ box, hits: hits(box) }))
        .toSorted((a, b) => a.hits - b.hits);
      if (!best) return [];
      taken.push(best.box);
      const [line] = set.lines(label, style, { x: best.box.x, width: width + 1 });
      // A line keeps room for accents: its foot goes on the spot's lower edge.
      return (line?.items ?? []).map((item) =>
        item.kind === "path" ? item : { ...item, y: best.box.y + height },
      );
    });
}
