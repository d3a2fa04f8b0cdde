import { groupBy } from "@/lib/collections";
import { type ManyWearer } from "@/lib/many/many-wearer";
import { type Rows } from "@/lib/journal/merge";
import { type Client, type Wearer } from "@/lib/records/types";
import { fold } from "@/lib/search/fold";
import { matchesAll } from "@/lib/search/match";
import { byKey, findRow, liveRowsOf, type Query, rowsOf } from "../query";
import { clientSearchText, latestSet } from "./clients";

/** A client's wearers to choose from, each with the newest set. */
export interface ManyClient {
  client: Client;
  wearers: ManyWearer[];
}

export interface ManyWearersView {
  items: ManyClient[];
  /** True where more clients match than were asked for. */
  more: boolean;
}

/** Wearers with their newest set, by client: found as one types, by the client's name or phone, or the wearer's name. */
export const manyWearersQuery: Query<{ find: string; limit: number }, ManyWearersView> = {
  name: "manyWearers",
  need: async (source, { find, limit }) => {
    const clients = await source.clientsFound(find, limit + 1);
    const wearers = await source.byParents(
      "wearers",
      "clientId",
      clients.map((row) => row.id),
    );
    const measurementSets = await source.byParents(
      "measurementSets",
      "wearerId",
      wearers.map((row) => row.id),
    );
    return { clients, wearers, measurementSets };
  },
  view: (rows, { find, limit }) => {
    const wearersOf = groupBy(liveRowsOf(rows, "wearers"), (wearer) => wearer.clientId);
    const found = liveRowsOf(rows, "clients")
      .map((client) => ({ client, wearers: (wearersOf.get(client.id) ?? []).sort(byKey((w) => w.id)) }))
      .filter((item) => matchesAll(clientSearchText(item.client, item.wearers), find))
      .sort((a, b) => byKey<Client>((client) => fold(client.name))(a.client, b.client));
    return {
      items: found
        .slice(0, limit)
        .map(({ client, wearers }) => ({ client, wearers: withSets(rows, wearers) })),
      more: found.length > limit,
    };
  },
};

/** The wearers chosen, in the order chosen, each with the newest set; those in the bin are left out. */
export const chosenWearersQuery: Query<{ ids: string[] }, ManyWearer[]> = {
  name: "chosenWearers",
  need: async (source, { ids }) => {
    const [wearers, measurementSets] = await Promise.all([
      source.byIds("wearers", ids),
      source.byParents("measurementSets", "wearerId", ids),
    ]);
    return { wearers, measurementSets };
  },
  view: (rows, { ids }) => {
    const chosen = ids.flatMap((id) => {
      const wearer = findRow(rows, "wearers", id);
      return wearer?.removedAt === null ? [wearer] : [];
    });
    return withSets(rows, chosen);
  },
};

function withSets(rows: Rows, wearers: readonly Wearer[]): ManyWearer[] {
  const setsOf = groupBy(rowsOf(rows, "measurementSets"), (set) => set.wearerId);
  return wearers.map((wearer) => ({ wearer, set: latestSet(setsOf.get(wearer.id) ?? []) }));
}
