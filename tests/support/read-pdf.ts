/** Reads a PDF back with pdfjs-dist: the pages' sizes in points and every text. */
import { getDocument } from "pdfjs-dist/legacy/build/pdf.mjs";

export interface ReadPdf {
  pages: { width: number; height: number; text: string }[];
  text: string;
}

export async function readPdf(bytes: Uint8Array): Promise<ReadPdf> {
  const document = await getDocument({ data: new Uint8Array(bytes), useSystemFonts: false }).promise;
  const pages: ReadPdf["pages"] = [];
  for (let n = 1; n <= document.numPages; n++) {
    const page = await document.getPage(n);
    const [, , width, height] = page.view as [number, number, number, number];
    const { items } = await page.getTextContent();
    pages.push({ width, height, text: items.map((item) => ("str" in item ? item.str : "")).join(" ") });
  }
  await document.destroy();
  return { pages, text: pages.map((page) => page.text).join("\n") };
}
