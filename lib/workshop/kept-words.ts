/**
 * What the line at the head of every screen says (sync contract L4). Until a server takes the changes, what waits is
 * what no saved copy has.
 */
import { type Head } from "@/lib/journal/journal";
import { type BookState } from "@/lib/store/book";
import { sinceWords } from "./since-words";

export interface KeptWords {
  said: string;
  /** True while the phone is still at work, so that a sign may show it. */
  working: boolean;
}

/** How many changes no copy has. */
export function changesSinceCopy(head: Pick<Head, "next" | "lastCopy">): number {
  return Math.max(0, head.next - 1 - (head.lastCopy?.number ?? 0));
}

const changes = (n: number): string => `${n} ${n === 1 ? "change" : "changes"}`;

function waiting(head: Head, now: Date): string {
  const n = changesSinceCopy(head);
  if (!head.lastCopy) return `${changes(n)}, no copy yet`;
  const when = sinceWords(new Date(head.lastCopy.at), now);
  // Short, so that it stands on one line of a phone.
  return n === 0 ? `all in the copy of ${when}` : `copy of ${when}, ${n} since`;
}

/** The same as a sentence of its own. */
export function copyWords(head: Head, now: Date): string {
  const n = changesSinceCopy(head);
  if (!head.lastCopy)
    return n === 0
      ? "Nothing to copy yet."
      : `No copy yet: ${changes(n)} ${n === 1 ? "is" : "are"} only on this phone.`;
  const when = sinceWords(new Date(head.lastCopy.at), now);
  return n === 0
    ? `The last copy, ${when}, has everything.`
    : `Last copy: ${when}. ${changes(n)} since then ${n === 1 ? "is" : "are"} in no copy.`;
}

/** Null where there is nothing to say yet: before the first start, and before the journal has been read. */
export function keptWords(state: BookState, { demo, now }: { demo: boolean; now: Date }): KeptWords | null {
  if (state.phase !== "open" || state.head.next === 1) return null;
  const { database, head } = state;
  const kept = (said: string, working = false): KeptWords => ({
    said: `Kept on this phone · ${said}`,
    working,
  });
  switch (database.phase) {
    case "waiting":
    case "opening":
      return kept("opening the book", true);
    case "fetching":
      return kept(`opening the book, ${database.done} of ${database.of}`, true);
    case "reading":
      return kept(`reading ${database.done} of ${changes(database.of)}`, true);
    case "failed":
      return kept("the book does not open");
    case "ready":
      return kept(demo ? "an invented workshop" : waiting(head, now));
  }
}
