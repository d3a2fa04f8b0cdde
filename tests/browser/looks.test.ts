/** Every screen of the invented workshop, offline: axe finds nothing in either theme, and nothing runs off the side. */
import AxeBuilder from "@axe-core/playwright";
import { type Page } from "@playwright/test";
import { screens } from "@/lib/screens";
import { expect, test, untilDatabaseOpen, untilReadyWithoutALine } from "./kit";

/** Addresses of every screen, found by following the app's own links. */
async function addresses(page: Page, url: string): Promise<Map<string, string>> {
  const found = new Map<string, string>();
  const note = async () => {
    for (const href of await page
      .locator("a[href^='/']")
      .evaluateAll((links) => links.map((a) => a.getAttribute("href")!))) {
      const path = href.split(/[?#]/)[0]!;
      // One with an id shows more than one without.
      if (!found.has(path) || (href.includes("=") && !found.get(path)!.includes("="))) found.set(path, href);
    }
  };
  const look = async (href: string | undefined) => {
    expect(href, "a link to follow").toBeTruthy();
    await page.goto(url + href);
    await untilDatabaseOpen(page);
    await page.getByRole("heading", { level: 1 }).waitFor();
    await page.waitForTimeout(600);
    await note();
  };
  /** Follows links of one screen until one leads to `wanted`: not every client has a wearer, nor every order a receipt. */
  const lookFor = async (from: string, each: string, wanted: string) => {
    await page.goto(url + from);
    await page.locator(`main a[href^="${each}"]`).first().waitFor();
    const hrefs = await page
      .locator(`main a[href^="${each}"]`)
      .evaluateAll((links) => links.map((a) => a.getAttribute("href")!));
    for (const href of new Set(hrefs)) {
      await look(href);
      if (found.get(wanted)?.includes("id=")) return;
    }
  };
  for (const path of ["/", "/clients", "/orders", "/sleeves", "/sums", "/settings"]) await look(path);
  await lookFor("/clients", "/clients/card", "/wearers/card");
  await lookFor(found.get("/clients/card")!, "/wearers/card", "/measure/set");
  await look(found.get("/measure/set"));
  await lookFor("/orders", "/orders/card", "/orders/receipt");
  const wearer = /id=([^&]+)/.exec(found.get("/wearers/card") ?? "")?.[1];
  if (wearer) found.set("/sleeves/many", `/sleeves/many?ids=${wearer}`);
  const [a, b] = await page.evaluate(() => [] as string[]).then(() => sleeveIds(page, url));
  if (a && b) found.set("/sleeves/compare", `/sleeves/compare?ids=${a},${b}`);
  if (a)
    found.set("/sleeves/draft", `/sleeves/draft?id=${a}`).set("/sleeves/marks", `/sleeves/marks?id=${a}`);
  return found;
}

async function sleeveIds(page: Page, url: string): Promise<string[]> {
  await page.goto(`${url}/sleeves`);
  const links = page.locator("a[href*='/sleeves/'][href*='id=']");
  await links.first().waitFor();
  const hrefs = await links.evaluateAll((all) => all.map((a) => a.getAttribute("href")!));
  return [...new Set(hrefs.map((href) => /id=([^&]+)/.exec(href)![1]!))];
}

test("every screen, in daylight and at night", async ({ server, page, context }) => {
  test.setTimeout(600_000);
  await page.goto(server.url);
  await page.getByRole("button", { name: /invented workshop/ }).click();
  await page.waitForURL((url) => url.pathname === "/");
  await untilReadyWithoutALine(page);
  await untilDatabaseOpen(page);
  await server.stop();
  await context.setOffline(true);
  const found = await addresses(page, server.url);

  for (const path of screens) {
    const href = found.get(path) ?? path;
    await test.step(href, async () => {
      await page.goto(server.url + href);
      await page.getByRole("heading", { level: 1 }).first().waitFor();
      if (path !== "/start") await untilDatabaseOpen(page);
      await page.waitForTimeout(300);
      for (const colorScheme of ["light", "dark"] as const) {
        await page.emulateMedia({ colorScheme });
        await page.screenshot({
          path: `tests/.output/looks/${test.info().project.name}-${colorScheme}${path.replaceAll("/", "-")}.png`,
        });
        const { violations } = await new AxeBuilder({ page }).analyze();
        expect(
          violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html).join(" | ")}`),
          `${href}, ${colorScheme}`,
        ).toEqual([]);
      }
      const runsOff = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(runsOff, `${href} runs off the side`).toBeLessThanOrEqual(0);
    });
  }
});
