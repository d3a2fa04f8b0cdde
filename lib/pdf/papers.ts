/** The papers a document can be made for. All lengths of this folder are points, 1/72 in, unless they say otherwise. */

export const MM = 72 / 25.4;

export interface Paper {
  readonly name: string;
  readonly width: number;
  /** None on a roll: it is as long as what stands on it. */
  readonly height?: number;
  readonly margin: {
    readonly top: number;
    readonly right: number;
    readonly bottom: number;
    readonly left: number;
  };
}

/** No page of a PDF may be longer (ISO 32000-1, Annex C). A roll longer than this is cut in two. */
export const LONGEST_PAGE = 14400;

const all = (margin: number) => ({ top: margin, right: margin, bottom: margin, left: margin });

// Common printers leave up to 6.7 mm at the edge unprinted: sheets keep 10 mm and more.
const a5: Paper = { name: "A5", width: 148 * MM, height: 210 * MM, margin: all(12 * MM) };
const a4: Paper = { name: "A4", width: 210 * MM, height: 297 * MM, margin: all(18 * MM) };
const letter: Paper = { name: "Letter", width: 612, height: 792, margin: all(18 * MM) };

const roll = (name: string, width: number, printable: number): Paper => {
  const side = ((width - printable) / 2) * MM;
  return { name, width: width * MM, margin: { top: 3 * MM, right: side, bottom: 6 * MM, left: side } };
};

export const receiptPapers = {
  a5,
  a4,
  roll80: roll("80 mm roll", 80, 72),
  roll58: roll("58 mm roll", 58, 48),
} satisfies Record<string, Paper>;
export type ReceiptPaper = keyof typeof receiptPapers;

export const marksPapers = { a4, a5, letter } satisfies Record<string, Paper>;
export type MarksPaper = keyof typeof marksPapers;

/** The width that may be printed on. */
export const inner = (paper: Paper): number => paper.width - paper.margin.left - paper.margin.right;

/** A pattern at full size: sheets, or a roll by its width in millimetres. */
export type FullSizePaper = "a4" | "letter" | "a3" | `roll-${number}`;

/** Common widths of paper for plotters, mm. */
export const rollWidths = [610, 914] as const;

/** What a roll may be wide, mm: room for the head of the first sheet, and no more than a PDF page can be. */
export const ROLL_LIMITS = { least: 210, most: 2000 } as const;

const full = (name: string, width: number, height?: number): Paper => ({
  name,
  width,
  ...(height !== undefined && { height }),
  margin: all(10 * MM),
});

/** Margins of 10 mm on every side. @throws RangeError for a roll outside `ROLL_LIMITS`. */
export function fullSizePaper(paper: FullSizePaper): Paper {
  if (paper === "a4") return full("A4", 210 * MM, 297 * MM);
  if (paper === "letter") return full("Letter", 612, 792);
  if (paper === "a3") return full("A3", 297 * MM, 420 * MM);
  const width = Number(paper.slice("roll-".length));
  if (!(width >= ROLL_LIMITS.least && width <= ROLL_LIMITS.most))
    throw new RangeError(`No roll is ${paper.slice("roll-".length)} mm wide.`);
  return full(`Roll, ${width} mm`, width * MM);
}

/** Whether a text, such as a remembered one, names a paper for full size. */
export function isFullSizePaper(text: string): text is FullSizePaper {
  const width = /^roll-(\d+(?:\.\d+)?)$/.exec(text)?.[1];
  return width === undefined
    ? ["a4", "letter", "a3"].includes(text)
    : Number(width) >= ROLL_LIMITS.least && Number(width) <= ROLL_LIMITS.most;
}
