"use client";

import { useCallback, useMemo, useState } from "react";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { backToSleeves } from "@/components/frame/not-shown";
import { StyleCard } from "@/components/sleeves/style-card";
import { StyleFigures } from "@/components/sleeves/style-figures";
import { useSavedForm } from "@/components/sleeves/use-saved-form";
import { useKeep, useView } from "@/components/store/use-book";
import { type DraftHandle } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { Button, ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Choice } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { draftedOf } from "@/lib/many/draft-many";
import { keepWrites } from "@/lib/many/keep-many";
import {
  manyAsk,
  type ManyForm,
  readMany,
  styleOnly,
  withoutWearers,
  withStyle,
  withWearers,
} from "@/lib/many/many-form";
import { type StyleId } from "@/lib/records/types";
import { type FieldProblems } from "@/lib/sleeves/field-problems";
import { type Reach, reaches } from "@/lib/sleeves/reach";
import { type SleeveForm } from "@/lib/sleeves/sleeve-form";
import { withStyleText } from "@/lib/sleeves/style-form";
import { dropDraft } from "@/lib/store/drafts";
import { chosenWearersQuery } from "@/lib/store/queries/many";
import { ChosenWearers } from "./chosen-wearers";
import { ManyResults } from "./many-results";
import { useManyDrafts } from "./use-many-drafts";
import "@/components/sleeves/sleeves.css";

export interface ManyEditorProps {
  title: string;
  workshopName: string;
  draftKey: string;
  initial: ManyForm;
  /** What was begun when the screen was left, or null. */
  begun: ManyForm | null;
  handle: DraftHandle<ManyForm>;
}

export function ManyEditor({ begun, draftKey, handle, initial, title, workshopName }: ManyEditorProps) {
  const [form, setForm] = useState(begun ?? initial);
  const [pressed, setPressed] = useState(false);
  /** The form as it was when its sleeves were kept. */
  const [kept, setKept] = useState<{ form: ManyForm; count: number } | null>(null);
  // Open from the start where something was typed there.
  const [opened] = useState(() => Object.keys((begun ?? initial).styleTyped).length > 0);
  const { busy, keep, problem } = useKeep();
  const today = useToday();
  const { save } = handle;
  const putDown = useCallback(
    (now: ManyForm) => (now === initial ? dropDraft(draftKey).catch(() => undefined) : save(now)),
    [initial, draftKey, save],
  );
  useSavedForm(form, form !== begun && form !== kept?.form, putDown);

  const { cloth, fineness, oldToo, reach, style, styleTyped, unit, wearerIds } = form;
  const { state, view } = useView(chosenWearersQuery, { ids: wearerIds });
  const ask = useMemo(
    () => manyAsk({ cloth, fineness, oldToo, reach, style, styleTyped, unit }, today),
    [cloth, fineness, oldToo, reach, style, styleTyped, unit, today],
  );
  const { done, rows, settled } = useManyDrafts(view, ask);
  const drafted = useMemo(() => draftedOf(rows), [rows]);
  const read = useMemo(() => readMany(form), [form]);
  const sleeveForm = useMemo(() => styleOnly(form), [form]);
  const beside = useMemo(
    (): FieldProblems => ({
      ...{ errors: {}, problems: {}, marks: { front: new Map(), back: new Map() }, markErrors: [] },
      ...{ styleErrors: read.styleErrors, styleProblems: {}, general: [] },
    }),
    [read],
  );
  const [first] = drafted;

  const onStyle = useCallback((chosen: StyleId) => setForm((now) => ({ ...now, style: chosen })), []);
  const onStyleType = useCallback(
    (key: string, typed: string) => setForm((now) => withStyleText(now, key, typed)),
    [],
  );
  const onPatch = useCallback(
    (patch: (now: SleeveForm) => SleeveForm) => setForm((now) => withStyle(now, patch(styleOnly(now)))),
    [],
  );

  const unread = Object.keys(read.styleErrors).length > 0;
  const keepThem = async () => {
    setPressed(true);
    if (unread || !settled || drafted.length === 0) return;
    if (!(await keep(keepWrites(drafted, fineness, today)))) return;
    await dropDraft(draftKey).catch(() => undefined);
    setKept({ form, count: drafted.length });
    setPressed(false);
  };
  const isKept = kept?.form === form;

  return (
    <Screen
      title={title}
      sub="One style, drafted for each wearer from her own figures."
      back={backToSleeves}
      wide
      action={
        drafted.length > 0 && (
          <div className="grid gap-2">
            <KeepTrouble keep={problem} draft={handle.problem} />
            {pressed && unread && (
              <Notice live tone="wrong" title="Put right what is marked in the style’s figures first." />
            )}
            {isKept ? (
              <Notice
                live
                tone="good"
                title={`${countOf(kept.count, "sleeve is", "sleeves are")} kept on this phone.`}
                action={<ButtonLink href="/sleeves">See the sleeves</ButtonLink>}
              />
            ) : (
              <Button variant="main" full busy={busy || !settled} onClick={() => void keepThem()}>
                {drafted.length === 1 ? "Keep this sleeve" : `Keep these ${drafted.length} sleeves`}
              </Button>
            )}
          </div>
        )
      }
    >
      <BroughtBack
        draft={{
          broughtBack: begun !== null,
          startOver: () => setForm(initial),
        }}
      />
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-4 lg:grid-cols-2">
        <ChosenWearers
          ids={wearerIds}
          wearers={view}
          today={today}
          onAdd={(ids) => setForm((now) => withWearers(now, ids))}
          onTake={(ids) => setForm((now) => withoutWearers(now, ids))}
        />
        <StyleCard style={style} onChoose={onStyle} />
        <Card aria-labelledby="reach-title">
          <CardHead id="reach-title" title="How far down the arm" />
          <Choice
            bare
            label="How far down the arm"
            name="reach"
            options={reaches}
            value={reach}
            onChange={(event) => {
              const chosen = event.target.value as Reach;
              setForm((now) => ({ ...now, reach: chosen }));
            }}
          />
        </Card>
        <details open={opened}>
          <summary className="min-h-target rounded border-2 border-edge bg-well px-4 py-2 font-semibold">
            Change the figures of the style
          </summary>
          <div className="mt-4 grid grid-cols-[minmax(0,1fr)] gap-2">
            <StyleFigures
              form={sleeveForm}
              beside={beside}
              shown={first?.good.shown ?? []}
              onType={onStyleType}
              onPatch={onPatch}
            />
            {first && drafted.length > 1 && first.good.shown.length > 0 && (
              <p className="text-sm text-soft">
                The usual figures that stand there are those for {first.wearer.name}. Each wearer gets her
                own.
              </p>
            )}
          </div>
        </details>
      </div>
      {state === "failed" && (
        <Notice
          tone="wrong"
          title="The book on this phone did not answer. Close Notchbook and open it again."
        />
      )}
      {wearerIds.length > 0 && state === "opening" && <Progress label="Opening the book" />}
      {done !== null && <Progress label="Drafting" value={done} max={view.length} />}
      {rows.length > 0 && view.length > 0 && (
        <ManyResults {...{ rows, form, read, today, workshopName }} onPatch={setForm} stale={!settled} />
      )}
    </Screen>
  );
}

const countOf = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;
