"use client";

import { useEffect, useRef } from "react";

/**
 * Puts down a value on each change. While one is on its way to the disk only the latest waits, so that a dragged
 * handle cannot outrun the phone's storage; the last is always put down.
 */
export function useSavedForm<T>(value: T, begun: boolean, save: (value: T) => Promise<void>): void {
  const waiting = useRef<T | null>(null);
  const writing = useRef(false);
  useEffect(() => {
    if (!begun) return;
    waiting.current = value;
    if (writing.current) return;
    writing.current = true;
    void (async () => {
      try {
        while (waiting.current !== null) {
          const next = waiting.current;
          waiting.current = null;
          await save(next);
        }
      } finally {
        writing.current = false;
      }
    })();
  }, [value, begun, save]);
}
