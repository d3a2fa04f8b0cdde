"use client";

import { useIsFetching } from "@tanstack/react-query";
import { Phone, Search, X } from "lucide-react";
import { useId, useRef } from "react";
import { useView } from "@/components/store/use-book";
import { AppLink } from "@/components/ui/app-link";
import { Button, ButtonLink } from "@/components/ui/button";
import { Card, Rows } from "@/components/ui/card";
import { Empty } from "@/components/ui/empty";
import { TextInput } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { countWords, namesInWords, newClientHref, PAGE } from "@/lib/clients/list-words";
import { phoneLinks } from "@/lib/clients/phone-links";
import { clientListQuery, type ClientListItem } from "@/lib/store/queries/clients";
import { setListPlace, useListPlace } from "./list-place";
import { useSettled } from "@/components/store/use-settled";

const ASK_AFTER_MS = 120;

/** Clients by name, found as one types. `chosen` is the one whose card stands beside. */
export function ClientList({ chosen }: { chosen?: string | null }) {
  const { find, limit } = useListPlace();
  const asked = find.trim();
  const args = { find: useSettled(asked, ASK_AFTER_MS), limit };
  const { view, state } = useView(clientListQuery, args);
  const fetching = useIsFetching({ queryKey: [clientListQuery.name, args] }) > 0;
  // Until the database has answered for these very words, an empty list says nothing.
  const sure = state === "known" && !fetching && args.find === asked;
  const shown = view.items.length;
  const none = shown === 0 && sure;
  const showMore = () => setListPlace({ find, limit: limit + PAGE });

  return (
    <>
      {!(none && asked === "") && <FindField find={find} />}
      {state === "opening" && <Progress label="Opening the book" />}
      {state === "failed" && (
        <Notice tone="wrong" title="The list did not open. Close Notchbook and open it again." />
      )}
      <p role="status" className={none ? "sr-only" : "text-soft"}>
        {none && (asked === "" ? "No clients yet" : `No one matches “${asked}”`)}
        {!none && shown === 0 && state === "known" && "Looking …"}
        {shown > 0 && countWords({ shown, more: view.more, find: asked })}
      </p>
      {none && (asked === "" ? <NoClients /> : <NoMatch find={asked} />)}
      {shown > 0 && (
        <Card flush notches={1} aria-label="Clients by name">
          <Rows>
            {view.items.map((item) => (
              <ClientRow key={item.client.id} item={item} chosen={item.client.id === chosen} />
            ))}
          </Rows>
        </Card>
      )}
      {view.more && (
        <Button full onClick={showMore} busy={fetching && shown < limit}>
          Show more
        </Button>
      )}
    </>
  );
}

function FindField({ find }: { find: string }) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  return (
    <div role="search" className="grid gap-1.5">
      <label htmlFor={id} className="font-semibold">
        Find by name, phone or wearer
      </label>
      <div className="relative">
        <Search
          aria-hidden="true"
          className="pointer-events-none absolute start-3 top-1/2 size-5 -translate-y-1/2 text-soft"
        />
        <TextInput
          id={id}
          ref={input}
          value={find}
          onChange={(event) => setListPlace({ find: event.target.value, limit: PAGE })}
          autoComplete="off"
          autoCorrect="off"
          spellCheck={false}
          enterKeyHint="search"
          className="ps-11 pe-12"
        />
        {find !== "" && (
          <button
            type="button"
            className="absolute inset-y-0 end-0 flex w-12 items-center justify-center"
            onClick={() => {
              setListPlace({ find: "", limit: PAGE });
              input.current?.focus();
            }}
          >
            <X aria-hidden="true" className="size-5" />
            <span className="sr-only">Show all clients</span>
          </button>
        )}
      </div>
    </div>
  );
}

function ClientRow({ item: { client, wearers }, chosen }: { item: ClientListItem; chosen: boolean }) {
  const links = phoneLinks(client.phone, client.phoneE164);
  return (
    <li className="flex items-stretch">
      <AppLink
        href={`/clients/card?id=${client.id}`}
        className="row row-link min-w-0 flex-1"
        aria-current={chosen ? "true" : undefined}
      >
        <span className="min-w-0">
          <span className="block font-semibold wrap-anywhere">{client.name}</span>
          {wearers.length > 0 && (
            <span className="block text-sm text-soft wrap-anywhere">
              <span className="sr-only">Sewing for </span>
              {namesInWords(wearers.map(({ name }) => name))}
            </span>
          )}
        </span>
      </AppLink>
      {links && (
        <a
          href={links.call}
          className="flex w-14 shrink-0 items-center justify-center border-s border-line text-chalk hover:bg-well"
          aria-label={`Call ${client.name}, ${client.phone}`}
        >
          <Phone aria-hidden="true" className="size-5" />
        </a>
      )}
    </li>
  );
}

function NoClients() {
  return (
    <Empty
      say={
        <>
          <p className="font-semibold">Here stand your clients, by name.</p>
          <p>Each with the people you sew for, their figures and their orders.</p>
        </>
      }
      action={<ButtonLink href="/clients/new">Add the first client</ButtonLink>}
    />
  );
}

function NoMatch({ find }: { find: string }) {
  return (
    <Empty
      say={<p className="wrap-anywhere">No one matches “{find}”. Fewer letters find more.</p>}
      action={<ButtonLink href={newClientHref(find)}>Add “{find}” as a new client</ButtonLink>}
    />
  );
}
