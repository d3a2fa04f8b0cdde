"use client";

import { usePathname, useRouter } from "next/navigation";
import { type ReactNode, useEffect } from "react";
import { useBookState } from "@/components/store/use-book";
import { Progress } from "@/components/ui/progress";
import { openBook } from "@/lib/store/book";
import { forgetOtherScreens } from "@/lib/workshop/clear-phone";
import { NoStorage } from "./no-storage";

/** Leads a first visit to the start; says plainly where this browser can keep nothing. */
export function BookGate({ children }: { children: ReactNode }) {
  const state = useBookState();
  const router = useRouter();
  const path = usePathname();
  const isNew = state.phase === "open" && state.head.next === 1;
  const book = state.phase === "open" ? state.head.book : null;
  const leadsOn = isNew && path !== "/start";

  useEffect(() => {
    // The first change shows before the head has moved on.
    if (leadsOn && openBook().pending.last === 0) router.replace("/start");
  }, [leadsOn, router]);
  useEffect(() => {
    if (book) forgetOtherScreens(book).catch(() => undefined);
  }, [book]);

  // Not before the book is open: what a screen shows is the phone's own, and the page that was made ahead knows none of
  // it; and a first visit, led on to the start, need not load the screen it came by.
  if (state.phase === "reading-journal" || leadsOn)
    return (
      <main id="main" tabIndex={-1} className="screen max-w-page">
        <Progress label="Opening the book" />
      </main>
    );
  if (state.phase === "no-storage") return <NoStorage say={state.say} />;
  return children;
}
