import { westernDigits } from "@/lib/lengths/western-digits";

export type NumberRead = { ok: true; value: number } | { ok: false; say: string };

const plain = (text: string): string =>
  westernDigits(
    text
      .replace(/\p{Cf}/gu, "")
      .replace(/[¼-¾⅐-⅞↉]/gu, (c) => ` ${c.normalize("NFKC")}`)
      .normalize("NFKC"),
  )
    .replace(/⁄/gu, "/")
    .replace(/٫/gu, ".")
    .replace(/\s+/gu, " ")
    .trim();

/** A whole number as typed, in any script's digits. Never throws. */
export function readCount(text: string): NumberRead {
  const digits = plain(text);
  if (/^\d{1,6}$/u.test(digits)) return { ok: true, value: Number(digits) };
  if (/^\d+[.,/ ]/u.test(digits))
    return { ok: false, say: "That is no whole number. Type how many, such as 6." };
  return { ok: false, say: "That cannot be read as a number. Type how many, such as 6." };
}

/** A ratio as a hand writes it: `2.5`, `2,5`, `2 1/2`, `2½`, `2.5 : 1`, `2.5x`. Never throws. */
export function readRatio(text: string): NumberRead {
  const bare = plain(text)
    .replace(/ ?(?::|to) ?1$/iu, "")
    .replace(/ ?[x×]$/iu, "");
  if (/^\d{1,4}(?:[.,]\d{1,6})?$/u.test(bare) || /^[.,]\d{1,6}$/u.test(bare))
    return { ok: true, value: Number(bare.replace(",", ".")) };
  const parts = /^(?:(\d{1,4})[ -])?(\d{1,4}) ?\/ ?(\d{1,4})$/u.exec(bare);
  if (parts && Number(parts[3]) > 0)
    return { ok: true, value: Number(parts[1] ?? 0) + Number(parts[2]) / Number(parts[3]) };
  return { ok: false, say: "That cannot be read as a number of times. Type it such as 2 or 2 1/2." };
}
