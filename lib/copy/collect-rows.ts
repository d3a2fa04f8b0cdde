/** Gathers every row of the present book, for a copy or to hold a copy against. */
import { type Change } from "@/lib/journal/change";
import { type AnyRow, overlay, type Rows } from "@/lib/journal/merge";
import { type TableName, tableNames } from "@/lib/records/types";

/** What rows are gathered from; the book of a tab is one. */
export interface RowsAtHand {
  page(table: TableName, afterId: string | null, limit: number): Promise<AnyRow[]>;
  changesSince(after: number, limit?: number): Promise<Change[]>;
}

export interface Collected {
  rows: Rows;
  /** The last change that is surely in them. */
  upTo: number;
}

export type TellProgress = (done: number, of: number) => void;

const ROWS_A_PAGE = 500;
const CHANGES_A_PIECE = 500;

/** Changes above `after`, fetched in pieces so that other work of the phone gets its turn. */
async function changesAfter(
  book: RowsAtHand,
  after: number,
  tell: (done: number) => void,
): Promise<Change[]> {
  const changes: Change[] = [];
  for (;;) {
    const piece = await book.changesSince(changes.at(-1)?.number ?? after, CHANGES_A_PIECE);
    changes.push(...piece);
    tell(changes.length);
    if (piece.length < CHANGES_A_PIECE) return changes;
  }
}

/** Out of the journal alone, for a book whose database does not open. `last` is its last number. */
export async function collectFromJournal(
  book: RowsAtHand,
  last: number,
  tell: TellProgress = () => undefined,
): Promise<Collected> {
  const changes = await changesAfter(book, 0, (done) => tell(done, Math.max(last, done, 1)));
  return { rows: overlay({}, changes), upTo: changes.at(-1)?.number ?? 0 };
}

/**
 * Out of the database, page by page, with what it may not have got yet laid over. `applied` is a change that the
 * database is known to hold: rows written between two pages come in with those after it.
 */
export async function collectFromDatabase(
  book: RowsAtHand,
  applied: number,
  tell: TellProgress = () => undefined,
): Promise<Collected> {
  const rows: Rows = {};
  const steps = tableNames.length + 1;
  for (const [at, table] of tableNames.entries()) {
    tell(at, steps);
    const held: AnyRow[] = [];
    for (;;) {
      const page = await book.page(table, held.at(-1)?.id ?? null, ROWS_A_PAGE);
      held.push(...page);
      if (page.length < ROWS_A_PAGE) break;
    }
    rows[table] = held;
  }
  tell(steps - 1, steps);
  const changes = await changesAfter(book, applied, () => undefined);
  tell(steps, steps);
  return { rows: overlay(rows, changes), upTo: changes.at(-1)?.number ?? applied };
}
