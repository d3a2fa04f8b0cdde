/** What a recipe is given, and how its figures are described. */
import { type SleeveDraft } from "@/lib/drafting/basic-sleeve";
import { type Cloth, type StyleResult } from "@/lib/drafting/pattern";
import { type Phrase, type SleeveAsk, type SleeveFigures } from "@/lib/drafting/types";

/** A figure of a style as the form shows it. */
export interface StyleFigure {
  readonly key: string;
  readonly label: string;
  /** In a sentence: "the opening at the head". */
  readonly said: string;
  /** One sentence: what it does to the look. */
  readonly does: string;
  /** A length in mm, a count of things, or a ratio to one. */
  readonly kind: "length" | "count" | "ratio";
  readonly usual: number;
  readonly low: number;
  readonly high: number;
}

/** The block and what is known of the wearer and the cloth. */
export interface StyleGround {
  readonly ask: SleeveAsk;
  readonly figures: SleeveFigures;
  readonly block: SleeveDraft;
  readonly cloth: Cloth;
  /** Usable width of the cloth, mm. */
  readonly clothWidth: number;
}

export interface StyleContext extends StyleGround {
  /** Every figure of the recipe by its key, within its bounds. */
  readonly values: Readonly<Record<string, number>>;
  /** Rounds a distance to what the hand sets out; leaves it alone where the exact draft is wanted. */
  near(mm: number): number;
}

/** Figures of the style that were given, by their keys; not held to any bounds yet. */
export type Typed = Readonly<Record<string, number>>;

/** What a default that follows another figure goes by: what was typed there if it will do, or its own default. */
export function settled({ key, kind, usual, low, high }: StyleFigure, typed: Typed): number {
  const value = typed[key];
  if (value === undefined || !(value >= low && value <= high)) return usual;
  return kind === "count" ? Math.round(value) : value;
}

export interface StyleRecipe {
  readonly id: string;
  readonly name: string;
  /** One sentence: how it looks. */
  readonly look: string;
  /** Checks of the block that do not hold for it: the hem of a sleeve whose hem is gathered into a cuff. */
  readonly replaces?: readonly string[];
  /** Defaults follow the block, and the figures that were typed. */
  figures(ground: StyleGround, typed: Typed): readonly StyleFigure[];
  make(context: StyleContext): StyleResult;
}

/** A style that the figures make impossible. */
export function impossible(
  figure: string,
  id: string,
  phrase: Phrase,
  remedy: Phrase,
): Extract<StyleResult, { ok: false }> {
  return { ok: false, problems: [{ id, figure, phrase, remedy }] };
}
