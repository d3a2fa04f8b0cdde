/**
 * Makes the two fonts that printed papers are set in: complete TrueType fonts cut down to the scripts that jsPDF
 * can set without shaping. Fontsource's files will not do: each holds one script, and jsPDF reads no WOFF2.
 */
import { existsSync, mkdirSync, readFileSync, renameSync, statSync, writeFileSync } from "node:fs";
import { createRequire } from "node:module";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import subsetFont from "subset-font";

const require = createRequire(import.meta.url);
const SOURCE = "@expo-google-fonts/source-sans-3";

const fonts = [
  { from: "400Regular/SourceSans3_400Regular.ttf", to: "print-regular.ttf" },
  { from: "700Bold/SourceSans3_700Bold.ttf", to: "print-bold.ttf" },
];

/** Blocks of Unicode, first and last. Combining marks are left out: what has no letter of its own is drawn as a picture. */
const blocks = [
  [0x20, 0x7e], // Latin
  [0xa0, 0x24f], // Latin-1 with ½ ¼ ¾ ×, Extended-A and B
  [0x2bb, 0x2bc], // the letters ʻ and ʼ of names
  [0x370, 0x3ff], // Greek
  [0x400, 0x52f], // Cyrillic
  [0x1e00, 0x1eff], // Latin Extended Additional: Vietnamese
  [0x1f00, 0x1fff], // Greek with breathings
  [0x2000, 0x206f], // spaces, dashes, quotation marks, ⁄
  [0x2070, 0x209c], // raised and lowered figures
  [0x20a0, 0x20c0], // signs of currencies
  [0x2116, 0x2122], // № ™
  [0x2150, 0x215f], // ⅓ ⅛ ⅜ ⅝ ⅞
  [0x2190, 0x2199], // arrows
  [0x2212, 0x2212], // −
  [0x2248, 0x2265], // ≈ ≠ ≤ ≥
  [0x25a0, 0x25cf], // ▪ ▲ ▼ ●
  [0x2713, 0x2718], // ✓ ✗
];

const letters = blocks
  .flatMap(([first, last]) =>
    Array.from({ length: last - first + 1 }, (_, i) => String.fromCodePoint(first + i)),
  )
  .join("");

function isFresh(output, inputs) {
  if (!existsSync(output)) return false;
  const made = statSync(output).mtimeMs;
  return inputs.every((input) => statSync(input).mtimeMs <= made);
}

/** Writes print-regular.ttf and print-bold.ttf into `outDir`; leaves alone what is newer than what it is made from. */
export async function prepareFonts(outDir) {
  const sourceDir = dirname(require.resolve(`${SOURCE}/package.json`));
  const self = fileURLToPath(import.meta.url);
  mkdirSync(outDir, { recursive: true });
  for (const { from, to } of fonts) {
    const input = join(sourceDir, from);
    const output = join(outDir, to);
    if (isFresh(output, [input, self])) continue;
    const subset = await subsetFont(readFileSync(input), letters, {
      targetFormat: "sfnt",
      keepFeatures: [],
      noLayoutClosure: true,
      noHinting: true,
      dropTables: ["GSUB", "GPOS", "GDEF", "BASE", "STAT", "DSIG", "gasp"],
    });
    // Whole or not at all: a server may be reading it.
    const draft = `${output}.${process.pid}`;
    writeFileSync(draft, subset);
    renameSync(draft, output);
  }
}

if (process.argv[1] && resolve(process.argv[1]) === fileURLToPath(import.meta.url))
  await prepareFonts(join(dirname(fileURLToPath(import.meta.url)), "../public/fonts"));
