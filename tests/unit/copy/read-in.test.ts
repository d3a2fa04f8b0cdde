import "fake-indexeddb/auto";
import fc from "fast-check";
import { beforeEach, describe, expect, it } from "vitest";
import { collectFromJournal } from "@/lib/copy/collect-rows";
import { planReading } from "@/lib/copy/compare-copy";
import { packCopy, unpackCopy } from "@/lib/copy/copy-file";
import {
  type BookToFill,
  draftsForCopy,
  forgetUnfinished,
  readIn,
  unfinishedReading,
} from "@/lib/copy/read-in";
import { readCopy } from "@/lib/copy/read-copy";
import { makeCopy, type SavedCopy, writeCopy } from "@/lib/copy/saved-copy";
import { make } from "@/lib/journal/change";
import { openJournal } from "@/lib/journal/journal";
import { overlay } from "@/lib/journal/merge";
import { strictStore } from "@/lib/journal/strict-store";
import { dropAllDrafts, getDraft, setDraft } from "@/lib/store/drafts";
import { keepProblem } from "@/lib/store/keep-problem";
import { changesOf, WORKSHOP } from "@/tests/support/changes";

const madeAt = "2026-03-14T09:30:00.000Z";
let count = 0;

/** A book as `Book` is one, over a journal of its own; `failAfter` pieces the phone has no room left. */
function freshBook(failAfter = Infinity) {
  const journal = openJournal(strictStore(`journal-${++count}`, "journal"));
  let pieces = 0;
  let told = 0;
  const book: BookToFill = {
    startAnew: (workshopId, seen) => journal.startAnew(workshopId, seen),
    tellBookChanged: () => void told++,
    keepRows: async (rows, into) => {
      if (++pieces > failAfter) throw keepProblem(new DOMException("full", "QuotaExceededError"));
      await journal.appendRows(rows, into).catch((error: unknown) => {
        throw keepProblem(error);
      });
    },
    noteCopy: async (copy) => void (await journal.noteCopy(copy)),
    head: () => journal.head(),
    changesSince: (after) => journal.since(after),
  };
  const rows = async () => {
    const source = { page: () => Promise.reject(new Error("closed")), changesSince: journal.since };
    return (await collectFromJournal(source, 0)).rows;
  };
  return { book, journal, rows, told: () => told };
}

const sample = (seed: number) => fc.sample(changesOf({ max: 12 }), { numRuns: 1, seed })[0]!;
const tables = (rows: Parameters<typeof makeCopy>[0]) =>
  makeCopy(rows, [], { workshopId: WORKSHOP, madeAt }).tables;

const newClient = (name: string) =>
  make("clients", { name, phone: "", phoneE164: null, email: "", address: "", note: "" });

/** More rows than one change takes, so that a first piece may get in and the second not. */
function manyClients() {
  const rows = overlay({}, sample(8));
  const [client] = rows.clients!;
  rows.clients = Array.from({ length: 1200 }, (_, n) => ({
    ...client!,
    id: `01890001-0000-7000-8000-${n.toString(16).padStart(12, "0")}`,
  }));
  return rows;
}

/** The same book on a phone that has room again. */
const withRoom = ({ book, journal }: ReturnType<typeof freshBook>): BookToFill => ({
  ...book,
  keepRows: async (rows, into) => void (await journal.appendRows(rows, into)),
});

async function fileOf(rows: Parameters<typeof makeCopy>[0], drafts: SavedCopy["drafts"] = []) {
  const text = await writeCopy(makeCopy(rows, drafts, { workshopId: WORKSHOP, madeAt }));
  const { bytes } = await packCopy(text, "copy");
  return { bytes, copy: (await openFile(bytes))! };
}

async function openFile(bytes: Uint8Array<ArrayBuffer>): Promise<SavedCopy | null> {
  const unpacked = await unpackCopy(bytes);
  const read = unpacked.ok ? await readCopy(unpacked.text) : null;
  return read?.ok ? read.copy : null;
}

beforeEach(() => dropAllDrafts());

describe("reading in", () => {
  it("fills a phone anew: the copy's rows, drafts and day; nothing of the book before", async () => {
    const rows = overlay({}, sample(4));
    const { bytes, copy } = await fileOf(rows, [
      { key: "client:new", savedAt: madeAt, value: { name: "Zo" } },
    ]);
    const there = freshBook();
    await there.journal.append(() => []);
    await setDraft("order:new", { of: "the book before" });
    const before = await there.journal.head();
    const plan = planReading(copy, { workshopId: before.workshopId, rows: await there.rows() });
    await readIn(there.book, copy, bytes, plan);
    const head = await there.journal.head();
    expect(head.workshopId).toBe(WORKSHOP);
    expect(head.device).not.toBe(before.device);
    expect(head.lastCopy).toEqual({ number: head.next - 1, at: madeAt });
    expect(tables(await there.rows())).toEqual(tables(rows));
    expect((await draftsForCopy()).map(({ key, value }) => [key, value])).toEqual([
      ["client:new", { name: "Zo" }],
    ]);
    expect(await unfinishedReading()).toBeNull();
  });

  it("ended half-way says so, and goes on from there to the whole copy", async () => {
    const rows = manyClients();
    const { bytes, copy } = await fileOf(rows);
    const there = freshBook(1);
    const { workshopId } = await there.journal.head();
    const plan = planReading(copy, { workshopId, rows: {} });
    await expect(readIn(there.book, copy, bytes, plan)).rejects.toThrow(/no room left/);

    const left = (await unfinishedReading())!;
    expect(left).toMatchObject({ workshopId: WORKSHOP, madeAt, whole: true });
    expect(tables(await there.rows())).not.toEqual(tables(rows));
    const again = (await openFile(left.bytes))!;
    const rest = planReading(again, { workshopId: WORKSHOP, rows: await there.rows() });
    expect(rest.kind).toBe("same");
    expect(rest.counts.same).toBe(500);
    await readIn(withRoom(there), again, left.bytes, rest, left.whole);
    expect(tables(await there.rows())).toEqual(tables(rows));
    const head = await there.journal.head();
    expect(head.lastCopy).toEqual({ number: head.next - 1, at: madeAt });
    expect(await unfinishedReading()).toBeNull();
  });

  it("that goes on counts as copied nothing that was kept between, as that is in no copy", async () => {
    const { bytes, copy } = await fileOf(manyClients());
    const there = freshBook(1);
    const { workshopId } = await there.journal.head();
    await expect(
      readIn(there.book, copy, bytes, planReading(copy, { workshopId, rows: {} })),
    ).rejects.toThrow();
    await there.journal.append(() => [newClient("Own")]);
    const rest = planReading(copy, { workshopId: WORKSHOP, rows: await there.rows() });
    await readIn(withRoom(there), copy, bytes, rest, true);
    const head = await there.journal.head();
    expect(head.lastCopy!.number).toBeLessThan(2);
    expect((await there.rows()).clients!.some(({ name }) => name === "Own")).toBe(true);
  });

  it("that goes on drops what was being typed in the earlier book, and keeps what was typed since", async () => {
    const { bytes, copy } = await fileOf(manyClients(), [
      { key: "client:new", savedAt: madeAt, value: "of the copy" },
    ]);
    const there = freshBook();
    await setDraft("client:new", "of the book before");
    await setDraft("order:new", "of the book before");
    // The phone stops right after the clearing.
    const cutOff: BookToFill = {
      ...there.book,
      tellBookChanged: () => {
        throw new Error("cut off");
      },
    };
    const { workshopId } = await there.journal.head();
    const plan = planReading(copy, { workshopId, rows: {} });
    await expect(readIn(cutOff, copy, bytes, plan)).rejects.toThrow("cut off");
    await new Promise((later) => setTimeout(later, 5));
    await setDraft("wearer:new", "typed since");
    const rest = planReading(copy, { workshopId: WORKSHOP, rows: await there.rows() });
    await readIn(there.book, copy, bytes, rest, true);
    expect((await draftsForCopy()).map(({ key, value }) => [key, value])).toEqual([
      ["client:new", "of the copy"],
      ["wearer:new", "typed since"],
    ]);
  });

  it("clears nothing without asking where another window began to fill the book meanwhile", async () => {
    const { bytes, copy } = await fileOf(manyClients());
    const there = freshBook();
    const { workshopId } = await there.journal.head();
    const plan = planReading(copy, { workshopId, rows: await there.rows() });
    expect(plan.kind).toBe("empty");
    await there.journal.append(() => [newClient("Kept in another window")]);
    await expect(readIn(there.book, copy, bytes, plan)).rejects.toThrow(/changed in another window/);
    expect((await there.rows()).clients).toHaveLength(1);
    expect(await unfinishedReading()).toBeNull();
  });

  it("puts no row of one workshop into the book of another that was begun in another window", async () => {
    const { bytes, copy } = await fileOf(manyClients());
    const there = freshBook();
    await there.journal.startAnew(WORKSHOP);
    const plan = planReading(copy, { workshopId: WORKSHOP, rows: {} });
    // Before the first piece, and between two.
    await there.journal.startAnew();
    await expect(readIn(there.book, copy, bytes, plan)).rejects.toThrow(/changed in another window/);
    expect(await there.journal.since(0)).toEqual([]);
    await there.journal.startAnew(WORKSHOP);
    const interrupted: BookToFill = {
      ...there.book,
      keepRows: async (rows, into) => {
        await there.book.keepRows(rows, into);
        await there.journal.startAnew();
      },
    };
    await expect(readIn(interrupted, copy, bytes, plan)).rejects.toThrow(/another window/);
    expect(await there.journal.since(0)).toEqual([]);
  });

  it("merged in, leaves the book's own last copy as it is, and what is being typed now", async () => {
    const changes = sample(21);
    const saved = overlay({}, changes);
    const { bytes, copy } = await fileOf(saved, [
      { key: "a", savedAt: "2026-03-01T00:00:00.000Z", value: "earlier" },
      { key: "b", savedAt: "2026-03-01T00:00:00.000Z", value: "only in the copy" },
    ]);
    const there = freshBook();
    await there.journal.startAnew(WORKSHOP);
    await there.journal.appendRows(changes[0]!.rows);
    await setDraft("a", "now");
    const plan = planReading(copy, { workshopId: WORKSHOP, rows: await there.rows() });
    await readIn(there.book, copy, bytes, plan);
    expect(tables(await there.rows())).toEqual(tables(saved));
    expect((await there.journal.head()).lastCopy).toBeNull();
    expect(there.told()).toBe(0);
    expect((await getDraft("a"))?.value).toBe("now");
    expect((await getDraft("b"))?.value).toBe("only in the copy");
  });

  it("is forgotten when told so", async () => {
    const { bytes, copy } = await fileOf(overlay({}, sample(2)));
    const there = freshBook(0);
    const plan = planReading(copy, { workshopId: "01890000-0000-7000-8000-0000000000ff", rows: {} });
    await expect(readIn(there.book, copy, bytes, plan)).rejects.toThrow();
    expect(await unfinishedReading()).not.toBeNull();
    await forgetUnfinished();
    expect(await unfinishedReading()).toBeNull();
  });

  it("L1 nothing is kept in a book that another window replaced", async () => {
    const there = freshBook();
    const { book } = await there.journal.head();
    await there.journal.startAnew();
    const late = there.journal.append(() => [], book);
    await expect(late).rejects.toThrow();
    expect(keepProblem(await late.catch((error: unknown) => error)).message).toMatch(/another window/);
    expect((await there.journal.head()).next).toBe(1);
  });
});
