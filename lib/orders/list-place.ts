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

const kinds: Record<OrderListShow, string> = {
  open: " not handed over, the soonest due first",
  owing: " with money to come or to give back, the oldest first",
  all: ", the newest first",
};

/** How many stand on the list, for the eye and for a screen reader. */
export function ordersCountWords(show: OrderListShow, shown: number, more: boolean): string {
  return `${more ? "The first " : ""}${shown} ${shown === 1 ? "order" : "orders"}${kinds[show]}`;
}
