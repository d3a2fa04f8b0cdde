import { type AnyRow, type Rows } from "@/lib/journal/merge";
import { type TableName } from "@/lib/records/types";

/** What the leading tab's database answers to every tab. Only reads: writes go through the journal. */
export interface DatabaseApi {
  /** The rows that the query of that name needs. Rejects on a name that it does not know. */
  read(queryName: string, args: unknown): Promise<Rows>;
  /** All rows of a table in the order of their ids, from after one id, for a copy. */
  page(table: TableName, afterId: string | null, limit: number): Promise<AnyRow[]>;
}
