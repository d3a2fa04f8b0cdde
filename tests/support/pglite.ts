/** A fresh PGlite in memory with our migrations, as the browser has it. */
import { PGlite } from "@electric-sql/pglite";
import { drizzle } from "drizzle-orm/pglite";
import { migrate } from "drizzle-orm/pglite/migrator";
import { type BookDatabase } from "@/db/apply";
import * as schema from "@/db/schema";

export async function freshDatabase(): Promise<{ db: BookDatabase; client: PGlite }> {
  const client = await PGlite.create();
  const db = drizzle({ client, schema });
  await migrate(db, { migrationsFolder: "drizzle" });
  return { db: db as unknown as BookDatabase, client };
}

export async function emptyDatabase(client: PGlite): Promise<void> {
  await client.exec(
    `truncate workshops, clients, wearers, measurement_sets, sleeves, orders, garments, price_lines, payments, receipts,
     sums, client_index, order_sums, journal_marks`,
  );
}
