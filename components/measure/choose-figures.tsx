"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Check } from "@/components/ui/field";
import { Card, CardHead } from "@/components/ui/card";
import { Length } from "@/components/ui/fraction";
import { Screen } from "@/components/ui/screen";
import { bodyMeasure, fullSet, type MeasureKey, sleeveSet } from "@/lib/figures/body-measures";
import { type Known } from "@/lib/measuring/taking";
import { formatDay } from "@/lib/people/format-day";
import { type Fineness, type Unit } from "@/lib/records/types";
import { TapeDrawing } from "./tape-drawing";

export interface ChooseFiguresProps {
  wearer: string;
  sub: string;
  back: { href: string; label: string };
  known: Known;
  unit: Unit;
  fineness: Fineness;
  onStart: (keys: readonly MeasureKey[]) => void;
}

const names = (keys: readonly MeasureKey[]): string =>
  keys.map((key, i) => (i === 0 ? bodyMeasure(key).name : bodyMeasure(key).name.toLowerCase())).join(", ");

function SetButton({
  drawing,
  name,
  count,
  say,
  onPress,
}: {
  drawing: MeasureKey;
  name: string;
  count: number;
  say: string;
  onPress: () => void;
}) {
  return (
    <button
      type="button"
      onClick={onPress}
      className="card grid w-full grid-cols-[4.5rem_minmax(0,1fr)] items-center gap-3 p-4 text-start hover:border-ink"
    >
      <TapeDrawing measure={drawing} className="h-28 [--card:var(--well)]" />
      <span>
        <span className="block font-figure text-xl font-bold">{name}</span>
        <span className="block font-semibold">{count} figures, in tape order</span>
        <span className="block text-sm text-soft">{say}</span>
      </span>
    </button>
  );
}

/** What is to be taken: the short set for a sleeve, everything, or single figures. */
export function ChooseFigures({ wearer, sub, back, known, unit, fineness, onStart }: ChooseFiguresProps) {
  const [chosen, setChosen] = useState<ReadonlySet<MeasureKey>>(new Set());
  const toggle = (key: MeasureKey) => {
    const next = new Set(chosen);
    if (!next.delete(key)) next.add(key);
    setChosen(next);
  };
  return (
    <Screen
      title={`Measure ${wearer}`}
      sub={sub}
      back={back}
      action={
        chosen.size > 0 && (
          <Button variant="main" full onClick={() => onStart([...chosen])}>
            {chosen.size === 1 ? "Take this figure" : `Take these ${chosen.size} figures`}
          </Button>
        )
      }
    >
      <SetButton
        drawing="upperArmGirth"
        name="For a sleeve"
        count={sleeveSet.measures.length}
        say={names(sleeveSet.measures)}
        onPress={() => onStart(sleeveSet.measures)}
      />
      <SetButton
        drawing="bustGirth"
        name="Full set"
        count={fullSet.measures.length}
        say="Shoulder, armscye, arm, back, bust and waist."
        onPress={() => onStart(fullSet.measures)}
      />
      <Card aria-labelledby="single">
        <CardHead id="single" title="Single figures" sub="Tick what is to be taken." />
        <ul>
          {fullSet.measures.map((key) => {
            const last = known.previous[key];
            return (
              <li key={key} className="border-t border-line">
                <Check
                  checked={chosen.has(key)}
                  onChange={() => toggle(key)}
                  label={
                    <>
                      <span className="font-semibold">{bodyMeasure(key).name}</span>
                      {last && (
                        <span className="block text-sm text-soft">
                          <Length mm={last.mm} unit={unit} fineness={fineness} />, {formatDay(last.takenOn)}
                        </span>
                      )}
                    </>
                  }
                />
              </li>
            );
          })}
        </ul>
      </Card>
    </Screen>
  );
}
