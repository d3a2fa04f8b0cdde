/** The two fonts of print, read once: what they cover, how wide they set a text, and how a document gets them. */
import { jsPDF } from "jspdf";
import { type Covers } from "@/lib/pdf/text-runs";

const FAMILY = "Print";

export interface PrintFonts {
  readonly covers: Covers;
  /** Points; `text` must be covered. */
  width(text: string, size: number, bold: boolean): number;
  /** Makes the fonts known to a document. */
  install(pdf: jsPDF): void;
}

export const setFont = (pdf: jsPDF, size: number, bold: boolean): jsPDF =>
  pdf.setFont(FAMILY, bold ? "bold" : "normal").setFontSize(size);

/** jsPDF keeps files as strings of bytes. */
function asByteString(file: ArrayBuffer): string {
  const bytes = new Uint8Array(file);
  let text = "";
  for (let i = 0; i < bytes.length; i += 0x8000)
    text += String.fromCharCode(...bytes.subarray(i, i + 0x8000));
  return text;
}

/** Reads two TrueType files. @throws Error where a file is none. */
export function readPrintFonts(regular: ArrayBuffer, bold: ArrayBuffer): PrintFonts {
  const files = [
    { name: "print-regular.ttf", style: "normal", bytes: asByteString(regular) },
    { name: "print-bold.ttf", style: "bold", bytes: asByteString(bold) },
  ];
  const install = (pdf: jsPDF) => {
    for (const { name, style, bytes } of files) {
      if (!bytes.startsWith("\x00\x01\x00\x00")) throw new Error(`${name} is not a TrueType font.`);
      pdf.addFileToVFS(name, bytes).addFont(name, FAMILY, style);
    }
  };
  const scratch = new jsPDF({ unit: "pt" });
  install(scratch);
  const glyphs = ["normal", "bold"].map((style) => {
    const { metadata } = scratch.setFont(FAMILY, style).getFont();
    return (metadata as { cmap: { unicode: { codeMap: Record<number, number> } } }).cmap.unicode.codeMap;
  });
  return {
    install,
    covers: (codePoint) => glyphs.every((map) => Boolean(map[codePoint])),
    width: (text, size, isBold) => {
      setFont(scratch, size, isBold);
      return scratch.getStringUnitWidth(text) * size;
    },
  };
}
