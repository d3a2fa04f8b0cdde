"use client";

import { useQuery } from "@tanstack/react-query";
import { useCallback, useMemo, useRef, useState, useSyncExternalStore } from "react";
import { type Change, type Write } from "@/lib/journal/change";
import { type Numbers } from "@/lib/journal/journal";
import { overlay } from "@/lib/journal/merge";
import { type Workshop } from "@/lib/records/types";
import { type BookState, openBook } from "@/lib/store/book";
import { type KeepProblem, keepProblem } from "@/lib/store/keep-problem";
import { type Query } from "@/lib/store/query";
import { workshopQuery } from "@/lib/store/queries/workshop";

const unopened: BookState = { phase: "reading-journal" };
const noChanges: readonly Change[] = [];
const noSubscription = () => () => undefined;
const onServer = typeof window === "undefined";

/** Where the book stands: storage, database, numbers. */
export function useBookState(): BookState {
  return useSyncExternalStore(
    onServer ? noSubscription : openBook().subscribe,
    onServer ? () => unopened : openBook().state,
    () => unopened,
  );
}

export interface Viewed<V> {
  view: V;
  /**
   * "known": from the database or from the last time it was looked at. "opening": only what was kept since the
   * start is known as yet. "failed": the database cannot answer.
   */
  state: "known" | "opening" | "failed";
}

/** What a query shows now: the database's rows, or the last seen, with every kept change laid over them. */
export function useView<A, V>(query: Query<A, V>, args: A): Viewed<V> {
  const { data, isError, isPlaceholderData } = useQuery({
    queryKey: [query.name, args],
    queryFn: () => openBook().read(query.name, args),
    // A list that is being searched goes on showing the last answer until the next one is there.
    placeholderData: (previous, before) => (before?.queryKey[0] === query.name ? previous : undefined),
  });
  const pending = useSyncExternalStore(
    onServer ? noSubscription : openBook().pending.subscribe,
    onServer ? () => noChanges : openBook().pending.all,
    () => noChanges,
  );
  const key = JSON.stringify(args);
  const view = useMemo(
    () => query.view(overlay(data ?? {}, pending), JSON.parse(key) as A),
    [query, data, pending, key],
  );
  // The last answer was to another question: that it does not hold this thing does not say that it is not there.
  const known = data !== undefined && !(isPlaceholderData && view === null);
  return { view, state: known ? "known" : isError ? "failed" : "opening" };
}

/** The workshop, or null where none is known (not begun yet, or still opening). */
export function useWorkshop(): Workshop | null {
  return useView(workshopQuery, {}).view;
}

export interface Keeping {
  /** Keeps one change. Resolves to it, or to null where it could not be kept: then `problem` says why. */
  keep(build: Write[] | ((numbers: Numbers) => Write[])): Promise<Change | null>;
  busy: boolean;
  problem: KeepProblem | null;
}

/** A write takes a few milliseconds: only one that takes longer than this is shown as being at work. */
const SHOWN_BUSY_AFTER_MS = 120;

/** Keeping from a screen, with its state to show. A second tap while the first is at work is the same write. */
export function useKeep(): Keeping {
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<KeepProblem | null>(null);
  const running = useRef<Promise<Change | null>>(null);
  const keep = useCallback<Keeping["keep"]>((build) => {
    running.current ??= (async () => {
      // Drawing anything before the write is under way would only make it wait.
      const writing = openBook().keep(build);
      const timer = setTimeout(() => setBusy(true), SHOWN_BUSY_AFTER_MS);
      try {
        const change = await writing;
        setProblem(null);
        return change;
      } catch (error) {
        setProblem(keepProblem(error));
        return null;
      } finally {
        clearTimeout(timer);
        setBusy(false);
        running.current = null;
      }
    })();
    return running.current;
  }, []);
  return { keep, busy, problem };
}
