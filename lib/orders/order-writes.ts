import { edit, make, newId, setRemoved, type Write } from "@/lib/journal/change";
import { type Numbers } from "@/lib/journal/journal";
import { type Currency } from "@/lib/money/currencies";
import { type IsoDate } from "@/lib/people/iso-date";
import {
  type Client,
  type Garment,
  type GarmentFields,
  type Order,
  type PriceLine,
  type PriceLineFields,
  type Workshop,
} from "@/lib/records/types";
import { isBlankGarment, type OrderValues, readAmount } from "./order-form";
import { isBlankLine, readLine } from "./price-lines";
import { moneyWrites } from "./take-money";

/** The rows of an order's garments and lines as typed, with the ids that they are kept under. */
interface Typed {
  garments: { id: string; fields: GarmentFields }[];
  lines: { id: string; fields: PriceLineFields }[];
}

const orNull = (id: string): string | null => (id === "" ? null : id);

/** @throws RangeError where a line or an amount cannot be read: the form's schema has let none of those through. */
function typedRows(
  values: OrderValues,
  currency: Currency,
  kept: { garments: readonly Garment[]; lines: readonly PriceLine[] },
  id: () => string,
): Typed {
  const { orderId } = values;
  const keptIds = new Set([...kept.garments, ...kept.lines].map((row) => row.id));
  const idOf = (rowId: string) => (keptIds.has(rowId) ? rowId : id());
  const filled = values.garments.filter((garment) => !isBlankGarment(garment));
  const garmentIds = new Map(filled.map(({ rowId }) => [rowId, idOf(rowId)]));
  return {
    garments: filled.map((garment, position) => ({
      id: garmentIds.get(garment.rowId)!,
      fields: {
        orderId,
        wearerId: orNull(garment.wearerId),
        kind: garment.kind.trim().replace(/\s+/gu, " "),
        setId: orNull(garment.setId),
        sleeveId: orNull(garment.sleeveId),
        fittingOn: orNull(garment.fittingOn),
        note: garment.note.trim(),
        position,
      },
    })),
    lines: values.lines
      .filter((line) => !isBlankLine(line))
      .map((line, position) => {
        const read = readLine(line, currency);
        if (!read.ok) throw new RangeError(`line ${position}: ${read.problems[0]!.say}`);
        return {
          id: idOf(line.rowId),
          fields: { orderId, garmentId: garmentIds.get(line.garmentId) ?? null, ...read.line, position },
        };
      }),
  };
}

export interface NewOrderAsk {
  values: OrderValues;
  client: Pick<Client, "id" | "name" | "address">;
  workshop: Pick<Workshop, "name" | "address" | "phone">;
  currency: Currency;
  today: IsoDate;
  /** For the deposit's receipt. */
  cautions: readonly string[];
  /** Where the deposit's receipt is going to be. */
  receiptId: string;
  id?: () => string;
}

/**
 * A new order with all that hangs on it, to be kept as one change: garments, price lines, and where a deposit was taken
 * the payment with its receipt. @throws RangeError as above.
 */
export function newOrderWrites(ask: NewOrderAsk, numbers: Numbers): Write[] {
  const { values, client, workshop, currency, today, cautions, receiptId, id = newId } = ask;
  const { orderId } = values;
  const occasion = values.occasion.trim().replace(/\s+/gu, " ");
  const { garments, lines } = typedRows(values, currency, { garments: [], lines: [] }, id);
  const writes: Write[] = [
    make(
      "orders",
      {
        clientId: client.id,
        occasion,
        agreedOn: today,
        dueOn: orNull(values.dueOn),
        stage: "agreed",
        currency: currency.code,
        note: values.note.trim(),
      },
      orderId,
    ),
    ...garments.map((garment) => make("garments", garment.fields, garment.id)),
    ...lines.map((line) => make("priceLines", line.fields, line.id)),
  ];
  if (values.deposit.taken === "later") return writes;
  const amount = readAmount(values.deposit.amount, currency);
  if (!amount.ok) throw new RangeError(`deposit: ${amount.say}`);
  const deposit = moneyWrites(
    {
      orderId,
      workshop,
      client,
      order: { occasion, currency: currency.code },
      lines: lines.map(({ fields }) => fields),
      earlier: [],
      cautions,
      payment: {
        id: id(),
        kind: "deposit",
        method: values.deposit.method,
        amountMinor: amount.minor,
        paidOn: today,
        note: "",
      },
      receiptId,
    },
    numbers,
  );
  return [...writes, ...deposit];
}

export interface KeptOrder {
  order: Order;
  garments: readonly Garment[];
  lines: readonly PriceLine[];
}

/** What has to be kept to turn an order into what was typed; empty where nothing differs. @throws RangeError as above. */
export function changeOrderWrites(
  kept: KeptOrder,
  values: OrderValues,
  currency: Currency,
  now: string,
  id: () => string = newId,
): Write[] {
  const typed = typedRows(values, currency, kept, id);
  const writes = [
    edit("orders", kept.order, {
      occasion: values.occasion.trim().replace(/\s+/gu, " "),
      dueOn: orNull(values.dueOn),
      note: values.note.trim(),
    }),
    ...typed.garments.map((garment) => {
      const seen = kept.garments.find((row) => row.id === garment.id);
      return seen ? edit("garments", seen, garment.fields) : make("garments", garment.fields, garment.id);
    }),
    ...typed.lines.map((line) => {
      const seen = kept.lines.find((row) => row.id === line.id);
      return seen ? edit("priceLines", seen, line.fields) : make("priceLines", line.fields, line.id);
    }),
    ...kept.garments
      .filter((row) => !typed.garments.some((garment) => garment.id === row.id))
      .map((row) => setRemoved("garments", row, now)),
    ...kept.lines
      .filter((row) => !typed.lines.some((line) => line.id === row.id))
      .map((row) => setRemoved("priceLines", row, now)),
  ];
  return writes.filter((write) => write.makes || Object.keys(write.fields).length > 0);
}
