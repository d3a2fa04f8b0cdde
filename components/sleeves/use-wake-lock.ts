"use client";

import { useEffect, useState } from "react";

export type WakeLockState = "asking" | "held" | "not-here" | "refused";

/** Keeps the screen awake while it is shown; asks again when the phone comes back to it. */
export function useWakeLock(): WakeLockState {
  const [state, setState] = useState<WakeLockState>("asking");
  useEffect(() => {
    let gone = false;
    let lock: WakeLockSentinel | null = null;
    const ask = async () => {
      if (document.visibilityState !== "visible" || (lock && !lock.released)) return;
      if (!("wakeLock" in navigator)) {
        setState("not-here");
        return;
      }
      try {
        lock = await navigator.wakeLock.request("screen");
        if (gone) void lock.release();
        else setState("held");
      } catch {
        // A low battery or the phone's own settings: the screen goes dark as it always does.
        if (!gone) setState("refused");
      }
    };
    void ask();
    const again = () => void ask();
    document.addEventListener("visibilitychange", again);
    return () => {
      gone = true;
      document.removeEventListener("visibilitychange", again);
      void lock?.release().catch(() => undefined);
    };
  }, []);
  return state;
}
