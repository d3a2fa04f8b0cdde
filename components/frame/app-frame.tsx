"use client";

import { type ReactNode } from "react";
import { BookProvider } from "@/components/store/book-provider";
import { Shell } from "@/components/shell/shell";
import { Banners } from "./banners";
import { BookGate } from "./book-gate";
import { KeptStatus } from "./kept-status";

/** What stands around every screen: the book, the bar, what is kept, and what is the matter. */
export function AppFrame({ children }: { children: ReactNode }) {
  return (
    <BookProvider>
      <Shell kept={<KeptStatus />} banners={<Banners />}>
        <BookGate>{children}</BookGate>
      </Shell>
    </BookProvider>
  );
}
