/** Failures that are ordinary days: each has a state on the screen, and nothing typed is lost. */
import { freePort } from "@/tests/support/app-server";
import { Line } from "@/tests/support/line";
import { beginWorkshop, expect, test, untilDatabaseOpen, untilReadyWithoutALine } from "./kit";

test("before the database has arrived, starting and adding a client work, and are there after a reload", async ({
  server,
  page,
}) => {
  const line = new Line(await freePort(), server.port);
  line.holdBack = /^\/pglite\//;
  await line.start();
  try {
    await page.goto(line.url);
    await beginWorkshop(page);
    await page.goto(`${line.url}/clients/new`);
    await page.getByLabel("Name", { exact: true }).first().fill("Early Bird");
    await page.getByRole("button", { name: "Keep the client" }).click();
    await expect(page.getByRole("heading", { name: "Early Bird", level: 1 })).toBeVisible();
    await expect(page.locator(".kept-line")).toContainText("opening the book");

    await page.reload();
    await expect(page.getByRole("heading", { name: "Early Bird", level: 1 })).toBeVisible();

    line.release();
    await untilDatabaseOpen(page);
    await expect(page.getByRole("heading", { name: "Early Bird", level: 1 })).toBeVisible();
  } finally {
    line.stop();
  }
});

test("a browser that refuses storage is told so, plainly", async ({ server, page }) => {
  await page.addInitScript(() => {
    IDBFactory.prototype.open = () => {
      throw new DOMException("refused", "SecurityError");
    };
  });
  await page.goto(server.url);
  await expect(page.getByRole("heading", { level: 1 })).toContainText(/kept|keep/i);
  await expect(page.getByRole("main")).toContainText(/private window/i);
});

test("a full phone says so where one presses, keeps the form, and keeps it after there is room", async ({
  server,
  page,
}) => {
  await page.goto(server.url);
  await beginWorkshop(page);
  await page.goto(`${server.url}/clients/new`);
  await page.getByLabel("Name", { exact: true }).first().fill("No Room");
  await page.evaluate(() => {
    const put = IDBObjectStore.prototype.put;
    (window as unknown as { thereIsRoom: () => void }).thereIsRoom = () => {
      IDBObjectStore.prototype.put = put;
    };
    IDBObjectStore.prototype.put = () => {
      throw new DOMException("full", "QuotaExceededError");
    };
  });
  const keep = page.getByRole("button", { name: "Keep the client" });
  await keep.click();
  await expect(page.getByText(/no room left/)).toBeVisible();
  await expect(page.getByLabel("Name", { exact: true }).first()).toHaveValue("No Room");
  await page.evaluate(() => (window as unknown as { thereIsRoom: () => void }).thereIsRoom());
  await keep.click();
  await expect(page.getByRole("heading", { name: "No Room", level: 1 })).toBeVisible();
});

test("a database that cannot be had says so, and a copy of everything can still be saved", async ({
  server,
  page,
}) => {
  const line = new Line(await freePort(), server.port);
  line.holdBack = /^\/pglite\//;
  await line.start();
  try {
    await page.goto(line.url);
    await beginWorkshop(page);
    await page.goto(`${line.url}/clients/new`);
    await page.getByLabel("Name", { exact: true }).first().fill("Still Here");
    await page.getByRole("button", { name: "Keep the client" }).click();
    await expect(page.getByRole("heading", { name: "Still Here", level: 1 })).toBeVisible();
    line.refuseHeld();
    await expect(page.getByText("The book on this phone does not open")).toBeVisible();
    const [file] = await Promise.all([
      page.waitForEvent("download"),
      page
        .getByRole("button", { name: /save a copy/i })
        .first()
        .click(),
    ]);
    expect(file.suggestedFilename()).toMatch(/^notchbook-Thimble-Lane-.*\.json(\.gz)?$/);
  } finally {
    line.stop();
  }
});

test("a shell that is not whole is never taken: the first install fails and says so at the next visit", async ({
  server,
  page,
}) => {
  const line = new Line(await freePort(), server.port);
  line.refuse = /^\/orders\/receipt/;
  await line.start();
  try {
    await page.goto(line.url);
    await beginWorkshop(page);
    await expect.poll(() => line.refused).toBeGreaterThan(0);
    // A failed install takes its registration with it.
    await expect
      .poll(() => page.evaluate(async () => (await navigator.serviceWorker.getRegistration()) === undefined))
      .toBe(true);
    line.refuse = null;
    await page.reload();
    await untilReadyWithoutALine(page);
  } finally {
    line.stop();
  }
});
