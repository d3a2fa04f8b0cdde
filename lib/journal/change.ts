/**
 * A change is one write made on one device (sync contract L3): numbered without a gap, carrying the schema it
 * was written under; each field with its value, its stamp and the stamp that it replaces.
 */
import { v7 as uuidv7 } from "uuid";
import { type FieldsByTable, type RowHead, type RowOf, type TableName } from "@/lib/records/types";

/** Moves up by one with each migration that changes synced fields. */
export const SCHEMA_NUMBER = 2;

export interface FieldChange {
  value: unknown;
  stamp: string;
  /** Stamp of the value that its author saw, or null where there was none. */
  base: string | null;
}

export interface RowChange {
  table: TableName;
  id: string;
  /** True where this change makes the row. */
  makes: boolean;
  fields: Record<string, FieldChange>;
}

export interface Change {
  /** 1, 2, 3 … on this device. */
  number: number;
  device: string;
  workshopId: string;
  schema: number;
  /** When it was written, by this phone's own clock; for people to read, never to decide by. */
  writtenAt: string;
  rows: RowChange[];
}

/** What a screen asks to be kept, before it has a number and stamps. */
export type Write = {
  [T in TableName]: {
    table: T;
    id: string;
    makes: boolean;
    fields: Partial<FieldsByTable[T]> & { removedAt?: string | null };
    bases: Record<string, string>;
  };
}[TableName];

/** A new id, made where the row is made (C1). */
export const newId = (): string => uuidv7();

/** A write that makes a row. */
export function make<T extends TableName>(table: T, fields: FieldsByTable[T], id: string = newId()): Write {
  return { table, id, makes: true, fields: { ...fields, removedAt: null }, bases: {} } as unknown as Write;
}

/** A write that changes some fields of a row as it was seen; fields with the same value are left out. */
export function edit<T extends TableName>(table: T, seen: RowOf<T>, patch: Partial<FieldsByTable[T]>): Write {
  const before = seen as unknown as Record<string, unknown>;
  const fields = Object.fromEntries(
    Object.entries(patch).filter(([name, value]) => JSON.stringify(before[name]) !== JSON.stringify(value)),
  );
  return { table, id: seen.id, makes: false, fields, bases: seen.stamps } as unknown as Write;
}

/** Puts a row in the bin, or brings it back. */
export function setRemoved<T extends TableName>(table: T, seen: RowHead, removedAt: string | null): Write {
  return { table, id: seen.id, makes: false, fields: { removedAt }, bases: seen.stamps } as unknown as Write;
}
