/** A full sleeve without a line: chosen, walked, marked out to the machine, and printed at full size. */
import { readFileSync } from "node:fs";
import { readPdf } from "@/tests/support/read-pdf";
import { beginWorkshop, expect, test, untilDatabaseOpen, untilReadyWithoutALine } from "./kit";

test("a statement sleeve from four figures, to its sheets, in aeroplane mode", async ({ page, server }) => {
  await page.goto(server.url);
  await beginWorkshop(page);
  await untilReadyWithoutALine(page);
  await untilDatabaseOpen(page);
  await server.stop();
  await page.goto(`${server.url}/sleeves/draft`);

  await test.step("the style and its walk", async () => {
    for (const [name, figure] of [
      ["Sleeve length", "8"],
      ["Cap depth", "4"],
      ["Biceps line", "12"],
      ["Hem round", "11"],
    ] as const)
      await page.getByRole("textbox", { name, exact: true }).fill(figure);
    await page.getByRole("button", { name: "Choose another style" }).click();
    await page.getByRole("dialog").getByText("Two-part statement sleeve").click();
    await expect(page.getByText("All 4 seams meet")).toBeVisible();
    await expect(page.getByText("Upper part").first()).toBeVisible();
    // Wider than the piece can bear: the figure in the way is named beside its field.
    const open = page.getByRole("textbox", { name: "Opening at the head", exact: true });
    await open.fill("4");
    await expect(page.getByText(/bends round into itself/).first()).toBeVisible();
    await open.fill("1");
    await expect(page.getByText("All 4 seams meet")).toBeVisible();
    await page.getByRole("button", { name: "Keep and mark out" }).click();
  });

  await test.step("the steps, to the machine", async () => {
    await page.waitForURL(/\/sleeves\/marks/);
    await page.getByRole("button", { name: "All steps" }).click();
    await expect(page.getByText("At the machine").first()).toBeVisible();
    await expect(page.getByText(/Sew two rows of long stitches along the head/)).toBeVisible();
  });

  await test.step("the sheets at full size", async () => {
    await page.getByRole("link", { name: /full size/ }).click();
    const title = page.getByRole("heading", { name: /sheets of A4$/ });
    await expect(title).toBeVisible();
    const [file] = await Promise.all([
      page.waitForEvent("download"),
      page.getByRole("button", { name: "Save", exact: true }).click(),
    ]);
    const { pages, text } = await readPdf(readFileSync(await file.path()));
    expect(pages).toHaveLength(Number((await title.innerText()).split(" ")[0]));
    for (const said of ["Upper part", "Lower part", "Cut 2, mirrored", "50 mm", "2 in"])
      expect(text).toContain(said);
    // Points of A4.
    for (const { height, width } of pages)
      expect([width, height].map((n) => Math.round(n * 100) / 100)).toEqual([595.28, 841.89]);
  });
});
