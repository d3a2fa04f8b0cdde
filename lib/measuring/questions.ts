import { askAbout, type Question } from "@/lib/figures/ask-about";
import { type MeasureKey } from "@/lib/figures/body-measures";
import { parseLength } from "@/lib/lengths/parse-length";
import { type Known, type TakenHere, type Taking } from "@/lib/measuring/taking";
import { entryOf } from "@/lib/measuring/entry";

/** A question with a sign that stays the same while its figures do. */
export interface SignedQuestion extends Question {
  key: MeasureKey;
  sign: string;
}

type Figures = Partial<Record<MeasureKey, Pick<TakenHere, "mm"> & { unit?: TakenHere["unit"] }>>;

/** Two figures out of order are asked about from both sides: the same lengths make the same sign. */
function signOf({ kind, say }: Question, key: MeasureKey): string {
  const lengths = say.flatMap((part) => (typeof part === "string" ? [] : [part.mm.toFixed(2)])).sort();
  if (kind === "order" || kind === "halves") return [kind, ...lengths].join(":");
  return [kind, key, ...(lengths.length > 0 ? lengths : say)].join(":");
}

/** What there is to ask about one figure, among the others of its set. */
export function questionsAbout(figures: Figures, key: MeasureKey, known: Known): SignedQuestion[] {
  const figure = figures[key];
  if (!figure) return [];
  const { previous: before, ageYears, on } = known;
  const previous = before[key];
  const others = Object.fromEntries(
    Object.entries(figures)
      .filter(([other]) => other !== key)
      .map(([other, { mm }]) => [other, mm]),
  );
  const context = { ageYears, previous, others, today: on };
  // Unusual last time too, and then said to be right: the same body is not asked about again.
  const usualForHer =
    previous !== undefined &&
    askAbout(key, previous.mm, { ageYears, others: {}, today: on }).some(({ kind }) => kind === "bounds");
  return askAbout(key, figure.mm, { ...context, unit: figure.unit })
    .filter(({ kind }) => kind !== "bounds" || !usualForHer)
    .map((question) => ({ ...question, key, sign: signOf(question, key) }));
}

/** Questions about the figure at hand that have no answer yet. */
export function openQuestionsAbout(taking: Taking, key: MeasureKey, known: Known): SignedQuestion[] {
  return questionsAbout(taking.taken, key, known).filter(({ sign }) => !taking.settled.includes(sign));
}

/** Every question of a set, each once, in tape order. */
export function allQuestions(figures: Figures, keys: readonly MeasureKey[], known: Known): SignedQuestion[] {
  const bySign = new Map<string, SignedQuestion>();
  for (const question of keys.flatMap((key) => questionsAbout(figures, key, known)))
    if (!bySign.has(question.sign)) bySign.set(question.sign, question);
  return [...bySign.values()];
}

export function allOpenQuestions(taking: Taking, known: Known): SignedQuestion[] {
  return allQuestions(taking.taken, taking.keys, known).filter(({ sign }) => !taking.settled.includes(sign));
}

/** The figure that was perhaps meant, where its unit seems mistaken: the same number in a unit that raises no question. */
export function meantFigure(taking: Taking, key: MeasureKey, known: Known): TakenHere | null {
  const figure = taking.taken[key];
  if (!figure || !questionsAbout(taking.taken, key, known).some(({ kind }) => kind === "unit")) return null;
  const number = entryOf(figure.typed, figure.unit);
  const units = figure.unit === "in" ? (["cm"] as const) : (["in", "mm"] as const);
  for (const word of units) {
    const typed = `${number} ${word}`;
    const read = parseLength(typed, figure.unit);
    if (!read.ok || read.mm === 0) continue;
    const meant: TakenHere = { typed, mm: read.mm, unit: word === "in" ? "in" : "cm" };
    if (questionsAbout({ ...taking.taken, [key]: meant }, key, known).length === 0) return meant;
  }
  return null;
}
