/** Writes composed pages as a PDF. */
import { jsPDF } from "jspdf";
import { type Item } from "@/lib/pdf/blocks";
import { type ComposedPage } from "@/lib/pdf/compose";
import { type PrintFonts, setFont } from "@/lib/pdf/print-fonts";
import { type PaintedText, type TextPainter } from "@/lib/pdf/text-painter";

/** What a document needs besides what it says. */
export interface PrintTools {
  readonly fonts: PrintFonts;
  readonly painter: TextPainter;
  readonly onProgress?: (done: number, of: number) => void;
  /** Fixed, two runs give the same bytes. Absent: now, and a random id. */
  readonly stamp?: { readonly createdAt: Date; /** 32 hexadecimal digits. */ readonly fileId: string };
}

export interface PdfFacts {
  readonly title: string;
  readonly author: string;
  readonly subject?: string;
  /** BCP 47, as `en-GB`. */
  readonly lang: string;
}

/** Parts of jsPDF that its types leave out. */
interface Internals {
  write(...parts: string[]): void;
  events: { subscribe(topic: string, callback: () => void): unknown };
}

const utf16 = (text: string): string =>
  Array.from({ length: text.length }, (_, i) => text.charCodeAt(i).toString(16).padStart(4, "0")).join("");

function startPdf(first: ComposedPage, facts: PdfFacts, { fonts, stamp }: PrintTools): jsPDF {
  const pdf = new jsPDF({
    unit: "pt",
    format: [first.width, first.height],
    orientation: orientationOf(first),
    compress: true,
    putOnlyUsedFonts: true,
  });
  fonts.install(pdf);
  const { title, author, subject = "", lang } = facts;
  pdf.setProperties({ title, author, subject, creator: "Notchbook" });
  // Full size: a printer that shrinks to fit would make the tape's ticks lie.
  pdf.viewerPreferences({ DisplayDocTitle: true, PrintScaling: "None" });
  // jsPDF's own setLanguage drops languages that are not on its list.
  const internal = pdf.internal as unknown as Internals;
  if (/^[A-Za-z0-9-]+$/.test(lang))
    internal.events.subscribe("putCatalog", () => internal.write(`/Lang (${lang})`));
  if (stamp) pdf.setCreationDate(stamp.createdAt).setFileId(stamp.fileId);
  return pdf;
}

/** jsPDF swaps width and height where they disagree with this. */
const orientationOf = ({ width, height }: ComposedPage) => (width > height ? "landscape" : "portrait");

function drawPath(pdf: jsPDF, { steps, fill, stroke }: Extract<Item, { kind: "path" }>): void {
  if (fill) pdf.setFillColor(...fill);
  if (stroke) {
    pdf.setDrawColor(...stroke.colour);
    pdf.setLineWidth(stroke.width);
    pdf.setLineDashPattern([...(stroke.dash ?? [])], stroke.phase ?? 0);
  }
  pdf.path(steps.map(({ op, c }) => ({ op, c: [...c] })));
  if (fill && stroke) pdf.fillStroke();
  else if (fill) pdf.fill();
  else pdf.stroke();
}

type PictureItem = Extract<Item, { kind: "text" | "picture" }>;

function pictureBook(pdf: jsPDF, painter: TextPainter) {
  const painted = new Map<string, Promise<PaintedText>>();
  return async ({ x, y, text, size, bold }: PictureItem): Promise<void> => {
    const alias = `${size} ${bold} ${text}`;
    const pending = painted.get(alias) ?? painter.paint(text, size, bold);
    painted.set(alias, pending);
    const { widthPt, heightPt, baselinePt, bleedPt, png } = await pending;
    const { write } = pdf.internal as unknown as Internals;
    // Read aloud, searched and copied as the text it is.
    write(`/Span <</ActualText <feff${utf16(text)}>>> BDC`);
    pdf.addImage(png, "PNG", x - bleedPt, y - baselinePt, widthPt + 2 * bleedPt, heightPt, alias, "FAST");
    write("EMC");
  };
}

/** Text and pictures are drawn over paths, wherever they stand in the list. */
export async function writePdf(
  pages: readonly ComposedPage[],
  facts: PdfFacts,
  tools: PrintTools,
): Promise<ArrayBuffer> {
  const first = pages[0];
  if (!first) throw new Error("A document needs at least one page.");
  const pdf = startPdf(first, facts, tools);
  const drawPicture = pictureBook(pdf, tools.painter);
  const of = pages.reduce((sum, { items }) => sum + items.length, 0);
  let done = 0;
  for (const [index, page] of pages.entries()) {
    if (index > 0) pdf.addPage([page.width, page.height], orientationOf(page));
    pdf.setLineCap("butt").setLineJoin("round").setTextColor(0);
    for (const item of page.items) if (item.kind === "path") drawPath(pdf, item);
    for (const item of page.items) {
      if (item.kind === "text") setFont(pdf, item.size, item.bold).text(item.text, item.x, item.y);
      else if (item.kind === "picture") {
        await drawPicture(item);
        tools.onProgress?.(done, of);
      }
      done++;
    }
    tools.onProgress?.(done, of);
  }
  return pdf.output("arraybuffer");
}
