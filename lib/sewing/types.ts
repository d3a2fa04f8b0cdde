/**
 * What every sewing sum is: a few fields, a rule in plain words, and the work. Lengths in mm, in full precision; angles
 * in radians. Nothing here knows of a unit or of a screen.
 */
import { type Phrase } from "@/lib/drafting";
import { type SourceMark } from "@/lib/drafting/checks";

export type SumId =
  "ruffle" | "ring-flounce" | "circle-skirt" | "pleats" | "elastic" | "bias-strip" | "buttons" | "cuff-band";

/** Lengths in mm, counts, ratios and choices by field; undefined where left out. */
export type SumInputs = Readonly<Record<string, number | string | undefined>>;

interface FieldSaid {
  key: string;
  label: string;
  hint?: Phrase;
  /** May be left empty. */
  optional?: boolean;
  /** Asked only where this holds of what is put in so far. */
  when?(inputs: SumInputs): boolean;
}

export type SumField =
  | (FieldSaid & {
      kind: "length";
      /** What stands there at first, mm: a round figure in either unit. */
      usual?: { in: number; cm: number };
      /** mm. */
      least: number;
      most: number;
    })
  | (FieldSaid & { kind: "count"; usual?: number; least: number; most: number })
  | (FieldSaid & { kind: "ratio"; usual?: number; least: number; most: number })
  | (FieldSaid & {
      kind: "choice";
      usual?: string;
      options: readonly { value: string; label: string }[];
    });

export type SumResult = {
  label: string;
  /** Among the figures that are read at arm's length. */
  main?: boolean;
} & (
  | { mm: number; /** Shown up to the next step: cut never too short. */ up?: boolean }
  | { count: number }
  | { text: string }
  | { marks: readonly SumMark[]; from: string }
);

/** A mark to set out: how far from the start of its row, mm. */
export interface SumMark {
  name: string;
  mm: number;
}

export interface DrawnPath {
  /** SVG path data in mm, y downwards. */
  d: string;
  /** Cut heavy, sewn dashed, folded and measured thin. */
  line: "cut" | "stitch" | "fold" | "measure";
}

export interface DrawnLabel {
  x: number;
  y: number;
  /** A length, or words. */
  mm?: number;
  text?: string;
}

export interface SumDrawing {
  /** What the paths fill, mm. */
  box: { x: number; y: number; w: number; h: number };
  paths: readonly DrawnPath[];
  labels: readonly DrawnLabel[];
  /** What it shows, for who cannot see it. */
  say: Phrase;
}

export interface SumCaution {
  say: Phrase;
  source: string;
  mark: SourceMark;
}

/** What to type instead, and where. */
export interface SumProblem {
  field: string;
  say: Phrase;
}

export type SumWorked =
  | {
      ok: true;
      results: readonly SumResult[];
      drawing: SumDrawing;
      /** What to do, in order. */
      steps: readonly Phrase[];
      cautions: readonly SumCaution[];
    }
  | { ok: false; problems: readonly SumProblem[] };

export interface SewingSum {
  id: SumId;
  name: string;
  /** What it is for, in the words of a list. */
  about: string;
  /** The rule in a line. */
  rule: Phrase;
  source: string;
  mark: SourceMark;
  fields: readonly SumField[];
  /** Figures to draw it with before there are any. */
  example: SumInputs;
  /**
   * The sum. Called by `workSum` only, which sees to it that every needed field is there and within its bounds.
   * @param step what marks are set out to, mm (1/8 in = 3.175, or 1): marks are then rounded first, and everything that
   *   they make up is their sum. 0 works in full precision.
   */
  work(inputs: SumInputs, step: number): SumWorked;
}

/** What is common practice of the trade, and written nowhere that was seen. */
export const practice = { source: "common practice, no source", mark: "practice" } as const;
export const recalled = { source: "recalled, no source at hand", mark: "memory" } as const;
export const geometry = { source: "geometry", mark: "exact" } as const;
