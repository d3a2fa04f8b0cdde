"use client";

import { usePathname } from "next/navigation";
import { type ReactNode, useEffect } from "react";
import { BookProvider } from "@/components/store/book-provider";
import { Shell } from "@/components/shell/shell";
import { chosenTheme, showTheme } from "@/lib/workshop/theme";
import { Banners } from "./banners";
import { BookGate } from "./book-gate";
import { KeptStatus } from "./kept-status";

/** What stands around every screen: the book, the bar, what is kept, and what is the matter. */
export function AppFrame({ children }: { children: ReactNode }) {
  const path = usePathname();
  useEffect(() => showTheme(chosenTheme()), []);
  return (
    <BookProvider>
      {path === "/start" ? (
        // Nothing leads away from the start: there is nowhere to go yet.
        <>
          <Banners />
          <BookGate>{children}</BookGate>
        </>
      ) : (
        <Shell kept={<KeptStatus />} banners={<Banners />}>
          <BookGate>{children}</BookGate>
        </Shell>
      )}
    </BookProvider>
  );
}
