/** Corners of a seam allowance: how the cutting line gets from one edge to the next. */
import { distance } from "@/lib/drafting/measure";
import { leftOf } from "@/lib/drafting/offset";
import { cross, dot, firstHit, type Hit, onward, part, toward } from "@/lib/drafting/ray";
import { type CubicBezier, type Point } from "@/lib/drafting/types";

/** A corner's point lies no further from the stitch line than this many times the wider allowance. Common practice, no source. */
export const CORNER_LIMIT = 2.5;

/** Seams that turn by less than this run on smoothly: two widths meet in a step there, radians. Common practice, no source. */
const SMOOTH = Math.PI / 12;

/** What meets at a corner: the stitch line's direction there, the width outside it and the offset line. */
export interface Arm {
  readonly direction: Point;
  readonly width: number;
  /** Laid on the fold of the cloth: nothing may reach past it. */
  readonly onFold: boolean;
  readonly chain: readonly CubicBezier[];
}

/** The cutting line round a corner: the offset before it, points by straight lines, the offset after it. */
export interface Turn {
  readonly before: readonly CubicBezier[];
  /** These belong to the edge before, those to the edge after. */
  readonly tail: readonly Point[];
  readonly head: readonly Point[];
  readonly after: readonly CubicBezier[];
}

/** Through the corner itself in a hollow: the offsets cross there, and `outerRing` cuts both at the crossing. */
function hollow(corner: Point, e: Arm, f: Arm): Turn {
  return { before: e.chain, tail: [corner], head: [], after: f.chain };
}

/** Offset lines carried on straight till they meet. */
export function mitred(corner: Point, e: Arm, f: Arm): Turn {
  const sin = cross(e.direction, f.direction);
  if (sin < 0) return hollow(corner, e, f);
  const cos = dot(e.direction, f.direction);
  const [end, start] = [e.chain.at(-1)![3], f.chain[0]![0]];
  const room = CORNER_LIMIT * Math.max(e.width, f.width);
  const steep = Math.max(sin, 1e-9);
  /** How far each line is carried on; less than naught where the narrower line meets the wider one beyond its start. */
  const [onE, onF] = [(f.width - e.width * cos) / steep, (e.width - f.width * cos) / steep];
  if (onE >= 0 && onF >= 0) {
    const tip = onward(end, e.direction, onE);
    if (distance(corner, tip) <= room) return { before: e.chain, tail: [tip], head: [], after: f.chain };
    return clipped(corner, e, f, { tip, room });
  }
  const within = (hit: Hit | undefined, carried: Arm) =>
    hit && (carried.onFold || (sin > Math.sin(SMOOTH) && distance(corner, hit.point) <= room))
      ? hit
      : undefined;
  if (onF < 0) {
    const hit = within(firstHit(f.chain, end, e.direction), e);
    if (hit) return { before: e.chain, tail: [hit.point], head: [], after: from(f.chain, hit) };
    const step = onward(corner, leftOf(f.direction), e.width / cos);
    return { before: e.chain, tail: [step], head: [], after: f.chain };
  }
  const hit = within(firstHit(e.chain, start, back(f.direction)), f);
  if (hit) return { before: until(e.chain, hit), tail: [], head: [], after: f.chain };
  const step = onward(corner, leftOf(e.direction), f.width / cos);
  return { before: e.chain, tail: [], head: [step], after: f.chain };
}

/** A tip that is too long cut off square to the line from the corner to it. */
function clipped(
  corner: Point,
  e: Arm,
  f: Arm,
  { tip, room }: { readonly tip: Point; readonly room: number },
): Turn {
  const out = toward(corner, tip);
  const reach = (point: Point) => room - dot(out, { x: point.x - corner.x, y: point.y - corner.y });
  const [end, start] = [e.chain.at(-1)![3], f.chain[0]![0]];
  const one = onward(end, e.direction, reach(end) / dot(out, e.direction));
  const other = onward(start, f.direction, reach(start) / dot(out, f.direction));
  return { before: e.chain, tail: [one, other], head: [], after: f.chain };
}

/**
 * The seam `first` carried on over the other's allowance to its cutting line, and its own allowance cut off square there:
 * folded back along that seam, the end lies in the seam that crosses it. Mitred where the corner is hollow, too flat or on
 * an edge without allowance.
 */
export function squared(corner: Point, e: Arm, f: Arm, first: "before" | "after"): Turn {
  const sin = cross(e.direction, f.direction);
  const cos = dot(e.direction, f.direction);
  const room = CORNER_LIMIT * Math.max(e.width, f.width);
  if (sin <= 1e-9 || e.width === 0 || f.width === 0) return mitred(corner, e, f);
  const [end, start] = [e.chain.at(-1)![3], f.chain[0]![0]];
  const [own, other] = first === "before" ? [e, f] : [f, e];
  const along = first === "before" ? e.direction : back(f.direction);
  const hit = cos > 0 ? firstHit(other.chain, corner, along) : undefined;
  if (cos > 0 && !hit) return mitred(corner, e, f);
  const carried = hit ? hit.distance : other.width / sin;
  if (Math.hypot(carried, own.width) > room) return mitred(corner, e, f);
  const foot = onward(corner, along, carried);
  return first === "before"
    ? {
        before: e.chain,
        tail: [onward(end, along, carried), foot],
        head: [],
        after: hit ? from(f.chain, hit) : f.chain,
      }
    : {
        before: hit ? until(e.chain, hit) : e.chain,
        tail: hit ? [] : [foot],
        head: [onward(start, along, carried)],
        after: f.chain,
      };
}

const back = ({ x, y }: Point): Point => ({ x: -x, y: -y });

function from(chain: readonly CubicBezier[], { index, t }: Hit): CubicBezier[] {
  return [part(chain[index]!, t, 1), ...chain.slice(index + 1)];
}

function until(chain: readonly CubicBezier[], { index, t }: Hit): CubicBezier[] {
  return [...chain.slice(0, index), part(chain[index]!, 0, t)];
}
