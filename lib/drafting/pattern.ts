/** A style's pieces: what is cut, what is drawn on them, and how their edges meet. Lengths mm, angles radians. */
import { type Check } from "@/lib/drafting/checks";
import { type Outline } from "@/lib/drafting/outline";
import { type WalkedSeam } from "@/lib/drafting/seams";
import { type CubicBezier, type FigureName, type Phrase, type Piece, type Point } from "@/lib/drafting/types";

/** Drawn inside a piece: where it is folded, laid on another, stitched, or only guided by. */
export interface PatternLine {
  readonly kind: "fold" | "placement" | "stitch" | "guide";
  readonly words: string;
  readonly curves: readonly CubicBezier[];
}

/** How a corner of the allowance ends: edges carried on till they meet, or cut square to the seam that is sewn first. */
export type Corner = "mitred" | "squared";

export interface PatternPiece extends Piece {
  /** Unique in its style: "upper", "cuff". */
  readonly id: string;
  readonly cut: { readonly count: number; readonly mirrored: boolean };
  /** The edge laid on the fold of the cloth: no allowance there. */
  readonly onFold?: string;
  readonly lines: readonly PatternLine[];
  /** Width of the allowance outside each edge, mm; an edge that is not named has the style's own. */
  readonly allowances: Readonly<Record<string, number>>;
  /** Panels as they lie after a spread, each moved rigidly, for the drawing and the walk of the bridges. */
  readonly panels: readonly Outline[];
}

/** What is gathered: a stretch between two notches, or a whole edge. */
export interface Gather {
  readonly id: string;
  readonly piece: string;
  readonly edge: string;
  /** "the head, from notch to notch" */
  readonly words: string;
  /** mm along the edge before gathering, and pulled up. */
  readonly full: number;
  readonly pulledTo: number;
}

export type Cloth = "fine" | "medium" | "heavy";

/**
 * What is done at a step, for whoever rebuilds the draft from the sheet; the distance stands in the step. Slashes are
 * counted from 0 at the front, and are set out alike on both sides where a step names two.
 */
export type StyleAct =
  /** Down the centre line from the crown, then square across to both sides: the pieces above and below part there. */
  | { readonly act: "across" }
  /** Underarm seams straight from the underarm points to the level of the foot, and out no less than it was. */
  | { readonly act: "straight-sides" }
  /** Along the cap seam from the crown to the head of these slashes; of the lower part, from the middle of its top. */
  | { readonly act: "slash-head"; readonly slashes: readonly number[]; readonly part?: "lower" }
  /** Along the foot of the piece from its centre to the foot of these slashes. */
  | { readonly act: "slash-foot"; readonly slashes: readonly number[]; readonly part?: "lower" }
  /** Every slash opened by so much at that end. */
  | {
      readonly act: "open";
      readonly end: "head" | "foot";
      readonly slashes: readonly number[];
      readonly part?: "lower";
    }
  /** Marks set up or down the sheet from points of it. */
  | { readonly act: "set"; readonly from: readonly MarkPoint[]; readonly way: "up" | "down" }
  /** A fair curve through points, and the marks set from them: from notch to notch, or from end to end of the foot. */
  | {
      readonly act: "curve";
      readonly edge: "head" | "foot" | "petalFront" | "petalBack";
      readonly through: readonly MarkPoint[];
      readonly part?: "lower";
    }
  /** Along the cap seam from the crown, or from both underarm points: a mark on the front and one on the back. */
  | { readonly act: "seam-marks"; readonly from: "crown" | "underarm" }
  /** Down the centre line from the crown: a mark. */
  | { readonly act: "centre-mark" }
  /** The tape along a curve just drawn. */
  | { readonly act: "check"; readonly edge: "head" | "foot"; readonly part?: "lower" }
  /** A rectangle to cut, length and depth in this order. */
  | { readonly act: "strip"; readonly piece: string }
  /**
   * Part of a ring. "inner": an arc about a point, its radius. "outer": an arc about the same point, so far outside the
   * first. "end": so far along the inner arc from the straight end; there the other end, in line with the point.
   */
  | { readonly act: "ring"; readonly piece: string; readonly part: "inner" | "outer" | "end" }
  /** Outside an edge, an allowance of its own. */
  | { readonly act: "allow"; readonly edge: string }
  /** Anything that the hand does without measuring, and the work at the machine. */
  | { readonly act: "work" };

/**
 * A point that a step starts from: the middle of a panel's head or foot, taken along the seam and counted from 0 at the
 * front, or a named point. Over an opened slash on the centre line, crown and centre are midway between its two edges.
 */
export type MarkPoint =
  | { readonly panel: number; readonly end: "head" | "foot" }
  | {
      readonly named:
        | "crown"
        | "notchFront"
        | "notchBack"
        | "footCentre"
        | "footFront"
        | "footBack"
        /** Ends of the upper edge of a lower part. */
        | "topFront"
        | "topBack"
        /** What "seam-marks" and "centre-mark" set. */
        | "seamFront"
        | "seamBack"
        | "centre";
    };

export type StepStage = "draw" | "cut" | "sew";

/** One step of a style, after those of the block. */
export interface StyleStep {
  readonly stage: StepStage;
  readonly phrase: Phrase;
  /** mm; the one distance of the step. */
  readonly distance?: number;
  readonly act: StyleAct;
  readonly scene: StepScene;
}

/** What a step adds to its drawing. `sheet` counts the papers: a fresh one begins with nothing on it. */
export interface StepScene {
  readonly sheet: number;
  readonly fresh: readonly SceneLine[];
  readonly measured: readonly { readonly from: Point; readonly to: Point }[];
  readonly points: readonly (Point & { readonly words: string })[];
}

export interface SceneLine {
  readonly weight: "cut" | "guide";
  readonly curves: readonly CubicBezier[];
}

/** A figure of a style that makes it impossible, and what would do. */
export interface StyleProblem {
  readonly id: string;
  /** A figure of the style by its key, or one of the block. */
  readonly figure: string | FigureName;
  readonly phrase: Phrase;
  readonly remedy: Phrase;
}

export type StyleCheck = Omit<Check, "figure"> & { readonly figure: string };

/** What a recipe makes of the block. */
export interface StyleParts {
  readonly pieces: readonly PatternPiece[];
  readonly seams: readonly WalkedSeam[];
  readonly gathers: readonly Gather[];
  readonly checks: readonly StyleCheck[];
  readonly steps: readonly StyleStep[];
}

export type StyleResult =
  | { readonly ok: true; readonly value: StyleParts }
  | { readonly ok: false; readonly problems: readonly StyleProblem[] };
