/** A server of our own for each test, which the test may stop and start, on one port: one origin. */
import { test as base, type BrowserContext, chromium, expect, type Page } from "@playwright/test";
import { type ChildProcess, spawn } from "node:child_process";
import { createServer } from "node:net";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";

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

export const test = base.extend<{ server: AppServer; page: Page }>({
  server: async ({}, provide) => {
    const dataDir = mkdtempSync(join(tmpdir(), "notchbook-data-"));
    const server = new AppServer(await freePort(), dataDir);
    await server.start();
    await provide(server);
    await server.stop();
    rmSync(dataDir, { recursive: true, force: true });
  },
  page: async ({ page }, provide) => {
    const problems: string[] = [];
    page.on("pageerror", (error) => problems.push(`${error.name}: ${error.message}`));
    page.on("console", (message) => {
      // A stopped server is an ordinary day: the browser notes it in red, the app must not.
      if (message.type() === "error" && !/Failed to load resource|net::ERR_/.test(message.text()))
        problems.push(message.text());
    });
    await provide(page);
    expect(problems.filter((problem) => !problem.startsWith("ErrnoError"))).toEqual([]);
  },
});

export { expect };

/** Waits until every screen is on the phone: from here on the server may be stopped. */
export async function untilReadyWithoutALine(page: Page): Promise<void> {
  await page.waitForFunction(() =>
    navigator.serviceWorker.ready.then(() => navigator.serviceWorker.controller !== null),
  );
}

/** Waits until the phone's database has opened and followed the journal: the line at the head of the screen says so. */
export async function untilDatabaseOpen(page: Page): Promise<void> {
  const line = page.locator(".kept-line");
  await expect(line).toHaveText(/^Kept on this phone · (?!opening|reading|the book does not)/, {
    timeout: 60_000,
  });
}

/** A browser with a profile on the disk, to be killed and started again. */
export async function openProfile(
  dir: string,
  options: { width?: number; height?: number } = {},
): Promise<BrowserContext> {
  return chromium.launchPersistentContext(dir, {
    executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium",
    args: ["--no-sandbox", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
    viewport: { width: options.width ?? 360, height: options.height ?? 740 },
    locale: "en-GB",
    timezoneId: "Europe/Malta",
  });
}

/** First visit: a workshop of our own. */
export async function beginWorkshop(
  page: Page,
  { name = "Thimble Lane", unit = "Inches" } = {},
): Promise<void> {
  await page.getByLabel("Name of your workshop").fill(name);
  await page.getByText(unit, { exact: true }).click();
  await page.getByLabel("Clients pay in").selectOption("EUR");
  await page.getByRole("button", { name: "Begin", exact: true }).click();
  await page.waitForURL((url) => url.pathname === "/");
}
