/**
 * L1: a write is kept once the journal has it, and no sooner is it said to be. Ends the browser a hundred times
 * at random moments in and after writes, now and then spoils the database's files meanwhile, and finds every
 * kept client once. The server is stopped after the first visit.
 */
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { type Page } from "@playwright/test";
import { evenNumbers } from "@/tests/support/even-numbers";
import { beginWorkshop, expect, test, untilDatabaseOpen, untilReadyWithoutALine } from "./kit";
import { MortalBrowser } from "./mortal-browser";
import { spoilDatabase } from "./spoil";

const KILLS = 100;
const SPOIL_EVERY = 12;
const seed = Number(process.env.SEED ?? Date.now() % 1_000_000);

/** Names sort newest first, so that the list shows the last ones without paging. */
const nameOf = (n: number): string => `Kept ${String(9999 - n)}`;

async function namesInList(page: Page, url: string): Promise<string[]> {
  await page.goto(`${url}/clients`);
  await untilDatabaseOpen(page);
  const more = page.getByRole("button", { name: "Show more" });
  await page
    .getByRole("link", { name: /^Kept \d/ })
    .first()
    .waitFor({ timeout: 20_000 })
    .catch(() => undefined);
  // The key goes while the next ones are fetched: the list is whole only when it stays away.
  for (let away = 0; away < 3;) {
    if (await more.isVisible()) {
      away = 0;
      await more.click();
    } else away++;
    await page.waitForTimeout(250);
  }
  const names = await page.getByRole("link", { name: /^Kept \d/ }).allInnerTexts();
  return names.map((text) => text.split("\n")[0]!.trim());
}

test.describe.configure({ retries: 0 });

test("L1 a hundred ends of the browser lose nothing that was kept and double nothing", async ({ server }) => {
  test.setTimeout(900_000);
  console.log(`seed ${seed} (SEED=${seed} runs it again)`);
  const luck = evenNumbers(seed);
  const profile = mkdtempSync(join(tmpdir(), "notchbook-profile-"));
  const browser = new MortalBrowser(profile);
  const kept = new Set<string>();
  const tried = new Set<string>();
  let n = 0;
  try {
    for (let kill = 0; kill < KILLS; kill++) {
      const page = await browser.start();
      if (kill === 0) {
        await page.goto(server.url);
        await beginWorkshop(page);
        await untilReadyWithoutALine(page);
        await untilDatabaseOpen(page);
        await server.stop();
      }
      if (kill % SPOIL_EVERY === SPOIL_EVERY - 1) {
        // A page of this origin that is not the app: the database is closed while it is spoilt.
        await page.goto(`${server.url}/icons/icon-192.png`);
        expect(await spoilDatabase(page, 1 + Math.floor(luck() * 5))).toBeGreaterThan(0);
      }
      if (kill % 5 === 0 || kill % SPOIL_EVERY === SPOIL_EVERY - 1)
        check(await namesInList(page, server.url));

      // Counted from the first press, so that a slow machine too is ended in and after writes, not before them.
      let pressed = () => {};
      const begun = new Promise<void>((resolve) => (pressed = resolve));
      const until = begun.then(() => new Promise((resolve) => setTimeout(resolve, luck() * 1500)));
      let over = false;
      const writing = (async () => {
        for (let w = 0; w < 3 && !over; w++) {
          await page.goto(`${server.url}/clients/new`);
          const name = nameOf(n++);
          await page.getByLabel("Name", { exact: true }).first().fill(name);
          tried.add(name);
          const press = page.getByRole("button", { name: "Keep the client" }).click();
          pressed();
          await press;
          // The screen moves on only when the change is kept.
          await page.waitForURL(/\/clients\/card/);
          kept.add(name);
        }
      })().catch(() => undefined);
      await Promise.race([until, writing]);
      over = true;
      await browser.kill();
      await writing;
    }
    const page = await browser.start();
    check(await namesInList(page, server.url));
    console.log(`${KILLS} ends: ${tried.size} writes begun, ${kept.size} seen kept`);
    expect(kept.size).toBeGreaterThan(KILLS / 4);
  } finally {
    await browser.kill();
    rmSync(profile, { recursive: true, force: true });
  }

  function check(names: string[]): void {
    expect(new Set(names).size, "each once").toBe(names.length);
    expect(
      [...kept].filter((name) => !names.includes(name)),
      "kept and not found",
    ).toEqual([]);
    expect(
      names.filter((name) => !tried.has(name)),
      "found and never written",
    ).toEqual([]);
  }
});
