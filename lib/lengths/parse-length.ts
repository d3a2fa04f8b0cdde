import { type Unit } from "@/lib/records/types";
import { formatPlain } from "@/lib/lengths/format-length";
import { longestMm, mmPerInch } from "@/lib/lengths/units";
import { westernDigits } from "@/lib/lengths/western-digits";

export type ParsedLength = { ok: true; mm: number; typed: string } | { ok: false; say: string };

export interface LengthLimits {
  /** Shortest length taken, in mm. Default 0. */
  leastMm?: number;
  /** Longest length taken, in mm. Default 5 m. */
  mostMm?: number;
}

const mmByWord: ReadonlyMap<string, number> = new Map(
  (
    [
      [mmPerInch, ['"', "''", "in", "ins", "inch", "inches"]],
      [10, ["cm", "cms", "centimetre", "centimetres", "centimeter", "centimeters"]],
      [1, ["mm", "mms", "millimetre", "millimetres", "millimeter", "millimeters"]],
      [1000, ["m", "metre", "metres", "meter", "meters"]],
      [36 * mmPerInch, ["yd", "yds", "yard", "yards"]],
    ] as const
  ).flatMap(([mm, words]) => words.map((word) => [word, mm] as const)),
);

/** Fractions of one character, set apart from a whole number before it: "6¼" is 6 1/4, not 61/4. */
function plainCharacters(text: string): string {
  return westernDigits(
    text
      .replace(/\p{Cf}/gu, "")
      .replace(/[¼-¾⅐-⅞↉]/gu, (c) => ` ${c.normalize("NFKC")}`)
      .replace(/(\d)(?=[⁰¹²³⁴-⁹]+\s*[⁄∕/])/gu, "$1 ")
      .normalize("NFKC"),
  )
    .replace(/[⁄∕]/gu, "/")
    .replace(/٫/gu, ".")
    .replace(/[‐‑‒–—−﹣-]/gu, "-")
    .replace(/[“”″‟]/gu, '"')
    .replace(/[‘’′]/gu, "'")
    .replace(/\s+/gu, " ")
    .trim()
    .toLowerCase();
}

/**
 * Reads a length as a hand writes it: `6 1/4`, `6¼`, `6-1/4`, `6.25`, `6,25`, `6 1/4"`, `15.9 cm`, `159 mm`,
 * `1.5 m`, `2 yd`; a bare number is in `unit`. A comma is a decimal comma. Never throws.
 * @returns the length in mm, unrounded, beside the text exactly as typed; or a sentence that says what to type.
 */
export function parseLength(text: string, unit: Unit, limits: LengthLimits = {}): ParsedLength {
  const example = unit === "in" ? "6 1/4" : "15.9";
  const refuse = (say: string): ParsedLength => ({ ok: false, say });
  const plain = plainCharacters(text);

  if (plain === "") return refuse(`Type a length, such as ${example}.`);
  if (/^- ?[\d.,]/u.test(plain))
    return refuse(`A length is never below 0. Type it without the minus, such as ${example}.`);

  const split = /^([\d.,/\s-]*\d[.,]?) ?(\D*)$/u.exec(plain);
  const [, number = "", suffix = ""] = split ?? [];
  if (!split || /^[^\p{L}'"]+$/u.test(suffix))
    return refuse(`That cannot be read as a length. Type a number, such as ${example}.`);
  const word = suffix.trim().replace(/\.$/u, "").replace(/' '/u, "''");
  const mmEach = word === "" ? (unit === "in" ? mmPerInch : 10) : mmByWord.get(word);
  if (mmEach === undefined)
    return refuse(`"${suffix.trim()}" is not a unit known here. Type the number, then in, cm or mm.`);

  const read = readNumber(number, example);
  if (!read.ok) return refuse(read.say);
  const mm = read.value * mmEach;

  const { leastMm = 0, mostMm = longestMm } = limits;
  if (mm > mostMm)
    return refuse(
      `That is longer than ${formatPlain(mostMm, unit)}. Look at the number and its unit, and type it again.`,
    );
  if (mm < leastMm)
    return refuse(
      `That is shorter than ${formatPlain(leastMm, unit)}. Look at the number and its unit, and type it again.`,
    );
  return { ok: true, mm, typed: text };
}

type ReadNumber = { ok: true; value: number } | { ok: false; say: string };

/** Digits, one of `.` or `,` for the decimals, or a whole number and a fraction; no sign, no unit. */
function readNumber(number: string, example: string): ReadNumber {
  const refuse = (say: string): ReadNumber => ({ ok: false, say });
  const slashes = number.split("/").length - 1;
  const decimals = /[.,]/u.test(number);
  const cleaned = number.trim().replace(/ ?\/ ?/gu, "/");

  if (slashes > 1) {
    return refuse(`There is more than one fraction in that. Add them up and type one, such as 6 3/4.`);
  }
  if (slashes === 1) {
    if (decimals) return refuse("Type either a fraction or decimals, not both: 6 1/2 or 6.5.");
    const parts = /^(?:(\d{1,7})(?: ?- ?| ))?(\d{1,4})\/(\d{1,4})$/u.exec(cleaned);
    if (!parts) return refuse("Type the whole number, a space, then the fraction, such as 6 1/4.");
    const whole = Number(parts[1] ?? 0);
    const numerator = Number(parts[2]);
    const denominator = Number(parts[3]);
    if (denominator === 0)
      return refuse("A fraction cannot have 0 below the line. Type it again, such as 1/8.");
    if (numerator >= denominator) {
      const rest = numerator % denominator;
      const carried = whole + Math.floor(numerator / denominator);
      const better = rest === 0 ? `${carried}` : `${carried} ${rest}/${denominator}`;
      return refuse(`A fraction is less than 1. If ${cleaned} is meant, type ${better}.`);
    }
    return { ok: true, value: whole + numerator / denominator };
  }
  if (/^\d*[.,]?\d*$/u.test(cleaned)) {
    return { ok: true, value: Number(cleaned.replace(",", ".")) };
  }
  if (/^\d+[ -]+\d+$/u.test(cleaned)) {
    return refuse(
      `Those are two numbers. Type a fraction with a stroke, such as 6 1/4, or decimals with a point, such as 6.25.`,
    );
  }
  return refuse(`That cannot be read as one number. Type it again, such as ${example}.`);
}
