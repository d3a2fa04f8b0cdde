/**
 * `npm test`: packages where they are missing, the unit tests, a build, and the browser tests in Debian's
 * Chromium (installed where it is missing and may be). Ends with one line: how many passed and failed.
 */
import { spawnSync } from "node:child_process";
import { existsSync, mkdirSync, readFileSync, rmSync, statSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

const root = join(dirname(fileURLToPath(import.meta.url)), "..");
process.chdir(root);
const output = "tests/.output";

const run = (command, args, env = {}) =>
  spawnSync(command, args, { stdio: "inherit", env: { ...process.env, ...env } }).status ?? 1;

function installPackages() {
  const installed = "node_modules/.package-lock.json";
  if (existsSync(installed) && statSync(installed).mtimeMs >= statSync("package-lock.json").mtimeMs) return;
  if (run("npm", ["ci"]) !== 0) process.exit(1);
}

function findChromium() {
  return [process.env.CHROMIUM, "/usr/bin/chromium", "/usr/bin/chromium-browser"].find(
    (path) => path && existsSync(path),
  );
}

/** Chromium, installed from Debian's packages where it is missing. */
function ensureChromium() {
  const found = findChromium();
  if (found) return found;
  const asRoot = process.getuid?.() === 0;
  const sudo = !asRoot && spawnSync("sudo", ["-n", "true"]).status === 0;
  if (existsSync("/usr/bin/apt-get") && (asRoot || sudo)) {
    const apt = (...args) => (asRoot ? run("apt-get", args) : run("sudo", ["-n", "apt-get", ...args]));
    if (apt("update") === 0) apt("install", "-y", "--no-install-recommends", "chromium", "fonts-dejavu-core");
  }
  const now = findChromium();
  if (now) return now;
  console.error(
    "The browser tests need Chromium. Install it (on Debian: sudo apt-get install chromium) and run npm test again.",
  );
  process.exit(1);
}

function countVitest() {
  const file = join(output, "vitest.json");
  if (!existsSync(file)) return { passed: 0, failed: 1 };
  const { numPassedTests, numFailedTests, numFailedTestSuites } = JSON.parse(readFileSync(file, "utf8"));
  return { passed: numPassedTests, failed: numFailedTests || (numFailedTestSuites ? 1 : 0) };
}

function countPlaywright() {
  const file = join(output, "playwright.json");
  if (!existsSync(file)) return { passed: 0, failed: 1 };
  const { stats } = JSON.parse(readFileSync(file, "utf8"));
  return { passed: stats.expected + stats.flaky, failed: stats.unexpected };
}

rmSync(output, { recursive: true, force: true });
mkdirSync(output, { recursive: true });
installPackages();
if (run("npm", ["run", "prepare:browser"]) !== 0) process.exit(1);
const unit = run("npx", [
  "vitest",
  "run",
  "--reporter=default",
  "--reporter=json",
  `--outputFile.json=${output}/vitest.json`,
]);
const chromium = ensureChromium();
const build = run("npm", ["run", "build"]);
const browser = build === 0 ? run("npx", ["playwright", "test"], { CHROMIUM: chromium }) : 1;

const counts = [countVitest(), countPlaywright()];
const sum = (key) => counts.reduce((total, one) => total + one[key], 0);
console.log(`${sum("passed")} passed, ${sum("failed")} failed`);
process.exit(unit === 0 && build === 0 && browser === 0 ? 0 : 1);
