"use client";

import { memo } from "react";
import { type Fineness, type Unit, type Wearer } from "@/lib/records/types";
import { type SleeveForm } from "@/lib/sleeves/sleeve-form";
import { Card, CardHead } from "@/components/ui/card";
import { Choice, Field, TextArea, TextInput } from "@/components/ui/field";
import { WhoseSleeve } from "./whose-sleeve";

export interface SleeveDetailsProps {
  name: string;
  note: string;
  wearerId: string | null;
  unit: Unit;
  fineness: Fineness;
  whose: Wearer | null;
  suggested: string;
  onPatch(patch: (now: SleeveForm) => SleeveForm): void;
}

/** The name it is found by, whose it is, and how finely its marks are set out. */
export const SleeveDetails = memo(function SleeveDetails(props: SleeveDetailsProps) {
  const { fineness, name, note, onPatch, suggested, unit, wearerId, whose } = props;
  return (
    <Card aria-labelledby="details-title">
      <CardHead id="details-title" title="Name and wearer" />
      <div className="grid grid-cols-[minmax(0,1fr)] gap-5">
        <Field
          label="Name"
          optional
          hint={name.trim() ? undefined : `Left empty, it is called “${suggested}”.`}
        >
          <TextInput
            value={name}
            maxLength={120}
            onChange={(event) => {
              const typed = event.target.value;
              onPatch((now) => ({ ...now, name: typed }));
            }}
          />
        </Field>
        <WhoseSleeve
          wearerId={wearerId}
          whose={whose}
          onChoose={(wearerId) =>
            onPatch((now) => ({ ...now, wearerId, setId: wearerId === now.wearerId ? now.setId : null }))
          }
        />
        {unit === "in" && (
          <Choice
            label="Marks set out to"
            name="fineness"
            options={[
              { value: "8", label: "Eighths" },
              { value: "16", label: "Sixteenths" },
            ]}
            value={String(fineness)}
            onChange={(event) => {
              const chosen = event.target.value === "16" ? 16 : 8;
              onPatch((now) => ({ ...now, fineness: chosen }));
            }}
          />
        )}
        <Field label="Note" optional>
          <TextArea
            value={note}
            maxLength={2000}
            onChange={(event) => {
              const typed = event.target.value;
              onPatch((now) => ({ ...now, note: typed }));
            }}
          />
        </Field>
      </div>
    </Card>
  );
});
