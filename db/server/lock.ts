/**
 * PGlite takes no lock on its folder, and two processes on one folder lose rows. So one process holds a file
 * with its number in it; a file whose process has gone is stale and is taken over.
 */
import { mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";

export class DataFolderBusy extends Error {
  constructor(folder: string, pid: number) {
    super(
      `The data folder ${folder} is in use by process ${pid}. Stop that Notchbook first, or give this one another folder.`,
    );
    this.name = "DataFolderBusy";
  }
}

function isAlive(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    // EPERM: it lives, and is somebody else's.
    return (error as NodeJS.ErrnoException).code === "EPERM";
  }
}

/** When a process began, as Linux counts it, or "" where it cannot be told: a number may be given out again. */
function beganAt(pid: number): string {
  try {
    // The name in brackets may hold spaces; the 22nd field of all is the 20th behind it.
    return readFileSync(`/proc/${pid}/stat`, "utf8").split(") ").pop()?.split(" ")[19] ?? "";
  } catch {
    return "";
  }
}

/**
 * Takes the folder for this process, making it where it is missing; the returned function gives it back.
 * @throws DataFolderBusy while another living process has it.
 */
export function lockFolder(folder: string): () => void {
  mkdirSync(folder, { recursive: true });
  const file = join(folder, "notchbook.lock");
  for (let tried = 0; ; tried++) {
    try {
      // "wx" fails where the file exists: the making of the file is the taking of the lock.
      writeFileSync(file, `${process.pid} ${beganAt(process.pid)}`, { flag: "wx" });
      return () => rmSync(file, { force: true });
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== "EEXIST" || tried > 3) throw error;
      const pid = Number(readFileSync(file, "utf8"));
      if (pid !== process.pid && Number.isInteger(pid) && pid > 0 && isAlive(pid))
        throw new DataFolderBusy(folder, pid);
      rmSync(file, { force: true });
    }
  }
}
