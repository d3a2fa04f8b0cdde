"use client";

import { useDeferredValue, useMemo, useState } from "react";
import { useRouter } from "next/navigation";
import { useForm, useWatch } from "react-hook-form";
import { BinAsk } from "@/components/clients/bin-ask";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { ShareButton } from "@/components/measure/share-button";
import { useKeep } from "@/components/store/use-book";
import { type DraftHandle } from "@/components/store/use-draft";
import { useFormDraft } from "@/components/store/use-form-draft";
import { Button, ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Field, TextArea, TextInput } from "@/components/ui/field";
import { Phrase } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { edit, make, newId, setRemoved } from "@/lib/journal/change";
import { type Client, type Fineness, type Order, type Sum } from "@/lib/records/types";
import { fieldsAsked, type SewingSum, type SumWorked, workSum } from "@/lib/sewing";
import { missingWords, readSumForm, sumFields, type SumForm, suggestedSumName } from "@/lib/sums/sum-form";
import { sumShareText } from "@/lib/sums/sum-words";
import { backToSums, sumHref } from "./places";
import { SumDrawing } from "./sum-drawing";
import { SumField } from "./sum-field";
import { SumOrder } from "./sum-order";
import { MainFigures, SumResults } from "./sum-results";
import "./sums.css";

type Good = SumWorked & { ok: true };

export interface SumEditorProps {
  draftKey: string;
  sum: SewingSum;
  /** The row as it was when the form was opened; null for a new sum. */
  kept: Sum | null;
  /** The order that it is on, or that it was begun from. */
  on: { order: Order; client: Client | null } | null;
  initial: SumForm;
  /** What the form opens with: `initial`, or what was being typed. */
  begin: SumForm;
  handle: DraftHandle<SumForm>;
  fineness: Fineness;
  justKept: boolean;
  /** Kept, and the screen stays. */
  onKept?(): void;
}

/** One sewing sum: what it asks, drawn and worked out while it is typed. */
export function SumEditor(props: SumEditorProps) {
  const { begin, draftKey, fineness, handle, initial, justKept, kept, on, onKept, sum } = props;
  const { unit } = initial;
  const router = useRouter();
  const { busy, keep, problem } = useKeep();
  const form = useForm<SumForm>({ defaultValues: begin });
  const draft = useFormDraft(form, draftKey, initial, handle);
  const values = useWatch({ control: form.control }) as SumForm;
  const [pressed, setPressed] = useState(false);
  const read = useMemo(() => readSumForm(sum, { ...values, unit }, fineness), [sum, values, unit, fineness]);
  const worked = read.worked?.ok ? read.worked : null;
  const shown = useLastWorked(worked);
  const later = useDeferredValue(worked);
  const suggested = suggestedSumName(sum, read, unit, fineness);
  const name = values.name.trim() || suggested;
  const marked = { unit, fineness };

  const keepIt = async () => {
    setPressed(true);
    if (!worked) {
      const bad = read.missing[0]?.key ?? Object.keys(read.errors)[0];
      if (bad) form.setFocus(`typed.${bad}`);
      return;
    }
    const id = kept?.id ?? newId();
    const fields = sumFields(sum, values, read, suggested);
    if (!(await keep([kept ? edit("sums", kept, fields) : make("sums", fields, id)]))) return;
    await handle.drop();
    if (onKept) onKept();
    else router.replace(`${sumHref(id)}&kept=1`);
  };
  const missing = new Set(read.missing.map(({ key }) => key));

  return (
    <Screen
      title={kept?.name ?? sum.name}
      sub={<Phrase parts={[...sum.rule]} {...marked} />}
      back={on ? { href: `/orders/card?id=${on.order.id}`, label: "The order" } : backToSums}
      wide
      action={
        <div className="grid gap-2">
          {pressed && !worked && (
            <Notice
              live
              tone="wrong"
              title={
                missing.size > 0
                  ? `Type ${missingWords(read.missing)}, then keep it.`
                  : "Put right what is marked, then keep it."
              }
            />
          )}
          <KeepTrouble keep={problem} draft={handle.problem} />
          <Button variant="main" full busy={busy} onClick={() => void keepIt()}>
            Keep
          </Button>
        </div>
      }
    >
      <BroughtBack draft={draft} />
      {justKept && kept && !draft.broughtBack && (
        <Notice live tone="good" title={`${kept.name} is kept on this phone.`}>
          {on && on.order.id === kept.orderId && (
            <div>
              <ButtonLink href={`/orders/card?id=${on.order.id}`}>To its order</ButtonLink>
            </div>
          )}
        </Notice>
      )}
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-4 lg:grid-cols-[minmax(0,27rem)_minmax(0,1fr)] lg:gap-6">
        <div className="sum-panel lg:col-start-2 lg:row-start-1">
          <SumDrawing
            drawing={(shown ?? exampleOf(sum)).drawing}
            faint={shown === null || shown !== worked}
            {...marked}
          />
          {worked ? (
            <div role="status">
              <MainFigures worked={worked} {...marked} />
            </div>
          ) : (
            <p role="status" className="border-t-2 border-edge px-4 py-2">
              {Object.keys(read.errors).length > 0
                ? "Put right what is marked below, and it is worked out."
                : `Type ${missingWords(read.missing)}, and it is worked out.`}
            </p>
          )}
        </div>
        <div className="sum-form grid min-w-0 grid-cols-[minmax(0,1fr)] content-start gap-5 lg:row-span-2">
          <Card aria-label="What is known">
            <div className="grid grid-cols-[minmax(0,1fr)] gap-5">
              {fieldsAsked(sum, read.inputs).map((field) => (
                <SumField
                  key={field.key}
                  {...{ field, form }}
                  {...marked}
                  error={
                    read.errors[field.key] ??
                    (pressed && missing.has(field.key) ? [`Type ${missingWords([field])}.`] : undefined)
                  }
                />
              ))}
            </div>
          </Card>
        </div>
        <div className="grid min-w-0 grid-cols-[minmax(0,1fr)] content-start gap-5 lg:col-start-2">
          {later && <SumResults worked={later} {...marked} />}
          <p className="text-sm text-soft">Rule: {sum.source}.</p>
          <Card aria-labelledby="sum-keep">
            <CardHead id="sum-keep" title="Name and order" />
            <div className="grid grid-cols-[minmax(0,1fr)] gap-5">
              <Field
                label="Name"
                optional
                hint={values.name.trim() ? undefined : `Left empty, it is called “${suggested}”.`}
              >
                <TextInput {...form.register("name")} maxLength={120} />
              </Field>
              <SumOrder form={form} on={on} />
              <Field label="Note" optional>
                <TextArea {...form.register("note")} maxLength={2000} />
              </Field>
            </div>
          </Card>
          {worked && (
            <ShareButton title={name} text={sumShareText(sum, name, read, worked, unit, fineness)} />
          )}
          {kept && (
            <div>
              <BinAsk
                question={{
                  title: `Put ${kept.name} in the bin?`,
                  say: ["It can be brought back from the bin."],
                }}
                busy={busy}
                onYes={() => void keep([setRemoved("sums", kept, new Date().toISOString())])}
              />
            </div>
          )}
        </div>
      </div>
    </Screen>
  );
}

function exampleOf(sum: SewingSum): Good {
  const worked = workSum(sum, sum.example);
  if (!worked.ok) throw new Error(`The example of ${sum.id} does not work.`);
  return worked;
}

/** The sum, or while it cannot be worked the last that could; null before the first. */
function useLastWorked(worked: Good | null): Good | null {
  const [last, setLast] = useState<Good | null>(null);
  if (worked && worked !== last) setLast(worked);
  return worked ?? last;
}
