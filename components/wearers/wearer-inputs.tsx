"use client";

import { type FieldErrors, type UseFormRegisterReturn } from "react-hook-form";
import { Choice, Field, Select, TextArea, TextInput } from "@/components/ui/field";
import { type AgeKnown, monthNames, type WearerValues } from "@/lib/clients/wearer-form";

export interface WearerInputsProps {
  register: (field: keyof WearerValues) => UseFormRegisterReturn;
  errors: FieldErrors<WearerValues>;
  known: AgeKnown;
  /** Today's date: no day of an age lies after it. */
  today: string;
  /** Only what a first visit needs: no day of the age (it is today), no note. */
  short?: boolean;
}

export function WearerInputs({ register, errors, known, today, short }: WearerInputsProps) {
  return (
    <>
      <Field label="Name" error={errors.name?.message}>
        <TextInput {...register("name")} autoComplete="off" autoCapitalize="words" />
      </Field>
      <Choice
        {...register("known")}
        label="Age"
        options={[
          { value: "born", label: "Birth month" },
          { value: "told", label: "In years" },
          { value: "grown", label: "Grown up" },
        ]}
        hint={
          known === "grown"
            ? "The age is not asked."
            : known === "born"
              ? "A child's figures grow old: the age says how fast."
              : undefined
        }
      />
      {known === "born" && (
        <div className="grid grid-cols-[repeat(auto-fit,minmax(min(100%,9rem),1fr))] items-start gap-3">
          <Field label="Month" error={errors.month?.message}>
            <Select {...register("month")}>
              <option value="">Not known</option>
              {monthNames.map((name, i) => (
                <option key={name} value={i + 1}>
                  {name}
                </option>
              ))}
            </Select>
          </Field>
          <Field label="Year of birth" error={errors.year?.message}>
            <TextInput {...register("year")} figure inputMode="numeric" maxLength={8} />
          </Field>
        </div>
      )}
      {known === "told" && (
        <div className="grid grid-cols-[repeat(auto-fit,minmax(min(100%,9rem),1fr))] items-start gap-3">
          <Field label="Age in years" error={errors.age?.message}>
            <TextInput {...register("age")} figure inputMode="numeric" maxLength={8} />
          </Field>
          {!short && (
            <Field label="On which day" error={errors.on?.message}>
              <TextInput {...register("on")} type="date" max={today} />
            </Field>
          )}
        </div>
      )}
      {!short && (
        <Field label="Note" optional hint="What to mind: one shoulder lower, likes room in the arm.">
          <TextArea {...register("note")} rows={2} />
        </Field>
      )}
    </>
  );
}
