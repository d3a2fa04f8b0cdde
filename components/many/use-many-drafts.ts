"use client";

import { useEffect, useState } from "react";
import { draftOne, type ManyAsk, type ManyRow } from "@/lib/many/draft-many";
import { inTurns } from "@/lib/many/in-turns";
import { type ManyWearer } from "@/lib/many/many-wearer";
import { screenTurns } from "./screen-turns";

/** Shorter work is not worth saying how far it is, ms. */
const SAID_AFTER_MS = 500;

export interface ManyDrafts {
  /** What was drafted last, in the order of the wearers; kept on the screen while it is drafted anew. */
  rows: readonly ManyRow[];
  /** How many are done, where it takes long enough to say so. */
  done: number | null;
  /** The rows are of the wearers and the style that stand on the form now. */
  settled: boolean;
}

interface Made {
  wearers: readonly ManyWearer[];
  ask: ManyAsk;
  rows: readonly ManyRow[];
}

const none: readonly ManyRow[] = [];

/** The wearers drafted, a few at a time, so that the screen answers meanwhile. */
export function useManyDrafts(wearers: readonly ManyWearer[], ask: ManyAsk): ManyDrafts {
  const [made, setMade] = useState<Made | null>(null);
  const [done, setDone] = useState<number | null>(null);
  useEffect(() => {
    const off = new AbortController();
    const begun = performance.now();
    const onTurn = (count: number) => {
      if (!off.signal.aborted && performance.now() - begun > SAID_AFTER_MS) setDone(count);
    };
    void (async () => {
      // A key pressed at once after this one calls it off before anything is drawn.
      await screenTurns.pause();
      if (off.signal.aborted) return;
      const rows = await inTurns(wearers, (one) => draftOne(one, ask), {
        ...screenTurns,
        onTurn,
        signal: off.signal,
      });
      if (!rows) return;
      setMade({ wearers, ask, rows });
      setDone(null);
    })();
    return () => off.abort();
  }, [wearers, ask]);
  return { rows: made?.rows ?? none, done, settled: made?.wearers === wearers && made.ask === ask };
}
