/**
 * The shapes the drafting engine works in. Lengths are millimetres, angles radians. x runs across the sleeve
 * (front negative, back positive), y runs down from the crown.
 */

export interface Point {
  readonly x: number;
  readonly y: number;
}

/** Start, two handles, end. A straight line is a cubic with its handles at the thirds. */
export type CubicBezier = readonly [Point, Point, Point, Point];

export type Side = "front" | "back";

export type EdgeName = "capFront" | "capBack" | "underarmFront" | "underarmBack" | "hem";

/** One side of a piece: a chain of curves, each starting where the one before ends. */
export interface Edge {
  /** Unique in its piece; those of the basic sleeve are `EdgeName`. */
  readonly name: string;
  readonly curves: readonly CubicBezier[];
}

/** `at` is the arc length from the start of the edge; one notch marks the front, two the back. */
export interface Notch {
  readonly edge: string;
  readonly at: number;
  readonly count: 1 | 2;
  /** Meets the notch of the same id on the partner's edge. */
  readonly id?: string;
}

/** A closed outline: the edges in order, clockwise as seen on the paper, each starting where the last ends. */
export interface Piece {
  readonly name: string;
  readonly edges: readonly Edge[];
  readonly notches: readonly Notch[];
  readonly grain: { readonly from: Point; readonly to: Point };
}

/**
 * A mark the cap seam runs through. `share` is how far up the guide line it stands, from 0 at the underarm point
 * to 1 at the top; `out` is how far it is raised (+) or hollowed (-), square to the guide line.
 */
export interface GuideMark {
  readonly share: number;
  readonly out: number;
}

/** Everything a basic sleeve is drawn from. */
export interface SleeveFigures {
  readonly length: number;
  readonly capDepth: number;
  readonly biceps: number;
  readonly hem: number;
  /** Depth is taken from the crown. */
  readonly elbow?: { readonly depth: number; readonly width: number };
  /** How far beside the crown, on the level line through it, the guide lines start. */
  readonly beside: number;
  /** From the underarm up. */
  readonly front: readonly GuideMark[];
  readonly back: readonly GuideMark[];
  /** Along the cap seam, from the underarm point to the notch. */
  readonly notches: Readonly<Record<Side, number>>;
}

/** A message for a person: words, and lengths that the app shows in the workshop's unit. */
export type Phrase = readonly (string | { readonly mm: number })[];

/** What a problem or a check is about, so that it can stand beside the field. */
export type FigureName =
  | "length"
  | "capDepth"
  | "biceps"
  | "hem"
  | "elbowDepth"
  | "elbowWidth"
  | "beside"
  | "frontMarks"
  | "backMarks"
  | "notches"
  | "armholeFront"
  | "armholeBack"
  | "armhole"
  | "headEase"
  | "upperArm"
  | "elbowGirth"
  | "wrist"
  | "hand";

/** Why a sleeve cannot be drawn, and what would do. */
export interface DraftProblem {
  readonly id: string;
  readonly figure: FigureName;
  /** The guide mark at fault, counted from 0 at the underarm. */
  readonly mark?: { readonly side: Side; readonly index: number };
  readonly phrase: Phrase;
  readonly remedy: Phrase;
}

/** What the form gives. Body measurements are optional: each brings its own check. */
export interface SleeveAsk {
  readonly length: number;
  readonly biceps: number;
  readonly hem: number;
  /** Absent: found from the armhole and the ease. */
  readonly capDepth?: number;
  readonly armhole?: Readonly<Record<Side, number>>;
  /** How much longer the cap seam is than the armhole. Absent: `usualHeadEase`. */
  readonly headEase?: number;
  readonly cloth?: "woven" | "knit";
  /** The sleeve opens at the hem, so that the hand need not pass through it closed. */
  readonly opening?: boolean;
  readonly elbowDepth?: number;
  readonly elbowWidth?: number;
  readonly beside?: number;
  readonly notches?: Readonly<Record<Side, number>>;
  readonly frontMarks?: readonly GuideMark[];
  readonly backMarks?: readonly GuideMark[];
  readonly upperArm?: number;
  readonly elbowGirth?: number;
  readonly wrist?: number;
  readonly hand?: number;
}

export type Result<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problems: readonly DraftProblem[] };
