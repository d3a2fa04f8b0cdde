/** A half-taken set survives a flat battery at each figure, and the whole one is in the book once. */
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { beginWorkshop, expect, tapFigure, test, untilDatabaseOpen, untilReadyWithoutALine } from "./kit";
import { MortalBrowser } from "./mortal-browser";

/** The figures of a seven-year-old's sleeve set, in tape order: whole inches and the eighths key. */
const figures: [string, RegExp][] = [
  ["11", /three quarters/i],
  ["7", /three eighths/i],
  ["7", /^(an|one) eighth/i],
  ["4", /seven eighths/i],
  ["5", /three eighths/i],
  ["9", /half/i],
  ["15", /^Whole/],
];

test("L1 a set survives the end of the browser at each of its figures", async ({ server }) => {
  test.setTimeout(300_000);
  const profile = mkdtempSync(join(tmpdir(), "notchbook-profile-"));
  const browser = new MortalBrowser(profile);
  try {
    let page = await browser.start();
    await page.goto(server.url);
    await beginWorkshop(page);
    await untilReadyWithoutALine(page);
    await page.goto(`${server.url}/clients/new`);
    await page.getByLabel("Name", { exact: true }).first().fill("Rosa Camenzuli");
    await page.getByLabel("The client too").check();
    await page.getByRole("button", { name: "Keep the client" }).click();
    await page
      .getByRole("link", { name: /^Measure/ })
      .first()
      .click();
    await page.waitForURL(/\/measure\?/);
    const measuring = page.url();
    await server.stop();

    for (const [taken, [whole, eighths]] of figures.entries()) {
      if (taken === 0) {
        const sleeveSet = page
          .getByRole("link", { name: /For a sleeve/ })
          .or(page.getByRole("button", { name: /For a sleeve/ }));
        await sleeveSet.first().click();
      } else await page.getByRole("button", { name: /go on/i }).first().click();
      await tapFigure(page, whole, eighths);
      // The sign that it is kept; from here on the battery may go.
      if (taken < figures.length - 1) {
        await expect(page.getByText(`${taken + 1}/7`)).toBeVisible();
        await expect(page.getByText(", kept on this phone").nth(taken)).toBeAttached();
      } else await expect(page.getByRole("button", { name: "Keep this set" })).toBeVisible();
      await browser.kill();
      page = await browser.start();
      await page.goto(measuring);
    }

    await page
      .getByRole("button", { name: /go on|look/i })
      .first()
      .click();
    const keep = page.getByRole("button", { name: "Keep this set" });
    await keep.click();
    await page.waitForURL(/\/measure\/set\?id=/);
    await browser.kill();

    page = await browser.start();
    await page.goto(`${server.url}/clients`);
    await untilDatabaseOpen(page);
    await page
      .getByRole("link", { name: /Rosa Camenzuli/ })
      .first()
      .click();
    await page.locator("main a[href*='/wearers/card']").first().click();
    await expect(page.locator("main a[href*='/measure/set?id=']")).toHaveCount(1);
    await page.locator("main a[href*='/measure/set?id=']").click();
    await expect(page.getByRole("heading", { name: "7 figures" })).toBeVisible();
  } finally {
    await browser.kill();
    rmSync(profile, { recursive: true, force: true });
  }
});
