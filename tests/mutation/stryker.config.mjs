/** `npm run mutate`: changes the engine in small ways and counts the changes that no test notices. */
const config = {
  packageManager: "npm",
  plugins: ["@stryker-mutator/vitest-runner"],
  testRunner: "vitest",
  vitest: { configFile: "tests/mutation/vitest.config.ts" },
  mutate: ["lib/drafting/**/*.ts"],
  // Words for people are checked by reading them, not by a test each.
  mutator: { excludedMutations: ["StringLiteral"] },
  ignorePatterns: [".next", "data", "public", "tests/browser", "tests/.output"],
  coverageAnalysis: "perTest",
  concurrency: 2,
  timeoutMS: 15_000,
  tempDirName: "tests/.output/stryker",
  reporters: ["clear-text", "progress", "json"],
  jsonReporter: { fileName: "tests/.output/mutation.json" },
  thresholds: { high: 85, low: 70, break: null },
};

export default config;
