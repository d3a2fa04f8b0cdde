"use client";

import { ButtonLink } from "@/components/ui/button";
import { Beside, Screen } from "@/components/ui/screen";
import { OrderList } from "./order-list";

export function OrdersScreen() {
  return (
    <Screen
      wide
      title="Orders"
      action={
        <ButtonLink variant="main" full href="/orders/new">
          New order
        </ButtonLink>
      }
    >
      <Beside
        list={<OrderList />}
        nothing={
          <p className="rounded border-2 border-dashed border-edge px-4 py-8 text-center text-soft">
            Choose an order, and its card opens here.
          </p>
        }
      />
    </Screen>
  );
}
