import { defineConfig } from "@playwright/test";

const chromium = {
  browserName: "chromium" as const,
  launchOptions: {
    executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium",
    args: ["--no-sandbox", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
  },
};

export default defineConfig({
  testDir: "tests/browser",
  outputDir: "test-results",
  timeout: 120_000,
  expect: { timeout: 20_000 },
  fullyParallel: true,
  workers: 2,
  forbidOnly: true,
  // Two cores under CI drive two browsers at once; what is lost is never tried again (see durability.test.ts).
  retries: process.env.CI ? 1 : 0,
  reporter: [["list"], ["json", { outputFile: "tests/.output/playwright.json" }]],
  use: { ...chromium, trace: "off", locale: "en-GB", timezoneId: "Europe/Malta" },
  projects: [
    { name: "phone", use: { viewport: { width: 360, height: 740 }, deviceScaleFactor: 2, hasTouch: true } },
    { name: "wide", use: { viewport: { width: 1280, height: 800 } }, testMatch: /(journey|looks)\.test\.ts/ },
  ],
});
