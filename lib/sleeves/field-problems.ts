/** What stands beside each field: what cannot be read, what is missing, and what the engine says is in the way. */
import { type FigureName, type Side } from "@/lib/drafting";
import { type Phrase } from "@/lib/lengths/phrase";
import { type MarkProblem } from "@/lib/sleeves/guide-marks";
import { type FigureKey, fieldsFor, sleeveFigure } from "@/lib/sleeves/sleeve-figures";
import { type StyledSleeve } from "@/lib/sleeves/make-style-from-record";
import { styleFigures } from "@/lib/sleeves/styles";
import { figuresInUse, type ReadForm, type SleeveForm } from "@/lib/sleeves/sleeve-form";

export interface FieldProblems {
  errors: Partial<Record<FigureKey, string>>;
  problems: Partial<Record<FigureKey, Phrase>>;
  /** The engine's words for a guide mark, by side and index. */
  marks: Record<Side, Map<number, Phrase>>;
  markErrors: MarkProblem[];
  /** Beside the style's figures, by key: what cannot be read, and what the engine says. */
  styleErrors: Record<string, string>;
  styleProblems: Record<string, Phrase>;
  /** What belongs to no field on the form. */
  general: Phrase[];
}

/** @param pressed whether Keep was pressed: only then are empty fields asked for. */
export function fieldProblems(
  form: SleeveForm,
  made: StyledSleeve | null,
  read: ReadForm,
  pressed: boolean,
): FieldProblems {
  const inUse = new Set(figuresInUse(form));
  const errors = { ...read.errors };
  if (pressed) {
    for (const key of read.missing)
      errors[key] ??= `Type ${sleeveFigure(key).said}: without it there is nothing to draw.`;
  }
  const found: FieldProblems = {
    errors,
    problems: {},
    marks: { front: new Map(), back: new Map() },
    markErrors: read.markErrors,
    styleErrors: read.styleErrors,
    styleProblems: {},
    general: [],
  };
  const ofStyle = new Set(styleFigures(form.style).map(({ key }) => key));
  const say = (figure: string, phrase: Phrase): void => {
    if (ofStyle.has(figure)) {
      if (!read.styleErrors[figure]) found.styleProblems[figure] ??= phrase;
      return;
    }
    const field = fieldsFor(figure as FigureName).find((key) => inUse.has(key));
    if (!field) found.general.push(phrase);
    else if (!errors[field]) found.problems[field] ??= phrase;
  };
  if (made && !made.ok) {
    for (const problem of made.problems) {
      const whole: Phrase = [...problem.phrase, " ", ...problem.remedy];
      const mark = "mark" in problem ? problem.mark : undefined;
      if (mark) found.marks[mark.side].set(mark.index, whole);
      else say(problem.figure, whole);
    }
  }
  if (made?.ok) {
    for (const { figure, phrase, remedy, verdict } of made.checks) {
      if (verdict === "wrong") say(figure, [...phrase, " ", ...remedy]);
    }
  }
  return found;
}
