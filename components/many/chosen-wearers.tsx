"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Sheet } from "@/components/ui/dialog";
import { namesInWords } from "@/lib/clients/list-words";
import { MOST_WEARERS } from "@/lib/many/many-form";
import { type ManyWearer } from "@/lib/many/many-wearer";
import { type IsoDate } from "@/lib/people/iso-date";
import { ChooseWearers } from "./choose-wearers";

export interface ChosenWearersProps {
  ids: readonly string[];
  /** The rows of those chosen, as far as they are known. */
  wearers: readonly ManyWearer[];
  today: IsoDate;
  onAdd(ids: readonly string[]): void;
  onTake(ids: readonly string[]): void;
}

/** More names than these are only counted. */
const NAMED = 12;

/** For whom it is drafted, and the way to choose them. */
export function ChosenWearers({ ids, onAdd, onTake, today, wearers }: ChosenWearersProps) {
  const [open, setOpen] = useState(false);
  const names = wearers.map(({ wearer }) => wearer.name);
  const shown = names.length > NAMED ? [...names.slice(0, NAMED), `${names.length - NAMED} more`] : names;
  return (
    <Card aria-labelledby="who-title">
      <CardHead id="who-title" title="Who it is for" sub={<span role="status">{ids.length} chosen</span>} />
      <p className="mb-3 wrap-anywhere">
        {ids.length === 0
          ? "A choir, a bridal party, a school play: choose everyone who wears it."
          : namesInWords(shown)}
      </p>
      {ids.length >= MOST_WEARERS && (
        <p className="mb-3 font-semibold">{MOST_WEARERS} is as many as can be drafted at once.</p>
      )}
      <div className="flex flex-wrap gap-2">
        <Sheet
          open={open}
          onOpenChange={setOpen}
          title="Who is it for?"
          trigger={<Button>{ids.length === 0 ? "Choose wearers" : "Change who"}</Button>}
        >
          <ChooseWearers {...{ ids, today, onAdd, onTake }} />
          <div className="sheet-action">
            <Button variant="main" full onClick={() => setOpen(false)}>
              {ids.length === 0 ? "Close" : `Done, ${ids.length} chosen`}
            </Button>
          </div>
        </Sheet>
        {ids.length > 0 && (
          <Button variant="quiet" onClick={() => onTake(ids)}>
            Take all off
          </Button>
        )}
      </div>
    </Card>
  );
}
