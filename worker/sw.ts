/**
 * The service worker owns the shell, and nothing else: the built files, and two answers for each screen, keyed
 * by path alone (what a screen shows comes from the phone's own database). A navigation gets the page, a
 * request of the router (`RSC: 1`) the payload. Both are of one build, fetched together; a new build waits for
 * the user's word.
 */
import { type PrecacheEntry, Serwist, type SerwistGlobalConfig } from "serwist";
import { screens } from "@/lib/screens";

declare global {
  interface WorkerGlobalScope extends SerwistGlobalConfig {
    __SW_MANIFEST: (PrecacheEntry | string)[] | undefined;
  }
}
declare const self: ServiceWorkerGlobalScope;

const buildId = process.env.NOTCHBOOK_BUILD_ID ?? "development";
const SCREENS = "notchbook-screens-";
const cacheName = SCREENS + buildId;
const known = new Set<string>(screens);

type Half = "page" | "payload";
const keyOf = (path: string, half: Half): string => `${path}?half=${half}`;

async function fetchHalf(path: string, half: Half): Promise<Response> {
  const response = await fetch(path, {
    headers: half === "payload" ? { RSC: "1" } : {},
    cache: "no-store",
    credentials: "same-origin",
  });
  if (!response.ok) throw new Error(`${path}: the server answered ${response.status}`);
  if (response.headers.get("X-Notchbook-Build") !== buildId)
    throw new Error(`${path}: the server has another build by now`);
  // Kept without `Vary`: the key alone says which half it is.
  const headers = new Headers(response.headers);
  headers.delete("Vary");
  headers.delete("Content-Encoding");
  headers.delete("Content-Length");
  return new Response(await response.arrayBuffer(), { status: 200, headers });
}

/** A few at a time: a browser has six lines to a server, and what is being looked at needs one. */
const AT_A_TIME = 2;

async function keepScreens(): Promise<void> {
  const cache = await caches.open(cacheName);
  const halves = screens.flatMap((path) => (["page", "payload"] as const).map((half) => ({ path, half })));
  const next = halves.values();
  const keepOn = async (): Promise<void> => {
    for (const { path, half } of next) await cache.put(keyOf(path, half), await fetchHalf(path, half));
  };
  await Promise.all(Array.from({ length: AT_A_TIME }, keepOn));
}

async function dropOtherBuilds(): Promise<void> {
  const names = await caches.keys();
  await Promise.all(
    names.filter((name) => name.startsWith(SCREENS) && name !== cacheName).map((name) => caches.delete(name)),
  );
}

/** The kept answer for a screen, or the server's where this build knows no such screen. */
async function answer(request: Request, path: string, half: Half): Promise<Response> {
  const cache = await caches.open(cacheName);
  return (await cache.match(keyOf(path, half))) ?? fetch(request);
}

self.addEventListener("install", (event) => event.waitUntil(keepScreens()));
self.addEventListener("activate", (event) => event.waitUntil(dropOtherBuilds()));

self.addEventListener("fetch", (event) => {
  const { request } = event;
  const url = new URL(request.url);
  if (request.method !== "GET" || url.origin !== self.location.origin) return;
  const path = url.pathname.length > 1 ? url.pathname.replace(/\/$/, "") : url.pathname;
  if (!known.has(path)) return;
  if (request.headers.get("RSC") === "1") event.respondWith(answer(request, path, "payload"));
  else if (request.mode === "navigate") event.respondWith(answer(request, path, "page"));
});

const serwist = new Serwist({
  precacheEntries: self.__SW_MANIFEST,
  skipWaiting: false,
  clientsClaim: true,
  navigationPreload: false,
  precacheOptions: { cleanupOutdatedCaches: true, concurrency: AT_A_TIME },
});
// Answers `SKIP_WAITING` when the user says so.
serwist.addEventListeners();
