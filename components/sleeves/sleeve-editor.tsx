"use client";

import { useCallback, useDeferredValue, useEffect, useMemo, useRef, useState } from "react";
import { useRouter } from "next/navigation";
import { BroughtBack, KeepTrouble } from "@/components/frame/form-notices";
import { BinAsk } from "@/components/clients/bin-ask";
import { type DraftHandle } from "@/components/store/use-draft";
import { useKeep, useView } from "@/components/store/use-book";
import { Button, ButtonLink } from "@/components/ui/button";
import { Phrase } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { edit, make, newId, setRemoved } from "@/lib/journal/change";
import { phraseText } from "@/lib/lengths/phrase";
import { formatDay } from "@/lib/people/format-day";
import {
  type MeasurementSet,
  type Sleeve,
  type SleeveFields,
  type StyleId,
  type Wearer,
} from "@/lib/records/types";
import { type HandleName } from "@/lib/sleeves/handles";
import { countLine, type HeadLine, headLine } from "@/lib/sleeves/head-line";
import { styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import { fieldProblems } from "@/lib/sleeves/field-problems";
import { type FigureKey } from "@/lib/sleeves/sleeve-figures";
import { namesOf, readForm, type SleeveForm, withFigure } from "@/lib/sleeves/sleeve-form";
import { withStyleText } from "@/lib/sleeves/style-form";
import { suggestedName } from "@/lib/sleeves/sleeve-name";
import { dropDraft } from "@/lib/store/drafts";
import { wearerCardQuery } from "@/lib/store/queries/wearers";
import { ChecksList } from "./checks-list";
import { DrawingPanel } from "./drawing-panel";
import { FiguresForm } from "./figures-form";
import { HeadLineView } from "./head-line-view";
import { backToSleeves } from "@/components/frame/not-shown";
import { SleeveDetails } from "./sleeve-details";
import { StyleCard } from "./style-card";
import { StyleFigures } from "./style-figures";
import { useLastGood } from "./use-last-good";
import { useSavedForm } from "./use-saved-form";
import { WalkList } from "./walk-list";

export interface SleeveEditorProps {
  draftKey: string;
  initial: SleeveForm;
  /** What was being typed when the screen was left, or null. */
  begun: SleeveForm | null;
  sleeve: Sleeve | null;
  wearer: Wearer | null;
  set: MeasurementSet | null;
  handle: DraftHandle<SleeveForm>;
  today: string;
  justKept: boolean;
  /** Kept, and the screen stays. */
  onKept?(): void;
}

export function SleeveEditor(props: SleeveEditorProps) {
  const { begun, draftKey, handle, initial, justKept, onKept, set, sleeve, today, wearer } = props;
  const router = useRouter();
  const { busy, keep, problem } = useKeep();
  const [form, setForm] = useState(begun ?? initial);
  const [focus, setFocus] = useState<FigureKey | null>(null);
  const [pressed, setPressed] = useState(false);
  const [broughtBack] = useState(begun !== null && !same(begun, initial));
  const { save } = handle;
  const putDown = useCallback(
    // Nothing is left lying that only says what the book says already.
    (now: SleeveForm) => (same(now, initial) ? dropDraft(draftKey).catch(() => undefined) : save(now)),
    [initial, draftKey, save],
  );
  useSavedForm(form, form !== initial && form !== begun, putDown);

  const { view: chosen } = useView(wearerCardQuery, { id: form.wearerId ?? "" });
  const whose = form.wearerId === wearer?.id ? wearer : (chosen?.wearer ?? null);
  const suggested = suggestedName(whose?.name ?? null, formatDay(today, { style: "short" }));
  const { fineness, style, unit } = form;
  const read = useMemo(() => readForm(form), [form]);
  const made = useMemo(
    () => (read.drawable ? styleFromRecord({ style, ask: read.record }) : null),
    [read, style],
  );
  const shown = useLastGood(made, style);
  const line = useMemo((): HeadLine => {
    if (made) return headLine(made, read.record);
    const bad = Object.keys(read.errors).length + Object.keys(read.styleErrors).length > 0;
    return {
      verdict: "plain",
      phrase: [bad ? "Put right what is marked below, and it is drawn." : startWords(read.missing)],
    };
  }, [made, read]);
  const beside = useMemo(() => fieldProblems(form, made, read, pressed), [form, made, read, pressed]);
  // The drawing comes first; the list of checks may follow in the frame after.
  const laterMade = useDeferredValue(made);
  const walked = laterMade?.ok ? laterMade : null;
  const block = walked ?? (laterMade && !laterMade.ok ? laterMade.block : null);
  const laterBeside = useDeferredValue(beside);

  // Fields that are empty are only marked once Keep was pressed, a moment after it.
  const leadOn = useRef(false);
  useEffect(() => {
    if (leadOn.current) leadOn.current = !focusFirstBad();
  }, [laterBeside]);

  const onType = useCallback((key: FigureKey, text: string) => {
    setForm((now) => ({ ...now, typed: { ...now.typed, [key]: text } }));
  }, []);
  const onHandle = useCallback((name: HandleName, mm: number) => {
    setFocus(name);
    setForm((now) => withFigure(now, name, mm));
  }, []);
  const onStyleType = useCallback((key: string, text: string) => {
    setFocus(null);
    setForm((now) => withStyleText(now, key, text));
  }, []);
  const onStyle = useCallback((chosen: StyleId) => setForm((now) => ({ ...now, style: chosen })), []);
  const onPatch = useCallback((patch: (now: SleeveForm) => SleeveForm) => setForm(patch), []);

  const unread = [...Object.keys(read.errors), ...Object.keys(read.styleErrors), ...read.markErrors];
  const blocked = !made?.ok || unread.length > 0;
  const keepIt = async (then: "marks" | "stay") => {
    setPressed(true);
    if (blocked) {
      leadOn.current = !focusFirstBad();
      return;
    }
    const id = sleeve?.id ?? newId();
    const fields: SleeveFields = {
      wearerId: form.wearerId,
      setId: form.setId,
      name: form.name.trim() || suggested,
      style,
      ask: read.record,
      fineness,
      note: form.note.trim(),
    };
    const write = sleeve ? edit("sleeves", sleeve, fields) : make("sleeves", fields, id);
    if (!(await keep([write]))) return;
    await handle.drop();
    if (then === "marks") router.push(`/sleeves/marks?id=${id}`);
    else if (onKept) onKept();
    else router.replace(`/sleeves/draft?id=${id}&kept=1`);
  };

  return (
    <Screen
      title={sleeve?.name ?? "Draft a sleeve"}
      sub={whose ? whose.name : "From bare figures"}
      back={backToSleeves}
      wide
      action={
        <div className="grid gap-2">
          {pressed && blocked && <Notice live tone="wrong" title={blockedWords(read, made?.ok ?? false)} />}
          <KeepTrouble keep={problem} draft={handle.problem} />
          <div className="grid grid-cols-[auto_minmax(0,1fr)] gap-2">
            <Button className="min-h-key" busy={busy} onClick={() => void keepIt("stay")}>
              Keep
            </Button>
            <Button variant="main" full busy={busy} onClick={() => void keepIt("marks")}>
              Keep and mark out
            </Button>
          </div>
        </div>
      }
    >
      <BroughtBack
        draft={{
          broughtBack,
          startOver: () => {
            setForm({ ...initial });
            setPressed(false);
          },
        }}
      />
      {justKept && form === initial && sleeve && (
        <Notice
          live
          tone="good"
          title={`${sleeve.name} is kept on this phone.`}
          action={<ButtonLink href={`/sleeves/marks?id=${sleeve.id}`}>Mark it out</ButtonLink>}
        />
      )}
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-4 lg:grid-cols-[minmax(0,27rem)_minmax(0,1fr)] lg:gap-6">
        <DrawingPanel
          made={shown}
          faint={shown !== made}
          {...{ focus, unit, fineness }}
          label={shown ? `The sleeve drawn. ${phraseText(line.phrase, unit, fineness)}` : ""}
          head={<HeadLineView {...{ line, unit, fineness }} checks={made?.ok ? made.checks : undefined} />}
          onFigure={onHandle}
        />
        <div className="sleeve-form grid min-w-0 grid-cols-[minmax(0,1fr)] content-start gap-5">
          <StyleCard style={style} onChoose={onStyle} />
          <FiguresForm
            {...{ form, set, wearer, today }}
            beside={laterBeside}
            made={block}
            isNew={!sleeve}
            onType={onType}
            onFocusFigure={setFocus}
            onPatch={onPatch}
          >
            <StyleFigures
              {...{ form, onPatch }}
              beside={laterBeside}
              shown={laterMade?.shown ?? []}
              onType={onStyleType}
            />
          </FiguresForm>
          {walked && walked.seams.length > 0 && (
            <WalkList {...{ unit, fineness }} seams={walked.seams} gathers={walked.gathers} />
          )}
          {walked && (
            <ChecksList checks={walked.checks} {...{ unit, fineness }} sub={countLine(walked.checks)} />
          )}
          {laterBeside.general.map((text, i) => (
            <Notice key={i} tone="wrong" title={<Phrase parts={text} unit={unit} fineness={fineness} />} />
          ))}
          <SleeveDetails
            {...{ suggested, unit, fineness, whose, onPatch }}
            name={form.name}
            note={form.note}
            wearerId={form.wearerId}
          />
          {sleeve && (
            <BinAsk
              question={{
                title: `Put ${sleeve.name} in the bin?`,
                say: ["It can be brought back from the bin. Marks already on paper stay as they are."],
              }}
              busy={busy}
              onYes={() => void keep([setRemoved("sleeves", sleeve, new Date().toISOString())])}
            />
          )}
        </div>
      </div>
    </Screen>
  );
}

const same = (a: SleeveForm, b: SleeveForm): boolean => JSON.stringify(a) === JSON.stringify(b);

function startWords(missing: readonly FigureKey[]): string {
  return missing.length === 0 ? "" : `Type ${namesOf(missing)}, and the sleeve is drawn.`;
}

function blockedWords(read: ReturnType<typeof readForm>, drawn: boolean): string {
  if (read.missing.length > 0) return startWords(read.missing);
  return drawn
    ? "Put right what is marked above, then keep it."
    : "This sleeve cannot be drawn yet. Put right what is marked above, then keep it.";
}

/** Whether there was a marked field to go to. */
function focusFirstBad(): boolean {
  const field = document.querySelector<HTMLElement>('.sleeve-form [aria-invalid="true"]');
  field?.focus();
  return field !== null;
}
