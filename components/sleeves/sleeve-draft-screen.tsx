"use client";

import { useMemo, useState } from "react";
import { useSearchParams } from "next/navigation";
import { useIdParam } from "@/components/store/use-id-param";
import { useView, useWorkshop } from "@/components/store/use-book";
import { useDraft } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { type MeasurementSet, type Sleeve, type Wearer, type Workshop } from "@/lib/records/types";
import { ageOn } from "@/lib/people/age";
import { askFromSet, fillFromSet, usualReach } from "@/lib/sleeves/ask-from-set";
import { emptyForm, formOfSleeve, restoredForm, type SleeveForm } from "@/lib/sleeves/sleeve-form";
import { sleevesQuery } from "@/lib/store/queries/sleeves";
import { setCardQuery, wearerCardQuery } from "@/lib/store/queries/wearers";
import { BinnedSleeve } from "./binned-sleeve";
import { backToSleeves, NotShown } from "@/components/frame/not-shown";
import { SleeveEditor } from "./sleeve-editor";

/** The address says what to draft from: a kept sleeve, a measurement set, a wearer, or nothing but bare figures. */
export function SleeveDraftScreen() {
  const id = useIdParam("id");
  const setId = useIdParam("set");
  const wearerId = useIdParam("wearer");
  const asked = useSearchParams().toString();
  const workshop = useWorkshop();
  if (!workshop)
    return (
      <Screen title="Draft a sleeve" back={backToSleeves}>
        <Progress label="Opening the book" />
      </Screen>
    );
  if (id) return <FromSleeve key={id} id={id} workshop={workshop} />;
  if (setId) return <FromSet key={setId} id={setId} workshop={workshop} />;
  if (wearerId) return <FromWearer key={wearerId} id={wearerId} workshop={workshop} />;
  if (/(?:^|&)(?:id|set|wearer)=/u.test(asked))
    return (
      <NotShown
        back={backToSleeves}
        title="Draft a sleeve"
        state="known"
        say="What to draft from is not in the book."
      />
    );
  return <Drafting draftKey="sleeve:bare" sleeve={null} wearer={null} set={null} workshop={workshop} />;
}

function FromSleeve({ id, workshop }: { id: string; workshop: Workshop }) {
  const { view, state } = useView(sleevesQuery, { ids: [id] });
  // Kept on this screen: the editor begins again from the row as it was kept.
  const [kept, setKept] = useState(0);
  const cameKept = useSearchParams().has("kept");
  const found = view[0];
  if (!found)
    return (
      <NotShown back={backToSleeves} title="Sleeve" state={state} say="This sleeve is not in the book." />
    );
  const { set, sleeve, wearer } = found;
  if (sleeve.removedAt !== null) return <BinnedSleeve sleeve={sleeve} />;
  return (
    <Drafting
      key={kept}
      draftKey={`sleeve:${id}`}
      {...{ sleeve, wearer, set, workshop }}
      justKept={kept > 0 || cameKept}
      onKept={() => setKept((before) => before + 1)}
    />
  );
}

function FromSet({ id, workshop }: { id: string; workshop: Workshop }) {
  const { view, state } = useView(setCardQuery, { id });
  if (!view)
    return (
      <NotShown
        back={backToSleeves}
        title="Draft a sleeve"
        state={state}
        say="This measurement set is not in the book."
      />
    );
  return (
    <Drafting
      draftKey={`sleeve:${id}`}
      sleeve={null}
      wearer={view.wearer}
      set={view.set}
      workshop={workshop}
    />
  );
}

function FromWearer({ id, workshop }: { id: string; workshop: Workshop }) {
  const { view, state } = useView(wearerCardQuery, { id });
  // The latest set may still be on its way from the database: the form must not begin without it.
  if (!view || state === "opening")
    return (
      <NotShown
        back={backToSleeves}
        title="Draft a sleeve"
        state={state}
        say="This wearer is not in the book."
      />
    );
  return (
    <Drafting
      draftKey={`sleeve:${id}`}
      sleeve={null}
      wearer={view.wearer}
      set={view.sets[0] ?? null}
      workshop={workshop}
    />
  );
}

interface DraftingProps {
  draftKey: string;
  sleeve: Sleeve | null;
  wearer: Wearer | null;
  set: MeasurementSet | null;
  workshop: Workshop;
  justKept?: boolean;
  onKept?(): void;
}

/** Waits for what was being typed, and begins the form with it or with what the book has. */
function Drafting({ draftKey, justKept = false, onKept, set, sleeve, wearer, workshop }: DraftingProps) {
  const handle = useDraft<SleeveForm>(draftKey);
  const today = useToday();
  const { fineness, unit } = workshop;
  // What the form begins with must not move under the typing when another row of the book changes.
  const [initial] = useState((): SleeveForm => {
    if (sleeve) return formOfSleeve(sleeve, unit);
    const empty = { ...emptyForm(unit, fineness), wearerId: wearer?.id ?? null };
    if (!set) return empty;
    const ageYears = wearer ? ageOn(wearer, today)?.years : undefined;
    const reach = usualReach(set.figures, ageYears);
    const ask = askFromSet({
      figures: set.figures,
      ...(ageYears !== undefined && { ageYears }),
      reach,
      unit,
      fineness,
    });
    return fillFromSet({ ...empty, setId: set.id, reach }, ask, null);
  });
  const { draft } = handle;
  const begun = useMemo(() => (draft ? restoredForm(draft, unit, fineness) : null), [draft, unit, fineness]);
  if (draft === undefined)
    return (
      <Screen title={sleeve ? sleeve.name : "Draft a sleeve"} back={backToSleeves}>
        <Progress label="Opening the book" />
      </Screen>
    );
  return (
    <SleeveEditor
      begun={begun}
      {...{ draftKey, initial, sleeve, wearer, set, handle, justKept, today }}
      onKept={onKept}
    />
  );
}
