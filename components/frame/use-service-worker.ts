"use client";

import { useSyncExternalStore } from "react";

/** How far the app itself is on this phone. One store for the page: it registers once, whoever asks. */
export interface ShellState {
  /** "off": this browser has no service workers, or this is no built app. "ready": every screen works without a line. */
  phase: "off" | "getting" | "ready" | "failed";
  /** It has just become so, for the first time. */
  justReady: boolean;
  updateWaits: boolean;
}

const SAID_KEY = "notchbook-ready-said";

const atFirst: ShellState = { phase: "off", justReady: false, updateWaits: false };
let state = atFirst;
let started = false;
let waiting: ServiceWorker | null = null;
const listeners = new Set<() => void>();

function become(next: Partial<ShellState>): void {
  state = { ...state, ...next };
  for (const listener of listeners) listener();
}

/** True once: the first time that the phone has everything. */
function firstTime(): boolean {
  try {
    if (localStorage.getItem(SAID_KEY)) return false;
    localStorage.setItem(SAID_KEY, "1");
    return true;
  } catch {
    return false;
  }
}

function follow(registration: ServiceWorkerRegistration): void {
  const look = () => {
    if (registration.active && state.phase !== "ready") become({ phase: "ready", justReady: firstTime() });
    // A first install also waits for a moment; only with an active one before it is it an update.
    waiting = registration.active ? registration.waiting : null;
    become({ updateWaits: waiting !== null });
  };
  const watch = (worker: ServiceWorker | null) =>
    worker?.addEventListener("statechange", () => {
      if (worker.state === "redundant" && !registration.active) become({ phase: "failed" });
      look();
    });
  look();
  watch(registration.installing);
  registration.addEventListener("updatefound", () => watch(registration.installing));
}

function start(): void {
  if (started) return;
  started = true;
  if (!("serviceWorker" in navigator) || process.env.NODE_ENV === "development") return;
  state = { ...state, phase: "getting" };
  const known = navigator.serviceWorker.controller !== null;
  navigator.serviceWorker.register("/sw.js", { scope: "/", updateViaCache: "none" }).then(follow, () => {
    // Without a line the one that is there goes on; only a first visit is left without.
    become({ phase: known ? "ready" : "failed" });
  });
}

function subscribe(listener: () => void): () => void {
  start();
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function useServiceWorker(): ShellState {
  return useSyncExternalStore(
    subscribe,
    () => state,
    () => atFirst,
  );
}

/** Goes over to the newer build that waits; the page begins again. */
export function takeUpdate(): void {
  if (!waiting) return;
  navigator.serviceWorker.addEventListener("controllerchange", () => location.reload(), { once: true });
  waiting.postMessage({ type: "SKIP_WAITING" });
}

export function dismissReady(): void {
  become({ justReady: false });
}
