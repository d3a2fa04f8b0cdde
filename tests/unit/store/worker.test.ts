/** The database's worker itself, on a PGlite in memory; each test starts it anew over the same journal and database. */
import "fake-indexeddb/auto";
import { type PGlite } from "@electric-sql/pglite";
import { type Endpoint, type Remote, wrap } from "comlink";
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { type BookDatabase } from "@/db/apply";
import { make, type RowChange } from "@/lib/journal/change";
import { type Journal, openJournal } from "@/lib/journal/journal";
import { strictStore } from "@/lib/journal/strict-store";
import { CALLS_CHANNEL, JOURNAL_NAME, type News, openNews } from "@/lib/store/channels";
import { type DatabaseApi } from "@/lib/store/database-api";
import { emptyDatabase, freshDatabase } from "@/tests/support/pglite";

const opened = vi.hoisted(() => ({ names: [] as string[], open: (): unknown => null }));
vi.mock("@/db/browser/open", () => ({
  fetchEngine: () => Promise.resolve({}),
  openDatabase: (name: string) => {
    opened.names.push(name);
    return Promise.resolve({ db: opened.open(), close: () => Promise.resolve() });
  },
  deleteOthers: () => Promise.resolve(),
}));

let db: BookDatabase;
let client: PGlite;
let journal: Journal;
let heard: News[];
let news: ReturnType<typeof openNews>;
let channels: BroadcastChannel[];

beforeAll(async () => {
  ({ db, client } = await freshDatabase());
}, 90_000);
afterAll(() => client.close());
beforeEach(async () => {
  await emptyDatabase(client);
  channels = [];
  vi.stubGlobal(
    "BroadcastChannel",
    class extends BroadcastChannel {
      constructor(name: string) {
        super(name);
        channels.push(this);
      }
    },
  );
  vi.stubGlobal("self", { addEventListener: () => undefined });
  vi.stubGlobal("navigator", { locks: { request: (_name: string, lead: () => Promise<void>) => lead() } });
  journal = openJournal(strictStore(JOURNAL_NAME, "journal"));
  await journal.startAnew();
  opened.names.length = 0;
  opened.open = () => db;
  heard = [];
  news = openNews((item) => heard.push(item));
});
afterEach(() => {
  for (const channel of channels) channel.close();
  vi.unstubAllGlobals();
  vi.restoreAllMocks();
  vi.resetModules();
});

const newClient = (name: string) =>
  make("clients", { name, phone: "", phoneE164: null, email: "", address: "", note: "" });
const states = () => heard.flatMap((item) => (item.kind === "state" ? [item.state] : []));
const startWorker = async () => {
  await import("@/worker/database");
  await vi.waitFor(() => expect(["ready", "failed"]).toContain(states().at(-1)?.phase), 20_000);
};
/** Held for good: comlink tells the other side when a caller is collected as garbage, and these channels are closed. */
const callers: Remote<DatabaseApi>[] = [];
const calls = (): Remote<DatabaseApi> => {
  const caller = wrap<DatabaseApi>(new BroadcastChannel(CALLS_CHANNEL) as unknown as Endpoint);
  callers.push(caller);
  return caller;
};
const until = (look: () => void) => vi.waitFor(look, 20_000);

describe("the database's worker", () => {
  it("says at once how far it has come", async () => {
    await journal.append(() => [newClient("Ada")]);
    await startWorker();
    expect(states().find(({ phase }) => phase === "ready")).toMatchObject({ applied: 1, rebuilt: false });
  });

  it("opens the book on a phone with no room left", async () => {
    await journal.append(() => [newClient("Ada")]);
    await startWorker();
    for (const channel of channels.splice(1)) channel.close();
    vi.resetModules();
    heard.length = 0;
    // From now on nothing can be written any more.
    vi.spyOn(IDBObjectStore.prototype, "put").mockImplementation(() => {
      throw new DOMException("full", "QuotaExceededError");
    });
    opened.names.length = 0;
    await startWorker();
    expect(states().at(-1)).toMatchObject({ phase: "ready", applied: 1, rebuilt: false });
    expect(opened.names).toHaveLength(1);
    expect(await calls().page("clients", null, 10)).toHaveLength(1);
  });

  it("follows again after the journal could not be read, on the same database", async () => {
    await startWorker();
    await until(() => expect(heard.some(({ kind }) => kind === "rows-changed")).toBe(true));
    await journal.append(() => [newClient("Ada")]);
    vi.spyOn(IDBObjectStore.prototype, "getAll").mockImplementationOnce(() => {
      throw new DOMException("gone", "UnknownError");
    });
    news.tell({ kind: "journal-grew" });
    await until(() => expect(states().at(-1)?.phase).toBe("failed"));
    news.tell({ kind: "journal-grew" });
    await until(() => expect(states().at(-1)).toMatchObject({ phase: "ready", applied: 1 }));
    expect(opened.names).toHaveLength(1);
  });

  it("answers from the database made anew what was asked of the spoilt one, however late that fails", async () => {
    vi.spyOn(console, "warn").mockImplementation(() => undefined);
    const bad = Object.assign(new Error("invalid page"), { code: "XX001" });
    const giveUp: (() => void)[] = [];
    let spoilt = false;
    const spoiltDb = new Proxy(db, {
      get: (target, name) =>
        spoilt && name === "select"
          ? () => {
              const fails = new Promise((_, reject) => giveUp.push(() => reject(bad)));
              return { from: () => ({ where: () => fails }) };
            }
          : (Reflect.get(target, name) as unknown),
    });
    opened.open = () => (opened.names.length === 1 ? spoiltDb : db);
    await journal.append(() => [newClient("Ada")]);
    await startWorker();
    await until(() => expect(heard.some(({ kind }) => kind === "rows-changed")).toBe(true));
    spoilt = true;
    const [first, second] = [calls().read("workshop", {}), calls().read("workshop", {})];
    await until(() => expect(giveUp).toHaveLength(2));
    giveUp[0]!();
    expect(await first).toEqual({ workshops: [] });
    giveUp[1]!();
    expect(await second).toEqual({ workshops: [] });
    expect(opened.names).toHaveLength(2);
    expect(states().at(-1)).toMatchObject({ phase: "ready", rebuilt: true });
  });

  it("applies what a copy brings in steps, between which questions are answered", async () => {
    await startWorker();
    const { device } = await journal.head();
    const stamp = `0189a0000000-0000-${device}`;
    const rows = (piece: number): RowChange[] =>
      Array.from({ length: 600 }, (_, n) => ({
        table: "clients",
        id: `0189000${piece}-0000-7000-8000-${n.toString(16).padStart(12, "0")}`,
        makes: true,
        fields: Object.fromEntries(
          Object.entries(newClient(`Client ${n}`).fields).map(([name, value]) => [
            name,
            { value, stamp, base: null },
          ]),
        ),
      }));
    for (const piece of [1, 2, 3]) await journal.appendRows(rows(piece));
    const steps = vi.spyOn(db, "transaction");
    news.tell({ kind: "journal-grew" });
    await until(() => expect(heard.at(-1)).toMatchObject({ kind: "rows-changed", applied: 3 }));
    expect(steps).toHaveBeenCalledTimes(2);
    expect(await calls().page("clients", null, 5000)).toHaveLength(1800);
  });
});
