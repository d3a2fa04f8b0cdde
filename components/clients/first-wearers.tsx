"use client";

import { Plus } from "lucide-react";
import { useFieldArray, type UseFormReturn, useWatch } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Check } from "@/components/ui/field";
import { WearerInputs } from "@/components/wearers/wearer-inputs";
import { type NewClientValues } from "@/lib/clients/client-form";
import { emptyWearer } from "@/lib/clients/wearer-form";

/** Who a new client has sewn for: the client herself by one tap, and anyone else. */
export function FirstWearers({ form, today }: { form: UseFormReturn<NewClientValues>; today: string }) {
  const { fields, append, remove } = useFieldArray({ control: form.control, name: "wearers" });
  const wearers = useWatch({ control: form.control, name: "wearers" });
  return (
    <section aria-labelledby="first-wearers" className="grid grid-cols-[minmax(0,1fr)] gap-3">
      <h2 id="first-wearers" className="font-figure text-lg font-bold">
        Who is it sewn for?
      </h2>
      <Check
        {...form.register("self")}
        label="The client too"
        hint="Kept as grown up, age not asked. Both can be changed later."
      />
      {fields.map((field, i) => (
        <Card key={field.id}>
          <CardHead
            level={3}
            title={wearers[i]?.name.trim() || "Someone to sew for"}
            end={
              <Button
                variant="quiet"
                onClick={() => remove(i)}
                aria-label={`Leave out ${wearers[i]?.name.trim() || "this one"}`}
              >
                Leave out
              </Button>
            }
          />
          <div className="grid gap-4">
            <WearerInputs
              short
              today={today}
              known={wearers[i]?.known ?? "born"}
              register={(name) => form.register(`wearers.${i}.${name}`)}
              errors={form.formState.errors.wearers?.[i] ?? {}}
            />
          </div>
        </Card>
      ))}
      <Button
        icon={<Plus className="size-5" />}
        onClick={() => append(emptyWearer(today), { focusName: `wearers.${fields.length}.name` })}
      >
        {fields.length === 0 ? "Add someone to sew for" : "Add another"}
      </Button>
    </section>
  );
}
