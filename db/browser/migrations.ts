/** Applies drizzle-kit's migrations, bundled as JSON by `db/prepare-browser.mjs`. */
import { type PgDialect, type PgSession } from "drizzle-orm/pg-core";
import { type MigrationMeta } from "drizzle-orm/migrator";
import migrations from "../migrations.json";
import { type BookDatabase } from "../apply";

/** Drizzle's own migrator, reached by its internals as Drizzle has no public way without a file system. */
export async function migrate(db: BookDatabase): Promise<void> {
  const { dialect, session } = db as unknown as { dialect: PgDialect; session: PgSession };
  await dialect.migrate(migrations as MigrationMeta[], session, { migrationsFolder: "" });
}
