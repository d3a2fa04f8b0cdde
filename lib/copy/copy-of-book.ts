/** A copy of the book of this tab, out of whichever of its two sides answers. */
import { type Book } from "@/lib/store/book";
import { collectFromDatabase, collectFromJournal, type Collected, type TellProgress } from "./collect-rows";
import { type CopyFile, copyFileName, packCopy, textCopy } from "./copy-file";
import { draftsForCopy } from "./read-in";
import { countRows, makeCopy, writeCopy } from "./saved-copy";

/** Every row of the present book: from the database where it is open, else from the journal, which has them all. */
export async function collectBook(book: Book, tell?: TellProgress): Promise<Collected> {
  const state = book.state();
  if (state.phase === "open" && state.database.phase === "ready") {
    try {
      return await collectFromDatabase(book, state.database.applied, tell);
    } catch (error) {
      console.warn("The database does not answer; the copy is made from the journal.", error);
    }
  }
  const last = state.phase === "open" ? state.head.next - 1 : 0;
  return collectFromJournal(book, last, tell);
}

export interface MadeCopy {
  /** To save on the phone. */
  file: CopyFile;
  /** The same, in the form in which it can be sent. */
  toSend: CopyFile;
  entries: number;
  /** For `noteCopy`, once it has been saved. */
  note: { number: number; at: string };
}

export async function copyBook(book: Book, tell?: TellProgress): Promise<MadeCopy> {
  const { workshopId } = await book.head();
  const now = new Date();
  const madeAt = now.toISOString();
  const { rows, upTo } = await collectBook(book, tell);
  // A draft that cannot be read must not keep the rest from being saved.
  const drafts = await draftsForCopy().catch(() => []);
  const copy = makeCopy(rows, drafts, { workshopId, madeAt });
  const text = await writeCopy(copy);
  const name = copyFileName(copy.workshop.name, now);
  return {
    file: await packCopy(text, name),
    toSend: textCopy(text, name),
    entries: countRows(copy),
    note: { number: upTo, at: madeAt },
  };
}
