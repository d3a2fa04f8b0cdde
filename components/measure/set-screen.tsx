"use client";

import { TriangleAlert } from "lucide-react";
import { NotShown } from "@/components/clients/not-shown";
import { useIdParam } from "@/components/clients/use-id-param";
import { useView, useWorkshop } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { AppLink } from "@/components/ui/app-link";
import { ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Length } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { Tape } from "@/components/ui/tape";
import { bodyMeasure, fullSet, isMeasureKey, type MeasureKey } from "@/lib/figures/body-measures";
import { staleness } from "@/lib/figures/staleness";
import { knownOf } from "@/lib/measuring/known";
import { type PreviousFigure } from "@/lib/measuring/previous";
import { allQuestions } from "@/lib/measuring/questions";
import { shareText } from "@/lib/measuring/share-text";
import { type Known } from "@/lib/measuring/taking";
import { ageOn } from "@/lib/people/age";
import { formatDay } from "@/lib/people/format-day";
import { type Fineness, type MeasurementSet, type Unit } from "@/lib/records/types";
import { type SetCardView, setCardQuery, wearerCardQuery } from "@/lib/store/queries/wearers";
import { LengthChange } from "./length-change";
import { QuestionWords } from "./question-panel";
import { ShareSet } from "./share-set";

const NOT_HERE = "This set is not in the book.";

export function SetScreen() {
  const id = useIdParam("id");
  return id ? (
    <SetCard key={id} id={id} />
  ) : (
    <NotShown title="Measurement set" state="known" say={NOT_HERE} />
  );
}

function SetCard({ id }: { id: string }) {
  const { view, state } = useView(setCardQuery, { id });
  if (!view) return <NotShown title="Measurement set" state={state} say={NOT_HERE} />;
  return <KnownSet view={view} />;
}

function KnownSet({ view }: { view: SetCardView }) {
  const { set, wearer, corrects, correctedBy } = view;
  const card = useView(wearerCardQuery, { id: set.wearerId }).view;
  const workshop = useWorkshop();
  const today = useToday();
  const unit = workshop?.unit ?? "in";
  const fineness = workshop?.fineness ?? 8;
  const facts = wearer ?? { birthYear: null, birthMonth: null, ageYears: null, ageOn: null };
  const known = knownOf({ wearer: facts, standing: card?.sets ?? [], before: set, today, bookUnit: unit });
  const stale = correctedBy ? undefined : staleness(set.takenOn, ageOn(facts, today)?.years, today).say;
  const name = wearer?.name ?? "Wearer";

  return (
    <Screen
      title={formatDay(set.takenOn, { style: "long" })}
      sub={set.takenBy ? `Figures of ${name}, taken by ${set.takenBy}` : `Figures of ${name}`}
      back={{ href: `/wearers/card?id=${set.wearerId}`, label: name }}
      action={
        correctedBy ? (
          <ButtonLink variant="main" full href={`/measure/set?id=${correctedBy.id}`}>
            Open the set that puts it right
          </ButtonLink>
        ) : (
          <ButtonLink variant="main" full href={`/sleeves/draft?set=${set.id}`}>
            Draft a sleeve from it
          </ButtonLink>
        )
      }
    >
      {correctedBy && (
        <Notice tone="look" title="This set was put right by a later one.">
          <p>It stays as it was taken. Work by the later set.</p>
        </Notice>
      )}
      {corrects && (
        <p>
          Puts right the{" "}
          <AppLink href={`/measure/set?id=${corrects.id}`} className="font-semibold">
            set of {formatDay(corrects.takenOn, { style: "long" })}
          </AppLink>
          .
        </p>
      )}
      {stale && <Notice tone="look" title={stale} />}
      <Figures set={set} known={known} unit={unit} fineness={fineness} />
      {set.note && <p className="wrap-anywhere whitespace-pre-line">{set.note}</p>}
      {!correctedBy && <StandingQuestions set={set} known={known} unit={unit} fineness={fineness} />}
      <div className="flex flex-wrap items-start gap-2">
        {!correctedBy && wearer?.removedAt === null && (
          <ButtonLink href={`/measure?wearer=${set.wearerId}&corrects=${set.id}`}>Put right</ButtonLink>
        )}
        <ShareSet text={shareText(set, name, unit, fineness)} />
      </div>
    </Screen>
  );
}

interface SetPartProps {
  set: MeasurementSet;
  known: Known;
  unit: Unit;
  fineness: Fineness;
}

const named = (set: MeasurementSet): { key: MeasureKey; mm: number }[] =>
  fullSet.measures.flatMap((key) => {
    const figure = set.figures.find((one) => one.key === key);
    return figure ? [{ key, mm: figure.mm }] : [];
  });

function Figures({ set, known, unit, fineness }: SetPartProps) {
  const others = set.figures.filter(({ key }) => !isMeasureKey(key));
  return (
    <Card aria-labelledby="figures" className="overflow-clip">
      <CardHead
        id="figures"
        title={set.figures.length === 1 ? "1 figure" : `${set.figures.length} figures`}
      />
      <ul className="-mx-4 grid grid-cols-[repeat(auto-fill,minmax(min(100%,9.5rem),1fr))]">
        {named(set).map(({ key, mm }) => (
          <li key={key} className="border-t border-line">
            <AppLink
              href={`/measure/history?wearer=${set.wearerId}&figure=${key}`}
              className="row-link grid h-full min-h-target content-start gap-1 px-4 py-3 text-ink no-underline"
            >
              <Length mm={mm} unit={unit} fineness={fineness} size="card" />
              <span className="font-semibold">{bodyMeasure(key).name}</span>
              <SinceBefore mm={mm} previous={known.previous[key]} unit={unit} fineness={fineness} />
            </AppLink>
          </li>
        ))}
        {others.map(({ key, mm }) => (
          <li key={key} className="grid gap-1 border-t border-line px-4 py-3">
            <Length mm={mm} unit={unit} fineness={fineness} size="card" />
            <span className="font-semibold">{key}</span>
          </li>
        ))}
      </ul>
      <Tape unit={unit} className="-mx-4 mt-2 -mb-4 w-auto" />
    </Card>
  );
}

function SinceBefore({
  mm,
  previous,
  unit,
  fineness,
}: {
  mm: number;
  previous: PreviousFigure | undefined;
  unit: Unit;
  fineness: Fineness;
}) {
  if (!previous) return null;
  return (
    <span className="text-sm text-soft">
      <LengthChange fromMm={previous.mm} toMm={mm} unit={unit} fineness={fineness} /> since{" "}
      {formatDay(previous.takenOn)}
    </span>
  );
}

function StandingQuestions({ set, known, unit, fineness }: SetPartProps) {
  const figures = Object.fromEntries(named(set).map(({ key, mm }) => [key, { mm }]));
  const questions = allQuestions(figures, fullSet.measures, known);
  if (questions.length === 0) return null;
  return (
    <Card aria-labelledby="questions">
      <CardHead
        id="questions"
        title="Worth a second look"
        sub="Where the tape said the same twice, leave it as it is."
      />
      <ul className="grid gap-4">
        {questions.map((question) => (
          <li key={question.sign} className="grid gap-1">
            <p className="flex items-start gap-2 font-semibold text-thread">
              <TriangleAlert aria-hidden="true" className="mt-[0.2em] size-[1em] shrink-0" />
              {bodyMeasure(question.key).name}
            </p>
            <QuestionWords questions={[question]} unit={unit} fineness={fineness} />
          </li>
        ))}
      </ul>
    </Card>
  );
}
