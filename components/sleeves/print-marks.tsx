"use client";

import { useCallback, useMemo } from "react";
import { ShareDocument } from "@/components/share-document";
import { Card, CardHead } from "@/components/ui/card";
import { type MarksPaper } from "@/lib/pdf/papers";
import { type OnProgress } from "@/lib/pdf/pdf-api";
import { marksDocument, type MarksSheet } from "@/lib/sleeves/marks-document";

const papers: { value: MarksPaper; label: string }[] = [
  { value: "a4", label: "A4" },
  { value: "a5", label: "A5" },
  { value: "letter", label: "Letter" },
];

/** The marks on paper, or sent to whoever draws. */
export function PrintMarks(props: MarksSheet) {
  const { author, exact, rounded, sleeve, stale, step, today, unit, wearerName } = props;
  const sheet = useMemo(
    () => marksDocument({ author, exact, rounded, sleeve, stale, step, today, unit, wearerName }),
    [author, exact, rounded, sleeve, stale, step, today, unit, wearerName],
  );
  const make = useCallback(
    async (paper: MarksPaper, onProgress: OnProgress) => {
      // The printing part is large, and most mark-outs are only read.
      const { makeMarks } = await import("@/lib/pdf/client");
      return makeMarks(sheet, paper, onProgress);
    },
    [sheet],
  );
  return (
    <Card aria-labelledby="print-title">
      <CardHead id="print-title" title="Print or share the marks" />
      <ShareDocument name="marks" make={make} fileName={fileName(sleeve.name)} papers={papers} />
    </Card>
  );
}

/** Without what a file's name cannot hold. */
function fileName(name: string): string {
  return `Marks of ${name}`.replace(/[\\/:*?"<>|\p{Cc}]/gu, " ").trim();
}
