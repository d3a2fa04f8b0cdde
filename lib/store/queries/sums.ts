import { type Rows } from "@/lib/journal/merge";
import { type Client, type Order, type Sum } from "@/lib/records/types";
import { findRow, idsIn, liveRowsOf, newestFirst, type Query, type RowSource } from "../query";

export interface SumView {
  sum: Sum;
  /** The order that it is on; in the bin too, where that is where it lies. */
  order: Order | null;
  client: Client | null;
}

async function withOrders(source: RowSource, sums: Rows["sums"] = []): Promise<Rows> {
  const orders = await source.byIds("orders", idsIn(sums, "orderId"));
  return { sums, orders, clients: await source.byIds("clients", idsIn(orders, "clientId")) };
}

function sumView(rows: Rows, sum: Sum): SumView {
  const order = findRow(rows, "orders", sum.orderId);
  return { sum, order, client: findRow(rows, "clients", order?.clientId ?? null) };
}

/** Kept sewing sums, newest first. */
export const sumListQuery: Query<{ limit: number }, { items: SumView[]; more: boolean }> = {
  name: "sumList",
  need: async (source, { limit }) => withOrders(source, await source.newest("sums", limit + 1)),
  view: (rows, { limit }) => {
    const sums = liveRowsOf(rows, "sums").sort(newestFirst);
    return { items: sums.slice(0, limit).map((sum) => sumView(rows, sum)), more: sums.length > limit };
  },
};

/** One kept sum; null where there is no such sum. */
export const sumQuery: Query<{ id: string }, SumView | null> = {
  name: "sum",
  need: async (source, { id }) => withOrders(source, await source.byIds("sums", [id])),
  view: (rows, { id }) => {
    const sum = findRow(rows, "sums", id);
    return sum && sumView(rows, sum);
  },
};
