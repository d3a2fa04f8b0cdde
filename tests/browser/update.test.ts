import { freePort } from "@/tests/support/app-server";
import { Line } from "@/tests/support/line";
import { beginWorkshop, expect, test, untilReadyWithoutALine } from "./kit";

test("a newer build waits for the user's word, and what is being typed stays", async ({ server, page }) => {
  const line = new Line(await freePort(), server.port);
  await line.start();
  try {
    await page.goto(line.url);
    await beginWorkshop(page);
    await untilReadyWithoutALine(page);

    // The same build with one byte more is another service worker.
    line.appended.set("/sw.js", "\n// newer\n");
    await page.goto(`${line.url}/clients/new`);
    await page.getByLabel("Name", { exact: true }).first().fill("Half a na");
    await page.evaluate(() => navigator.serviceWorker.getRegistration().then((found) => found?.update()));
    const use = page.getByRole("button", { name: "Use it now" });
    await expect(use).toBeVisible();
    await expect(page.getByLabel("Name", { exact: true }).first()).toHaveValue("Half a na");

    await Promise.all([page.waitForEvent("load"), use.click()]);
    await expect(page.getByLabel("Name", { exact: true }).first()).toHaveValue("Half a na");
    await expect(use).toBeHidden();
  } finally {
    line.stop();
  }
});
