import { Card, CardHead } from "@/components/ui/card";
import { namesInWords } from "@/lib/clients/list-words";
import { type ClothRow } from "@/lib/many/cloth-rows";
import { type NotDrafted } from "@/lib/many/draft-many";

export interface ClothCardProps {
  cloth: readonly ClothRow[];
  not: readonly NotDrafted[];
  /** From 0 to below 1. */
  shrinks: number;
}

/** What to buy at each width, for the sleeves alone. */
export function ClothCard({ cloth, not, shrinks }: ClothCardProps) {
  return (
    <Card aria-labelledby="cloth-title">
      <CardHead
        id="cloth-title"
        title="Cloth to buy, by simple widths"
        sub="For the sleeves alone. Pieces in rows straight across, none fitted into another: it errs on the safe side."
      />
      <table className="w-full border-collapse">
        <thead>
          <tr className="text-sm text-soft">
            <th scope="col" className="py-1 pe-3 text-start font-normal">
              Width
            </th>
            <th scope="col" className="px-2 py-1 text-end font-normal">
              Metres
            </th>
            <th scope="col" className="py-1 ps-2 text-end font-normal">
              Yards
            </th>
          </tr>
        </thead>
        <tbody>
          {cloth.map(({ buy, own, width }) => (
            <tr key={`${width} ${own}`} className="border-t border-line align-top">
              <th scope="row" className="py-2 pe-3 text-start font-semibold">
                {width}
                {own && <span className="block text-sm font-normal text-soft">as typed</span>}
              </th>
              {"tooWide" in buy ? (
                <td colSpan={2} className="py-2 ps-2 text-end">
                  {namesInWords(buy.tooWide)}: wider than this cloth
                </td>
              ) : (
                <>
                  <td className="figures px-2 py-2 text-end text-lg font-bold">{buy.metres}</td>
                  <td className="figures py-2 ps-2 text-end text-lg font-bold">{buy.yards}</td>
                </>
              )}
            </tr>
          ))}
        </tbody>
      </table>
      <p className="mt-3 text-sm text-soft">
        Rounded up to a tenth of a metre or an eighth of a yard.
        {shrinks > 0 &&
          ` Enough after it has shrunk ${Math.round(shrinks * 1000) / 10} % each way: wash it before it is cut.`}
        {not.length > 0 && ` Not counted: ${namesInWords(not.map(({ wearer }) => wearer.name))}.`}
      </p>
    </Card>
  );
}
