"use client";

import { type ReactNode, useMemo, useState } from "react";
import { defaultBeside, defaultMarks, usualHeadEase } from "@/lib/drafting";
import { ageOn } from "@/lib/people/age";
import { phraseText } from "@/lib/lengths/phrase";
import { parseLength } from "@/lib/lengths/parse-length";
import { type MeasurementSet, type Wearer } from "@/lib/records/types";
import { askFromSet, fillFromSet, saidOf, triedAsks } from "@/lib/sleeves/ask-from-set";
import { type FieldProblems } from "@/lib/sleeves/field-problems";
import { type MarkText } from "@/lib/sleeves/guide-marks";
import { usualBicepsEase } from "@/lib/sleeves/ask-from-record";
import { type GoodSleeve } from "@/lib/sleeves/make-style-from-record";
import { type Reach, reaches } from "@/lib/sleeves/reach";
import { type FigureKey, sleeveFigure } from "@/lib/sleeves/sleeve-figures";
import { figuresNeeded, type SleeveForm, withFigure } from "@/lib/sleeves/sleeve-form";
import { Card, CardHead } from "@/components/ui/card";
import { Check, Choice } from "@/components/ui/field";
import { Length } from "@/components/ui/fraction";
import { FigureField } from "./figure-field";
import { FromSetNotice } from "./from-set-notice";
import { MarksTable } from "./marks-table";

export interface FiguresFormProps {
  form: SleeveForm;
  beside: FieldProblems;
  /** The sleeve, or the plain one that its style is made from; null while that cannot be drawn. */
  made: GoodSleeve | null;
  set: MeasurementSet | null;
  wearer: Wearer | null;
  today: string;
  /** Not kept yet. */
  isNew: boolean;
  onType(figure: FigureKey, typed: string): void;
  onFocusFigure(figure: FigureKey): void;
  onPatch(patch: (now: SleeveForm) => SleeveForm): void;
  /** The style's figures, which come after the four. */
  children?: ReactNode;
}

/** All figures of the sleeve, the four that draw it first. */
export function FiguresForm(props: FiguresFormProps) {
  const { beside, children, form, isNew, made, onFocusFigure, onPatch, onType, set, today, wearer } = props;
  const { armholeBy, bicepsBy, capBy, fineness, typed, unit } = form;
  const ageYears = wearer ? ageOn(wearer, today)?.years : undefined;
  const setFigures = form.setId === set?.id ? set?.figures : undefined;
  const asks = useMemo(() => {
    if (!setFigures) return [];
    const age = ageYears === undefined ? {} : { ageYears };
    return triedAsks({ figures: setFigures, ...age, reach: form.reach, unit, fineness });
  }, [setFigures, ageYears, form.reach, unit, fineness]);
  const said = saidOf(typed, asks);
  const needed = new Set(figuresNeeded(form));
  const usual = usualFigures(form, made);

  const field = (figure: FigureKey) => (
    <FigureField
      key={figure}
      {...{ figure, unit, fineness, onType, onFocusFigure }}
      {...names(figure)}
      typed={typed[figure]}
      optional={!needed.has(figure)}
      usualMm={usual[figure]}
      error={beside.errors[figure]}
      problem={beside.problems[figure]}
      said={said[figure]}
    />
  );
  const reachTo = (reach: Reach) =>
    onPatch((now) => {
      if (!setFigures) return now;
      const options = { figures: setFigures, ...(ageYears !== undefined && { ageYears }), unit, fineness };
      const before = now.reach ? askFromSet({ ...options, reach: now.reach }) : null;
      return { ...fillFromSet(now, askFromSet({ ...options, reach }), before), reach };
    });

  return (
    <>
      <FromSetNotice
        {...{ set, wearer, today, isNew }}
        fromOther={isNew && set !== null && form.setId !== null && form.setId !== set.id}
        inUse={setFigures !== undefined}
        said={said}
      />
      <Card aria-labelledby="figures-title">
        <CardHead id="figures-title" title="Figures" />
        <div className="grid grid-cols-[minmax(0,1fr)] gap-5">
          {form.reach && (
            <Choice
              label="How long"
              name="reach"
              options={reaches}
              value={form.reach}
              onChange={(event) => reachTo(event.target.value as Reach)}
            />
          )}
          {field("length")}
          <Choice
            label="Cap depth"
            name="capBy"
            options={[
              { value: "given", label: "I have it" },
              { value: "armhole", label: "Find it", sub: "from the armhole" },
            ]}
            value={capBy}
            onChange={(event) => onPatch((now) => withCapBy(now, event.target.value, made))}
          />
          {capBy === "given" ? (
            field("capDepth")
          ) : (
            <>
              {made && (
                <p>
                  Found: a cap{" "}
                  <Length mm={made.figures.capDepth} unit={unit} fineness={fineness} className="font-bold" />{" "}
                  deep.
                </p>
              )}
              <ArmholeFields {...{ armholeBy, field, onPatch }} />
              {field("headEase")}
            </>
          )}
          <Choice
            label="Biceps line"
            name="bicepsBy"
            options={[
              { value: "given", label: "I have it" },
              { value: "arm", label: "From the arm", sub: "and its ease" },
            ]}
            value={bicepsBy}
            onChange={(event) => onPatch((now) => withBicepsBy(now, event.target.value, made))}
          />
          {bicepsBy === "given" ? (
            field("biceps")
          ) : (
            <>
              {field("upperArm")}
              {field("bicepsEase")}
              {made && (
                <p>
                  Biceps line{" "}
                  <Length mm={made.figures.biceps} unit={unit} fineness={fineness} className="font-bold" />.
                </p>
              )}
            </>
          )}
          {field("hem")}
          <Check
            label="The hem opens, with a placket or a slit"
            checked={form.hemOpens}
            onChange={(event) => {
              const hemOpens = event.target.checked;
              onPatch((now) => ({ ...now, hemOpens }));
            }}
          />
        </div>
      </Card>
      {children}
      <Card aria-labelledby="more-title">
        <CardHead
          id="more-title"
          title="To check it by"
          sub="None is needed. Each brings a check against the arm or the bodice."
        />
        <div className="grid grid-cols-[minmax(0,1fr)] gap-5">
          {capBy === "given" && <ArmholeFields {...{ armholeBy, field, onPatch }} />}
          {bicepsBy === "given" && field("upperArm")}
          {field("hand")}
          {field("wrist")}
          {field("elbowDepth")}
          {field("elbowGirth")}
          {field("elbowWidth")}
        </div>
      </Card>
      <GuideMarks {...{ beside, form, made, field, onPatch }} />
    </>
  );
}

interface PartProps {
  field(figure: FigureKey): React.ReactNode;
  onPatch: FiguresFormProps["onPatch"];
}

function ArmholeFields({ armholeBy, field, onPatch }: PartProps & Pick<SleeveForm, "armholeBy">) {
  return (
    <>
      <Choice
        label="Armhole measured"
        name="armholeBy"
        options={[
          { value: "halves", label: "Front and back" },
          { value: "whole", label: "All round" },
        ]}
        value={armholeBy}
        onChange={(event) => {
          const by = event.target.value as SleeveForm["armholeBy"];
          onPatch((now) => ({ ...now, armholeBy: by }));
        }}
      />
      {armholeBy === "whole" ? (
        field("armholeWhole")
      ) : (
        <>
          {field("armholeFront")}
          {field("armholeBack")}
        </>
      )}
    </>
  );
}

type MarksProps = PartProps & Pick<FiguresFormProps, "beside" | "form" | "made">;

function GuideMarks({ beside, field, form, made, onPatch }: MarksProps) {
  const { fineness, marks, unit } = form;
  const figures = made?.figures;
  const rule = figures && defaultMarks(figures.biceps, figures.capDepth);
  const troubled = beside.markErrors.length > 0 || beside.marks.front.size > 0 || beside.marks.back.size > 0;
  const [unfolded, setUnfolded] = useState(false);
  const open = unfolded || troubled;
  const onChange = (side: "front" | "back", texts: MarkText[] | null) =>
    onPatch((now) => ({ ...now, marks: { ...now.marks, [side]: texts } }));
  return (
    <Card aria-labelledby="marks-title">
      <details open={open} onToggle={(event) => setUnfolded(event.currentTarget.open)}>
        <summary className="min-h-target py-2">
          <h2 id="marks-title" className="inline font-figure text-lg font-bold">
            Guide marks and notches
          </h2>
        </summary>
        {open && (
          <div className="mt-3 grid grid-cols-[minmax(0,1fr)] gap-5">
            <p className="text-soft">
              The cap seam runs through marks set out from a straight line, underarm to crown. The rule
              (common practice, no source) grows with the biceps line until a mark is changed by hand.
            </p>
            {(["front", "back"] as const).map(
              (side) =>
                (rule || marks[side]) && (
                  <MarksTable
                    key={side}
                    {...{ side, unit, fineness, onChange }}
                    texts={marks[side]}
                    rule={rule?.[side] ?? []}
                    problems={beside.markErrors.filter((problem) => problem.side === side)}
                    faults={
                      new Map(
                        [...beside.marks[side]].map(([i, text]) => [i, phraseText(text, unit, fineness)]),
                      )
                    }
                  />
                ),
            )}
            {field("beside")}
            {field("notchFront")}
            {field("notchBack")}
          </div>
        )}
      </details>
    </Card>
  );
}

function names(figure: FigureKey) {
  const { how, name } = sleeveFigure(figure);
  return { how, name };
}

/** Changing over takes along what was found, so that the drawing does not jump. */
function withCapBy(now: SleeveForm, by: string, made: GoodSleeve | null): SleeveForm {
  if (by === "armhole") return { ...now, capBy: "armhole" };
  const keepsOwn = now.typed.capDepth.trim() !== "" || !made;
  return keepsOwn ? { ...now, capBy: "given" } : withFigure(now, "capDepth", made.figures.capDepth);
}

function withBicepsBy(now: SleeveForm, by: string, made: GoodSleeve | null): SleeveForm {
  if (by === "arm") return { ...now, bicepsBy: "arm" };
  const keepsOwn = now.typed.biceps.trim() !== "" || !made;
  return keepsOwn ? { ...now, bicepsBy: "given" } : withFigure(now, "biceps", made.figures.biceps);
}

/** What an empty field stands for. */
function usualFigures(form: SleeveForm, made: GoodSleeve | null): Partial<Record<FigureKey, number>> {
  const mm = (key: FigureKey) => {
    const read = parseLength(form.typed[key], form.unit);
    return read.ok ? read.mm : undefined;
  };
  const [front, back, whole, arm] = [
    mm("armholeFront"),
    mm("armholeBack"),
    mm("armholeWhole"),
    mm("upperArm"),
  ];
  const armhole =
    form.armholeBy === "whole" ? whole : front === undefined || back === undefined ? undefined : front + back;
  return {
    ...(armhole !== undefined && { headEase: usualHeadEase(armhole) }),
    ...(arm !== undefined && { bicepsEase: usualBicepsEase(arm) }),
    ...(made && {
      beside: defaultBeside(made.figures.biceps),
      notchFront: made.figures.notches.front,
      notchBack: made.figures.notches.back,
      ...(made.figures.elbow && { elbowWidth: made.figures.elbow.width }),
    }),
  };
}
