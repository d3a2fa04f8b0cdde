/** A server of our own for each test, which the test may stop and start, on one port: one origin. */
import { test as base, expect, type Page } from "@playwright/test";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { AppServer, freePort } from "@/tests/support/app-server";

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
      // Only tests that spoil the database may see it made anew; they have browsers of their own.
      if (message.type() === "warning" && message.text().includes("made anew")) problems.push(message.text());
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
    timeout: 150_000,
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

/** Taps a figure on the pad: whole inches, then the eighths key, which moves on by itself; a question is answered. */
export async function tapFigure(page: Page, whole: string, eighths: RegExp): Promise<void> {
  const asked = page.locator(".pad-about").getByRole("heading");
  const right = page.getByRole("button", { name: "It is right" });
  const name = await asked.innerText();
  const movedOn = async () => !(await asked.isVisible()) || (await asked.innerText()) !== name;
  for (const digit of whole) await page.getByRole("button", { name: digit, exact: true }).click();
  await page
    .getByRole("group", { name: /^Eighths/ })
    .getByRole("button", { name: eighths })
    .click();
  await expect.poll(async () => (await right.isVisible()) || (await movedOn())).toBe(true);
  if (await right.isVisible()) await right.click();
  await expect.poll(movedOn).toBe(true);
}
