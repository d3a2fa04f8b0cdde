import { type OrderListShow } from "@/lib/store/queries/orders";

/** Where the list of orders was left: which ones, and how many were shown. */
export interface OrdersPlace {
  show: OrderListShow;
  limit: number;
}

export const PAGE = 30;

export const isShow = (value: unknown): value is OrderListShow =>
  value === "open" || value === "owing" || value === "all";

/** Reads a place that was put down as JSON; anything else is the head of the open ones. */
export function readOrdersPlace(json: string | null): OrdersPlace {
  const head: OrdersPlace = { show: "open", limit: PAGE };
  if (json === null) return head;
  try {
    const { show, limit } = JSON.parse(json) as Partial<OrdersPlace>;
    return {
      show: isShow(show) ? show : head.show,
      limit: Number.isSafeInteger(limit) && limit! > PAGE ? limit! : PAGE,
    };
  } catch {
    return head;
  }
}

const kinds: Record<OrderListShow, { what: string; by: string }> = {
  open: { what: " not handed over", by: ", the soonest due first" },
  owing: { what: " with money to come or to give back", by: ", the oldest first" },
  all: { what: "", by: ", the newest first" },
};

/** How many stand on the list, for the eye and for a screen reader. */
export function ordersCountWords(show: OrderListShow, shown: number, more: boolean): string {
  const { what, by } = kinds[show];
  if (shown === 1) return `1 order${what}`;
  return `${more ? "The first " : ""}${shown} orders${what}${by}`;
}
