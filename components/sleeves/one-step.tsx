"use client";

import { type PointerEvent, useEffect, useRef } from "react";
import { ArrowLeft, ArrowRight, List } from "lucide-react";
import { type Phrase as PhraseParts } from "@/lib/drafting";
import { type Fineness, type Sleeve, type Unit } from "@/lib/records/types";
import { stageNames, type StepPicture } from "@/lib/sleeves/mark-out";
import { Button } from "@/components/ui/button";
import { Length, Phrase } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { type Place } from "./place";
import { StepDrawing } from "./step-drawing";
import { useWakeLock } from "./use-wake-lock";

export interface OneStepProps {
  pictures: StepPicture[];
  place: Place;
  go(next: Place): void;
  unit: Unit;
  fineness: Fineness;
  back: { href: string; label: string };
  sleeve: Sleeve;
  stale?: string;
  wrong: { id: string; phrase: PhraseParts }[];
}

/** A finger must go this far across, and further across than down, px. */
const swipe = 48;

/** One step on the whole screen. */
export function OneStep({ back, fineness, go, pictures, place, stale, unit, wrong }: OneStepProps) {
  const awake = useWakeLock();
  const picture = pictures[place.at]!;
  const { step } = picture;
  // A plain sleeve is only drawn.
  const staged = pictures.some((one) => one.step.stage !== "draw");
  const isLast = place.at === pictures.length - 1;
  const next = () => go(isLast ? { ...place, all: true } : { ...place, at: place.at + 1 });
  const before = () => place.at > 0 && go({ ...place, at: place.at - 1 });
  const start = useRef<{ id: number; x: number; y: number } | null>(null);

  useEffect(() => {
    const keys = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey) return;
      const onControl = event.target instanceof Element && event.target.closest("a, button, input, summary");
      const forward = event.key === "ArrowRight" || (event.key === " " && !onControl);
      if (!forward && event.key !== "ArrowLeft") return;
      event.preventDefault();
      if (forward) next();
      else before();
    };
    window.addEventListener("keydown", keys);
    return () => window.removeEventListener("keydown", keys);
  });

  const down = (event: PointerEvent) => {
    start.current = { id: event.pointerId, x: event.clientX, y: event.clientY };
  };
  const up = (event: PointerEvent) => {
    const from = start.current;
    start.current = null;
    if (!from || from.id !== event.pointerId || event.pointerType === "mouse") return;
    const dx = event.clientX - from.x;
    const dy = event.clientY - from.y;
    if (Math.abs(dx) < swipe || Math.abs(dx) < 1.5 * Math.abs(dy)) return;
    if (dx < 0) next();
    else before();
  };

  return (
    <Screen
      title="Mark out"
      back={back}
      wide
      action={
        <div className="grid grid-cols-[minmax(0,2fr)_minmax(0,3fr)] gap-2">
          <Button
            className="min-h-16"
            icon={<ArrowLeft className="size-6" />}
            onClick={before}
            disabled={place.at === 0}
          >
            Back
          </Button>
          <Button variant="main" className="min-h-16" full onClick={next}>
            {isLast ? (staged ? "Done" : "Drawn") : "Next"}{" "}
            <ArrowRight aria-hidden="true" className="size-6" />
          </Button>
        </div>
      }
    >
      {place.at === 0 && wrong.length > 0 && (
        <Notice tone="wrong" title="Some of this sleeve is wrong. Change it before cloth is cut.">
          <ul className="grid gap-1">
            {wrong.map(({ id, phrase }) => (
              <li key={id}>
                <Phrase parts={[...phrase]} unit={unit} fineness={fineness} />
              </li>
            ))}
          </ul>
        </Notice>
      )}
      {place.at === 0 && stale && <Notice tone="look" title={stale} />}
      <section
        aria-label="Step"
        className="-mt-2 grid touch-pan-y grid-cols-[minmax(0,1fr)] gap-3 select-none lg:grid-cols-[minmax(0,24rem)_minmax(0,1fr)] lg:gap-8"
        onPointerDown={down}
        onPointerUp={up}
        onPointerCancel={() => (start.current = null)}
      >
        <div className="grid content-start gap-2">
          <StepTrack at={place.at} count={pictures.length} />
          <div className="flex flex-wrap items-center justify-between gap-2">
            <p className="font-semibold text-soft">
              Step {step.n} of {pictures.length}
              {staged && <span className="block text-ink">{stageNames[step.stage]}</span>}
            </p>
            <Button
              variant="quiet"
              className="-me-3"
              icon={<List className="size-5" />}
              onClick={() => go({ ...place, all: true })}
            >
              All steps
            </Button>
          </div>
          <div aria-live="polite" className="grid gap-2">
            <p className="sr-only">
              Step {step.n}.{staged && ` ${stageNames[step.stage]}.`}
            </p>
            {step.distance !== undefined && (
              <p>
                <Length mm={step.distance} unit={unit} fineness={fineness} size="giant" />
              </p>
            )}
            <p className="text-lg">
              <Phrase parts={[...step.phrase]} unit={unit} fineness={fineness} />
            </p>
          </div>
        </div>
        <StepDrawing picture={picture} className="h-[27dvh] min-h-40 lg:h-[60dvh]" />
      </section>
      <p className="text-sm text-soft">
        {awake === "held" && "The screen stays on. "}
        {awake === "not-here" &&
          "This browser cannot keep the screen on; your place is kept if it goes dark. "}
        {awake === "refused" &&
          "The phone does not let the screen stay on, perhaps to save its battery; your place is kept if it goes dark. "}
        {place.at === 0 && "Swipe, or press the arrow keys, to go on."}
      </p>
    </Screen>
  );
}

/** How far it is, as a tape with one tick a step. */
function StepTrack({ at, count }: { at: number; count: number }) {
  return (
    <div
      role="progressbar"
      aria-label="Steps done"
      aria-valuemin={0}
      aria-valuemax={count}
      aria-valuenow={at + 1}
      aria-valuetext={`${at + 1} of ${count}`}
      className="progress-tape"
    >
      <div className="progress-done" style={{ width: `${((at + 1) / count) * 100}%` }} />
    </div>
  );
}
