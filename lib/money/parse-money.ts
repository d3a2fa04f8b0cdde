import { westernDigits } from "@/lib/lengths/western-digits";
import { type Currency } from "@/lib/money/currencies";

export type ParsedMoney = { ok: true; minor: number } | { ok: false; say: string };

/** The ways in which a currency's sign is written, folded to lower case without dots. */
function signsOf(code: string): ReadonlySet<string> {
  const signs = new Set<string>();
  // Most codes begin with their country, where the sign is written as people there write it: "KSh", "R", "kr".
  for (const locale of ["en", `en-${code.slice(0, 2)}`]) {
    for (const currencyDisplay of ["code", "symbol", "narrowSymbol"] as const) {
      const parts = new Intl.NumberFormat(locale, {
        style: "currency",
        currency: code,
        currencyDisplay,
      }).formatToParts(0);
      for (const { type, value } of parts) if (type === "currency") signs.add(foldSign(value));
    }
  }
  return signs;
}

const foldSign = (sign: string): string => sign.normalize("NFKC").replace(/[.\s]/gu, "").toLowerCase();

const groupsOfThree = /^\d{1,3}(?:[., ']\d{3})*$/u;
/** 12,50,000: two figures to a group but the last, as lakh and crore are written. */
const groupsOfTwo = /^\d{1,2}(?:[., ']\d{2})*[., ']\d{3}$/u;

/**
 * Splits a number into its whole and decimal figures, or undefined where the separators make no sense.
 * Of `.` and `,` the later one that stands alone marks the decimals. A single one before exactly three figures marks
 * thousands ("1,250" and "1.250" are 1250), unless the currency itself has three decimals or a 0 leads.
 */
function splitNumber(text: string, digits: number): { whole: string; decimals: string } | undefined {
  const separators = text.match(/[.,]/gu) ?? [];
  const last = separators.at(-1);
  let wholeText = text;
  let decimals = "";
  if (last !== undefined && separators.filter((s) => s === last).length === 1) {
    const at = text.lastIndexOf(last);
    const before = text.slice(0, at);
    const after = text.slice(at + 1);
    const couldBeThousands =
      separators.length === 1 && after.length === 3 && /^[1-9]\d{0,2}(?:[ ']\d{3})*$/u.test(before);
    if (!couldBeThousands || digits === 3) {
      if (!/^\d*$/u.test(after) || (before === "" && after === "")) return undefined;
      wholeText = before === "" ? "0" : before;
      decimals = after;
    }
  }
  const groupMarks = new Set(wholeText.match(/[., ']/gu) ?? []);
  const grouped = groupMarks.size <= 1 && (groupsOfThree.test(wholeText) || groupsOfTwo.test(wholeText));
  if (!/^\d+$/u.test(wholeText) && !grouped) return undefined;
  return { whole: wholeText.replace(/\D/gu, ""), decimals };
}

/**
 * Reads an amount as it is written by hand: `1250`, `1,250.50`, `1.250,50`, `1 250`, `1'250.50`, `1,25,000`, with the currency's
 * sign or code before or after, or a closing `/=`. See `splitNumber` for "1,250". Never throws.
 * @returns a whole number of minor units, 0 or more; or a sentence that says what to type.
 */
export function parseMoney(text: string, currency: Currency): ParsedMoney {
  const { code, digits } = currency;
  const example = digits === 0 ? "1250" : `1250.${"5".padEnd(digits, "0")}`;
  const refuse = (say: string): ParsedMoney => ({ ok: false, say });
  const plain = westernDigits(text.replace(/\p{Cf}/gu, ""))
    .replace(/٬/gu, ",")
    .replace(/٫/gu, ".")
    .replace(/[’ʼ′]/gu, "'")
    .replace(/[−–—]/gu, "-")
    .replace(/\s+/gu, " ")
    .trim()
    .replace(/ ?\/[-=]?$|(?<=\d)[.,][-=]$/u, "");
  if (plain === "") return refuse(`Type an amount, such as ${example}.`);

  const taken = /^([^\d.,]*\p{L}\.?|[^\d.,]*)\s*([\d.,][\d., ']*?)\s*([^\d., '][^\d]*)?$/u.exec(plain);
  if (!taken) return refuse(`That cannot be read as an amount. Type figures only, such as ${example}.`);
  const [, before = "", number = "", after = ""] = taken;
  if (/-/u.test(before + after))
    return refuse(`An amount is never below 0. Type it without the minus, such as ${example}.`);
  const signs = [before, after].map(foldSign).filter((sign) => sign !== "");
  if (signs.length > 0) {
    const known = signsOf(code);
    const strange = signs.find((sign) => !known.has(sign));
    if (strange !== undefined)
      return refuse(`Amounts here are in ${code}. Type figures only, such as ${example}.`);
  }

  const split = splitNumber(number, digits);
  if (!split)
    return refuse(`That cannot be read as an amount. Type it without spaces or commas, such as ${example}.`);
  if (split.decimals.length > digits && /[1-9]/u.test(split.decimals.slice(digits))) {
    return refuse(
      digits === 0
        ? `${code} has no smaller coins. Type a whole number, such as ${example}.`
        : `${code} has ${digits} figures after the point. Type it with no more, such as ${example}.`,
    );
  }
  const minor = BigInt(split.whole + split.decimals.slice(0, digits).padEnd(digits, "0"));
  if (minor > BigInt(Number.MAX_SAFE_INTEGER))
    return refuse(`That is too large. Type an amount such as ${example}.`);
  return { ok: true, minor: Number(minor) };
}
