/** `RowSource` over plain rows in memory: the plainest reading of its words, to hold databases against. */
import { type AnyRow, type Rows } from "@/lib/journal/merge";
import { orderSums } from "@/lib/money/order-sums";
import { type Client, type Order, type TableName } from "@/lib/records/types";
import { fold } from "@/lib/search/fold";
import { matchesAll } from "@/lib/search/match";
import { byKey, compareText, liveRowsOf, newestFirst, type RowSource, rowsOf } from "@/lib/store/query";
import { clientSearchText } from "@/lib/store/queries/clients";
import { dueKey } from "@/lib/store/queries/orders";

export function memorySource(rows: Rows): RowSource {
  const all = (table: TableName): AnyRow[] => rows[table] ?? [];
  const asRows = (found: unknown[]) => Promise.resolve(found as AnyRow[]);
  const live = (table: TableName) => all(table).filter((row) => row.removedAt === null);
  return {
    workshop: () => asRows(all("workshops")),
    byIds: (table, ids) => asRows(all(table).filter((row) => ids.includes(row.id))),
    byParents: (table, column, ids) =>
      asRows(all(table).filter((row) => ids.includes(row[column] as string))),
    newest: (table, limit) => asRows(live(table).sort(newestFirst).slice(0, limit)),
    binned: (table, limit) =>
      asRows(
        all(table)
          .filter((row) => row.removedAt !== null)
          .sort((a, b) => compareText(b.removedAt!, a.removedAt!) || compareText(a.id, b.id))
          .slice(0, limit),
      ),
    clientsFound: (find, limit) =>
      asRows(
        liveRowsOf(rows, "clients")
          .filter((client) => {
            const wearers = rowsOf(rows, "wearers").filter((wearer) => wearer.clientId === client.id);
            return matchesAll(clientSearchText(client, wearers), find);
          })
          .sort(byKey<Client>((client) => fold(client.name)))
          .slice(0, limit),
      ),
    ordersOpen: (limit) =>
      asRows(
        liveRowsOf(rows, "orders")
          .filter((order) => order.stage !== "handed-over")
          .sort(byKey(dueKey))
          .slice(0, limit),
      ),
    ordersOwing: (limit) =>
      asRows(
        liveRowsOf(rows, "orders")
          .filter((order) => {
            const lines = liveRowsOf(rows, "priceLines").filter((line) => line.orderId === order.id);
            const payments = rowsOf(rows, "payments").filter((payment) => payment.orderId === order.id);
            return orderSums(lines, payments).balanceMinor !== 0;
          })
          .sort(byKey<Order>((order) => order.agreedOn))
          .slice(0, limit),
      ),
  };
}
