/** What reading a copy in would do to the present book, decided before anything is touched. */
import { type RowChange } from "@/lib/journal/change";
import { type AnyRow, type Rows } from "@/lib/journal/merge";
import { type TableName, tableNames } from "@/lib/records/types";
import { type SavedCopy } from "./saved-copy";

export interface PresentBook {
  workshopId: string;
  rows: Rows;
}

export interface ReadingPlan {
  /** "empty": nothing is in the way. "same": the two are merged. "other": the present book has to go first. */
  kind: "empty" | "same" | "other";
  /** Entries that are not in the present book, that have later words in them, and that change nothing. */
  counts: { fresh: number; changed: number; same: number };
  /** What has to be kept, with the stamps it has. */
  rows: RowChange[];
}

/**
 * A row of a copy as a change to what is held: its fields with a later stamp. (The same stamp is the same writing,
 * even where two stores give its members in another order.) Null where the copy has nothing later.
 */
function laterFields(table: TableName, row: AnyRow, held?: AnyRow): RowChange | null {
  const fields = Object.entries(row.stamps)
    .filter(([name, stamp]) => stamp > (held?.stamps[name] ?? ""))
    .map(([name, stamp]) => [name, { value: row[name] ?? null, stamp, base: held?.stamps[name] ?? null }]);
  if (held && fields.length === 0) return null;
  return { table, id: row.id, makes: !held, fields: Object.fromEntries(fields) as RowChange["fields"] };
}

export function planReading(copy: SavedCopy, present: PresentBook): ReadingPlan {
  const isEmpty = tableNames.every((name) => (present.rows[name] ?? []).length === 0);
  const kind = present.workshopId === copy.workshop.id ? "same" : isEmpty ? "empty" : "other";
  const counts = { fresh: 0, changed: 0, same: 0 };
  const rows: RowChange[] = [];
  for (const table of tableNames) {
    const held = new Map<string, AnyRow>();
    if (kind === "same") for (const row of present.rows[table] ?? []) held.set(row.id, row);
    for (const row of copy.tables[table] as unknown as AnyRow[]) {
      const before = held.get(row.id);
      const change = laterFields(table, row, before);
      counts[!before ? "fresh" : change ? "changed" : "same"]++;
      if (change) rows.push(change);
    }
  }
  return { kind, counts, rows };
}
