import { ButtonLink } from "@/components/ui/button";
import { Card, RowLink, Rows } from "@/components/ui/card";
import { formatDay } from "@/lib/people/format-day";
import { type Sleeve, type Wearer } from "@/lib/records/types";
import { styleName } from "@/lib/sleeves/style-names";
import { type WearerCardView } from "@/lib/store/queries/wearers";

/** What is being sewn for a wearer, and the sleeves drafted from the figures. */
export function WearerWork({
  wearer,
  sleeves,
  openGarments,
}: {
  wearer: Wearer;
  sleeves: Sleeve[];
  openGarments: WearerCardView["openGarments"];
}) {
  return (
    <>
      {openGarments.length > 0 && (
        <section aria-labelledby="garments" className="grid gap-3">
          <h2 id="garments" className="font-figure text-lg font-bold">
            Being sewn
          </h2>
          <Card flush aria-label="Garments not handed over">
            <Rows>
              {openGarments.map(({ garment, order }) => (
                <RowLink
                  key={garment.id}
                  href={`/orders/card?id=${order.id}`}
                  title={garment.kind}
                  sub={[order.occasion, order.dueOn && `due ${formatDay(order.dueOn, { style: "short" })}`]
                    .filter(Boolean)
                    .join(", ")}
                />
              ))}
            </Rows>
          </Card>
        </section>
      )}
      <section aria-labelledby="sleeves" className="grid gap-3">
        <div className="flex flex-wrap items-center justify-between gap-2">
          <h2 id="sleeves" className="font-figure text-lg font-bold">
            Sleeves
          </h2>
          <ButtonLink href={`/sleeves/draft?wearer=${wearer.id}`}>Draft a sleeve</ButtonLink>
        </div>
        {sleeves.length === 0 ? (
          <p className="text-soft">None drafted yet.</p>
        ) : (
          <Card flush aria-label="Sleeves drafted, newest first">
            <Rows>
              {sleeves.map((sleeve) => (
                <RowLink
                  key={sleeve.id}
                  href={`/sleeves/marks?id=${sleeve.id}`}
                  title={sleeve.name}
                  sub={[styleName(sleeve.style), sleeve.note].filter(Boolean).join(". ")}
                />
              ))}
            </Rows>
          </Card>
        )}
      </section>
    </>
  );
}
