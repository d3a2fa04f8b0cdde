/**
 * After the build: every program and style once more as brotli, a fifth smaller than what Next compresses on the
 * fly. `next.config.ts` sends these to browsers that read brotli.
 */
import { mkdirSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { brotliCompressSync, constants } from "node:zlib";

const root = join(dirname(fileURLToPath(import.meta.url)), "..");
const from = join(root, ".next/static");
const to = join(root, "public/static-br");

rmSync(to, { recursive: true, force: true });
for (const path of readdirSync(from, { recursive: true })) {
  const file = join(from, path);
  if (!/\.(js|css)$/.test(path) || !statSync(file).isFile()) continue;
  const content = readFileSync(file);
  const params = { [constants.BROTLI_PARAM_QUALITY]: 11, [constants.BROTLI_PARAM_SIZE_HINT]: content.length };
  mkdirSync(dirname(join(to, path)), { recursive: true });
  writeFileSync(join(to, path), brotliCompressSync(content, { params }));
}
