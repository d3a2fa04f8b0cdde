/** One style drafted for many wearers, each from her own set. Whoever cannot be drafted for is told why; the others go on. */
import { namesInWords } from "@/lib/clients/list-words";
import { type Verdict } from "@/lib/drafting";
import { bodyMeasure } from "@/lib/figures/body-measures";
import { staleness } from "@/lib/figures/staleness";
import { type Phrase } from "@/lib/lengths/phrase";
import { type ManyWearer } from "@/lib/many/many-wearer";
import { missingMeasures } from "@/lib/many/missing-measures";
import { ageOn } from "@/lib/people/age";
import { formatDay } from "@/lib/people/format-day";
import { type IsoDate } from "@/lib/people/iso-date";
import {
  type Fineness,
  type MeasurementSet,
  type SleeveAskRecord,
  type Unit,
  type Wearer,
} from "@/lib/records/types";
import { askFromSet, fillFromSet } from "@/lib/sleeves/ask-from-set";
import { type HeadLine, headLine } from "@/lib/sleeves/head-line";
import { failingSeams, type GoodSleeve, styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import { type Reach } from "@/lib/sleeves/reach";
import { emptyForm, namesOf, readForm } from "@/lib/sleeves/sleeve-form";
import { type StyleForm } from "@/lib/sleeves/style-form";

/** What is the same for all of them. A figure of the style that cannot be read is the usual one. */
export interface ManyAsk extends StyleForm {
  unit: Unit;
  fineness: Fineness;
  reach: Reach;
  /** Draft from a child's figures that are too old to cut from, too. */
  oldToo: boolean;
  today: IsoDate;
}

export interface DraftedWearer {
  drafted: true;
  wearer: Wearer;
  set: MeasurementSet;
  /** Drawn from marks rounded to what a hand sets out. */
  good: GoodSleeve;
  /** What is kept of it. */
  record: SleeveAskRecord;
  /** Whether it goes into the armhole. */
  line: HeadLine;
  /** The worst of the seams, the checks and the age of the figures. */
  verdict: Verdict;
  /** Each with what to do, where the verdict is not "good". */
  reasons: Phrase[];
}

export interface NotDrafted {
  drafted: false;
  wearer: Wearer;
  set: MeasurementSet | null;
  cause: "no-set" | "old" | "missing" | "figures";
  /** Why, and what to do. */
  why: Phrase;
}

export type ManyRow = DraftedWearer | NotDrafted;

/** One row for each wearer, in their order. */
export function draftMany(wearers: readonly ManyWearer[], ask: ManyAsk): ManyRow[] {
  return wearers.map((one) => draftOne(one, ask));
}

/** From here a wearer is grown, as `staleness` counts it, years. */
const GROWN = 18;

export function draftOne({ set, wearer }: ManyWearer, ask: ManyAsk): ManyRow {
  const { fineness, oldToo, reach, today, unit } = ask;
  const not = (cause: NotDrafted["cause"], why: Phrase): NotDrafted => ({
    drafted: false,
    wearer,
    set,
    cause,
    why,
  });
  if (!set) return not("no-set", ["There are no measurements yet. Measure first."]);
  const ageYears = ageOn(wearer, today)?.years;
  const { say: old } = staleness(set.takenOn, ageYears, today);
  if (old && !oldToo && ageYears !== undefined && ageYears < GROWN) return not("old", [old]);

  const { figures, id: setId } = set;
  const lacks = missingMeasures(figures, reach).map((key) => bodyMeasure(key).name.toLowerCase());
  if (lacks.length > 0)
    return not("missing", [
      `The set of ${formatDay(set.takenOn)} has no ${namesInWords(lacks)}. Measure again: this sleeve needs ${lacks.length === 1 ? "it" : "them"}.`,
    ]);
  const fromSet = askFromSet({ figures, ...(ageYears !== undefined && { ageYears }), reach, unit, fineness });
  const { cloth, style, styleTyped } = ask;
  const empty = { ...emptyForm(unit, fineness), style, cloth, styleTyped, wearerId: wearer.id, setId, reach };
  const { errors, missing, record } = readForm(fillFromSet(empty, fromSet, null));
  const made = styleFromRecord({ style, ask: record }, unit, fineness);
  if (!made) {
    const [unread] = Object.values(errors);
    return not("missing", [unread ?? `Without ${namesOf(missing)} there is nothing to draw. Measure again.`]);
  }
  if (!made.ok)
    return not(
      "figures",
      made.problems.flatMap(({ phrase, remedy }, i) => [...(i > 0 ? [" "] : []), ...phrase, " ", ...remedy]),
    );
  const line = headLine(made, record);
  return { drafted: true, wearer, set, good: made, record, line, ...judged(made, line, old) };
}

function judged(
  good: GoodSleeve,
  line: HeadLine,
  old: string | undefined,
): Pick<DraftedWearer, "verdict" | "reasons"> {
  const found = (verdict: Verdict) =>
    good.checks
      .filter((check) => check.verdict === verdict)
      .map(({ phrase, remedy }): Phrase => [...phrase, " ", ...remedy]);
  const apart = failingSeams(good).map(({ phrase, remedy }): Phrase => [...phrase, " ", ...remedy]);
  const wrong = [...apart, ...found("wrong")];
  if (wrong.length === 0 && line.verdict === "wrong") wrong.push(line.phrase);
  const look = [...(old ? [[old]] : []), ...found("look")];
  return {
    verdict: wrong.length > 0 ? "wrong" : look.length > 0 ? "look" : "good",
    reasons: [...wrong, ...look],
  };
}

/** Who cannot be drafted for first, then what is wrong, then what to look at; in their own order otherwise. */
export function failingFirst(rows: readonly ManyRow[]): ManyRow[] {
  const rank = (row: ManyRow) => (row.drafted ? { wrong: 1, look: 2, good: 3 }[row.verdict] : 0);
  return [...rows].sort((a, b) => rank(a) - rank(b));
}

export function draftedOf(rows: readonly ManyRow[]): DraftedWearer[] {
  return rows.filter((row) => row.drafted);
}
