/** One book, two tabs: each sees the other's changes at once, and either goes on when the other is closed. */
import { type Page } from "@playwright/test";
import { beginWorkshop, expect, test, untilDatabaseOpen } from "./kit";

async function addClient(page: Page, url: string, name: string): Promise<void> {
  await page.goto(`${url}/clients/new`);
  await page.getByLabel("Name", { exact: true }).first().fill(name);
  await page.getByRole("button", { name: "Keep the client" }).click();
  await expect(page.getByRole("heading", { name, level: 1 })).toBeVisible();
}

test("two tabs work on one database, and the second leads on when the first is closed", async ({
  server,
  page,
  context,
}) => {
  await page.goto(server.url);
  await beginWorkshop(page);
  await untilDatabaseOpen(page);

  const other = await context.newPage();
  await other.goto(`${server.url}/clients`);
  await untilDatabaseOpen(other);

  await addClient(page, server.url, "From The First");
  await expect(other.getByRole("link", { name: /From The First/ })).toBeVisible();

  await page.close();
  await addClient(other, server.url, "From The Second");
  await other.goto(`${server.url}/clients`);
  await untilDatabaseOpen(other);
  await expect(other.getByRole("link", { name: /From The/ })).toHaveCount(2);
  // Found by the database that the second tab now leads, not only by what this tab still remembers.
  await other.reload();
  await untilDatabaseOpen(other);
  await other.getByLabel(/^Find/).fill("second from");
  await expect(other.getByRole("link", { name: /From The/ })).toHaveCount(1);
});
