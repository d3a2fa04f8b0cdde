import { groupBy } from "@/lib/collections";
import { wentWithClient } from "@/lib/clients/bin-question";
import { type Client, type MeasurementSet, type Order, type Sleeve, type Wearer } from "@/lib/records/types";
import { fold } from "@/lib/search/fold";
import { matchesAll, searchText } from "@/lib/search/match";
import { byKey, findRow, idsIn, liveRowsOf, newestFirst, type Query, rowsOf } from "../query";
import { moneyOf, type OrderWithMoney } from "./order-money";

/** What a client can be found by: the list and the databases use the same text. */
export function clientSearchText(client: Client, wearers: readonly Wearer[]): string {
  return searchText({
    name: client.name,
    phones: [client.phone, client.phoneE164 ?? ""],
    wearerNames: wearers.filter((wearer) => !wearer.removedAt).map((wearer) => wearer.name),
  });
}

export interface ClientListItem {
  client: Client;
  wearers: Wearer[];
}

export interface ClientListView {
  items: ClientListItem[];
  /** True where more clients match than were asked for. */
  more: boolean;
}

/** Clients by name, found as one types. */
export const clientListQuery: Query<{ find: string; limit: number }, ClientListView> = {
  name: "clientList",
  need: async (source, { find, limit }) => {
    const clients = await source.clientsFound(find, limit + 1);
    return {
      clients,
      wearers: await source.byParents(
        "wearers",
        "clientId",
        clients.map((row) => row.id),
      ),
    };
  },
  view: (rows, { find, limit }) => {
    const wearersOf = groupBy(liveRowsOf(rows, "wearers"), (wearer) => wearer.clientId);
    const found = liveRowsOf(rows, "clients")
      .map((client) => ({ client, wearers: (wearersOf.get(client.id) ?? []).sort(byKey((w) => w.id)) }))
      .filter((item) => matchesAll(clientSearchText(item.client, item.wearers), find))
      .sort((a, b) => byKey<Client>((client) => fold(client.name))(a.client, b.client));
    return { items: found.slice(0, limit), more: found.length > limit };
  },
};

export interface WearerSummary {
  wearer: Wearer;
  latestSet: MeasurementSet | null;
  sleeves: Sleeve[];
}

export interface ClientCardView {
  client: Client;
  wearers: WearerSummary[];
  orders: OrderWithMoney[];
  /** Where the client is in the bin: the orders that went in along with it. */
  binnedWith: Order[];
}

/** One client with wearers and orders; null where there is no such client. */
export const clientCardQuery: Query<{ id: string }, ClientCardView | null> = {
  name: "clientCard",
  need: async (source, { id }) => {
    const [clients, wearers, orders] = await Promise.all([
      source.byIds("clients", [id]),
      source.byParents("wearers", "clientId", [id]),
      source.byParents("orders", "clientId", [id]),
    ]);
    const wearerIds = wearers.map((row) => row.id);
    const orderIds = orders.map((row) => row.id);
    const [measurementSets, sleeves, priceLines, payments] = await Promise.all([
      source.byParents("measurementSets", "wearerId", wearerIds),
      source.byParents("sleeves", "wearerId", wearerIds),
      source.byParents("priceLines", "orderId", orderIds),
      source.byParents("payments", "orderId", orderIds),
    ]);
    return { clients, wearers, orders, measurementSets, sleeves, priceLines, payments };
  },
  view: (rows, { id }) => {
    const client = findRow(rows, "clients", id);
    if (!client) return null;
    const setsOf = groupBy(rowsOf(rows, "measurementSets"), (set) => set.wearerId);
    const sleevesOf = groupBy(liveRowsOf(rows, "sleeves"), (sleeve) => sleeve.wearerId);
    return {
      client,
      wearers: liveRowsOf(rows, "wearers")
        .filter((wearer) => wearer.clientId === id)
        .sort(byKey((wearer) => wearer.id))
        .map((wearer) => ({
          wearer,
          latestSet: latestSet(setsOf.get(wearer.id) ?? []),
          sleeves: (sleevesOf.get(wearer.id) ?? []).sort(newestFirst),
        })),
      orders: liveRowsOf(rows, "orders")
        .filter((order) => order.clientId === id)
        .sort(newestFirst)
        .map((order) => moneyOf(rows, order)),
      binnedWith: wentWithClient(client, rowsOf(rows, "orders")),
    };
  },
};

/** The set to work by: the last day's, and of one day the last made; sets that were put right do not count. */
export function latestSet(sets: readonly MeasurementSet[]): MeasurementSet | null {
  return standingSets(sets)[0] ?? null;
}

/** Sets that no later one puts right, newest first. */
export function standingSets(sets: readonly MeasurementSet[]): MeasurementSet[] {
  const corrected = new Set(idsIn(sets as unknown as Parameters<typeof idsIn>[0], "correctsId"));
  return sets
    .filter((set) => !corrected.has(set.id))
    .sort(byKey((set) => set.takenOn))
    .reverse();
}
