"use client";

import { Plus } from "lucide-react";
import { useState } from "react";
import { useFieldArray, type UseFormReturn, useWatch } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { Card } from "@/components/ui/card";
import { cx } from "@/components/ui/cx";
import { Field, TextInput } from "@/components/ui/field";
import { Money } from "@/components/ui/money";
import { type Currency } from "@/lib/money/currencies";
import { lineText } from "@/lib/orders/garment-choices";
import { emptyLine, freshName, type GarmentValues, type OrderValues } from "@/lib/orders/order-form";
import { liveTotal, type LineValues } from "@/lib/orders/price-lines";
import { TakenOff } from "./taken-off";

export interface PricesFieldsProps {
  form: UseFormReturn<OrderValues>;
  currency: Currency;
  nameOf: (wearerId: string) => string | undefined;
}

/** What is asked for it, line by line, and what that comes to. */
export function PricesFields({ form, currency, nameOf }: PricesFieldsProps) {
  const { fields, append, remove, insert } = useFieldArray({ control: form.control, name: "lines" });
  const [lines, garments] = useWatch({ control: form.control, name: ["lines", "garments"] });
  const [left, setLeft] = useState<{ at: number; line: LineValues } | null>(null);
  const { totalMinor, whole } = liveTotal(lines, currency);
  const unpriced = garments.filter(
    ({ rowId, kind }) => kind.trim() !== "" && lines.every(({ garmentId }) => garmentId !== rowId),
  );
  const addFor = (garment: GarmentValues) =>
    append(
      {
        ...emptyLine(freshName("line", lines)),
        garmentId: garment.rowId,
        text: lineText(garment, nameOf(garment.wearerId)),
      },
      { focusName: `lines.${fields.length}.price` },
    );

  return (
    <section aria-labelledby="prices" className="grid grid-cols-[minmax(0,1fr)] gap-3">
      <h2 id="prices" className="font-figure text-lg font-bold">
        Price
      </h2>
      {fields.length > 0 && (
        <Card flush aria-label="Prices">
          <ul className="rows">
            {fields.map((field, i) => (
              <li key={field.id} className="px-4 py-3">
                <PriceLine
                  form={form}
                  at={i}
                  currency={currency}
                  onLeaveOut={() => {
                    setLeft({ at: i, line: form.getValues(`lines.${i}`) });
                    remove(i);
                  }}
                />
              </li>
            ))}
          </ul>
        </Card>
      )}
      <TakenOff
        what={left && (left.line.text.trim() || "The price")}
        onUndo={() => {
          if (left) insert(Math.min(left.at, fields.length), left.line);
          setLeft(null);
        }}
      />
      <div className="grid grid-cols-[minmax(0,1fr)] gap-2">
        {unpriced.map((garment) => (
          <Button
            key={garment.rowId}
            className="wrap-anywhere"
            icon={<Plus className="size-5" />}
            onClick={() => addFor(garment)}
          >
            Price of {lineText(garment, nameOf(garment.wearerId))}
          </Button>
        ))}
        <Button
          icon={<Plus className="size-5" />}
          onClick={() =>
            append(emptyLine(freshName("line", lines)), { focusName: `lines.${fields.length}.text` })
          }
        >
          {fields.length === 0 && unpriced.length === 0 ? "Add a price" : "Another price"}
        </Button>
      </div>
      <p
        role="status"
        className="flex flex-wrap items-baseline justify-between gap-x-4 border-y-2 border-ink py-2"
      >
        <span className="font-semibold">{whole ? "Total" : "Total of what can be read"}</span>
        <Money minor={totalMinor} currency={currency.code} className="text-2xl font-bold" />
      </p>
    </section>
  );
}

function PriceLine({
  form,
  at,
  currency,
  onLeaveOut,
}: Pick<PricesFieldsProps, "form" | "currency"> & { at: number; onLeaveOut: () => void }) {
  const line = useWatch({ control: form.control, name: `lines.${at}` });
  const errors = form.formState.errors.lines?.[at];
  const { totalMinor } = liveTotal([line], currency);
  return (
    <div role="group" aria-label={line.text.trim() || `Price ${at + 1}`} className="grid gap-3">
      <Field label="For" error={errors?.text?.message}>
        <TextInput {...form.register(`lines.${at}.text`)} autoComplete="off" />
      </Field>
      <div className="flex flex-wrap items-start gap-3">
        <Field
          className={cx("min-w-0 flex-1", errors?.quantity ? "basis-full" : "basis-24")}
          label="How many"
          error={errors?.quantity?.message}
        >
          <TextInput figure inputMode="numeric" {...form.register(`lines.${at}.quantity`)} />
        </Field>
        <Field
          className={cx("min-w-0 flex-[2]", errors?.price ? "basis-full" : "basis-40")}
          label="Price of one"
          error={errors?.price?.message}
        >
          <TextInput
            figure
            inputMode={currency.digits === 0 ? "numeric" : "decimal"}
            after={currency.code}
            className="pe-16"
            {...form.register(`lines.${at}.price`)}
          />
        </Field>
      </div>
      <div className="flex flex-wrap items-center justify-between gap-x-4">
        <Button
          variant="quiet"
          className="-ms-4"
          onClick={onLeaveOut}
          aria-label={`Leave out ${line.text.trim() || `price ${at + 1}`}`}
        >
          Leave out
        </Button>
        <Money minor={totalMinor} currency={currency.code} className="text-lg font-semibold" />
      </div>
    </div>
  );
}
