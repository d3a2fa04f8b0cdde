/** The server's database: PGlite under ./data (or NOTCHBOOK_DATA), with the phone's schema and migrations. */
import { join } from "node:path";
import { PGlite } from "@electric-sql/pglite";
import { drizzle } from "drizzle-orm/pglite";
import { migrate } from "drizzle-orm/pglite/migrator";
import { type BookDatabase } from "../apply";
import * as schema from "../schema";
import { lockFolder } from "./lock";

export interface ServerDatabase {
  db: BookDatabase;
  close(): Promise<void>;
}

/** Opens the database in `folder`. @throws DataFolderBusy */
export async function openServerDatabase(folder: string): Promise<ServerDatabase> {
  const unlock = lockFolder(folder);
  try {
    const client = await PGlite.create(join(folder, "pglite"));
    const db = drizzle({ client, schema });
    await migrate(db, { migrationsFolder: join(process.cwd(), "drizzle") });
    return {
      db: db as unknown as BookDatabase,
      close: async () => {
        await client.close();
        unlock();
      },
    };
  } catch (error) {
    unlock();
    throw error;
  }
}

const held = globalThis as typeof globalThis & { notchbookDatabase?: Promise<ServerDatabase> };

/** This process's database, opened at the first call (never while the app is being built). */
export function serverDatabase(): Promise<ServerDatabase> {
  if (!held.notchbookDatabase) {
    const opening = openServerDatabase(process.env.NOTCHBOOK_DATA ?? "data");
    held.notchbookDatabase = opening;
    // The next request tries again, perhaps after the other process has gone.
    opening.catch(() => (held.notchbookDatabase = undefined));
  }
  return held.notchbookDatabase;
}
