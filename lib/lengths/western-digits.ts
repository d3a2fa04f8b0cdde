const decimalDigit = /\p{Nd}/u;

/** The same text with every script's decimal digits (Arabic-Indic, Devanagari, full width …) as 0 to 9. */
export function westernDigits(text: string): string {
  return text.replace(/\p{Nd}/gu, (digit) => {
    if (digit >= "0" && digit <= "9") return digit;
    // Unicode keeps a script's digits as an unbroken run of ten (or of tens), 0 first.
    const at = digit.codePointAt(0)!;
    let first = at;
    while (decimalDigit.test(String.fromCodePoint(first - 1))) first -= 1;
    return String((at - first) % 10);
  });
}
