import { orderSums } from "@/lib/money/order-sums";
import {
  type Client,
  type Order,
  type Payment,
  type PriceLine,
  type Receipt,
  type ReceiptSnapshot,
  type Workshop,
} from "@/lib/records/types";

export interface SnapshotAsk {
  workshop: Pick<Workshop, "name" | "address" | "phone">;
  /** Null where the client is not in the book any more. */
  client: Pick<Client, "name" | "address"> | null;
  order: Pick<Order, "occasion" | "currency">;
  lines: readonly Pick<PriceLine, "text" | "quantity" | "unitMinor">[];
  /** What moved before this payment, the first first; each with its receipt's number. */
  earlier: ReceiptSnapshot["earlier"];
  payment: ReceiptSnapshot["payment"];
  cautions: readonly string[];
}

const linesOf = (text: string): string[] =>
  text
    .split(/\r?\n/u)
    .map((line) => line.trim())
    .filter((line) => line !== "");

/**
 * All that a receipt is going to say, for ever. Money in minor units of the order's currency: `totalMinor` is the sum of
 * the lines, `receivedMinor` what is held after this payment (received less given back), `balanceMinor` the difference,
 * below 0 where money is to be given back.
 * @throws RangeError as `orderSums` does.
 */
export function receiptSnapshot(ask: SnapshotAsk): ReceiptSnapshot {
  const { workshop, client, order, payment } = ask;
  const sums = orderSums(ask.lines, [...ask.earlier, payment]);
  return {
    seller: { name: workshop.name, lines: [...linesOf(workshop.address), ...linesOf(workshop.phone)] },
    buyer: { name: client?.name ?? "", lines: linesOf(client?.address ?? "") },
    occasion: order.occasion,
    currency: order.currency,
    lines: ask.lines.map(({ text, quantity, unitMinor }) => ({
      text,
      quantity,
      unitMinor,
      amountMinor: quantity * unitMinor,
    })),
    earlier: ask.earlier.map(({ number, paidOn, kind, amountMinor }) => ({
      number,
      paidOn,
      kind,
      amountMinor,
    })),
    payment: { kind: payment.kind, method: payment.method, amountMinor: payment.amountMinor },
    totalMinor: sums.totalMinor,
    receivedMinor: sums.receivedMinor - sums.givenBackMinor,
    balanceMinor: sums.balanceMinor,
    cautions: [...ask.cautions],
  };
}

/** Payments with their receipts' numbers, in the order given; "" where a receipt has not come to this phone as yet. */
export function earlierPayments(
  payments: readonly Payment[],
  receipts: readonly Pick<Receipt, "paymentId" | "number">[],
): ReceiptSnapshot["earlier"] {
  const numbers = new Map(receipts.map(({ paymentId, number }) => [paymentId, number]));
  return payments.map(({ id, paidOn, kind, amountMinor }) => ({
    number: numbers.get(id) ?? "",
    paidOn,
    kind,
    amountMinor,
  }));
}
