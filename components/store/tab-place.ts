"use client";

import { useSyncExternalStore } from "react";

export interface TabPlace<T> {
  set(next: T): void;
  use(): T;
}

/**
 * Where something was left (what a list was searched for, how far it was opened): lives as long as the tab, so that back,
 * and a reload, return to it. `read` makes the place from what is stored, or the first one from null; it never throws.
 */
export function tabPlace<T>(key: string, read: (stored: string | null) => T): TabPlace<T> {
  const first = read(null);
  const listeners = new Set<() => void>();
  let place: T | undefined;

  const current = (): T => {
    if (place !== undefined) return place;
    try {
      place = read(sessionStorage.getItem(key));
    } catch {
      // Without session storage it begins at its head.
      place = first;
    }
    return place;
  };
  const subscribe = (listener: () => void): (() => void) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  };
  return {
    set(next) {
      place = next;
      try {
        sessionStorage.setItem(key, JSON.stringify(next));
      } catch {
        // It is then remembered until the page is loaded again.
      }
      for (const listener of listeners) listener();
    },
    use: () => useSyncExternalStore(subscribe, current, () => first),
  };
}
