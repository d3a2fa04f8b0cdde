"use client";

import { useEffect, useState } from "react";
import { type Unfinished, readUnfinished } from "@/lib/orders/unfinished";
import { listDrafts } from "@/lib/store/drafts";

export interface UnfinishedDraft {
  key: string;
  /** ISO date-time of the last key. */
  savedAt: string;
  what: Unfinished;
}

/** What was begun on this phone and not kept, last touched first. */
export function useUnfinished(): UnfinishedDraft[] {
  const [found, setFound] = useState<UnfinishedDraft[]>([]);
  useEffect(() => {
    let current = true;
    const look = async () => {
      // Without storage there is nothing half done to come back to; the screen says elsewhere what is wrong.
      const held = await Promise.all([listDrafts<unknown>("measure:"), listDrafts<unknown>("order:")]).catch(
        () => [],
      );
      const drafts = held.flat().flatMap(({ key, draft }): UnfinishedDraft[] => {
        const what = readUnfinished(key, draft.value);
        return what ? [{ key, savedAt: draft.savedAt, what }] : [];
      });
      if (current) setFound(drafts.sort((a, b) => (a.savedAt < b.savedAt ? 1 : -1)));
    };
    const wake = () => void look();
    wake();
    document.addEventListener("visibilitychange", wake);
    return () => {
      current = false;
      document.removeEventListener("visibilitychange", wake);
    };
  }, []);
  return found;
}
