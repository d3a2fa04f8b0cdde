"use client";

import { usePathname } from "next/navigation";
import { type ReactNode } from "react";
import { ListBeside } from "@/components/frame/list-beside";
import { useIdParam } from "@/components/store/use-id-param";
import { useView } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { receiptQuery } from "@/lib/store/queries/orders";
import { OrderList } from "./order-list";

export function OrdersBeside({ children }: { children: ReactNode }) {
  const path = usePathname();
  return (
    <ListBeside
      href="/orders"
      title="Orders"
      action={<ButtonLink href="/orders/new">New order</ButtonLink>}
      list={path === "/orders/receipt" ? <ListWithReceipt /> : <ListWithOrder />}
    >
      {children}
    </ListBeside>
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
