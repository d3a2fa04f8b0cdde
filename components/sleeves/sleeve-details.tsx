"use client";

import { type Wearer } from "@/lib/records/types";
import { type SleeveForm } from "@/lib/sleeves/sleeve-form";
import { Card, CardHead } from "@/components/ui/card";
import { Choice, Field, TextArea, TextInput } from "@/components/ui/field";
import { WhoseSleeve } from "./whose-sleeve";

export interface SleeveDetailsProps {
  form: SleeveForm;
  whose: Wearer | null;
  suggested: string;
  onPatch(patch: (now: SleeveForm) => SleeveForm): void;
}

/** The name it is found by, whose it is, and how finely its marks are set out. */
export function SleeveDetails({ form, onPatch, suggested, whose }: SleeveDetailsProps) {
  return (
    <Card aria-labelledby="details-title">
      <CardHead id="details-title" title="Name and wearer" />
      <div className="grid gap-5">
        <Field
          label="Name"
          optional
          hint={form.name.trim() ? undefined : `Left empty, it is called “${suggested}”.`}
        >
          <TextInput
            value={form.name}
            maxLength={120}
            onChange={(event) => {
              const name = event.target.value;
              onPatch((now) => ({ ...now, name }));
            }}
          />
        </Field>
        <WhoseSleeve
          wearerId={form.wearerId}
          whose={whose}
          onChoose={(wearerId) =>
            onPatch((now) => ({ ...now, wearerId, setId: wearerId === now.wearerId ? now.setId : null }))
          }
        />
        {form.unit === "in" && (
          <Choice
            label="Marks set out to"
            name="fineness"
            options={[
              { value: "8", label: "Eighths" },
              { value: "16", label: "Sixteenths" },
            ]}
            value={String(form.fineness)}
            onChange={(event) => {
              const fineness = event.target.value === "16" ? 16 : 8;
              onPatch((now) => ({ ...now, fineness }));
            }}
          />
        )}
        <Field label="Note" optional>
          <TextArea
            value={form.note}
            maxLength={2000}
            onChange={(event) => {
              const note = event.target.value;
              onPatch((now) => ({ ...now, note }));
            }}
          />
        </Field>
      </div>
    </Card>
  );
}
