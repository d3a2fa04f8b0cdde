/**
 * Reads a copy into the book. What is read in is put down first, with the file itself, so that a reading that ends
 * half-way (a flat battery) is said at the next start and goes on from there.
 */
import { type RowChange } from "@/lib/journal/change";
import { type Head } from "@/lib/journal/journal";
import { dropDraft, getDraft, listDrafts, setDraft } from "@/lib/store/drafts";
import { type TellProgress } from "./collect-rows";
import { type ReadingPlan } from "./compare-copy";
import { type CopiedDraft, type SavedCopy } from "./saved-copy";

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
  startAnew(workshopId?: string): Promise<void>;
  tellBookChanged(): void;
  keepRows(rows: RowChange[]): Promise<void>;
  noteCopy(copy: { number: number; at: string }): Promise<void>;
  head(): Promise<Head>;
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

async function dropDraftsOfEarlierBook(): Promise<void> {
  for (const { key } of await draftsForCopy()) await dropDraft(key);
}

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
  await setDraft(UNFINISHED, {
    workshopId: workshop.id,
    workshopName: workshop.name,
    madeAt,
    whole,
    bytes,
  } satisfies UnfinishedReading);
  if (plan.kind !== "same") {
    await book.startAnew(workshop.id);
    // Other tabs at once: none of them may go on writing about rows that are no more.
    book.tellBookChanged();
    await dropDraftsOfEarlierBook();
  }
  const of = Math.max(plan.rows.length, 1);
  tell(0, of);
  for (let at = 0; at < plan.rows.length; at += ROWS_A_CHANGE) {
    await book.keepRows(plan.rows.slice(at, at + ROWS_A_CHANGE));
    tell(Math.min(at + ROWS_A_CHANGE, of), of);
  }
  await bringBackDrafts(copy.drafts);
  if (whole) await book.noteCopy({ number: (await book.head()).next - 1, at: madeAt });
  await forgetUnfinished();
}
