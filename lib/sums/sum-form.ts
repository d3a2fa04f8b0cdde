/** The form of a sewing sum as it is typed, and its way to and from what is kept. */
import { type Phrase } from "@/lib/drafting";
import { formatLength, formatPlain } from "@/lib/lengths/format-length";
import { parseLength } from "@/lib/lengths/parse-length";
import { stepOf } from "@/lib/lengths/units";
import { type Fineness, type Sum, type SumFields, type SumInput, type Unit } from "@/lib/records/types";
import {
  fieldsAsked,
  type SewingSum,
  type SumField,
  type SumInputs,
  type SumWorked,
  workSum,
} from "@/lib/sewing";
import { readCount, readRatio } from "./read-number";

export interface SumForm {
  /** The unit that a bare number was typed in. */
  unit: Unit;
  name: string;
  note: string;
  /** "" where it is on no order. */
  orderId: string;
  /** As typed, or the choice; "" where left out. */
  typed: Record<string, string>;
}

function usualText(field: SumField, unit: Unit, fineness: Fineness): string {
  if (field.usual === undefined) return "";
  return field.kind === "length"
    ? formatLength(field.usual[unit], unit, fineness).figure
    : String(field.usual);
}

/** A new form, with what is usual in it. */
export function emptySumForm(sum: SewingSum, unit: Unit, fineness: Fineness, orderId = ""): SumForm {
  return {
    unit,
    name: "",
    note: "",
    orderId,
    typed: Object.fromEntries(sum.fields.map((field) => [field.key, usualText(field, unit, fineness)])),
  };
}

/** A kept sum back on the form: as typed, unless the workshop's unit has changed since. */
export function formOfSum(sum: SewingSum, kept: Sum, unit: Unit, fineness: Fineness): SumForm {
  const typedAgain = (field: SumField): string => {
    const input = kept.inputs[field.key];
    if (!input) return "";
    if (field.kind !== "length" || input.mm === undefined) return input.typed;
    const read = parseLength(input.typed, unit, { mostMm: field.most });
    return read.ok && Math.abs(read.mm - input.mm) < 0.01
      ? input.typed
      : formatLength(input.mm, unit, fineness).figure;
  };
  return {
    unit,
    name: kept.name,
    note: kept.note,
    orderId: kept.orderId ?? "",
    typed: Object.fromEntries(sum.fields.map((field) => [field.key, typedAgain(field)])),
  };
}

/** What was put down earlier, over what the form begins with; its lengths written again where the unit has changed. */
export function restoredSumForm(
  sum: SewingSum,
  begin: SumForm,
  draft: Partial<SumForm> | null,
  fineness: Fineness,
): SumForm {
  if (!draft) return begin;
  const from = draft.unit ?? begin.unit;
  const typed = { ...begin.typed, ...draft.typed };
  if (from !== begin.unit)
    for (const field of sum.fields) {
      const text = draft.typed?.[field.key];
      if (field.kind !== "length" || !text) continue;
      const read = parseLength(text, from, { mostMm: field.most });
      if (read.ok) typed[field.key] = formatLength(read.mm, begin.unit, fineness).figure;
    }
  return { ...begin, ...draft, unit: begin.unit, typed };
}

export interface ReadSumForm {
  /** What could be read. */
  inputs: SumInputs;
  /** The same to keep, with what was typed. */
  record: Record<string, SumInput>;
  /** What to type instead, by field. */
  errors: Record<string, Phrase>;
  /** Needed, and not there yet. */
  missing: SumField[];
  worked: SumWorked | null;
}

function readField(field: SumField, text: string, unit: Unit): SumInput | { say: string } {
  if (field.kind === "length") {
    const read = parseLength(text, unit, { leastMm: field.least, mostMm: field.most });
    return read.ok ? { typed: text, mm: read.mm } : { say: read.say };
  }
  if (field.kind === "choice") return { typed: text, value: text };
  const read = field.kind === "count" ? readCount(text) : readRatio(text);
  return read.ok ? { typed: text, value: read.value } : { say: read.say };
}

/** Reads the form and works the sum, marks set out to the workshop's step. `worked` is null while something is missing. */
export function readSumForm(sum: SewingSum, form: SumForm, fineness: Fineness): ReadSumForm {
  const inputs: Record<string, number | string | undefined> = {};
  const record: Record<string, SumInput> = {};
  const unread: Record<string, Phrase> = {};
  for (const field of sum.fields) {
    const text = form.typed[field.key] ?? "";
    if (text.trim() === "") continue;
    const read = readField(field, text, form.unit);
    if ("say" in read) {
      unread[field.key] = [read.say];
      record[field.key] = { typed: text };
    } else {
      record[field.key] = read;
      inputs[field.key] = read.mm ?? read.value;
    }
  }
  const asked = fieldsAsked(sum, inputs);
  const errors = Object.fromEntries(
    asked.flatMap(({ key }) => (unread[key] ? [[key, unread[key]] as const] : [])),
  );
  const missing = asked.filter(({ key, optional }) => !optional && inputs[key] === undefined && !unread[key]);
  const read = { inputs, record, errors, missing };
  if (missing.length > 0 || Object.keys(errors).length > 0) return { ...read, worked: null };
  const worked = workSum(sum, inputs, stepOf(form.unit, fineness));
  if (!worked.ok) for (const { field, say } of worked.problems) errors[field] ??= say;
  return { ...read, worked };
}

/** A name for a sum that was given none: "Ruffle and gathers, 15 in". */
export function suggestedSumName(
  sum: SewingSum,
  { inputs }: ReadSumForm,
  unit: Unit,
  fineness: Fineness,
): string {
  // By what she measured, not by what stood there at first.
  const first = sum.fields.find(
    (field) => field.kind === "length" && !field.usual && typeof inputs[field.key] === "number",
  );
  return first ? `${sum.name}, ${formatPlain(inputs[first.key] as number, unit, fineness)}` : sum.name;
}

/** What is kept of a form that could be worked. */
export function sumFields(sum: SewingSum, form: SumForm, read: ReadSumForm, suggested: string): SumFields {
  return {
    orderId: form.orderId === "" ? null : form.orderId,
    kind: sum.id,
    name: form.name.trim() || suggested,
    inputs: read.record,
    note: form.note.trim(),
  };
}

/** "the seam it is sewn to and the fullness". */
export function missingWords(missing: readonly SumField[]): string {
  const said = missing.map(({ label }) => `“${label}”`);
  return said.length < 2 ? (said[0] ?? "") : `${said.slice(0, -1).join(", ")} and ${said.at(-1)}`;
}
