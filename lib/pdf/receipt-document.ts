/** What a receipt says. Money, quantities and labels come as text, already formatted for the reader. */
import { type TapeUnit } from "@/lib/pdf/signs";

export interface Party {
  readonly name: string;
  /** Address, phone: one line each. */
  readonly lines: readonly string[];
}

export interface ReceiptLine {
  readonly text: string;
  readonly quantity: string;
  /** Price of one. */
  readonly unitText: string;
  readonly amountText: string;
}

export interface EarlierPayment {
  /** ISO date. */
  readonly date: string;
  /** Of its receipt. */
  readonly number: string;
  readonly label: string;
  readonly amountText: string;
}

export interface ReceiptDocument {
  readonly number: string;
  /** ISO date, as `2025-12-01`. */
  readonly issuedOn: string;
  readonly title: "Receipt" | "Money given back";
  readonly seller: Party;
  readonly buyer: Party;
  /** What it is for. */
  readonly orderTitle: string;
  readonly lines: readonly ReceiptLine[];
  readonly totalText: string;
  readonly payment: {
    /** "Deposit", "Balance". */
    readonly label: string;
    /** "Cash", "Bank transfer". */
    readonly methodLabel: string;
    readonly amountText: string;
  };
  readonly earlier: readonly EarlierPayment[];
  /** In all, this payment with it. */
  readonly receivedText: string;
  readonly balanceLabel: string;
  readonly balanceText: string;
  readonly thanks?: string;
  /** What to take care of, a sentence each. */
  readonly cautions: readonly string[];
  /** BCP 47: the language of the dates and of the file. */
  readonly lang: string;
  /** The unit of the ticks on the head's tape. Default "cm". */
  readonly tape?: TapeUnit;
}
