"use client";

import { useEffect, useId, useRef } from "react";
import { ListChecks, X } from "lucide-react";
import { AppLink } from "@/components/ui/app-link";
import { Button } from "@/components/ui/button";
import { FieldError } from "@/components/ui/field";
import { Length } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { bodyMeasure, type MeasureKey } from "@/lib/figures/body-measures";
import { type Press } from "@/lib/measuring/press";
import { meantFigure, openQuestionsAbout } from "@/lib/measuring/questions";
import { type Known, takenCount, type Taking } from "@/lib/measuring/taking";
import { formatDay } from "@/lib/people/format-day";
import { type Fineness } from "@/lib/records/types";
import { PadKeys } from "./pad-keys";
import { PadStrip } from "./pad-strip";
import { QuestionPanel } from "./question-panel";
import { ShownFigure } from "./shown-figure";
import { TapeDrawing } from "./tape-drawing";
import { type TakingDesk } from "./use-taking";
import "./measure.css";

export interface PadScreenProps {
  wearer: string;
  back: { href: string; label: string };
  desk: TakingDesk;
  taking: Taking;
  at: MeasureKey;
  known: Known;
  fineness: Fineness;
  onPress: (key: Press) => void;
}

/** One figure after the other, the tape in one hand. */
export function PadScreen({ wearer, back, desk, taking, at, known, fineness, onPress }: PadScreenProps) {
  const input = useRef<HTMLInputElement>(null);
  const about = useId();
  const measure = bodyMeasure(at);
  const previous = known.previous[at];
  const questions = taking.held ? openQuestionsAbout(taking, at, known) : [];
  const asked = new Set(taking.keys.filter((key) => openQuestionsAbout(taking, key, known).length > 0));
  useTypeAnywhere(input);

  return (
    <main id="main" tabIndex={-1} className="pad">
      <header className="pad-head flex min-h-11 flex-wrap items-center gap-x-2">
        <AppLink
          href={back.href}
          className="-ms-1 flex size-target shrink-0 items-center justify-center text-ink"
          aria-label={`Stop here, back to ${back.label}. What is taken stays.`}
        >
          <X aria-hidden="true" className="size-6" />
        </AppLink>
        <h1 className="min-w-0 flex-1 basis-24 truncate font-figure text-lg font-bold">
          <span className="sr-only">Measuring </span>
          {wearer}
        </h1>
        <Button
          className="px-3!"
          icon={<ListChecks className="size-5" />}
          onClick={() => onPress({ do: "go", to: "review" })}
        >
          <span className="figures">
            {takenCount(taking)}/{taking.keys.length}
          </span>
          <span className="sr-only"> taken. Look them over</span>
        </Button>
      </header>
      <PadStrip
        taking={taking}
        fineness={fineness}
        asked={asked}
        onDisk={desk.onDisk}
        onGo={(key) => onPress({ do: "go", to: key })}
      />
      <section className="pad-about" aria-labelledby={`${about}-name`}>
        <TapeDrawing measure={at} className="pad-drawing" />
        <div className="grid content-start gap-1">
          <h2 id={`${about}-name`} className="font-figure text-lg leading-tight font-bold lg:text-2xl">
            {measure.name}
          </h2>
          {taking.problem ? (
            <div role="alert" className="text-sm leading-snug">
              <FieldError id={`${about}-how`}>{taking.problem}</FieldError>
            </div>
          ) : (
            <p id={`${about}-how`} className="text-sm leading-snug lg:text-lg">
              {measure.how}
            </p>
          )}
          {previous && (
            <p id={`${about}-last`} className="text-sm text-soft lg:text-lg">
              Last time{" "}
              <strong className="text-base text-ink">
                <Length mm={previous.mm} unit={taking.unit} fineness={fineness} />
              </strong>
              , {formatDay(previous.takenOn)}
            </p>
          )}
          {desk.problem && <Notice live tone="wrong" title={desk.problem} />}
        </div>
      </section>
      <ShownFigure
        name={measure.name}
        entry={taking.entry}
        taken={taking.taken[at]}
        unit={taking.unit}
        fineness={fineness}
        invalid={taking.problem !== null}
        describedBy={previous ? `${about}-how ${about}-last` : `${about}-how`}
        input={input}
        onType={(text) => onPress({ do: "type", text })}
        onEnter={() => onPress({ do: "next" })}
        onUnit={(unit) => onPress({ do: "unit", unit })}
      />
      {questions.length > 0 ? (
        <QuestionPanel
          key={at}
          questions={questions}
          unit={taking.taken[at]?.unit ?? taking.unit}
          fineness={fineness}
          meant={meantFigure(taking, at, known)}
          onRight={() => onPress({ do: "right" })}
          onAgain={() => onPress({ do: "again" })}
          onMeant={() => onPress({ do: "meant" })}
        />
      ) : (
        <PadKeys
          unit={taking.unit}
          fineness={fineness}
          previous={previous}
          first={taking.keys[0] === at}
          onPress={onPress}
        />
      )}
      <p role="status" className="sr-only">
        {desk.said}
      </p>
    </main>
  );
}

/** A digit typed on a keyboard goes into the figure, wherever the focus is; another field keeps its own typing. */
function useTypeAnywhere(input: React.RefObject<HTMLInputElement | null>): void {
  useEffect(() => {
    input.current?.focus({ preventScroll: true });
    const toFigure = (event: KeyboardEvent) => {
      const elsewhere = event.target instanceof Element && event.target.closest("input, textarea, select");
      if (!elsewhere && /^\d$/u.test(event.key) && !event.ctrlKey && !event.metaKey && !event.altKey)
        input.current?.focus({ preventScroll: true });
    };
    document.addEventListener("keydown", toFigure);
    return () => document.removeEventListener("keydown", toFigure);
  }, [input]);
}
