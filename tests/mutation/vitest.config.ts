/** The engine's tests alone, with fewer random cases: each mutant runs them again. */
import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

export default defineConfig({
  root: fileURLToPath(new URL("../..", import.meta.url)),
  resolve: { alias: { "@": fileURLToPath(new URL("../..", import.meta.url)) } },
  test: {
    include: ["tests/unit/drafting/**/*.test.ts"],
    setupFiles: ["tests/mutation/few-runs.ts"],
    // Counts what many random cases come to: with few it says nothing.
    testNamePattern: "^(?!.*refused, names one of its figures)",
    testTimeout: 30_000,
  },
});
