/**
 * Cloth reckoned by simple widths: upright boxes in rows straight across, nothing fitted into what is left beside a slope.
 * A lay drawn on the cloth needs no more than this, and mostly less.
 */
import { mmPerInch } from "@/lib/lengths/units";
import { type CutPiece } from "@/lib/many/cut-list";

/** A width that cloth is usually sold in; of a pair the narrower counts. Fabric conversion chart (seen). */
export interface UsualWidth {
  words: { in: string; cm: string };
  mm: number;
}

export const usualWidths: readonly UsualWidth[] = [
  { words: { in: "36 in", cm: "91 cm" }, mm: 36 * mmPerInch },
  { words: { in: "44/45 in", cm: "112–114 cm" }, mm: 44 * mmPerInch },
  { words: { in: "54 in", cm: "137 cm" }, mm: 54 * mmPerInch },
  { words: { in: "58–60 in", cm: "147–152 cm" }, mm: 58 * mmPerInch },
];

export type Need = { ok: true; mm: number } | { ok: false; tooWide: string[] };

/** The length that all pieces take, laid in rows, at each of the widths, mm; or which pieces are wider than the cloth. */
export function simpleNeeds(pieces: readonly CutPiece[], widths: readonly number[]): Need[] {
  const boxes = pieces
    .flatMap(({ sizes }) => sizes.flatMap((size) => Array.from({ length: size.count }, () => size)))
    .sort((a, b) => b.along - a.along || b.across - a.across);
  const alone = new Map(
    [...new Set(widths)].map((width): [number, Need] => {
      const tooWide = pieces.filter(({ sizes }) => sizes.some(({ across }) => across > width + 1e-6));
      if (tooWide.length > 0) return [width, { ok: false, tooWide: tooWide.map(({ name }) => name) }];
      return [width, { ok: true, mm: rowsLength(boxes, width) }];
    }),
  );
  // Rows are filled one by one, so that a wider cloth may chance to come out longer; it can be laid as the narrower one.
  return widths.map((width) => {
    const own = alone.get(width)!;
    if (!own.ok) return own;
    const lengths = [...alone].flatMap(([other, need]) => (other <= width && need.ok ? [need.mm] : []));
    return { ok: true, mm: Math.min(...lengths) };
  });
}

interface Box {
  across: number;
  along: number;
}

/** The longest first, each into the first row that has room for it. */
function rowsLength(boxes: readonly Box[], width: number): number {
  const left: number[] = [];
  let length = 0;
  for (const { across, along } of boxes) {
    const row = left.findIndex((room) => room >= across - 1e-6);
    if (row >= 0) left[row]! -= across;
    else {
      left.push(width - across);
      length += along;
    }
  }
  return length;
}
