"use client";

import { type Fineness, type Sleeve, type Unit, type Wearer } from "@/lib/records/types";
import { countLine } from "@/lib/sleeves/head-line";
import { type GoodSleeve as Good } from "@/lib/sleeves/make-style-from-record";
import { roundingPhrase, stageNames, type StepPicture } from "@/lib/sleeves/mark-out";
import { styleName } from "@/lib/sleeves/style-names";
import { Button, ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Length, Phrase } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { ChecksList } from "./checks-list";
import { type Place } from "./place";
import { PrintMarks } from "./print-marks";
import { StepDrawing } from "./step-drawing";
import { WalkList } from "./walk-list";

export interface AllStepsProps {
  pictures: StepPicture[];
  place: Place;
  go(next: Place): void;
  unit: Unit;
  fineness: Fineness;
  back: { href: string; label: string };
  sleeve: Sleeve;
  wearer: Wearer | null;
  workshopName: string;
  today: string;
  stale?: string;
  exact: Good;
  rounded: Good;
  /** mm. */
  step: number;
}

/** Every step on one page, with the checks of the sleeve that the marks make. */
export function AllSteps(props: AllStepsProps) {
  const { back, exact, fineness, go, pictures, place, rounded, sleeve, stale, step, today, unit } = props;
  const units = { unit, fineness };
  // A plain sleeve is only drawn.
  const staged = pictures.some((one) => one.step.stage !== "draw");
  return (
    <Screen
      title="All steps"
      sub={`${sleeve.name}, ${styleName(sleeve.style)}`}
      back={back}
      tools={<ButtonLink href={`/sleeves/draft?id=${sleeve.id}`}>Change the sleeve</ButtonLink>}
      action={
        <Button variant="main" full onClick={() => go({ ...place, all: false })}>
          One step at a time
        </Button>
      }
    >
      {stale && <Notice tone="look" title={stale} />}
      <p className="text-soft">
        <Phrase parts={roundingPhrase(exact, rounded, step)} {...units} />
      </p>
      {rounded.seams.length > 0 && <WalkList seams={rounded.seams} gathers={rounded.gathers} {...units} />}
      <ChecksList checks={rounded.checks} {...units} sub={countLine(rounded.checks)} />
      <PrintMarks
        {...{ sleeve, exact, rounded, step, unit, today, stale }}
        wearerName={props.wearer?.name ?? ""}
        author={props.workshopName}
      />
      <ButtonLink href={`/sleeves/full-size?id=${sleeve.id}`}>Print the pieces at full size</ButtonLink>
      <Card aria-labelledby="steps-title">
        <CardHead id="steps-title" title="Steps" />
        <ol className="grid gap-4">
          {pictures.map((picture, i) => {
            const { distance, n, phrase, stage } = picture.step;
            const stageBegins = staged && stage !== pictures[i - 1]?.step.stage;
            return (
              <li key={n} className="grid gap-2 border-t border-line pt-3 sm:grid-cols-[minmax(0,1fr)_14rem]">
                {stageBegins && (
                  <h3 className="font-figure text-lg font-bold sm:col-span-2">{stageNames[stage]}</h3>
                )}
                <div>
                  <p className="flex flex-wrap items-baseline gap-x-3">
                    <span className="font-semibold text-soft">{n}.</span>
                    {distance !== undefined && (
                      <Length mm={distance} {...units} className="text-xl font-bold" />
                    )}
                  </p>
                  <p>
                    <Phrase parts={[...phrase]} {...units} />
                  </p>
                  <Button variant="quiet" className="-ms-4" onClick={() => go({ at: i, all: false })}>
                    Begin at step {n}
                  </Button>
                </div>
                <StepDrawing picture={picture} className="h-40" />
              </li>
            );
          })}
        </ol>
      </Card>
    </Screen>
  );
}
