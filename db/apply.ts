/**
 * Brings a database up to a run of changes, in one transaction: rows merged field by field, what is worked out
 * from them, and how far the database has come. Applying a change again has no effect (sync contract P2).
 */
import { and, count, eq, inArray, sql } from "drizzle-orm";
import { type PgDatabase, type PgQueryResultHKT, type PgTable } from "drizzle-orm/pg-core";
import { type Change } from "@/lib/journal/change";
import { type AnyRow, mergeRow } from "@/lib/journal/merge";
import { orderSums as sumOrder } from "@/lib/money/order-sums";
import {
  type Client,
  type Payment,
  type PriceLine,
  type TableName,
  tableNames,
  type Wearer,
} from "@/lib/records/types";
import { fold } from "@/lib/search/fold";
import { groupBy } from "@/lib/collections";
import { clientSearchText } from "@/lib/store/queries/clients";
import * as schema from "./schema";

export type BookDatabase = PgDatabase<PgQueryResultHKT, typeof schema>;

/** How many rows go into one statement: PostgreSQL takes 65 535 parameters at most. */
const ROWS_A_STATEMENT = 500;

/** What has to be worked out again, by workshop. */
class Touched {
  readonly tables = new Set<TableName>();
  readonly clients = new Map<string, Set<string>>();
  readonly orders = new Map<string, Set<string>>();

  note(name: TableName, row: AnyRow | undefined): void {
    if (!row) return;
    if (name === "clients") this.add(this.clients, row, row.id);
    if (name === "wearers") this.add(this.clients, row, (row as unknown as Wearer).clientId);
    if (name === "orders") this.add(this.orders, row, row.id);
    if (name === "priceLines" || name === "payments")
      this.add(this.orders, row, (row as unknown as PriceLine | Payment).orderId);
  }

  private add(to: Map<string, Set<string>>, row: AnyRow, id: string): void {
    const ids = to.get(row.workshopId) ?? new Set();
    to.set(row.workshopId, ids.add(id));
  }
}

async function inPieces<T>(items: readonly T[], run: (piece: T[]) => Promise<unknown>): Promise<void> {
  for (let i = 0; i < items.length; i += ROWS_A_STATEMENT) await run(items.slice(i, i + ROWS_A_STATEMENT));
}

async function mergeTable(
  db: BookDatabase,
  name: TableName,
  changes: readonly Change[],
  touched: Touched,
): Promise<number> {
  const table = schema.bookTables[name];
  const ids = new Set<string>();
  const workshopIds = new Set<string>();
  for (const change of changes)
    for (const row of change.rows)
      if (row.table === name) {
        ids.add(row.id);
        workshopIds.add(change.workshopId);
      }
  if (ids.size === 0) return 0;

  const held = new Map<string, AnyRow>();
  await inPieces([...ids], async (piece) => {
    const rows = await db
      .select()
      .from(table as PgTable)
      .where(and(inArray(table.workshopId, [...workshopIds]), inArray(table.id, piece)));
    for (const row of rows as AnyRow[]) held.set(row.id, row);
  });
  const before = held.size;
  const merged = new Map(held);
  for (const change of changes)
    for (const row of change.rows)
      if (row.table === name) merged.set(row.id, mergeRow(merged.get(row.id), row, change.workshopId));

  const changed = [...merged.values()].filter((row) => row !== held.get(row.id));
  if (changed.length > 0) {
    const set = Object.fromEntries(
      Object.entries(sqlColumns(table)).map(([key, column]) => [key, sql.raw(`excluded."${column}"`)]),
    );
    await inPieces(changed, (piece) =>
      db
        .insert(table as PgTable)
        .values(piece)
        .onConflictDoUpdate({ target: [table.workshopId, table.id], set }),
    );
    touched.tables.add(name);
    for (const row of changed) {
      touched.note(name, row);
      touched.note(name, held.get(row.id));
    }
  }
  return merged.size - before;
}

function sqlColumns(table: PgTable): Record<string, string> {
  const columns = (table as unknown as Record<symbol, Record<string, { name: string }>>)[
    Symbol.for("drizzle:Columns")
  ]!;
  return Object.fromEntries(
    Object.entries(columns)
      .filter(([key]) => key !== "workshopId" && key !== "id")
      .map(([key, column]) => [key, column.name]),
  );
}

async function workOutClients(db: BookDatabase, workshopId: string, ids: readonly string[]): Promise<void> {
  await inPieces(ids, async (piece) => {
    const clients = (await db
      .select()
      .from(schema.clients)
      .where(and(eq(schema.clients.workshopId, workshopId), inArray(schema.clients.id, piece)))) as Client[];
    const wearers = (await db
      .select()
      .from(schema.wearers)
      .where(
        and(eq(schema.wearers.workshopId, workshopId), inArray(schema.wearers.clientId, piece)),
      )) as Wearer[];
    if (clients.length === 0) return;
    const wearersOf = groupBy(wearers, (wearer) => wearer.clientId);
    await db
      .insert(schema.clientIndex)
      .values(
        clients.map((client) => ({
          workshopId,
          clientId: client.id,
          text: clientSearchText(client, wearersOf.get(client.id) ?? []),
          sortKey: fold(client.name),
          removed: client.removedAt !== null,
        })),
      )
      .onConflictDoUpdate({
        target: [schema.clientIndex.workshopId, schema.clientIndex.clientId],
        set: {
          text: sql`excluded.text`,
          sortKey: sql`excluded.sort_key`,
          removed: sql`excluded.removed`,
        },
      });
  });
}

async function workOutOrders(db: BookDatabase, workshopId: string, ids: readonly string[]): Promise<void> {
  await inPieces(ids, async (piece) => {
    const lines = (await db
      .select()
      .from(schema.priceLines)
      .where(
        and(eq(schema.priceLines.workshopId, workshopId), inArray(schema.priceLines.orderId, piece)),
      )) as PriceLine[];
    const payments = (await db
      .select()
      .from(schema.payments)
      .where(
        and(eq(schema.payments.workshopId, workshopId), inArray(schema.payments.orderId, piece)),
      )) as Payment[];
    const linesOf = groupBy(
      lines.filter((line) => !line.removedAt),
      (line) => line.orderId,
    );
    const paymentsOf = groupBy(payments, (payment) => payment.orderId);
    await db
      .insert(schema.orderSums)
      .values(
        piece.map((orderId) => {
          const sums = sumOrder(linesOf.get(orderId) ?? [], paymentsOf.get(orderId) ?? []);
          return { workshopId, orderId, totalMinor: sums.totalMinor, balanceMinor: sums.balanceMinor };
        }),
      )
      .onConflictDoUpdate({
        target: [schema.orderSums.workshopId, schema.orderSums.orderId],
        set: { totalMinor: sql`excluded.total_minor`, balanceMinor: sql`excluded.balance_minor` },
      });
  });
}

/**
 * Applies changes of one device, in their order, as one transaction. Changes that the database already holds
 * are passed over. Returns the tables in which something changed.
 */
export async function applyChanges(db: BookDatabase, changes: readonly Change[]): Promise<Set<TableName>> {
  const touched = new Touched();
  const last = changes.at(-1);
  if (!last) return touched.tables;
  await db.transaction(async (tx) => {
    const mark = await readMark(tx, last.device);
    const fresh = changes.filter((change) => change.number > mark.applied);
    if (fresh.length === 0) return;
    const counts = { ...mark.counts };
    for (const name of tableNames)
      counts[name] = (counts[name] ?? 0) + (await mergeTable(tx, name, fresh, touched));
    for (const [workshopId, ids] of touched.clients) await workOutClients(tx, workshopId, [...ids]);
    for (const [workshopId, ids] of touched.orders) await workOutOrders(tx, workshopId, [...ids]);
    await tx
      .insert(schema.journalMarks)
      .values({ device: last.device, applied: last.number, counts })
      .onConflictDoUpdate({
        target: schema.journalMarks.device,
        set: { applied: last.number, counts },
      });
  });
  return touched.tables;
}

export interface JournalMark {
  applied: number;
  counts: Record<string, number>;
}

/** How far this database has followed a device's journal. */
export async function readMark(db: BookDatabase, device: string): Promise<JournalMark> {
  const [mark] = await db.select().from(schema.journalMarks).where(eq(schema.journalMarks.device, device));
  return { applied: mark?.applied ?? 0, counts: mark?.counts ?? {} };
}

/** Throws where a table does not hold what it held after its last change: pages were lost under it. */
export async function checkCounts(db: BookDatabase, mark: JournalMark): Promise<void> {
  for (const name of tableNames) {
    // Summing the stamps' sizes makes PostgreSQL read each row whole, not just the index.
    const table = schema.bookTables[name];
    const [held] = await db
      .select({ rows: count(), bytes: sql<number>`coalesce(sum(length(${table.stamps}::text)), 0)` })
      .from(table as PgTable);
    const expected = mark.counts[name] ?? 0;
    if (held?.rows !== expected)
      throw new Error(`${name} holds ${held?.rows ?? 0} rows where ${expected} were kept`);
  }
}
