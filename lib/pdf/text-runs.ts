/**
 * jsPDF sets glyphs one after another and cannot shape. Text is therefore cut into stretches: what the font has
 * a glyph for, letter by letter, is set as text; the rest is drawn by the browser and placed as a picture.
 */

export interface Run {
  readonly kind: "text" | "picture";
  readonly text: string;
}

/** Whether the font has a glyph for a code point. */
export type Covers = (codePoint: number) => boolean;

const graphemes = new Intl.Segmenter("en", { granularity: "grapheme" });

/** What a reader takes for one letter each, never cut in two. */
export const splitGraphemes = (text: string): string[] =>
  Array.from(graphemes.segment(text), ({ segment }) => segment);

const UNSHAPED =
  /^[\p{Script=Latin}\p{Script=Greek}\p{Script=Cyrillic}\p{Script=Armenian}\p{Script=Georgian}\p{Script=Common}]$/u;
// Letters of right-to-left scripts, their presentation forms, and the marks that turn the direction.
const RIGHT_TO_LEFT =
  /[\u0590-\u08ff\ufb1d-\ufdff\ufe70-\ufefc\u200f\u202b\u202e\u2067\u{10800}-\u{10fff}\u{1e800}-\u{1efff}]/u;
const UNSEEN = /^[\p{Cf}\p{Cc}]+$/u;
const BLANK = /^\s+$/;

const FIRST_LETTER = /[\p{L}\u200e\u200f]/u;

export const isRightToLeft = (text: string): boolean => RIGHT_TO_LEFT.test(text);

/** The direction of a paragraph: that of its first letter or direction mark. */
export function directionOf(text: string): "rtl" | "ltr" {
  const first = FIRST_LETTER.exec(text)?.[0];
  return first && isRightToLeft(first) ? "rtl" : "ltr";
}

/**
 * Text as it is printed: composed, hyphens and spaces of one kind, without control characters. Line ends stay.
 * Hyphens and no-break spaces share one glyph in the font; kept apart they could not be read back.
 */
export const tidy = (text: string): string =>
  text
    .normalize("NFC")
    .replace(/\r\n?|[\u2028\u2029]/g, "\n")
    .replace(/\u00ad|\ufeff/g, "")
    .replace(/[\u2010\u2011]/g, "-")
    .replace(/[^\S\n\u00a0\u202f]+/g, " ")
    .replace(/[\u0000-\u0009\u000b-\u001f\u007f-\u009f]/g, "");

function kindOf(cluster: string, covers: Covers): Run["kind"] {
  const signs = [...cluster];
  // More than one code point left after composing: the font has no letter of its own for it.
  if (signs.length !== 1) return "picture";
  const codePoint = cluster.codePointAt(0)!;
  // jsPDF writes two-byte codes.
  return codePoint <= 0xffff && covers(codePoint) && UNSHAPED.test(cluster) ? "text" : "picture";
}

/**
 * Cuts one line into runs. A line with right-to-left letters is one picture, so that the browser puts the
 * stretches in order.
 */
export function splitRuns(line: string, covers: Covers): Run[] {
  const text = tidy(line);
  if (text === "") return [];
  if (isRightToLeft(text)) return [{ kind: "picture", text }];
  const runs: { kind: Run["kind"]; text: string }[] = [];
  for (const cluster of splitGraphemes(text)) {
    if (UNSEEN.test(cluster)) continue;
    const kind = kindOf(cluster, covers);
    const last = runs.at(-1);
    if (last?.kind === kind) last.text += cluster;
    else runs.push({ kind, text: cluster });
  }
  // A gap between two pictures belongs to their script: one picture.
  for (let i = runs.length - 2; i > 0; i--) {
    const [before, gap, after] = [runs[i - 1]!, runs[i]!, runs[i + 1]!];
    if (gap.kind === "text" && BLANK.test(gap.text) && before.kind === "picture" && after.kind === "picture")
      runs.splice(i - 1, 3, { kind: "picture", text: before.text + gap.text + after.text });
  }
  return runs.map((run) =>
    run.kind === "text" ? { ...run, text: run.text.replace(/[\u00a0\u202f]/g, " ") } : run,
  );
}
