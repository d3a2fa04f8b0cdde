"use client";

import { Plus } from "lucide-react";
import { useState } from "react";
import { useFieldArray, type UseFormReturn, useWatch } from "react-hook-form";
import { Button, ButtonLink } from "@/components/ui/button";
import { garmentKinds } from "@/lib/orders/garment-kinds";
import { sameForNext, withWearer } from "@/lib/orders/garment-choices";
import { emptyGarment, freshName, type GarmentValues, type OrderValues } from "@/lib/orders/order-form";
import { type IsoDate } from "@/lib/people/iso-date";
import { type OrderPeopleView } from "@/lib/store/queries/orders";
import { GarmentCard } from "./garment-card";
import { TakenOff } from "./taken-off";

export const KINDS_LIST = "garment-kinds";

export interface GarmentsFieldsProps {
  form: UseFormReturn<OrderValues>;
  people: OrderPeopleView;
  today: IsoDate;
  /** Wearers who are no longer to be chosen but stand on a garment, by id. */
  otherNames: ReadonlyMap<string, string>;
}

/** What is to be sewn, and for whom. */
export function GarmentsFields({ form, people, today, otherNames }: GarmentsFieldsProps) {
  const { fields, append, remove, insert } = useFieldArray({ control: form.control, name: "garments" });
  const garments = useWatch({ control: form.control, name: "garments" });
  const [left, setLeft] = useState<{ at: number; garment: GarmentValues } | null>(null);
  const last = garments.at(-1);
  const again =
    last && last.kind.trim() !== "" && sameForNext(last, garments, people, freshName("garment", garments));
  const [only, second] = people.wearers;
  /** Where there is one wearer alone, it is for that one. */
  const another = () => {
    const empty = emptyGarment(freshName("garment", garments));
    return only && !second ? withWearer(empty, only.wearer.id, people) : empty;
  };
  const nameOfNext = again && people.wearers.find(({ wearer }) => wearer.id === again.wearerId)?.wearer.name;

  return (
    <section aria-labelledby="garments" className="grid grid-cols-[minmax(0,1fr)] gap-3">
      <h2 id="garments" className="font-figure text-lg font-bold">
        What is sewn
      </h2>
      <datalist id={KINDS_LIST}>
        {garmentKinds.map((kind) => (
          <option key={kind} value={kind} />
        ))}
      </datalist>
      {people.wearers.length === 0 && (
        <p className="flex flex-wrap items-center justify-between gap-2 text-soft">
          Nobody to sew for is set down under {people.client.name}.
          <ButtonLink href={`/wearers/new?client=${people.client.id}`}>Add a wearer</ButtonLink>
        </p>
      )}
      {fields.map((field, i) => (
        <GarmentCard
          key={field.id}
          form={form}
          at={i}
          people={people}
          today={today}
          otherNames={otherNames}
          onLeaveOut={
            fields.length > 1
              ? () => {
                  setLeft({ at: i, garment: form.getValues(`garments.${i}`) });
                  remove(i);
                }
              : undefined
          }
        />
      ))}
      <TakenOff
        what={left && (left.garment.kind.trim() || "The garment")}
        onUndo={() => {
          if (left) insert(Math.min(left.at, fields.length), left.garment);
          setLeft(null);
        }}
      />
      <div className="grid grid-cols-[minmax(0,1fr)] gap-2">
        {again && (
          <Button
            className="wrap-anywhere"
            icon={<Plus className="size-5" />}
            onClick={() => append(again, { shouldFocus: false })}
          >
            The same for {nameOfNext}
          </Button>
        )}
        <Button
          icon={<Plus className="size-5" />}
          onClick={() =>
            append(another(), {
              focusName: `garments.${fields.length}.kind`,
            })
          }
        >
          Another garment
        </Button>
      </div>
    </section>
  );
}
