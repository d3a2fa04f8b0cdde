/** The sheet of marks: everything the screen says, as text in the workshop's unit. */
import { type CubicBezier, type Point } from "@/lib/drafting";
import { formatPlain } from "@/lib/lengths/format-length";
import { type Phrase, phraseText } from "@/lib/lengths/phrase";
import { type IsoDate } from "@/lib/people/iso-date";
import { clip } from "@/lib/pdf/bezier-clip";
import {
  type DrawingLine,
  type DrawingPoint,
  type MarksDocument,
  type MarksStep,
} from "@/lib/pdf/marks-document";
import { type Sleeve, type Unit } from "@/lib/records/types";
import { armholeOfRecord } from "@/lib/sleeves/head-line";
import { failingSeams, type GoodSleeve } from "@/lib/sleeves/make-style-from-record";
import {
  type DrawnLine,
  roundingPhrase,
  stageNames,
  type StepPicture,
  stepPictures,
} from "@/lib/sleeves/mark-out";
import { styleName } from "@/lib/sleeves/style-names";

export interface MarksSheet {
  sleeve: Pick<Sleeve, "name" | "ask" | "fineness">;
  exact: GoodSleeve;
  /** The sleeve of the rounded marks: all that the sheet says is of this one. */
  rounded: GoodSleeve;
  /** mm. */
  step: number;
  unit: Unit;
  /** "" where the sleeve is nobody's yet. */
  wearerName: string;
  /** The workshop's name. */
  author: string;
  today: IsoDate;
  /** What is said of measurements that are too old. */
  stale?: string;
}

/** Pure: the same sleeve gives the same sheet. A sleeve that fails a check says so before its first step. */
export function marksDocument(sheet: MarksSheet): MarksDocument {
  const { author, exact, rounded, sleeve, stale, step, today, unit, wearerName } = sheet;
  const text = (phrase: readonly (string | { readonly mm: number })[]) =>
    phraseText([...phrase] as Phrase, unit, sleeve.fineness);
  const wrong = [...failingSeams(rounded), ...rounded.checks.filter(({ verdict }) => verdict === "wrong")];
  const pictures = stepPictures(rounded);
  return {
    title: sleeve.name,
    subtitle: `${styleName(rounded.style)}. Marks in the order they are drawn`,
    wearer: wearerName,
    date: today,
    figures: figuresOf(sheet),
    warnings: [
      ...(wrong.length > 0 ? ["This sleeve fails. Change it before cloth is cut."] : []),
      ...wrong.map(({ phrase, remedy }) => `${text(phrase)} ${text(remedy)}`),
      ...(stale ? [stale] : []),
      text(roundingPhrase(exact, rounded, step)).replace("The checks here", "The checks on this sheet"),
    ],
    steps: pictures.map((picture, i) =>
      stepOf(picture, `${stageWords(pictures, i)}${text(picture.step.phrase)}`),
    ),
    checks: [
      ...rounded.seams.map(({ agrees, phrase, remedy }) => ({
        text: agrees ? text(phrase) : `${text(phrase)} ${text(remedy)}`,
        verdict: agrees ? ("good" as const) : ("wrong" as const),
      })),
      ...rounded.checks.map(({ phrase, remedy, verdict }) => ({
        text: verdict === "good" ? text(phrase) : `${text(phrase)} ${text(remedy)}`,
        verdict,
      })),
    ],
    lang: "en-GB",
    author,
    tape: unit === "in" ? "inch" : "cm",
  };
}

function figuresOf({ rounded, sleeve, unit }: MarksSheet): { name: string; text: string }[] {
  const { biceps, capDepth, elbow, hem, length } = rounded.figures;
  const armhole = armholeOfRecord(sleeve.ask);
  const { cap, underarmFront } = rounded.draft.lengths;
  const rows: [string, number | undefined][] = [
    ["Sleeve length", length],
    ["Cap depth", capDepth],
    ["Biceps line", biceps],
    ["Elbow line", elbow?.width],
    ["Hem round", hem],
    ["Cap seam", cap],
    ["Armhole", armhole],
    ["Underarm seam", underarmFront],
  ];
  return rows.flatMap(([name, mm]) =>
    mm === undefined ? [] : [{ name, text: formatPlain(mm, unit, sleeve.fineness) }],
  );
}

/** "At the machine: " before the first step of a stage; the steps that draw say so themselves. */
function stageWords(pictures: readonly StepPicture[], i: number): string {
  const stage = pictures[i]!.step.stage;
  const changes = stage !== "draw" && pictures[i - 1]?.step.stage !== stage;
  return changes ? `${stageNames[stage]}: ` : "";
}

/** Lines run on this far beyond what is shown, of its height: that there is more is seen, and no other step is drawn over. */
const beyond = 0.06;

function stepOf({ before, box, fresh, measured, points, step }: StepPicture, text: string): MarksStep {
  const past = box.h * beyond;
  const paper = { x: box.x - past, y: box.y - past, w: box.w + 2 * past, h: box.h + 2 * past };
  const shown = ({ curves }: Pick<DrawnLine, "curves">): CubicBezier[] =>
    clip(curves, paper).flatMap((run) => [...run.curves]);
  const lines: DrawingLine[] = [
    ...before.map((line) => ({ d: shown(line), weight: line.weight })),
    ...measured.map(({ from, to }) => ({ d: [[from, to] as const], weight: "new" as const })),
    ...fresh.map((line) => ({ d: shown(line), weight: "new" as const })),
  ];
  const onPaper = ({ x, y }: Point) =>
    x >= paper.x && x <= paper.x + paper.w && y >= paper.y && y <= paper.y + paper.h;
  return {
    n: step.n,
    text,
    drawing: {
      viewBox: box,
      lines: lines.filter(({ d }) => d.length > 0),
      points: points.filter(onPaper).map(({ fresh: isNew, words, x, y }): DrawingPoint => ({
        x,
        y,
        ...(isNew && { new: true }),
        ...(isNew && words && { label: words }),
      })),
    },
  };
}
