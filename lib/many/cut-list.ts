/** Everything that is cut, for all wearers together. */
import { type DraftedWearer } from "@/lib/many/draft-many";
import { type PieceSize, pieceSize } from "@/lib/many/piece-size";

/** Pieces of one size. */
export interface CutSize extends PieceSize {
  count: number;
  /** Whose they are, by name. */
  wearers: string[];
}

export interface CutPiece {
  id: string;
  name: string;
  /** How many to cut in all. */
  count: number;
  onFold: boolean;
  /** With their allowances, rounded up to the step; the smallest first. */
  sizes: CutSize[];
}

/**
 * @param usual width of the allowance where an edge has none of its own, mm.
 * @param step sizes are rounded up to it, mm.
 */
export function cutList(drafted: readonly DraftedWearer[], usual: number, step: number): CutPiece[] {
  const pieces = new Map<string, CutPiece & { bySize: Map<string, CutSize> }>();
  for (const { good, wearer } of drafted) {
    for (const piece of good.pieces) {
      const { cut, id, name, onFold } = piece;
      const key = `${id} ${onFold ?? ""}`;
      const listed = pieces.get(key) ?? {
        id: key.trim(),
        name,
        count: 0,
        onFold: onFold !== undefined,
        sizes: [],
        bySize: new Map<string, CutSize>(),
      };
      pieces.set(key, listed);
      listed.count += cut.count;
      const exact = pieceSize(piece, usual);
      const [across, along] = [upTo(exact.across, step), upTo(exact.along, step)];
      const sizeKey = `${across} ${along}`;
      const size = listed.bySize.get(sizeKey) ?? {
        across: across * step,
        along: along * step,
        count: 0,
        wearers: [],
      };
      listed.bySize.set(sizeKey, size);
      size.count += cut.count;
      if (!size.wearers.includes(wearer.name)) size.wearers.push(wearer.name);
    }
  }
  return [...pieces.values()].map(({ bySize, ...listed }) => ({
    ...listed,
    sizes: [...bySize.values()].sort((a, b) => a.along - b.along || a.across - b.across),
  }));
}

/** In whole steps. */
const upTo = (mm: number, step: number): number => Math.ceil(mm / step - 1e-6);
