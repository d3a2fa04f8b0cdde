"use client";

import { CircleCheck } from "lucide-react";
import { useServiceWorker } from "@/components/frame/use-service-worker";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";

/** How far the app itself is on this phone, while the start is being filled in. */
export function GettingReady() {
  const { phase } = useServiceWorker();
  if (phase === "off") return null;
  if (phase === "failed")
    return (
      <Notice tone="look" title="Notchbook could not be put on this phone yet.">
        <p>You can begin all the same. Open it once more with data on, and it will then work without.</p>
      </Notice>
    );
  return (
    <div role="status">
      {phase === "ready" ? (
        <p className="flex items-start gap-2 text-moss">
          <CircleCheck aria-hidden="true" className="mt-[0.15em] size-[1.2em] shrink-0" />
          Every screen is on this phone: from now on it works without data.
        </p>
      ) : (
        <Progress label="Getting this phone ready to work without data" />
      )}
    </div>
  );
}
