import { type Client, type MeasurementSet, type Sleeve, type Wearer } from "@/lib/records/types";
import { byKey, findRow, idsIn, liveRowsOf, newestFirst, type Query, rowsOf } from "../query";
import { standingSets } from "./clients";

export interface WearerCardView {
  wearer: Wearer;
  client: Client | null;
  /** Sets to work by, newest first. */
  sets: MeasurementSet[];
  /** Every set ever taken, newest first, those put right too. */
  allSets: MeasurementSet[];
  sleeves: Sleeve[];
}

/** One wearer with every set and sleeve; null where there is no such wearer. */
export const wearerCardQuery: Query<{ id: string }, WearerCardView | null> = {
  name: "wearerCard",
  need: async (source, { id }) => {
    const wearers = await source.byIds("wearers", [id]);
    const [clients, measurementSets, sleeves] = await Promise.all([
      source.byIds("clients", idsIn(wearers, "clientId")),
      source.byParents("measurementSets", "wearerId", [id]),
      source.byParents("sleeves", "wearerId", [id]),
    ]);
    return { wearers, clients, measurementSets, sleeves };
  },
  view: (rows, { id }) => {
    const wearer = findRow(rows, "wearers", id);
    if (!wearer) return null;
    const sets = rowsOf(rows, "measurementSets").filter((set) => set.wearerId === id);
    return {
      wearer,
      client: findRow(rows, "clients", wearer.clientId),
      sets: standingSets(sets),
      allSets: sets.sort(byKey((set) => set.takenOn)).reverse(),
      sleeves: liveRowsOf(rows, "sleeves")
        .filter((sleeve) => sleeve.wearerId === id)
        .sort(newestFirst),
    };
  },
};

export interface SetCardView {
  set: MeasurementSet;
  wearer: Wearer | null;
  client: Client | null;
  /** The set that puts this one right, if there is one. */
  correctedBy: MeasurementSet | null;
  /** The set that this one puts right. */
  corrects: MeasurementSet | null;
}

/** One measurement set; null where there is no such set. */
export const setCardQuery: Query<{ id: string }, SetCardView | null> = {
  name: "setCard",
  need: async (source, { id }) => {
    const measurementSets = await source.byIds("measurementSets", [id]);
    const wearers = await source.byIds("wearers", idsIn(measurementSets, "wearerId"));
    const [clients, siblings] = await Promise.all([
      source.byIds("clients", idsIn(wearers, "clientId")),
      source.byParents("measurementSets", "wearerId", wearers.map((row) => row.id)),
    ]);
    return { measurementSets: siblings, wearers, clients };
  },
  view: (rows, { id }) => {
    const set = findRow(rows, "measurementSets", id);
    if (!set) return null;
    const wearer = findRow(rows, "wearers", set.wearerId);
    return {
      set,
      wearer,
      client: findRow(rows, "clients", wearer?.clientId ?? null),
      correctedBy: rowsOf(rows, "measurementSets").find((other) => other.correctsId === id) ?? null,
      corrects: findRow(rows, "measurementSets", set.correctsId),
    };
  },
};
