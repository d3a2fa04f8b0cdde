"use client";

import { usePathname } from "next/navigation";
import { type ReactNode } from "react";
import { ListBeside } from "@/components/frame/list-beside";
import { useView } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { wearerCardQuery } from "@/lib/store/queries/wearers";
import { ClientList } from "./client-list";
import { useIdParam } from "@/components/store/use-id-param";

export function ClientsBeside({ children }: { children: ReactNode }) {
  const path = usePathname();
  return (
    <ListBeside
      href="/clients"
      title="Clients"
      action={<ButtonLink href="/clients/new">New client</ButtonLink>}
      list={path.startsWith("/wearers/") ? <ListWithWearer /> : <ListWithClient />}
    >
      {children}
    </ListBeside>
  );
}

function ListWithClient() {
  return <ClientList chosen={useIdParam("id")} />;
}

function ListWithWearer() {
  const client = useIdParam("client");
  const wearer = useIdParam("id");
  return wearer ? <ListWithClientOf wearer={wearer} /> : <ClientList chosen={client} />;
}

function ListWithClientOf({ wearer }: { wearer: string }) {
  const { view } = useView(wearerCardQuery, { id: wearer });
  return <ClientList chosen={view?.wearer.clientId} />;
}
