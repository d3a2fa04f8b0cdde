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
  expect: { timeout: 15_000 },
  fullyParallel: true,
  workers: 2,
  forbidOnly: true,
  retries: 0,
  reporter: [["list"], ["json", { outputFile: "tests/.output/playwright.json" }]],
  use: { ...chromium, trace: "off", locale: "en-GB", timezoneId: "Europe/Malta" },
  projects: [
    { name: "phone", use: { viewport: { width: 360, height: 740 }, deviceScaleFactor: 2, hasTouch: true } },
    { name: "wide", use: { viewport: { width: 1280, height: 800 } }, testMatch: /(journey|looks)\.test\.ts/ },
  ],
});
