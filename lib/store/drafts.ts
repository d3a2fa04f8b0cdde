/**
 * What is being typed and is not kept yet: half-taken measurement sets, half-filled forms. Stays on this phone,
 * survives a flat battery, and goes when the thing itself is kept.
 */
import { del, entries, get, promisifyRequest, set } from "idb-keyval";
import { strictStore } from "@/lib/journal/strict-store";
import { DRAFTS_NAME } from "./channels";

const store = strictStore(DRAFTS_NAME, "drafts");

export interface Draft<T> {
  savedAt: string;
  value: T;
}

export async function getDraft<T>(key: string): Promise<Draft<T> | null> {
  return (await get<Draft<T>>(key, store)) ?? null;
}

/** Resolves when the draft has reached the disk. */
export async function setDraft<T>(key: string, value: T): Promise<void> {
  const start = performance.now();
  await set(key, { savedAt: new Date().toISOString(), value } satisfies Draft<T>, store);
  performance.measure("notchbook:draft-kept", { start });
}

export async function dropDraft(key: string): Promise<void> {
  await del(key, store);
}

/** Drafts whose key begins with `prefix`, last touched first. */
export async function listDrafts<T>(prefix: string): Promise<{ key: string; draft: Draft<T> }[]> {
  const held = await entries<string, Draft<T>>(store);
  return held
    .filter(([key]) => key.startsWith(prefix))
    .map(([key, draft]) => ({ key, draft }))
    .sort((a, b) => b.draft.savedAt.localeCompare(a.draft.savedAt));
}

/** Takes every draft away, with the book that they belong to. Resolves when they are gone from the disk. */
export async function dropAllDrafts(): Promise<void> {
  await store("readwrite", (objects) => {
    objects.clear();
    return promisifyRequest(objects.transaction);
  });
}
