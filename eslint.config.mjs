import next from "eslint-config-next/core-web-vitals";
import typescript from "eslint-config-next/typescript";
import prettier from "eslint-config-prettier";
import boundaries from "eslint-plugin-boundaries";

const mayImport = {
  app: ["app", "components", "lib", "db", "drafting"],
  components: ["components", "lib", "drafting"],
  worker: ["worker", "lib", "db", "drafting"],
  db: ["db", "lib"],
  lib: ["lib", "drafting"],
  drafting: ["drafting"],
};

const config = [
  {
    ignores: [
      ".next/**",
      "data/**",
      "public/**",
      "drizzle/**",
      "next-env.d.ts",
      "test-results/**",
      "playwright-report/**",
      "tests/.output/**",
    ],
  },
  ...next,
  ...typescript,
  {
    plugins: { boundaries },
    settings: {
      "import/resolver": { typescript: { alwaysTryTypes: true } },
      "boundaries/include": ["app/**", "components/**", "lib/**", "db/**", "worker/**"],
      "boundaries/elements": [
        { type: "drafting", pattern: "lib/drafting" },
        { type: "lib", pattern: "lib" },
        { type: "db", pattern: "db" },
        { type: "worker", pattern: "worker" },
        { type: "components", pattern: "components" },
        { type: "app", pattern: "app" },
      ],
    },
    rules: {
      // Imports point one way: app -> components -> lib, db. The drafting engine imports nothing of ours.
      "boundaries/dependencies": [
        "error",
        {
          default: "disallow",
          policies: Object.entries(mayImport).map(([from, to]) => ({
            from: { element: { type: from } },
            allow: to.map((type) => ({ to: { element: { type } } })),
          })),
        },
      ],
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
      "@typescript-eslint/consistent-type-imports": ["error", { fixStyle: "inline-type-imports" }],
    },
  },
  prettier,
];

export default config;
