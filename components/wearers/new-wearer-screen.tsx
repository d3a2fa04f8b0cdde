"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { backToClients, NotShown, ScreenOpening } from "@/components/frame/not-shown";
import { useIdParam } from "@/components/store/use-id-param";
import { useKeep, useView } from "@/components/store/use-book";
import { useDraft } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { emptyWearer, wearerFields, type WearerValues } from "@/lib/clients/wearer-form";
import { make, newId } from "@/lib/journal/change";
import { clientCardQuery } from "@/lib/store/queries/clients";
import { WearerForm } from "./wearer-form";

const TITLE = "New wearer";
const NOT_HERE = "The client of this wearer is not in the book.";

export function NewWearerScreen() {
  const client = useIdParam("client");
  return client ? (
    <NewOf key={client} clientId={client} />
  ) : (
    <NotShown back={backToClients} title={TITLE} state="known" say={NOT_HERE} />
  );
}

function NewOf({ clientId }: { clientId: string }) {
  const router = useRouter();
  const today = useToday();
  const [initial] = useState(() => emptyWearer(today));
  const { view, state } = useView(clientCardQuery, { id: clientId });
  const key = `client:${clientId}:new-wearer`;
  const handle = useDraft<WearerValues>(key);
  const { keep, busy, problem } = useKeep();
  if (!view) return <NotShown back={backToClients} title={TITLE} state={state} say={NOT_HERE} />;
  if (handle.draft === undefined) return <ScreenOpening title={TITLE} />;
  return (
    <WearerForm
      title={TITLE}
      sub={`For ${view.client.name}`}
      back={{ href: `/clients/card?id=${clientId}`, label: view.client.name }}
      draftKey={key}
      handle={handle}
      initial={initial}
      today={today}
      keepWords="Keep the wearer"
      busy={busy}
      problem={problem}
      onKeep={async (values) => {
        const id = newId();
        if (!(await keep([make("wearers", wearerFields(values, clientId), id)]))) return;
        await handle.drop();
        router.replace(`/wearers/card?id=${id}`);
      }}
    />
  );
}
