"use client";

import { useCallback, useEffect, useRef, useState } from "react";
import { dropDraft, getDraft, setDraft } from "@/lib/store/drafts";
import { keepProblem } from "@/lib/store/keep-problem";

export interface DraftHandle<T> {
  /** Undefined while it is being read; null where there is none. */
  draft: T | null | undefined;
  savedAt: string | null;
  /** Puts down what is typed; resolves when it is on the disk. */
  save(value: T): Promise<void>;
  drop(): Promise<void>;
  /** Why the last `save` failed, in words, or null. */
  problem: string | null;
}

/**
 * What was being typed on a screen, brought back after a reload, a crash or a step back. `key` names the thing:
 * "order:new:<client id>". Render the form once `draft` is not undefined, and call `save` on each change.
 */
export function useDraft<T>(key: string): DraftHandle<T> {
  const [read, setRead] = useState<{ key: string; draft: T | null; savedAt: string | null }>();
  const [problem, setProblem] = useState<string | null>(null);
  const dropped = useRef(false);

  useEffect(() => {
    let current = true;
    dropped.current = false;
    getDraft<T>(key).then(
      (found) => {
        if (current) setRead({ key, draft: found?.value ?? null, savedAt: found?.savedAt ?? null });
      },
      (error: unknown) => {
        // Without storage the form still works; it only cannot be brought back.
        if (!current) return;
        setRead({ key, draft: null, savedAt: null });
        setProblem(keepProblem(error).message);
      },
    );
    return () => {
      current = false;
    };
  }, [key]);

  const save = useCallback(
    async (value: T) => {
      if (dropped.current) return;
      try {
        await setDraft(key, value);
        setProblem(null);
      } catch (error) {
        setProblem(keepProblem(error).message);
      }
    },
    [key],
  );
  const drop = useCallback(async () => {
    dropped.current = true;
    await dropDraft(key).catch(() => undefined);
  }, [key]);

  const current = read?.key === key ? read : undefined;
  return { draft: current?.draft, savedAt: current?.savedAt ?? null, save, drop, problem };
}
