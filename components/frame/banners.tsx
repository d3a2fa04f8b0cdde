"use client";

import { usePathname } from "next/navigation";
import { useState } from "react";
import { OfflineReady } from "@/components/shell/offline-ready";
import { UpdateBanner } from "@/components/shell/update-banner";
import { useBookState } from "@/components/store/use-book";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { SaveCopy } from "@/components/workshop/save-copy";
import { UnfinishedReading } from "@/components/workshop/unfinished-reading";
import { dismissReady, takeUpdate, useServiceWorker } from "./use-service-worker";

/** What is the matter with the app itself: its readiness, a newer build, a database that failed or was made again. */
export function Banners() {
  const shell = useServiceWorker();
  const book = useBookState();
  const path = usePathname();
  const [later, setLater] = useState(false);
  const database = book.phase === "open" ? book.database : null;
  return (
    <>
      {database?.phase === "failed" && <DoesNotOpen say={database.say} />}
      {database?.phase === "ready" && database.rebuilt && <MadeAgain />}
      <UnfinishedReading />
      <UpdateBanner ready={shell.updateWaits && !later} onUse={takeUpdate} onLater={() => setLater(true)} />
      {/* The start says so itself, and nothing may push away what is being filled in there. */}
      <OfflineReady ready={shell.justReady && path !== "/start"} onClose={dismissReady} />
    </>
  );
}

function DoesNotOpen({ say }: { say: string }) {
  return (
    <div className="banner">
      <Notice live tone="wrong" title="The book on this phone does not open">
        <p>
          Nothing is lost: everything that was kept is still on the phone, and what you keep now is kept too.
          Try again; if it stays so, save a copy.
        </p>
        <Button className="justify-self-start" onClick={() => location.reload()}>
          Try again
        </Button>
        <SaveCopy />
        <details>
          <summary className="min-h-target content-center text-soft">What the phone says</summary>
          <p className="text-sm text-soft wrap-anywhere">{say}</p>
        </details>
      </Notice>
    </div>
  );
}

function MadeAgain() {
  const [closed, setClosed] = useState(false);
  if (closed) return null;
  return (
    <div className="banner">
      <Notice
        live
        title="The book was made again"
        action={<Button onClick={() => setClosed(true)}>Good</Button>}
      >
        <p>It was made from the journal, in which every change stands. Nothing is missing.</p>
      </Notice>
    </div>
  );
}
