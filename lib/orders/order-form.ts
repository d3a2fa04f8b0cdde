import { z } from "zod";
import { type Currency } from "@/lib/money/currencies";
import { moneyFigure } from "@/lib/money/format-money";
import { parseMoney } from "@/lib/money/parse-money";
import { type Garment, type Order, type PaymentMethod, type PriceLine } from "@/lib/records/types";
import { AMOUNT_AT_MOST, isBlankLine, type LineValues, readLine } from "./price-lines";

/** A garment as it is typed; an empty id means none. */
export interface GarmentValues {
  /** Id of the kept garment, or a name of its own in the form. */
  rowId: string;
  kind: string;
  wearerId: string;
  setId: string;
  sleeveId: string;
  fittingOn: string;
  note: string;
}

/** What the form holds of an order, as typed. Days are "" or ISO dates. */
export interface OrderValues {
  /** The id that the order has, or is going to have: what is in the book already is not kept twice. */
  orderId: string;
  occasion: string;
  dueOn: string;
  note: string;
  garments: GarmentValues[];
  lines: LineValues[];
  /** A deposit taken while the order is agreed. */
  deposit: { taken: "now" | "later"; amount: string; method: PaymentMethod };
}

const GARMENTS_AT_MOST = 100;
const LINES_AT_MOST = 100;
const TEXT_AT_MOST = 200;

/** `rowId` is the name of its own that it has in the form. */
export function emptyGarment(rowId: string): GarmentValues {
  return { rowId, kind: "", wearerId: "", setId: "", sleeveId: "", fittingOn: "", note: "" };
}

export function emptyLine(rowId: string): LineValues {
  return { rowId, garmentId: "", text: "", quantity: "1", price: "" };
}

/** A new order: one garment to fill in, no price as yet. */
export function emptyOrder(orderId: string): OrderValues {
  return {
    orderId,
    occasion: "",
    dueOn: "",
    note: "",
    garments: [emptyGarment("garment-1")],
    lines: [],
    deposit: { taken: "later", amount: "", method: "cash" },
  };
}

export const isBlankGarment = ({ kind, wearerId, fittingOn, note }: GarmentValues): boolean =>
  kind.trim() === "" && wearerId === "" && fittingOn === "" && note.trim() === "";

const tooLong = `Shorten this to ${TEXT_AT_MOST} letters; the rest can stand in the note.`;

const shape = z.object({
  orderId: z.string(),
  occasion: z.string(),
  dueOn: z.string(),
  note: z.string(),
  garments: z.array(
    z.object({
      rowId: z.string(),
      kind: z.string(),
      wearerId: z.string(),
      setId: z.string(),
      sleeveId: z.string(),
      fittingOn: z.string(),
      note: z.string(),
    }),
  ),
  lines: z.array(
    z.object({
      rowId: z.string(),
      garmentId: z.string(),
      text: z.string(),
      quantity: z.string(),
      price: z.string(),
    }),
  ),
  deposit: z.object({
    taken: z.enum(["now", "later"]),
    amount: z.string(),
    method: z.enum(["cash", "transfer", "card"]),
  }),
});

/** A form as it comes back off the phone, perhaps put down by an older Notchbook; null where it cannot be read. */
export function readOrderDraft(value: unknown): OrderValues | null {
  const read = shape.safeParse(value);
  return read.success ? (read.data satisfies OrderValues) : null;
}

const isDayOrNone = (typed: string): boolean => typed === "" || z.iso.date().safeParse(typed).success;

/** The form's rules; each problem is a sentence that says what to type instead. Money is read in `currency`. */
export function orderSchema(currency: Currency) {
  return shape.superRefine(({ occasion, dueOn, garments, lines, deposit }, context) => {
    const problem = (path: (string | number)[], message: string) =>
      context.addIssue({ code: "custom", path, message });
    const notLong = (typed: string, path: (string | number)[]) => {
      if (typed.trim().length > TEXT_AT_MOST) problem(path, tooLong);
    };
    const dayOrNone = (typed: string, path: (string | number)[]) => {
      if (!isDayOrNone(typed)) problem(path, "Choose a day of the calendar, or leave it empty.");
    };
    notLong(occasion, ["occasion"]);
    dayOrNone(dueOn, ["dueOn"]);
    const noneFilled = garments.every(isBlankGarment);
    garments.forEach((garment, i) => {
      notLong(garment.kind, ["garments", i, "kind"]);
      dayOrNone(garment.fittingOn, ["garments", i, "fittingOn"]);
      if (garment.kind.trim() === "" && (!isBlankGarment(garment) || (i === 0 && noneFilled)))
        problem(["garments", i, "kind"], "Type what is to be sewn, such as Dress or Blouse.");
      if (i === GARMENTS_AT_MOST)
        problem(
          ["garments", i, "kind"],
          `Leave this one out: ${GARMENTS_AT_MOST} garments are the most of one order.`,
        );
    });
    lines.forEach((line, i) => {
      if (isBlankLine(line)) return;
      notLong(line.text, ["lines", i, "text"]);
      const read = readLine(line, currency);
      if (!read.ok) for (const { field, say } of read.problems) problem(["lines", i, field], say);
      if (i === LINES_AT_MOST)
        problem(
          ["lines", i, "text"],
          `Leave this one out: ${LINES_AT_MOST} prices are the most of one order.`,
        );
    });
    if (deposit.taken === "now") {
      const read = readAmount(deposit.amount, currency);
      if (!read.ok) problem(["deposit", "amount"], read.say);
    }
  });
}

/** An amount of money that changes hands: above 0. */
export function readAmount(
  typed: string,
  currency: Currency,
): { ok: true; minor: number } | { ok: false; say: string } {
  const read = parseMoney(typed, currency);
  if (!read.ok) return read;
  if (read.minor === 0) return { ok: false, say: "Type the amount, more than 0." };
  if (read.minor > AMOUNT_AT_MOST)
    return { ok: false, say: "That is too large. Look at the number, and type a smaller one." };
  return read;
}

/** A kept order as the form shows it. */
export function orderValues(
  order: Order,
  garments: readonly Garment[],
  lines: readonly PriceLine[],
  currency: Currency,
): OrderValues {
  return {
    orderId: order.id,
    occasion: order.occasion,
    dueOn: order.dueOn ?? "",
    note: order.note,
    garments: garments.map(({ id, kind, wearerId, setId, sleeveId, fittingOn, note }) => ({
      rowId: id,
      kind,
      wearerId: wearerId ?? "",
      setId: setId ?? "",
      sleeveId: sleeveId ?? "",
      fittingOn: fittingOn ?? "",
      note,
    })),
    lines: lines.map((line) => ({
      rowId: line.id,
      garmentId: line.garmentId ?? "",
      text: line.text,
      quantity: String(line.quantity),
      price: moneyFigure(line.unitMinor, currency),
    })),
    deposit: { taken: "later", amount: "", method: "cash" },
  };
}

/** A name for a new garment or line that none of the others in the form has. */
export function freshName(kind: "garment" | "line", rows: readonly { rowId: string }[]): string {
  const taken = new Set(rows.map(({ rowId }) => rowId));
  let n = rows.length + 1;
  while (taken.has(`${kind}-${n}`)) n++;
  return `${kind}-${n}`;
}
