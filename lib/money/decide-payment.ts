import { type Currency } from "@/lib/money/currencies";
import { formatMoney } from "@/lib/money/format-money";
import { type OrderSums } from "@/lib/money/order-sums";

/** `say` with `ok: true` is a question to ask before it is kept; with `ok: false`, what to type instead. */
export type PaymentDecision = { ok: true; say?: string } | { ok: false; say: string };

/** May this deposit or payment be taken? More than the balance is asked about, never refused. */
export function decideTaking(
  sums: OrderSums,
  amountMinor: number,
  currency: Currency,
  locale?: string,
): PaymentDecision {
  if (!isAmount(amountMinor)) return { ok: false, say: "Type the amount received, more than 0." };
  const owed = Math.max(0, sums.balanceMinor);
  if (amountMinor <= owed) return { ok: true };
  const money = (minor: number) => formatMoney(minor, currency, locale);
  const say =
    owed === 0
      ? `Nothing is owed on this order. Keep ${money(amountMinor)} all the same?`
      : `Only ${money(owed)} is owed: ${money(amountMinor)} is ${money(amountMinor - owed)} more. Keep it all the same?`;
  return { ok: true, say };
}

/** May this be given back? Never more than came in and has not gone back already. */
export function decideGivingBack(
  sums: OrderSums,
  amountMinor: number,
  currency: Currency,
  locale?: string,
): PaymentDecision {
  if (!isAmount(amountMinor)) return { ok: false, say: "Type the amount given back, more than 0." };
  const held = sums.receivedMinor - sums.givenBackMinor;
  if (amountMinor <= held) return { ok: true };
  if (held <= 0)
    return {
      ok: false,
      say: "Nothing has been received on this order, so nothing can be given back. Keep the payment first.",
    };
  return {
    ok: false,
    say: `Only ${formatMoney(held, currency, locale)} can be given back. Type that or less.`,
  };
}

const isAmount = (minor: number): boolean => Number.isSafeInteger(minor) && minor > 0;
