/** What a pattern at full size says: pieces in millimetres, y down, and words in the workshop's own unit. */
import { type CubicBezier, type Point } from "@/lib/drafting/types";
import { type FullSizePaper } from "@/lib/pdf/papers";

export type Chain = readonly CubicBezier[];

/** A short straight mark, from its start to its end. */
export type Stroke = readonly [from: Point, to: Point];

export interface FullSizeLine {
  readonly kind: "fold" | "placement" | "stitch" | "guide";
  /** "" for a line that needs no name. */
  readonly words: string;
  readonly curves: Chain;
}

export interface FullSizePiece {
  /** Unique in its document. */
  readonly id: string;
  readonly name: string;
  /** "Cut 2, mirrored": a piece cut more than once is drawn once. */
  readonly cutWords: string;
  /** Sewn along: closed outlines, or open chains. */
  readonly stitch: readonly Chain[];
  /** Cut along, where the allowances are drawn: closed outlines outside the stitch lines. */
  readonly cutting?: readonly Chain[];
  readonly notches: readonly Stroke[];
  readonly grain: { readonly from: Point; readonly to: Point };
  readonly lines: readonly FullSizeLine[];
  /** Words at a place: "Front". */
  readonly labels: readonly { readonly words: string; readonly at: Point }[];
}

export interface FullSizeDocument {
  /** The sleeve's name. */
  readonly title: string;
  /** "Plain sleeve" */
  readonly style: string;
  /** "" for a sleeve that is nobody's yet. */
  readonly wearer: string;
  /** ISO date. */
  readonly date: string;
  /** Whether allowances are drawn, and how wide: "Allowances drawn: 1 cm, hem 3 cm". */
  readonly allowances: string;
  /** Said on the first sheet, such as a walk that fails. */
  readonly warnings: readonly string[];
  readonly pieces: readonly FullSizePiece[];
  /** Whose file it is, for the file's properties. */
  readonly author?: string;
  /** BCP 47. Default "en-GB". */
  readonly lang?: string;
}

export interface TitledList {
  readonly title: string;
  readonly lines: readonly string[];
}

/** What is asked of the printing worker. */
export interface FullSizeJob {
  readonly docs: readonly FullSizeDocument[];
  /** Printed after the contents of several documents: what to cut in all, what to buy. */
  readonly lists?: readonly TitledList[];
  readonly paper: FullSizePaper;
  /** Names of the sheets wanted, for one document; absent: all. */
  readonly only?: readonly string[];
}
