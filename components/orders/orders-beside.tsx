"use client";

import { usePathname } from "next/navigation";
import { type ReactNode, Suspense, useSyncExternalStore } from "react";
import { useIdParam } from "@/components/clients/use-id-param";
import { useView } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { receiptQuery } from "@/lib/store/queries/orders";
import { OrderList } from "./order-list";

/** Where Tailwind's `lg` begins. */
const WIDE = "(min-width: 64rem)";

function subscribeWide(listener: () => void): () => void {
  const media = window.matchMedia(WIDE);
  media.addEventListener("change", listener);
  return () => media.removeEventListener("change", listener);
}

/** On a wide screen the list stays beside the card; a phone never draws it there. */
export function OrdersBeside({ children }: { children: ReactNode }) {
  const path = usePathname();
  const wide = useSyncExternalStore(
    subscribeWide,
    () => window.matchMedia(WIDE).matches,
    () => false,
  );
  if (path === "/orders") return children;
  return (
    <div className="lg:grid lg:grid-cols-[minmax(0,24.25rem)_minmax(0,1fr)]">
      <aside
        aria-labelledby="orders-beside"
        className="hidden lg:sticky lg:top-0 lg:block lg:max-h-dvh lg:self-start lg:overflow-y-auto lg:py-2 lg:ps-8 lg:pe-1"
      >
        {wide && (
          <>
            <div className="mb-4 flex items-center justify-between gap-2">
              <h2 id="orders-beside" className="font-figure text-2xl font-bold">
                Orders
              </h2>
              <ButtonLink href="/orders/new">New order</ButtonLink>
            </div>
            <div className="grid grid-cols-[minmax(0,1fr)] gap-4 pb-4">
              <Suspense>{path === "/orders/receipt" ? <ListWithReceipt /> : <ListWithOrder />}</Suspense>
            </div>
          </>
        )}
      </aside>
      <div className="min-w-0">{children}</div>
    </div>
  );
}

function ListWithOrder() {
  return <OrderList chosen={useIdParam("id")} />;
}

function ListWithReceipt() {
  const receipt = useIdParam("id");
  return receipt ? <ListWithOrderOf receipt={receipt} /> : <OrderList />;
}

function ListWithOrderOf({ receipt }: { receipt: string }) {
  const { view } = useView(receiptQuery, { id: receipt });
  return <OrderList chosen={view?.receipt.orderId} />;
}
