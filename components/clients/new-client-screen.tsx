"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter, useSearchParams } from "next/navigation";
import { useMemo, useState } from "react";
import { useForm, useWatch } from "react-hook-form";
import { useKeep, useWorkshop } from "@/components/store/use-book";
import { type DraftHandle, useDraft } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { Button } from "@/components/ui/button";
import { Screen } from "@/components/ui/screen";
import {
  clientFields,
  emptyClient,
  firstWearers,
  newClientSchema,
  type NewClientValues,
} from "@/lib/clients/client-form";
import { make, newId } from "@/lib/journal/change";
import { NameAndPhone, RestOfClient } from "./client-inputs";
import { FirstWearers } from "./first-wearers";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { backToClients, ScreenOpening } from "@/components/frame/not-shown";
import { SimilarNotice } from "./similar-notice";
import { useFormDraft } from "@/components/store/use-form-draft";
import { readE164, usePhoneReading } from "@/components/store/use-phone-reading";

const KEY = "client:new";
const TITLE = "New client";

export function NewClientScreen() {
  const params = useSearchParams();
  const handle = useDraft<NewClientValues>(KEY);
  const name = params.get("name") ?? "";
  const phone = params.get("phone") ?? "";
  const initial = useMemo(
    (): NewClientValues => ({ ...emptyClient, name, phone, self: false, wearers: [] }),
    [name, phone],
  );
  if (handle.draft === undefined) return <ScreenOpening title={TITLE} />;
  return <NewClientForm initial={initial} handle={handle} />;
}

function NewClientForm({
  initial,
  handle,
}: {
  initial: NewClientValues;
  handle: DraftHandle<NewClientValues>;
}) {
  const router = useRouter();
  const today = useToday();
  const country = useWorkshop()?.country ?? "";
  const { keep, busy, problem } = useKeep();
  const [phoneLeft, setPhoneLeft] = useState(Boolean(handle.draft?.phone || initial.phone));
  const form = useForm<NewClientValues>({
    resolver: useMemo(() => zodResolver(newClientSchema(today)), [today]),
    defaultValues: { ...initial, ...handle.draft },
    mode: "onTouched",
  });
  const draft = useFormDraft(form, KEY, initial, handle);
  const [name, phone] = useWatch({ control: form.control, name: ["name", "phone"] });
  const reading = usePhoneReading(phone, country);

  const submit = form.handleSubmit(async (values) => {
    const id = newId();
    const phoneE164 = await readE164(values.phone, country);
    const kept = await keep([
      make("clients", clientFields(values, phoneE164), id),
      ...firstWearers(values, id).map((wearer) => make("wearers", wearer)),
    ]);
    if (!kept) return;
    await handle.drop();
    router.replace(`/clients/card?id=${id}`);
  });

  return (
    <Screen
      title={TITLE}
      back={backToClients}
      action={
        <>
          <KeepTrouble keep={problem} draft={handle.problem} />
          <Button type="submit" form="client" variant="main" full busy={busy || form.formState.isSubmitting}>
            Keep the client
          </Button>
        </>
      }
    >
      <BroughtBack draft={draft} />
      <form id="client" noValidate onSubmit={submit} className="grid gap-4">
        <NameAndPhone
          register={(field) =>
            form.register(field, field === "phone" ? { onBlur: () => setPhoneLeft(true) } : undefined)
          }
          errors={form.formState.errors}
          reading={reading}
          phoneLeft={phoneLeft}
        />
        <SimilarNotice typed={{ name, phone, phoneE164: reading?.e164 ?? null }} />
        <FirstWearers form={form} today={today} />
        <h2 className="font-figure text-lg font-bold">More about the client</h2>
        <RestOfClient register={(field) => form.register(field)} errors={form.formState.errors} />
      </form>
    </Screen>
  );
}
