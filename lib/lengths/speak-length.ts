import { type Fineness, type Unit } from "@/lib/records/types";
import { formatLength } from "@/lib/lengths/format-length";

const small = [
  ..."zero one two three four five six seven eight nine ten eleven twelve thirteen fourteen".split(" "),
  ..."fifteen sixteen seventeen eighteen nineteen".split(" "),
];
const tens = "- - twenty thirty forty fifty sixty seventy eighty ninety".split(" ");

/** 0 to 999 in words; beyond that the digits, which a screen reader reads well. */
function inWords(n: number): string {
  if (n < 20) return small[n]!;
  if (n < 100) return n % 10 === 0 ? tens[n / 10]! : `${tens[Math.floor(n / 10)]}-${small[n % 10]}`;
  if (n < 1000) {
    const rest = n % 100;
    return `${small[Math.floor(n / 100)]} hundred${rest === 0 ? "" : ` and ${inWords(rest)}`}`;
  }
  return String(n);
}

const shareNames: Record<number, string> = { 2: "half", 4: "quarter", 8: "eighth", 16: "sixteenth" };

function fractionWords(numerator: number, denominator: number): string {
  const name = shareNames[denominator]!;
  if (numerator > 1) return `${inWords(numerator)} ${name}s`;
  return `${name === "eighth" ? "an" : "a"} ${name}`;
}

/** As a screen reader says it: "six and a quarter inches", "five eighths of an inch", "fifteen point nine centimetres". */
export function speakLength(mm: number, unit: Unit, fineness: Fineness = 8): string {
  const { negative, whole, numerator, denominator } = formatLength(mm, unit, fineness);
  const sign = negative ? "minus " : "";
  if (unit === "cm") {
    const number = numerator === 0 ? inWords(whole) : `${inWords(whole)} point ${inWords(numerator)}`;
    return `${sign}${number} ${whole === 1 && numerator === 0 ? "centimetre" : "centimetres"}`;
  }
  if (numerator === 0) return `${sign}${inWords(whole)} ${whole === 1 ? "inch" : "inches"}`;
  const fraction = fractionWords(numerator, denominator);
  if (whole > 0) return `${sign}${inWords(whole)} and ${fraction} inches`;
  return `${sign}${fraction === "a half" ? "half an inch" : `${fraction} of an inch`}`;
}
