/**
 * Merging a change into rows (sync contract P2): field by field, the later stamp stands. Commutative,
 * associative and idempotent, so that the same change may be applied any number of times, in any order.
 */
import { type RowHead, type TableName, tableNames } from "@/lib/records/types";
import { type Change, type FieldChange, type RowChange } from "./change";

export type AnyRow = RowHead & Record<string, unknown>;
/** Rows by table. Each row may be partial until the change that makes it has been merged. */
export type Rows = { [T in TableName]?: AnyRow[] };

/** The later stamp stands; with equal stamps, the greater value as text, so that order never matters. */
function wins(field: FieldChange, heldStamp: string | undefined, held: unknown): boolean {
  if (heldStamp === undefined || field.stamp > heldStamp) return true;
  if (field.stamp < heldStamp) return false;
  return JSON.stringify(field.value ?? null) > JSON.stringify(held ?? null);
}

/** The row after one row change. Gives back `held` itself where nothing changes. */
export function mergeRow(held: AnyRow | undefined, change: RowChange, workshopId: string): AnyRow {
  let next = held ?? { workshopId, id: change.id, stamps: {}, removedAt: null };
  for (const [name, field] of Object.entries(change.fields)) {
    if (!wins(field, next.stamps[name], next[name])) continue;
    next = { ...next, [name]: field.value, stamps: { ...next.stamps, [name]: field.stamp } };
  }
  return next;
}

/**
 * Rows with changes laid over them. A row that is only edited by the changes, and is not among the rows, is
 * left out: without the change that made it, it would be a torso.
 */
export function overlay(rows: Rows, changes: readonly Change[]): Rows {
  if (changes.length === 0) return rows;
  const tables = new Map<TableName, Map<string, AnyRow>>();
  const torsos = new Map<AnyRow["id"], TableName>();
  for (const change of changes) {
    for (const rowChange of change.rows) {
      let table = tables.get(rowChange.table);
      if (!table) {
        table = new Map((rows[rowChange.table] ?? []).map((row) => [row.id, row]));
        tables.set(rowChange.table, table);
      }
      const held = table.get(rowChange.id);
      if (!held && !rowChange.makes) torsos.set(rowChange.id, rowChange.table);
      if (rowChange.makes) torsos.delete(rowChange.id);
      table.set(rowChange.id, mergeRow(held, rowChange, change.workshopId));
    }
  }
  for (const [id, name] of torsos) tables.get(name)?.delete(id);
  const merged: Rows = { ...rows };
  for (const name of tableNames) {
    const table = tables.get(name);
    if (table) merged[name] = [...table.values()];
  }
  return merged;
}
