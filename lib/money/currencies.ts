import { data } from "currency-codes";

export interface Currency {
  /** ISO 4217 code. */
  code: string;
  /** Decimals of the minor unit (ISO 4217): 0 for JPY, 2 for most, 3 for BHD. */
  digits: number;
  name: string;
}

/** ISO 4217 also numbers metals, baskets, test codes and funds, in which nobody pays for a dress. */
const notTaken = /^(?:X(?!AF|CD|CG|OF|PF)..|BOV|CHE|CHW|CLF|COU|MXV|USN|UYI|UYW)$/u;

const byCode: ReadonlyMap<string, Currency> = new Map(
  data
    .filter(({ code }) => !notTaken.test(code))
    .map(({ code, digits, currency: name }) => [code, { code, digits, name: name.trim() }]),
);

/** The currency of an ISO 4217 code in either case; undefined where there is none that people pay in. */
export function currency(code: string): Currency | undefined {
  return byCode.get(code.trim().toUpperCase());
}

/** Every currency that people pay in, by name. */
export function currencies(): Currency[] {
  return [...byCode.values()].sort(
    (a, b) => a.name.localeCompare(b.name, "en") || (a.code < b.code ? -1 : 1),
  );
}
