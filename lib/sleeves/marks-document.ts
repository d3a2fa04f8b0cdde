/** The sheet of marks: everything the screen says, as text in the workshop's unit. */
import { type CubicBezier, type MadeSleeve } from "@/lib/drafting";
import { formatPlain } from "@/lib/lengths/format-length";
import { type Phrase, phraseText } from "@/lib/lengths/phrase";
import { type IsoDate } from "@/lib/people/iso-date";
import {
  type DrawingLine,
  type DrawingPoint,
  type LineWeight,
  type MarksDocument,
  type MarksStep,
} from "@/lib/pdf/marks-document";
import { type Sleeve, type Unit } from "@/lib/records/types";
import { armholeOfRecord } from "@/lib/sleeves/head-line";
import { roundingPhrase, type StepPicture, stepPictures } from "@/lib/sleeves/mark-out";

type Good = MadeSleeve & { ok: true };

export interface MarksSheet {
  sleeve: Pick<Sleeve, "name" | "ask" | "fineness">;
  exact: Good;
  /** The sleeve of the rounded marks: all that the sheet says is of this one. */
  rounded: Good;
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
  const wrong = rounded.checks.filter(({ verdict }) => verdict === "wrong");
  return {
    title: sleeve.name,
    subtitle: "Marks of a plain sleeve, in the order they are drawn",
    wearer: wearerName,
    date: today,
    figures: figuresOf(sheet),
    warnings: [
      ...(wrong.length > 0 ? ["This sleeve fails. Change it before cloth is cut."] : []),
      ...wrong.map(({ phrase, remedy }) => `${text(phrase)} ${text(remedy)}`),
      ...(stale ? [stale] : []),
      text(roundingPhrase(exact, rounded, step)).replace("The checks here", "The checks on this sheet"),
    ],
    steps: stepPictures(rounded).map((picture) => stepOf(picture, text(picture.step.phrase))),
    checks: rounded.checks.map(({ phrase, remedy, verdict }) => ({
      text: verdict === "good" ? text(phrase) : `${text(phrase)} ${text(remedy)}`,
      verdict,
    })),
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

/** The outline is cut along; everything else on the paper guides. */
function weightOf(name: string): LineWeight {
  return name === "hemLine" || /^(cap|underarm)(Front|Back)$/u.test(name) ? "cut" : "guide";
}

function stepOf({ before, box, fresh, measured, points, step }: StepPicture, text: string): MarksStep {
  const lines: DrawingLine[] = [
    ...before.map(({ curves, name }) => ({ d: [...curves] as CubicBezier[], weight: weightOf(name) })),
    ...measured.map(({ from, to }) => ({ d: [[from, to] as const], weight: "new" as const })),
    ...fresh.map(({ curves }) => ({ d: [...curves] as CubicBezier[], weight: "new" as const })),
  ];
  return {
    n: step.n,
    text,
    drawing: {
      viewBox: box,
      lines,
      points: points.map(({ fresh: isNew, words, x, y }): DrawingPoint => ({
        x,
        y,
        ...(isNew && { new: true }),
        ...(isNew && words && { label: words }),
      })),
    },
  };
}
