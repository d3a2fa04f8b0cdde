/** Breaks text into measured lines: at words, then, where a word is wider than its column, between letters. */
import { type Item, type Line, shiftAll } from "@/lib/pdf/blocks";
import { type PrintFonts } from "@/lib/pdf/print-fonts";
import { directionOf, isRightToLeft, splitGraphemes, splitRuns, tidy } from "@/lib/pdf/text-runs";
import { type TextPainter } from "@/lib/pdf/text-painter";

export interface TextStyle {
  readonly size: number;
  readonly bold?: boolean;
}

export type Align = "left" | "right" | "centre";

export interface Column {
  readonly x: number;
  readonly width: number;
  /** Default left. */
  readonly align?: Align;
}

export interface Typesetter {
  /** Of the text on one line. */
  width(text: string, style: TextStyle): number;
  /** The text in a column: at least one line, empty for no text. */
  lines(text: string, style: TextStyle, column: Column): Line[];
}

// Of the letter's size. Room for Ế above and ỵ below without touching.
const ABOVE = 0.96;
const BELOW = 0.34;

const NO_SPACES =
  /[\p{Script=Han}\p{Script=Hiragana}\p{Script=Katakana}\p{Script=Thai}\p{Script=Lao}\p{Script=Khmer}\p{Script=Myanmar}]/u;
const words = new Intl.Segmenter("en", { granularity: "word" });
const CLOSING = /^[\p{Pe}\p{Pf}\p{Po}\p{Mn}]/u;

// A figure keeps its fraction and its unit: no "5" at the end of one line and "¼ in" on the next.
const FRACTION = "[½¼¾⅛⅜⅝⅞⅓⅔⁰¹²³⁴⁵⁶⁷⁸⁹]";
const INSIDE_A_FIGURE = new RegExp(
  `(?<=\\d) (?=${FRACTION})|(?<=[\\d½¼¾⅛⅜⅝⅞⅓⅔₂₄₆₈]) (?=(?:in|cm|mm|m|yd|ft)(?![\\p{L}\\p{N}]))`,
  "gu",
);

/** Pieces that a line may end after; the spaces stay at their ends. */
function breakable(text: string): string[] {
  const pieces = text.replace(INSIDE_A_FIGURE, "\u00a0").match(/[^ ]+ */g) ?? [];
  return pieces
    .flatMap((piece) => piece.split(/(?<=\p{L}[-–—/])(?=\p{L})|(?<=\u200b)/u))
    .flatMap((piece) => {
      if (!NO_SPACES.test(piece)) return [piece];
      const parts: string[] = [];
      for (const { segment } of words.segment(piece)) {
        if (parts.length > 0 && (CLOSING.test(segment) || parts.at(-1)!.trim() === ""))
          parts[parts.length - 1] += segment;
        else parts.push(segment);
      }
      return parts;
    });
}

export function typesetter(fonts: PrintFonts, painter: TextPainter): Typesetter {
  const setLine = (text: string, { size, bold = false }: TextStyle): Line => {
    let x = 0;
    let above = size * ABOVE;
    let below = size * BELOW;
    const items: Item[] = [];
    for (const run of splitRuns(text, fonts.covers)) {
      items.push({ kind: run.kind, x, y: 0, text: run.text, size, bold });
      if (run.kind === "text") x += fonts.width(run.text, size, bold);
      else {
        const box = painter.measure(run.text, size, bold);
        x += box.widthPt;
        above = Math.max(above, box.baselinePt);
        below = Math.max(below, box.heightPt - box.baselinePt);
      }
    }
    return { items: shiftAll(items, 0, above), baseline: above, height: above + below, width: x };
  };

  const wrap = (paragraph: string, style: TextStyle, width: number): Line[] => {
    // A line cut out of a right-to-left paragraph must not take its direction from its own first word.
    const mark = isRightToLeft(paragraph) ? (directionOf(paragraph) === "rtl" ? "\u200f" : "\u200e") : "";
    const set = (text: string) => setLine(mark + text.trim(), style);
    const fits = (text: string) => set(text).width <= width + 0.01;
    const lines: Line[] = [];
    let open = "";
    const close = () => {
      lines.push(set(open));
      open = "";
    };
    for (const piece of breakable(paragraph)) {
      if (fits(open + piece)) {
        open += piece;
        continue;
      }
      if (open.trim() !== "") close();
      if (fits(piece)) {
        open = piece;
        continue;
      }
      for (const letter of splitGraphemes(piece.trim())) {
        if (open !== "" && !fits(open + letter)) close();
        open += letter;
      }
    }
    if (open.trim() !== "" || lines.length === 0) close();
    return lines;
  };

  return {
    width: (text, style) => setLine(text, style).width,
    lines(text, style, { x, width, align = "left" }) {
      const share = { left: 0, centre: 0.5, right: 1 }[align];
      return tidy(text)
        .split("\n")
        .flatMap((paragraph) => wrap(paragraph, style, width))
        .map((line) => ({ ...line, items: shiftAll(line.items, x + (width - line.width) * share, 0) }));
    },
  };
}
