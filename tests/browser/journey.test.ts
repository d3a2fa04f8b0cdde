/**
 * The whole job with the network off and the server stopped after the first visit: a child's figures, the
 * sleeve, its marks, an order with a deposit, the receipt. As its user would do it, by what is on the screen.
 */
import { readFileSync } from "node:fs";
import { readPdf } from "@/tests/support/read-pdf";
import { beginWorkshop, expect, tapFigure, test, untilDatabaseOpen, untilReadyWithoutALine } from "./kit";

test("from the first visit to the receipt in aeroplane mode", async ({ server, page, context }) => {
  await page.goto(server.url);
  await beginWorkshop(page);
  await untilReadyWithoutALine(page);
  await untilDatabaseOpen(page);
  await server.stop();
  await context.setOffline(true);

  await test.step("a client and her daughter", async () => {
    await page.getByRole("link", { name: "Clients", exact: true }).click();
    await page
      .getByRole("link", { name: /new client|first client/i })
      .first()
      .click();
    await page.getByLabel("Name", { exact: true }).first().fill("Rosa Camenzuli");
    await page.getByLabel(/^Phone/).fill("2100 0000");
    await page
      .getByRole("button", { name: /someone|wearer/i })
      .first()
      .click();
    const wearer = page
      .getByRole("main")
      .locator("section, fieldset")
      .filter({ hasText: "Year of birth" })
      .last();
    await wearer.getByLabel("Name", { exact: true }).fill("Marisol");
    await wearer.getByLabel("Month", { exact: true }).selectOption({ label: "May" });
    await wearer.getByLabel("Year of birth").fill("2019");
    await page.getByRole("button", { name: "Keep the client" }).click();
    await expect(page.getByRole("heading", { name: "Rosa Camenzuli", level: 1 })).toBeVisible();
  });

  await test.step("her figures, with the pad", async () => {
    await page
      .getByRole("link", { name: /^Measure/ })
      .first()
      .click();
    await page
      .getByRole("link", { name: /For a sleeve/ })
      .or(page.getByRole("button", { name: /For a sleeve/ }))
      .first()
      .click();
    await expect(page.getByRole("heading", { name: "Armscye girth" })).toBeVisible();
    await tapFigure(page, "11", /three quarters/i);
    await tapFigure(page, "7", /three eighths/i);
    await tapFigure(page, "7", /^(an|one) eighth/i);
    await tapFigure(page, "4", /seven eighths/i);
    await tapFigure(page, "5", /three eighths/i);
    // A hard reload in the middle, offline: what was taken is offered again.
    await page.reload();
    await page.getByRole("button", { name: /go on/i }).first().click();
    await tapFigure(page, "9", /half/i);
    await tapFigure(page, "15", /^Whole/);
    await page.getByRole("button", { name: "Keep this set" }).click();
    await expect(page).toHaveURL(/\/measure\/set\?id=/);
    await expect(page.getByRole("main")).toContainText("Upper arm girth");
  });

  await test.step("her sleeve, drafted from them", async () => {
    await page
      .getByRole("link", { name: /Draft a sleeve/ })
      .first()
      .click();
    await expect(page.getByRole("main")).toContainText(/Goes into the armhole/);
    await page.getByRole("button", { name: /mark out/i }).click();
    await expect(page).toHaveURL(/\/sleeves\/marks\?id=/);
    await page
      .getByRole("button", { name: /^Next/ })
      .or(page.getByRole("link", { name: /^Next/ }))
      .first()
      .click();
    await expect(page.getByText(/Step 2 of/)).toBeVisible();
    // The place is put down behind the step; a hand is slower than this too.
    await page.waitForTimeout(300);
    await page.reload();
    await expect(page.getByText(/Step 2 of/)).toBeVisible();
  });

  await test.step("the marks as PDF", async () => {
    await page
      .getByRole("button", { name: /all steps|print|paper/i })
      .or(page.getByRole("link", { name: /all steps|print|paper/i }))
      .first()
      .click();
    const [sheet] = await Promise.all([
      page.waitForEvent("download"),
      page.getByRole("button", { name: "Save", exact: false }).last().click(),
    ]);
    const pdf = await readPdf(readFileSync(await sheet.path()));
    // A4 in points (sources: 595.276 x 841.890), and the child's name on it.
    expect(pdf.pages[0]!.width).toBeCloseTo(595.28, 1);
    expect(pdf.pages[0]!.height).toBeCloseTo(841.89, 1);
    expect(pdf.text).toContain("Marisol");
    expect(pdf.text).toMatch(/cap line/);
  });

  await test.step("an order with a deposit, and its receipt", async () => {
    await page.getByRole("link", { name: "Orders", exact: true }).click();
    await page
      .getByRole("link", { name: /order/i })
      .filter({ hasText: /New order|first order/ })
      .first()
      .click();
    await page
      .getByRole("button", { name: /Rosa Camenzuli/ })
      .or(page.getByRole("link", { name: /Rosa Camenzuli/ }))
      .first()
      .click();
    await page.getByLabel("What it is for").fill("School play");
    await page.getByLabel(/^Due on/).fill("2027-01-20");
    await page.getByLabel("Kind").first().fill("Dress");
    await page.getByRole("button", { name: "Price of Dress, Marisol" }).click();
    await page.getByLabel("Price of one").fill("90");
    await page.getByText("Taken now", { exact: true }).click();
    await page.getByLabel("Amount received").fill("45");
    await page.getByRole("button", { name: /keep the order/i }).click();
    await expect(page).toHaveURL(/\/orders\/receipt\?id=/);
    const main = page.getByRole("main");
    await expect(main).toContainText(/[0-9A-Z]{6}-0001/);
    const number = (await main.innerText()).match(/[0-9A-Z]{6}-0001/)?.[0];
    await page.reload();
    await expect(page.getByText(number!).first()).toBeVisible();
    const [file] = await Promise.all([
      page.waitForEvent("download"),
      page.getByRole("button", { name: /save/i }).first().click(),
    ]);
    const pdf = await readPdf(readFileSync(await file.path()));
    expect(pdf.text).toContain(number!);
    expect(pdf.text).toContain("Rosa Camenzuli");
    expect(pdf.text).toContain("Thimble Lane");
    // A5 in points, and amounts that add up: total less what was received is the balance.
    expect(pdf.pages[0]!.width).toBeCloseTo(419.53, 1);
    expect(pdf.pages[0]!.height).toBeCloseTo(595.28, 1);
    const amountBehind = (words: RegExp) =>
      Number(new RegExp(`${words.source}[^0-9]*([0-9]+\\.[0-9]{2})`).exec(pdf.text)?.[1]);
    expect(amountBehind(/Total/)).toBe(90);
    expect(amountBehind(/Received in all/)).toBe(45);
    expect(amountBehind(/Balance to pay/)).toBe(90 - 45);
  });

  await test.step("Today", async () => {
    await page.getByRole("link", { name: "Today", exact: true }).click();
    await page.reload();
    await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
    await expect(page.getByRole("main")).toContainText(/Rosa Camenzuli|later/);
  });
});
