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

export interface ReadPath {
  /** As written: move, line, cubic curve, close. Points, from the top left of the page. */
  readonly steps: readonly { readonly op: "m" | "l" | "c" | "h"; readonly c: readonly number[] }[];
  readonly filled: boolean;
  readonly stroked: boolean;
  /** Of the pen when it was drawn. */
  readonly width: number;
  readonly dash: readonly number[];
  readonly phase: number;
}

export interface ReadPage {
  readonly width: number;
  readonly height: number;
  readonly texts: readonly ReadText[];
  readonly pictures: readonly ReadPicture[];
  readonly paths: readonly ReadPath[];
  /** How often each path operator stands on the page. */
  readonly curves: number;
  readonly lines: number;
}

export interface ReadPdf {
  readonly pages: readonly ReadPage[];
  /** All words in reading order. */
  readonly text: string;
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

// How pdf.js packs a path: each operator's number, followed by its coordinates.
const OPERATORS = { 0: ["m", 2], 1: ["l", 2], 2: ["c", 6], 4: ["h", 0] } as const;

function stepsOf(packed: ArrayLike<number>, [a, b, c, d, e, f]: Matrix, height: number): ReadPath["steps"] {
  const steps: ReadPath["steps"][number][] = [];
  for (let at = 0; at < packed.length;) {
    const known = OPERATORS[packed[at] as keyof typeof OPERATORS];
    if (!known) throw new Error(`A path has the operator ${packed[at]}, which nothing here writes.`);
    const [op, count] = known;
    const numbers = Array.from({ length: count }, (_, i) => packed[at + 1 + i]!);
    const placed = numbers.map((value, i) => {
      const [x, y] = i % 2 ? [numbers[i - 1]!, value] : [value, numbers[i + 1]!];
      return i % 2 ? height - (b! * x + d! * y + f!) : a! * x + c! * y + e!;
    });
    steps.push({ op, c: placed });
    at += 1 + count;
  }
  return steps;
}

const STROKES: readonly unknown[] = [
  OPS.stroke,
  OPS.closeStroke,
  OPS.fillStroke,
  OPS.eoFillStroke,
  OPS.closeFillStroke,
  OPS.closeEOFillStroke,
];
const FILLS: readonly unknown[] = [
  OPS.fill,
  OPS.eoFill,
  OPS.fillStroke,
  OPS.eoFillStroke,
  OPS.closeFillStroke,
  OPS.closeEOFillStroke,
];

export async function readPdf(file: ArrayBuffer | Uint8Array): Promise<ReadPdf> {
  const pdf = await getDocument({ data: Uint8Array.from(new Uint8Array(file)), verbosity: 0 }).promise;
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
    const paths: ReadPath[] = [];
    let pen = { width: 1, dash: [] as number[], phase: 0 };
    fnArray.forEach((fn, i) => {
      const args = argsArray[i] as unknown[] | null;
      if (fn === OPS.save) saved.push(matrix);
      else if (fn === OPS.restore) matrix = saved.pop() ?? matrix;
      else if (fn === OPS.transform) matrix = times(matrix, args as number[]);
      else if (fn === OPS.paintImageXObject) {
        const [w = 0, , , h = 0, x = 0, y = 0] = matrix;
        pictures.push({ left: x, right: x + w, top: height - y - h, bottom: height - y });
      } else if (fn === OPS.setLineWidth) pen = { ...pen, width: args![0] as number };
      else if (fn === OPS.setDash)
        pen = { ...pen, dash: [...(args![0] as number[])], phase: args![1] as number };
      else if (fn === OPS.constructPath) {
        const [packed] = (args?.[1] ?? []) as (ArrayLike<number> | null)[];
        const paint = args?.[0];
        if (packed)
          paths.push({
            steps: stepsOf(packed, matrix, height),
            filled: FILLS.includes(paint),
            stroked: STROKES.includes(paint),
            ...pen,
          });
      }
    });
    const count = (op: string) => paths.flatMap(({ steps }) => steps).filter((step) => step.op === op).length;
    pages.push({ width, height, texts, pictures, paths, curves: count("c"), lines: count("l") });
  }
  const metadata = await pdf.getMetadata();
  const info = metadata.info as Record<string, unknown>;
  const read = {
    pages,
    text: wordsOf(pages),
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
