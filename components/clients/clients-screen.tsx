"use client";

import { ButtonLink } from "@/components/ui/button";
import { Beside, Screen } from "@/components/ui/screen";
import { ClientList } from "./client-list";

export function ClientsScreen() {
  return (
    <Screen
      wide
      title="Clients"
      action={
        <ButtonLink variant="main" full href="/clients/new">
          New client
        </ButtonLink>
      }
    >
      <Beside
        list={<ClientList />}
        nothing={
          <p className="rounded border-2 border-dashed border-edge px-4 py-8 text-center text-soft">
            Choose a client, and the card opens here.
          </p>
        }
      />
    </Screen>
  );
}
