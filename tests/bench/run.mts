/**
 * `npm run bench`: what a phone pays and waits for. Everything in one run on one machine; compare only within it.
 * Wants a build (`npm run build`) and Chromium. Prints the table that DEVELOPERS.md keeps.
 */
import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { type CDPSession, chromium, type Page } from "@playwright/test";
import { makeCopy, writeCopy } from "@/lib/copy/saved-copy";
import { type Change, newId, SCHEMA_NUMBER } from "@/lib/journal/change";
import { overlay } from "@/lib/journal/merge";
import { todayIso } from "@/lib/people/today";
import { AppServer, freePort } from "@/tests/support/app-server";
import { Line } from "@/tests/support/line";
import { bigBook } from "./big-book";
import { measureEngine, measureStyles } from "./engine";
import { measureMany } from "./many";
import { kb, machine, type Measured, ms, spread, table } from "./report";

const SLOW = 4;
const CLIENTS = 5000;
const ORDERS = 20_000;
const rows: Measured[] = [];
const note = (what: string, value: string) => {
  rows.push({ what, value });
  console.log(`${what}: ${value}`);
};

const server = new AppServer(await freePort(), mkdtempSync(join(tmpdir(), "notchbook-bench-")));
await server.start();
const profile = mkdtempSync(join(tmpdir(), "notchbook-profile-"));
const executablePath = process.env.CHROMIUM ?? "/usr/bin/chromium";
const open = (dir: string) =>
  chromium.launchPersistentContext(dir, {
    executablePath,
    args: ["--no-sandbox", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
    viewport: { width: 360, height: 740 },
    acceptDownloads: true,
  });

async function slowly(page: Page, times: number): Promise<CDPSession> {
  const session = await page.context().newCDPSession(page);
  await session.send("Emulation.setCPUThrottlingRate", { rate: times });
  return session;
}

const untilOpen = (page: Page) =>
  page.waitForFunction(
    () =>
      /^Kept on this phone · (?!opening|reading)/.test(
        document.querySelector(".kept-line")?.textContent ?? "",
      ),
    null,
    { timeout: 600_000 },
  );

async function firstVisit(): Promise<void> {
  const line = new Line(await freePort(), server.port);
  await line.start();
  const dir = mkdtempSync(join(tmpdir(), "notchbook-profile-"));
  const context = await open(dir);
  const page = context.pages()[0]!;
  let programs = 0;
  const session = await page.context().newCDPSession(page);
  await session.send("Network.enable");
  const scripts = new Set<string>();
  session.on("Network.responseReceived", (event) => {
    if (event.type === "Script") scripts.add(event.requestId);
  });
  session.on("Network.loadingFinished", (event) => {
    if (scripts.has(event.requestId)) programs += event.encodedDataLength;
  });
  await page.goto(line.url);
  await page.getByRole("button", { name: "Begin", exact: true }).waitFor();
  note("programs before the first tap, the start screen (brotli, with headers)", kb(programs));
  await page.waitForFunction(() => navigator.serviceWorker.controller !== null, null, { timeout: 120_000 });
  await page.waitForTimeout(1500);
  let all = 0;
  for (const [part, bytes] of [...line.byPart()].sort((a, b) => b[1] - a[1])) {
    note(`first visit, ${part}`, kb(bytes));
    all += bytes;
  }
  note("first visit, all (aim: 4.5 MB at most)", kb(all));
  const kept = await page.evaluate(async () => (await navigator.storage.estimate()).usage ?? 0);
  note("kept by the browser after it, with an empty book", kb(kept));
  await context.close();
  line.stop();
  rmSync(dir, { recursive: true, force: true });
}

/** The book as a saved copy, read in as its owner would read it in. */
async function bigCopy(): Promise<string> {
  const workshopId = newId();
  const today = todayIso();
  const made: Change = {
    number: 1,
    device: "",
    workshopId,
    schema: SCHEMA_NUMBER,
    writtenAt: "",
    rows: bigBook({ clients: CLIENTS, orders: ORDERS, today, seed: 7 }),
  };
  const stamp = Object.values(made.rows[0]!.fields)[0]!.stamp;
  const fields = {
    name: "Bench Street",
    unit: "in",
    fineness: 8,
    currency: "EUR",
    country: "MT",
    address: "",
    phone: "",
    demo: false,
    removedAt: null,
  };
  made.rows.push({
    table: "workshops",
    id: workshopId,
    makes: true,
    fields: Object.fromEntries(
      Object.entries(fields).map(([name, value]) => [name, { value, stamp, base: null }]),
    ),
  });
  const copy = makeCopy(overlay({}, [made]), [], { workshopId, madeAt: new Date().toISOString() });
  const file = join(profile, "big-copy.json");
  writeFileSync(file, await writeCopy(copy));
  return file;
}

async function bigBookOnAPhone(): Promise<void> {
  let context = await open(profile);
  let page = context.pages()[0]!;
  await page.goto(server.url);
  await page.getByTestId("copy-file").setInputFiles(await bigCopy());
  const started = Date.now();
  await page.getByRole("button", { name: "Read it in" }).click({ timeout: 120_000 });
  await page.waitForURL((url) => url.pathname === "/", { timeout: 600_000 });
  await untilOpen(page);
  note(
    `reading in a copy of ${CLIENTS} clients and ${ORDERS} orders, until the database has it (full speed)`,
    ms(Date.now() - started),
  );
  await page.locator("main .row").first().waitFor();
  await page.waitForFunction(() => navigator.serviceWorker.controller !== null);
  await page.waitForTimeout(4000);
  await context.close();

  const usable: number[] = [];
  const opened: number[] = [];
  for (let i = 0; i < 5; i++) {
    context = await open(profile);
    page = context.pages()[0]!;
    await slowly(page, SLOW);
    const from = Date.now();
    await page.goto(server.url, { waitUntil: "commit" });
    await page.locator("main .row").first().waitFor();
    usable.push(Date.now() - from);
    await untilOpen(page);
    opened.push(Date.now() - from);
    await page.waitForTimeout(500);
    await context.close();
  }
  note(
    `cold start to usable Today, ${CLIENTS} clients, ${ORDERS} orders, ${SLOW}x slower CPU`,
    spread(usable),
  );
  note("the same, until the database has answered", spread(opened));

  context = await open(profile);
  page = context.pages()[0]!;
  await slowly(page, SLOW);
  await page.goto(server.url);
  await untilOpen(page);
  const drawn: number[] = [];
  const found: number[] = [];
  const orders: number[] = [];
  for (let i = 0; i < 9; i++) {
    const timeTo = (act: () => Promise<unknown>, until: () => Promise<unknown>) =>
      (async () => {
        const from = Date.now();
        await act();
        await until();
        return Date.now() - from;
      })();
    const row = page.locator("main .row").first();
    drawn.push(
      await timeTo(
        () => page.getByLabel("Places").getByRole("link", { name: "Clients" }).click(),
        async () => {
          await page.waitForURL(/\/clients$/);
          await row.waitFor();
        },
      ),
    );
    const field = page.getByRole("searchbox").or(page.getByLabel(/^Find/)).first();
    const wanted = String(1000 + i * 37);
    found.push(
      await timeTo(
        () => field.fill(wanted),
        () => page.locator("main .row", { hasText: wanted }).first().waitFor(),
      ),
    );
    await field.fill("");
    orders.push(
      await timeTo(
        () => page.getByLabel("Places").getByRole("link", { name: "Orders" }).click(),
        async () => {
          await page.waitForURL(/\/orders$/);
          await row.waitFor();
        },
      ),
    );
    await page.getByLabel("Places").getByRole("link", { name: "Today" }).click();
    await row.waitFor();
  }
  note(`tap to drawn list of clients, ${SLOW}x slower CPU`, spread(drawn));
  note(`typing to the client found, ${SLOW}x slower CPU`, spread(found));
  note(`tap to drawn list of orders, ${SLOW}x slower CPU`, spread(orders));
  await context.close();
}

/** A statement sleeve at full size: laid out, written by the worker, handed to the browser as a file. At full speed. */
async function fullSize(): Promise<void> {
  const dir = mkdtempSync(join(tmpdir(), "notchbook-profile-"));
  const context = await open(dir);
  const page = context.pages()[0]!;
  await page.goto(server.url);
  await page.getByRole("button", { name: /invented workshop/ }).click();
  await page.waitForURL((address) => address.pathname === "/");
  await untilOpen(page);
  await page.waitForTimeout(3000);
  await page.getByLabel("Places").getByRole("link", { name: "Sleeves" }).click();
  const sleeve = page.getByRole("link", { name: /statement sleeve/ }).first();
  const id = /id=([^&]+)/.exec((await sleeve.getAttribute("href"))!)![1]!;
  await page.goto(`${server.url}/sleeves/full-size?id=${id}`);
  const save = page.getByRole("button", { name: /^Save .*PDF|^Save$|^Save as PDF/ }).first();
  await save.waitFor();
  const sheets = await page.locator("#sheets-title").innerText();
  const times: number[] = [];
  for (let i = 0; i < 8; i++) {
    const from = Date.now();
    await Promise.all([page.waitForEvent("download"), save.click()]);
    times.push(Date.now() - from);
    // Another document each time: one that is made already is only handed over.
    await page.getByLabel("Allowance", { exact: true }).fill(`${(i % 6) + 2}/16`);
    await page.waitForTimeout(600);
  }
  note(
    `a statement sleeve at full size as PDF, ${sheets}: the first, with its program and fonts`,
    ms(times[0]!),
  );
  note("the same, the next ones (aim: 1 s)", spread(times.slice(1)));
  await context.close();
  rmSync(dir, { recursive: true, force: true });
}

async function keeping(): Promise<void> {
  const dir = mkdtempSync(join(tmpdir(), "notchbook-profile-"));
  const context = await open(dir);
  const page = context.pages()[0]!;
  await page.goto(server.url);
  await page.getByRole("button", { name: /invented workshop/ }).click();
  await page.waitForURL((address) => address.pathname === "/");
  await untilOpen(page);
  await page.waitForTimeout(3000);
  await slowly(page, SLOW);
  const kept: number[] = [];
  for (let i = 0; i < 25; i++) {
    await page.getByLabel("Places").getByRole("link", { name: "Clients" }).click();
    await page.getByRole("link", { name: "New client" }).click();
    await page.getByLabel("Name", { exact: true }).first().fill(`Bench ${i}`);
    await page.getByRole("button", { name: "Keep the client" }).click();
    await page.waitForURL(/\/clients\/card/);
    kept.push(...(await measures(page, "notchbook:kept")));
  }
  note(`a write until it is kept, ${SLOW}x slower CPU (aim: 50 ms)`, spread(kept));
  note(
    `what is typed in a form until it is kept, ${SLOW}x slower CPU`,
    spread(await measures(page, "notchbook:draft-kept")),
  );

  await page.getByLabel("Places").getByRole("link", { name: "Sleeves" }).click();
  await page.locator("main a[href*='/sleeves/draft?id=']").first().click();
  await page
    .getByRole("button", { name: /, more$/ })
    .first()
    .waitFor();
  // tsx names inner functions through a helper that the page has not got.
  await page.evaluate("globalThis.__name = (named) => named");
  const redrawn = await page.evaluate(async () => {
    const buttons = [...document.querySelectorAll<HTMLButtonElement>("main button")];
    const more = buttons.find((button) => /, more$/.test(button.textContent ?? ""))!;
    const drawing = () =>
      [...document.querySelectorAll("main svg path")].map((path) => path.getAttribute("d")).join();
    const drawn: number[] = [];
    const shown: number[] = [];
    for (let i = 0; i < 30; i++) {
      await new Promise((resolve) => setTimeout(resolve, 100));
      await new Promise(requestAnimationFrame);
      const before = drawing();
      const from = performance.now();
      more.click();
      // React draws a click's change in the microtasks behind it.
      await Promise.resolve();
      drawn.push(performance.now() - from);
      if (drawing() === before) throw new Error("the drawing did not change");
      await new Promise<void>((resolve) => {
        requestAnimationFrame(() => {
          const behindThePaint = new MessageChannel();
          behindThePaint.port1.onmessage = () => resolve();
          behindThePaint.port2.postMessage(null);
        });
      });
      shown.push(performance.now() - from);
    }
    return { drawn, shown };
  });
  note(
    `a tap on a figure of the sleeve until the new drawing stands in the page, ${SLOW}x slower CPU (aim: 16.7 ms)`,
    spread(redrawn.drawn),
  );
  note("the same until it is painted, waiting for the frame included", spread(redrawn.shown));

  await page.getByLabel("Places").getByRole("link", { name: "Orders" }).click();
  await page.locator("main a[href*='/orders/card']").first().click();
  await page.locator("main a[href*='/orders/receipt']").first().click();
  const printed: number[] = [];
  for (let i = 0; i < 6; i++) {
    const papers = page.getByRole("radio");
    await papers.nth(i % 2).check({ force: true });
    const from = Date.now();
    await Promise.all([
      page.waitForEvent("download"),
      page.getByRole("button", { name: /^Save/ }).first().click(),
    ]);
    printed.push(Date.now() - from);
  }
  note("a receipt as PDF: the first, with its program and fonts", ms(printed[0]!));
  note("a receipt as PDF: the next ones", spread(printed.slice(2)));
  await context.close();
  rmSync(dir, { recursive: true, force: true });
}

const measures = (page: Page, name: string): Promise<number[]> =>
  page.evaluate((wanted) => {
    const found = performance.getEntriesByName(wanted).map((entry) => entry.duration);
    performance.clearMeasures(wanted);
    return found;
  }, name);

try {
  rows.push(...measureEngine(), ...measureStyles(), ...measureMany());
  for (const { what, value } of rows) console.log(`${what}: ${value}`);
  await firstVisit();
  await keeping();
  await fullSize();
  await bigBookOnAPhone();
} finally {
  await server.stop();
  rmSync(profile, { recursive: true, force: true });
}
const browser = execFileSync(executablePath, ["--version"], { encoding: "utf8" }).trim();
console.log(`\n${table(`${todayIso()}, ${machine(browser)}:`, rows)}`);
