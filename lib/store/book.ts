/**
 * The book as a tab sees it: writes through the journal, reads from whichever tab's database leads. One per
 * tab; `openBook` makes it.
 */
import { type Endpoint, type Remote, wrap } from "comlink";
import { type Change, type RowChange, type Write } from "@/lib/journal/change";
import { type Head, type Journal, type Numbers, openJournal } from "@/lib/journal/journal";
import { type AnyRow, type Rows } from "@/lib/journal/merge";
import { strictStore } from "@/lib/journal/strict-store";
import { type TableName } from "@/lib/records/types";
import { CALLS_CHANNEL, type DatabaseState, JOURNAL_NAME, type News, openNews } from "./channels";
import { type DatabaseApi } from "./database-api";
import { keepProblem, storageProblem } from "./keep-problem";
import { Pending } from "./pending";

/** A leader that closes takes its answers with it: ask again after this. Reads have no effect, so may be. */
const ANSWER_WITHIN_MS = 8000;
const TRIES = 4;
/** PGlite on spoilt files may hang without an error. Doubled each time, for the sake of very slow phones. */
const OPENED_WITHIN_MS = 30_000;

export type BookState =
  | { phase: "reading-journal" }
  /** IndexedDB itself is refused: nothing can be kept in this browser. */
  | { phase: "no-storage"; say: string }
  | { phase: "open"; head: Head; database: DatabaseState };

export class Book {
  readonly pending = new Pending();
  private readonly journal: Journal;
  private readonly calls: Remote<DatabaseApi>;
  private readonly news: ReturnType<typeof openNews>;
  private readonly listeners = new Set<() => void>();
  private readonly changeListeners = new Set<(applied: number) => void>();
  private current: BookState = { phase: "reading-journal" };
  /** Every change up to here has been read or needs not be. Own changes do not move it: another tab's may lie before. */
  private readTo = 0;
  /** The device's state as it was when the book was opened; rejects where storage is refused. */
  readonly opened: Promise<Head>;
  private worker: Worker | undefined;
  private openingTimer: ReturnType<typeof setTimeout> | undefined;
  private openedWithin = OPENED_WITHIN_MS;
  private waiters: { ready: () => void; failed: (why: Error) => void }[] = [];

  constructor(private readonly startWorker: () => Worker) {
    this.journal = openJournal(strictStore(JOURNAL_NAME, "journal"));
    this.calls = wrap<DatabaseApi>(new BroadcastChannel(CALLS_CHANNEL) as unknown as Endpoint);
    this.news = openNews((item) => this.hear(item));
    this.opened = this.journal.head();
    void this.open();
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly state = (): BookState => this.current;

  /** Calls back when rows of the database may have changed. */
  onRowsChanged(listener: (applied: number) => void): () => void {
    this.changeListeners.add(listener);
    return () => this.changeListeners.delete(listener);
  }

  /**
   * Keeps one change and shows it. Resolves when it has reached the disk.
   * @throws KeepProblem, with words for the user, and nothing kept.
   */
  async keep(build: Write[] | ((numbers: Numbers) => Write[])): Promise<Change> {
    const start = performance.now();
    const change = await this.kept(async () => {
      const { book } = await this.opened;
      return this.journal.append(typeof build === "function" ? build : () => build, book);
    });
    // It is kept: whatever goes wrong from here on may not say that it is not, or it would be kept twice.
    try {
      performance.measure("notchbook:kept", { start });
    } catch (error) {
      console.error(error);
    }
    return this.show(change);
  }

  /** Keeps rows of a copy in `book`, with the stamps they have. @throws KeepProblem */
  async keepRows(rows: RowChange[], book: string): Promise<void> {
    this.show(await this.kept(() => this.journal.appendRows(rows, book)));
  }

  /**
   * Clears everything on this phone and begins an empty book; every tab starts again.
   * @param seen where nothing may have been kept since: the head as it was. @throws KeepProblem
   */
  async startAnew(workshopId?: string, seen?: Head): Promise<Head> {
    return this.kept(() => this.journal.startAnew(workshopId, seen));
  }

  /** Tells every other tab to begin again, after `startAnew` and what was to follow it. */
  tellBookChanged(): void {
    this.news.tell({ kind: "book-changed" });
  }

  /** Notes that a copy was saved: the last change in it, and when it was made. */
  async noteCopy(copy: { number: number; at: string }): Promise<void> {
    await this.journal.noteCopy(copy);
    await this.refreshHead();
  }

  /** The device's state as it is now, whichever tab moved it. */
  head(): Promise<Head> {
    return this.journal.head();
  }

  /** All changes in the journal after one, for a copy without the database. */
  changesSince(after: number, limit?: number): Promise<Change[]> {
    return this.journal.since(after, limit);
  }

  async read(queryName: string, args: unknown): Promise<Rows> {
    return this.ask(() => this.calls.read(queryName, args));
  }

  async page(table: TableName, afterId: string | null, limit: number): Promise<AnyRow[]> {
    return this.ask(() => this.calls.page(table, afterId, limit));
  }

  private async kept<T>(write: () => Promise<T>): Promise<T> {
    try {
      return await write();
    } catch (error) {
      throw keepProblem(error);
    }
  }

  private async ask<T>(call: () => Promise<T>): Promise<T> {
    for (let tried = 1; ; tried++) {
      await this.ready();
      let timer: ReturnType<typeof setTimeout> | undefined;
      const late = new Promise<"late">((resolve) => {
        timer = setTimeout(() => resolve("late"), ANSWER_WITHIN_MS);
      });
      const answer = await Promise.race([call(), late]).finally(() => clearTimeout(timer));
      if (answer !== "late") return answer;
      if (tried >= TRIES) {
        void this.leaveStuckDatabase().catch(() => undefined);
        throw new Error("The database does not answer.");
      }
      this.news.tell({ kind: "state-wanted" });
    }
  }

  /** Rejects where the database failed; the screens then say so instead of waiting for ever. */
  private ready(): Promise<void> {
    const database = this.current.phase === "open" ? this.current.database : null;
    if (database?.phase === "ready") return Promise.resolve();
    if (database?.phase === "failed") return Promise.reject(new Error(database.say));
    return new Promise((ready, failed) => this.waiters.push({ ready, failed }));
  }

  private async open(): Promise<void> {
    try {
      const head = await this.opened;
      this.readTo = head.confirmed;
      await this.readOn();
      this.become({ phase: "open", head, database: { phase: "waiting" } });
    } catch (error) {
      this.become({ phase: "no-storage", say: storageProblem(error) });
      return;
    }
    this.news.tell({ kind: "state-wanted" });
    this.beginWorker();
  }

  private beginWorker(): void {
    this.worker?.terminate();
    this.worker = this.startWorker();
    this.worker.onerror = (event) => {
      this.setDatabase({
        phase: "failed",
        say: event.message || "The database's program could not be loaded.",
      });
      // Another tab's may lead and answer all the same.
      this.news.tell({ kind: "state-wanted" });
    };
  }

  /** Ends the thread that hangs, in whichever tab it is; the next one makes the database anew from the journal. */
  private async leaveStuckDatabase(): Promise<void> {
    if (this.current.phase !== "open") return;
    const head = await this.journal.leaveDatabase(this.current.head.generation);
    this.become({ ...this.current, head, database: { phase: "waiting" } });
    this.news.tell({ kind: "database-stuck" });
    this.beginWorker();
  }

  private watchOpening(database: DatabaseState): void {
    clearTimeout(this.openingTimer);
    if (database.phase !== "opening") return;
    const begun = Date.now();
    this.openingTimer = setTimeout(() => {
      // A phone that slept meanwhile proves nothing: the worker slept too. Look again.
      if (document.hidden || Date.now() - begun > this.openedWithin * 1.5) return this.watchOpening(database);
      this.openedWithin *= 2;
      void this.leaveStuckDatabase().catch(() => undefined);
    }, this.openedWithin);
  }

  private show(change: Change): Change {
    try {
      this.pending.add([change]);
    } catch (error) {
      console.error(error);
    }
    this.news.tell({ kind: "journal-grew" });
    void this.refreshHead();
    return change;
  }

  private async refreshHead(): Promise<void> {
    const head = await this.journal.head().catch(() => null);
    if (head && this.current.phase === "open") this.become({ ...this.current, head });
  }

  private async readOn(): Promise<void> {
    const changes = await this.journal.since(this.readTo);
    this.pending.add(changes);
    this.readTo = Math.max(this.readTo, changes.at(-1)?.number ?? 0);
  }

  private async catchUpWithOthers(): Promise<void> {
    await this.opened;
    await this.readOn();
    await this.refreshHead();
  }

  private hear(item: News): void {
    if (item.kind === "journal-grew") void this.catchUpWithOthers().catch(() => undefined);
    if (item.kind === "state") this.setDatabase(item.state);
    if (item.kind === "rows-changed") this.rowsChanged(item.applied);
    if (item.kind === "database-stuck") {
      void this.refreshHead();
      this.beginWorker();
    }
    // A whole new page: nothing of the book that was cleared may stay in memory.
    if (item.kind === "book-changed") location.reload();
  }

  private setDatabase(database: DatabaseState): void {
    if (this.current.phase !== "open") return;
    this.become({ ...this.current, database });
    this.watchOpening(database);
    if (database.phase === "failed")
      for (const { failed } of this.waiters.splice(0)) failed(new Error(database.say));
    if (database.phase !== "ready") return;
    for (const { ready } of this.waiters.splice(0)) ready();
    this.tellRowsChanged(database.applied);
  }

  private rowsChanged(applied: number): void {
    if (this.current.phase === "open" && this.current.database.phase === "ready")
      this.become({ ...this.current, database: { ...this.current.database, applied } });
    this.tellRowsChanged(applied);
  }

  private tellRowsChanged(applied: number): void {
    for (const listener of this.changeListeners) listener(applied);
  }

  private become(next: BookState): void {
    this.current = next;
    for (const listener of this.listeners) listener();
  }
}

let book: Book | undefined;

/** This tab's book; browser only. */
export function openBook(): Book {
  book ??= new Book(
    () => new Worker(new URL("../../worker/database.ts", import.meta.url), { type: "module" }),
  );
  return book;
}
