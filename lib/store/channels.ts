/** What tabs and the database's worker tell each other. All of them hear all of it, except the one who speaks. */
import { SCHEMA_NUMBER } from "@/lib/journal/change";

/**
 * While an update is taken in one tab and not yet in another, each version has a database of its own and a leader for it:
 * an older one would pass over what it does not know, and say that it has it.
 */
export const DATABASE_LOCK = `notchbook-database-${SCHEMA_NUMBER}`;
export const CALLS_CHANNEL = `notchbook-calls-${SCHEMA_NUMBER}`;
export const NEWS_CHANNEL = "notchbook-news";
export const JOURNAL_NAME = "notchbook-journal";
export const DRAFTS_NAME = "notchbook-drafts";
export const databaseName = ({ book, generation }: { book: string; generation: number }): string =>
  `notchbook-${book}-${generation}-${SCHEMA_NUMBER}`;

/** Where the browser's database stands, as told to every tab. */
export type DatabaseState =
  | { phase: "waiting" }
  | { phase: "fetching"; done: number; of: number }
  | { phase: "opening" }
  /** Following the journal: `done` of `of` changes. */
  | { phase: "reading"; done: number; of: number }
  | { phase: "ready"; applied: number; rebuilt: boolean }
  | { phase: "failed"; say: string };

export type News =
  | { kind: "journal-grew" }
  | { kind: "state"; state: DatabaseState }
  | { kind: "state-wanted" }
  /** Rows of the database changed; it has now followed the journal to `applied`. */
  | { kind: "rows-changed"; applied: number }
  /** The leading worker does not answer any more: every tab ends its own and starts another. */
  | { kind: "database-stuck" }
  /** Everything was cleared, or another book was read in: every tab begins again. */
  | { kind: "book-changed" };

/** What concerns every version; the rest is about the database of the one that speaks. */
const ofTheJournal = new Set<News["kind"]>(["journal-grew", "book-changed"]);

export function openNews(hear: (news: News) => void): { tell(news: News): void; close(): void } {
  const channel = new BroadcastChannel(NEWS_CHANNEL);
  channel.onmessage = ({ data }: MessageEvent<News & { schema: number }>) => {
    if (data.schema === SCHEMA_NUMBER || ofTheJournal.has(data.kind)) hear(data);
  };
  return {
    tell: (news) => channel.postMessage({ ...news, schema: SCHEMA_NUMBER }),
    close: () => channel.close(),
  };
}
