/** The drafting form as it is typed, and its way to and from a sleeve's record. */
import { formatLength } from "@/lib/lengths/format-length";
import { parseLength } from "@/lib/lengths/parse-length";
import {
  type Fineness,
  type Sleeve,
  type SleeveAskRecord,
  type TypedLength,
  type Unit,
} from "@/lib/records/types";
import { marksOf, type MarkProblem, markTexts, type MarkText } from "@/lib/sleeves/guide-marks";
import { type Reach } from "@/lib/sleeves/reach";
import { type FigureKey, sleeveFigure, sleeveFigures } from "@/lib/sleeves/sleeve-figures";
import {
  emptyStyleForm,
  readStyle,
  type ReadStyle,
  type StyleForm,
  styleFormOf,
  styleTypedAgain,
} from "@/lib/sleeves/style-form";

export interface SleeveForm extends StyleForm {
  /** The unit that a bare number was typed in. */
  unit: Unit;
  name: string;
  wearerId: string | null;
  setId: string | null;
  /** How far down the arm the set was asked to fill the form; null where it was not. */
  reach: Reach | null;
  /** As typed; "" where left out. */
  typed: Record<FigureKey, string>;
  /** The cap depth is given, or found from the armhole. */
  capBy: "given" | "armhole";
  armholeBy: "halves" | "whole";
  /** The biceps line is given, or the upper arm and its ease. */
  bicepsBy: "given" | "arm";
  /** Null keeps the rule's own marks. */
  marks: { front: MarkText[] | null; back: MarkText[] | null };
  hemOpens: boolean;
  fineness: Fineness;
  note: string;
}

export function emptyForm(unit: Unit, fineness: Fineness): SleeveForm {
  return {
    ...emptyStyleForm,
    unit,
    name: "",
    wearerId: null,
    setId: null,
    reach: null,
    typed: Object.fromEntries(sleeveFigures.map(({ key }) => [key, ""])) as Record<FigureKey, string>,
    capBy: "given",
    armholeBy: "halves",
    bicepsBy: "given",
    marks: { front: null, back: null },
    hemOpens: false,
    fineness,
    note: "",
  };
}

/** A kept sleeve back on the form. What was typed comes back as typed, unless the workshop's unit has changed since. */
export function formOfSleeve(sleeve: Sleeve, unit: Unit): SleeveForm {
  const { lengths, frontMarks, backMarks, hemOpens } = sleeve.ask;
  const form = emptyForm(unit, sleeve.fineness);
  for (const { key } of sleeveFigures) form.typed[key] = typedAgain(lengths[key], unit, sleeve.fineness);
  return {
    ...form,
    ...styleFormOf(sleeve.style, sleeve.ask, (length) => typedAgain(length, unit, sleeve.fineness)),
    name: sleeve.name,
    wearerId: sleeve.wearerId,
    setId: sleeve.setId,
    capBy: lengths.capDepth ? "given" : "armhole",
    armholeBy: lengths.armholeWhole ? "whole" : "halves",
    bicepsBy: lengths.biceps ? "given" : "arm",
    marks: { front: frontMarks && markTexts(frontMarks), back: backMarks && markTexts(backMarks) },
    hemOpens,
    note: sleeve.note,
  };
}

function typedAgain(length: TypedLength | undefined, unit: Unit, fineness: Fineness): string {
  if (!length || length.typed === "") return "";
  const read = parseLength(length.typed, unit);
  if (read.ok && Math.abs(read.mm - length.mm) < 0.01) return length.typed;
  return formatLength(length.mm, unit, fineness).figure;
}

/** A form that was typed in another unit, its lengths written again in this one. */
export function formInUnit(form: SleeveForm, unit: Unit): SleeveForm {
  if (form.unit === unit) return form;
  const again = (typed: string) => {
    const read = parseLength(typed, form.unit);
    return read.ok ? formatLength(read.mm, unit, form.fineness).figure : typed;
  };
  const typed = Object.fromEntries(
    Object.entries(form.typed).map(([key, text]) => [key, text === "" ? "" : again(text)]),
  ) as Record<FigureKey, string>;
  const marks = (texts: MarkText[] | null) =>
    texts && texts.map((mark) => ({ ...mark, outTyped: mark.outTyped && again(mark.outTyped) }));
  return {
    ...form,
    unit,
    typed,
    styleTyped: styleTypedAgain(form.styleTyped, again),
    marks: { front: marks(form.marks.front), back: marks(form.marks.back) },
  };
}

/** A form that was put down earlier, in this unit; what it has not got is as on an empty one. */
export function restoredForm(draft: Partial<SleeveForm>, unit: Unit, fineness: Fineness): SleeveForm {
  const empty = emptyForm(unit, fineness);
  return formInUnit({ ...empty, ...draft, typed: { ...empty.typed, ...draft.typed } }, unit);
}

/** The form with a figure set from outside its field: by a handle, or taken over from what was found. */
export function withFigure(form: SleeveForm, key: FigureKey, mm: number): SleeveForm {
  return {
    ...form,
    typed: { ...form.typed, [key]: formatLength(mm, form.unit, form.fineness).figure },
    ...(key === "capDepth" && { capBy: "given" as const }),
    ...(key === "biceps" && { bicepsBy: "given" as const }),
  };
}

/** The figures that the form asks for as it is set, in order. */
export function figuresInUse({ armholeBy, bicepsBy, capBy }: SleeveForm): FigureKey[] {
  return [
    "length",
    ...(capBy === "given" ? (["capDepth"] as const) : []),
    ...(armholeBy === "whole" ? (["armholeWhole"] as const) : (["armholeFront", "armholeBack"] as const)),
    ...(capBy === "armhole" ? (["headEase"] as const) : []),
    ...(bicepsBy === "given" ? (["biceps", "upperArm"] as const) : (["upperArm", "bicepsEase"] as const)),
    "hem",
    "hand",
    "wrist",
    "elbowDepth",
    "elbowWidth",
    "elbowGirth",
    "beside",
    "notchFront",
    "notchBack",
  ];
}

/** Without these there is nothing to draw. */
export function figuresNeeded({ armholeBy, bicepsBy, capBy }: SleeveForm): FigureKey[] {
  const armhole: FigureKey[] = armholeBy === "whole" ? ["armholeWhole"] : ["armholeFront", "armholeBack"];
  return [
    "length",
    ...(capBy === "given" ? (["capDepth"] as const) : armhole),
    bicepsBy === "given" ? "biceps" : "upperArm",
    "hem",
  ];
}

export interface ReadForm {
  /** What could be read and is in use. */
  record: SleeveAskRecord;
  /** What to type instead, by field. */
  errors: Partial<Record<FigureKey, string>>;
  markErrors: MarkProblem[];
  /** The same for the style's figures. */
  styleErrors: ReadStyle["errors"];
  /** Needed, and not there yet. */
  missing: FigureKey[];
  /** Every needed figure could be read: there is something to draw. */
  drawable: boolean;
}

export function readForm(form: SleeveForm): ReadForm {
  const lengths: Record<string, TypedLength> = {};
  const errors: ReadForm["errors"] = {};
  for (const key of figuresInUse(form)) {
    const typed = form.typed[key];
    if (typed.trim() === "") continue;
    const read = parseLength(typed, form.unit);
    if (read.ok) lengths[key] = { typed, mm: read.mm };
    else errors[key] = read.say;
  }
  for (const [one, other] of [
    ["armholeFront", "armholeBack"],
    ["armholeBack", "armholeFront"],
  ] as const) {
    if (lengths[one] && !lengths[other] && !errors[other] && form.capBy === "given")
      errors[other] =
        `Type ${sleeveFigure(other).said} as well, or empty both: half an armhole cannot be checked.`;
  }
  const needed = figuresNeeded(form);
  const style = readStyle(form);
  const front = marksOf(form.marks.front, "front", form.unit);
  const back = marksOf(form.marks.back, "back", form.unit);
  return {
    record: {
      lengths,
      frontMarks: front.marks,
      backMarks: back.marks,
      hemOpens: form.hemOpens,
      ...style.ask,
    },
    errors,
    styleErrors: style.errors,
    markErrors: [...front.problems, ...back.problems],
    missing: needed.filter((key) => form.typed[key].trim() === ""),
    drawable: needed.every((key) => lengths[key] !== undefined),
  };
}

/** "the sleeve length, the cap depth and the hem round". */
export function namesOf(keys: readonly FigureKey[]): string {
  const said = keys.map((key) => sleeveFigure(key).said);
  return said.length < 2 ? (said[0] ?? "") : `${said.slice(0, -1).join(", ")} and ${said.at(-1)}`;
}
