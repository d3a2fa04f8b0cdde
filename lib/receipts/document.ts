import { sayMoney } from "@/lib/orders/say-money";
import { type ReceiptDocument } from "@/lib/pdf/receipt-document";
import { type PaymentKind, type PaymentMethod, type ReceiptFields, type Unit } from "@/lib/records/types";

const kinds: Record<PaymentKind, string> = {
  deposit: "Deposit",
  payment: "Payment",
  "giving-back": "Given back",
};

const methods: Record<PaymentMethod, string> = { cash: "Cash", transfer: "Bank transfer", card: "Card" };

export const kindWords = (kind: PaymentKind): string => kinds[kind];
export const methodWords = (method: PaymentMethod): string => methods[method];

export interface BalanceSaid {
  label: string;
  /** Never below 0: the label says which way it goes. */
  minor: number;
}

/** A balance in words: what is still to pay, what is to be given back, or that nothing is. */
export function balanceSaid(balanceMinor: number): BalanceSaid {
  if (balanceMinor > 0) return { label: "Balance to pay", minor: balanceMinor };
  if (balanceMinor < 0) return { label: "To be given back", minor: -balanceMinor };
  return { label: "Paid in full, balance", minor: 0 };
}

/** What a payment is called on its own receipt; the title of one for money given back says it already. */
function paymentLabel(kind: PaymentKind, balanceMinor: number): string {
  if (kind === "giving-back") return "";
  if (kind === "payment" && balanceMinor === 0) return "Balance";
  return kind === "payment" && balanceMinor > 0 ? "Part payment" : kindWords(kind);
}

export interface DocumentStyle {
  /** BCP 47, for money and days. */
  lang: string;
  /** The workshop's unit, for the tape at the head. */
  unit?: Unit;
}

/** A kept receipt as it is printed: everything in words of `lang`'s money and days. Says the same for ever. */
export function receiptDocument(
  { number, issuedOn, snapshot }: Pick<ReceiptFields, "number" | "issuedOn" | "snapshot">,
  { lang, unit }: DocumentStyle,
): ReceiptDocument {
  const money = (minor: number) => sayMoney(minor, snapshot.currency, lang);
  const { payment } = snapshot;
  const givenBack = payment.kind === "giving-back";
  const balance = balanceSaid(snapshot.balanceMinor);
  return {
    number,
    issuedOn,
    title: givenBack ? "Money given back" : "Receipt",
    seller: snapshot.seller,
    buyer: { ...snapshot.buyer, name: snapshot.buyer.name || "The client" },
    orderTitle: snapshot.occasion || "Sewing to order",
    lines: snapshot.lines.map(({ text, quantity, unitMinor, amountMinor }) => ({
      text,
      quantity: String(quantity),
      unitText: money(unitMinor),
      amountText: money(amountMinor),
    })),
    totalText: money(snapshot.totalMinor),
    payment: {
      label: paymentLabel(payment.kind, snapshot.balanceMinor),
      methodLabel: methodWords(payment.method),
      amountText: money(payment.amountMinor),
    },
    earlier: snapshot.earlier.map(({ number: earlierNumber, paidOn, kind, amountMinor }) => ({
      date: paidOn,
      number: earlierNumber,
      label: kindWords(kind),
      amountText: money(kind === "giving-back" ? -amountMinor : amountMinor),
    })),
    receivedText: money(snapshot.receivedMinor),
    balanceLabel: balance.label,
    balanceText: money(balance.minor),
    ...(!givenBack && { thanks: "Thank you." }),
    cautions: snapshot.cautions,
    lang,
    tape: unit === "in" ? "inch" : "cm",
  };
}
