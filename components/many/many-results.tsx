"use client";

import { type Dispatch, type SetStateAction, useMemo, useState } from "react";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { manyLists } from "@/lib/many/many-text";
import { stepOf } from "@/lib/lengths/units";
import { clothRows } from "@/lib/many/cloth-rows";
import { cutList } from "@/lib/many/cut-list";
import { draftedOf, failingFirst, type ManyRow, type NotDrafted } from "@/lib/many/draft-many";
import { type ManyForm, type ReadMany } from "@/lib/many/many-form";
import { type IsoDate } from "@/lib/people/iso-date";
import { ClothCard } from "./cloth-card";
import { ClothFields } from "./cloth-fields";
import { CutListCard } from "./cut-list-card";
import { DraftedCards, DraftedTable } from "./drafted-wearers";
import { NotDraftedCard } from "./not-drafted-card";
import { PrintMany } from "./print-many";

export interface ManyResultsProps {
  rows: readonly ManyRow[];
  form: ManyForm;
  read: ReadMany;
  today: IsoDate;
  workshopName: string;
  /** Something was changed since, and it is being drafted anew. */
  stale: boolean;
  onPatch: Dispatch<SetStateAction<ManyForm>>;
}

/** Each shown row is a card with figures: more at once only make a phone slow. */
const PAGE = 30;

export function ManyResults(props: ManyResultsProps) {
  const { form, onPatch, read, rows, stale, today, workshopName } = props;
  const { fineness, oldToo, style, unit } = form;
  const [limit, setLimit] = useState(PAGE);
  const sorted = useMemo(() => failingFirst(rows), [rows]);
  const drafted = useMemo(() => draftedOf(sorted), [sorted]);
  const not = useMemo(() => sorted.filter((row): row is NotDrafted => !row.drafted), [sorted]);
  const { allowance, clothWidth, shrinks } = read;
  // Cut and printed in the order they were chosen.
  const inOrder = useMemo(() => draftedOf(rows), [rows]);
  const pieces = useMemo(
    () => cutList(inOrder, allowance, stepOf(unit, fineness)),
    [inOrder, allowance, unit, fineness],
  );
  const cloth = useMemo(
    () => clothRows(pieces, clothWidth, shrinks, unit),
    [pieces, clothWidth, shrinks, unit],
  );
  const lists = useMemo(
    () => manyLists({ pieces, cloth, left: not, unit, fineness }),
    [pieces, cloth, not, unit, fineness],
  );
  const units = { unit, fineness };
  const shown = drafted.slice(0, limit);
  return (
    <section aria-label="What comes of it" aria-busy={stale} className="grid grid-cols-[minmax(0,1fr)] gap-4">
      {(not.length > 0 || oldToo) && (
        <NotDraftedCard
          {...{ ...units, not, oldToo }}
          of={rows.length}
          onOldToo={(old) => onPatch((now) => ({ ...now, oldToo: old }))}
        />
      )}
      {drafted.length > 0 && (
        <>
          <Card aria-labelledby="drafted-title">
            <CardHead id="drafted-title" title="Drafted" sub={draftedWords(drafted, rows.length)} />
            <DraftedCards rows={shown} {...units} />
            <DraftedTable rows={shown} {...units} />
            {drafted.length > limit && (
              <Button className="mt-3" onClick={() => setLimit((now) => now + PAGE)}>
                Show {Math.min(PAGE, drafted.length - limit)} more
              </Button>
            )}
          </Card>
          <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-4 lg:grid-cols-2">
            <CutListCard {...{ ...units, pieces, cloth, not, style }} count={drafted.length} />
            <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
              <ClothFields {...{ form, read, onPatch }} />
              <ClothCard cloth={cloth} not={not} shrinks={shrinks} />
              <PrintMany {...{ ...units, allowance, lists, style, today, workshopName }} drafted={inOrder} />
            </div>
          </div>
        </>
      )}
    </section>
  );
}

function draftedWords(drafted: readonly { verdict: string }[], of: number): string {
  const count = (verdict: string) => drafted.filter((row) => row.verdict === verdict).length;
  const [wrong, look] = [count("wrong"), count("look")];
  const parts = [
    `${drafted.length} of ${of}`,
    ...(wrong > 0 ? [`${wrong} wrong`] : []),
    ...(look > 0 ? [`${look} to look at`] : []),
  ];
  return parts.join(", ");
}
