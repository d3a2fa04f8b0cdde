"use client";

import { type KeyboardEvent, memo, useId, useState } from "react";
import { Minus, Plus } from "lucide-react";
import { formatLength } from "@/lib/lengths/format-length";
import { type Phrase as PhraseParts } from "@/lib/lengths/phrase";
import { type Fineness, type Unit } from "@/lib/records/types";
import { steppedText, withEighth } from "@/lib/sleeves/handles";
import { Field, TextInput } from "@/components/ui/field";
import { Phrase } from "@/components/ui/fraction";
import { useHoldRepeat } from "./use-hold-repeat";

export interface FigureFieldProps<K extends string> {
  figure: K;
  name: string;
  /** What it is, in one plain sentence. */
  how: string;
  typed: string;
  unit: Unit;
  fineness: Fineness;
  /** Not needed to draw. */
  optional?: boolean;
  /** What stands there while it is empty, mm: the rule's own value. */
  usualMm?: number;
  /** Why what is typed cannot be read. */
  error?: string;
  /** What is wrong with the figure, and what would do. */
  problem?: PhraseParts;
  /** Where it was taken from; else what it is. */
  said?: PhraseParts;
  onType(figure: K, typed: string): void;
  onFocusFigure?(figure: K): void;
}

/** One length: typed as a hand writes it, stepped by the thumb, with its eighths at hand while it is typed. */
function LengthField<K extends string>(props: FigureFieldProps<K>) {
  const { error, figure, fineness, how, name, onFocusFigure, onType, optional, problem, said, typed } = props;
  const { unit, usualMm } = props;
  const id = useId();
  const [inHand, setInHand] = useState(false);
  const usual = usualMm === undefined ? undefined : formatLength(usualMm, unit, fineness).figure;

  const step = (way: 1 | -1) => {
    onFocusFigure?.(figure);
    const next = steppedText(typed, way, unit, fineness, usualMm);
    if (next !== null) onType(figure, next);
  };
  const keys = (event: KeyboardEvent) => {
    if (event.key !== "ArrowUp" && event.key !== "ArrowDown") return;
    event.preventDefault();
    step(event.key === "ArrowUp" ? 1 : -1);
  };
  const shown = error ?? (problem && <Phrase parts={problem} unit={unit} fineness={fineness} />);

  return (
    <div
      onFocus={() => setInHand(true)}
      onBlur={(event) => {
        if (!event.currentTarget.contains(event.relatedTarget)) setInHand(false);
      }}
    >
      <Field
        id={id}
        label={name}
        optional={optional}
        error={shown}
        hint={said?.length ? <Phrase parts={said} unit={unit} fineness={fineness} /> : how}
      >
        <span className="step-row">
          <StepKey way={-1} words={`${name}, less`} onStep={step} />
          <span className="step-field">
            <TextInput
              figure
              after={unit}
              value={typed}
              placeholder={usual}
              data-figure={figure}
              onChange={(event) => onType(figure, event.target.value)}
              onFocus={() => onFocusFigure?.(figure)}
              onKeyDown={keys}
              className="text-center"
            />
          </span>
          <StepKey way={1} words={`${name}, more`} onStep={step} />
        </span>
        {inHand && unit === "in" && (
          <Eighths name={name} onEighth={(n) => onType(figure, withEighth(typed, n))} />
        )}
      </Field>
    </div>
  );
}

export const FigureField = memo(LengthField) as typeof LengthField;

interface StepKeyProps {
  way: 1 | -1;
  words: string;
  onStep(way: 1 | -1): void;
}

export function StepKey({ onStep, way, words }: StepKeyProps) {
  const hold = useHoldRepeat(() => onStep(way));
  const Sign = way > 0 ? Plus : Minus;
  return (
    <button
      type="button"
      {...hold}
      className="flex min-h-key min-w-13 touch-manipulation items-center justify-center rounded border-2 border-edge bg-well select-none active:bg-ink active:text-onink"
    >
      <Sign aria-hidden="true" className="size-6" />
      <span className="sr-only">{words}</span>
    </button>
  );
}

const eighths = [0, 1, 2, 3, 4, 5, 6, 7] as const;
const words = ["0", "⅛", "¼", "⅜", "½", "⅝", "¾", "⅞"] as const;

function Eighths({ name, onEighth }: { name: string; onEighth(eighth: number): void }) {
  return (
    <span role="group" aria-label={`${name}, the odd eighths`} className="grid grid-cols-4 gap-1.5">
      {eighths.map((n) => (
        <button
          key={n}
          type="button"
          // The field keeps the focus, and the phone its keys.
          onPointerDown={(event) => event.preventDefault()}
          onClick={() => onEighth(n)}
          className="figures flex min-h-target touch-manipulation items-center justify-center rounded border-2 border-edge bg-card px-0 font-semibold"
        >
          {words[n]}
        </button>
      ))}
    </span>
  );
}
