"use client";

import { useNow } from "@/components/frame/use-now";
import { useView } from "@/components/store/use-book";
import { Card, RowLink, Rows } from "@/components/ui/card";
import { orderName } from "@/lib/orders/order-name";
import { clientCardQuery } from "@/lib/store/queries/clients";
import { orderCardQuery } from "@/lib/store/queries/orders";
import { wearerCardQuery } from "@/lib/store/queries/wearers";
import { sinceWords } from "@/lib/workshop/since-words";
import { type UnfinishedDraft } from "./use-unfinished";

/** What was begun and not kept, offered again. */
export function UnfinishedCard({ drafts }: { drafts: readonly UnfinishedDraft[] }) {
  if (drafts.length === 0) return null;
  return (
    <section aria-labelledby="unfinished" className="grid gap-2">
      <h2 id="unfinished" className="font-figure text-lg font-bold">
        Go on with
      </h2>
      <Card flush aria-label="Begun and not kept">
        <Rows>
          {drafts.map((draft) => (
            <UnfinishedRow key={draft.key} draft={draft} />
          ))}
        </Rows>
      </Card>
    </section>
  );
}

function UnfinishedRow({ draft: { what, savedAt } }: { draft: UnfinishedDraft }) {
  const since = `last touched ${sinceWords(new Date(savedAt), useNow())}`;
  if (what.kind === "set") return <SetRow {...what} since={since} />;
  if (what.kind === "new-order") return <NewOrderRow {...what} since={since} />;
  return <OrderDraftRow {...what} since={since} />;
}

type RowOf = { href: string; since: string };

function SetRow({
  wearerId,
  taken,
  of,
  href,
  since,
}: RowOf & { wearerId: string; taken: number; of: number }) {
  const { view } = useView(wearerCardQuery, { id: wearerId });
  if (!view || view.wearer.removedAt !== null) return null;
  return (
    <RowLink
      href={href}
      title={`Measuring ${view.wearer.name}`}
      sub={`${taken} of ${of} figures, ${since}`}
    />
  );
}

function NewOrderRow({ clientId, href, since }: RowOf & { clientId: string }) {
  const { view } = useView(clientCardQuery, { id: clientId });
  if (!view || view.client.removedAt !== null) return null;
  return <RowLink href={href} title={`New order for ${view.client.name}`} sub={`Not kept yet, ${since}`} />;
}

const sayOf = {
  "change-order": "Changing",
  money: "Taking money for",
  "giving-back": "Giving money back for",
} as const;

function OrderDraftRow({
  kind,
  orderId,
  href,
  since,
}: RowOf & { kind: keyof typeof sayOf; orderId: string }) {
  const { view } = useView(orderCardQuery, { id: orderId });
  if (!view || view.order.removedAt !== null) return null;
  const whose = view.client ? `, ${view.client.name}` : "";
  return (
    <RowLink
      href={href}
      title={`${sayOf[kind]} ${orderName(view.order)}${whose}`}
      sub={`Not kept yet, ${since}`}
    />
  );
}
