/** The language of a receipt's words is English; its money and days are written as this phone's owner writes them. */
export function receiptLang(): string {
  return navigator.language.startsWith("en") ? navigator.language : "en-GB";
}
