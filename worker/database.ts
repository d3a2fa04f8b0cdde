/**
 * The browser's database in its worker. Every tab starts one of these; the one that holds the lock leads and
 * answers all tabs, until its tab closes and the next one leads. The lock is held in here, not in the tab, so
 * that it goes only when this thread, and with it the database, is really gone.
 */
import { asc, gt } from "drizzle-orm";
import { type PgColumn, type PgTable } from "drizzle-orm/pg-core";
import { type Endpoint, expose } from "comlink";
import { applyChanges, type BookDatabase, checkCounts, readMark } from "@/db/apply";
import { deleteOthers, fetchEngine, openDatabase, type OpenDatabase } from "@/db/browser/open";
import { bookTables } from "@/db/schema";
import { drizzleSource } from "@/db/source";
import { isSpoilt } from "@/db/spoilt";
import { type Change } from "@/lib/journal/change";
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
/** Questions wait while a step is applied; a change of a copy that is read in holds hundreds of rows. */
const ROWS_A_STEP = 1000;

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
    for (const step of stepsOf(changes)) await applyChanges(open.db, step);
    applied = last.number;
  }
}

/** Runs of changes with about `ROWS_A_STEP` rows, in their order. */
function stepsOf(changes: readonly Change[]): Change[][] {
  const steps: Change[][] = [];
  let rows = ROWS_A_STEP;
  for (const change of changes) {
    if (rows >= ROWS_A_STEP) {
      steps.push([]);
      rows = 0;
    }
    steps.at(-1)!.push(change);
    rows += change.rows.length;
  }
  return steps;
}

type Engine = Awaited<ReturnType<typeof fetchEngine>>;

interface Opened {
  open: OpenDatabase;
  applied: number;
}

async function openOnce(head: Head, engine: Engine): Promise<Opened> {
  become({ phase: "opening" });
  const open = await openDatabase(databaseName(head), engine);
  try {
    const mark = await readMark(open.db, head.device);
    if (mark.applied >= head.next) throw new Error("the database is ahead of the journal");
    await checkCounts(open.db, mark);
    // What the mark says was really saved: it has just come out of a reopened database. On a full phone this cannot be
    // noted; the screens then only lay more changes over the rows.
    await journal.confirm(mark.applied, head.book).catch(() => undefined);
    const applied = await catchUp(open, head, (done, of) => become({ phase: "reading", done, of }));
    return { open, applied };
  } catch (error) {
    await open.close().catch(() => undefined);
    throw error;
  }
}

/** The database while this thread leads. Where it turns out to be spoilt it is made anew, once, from the journal. */
class Leader {
  private rebuilding: Promise<void> | null = null;
  private rebuilt = false;
  private running: Promise<void> | null = null;
  private again = false;
  private applied = 0;

  private constructor(
    private head: Head,
    private readonly engine: Engine,
    private open: OpenDatabase | null,
  ) {}

  static async start(): Promise<Leader> {
    const head = await journal.head();
    const engine = await fetchEngine((done, of) => become({ phase: "fetching", done, of }));
    const leader = new Leader(head, engine, null);
    try {
      leader.take(await openOnce(head, engine));
    } catch (error) {
      await leader.rebuild(error);
    }
    return leader;
  }

  /** Asks the database; where it cannot answer, asks again the one made anew. */
  async ask<T>(question: (db: BookDatabase) => Promise<T>): Promise<T> {
    await this.rebuilding;
    const asked = this.open;
    try {
      return await question(asked!.db);
    } catch (error) {
      if (!isSpoilt(error)) throw error;
      // Several may have been asked of the one that was spoilt; by the time this fails there may be another.
      if (asked === this.open || this.open === null) {
        await this.rebuild(error);
        this.ready();
      }
      return question(this.open!.db);
    }
  }

  private take({ open, applied }: Opened): void {
    this.open = open;
    this.applied = applied;
  }

  source(db: BookDatabase) {
    return drizzleSource(db, this.head.workshopId);
  }

  /** Brings the database up to the journal, now or after the round that is running. */
  follow(): void {
    this.again = true;
    this.running ??= this.followToTheEnd()
      .catch((error: unknown) => become({ phase: "failed", say: sayWhy(error) }))
      .finally(() => (this.running = null));
  }

  private async followToTheEnd(): Promise<void> {
    while (this.again) {
      this.again = false;
      this.applied = await this.ask(() => catchUp(this.open!, this.head));
      // After a failure everybody has to hear that it answers again.
      if (state.phase !== "ready") this.ready();
      state = { phase: "ready", applied: this.applied, rebuilt: this.rebuilt };
      news.tell({ kind: "rows-changed", applied: this.applied });
    }
  }

  ready(): void {
    become({ phase: "ready", applied: this.applied, rebuilt: this.rebuilt });
  }

  private rebuild(because: unknown): Promise<void> {
    if (this.rebuilt) return Promise.reject(because as Error);
    this.rebuilding ??= this.makeAnew(because).finally(() => (this.rebuilding = null));
    return this.rebuilding;
  }

  private async makeAnew(because: unknown): Promise<void> {
    console.warn("The database is made anew from the journal.", because);
    // Under another name: what hangs on to the spoilt one may not let go of it before this thread ends.
    void this.open?.close().catch(() => undefined);
    this.open = null;
    this.head = await journal.leaveDatabase(this.head.generation);
    this.take(await openOnce(this.head, this.engine));
    this.rebuilt = true;
  }
}

async function lead(): Promise<void> {
  leads = true;
  try {
    const leader = await Leader.start();
    const api: DatabaseApi = {
      read: async (queryName, args) => {
        const query = queriesByName.get(queryName);
        if (!query) throw new Error(`No query ${queryName}`);
        return leader.ask((db) => query.need(leader.source(db), args));
      },
      page: (table, afterId, limit) =>
        leader.ask(async (db) => {
          const from = bookTables[table] as PgTable & { id: PgColumn };
          const rows = await db
            .select()
            .from(from)
            .where(afterId === null ? undefined : gt(from.id, afterId))
            .orderBy(asc(from.id))
            .limit(limit);
          return rows as AnyRow[];
        }),
    };
    expose(api, new BroadcastChannel(CALLS_CHANNEL) as unknown as Endpoint);
    // Not before it listens: a call that nobody hears is asked again only after its time limit.
    leader.ready();
    follow = () => leader.follow();
    // Changes that came between the last look and now.
    follow();
    const head = await journal.head();
    void deleteOthers(databaseName(head)).catch(() => undefined);
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
