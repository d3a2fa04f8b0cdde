/**
 * Reads a copy into the book. What is read in is put down first, with the file itself, so that a reading that ends
 * half-way (a flat battery) is said at the next start and goes on from there.
 */
import { type Change, type RowChange } from "@/lib/journal/change";
import { type Head } from "@/lib/journal/journal";
import { dropDraft, getDraft, listDrafts, setDraft } from "@/lib/store/drafts";
import { KeepProblem } from "@/lib/store/keep-problem";
import { type TellProgress } from "./collect-rows";
import { type ReadingPlan } from "./compare-copy";
import { type CopiedDraft, countRows, type SavedCopy } from "./saved-copy";

const UNFINISHED = "restore:unfinished";
const ROWS_A_CHANGE = 500;

export interface UnfinishedReading {
  workshopId: string;
  workshopName: string;
  madeAt: string;
  /** True where the copy is all that the book is to hold; false where it is merged into one. */
  whole: boolean;
  /** The file as it was chosen. */
  bytes: Uint8Array<ArrayBuffer>;
}

/** The part of the book that reading in needs. */
export interface BookToFill {
  startAnew(workshopId?: string, seen?: Head): Promise<Head>;
  tellBookChanged(): void;
  keepRows(rows: RowChange[], book: string): Promise<void>;
  noteCopy(copy: { number: number; at: string }): Promise<void>;
  head(): Promise<Head>;
  changesSince(after: number): Promise<Change[]>;
}

/** A reading that has not come to its end, or null. */
export async function unfinishedReading(): Promise<UnfinishedReading | null> {
  return (await getDraft<UnfinishedReading>(UNFINISHED))?.value ?? null;
}

/** Forgets a reading that has not come to its end; what was read in stays. */
export async function forgetUnfinished(): Promise<void> {
  await dropDraft(UNFINISHED);
}

/** Drafts of this phone for a copy: all but the note of a reading. */
export async function draftsForCopy(): Promise<CopiedDraft[]> {
  const held = await listDrafts<unknown>("");
  return held
    .filter(({ key }) => key !== UNFINISHED)
    .map(({ key, draft }) => ({ key, savedAt: draft.savedAt, value: draft.value }));
}

/**
 * Puts down what is being read in, unless a reading of it goes on. Gives when it was begun: of a reading that makes the
 * whole book, drafts from before then are of the book that went, although the phone stopped before they were dropped.
 */
async function noteReading(reading: UnfinishedReading, goesOn: boolean): Promise<string> {
  const left = await getDraft<UnfinishedReading>(UNFINISHED);
  const same =
    left?.value.workshopId === reading.workshopId &&
    left.value.madeAt === reading.madeAt &&
    left.value.whole === reading.whole;
  if (!goesOn || !same) await setDraft(UNFINISHED, reading);
  return (await getDraft(UNFINISHED))!.savedAt;
}

/** @param begunAt only those from before then; without it all. */
async function dropDraftsOfEarlierBook(begunAt?: string): Promise<void> {
  for (const { key, savedAt } of await draftsForCopy())
    if (begunAt === undefined || savedAt <= begunAt) await dropDraft(key);
}

/** The book that the plan was made for. @throws KeepProblem where another window has changed it so that it is not. */
async function bookOfPlan(book: BookToFill, plan: ReadingPlan, workshopId: string): Promise<Head> {
  const head = await book.head();
  const stands =
    plan.kind === "same"
      ? head.workshopId === workshopId
      : plan.kind === "other" || (await book.changesSince(0)).every(({ rows }) => rows.length === 0);
  if (stands) return head;
  throw new KeepProblem(
    "Nothing was read in: meanwhile this phone’s book was changed in another window. Choose the file again to see what it would do now.",
    null,
  );
}

/** How many changes it takes to keep so many rows. */
const piecesOf = (rows: number): number => Math.ceil(rows / ROWS_A_CHANGE);

/** What was being typed when the copy was made, unless something later is being typed at the same place. */
async function bringBackDrafts(drafts: readonly CopiedDraft[]): Promise<void> {
  for (const { key, savedAt, value } of drafts) {
    const held = await getDraft(key);
    if (!held || held.savedAt < savedAt) await setDraft(key, value);
  }
}

/**
 * Reads in as planned. With a plan of kind "empty" or "other" everything on this phone is cleared first: ask before.
 * Afterwards every tab must begin again.
 * @param whole see `UnfinishedReading`; a reading that goes on keeps what it was begun with.
 * @throws KeepProblem where the phone cannot keep it; what was read in until then stays, and it can go on later.
 */
export async function readIn(
  book: BookToFill,
  copy: SavedCopy,
  bytes: Uint8Array<ArrayBuffer>,
  plan: ReadingPlan,
  whole: boolean = plan.kind !== "same",
  tell: TellProgress = () => undefined,
): Promise<void> {
  const { workshop, madeAt } = copy;
  let into = await bookOfPlan(book, plan, workshop.id);
  const begunAt = await noteReading(
    { workshopId: workshop.id, workshopName: workshop.name, madeAt, whole, bytes },
    plan.kind === "same",
  );
  if (plan.kind !== "same") {
    into = await book.startAnew(workshop.id, into);
    // Other tabs at once: none of them may go on writing about rows that are no more.
    book.tellBookChanged();
  }
  if (whole) await dropDraftsOfEarlierBook(plan.kind === "same" ? begunAt : undefined);
  const of = Math.max(plan.rows.length, 1);
  tell(0, of);
  for (let at = 0; at < plan.rows.length; at += ROWS_A_CHANGE) {
    await book.keepRows(plan.rows.slice(at, at + ROWS_A_CHANGE), into.book);
    tell(Math.min(at + ROWS_A_CHANGE, of), of);
  }
  await bringBackDrafts(copy.drafts);
  if (whole) {
    const last = (await book.head()).next - 1;
    // More changes than the copy takes: something of her own is among them, which the copy does not have.
    const all = countRows(copy);
    const ofCopy = piecesOf(all - plan.rows.length) + piecesOf(plan.rows.length);
    await book.noteCopy({ number: last === ofCopy ? last : 0, at: madeAt });
  }
  await forgetUnfinished();
}
