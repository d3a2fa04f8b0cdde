"use client";

import { useEffect, useState } from "react";
import { getDraft, setDraft } from "@/lib/store/drafts";

/** Lies among the drafts, so that it goes when the book is cleared off the phone. */
const KEY = "taken-by";

/** Who held the tape last on this phone; undefined while it is being read. */
export function useTakenBy(): string | undefined {
  const [name, setName] = useState<string>();
  useEffect(() => {
    getDraft<unknown>(KEY).then(
      (draft) => setName(typeof draft?.value === "string" ? draft.value : ""),
      () => setName(""),
    );
  }, []);
  return name;
}

export async function rememberTakenBy(name: string): Promise<void> {
  // Only a convenience: the set is kept whether or not the name is remembered.
  await setDraft(KEY, name).catch(() => undefined);
}
