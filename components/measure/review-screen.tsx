"use client";

import { useRef, useState } from "react";
import { KeepTrouble } from "@/components/frame/form-notices";
import { Button } from "@/components/ui/button";
import { Card, Row, RowButton, Rows } from "@/components/ui/card";
import { Field, TextArea, TextInput } from "@/components/ui/field";
import { Sheet } from "@/components/ui/dialog";
import { Length } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { bodyMeasure, fullSet, type MeasureKey } from "@/lib/figures/body-measures";
import { reviewProblems, type ReviewProblems } from "@/lib/measuring/keep-set";
import { type Press } from "@/lib/measuring/press";
import { allOpenQuestions } from "@/lib/measuring/questions";
import { type Known, type Taking } from "@/lib/measuring/taking";
import { formatDay } from "@/lib/people/format-day";
import { type IsoDate } from "@/lib/people/iso-date";
import { type Fineness, type MeasurementSet, type Unit } from "@/lib/records/types";
import { type KeepProblem } from "@/lib/store/keep-problem";
import { QuestionNote } from "./question-note";
import { type TakingDesk } from "./use-taking";

export interface ReviewScreenProps {
  wearer: string;
  back: { href: string; label: string };
  desk: TakingDesk;
  taking: Taking;
  known: Known;
  unit: Unit;
  fineness: Fineness;
  today: IsoDate;
  /** The set that is being put right. */
  old: MeasurementSet | null;
  busy: boolean;
  problem: KeepProblem | null;
  onPress: (key: Press) => void;
  onKeep: () => void;
}

/** Every figure once more before it is kept for good. */
export function ReviewScreen(props: ReviewScreenProps) {
  const { wearer, back, desk, taking, known, unit, fineness, today, old, busy, problem, onPress, onKeep } =
    props;
  // Refusals come with the first try, and go by themselves as they are met.
  const [tried, setTried] = useState(false);
  const problems: ReviewProblems = tried ? reviewProblems(taking, today, old) : {};
  const day = useRef<HTMLInputElement>(null);

  const tryToKeep = () => {
    setTried(true);
    const found = reviewProblems(taking, today, old);
    if (found.takenOn) day.current?.focus();
    else if (!found.figures) onKeep();
  };

  return (
    <Screen
      title={old ? "Put the set right" : "Look them over"}
      sub={old ? `${wearer}, set of ${formatDay(old.takenOn, { style: "long" })}` : wearer}
      back={back}
      action={
        <>
          {problems.figures && <Notice live tone="wrong" title={problems.figures} />}
          <KeepTrouble keep={problem} draft={desk.problem} />
          <Button variant="main" full busy={busy} onClick={tryToKeep}>
            {old ? "Keep it as a new set" : "Keep this set"}
          </Button>
        </>
      }
    >
      <p role="status" className="sr-only">
        {desk.said}
      </p>
      {old && (
        <p>
          Tap what is wrong and take it again. The old set stays as it was, and says that this one puts it
          right.
        </p>
      )}
      <StandingQuestions taking={taking} known={known} unit={unit} fineness={fineness} onPress={onPress} />
      <div className="grid gap-2">
        <Card flush aria-label="Figures">
          <Rows>
            {taking.keys.map((key) => (
              <FigureRow
                key={key}
                measure={key}
                taking={taking}
                unit={unit}
                fineness={fineness}
                onPress={() => onPress({ do: "go", to: key })}
              />
            ))}
            {taking.keys.length === 0 && <Row title="No figure yet" />}
          </Rows>
        </Card>
        <AddFigure taking={taking} onAdd={(key) => onPress({ do: "add", key })} />
      </div>
      <Field label="Taken on" error={problems.takenOn}>
        <TextInput
          ref={day}
          type="date"
          max={today}
          value={taking.takenOn}
          onChange={(event) => onPress({ do: "say", patch: { takenOn: event.target.value } })}
        />
      </Field>
      <Field label="Taken by" optional hint="Who held the tape. It is remembered for the next set.">
        <TextInput
          autoComplete="off"
          maxLength={80}
          value={taking.takenBy}
          onChange={(event) => onPress({ do: "say", patch: { takenBy: event.target.value } })}
        />
      </Field>
      <Field label="Note" optional>
        <TextArea
          rows={2}
          value={taking.note}
          onChange={(event) => onPress({ do: "say", patch: { note: event.target.value } })}
        />
      </Field>
    </Screen>
  );
}

interface FigureRowProps {
  measure: MeasureKey;
  taking: Taking;
  unit: Unit;
  fineness: Fineness;
  onPress: () => void;
}

function FigureRow({ measure, taking, unit, fineness, onPress }: FigureRowProps) {
  const figure = taking.taken[measure];
  const skipped = taking.skipped.includes(measure);
  return (
    <RowButton
      onPress={onPress}
      title={bodyMeasure(measure).name}
      sub={
        figure
          ? figure.unit === unit
            ? undefined
            : `Typed ${figure.typed}`
          : `${skipped ? "Skipped" : "Not taken"}. Tap to take it`
      }
      figure={figure && <Length mm={figure.mm} unit={unit} fineness={fineness} size="card" />}
    />
  );
}

function StandingQuestions({
  taking,
  known,
  unit,
  fineness,
  onPress,
}: Pick<ReviewScreenProps, "taking" | "known" | "unit" | "fineness" | "onPress">) {
  const questions = allOpenQuestions(taking, known);
  if (questions.length === 0) return null;
  return (
    <section aria-labelledby="questions" className="grid gap-3">
      <h2 id="questions" className="font-figure text-lg font-bold">
        To look at once more
      </h2>
      <ul className="grid gap-3">
        {questions.map((question) => (
          <li key={question.sign}>
            <QuestionNote
              question={question}
              unit={taking.taken[question.key]?.unit ?? unit}
              fineness={fineness}
              action={
                <>
                  <Button onClick={() => onPress({ do: "settle", sign: question.sign })}>It is right</Button>
                  <Button onClick={() => onPress({ do: "go", to: question.key })}>Take again</Button>
                </>
              }
            />
          </li>
        ))}
      </ul>
    </section>
  );
}

function AddFigure({ taking, onAdd }: { taking: Taking; onAdd: (key: MeasureKey) => void }) {
  const others = fullSet.measures.filter((key) => !taking.keys.includes(key));
  if (others.length === 0) return null;
  return (
    <Sheet title="Add a figure" trigger={<Button className="justify-self-start">Add a figure</Button>}>
      <Card flush notches={0} className="pt-0" aria-label="Figures that are not in this set">
        <Rows>
          {others.map((key) => (
            <RowButton key={key} title={bodyMeasure(key).name} onPress={() => onAdd(key)} />
          ))}
        </Rows>
      </Card>
    </Sheet>
  );
}
