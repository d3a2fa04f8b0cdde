/** Asks for styles over random figures, and what is measured on the pieces without the engine. */
import type fc from "fast-check";
import { svgPathProperties } from "svg-path-properties";
import { type CubicBezier, makeStyle, type PatternPiece, type SleeveAsk } from "@/lib/drafting";
import { human, svgPath } from "./helpers";

/** Infant to large adult. */
export const blocks: fc.Arbitrary<SleeveAsk> = human.map(({ length, biceps, hem, capDepth }) => ({
  length,
  biceps,
  hem,
  capDepth,
}));

export type Made = Extract<ReturnType<typeof makeStyle>, { ok: true }>;

export function made(
  style: string,
  block: SleeveAsk,
  values: Record<string, number> = {},
  step?: number,
): Made {
  const result = makeStyle({ style, block, values }, step);
  if (!result.ok) throw new Error(JSON.stringify(result.problems));
  return result;
}

export function edgeOf(piece: Pick<PatternPiece, "edges">, name: string): readonly CubicBezier[] {
  const found = piece.edges.find((edge) => edge.name === name);
  if (!found) throw new Error(`no edge ${name}`);
  return found.curves;
}

export function pieceOf(of: Made, id: string): PatternPiece {
  const found = of.parts.pieces.find((piece) => piece.id === id);
  if (!found) throw new Error(`no piece ${id}`);
  return found;
}

/** Arc length by svg-path-properties, a library the engine does not use. */
export function witnessLength(curves: readonly CubicBezier[]): number {
  return new svgPathProperties(svgPath(curves)).getTotalLength();
}
