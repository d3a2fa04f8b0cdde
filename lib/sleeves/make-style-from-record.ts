/** From a sleeve's record to the pieces that are cut for it: the only way there, for the form, the marks and the print. */
import {
  type MadeStyle,
  makeStyle,
  type PatternPiece,
  type SleeveDraft,
  type SleeveFigures,
  type StyleFigure,
  type StyleProblem,
} from "@/lib/drafting";
import { type StyleParts } from "@/lib/drafting/pattern";
import { type WalkedSeam } from "@/lib/drafting/seams";
import { type DraftProblem } from "@/lib/drafting/types";
import { stepOf } from "@/lib/lengths/units";
import { type Fineness, type SleeveFields, type StyleId, type Unit } from "@/lib/records/types";
import { askOf, fitting } from "@/lib/sleeves/ask-from-record";
import { styleName } from "@/lib/sleeves/style-names";

export type StyledFields = Pick<SleeveFields, "style" | "ask">;

/** A sleeve as it is cut. `figures` and `draft` are of the block that it is made from. */
export interface GoodSleeve extends StyleParts {
  readonly ok: true;
  readonly style: StyleId;
  readonly figures: SleeveFigures;
  readonly draft: SleeveDraft;
  /** What the style asks for, with its usual values for this block. */
  readonly shown: readonly StyleFigure[];
}

/** Why it cannot be drawn; `block` is the plain sleeve, where that could be. */
export interface BadSleeve {
  readonly ok: false;
  readonly problems: readonly (DraftProblem | StyleProblem)[];
  readonly shown: readonly StyleFigure[];
  readonly block: GoodSleeve | null;
}

export type StyledSleeve = GoodSleeve | BadSleeve;

/**
 * The sleeve in full precision or, with the workshop's unit, of marks rounded to what a hand can set: the one that will
 * be cut. Null where a needed figure is missing.
 */
export function styleFromRecord(
  { style, ask: record }: StyledFields,
  unit?: Unit,
  fineness?: Fineness,
): StyledSleeve | null {
  const block = askOf(record);
  if (!block) return null;
  const step = unit && stepOf(unit, fineness);
  const { cloth, figures = {} } = record.style ?? {};
  const values = Object.fromEntries(
    Object.entries(figures).map(([key, value]) => [key, typeof value === "number" ? value : value.mm]),
  );
  const good = (id: StyleId, made: MadeStyle & { ok: true }): GoodSleeve => ({
    ...made.parts,
    ok: true,
    style: id,
    figures: made.figures,
    draft: made.block,
    shown: made.shown,
    checks: fitting(record, made.checks),
  });
  const made = makeStyle({ style, block, values, ...(cloth && { cloth }) }, step);
  if (made.ok) return good(style, made);
  const { problems, shown = [] } = made;
  // Without the style's figures the block itself could not be drawn.
  const plain = shown.length > 0 ? makeStyle({ style: "plain", block, values: {} }, step) : null;
  return { ok: false, problems, shown, block: plain?.ok ? good("plain", plain) : null };
}

/** What is printed of a sleeve: its pieces, under the name of its style. */
export function piecesOf({ pieces, style }: GoodSleeve): { style: string; pieces: readonly PatternPiece[] } {
  return { style: styleName(style), pieces };
}

export interface MarkedSleeve {
  /** As the figures have it. */
  exact: GoodSleeve;
  /** Drawn again from marks rounded to what a hand can set: the sleeve that will be cut. */
  rounded: StyledSleeve;
  /** mm. */
  step: number;
}

/** The sleeve for the mark-out. Null, or the problems, where there is nothing to mark out. */
export function markedFromRecord(
  sleeve: StyledFields,
  unit: Unit,
  fineness: Fineness,
): MarkedSleeve | BadSleeve | null {
  const exact = styleFromRecord(sleeve);
  if (!exact?.ok) return exact;
  const rounded = styleFromRecord(sleeve, unit, fineness)!;
  return { exact, rounded, step: stepOf(unit, fineness) };
}

/** Seams that do not meet. Such a sleeve is drawn, and says so wherever it is shown or printed. */
export function failingSeams({ seams }: Pick<GoodSleeve, "seams">): WalkedSeam[] {
  return seams.filter(({ agrees }) => !agrees);
}
