"use client";

import { memo, useEffect, useState } from "react";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Sheet } from "@/components/ui/dialog";
import { type StyleId } from "@/lib/records/types";
import { examplePieces, styleChoice, styleChoices } from "@/lib/sleeves/styles";
import { SleeveThumb } from "./sleeve-thumb";

export interface StyleCardProps {
  style: StyleId;
  onChoose(style: StyleId): void;
}

/** How the sleeve is to look, and the way to another. */
export const StyleCard = memo(function StyleCard({ onChoose, style }: StyleCardProps) {
  const [open, setOpen] = useState(false);
  const { look, name } = styleChoice(style);
  return (
    <Card aria-labelledby="style-title">
      <CardHead id="style-title" title="Style" className="mb-1" />
      <p className="font-semibold">{name}</p>
      <p className="mb-3 text-soft">{look}</p>
      <Sheet
        open={open}
        onOpenChange={setOpen}
        title="Choose a style"
        trigger={<Button>Choose another style</Button>}
      >
        <StyleList
          style={style}
          onChoose={(chosen) => {
            onChoose(chosen);
            setOpen(false);
          }}
        />
      </Sheet>
    </Card>
  );
});

/** Every style with its pieces and its look; the one in use is marked. */
function StyleList({ onChoose, style }: StyleCardProps) {
  const drawn = useOneByOne(styleChoices.length);
  return (
    <ul className="rows rounded border-2 border-edge">
      {styleChoices.map(({ id, look, name }, i) => (
        <li key={id}>
          <button
            type="button"
            onClick={() => onChoose(id)}
            className="row row-link w-full text-start"
            aria-current={id === style ? "true" : undefined}
          >
            <span className="size-16 shrink-0">
              {i < drawn && <SleeveThumb pieces={examplePieces(id)} />}
            </span>
            <span className="min-w-0 flex-1">
              <span className="block font-semibold">{name}</span>
              <span className="block text-sm text-soft">{look}</span>
            </span>
          </button>
        </li>
      ))}
    </ul>
  );
}

/** Counts up, one a turn: all styles are drafted for the list, and its words must not wait for that. */
function useOneByOne(count: number): number {
  const [done, setDone] = useState(0);
  useEffect(() => {
    if (done >= count) return;
    const timer = setTimeout(() => setDone(done + 1));
    return () => clearTimeout(timer);
  }, [done, count]);
  return done;
}
