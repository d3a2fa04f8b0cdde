/** Spoils the browser's database as a bad memory chip would: rubbish in its files, the journal left alone. */
import { type Page } from "@playwright/test";

/**
 * Overwrites every `every`th non-empty file of PGlite's database with rubbish of the same length. To be called on a page of
 * the same origin that does not have the app open. Gives how many files were spoilt.
 */
export async function spoilDatabase(page: Page, every: number): Promise<number> {
  return page.evaluate(async (step) => {
    const wait = <T>(request: IDBRequest<T>) =>
      new Promise<T>((resolve, reject) => {
        request.onsuccess = () => resolve(request.result);
        request.onerror = () => reject(request.error ?? new Error("failed"));
      });
    let spoilt = 0;
    for (const { name } of await indexedDB.databases()) {
      if (!name?.startsWith("/pglite/")) continue;
      const database = await wait(indexedDB.open(name));
      for (const storeName of Array.from(database.objectStoreNames)) {
        const store = database.transaction(storeName, "readwrite").objectStore(storeName);
        const keys = await wait(store.getAllKeys());
        let n = 0;
        for (const key of keys) {
          const value = (await wait(store.get(key))) as { contents?: Uint8Array } | undefined;
          if (!value?.contents?.length || n++ % step !== 0) continue;
          const contents = new Uint8Array(value.contents.length);
          for (let i = 0; i < contents.length; i += 65536)
            crypto.getRandomValues(contents.subarray(i, Math.min(i + 65536, contents.length)));
          await wait(store.put({ ...value, contents }, key));
          spoilt++;
        }
      }
      database.close();
    }
    return spoilt;
  }, every);
}
