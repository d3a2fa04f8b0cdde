import {
  type Client,
  type Garment,
  type MeasurementSet,
  type Order,
  type Sleeve,
  type TableName,
  type RowOf,
} from "@/lib/records/types";
import { type Rows } from "@/lib/journal/merge";
import { byKey, compareText, liveRowsOf, newestFirst, type Query } from "../query";
import { dueKey, orderItems, type OrderListItem, withOrderParts } from "./orders";

export interface FittingItem extends OrderListItem {
  garment: Garment;
}

export interface TodayView {
  /** Past their day and not handed over. */
  late: OrderListItem[];
  /** Due today or in the next seven days. */
  due: OrderListItem[];
  /** Fittings from seven days back (not to be forgotten) to seven ahead. */
  fittings: FittingItem[];
  /** Handed over with money still to come, or money to give back. */
  owed: OrderListItem[];
  /** Open orders due later or with no day. */
  laterCount: number;
  /** False where there is not one order in the book. */
  anyOrder: boolean;
  /** The last made of each, or null: how far a new book has come. */
  newest: { client: Client | null; set: MeasurementSet | null; sleeve: Sleeve | null };
}

/** How many orders Today looks at; a home workshop has a few dozen open. */
const LIMIT = 200;
const DAYS = 7;

/** The ISO date `days` after `on`. */
export function addDays(on: string, days: number): string {
  return new Date(Date.parse(`${on}T00:00:00Z`) + days * 86_400_000).toISOString().slice(0, 10);
}

/** What today asks for. `on` is today's ISO date where she is. */
export const todayQuery: Query<{ on: string }, TodayView> = {
  name: "today",
  need: async (source) => {
    const [open, owing, newest, clients, measurementSets, sleeves] = await Promise.all([
      source.ordersOpen(LIMIT),
      source.ordersOwing(LIMIT),
      source.newest("orders", 1),
      source.newest("clients", 1),
      source.newest("measurementSets", 1),
      source.newest("sleeves", 1),
    ]);
    const orders = new Map([...open, ...owing, ...newest].map((row) => [row.id, row]));
    const parts = await withOrderParts(source, [...orders.values()]);
    const known = new Set((parts.clients ?? []).map((row) => row.id));
    return {
      ...parts,
      clients: [...(parts.clients ?? []), ...clients.filter((row) => !known.has(row.id))],
      measurementSets,
      sleeves,
    };
  },
  view: (rows, { on }) => {
    const live = liveRowsOf(rows, "orders");
    const open = live
      .filter((order) => order.stage !== "handed-over")
      .sort(byKey(dueKey))
      .slice(0, LIMIT);
    const soon = addDays(on, DAYS);
    const items = orderItems(rows, open);
    const late = items.filter(({ order }) => order.dueOn !== null && order.dueOn < on);
    const due = items.filter(({ order }) => order.dueOn !== null && order.dueOn >= on && order.dueOn <= soon);
    const back = addDays(on, -DAYS);
    const fittings = items
      .flatMap((item) => item.garments.map((garment) => ({ ...item, garment })))
      .filter(
        ({ garment }) => garment.fittingOn !== null && garment.fittingOn >= back && garment.fittingOn <= soon,
      )
      .sort(
        (a, b) =>
          compareText(a.garment.fittingOn!, b.garment.fittingOn!) || compareText(a.garment.id, b.garment.id),
      );
    const owed = orderItems(rows, live)
      .filter(({ sums }) => sums.balanceMinor !== 0)
      .sort((a, b) => byKey<Order>((order) => order.agreedOn)(a.order, b.order))
      .slice(0, LIMIT)
      .filter(({ order, sums }) => order.stage === "handed-over" || sums.balanceMinor < 0);
    return {
      late,
      due,
      fittings,
      owed,
      laterCount: items.length - late.length - due.length,
      anyOrder: live.length > 0,
      newest: {
        client: newestOf(rows, "clients"),
        set: newestOf(rows, "measurementSets"),
        sleeve: newestOf(rows, "sleeves"),
      },
    };
  },
};

/** Today as a query that does not name the day: what was fetched on another day shows at once on this one. */
export function todayOn(on: string): Query<Record<string, never>, TodayView> {
  return {
    name: todayQuery.name,
    need: (source) => todayQuery.need(source, { on }),
    view: (rows) => todayQuery.view(rows, { on }),
  };
}

function newestOf<T extends TableName>(rows: Rows, table: T): RowOf<T> | null {
  return liveRowsOf(rows, table).sort(newestFirst)[0] ?? null;
}
