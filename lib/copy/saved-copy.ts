/**
 * A saved copy: everything of a book in one JSON file of our own format. Version 2 has the members of `SavedCopy`;
 * version 1 had no table `sums`. `sha256` is the checksum of the canonical JSON of all the others. A file of every
 * version there ever was must open.
 */
import { SCHEMA_NUMBER } from "@/lib/journal/change";
import { type AnyRow, type Rows } from "@/lib/journal/merge";
import { type RowOf, type TableName, tableNames } from "@/lib/records/types";
import { canonicalJson, sha256 } from "./canonical-json";

export const COPY_FORMAT = "notchbook-copy";
export const COPY_VERSION = 2;

/** What was being typed and not kept yet. */
export interface CopiedDraft {
  key: string;
  savedAt: string;
  value: unknown;
}

export interface SavedCopy {
  format: typeof COPY_FORMAT;
  version: number;
  /** The schema that its rows were written under. */
  schema: number;
  madeAt: string;
  workshop: { id: string; name: string };
  /** Every row, the bin's too, with its stamps, in the order of ids. */
  tables: { [T in TableName]: RowOf<T>[] };
  drafts: CopiedDraft[];
}

const byId = (a: AnyRow, b: AnyRow): number => (a.id < b.id ? -1 : a.id > b.id ? 1 : 0);

/** A copy of these rows. `workshopId` says whose, `madeAt` when (ISO date-time in UTC). */
export function makeCopy(
  rows: Rows,
  drafts: readonly CopiedDraft[],
  { workshopId, madeAt }: { workshopId: string; madeAt: string },
): SavedCopy {
  const sorted = Object.fromEntries(
    tableNames.map((name) => [name, [...(rows[name] ?? [])].sort(byId)]),
  ) as unknown as SavedCopy["tables"];
  return {
    format: COPY_FORMAT,
    version: COPY_VERSION,
    schema: SCHEMA_NUMBER,
    madeAt,
    workshop: { id: workshopId, name: sorted.workshops.find((row) => row.removedAt === null)?.name ?? "" },
    tables: sorted,
    drafts: [...drafts].sort((a, b) => (a.key < b.key ? -1 : 1)),
  };
}

/** The text of the file. */
export async function writeCopy(copy: SavedCopy): Promise<string> {
  return canonicalJson({ ...copy, sha256: await sha256(canonicalJson(copy)) });
}

/** How many entries are in a copy, those in the bin too. */
export function countRows(copy: SavedCopy): number {
  return tableNames.reduce((all, name) => all + copy.tables[name].length, 0);
}
