import "fake-indexeddb/auto";
import { promisifyRequest } from "idb-keyval";
import { describe, expect, it, vi } from "vitest";
import { strictStore } from "@/lib/journal/strict-store";

let count = 0;
const fresh = () => strictStore(`strict-test-${++count}`, "things");

describe("a strict store", () => {
  it("asks for writes that have reached the disk when they complete", async () => {
    const begin = vi.spyOn(IDBDatabase.prototype, "transaction");
    const store = fresh();
    await store("readwrite", (objects) => promisifyRequest(objects.put(1, "a")));
    expect(begin.mock.lastCall?.[2]).toEqual({ durability: "strict" });
    begin.mockRestore();
  });

  it("says why a write failed, although its transaction has no error yet when it hears of it", async () => {
    const store = fresh();
    const twice = store("readwrite", (objects) => {
      const done = promisifyRequest(objects.transaction);
      objects.put(1, "a");
      objects.add(2, "a");
      return done;
    });
    await expect(twice).rejects.toMatchObject({ name: "ConstraintError" });
    expect(await store("readonly", (objects) => promisifyRequest(objects.get("a")))).toBeUndefined();
  });

  it("goes on after the browser closed its connection without a word", async () => {
    const open = vi.spyOn(indexedDB, "open");
    const store = fresh();
    await store("readwrite", (objects) => promisifyRequest(objects.put(1, "a")));
    open.mock.results[0]!.value.result.close();
    expect(await store("readonly", (objects) => promisifyRequest(objects.get("a")))).toBe(1);
    open.mockRestore();
  });

  it("says so where the browser lets nothing be opened", async () => {
    const store = fresh();
    const open = vi.spyOn(indexedDB, "open").mockImplementation(() => {
      throw new DOMException("refused", "SecurityError");
    });
    await expect(store("readonly", () => 1)).rejects.toMatchObject({ name: "SecurityError" });
    open.mockRestore();
    expect(await store("readonly", () => 1)).toBe(1);
  });
});
