/**
 * Opens the browser's database: PGlite over IndexedDB, relaxed (the journal keeps what it has not saved yet).
 * Its files come compressed from our own server, or from the service worker's cache.
 */
import { IdbFs, PGlite } from "@electric-sql/pglite";
import { drizzle } from "drizzle-orm/pglite";
import files from "../browser-files.json";
import * as schema from "../schema";
import { type BookDatabase } from "../apply";
import { migrate } from "./migrations";

export interface OpenDatabase {
  db: BookDatabase;
  close(): Promise<void>;
}

async function fetchFile(name: keyof typeof files): Promise<Response> {
  const response = await fetch(`/pglite/${files[name]}`);
  if (!response.ok) throw new Error(`${String(name)}: the server answered ${response.status}`);
  return response;
}

/**
 * Fetches and compiles PGlite's three files, one after the other: on a slow line the screens come first. `tell` hears
 * how many are there.
 */
export async function fetchEngine(tell: (done: number, of: number) => void) {
  const compile = async (name: keyof typeof files) =>
    WebAssembly.compile(await (await fetchFile(name)).arrayBuffer());
  tell(0, 3);
  const pgliteWasmModule = await compile("pglite.wasm");
  tell(1, 3);
  const initdbWasmModule = await compile("initdb.wasm");
  tell(2, 3);
  const fsBundle = await (await fetchFile("pglite.data")).blob();
  tell(3, 3);
  return { pgliteWasmModule, initdbWasmModule, fsBundle };
}

/** Opens (and makes, at the first time) the database `name` and brings its tables up to date. */
export async function openDatabase(
  name: string,
  engine: Awaited<ReturnType<typeof fetchEngine>>,
): Promise<OpenDatabase> {
  const client = await PGlite.create({
    fs: new IdbFs(name),
    relaxedDurability: true,
    // PGlite saves whole files: a write-ahead log in pieces of 1 MB, not of 16, is that much less to save each time.
    initDbStartParams: ["--wal-segsize=1"],
    postgresqlconf: ["min_wal_size = 2MB", "max_wal_size = 8MB"],
    ...engine,
  });
  try {
    const db = drizzle({ client, schema }) as unknown as BookDatabase;
    await migrate(db);
    return { db, close: () => client.close() };
  } catch (error) {
    await client.close().catch(() => undefined);
    throw error;
  }
}

/** IndexedDB names of PGlite's databases of ours. */
const idbName = (name: string): string => `/pglite/${name}`;

async function deleteDatabase(name: string): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    const request = indexedDB.deleteDatabase(idbName(name));
    request.onsuccess = () => resolve();
    request.onerror = () => reject(request.error ?? new Error(`${name} cannot be deleted`));
    // Another connection is closing; the deletion goes through as soon as it has.
    request.onblocked = () => resolve();
  });
}

/** Throws away databases of earlier books. */
export async function deleteOthers(name: string): Promise<void> {
  for (const { name: other } of await indexedDB.databases())
    if (other?.startsWith(idbName("notchbook-")) && other !== idbName(name))
      await deleteDatabase(other.slice("/pglite/".length));
}
