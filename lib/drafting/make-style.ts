/** From the block and a style's figures to its pieces, walked and checked, or to what is in the way. */
import { type SleeveDraft } from "@/lib/drafting/basic-sleeve";
import { type Check } from "@/lib/drafting/checks";
import { type MadeSleeve, makeSleeve, remakeSleeve } from "@/lib/drafting/make-sleeve";
import { type Cloth, type StyleCheck, type StyleParts, type StyleProblem } from "@/lib/drafting/pattern";
import { roundFigures } from "@/lib/drafting/round";
import { say } from "@/lib/drafting/say";
import { recipeOf } from "@/lib/drafting/styles";
import { type StyleFigure, type StyleGround } from "@/lib/drafting/styles/context";
import { type SleeveAsk, type SleeveFigures } from "@/lib/drafting/types";

/** The usual width of dress cloth, mm: 45 in. Usual widths 36, 44/45, 54, 58-60 in, as read in a fabric chart. */
export const USUAL_CLOTH_WIDTH = 1143;

/** Lengths are shown to the nearest eighth of an inch, mm. */
const SHOWN = 3.175;

export interface StyleAsk {
  readonly style: string;
  readonly block: SleeveAsk;
  /** Those left out are the recipe's usual ones. */
  readonly values: Readonly<Record<string, number>>;
  readonly cloth?: Cloth;
  /** mm. Default `USUAL_CLOTH_WIDTH`. */
  readonly clothWidth?: number;
}

export type MadeStyle =
  | {
      readonly ok: true;
      readonly figures: SleeveFigures;
      readonly block: SleeveDraft;
      readonly values: Readonly<Record<string, number>>;
      readonly shown: readonly StyleFigure[];
      readonly parts: StyleParts;
      /** The block's checks, then the style's. */
      readonly checks: readonly StyleCheck[];
    }
  | {
      readonly ok: false;
      readonly problems: readonly StyleProblem[];
      /** The style's figures, where the block itself could be drawn. */
      readonly shown?: readonly StyleFigure[];
    };

/**
 * Drafts a style. With a `step` (mm) the block and every mark of the style are rounded to it before anything is drawn, so
 * that what is walked is what will be cut. Throws on nothing a form can send.
 */
export function makeStyle(ask: StyleAsk, step?: number): MadeStyle {
  const exact = makeSleeve(ask.block);
  if (!exact.ok) return { ok: false, problems: exact.problems };
  const made = step === undefined ? exact : remakeSleeve(ask.block, roundFigures(exact.figures, step));
  if (!made.ok) return { ok: false, problems: made.problems };
  return styleOf(ask, made, step);
}

function styleOf(ask: StyleAsk, made: MadeSleeve & { ok: true }, step: number | undefined): MadeStyle {
  const recipe = recipeOf(ask.style);
  const ground: StyleGround = {
    ask: ask.block,
    figures: made.figures,
    block: made.draft,
    cloth: ask.cloth ?? "medium",
    clothWidth: ask.clothWidth ?? USUAL_CLOTH_WIDTH,
  };
  const shown = recipe.figures(ground, ask.values);
  const values = Object.fromEntries(shown.map(({ key, usual }) => [key, ask.values[key] ?? usual]));
  const problems = shown.flatMap((figure) => outOfBounds(figure, values[figure.key]!));
  if (problems.length > 0) return { ok: false, problems, shown };
  const near = step === undefined ? (mm: number) => mm : (mm: number) => Math.round(mm / step) * step;
  const parts = recipe.make({ ...ground, values, near });
  if (!parts.ok) return { ...parts, shown };
  return {
    ok: true,
    figures: made.figures,
    block: made.draft,
    values,
    shown,
    parts: parts.value,
    checks: [
      ...made.checks.filter(({ id }) => !recipe.replaces?.includes(id)).map(plain),
      ...parts.value.checks,
    ],
  };
}

const plain = (check: Check): StyleCheck => check;

function outOfBounds({ key, kind, label, low, high }: StyleFigure, value: number): StyleProblem[] {
  // A bound is shown rounded to an eighth: what is typed after it must be taken.
  const slack = kind === "length" ? SHOWN / 2 : 1e-9;
  if (value >= low - slack && value <= high + slack && (kind !== "count" || Number.isInteger(value)))
    return [];
  const between =
    kind === "length"
      ? say`Type a length between ${low} and ${high}.`
      : say`Type ${kind === "count" ? "a whole number" : "a number"} between ${`${low}`} and ${`${high}`}.`;
  const phrase = !Number.isFinite(value)
    ? say`${label}: that is not a ${kind === "length" ? "length" : "number"}.`
    : kind === "length"
      ? say`${label} is ${value}.`
      : say`${label}: ${`${value}`}.`;
  return [{ id: `${key}-range`, figure: key, phrase, remedy: between }];
}
