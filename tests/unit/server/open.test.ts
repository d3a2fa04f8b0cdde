import { spawn } from "node:child_process";
import { existsSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import fc from "fast-check";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { applyChanges, checkCounts, readMark } from "@/db/apply";
import { DataFolderBusy, lockFolder } from "@/db/server/lock";
import { openServerDatabase } from "@/db/server/open";
import { changesOf, DEVICE } from "@/tests/support/changes";

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "notchbook-server-"));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe("the server's data folder", () => {
  it("is refused, in a plain sentence, while another process has it", async () => {
    const other = spawn("sleep", ["30"]);
    try {
      writeFileSync(join(folder, "notchbook.lock"), String(other.pid));
      expect(() => lockFolder(folder)).toThrow(DataFolderBusy);
      expect(() => lockFolder(folder)).toThrow(`in use by process ${other.pid}`);
    } finally {
      other.kill("SIGKILL");
      await new Promise((resolve) => other.once("exit", resolve));
    }
    // A number that another process has got since then holds nothing.
    writeFileSync(join(folder, "notchbook.lock"), `${process.ppid} 1`);
    const unlock = lockFolder(folder);
    expect(existsSync(join(folder, "notchbook.lock"))).toBe(true);
    unlock();
    expect(existsSync(join(folder, "notchbook.lock"))).toBe(false);
  });

  it("holds, in the phone's own schema, what was written before it was closed", async () => {
    const changes = fc.sample(changesOf({ max: 8 }), { numRuns: 1, seed: 11 })[0]!;
    const first = await openServerDatabase(join(folder, "deep", "data"));
    await applyChanges(first.db, changes);
    await first.close();
    const second = await openServerDatabase(join(folder, "deep", "data"));
    const mark = await readMark(second.db, DEVICE);
    expect(mark.applied).toBe(changes.length);
    await checkCounts(second.db, mark);
    await second.close();
  });
});
