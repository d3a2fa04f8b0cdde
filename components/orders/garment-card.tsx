"use client";

import { TriangleAlert } from "lucide-react";
import { useWatch } from "react-hook-form";
import { Button, ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Field, Select, TextArea, TextInput } from "@/components/ui/field";
import { setChoiceWords, sleevesFor, withWearer } from "@/lib/orders/garment-choices";
import { staleness } from "@/lib/figures/staleness";
import { ageOn } from "@/lib/people/age";
import { styleName } from "@/lib/sleeves/style-names";
import { type WearerChoice } from "@/lib/store/queries/orders";
import { type GarmentsFieldsProps, KINDS_LIST } from "./garments-fields";

interface GarmentCardProps extends GarmentsFieldsProps {
  at: number;
  onLeaveOut?: () => void;
}

/** One garment of an order, as it is typed. */
export function GarmentCard({ form, at, people, today, otherNames, onLeaveOut }: GarmentCardProps) {
  const garment = useWatch({ control: form.control, name: `garments.${at}` });
  const dueOn = useWatch({ control: form.control, name: "dueOn" });
  const errors = form.formState.errors.garments?.[at];
  const choice = people.wearers.find(({ wearer }) => wearer.id === garment.wearerId);
  const other = choice ? undefined : otherNames.get(garment.wearerId);
  const sleeves = sleevesFor(choice, people.bareSleeves);
  const strangeSleeve = garment.sleeveId !== "" && sleeves.every(({ id }) => id !== garment.sleeveId);
  const name = garment.kind.trim() || `Garment ${at + 1}`;
  const chooseWearer = (wearerId: string) => {
    const next = withWearer(form.getValues(`garments.${at}`), wearerId, people);
    form.setValue(`garments.${at}.wearerId`, wearerId, { shouldDirty: true });
    form.setValue(`garments.${at}.setId`, next.setId, { shouldDirty: true });
    form.setValue(`garments.${at}.sleeveId`, next.sleeveId, { shouldDirty: true });
  };

  return (
    <Card aria-label={`Garment ${at + 1}, ${name}`}>
      <CardHead
        level={3}
        title={name}
        end={
          onLeaveOut && (
            <Button variant="quiet" onClick={onLeaveOut} aria-label={`Leave out garment ${at + 1}, ${name}`}>
              Leave out
            </Button>
          )
        }
      />
      <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
        <Field label="Kind" error={errors?.kind?.message}>
          <TextInput
            {...form.register(`garments.${at}.kind`)}
            list={KINDS_LIST}
            autoComplete="off"
            autoCapitalize="sentences"
          />
        </Field>
        {(people.wearers.length > 0 || other) && (
          <Field label="For whom">
            <Select value={garment.wearerId} onChange={(event) => chooseWearer(event.target.value)}>
              <option value="">Nobody named yet</option>
              {people.wearers.map(({ wearer }) => (
                <option key={wearer.id} value={wearer.id}>
                  {wearer.name}
                </option>
              ))}
              {other && <option value={garment.wearerId}>{other}, in the bin</option>}
            </Select>
          </Field>
        )}
        {choice && <SetField form={form} at={at} choice={choice} setId={garment.setId} today={today} />}
        {(sleeves.length > 0 || strangeSleeve) && (
          <Field label="Sleeve drafted" optional>
            <Select {...form.register(`garments.${at}.sleeveId`)}>
              <option value="">None</option>
              {sleeves.map((sleeve) => (
                <option key={sleeve.id} value={sleeve.id}>
                  {sleeve.name}, {styleName(sleeve.style)}
                  {sleeve.wearerId === null ? ", nobody’s yet" : ""}
                </option>
              ))}
              {strangeSleeve && <option value={garment.sleeveId}>A sleeve from the bin</option>}
            </Select>
          </Field>
        )}
        <Field
          label="Fitting"
          optional
          error={errors?.fittingOn?.message}
          hint={
            garment.fittingOn !== "" && dueOn !== "" && garment.fittingOn > dueOn
              ? "This is after the day it is due."
              : undefined
          }
        >
          <TextInput type="date" {...form.register(`garments.${at}.fittingOn`)} />
        </Field>
        <Field label="Note" optional>
          <TextArea rows={1} {...form.register(`garments.${at}.note`)} placeholder="Cloth, length, opening" />
        </Field>
      </div>
    </Card>
  );
}

interface SetFieldProps extends Pick<GarmentsFieldsProps, "form" | "today"> {
  at: number;
  choice: WearerChoice;
  setId: string;
}

/** Which figures it is cut by; says so where they are too old for it. */
function SetField({ form, at, choice: { wearer, sets }, setId, today }: SetFieldProps) {
  const measure = (
    <ButtonLink href={`/measure?wearer=${wearer.id}`} className="justify-self-start">
      Measure {wearer.name}
    </ButtonLink>
  );
  if (sets.length === 0 && setId === "")
    return (
      <div className="grid gap-2">
        <p>{wearer.name} is not measured yet. What you typed here waits for you.</p>
        {measure}
      </div>
    );
  const chosen = sets.find(({ id }) => id === setId);
  const stale = chosen && staleness(chosen.takenOn, ageOn(wearer, today)?.years, today).say;
  return (
    <div className="grid gap-2">
      <Field label="Figures taken on">
        <Select {...form.register(`garments.${at}.setId`)}>
          {sets.map((set) => (
            <option key={set.id} value={set.id}>
              {setChoiceWords(set)}
            </option>
          ))}
          {setId !== "" && !chosen && <option value={setId}>A set that was put right since</option>}
          <option value="">None yet, measure later</option>
        </Select>
      </Field>
      {stale && (
        <>
          <p className="flex items-start gap-2 font-semibold text-thread">
            <TriangleAlert aria-hidden="true" className="mt-[0.2em] size-[1.1em] shrink-0" />
            <span>{stale}</span>
          </p>
          {measure}
        </>
      )}
    </div>
  );
}
