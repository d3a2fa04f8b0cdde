"use client";

import { KeptLine } from "@/components/shell/kept-line";
import { useBookState, useWorkshop } from "@/components/store/use-book";
import { keptWords } from "@/lib/workshop/kept-words";
import { useNow } from "./use-now";

/** The line that says what is kept, from the book's state. */
export function KeptStatus() {
  const state = useBookState();
  const workshop = useWorkshop();
  const words = keptWords(state, { demo: workshop?.demo ?? false, now: useNow() });
  return words && <KeptLine {...words} href={workshop?.demo ? "/settings#demo" : "/settings#copy"} />;
}
