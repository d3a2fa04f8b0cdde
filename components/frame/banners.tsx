"use client";

import { useState } from "react";
import { OfflineReady } from "@/components/shell/offline-ready";
import { UpdateBanner } from "@/components/shell/update-banner";
import { useBookState } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { useServiceWorker } from "./use-service-worker";

/** What is the matter with the app itself: its readiness, a newer build, a database that failed. */
export function Banners() {
  const shell = useServiceWorker();
  const book = useBookState();
  const [later, setLater] = useState(false);
  const database = book.phase === "open" ? book.database : null;
  return (
    <>
      {database?.phase === "failed" && (
        <div className="banner">
          <Notice
            live
            tone="wrong"
            title="The book on this phone does not open"
            action={<ButtonLink href="/settings">Save a copy as a file</ButtonLink>}
          >
            <p>What you keep is still kept, and a copy of everything can be saved. Close Notchbook and open it again to try once more.</p>
            <p className="text-sm text-soft">{database.say}</p>
          </Notice>
        </div>
      )}
      <UpdateBanner ready={shell.updateWaits && !later} onUse={shell.useUpdate} onLater={() => setLater(true)} />
      <OfflineReady ready={shell.justReady} onClose={shell.dismissReady} />
    </>
  );
}
