"use client";

import { type UseFormReturn } from "react-hook-form";
import { Choice, Field, TextInput } from "@/components/ui/field";
import { Phrase } from "@/components/ui/fraction";
import { type Phrase as PhraseParts } from "@/lib/drafting";
import { type Fineness, type Unit } from "@/lib/records/types";
import { type SumField as AskedField } from "@/lib/sewing";
import { type SumForm } from "@/lib/sums/sum-form";

export interface SumFieldProps {
  field: AskedField;
  form: UseFormReturn<SumForm>;
  unit: Unit;
  fineness: Fineness;
  /** What to type instead. */
  error: PhraseParts | undefined;
}

/** One thing that a sum asks: a length as a hand writes it, a number, or one of a few. */
export function SumField({ error, field, fineness, form, unit }: SumFieldProps) {
  const name = `typed.${field.key}` as const;
  const said = (parts: PhraseParts | undefined) =>
    parts && parts.length > 0 ? <Phrase parts={[...parts]} unit={unit} fineness={fineness} /> : undefined;
  if (field.kind === "choice")
    return (
      <Choice
        {...form.register(name)}
        label={field.label}
        hint={said(field.hint)}
        error={said(error)}
        options={field.options}
        stacked={field.options.some(({ label }) => label.length > 16)}
      />
    );
  return (
    <Field label={field.label} optional={field.optional} hint={said(field.hint)} error={said(error)}>
      <TextInput
        {...form.register(name)}
        figure
        inputMode={field.kind === "count" ? "numeric" : "decimal"}
        after={field.kind === "length" ? unit : field.kind === "ratio" ? "×" : undefined}
      />
    </Field>
  );
}
