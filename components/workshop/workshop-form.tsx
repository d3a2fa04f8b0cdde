"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useMemo, useState } from "react";
import { useForm, useWatch } from "react-hook-form";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { useFormDraft } from "@/components/store/use-form-draft";
import { usePhoneReading } from "@/components/store/use-phone-reading";
import { useKeep } from "@/components/store/use-book";
import { type DraftHandle, useDraft } from "@/components/store/use-draft";
import { Button } from "@/components/ui/button";
import { Choice, Field, Select, TextArea, TextInput } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { edit } from "@/lib/journal/change";
import { currencies } from "@/lib/money/currencies";
import { countries } from "@/lib/people/countries";
import { type Workshop } from "@/lib/records/types";
import {
  workshopFields,
  workshopSchema,
  type WorkshopValues,
  workshopValues,
} from "@/lib/workshop/workshop-form";

const KEY = "workshop:change";

const units = [
  { value: "in", label: "Inches" },
  { value: "cm", label: "Centimetres" },
] as const;
const finenesses = [
  { value: "8", label: "Eighths" },
  { value: "16", label: "Sixteenths" },
] as const;

type Props = { workshop: Workshop; keptBefore: boolean; onKept: () => void };

export function WorkshopForm(props: Props) {
  const handle = useDraft<WorkshopValues>(KEY);
  if (handle.draft === undefined) return <Progress label="Opening the book" />;
  return <Form {...props} handle={handle} />;
}

function Form({ workshop, keptBefore, onKept, handle }: Props & { handle: DraftHandle<WorkshopValues> }) {
  const { keep, busy, problem } = useKeep();
  const [initial] = useState(() => workshopValues(workshop));
  const [money, places] = useMemo(() => [currencies(), countries()] as const, []);
  const form = useForm<WorkshopValues>({
    resolver: zodResolver(workshopSchema),
    defaultValues: { ...initial, ...handle.draft },
    mode: "onTouched",
  });
  const draft = useFormDraft(form, KEY, initial, handle);
  const values = { ...initial, ...useWatch({ control: form.control }) };
  const reading = usePhoneReading(values.phone, values.country);
  const { errors } = form.formState;
  const changed = JSON.stringify(workshopFields(values)) !== JSON.stringify(workshopFields(initial));

  const submit = form.handleSubmit(async (typed) => {
    if (!(await keep([edit("workshops", workshop, workshopFields(typed))]))) return;
    await handle.drop();
    onKept();
  });

  return (
    <form noValidate onSubmit={submit} className="grid gap-4">
      <BroughtBack draft={draft} />
      <Field label="Name of your workshop" error={errors.name?.message}>
        <TextInput autoComplete="organization" {...form.register("name")} />
      </Field>
      <Field label="Address" optional error={errors.address?.message}>
        <TextArea autoComplete="street-address" rows={2} {...form.register("address")} />
      </Field>
      <Field label="Phone" optional error={errors.phone?.message} hint={reading?.say}>
        <TextInput type="tel" autoComplete="tel" {...form.register("phone")} />
      </Field>
      <Field
        label="Country"
        error={errors.country?.message}
        hint="Phone numbers without a country code are read as from here."
      >
        <Select {...form.register("country")}>
          {places.map(({ code, name, callingCode }) => (
            <option key={code} value={code}>
              {name} (+{callingCode})
            </option>
          ))}
        </Select>
      </Field>
      <Field label="Clients pay in" error={errors.currency?.message}>
        <Select {...form.register("currency")}>
          {money.map(({ code, name }) => (
            <option key={code} value={code}>
              {name} ({code})
            </option>
          ))}
        </Select>
      </Field>
      {values.currency !== initial.currency && (
        <Notice live tone="look" title={`Orders that are in the book stay in ${initial.currency}.`}>
          <p>Only orders made from now on are in {values.currency}. Nothing is converted.</p>
        </Notice>
      )}
      <Choice
        label="Your tape is read in"
        options={units}
        error={errors.unit?.message}
        hint="Figures that are kept stay as they were typed; they are only shown in the other unit."
        {...form.register("unit")}
      />
      {values.unit === "in" && (
        <Choice
          label="Marks are set out in"
          options={finenesses}
          error={errors.fineness?.message}
          {...form.register("fineness")}
        />
      )}
      <KeepTrouble keep={problem} draft={handle.problem} />
      <Button
        type="submit"
        variant="main"
        full
        busy={busy}
        disabled={!changed && Object.keys(errors).length === 0}
      >
        Keep the workshop
      </Button>
      <p role="status" className="text-center text-soft empty:hidden">
        {keptBefore && !changed ? "Kept." : ""}
      </p>
    </form>
  );
}
