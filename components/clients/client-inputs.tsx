"use client";

import { type FieldErrors, type UseFormRegisterReturn } from "react-hook-form";
import { Field, TextArea, TextInput } from "@/components/ui/field";
import { type ClientValues } from "@/lib/clients/client-form";
import { type ReadPhone } from "@/lib/people/phone";

export interface ClientInputsProps {
  register: (field: keyof ClientValues) => UseFormRegisterReturn;
  errors: FieldErrors<ClientValues>;
  /** What the phone reads as, where it is read. */
  reading: ReadPhone | null;
  /** True once the phone's field was left: a half-typed number is not remarked on. */
  phoneLeft: boolean;
}

export function NameAndPhone({ register, errors, reading, phoneLeft }: ClientInputsProps) {
  return (
    <>
      <Field label="Name" error={errors.name?.message}>
        <TextInput {...register("name")} autoComplete="off" autoCapitalize="words" />
      </Field>
      <Field label="Phone" optional hint={phoneHint(reading, phoneLeft)}>
        <TextInput {...register("phone")} type="tel" inputMode="tel" autoComplete="off" />
      </Field>
    </>
  );
}

function phoneHint(reading: ReadPhone | null, left: boolean) {
  if (reading?.e164) return `Reads as ${reading.e164}`;
  if (reading?.say && left) return <span className="font-semibold text-thread">{reading.say}</span>;
  return undefined;
}

export function RestOfClient({ register, errors }: Pick<ClientInputsProps, "register" | "errors">) {
  return (
    <>
      <Field label="Email" optional error={errors.email?.message}>
        <TextInput
          {...register("email")}
          inputMode="email"
          autoComplete="off"
          autoCapitalize="none"
          spellCheck={false}
        />
      </Field>
      <Field label="Address" optional>
        <TextArea {...register("address")} rows={2} autoComplete="off" />
      </Field>
      <Field label="Note" optional hint="The way to the house, the best time to ring, what they like.">
        <TextArea {...register("note")} rows={2} />
      </Field>
    </>
  );
}
