/**
 * Makes what the browser needs and no bundler makes: PGlite's files compressed once (Next would send the large
 * data file as it is), the migrations as JSON, the fonts for print.
 */
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { createRequire } from "node:module";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { brotliCompressSync, constants } from "node:zlib";
import { readMigrationFiles } from "drizzle-orm/migrator";
import { prepareFonts } from "./prepare-fonts.mjs";

const root = join(dirname(fileURLToPath(import.meta.url)), "..");
const require = createRequire(import.meta.url);

/** Names carry the content's hash: a new version of PGlite is a new address, and may be cached for ever. */
function preparePglite() {
  const from = dirname(require.resolve("@electric-sql/pglite"));
  const to = join(root, "public/pglite");
  mkdirSync(to, { recursive: true });
  const names = {};
  for (const file of ["pglite.wasm", "initdb.wasm", "pglite.data"]) {
    const content = readFileSync(join(from, file));
    const hash = createHash("sha256").update(content).digest("hex").slice(0, 10);
    const name = `${file.replace(".", "-")}.${hash}.br`;
    names[file] = name;
    if (existsSync(join(to, name))) continue;
    const params = {
      [constants.BROTLI_PARAM_QUALITY]: 11,
      [constants.BROTLI_PARAM_LGWIN]: 24,
      [constants.BROTLI_PARAM_SIZE_HINT]: content.length,
    };
    writeFileSync(join(to, name), brotliCompressSync(content, { params }));
  }
  for (const file of readdirSync(to)) if (!Object.values(names).includes(file)) rmSync(join(to, file));
  return names;
}

function prepareMigrations() {
  return readMigrationFiles({ migrationsFolder: join(root, "drizzle") });
}

const write = (file, content) => {
  const text = JSON.stringify(content, null, 1);
  const path = join(root, file);
  if (!existsSync(path) || readFileSync(path, "utf8") !== text) writeFileSync(path, text);
};

write("db/migrations.json", prepareMigrations());
write("db/browser-files.json", preparePglite());
await prepareFonts(join(root, "public/fonts"));
