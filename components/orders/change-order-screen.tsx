"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useMemo, useState } from "react";
import { useForm } from "react-hook-form";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { backToOrders, ScreenOpening } from "@/components/frame/not-shown";
import { useFormDraft } from "@/components/store/use-form-draft";
import { useIdParam } from "@/components/store/use-id-param";
import { useKeep, useView } from "@/components/store/use-book";
import { type DraftHandle, useDraft } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { Button, ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { type Currency, currency as currencyOf } from "@/lib/money/currencies";
import { type OrderValues, orderSchema, orderValues, readOrderDraft } from "@/lib/orders/order-form";
import { orderName } from "@/lib/orders/order-name";
import { changeOrderWrites } from "@/lib/orders/order-writes";
import {
  orderCardQuery,
  type OrderCardView,
  orderPeopleQuery,
  type OrderPeopleView,
} from "@/lib/store/queries/orders";
import { NoCurrency } from "./no-currency";
import { OrderInputs } from "./order-inputs";
import { NotShown } from "@/components/frame/not-shown";

const TITLE = "Change the order";
const NOT_HERE = "This order is not in the book.";

export function ChangeOrderScreen() {
  const id = useIdParam("id");
  return id ? (
    <ChangeOrder key={id} id={id} />
  ) : (
    <NotShown back={backToOrders} title={TITLE} state="known" say={NOT_HERE} />
  );
}

function ChangeOrder({ id }: { id: string }) {
  const { view, state } = useView(orderCardQuery, { id });
  if (!view) return <NotShown back={backToOrders} title={TITLE} state={state} say={NOT_HERE} />;
  return <ChangeOrderOf view={view} />;
}

function ChangeOrderOf({ view }: { view: OrderCardView }) {
  const { order } = view;
  const { view: people, state } = useView(orderPeopleQuery, { clientId: order.clientId });
  const draftKey = `order:change:${order.id}`;
  const handle = useDraft<unknown>(draftKey);
  if (order.removedAt !== null)
    return (
      <Screen title={TITLE}>
        <Notice
          tone="look"
          title="This order is in the bin."
          action={<ButtonLink href={`/orders/card?id=${order.id}`}>Bring back first</ButtonLink>}
        />
      </Screen>
    );
  if (!people)
    return (
      <NotShown
        back={backToOrders}
        title={TITLE}
        state={state}
        say="The client of this order is not in the book."
      />
    );
  if (handle.draft === undefined) return <ScreenOpening title={TITLE} />;
  const currency = currencyOf(order.currency);
  if (!currency) return <NoCurrency title={TITLE} code={order.currency} />;
  return (
    <ChangeOrderForm view={view} people={people} currency={currency} draftKey={draftKey} handle={handle} />
  );
}

interface ChangeOrderFormProps {
  view: OrderCardView;
  people: OrderPeopleView;
  currency: Currency;
  draftKey: string;
  handle: DraftHandle<unknown>;
}

function ChangeOrderForm({ view, people, currency, draftKey, handle }: ChangeOrderFormProps) {
  const { order, garments, lines, payments, wearers } = view;
  const card = `/orders/card?id=${order.id}`;
  const router = useRouter();
  const today = useToday();
  const { keep, busy, problem } = useKeep();
  const [initial] = useState(() => orderValues(order, garments, lines, currency));
  const form = useForm<OrderValues>({
    resolver: useMemo(() => zodResolver(orderSchema(currency)), [currency]),
    defaultValues: readOrderDraft(handle.draft) ?? initial,
    mode: "onTouched",
  });
  const draft = useFormDraft(form, draftKey, initial, handle as DraftHandle<OrderValues>);
  const otherNames = useMemo(() => new Map(wearers.map(({ id, name }) => [id, name])), [wearers]);

  const submit = form.handleSubmit(async (values) => {
    const writes = changeOrderWrites({ order, garments, lines }, values, currency, new Date().toISOString());
    if (writes.length > 0 && !(await keep(writes))) return;
    await handle.drop();
    router.replace(card);
  });

  return (
    <Screen
      title={TITLE}
      sub={[view.client?.name, orderName(order)].filter(Boolean).join(", ")}
      back={{ href: card, label: orderName(order) }}
      action={
        <>
          <KeepTrouble keep={problem} draft={handle.problem} />
          <Button type="submit" form="order" variant="main" full busy={busy || form.formState.isSubmitting}>
            Keep the changes
          </Button>
        </>
      }
    >
      <BroughtBack draft={draft} />
      <form id="order" noValidate onSubmit={submit} className="grid grid-cols-[minmax(0,1fr)] gap-5">
        <OrderInputs form={form} people={people} currency={currency} today={today} otherNames={otherNames}>
          {payments.length > 0 && (
            <p className="text-soft">
              Receipts that were given stay as they are. The next one carries the new prices.
            </p>
          )}
        </OrderInputs>
      </form>
    </Screen>
  );
}
