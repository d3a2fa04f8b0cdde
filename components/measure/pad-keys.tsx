"use client";

import { type ComponentProps } from "react";
import { ChevronLeft, Delete } from "lucide-react";
import { Button } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { formatLength } from "@/lib/lengths/format-length";
import { speakLength } from "@/lib/lengths/speak-length";
import { mmPerInch } from "@/lib/lengths/units";
import { type PreviousFigure } from "@/lib/measuring/previous";
import { type Press } from "@/lib/measuring/press";
import { type Fineness, type Unit } from "@/lib/records/types";
import { Length } from "@/components/ui/fraction";

type OnPress = (key: Press) => void;

/** A key leaves the focus where it was, so that a keyboard goes on typing into the figure. */
function Key({ className, ...rest }: ComponentProps<"button">) {
  return (
    <button
      type="button"
      {...rest}
      className={cx("pad-key", className)}
      onPointerDown={(event) => event.preventDefault()}
    />
  );
}

const digits = [1, 2, 3, 4, 5, 6, 7, 8, 9] as const;

function Digits({ unit, onPress }: { unit: Unit; onPress: OnPress }) {
  const digit = (n: number) => (
    <Key key={n} className="figures" onClick={() => onPress({ do: "digit", digit: n })}>
      {n}
    </Key>
  );
  return (
    <div
      role="group"
      aria-label={unit === "in" ? "Whole inches" : "Whole centimetres"}
      className="pad-group grid-cols-3"
    >
      {digits.map(digit)}
      <Key aria-label="Take the last one away" onClick={() => onPress({ do: "erase" })}>
        <Delete aria-hidden="true" className="size-6" />
      </Key>
      {digit(0)}
      <Key className="pad-key-word" onClick={() => onPress({ do: "clear" })}>
        Clear
      </Key>
    </div>
  );
}

/** Each of these finishes the figure: the inch in its eighths or sixteenths, quarters first in each row. */
function InchParts({ fineness, onPress }: { fineness: Fineness; onPress: OnPress }) {
  return (
    <div
      role="group"
      aria-label={
        fineness === 8 ? "Eighths, and on to the next figure" : "Sixteenths, and on to the next figure"
      }
      className={cx("pad-group", fineness === 8 ? "grid-cols-2" : "grid-cols-4")}
    >
      {Array.from({ length: fineness }, (_, over) => {
        const { numerator, denominator } = formatLength((over / fineness) * mmPerInch, "in", fineness);
        return (
          <Key
            key={over}
            className="pad-key-part figures"
            aria-label={
              over === 0 ? "Whole, nothing over" : speakLength((over / fineness) * mmPerInch, "in", fineness)
            }
            onClick={() => onPress({ do: "part", over, under: fineness })}
          >
            {over === 0 ? (
              <span className="pad-key-word font-sans">{fineness === 8 ? "whole" : "–"}</span>
            ) : (
              <span className="stacked-fraction">
                <span>{numerator}</span>
                <span>{denominator}</span>
              </span>
            )}
          </Key>
        );
      })}
    </div>
  );
}

function Millimetres({ onPress }: { onPress: OnPress }) {
  return (
    <div role="group" aria-label="Millimetres, and on to the next figure" className="pad-group grid-cols-3">
      {[...digits, 0].map((over) => (
        <Key
          key={over}
          className={cx("pad-key-part figures", over === 0 && "col-span-3")}
          aria-label={
            over === 0 ? "Whole, nothing over" : `${over} ${over === 1 ? "millimetre" : "millimetres"}`
          }
          onClick={() => onPress({ do: "part", over, under: 10 })}
        >
          .{over}
        </Key>
      ))}
    </div>
  );
}

export interface PadKeysProps {
  unit: Unit;
  fineness: Fineness;
  previous: PreviousFigure | undefined;
  first: boolean;
  onPress: OnPress;
}

/** The keys: whole numbers at the left, what finishes the figure at the right, and below them where to go. */
export function PadKeys({ unit, fineness, previous, first, onPress }: PadKeysProps) {
  return (
    <>
      <div className="pad-keys" data-parts={unit === "cm" ? 10 : fineness}>
        <Digits unit={unit} onPress={onPress} />
        {unit === "in" ? (
          <InchParts fineness={fineness} onPress={onPress} />
        ) : (
          <Millimetres onPress={onPress} />
        )}
      </div>
      <div className="pad-acts">
        <Button
          className="px-3!"
          aria-label="Back one figure"
          disabled={first}
          onClick={() => onPress({ do: "back" })}
        >
          <ChevronLeft aria-hidden="true" className="size-6" />
        </Button>
        <Button className="px-2.5!" onClick={() => onPress({ do: "skip" })}>
          Skip
        </Button>
        {previous && (
          <Button
            className="flex-1 gap-1.5 px-1.5! py-0 [&_.length-unit]:hidden"
            onClick={() => onPress({ do: "same" })}
          >
            <span className="text-sm">
              Same<span className="sr-only"> as last time,</span>
            </span>
            <Length mm={previous.mm} unit={unit} fineness={fineness} />
          </Button>
        )}
        <Button variant="main" className="min-w-16 flex-1 px-2!" onClick={() => onPress({ do: "next" })}>
          Next
        </Button>
      </div>
    </>
  );
}
