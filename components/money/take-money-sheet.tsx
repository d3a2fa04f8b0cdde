"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useMemo, useState } from "react";
import { useForm, useWatch } from "react-hook-form";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { useFormDraft } from "@/components/store/use-form-draft";
import { methodOptions } from "@/components/orders/deposit-fields";
import { useKeep, useWorkshop } from "@/components/store/use-book";
import { type DraftHandle, useDraft } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { Button } from "@/components/ui/button";
import { Ask, Sheet } from "@/components/ui/dialog";
import { Choice, Field, TextInput } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { newId } from "@/lib/journal/change";
import { type Currency, currency as currencyOf } from "@/lib/money/currencies";
import { formatMoney, moneyFigure } from "@/lib/money/format-money";
import { suggestedDeposit } from "@/lib/money/order-sums";
import { orderCautions, receiptCautions } from "@/lib/orders/order-cautions";
import { readAmount } from "@/lib/orders/order-form";
import {
  decideMoney,
  emptyMoney,
  moneySchema,
  type MoneyValues,
  moneyWrites,
  readMoneyDraft,
} from "@/lib/orders/take-money";
import { earlierPayments } from "@/lib/receipts/snapshot";
import { type PaymentKind, type Workshop } from "@/lib/records/types";
import { type OrderCardView } from "@/lib/store/queries/orders";

export interface TakeMoneySheetProps {
  view: OrderCardView;
  /** Where something else than the likeliest is wanted. */
  kind?: PaymentKind;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

/** Money that changes hands, kept with its receipt; then the receipt is shown. */
export function TakeMoneySheet({ view, kind, open, onOpenChange }: TakeMoneySheetProps) {
  const { sums, order } = view;
  const currency = currencyOf(order.currency);
  const say =
    currency && sums.balanceMinor !== 0
      ? sums.balanceMinor > 0
        ? `${formatMoney(sums.balanceMinor, currency)} is to come in.`
        : `${formatMoney(-sums.balanceMinor, currency)} is to be given back.`
      : undefined;
  return (
    <Sheet
      open={open}
      onOpenChange={onOpenChange}
      title={kind === "giving-back" ? "Give money back" : "Take money"}
      say={say}
    >
      {currency ? (
        <MoneyDesk view={view} kind={kind} currency={currency} />
      ) : (
        <Notice tone="look" title={`${order.currency} is not a currency that people pay in.`} />
      )}
    </Sheet>
  );
}

type DeskProps = Pick<TakeMoneySheetProps, "view" | "kind"> & { currency: Currency };

function MoneyDesk(props: DeskProps) {
  const draftKey = `order:${props.kind === "giving-back" ? "giving-back" : "money"}:${props.view.order.id}`;
  const handle = useDraft<unknown>(draftKey);
  const workshop = useWorkshop();
  if (handle.draft === undefined || !workshop) return <Progress label="Opening the book" />;
  const typed = readMoneyDraft(handle.draft);
  // Kept before, but the phone went out before the draft was dropped.
  const isKept = typed !== null && props.view.payments.some(({ id }) => id === typed.paymentId);
  return (
    <MoneyForm
      {...props}
      workshop={workshop}
      draftKey={draftKey}
      handle={handle}
      found={isKept ? null : typed}
    />
  );
}

const kinds = [
  { value: "deposit", label: "Deposit" },
  { value: "payment", label: "Payment" },
  { value: "giving-back", label: "Giving back" },
] as const;

interface MoneyFormProps extends DeskProps {
  workshop: Workshop;
  draftKey: string;
  handle: DraftHandle<unknown>;
  found: MoneyValues | null;
}

function MoneyForm({ view, kind, currency, workshop, draftKey, handle, found }: MoneyFormProps) {
  const { order, client, garments, wearers, lines, payments, receipts, sums } = view;
  const router = useRouter();
  const today = useToday();
  const { keep, busy, problem } = useKeep();
  const [initial] = useState(() =>
    emptyMoney({ paymentId: found?.paymentId ?? newId(), sums, today, currency, kind }),
  );
  const [ask, setAsk] = useState<{ say: string; values: MoneyValues } | null>(null);
  const form = useForm<MoneyValues>({
    resolver: useMemo(() => zodResolver(moneySchema({ sums, currency, today })), [sums, currency, today]),
    defaultValues: found ?? initial,
    mode: "onTouched",
  });
  const draft = useFormDraft(form, draftKey, initial, handle as DraftHandle<MoneyValues>);
  const [typedKind, amount] = useWatch({ control: form.control, name: ["kind", "amount"] });
  const { errors } = form.formState;

  const keepMoney = async (values: MoneyValues) => {
    const read = readAmount(values.amount, currency);
    if (!read.ok) return;
    const receiptId = newId();
    const cautions = orderCautions(
      garments.map((garment) => ({
        kind: garment.kind,
        note: garment.note,
        wearer: wearers.find(({ id }) => id === garment.wearerId) ?? null,
      })),
      today,
    );
    const kept = await keep((numbers) =>
      moneyWrites(
        {
          orderId: order.id,
          workshop,
          client,
          order,
          lines,
          earlier: earlierPayments(payments, receipts),
          cautions: receiptCautions(cautions),
          payment: {
            id: values.paymentId,
            kind: values.kind,
            method: values.method,
            amountMinor: read.minor,
            paidOn: values.paidOn,
            note: values.note.trim(),
          },
          receiptId,
        },
        numbers,
      ),
    );
    if (!kept) return;
    await handle.drop();
    router.push(`/orders/receipt?id=${receiptId}`);
  };
  const submit = form.handleSubmit(async (values) => {
    const read = readAmount(values.amount, currency);
    const decision = read.ok ? decideMoney(values.kind, sums, read.minor, currency) : null;
    if (decision?.ok && decision.say) return setAsk({ say: decision.say, values });
    await keepMoney(values);
  });
  const fill = (minor: number) =>
    form.setValue("amount", moneyFigure(minor, currency), { shouldDirty: true, shouldValidate: true });

  return (
    <form noValidate onSubmit={submit} className="flex flex-col gap-4">
      <BroughtBack draft={draft} />
      <Choice
        label="What it is"
        options={kinds}
        {...form.register("kind", {
          onChange: (event: { target: { value: string } }) => {
            // An amount that nobody typed goes along with what it was meant for.
            if (event.target.value === "giving-back" && amount === initial.amount)
              form.setValue("amount", "");
          },
        })}
      />
      <Field
        label={typedKind === "giving-back" ? "Amount given back" : "Amount received"}
        error={errors.amount?.message}
      >
        <TextInput
          figure
          inputMode={currency.digits === 0 ? "numeric" : "decimal"}
          after={currency.code}
          className="pe-16 text-xl"
          {...form.register("amount")}
        />
      </Field>
      <QuickAmounts kind={typedKind} sums={sums} amount={amount} currency={currency} onFill={fill} />
      <Choice label="How" options={methodOptions} {...form.register("method")} />
      <Field label="On" error={errors.paidOn?.message}>
        <TextInput type="date" max={today} {...form.register("paidOn")} />
      </Field>
      <Field label="Note" optional hint="For you; it does not stand on the receipt.">
        <TextInput {...form.register("note")} autoComplete="off" />
      </Field>
      <KeepTrouble keep={problem} draft={handle.problem} />
      <div className="sheet-action">
        <Button type="submit" variant="main" full busy={busy || form.formState.isSubmitting}>
          Keep, and make the receipt
        </Button>
      </div>
      <Ask
        open={ask !== null}
        onOpenChange={(open) => !open && setAsk(null)}
        title="More than is owed?"
        say={ask?.say ?? ""}
        yes="Keep it all the same"
        onYes={() => ask && void keepMoney(ask.values)}
      />
    </form>
  );
}

interface QuickAmountsProps {
  kind: PaymentKind;
  sums: OrderCardView["sums"];
  amount: string;
  currency: Currency;
  onFill: (minor: number) => void;
}

/** The amounts that are likely, one tap each; the one that stands in the field already is left out. */
function QuickAmounts({ kind, sums, amount, currency, onFill }: QuickAmountsProps) {
  const half = suggestedDeposit(sums.totalMinor);
  const held = sums.receivedMinor - sums.givenBackMinor;
  const offered =
    kind === "giving-back"
      ? [
          { say: "What is too much", minor: -sums.balanceMinor },
          { say: "All that was received", minor: held },
        ]
      : [
          { say: "All", minor: sums.balanceMinor },
          ...(kind === "deposit"
            ? [{ say: half * 2 === sums.totalMinor ? "Half" : "About half", minor: half }]
            : []),
        ];
  const keys = offered.filter(
    ({ minor }, i) =>
      minor > 0 &&
      moneyFigure(minor, currency) !== amount &&
      offered.findIndex((other) => other.minor === minor) === i,
  );
  if (keys.length === 0) return null;
  return (
    <div className="flex flex-wrap gap-2">
      {keys.map(({ say, minor }) => (
        <Button key={say} onClick={() => onFill(minor)}>
          {say}: {formatMoney(minor, currency)}
        </Button>
      ))}
    </div>
  );
}
