import { type Currency } from "@/lib/money/currencies";

/** Minor units as the decimal text of the major unit, exactly: 125050 of two digits is "1250.50". */
function majorText(minor: number, digits: number): `${number}` {
  if (!Number.isSafeInteger(minor)) throw new RangeError(`not a whole number of minor units: ${minor}`);
  const figures = String(Math.abs(minor)).padStart(digits + 1, "0");
  const at = figures.length - digits;
  const text = digits === 0 ? figures : `${figures.slice(0, at)}.${figures.slice(at)}`;
  return `${minor < 0 ? "-" : ""}${text}` as `${number}`;
}

/**
 * Money as a reader of `locale` (default: the browser's) writes it, always with the currency's own decimals.
 * @throws RangeError where `minor` is not a safe integer.
 */
export function formatMoney(minor: number, currency: Currency, locale?: string): string {
  return new Intl.NumberFormat(locale, {
    style: "currency",
    currency: currency.code,
    currencyDisplay: "narrowSymbol",
    minimumFractionDigits: currency.digits,
    maximumFractionDigits: currency.digits,
  }).format(majorText(minor, currency.digits));
}

/** As it would be typed back into a field: "1250.50", without sign or grouping. */
export function moneyFigure(minor: number, currency: Currency): string {
  return majorText(minor, currency.digits);
}
