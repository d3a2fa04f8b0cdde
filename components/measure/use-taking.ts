"use client";

import { useCallback, useEffect, useRef, useState } from "react";
import { type MeasureKey } from "@/lib/figures/body-measures";
import { press as pressed, type Press } from "@/lib/measuring/press";
import { readTaking } from "@/lib/measuring/read-taking";
import { announce } from "@/lib/measuring/say";
import { holdsSomething, type Known, type Taking } from "@/lib/measuring/taking";
import { type Fineness } from "@/lib/records/types";
import { dropDraft, getDraft, setDraft } from "@/lib/store/drafts";
import { keepProblem } from "@/lib/store/keep-problem";

export interface TakingDesk {
  /** What was left half-taken. Undefined while it is being read; null where there is nothing. */
  found: Taking | null | undefined;
  /** What is being taken now, or null before it is begun. */
  taking: Taking | null;
  /** Whether a figure, as it stands here, has reached the phone's disk. */
  onDisk(key: MeasureKey): boolean;
  /** Why the last key could not be put down on the phone, or null. */
  problem: string | null;
  /** For a screen reader: what the last key did. */
  said: string;
  start(taking: Taking): void;
  press(key: Press, known: Known, fineness: Fineness): void;
  /** Takes it off the phone's disk, once it is kept as a set. */
  putAway(): Promise<void>;
  /** Forgets it: not wanted. */
  startOver(): Promise<void>;
}

/** A set as it is being taken, put down on the phone at each key under `draftKey`. */
export function useTaking(draftKey: string): TakingDesk {
  const [found, setFound] = useState<Taking | null>();
  const [taking, setTaking] = useState<Taking | null>(null);
  const [disk, setDisk] = useState<Taking["taken"]>({});
  const [problem, setProblem] = useState<string | null>(null);
  const [said, setSaid] = useState("");
  const now = useRef<Taking | null>(null);
  const writing = useRef<Promise<void> | null>(null);
  const dropped = useRef(false);

  useEffect(() => {
    let current = true;
    getDraft<unknown>(draftKey).then(
      (draft) => {
        if (!current) return;
        const read = readTaking(draft?.value);
        setFound(read);
        if (read) setDisk(read.taken);
      },
      (error: unknown) => {
        if (!current) return;
        setFound(null);
        setProblem(keepProblem(error).message);
      },
    );
    return () => {
      current = false;
    };
  }, [draftKey]);

  /** Writes what stands now, and again while keys come faster than the disk. */
  const write = useCallback(async () => {
    for (let last: Taking | null = null; now.current && now.current !== last && !dropped.current;) {
      const value: Taking = now.current;
      last = value;
      try {
        await (holdsSomething(value) ? setDraft(draftKey, value) : dropDraft(draftKey));
        setDisk(value.taken);
        setProblem(null);
      } catch (error) {
        setProblem(keepProblem(error).message);
      }
    }
  }, [draftKey]);

  const start = useCallback((value: Taking) => {
    dropped.current = false;
    now.current = value;
    setTaking(value);
  }, []);

  const press = useCallback(
    (key: Press, known: Known, fineness: Fineness) => {
      const before = now.current;
      if (!before) return;
      const after = pressed(before, key, known);
      if (after === before) return;
      now.current = after;
      setTaking(after);
      setSaid(announce(before, after, known, fineness));
      writing.current ??= write().finally(() => (writing.current = null));
    },
    [write],
  );

  const putAway = useCallback(async () => {
    dropped.current = true;
    await writing.current;
    await dropDraft(draftKey).catch(() => undefined);
  }, [draftKey]);

  const startOver = useCallback(async () => {
    await putAway();
    now.current = null;
    setTaking(null);
    setFound(null);
    setDisk({});
  }, [putAway]);

  const onDisk = (key: MeasureKey): boolean => {
    const here = taking?.taken[key];
    return here !== undefined && disk[key]?.mm === here.mm && disk[key].typed === here.typed;
  };

  return { found, taking, onDisk, problem, said, start, press, putAway, startOver };
}
