/**
 * idb-keyval stores whose writes ask for `durability: "strict"`: a completed transaction has reached the disk,
 * so that a flat battery right after it loses nothing.
 */
import { promisifyRequest, type UseStore } from "idb-keyval";

/** Opens (and makes, at the first time) one object store in a database of its own. */
export function strictStore(databaseName: string, storeName: string): UseStore {
  let opening: Promise<IDBDatabase> | undefined;
  const open = (): Promise<IDBDatabase> => {
    opening ??= new Promise<IDBDatabase>((resolve, reject) => {
      const request = indexedDB.open(databaseName);
      request.onupgradeneeded = () => request.result.createObjectStore(storeName);
      promisifyRequest(request).then((database) => {
        // The browser may close it (storage cleared, memory short): open it anew at the next use.
        database.onclose = () => (opening = undefined);
        database.onversionchange = () => {
          database.close();
          opening = undefined;
        };
        resolve(database);
      }, reject);
    });
    opening.catch(() => (opening = undefined));
    return opening;
  };
  return async (mode, use) => {
    const database = await open();
    const transaction = database.transaction(storeName, mode, { durability: "strict" });
    return use(transaction.objectStore(storeName));
  };
}
