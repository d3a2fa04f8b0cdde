"use client";

import { QueryClient } from "@tanstack/react-query";
import { PersistQueryClientProvider } from "@tanstack/react-query-persist-client";
import { createAsyncStoragePersister } from "@tanstack/query-async-storage-persister";
import { del, get, set } from "idb-keyval";
import { type ReactNode, useEffect, useState } from "react";
import { SCHEMA_NUMBER } from "@/lib/journal/change";
import { openBook } from "@/lib/store/book";
import { screensStore } from "@/lib/store/screens-store";

/** How many of the last looked-at screens are at hand before the database has opened. */
const SCREENS_KEPT = 80;

function makeClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      // The database tells when rows changed; time alone makes nothing stale. No line is ever needed.
      queries: {
        networkMode: "always",
        staleTime: Infinity,
        gcTime: Infinity,
        retry: false,
        refetchOnWindowFocus: false,
      },
    },
  });
}

/** The screens' rows, right for whoever lays every change after `after` over them. */
interface KeptScreens {
  after: number;
  value: string;
}

/** The last change that no screen's rows need laid over them. */
async function neededAfter(): Promise<number> {
  const book = openBook();
  const { next } = await book.opened;
  return (book.pending.all()[0]?.number ?? next) - 1;
}

/**
 * The rows of the screens, once the changes that they lack are held: a screen that was not looked at since has older
 * rows than the database, and would show an order as not taken. Null where those changes are too many to be held.
 */
async function readScreens({ after, value }: KeptScreens): Promise<string | null> {
  const book = openBook();
  const lacking = await book.changesSince(after);
  book.pending.add(lacking);
  return lacking.length === 0 || (await neededAfter()) <= after ? value : null;
}

/** Keeps the screens' rows under the name of the book that they are of: another book never sees them. */
function makePersister() {
  const keyOf = async (key: string) => `${key}/${(await openBook().opened).book}`;
  return createAsyncStoragePersister({
    storage: {
      getItem: async (key) => {
        const kept = await get<KeptScreens>(await keyOf(key), screensStore);
        return kept?.value ? readScreens(kept) : null;
      },
      setItem: async (key, value) =>
        set(await keyOf(key), { after: await neededAfter(), value } satisfies KeptScreens, screensStore),
      removeItem: async (key) => del(await keyOf(key), screensStore),
    },
    throttleTime: 500,
  });
}

/** Drops the screens that were looked at longest ago. */
function prune(client: QueryClient): void {
  const idle = client
    .getQueryCache()
    .getAll()
    .filter((query) => query.getObserversCount() === 0)
    .filter((query) => query.queryKey[0] !== "today" && query.queryKey[0] !== "workshop")
    .sort((a, b) => b.state.dataUpdatedAt - a.state.dataUpdatedAt);
  for (const query of idle.slice(SCREENS_KEPT)) client.getQueryCache().remove(query);
}

/** Opens the book for everything below it, with the cache of screens that shows yesterday's at once. */
export function BookProvider({ children }: { children: ReactNode }) {
  const [client] = useState(makeClient);
  const [persister] = useState(makePersister);

  useEffect(() => {
    const book = openBook();
    return book.onRowsChanged((applied) => {
      prune(client);
      void client.invalidateQueries().then(() => {
        if (book.pending.trim(applied)) client.removeQueries({ type: "inactive" });
      });
    });
  }, [client]);

  return (
    <PersistQueryClientProvider
      client={client}
      persistOptions={{
        persister,
        maxAge: Infinity,
        buster: String(SCHEMA_NUMBER),
        dehydrateOptions: { shouldDehydrateQuery: (query) => query.state.status === "success" },
      }}
    >
      {children}
    </PersistQueryClientProvider>
  );
}
