import "fake-indexeddb/auto";
import { type PGlite } from "@electric-sql/pglite";
import { asc, gt } from "drizzle-orm";
import { type PgColumn, type PgTable } from "drizzle-orm/pg-core";
import fc from "fast-check";
import { afterAll, beforeAll, describe, expect, expectTypeOf, it } from "vitest";
import { type z } from "zod";
import { applyChanges, type BookDatabase } from "@/db/apply";
import { bookTables } from "@/db/schema";
import { canonicalJson } from "@/lib/copy/canonical-json";
import { collectFromDatabase, collectFromJournal, type RowsAtHand } from "@/lib/copy/collect-rows";
import { planReading } from "@/lib/copy/compare-copy";
import { copyFileName, packCopy, textCopy, unpackCopy } from "@/lib/copy/copy-file";
import { readCopy } from "@/lib/copy/read-copy";
import { type CopiedDraft, makeCopy, type SavedCopy, writeCopy } from "@/lib/copy/saved-copy";
import { type Change } from "@/lib/journal/change";
import { type AnyRow, overlay, type Rows } from "@/lib/journal/merge";
import { type rowSchemas } from "@/lib/records/schemas";
import { type RowOf, type TableName, tableNames } from "@/lib/records/types";
import { changesOf, DEVICE, WORKSHOP } from "@/tests/support/changes";
import { emptyDatabase, freshDatabase } from "@/tests/support/pglite";

const madeAt = "2026-03-14T09:30:00.000Z";
const whose = { workshopId: WORKSHOP, madeAt };
const drafts: CopiedDraft[] = [
  { key: "order:new", savedAt: madeAt, value: { occasion: "Namenstag", lines: [1, null, { b: 1, a: "é" }] } },
];

let db: BookDatabase;
let client: PGlite;
beforeAll(async () => {
  ({ db, client } = await freshDatabase());
}, 60_000);
afterAll(() => client.close());

/** The book's two sides as the worker and the journal give them. */
function bookOf(changes: readonly Change[]): RowsAtHand {
  return {
    page: async (table, afterId, limit) => {
      const from = bookTables[table] as PgTable & { id: PgColumn };
      return (await db
        .select()
        .from(from)
        .where(afterId === null ? undefined : gt(from.id, afterId))
        .orderBy(asc(from.id))
        .limit(limit)) as AnyRow[];
    },
    changesSince: (after, limit = Infinity) =>
      Promise.resolve(changes.filter((change) => change.number > after).slice(0, limit)),
  };
}

const read = async (text: string): Promise<SavedCopy> => {
  const answer = await readCopy(text);
  if (!answer.ok) throw new Error(answer.say);
  return answer.copy;
};

const plain = (row: AnyRow) => canonicalJson(row);

const tablesOf = (rows: Rows) => makeCopy(rows, [], whose).tables;

/** The rows after a plan was kept over the present ones, as the journal does it. */
function after(present: Rows, rows: ReturnType<typeof planReading>["rows"]): Rows {
  const change: Change = {
    number: 1,
    device: DEVICE,
    workshopId: WORKSHOP,
    schema: 1,
    writtenAt: madeAt,
    rows,
  };
  return overlay(present, [change]);
}

describe("a copy", () => {
  it("is the same text out of the database, at any point that it has come to, as out of the journal alone", async () => {
    await fc.assert(
      fc.asyncProperty(changesOf({ max: 14 }), fc.nat(), async (changes, at) => {
        await emptyDatabase(client);
        const upTo = at % (changes.length + 1);
        await applyChanges(db, changes.slice(0, upTo));
        const book = bookOf(changes);
        const fromJournal = await collectFromJournal(book, changes.length);
        const fromDatabase = await collectFromDatabase(book, upTo);
        expect(fromDatabase.upTo).toBe(changes.length);
        expect(fromJournal.upTo).toBe(changes.length);
        const text = await writeCopy(makeCopy(fromJournal.rows, drafts, whose));
        expect(await writeCopy(makeCopy(fromDatabase.rows, drafts, whose))).toBe(text);
      }),
      { numRuns: 25 },
    );
  }, 120_000);

  it("reads back as it was saved, packed or as text, and fills an empty book with the same rows and stamps", async () => {
    await fc.assert(
      fc.asyncProperty(changesOf({ max: 14 }), async (changes) => {
        const rows = overlay({}, changes);
        const text = await writeCopy(makeCopy(rows, drafts, whose));
        const packed = await unpackCopy((await packCopy(text, "copy")).bytes);
        const plain = await unpackCopy(textCopy(text, "copy").bytes);
        expect(packed).toEqual({ ok: true, text });
        expect(plain).toEqual({ ok: true, text });
        const copy = await read(text);
        expect(copy.drafts).toEqual(drafts);
        expect(copy.tables).toEqual(tablesOf(rows));
        const plan = planReading(copy, { workshopId: "01890000-0000-7000-8000-0000000000ff", rows: {} });
        expect(plan.kind).toBe("empty");
        expect(tablesOf(after({}, plan.rows))).toEqual(tablesOf(rows));
      }),
      { numRuns: 60 },
    );
  });

  it("P2 merged into its own workshop keeps the later of every field, counts truly, and changes nothing twice", async () => {
    await fc.assert(
      fc.asyncProperty(changesOf({ max: 14 }), fc.nat(), async (changes, at) => {
        const common = at % (changes.length + 1);
        const branch = (odd: number) =>
          overlay(
            {},
            changes.filter(({ number }) => number <= common || number % 2 === odd),
          );
        const [saved, present] = [branch(0), branch(1)];
        const copy = await read(await writeCopy(makeCopy(saved, [], whose)));
        const plan = planReading(copy, { workshopId: WORKSHOP, rows: present });
        expect(plan.kind).toBe("same");
        const merged = after(present, plan.rows);
        const counts = { fresh: 0, changed: 0, same: 0 };
        for (const table of tableNames) {
          const find = (rows: Rows, id: string) => (rows[table] ?? []).find((row) => row.id === id);
          const ids = new Set([saved, present].flatMap((rows) => (rows[table] ?? []).map((row) => row.id)));
          expect(new Set((merged[table] ?? []).map((row) => row.id))).toEqual(ids);
          for (const id of ids) {
            const [mine, theirs, both] = [find(present, id), find(saved, id), find(merged, id)!];
            for (const [field, stamp] of Object.entries(both.stamps)) {
              const later = (theirs?.stamps[field] ?? "") > (mine?.stamps[field] ?? "") ? theirs! : mine!;
              expect(stamp).toBe(later.stamps[field]);
              expect(both[field]).toEqual(later[field]);
            }
            if (theirs) counts[!mine ? "fresh" : plain(mine) === plain(both) ? "same" : "changed"]++;
          }
        }
        expect(plan.counts).toEqual(counts);
        const again = planReading(copy, { workshopId: WORKSHOP, rows: merged });
        expect(again.rows).toEqual([]);
        expect(again.counts.fresh + again.counts.changed).toBe(0);
      }),
      { numRuns: 80 },
    );
  });

  it("of another workshop never merges: the present one has to go first", async () => {
    const [changes] = fc.sample(changesOf({ max: 6 }), { numRuns: 1, seed: 3 });
    const rows = overlay({}, changes!);
    const copy = await read(await writeCopy(makeCopy(rows, [], whose)));
    const plan = planReading(copy, { workshopId: "01890000-0000-7000-8000-0000000000ff", rows });
    expect(plan.kind).toBe("other");
    expect(plan.counts.same).toBe(0);
  });
});

describe("reading a file", () => {
  const copyText = async () => {
    const [changes] = fc.sample(changesOf({ max: 8 }), { numRuns: 1, seed: 11 });
    return writeCopy(makeCopy(overlay({}, changes!), drafts, whose));
  };

  it("finds any one character that is not what was saved", async () => {
    const text = await copyText();
    await fc.assert(
      fc.asyncProperty(
        fc.nat({ max: text.length - 1 }),
        fc.constantFrom("x", "7", " ", '"'),
        async (at, other) => {
          fc.pre(text[at] !== other);
          const spoilt = text.slice(0, at) + other + text.slice(at + 1);
          const answer = await readCopy(spoilt);
          expect(answer.ok).toBe(false);
        },
      ),
      { numRuns: 150 },
    );
  });

  it("finds a file that was cut short, packed or not", async () => {
    const text = await copyText();
    const cut = await readCopy(text.slice(0, text.length - 20));
    expect(cut).toMatchObject({ ok: false, say: expect.stringContaining("damaged") as string });
    const { bytes } = await packCopy(text, "copy");
    const cutBytes = await unpackCopy(bytes.slice(0, bytes.length - 30));
    expect(cutBytes).toMatchObject({ ok: false, say: expect.stringContaining("damaged") as string });
  });

  it("says what each other file is, and what to do instead", async () => {
    const say = async (text: string) => {
      const answer = await readCopy(text);
      return answer.ok ? "" : answer.say;
    };
    expect(await say("Dear Ana, the cloth has come.")).toMatch(/not a saved copy/);
    expect(await say('{"format":"another"}')).toMatch(/not a saved copy/);
    expect(await say("[]")).toMatch(/not a saved copy/);
    const copy = await read(await copyText());
    expect(await say(await writeCopy({ ...copy, version: 3 }))).toMatch(/newer Notchbook/);
    expect(await say(await writeCopy({ ...copy, schema: 99 }))).toMatch(/newer Notchbook/);
    expect(await unpackCopy(new Uint8Array())).toMatchObject({ ok: false });
  });

  it("refuses rows that are not what their table holds, although the checksum is right", async () => {
    const copy = await read(await copyText());
    const bent = {
      ...copy,
      tables: { ...copy.tables, clients: [{ ...copy.tables.clients[0]!, name: 7 }] },
    } as unknown as SavedCopy;
    expect(await readCopy(await writeCopy(bent))).toMatchObject({ ok: false });
    const foreign = {
      ...copy,
      workshop: { ...copy.workshop, id: "01890000-0000-7000-8000-0000000000ff" },
    };
    expect(await readCopy(await writeCopy(foreign))).toMatchObject({ ok: false });
  });
});

describe("the file's writing", () => {
  it("is RFC 8785's: names in the order of UTF-16 code units, ECMAScript's numbers, no spaces", () => {
    // The RFC's own example of sorting, section 3.2.3 (memory).
    const names = { "\u20ac": 1, "\r": 2, "\ufb33": 3, "1": 4, "\ud83d\ude00": 5, "\u0080": 6, "\u00f6": 7 };
    expect([...canonicalJson(names).matchAll(/:(\d)/g)].map(([, n]) => n).join("")).toBe("2467153");
    expect(canonicalJson({ b: [1e21, 0.1, -0], a: { d: null, c: "é\n" } })).toBe(
      '{"a":{"c":"é\\n","d":null},"b":[1e+21,0.1,0]}',
    );
  });

  it("names a file by the workshop's own letters", () => {
    const at = new Date(2026, 2, 14, 9, 5);
    expect(copyFileName("Ana's Workshop", at)).toBe("notchbook-Anas-Workshop-2026-03-14-0905");
    expect(copyFileName("ورشة/مريم?", at)).toBe("notchbook-ورشة-مريم-2026-03-14-0905");
    expect(copyFileName("  ", at)).toBe("notchbook-2026-03-14-0905");
  });

  it("checks rows by schemas of exactly the records' types", () => {
    type Checked = { [T in TableName]: z.infer<(typeof rowSchemas)[T]> };
    expectTypeOf<Checked>().toEqualTypeOf<{ [T in TableName]: { [K in keyof RowOf<T>]: RowOf<T>[K] } }>();
  });
});
