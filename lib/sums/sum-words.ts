/** What a sum came to, in words: for a list, and to be sent in a message. */
import { formatPlain } from "@/lib/lengths/format-length";
import { phraseText } from "@/lib/lengths/phrase";
import { stepOf } from "@/lib/lengths/units";
import { type Fineness, type Sum, type Unit } from "@/lib/records/types";
import {
  fieldsAsked,
  type SewingSum,
  sewingSum,
  type SumResult,
  type SumWorked,
  upToStep,
} from "@/lib/sewing";
import { formOfSum, readSumForm, type ReadSumForm } from "./sum-form";

type Good = SumWorked & { ok: true };

/** What a result is shown as, mm: what is cut goes up to the next step, never down. */
export const shownMm = (result: { mm: number; up?: boolean }, unit: Unit, fineness: Fineness): number =>
  result.up ? upToStep(result.mm, stepOf(unit, fineness)) : result.mm;

/** "37 1/2 in", "3", "1.9 times"; marks as "4 marks". */
export function resultText(result: SumResult, unit: Unit, fineness: Fineness): string {
  if ("mm" in result) return formatPlain(shownMm(result, unit, fineness), unit, fineness);
  if ("count" in result) return String(result.count);
  if ("text" in result) return result.text;
  return `${result.marks.length} marks`;
}

/** "Strip 37 1/2 in · Strips to cut 1": the main figures in a line. */
export function mainLine(worked: Good, unit: Unit, fineness: Fineness): string {
  return worked.results
    .filter(({ main }) => main)
    .map((result) => `${result.label} ${resultText(result, unit, fineness)}`)
    .join(" · ");
}

/** What a kept sum says in a list. */
export function keptLine(kept: Sum, unit: Unit, fineness: Fineness): string {
  const sum = sewingSum(kept.kind);
  if (!sum) return "Of a newer Notchbook. Bring this one up to date to see it.";
  const { worked } = readSumForm(sum, formOfSum(sum, kept, unit, fineness), fineness);
  return worked?.ok ? mainLine(worked, unit, fineness) : "Something in it is to be put right.";
}

/** A sum as plain lines. */
export function sumShareText(
  sum: SewingSum,
  name: string,
  { inputs }: ReadSumForm,
  worked: Good,
  unit: Unit,
  fineness: Fineness,
): string {
  const given = fieldsAsked(sum, inputs).flatMap((field) => {
    const value = inputs[field.key];
    if (value === undefined) return [];
    if (field.kind === "length") return [`${field.label}: ${formatPlain(value as number, unit, fineness)}`];
    if (field.kind === "choice")
      return [`${field.label}: ${field.options.find((option) => option.value === value)?.label ?? value}`];
    return [`${field.label}: ${value}`];
  });
  const found = worked.results.flatMap((result) =>
    "marks" in result
      ? [
          `${result.label}, from ${result.from}:`,
          ...result.marks.map((mark) => `  ${mark.name}: ${formatPlain(mark.mm, unit, fineness)}`),
        ]
      : [`${result.label}: ${resultText(result, unit, fineness)}`],
  );
  const said = (parts: Good["steps"][number]) => phraseText([...parts], unit, fineness);
  return [
    name,
    "",
    ...given,
    "",
    ...found,
    "",
    ...worked.steps.map((step, i) => `${i + 1}. ${said(step)}`),
    ...(worked.cautions.length > 0 ? ["", ...worked.cautions.map((caution) => said(caution.say))] : []),
  ].join("\n");
}
