"use client";

import { useRouter } from "next/navigation";
import { useMemo, useState } from "react";
import { backToClients, NotShown, ScreenOpening } from "@/components/frame/not-shown";
import { useIdParam } from "@/components/store/use-id-param";
import { useKeep, useView } from "@/components/store/use-book";
import { type DraftHandle, useDraft } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { wearerFields, type WearerValues, wearerValues } from "@/lib/clients/wearer-form";
import { edit } from "@/lib/journal/change";
import { type Wearer } from "@/lib/records/types";
import { wearerCardQuery } from "@/lib/store/queries/wearers";
import { WearerForm } from "./wearer-form";

const TITLE = "Change the wearer";
const NOT_HERE = "This wearer is not in the book.";

const draftKey = (id: string): string => `client:wearer:change:${id}`;

export function ChangeWearerScreen() {
  const id = useIdParam("id");
  return id ? (
    <Change key={id} id={id} />
  ) : (
    <NotShown back={backToClients} title={TITLE} state="known" say={NOT_HERE} />
  );
}

function Change({ id }: { id: string }) {
  const { view, state } = useView(wearerCardQuery, { id });
  const handle = useDraft<WearerValues>(draftKey(id));
  if (!view) return <NotShown back={backToClients} title={TITLE} state={state} say={NOT_HERE} />;
  if (handle.draft === undefined) return <ScreenOpening title={TITLE} />;
  return <ChangeForm wearer={view.wearer} handle={handle} />;
}

function ChangeForm({ wearer, handle }: { wearer: Wearer; handle: DraftHandle<WearerValues> }) {
  const router = useRouter();
  const today = useToday();
  const { keep, busy, problem } = useKeep();
  // The row as it was when the form was opened: what changed elsewhere since is left as it is.
  const [seen] = useState(wearer);
  const [opened] = useState(today);
  const initial = useMemo(() => wearerValues(seen, opened), [seen, opened]);
  const card = `/wearers/card?id=${seen.id}`;
  return (
    <WearerForm
      title={TITLE}
      back={{ href: card, label: seen.name }}
      draftKey={draftKey(seen.id)}
      handle={handle}
      initial={initial}
      today={today}
      keepWords="Keep the changes"
      busy={busy}
      problem={problem}
      onKeep={async (values) => {
        const change = edit("wearers", seen, wearerFields(values, seen.clientId));
        if (Object.keys(change.fields).length > 0 && !(await keep([change]))) return;
        await handle.drop();
        router.replace(card);
      }}
    />
  );
}
