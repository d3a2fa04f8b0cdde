"use client";

import { useCallback, useMemo } from "react";
import { useIdParam } from "@/components/store/use-id-param";
import { ShareDocument } from "@/components/share-document";
import { backToOrders, NotShown } from "@/components/frame/not-shown";
import { useView, useWorkshop } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Screen } from "@/components/ui/screen";
import { orderName } from "@/lib/orders/order-name";
import { makeReceipt } from "@/lib/pdf/client";
import { type ReceiptPaper } from "@/lib/pdf/papers";
import { type OnProgress } from "@/lib/pdf/pdf-api";
import { receiptDocument } from "@/lib/receipts/document";
import { receiptQuery, type ReceiptView } from "@/lib/store/queries/orders";
import { ReceiptCard } from "./receipt-card";
import { receiptLang } from "./receipt-lang";

const NOT_HERE = "This receipt is not in the book.";

export function ReceiptScreen() {
  const id = useIdParam("id");
  return id ? (
    <Receipt key={id} id={id} />
  ) : (
    <NotShown back={backToOrders} title="Receipt" state="known" say={NOT_HERE} />
  );
}

function Receipt({ id }: { id: string }) {
  const { view, state } = useView(receiptQuery, { id });
  if (!view) return <NotShown back={backToOrders} title="Receipt" state={state} say={NOT_HERE} />;
  return <KnownReceipt view={view} />;
}

const papers: { value: ReceiptPaper; label: string; sub?: string }[] = [
  { value: "a5", label: "A5" },
  { value: "a4", label: "A4" },
  { value: "roll80", label: "80 mm", sub: "till roll" },
  { value: "roll58", label: "58 mm", sub: "till roll" },
];

function KnownReceipt({ view: { receipt, order } }: { view: ReceiptView }) {
  const unit = useWorkshop()?.unit ?? "in";
  const doc = useMemo(() => receiptDocument(receipt, { lang: receiptLang(), unit }), [receipt, unit]);
  const make = useCallback(
    (paper: ReceiptPaper, onProgress: OnProgress) => makeReceipt(doc, paper, onProgress),
    [doc],
  );
  return (
    <Screen
      title={`${doc.title} ${doc.number}`}
      sub={`${doc.balanceLabel} ${doc.balanceText}`}
      back={
        order
          ? { href: `/orders/card?id=${order.id}`, label: orderName(order) }
          : { href: "/orders", label: "Orders" }
      }
    >
      <Card aria-labelledby="give">
        <CardHead id="give" title="Give it to the client" />
        <ShareDocument
          name="receipt"
          make={make}
          fileName={`${doc.title} ${doc.number}`}
          papers={papers}
          rememberAs="receipt"
        />
      </Card>
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
