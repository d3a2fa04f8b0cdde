import { formatPlain } from "@/lib/lengths/format-length";
import { type CutPiece } from "@/lib/many/cut-list";
import { bought, type ShopLength, shopLength } from "@/lib/many/shop-length";
import { simpleNeeds, usualWidths } from "@/lib/many/simple-widths";
import { type Unit } from "@/lib/records/types";

export interface ClothRow {
  /** The width as it is said in the shop. */
  width: string;
  /** Typed by her; the others are the usual ones. */
  own: boolean;
  /** What to buy, or which pieces are wider than the cloth. */
  buy: ShopLength | { tooWide: string[] };
}

/** What to buy at her own width, if she gave one, and at each of the usual ones. `shrinks` is from 0 to below 1. */
export function clothRows(
  pieces: readonly CutPiece[],
  own: number | null,
  shrinks: number,
  unit: Unit,
): ClothRow[] {
  const asked = [
    ...(own === null ? [] : [{ width: formatPlain(own, unit), own: true, mm: own }]),
    ...usualWidths.map(({ mm, words }) => ({ width: words[unit], own: false, mm })),
  ];
  // Cloth shrinks in width too: what is left of it is what the pieces lie on.
  const needs = simpleNeeds(
    pieces,
    asked.map(({ mm }) => mm * (1 - shrinks)),
  );
  return asked.map(({ own, width }, i) => {
    const need = needs[i]!;
    return { width, own, buy: need.ok ? shopLength(bought(need.mm, shrinks)) : { tooWide: need.tooWide } };
  });
}
