/** The guide marks as they are typed in their small table. */
import { type GuideMark, type Side } from "@/lib/drafting";
import { parseLength } from "@/lib/lengths/parse-length";
import { westernDigits } from "@/lib/lengths/western-digits";
import { type Unit } from "@/lib/records/types";

/** One mark: its values, and what was typed over them; null where nothing was. */
export interface MarkText {
  share: number;
  shareTyped: string | null;
  /** mm square to the guide line, without a sign. */
  out: number;
  outTyped: string | null;
  raised: boolean;
}

export interface MarkProblem {
  side: Side;
  index: number;
  cell: "share" | "out";
  say: string;
}

export function markTexts(marks: readonly GuideMark[]): MarkText[] {
  return marks.map(({ share, out }) => ({
    share,
    shareTyped: null,
    out: Math.abs(out),
    outTyped: null,
    raised: out >= 0,
  }));
}

/** Reads "25", "25 %" or "33.5": hundredths of the guide line, from the underarm up. */
export function parseShare(text: string): { ok: true; share: number } | { ok: false; say: string } {
  const plain = westernDigits(text).normalize("NFKC").replace(/%/u, "").replace(",", ".").trim();
  const number = /^\d{1,3}(\.\d+)?$/u.test(plain) ? Number(plain) : NaN;
  if (!(number > 0 && number < 100))
    return {
      ok: false,
      say: "Type a number above 0 and below 100: hundredths of the guide line, such as 25.",
    };
  return { ok: true, share: number / 100 };
}

/** The share as it is written in the table: at most one decimal. */
export function shareText(share: number): string {
  return String(Math.round(share * 1000) / 10);
}

/** The marks that the texts say; null where the rule's own are kept. An unreadable cell keeps its last value. */
export function marksOf(
  texts: readonly MarkText[] | null,
  side: Side,
  unit: Unit,
): { marks: { share: number; out: number }[] | null; problems: MarkProblem[] } {
  if (!texts) return { marks: null, problems: [] };
  const problems: MarkProblem[] = [];
  const marks = texts.map((text, index) => {
    let { share, out } = text;
    if (text.shareTyped !== null) {
      const read = parseShare(text.shareTyped);
      if (read.ok) share = read.share;
      else problems.push({ side, index, cell: "share", say: read.say });
    }
    if (text.outTyped !== null) {
      const read = parseLength(text.outTyped, unit);
      if (read.ok) out = read.mm;
      else problems.push({ side, index, cell: "out", say: read.say });
    }
    return { share, out: text.raised ? out : -out };
  });
  return { marks, problems };
}
