"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useMemo, useState } from "react";
import { useForm, useWatch } from "react-hook-form";
import { useKeep, useView, useWorkshop } from "@/components/store/use-book";
import { type DraftHandle, useDraft } from "@/components/store/use-draft";
import { Button } from "@/components/ui/button";
import { Screen } from "@/components/ui/screen";
import { clientFields, clientSchema, type ClientValues, clientValues } from "@/lib/clients/client-form";
import { edit } from "@/lib/journal/change";
import { type Client } from "@/lib/records/types";
import { clientCardQuery } from "@/lib/store/queries/clients";
import { NameAndPhone, RestOfClient } from "./client-inputs";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { backToClients, NotShown, ScreenOpening } from "@/components/frame/not-shown";
import { SimilarNotice } from "./similar-notice";
import { useFormDraft } from "@/components/store/use-form-draft";
import { useIdParam } from "@/components/store/use-id-param";
import { readE164, usePhoneReading } from "@/components/store/use-phone-reading";

const TITLE = "Change the client";
const NOT_HERE = "This client is not in the book.";

const draftKey = (id: string): string => `client:change:${id}`;

export function ChangeClientScreen() {
  const id = useIdParam("id");
  return id ? (
    <Change key={id} id={id} />
  ) : (
    <NotShown back={backToClients} title={TITLE} state="known" say={NOT_HERE} />
  );
}

function Change({ id }: { id: string }) {
  const { view, state } = useView(clientCardQuery, { id });
  const handle = useDraft<ClientValues>(draftKey(id));
  if (!view) return <NotShown back={backToClients} title={TITLE} state={state} say={NOT_HERE} />;
  if (handle.draft === undefined) return <ScreenOpening title={TITLE} />;
  return <ChangeForm client={view.client} handle={handle} />;
}

function ChangeForm({ client, handle }: { client: Client; handle: DraftHandle<ClientValues> }) {
  const router = useRouter();
  const country = useWorkshop()?.country ?? "";
  const { keep, busy, problem } = useKeep();
  // The row as it was when the form was opened: what changed elsewhere since is left as it is.
  const [seen] = useState(client);
  const initial = useMemo(() => clientValues(seen), [seen]);
  const [phoneLeft, setPhoneLeft] = useState(true);
  const form = useForm<ClientValues>({
    resolver: zodResolver(clientSchema),
    defaultValues: { ...initial, ...handle.draft },
    mode: "onTouched",
  });
  const draft = useFormDraft(form, draftKey(seen.id), initial, handle);
  const [name, phone] = useWatch({ control: form.control, name: ["name", "phone"] });
  const reading = usePhoneReading(phone, country);
  const card = `/clients/card?id=${seen.id}`;

  const submit = form.handleSubmit(async (values) => {
    const phoneE164 =
      values.phone.trim() === seen.phone ? seen.phoneE164 : await readE164(values.phone, country);
    const change = edit("clients", seen, clientFields(values, phoneE164));
    if (Object.keys(change.fields).length > 0 && !(await keep([change]))) return;
    await handle.drop();
    router.replace(card);
  });

  return (
    <Screen
      title={TITLE}
      back={{ href: card, label: seen.name }}
      action={
        <>
          <KeepTrouble keep={problem} draft={handle.problem} />
          <Button type="submit" form="client" variant="main" full busy={busy || form.formState.isSubmitting}>
            Keep the changes
          </Button>
        </>
      }
    >
      <BroughtBack draft={draft} />
      <form id="client" noValidate onSubmit={submit} className="grid gap-4">
        <NameAndPhone
          register={(field) =>
            form.register(
              field,
              field === "phone"
                ? { onChange: () => setPhoneLeft(false), onBlur: () => setPhoneLeft(true) }
                : undefined,
            )
          }
          errors={form.formState.errors}
          reading={reading}
          phoneLeft={phoneLeft}
        />
        <SimilarNotice typed={{ name, phone, phoneE164: reading?.e164 ?? null }} exceptId={seen.id} />
        <RestOfClient register={(field) => form.register(field)} errors={form.formState.errors} />
      </form>
    </Screen>
  );
}
