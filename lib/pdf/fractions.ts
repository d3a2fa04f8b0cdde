/** Fractions typed with a stroke, as the font's own figures: 6 1/4 becomes 6 ¼, 3/16 becomes ³⁄₁₆. */

const ready: Record<string, string> = {
  "1/2": "½",
  "1/3": "⅓",
  "2/3": "⅔",
  "1/4": "¼",
  "3/4": "¾",
  "1/8": "⅛",
  "3/8": "⅜",
  "5/8": "⅝",
  "7/8": "⅞",
};
const RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
const LOWERED = "₀₁₂₃₄₅₆₇₈₉";
const figures = (digits: string, signs: string) =>
  Array.from(digits, (digit) => signs[Number(digit)]).join("");

/** Parts of a ruler only: a date or a telephone number keeps its strokes. */
export const setFractions = (text: string): string =>
  text.replace(
    /(?<![\d/])(\d{1,2})\/(2|3|4|8|16|32)(?![\d/])/g,
    (typed, numerator: string, denominator: string) =>
      ready[typed] ?? `${figures(numerator, RAISED)}⁄${figures(denominator, LOWERED)}`,
  );
