import { ShareButton } from "@/components/measure/share-button";
import { Card, CardHead } from "@/components/ui/card";
import { Length } from "@/components/ui/fraction";
import { namesInWords } from "@/lib/clients/list-words";
import { type ClothRow } from "@/lib/many/cloth-rows";
import { type CutPiece } from "@/lib/many/cut-list";
import { type NotDrafted } from "@/lib/many/draft-many";
import { manyText } from "@/lib/many/many-text";
import { type Fineness, type StyleId, type Unit } from "@/lib/records/types";
import { styleName } from "@/lib/sleeves/style-names";

export interface CutListCardProps {
  pieces: readonly CutPiece[];
  cloth: readonly ClothRow[];
  not: readonly NotDrafted[];
  style: StyleId;
  /** How many wearers it is for. */
  count: number;
  unit: Unit;
  fineness: Fineness;
}

/** What is cut for all of them, and how large. */
export function CutListCard({ cloth, count, fineness, not, pieces, style, unit }: CutListCardProps) {
  const units = { unit, fineness };
  const title = `${styleName(style)} for ${count}`;
  return (
    <Card aria-labelledby="cut-list-title">
      <CardHead
        id="cut-list-title"
        title="Cut list"
        sub="Across the cloth by along it, allowances counted in, rounded up."
      />
      {pieces.map((piece) => (
        <section key={piece.id} className="mb-4">
          <h3 className="font-bold">
            {piece.name}: cut {piece.count} in all{piece.onFold && ", on the fold"}
          </h3>
          <ul>
            {piece.sizes.map((size) => (
              <li
                key={`${size.across} ${size.along}`}
                className="flex flex-wrap items-baseline justify-between gap-x-4 border-t border-line py-1"
              >
                <span className="figures font-semibold">
                  {size.count} of <Length mm={size.across} {...units} /> ×{" "}
                  <Length mm={size.along} {...units} />
                </span>
                <span className="min-w-0 text-sm wrap-anywhere text-soft">{namesInWords(size.wearers)}</span>
              </li>
            ))}
          </ul>
        </section>
      ))}
      <ShareButton title={title} text={manyText(title, { pieces, cloth, left: not, ...units })} />
    </Card>
  );
}
