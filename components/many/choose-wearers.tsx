"use client";

import { useState } from "react";
import { useSettled } from "@/components/store/use-settled";
import { useView } from "@/components/store/use-book";
import { Button } from "@/components/ui/button";
import { Choice, Field, TextInput } from "@/components/ui/field";
import { wearerWords } from "@/lib/clients/age-words";
import { PAGE } from "@/lib/clients/list-words";
import { type ManyWearer } from "@/lib/many/many-wearer";
import { forWhom, orderName } from "@/lib/orders/order-name";
import { formatDay } from "@/lib/people/format-day";
import { type IsoDate } from "@/lib/people/iso-date";
import { matchesAll, searchText } from "@/lib/search/match";
import { manyWearersQuery } from "@/lib/store/queries/many";
import { orderListQuery } from "@/lib/store/queries/orders";

export interface ChooseWearersProps {
  /** Those chosen. */
  ids: readonly string[];
  today: IsoDate;
  onAdd(ids: readonly string[]): void;
  onTake(ids: readonly string[]): void;
}

type By = "people" | "orders";

const ASK_AFTER_MS = 120;
const listClasses = "grid max-h-[50dvh] content-start gap-3 overflow-y-auto rounded border-2 border-edge p-3";

/** Found as one types, and ticked one by one, or all of a client or an order with one tap. */
export function ChooseWearers(props: ChooseWearersProps) {
  const [find, setFind] = useState("");
  const [by, setBy] = useState<By>("people");
  const asked = useSettled(find.trim(), ASK_AFTER_MS);
  return (
    <>
      <Choice
        bare
        label="Find them"
        name="find-by"
        options={[
          { value: "people", label: "By client" },
          { value: "orders", label: "By order" },
        ]}
        value={by}
        onChange={(event) => setBy(event.target.value as By)}
      />
      <Field
        label={by === "people" ? "Find by name, phone or wearer" : "Find by client, wearer or what it is for"}
      >
        <TextInput
          type="search"
          value={find}
          onChange={(event) => setFind(event.target.value)}
          autoComplete="off"
          autoCorrect="off"
          spellCheck={false}
        />
      </Field>
      {by === "people" ? (
        <ByClient key={asked} find={asked} {...props} />
      ) : (
        <ByOrder find={asked} {...props} />
      )}
    </>
  );
}

function ByClient({ find, ...props }: ChooseWearersProps & { find: string }) {
  const [limit, setLimit] = useState(PAGE);
  const { state, view } = useView(manyWearersQuery, { find, limit });
  const groups = view.items.filter(({ wearers }) => wearers.length > 0);
  if (groups.length === 0) return <Nobody find={find} isOpening={state === "opening"} />;
  return (
    <div role="group" aria-label="Wearers by client" className={listClasses}>
      {groups.map(({ client, wearers }) => (
        <Group key={client.id} title={client.name} wearers={wearers} {...props} />
      ))}
      {view.more && <Button onClick={() => setLimit((now) => now + PAGE)}>Show more</Button>}
    </div>
  );
}

/** Open orders are few; they are searched among those that are there. */
const MOST_ORDERS = 200;

function ByOrder({ find, ...props }: ChooseWearersProps & { find: string }) {
  const { state, view } = useView(orderListQuery, { show: "open", limit: MOST_ORDERS });
  const orders = view.items.filter(({ client, order, wearers }) => {
    const names = wearers.map(({ name }) => name);
    const wearerNames = [...names, order.occasion];
    return (
      names.length > 0 && matchesAll(searchText({ name: client?.name ?? "", phones: [], wearerNames }), find)
    );
  });
  if (orders.length === 0) return <Nobody find={find} isOpening={state === "opening"} orders />;
  return (
    <div role="group" aria-label="Wearers by order" className={listClasses}>
      {orders.map(({ client, garments, order, wearers }) => (
        <Group
          key={order.id}
          title={orderName(order)}
          sub={[client?.name, forWhom(client?.name ?? "", wearers, garments)].filter(Boolean).join(", ")}
          wearers={wearers.filter(({ removedAt }) => removedAt === null).map((wearer) => ({ wearer }))}
          {...props}
        />
      ))}
    </div>
  );
}

function Nobody({ find, isOpening, orders }: { find: string; isOpening: boolean; orders?: boolean }) {
  const none = orders
    ? "No open order names a wearer yet."
    : "There are no wearers in the book yet. Add a client first.";
  return (
    <p role="status" className="text-soft">
      {isOpening
        ? "Opening the book…"
        : find === ""
          ? none
          : `Nothing matches “${find}”. Fewer letters find more.`}
    </p>
  );
}

interface GroupProps extends ChooseWearersProps {
  title: string;
  sub?: string;
  /** Without a set where it was not asked for. */
  wearers: readonly (Pick<ManyWearer, "wearer"> & Partial<ManyWearer>)[];
}

function Group({ ids, onAdd, onTake, sub, title, today, wearers }: GroupProps) {
  const own = wearers.map(({ wearer }) => wearer.id);
  const all = own.every((id) => ids.includes(id));
  return (
    <section className="grid gap-1 border-line not-first:border-t not-first:pt-3">
      <div className="flex flex-wrap items-center justify-between gap-x-3">
        <h3 className="min-w-0 flex-1 basis-32 font-bold wrap-anywhere">
          {title}
          {sub && <span className="block text-sm font-normal text-soft">{sub}</span>}
        </h3>
        {own.length > 1 && (
          <Button onClick={() => (all ? onTake(own) : onAdd(own))}>
            {all ? "Take off all" : "Add all"} {own.length}
            <span className="sr-only"> of {title}</span>
          </Button>
        )}
      </div>
      <ul>
        {wearers.map(({ set, wearer }) => (
          <li key={wearer.id}>
            <label className="flex min-h-target items-center gap-3 py-1.5">
              <input
                type="checkbox"
                checked={ids.includes(wearer.id)}
                onChange={(event) => (event.target.checked ? onAdd : onTake)([wearer.id])}
                className="size-6 shrink-0 accent-ink"
              />
              <span className="min-w-0">
                <span className="block font-semibold wrap-anywhere">{wearer.name}</span>
                <span className="block text-sm text-soft">
                  {wearerWords(wearer, today)}
                  {set === null && ", not measured yet"}
                  {set && `, measured ${formatDay(set.takenOn)}`}
                </span>
              </span>
            </label>
          </li>
        ))}
      </ul>
    </section>
  );
}
