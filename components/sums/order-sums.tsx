"use client";

import { useWorkshop } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { Card, RowLink, Rows } from "@/components/ui/card";
import { type OrderCardView } from "@/lib/store/queries/orders";
import { keptLine } from "@/lib/sums/sum-words";
import { sumHref } from "./places";

/** The sewing sums on an order, and the way to one more. */
export function OrderSums({ view: { order, sewingSums } }: { view: OrderCardView }) {
  const workshop = useWorkshop();
  if (!workshop) return null;
  const { fineness, unit } = workshop;
  return (
    <section aria-labelledby="sums" className="grid gap-3">
      <h2 id="sums" className="font-figure text-lg font-bold">
        Sums
      </h2>
      {sewingSums.length > 0 && (
        <Card flush aria-label="Sewing sums of this order">
          <Rows>
            {sewingSums.map((sum) => (
              <RowLink
                key={sum.id}
                href={sumHref(sum.id)}
                title={sum.name}
                sub={<span className="wrap-anywhere">{keptLine(sum, unit, fineness)}</span>}
              />
            ))}
          </Rows>
        </Card>
      )}
      <div>
        <ButtonLink href={`/sums?order=${order.id}`}>Add a sewing sum</ButtonLink>
      </div>
    </section>
  );
}
