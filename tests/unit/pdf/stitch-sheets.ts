/**
 * Puts printed sheets together as a hand does: cross on the cross of the same number, each cut along the line through
 * its crosses. Knows nothing of how they were laid out. Millimetres.
 */
import { Bezier } from "bezier-js";
import { type CubicBezier, type Point } from "@/lib/drafting/types";
import { type ReadPage, type ReadPath } from "@/tests/support/read-pdf";

const MM = 72 / 25.4;
const MARGIN = 10;
/** Of the foot with the sheet's name. */
const FOOT = 6;
const OVERLAP = 10;

export interface Cross extends Point {
  readonly n: number;
}

export interface StitchedSheet {
  readonly name: string;
  readonly page: ReadPage;
  readonly crosses: readonly Cross[];
  /** From its own paper to the stitched field; sheets that hang together in no way have fields of their own. */
  readonly by: Point;
  readonly island: number;
  /** How far any cross misses its partner. */
  readonly miss: number;
}

const isNear = (a: number, b: number, by = 0.01) => Math.abs(a - b) < by;

/** Two lines of 6 mm, level and upright, through one middle, and the figure beside them. */
export function crossesOf(page: ReadPage): Cross[] {
  return page.paths.flatMap(({ steps }): Cross[] => {
    if (steps.map(({ op }) => op).join("") !== "mlml") return [];
    const [a, b, c, d] = steps.map(({ c: [x, y] }) => ({ x: x! / MM, y: y! / MM }));
    if (!isNear(b!.x - a!.x, 6) || !isNear(a!.y, b!.y)) return [];
    if (!isNear(d!.y - c!.y, 6) || !isNear(c!.x, d!.x)) return [];
    const at = { x: (a!.x + b!.x) / 2, y: (c!.y + d!.y) / 2 };
    if (!isNear(at.x, c!.x) || !isNear(at.y, a!.y)) return [];
    const [nearest] = page.texts
      .filter(({ text }) => /^\d+$/.test(text))
      .map(({ text, left, right, baseline, size }) => ({
        n: Number(text),
        off: Math.hypot((left + right) / 2 / MM - at.x, (baseline - size * 0.36) / MM - at.y),
      }))
      .toSorted((one, other) => one.off - other.off);
    if (!nearest || nearest.off > 6) throw new Error("A cross has no number beside it.");
    return [{ ...at, n: nearest.n }];
  });
}

/** The name in the foot of a sheet: its largest words, last on the page. */
export const nameOf = ({ height, texts }: ReadPage): string =>
  texts.find(({ baseline, text }) => baseline > height - (MARGIN + FOOT) * MM && /^[A-Z]+\d+$/.test(text))!
    .text;

export function stitch(pages: readonly ReadPage[]): StitchedSheet[] {
  const read = pages.map((page) => ({ page, name: nameOf(page), crosses: crossesOf(page) }));
  const placed = new Map<number, { by: Point; island: number; miss: number }>();
  let island = 0;
  for (const start of read.keys()) {
    if (placed.has(start)) continue;
    placed.set(start, { by: { x: 0, y: 0 }, island: ++island, miss: 0 });
    const queue = [start];
    for (const index of queue)
      for (const [other, sheet] of read.entries()) {
        const pairs = read[index]!.crosses.flatMap((a) =>
          sheet.crosses.filter(({ n }) => n === a.n).map((b) => [a, b] as const),
        );
        if (other === index || pairs.length === 0) continue;
        const { by } = placed.get(index)!;
        const wanted = pairs.map(([a, b]) => ({ x: a.x - b.x + by.x, y: a.y - b.y + by.y }));
        const there = placed.get(other);
        const at = there?.by ?? wanted[0]!;
        const miss = Math.max(...wanted.map(({ x, y }) => Math.hypot(x - at.x, y - at.y)), there?.miss ?? 0);
        placed.set(other, { by: at, island, miss });
        if (!there) queue.push(other);
      }
  }
  return read.map((sheet, i) => ({ ...sheet, ...placed.get(i)! }));
}

/** What is left of a sheet when it is cut through its crosses, on its own paper. */
function cutSheet({ page, crosses }: StitchedSheet) {
  const edges = {
    left: MARGIN,
    top: MARGIN,
    right: page.width / MM - MARGIN,
    bottom: page.height / MM - MARGIN - FOOT,
  };
  const half = OVERLAP / 2;
  const cut = { ...edges };
  for (const { x, y } of crosses) {
    if (isNear(x, edges.left + half)) cut.left = edges.left + half;
    else if (isNear(x, edges.right - half)) cut.right = edges.right - half;
    else if (isNear(y, edges.top + half)) cut.top = edges.top + half;
    else if (isNear(y, edges.bottom - half)) cut.bottom = edges.bottom - half;
    else throw new Error(`Cross at ${x}, ${y} stands on no side.`);
  }
  return cut;
}

export function curvesOf({ steps }: ReadPath): CubicBezier[] {
  const curves: CubicBezier[] = [];
  let pen: Point = { x: 0, y: 0 };
  for (const { op, c } of steps) {
    const points = [0, 2, 4].slice(0, c.length / 2).map((i) => ({ x: c[i]! / MM, y: c[i + 1]! / MM }));
    if (op === "c") curves.push([pen, points[0]!, points[1]!, points[2]!]);
    if (op !== "h") pen = points.at(-1)!;
  }
  return curves;
}

/** Where something changes its sign over 0 to 1, looked for in 200 steps and then halved. */
function crossings(off: (t: number) => number): number[] {
  const steps = 200;
  return Array.from({ length: steps }, (_, i) => [i / steps, (i + 1) / steps] as [number, number])
    .filter(([from, to]) => off(from) < 0 !== off(to) < 0)
    .map(([from, to]) => {
      let [low, high] = [from, to];
      for (let i = 0; i < 50; i++) {
        const middle = (low + high) / 2;
        if (off(middle) < 0 === off(from) < 0) low = middle;
        else high = middle;
      }
      return (low + high) / 2;
    });
}

/** The curves of some paths on all sheets of an island, cut with the sheets and laid in their places. */
export function cutAndLaid(
  sheets: readonly StitchedSheet[],
  wanted: (path: ReadPath) => boolean,
): CubicBezier[] {
  return sheets.flatMap((sheet) => {
    const { left, right, top, bottom } = cutSheet(sheet);
    return sheet.page.paths
      .filter(wanted)
      .flatMap(curvesOf)
      .flatMap((curve): CubicBezier[] => {
        const whole = new Bezier(...curve);
        const cuts = [
          ...crossings((t) => whole.get(t).x - left),
          ...crossings((t) => whole.get(t).x - right),
          ...crossings((t) => whole.get(t).y - top),
          ...crossings((t) => whole.get(t).y - bottom),
        ];
        const marks = [0, ...cuts.sort((a, b) => a - b), 1];
        return marks.slice(1).flatMap((to, i) => {
          if (to - marks[i]! < 1e-7) return [];
          const middle = whole.get((marks[i]! + to) / 2);
          if (middle.x < left || middle.x > right || middle.y < top || middle.y > bottom) return [];
          const laid = whole
            .split(marks[i]!, to)
            .points.map(({ x, y }) => ({ x: x + sheet.by.x, y: y + sheet.by.y }));
          return [[laid[0]!, laid[1]!, laid[2]!, laid[3]!] as const];
        });
      });
  });
}

const apart = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y);

/** Closed loops out of curves lying end to end, in any order. @throws where one does not close. */
export function loopsOf(curves: readonly CubicBezier[], slack: number): CubicBezier[][] {
  const left = [...curves];
  const loops: CubicBezier[][] = [];
  while (left.length > 0) {
    const loop = [left.shift()!];
    while (apart(loop.at(-1)![3], loop[0]![0]) > slack || loop.length === 1) {
      const end = loop.at(-1)![3];
      const next = left.findIndex(([start]) => apart(start, end) < slack);
      if (next < 0) throw new Error(`The line ends at ${end.x}, ${end.y} and goes on nowhere.`);
      loop.push(...left.splice(next, 1));
    }
    loops.push(loop);
  }
  return loops;
}

/** A loop cut at its corners: seams, each smooth in itself. */
export function seamsOf(loop: readonly CubicBezier[], corner = 0.3): CubicBezier[][] {
  const turn = (before: CubicBezier, after: CubicBezier) => {
    const a = new Bezier(...before).derivative(1);
    const b = new Bezier(...after).derivative(0);
    return Math.abs(Math.atan2(a.x * b.y - a.y * b.x, a.x * b.x + a.y * b.y));
  };
  const starts = [...loop.keys()].filter((i) => turn(loop.at(i - 1)!, loop[i]!) > corner);
  return starts.map((start, i) => {
    const end = starts[(i + 1) % starts.length]!;
    return end > start ? loop.slice(start, end) : [...loop.slice(start), ...loop.slice(0, end)];
  });
}
