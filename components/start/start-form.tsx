"use client";

import { useRouter } from "next/navigation";
import { useMemo, useState } from "react";
import { type Resolver, useForm } from "react-hook-form";
import { KeepTrouble } from "@/components/frame/form-notices";
import { useFormDraft } from "@/components/store/use-form-draft";
import { useKeep } from "@/components/store/use-book";
import { type DraftHandle } from "@/components/store/use-draft";
import { Button } from "@/components/ui/button";
import { Card } from "@/components/ui/card";
import { Choice, Field, Select, TextInput } from "@/components/ui/field";
import { ReadInCopy } from "@/components/workshop/read-in-copy";
import { make } from "@/lib/journal/change";
import { currencies } from "@/lib/money/currencies";
import { todayIso } from "@/lib/people/today";
import { countryName } from "@/lib/workshop/home-country";
import { askToStay } from "@/lib/workshop/storage";
import { beginFields } from "@/lib/workshop/begin-fields";
import { type StartValues } from "@/lib/workshop/workshop-form";
import { GettingReady } from "./getting-ready";

export const START_DRAFT = "workshop:start";

const units = [
  { value: "in", label: "Inches" },
  { value: "cm", label: "Centimetres" },
] as const;

/** Fetched at the first check, so that the first screen of all stays light on the line. */
const checkStart: Resolver<StartValues> = async (...form) => {
  const [{ zodResolver }, { startSchema }] = await Promise.all([
    import("@hookform/resolvers/zod"),
    import("@/lib/workshop/workshop-form"),
  ]);
  return zodResolver(startSchema)(...form);
};

export function StartForm({
  workshopId,
  country,
  initial,
  handle,
}: {
  workshopId: string;
  country: string;
  initial: StartValues;
  handle: DraftHandle<StartValues>;
}) {
  const router = useRouter();
  const { keep, busy, problem } = useKeep();
  const [looking, setLooking] = useState(false);
  const [first] = useState(initial);
  const money = useMemo(() => currencies(), []);
  const form = useForm<StartValues>({
    resolver: checkStart,
    defaultValues: { ...first, ...handle.draft },
    mode: "onTouched",
  });
  useFormDraft(form, START_DRAFT, first, handle);
  const { errors } = form.formState;

  const leadOn = async () => {
    await handle.drop();
    void askToStay();
    router.replace("/");
  };
  const begin = form.handleSubmit(async (values) => {
    // The workshop's own row has its id, so that two windows that both begin make one workshop.
    if (await keep([make("workshops", beginFields(values, country), workshopId)])) await leadOn();
  });
  const lookRound = async () => {
    setLooking(true);
    try {
      const { demoWrites } = await import("@/lib/demo/demo-workshop");
      const today = todayIso();
      if (await keep((numbers) => demoWrites({ today, workshopId, numbers }))) await leadOn();
    } finally {
      setLooking(false);
    }
  };

  return (
    <>
      <Card aria-label="Your workshop">
        <form id="start" noValidate onSubmit={begin} className="grid gap-4">
          <Field label="Name of your workshop" error={errors.name?.message}>
            <TextInput autoComplete="organization" enterKeyHint="done" {...form.register("name")} />
          </Field>
          <Choice
            label="Your tape is read in"
            options={units}
            error={errors.unit?.message}
            {...form.register("unit")}
          />
          <Field label="Clients pay in" error={errors.currency?.message}>
            <Select {...form.register("currency")}>
              {money.map(({ code, name }) => (
                <option key={code} value={code}>
                  {name} ({code})
                </option>
              ))}
            </Select>
          </Field>
          <p className="text-sm text-soft">
            Country, for phone numbers: {countryName(country)}. All of this can be changed later under
            Workshop.
          </p>
        </form>
      </Card>
      <div className="screen-action lg:w-[calc(100%+1rem)]">
        <KeepTrouble keep={problem} draft={handle.problem} />
        <Button type="submit" form="start" variant="main" full busy={busy && !looking}>
          Begin
        </Button>
      </div>
      <GettingReady />
      <section aria-labelledby="or" className="grid gap-2">
        <h2 id="or" className="font-figure text-lg font-bold">
          Or else
        </h2>
        <Button full busy={looking} onClick={() => void lookRound()}>
          Look round an invented workshop
        </Button>
        <ReadInCopy full />
        <p className="text-sm text-soft">
          There is no account. What you write stays on this phone until you send it somewhere.
        </p>
      </section>
    </>
  );
}
