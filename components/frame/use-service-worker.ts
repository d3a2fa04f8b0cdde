"use client";

import { useCallback, useEffect, useState } from "react";

export interface ShellState {
  /** Every screen is on the phone: the app works without a line. */
  ready: boolean;
  /** It has just become so, for the first time. */
  justReady: boolean;
  /** Why it could not be made ready, or null. */
  failed: string | null;
  updateWaits: boolean;
  useUpdate(): void;
  dismissReady(): void;
}

const SAID_KEY = "notchbook-ready-said";

/** Registers the service worker and follows it. */
export function useServiceWorker(): ShellState {
  const [ready, setReady] = useState(false);
  const [justReady, setJustReady] = useState(false);
  const [failed, setFailed] = useState<string | null>(null);
  const [waiting, setWaiting] = useState<ServiceWorker | null>(null);

  useEffect(() => {
    if (!("serviceWorker" in navigator) || process.env.NODE_ENV === "development") return;
    let current = true;
    const hadController = navigator.serviceWorker.controller !== null;

    const follow = (registration: ServiceWorkerRegistration) => {
      const look = () => {
        if (!current) return;
        if (registration.active) {
          setReady(true);
          if (!localStorage.getItem(SAID_KEY)) {
            localStorage.setItem(SAID_KEY, "1");
            setJustReady(true);
          }
        }
        // A first install also waits for a moment; only with an active one before it is it an update.
        setWaiting(registration.active ? registration.waiting : null);
      };
      look();
      const watch = (worker: ServiceWorker | null) =>
        worker?.addEventListener("statechange", () => {
          if (worker.state === "redundant" && !registration.active)
            setFailed("Notchbook could not be put on this phone. Stay on the line and open it again.");
          look();
        });
      watch(registration.installing);
      registration.addEventListener("updatefound", () => watch(registration.installing));
    };
    navigator.serviceWorker
      .register("/sw.js", { scope: "/", updateViaCache: "none" })
      .then(follow, () => {
        if (current && !hadController)
          setFailed("Notchbook could not be put on this phone. Stay on the line and open it again.");
      });
    return () => {
      current = false;
    };
  }, []);

  const useUpdate = useCallback(() => {
    if (!waiting) return;
    navigator.serviceWorker.addEventListener("controllerchange", () => location.reload(), { once: true });
    waiting.postMessage({ type: "SKIP_WAITING" });
  }, [waiting]);
  const dismissReady = useCallback(() => setJustReady(false), []);
  return { ready, justReady, failed, updateWaits: waiting !== null, useUpdate, dismissReady };
}
