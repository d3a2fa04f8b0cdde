import {
  type Client,
  type Garment,
  type MeasurementSet,
  type Order,
  type Sleeve,
  type Wearer,
} from "@/lib/records/types";
import { type Rows } from "@/lib/journal/merge";
import { byKey, findRow, idsIn, liveRowsOf, newestFirst, type Query, rowsOf } from "../query";
import { standingSets } from "./clients";
import { dueKey } from "./orders";

export interface WearerCardView {
  wearer: Wearer;
  client: Client | null;
  /** Sets to work by, newest first. */
  sets: MeasurementSet[];
  /** Every set ever taken, newest first, those put right too. */
  allSets: MeasurementSet[];
  sleeves: Sleeve[];
  /** Garments of orders that are not handed over, the soonest due first. */
  openGarments: { garment: Garment; order: Order }[];
}

/** One wearer with every set and sleeve; null where there is no such wearer. */
export const wearerCardQuery: Query<{ id: string }, WearerCardView | null> = {
  name: "wearerCard",
  need: async (source, { id }) => {
    const wearers = await source.byIds("wearers", [id]);
    const [clients, measurementSets, sleeves, garments] = await Promise.all([
      source.byIds("clients", idsIn(wearers, "clientId")),
      source.byParents("measurementSets", "wearerId", [id]),
      source.byParents("sleeves", "wearerId", [id]),
      source.byParents("garments", "wearerId", [id]),
    ]);
    const orders = await source.byIds("orders", idsIn(garments, "orderId"));
    return { wearers, clients, measurementSets, sleeves, garments, orders };
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
      openGarments: openGarments(rows, id),
    };
  },
};

function openGarments(rows: Rows, wearerId: string): WearerCardView["openGarments"] {
  return liveRowsOf(rows, "garments")
    .flatMap((garment) => {
      const order = garment.wearerId === wearerId ? findRow(rows, "orders", garment.orderId) : null;
      return order && order.removedAt === null && order.stage !== "handed-over" ? [{ garment, order }] : [];
    })
    .sort(
      (a, b) =>
        byKey(dueKey)(a.order, b.order) || byKey<Garment>((garment) => garment.id)(a.garment, b.garment),
    );
}

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
      source.byParents(
        "measurementSets",
        "wearerId",
        wearers.map((row) => row.id),
      ),
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
