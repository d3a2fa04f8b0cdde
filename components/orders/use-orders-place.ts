"use client";

import { useSyncExternalStore } from "react";
import { type OrdersPlace, readOrdersPlace } from "@/lib/orders/list-place";

/** Where the list was left lives as long as the tab, so that back, and a reload, return to it. */
const KEY = "notchbook:orders-list";

const head = readOrdersPlace(null);
const listeners = new Set<() => void>();
let place: OrdersPlace | undefined;

function current(): OrdersPlace {
  if (place) return place;
  try {
    place = readOrdersPlace(sessionStorage.getItem(KEY));
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

export function setOrdersPlace(next: OrdersPlace): void {
  place = next;
  try {
    sessionStorage.setItem(KEY, JSON.stringify(next));
  } catch {
    // It is then remembered until the page is loaded again.
  }
  for (const listener of listeners) listener();
}

export function useOrdersPlace(): OrdersPlace {
  return useSyncExternalStore(subscribe, current, () => head);
}
