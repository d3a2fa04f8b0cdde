import "fake-indexeddb/auto";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { make } from "@/lib/journal/change";
import { type Journal, openJournal } from "@/lib/journal/journal";
import { strictStore } from "@/lib/journal/strict-store";
import { Book } from "@/lib/store/book";
import {
  type DatabaseState,
  databaseName,
  JOURNAL_NAME,
  type News,
  NEWS_CHANNEL,
  openNews,
} from "@/lib/store/channels";

const client = (name: string) =>
  make("clients", { name, phone: "", phoneE164: null, email: "", address: "", note: "" });
const ready: DatabaseState = { phase: "ready", applied: 0, rebuilt: false };

/** Another tab's journal, and a worker's news. */
let journal: Journal;
let heard: News[];
let news: ReturnType<typeof openNews>;
let worker: Worker;
const openTab = async () => {
  worker = { terminate: () => undefined } as Worker;
  const book = new Book(() => worker);
  await vi.waitFor(() => expect(book.state().phase).toBe("open"));
  return book;
};
const database = (book: Book) => {
  const state = book.state();
  return state.phase === "open" ? state.database : null;
};
const numbers = (book: Book) => book.pending.all().map(({ number }) => number);

beforeEach(async () => {
  journal = openJournal(strictStore(JOURNAL_NAME, "journal"));
  await journal.startAnew();
  heard = [];
  news = openNews((item) => heard.push(item));
});
afterEach(() => news.close());

describe("a tab's book", () => {
  it("shows what another tab kept just before a change of its own", async () => {
    const book = await openTab();
    await journal.append(() => [client("The other tab's")]);
    await book.keep([client("Own")]);
    news.tell({ kind: "journal-grew" });
    await vi.waitFor(() => expect(numbers(book)).toEqual([1, 2]));
  });

  it("reads only what is new to it when another tab keeps something", async () => {
    for (let n = 0; n < 3; n++) await journal.append(() => [client(`Client ${n}`)]);
    await journal.confirm(3, (await journal.head()).book);
    const book = await openTab();
    await journal.append(() => [client("The other tab's")]);
    news.tell({ kind: "journal-grew" });
    await vi.waitFor(() => expect(numbers(book)).toEqual([4]));
  });

  it("never says of what it has kept that it was not: it would be kept twice", async () => {
    const book = await openTab();
    vi.spyOn(performance, "measure").mockImplementationOnce(() => {
      throw new Error("no measuring here");
    });
    book.pending.subscribe(() => {
      throw new Error("a screen fell over");
    });
    const complained = vi.spyOn(console, "error").mockImplementation(() => undefined);
    expect((await book.keep([client("Ada")])).number).toBe(1);
    expect(complained).toHaveBeenCalled();
    complained.mockRestore();
    expect(await journal.since(0)).toHaveLength(1);
  });

  it("goes on with another tab's database where its own program cannot be loaded", async () => {
    const book = await openTab();
    heard.length = 0;
    worker.onerror!({ message: "404" } as ErrorEvent);
    expect(database(book)).toMatchObject({ phase: "failed" });
    await vi.waitFor(() => expect(heard).toContainEqual(expect.objectContaining({ kind: "state-wanted" })));
    news.tell({ kind: "state", state: ready });
    await vi.waitFor(() => expect(database(book)).toEqual(ready));
  });

  it("knows how far the database has come, so that a copy need not read the whole journal over it", async () => {
    const book = await openTab();
    news.tell({ kind: "state", state: ready });
    news.tell({ kind: "rows-changed", applied: 7 });
    await vi.waitFor(() => expect(database(book)).toEqual({ ...ready, applied: 7 }));
  });
});

describe("an older version in another tab", () => {
  it("has a database of its own, whose state is not taken for this one's; of the journal both hear", async () => {
    expect(databaseName({ book: "b", generation: 1 })).not.toBe("notchbook-b-1");
    const book = await openTab();
    const older = new BroadcastChannel(NEWS_CHANNEL);
    older.postMessage({ kind: "state", state: ready });
    await journal.append(() => [client("Kept by the older one")]);
    older.postMessage({ kind: "journal-grew" });
    await vi.waitFor(() => expect(numbers(book)).toEqual([1]));
    expect(database(book)).toEqual({ phase: "waiting" });
    older.close();
  });
});
