import { type PaymentKind } from "@/lib/records/types";

/** What is agreed: so many at so much each, in minor units. */
export interface PricedLine {
  quantity: number;
  unitMinor: number;
}

/** Money that changed hands; a giving-back is a positive amount too. */
export interface MoneyMoved {
  kind: PaymentKind;
  amountMinor: number;
}

/** All in integer minor units. */
export interface OrderSums {
  totalMinor: number;
  /** Deposits and payments. */
  receivedMinor: number;
  givenBackMinor: number;
  /** total − received + given back; below 0 where more came in than was agreed. */
  balanceMinor: number;
  /** The part of what was received that came as a deposit. */
  depositMinor: number;
}

function whole(value: number, least: number, what: string): number {
  if (!Number.isSafeInteger(value) || value < least)
    throw new RangeError(`${what} must be a whole number from ${least}: ${value}`);
  return value;
}

const sum = (amounts: number[]): number => amounts.reduce((all, amount) => whole(all + amount, 0, "sum"), 0);

/**
 * What an order comes to, what has come in and gone back, and what is owed. Neither order of the lists matters.
 * @throws RangeError where a figure is not a whole number, a quantity is below 1, a unit price below 0, an amount not
 * above 0, or a sum leaves the safe integers.
 */
export function orderSums(lines: readonly PricedLine[], payments: readonly MoneyMoved[]): OrderSums {
  const of = (...kinds: PaymentKind[]) =>
    sum(payments.filter((p) => kinds.includes(p.kind)).map((p) => whole(p.amountMinor, 1, "amountMinor")));
  const totalMinor = sum(
    lines.map(({ quantity, unitMinor }) =>
      whole(whole(quantity, 1, "quantity") * whole(unitMinor, 0, "unitMinor"), 0, "line"),
    ),
  );
  const receivedMinor = of("deposit", "payment");
  const givenBackMinor = of("giving-back");
  return {
    totalMinor,
    receivedMinor,
    givenBackMinor,
    balanceMinor: totalMinor - receivedMinor + givenBackMinor,
    depositMinor: of("deposit"),
  };
}

/**
 * Half of the total, rounded up to a round amount: to the largest power of ten, in minor units, within a hundredth of the
 * total, and never above the total. Source: deposit 50 %, practice; the rounding is common practice, no source.
 */
export function suggestedDeposit(totalMinor: number): number {
  whole(totalMinor, 0, "totalMinor");
  let step = 1;
  while (step * 1000 <= totalMinor) step *= 10;
  const half = Math.ceil(totalMinor / 2);
  return Math.min(totalMinor, Math.ceil(half / step) * step);
}
