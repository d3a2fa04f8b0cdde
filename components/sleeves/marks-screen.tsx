"use client";

import { useMemo, useState } from "react";
import { useIdParam } from "@/components/store/use-id-param";
import { useView, useWorkshop } from "@/components/store/use-book";
import { useDraft } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { ButtonLink } from "@/components/ui/button";
import { Phrase } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { staleness } from "@/lib/figures/staleness";
import { ageOn } from "@/lib/people/age";
import { type Unit } from "@/lib/records/types";
import { failingSeams, type GoodSleeve, markedFromRecord } from "@/lib/sleeves/make-style-from-record";
import { stepPictures } from "@/lib/sleeves/mark-out";
import { sleevesQuery, type SleeveView } from "@/lib/store/queries/sleeves";
import { AllSteps } from "./all-steps";
import { BinnedSleeve } from "./binned-sleeve";
import { backToSleeves, NotShown } from "@/components/frame/not-shown";
import { OneStep } from "./one-step";
import { type Place } from "./place";

const NOT_HERE = "This sleeve is not in the book.";

/** The mark-out of a kept sleeve, read from the table while both hands draw. */
export function MarksScreen() {
  const id = useIdParam("id");
  const workshop = useWorkshop();
  if (!id) return <NotShown back={backToSleeves} title="Mark out" state="known" say={NOT_HERE} />;
  return <Marks key={id} id={id} unit={workshop?.unit ?? "in"} workshopName={workshop?.name ?? ""} />;
}

interface Workplace {
  unit: Unit;
  workshopName: string;
}

function Marks({ id, ...workplace }: Workplace & { id: string }) {
  const { state, view } = useView(sleevesQuery, { ids: [id] });
  const found = view[0];
  if (!found) return <NotShown back={backToSleeves} title="Mark out" state={state} say={NOT_HERE} />;
  if (found.sleeve.removedAt !== null) return <BinnedSleeve sleeve={found.sleeve} />;
  return <MarkOut found={found} {...workplace} />;
}

function MarkOut({ found, unit, workshopName }: Workplace & { found: SleeveView }) {
  const { set, sleeve, wearer } = found;
  const { fineness } = sleeve;
  const today = useToday();
  const handle = useDraft<Place>(`marks:${sleeve.id}`);
  const [moved, setMoved] = useState<Place | null>(null);
  const { ask, style } = sleeve;
  const marked = useMemo(
    () => markedFromRecord({ ask, style }, unit, fineness),
    [ask, style, unit, fineness],
  );
  const rounded = marked && "exact" in marked && marked.rounded.ok ? marked.rounded : null;
  const pictures = useMemo(() => (rounded ? stepPictures(rounded) : []), [rounded]);
  const back = { href: `/sleeves/draft?id=${sleeve.id}`, label: sleeve.name };

  if (!marked || !("exact" in marked) || !rounded || pictures.length === 0) {
    const failed = marked && "exact" in marked ? marked.rounded : marked;
    return (
      <Screen title="Mark out" back={back}>
        <Notice
          tone="wrong"
          title={
            failed && !failed.ok ? (
              <Phrase parts={[...(failed.problems[0]?.phrase ?? [])]} unit={unit} fineness={fineness} />
            ) : (
              "A figure is missing, so there is nothing to mark out."
            )
          }
          action={<ButtonLink href={back.href}>Change the sleeve</ButtonLink>}
        >
          {failed && !failed.ok && failed.problems[0] && (
            <p>
              <Phrase parts={[...failed.problems[0].remedy]} unit={unit} fineness={fineness} />
            </p>
          )}
        </Notice>
      </Screen>
    );
  }
  if (handle.draft === undefined)
    return (
      <Screen title="Mark out" back={back}>
        <Progress label="Opening the book" />
      </Screen>
    );
  const saved = moved ?? handle.draft ?? { at: 0, all: false };
  const place = { ...saved, at: Math.min(Math.max(0, saved.at), pictures.length - 1) };
  const go = (next: Place) => {
    setMoved(next);
    void handle.save(next);
  };
  const stale = set
    ? staleness(set.takenOn, wearer ? ageOn(wearer, today)?.years : undefined, today).say
    : undefined;
  const common = { pictures, place, go, unit, fineness, back, sleeve };
  return place.all ? (
    <AllSteps
      {...common}
      {...{ wearer, today, stale, workshopName }}
      exact={marked.exact}
      rounded={rounded}
      step={marked.step}
    />
  ) : (
    <OneStep {...common} stale={stale} wrong={wrongChecks(rounded)} />
  );
}

function wrongChecks(rounded: GoodSleeve) {
  return [...failingSeams(rounded), ...rounded.checks.filter(({ verdict }) => verdict === "wrong")];
}
