import { groupBy } from "@/lib/collections";
import { type Rows } from "@/lib/journal/merge";
import {
  type Client,
  type Garment,
  type MeasurementSet,
  type Order,
  type Receipt,
  type Sleeve,
  type Sum,
  type Wearer,
} from "@/lib/records/types";
import { byKey, findRow, idsIn, liveRowsOf, newestFirst, type Query, type RowSource, rowsOf } from "../query";
import { standingSets, type WearerSummary } from "./clients";
import { moneyOf, type OrderWithMoney } from "./order-money";

export interface OrderListItem extends OrderWithMoney {
  client: Client | null;
  garments: Garment[];
  wearers: Wearer[];
}

/** Adds what a list shows of orders: client, garments, wearers, money. */
export async function withOrderParts(source: RowSource, orders: Rows["orders"] = []): Promise<Rows> {
  const ids = orders.map((row) => row.id);
  const [clients, garments, priceLines, payments] = await Promise.all([
    source.byIds("clients", idsIn(orders, "clientId")),
    source.byParents("garments", "orderId", ids),
    source.byParents("priceLines", "orderId", ids),
    source.byParents("payments", "orderId", ids),
  ]);
  const wearers = await source.byIds("wearers", idsIn(garments, "wearerId"));
  return { orders, clients, garments, wearers, priceLines, payments };
}

/** Makes list items of many orders, each table read once. */
export function orderItems(rows: Rows, orders: readonly Order[]): OrderListItem[] {
  const wanted = new Set(orders.map((order) => order.id));
  const clients = new Map(rowsOf(rows, "clients").map((row) => [row.id, row]));
  const wearers = new Map(rowsOf(rows, "wearers").map((row) => [row.id, row]));
  const ofOrder = <T extends { orderId: string }>(items: T[]) =>
    groupBy(
      items.filter((item) => wanted.has(item.orderId)),
      (item) => item.orderId,
    );
  const garments = ofOrder(liveRowsOf(rows, "garments"));
  const lines = ofOrder(liveRowsOf(rows, "priceLines"));
  const payments = ofOrder(rowsOf(rows, "payments"));
  return orders.map((order) => {
    const mine = (garments.get(order.id) ?? []).sort(byPosition);
    const money = {
      priceLines: lines.get(order.id) ?? [],
      payments: payments.get(order.id) ?? [],
    } as unknown as Rows;
    return {
      ...moneyOf(money, order),
      client: clients.get(order.clientId) ?? null,
      garments: mine,
      wearers: [...new Set(mine.map((garment) => garment.wearerId))].flatMap((id) => {
        const wearer = id === null ? undefined : wearers.get(id);
        return wearer ? [wearer] : [];
      }),
    };
  });
}

function byPosition(a: Garment, b: Garment): number {
  return a.position - b.position || byKey<Garment>((garment) => garment.id)(a, b);
}

/** Open orders stand by due day, those with none last; the key sorts as text. */
export const dueKey = (order: Order): string => order.dueOn ?? "9999-12-31";

export type OrderListShow = "open" | "owing" | "all";

export interface OrderListView {
  items: OrderListItem[];
  more: boolean;
}

/** Orders: the open ones by due day, those with money to come, or all, newest first. */
export const orderListQuery: Query<{ show: OrderListShow; limit: number }, OrderListView> = {
  name: "orderList",
  need: async (source, { show, limit }) => {
    const orders =
      show === "open"
        ? await source.ordersOpen(limit + 1)
        : show === "owing"
          ? await source.ordersOwing(limit + 1)
          : await source.newest("orders", limit + 1);
    return withOrderParts(source, orders);
  },
  view: (rows, { show, limit }) => {
    const live = liveRowsOf(rows, "orders");
    if (show === "owing") {
      const owing = orderItems(rows, live)
        .filter((item) => item.sums.balanceMinor !== 0)
        .sort((a, b) => byKey<Order>((order) => order.agreedOn)(a.order, b.order));
      return { items: owing.slice(0, limit), more: owing.length > limit };
    }
    const orders =
      show === "open"
        ? live.filter((order) => order.stage !== "handed-over").sort(byKey(dueKey))
        : live.sort(newestFirst);
    return { items: orderItems(rows, orders.slice(0, limit)), more: orders.length > limit };
  },
};

export interface OrderCardView extends OrderListItem {
  receipts: Receipt[];
  /** Everyone whom this client orders for, with their standing sets and sleeves to choose from. */
  clientWearers: Wearer[];
  sets: MeasurementSet[];
  sleeves: Sleeve[];
  /** Sewing sums put on it, as they were made. */
  sewingSums: Sum[];
}

/** One order with everything on it; null where there is no such order. */
export const orderCardQuery: Query<{ id: string }, OrderCardView | null> = {
  name: "orderCard",
  need: async (source, { id }) => {
    const orders = await source.byIds("orders", [id]);
    const [parts, receipts, sums, clientWearers] = await Promise.all([
      withOrderParts(source, orders),
      source.byParents("receipts", "orderId", [id]),
      source.byParents("sums", "orderId", [id]),
      source.byParents("wearers", "clientId", idsIn(orders, "clientId")),
    ]);
    const known = new Set(clientWearers.map((row) => row.id));
    const wearers = [...clientWearers, ...(parts.wearers ?? []).filter((row) => !known.has(row.id))];
    const wearerIds = wearers.map((row) => row.id);
    const [measurementSets, sleeves, bareSleeves] = await Promise.all([
      source.byParents("measurementSets", "wearerId", wearerIds),
      source.byParents("sleeves", "wearerId", wearerIds),
      source.byIds("sleeves", idsIn(parts.garments ?? [], "sleeveId")),
    ]);
    const drawn = new Map([...sleeves, ...bareSleeves].map((row) => [row.id, row]));
    return { ...parts, receipts, sums, wearers, measurementSets, sleeves: [...drawn.values()] };
  },
  view: (rows, { id }) => {
    const order = findRow(rows, "orders", id);
    if (!order) return null;
    const [item] = orderItems(rows, [order]);
    return {
      ...item!,
      receipts: rowsOf(rows, "receipts")
        .filter((receipt) => receipt.orderId === id)
        .sort(byKey((receipt) => receipt.id)),
      clientWearers: liveRowsOf(rows, "wearers")
        .filter((wearer) => wearer.clientId === order.clientId)
        .sort(byKey((wearer) => wearer.id)),
      sets: rowsOf(rows, "measurementSets").sort(newestFirst),
      sleeves: liveRowsOf(rows, "sleeves").sort(newestFirst),
      sewingSums: liveRowsOf(rows, "sums")
        .filter((sum) => sum.orderId === id)
        .sort(byKey((sum) => sum.id)),
    };
  },
};

export interface ReceiptView {
  receipt: Receipt;
  order: Order | null;
  client: Client | null;
}

/** One receipt; null where there is no such receipt. */
export const receiptQuery: Query<{ id: string }, ReceiptView | null> = {
  name: "receipt",
  need: async (source, { id }) => {
    const receipts = await source.byIds("receipts", [id]);
    const orders = await source.byIds("orders", idsIn(receipts, "orderId"));
    return { receipts, orders, clients: await source.byIds("clients", idsIn(orders, "clientId")) };
  },
  view: (rows, { id }) => {
    const receipt = findRow(rows, "receipts", id);
    if (!receipt) return null;
    const order = findRow(rows, "orders", receipt.orderId);
    return { receipt, order, client: findRow(rows, "clients", order?.clientId ?? null) };
  },
};

export interface WearerChoice extends WearerSummary {
  /** Sets to work by, newest first. */
  sets: MeasurementSet[];
}

export interface OrderPeopleView {
  client: Client;
  wearers: WearerChoice[];
  /** Sleeves of nobody yet, among the last drafted. */
  bareSleeves: Sleeve[];
}

const LAST_SLEEVES = 50;

/** Whom and what an order of a client can be made of; null where there is no such client. */
export const orderPeopleQuery: Query<{ clientId: string }, OrderPeopleView | null> = {
  name: "orderPeople",
  need: async (source, { clientId }) => {
    const [clients, wearers, newest] = await Promise.all([
      source.byIds("clients", [clientId]),
      source.byParents("wearers", "clientId", [clientId]),
      source.newest("sleeves", LAST_SLEEVES),
    ]);
    const ids = wearers.map((row) => row.id);
    const [measurementSets, own] = await Promise.all([
      source.byParents("measurementSets", "wearerId", ids),
      source.byParents("sleeves", "wearerId", ids),
    ]);
    const sleeves = new Map([...newest, ...own].map((row) => [row.id, row]));
    return { clients, wearers, measurementSets, sleeves: [...sleeves.values()] };
  },
  view: (rows, { clientId }) => {
    const client = findRow(rows, "clients", clientId);
    if (!client) return null;
    const setsOf = groupBy(rowsOf(rows, "measurementSets"), (set) => set.wearerId);
    const sleeves = liveRowsOf(rows, "sleeves").sort(newestFirst);
    return {
      client,
      wearers: liveRowsOf(rows, "wearers")
        .filter((wearer) => wearer.clientId === clientId)
        .sort(byKey((wearer) => wearer.id))
        .map((wearer) => {
          const sets = standingSets(setsOf.get(wearer.id) ?? []);
          return {
            wearer,
            sets,
            latestSet: sets[0] ?? null,
            sleeves: sleeves.filter((sleeve) => sleeve.wearerId === wearer.id),
          };
        }),
      bareSleeves: sleeves.slice(0, LAST_SLEEVES).filter((sleeve) => sleeve.wearerId === null),
    };
  },
};
