import { type Rows } from "@/lib/journal/merge";
import { orderSums } from "@/lib/money/order-sums";
import { type Order, type Payment, type PriceLine } from "@/lib/records/types";
import { byKey, liveRowsOf, rowsOf } from "../query";

export interface OrderWithMoney {
  order: Order;
  lines: PriceLine[];
  payments: Payment[];
  sums: ReturnType<typeof orderSums>;
}

/** An order with its price lines in their order, its payments as they came, and what they add up to. */
export function moneyOf(rows: Rows, order: Order): OrderWithMoney {
  const lines = liveRowsOf(rows, "priceLines")
    .filter((line) => line.orderId === order.id)
    .sort((a, b) => a.position - b.position || byKey<PriceLine>((line) => line.id)(a, b));
  const payments = rowsOf(rows, "payments")
    .filter((payment) => payment.orderId === order.id)
    .sort(byKey((payment) => payment.paidOn));
  return { order, lines, payments, sums: orderSums(lines, payments) };
}
