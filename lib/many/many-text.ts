import { namesInWords } from "@/lib/clients/list-words";
import { formatPlain } from "@/lib/lengths/format-length";
import { type ClothRow } from "@/lib/many/cloth-rows";
import { type CutPiece, type CutSize } from "@/lib/many/cut-list";
import { type NotDrafted } from "@/lib/many/draft-many";
import { type TitledList } from "@/lib/pdf/full-size-document";
import { type Fineness, type Unit } from "@/lib/records/types";

/** "13 1/2 in × 9 in": across, then along. */
export function sizeWords({ across, along }: CutSize, unit: Unit, fineness: Fineness): string {
  return `${formatPlain(across, unit, fineness)} × ${formatPlain(along, unit, fineness)}`;
}

/** What to buy, in words: in metres and yards, or what does not fit. */
export function buyWords({ buy }: ClothRow): string {
  if ("tooWide" in buy) return `${namesInWords(buy.tooWide)}: wider than this cloth`;
  return `${buy.metres} or ${buy.yards}`;
}

export interface ManyLists {
  pieces: readonly CutPiece[];
  cloth: readonly ClothRow[];
  left: readonly NotDrafted[];
  unit: Unit;
  fineness: Fineness;
}

/** The cut list and the cloth, each a list under its title: for a message, and for the page before the patterns. */
export function manyLists({ cloth, fineness, left, pieces, unit }: ManyLists): TitledList[] {
  return [
    ...pieces.map(({ count, name, onFold, sizes }) => ({
      title: `${name}: cut ${count} in all${onFold ? ", on the fold" : ""}`,
      lines: sizes.map(
        (size) => `${size.count} of ${sizeWords(size, unit, fineness)}: ${namesInWords(size.wearers)}`,
      ),
    })),
    {
      title: "Cloth by simple widths, on the safe side:",
      lines: [
        ...cloth.map((row) => `${row.width} wide: ${buyWords(row)}`),
        ...(left.length > 0 ? [`Not counted: ${namesInWords(left.map(({ wearer }) => wearer.name))}`] : []),
      ],
    },
  ];
}

export function manyText(title: string, lists: ManyLists): string {
  return [title, ...manyLists(lists).flatMap((list) => ["", list.title, ...list.lines])].join("\n");
}
