import { describe, expect, it } from "vitest";
import { type ReceiptPaper, receiptPapers } from "@/lib/pdf/papers";
import { type ReceiptDocument } from "@/lib/pdf/receipt-document";
import { receiptPdf } from "@/lib/pdf/receipt";
import { boxPainter, printTools } from "./print-tools";
import { type ReadPdf, readPdf, wordsOf } from "@/tests/support/read-pdf";
import * as samples from "./receipt-samples";

// A4 and the unit: ISO 216 and 1 in = 25.4 mm (seen, sources.md); A5 is half an A4 to the millimetre. Rolls as
// sources.md has them: 58 mm with 48 printable, 80 mm with 72.
const sizes: Record<ReceiptPaper, { width: number; height?: number; printable: number }> = {
  a5: { width: 419.528, height: 595.276, printable: 419.528 - 2 * 28.346 },
  a4: { width: 595.276, height: 841.89, printable: 595.276 - 2 * 28.346 },
  roll80: { width: 226.772, printable: 204.094 },
  roll58: { width: 164.409, printable: 136.063 },
};
const papers = Object.keys(receiptPapers) as ReceiptPaper[];
const read = async (doc: ReceiptDocument, paper: ReceiptPaper): Promise<ReadPdf> =>
  readPdf(await receiptPdf(doc, paper, printTools()));

/** Everything stands on paper that a printer can reach: 10 mm from a sheet's edge, the printable band of a roll. */
function expectInside({ pages }: ReadPdf, paper: ReceiptPaper) {
  const { printable } = sizes[paper];
  for (const { width, height, texts, pictures } of pages) {
    const left = (width - printable) / 2 - 0.05;
    const right = (width + printable) / 2 + 0.05;
    const edge = sizes[paper].height ? 28.346 : 0;
    for (const text of texts) {
      expect(text.left, text.text).toBeGreaterThanOrEqual(left);
      expect(text.right, text.text).toBeLessThanOrEqual(right);
      expect(text.baseline - text.size * 0.7, text.text).toBeGreaterThanOrEqual(edge);
      expect(text.baseline + text.size * 0.25, text.text).toBeLessThanOrEqual(height - edge);
    }
    for (const picture of pictures) {
      expect(picture.left).toBeGreaterThanOrEqual(left);
      expect(picture.right).toBeLessThanOrEqual(right);
      expect(picture.top).toBeGreaterThanOrEqual(edge);
      expect(picture.bottom).toBeLessThanOrEqual(height - edge);
    }
  }
}

/** No two texts of one page lie on each other. */
function expectApart({ pages }: ReadPdf) {
  for (const { texts } of pages)
    texts.forEach((one, i) => {
      for (const other of texts.slice(i + 1)) {
        const across = Math.min(one.right, other.right) - Math.max(one.left, other.left);
        const down =
          Math.min(one.baseline, other.baseline) -
          Math.max(one.baseline - one.size * 0.66, other.baseline - other.size * 0.66);
        expect(across > 0.5 && down > 0.5, `“${one.text}” on “${other.text}”`).toBe(false);
      }
    });
}

const everyText = (doc: ReceiptDocument): string[] => [
  doc.number,
  doc.title,
  doc.seller.name,
  ...doc.seller.lines,
  doc.buyer.name,
  ...doc.buyer.lines,
  doc.orderTitle,
  ...doc.lines.flatMap(({ text, quantity, unitText, amountText }) => [text, quantity, unitText, amountText]),
  doc.totalText,
  doc.payment.label,
  doc.payment.label ? doc.payment.methodLabel.toLowerCase() : doc.payment.methodLabel,
  doc.payment.amountText,
  ...doc.earlier.flatMap(({ number, label, amountText }) => [number, label, amountText]),
  doc.receivedText,
  doc.balanceLabel,
  doc.balanceText,
  doc.thanks ?? "",
  ...doc.cautions,
];

/** A word wider than its column stands in pieces below one another, each starting at the column's left edge. */
function standsInPieces(word: string, { pages }: ReadPdf): boolean {
  return pages.some(({ texts }) =>
    texts.some((first) => {
      const column = texts
        .filter(({ left, baseline }) => Math.abs(left - first.left) < 0.1 && baseline >= first.baseline)
        .toSorted((a, b) => a.baseline - b.baseline);
      let rest = word;
      for (const { text } of column) {
        if (!rest.startsWith(text)) return false;
        rest = rest.slice(text.length);
        if (rest === "") return true;
      }
      return false;
    }),
  );
}

/** Columns side by side are read line by line, so a text that wraps is looked for word by word. */
function expectEveryText(doc: ReceiptDocument, pdf: ReadPdf) {
  const all = wordsOf(pdf.pages);
  for (const text of everyText(doc))
    for (const word of text.split(/\s+|(?<=\p{L}-)(?=\p{L})/u))
      expect(all.includes(word) || standsInPieces(word, pdf), word).toBe(true);
}

const documents: [string, ReceiptDocument][] = [
  ["a short order", samples.receiptOf(samples.short)],
  ["twenty lines", samples.receiptOf(samples.many(20))],
  ["two hundred lines", samples.receiptOf(samples.many(200))],
  ["very long names", samples.longNames],
  ["other alphabets", samples.otherAlphabets],
];

describe.each(papers)("a receipt on %s", (paper) => {
  it.each(documents)(
    "%s: the paper's size, every text, nothing outside, nothing on top of another",
    async (_, doc) => {
      const pdf = await read(doc, paper);
      const { width, height } = sizes[paper];
      for (const page of pdf.pages) {
        expect(page.width).toBeCloseTo(width, 2);
        if (height) expect(page.height).toBeCloseTo(height, 2);
      }
      expectEveryText(doc, pdf);
      expectInside(pdf, paper);
      expectApart(pdf);
    },
  );

  it("adds up, read back from the paper", async () => {
    const sample = samples.many(20);
    const pdf = await read(samples.receiptOf(sample), paper);
    const texts = pdf.pages.flatMap((page) => page.texts);
    const after = (label: string) => {
      const said = texts.find(({ text }) => text === label)!;
      const figure = texts.find(
        ({ text, baseline, left }) =>
          Math.abs(baseline - said.baseline) < 1 && left > said.left && text.startsWith("$"),
      )!;
      return Math.round(Number(figure.text.replace(/[$,]/g, "")) * 100);
    };
    const total = after("Total");
    const received = after("Received in all");
    expect(after("Balance to pay")).toBe(total - received);
    // The rightmost column of the table, above the total.
    const right = Math.max(...texts.map((text) => text.right));
    const totalAt = texts.findIndex(({ text }) => text === "Total");
    const tableAt = texts.findIndex(({ text }) => text === "What it is for");
    const amounts = texts
      .slice(tableAt, totalAt)
      .filter((text) => text.text.startsWith("$") && Math.abs(text.right - right) < 0.5)
      .map(({ text }) => Math.round(Number(text.replace(/[$,]/g, "")) * 100));
    expect(amounts).toHaveLength(20);
    expect(amounts.reduce((sum, cents) => sum + cents, 0)).toBe(total);
  });

  it("gives money right-aligned to the thousandth of a point", async () => {
    const pdf = await read(samples.receiptOf(samples.many(20)), paper);
    const rights = pdf.pages
      .flatMap(({ texts }) => texts)
      .filter(({ text }) => /^\$[\d,]+\.\d\d$/.test(text))
      .map(({ right }) => right);
    const edge = Math.max(...rights);
    expect(rights.filter((right) => Math.abs(right - edge) < 0.01).length).toBeGreaterThanOrEqual(20);
  });
});

describe("pages", () => {
  it("go on with the number, the page and the table's head", async () => {
    const { pages } = await read(samples.receiptOf(samples.many(200)), "a5");
    expect(pages.length).toBeGreaterThan(5);
    pages.forEach((page, i) => {
      const words = wordsOf([page]);
      expect(words).toContain(`Page ${i + 1} of ${pages.length}`);
      expect(words).toContain("7KQ4MX-0012");
      if (i > 0) expect(words).toContain("Receipt 7KQ4MX-0012, continued");
      if (/\b\d+\. (Choir|Puffed|Bishop|Hem|Bodice)/.test(words)) expect(words).toContain("What it is for");
    });
  });
  it("are not counted where there is one", async () => {
    const { pages } = await read(samples.receiptOf(samples.short), "a5");
    expect(pages).toHaveLength(1);
    expect(wordsOf(pages)).not.toContain("Page 1");
  });
  it("never part the last line from the total, nor the balance from what was received", async () => {
    for (let count = 5; count < 40; count++) {
      const { pages } = await read(samples.receiptOf(samples.many(count)), "a5");
      const has = (text: string) =>
        pages.findIndex((page) => page.texts.some((item) => item.text.startsWith(text)));
      expect(has(`${count}. `)).toBe(has("Total"));
      expect(has("Received in all")).toBe(has("Balance to pay"));
    }
  });
  it("are one on a roll, as long as what stands on it", async () => {
    for (const paper of ["roll80", "roll58"] as const) {
      const short = await read(samples.receiptOf(samples.short), paper);
      const long = await read(samples.receiptOf(samples.many(200)), paper);
      expect(short.pages).toHaveLength(1);
      expect(long.pages).toHaveLength(1);
      expect(long.pages[0]!.height).toBeGreaterThan(5 * short.pages[0]!.height);
      const lowest = Math.max(...short.pages[0]!.texts.map(({ baseline }) => baseline));
      expect(short.pages[0]!.height - lowest).toBeLessThan(60);
    }
  });
  it("of a roll are cut in two where PDF allows no longer page", async () => {
    const lines = samples
      .receiptOf(samples.many(200))
      .lines.map((line) => ({ ...line, text: line.text.repeat(12) }));
    const { pages } = await read(samples.receiptOf(samples.many(200), { lines }), "roll58");
    expect(pages.length).toBeGreaterThan(1);
    for (const { height } of pages) expect(height).toBeLessThanOrEqual(14400.01);
  });
});

describe("what a receipt says", () => {
  it("names money given back as that", async () => {
    const doc = samples.receiptOf(samples.short, { title: "Money given back" });
    const words = wordsOf((await read(doc, "a5")).pages);
    expect(words).toContain("Money given back");
    expect(words).toContain("Given back to");
    expect(words).toContain("Amount given back");
    expect(words).not.toContain("Amount received");
  });
  it("leaves out quantities where there is one of each", async () => {
    const doc = samples.receiptOf({
      lines: [{ text: "Hem", quantity: 1, unit: 500 }],
      earlier: [],
      now: 500,
    });
    const words = wordsOf((await read(doc, "a5")).pages);
    expect(words).not.toContain("Quantity");
    expect(words).not.toContain("Paid before");
  });
  it("stands without lines, thanks or cautions", async () => {
    const doc = samples.receiptOf(
      { lines: [], earlier: [], now: 500 },
      { thanks: undefined, cautions: [], buyer: { name: "Ines", lines: ["", " "] } },
    );
    for (const paper of papers) expectInside(await read(doc, paper), paper);
  });
});

describe("pictures of text", () => {
  it.each(papers)("stand inside %s, at the size and weight of their line", async (paper) => {
    const painter = boxPainter();
    const file = await receiptPdf(samples.pictures, paper, printTools({ painter }));
    const pdf = await readPdf(file);
    expectInside(pdf, paper);
    const drawn = painter.painted.map(({ text }) => text.replace(/[\u200e\u200f]/g, ""));
    expect(drawn.join(" ")).toContain("أمل الخياطة");
    expect(drawn).toContain("नंदिनी शर्मा");
    expect(drawn.join("")).toContain("山田さくら様");
    expect(pdf.pages.reduce((sum, { pictures }) => sum + pictures.length, 0)).toBe(drawn.length);
    expect(painter.painted.find(({ text }) => text === "नंदिनी शर्मा")?.bold).toBe(true);
    expect(wordsOf(pdf.pages)).toContain("27");
  });

  it("stand on the baseline of the text beside them", async () => {
    const { pages } = await read(samples.pictures, "a5");
    const [page] = pages;
    const house = page!.texts.find(({ text }) => text.trim() === "27")!;
    // The box painter's baseline is a quarter of its height above its foot: 0.35 of 1.4.
    const beside = page!.pictures.filter(
      ({ top, bottom }) =>
        Math.abs(bottom - (bottom - top) / 4 - house.baseline) < 0.01 &&
        Math.abs(bottom - top - house.size * 1.4) < 0.01,
    );
    expect(beside).toHaveLength(2);
    expect(Math.max(...beside.map(({ left }) => left))).toBeGreaterThanOrEqual(house.right - 0.1);
    expect(Math.min(...beside.map(({ right }) => right))).toBeLessThanOrEqual(house.left + 0.1);
  });

  it("are drawn once for one text, and tell how far they are", async () => {
    const painter = boxPainter();
    const lines = samples
      .receiptOf(samples.many(20))
      .lines.map((line) => ({ ...line, text: "ड्रेस", quantity: "1" }));
    const told: [number, number][] = [];
    const onProgress = (done: number, of: number) => void told.push([done, of]);
    await receiptPdf(
      samples.receiptOf(samples.many(20), { lines }),
      "a5",
      printTools({ painter, onProgress }),
    );
    expect(painter.painted.filter(({ text }) => text === "ड्रेस")).toHaveLength(1);
    const [done, of] = told.at(-1)!;
    expect(done).toBe(of);
    told.slice(1).forEach(([now], i) => expect(now).toBeGreaterThanOrEqual(told[i]![0]));
  });

  it("fail the file, not silently, when the painter fails", async () => {
    const painter = { ...boxPainter(), paint: () => Promise.reject(new Error("no memory")) };
    await expect(receiptPdf(samples.pictures, "a5", printTools({ painter }))).rejects.toThrow("no memory");
  });
});

describe("the file", () => {
  it("says what it is, whose, and in which language", async () => {
    const doc = samples.receiptOf(samples.short, { lang: "en-NG" });
    const { info, lang } = await read(doc, "a5");
    expect(info.Title).toBe("Receipt 7KQ4MX-0012");
    expect(info.Author).toBe("Tamsin Okoro-Vale, Seamstress");
    expect(info.Subject).toBe("Two dresses for Easter");
    expect(lang).toBe("en-NG");
  });
  it("says so in any script", async () => {
    expect((await read(samples.otherAlphabets, "a5")).info.Author).toBe("Швейная комната Ольги Ветровой");
  });
  it("is the same, byte for byte, for the same stamp", async () => {
    const doc = samples.receiptOf(samples.many(20));
    const [one, two] = await Promise.all([0, 1].map(() => receiptPdf(doc, "a5", printTools())));
    expect(Buffer.from(one!).equals(Buffer.from(two!))).toBe(true);
    expect((await readPdf(one!)).fingerprint).toBe("0123456789abcdef0123456789abcdef");
  });
  it("is small enough to send with little data", async () => {
    expect((await receiptPdf(samples.receiptOf(samples.short), "a5", printTools())).byteLength).toBeLessThan(
      40 * 1024,
    );
  });
});
