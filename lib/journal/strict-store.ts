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
  const begin = async (mode: IDBTransactionMode): Promise<IDBTransaction> =>
    (await open()).transaction(storeName, mode, { durability: "strict" });
  return async (mode, run) => {
    const transaction = await begin(mode).catch((error: unknown) => {
      // Some browsers close a connection without saying so. Nothing has begun yet, so it may be tried on another.
      if ((error as Error | null)?.name !== "InvalidStateError") throw error;
      opening = undefined;
      return begin(mode);
    });
    // While a failed request's error passes through its transaction, the transaction itself has none yet.
    let reason: DOMException | null = null;
    transaction.addEventListener("error", (event) => (reason ??= (event.target as IDBRequest).error));
    try {
      return await run(transaction.objectStore(storeName));
    } catch (error) {
      throw error ?? reason ?? transaction.error;
    }
  };
}
