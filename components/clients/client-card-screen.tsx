"use client";

import { useKeep, useView } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { Button, ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { clientBinQuestion } from "@/lib/clients/bin-question";
import { setRemoved } from "@/lib/journal/change";
import { currency } from "@/lib/money/currencies";
import { formatMoney } from "@/lib/money/format-money";
import { clientCardQuery, type ClientCardView } from "@/lib/store/queries/clients";
import { BinAsk } from "./bin-ask";
import { ClientOrders } from "./client-orders";
import { ClientWearers } from "./client-wearers";
import { ContactCard } from "./contact-card";
import { KeepTrouble } from "@/components/frame/form-notices";
import { backToClients, NotShown } from "@/components/frame/not-shown";
import { useIdParam } from "@/components/store/use-id-param";

function sayMoney(minor: number, code: string): string {
  const known = currency(code);
  return known ? formatMoney(minor, known) : `${minor} ${code}`;
}

const NOT_HERE = "This client is not in the book.";

export function ClientCardScreen() {
  const id = useIdParam("id");
  return id ? (
    <ClientCard key={id} id={id} />
  ) : (
    <NotShown back={backToClients} title="Client" state="known" say={NOT_HERE} />
  );
}

function ClientCard({ id }: { id: string }) {
  const { view, state } = useView(clientCardQuery, { id });
  if (!view) return <NotShown back={backToClients} title="Client" state={state} say={NOT_HERE} />;
  return view.client.removedAt === null ? <LiveClient view={view} /> : <BinnedClient view={view} />;
}

function LiveClient({ view: { client, wearers, orders } }: { view: ClientCardView }) {
  const today = useToday();
  const { keep, busy, problem } = useKeep();
  const putInBin = () => {
    const at = new Date().toISOString();
    // One moment for all of it: that is how what went along is known again.
    void keep([
      setRemoved("clients", client, at),
      ...orders.map(({ order }) => setRemoved("orders", order, at)),
    ]);
  };
  return (
    <Screen
      title={client.name}
      back={backToClients}
      tools={<ButtonLink href={`/clients/change?id=${client.id}`}>Change</ButtonLink>}
      action={
        <ButtonLink variant="main" full href={`/orders/new?client=${client.id}`}>
          New order
        </ButtonLink>
      }
    >
      <ContactCard client={client} />
      <ClientWearers clientId={client.id} wearers={wearers} today={today} />
      <ClientOrders orders={orders} />
      <div className="grid justify-items-start gap-2">
        <KeepTrouble keep={problem} draft={null} />
        <BinAsk
          question={clientBinQuestion(client, wearers.length, orders, sayMoney)}
          busy={busy}
          onYes={putInBin}
        />
      </div>
    </Screen>
  );
}

function BinnedClient({ view: { client, binnedWith } }: { view: ClientCardView }) {
  const { keep, busy, problem } = useKeep();
  const bringBack = () =>
    void keep([
      setRemoved("clients", client, null),
      ...binnedWith.map((order) => setRemoved("orders", order, null)),
    ]);
  const along =
    binnedWith.length === 0
      ? ""
      : binnedWith.length === 1
        ? ", with 1 order"
        : `, with ${binnedWith.length} orders`;
  return (
    <Screen title={client.name} back={backToClients}>
      <Notice
        live
        title={`${client.name} is in the bin${along}.`}
        action={
          <>
            <Button busy={busy} onClick={bringBack}>
              Bring back
            </Button>
            <ButtonLink href="/clients">All clients</ButtonLink>
          </>
        }
      >
        <KeepTrouble keep={problem} draft={null} />
      </Notice>
    </Screen>
  );
}
