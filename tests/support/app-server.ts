/** The app's server as a process of its own, to be stopped and started on one port: one origin. */
import { type ChildProcess, spawn } from "node:child_process";
import { createServer } from "node:net";

export class AppServer {
  private child: ChildProcess | undefined;

  constructor(
    readonly port: number,
    private readonly dataDir: string,
  ) {}

  get url(): string {
    return `http://localhost:${this.port}`;
  }

  async start(): Promise<void> {
    this.child = spawn(
      process.execPath,
      ["node_modules/next/dist/bin/next", "start", "-p", String(this.port)],
      {
        stdio: "ignore",
        env: { ...process.env, NOTCHBOOK_DATA: this.dataDir },
      },
    );
    for (let tried = 0; tried < 100; tried++) {
      const answered = await fetch(`${this.url}/manifest.webmanifest`).then(
        (response) => response.ok,
        () => false,
      );
      if (answered) return;
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
    throw new Error("The server did not start.");
  }

  async stop(): Promise<void> {
    const { child } = this;
    if (!child || child.exitCode !== null) return;
    const gone = new Promise((resolve) => child.once("exit", resolve));
    child.kill("SIGKILL");
    await gone;
    this.child = undefined;
  }
}

export async function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once("error", reject);
    probe.listen(0, () => {
      const address = probe.address();
      probe.close(() =>
        typeof address === "object" && address ? resolve(address.port) : reject(new Error("no port")),
      );
    });
  });
}
