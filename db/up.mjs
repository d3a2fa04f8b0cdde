/**
 * `npm run up`: everything that a fresh machine needs to serve Notchbook: packages, build, server on port 3000
 * (or PORT) with its data under ./data. Builds again only where something changed.
 */
import { spawn, spawnSync } from "node:child_process";
import { existsSync, mkdirSync, readdirSync, statSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

const root = join(dirname(fileURLToPath(import.meta.url)), "..");
process.chdir(root);

const [major, minor] = process.versions.node.split(".").map(Number);
if (major < 20 || (major === 20 && minor < 19)) {
  console.error(`Notchbook needs Node 20.19 or later; this is ${process.version}.`);
  process.exit(1);
}

const run = (command, args) => {
  const { status } = spawnSync(command, args, { stdio: "inherit" });
  if (status !== 0) process.exit(status ?? 1);
};

const made = ["pglite", "fonts", "static-br", "sw.js", "migrations.json", "browser-files.json"];

/** The newest change among files, in ms; what the build itself makes is passed over. */
function newest(path) {
  const stat = statSync(path);
  if (!stat.isDirectory()) return stat.mtimeMs;
  return readdirSync(path)
    .filter((name) => !made.includes(name))
    .reduce((latest, name) => Math.max(latest, newest(join(path, name))), 0);
}

const installed = "node_modules/.package-lock.json";
if (!existsSync(installed) || statSync(installed).mtimeMs < statSync("package-lock.json").mtimeMs)
  run("npm", ["ci"]);

const built = ".next/BUILD_ID";
const sources = [
  "app",
  "components",
  "lib",
  "db",
  "drizzle",
  "public",
  "worker",
  "package-lock.json",
  "next.config.ts",
  "tailwind.config.ts",
];
const changed = !existsSync(built) || sources.some((path) => newest(path) > statSync(built).mtimeMs);
if (changed) run("npm", ["run", "build"]);

if (!process.argv.includes("--build-only")) {
  mkdirSync("data", { recursive: true });
  const port = process.env.PORT ?? "3000";
  // By its own file: npx would leave it running when it is told to stop.
  const server = spawn(process.execPath, ["node_modules/next/dist/bin/next", "start", "-p", port], {
    stdio: "inherit",
  });
  for (const signal of ["SIGINT", "SIGTERM"]) process.on(signal, () => server.kill(signal));
  server.on("exit", (code) => process.exit(code ?? 0));
}
