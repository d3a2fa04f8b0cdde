"use client";

import { useView } from "@/components/store/use-book";
import { AppLink } from "@/components/ui/app-link";
import { Notice } from "@/components/ui/notice";
import { similarClients, similarWords, type TypedClient } from "@/lib/clients/similar-client";
import { clientListQuery } from "@/lib/store/queries/clients";
import { useSettled } from "@/components/store/use-settled";

const ASK_AFTER_MS = 400;
/** Of a common name there may be several before the one that is the same. */
const LOOK_AT = 30;

type Props = {
  typed: TypedClient;
  /** The client being changed. */
  exceptId?: string;
};

/** Points out who may be in the book already; it stops nothing. */
export function SimilarNotice({ typed, exceptId }: Props) {
  const settled = JSON.parse(useSettled(JSON.stringify(typed), ASK_AFTER_MS)) as TypedClient;
  const name = settled.name.trim();
  const figures = (settled.phoneE164 ?? settled.phone).replace(/\D/gu, "");
  if (name === "" && figures === "") return null;
  return <Found typed={settled} byName={name || figures} byPhone={figures || name} exceptId={exceptId} />;
}

function Found({ typed, byName, byPhone, exceptId }: Props & { byName: string; byPhone: string }) {
  const names = useView(clientListQuery, { find: byName, limit: LOOK_AT }).view.items;
  const phones = useView(clientListQuery, { find: byPhone, limit: LOOK_AT }).view.items;
  const clients = new Map([...names, ...phones].map(({ client }) => [client.id, client]));
  const similar = similarClients(typed, [...clients.values()], exceptId);
  if (similar.length === 0) return null;
  return (
    <Notice
      live
      tone="look"
      title={similar.length === 1 ? "Is this client in the book already?" : "Is this one of these clients?"}
    >
      <ul className="grid gap-1">
        {similar.map((one) => (
          <li key={one.client.id}>
            <AppLink
              href={`/clients/card?id=${one.client.id}`}
              className="inline-flex min-h-target items-center font-semibold wrap-anywhere"
            >
              {one.client.name}
            </AppLink>
            <span className="block text-sm text-soft">{similarWords(one)}</span>
          </li>
        ))}
      </ul>
      <p className="text-sm">If it is someone else, go on: both will be kept.</p>
    </Notice>
  );
}
