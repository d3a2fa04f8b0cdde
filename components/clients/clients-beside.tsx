"use client";

import { usePathname } from "next/navigation";
import { type ReactNode, Suspense, useSyncExternalStore } from "react";
import { useView } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { wearerCardQuery } from "@/lib/store/queries/wearers";
import { ClientList } from "./client-list";
import { useIdParam } from "./use-id-param";

/** Where Tailwind's `lg` begins. */
const WIDE = "(min-width: 64rem)";

function subscribeWide(listener: () => void): () => void {
  const media = window.matchMedia(WIDE);
  media.addEventListener("change", listener);
  return () => media.removeEventListener("change", listener);
}

/** On a wide screen the list stays beside the card; a phone never draws it there. */
export function ClientsBeside({ children }: { children: ReactNode }) {
  const path = usePathname();
  const wide = useSyncExternalStore(
    subscribeWide,
    () => window.matchMedia(WIDE).matches,
    () => false,
  );
  if (path === "/clients") return children;
  return (
    <div className="lg:grid lg:grid-cols-[minmax(0,24.25rem)_minmax(0,1fr)]">
      <aside
        aria-labelledby="clients-beside"
        className="hidden lg:sticky lg:top-0 lg:block lg:max-h-dvh lg:self-start lg:overflow-y-auto lg:py-2 lg:ps-8 lg:pe-1"
      >
        {wide && (
          <>
            <div className="mb-4 flex items-center justify-between gap-2">
              <h2 id="clients-beside" className="font-figure text-2xl font-bold">
                Clients
              </h2>
              <ButtonLink href="/clients/new">New client</ButtonLink>
            </div>
            <div className="grid grid-cols-[minmax(0,1fr)] gap-4 pb-4">
              <Suspense>{path.startsWith("/wearers/") ? <ListWithWearer /> : <ListWithClient />}</Suspense>
            </div>
          </>
        )}
      </aside>
      <div className="min-w-0">{children}</div>
    </div>
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
