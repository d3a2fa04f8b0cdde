"use client";

import { useSyncExternalStore } from "react";
import { type IsoDate } from "@/lib/people/iso-date";
import { todayIso } from "@/lib/people/today";

/** Looks again each minute and when the phone wakes: a page may stay open over midnight. */
function subscribe(changed: () => void): () => void {
  const timer = setInterval(changed, 60_000);
  document.addEventListener("visibilitychange", changed);
  return () => {
    clearInterval(timer);
    document.removeEventListener("visibilitychange", changed);
  };
}

/** Today's day where she is. While the page is made on the server: the day of the build, until the phone says. */
export function useToday(): IsoDate {
  return useSyncExternalStore(
    subscribe,
    () => todayIso(),
    () => todayIso(),
  );
}
