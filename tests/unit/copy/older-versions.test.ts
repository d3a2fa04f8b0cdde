/** Files as earlier versions saved them; they are never made anew. A new version of the format adds one. */
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { planReading } from "@/lib/copy/compare-copy";
import { openCopyFile } from "@/lib/copy/open-file";
import { contentWords, mergeWords } from "@/lib/copy/copy-words";
import { countRows, type SavedCopy } from "@/lib/copy/saved-copy";
import { tableNames } from "@/lib/records/types";
import { WORKSHOP } from "@/tests/support/changes";

const fixture = (name: string) =>
  new Uint8Array(readFileSync(new URL(`./fixtures/${name}`, import.meta.url))) as Uint8Array<ArrayBuffer>;

async function open(name: string): Promise<SavedCopy> {
  const read = await openCopyFile(fixture(name));
  if (!read.ok) throw new Error(read.say);
  return read.copy;
}

describe("a copy of version 1", () => {
  it.each(["version-1.notchbook.txt", "version-1.notchbook.json.gz"])("opens: %s", async (name) => {
    const copy = await open(name);
    expect(copy.workshop).toEqual({ id: WORKSHOP, name: "Wren Lane Sewing Room" });
    expect(copy.madeAt).toBe("2026-03-14T09:30:00.000Z");
    expect(countRows(copy)).toBe(95);
    for (const table of tableNames.filter((name) => name !== "sums"))
      expect(copy.tables[table].length, table).toBeGreaterThan(0);
    expect(copy.tables.sums).toEqual([]);
    expect(copy.tables.clients.find((row) => row.note.includes("never on a Friday"))).toBeDefined();
    expect(copy.tables.sleeves.filter((row) => row.removedAt !== null)).toHaveLength(1);
    expect(copy.drafts).toEqual([
      { key: "client:new", savedAt: "2026-03-14T09:10:00.000Z", value: { name: "Half-typ" } },
    ]);
  });

  it("says what is in it, and what putting it together with a book would do", async () => {
    const copy = await open("version-1.notchbook.txt");
    const words = contentWords(copy);
    expect(words).toContain("8 clients");
    expect(words).toContain("1 thing in the bin");
    expect(words).toContain("1 thing begun and not kept yet");
    const rows = { clients: copy.tables.clients.slice(1) as never };
    expect(mergeWords(planReading(copy, { workshopId: WORKSHOP, rows }))).toEqual([
      "88 entries are new here.",
      "7 entries stay as they are.",
      "Nothing that is only on this phone is lost.",
    ]);
    const whole = Object.fromEntries(tableNames.map((name) => [name, copy.tables[name]])) as never;
    expect(mergeWords(planReading(copy, { workshopId: WORKSHOP, rows: whole }))).toEqual([
      "Everything in it is in this phone’s book already.",
    ]);
  });
});

describe("a copy of version 2", () => {
  it.each(["version-2.notchbook.txt", "version-2.notchbook.json.gz"])(
    "opens with its sums: %s",
    async (name) => {
      const copy = await open(name);
      expect(copy.schema).toBe(2);
      expect(countRows(copy)).toBe(98);
      const [frill, skirt, binned] = copy.tables.sums;
      expect(frill).toMatchObject({
        orderId: copy.tables.orders.find(({ removedAt }) => removedAt === null)!.id,
        kind: "ruffle",
        name: "Collar frill",
        inputs: { seam: { typed: "15", mm: 381 }, ratio: { typed: "2.5", value: 2.5 } },
      });
      expect(skirt!.inputs).toMatchObject({ part: { typed: "half", value: "half" }, note: { typed: "" } });
      expect(binned!.removedAt).not.toBeNull();
      expect(copy.tables.sleeves[0]).toMatchObject({
        style: "puff",
        ask: { style: { figures: { puff: { typed: "1/2", mm: 12.7 }, ratio: 2 }, cloth: "fine" } },
      });
      expect(contentWords(copy)).toContain("2 sewing sums");
    },
  );
});
