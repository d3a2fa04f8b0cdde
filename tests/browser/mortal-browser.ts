/**
 * A Chromium of our own on a profile on the disk, to be killed at any moment as a flat battery does it
 * (SIGKILL to the whole process group), and started again on the same profile.
 */
import { type Browser, chromium, type Page } from "@playwright/test";
import { type ChildProcess, spawn } from "node:child_process";
import { existsSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";

export class MortalBrowser {
  private child: ChildProcess | undefined;
  private browser: Browser | undefined;

  constructor(private readonly profile: string) {}

  /** Starts it; gives its first page. */
  async start(): Promise<Page> {
    const portFile = join(this.profile, "DevToolsActivePort");
    rmSync(portFile, { force: true });
    for (const lock of ["SingletonLock", "SingletonCookie", "SingletonSocket"])
      rmSync(join(this.profile, lock), { force: true });
    this.child = spawn(
      process.env.CHROMIUM ?? "/usr/bin/chromium",
      [
        "--headless=new",
        "--no-sandbox",
        "--disable-gpu",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
        "--no-first-run",
        "--hide-crash-restore-bubble",
        "--window-size=360,740",
        "--remote-debugging-port=0",
        `--user-data-dir=${this.profile}`,
        "about:blank",
      ],
      { stdio: "ignore", detached: true },
    );
    let port: string | undefined;
    for (let tried = 0; tried < 200 && !port; tried++) {
      await new Promise((resolve) => setTimeout(resolve, 50));
      if (existsSync(portFile)) port = readFileSync(portFile, "utf8").split("\n")[0];
    }
    if (!port) throw new Error("Chromium did not start.");
    this.browser = await chromium.connectOverCDP(`http://127.0.0.1:${port}`);
    const context = this.browser.contexts()[0]!;
    return context.pages()[0] ?? context.newPage();
  }

  async newPage(): Promise<Page> {
    return this.browser!.contexts()[0]!.newPage();
  }

  /** Ends every process of it at once. */
  async kill(): Promise<void> {
    const { child } = this;
    if (!child?.pid) return;
    const gone = new Promise((resolve) => child.once("exit", resolve));
    process.kill(-child.pid, "SIGKILL");
    await gone;
    await this.browser?.close().catch(() => undefined);
    this.child = undefined;
  }
}
