"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useMemo } from "react";
import { useForm, useWatch } from "react-hook-form";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { useFormDraft } from "@/components/store/use-form-draft";
import { type DraftHandle } from "@/components/store/use-draft";
import { Button } from "@/components/ui/button";
import { Screen, type ScreenProps } from "@/components/ui/screen";
import { wearerSchema, type WearerValues } from "@/lib/clients/wearer-form";
import { type KeepProblem } from "@/lib/store/keep-problem";
import { WearerInputs } from "./wearer-inputs";

export interface WearerFormProps extends Pick<ScreenProps, "title" | "sub" | "back"> {
  draftKey: string;
  handle: DraftHandle<WearerValues>;
  initial: WearerValues;
  today: string;
  /** The words of the button. */
  keepWords: string;
  busy: boolean;
  problem: KeepProblem | null;
  /** Keeps and moves on; the form stays as it is where nothing could be kept. */
  onKeep: (values: WearerValues) => Promise<void>;
}

/** The screen of one wearer, new or to be changed. */
export function WearerForm(props: WearerFormProps) {
  const { title, sub, back, draftKey, handle, initial, today, keepWords, busy, problem, onKeep } = props;
  const form = useForm<WearerValues>({
    resolver: useMemo(() => zodResolver(wearerSchema(today)), [today]),
    defaultValues: { ...initial, ...handle.draft },
    mode: "onTouched",
  });
  const draft = useFormDraft(form, draftKey, initial, handle);
  const known = useWatch({ control: form.control, name: "known" });
  return (
    <Screen
      title={title}
      sub={sub}
      back={back}
      action={
        <>
          <KeepTrouble keep={problem} draft={handle.problem} />
          <Button type="submit" form="wearer" variant="main" full busy={busy || form.formState.isSubmitting}>
            {keepWords}
          </Button>
        </>
      }
    >
      <BroughtBack draft={draft} />
      <form id="wearer" noValidate onSubmit={form.handleSubmit(onKeep)} className="grid gap-4">
        <WearerInputs
          today={today}
          known={known}
          register={(field) => form.register(field)}
          errors={form.formState.errors}
        />
      </form>
    </Screen>
  );
}
