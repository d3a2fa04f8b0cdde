import { westernDigits } from "@/lib/lengths/western-digits";

/** Letters that Unicode does not take apart into a plain letter and a mark. */
const plainLetters: Record<string, string> = {
  ...{ ß: "ss", æ: "ae", œ: "oe", ø: "o", ł: "l", đ: "d", ð: "d", þ: "th", ħ: "h", ŧ: "t", ŋ: "n", ı: "i" },
  ...{ ɓ: "b", ɗ: "d", ƙ: "k", ƴ: "y", ɛ: "e", ɔ: "o", ə: "e", ς: "σ" },
};

/**
 * Text as it is searched: lower case, no accents, plain letters and digits, single spaces, nothing else. Vowel signs of scripts
 * that write words with them (Devanagari, Thai …) stay. Folding twice is the same as once.
 */
export function fold(text: string): string {
  return westernDigits(text.normalize("NFKD").toLowerCase().normalize("NFKD"))
    .replace(/[ßæœøłđðþħŧŋıɓɗƙƴɛɔəς]/gu, (letter) => plainLetters[letter] ?? letter)
    .replace(/(?=\p{M})[\p{Script=Inherited}֑-ׇ]|\p{Cf}|['’‘ʼʻ`´]/gu, "")
    .replace(/[^\p{L}\p{M}\p{N}]+/gu, " ")
    .trim();
}
