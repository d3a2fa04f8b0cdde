"use client";

import { type UseFormReturn, useWatch } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { Choice, Field, TextInput } from "@/components/ui/field";
import { type Currency } from "@/lib/money/currencies";
import { formatMoney, moneyFigure } from "@/lib/money/format-money";
import { suggestedDeposit } from "@/lib/money/order-sums";
import { type OrderValues } from "@/lib/orders/order-form";
import { liveTotal } from "@/lib/orders/price-lines";
import { methodWords } from "@/lib/receipts/document";

const when = [
  { value: "later", label: "Not now" },
  { value: "now", label: "Taken now" },
] as const;

export const methodOptions = (["cash", "transfer", "card"] as const).map((value) => ({
  value,
  label: methodWords(value),
}));

/** The deposit, where it is taken while the order is agreed. */
export function DepositFields({ form, currency }: { form: UseFormReturn<OrderValues>; currency: Currency }) {
  const [lines, deposit] = useWatch({ control: form.control, name: ["lines", "deposit"] });
  const { totalMinor, whole } = liveTotal(lines, currency);
  const half = whole && totalMinor > 0 ? suggestedDeposit(totalMinor) : 0;
  const halfSaid = half * 2 === totalMinor ? "Half" : "About half";
  const fill = () =>
    form.setValue("deposit.amount", moneyFigure(half, currency), { shouldDirty: true, shouldValidate: true });
  return (
    <section aria-labelledby="deposit" className="grid grid-cols-[minmax(0,1fr)] gap-3">
      <h2 id="deposit" className="font-figure text-lg font-bold">
        Deposit
      </h2>
      <Choice
        bare
        label="Is a deposit taken now?"
        options={when}
        {...form.register("deposit.taken", {
          onChange: (event: { target: { value: string } }) => {
            if (event.target.value === "now" && form.getValues("deposit.amount") === "" && half > 0) fill();
          },
        })}
        hint={
          half > 0
            ? `${halfSaid} is ${formatMoney(half, currency)}. Half as a deposit is common practice; nothing binds you to it.`
            : undefined
        }
      />
      {deposit.taken === "now" && (
        <>
          <Field label="Amount received" error={form.formState.errors.deposit?.amount?.message}>
            <TextInput
              figure
              inputMode={currency.digits === 0 ? "numeric" : "decimal"}
              after={currency.code}
              className="pe-16"
              {...form.register("deposit.amount")}
            />
          </Field>
          {half > 0 && deposit.amount !== moneyFigure(half, currency) && (
            <Button onClick={fill}>
              {halfSaid}: {formatMoney(half, currency)}
            </Button>
          )}
          <Choice label="How" options={methodOptions} {...form.register("deposit.method")} />
          <p className="text-soft">A receipt with its own number is made along with the order.</p>
        </>
      )}
    </section>
  );
}
