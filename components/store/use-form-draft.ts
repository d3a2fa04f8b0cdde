"use client";

import { useEffect } from "react";
import { type FieldValues, type UseFormReturn } from "react-hook-form";
import { type DraftHandle } from "@/components/store/use-draft";
import { dropDraft } from "@/lib/store/drafts";

export interface FormDraft {
  /** True where the form was opened with something typed earlier. */
  broughtBack: boolean;
  /** Empties the form back to what it began with. */
  startOver(): void;
}

const same = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b);

/** Puts down a form's typing on each change; where nothing differs from `initial`, nothing is left lying. */
export function useFormDraft<T extends FieldValues>(
  form: UseFormReturn<T>,
  key: string,
  initial: T,
  { draft, save }: DraftHandle<T>,
): FormDraft {
  useEffect(
    () =>
      form.subscribe({
        formState: { values: true },
        callback: ({ values }) =>
          void (same(values, initial) ? dropDraft(key).catch(() => undefined) : save(values)),
      }),
    [form, key, initial, save],
  );
  return {
    broughtBack: Boolean(draft) && !same(draft, initial),
    startOver: () => form.reset(initial),
  };
}
