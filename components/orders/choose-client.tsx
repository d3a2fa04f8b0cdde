"use client";

import { useState } from "react";
import { useSettled } from "@/components/store/use-settled";
import { useView } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { Card, RowLink, Rows } from "@/components/ui/card";
import { Empty } from "@/components/ui/empty";
import { Field, TextInput } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { namesInWords, newClientHref } from "@/lib/clients/list-words";
import { clientListQuery } from "@/lib/store/queries/clients";
import { backToOrders } from "@/components/frame/not-shown";

const AT_MOST = 30;
const ASK_AFTER_MS = 120;

/** Whose the new order is. */
export function ChooseClient() {
  const [find, setFind] = useState("");
  const asked = find.trim();
  const { view, state } = useView(clientListQuery, { find: useSettled(asked, ASK_AFTER_MS), limit: AT_MOST });
  const none = view.items.length === 0;
  const emptyBook = none && asked === "" && state === "known";
  return (
    <Screen
      title="New order"
      sub="Whose is it?"
      back={backToOrders}
      action={
        <ButtonLink variant="main" full href={newClientHref(asked)}>
          New client
        </ButtonLink>
      }
    >
      {!emptyBook && (
        <Field label="Find by name, phone or wearer">
          <TextInput
            type="search"
            value={find}
            onChange={(event) => setFind(event.target.value)}
            autoComplete="off"
            autoCorrect="off"
            spellCheck={false}
            enterKeyHint="search"
          />
        </Field>
      )}
      {state === "failed" && (
        <Notice tone="wrong" title="The list did not open. Close Notchbook and open it again." />
      )}
      {none && state === "opening" && <Progress label="Opening the book" />}
      {none && state === "known" && (
        <Empty
          say={
            asked === ""
              ? "An order stands under a client. Add the client first; the order follows at once."
              : `No one matches “${asked}”. Fewer letters find more.`
          }
          action={
            <ButtonLink href={newClientHref(asked)}>
              {asked === "" ? "Add the first client" : `Add “${asked}” as a new client`}
            </ButtonLink>
          }
        />
      )}
      {!none && (
        <Card flush aria-label="Clients by name">
          <Rows>
            {view.items.map(({ client, wearers }) => (
              <RowLink
                key={client.id}
                href={`/orders/new?client=${client.id}`}
                title={client.name}
                sub={
                  wearers.length > 0 && (
                    <span className="wrap-anywhere">{namesInWords(wearers.map(({ name }) => name))}</span>
                  )
                }
              />
            ))}
          </Rows>
        </Card>
      )}
      {view.more && <p className="text-soft">More are in the book: type a name to find them.</p>}
    </Screen>
  );
}
