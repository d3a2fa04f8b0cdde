"use client";

import { type PointerEvent, useEffect, useRef } from "react";

const firstAfterMs = 450;
const thenEachMs = 110;

/** Handlers for a key that goes on while it is held; a press by keyboard or by a screen reader counts once. */
export function useHoldRepeat(act: () => void) {
  const latest = useRef(act);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const held = useRef(false);

  useEffect(() => {
    latest.current = act;
  });
  useEffect(() => () => clearTimeout(timer.current), []);

  const stop = () => clearTimeout(timer.current);
  return {
    onPointerDown: (event: PointerEvent) => {
      if (event.button !== 0) return;
      held.current = false;
      const again = () => {
        held.current = true;
        latest.current();
        timer.current = setTimeout(again, thenEachMs);
      };
      timer.current = setTimeout(again, firstAfterMs);
    },
    onPointerUp: stop,
    onPointerLeave: stop,
    onPointerCancel: stop,
    onClick: () => {
      stop();
      if (!held.current) latest.current();
      held.current = false;
    },
  };
}
