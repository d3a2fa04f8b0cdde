import "fake-indexeddb/auto";
import { describe, expect, it, vi } from "vitest";
import { dropAllDrafts, getDraft, setDraft } from "@/lib/store/drafts";

describe("drafts", () => {
  it("are all gone from the disk before it says so, and it says where they could not go", async () => {
    await setDraft("client:new", { name: "Half-typ" });
    const clear = vi.spyOn(IDBObjectStore.prototype, "clear").mockImplementation(function (
      this: IDBObjectStore,
    ) {
      const request = this.get("client:new");
      this.transaction.abort();
      return request as never;
    });
    await expect(dropAllDrafts()).rejects.toBeDefined();
    clear.mockRestore();
    expect((await getDraft("client:new"))?.value).toEqual({ name: "Half-typ" });
    await dropAllDrafts();
    expect(await getDraft("client:new")).toBeNull();
  });
});
