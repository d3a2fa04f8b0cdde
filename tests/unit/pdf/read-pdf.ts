/** Reads a PDF back with another library than the one that wrote it. */
import { getDocument, OPS } from "pdfjs-dist/legacy/build/pdf.mjs";

export interface ReadText {
  readonly text: string;
  /** Points, from the top left of the page. */
  readonly left: number;
  readonly right: number;
  readonly baseline: number;
  readonly size: number;
}

export interface ReadPicture {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export interface ReadPage {
  readonly width: number;
  readonly height: number;
  readonly texts: readonly ReadText[];
  readonly pictures: readonly ReadPicture[];
  /** How often each path operator stands on the page. */
  readonly curves: number;
  readonly lines: number;
}

export interface ReadPdf {
  readonly pages: readonly ReadPage[];
  readonly info: Record<string, unknown>;
  readonly lang: string | null;
  readonly fingerprint: string | null;
}

type Matrix = readonly number[];
const times = ([a, b, c, d, e, f]: Matrix, [g, h, i, j, k, l]: Matrix): number[] => [
  a! * g! + c! * h!,
  b! * g! + d! * h!,
  a! * i! + c! * j!,
  b! * i! + d! * j!,
  a! * k! + c! * l! + e!,
  b! * k! + d! * l! + f!,
];

// How pdf.js packs a path: 0 move, 1 line, 2 cubic curve, 4 close, each followed by its numbers.
const NUMBERS = [2, 2, 6, 4, 0];

export async function readPdf(file: ArrayBuffer): Promise<ReadPdf> {
  const pdf = await getDocument({ data: new Uint8Array(file.slice(0)), verbosity: 0 }).promise;
  const pages: ReadPage[] = [];
  for (let n = 1; n <= pdf.numPages; n++) {
    const page = await pdf.getPage(n);
    const { width, height } = page.getViewport({ scale: 1 });
    const content = await page.getTextContent();
    const texts = content.items.flatMap((item): ReadText[] => {
      if (!("str" in item) || item.str.trim() === "") return [];
      const [a = 0, b = 0, , , left = 0, y = 0] = item.transform as number[];
      return [
        { text: item.str, left, right: left + item.width, baseline: height - y, size: Math.hypot(a, b) },
      ];
    });
    const { fnArray, argsArray } = await page.getOperatorList();
    let matrix: Matrix = [1, 0, 0, 1, 0, 0];
    const saved: Matrix[] = [];
    const pictures: ReadPicture[] = [];
    let curves = 0;
    let lines = 0;
    fnArray.forEach((fn, i) => {
      const args = argsArray[i] as unknown[] | null;
      if (fn === OPS.save) saved.push(matrix);
      else if (fn === OPS.restore) matrix = saved.pop() ?? matrix;
      else if (fn === OPS.transform) matrix = times(matrix, args as number[]);
      else if (fn === OPS.paintImageXObject) {
        const [w = 0, , , h = 0, x = 0, y = 0] = matrix;
        pictures.push({ left: x, right: x + w, top: height - y - h, bottom: height - y });
      } else if (fn === OPS.constructPath) {
        const [packed] = (args?.[1] ?? []) as (ArrayLike<number> | null)[];
        for (let at = 0; packed && at < packed.length; at += 1 + (NUMBERS[packed[at]!] ?? 0)) {
          if (packed[at] === 2) curves++;
          if (packed[at] === 1) lines++;
        }
      }
    });
    pages.push({ width, height, texts, pictures, curves, lines });
  }
  const metadata = await pdf.getMetadata();
  const info = metadata.info as Record<string, unknown>;
  const read = {
    pages,
    info,
    lang: (info.Language as string | undefined) ?? null,
    fingerprint: pdf.fingerprints[0] ?? null,
  };
  await pdf.destroy();
  return read;
}

/** All words of a page or a file in reading order, one space between them. */
export const wordsOf = (pages: readonly ReadPage[]): string =>
  pages
    .flatMap(({ texts }) => texts.map(({ text }) => text))
    .join(" ")
    .replace(/\s+/g, " ");

/** Without any spaces: a word cut between letters reads the same. */
export const lettersOf = (text: string): string => text.normalize("NFC").replace(/\s+/g, "");
