/**
 * The journal: every change stands here, durably, before anything says that it is kept (sync contract L1 to
 * L3). It is also the queue of changes that wait to be sent, and what a spoilt database is made again from.
 *
 * One object store: numbers are the changes by their number, "head" is the device's own state. IndexedDB runs
 * one writing transaction on it at a time, over all tabs, so that neither a change's number nor a receipt's can
 * go out twice.
 */
import { promisifyRequest, type UseStore } from "idb-keyval";
import { v4 as uuidv4 } from "uuid";
import { type Clock, newClock, observe, tick, writeStamp } from "@/lib/clock/stamp";
import { addOnlyTables } from "@/lib/records/types";
import { receiptNumber, seriesOf } from "@/lib/receipts/number";
import { type Change, newId, type RowChange, SCHEMA_NUMBER, type Write } from "./change";
import { upgradeChange } from "./upgrade";

export interface Head {
  /** This install, as a UUID. A new book on the same phone is a new device. */
  device: string;
  /** Names the browser's database; another after everything was cleared. */
  book: string;
  /** Counts the databases that were made for this book: a spoilt one is left behind, the next has another name. */
  generation: number;
  workshopId: string;
  /** The number that the next change takes. */
  next: number;
  /** The number that the next receipt of this device takes. */
  nextReceipt: number;
  clock: Clock;
  /** Last change that a reopened database was seen to hold. */
  confirmed: number;
  /** The last copy that was saved: the change it went up to, and when. */
  lastCopy: { number: number; at: string } | null;
}

/** Hands out receipt numbers while a change is being built. */
export interface Numbers {
  receipt(): string;
}

export interface Journal {
  /** The device's state; made at the first call. */
  head(): Promise<Head>;
  /**
   * Keeps one change. `build` is called inside the transaction and must not wait for anything.
   * Resolves when the change has reached the disk; rejects, with nothing kept, when it could not be.
   * @param book the book that it was written for. @throws BookReplaced where another one stands here by now.
   */
  append(build: (numbers: Numbers) => Write[], book?: string): Promise<Change>;
  /**
   * Keeps rows with the stamps they already have (a copy that is read back), as one change.
   * @param book as in `append`. @throws BookReplaced
   */
  appendRows(rows: RowChange[], book?: string): Promise<Change>;
  /** Changes numbered above `after`, in order, at most `limit`. */
  since(after: number, limit?: number): Promise<Change[]>;
  /** Notes what a reopened database of `book` was seen to hold; of a book that is no more, nothing. */
  confirm(number: number, book: string): Promise<Head>;
  /** Notes that a copy was saved: the last change in it, and when it was made. */
  noteCopy(copy: { number: number; at: string }): Promise<Head>;
  /** Gives up the database of a generation; gives the head with the next one. Once, however many tabs ask. */
  leaveDatabase(generation: number): Promise<Head>;
  /**
   * Empties everything in one transaction and begins a new book for `workshopId`.
   * @param seen the head of the book that is to go. @throws BookReplaced where that one has moved on, with nothing cleared.
   */
  startAnew(workshopId?: string, seen?: Head): Promise<Head>;
}

/** Another window has cleared this book or read in another. Its rows are no more: nothing may be written about them. */
export class BookReplaced extends Error {
  override readonly name = "BookReplaced";
}

function freshHead(workshopId: string = newId()): Head {
  return {
    device: uuidv4(),
    book: uuidv4(),
    generation: 1,
    workshopId,
    next: 1,
    nextReceipt: 1,
    clock: newClock,
    confirmed: 0,
    lastCopy: null,
  };
}

/**
 * The value without what PostgreSQL cannot hold and nobody can see: the sign of code 0, and half an emoji (a keyboard
 * that deletes by halves leaves one). One of them in the journal and no database could follow it any more.
 */
function storable(value: unknown): unknown {
  if (typeof value === "string") return value.replaceAll("\0", "").replace(/\p{Surrogate}/gu, "");
  if (Array.isArray(value)) return value.map(storable);
  if (typeof value === "object" && value !== null)
    return Object.fromEntries(Object.entries(value).map(([name, member]) => [name, storable(member)]));
  return value;
}

/** @throws where a write would change what is only ever added to (sync contract P3): a fault of the caller. */
function stamped(writes: Write[], stamp: string): RowChange[] {
  for (const { table, makes } of writes)
    if (!makes && addOnlyTables.has(table))
      throw new Error(`${table} are put right by adding, never changed`);
  return writes
    .filter((write) => write.makes || Object.keys(write.fields).length > 0)
    .map(({ table, id, makes, fields, bases }) => ({
      table,
      id,
      makes,
      fields: Object.fromEntries(
        Object.entries(fields).map(([name, value]) => [
          name,
          { value: storable(value ?? null), stamp, base: bases[name] ?? null },
        ]),
      ),
    }));
}

export function openJournal(store: UseStore, now: () => number = Date.now): Journal {
  const readHead = async (objects: IDBObjectStore): Promise<Head> => {
    const held = await promisifyRequest<Head | undefined>(objects.get("head"));
    return held ?? freshHead();
  };

  const put = (
    build: (head: Head, stamp: string, numbers: Numbers) => RowChange[],
    book: string | undefined,
  ) =>
    store("readwrite", async (objects) => {
      const done = promisifyRequest(objects.transaction);
      // A failing request also rejects below; the transaction's own rejection must not go unheard.
      done.catch(() => undefined);
      const head = await readHead(objects);
      if (book !== undefined && head.book !== book) throw new BookReplaced("This book is no more.");
      let clock = tick(head.clock, now());
      let nextReceipt = head.nextReceipt;
      const rows = build(head, writeStamp(clock, head.device), {
        receipt: () => receiptNumber(seriesOf(head.device), nextReceipt++),
      });
      for (const row of rows)
        for (const field of Object.values(row.fields)) clock = observe(clock, field.stamp);
      const change: Change = {
        number: head.next,
        device: head.device,
        workshopId: head.workshopId,
        schema: SCHEMA_NUMBER,
        writtenAt: new Date(now()).toISOString(),
        rows,
      };
      objects.put(change, change.number);
      objects.put({ ...head, clock, nextReceipt, next: head.next + 1 } satisfies Head, "head");
      await done;
      return change;
    });

  const updateHead = async (change: (head: Head) => Head): Promise<Head> =>
    store("readwrite", async (objects) => {
      const done = promisifyRequest(objects.transaction);
      done.catch(() => undefined);
      const head = change(await readHead(objects));
      objects.put(head, "head");
      await done;
      return head;
    });

  return {
    head: async () =>
      (await store("readonly", (objects) => promisifyRequest<Head | undefined>(objects.get("head")))) ??
      updateHead((head) => head),
    append: (build, book) => put((_head, stamp, numbers) => stamped(build(numbers), stamp), book),
    appendRows: (rows, book) => put(() => rows, book),
    since: async (after, limit) => {
      const held = await store("readonly", (objects) =>
        promisifyRequest<Change[]>(objects.getAll(IDBKeyRange.bound(after, Infinity, true), limit)),
      );
      return held.map((change) => upgradeChange(change));
    },
    confirm: (number, book) =>
      updateHead((head) =>
        head.book === book && number > head.confirmed ? { ...head, confirmed: number } : head,
      ),
    noteCopy: (lastCopy) => updateHead((head) => ({ ...head, lastCopy })),
    leaveDatabase: (generation) =>
      updateHead((head) => (head.generation === generation ? { ...head, generation: generation + 1 } : head)),
    startAnew: (workshopId, seen) =>
      store("readwrite", async (objects) => {
        const done = promisifyRequest(objects.transaction);
        done.catch(() => undefined);
        if (seen) {
          const held = await readHead(objects);
          if (held.book !== seen.book || held.next !== seen.next)
            throw new BookReplaced("This book has moved on.");
        }
        const head = freshHead(workshopId);
        objects.clear();
        objects.put(head, "head");
        await done;
        return head;
      }),
  };
}
