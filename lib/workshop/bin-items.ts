/** What the bin shows of a thing, and what comes back with it. */
import { setRemoved, type Write } from "@/lib/journal/change";
import { wentWithClient } from "@/lib/clients/bin-question";
import { orderName } from "@/lib/orders/order-name";
import { type BinItem } from "@/lib/store/queries/bin";

const kinds = {
  clients: "Client",
  wearers: "Wearer",
  orders: "Order",
  sleeves: "Sleeve",
  sums: "Sum",
} as const;

export interface BinWords {
  kind: string;
  name: string;
}

export function binWords(item: BinItem): BinWords {
  const kind = kinds[item.table];
  if (item.table !== "orders") return { kind, name: item.row.name || `${kind} without a name` };
  return { kind, name: orderName(item.row) };
}

const parentOf = (item: BinItem): string | null =>
  item.table === "wearers" || item.table === "orders"
    ? item.row.clientId
    : item.table === "sleeves"
      ? item.row.wearerId
      : item.table === "sums"
        ? item.row.orderId
        : null;

/**
 * What comes back together with a thing: first what it stands in and is in the bin too (an order its client), then the
 * orders that went in along with their client. The thing itself is among them.
 */
export function comesBack(item: BinItem, bin: readonly BinItem[]): BinItem[] {
  const back = [item];
  for (let parent = parentOf(item); parent !== null;) {
    const held = bin.find(({ row }) => row.id === parent);
    if (!held || back.includes(held)) break;
    back.unshift(held);
    parent = parentOf(held);
  }
  if (item.table === "clients") {
    const orders = bin.flatMap((other) => (other.table === "orders" ? [other] : []));
    const along = wentWithClient(
      item.row,
      orders.map(({ row }) => row),
    );
    back.push(...orders.filter(({ row }) => along.includes(row)));
  }
  return back;
}

/** "With it comes the client Ana."; empty where it comes alone. */
export function alongWords(all: readonly BinItem[], item: BinItem): string {
  const others = all.filter((other) => other !== item).map(binWords);
  if (others.length === 0) return "";
  const named = others.map(({ kind, name }) => `${kind.toLowerCase()} ${name}`);
  return `With it ${others.length === 1 ? "comes" : "come"} ${named.join(", ")}.`;
}

export function bringBack(items: readonly BinItem[]): Write[] {
  return items.map(({ table, row }) => setRemoved(table, row, null));
}
