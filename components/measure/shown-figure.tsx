"use client";

import { type RefObject, useId } from "react";
import { ArrowLeftRight } from "lucide-react";
import { Length } from "@/components/ui/fraction";
import { Tape } from "@/components/ui/tape";
import { speakLength } from "@/lib/lengths/speak-length";
import { shownEntry } from "@/lib/measuring/entry";
import { type TakenHere } from "@/lib/measuring/taking";
import { type Fineness, type Unit } from "@/lib/records/types";

function Entry({ text, unit }: { text: string; unit: Unit }) {
  const shown = shownEntry(text, unit);
  if ("raw" in shown) return <span className="truncate text-[0.7em]">{shown.raw}</span>;
  const { whole, over, under } = shown;
  return (
    <span className="figures inline-flex items-baseline">
      {whole}
      {over > 0 && unit === "cm" && `.${over}`}
      {over > 0 && unit === "in" && (
        <span className="stacked-fraction">
          <span>{over}</span>
          <span>{under}</span>
        </span>
      )}
    </span>
  );
}

export interface ShownFigureProps {
  name: string;
  entry: string;
  taken: TakenHere | undefined;
  unit: Unit;
  fineness: Fineness;
  invalid: boolean;
  /** Ids of the words about it. */
  describedBy: string;
  input: RefObject<HTMLInputElement | null>;
  onType: (text: string) => void;
  onEnter: () => void;
  onUnit: (unit: Unit) => void;
}

/**
 * The figure at hand, the largest thing on the screen. Below it lies a real field, for a keyboard with keys; the
 * phone's own keyboard stays down.
 */
export function ShownFigure(props: ShownFigureProps) {
  const { name, entry, taken, unit, fineness, invalid, describedBy, input, onType, onEnter, onUnit } = props;
  const id = useId();
  const unitWord = unit === "in" ? "inches" : "centimetres";
  const other = unit === "in" ? "cm" : "in";
  return (
    <div className="pad-shown">
      <div className="pad-giant">
        <label htmlFor={id} className="sr-only">
          {name}, in {unitWord}
          {taken && entry === "" && `, taken: ${speakLength(taken.mm, taken.unit, fineness)}`}
        </label>
        <input
          ref={input}
          id={id}
          type="text"
          inputMode="none"
          autoComplete="off"
          autoCorrect="off"
          spellCheck={false}
          aria-describedby={describedBy}
          aria-invalid={invalid || undefined}
          value={entry}
          onChange={(event) => onType(event.target.value)}
          onKeyDown={(event) => {
            if (event.key !== "Enter") return;
            event.preventDefault();
            onEnter();
          }}
        />
        <span aria-hidden="true" className="flex min-w-0 items-center">
          {entry !== "" || !taken ? (
            <>
              <Entry text={entry} unit={unit} />
              <span className="pad-caret" />
            </>
          ) : (
            <Length mm={taken.mm} unit={taken.unit} fineness={fineness} />
          )}
        </span>
      </div>
      <button
        type="button"
        className="me-2 flex min-h-target min-w-target items-center gap-1.5 rounded border-2 border-edge px-3 font-semibold"
        aria-label={`Counting in ${unitWord}. Count in ${unit === "in" ? "centimetres" : "inches"}`}
        onPointerDown={(event) => event.preventDefault()}
        onClick={() => onUnit(other)}
      >
        {unit}
        <ArrowLeftRight aria-hidden="true" className="size-4" />
      </button>
      <Tape unit={unit} className="col-span-2" />
    </div>
  );
}
