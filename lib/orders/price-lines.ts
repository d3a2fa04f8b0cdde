import { westernDigits } from "@/lib/lengths/western-digits";
import { type Currency } from "@/lib/money/currencies";
import { parseMoney } from "@/lib/money/parse-money";

/** A price line as it is typed. */
export interface LineValues {
  /** Id of the kept line, or a name of its own in the form. */
  rowId: string;
  /** `rowId` of the garment that it is for, or "". */
  garmentId: string;
  text: string;
  quantity: string;
  price: string;
}

export interface ReadLine {
  text: string;
  quantity: number;
  unitMinor: number;
}

export interface LineProblem {
  field: "text" | "quantity" | "price";
  say: string;
}

export type LineReading = { ok: true; line: ReadLine } | { ok: false; problems: LineProblem[] };

/** A hundred lines of this still add up exactly; in any currency it is more than a home workshop takes. */
export const AMOUNT_AT_MOST = 10_000_000_000_000;
const QUANTITY_AT_MOST = 9999;

/** True where nothing is typed: such a line is passed over. */
export const isBlankLine = ({ text, price }: Pick<LineValues, "text" | "price">): boolean =>
  text.trim() === "" && price.trim() === "";

/** A whole number from 1, in any script's digits; null where it is none. */
function readQuantity(typed: string): number | null {
  const plain = westernDigits(typed).trim();
  if (!/^\d{1,9}$/u.test(plain)) return null;
  const quantity = Number(plain);
  return quantity >= 1 && quantity <= QUANTITY_AT_MOST ? quantity : null;
}

/** Reads one line; every problem says what to type instead. */
export function readLine(values: LineValues, currency: Currency): LineReading {
  const problems: LineProblem[] = [];
  const text = values.text.trim().replace(/\s+/gu, " ");
  if (text === "") problems.push({ field: "text", say: "Type what the price is for, such as Dress." });
  const quantity = readQuantity(values.quantity);
  if (quantity === null)
    problems.push({ field: "quantity", say: `Type how many, a whole number from 1 to ${QUANTITY_AT_MOST}.` });
  const price = parseMoney(values.price, currency);
  if (values.price.trim() === "")
    problems.push({ field: "price", say: "Type the price of one, or 0 where it is free." });
  else if (/^\s*[-−–—]/u.test(values.price))
    problems.push({
      field: "price",
      say: "A price is never below 0. To take something off, type a lower price for what it is taken off.",
    });
  else if (!price.ok) problems.push({ field: "price", say: price.say });
  else if (price.minor * (quantity ?? 1) > AMOUNT_AT_MOST)
    problems.push({ field: "price", say: "That is too large. Look at the number, and type a smaller one." });
  if (problems.length > 0 || quantity === null || !price.ok) return { ok: false, problems };
  return { ok: true, line: { text, quantity, unitMinor: price.minor } };
}

export interface LiveTotal {
  /** Of the lines that can be read. */
  totalMinor: number;
  /** False where a line that is not blank cannot be read as yet. */
  whole: boolean;
}

/** What the typed lines come to, while they are being typed. A line counts as soon as its number and price can be read. */
export function liveTotal(lines: readonly LineValues[], currency: Currency): LiveTotal {
  let totalMinor = 0;
  let whole = true;
  for (const values of lines) {
    if (isBlankLine(values)) continue;
    const read = readLine({ ...values, text: values.text || "-" }, currency);
    if (read.ok) totalMinor += read.line.quantity * read.line.unitMinor;
    else whole = false;
  }
  return { totalMinor, whole };
}
