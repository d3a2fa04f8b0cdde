/** The styles that a sleeve can have, as they are offered, and what each may ask for. */
import {
  type MadeStyle,
  makeStyle,
  type PatternPiece,
  recipes,
  type SleeveAsk,
  type StyleFigure,
} from "@/lib/drafting";
import { type StyleId } from "@/lib/records/types";

export interface StyleChoice {
  id: StyleId;
  name: string;
  /** One sentence: how it looks. */
  look: string;
}

/** Every style, in the order they are offered. */
export const styleChoices: readonly StyleChoice[] = recipes.map(({ id, look, name }) => ({
  id: id as StyleId,
  name,
  look,
}));

export function styleChoice(id: StyleId): StyleChoice {
  return styleChoices.find((one) => one.id === id)!;
}

/** A grown woman's long sleeve, mm: what a style is shown by where there is no sleeve of one's own. An invention. */
const exampleBlock: SleeveAsk = { length: 560, biceps: 340, hem: 230, capDepth: 140 };

const made = new Map<StyleId, MadeStyle>();

/** The style on the example, with its usual figures; made once. */
function exampleOf(style: StyleId): MadeStyle {
  const known = made.get(style) ?? makeStyle({ style, block: exampleBlock, values: {} });
  made.set(style, known);
  return known;
}

/** The figures that a style asks for. Their bounds and usual values are the example's. */
export function styleFigures(style: StyleId): readonly StyleFigure[] {
  return exampleOf(style).shown ?? [];
}

/** Its pieces, cut for the example. */
export function examplePieces(style: StyleId): readonly PatternPiece[] {
  const example = exampleOf(style);
  return example.ok ? example.parts.pieces : [];
}

/** Whether any of it is gathered, so that the weight of the cloth matters. */
export function isGathered(style: StyleId): boolean {
  const example = exampleOf(style);
  return example.ok && example.parts.gathers.length > 0;
}
