/** The fonts as they are shipped, and a painter that draws boxes in place of letters: no browser needed. */
import { execFileSync } from "node:child_process";
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { crc32, deflateSync } from "node:zlib";
import { readPrintFonts } from "@/lib/pdf/print-fonts";
import { type TextBox, type TextPainter } from "@/lib/pdf/text-painter";
import { splitGraphemes } from "@/lib/pdf/text-runs";
import { type PrintTools } from "@/lib/pdf/write-pdf";

const file = (path: string) => fileURLToPath(new URL(`../../../${path}`, import.meta.url));

execFileSync(process.execPath, [file("db/prepare-fonts.mjs")]);
export const fontFile = (name: "regular" | "bold"): ArrayBuffer =>
  new Uint8Array(readFileSync(file(`public/fonts/print-${name}.ttf`))).buffer;

export const printFonts = readPrintFonts(fontFile("regular"), fontFile("bold"));

function chunk(type: string, data: Uint8Array): Buffer {
  const body = Buffer.concat([Buffer.from(type, "latin1"), data]);
  const whole = Buffer.alloc(body.length + 8);
  whole.writeUInt32BE(data.length, 0);
  body.copy(whole, 4);
  whole.writeUInt32BE(crc32(body), body.length + 4);
  return whole;
}

/** A grey PNG with alpha: a frame one dot wide. */
function framePng(width: number, height: number): Uint8Array {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header.set([8, 4, 0, 0, 0], 8);
  const rows = Buffer.alloc(height * (1 + 2 * width));
  for (let y = 0; y < height; y++)
    for (let x = 0; x < width; x++)
      if (x === 0 || y === 0 || x === width - 1 || y === height - 1)
        rows[y * (1 + 2 * width) + 1 + 2 * x + 1] = 255;
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk("IHDR", header),
    chunk("IDAT", deflateSync(rows)),
    chunk("IEND", Buffer.alloc(0)),
  ]);
}

export interface Painted {
  readonly text: string;
  readonly sizePt: number;
  readonly bold: boolean;
}

/** Each letter 0.6 of the size wide. `painted` is what it was asked to draw. */
export function boxPainter(): TextPainter & { readonly painted: Painted[] } {
  const painted: Painted[] = [];
  const measure = (text: string, sizePt: number): TextBox => ({
    widthPt: splitGraphemes(text).filter((letter) => !/^\p{Cf}+$/u.test(letter)).length * sizePt * 0.6,
    heightPt: sizePt * 1.4,
    baselinePt: sizePt * 1.05,
  });
  return {
    painted,
    measure,
    paint: async (text, sizePt, bold) => {
      painted.push({ text, sizePt, bold });
      const box = measure(text, sizePt);
      const png = framePng(Math.max(3, Math.round(box.widthPt)), Math.max(3, Math.round(box.heightPt)));
      return { ...box, bleedPt: 0, png };
    },
  };
}

export const stamp = {
  createdAt: new Date("2025-12-01T09:00:00Z"),
  fileId: "0123456789ABCDEF0123456789ABCDEF",
};

export const printTools = (more: Partial<PrintTools> = {}): PrintTools => ({
  fonts: printFonts,
  painter: boxPainter(),
  stamp,
  ...more,
});
