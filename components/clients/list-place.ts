"use client";

import { useSyncExternalStore } from "react";
import { type ListPlace, readListPlace } from "@/lib/clients/list-words";

/** Where the list was left lives as long as the tab, so that back, and a reload, return to it. */
const KEY = "notchbook:clients-list";

const head = readListPlace(null);
const listeners = new Set<() => void>();
let place: ListPlace | undefined;

function current(): ListPlace {
  if (place) return place;
  try {
    place = readListPlace(sessionStorage.getItem(KEY));
  } catch {
    // Without session storage the list begins at its head.
    place = head;
  }
  return place;
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function setListPlace(next: ListPlace): void {
  place = next;
  try {
    sessionStorage.setItem(KEY, JSON.stringify(next));
  } catch {
    // It is then remembered until the page is loaded again.
  }
  for (const listener of listeners) listener();
}

export function useListPlace(): ListPlace {
  return useSyncExternalStore(subscribe, current, () => head);
}
