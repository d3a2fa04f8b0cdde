"use client";

import { type UseFormReturn } from "react-hook-form";
import { useView } from "@/components/store/use-book";
import { Field, Select } from "@/components/ui/field";
import { orderName } from "@/lib/orders/order-name";
import { type Client, type Order } from "@/lib/records/types";
import { orderListQuery } from "@/lib/store/queries/orders";
import { type SumForm } from "@/lib/sums/sum-form";

const AT_MOST = 60;

/** "Ana Brdar: School play". */
export function orderWords(order: Order, client: Client | null): string {
  return client ? `${client.name}: ${orderName(order)}` : orderName(order);
}

export interface SumOrderProps {
  form: UseFormReturn<SumForm>;
  /** The order that it is on already, or that it was begun from. */
  on: { order: Order; client: Client | null } | null;
}

/** Which order the sum is put on: one that is open, or none. */
export function SumOrder({ form, on }: SumOrderProps) {
  const { view } = useView(orderListQuery, { show: "open", limit: AT_MOST });
  const others = view.items.filter(({ order }) => order.id !== on?.order.id);
  return (
    <Field label="On the order" optional hint="It then stands on the order’s card.">
      <Select {...form.register("orderId")}>
        <option value="">On no order</option>
        {on && (
          <option value={on.order.id}>
            {orderWords(on.order, on.client)}
            {on.order.removedAt === null ? "" : ", in the bin"}
          </option>
        )}
        {others.map(({ order, client }) => (
          <option key={order.id} value={order.id}>
            {orderWords(order, client)}
          </option>
        ))}
      </Select>
    </Field>
  );
}
