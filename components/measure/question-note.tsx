import { type ReactNode } from "react";
import { Phrase } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { bodyMeasure } from "@/lib/figures/body-measures";
import { type SignedQuestion } from "@/lib/measuring/questions";
import { type Fineness, type Unit } from "@/lib/records/types";

/** Something to look at once more, with where its bounds come from. */
export function QuestionNote({
  question: { key, say, source },
  unit,
  fineness,
  action,
}: {
  question: SignedQuestion;
  unit: Unit;
  fineness: Fineness;
  action?: ReactNode;
}) {
  return (
    <Notice tone="look" title={bodyMeasure(key).name} action={action}>
      <p>
        <Phrase parts={say} unit={unit} fineness={fineness} />
      </p>
      <p className="text-sm text-soft">Goes by: {source}.</p>
    </Notice>
  );
}
