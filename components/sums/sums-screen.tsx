"use client";

import { useState } from "react";
import { ChevronRight } from "lucide-react";
import { backToSleeves } from "@/components/frame/not-shown";
import { useIdParam } from "@/components/store/use-id-param";
import { useView, useWorkshop } from "@/components/store/use-book";
import { AppLink } from "@/components/ui/app-link";
import { Button } from "@/components/ui/button";
import { Card, RowLink, Rows } from "@/components/ui/card";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { type Fineness, type Unit } from "@/lib/records/types";
import { sewingSums } from "@/lib/sewing";
import { sumListQuery, type SumView } from "@/lib/store/queries/sums";
import { keptLine } from "@/lib/sums/sum-words";
import { newSumHref, sumHref } from "./places";
import { orderWords } from "./sum-order";
import { SumThumb } from "./sum-thumb";

const page = 20;

/** The kinds of sewing sums, and below them those that were kept. */
export function SumsScreen() {
  const orderId = useIdParam("order") ?? "";
  const [limit, setLimit] = useState(page);
  const { state, view } = useView(sumListQuery, { limit });
  const workshop = useWorkshop();
  const { items, more } = view;
  return (
    <Screen
      title="Sewing sums"
      sub={orderId === "" ? "The arithmetic beside the sleeve" : "Choose what to work out for the order"}
      back={orderId === "" ? backToSleeves : { href: `/orders/card?id=${orderId}`, label: "The order" }}
      wide
    >
      <Card flush notches={1} aria-label="Kinds of sums">
        <Rows className="lg:grid lg:grid-cols-2">
          {sewingSums.map((sum) => (
            <li key={sum.id}>
              <AppLink href={newSumHref(sum.id, orderId)} className="row row-link">
                <span className="flex w-14 shrink-0 justify-center">
                  <SumThumb sum={sum} />
                </span>
                <span className="min-w-0 flex-1">
                  <span className="block font-semibold">{sum.name}</span>
                  <span className="block text-sm text-soft">{sum.about}</span>
                </span>
                <ChevronRight aria-hidden="true" className="size-5 shrink-0 text-soft" />
              </AppLink>
            </li>
          ))}
        </Rows>
      </Card>
      <section aria-labelledby="kept" className="grid gap-3">
        <h2 id="kept" className="font-figure text-lg font-bold">
          Kept
        </h2>
        {state === "failed" && (
          <Notice
            tone="wrong"
            title="The book on this phone did not answer. Close Notchbook and open it again."
          />
        )}
        {items.length === 0 && state === "opening" && <Progress label="Opening the book" />}
        {items.length === 0 && state === "known" && (
          <p className="text-soft">Sums that you keep stand here. Choose one above; it works as you type.</p>
        )}
        {items.length > 0 && workshop && (
          <Card flush notches={0} aria-label="Kept sums, newest first">
            <Rows>
              {items.map((item) => (
                <KeptRow key={item.sum.id} item={item} unit={workshop.unit} fineness={workshop.fineness} />
              ))}
            </Rows>
          </Card>
        )}
        {more && <Button onClick={() => setLimit((now) => now + page)}>Show more</Button>}
      </section>
    </Screen>
  );
}

function KeptRow({
  item: { sum, order, client },
  unit,
  fineness,
}: {
  item: SumView;
  unit: Unit;
  fineness: Fineness;
}) {
  return (
    <RowLink
      href={sumHref(sum.id)}
      title={sum.name}
      sub={
        <>
          <span className="block wrap-anywhere">{keptLine(sum, unit, fineness)}</span>
          {order && order.removedAt === null && (
            <span className="block wrap-anywhere">{orderWords(order, client)}</span>
          )}
        </>
      }
    />
  );
}
