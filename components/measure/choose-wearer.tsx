"use client";

import { useIsFetching } from "@tanstack/react-query";
import { useState } from "react";
import { backToClients } from "@/components/frame/not-shown";
import { useSettled } from "@/components/store/use-settled";
import { useView } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { Button, ButtonLink } from "@/components/ui/button";
import { Card, RowLink, Rows } from "@/components/ui/card";
import { Empty } from "@/components/ui/empty";
import { Field, TextInput } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { wearerWords } from "@/lib/clients/age-words";
import { countWords, newClientHref, PAGE } from "@/lib/clients/list-words";
import { clientCardQuery, clientListQuery, type ClientListItem } from "@/lib/store/queries/clients";

const ASK_AFTER_MS = 120;

/** Whom the tape is put round: found as one types, by the client's name, phone, or the wearer's own. */
export function ChooseWearer({ clientId }: { clientId: string | null }) {
  return clientId === null ? <FromAll /> : <FromClient clientId={clientId} />;
}

function FromAll() {
  const [find, setFind] = useState("");
  const [limit, setLimit] = useState(PAGE);
  const asked = find.trim();
  const args = { find: useSettled(asked, ASK_AFTER_MS), limit };
  const { view, state } = useView(clientListQuery, args);
  const fetching = useIsFetching({ queryKey: [clientListQuery.name, args] }) > 0;
  const sure = state === "known" && !fetching && args.find === asked;
  const none = view.items.length === 0;
  const addNew = (
    <ButtonLink href={newClientHref(asked)}>
      {asked === "" ? "Add someone new" : `Add “${asked}” as someone new`}
    </ButtonLink>
  );

  return (
    <Screen title="Who is measured?" back={backToClients}>
      <Field label="Find by name, phone or wearer">
        <TextInput
          value={find}
          onChange={(event) => {
            setFind(event.target.value);
            setLimit(PAGE);
          }}
          autoComplete="off"
          autoCorrect="off"
          spellCheck={false}
          enterKeyHint="search"
        />
      </Field>
      {state === "opening" && <Progress label="Opening the book" />}
      {state === "failed" && (
        <Notice tone="wrong" title="The list did not open. Close Notchbook and open it again." />
      )}
      <p role="status" className={none ? "sr-only" : "text-soft"}>
        {!none && countWords({ shown: view.items.length, more: view.more, find: asked })}
        {none && sure && (asked === "" ? "No clients yet" : `No one matches “${asked}”`)}
      </p>
      {none && sure && (
        <Empty
          say={
            asked === ""
              ? "Here stand the people you sew for. Add the first, and take her figures."
              : `No one matches “${asked}”. Fewer letters find more.`
          }
          action={addNew}
        />
      )}
      {!none && (
        <>
          <Card flush aria-label="People to measure, by client">
            <Rows>{view.items.flatMap((item) => wearerRows(item))}</Rows>
          </Card>
          <div className="flex flex-wrap gap-2">
            {view.more && (
              <Button busy={fetching} onClick={() => setLimit(limit + PAGE)}>
                Show more
              </Button>
            )}
            {addNew}
          </div>
        </>
      )}
    </Screen>
  );
}

/** One row for each wearer; a client with none yet leads to adding one. */
function wearerRows({ client, wearers }: ClientListItem) {
  if (wearers.length === 0)
    return [
      <RowLink
        key={client.id}
        href={`/wearers/new?client=${client.id}`}
        title={client.name}
        sub="No wearer yet. Add who is sewn for"
      />,
    ];
  return wearers.map((wearer) => (
    <RowLink
      key={wearer.id}
      href={`/measure?wearer=${wearer.id}`}
      title={wearer.name}
      sub={wearer.name === client.name ? undefined : `For ${client.name}`}
    />
  ));
}

function FromClient({ clientId }: { clientId: string }) {
  const today = useToday();
  const { view, state } = useView(clientCardQuery, { id: clientId });
  if (!view && state === "known") return <FromAll />;
  return (
    <Screen
      title="Who is measured?"
      sub={view?.client.name}
      back={{ href: `/clients/card?id=${clientId}`, label: view?.client.name ?? "Client" }}
    >
      {!view && state === "opening" && <Progress label="Opening the book" />}
      {state === "failed" && (
        <Notice tone="wrong" title="The list did not open. Close Notchbook and open it again." />
      )}
      {view && view.wearers.length === 0 && (
        <Empty
          say={`No one is sewn for yet under ${view.client.name}.`}
          action={<ButtonLink href={`/wearers/new?client=${clientId}`}>Add a wearer</ButtonLink>}
        />
      )}
      {view && view.wearers.length > 0 && (
        <Card flush aria-label={`People sewn for under ${view.client.name}`}>
          <Rows>
            {view.wearers.map(({ wearer }) => (
              <RowLink
                key={wearer.id}
                href={`/measure?wearer=${wearer.id}&client=${clientId}`}
                title={wearer.name}
                sub={wearerWords(wearer, today)}
              />
            ))}
          </Rows>
        </Card>
      )}
      {view && view.wearers.length > 0 && (
        <ButtonLink className="justify-self-start" href={`/wearers/new?client=${clientId}`}>
          Add another wearer
        </ButtonLink>
      )}
    </Screen>
  );
}
