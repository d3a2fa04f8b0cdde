/** `RowSource` on any of our databases, by Drizzle. */
import { and, asc, desc, eq, inArray, isNotNull, isNull, ne, sql } from "drizzle-orm";
import { validate as isUuid } from "uuid";
import { type PgColumn, type PgTable } from "drizzle-orm/pg-core";
import { type AnyRow } from "@/lib/journal/merge";
import { type TableName } from "@/lib/records/types";
import { matchesAll } from "@/lib/search/match";
import { type RowSource } from "@/lib/store/query";
import { type BookDatabase } from "./apply";
import { bookTables, clientIndex, clients, orders, orderSums } from "./schema";

export function drizzleSource(db: BookDatabase, workshopId: string): RowSource {
  const tableOf = (name: TableName) =>
    bookTables[name] as PgTable & Record<"workshopId" | "id" | "removedAt", PgColumn>;
  const of = (name: TableName) => eq(tableOf(name).workshopId, workshopId);
  const rows = (found: Promise<unknown>) => found as Promise<AnyRow[]>;

  return {
    workshop: () => rows(db.select().from(bookTables.workshops).where(of("workshops")).then()),
    byIds: async (name, asked) => {
      const ids = asked.filter((id) => isUuid(id));
      if (ids.length === 0) return [];
      const table = tableOf(name);
      return rows(
        db
          .select()
          .from(table)
          .where(and(of(name), inArray(table.id, ids)))
          .then(),
      );
    },
    byParents: async (name, column, asked) => {
      const ids = asked.filter((id) => isUuid(id));
      if (ids.length === 0) return [];
      const table = tableOf(name);
      const parent = (table as unknown as Record<string, PgColumn | undefined>)[column];
      if (!parent) throw new Error(`${name} has no column ${column}`);
      return rows(
        db
          .select()
          .from(table)
          .where(and(of(name), inArray(parent, ids)))
          .then(),
      );
    },
    newest: (name, limit) => {
      const table = tableOf(name);
      return rows(
        db
          .select()
          .from(table)
          .where(and(of(name), isNull(table.removedAt)))
          .orderBy(desc(table.id))
          .limit(limit)
          .then(),
      );
    },
    binned: (name, limit) => {
      const table = tableOf(name);
      return rows(
        db
          .select()
          .from(table)
          .where(and(of(name), isNotNull(table.removedAt)))
          .orderBy(desc(table.removedAt), asc(table.id))
          .limit(limit)
          .then(),
      );
    },
    clientsFound: async (find, limit) => {
      const inBook = and(eq(clientIndex.workshopId, workshopId), eq(clientIndex.removed, false));
      const byName = [sql`${clientIndex.sortKey} collate "C"`, asc(clientIndex.clientId)];
      const index = db
        .select({ id: clientIndex.clientId, text: clientIndex.text })
        .from(clientIndex)
        .where(inBook)
        .orderBy(...byName);
      // The words are matched by the same function that the screen uses; a few thousand short texts are soon read.
      const found =
        find.trim() === ""
          ? await index.limit(limit)
          : (await index).filter(({ text }) => matchesAll(text, find)).slice(0, limit);
      if (found.length === 0) return [];
      const ids = found.map(({ id }) => id);
      return rows(
        db
          .select()
          .from(clients)
          .where(and(of("clients"), inArray(clients.id, ids)))
          .then(),
      );
    },
    ordersOpen: (limit) =>
      rows(
        db
          .select()
          .from(orders)
          .where(and(of("orders"), isNull(orders.removedAt), ne(orders.stage, "handed-over")))
          .orderBy(sql`${orders.dueOn} asc nulls last`, asc(orders.id))
          .limit(limit)
          .then(),
      ),
    ordersOwing: async (limit) => {
      const found = await db
        .select({ order: orders })
        .from(orderSums)
        .innerJoin(orders, and(eq(orders.workshopId, orderSums.workshopId), eq(orders.id, orderSums.orderId)))
        .where(
          and(eq(orderSums.workshopId, workshopId), ne(orderSums.balanceMinor, 0), isNull(orders.removedAt)),
        )
        .orderBy(asc(orders.agreedOn), asc(orders.id))
        .limit(limit);
      return found.map(({ order }) => order as unknown as AnyRow);
    },
  };
}
