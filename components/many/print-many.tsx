"use client";

import { useCallback, useState } from "react";
import { ShareDocument } from "@/components/share-document";
import { Card, CardHead } from "@/components/ui/card";
import { Check } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { type DraftedWearer } from "@/lib/many/draft-many";
import { inTurns } from "@/lib/many/in-turns";
import { printedOne } from "@/lib/many/print-many";
import { type IsoDate } from "@/lib/people/iso-date";
import { type TitledList } from "@/lib/pdf/full-size-document";
import { type FullSizePaper, rollWidths } from "@/lib/pdf/papers";
import { type OnProgress } from "@/lib/pdf/pdf-api";
import { type Fineness, type StyleId, type Unit } from "@/lib/records/types";
import { styleName } from "@/lib/sleeves/style-names";
import { screenTurns } from "./screen-turns";

export interface PrintManyProps {
  drafted: readonly DraftedWearer[];
  /** Printed after the contents. */
  lists: readonly TitledList[];
  /** mm. */
  allowance: number;
  style: StyleId;
  unit: Unit;
  fineness: Fineness;
  today: IsoDate;
  workshopName: string;
}

const papers: { value: FullSizePaper; label: string; sub?: string }[] = [
  { value: "a4", label: "A4" },
  { value: "letter", label: "Letter" },
  { value: "a3", label: "A3" },
  ...rollWidths.map((width) => ({
    value: `roll-${width}` as const,
    label: "Roll",
    sub: `${width} mm wide`,
  })),
];

/** Everyone's pattern at full size in one file, with a page of contents before them. */
export function PrintMany(props: PrintManyProps) {
  const { allowance, drafted, fineness, lists, style, today, unit, workshopName } = props;
  const [allowed, setAllowed] = useState(true);
  const width = allowed ? allowance : null;
  const make = useCallback(
    async (paper: FullSizePaper, onProgress: OnProgress) => {
      const ask = { allowance: width, unit, fineness, author: workshopName, today };
      const of = drafted.length;
      const docs = await inTurns(drafted, (one) => printedOne(one, ask), {
        ...screenTurns,
        // Drawing the pieces is about half of the work.
        onTurn: (done) => onProgress(done, 2 * of),
      });
      const { makeFullSize } = await import("@/lib/pdf/client");
      return makeFullSize({ docs: docs!, lists, paper }, (done, all) => onProgress(all + done, 2 * all));
    },
    [drafted, lists, width, unit, fineness, workshopName, today],
  );
  const wrong = drafted.filter(({ verdict }) => verdict === "wrong").length;
  return (
    <Card aria-labelledby="print-many-title">
      <CardHead
        id="print-many-title"
        title="Print all full size"
        sub="All sheets in one file; contents, cut list and cloth first."
      />
      {wrong > 0 && (
        <Notice
          tone="look"
          className="mb-3"
          title={`${wrong} ${wrong === 1 ? "sleeve is" : "sleeves are"} wrong. Each says so on its first sheet.`}
        />
      )}
      <Check
        className="mb-3"
        label="Draw the seam allowances"
        checked={allowed}
        onChange={(event) => setAllowed(event.target.checked)}
      />
      <ShareDocument
        name="patterns"
        make={make}
        fileName={`${styleName(style)} for ${drafted.length}`}
        papers={papers}
        rememberAs="full-size"
      />
    </Card>
  );
}
