/**
 * The browser's database in its worker. Every tab starts one of these; the one that holds the lock leads and
 * answers all tabs, until its tab closes and the next one leads. The lock is held in here, not in the tab, so
 * that it goes only when this thread, and with it the database, is really gone.
 */
import { asc, gt } from "drizzle-orm";
import { type PgColumn, type PgTable } from "drizzle-orm/pg-core";
import { type Endpoint, expose } from "comlink";
import { applyChanges, checkCounts, readMark } from "@/db/apply";
import {
  deleteDatabase,
  deleteOthers,
  fetchEngine,
  openDatabase,
  type OpenDatabase,
} from "@/db/browser/open";
import { bookTables } from "@/db/schema";
import { drizzleSource } from "@/db/source";
import { type Head, openJournal } from "@/lib/journal/journal";
import { type AnyRow } from "@/lib/journal/merge";
import { strictStore } from "@/lib/journal/strict-store";
import {
  CALLS_CHANNEL,
  DATABASE_LOCK,
  databaseName,
  type DatabaseState,
  JOURNAL_NAME,
  openNews,
} from "@/lib/store/channels";
import { type DatabaseApi } from "@/lib/store/database-api";
import { queriesByName } from "@/lib/store/queries";

const journal = openJournal(strictStore(JOURNAL_NAME, "journal"));
const CHANGES_A_STEP = 100;

let state: DatabaseState = { phase: "waiting" };
let leads = false;
let follow: () => void = () => undefined;

const news = openNews((item) => {
  if (item.kind === "journal-grew") follow();
  if (item.kind === "state-wanted" && leads) news.tell({ kind: "state", state });
});

function become(next: DatabaseState): void {
  state = next;
  news.tell({ kind: "state", state });
}

/** Brings the database up to the journal's end; `tell` hears how far it is. */
async function catchUp(
  open: OpenDatabase,
  head: Head,
  tell?: (done: number, of: number) => void,
): Promise<number> {
  let { applied } = await readMark(open.db, head.device);
  const first = applied;
  for (;;) {
    const changes = await journal.since(applied, CHANGES_A_STEP);
    const last = changes.at(-1);
    if (!last) return applied;
    tell?.(applied - first, Math.max((await journal.head()).next - 1 - first, 1));
    await applyChanges(open.db, changes);
    applied = last.number;
  }
}

/** Opens the database, made anew from the journal where it is spoilt. */
async function openChecked(head: Head): Promise<{ open: OpenDatabase; rebuilt: boolean }> {
  const name = databaseName(head.book);
  const engine = await fetchEngine((done, of) => become({ phase: "fetching", done, of }));
  const attempt = async (): Promise<OpenDatabase> => {
    become({ phase: "opening" });
    const open = await openDatabase(name, engine);
    try {
      const mark = await readMark(open.db, head.device);
      // Whatever the mark says was really saved: it has just come out of a reopened database.
      if (mark.applied >= head.next) throw new Error("the database is ahead of the journal");
      await checkCounts(open.db, mark);
      await journal.confirm(mark.applied);
      await catchUp(open, head, (done, of) => become({ phase: "reading", done, of }));
      return open;
    } catch (error) {
      await open.close().catch(() => undefined);
      throw error;
    }
  };
  try {
    return { open: await attempt(), rebuilt: false };
  } catch (error) {
    console.warn("The database is made anew from the journal.", error);
    await deleteDatabase(name);
    return { open: await attempt(), rebuilt: true };
  }
}

async function lead(): Promise<void> {
  leads = true;
  try {
    const head = await journal.head();
    const { open, rebuilt } = await openChecked(head);
    const source = drizzleSource(open.db, head.workshopId);
    const api: DatabaseApi = {
      read: async (queryName, args) => {
        const query = queriesByName.get(queryName);
        if (!query) throw new Error(`No query ${queryName}`);
        return query.need(source, args);
      },
      page: async (table, afterId, limit) => {
        const from = bookTables[table] as PgTable & { id: PgColumn };
        const rows = await open.db
          .select()
          .from(from)
          .where(afterId === null ? undefined : gt(from.id, afterId))
          .orderBy(asc(from.id))
          .limit(limit);
        return rows as AnyRow[];
      },
    };
    expose(api, new BroadcastChannel(CALLS_CHANNEL) as unknown as Endpoint);

    let running: Promise<void> | null = null;
    let again = false;
    const run = async (): Promise<void> => {
      do {
        again = false;
        const applied = await catchUp(open, head);
        state = { phase: "ready", applied, rebuilt };
        news.tell({ kind: "rows-changed", applied });
      } while (again);
    };
    follow = () => {
      again = true;
      running ??= run()
        .catch((error: unknown) => become({ phase: "failed", say: sayWhy(error) }))
        .finally(() => (running = null));
    };
    become({ phase: "ready", applied: (await readMark(open.db, head.device)).applied, rebuilt });
    // Changes that came between the last look and now.
    follow();
    void deleteOthers(databaseName(head.book)).catch(() => undefined);
  } catch (error) {
    become({ phase: "failed", say: sayWhy(error) });
  }
  // Leads until this thread ends.
  await new Promise(() => undefined);
}

function sayWhy(error: unknown): string {
  return error instanceof Error ? `${error.name}: ${error.message}` : String(error);
}

/**
 * Saving in the background (relaxed), PGlite may meet a file that PostgreSQL has just removed; that round of
 * saving fails with Emscripten's ErrnoError and the next one does it. Nothing is lost: the journal has it.
 */
self.addEventListener("unhandledrejection", (event) => {
  if ((event.reason as { name?: string } | null)?.name === "ErrnoError") event.preventDefault();
});

void navigator.locks.request(DATABASE_LOCK, lead);
