"use client";

import { useEffect, useRef } from "react";
import { Button } from "@/components/ui/button";
import { Phrase } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { type SignedQuestion } from "@/lib/measuring/questions";
import { type TakenHere } from "@/lib/measuring/taking";
import { type Fineness, type Unit } from "@/lib/records/types";

/** What is asked, each with where its bounds come from. */
function QuestionWords({
  questions,
  unit,
  fineness,
}: {
  questions: readonly SignedQuestion[];
  unit: Unit;
  fineness: Fineness;
}) {
  return questions.map(({ sign, say, source }) => (
    <div key={sign}>
      <p>
        <Phrase parts={say} unit={unit} fineness={fineness} />
      </p>
      <p className="text-sm text-soft">Goes by: {source}.</p>
    </div>
  ));
}

export interface QuestionPanelProps {
  questions: readonly SignedQuestion[];
  unit: Unit;
  fineness: Fineness;
  /** The figure in the unit that was perhaps meant. */
  meant: TakenHere | null;
  onRight: () => void;
  onAgain: () => void;
  onMeant: () => void;
}

/** In place of the keys: a figure to look at once more. Any answer goes on; none blocks. */
export function QuestionPanel(props: QuestionPanelProps) {
  const { questions, unit, fineness, meant, onRight, onAgain, onMeant } = props;
  const panel = useRef<HTMLElement>(null);
  useEffect(() => panel.current?.focus({ preventScroll: true }), []);
  return (
    <section
      ref={panel}
      tabIndex={-1}
      aria-label="A question about this figure"
      className="pad-question outline-none"
    >
      <Notice tone="look" title={questions.length > 1 ? "Look at these once more" : "Look at this once more"}>
        <QuestionWords questions={questions} unit={unit} fineness={fineness} />
      </Notice>
      {meant && (
        <Button full onClick={onMeant}>
          Take it as {meant.typed}
        </Button>
      )}
      <div className="pad-answers">
        <Button className="min-h-key" onClick={onAgain}>
          Take again
        </Button>
        <Button variant="main" onClick={onRight}>
          It is right
        </Button>
      </div>
    </section>
  );
}
