/** The guide line of one half, the marks on it, and the hand practice they start from. */
import { distance, lerp } from "@/lib/drafting/measure";
import { type GuideMark, type Point, type Side, type SleeveFigures } from "@/lib/drafting/types";

export const INCH = 25.4;

/** The child's sleeve that the hand practice is given for: B 12 in, C 6 1/4 in. Common practice, no source. */
const PRACTICE = { biceps: 12 * INCH, capDepth: 6.25 * INCH };

const SHARES = [0.25, 0.55, 0.8] as const;
const OUT: Record<Side, readonly [number, number, number]> = {
  front: [-INCH / 2, INCH / 2, (INCH * 3) / 4],
  // Hollowed less than the front and raised a little sooner, so that the two halves measure nearly alike.
  back: [(-INCH * 3) / 8, (INCH * 5) / 8, (INCH * 3) / 4],
};

/**
 * Guide marks of hand practice: from the underarm up 1/2 in hollow, 1/2 in raise, 3/4 in raise at B = 12 in, scaled with B.
 * On a cap flatter than the practice's they shrink with its depth instead, or the top mark would rise over the crown.
 * Common practice, no source; the shares of the guide line are ours, set so that half the cap comes near 9 1/4 in.
 */
export function defaultMarks(biceps: number, capDepth?: number): Record<Side, GuideMark[]> {
  const wide = biceps / PRACTICE.biceps;
  const scale = capDepth === undefined ? wide : Math.min(wide, capDepth / PRACTICE.capDepth);
  const marks = (side: Side) => SHARES.map((share, i): GuideMark => ({ share, out: OUT[side][i]! * scale }));
  return { front: marks("front"), back: marks("back") };
}

/** How far beside the crown the guide lines start: 1/4 in at B = 12 in. Common practice, no source. */
export function defaultBeside(biceps: number): number {
  return biceps / 48;
}

/** Underarm point to notch along the cap seam: 3 in at B = 12 in, past the turn of the hollow. Common practice, no source. */
export function defaultNotches(biceps: number): Record<Side, number> {
  return { front: biceps / 4, back: biceps / 4 };
}

/** -1 towards the front, +1 towards the back. */
export function across(side: Side): 1 | -1 {
  return side === "front" ? -1 : 1;
}

export interface GuideLine {
  readonly underarm: Point;
  readonly top: Point;
  readonly length: number;
  /** Where the marks stand on the line, before they are set out or in. */
  readonly feet: readonly Point[];
  readonly marks: readonly Point[];
}

type GuideFigures = Pick<SleeveFigures, "capDepth" | "biceps" | "beside" | "front" | "back">;

export function guideLine(figures: GuideFigures, side: Side): GuideLine {
  const s = across(side);
  const underarm = { x: (s * figures.biceps) / 2, y: figures.capDepth };
  const top = { x: s * figures.beside, y: 0 };
  const length = distance(underarm, top);
  const up = { x: (top.x - underarm.x) / length, y: (top.y - underarm.y) / length };
  const raised = { x: -s * up.y, y: s * up.x };
  const feet = figures[side].map((mark) => lerp(underarm, top, mark.share));
  const marks = figures[side].map(({ out }, i) => ({
    x: feet[i]!.x + raised.x * out,
    y: feet[i]!.y + raised.y * out,
  }));
  return { underarm, top, length, feet, marks };
}

/** The points one half of the cap seam runs through, from the underarm up, in the frame of `cap-seam`. */
export function halfKnots(figures: GuideFigures, side: Side): Point[] {
  const s = across(side);
  const crown = { x: 0, y: 0 };
  const { underarm, marks } = guideLine(figures, side);
  return [underarm, ...marks, crown].map(({ x, y }) => ({
    x: figures.biceps / 2 - s * x,
    y: figures.capDepth - y,
  }));
}
