import { type MeasureKey, bodyMeasure } from "@/lib/figures/body-measures";
import { type Mark } from "@/lib/figures/reference-tables";
import { type UsualBounds, usualBounds } from "@/lib/figures/usual-bounds";
import { formatPlain } from "@/lib/lengths/format-length";
import { type Phrase } from "@/lib/lengths/phrase";
import { mmPerInch } from "@/lib/lengths/units";
import { formatDay } from "@/lib/people/format-day";
import { type IsoDate, daysBetween } from "@/lib/people/iso-date";
import { type Unit } from "@/lib/records/types";

/** Something to look at once more. It never blocks: the figure can be kept as it is. */
export interface Question {
  kind: "unit" | "bounds" | "order" | "halves" | "change";
  say: Phrase;
  /** Where the bounds come from. */
  source: string;
  mark: Mark;
}

export interface AskContext {
  /** Whole years, where known. */
  ageYears?: number;
  /** The same measure in the wearer's set before. */
  previous?: { mm: number; takenOn: IsoDate };
  /** The other figures of this set, in mm, by measure. */
  others: Partial<Record<MeasureKey, number>>;
  today: IsoDate;
  /** The unit that the figure was typed in, where known: a slip is then only looked for from that one. */
  unit?: Unit;
}

const practice = { source: "common practice, no source", mark: "practice" } as const;

/**
 * Questions about one figure as it is typed, worst first: a unit mistaken, out of what is usual at the age, out of order with the
 * other girths, halves that do not make the whole, or changed more than is likely since last time. None: nothing to ask.
 * @param mm the figure, in mm.
 * @throws RangeError where a date is not a day.
 */
export function askAbout(figure: MeasureKey, mm: number, context: AskContext): Question[] {
  const bounds = usualBounds(figure, context.ageYears);
  const unit = unitQuestion(figure, mm, bounds, context);
  // A unit mistaken puts every other comparison out as well: one question is enough.
  if (unit) return [unit];
  return [
    ...boundsQuestions(figure, mm, bounds),
    ...orderQuestions(figure, mm, context.others),
    ...halvesQuestions(figure, mm, context.others),
    ...changeQuestions(figure, mm, context),
  ];
}

const named = (figure: MeasureKey): string => bodyMeasure(figure).name.toLowerCase();
const inside = (mm: number, { lowMm, highMm }: UsualBounds): boolean => mm >= lowMm && mm <= highMm;

const figureText = (n: number): string => String(Math.round(n * 100) / 100);

/** The ways in which a number is set down under the wrong unit, each with what was written and what may have been meant. */
const slips = [
  { meantMm: (mm: number) => (mm / mmPerInch) * 10, wrote: "in", meant: "cm", per: mmPerInch },
  { meantMm: (mm: number) => (mm / 10) * mmPerInch, wrote: "cm", meant: "in", per: 10 },
  { meantMm: (mm: number) => mm / 10, wrote: "cm", meant: "mm", per: 10 },
] as const;

function unitQuestion(
  figure: MeasureKey,
  mm: number,
  bounds: UsualBounds,
  { previous, unit }: AskContext,
): Question | undefined {
  const previousMm = previous?.mm;
  const strange = !inside(mm, bounds);
  // Against last time's figure: within a tenth, common practice.
  const likeLastTime = (meant: number) => previousMm !== undefined && Math.abs(meant / previousMm - 1) <= 0.1;
  const far = previousMm !== undefined && (mm / previousMm > 2 || mm / previousMm < 0.5);
  const fits = ({ meantMm }: (typeof slips)[number]) => {
    const meant = meantMm(mm);
    return previousMm === undefined
      ? strange && inside(meant, bounds)
      : (strange || far) && likeLastTime(meant);
  };
  const slip = slips.find((one) => (unit === undefined || one.wrote === unit) && fits(one));
  if (!slip) return undefined;
  const number = figureText(mm / slip.per);
  const other = slip.wrote === "in" ? "cm" : "in";
  return {
    kind: "unit",
    say:
      slip.meant === "mm"
        ? [`${number} cm is too long for ${named(figure)}. Did you mean ${number} mm?`]
        : [`${number} ${slip.wrote} is ${formatPlain(mm, other)}. Did you mean ${number} ${slip.meant}?`],
    source: "1 in = 25.4 mm",
    mark: "exact",
  };
}

function boundsQuestions(figure: MeasureKey, mm: number, bounds: UsualBounds): Question[] {
  if (inside(mm, bounds)) return [];
  const { lowMm, highMm, whose, source, mark } = bounds;
  const say: Phrase = [
    `The ${named(figure)} ${whose} is usually `,
    { mm: lowMm },
    " to ",
    { mm: highMm },
    ". This is ",
    { mm },
    ". Measure it once more, and keep it if the tape says the same.",
  ];
  return [{ kind: "bounds", say, source, mark }];
}

/** On a real arm each of these is smaller than the next. */
const ascending: readonly MeasureKey[] = ["wristGirth", "handGirth", "upperArmGirth", "armscyeGirth"];

function orderQuestions(figure: MeasureKey, mm: number, others: AskContext["others"]): Question[] {
  const at = ascending.indexOf(figure);
  if (at < 0) return [];
  return ascending.flatMap((other, i): Question[] => {
    const otherMm = others[other];
    if (i === at || otherMm === undefined || (i < at ? mm > otherMm : mm < otherMm)) return [];
    const say: Phrase = [
      `The ${named(figure)}, `,
      { mm },
      `, is usually ${i < at ? "more" : "less"} than the ${named(other)}, `,
      { mm: otherMm },
      ". Look at both.",
    ];
    return [
      {
        kind: "order",
        say,
        source: "US Army surveys: wrist, hand, upper arm and armscye are in that order",
        mark: "seen",
      },
    ];
  });
}

/** How far the two halves of the armscye may be from the whole before it is asked, mm: half an inch, common practice. */
const halvesSlackMm = mmPerInch / 2;

function halvesQuestions(figure: MeasureKey, mm: number, others: AskContext["others"]): Question[] {
  if (figure !== "armscyeGirth" && figure !== "armscyeFront" && figure !== "armscyeBack") return [];
  const all = { ...others, [figure]: mm };
  const { armscyeGirth: girth, armscyeFront: front, armscyeBack: back } = all;
  if (girth === undefined || front === undefined || back === undefined) return [];
  if (Math.abs(front + back - girth) <= halvesSlackMm) return [];
  const say: Phrase = [
    "The front and back halves of the armscye make ",
    { mm: front + back },
    ", but round the whole it is ",
    { mm: girth },
    ". Measure all three once more.",
  ];
  return [{ kind: "halves", say, ...practice }];
}

/** All common practice, no source: how far two takings of the tape differ, and how fast a body changes. */
const tapeSlackMm = mmPerInch / 2;
const growing = { girth: { at: 0.08, perMonth: 0.015 }, length: { at: 0.05, perMonth: 0.012 } };
const grown = { girth: { at: 0.08, perMonth: 0.01 }, length: { at: 0.06, perMonth: 0 } };
const mostShare = 0.35;

function changeQuestions(
  figure: MeasureKey,
  mm: number,
  { previous, ageYears, today }: AskContext,
): Question[] {
  if (!previous) return [];
  const { kind } = bodyMeasure(figure);
  const child = ageYears !== undefined && ageYears < 18;
  const days = Math.max(0, daysBetween(previous.takenOn, today));
  const months = days / 30.44;
  const change = mm - previous.mm;
  const ask = (text: string): Question[] => {
    const say: Phrase = [
      `Last time, ${formatDay(previous.takenOn)}, the ${named(figure)} was `,
      { mm: previous.mm },
      "; now it is ",
      { mm },
      `. ${text}`,
    ];
    return [{ kind: "change", say, ...practice }];
  };
  if (child && kind === "length" && change < -tapeSlackMm) {
    return ask("A child's arm and back do not get shorter: measure it once more.");
  }
  const { at, perMonth } = (child ? growing : grown)[kind];
  const allowed = Math.max(tapeSlackMm, Math.min(mostShare, at + perMonth * months) * previous.mm);
  if (Math.abs(change) <= allowed) return [];
  return ask(
    child && change < 0
      ? "A child seldom gets so much thinner: measure it once more."
      : "That is a large change for the time: measure it once more, and keep it if the tape says the same.",
  );
}
