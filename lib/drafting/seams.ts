/** Seams, and the walk: both sides of each are measured and set against each other before cloth is cut. */
import { edgeLength } from "@/lib/drafting/measure";
import { say } from "@/lib/drafting/say";
import { type Edge, type Phrase } from "@/lib/drafting/types";

/** One side of a seam: an edge we drew, or the bare length of one we did not, such as an armhole. */
export interface SeamSide {
  /** As it reads in a sentence: "the front of the cap". */
  readonly words: string;
  readonly measured: Edge | number;
}

/** How the two sides meet. `by` is how much longer the first is, where that was asked for; of pleats, what they take up. */
export type Joining =
  | { readonly how: "equal" }
  | { readonly how: "eased"; readonly by?: number }
  | { readonly how: "gathered" }
  | { readonly how: "pleated"; readonly by: number };

export interface Seam {
  readonly id: string;
  readonly sides: readonly [SeamSide, SeamSide];
  readonly joining: Joining;
}

export interface WalkedSeam {
  readonly id: string;
  readonly how: Joining["how"];
  /** mm, in the order of the seam's sides. */
  readonly lengths: readonly [number, number];
  /** First less second. */
  readonly difference: number;
  readonly agrees: boolean;
  readonly phrase: Phrase;
  readonly remedy: Phrase;
}

/** What a pencil line is wide: less than this is no difference at the table, mm. Common practice, no source. */
export const LINE_WIDTH = 0.5;

export function walk({ id, sides, joining }: Seam): WalkedSeam {
  const [a, b] = sides.map(({ measured }) =>
    typeof measured === "number" ? measured : edgeLength(measured),
  );
  const lengths = [a!, b!] as const;
  const difference = a! - b!;
  const [first, second] = [sides[0].words, sides[1].words];
  const start = `${first[0]!.toUpperCase()}${first.slice(1)}`;
  const even = Math.abs(difference) <= LINE_WIDTH;
  const read =
    joining.how === "gathered" && difference > LINE_WIDTH
      ? say`${start} measures ${a!} and is gathered into the ${b!} of ${second}: ${ratioWords(a! / b!)}.`
      : even
        ? say`${start} and ${second} both measure ${a!}.`
        : say`${start} measures ${a!} and ${second} ${b!}: ${Math.abs(difference)} ${difference > 0 ? "longer" : "shorter"}.`;
  const agrees = meets(joining, difference);
  return {
    id,
    how: joining.how,
    lengths,
    difference,
    agrees,
    phrase: read,
    remedy: agrees ? nothing(joining, difference) : change(joining, difference, first),
  };
}

function meets(joining: Joining, difference: number): boolean {
  if (joining.how === "equal") return Math.abs(difference) <= LINE_WIDTH;
  if (joining.how === "gathered" || joining.by === undefined) return difference >= -LINE_WIDTH;
  return Math.abs(difference - joining.by) <= LINE_WIDTH;
}

/** "2.5 : 1", which does not break over a line. */
export function ratioWords(ratio: number): string {
  return `${Math.round(ratio * 10) / 10}\u00a0:\u00a01`;
}

function nothing(joining: Joining, difference: number): Phrase {
  if (difference <= LINE_WIDTH) return say`Nothing to change.`;
  if (joining.how === "eased") return say`Ease in the ${difference}.`;
  if (joining.how === "pleated") return say`The pleats take up the ${difference}.`;
  return say`Nothing to change.`;
}

function change(joining: Joining, difference: number, first: string): Phrase {
  const wanted = joining.how === "eased" || joining.how === "pleated" ? (joining.by ?? 0) : 0;
  const off = difference - wanted;
  return say`${off > 0 ? "Shorten" : "Lengthen"} ${first} by ${Math.abs(off)}.`;
}
