/** What a sheet of marks says: a pattern drawn by hand, step by step. Figures come as text in the workshop's unit. */
import { type TapeUnit } from "@/lib/pdf/signs";
import { type CubicBezier, type Point } from "@/lib/drafting/types";

/** `new` is the line of the step at hand; the others were there before, or are cut, sewn or guided along. */
export type LineWeight = "thin" | "new" | "cut" | "stitch" | "guide";

export interface DrawingLine {
  /** Curves and straight lines, mm, each starting where the one before ends or anew. */
  readonly d: readonly (CubicBezier | readonly [Point, Point])[];
  readonly weight: LineWeight;
}

export interface DrawingPoint extends Point {
  readonly label?: string;
  readonly new?: boolean;
}

/** Millimetres, y down. */
export interface StepDrawing {
  readonly viewBox: { readonly x: number; readonly y: number; readonly w: number; readonly h: number };
  readonly lines: readonly DrawingLine[];
  readonly points: readonly DrawingPoint[];
}

export interface MarksStep {
  /** From 1. */
  readonly n: number;
  readonly text: string;
  readonly drawing: StepDrawing;
}

export interface MarksDocument {
  readonly title: string;
  readonly subtitle: string;
  readonly wearer: string;
  /** ISO date. */
  readonly date: string;
  readonly figures: readonly { readonly name: string; readonly text: string }[];
  readonly warnings: readonly string[];
  readonly steps: readonly MarksStep[];
  readonly checks: readonly { readonly text: string; readonly verdict: "good" | "look" | "wrong" }[];
  /** BCP 47. Default "en-GB". */
  readonly lang?: string;
  /** Whose file it is, for the file's properties. */
  readonly author?: string;
  /** The unit of the ticks on the head's tape. Default "cm". */
  readonly tape?: TapeUnit;
}
