/** What is chosen and typed for one style over many wearers, and how it is read. */
import { validate } from "uuid";
import { formatLength } from "@/lib/lengths/format-length";
import { parseLength } from "@/lib/lengths/parse-length";
import { type ManyAsk } from "@/lib/many/draft-many";
import { type IsoDate } from "@/lib/people/iso-date";
import { type Fineness, type Unit } from "@/lib/records/types";
import { usualAllowance } from "@/lib/sleeves/full-size";
import { emptyForm, type SleeveForm } from "@/lib/sleeves/sleeve-form";
import {
  emptyStyleForm,
  readStyle,
  type ReadStyle,
  type StyleForm,
  styleTypedAgain,
} from "@/lib/sleeves/style-form";
import { readRatio } from "@/lib/sums/read-number";

export interface ManyForm extends Omit<ManyAsk, "today"> {
  /** In the order chosen, each once. */
  wearerIds: string[];
  /** As typed: seam allowance, the width in the shop and the hundredths that the cloth shrinks; the last two may be "". */
  allowance: string;
  clothWidth: string;
  shrinkage: string;
}

export function emptyManyForm(unit: Unit, fineness: Fineness, wearerIds: readonly string[] = []): ManyForm {
  return {
    ...emptyStyleForm,
    unit,
    fineness,
    wearerIds: [...wearerIds],
    reach: "long",
    oldToo: false,
    allowance: formatLength(usualAllowance(unit), unit, fineness).figure,
    clothWidth: "",
    shrinkage: "",
  };
}

/** A form that was put down earlier, in this unit; what it has not got is as on an empty one. */
export function restoredManyForm(draft: Partial<ManyForm>, unit: Unit, fineness: Fineness): ManyForm {
  const form = { ...emptyManyForm(unit, fineness), ...draft, fineness };
  if (form.unit === unit) return form;
  const again = (typed: string) => {
    const read = parseLength(typed, form.unit);
    return read.ok ? formatLength(read.mm, unit, fineness).figure : typed;
  };
  return {
    ...form,
    unit,
    styleTyped: styleTypedAgain(form.styleTyped, again),
    allowance: again(form.allowance),
    clothWidth: again(form.clothWidth),
  };
}

/** More in one go, and a phone has no room for their papers. */
export const MOST_WEARERS = 200;

/** With these as well, each once and no more than `MOST_WEARERS`. */
export function withWearers(form: ManyForm, ids: readonly string[]): ManyForm {
  return { ...form, wearerIds: [...new Set([...form.wearerIds, ...ids])].slice(0, MOST_WEARERS) };
}

export function withoutWearers(form: ManyForm, ids: readonly string[]): ManyForm {
  return { ...form, wearerIds: form.wearerIds.filter((id) => !ids.includes(id)) };
}

/** The ids in the address, commas between them: each once; what is no id is passed over. */
export function askedWearers(text: string | null): string[] {
  return [...new Set((text ?? "").split(",").filter((id) => validate(id)))].slice(0, MOST_WEARERS);
}

/** The part of it that the style's own fields work on. */
export function styleOnly(form: ManyForm): SleeveForm {
  const { cloth, fineness, style, styleTyped, unit } = form;
  return { ...emptyForm(unit, fineness), cloth, style, styleTyped };
}

export function withStyle(form: ManyForm, { cloth, style, styleTyped }: StyleForm): ManyForm {
  return { ...form, cloth, style, styleTyped };
}

/** The part of it that the sleeves depend on. */
export function manyAsk(form: Omit<ManyAsk, "today">, today: IsoDate): ManyAsk {
  const { cloth, fineness, oldToo, reach, style, styleTyped, unit } = form;
  return { cloth, fineness, oldToo, reach, style, styleTyped, unit, today };
}

export interface ReadMany {
  /** mm; what cannot be read is the usual one, and no width of her own. */
  allowance: number;
  clothWidth: number | null;
  /** From 0 to below 1. */
  shrinks: number;
  /** What to type instead. */
  errors: Partial<Record<"allowance" | "clothWidth" | "shrinkage", string>>;
  styleErrors: ReadStyle["errors"];
}

/** The narrowest and the widest that cloth is woven, mm. Common practice, no source. */
const WIDTHS = { leastMm: 300, mostMm: 3500 };

export function readMany(form: ManyForm): ReadMany {
  const { unit } = form;
  const errors: ReadMany["errors"] = {};
  const allowance = parseLength(form.allowance, unit, { leastMm: 0, mostMm: 100 });
  if (!allowance.ok) errors.allowance = allowance.say;
  const width = form.clothWidth.trim() === "" ? null : parseLength(form.clothWidth, unit, WIDTHS);
  if (width?.ok === false) errors.clothWidth = width.say;
  const shrinks = readShrinkage(form.shrinkage);
  if (!shrinks.ok) errors.shrinkage = shrinks.say;
  return {
    allowance: allowance.ok ? allowance.mm : usualAllowance(unit),
    clothWidth: width?.ok ? width.mm : null,
    shrinks: shrinks.ok ? shrinks.value : 0,
    errors,
    styleErrors: readStyle(form).errors,
  };
}

/** A cloth that shrinks more is not sewn before it is washed, hundredths. Common practice, no source. */
const MOST_SHRINKAGE = 30;

function readShrinkage(typed: string): { ok: true; value: number } | { ok: false; say: string } {
  const bare = typed.replace(/[%٪]\s*$/u, "").trim();
  if (bare === "") return { ok: true, value: 0 };
  const read = readRatio(bare);
  if (!read.ok) return { ok: false, say: "That cannot be read as hundredths. Type a number, such as 5." };
  if (read.value > MOST_SHRINKAGE)
    return {
      ok: false,
      say: `More than ${MOST_SHRINKAGE} in a hundred is not likely. Look at the number and type it again, such as 5.`,
    };
  return { ok: true, value: read.value / 100 };
}
