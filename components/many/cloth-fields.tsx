import { type Dispatch, type SetStateAction } from "react";
import { Card, CardHead } from "@/components/ui/card";
import { Field, TextInput } from "@/components/ui/field";
import { type ManyForm, type ReadMany } from "@/lib/many/many-form";

export interface ClothFieldsProps {
  form: ManyForm;
  read: ReadMany;
  onPatch: Dispatch<SetStateAction<ManyForm>>;
}

/** What the cloth is like, and how far outside the seams it is cut. */
export function ClothFields({ form, onPatch, read }: ClothFieldsProps) {
  const { allowance, clothWidth, shrinkage, unit } = form;
  const { errors } = read;
  return (
    <Card aria-labelledby="cloth-fields-title">
      <CardHead id="cloth-fields-title" title="Cloth and allowances" />
      <div className="grid gap-5">
        <Field
          label="Width in the shop"
          optional
          error={errors.clothWidth}
          hint="Between the selvedges. The usual widths are reckoned in any case."
        >
          <TextInput
            figure
            after={unit}
            value={clothWidth}
            onChange={(event) => {
              const typed = event.target.value;
              onPatch((now) => ({ ...now, clothWidth: typed }));
            }}
          />
        </Field>
        <Field
          label="Shrinks by"
          optional
          error={errors.shrinkage}
          hint="Wash a piece of known length and measure it again: from 100 to 95 is 5 %."
        >
          <TextInput
            figure
            after="%"
            value={shrinkage}
            onChange={(event) => {
              const typed = event.target.value;
              onPatch((now) => ({ ...now, shrinkage: typed }));
            }}
          />
        </Field>
        <Field
          label="Seam allowance"
          error={errors.allowance}
          hint="A hem, or another edge that has its own, keeps it."
        >
          <TextInput
            figure
            after={unit}
            value={allowance}
            onChange={(event) => {
              const typed = event.target.value;
              onPatch((now) => ({ ...now, allowance: typed }));
            }}
          />
        </Field>
      </div>
    </Card>
  );
}
