"use client";

import { type ReactNode } from "react";
import { type UseFormReturn, useWatch } from "react-hook-form";
import { Field, TextArea, TextInput } from "@/components/ui/field";
import { type Currency } from "@/lib/money/currencies";
import { countdownWords } from "@/lib/orders/day-words";
import { type OrderCaution, orderCautions } from "@/lib/orders/order-cautions";
import { type GarmentValues, type OrderValues } from "@/lib/orders/order-form";
import { formatDay } from "@/lib/people/format-day";
import { type IsoDate } from "@/lib/people/iso-date";
import { type OrderPeopleView } from "@/lib/store/queries/orders";
import { CautionsNotice } from "./cautions-notice";
import { GarmentsFields } from "./garments-fields";
import { PricesFields } from "./prices-fields";

export interface OrderInputsProps {
  form: UseFormReturn<OrderValues>;
  people: OrderPeopleView;
  currency: Currency;
  today: IsoDate;
  /** Wearers who are no longer to be chosen but stand on a garment, by id. */
  otherNames?: ReadonlyMap<string, string>;
  /** What follows the prices: the deposit of a new order, or what a change leaves as it is. */
  children?: ReactNode;
}

const noOthers: ReadonlyMap<string, string> = new Map();

/** What to mind about the garments as they are typed. */
export function typedCautions(
  garments: readonly GarmentValues[],
  people: OrderPeopleView,
  today: IsoDate,
): OrderCaution[] {
  return orderCautions(
    garments.map(({ kind, note, wearerId }) => ({
      kind,
      note,
      wearer: people.wearers.find(({ wearer }) => wearer.id === wearerId)?.wearer ?? null,
    })),
    today,
  );
}

function dueHint(dueOn: string, today: IsoDate): string | undefined {
  if (dueOn === "") return undefined;
  try {
    if (dueOn < today) return `${formatDay(dueOn, { style: "long" })}. That day is past.`;
    return `${formatDay(dueOn, { style: "long" })}, ${countdownWords(dueOn, today)}.`;
  } catch {
    // Half typed: nothing to say as yet.
    return undefined;
  }
}

/** Everything that an order holds, for a new one and for one that is changed. */
export function OrderInputs({
  form,
  people,
  currency,
  today,
  otherNames = noOthers,
  children,
}: OrderInputsProps) {
  const { errors } = form.formState;
  const [dueOn, garments] = useWatch({ control: form.control, name: ["dueOn", "garments"] });
  const nameOf = (wearerId: string) =>
    people.wearers.find(({ wearer }) => wearer.id === wearerId)?.wearer.name ?? otherNames.get(wearerId);
  return (
    <>
      <Field
        label="What it is for"
        optional
        error={errors.occasion?.message}
        hint="A naming day, a school play, the first of the month."
      >
        <TextInput {...form.register("occasion")} autoComplete="off" autoCapitalize="sentences" />
      </Field>
      <Field label="Due on" optional error={errors.dueOn?.message} hint={dueHint(dueOn, today)}>
        <TextInput type="date" {...form.register("dueOn")} />
      </Field>
      <GarmentsFields form={form} people={people} today={today} otherNames={otherNames} />
      <CautionsNotice cautions={typedCautions(garments, people, today)} />
      <PricesFields form={form} currency={currency} nameOf={nameOf} />
      {children}
      <Field label="Note on the order" optional>
        <TextArea rows={2} {...form.register("note")} />
      </Field>
    </>
  );
}
