"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useMemo, useState } from "react";
import { useForm } from "react-hook-form";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { backToOrders, ScreenOpening } from "@/components/frame/not-shown";
import { useFormDraft } from "@/components/store/use-form-draft";
import { useIdParam } from "@/components/store/use-id-param";
import { useKeep, useView, useWorkshop } from "@/components/store/use-book";
import { type DraftHandle, useDraft } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { Button, ButtonLink } from "@/components/ui/button";
import { Ask } from "@/components/ui/dialog";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { newId } from "@/lib/journal/change";
import { type Currency, currency as currencyOf } from "@/lib/money/currencies";
import { decideTaking } from "@/lib/money/decide-payment";
import { orderSums } from "@/lib/money/order-sums";
import { withTodaysSets, withWearer } from "@/lib/orders/garment-choices";
import { receiptCautions } from "@/lib/orders/order-cautions";
import {
  emptyOrder,
  type OrderValues,
  orderSchema,
  readAmount,
  readOrderDraft,
} from "@/lib/orders/order-form";
import { newOrderWrites } from "@/lib/orders/order-writes";
import { liveTotal } from "@/lib/orders/price-lines";
import { type Workshop } from "@/lib/records/types";
import { orderCardQuery, orderPeopleQuery, type OrderPeopleView } from "@/lib/store/queries/orders";
import { ChooseClient } from "./choose-client";
import { DepositFields } from "./deposit-fields";
import { NoCurrency } from "./no-currency";
import { OrderInputs, typedCautions } from "./order-inputs";
import { NotShown } from "@/components/frame/not-shown";

const TITLE = "New order";

export function NewOrderScreen() {
  const client = useIdParam("client");
  return client ? <NewOrder key={client} clientId={client} /> : <ChooseClient />;
}

function NewOrder({ clientId }: { clientId: string }) {
  const draftKey = `order:new:${clientId}`;
  const { view: people, state } = useView(orderPeopleQuery, { clientId });
  const workshop = useWorkshop();
  const handle = useDraft<unknown>(draftKey);
  const [round, setRound] = useState(0);
  if (!people)
    return <NotShown back={backToOrders} title={TITLE} state={state} say="This client is not in the book." />;
  if (people.client.removedAt !== null)
    return (
      <Screen title={TITLE}>
        <Notice
          tone="look"
          title={`${people.client.name} is in the bin.`}
          action={<ButtonLink href={`/clients/card?id=${clientId}`}>Bring back first</ButtonLink>}
        />
      </Screen>
    );
  if (handle.draft === undefined || !workshop) return <ScreenOpening title={TITLE} />;
  const currency = currencyOf(workshop.currency);
  if (!currency) return <NoCurrency title={TITLE} code={workshop.currency} />;
  return (
    <NewOrderForm
      key={round}
      people={people}
      workshop={workshop}
      currency={currency}
      draftKey={draftKey}
      handle={handle}
      // After "Begin another" the draft that was read is of the order that is kept.
      found={round === 0 ? readOrderDraft(handle.draft) : null}
      onBeginAnother={() => setRound(round + 1)}
    />
  );
}

interface NewOrderFormProps {
  people: OrderPeopleView;
  workshop: Workshop;
  currency: Currency;
  draftKey: string;
  handle: DraftHandle<unknown>;
  found: OrderValues | null;
  onBeginAnother: () => void;
}

/** An empty order; where the client orders for one wearer alone, it is for that one. */
function firstValues(orderId: string, people: OrderPeopleView): OrderValues {
  const empty = emptyOrder(orderId);
  const [only, second] = people.wearers;
  return only && !second
    ? { ...empty, garments: empty.garments.map((one) => withWearer(one, only.wearer.id, people)) }
    : empty;
}

function NewOrderForm(props: NewOrderFormProps) {
  const { people, workshop, currency, draftKey, handle, found, onBeginAnother } = props;
  const { client } = people;
  const router = useRouter();
  const today = useToday();
  const { keep, busy, problem } = useKeep();
  const [initial] = useState(() => firstValues(found?.orderId ?? newId(), people));
  const [ask, setAsk] = useState<{ say: string; values: OrderValues } | null>(null);
  const [isKept, setIsKept] = useState(false);
  // Kept before, but the phone went out before the draft was dropped.
  const { view: already } = useView(orderCardQuery, { id: initial.orderId });
  const form = useForm<OrderValues>({
    resolver: useMemo(() => zodResolver(orderSchema(currency)), [currency]),
    defaultValues: found ? { ...found, garments: withTodaysSets(found.garments, people, today) } : initial,
    mode: "onTouched",
  });
  const draft = useFormDraft(form, draftKey, initial, handle as DraftHandle<OrderValues>);

  const keepOrder = async (values: OrderValues) => {
    const receiptId = newId();
    const cautions = receiptCautions(typedCautions(values.garments, people, today));
    const kept = await keep((numbers) =>
      newOrderWrites({ values, client, workshop, currency, today, cautions, receiptId }, numbers),
    );
    if (!kept) return;
    setIsKept(true);
    await handle.drop();
    router.replace(
      values.deposit.taken === "now"
        ? `/orders/receipt?id=${receiptId}`
        : `/orders/card?id=${values.orderId}`,
    );
  };
  const submit = form.handleSubmit(async (values) => {
    const amount = readAmount(values.deposit.amount, currency);
    if (values.deposit.taken === "now" && amount.ok) {
      const { totalMinor } = liveTotal(values.lines, currency);
      const sums = orderSums([{ quantity: 1, unitMinor: totalMinor }], []);
      const { say } = decideTaking(sums, amount.minor, currency);
      if (say) return setAsk({ say, values });
    }
    await keepOrder(values);
  });

  if (already && !isKept && !busy)
    return (
      <Screen title={TITLE} sub={client.name}>
        <Notice
          title="This order is in the book already."
          action={
            <>
              <ButtonLink href={`/orders/card?id=${initial.orderId}`}>Open it</ButtonLink>
              <Button onClick={onBeginAnother}>Begin another</Button>
            </>
          }
        />
      </Screen>
    );
  return (
    <Screen
      title={TITLE}
      sub={`For ${client.name}`}
      back={{ href: `/clients/card?id=${client.id}`, label: client.name }}
      tools={<ButtonLink href="/orders/new">Another client</ButtonLink>}
      action={
        <>
          <KeepTrouble keep={problem} draft={handle.problem} />
          <Button
            type="submit"
            form="order"
            variant="main"
            full
            busy={busy || form.formState.isSubmitting || isKept}
          >
            Keep the order
          </Button>
        </>
      }
    >
      <BroughtBack draft={draft} />
      <form id="order" noValidate onSubmit={submit} className="grid grid-cols-[minmax(0,1fr)] gap-5">
        <OrderInputs form={form} people={people} currency={currency} today={today}>
          <DepositFields form={form} currency={currency} />
        </OrderInputs>
      </form>
      <Ask
        open={ask !== null}
        onOpenChange={(open) => !open && setAsk(null)}
        title="More than is owed?"
        say={ask?.say ?? ""}
        yes="Keep it all the same"
        onYes={() => ask && void keepOrder(ask.values)}
      />
    </Screen>
  );
}
