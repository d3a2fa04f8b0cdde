"use client";

import { type KeyboardEvent, memo, useId } from "react";
import { type Cloth, type StyleFigure } from "@/lib/drafting";
import { type Phrase as PhraseParts } from "@/lib/lengths/phrase";
import { type Fineness, type Unit } from "@/lib/records/types";
import { type FieldProblems } from "@/lib/sleeves/field-problems";
import { type SleeveForm } from "@/lib/sleeves/sleeve-form";
import { steppedStyleText, styleFigureText, styleText } from "@/lib/sleeves/style-form";
import { styleName } from "@/lib/sleeves/style-names";
import { isGathered, styleFigures } from "@/lib/sleeves/styles";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Choice, Field, TextInput } from "@/components/ui/field";
import { Length, Phrase } from "@/components/ui/fraction";
import { FigureField, StepKey } from "./figure-field";

export interface StyleFiguresProps {
  form: SleeveForm;
  beside: FieldProblems;
  /** The style's figures for this sleeve; empty while the plain sleeve cannot be drawn. */
  shown: readonly StyleFigure[];
  onType(key: string, typed: string): void;
  onPatch(patch: (now: SleeveForm) => SleeveForm): void;
}

const cloths: { value: Cloth; label: string; sub: string }[] = [
  { value: "fine", label: "Fine", sub: "voile, lawn" },
  { value: "medium", label: "Medium", sub: "cotton, linen" },
  { value: "heavy", label: "Heavy", sub: "wool, brocade" },
];

/** What the style asks for: each figure is its usual one until another is typed. */
export const StyleFigures = memo(function StyleFigures(props: StyleFiguresProps) {
  const { beside, form, onPatch, onType, shown } = props;
  const { cloth, fineness, style, unit } = form;
  const known = shown.length > 0;
  return (
    <Card aria-labelledby="style-figures-title">
      <CardHead
        id="style-figures-title"
        title={styleName(style)}
        sub={
          known
            ? "Left empty, a figure is the usual one. Usual figures grow with the sleeve (common practice, no source)."
            : "The usual figures stand here once the plain sleeve can be drawn."
        }
      />
      <div className="grid grid-cols-[minmax(0,1fr)] gap-5">
        {isGathered(style) && (
          <Choice
            label="Cloth"
            name="cloth"
            options={cloths}
            value={cloth}
            hint="How much it can be gathered before it bunches."
            onChange={(event) => {
              const chosen = event.target.value as Cloth;
              onPatch((now) => ({ ...now, cloth: chosen }));
            }}
          />
        )}
        {(known ? shown : styleFigures(style)).map((figure) => (
          <StyleField
            key={figure.key}
            {...{ figure, known, unit, fineness, onType }}
            typed={styleText(form, figure.key)}
            error={beside.styleErrors[figure.key]}
            problem={beside.styleProblems[figure.key]}
          />
        ))}
      </div>
    </Card>
  );
});

interface StyleFieldProps {
  figure: StyleFigure;
  /** Its usual value is of this sleeve. */
  known: boolean;
  typed: string;
  unit: Unit;
  fineness: Fineness;
  error?: string;
  problem?: PhraseParts;
  onType(key: string, typed: string): void;
}

function StyleField(props: StyleFieldProps) {
  const { error, figure, fineness, known, onType, problem, typed, unit } = props;
  const { does, key, kind, label, usual } = figure;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-1">
      {kind === "length" ? (
        <FigureField
          {...{ typed, unit, fineness, error, problem, onType }}
          figure={key}
          name={label}
          how={does}
          usualMm={known ? usual : undefined}
        />
      ) : (
        <NumberField {...props} />
      )}
      {typed !== "" && known && (
        <Button variant="quiet" className="-ms-3 justify-self-start" onClick={() => onType(key, "")}>
          <span>
            Back to the usual{" "}
            {kind === "length" ? (
              <Length mm={usual} unit={unit} fineness={fineness} />
            ) : (
              styleFigureText(kind, usual, unit, fineness)
            )}
          </span>
        </Button>
      )}
    </div>
  );
}

/** How many, or how many times: typed, or with the keys beside it. */
function NumberField({ error, figure, fineness, known, onType, problem, typed, unit }: StyleFieldProps) {
  const id = useId();
  const { does, key, kind, label, usual } = figure;
  const step = (way: 1 | -1) => {
    const next = steppedStyleText(figure, typed, way, unit, fineness);
    if (next !== null) onType(key, next);
  };
  const keys = (event: KeyboardEvent) => {
    if (event.key !== "ArrowUp" && event.key !== "ArrowDown") return;
    event.preventDefault();
    step(event.key === "ArrowUp" ? 1 : -1);
  };
  return (
    <Field
      id={id}
      label={label}
      error={error ?? (problem && <Phrase parts={problem} unit={unit} fineness={fineness} />)}
      hint={does}
    >
      <span className="step-row">
        <StepKey way={-1} words={`${label}, less`} onStep={step} />
        <span className="step-field">
          <TextInput
            figure
            inputMode={kind === "count" ? "numeric" : "decimal"}
            after={kind === "ratio" ? ": 1" : undefined}
            value={typed}
            placeholder={known ? styleFigureText(kind, usual, unit, fineness) : undefined}
            onChange={(event) => onType(key, event.target.value)}
            onKeyDown={keys}
            className="text-center"
          />
        </span>
        <StepKey way={1} words={`${label}, more`} onStep={step} />
      </span>
    </Field>
  );
}
