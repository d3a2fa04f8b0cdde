/** What the drafting form holds of a style: which one, its figures as typed, and the cloth. */
import { type Cloth, type StyleFigure } from "@/lib/drafting";
import { formatLength } from "@/lib/lengths/format-length";
import { parseLength } from "@/lib/lengths/parse-length";
import {
  type Fineness,
  type SleeveAskRecord,
  type StyleId,
  type TypedLength,
  type Unit,
} from "@/lib/records/types";
import { steppedText } from "@/lib/sleeves/handles";
import { styleFigures } from "@/lib/sleeves/styles";
import { readCount, readRatio } from "@/lib/sums/read-number";

export interface StyleForm {
  style: StyleId;
  cloth: Cloth;
  /** As typed, by style: one that is tried and left keeps its figures. Left out or "" stands for the usual. */
  styleTyped: Partial<Record<StyleId, Record<string, string>>>;
}

export const emptyStyleForm: StyleForm = { style: "plain", cloth: "medium", styleTyped: {} };

/** A figure of the style that the form is set to, as typed. */
export function styleText({ style, styleTyped }: StyleForm, key: string): string {
  return styleTyped[style]?.[key] ?? "";
}

/** The form with a figure of its style typed; emptied, nothing is left of it, as on a form where it never was typed. */
export function withStyleText<F extends StyleForm>(form: F, key: string, typed: string): F {
  const { style, styleTyped } = form;
  const { [key]: _before, ...others } = styleTyped[style] ?? {};
  const texts = typed === "" ? others : { ...styleTyped[style], [key]: typed };
  const { [style]: _style, ...styles } = styleTyped;
  return { ...form, styleTyped: Object.keys(texts).length > 0 ? { ...styleTyped, [style]: texts } : styles };
}

type Read = { ok: true; value: TypedLength | number } | { ok: false; say: string };

/** One figure of a style as a hand writes it. */
export function readStyleFigure(kind: StyleFigure["kind"], typed: string, unit: Unit): Read {
  if (kind === "count") return readCount(typed);
  if (kind === "ratio") return readRatio(typed);
  const read = parseLength(typed, unit);
  return read.ok ? { ok: true, value: { typed, mm: read.mm } } : read;
}

export interface ReadStyle {
  /** For the record: nothing for a plain sleeve that is all usual. */
  ask: Pick<SleeveAskRecord, "style">;
  /** What to type instead, by figure. */
  errors: Record<string, string>;
}

export function readStyle(form: StyleForm & { unit: Unit }): ReadStyle {
  const { cloth, style, unit } = form;
  const figures: Record<string, TypedLength | number> = {};
  const errors: ReadStyle["errors"] = {};
  for (const { key, kind } of styleFigures(style)) {
    const typed = styleText(form, key);
    if (typed.trim() === "") continue;
    const read = readStyleFigure(kind, typed, unit);
    if (read.ok) figures[key] = read.value;
    else errors[key] = read.say;
  }
  const asksNothing = style === "plain" && Object.keys(figures).length === 0;
  return { ask: asksNothing ? {} : { style: { figures, cloth } }, errors };
}

/** A kept style back on the form; `length` brings back a length as typed. */
export function styleFormOf(
  style: StyleId,
  { style: kept }: SleeveAskRecord,
  length: (value: TypedLength) => string,
): StyleForm {
  if (!kept) return { ...emptyStyleForm, style };
  const typed = Object.fromEntries(
    Object.entries(kept.figures).map(([key, value]) => [
      key,
      typeof value === "number" ? String(value) : length(value),
    ]),
  );
  const styleTyped = Object.keys(typed).length > 0 ? { [style]: typed } : {};
  return { style, cloth: kept.cloth, styleTyped };
}

/** The typed figures with every length written again; `again` is not asked for what is left out. */
export function styleTypedAgain(
  styleTyped: StyleForm["styleTyped"],
  again: (typed: string) => string,
): StyleForm["styleTyped"] {
  const inStyle = ([id, texts]: [string, Record<string, string>]) => {
    const lengths = new Set(
      styleFigures(id as StyleId).flatMap(({ key, kind }) => (kind === "length" ? [key] : [])),
    );
    const written = Object.entries(texts).map(([key, text]) => [
      key,
      lengths.has(key) && text !== "" ? again(text) : text,
    ]);
    return [id, Object.fromEntries(written)];
  };
  return Object.fromEntries(Object.entries(styleTyped).map(inStyle));
}

/** How a figure of a style is written: as it would be typed. */
export function styleFigureText(
  kind: StyleFigure["kind"],
  value: number,
  unit: Unit,
  fineness: Fineness,
): string {
  if (kind === "length") return formatLength(value, unit, fineness).figure;
  return String(Math.round(value * 100) / 100);
}

/** A ratio goes up and down by this. */
const ratioStep = 0.1;

/** What is typed, one step more or less, between the figure's bounds; what cannot be read starts at the usual. */
export function steppedStyleText(
  { high, kind, low, usual }: StyleFigure,
  typed: string,
  way: 1 | -1,
  unit: Unit,
  fineness: Fineness,
): string | null {
  if (kind === "length") return steppedText(typed, way, unit, fineness, usual);
  const read = readStyleFigure(kind, typed, unit);
  const from = read.ok && typeof read.value === "number" ? read.value : usual;
  const step = kind === "count" ? 1 : ratioStep;
  const next = Math.min(high, Math.max(low, from + way * step));
  return styleFigureText(kind, next, unit, fineness);
}
