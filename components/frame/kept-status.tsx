"use client";

import { KeptLine } from "@/components/shell/kept-line";
import { useBookState } from "@/components/store/use-book";

/** The line that says what is kept, from the book's state. */
export function KeptStatus() {
  const state = useBookState();
  if (state.phase !== "open" || state.head.next === 1) return null;
  const { database } = state;
  return <KeptLine state={database.phase === "ready" ? "ready" : "opening"} waiting={null} />;
}
