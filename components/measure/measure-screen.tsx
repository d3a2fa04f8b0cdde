"use client";

import { useRouter } from "next/navigation";
import { useEffect, useState } from "react";
import { backToClients, NotShown, ScreenOpening } from "@/components/frame/not-shown";
import { useIdParam } from "@/components/store/use-id-param";
import { useKeep, useView, useWorkshop } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { wearerWords } from "@/lib/clients/age-words";
import { type MeasureKey } from "@/lib/figures/body-measures";
import { make, newId } from "@/lib/journal/change";
import { setFields } from "@/lib/measuring/keep-set";
import { knownOf } from "@/lib/measuring/known";
import { type Press } from "@/lib/measuring/press";
import { begin, beginCorrection, takingKey } from "@/lib/measuring/taking";
import { type MeasurementSet, type Workshop } from "@/lib/records/types";
import { wearerCardQuery, type WearerCardView } from "@/lib/store/queries/wearers";
import { ChooseFigures } from "./choose-figures";
import { ChooseWearer } from "./choose-wearer";
import { PadScreen } from "./pad-screen";
import { ResumeOffer } from "./resume-offer";
import { ReviewScreen } from "./review-screen";
import { rememberTakenBy, useTakenBy } from "./use-taken-by";
import { useTaking } from "./use-taking";

export function MeasureScreen() {
  const wearer = useIdParam("wearer");
  const corrects = useIdParam("corrects");
  const client = useIdParam("client");
  if (!wearer) return <ChooseWearer clientId={client} />;
  return (
    <MeasureWearer key={`${wearer} ${corrects}`} wearerId={wearer} correctsId={corrects} clientId={client} />
  );
}

interface MeasureWearerProps {
  wearerId: string;
  correctsId: string | null;
  clientId: string | null;
}

function MeasureWearer({ wearerId, correctsId, clientId }: MeasureWearerProps) {
  const { view, state } = useView(wearerCardQuery, { id: wearerId });
  const workshop = useWorkshop();
  const takenBy = useTakenBy();
  if (!view)
    return (
      <NotShown back={backToClients} title="Measure" state={state} say="This wearer is not in the book." />
    );
  const old = view.allSets.find(({ id }) => id === correctsId) ?? null;
  if (correctsId !== null && !old)
    return (
      <NotShown
        back={backToClients}
        title="Put a set right"
        state={state}
        say="The set to put right is not in the book."
      />
    );
  if (!workshop || takenBy === undefined) return <ScreenOpening title={`Measure ${view.wearer.name}`} />;
  const back =
    clientId === null
      ? { href: `/wearers/card?id=${wearerId}`, label: view.wearer.name }
      : { href: `/clients/card?id=${clientId}`, label: view.client?.name ?? "Client" };
  if (view.wearer.removedAt !== null)
    return (
      <Screen title={`Measure ${view.wearer.name}`} back={back}>
        <Notice
          tone="look"
          title={`${view.wearer.name} is in the bin.`}
          action={<ButtonLink href={`/wearers/card?id=${wearerId}`}>Bring back first</ButtonLink>}
        />
      </Screen>
    );
  return <Measuring view={view} old={old} workshop={workshop} takenBy={takenBy} back={back} />;
}

interface MeasuringProps {
  view: WearerCardView;
  old: MeasurementSet | null;
  workshop: Workshop;
  takenBy: string;
  back: { href: string; label: string };
}

function Measuring({ view, old, workshop, takenBy, back }: MeasuringProps) {
  const { wearer, sets, allSets } = view;
  const { unit, fineness } = workshop;
  const router = useRouter();
  const today = useToday();
  const { keep, busy, problem } = useKeep();
  const desk = useTaking(takingKey(wearer.id, old?.id ?? null));
  const { found, taking, start, startOver } = desk;
  const [kept, setKept] = useState(false);
  const known = knownOf({ wearer, standing: sets, before: old ?? undefined, today, bookUnit: unit });
  const onPress = (key: Press) => desk.press(key, known, fineness);
  const now = () => new Date().toISOString();

  // Kept, and the phone went dark before the half-taken set was put away.
  const keptAlready = found && !taking ? allSets.some(({ id }) => id === found.setId) : false;
  useEffect(() => {
    if (keptAlready) void startOver();
  }, [keptAlready, startOver]);
  useEffect(() => {
    if (old && found === null && !taking) start(beginCorrection(old, { setId: newId(), unit, now: now() }));
  }, [old, found, taking, start, unit]);

  // Each of these is a screen of its own, begun at its head.
  const place = taking ? (taking.at === "review" ? "review" : "pad") : found ? "half-taken" : "choose";
  useEffect(() => {
    // Newer browsers answer with a promise, which an effect must not return.
    void window.scrollTo(0, 0);
  }, [place]);

  const startSet = (keys: readonly MeasureKey[]) =>
    start(
      begin({
        setId: newId(),
        wearerId: wearer.id,
        keys,
        unit,
        now: now(),
        today,
        takenBy: takenBy || (sets[0]?.takenBy ?? ""),
      }),
    );

  const keepSet = async () => {
    if (!taking) return;
    const fields = setFields(taking);
    if (!(await keep([make("measurementSets", fields, taking.setId)]))) return;
    setKept(true);
    await Promise.all([rememberTakenBy(fields.takenBy), desk.putAway()]);
    router.replace(`/measure/set?id=${taking.setId}`);
  };

  if (found === undefined || keptAlready) return <ScreenOpening title={`Measure ${wearer.name}`} />;
  if (!taking) {
    if (found)
      return (
        <ResumeOffer
          wearer={wearer.name}
          back={back}
          found={found}
          today={today}
          fineness={fineness}
          onGoOn={() => start(found)}
          onStartOver={() => void startOver()}
        />
      );
    if (old) return <ScreenOpening title="Put the set right" />;
    return (
      <ChooseFigures
        wearer={wearer.name}
        sub={wearerWords(wearer, today)}
        back={back}
        known={known}
        unit={unit}
        fineness={fineness}
        onStart={startSet}
      />
    );
  }
  if (taking.at === "review")
    return (
      <ReviewScreen
        wearer={wearer.name}
        back={back}
        desk={desk}
        taking={taking}
        known={known}
        unit={unit}
        fineness={fineness}
        today={today}
        old={old}
        busy={busy || kept}
        problem={problem}
        onPress={onPress}
        onKeep={() => void keepSet()}
      />
    );
  return (
    <PadScreen
      wearer={wearer.name}
      back={back}
      desk={desk}
      taking={taking}
      at={taking.at}
      known={known}
      fineness={fineness}
      onPress={onPress}
    />
  );
}
