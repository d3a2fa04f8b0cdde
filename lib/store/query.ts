/**
 * A query in two halves. `need` fetches, from a database, rows enough for the view; `view` makes what a screen
 * shows out of rows, and is right for any rows that hold at least the needed ones. So changes that the database
 * has not got yet are laid over the rows (`overlay`), and the same view is right at once: before the database
 * has opened, and while it catches up.
 */
import { type AnyRow, type Rows } from "@/lib/journal/merge";
import { type RowOf, type TableName } from "@/lib/records/types";

/** What a database must be able to find. Rows of one workshop only; binned rows too unless said otherwise. */
export interface RowSource {
  workshop(): Promise<AnyRow[]>;
  byIds(table: TableName, ids: readonly string[]): Promise<AnyRow[]>;
  /** Rows whose `column` (an id of a parent) is one of `ids`. */
  byParents(table: TableName, column: string, ids: readonly string[]): Promise<AnyRow[]>;
  /** The newest rows that are not in the bin. */
  newest(table: TableName, limit: number): Promise<AnyRow[]>;
  /** Rows in the bin, newest first. */
  binned(table: TableName, limit: number): Promise<AnyRow[]>;
  /** Clients not in the bin that match all words of `find`, by name. */
  clientsFound(find: string, limit: number): Promise<AnyRow[]>;
  /** Orders not in the bin and not handed over, by due day; those with no day last. */
  ordersOpen(limit: number): Promise<AnyRow[]>;
  /** Orders not in the bin with money to come in or to give back, oldest first. */
  ordersOwing(limit: number): Promise<AnyRow[]>;
}

export interface Query<A, V> {
  name: string;
  need(source: RowSource, args: A): Promise<Rows>;
  view(rows: Rows, args: A): V;
}

/** Rows of one table, typed. */
export function rowsOf<T extends TableName>(rows: Rows, table: T): RowOf<T>[] {
  return (rows[table] ?? []) as unknown as RowOf<T>[];
}

/** Rows of one table that are not in the bin. */
export function liveRowsOf<T extends TableName>(rows: Rows, table: T): RowOf<T>[] {
  return rowsOf(rows, table).filter((row) => row.removedAt === null);
}

export function findRow<T extends TableName>(rows: Rows, table: T, id: string | null): RowOf<T> | null {
  return id === null ? null : (rowsOf(rows, table).find((row) => row.id === id) ?? null);
}

/** The ids in one column of rows, without empty ones, each once. */
export function idsIn(rows: readonly AnyRow[], column: string): string[] {
  const ids = new Set<string>();
  for (const row of rows) {
    const id = row[column];
    if (typeof id === "string" && id !== "") ids.add(id);
  }
  return [...ids];
}

/** Orders by text, then by id, so that two databases sort alike. */
export function byKey<T extends { id: string }>(keyOf: (item: T) => string): (a: T, b: T) => number {
  return (a, b) => compareText(keyOf(a), keyOf(b)) || compareText(a.id, b.id);
}

/** Compares by code unit, as PostgreSQL's "C" collation does for folded text. */
export function compareText(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}

/** Newest first: UUIDv7 sorts by the time it was made. */
export function newestFirst<T extends { id: string }>(a: T, b: T): number {
  return compareText(b.id, a.id);
}
