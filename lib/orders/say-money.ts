import { currency } from "@/lib/money/currencies";
import { formatMoney } from "@/lib/money/format-money";

/** An amount for a sentence. A code that nobody pays in is shown with its bare figure. */
export function sayMoney(minor: number, code: string, locale?: string): string {
  const known = currency(code);
  return known ? formatMoney(minor, known, locale) : `${minor} ${code}`;
}
