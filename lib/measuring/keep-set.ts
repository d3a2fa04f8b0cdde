import { readDay, type IsoDate } from "@/lib/people/iso-date";
import { type MeasurementSet, type MeasurementSetFields } from "@/lib/records/types";
import { type Taking } from "@/lib/measuring/taking";

/** The row that a taking makes. */
export function setFields(taking: Taking): MeasurementSetFields {
  return {
    wearerId: taking.wearerId,
    takenOn: taking.takenOn,
    takenBy: taking.takenBy.trim(),
    figures: taking.keys.flatMap((key) => {
      const figure = taking.taken[key];
      return figure ? [{ key, typed: figure.typed, mm: figure.mm }] : [];
    }),
    note: taking.note.trim(),
    correctsId: taking.correctsId,
  };
}

export interface ReviewProblems {
  figures?: string;
  takenOn?: string;
}

function isDay(text: string): boolean {
  try {
    readDay(text);
    return true;
  } catch {
    return false;
  }
}

const says = ({ takenOn, takenBy, note, figures }: Omit<MeasurementSetFields, "wearerId" | "correctsId">) =>
  JSON.stringify([
    takenOn,
    takenBy,
    note,
    // Figures by name: a set from elsewhere may have them in another order.
    figures
      .map(({ key, typed, mm }) => [key, typed, mm])
      .sort(([a], [b]) => (String(a) < String(b) ? -1 : 1)),
  ]);

/** What keeps a set from being kept, each with what to do instead. `old` is the set that is being put right. */
export function reviewProblems(taking: Taking, today: IsoDate, old: MeasurementSet | null): ReviewProblems {
  const fields = setFields(taking);
  const problems: ReviewProblems = {};
  if (fields.figures.length === 0) problems.figures = "No figure is taken yet. Tap one, and take it first.";
  else if (old && says(fields) === says(old))
    problems.figures = "Nothing is changed yet. Tap the figure that is wrong, and take it again.";
  if (!isDay(taking.takenOn)) problems.takenOn = "Choose the day on which the tape was taken.";
  else if (taking.takenOn > today)
    problems.takenOn = "That day is still to come. Choose today or an earlier one.";
  return problems;
}
