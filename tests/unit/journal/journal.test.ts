import "fake-indexeddb/auto";
import { describe, expect, it } from "vitest";
import { edit, make, newId, type Write } from "@/lib/journal/change";
import { openJournal } from "@/lib/journal/journal";
import { overlay } from "@/lib/journal/merge";
import { strictStore } from "@/lib/journal/strict-store";
import { receiptNumber, seriesOf } from "@/lib/receipts/number";
import { rowsOf } from "@/lib/store/query";

let count = 0;
const fresh = (now?: () => number) => {
  const store = strictStore(`journal-test-${count++}`, "journal");
  return { store, journal: openJournal(store, now) };
};
const client = (name: string, id?: string): Write =>
  make("clients", { name, phone: "", phoneE164: null, email: "", address: "", note: "" }, id);

describe("the journal", () => {
  it("L3 numbers changes 1, 2, 3 … without a gap, also when many are kept at once", async () => {
    const { store, journal } = fresh();
    // A second tab: another journal over the same store.
    const other = openJournal(store);
    await Promise.all(
      Array.from({ length: 60 }, (_, i) => (i % 2 ? journal : other).append(() => [client(`Client ${i}`)])),
    );
    const changes = await journal.since(0);
    expect(changes.map((change) => change.number)).toEqual(Array.from({ length: 60 }, (_, i) => i + 1));
    expect(new Set(changes.map((change) => Object.values(change.rows[0]!.fields)[0]!.stamp)).size).toBe(60);
  });

  it("L3 each field carries the stamp that it replaces, and only what changed is written", async () => {
    const { journal } = fresh();
    const id = newId();
    const made = await journal.append(() => [client("Ada", id)]);
    const seen = rowsOf(overlay({}, [made]), "clients")[0]!;
    const edited = await journal.append(() => [edit("clients", seen, { name: "Ida", note: "" })]);
    expect(edited.rows).toHaveLength(1);
    expect(Object.keys(edited.rows[0]!.fields)).toEqual(["name"]);
    expect(edited.rows[0]!.fields.name!.base).toBe(made.rows[0]!.fields.name!.stamp);
    expect(edited.rows[0]!.fields.name!.stamp > made.rows[0]!.fields.name!.stamp).toBe(true);
  });

  it("P3 refuses to change what is only ever added to", async () => {
    const { journal } = fresh();
    const payment: Write = {
      table: "payments",
      id: newId(),
      makes: false,
      fields: { amountMinor: 1 },
      bases: {},
    };
    await expect(journal.append(() => [payment])).rejects.toThrow("never changed");
    expect(await journal.since(0)).toEqual([]);
  });

  it("keeps nothing of a change that fails while it is built, and takes no number for it", async () => {
    const { journal } = fresh();
    await journal.append(() => [client("Ada")]);
    await expect(
      journal.append((numbers) => {
        numbers.receipt();
        throw new Error("no");
      }),
    ).rejects.toThrow("no");
    const next = await journal.append((numbers) => [client(numbers.receipt())]);
    expect(next.number).toBe(2);
    expect(next.rows[0]!.fields.name!.value).toMatch(/-0001$/);
  });

  it("never gives a receipt number out twice over two tabs", async () => {
    const { store, journal } = fresh();
    const other = openJournal(store);
    const changes = await Promise.all(
      Array.from({ length: 40 }, (_, i) =>
        (i % 2 ? journal : other).append((numbers) => [client(numbers.receipt()), client(numbers.receipt())]),
      ),
    );
    const numbers = changes.flatMap((change) => change.rows.map((row) => row.fields.name!.value));
    expect(new Set(numbers).size).toBe(80);
  });

  it("stamps on after a copy with later stamps was read in", async () => {
    const { journal } = fresh(() => 1000);
    const far = "0fffffffffff-0000-other";
    await journal.appendRows([
      { table: "clients", id: "a", makes: true, fields: { name: { value: "x", stamp: far, base: null } } },
    ]);
    const after = await journal.append(() => [client("b")]);
    expect(after.rows[0]!.fields.name!.stamp > far).toBe(true);
  });

  it("begins anew with another device, book and number series in one step", async () => {
    const { journal } = fresh();
    const before = await journal.head();
    await journal.append(() => [client("Ada")]);
    const after = await journal.startAnew();
    expect(await journal.since(0)).toEqual([]);
    expect(after.next).toBe(1);
    expect(after.device).not.toBe(before.device);
    expect(after.book).not.toBe(before.book);
  });

  it("leaves a spoilt database behind once, however many tabs say that it hangs", async () => {
    const { journal } = fresh();
    const { generation } = await journal.head();
    const heads = await Promise.all([journal.leaveDatabase(generation), journal.leaveDatabase(generation)]);
    expect(heads.map((head) => head.generation)).toEqual([generation + 1, generation + 1]);
  });

  it("gives the last confirmed change only forwards", async () => {
    const { journal } = fresh();
    await journal.append(() => [client("Ada")]);
    await journal.append(() => [client("Ida")]);
    const { book } = await journal.head();
    await journal.confirm(2, book);
    expect((await journal.confirm(1, book)).confirmed).toBe(2);
  });

  it("notes nothing about a new book that the database of the one before it was seen to hold", async () => {
    const { journal } = fresh();
    await journal.append(() => [client("Ada")]);
    const before = await journal.head();
    await journal.startAnew();
    expect((await journal.confirm(1, before.book)).confirmed).toBe(0);
  });

  it("keeps no rows of a copy in another book than the one that they were meant for", async () => {
    const { journal } = fresh();
    const { book } = await journal.head();
    await journal.startAnew();
    await expect(journal.appendRows([], book)).rejects.toThrow("no more");
    expect((await journal.head()).next).toBe(1);
  });

  it("clears nothing where something was kept since the clearing was decided", async () => {
    const { journal } = fresh();
    const seen = await journal.head();
    await journal.append(() => [client("Ada")]);
    await expect(journal.startAnew(undefined, seen)).rejects.toThrow("moved on");
    expect(await journal.since(0)).toHaveLength(1);
    expect((await journal.startAnew(undefined, await journal.head())).next).toBe(1);
  });

  it("keeps nothing that no database could hold: the sign of code 0, half an emoji", async () => {
    const { journal } = fresh();
    const whole = "A\ud83e\uddf5\nda مريم";
    const kept = await journal.append(() => [
      client(`A\0${whole}\ud83e`),
      make("measurementSets", {
        wearerId: newId(),
        takenOn: "2026-03-14",
        takenBy: "",
        figures: [{ key: "wrist", typed: "6\0\udf00", mm: 152.4 }],
        note: "",
        correctsId: null,
      }),
    ]);
    expect(kept.rows[0]!.fields.name!.value).toBe(`A${whole}`);
    expect(kept.rows[1]!.fields.figures!.value).toEqual([{ key: "wrist", typed: "6", mm: 152.4 }]);
  });
});

describe("receipt numbers", () => {
  it("have a series of their own on each device", () => {
    const series = new Set(Array.from({ length: 5000 }, () => seriesOf(crypto.randomUUID())));
    // 30 random bits: two of 5 000 alike would be chance of about 1 %; two alike twice, never.
    expect(series.size).toBeGreaterThanOrEqual(4999);
    for (const one of series) expect(one).toMatch(/^[0-9A-HJKMNP-TV-Z]{6}$/);
  });

  it("are written to be read aloud", () => {
    expect(receiptNumber("7KQ4MX", 12)).toBe("7KQ4MX-0012");
    expect(receiptNumber("7KQ4MX", 12345)).toBe("7KQ4MX-12345");
  });
});
