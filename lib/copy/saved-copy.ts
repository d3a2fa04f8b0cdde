/**
 * A saved copy: everything of a book in one JSON file of our own format. Version 1 has the members of `SavedCopy`;
 * `sha256` is the checksum of the canonical JSON of all the others. A file of every version there ever was must open.
 */
import { z } from "zod";
import { SCHEMA_NUMBER } from "@/lib/journal/change";
import { type AnyRow, type Rows } from "@/lib/journal/merge";
import { rowSchemas } from "@/lib/records/schemas";
import { type RowOf, type TableName, tableNames } from "@/lib/records/types";
import { canonicalJson, sha256 } from "./canonical-json";

const COPY_FORMAT = "notchbook-copy";
const COPY_VERSION = 1;

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

export type CopyRead = { ok: true; copy: SavedCopy } | { ok: false; say: string };

const tables = z.strictObject(
  Object.fromEntries(tableNames.map((name) => [name, z.array(rowSchemas[name])])) as {
    [T in TableName]: z.ZodArray<(typeof rowSchemas)[T]>;
  },
);

const heading = z.object({ format: z.literal(COPY_FORMAT), version: z.int().min(1), schema: z.int().min(1) });

const shape = z.strictObject({
  format: z.literal(COPY_FORMAT),
  version: z.literal(COPY_VERSION),
  schema: z.int(),
  madeAt: z.iso.datetime(),
  workshop: z.strictObject({ id: z.guid(), name: z.string() }),
  tables,
  drafts: z.array(z.strictObject({ key: z.string(), savedAt: z.string(), value: z.unknown() })),
});

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

const notACopy =
  "This file is not a saved copy of Notchbook. Choose the file that Notchbook saved; its name begins with “notchbook”.";
const damaged =
  "This copy is damaged: what is in it is not what was saved. Nothing was read in. Send or fetch the file once more, or choose an earlier copy.";
const newer =
  "This copy was made by a newer Notchbook. Bring Notchbook on this phone up to date (open it with data on), then choose the file again.";

/** Reads the text of a file, checked from end to end. Never throws. */
export async function readCopy(text: string): Promise<CopyRead> {
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch {
    return { ok: false, say: text.slice(0, 2000).includes(COPY_FORMAT) ? damaged : notACopy };
  }
  const head = heading.safeParse(json);
  if (!head.success) return { ok: false, say: notACopy };
  if (head.data.version > COPY_VERSION || head.data.schema > SCHEMA_NUMBER) return { ok: false, say: newer };
  const { sha256: expected, ...body } = json as Record<string, unknown>;
  if (expected !== (await sha256(canonicalJson(body)))) return { ok: false, say: damaged };
  const copy = shape.safeParse(body);
  if (!copy.success) return { ok: false, say: damaged };
  const strange = tableNames.some((name) =>
    copy.data.tables[name].some((row) => row.workshopId !== copy.data.workshop.id),
  );
  return strange ? { ok: false, say: damaged } : { ok: true, copy: copy.data };
}

/** How many entries are in a copy, those in the bin too. */
export function countRows(copy: SavedCopy): number {
  return tableNames.reduce((all, name) => all + copy.tables[name].length, 0);
}
