"use client";

import { useMemo } from "react";
import { useIdParam } from "@/components/clients/use-id-param";
import { OrderNotShown } from "@/components/orders/order-not-shown";
import { useView, useWorkshop } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { Screen } from "@/components/ui/screen";
import { orderName } from "@/lib/orders/order-name";
import { receiptDocument } from "@/lib/receipts/document";
import { receiptQuery, type ReceiptView } from "@/lib/store/queries/orders";
import { ReceiptCard } from "./receipt-card";
import { receiptLang } from "./receipt-lang";

const NOT_HERE = "This receipt is not in the book.";

export function ReceiptScreen() {
  const id = useIdParam("id");
  return id ? <Receipt key={id} id={id} /> : <OrderNotShown title="Receipt" state="known" say={NOT_HERE} />;
}

function Receipt({ id }: { id: string }) {
  const { view, state } = useView(receiptQuery, { id });
  if (!view) return <OrderNotShown title="Receipt" state={state} say={NOT_HERE} />;
  return <KnownReceipt view={view} />;
}

function KnownReceipt({ view: { receipt, order } }: { view: ReceiptView }) {
  const unit = useWorkshop()?.unit ?? "in";
  const doc = useMemo(() => receiptDocument(receipt, { lang: receiptLang(), unit }), [receipt, unit]);
  return (
    <Screen
      title={`${doc.title} ${doc.number}`}
      back={
        order
          ? { href: `/orders/card?id=${order.id}`, label: orderName(order) }
          : { href: "/orders", label: "Orders" }
      }
    >
      <ReceiptCard doc={doc} unit={unit} />
      <details className="rounded border-2 border-edge bg-well px-4">
        <summary className="flex min-h-key items-center font-semibold">Is something wrong on it?</summary>
        <div className="grid gap-2 pb-4">
          <p>
            A receipt is never changed: the client holds the same words. Put a wrong payment right on the
            order: give the money back there, then take the right amount. Each makes a receipt with a number
            of its own.
          </p>
          {order && (
            <ButtonLink href={`/orders/card?id=${order.id}&money=give-back`} className="justify-self-start">
              Give money back
            </ButtonLink>
          )}
        </div>
      </details>
    </Screen>
  );
}
