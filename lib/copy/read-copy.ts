/** Reads the text of a saved copy, checked from end to end. Apart from `saved-copy`, since checking is heavy to load. */
import { z } from "zod";
import { SCHEMA_NUMBER } from "@/lib/journal/change";
import { rowSchemas } from "@/lib/records/schemas";
import { type TableName, tableNames } from "@/lib/records/types";
import { canonicalJson, sha256 } from "./canonical-json";
import { COPY_FORMAT, COPY_VERSION, type SavedCopy } from "./saved-copy";

export type CopyRead = { ok: true; copy: SavedCopy } | { ok: false; say: string };

const tables = z.strictObject(
  Object.fromEntries(tableNames.map((name) => [name, z.array(rowSchemas[name])])) as {
    [T in TableName]: z.ZodArray<(typeof rowSchemas)[T]>;
  },
);

/** The tables of a copy of version 1, which came before sewing sums; read as one that has none. */
const tablesOf1 = tables.omit({ sums: true }).transform((older) => ({ ...older, sums: [] }));

const heading = z.object({ format: z.literal(COPY_FORMAT), version: z.int().min(1), schema: z.int().min(1) });

const members = {
  format: z.literal(COPY_FORMAT),
  schema: z.int(),
  madeAt: z.iso.datetime(),
  workshop: z.strictObject({ id: z.guid(), name: z.string() }),
  drafts: z.array(z.strictObject({ key: z.string(), savedAt: z.string(), value: z.unknown() })),
};

const shape = z.discriminatedUnion("version", [
  z.strictObject({ ...members, version: z.literal(1), tables: tablesOf1 }),
  z.strictObject({ ...members, version: z.literal(COPY_VERSION), tables }),
]);

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
