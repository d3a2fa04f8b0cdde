/** The text of one figure as keys build it up. The text alone is kept; what is shown and its millimetres are read off it. */
import { formatLength } from "@/lib/lengths/format-length";
import { parseLength } from "@/lib/lengths/parse-length";
import { mmPerInch } from "@/lib/lengths/units";
import { type Unit } from "@/lib/records/types";

/** Longer than anything that is a length. */
export const ENTRY_AT_MOST = 24;
/** Nothing on a body has four digits in either unit. */
const WHOLE_DIGITS = 3;

const finished = /^\d+(?: \d+\/\d+|[.,]\d)$/u;

/** A digit of the pad, put after what is there; after a finished figure it begins a new one. */
export function addDigit(text: string, digit: number): string {
  if (finished.test(text)) return String(digit);
  if (!/^\d*$/u.test(text)) return (text + digit).slice(0, ENTRY_AT_MOST);
  const whole = text.replace(/^0+/u, "") + digit;
  return whole.length > WHOLE_DIGITS ? text : whole;
}

/**
 * A key of eighths, sixteenths or tenths, put after the whole number that is there.
 * @returns null where there is no whole number yet.
 */
export function setPart(text: string, over: number, under: number): string | null {
  const whole = /^\d+/u.exec(text)?.[0];
  if (whole === undefined) return null;
  if (over === 0) return whole;
  if (under === 10) return `${whole}.${over}`;
  return `${whole} ${formatLength((over / under) * mmPerInch, "in", 16).figure}`;
}

/** Takes the last thing away: the fraction or the tenths as one, else a character. */
export function eraseLast(text: string): string {
  if (finished.test(text)) return /^\d+/u.exec(text)![0];
  return text.slice(0, -1).trimEnd();
}

/** What is shown of a text: a whole number with its part to be stacked, or the text as it stands. */
export type Shown = { whole: number; over: number; under: number } | { raw: string };

export function shownEntry(text: string, unit: Unit): Shown {
  const pattern = unit === "in" ? /^(\d{1,3})(?: (\d{1,2})\/(\d{1,2}))?$/u : /^(\d{1,3})(?:\.(\d))?$/u;
  const [, whole, over, under] = pattern.exec(text) ?? [];
  if (whole === undefined) return { raw: text };
  const part = { over: Number(over ?? 0), under: unit === "in" ? Number(under ?? 1) : 10 };
  return part.over < part.under ? { whole: Number(whole), ...part } : { raw: text };
}

export type ReadEntry = { ok: true; typed: string; mm: number; unit: Unit } | { ok: false; say: string };

/** The unit that a figure was typed in: named in the text, or the one that bare numbers are in. */
export function unitTyped(text: string, unit: Unit): Unit {
  if (/["”″]|''|in|yd|yard/iu.test(text)) return "in";
  return /m/iu.test(text) ? "cm" : unit;
}

/**
 * Reads a finished entry.
 * @param unit the pad's unit; `bookUnit` the unit in which a bare number is kept: under another one the text gets it named.
 */
export function readEntry(text: string, unit: Unit, bookUnit: Unit): ReadEntry {
  const read = parseLength(text, unit);
  if (!read.ok) return read;
  if (read.mm === 0)
    return { ok: false, say: "A figure is more than 0. Type what the tape says, or press Skip." };
  const bare = !/[\p{L}'"’”′″]/u.test(text);
  const typed = text.trim() + (bare && unit !== bookUnit ? ` ${unit}` : "");
  return { ok: true, typed, mm: read.mm, unit: unitTyped(text, unit) };
}

/** The text of a figure once taken, to be put right by a key: without the unit that the pad counts in. */
export function entryOf(typed: string, unit: Unit): string {
  return typed.replace(unit === "in" ? / ?(?:in|")$/u : / ?cm$/u, "");
}

/** Text for a figure taken earlier, perhaps under another unit, that reads as the same length now. */
export function typedAgain(figure: { typed: string; mm: number }, bookUnit: Unit): string {
  const same = (text: string) => {
    const read = parseLength(text, bookUnit);
    return read.ok && Math.abs(read.mm - figure.mm) < 0.001;
  };
  const texts = [figure.typed, `${figure.typed} in`, `${figure.typed} cm`];
  return texts.find(same) ?? `${Math.round(figure.mm * 100) / 100} mm`;
}
