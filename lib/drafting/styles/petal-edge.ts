/** The free edge of a petal: from its head past the crown, over the centre line, and square to its own underarm seam. */
import { bowCurve, tightestBend } from "@/lib/drafting/fair";
import { INCH } from "@/lib/drafting/guide";
import { chainLength, distance, pointAt } from "@/lib/drafting/measure";
import { edgeOf, endOf, startOf } from "@/lib/drafting/outline";
import { type StyleResult } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { impossible } from "@/lib/drafting/styles/context";
import { type CubicBezier, type Piece, type Point, type Side } from "@/lib/drafting/types";

/** Further than this from upright, no edge meets the underarm seam square and runs on fairly, radians. */
const MOST_LEAN = Math.PI / 6;
/** The free edge leaves the head at no sharper or blunter an angle, radians. */
const CORNER = Math.PI / 7;
/** Of the room between too straight an edge and too square a one, the crossing keeps this share from either. */
const MARGIN = 0.15;
/** A tighter bend than this share of the biceps line is a corner, and takes no narrow hem: 1 in at 12 in. Common practice, no source. */
const TIGHTEST = 1 / 12;
/** A crossing read off a message in eighths of an inch is taken, though it was rounded. */
const SLACK = INCH / 16;

export interface Marks {
  /** Edges "head", "underarmBack", "foot", "underarmFront". */
  readonly sleeve: Piece;
  /** Along the head. */
  readonly crown: number;
  readonly overlap: number;
  /** Below the crown, on the centre line. */
  readonly crossing: number;
}

interface EdgeGround {
  /** The end of the petal's head, past the crown, and how the head runs on there, away from the crown. */
  readonly start: Point;
  readonly onward: Point;
  /** The lower end of its own underarm seam. */
  readonly end: Point;
  /** Square to that seam, away from the centre: front and back then run on into each other. */
  readonly arriving: Point;
  /** Depth on the centre line of the straight line from start to end, and of the one that meets the seam square. */
  readonly straight: number;
  readonly square: number;
}

function edgeGround({ sleeve, crown, overlap }: Omit<Marks, "crossing">, side: Side): EdgeGround {
  const way = side === "front" ? 1 : -1;
  const { point: start, direction } = pointAt(edgeOf(sleeve, "head").curves, crown + way * overlap);
  const foot = edgeOf(sleeve, "foot").curves;
  const end = side === "front" ? endOf(foot) : startOf(foot);
  const seam = edgeOf(sleeve, side === "front" ? "underarmFront" : "underarmBack").curves;
  const run = pointAt(seam, side === "front" ? 0 : chainLength(seam)).direction;
  const arriving = { x: run.y, y: -run.x };
  const at = (dx: number, dy: number) => end.y - (end.x * dy) / dx;
  return {
    start,
    onward: { x: way * direction.x, y: way * direction.y },
    end,
    arriving,
    straight: at(end.x - start.x, end.y - start.y),
    square: at(arriving.x, arriving.y),
  };
}

/** How far below the crown the underarm seam should end, so that an edge which meets it square is still a bow. */
export function underarmNeeded(marks: Omit<Marks, "crossing">): number {
  const ends = (["front", "back"] as const).map((side) => {
    const { start, end, arriving } = edgeGround(marks, side);
    return start.y + 1.5 * (arriving.y / Math.abs(arriving.x)) * Math.abs(start.x - end.x);
  });
  return Math.max(...ends);
}

/** The crossings that give both petals a fair edge, shallowest and deepest. */
export function crossings(marks: Omit<Marks, "crossing">): { readonly least: number; readonly most: number } {
  const sides = (["front", "back"] as const).map((side) => {
    const { straight, square } = edgeGround(marks, side);
    return [straight + MARGIN * (square - straight), square - MARGIN * (square - straight)] as const;
  });
  return { least: Math.max(...sides.map(([low]) => low)), most: Math.min(...sides.map(([, high]) => high)) };
}

export function outOfReach(marks: Marks): StyleResult | undefined {
  const { overlap, crossing } = marks;
  const grounds = (["front", "back"] as const).map((side) => edgeGround(marks, side));
  if (grounds.some(({ arriving }) => Math.abs(Math.atan2(arriving.y, Math.abs(arriving.x))) > MOST_LEAN))
    return impossible(
      "hem",
      "underarm-leans",
      say`The underarm seams lean so far that no petal can meet them square.`,
      say`Bring the hem nearer to the width of the biceps line.`,
    );
  const { least, most } = crossings(marks);
  if (least > most)
    return impossible(
      "overlap",
      "petals-too-long",
      say`Each petal runs ${overlap} past the crown, which leaves no room for its edge to turn down to the underarm.`,
      say`Let them run less far past the crown, or make the underarm longer.`,
    );
  if (crossing < least - SLACK || crossing > most + SLACK)
    return impossible(
      "crossing",
      "no-fair-edge",
      crossing < least
        ? say`Crossing ${crossing} below the crown, the petals would have hollow edges.`
        : say`Crossing ${crossing} below the crown, the petals would turn a corner there.`,
      say`Let them cross between ${least} and ${most} below the crown.`,
    );
  const corners = (["front", "back"] as const).map((side) => corner(marks, side));
  if (corners.some((angle) => angle < CORNER || angle > Math.PI - CORNER))
    return impossible(
      "crossing",
      "no-corner",
      say`Crossing ${crossing} below the crown, the edge of a petal leaves its head at no clear corner.`,
      say`Let them cross nearer to ${(least + most) / 2} below the crown, or run less far past the crown.`,
    );
  const head = edgeOf(marks.sleeve, "head").curves;
  const biceps = distance(startOf(head), endOf(head));
  const bends = (["front", "back"] as const).map((side) => tightestBend(freeEdge(marks, side)));
  if (Math.min(...bends) < TIGHTEST * biceps)
    return impossible(
      "crossing",
      "edge-corner",
      say`Crossing ${crossing} below the crown, the edge of a petal would turn a corner.`,
      say`Let them cross nearer to ${(least + most) / 2} below the crown, run further past it, or make the underarm longer.`,
    );
  return undefined;
}

/** How far the outline turns where the head ends and the free edge begins. */
function corner(marks: Marks, side: Side): number {
  const { onward } = edgeGround(marks, side);
  const [[a, b]] = freeEdge(marks, side) as [CubicBezier];
  const run = { x: b.x - a.x, y: b.y - a.y };
  const way = side === "front" ? 1 : -1;
  return Math.atan2(way * (onward.x * run.y - onward.y * run.x), onward.x * run.x + onward.y * run.y);
}

/** From the end of the head, over the centre line and round to the petal's own underarm seam. */
export function freeEdge(marks: Marks, side: Side): CubicBezier[] {
  const { start, end, arriving } = edgeGround(marks, side);
  return bowCurve([start, { x: 0, y: marks.crossing }, end], undefined, arriving);
}
