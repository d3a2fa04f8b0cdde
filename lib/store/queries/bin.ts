import { type RowOf, type TableName } from "@/lib/records/types";
import { compareText, type Query, rowsOf } from "../query";

export const binTables = [
  "clients",
  "wearers",
  "orders",
  "sleeves",
  "sums",
] as const satisfies readonly TableName[];
export type BinTable = (typeof binTables)[number];

export type BinItem = { [T in BinTable]: { table: T; row: RowOf<T> } }[BinTable];

const LIMIT = 200;

/** What is in the bin, last thrown first. */
export const binQuery: Query<Record<string, never>, BinItem[]> = {
  name: "bin",
  need: async (source) => {
    const [clients, wearers, orders, sleeves, sums] = await Promise.all(
      binTables.map((table) => source.binned(table, LIMIT)),
    );
    return { clients, wearers, orders, sleeves, sums };
  },
  view: (rows) =>
    binTables
      .flatMap((table) =>
        rowsOf(rows, table)
          .filter((row) => row.removedAt !== null)
          .map((row) => ({ table, row }) as BinItem),
      )
      .sort((a, b) => compareText(b.row.removedAt!, a.row.removedAt!) || compareText(a.row.id, b.row.id))
      .slice(0, LIMIT),
};
