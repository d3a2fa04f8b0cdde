import { z } from "zod";
import { make, type Write } from "@/lib/journal/change";
import { type Numbers } from "@/lib/journal/journal";
import { type Currency } from "@/lib/money/currencies";
import { decideGivingBack, decideTaking, type PaymentDecision } from "@/lib/money/decide-payment";
import { moneyFigure } from "@/lib/money/format-money";
import { type OrderSums } from "@/lib/money/order-sums";
import { type IsoDate } from "@/lib/people/iso-date";
import { receiptSnapshot, type SnapshotAsk } from "@/lib/receipts/snapshot";
import { type PaymentKind, type PaymentMethod } from "@/lib/records/types";
import { readAmount } from "./order-form";

/** What the sheet for money holds, as typed. */
export interface MoneyValues {
  /** The id that the payment is going to have: what is in the book already is not kept twice. */
  paymentId: string;
  kind: PaymentKind;
  amount: string;
  method: PaymentMethod;
  paidOn: string;
  note: string;
}

/** What the sheet begins with: the balance to come in, or what is to go back. */
export function emptyMoney(ask: {
  paymentId: string;
  sums: OrderSums;
  today: IsoDate;
  currency: Currency;
  /** Where something else than the likeliest is wanted. */
  kind?: PaymentKind;
}): MoneyValues {
  const { sums, currency } = ask;
  const kind: PaymentKind = ask.kind ?? (sums.balanceMinor < 0 ? "giving-back" : "payment");
  const minor = kind === "giving-back" ? Math.max(0, -sums.balanceMinor) : Math.max(0, sums.balanceMinor);
  return {
    paymentId: ask.paymentId,
    kind,
    amount: minor > 0 ? moneyFigure(minor, currency) : "",
    method: "cash",
    paidOn: ask.today,
    note: "",
  };
}

/** May this be kept? As `decideTaking` and `decideGivingBack` say. */
export function decideMoney(
  kind: PaymentKind,
  sums: OrderSums,
  amountMinor: number,
  currency: Currency,
  locale?: string,
): PaymentDecision {
  return kind === "giving-back"
    ? decideGivingBack(sums, amountMinor, currency, locale)
    : decideTaking(sums, amountMinor, currency, locale);
}

const shape = z.object({
  paymentId: z.string(),
  kind: z.enum(["deposit", "payment", "giving-back"]),
  amount: z.string(),
  method: z.enum(["cash", "transfer", "card"]),
  paidOn: z.string(),
  note: z.string(),
});

/** A sheet as it comes back off the phone; null where it cannot be read. */
export function readMoneyDraft(value: unknown): MoneyValues | null {
  const read = shape.safeParse(value);
  return read.success ? (read.data satisfies MoneyValues) : null;
}

export interface MoneyRules {
  sums: OrderSums;
  currency: Currency;
  today: IsoDate;
  locale?: string;
}

/** The sheet's rules; each problem is a sentence that says what to type instead. */
export function moneySchema({ sums, currency, today, locale }: MoneyRules) {
  return shape.superRefine(({ kind, amount, paidOn }, context) => {
    const problem = (field: keyof MoneyValues, message: string) =>
      context.addIssue({ code: "custom", path: [field], message });
    const read = readAmount(amount, currency);
    const decision = read.ok ? decideMoney(kind, sums, read.minor, currency, locale) : read;
    if (!decision.ok) problem("amount", decision.say);
    if (!z.iso.date().safeParse(paidOn).success)
      problem("paidOn", "Choose the day on which the money changed hands.");
    else if (paidOn > today) problem("paidOn", "That day is still to come. Choose today or an earlier one.");
  });
}

export interface MoneyAsk extends Omit<SnapshotAsk, "payment"> {
  orderId: string;
  payment: {
    id: string;
    kind: PaymentKind;
    method: PaymentMethod;
    amountMinor: number;
    paidOn: IsoDate;
    note: string;
  };
  receiptId: string;
}

/** The payment and its receipt, to be kept in one change. The receipt carries the day on which the money moved. */
export function moneyWrites(ask: MoneyAsk, numbers: Numbers): Write[] {
  const { orderId, payment, receiptId } = ask;
  const { id, ...fields } = payment;
  return [
    make("payments", { orderId, ...fields }, id),
    make(
      "receipts",
      {
        paymentId: id,
        orderId,
        number: numbers.receipt(),
        issuedOn: payment.paidOn,
        snapshot: receiptSnapshot(ask),
      },
      receiptId,
    ),
  ];
}
