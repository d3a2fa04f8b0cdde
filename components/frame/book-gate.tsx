"use client";

import { usePathname, useRouter } from "next/navigation";
import { type ReactNode, useEffect } from "react";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { useBookState } from "@/components/store/use-book";

/** Leads a first visit to the start; says plainly where this browser can keep nothing. */
export function BookGate({ children }: { children: ReactNode }) {
  const state = useBookState();
  const router = useRouter();
  const path = usePathname();
  const isNew = state.phase === "open" && state.head.next === 1;

  useEffect(() => {
    if (isNew && path !== "/start") router.replace("/start");
  }, [isNew, path, router]);

  if (state.phase === "no-storage")
    return (
      <Screen title="Nothing can be kept here">
        <Notice tone="wrong" title="This browser does not let Notchbook keep anything on the phone.">
          <p>{state.say}</p>
        </Notice>
      </Screen>
    );
  return children;
}
