import { type Client, type MeasurementSet, type Sleeve, type Wearer } from "@/lib/records/types";
import { type AnyRow, type Rows } from "@/lib/journal/merge";
import { findRow, idsIn, liveRowsOf, newestFirst, type Query, type RowSource } from "../query";

export interface SleeveView {
  sleeve: Sleeve;
  wearer: Wearer | null;
  client: Client | null;
  set: MeasurementSet | null;
}

async function withPeople(source: RowSource, sleeves: AnyRow[]): Promise<Rows> {
  const [wearers, measurementSets] = await Promise.all([
    source.byIds("wearers", idsIn(sleeves, "wearerId")),
    source.byIds("measurementSets", idsIn(sleeves, "setId")),
  ]);
  return {
    sleeves,
    wearers,
    measurementSets,
    clients: await source.byIds("clients", idsIn(wearers, "clientId")),
  };
}

function sleeveView(rows: Rows, sleeve: Sleeve): SleeveView {
  const wearer = findRow(rows, "wearers", sleeve.wearerId);
  return {
    sleeve,
    wearer,
    client: findRow(rows, "clients", wearer?.clientId ?? null),
    set: findRow(rows, "measurementSets", sleeve.setId),
  };
}

/** Sleeves, newest first. */
export const sleeveListQuery: Query<{ limit: number }, { items: SleeveView[]; more: boolean }> = {
  name: "sleeveList",
  need: async (source, { limit }) => withPeople(source, await source.newest("sleeves", limit + 1)),
  view: (rows, { limit }) => {
    const sleeves = liveRowsOf(rows, "sleeves").sort(newestFirst);
    return {
      items: sleeves.slice(0, limit).map((sleeve) => sleeveView(rows, sleeve)),
      more: sleeves.length > limit,
    };
  },
};

/** The sleeves asked for, in the order asked; those that are not there are left out. */
export const sleevesQuery: Query<{ ids: string[] }, SleeveView[]> = {
  name: "sleeves",
  need: async (source, { ids }) => withPeople(source, await source.byIds("sleeves", ids)),
  view: (rows, { ids }) =>
    ids.flatMap((id) => {
      const sleeve = findRow(rows, "sleeves", id);
      return sleeve ? [sleeveView(rows, sleeve)] : [];
    }),
};
