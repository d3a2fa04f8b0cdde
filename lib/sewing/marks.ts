/** Marks that a hand can set: rounded to a step, and still adding up. */
import { type Phrase } from "@/lib/drafting";

/** Float noise of a length that lies on a step or half-way between two, in steps. */
const noise = 1e-6;

/** A length to the nearest step, half-way up; itself where the step is 0. */
export const toStep = (mm: number, step: number): number =>
  step === 0 ? mm : Math.floor(mm / step + 0.5 + noise) * step;

/** A length up to the next step, so that what is cut is never too short; itself where the step is 0. */
export const upToStep = (mm: number, step: number): number =>
  step === 0 ? mm : Math.ceil(mm / step - noise) * step;

/** A length down to the step before; itself where the step is 0. */
export const downToStep = (mm: number, step: number): number =>
  step === 0 ? mm : Math.floor(mm / step + noise) * step;

/**
 * `count` marks at equal distances, the first at `first` and the last at `last`, each counted from the same start and
 * rounded by itself: so no rounding piles up, and the last one lands. Gaps are then up to one step unlike.
 */
export function evenMarks(first: number, last: number, count: number, step: number): number[] {
  const gap = count > 1 ? (last - first) / (count - 1) : 0;
  return Array.from({ length: count }, (_, i) => toStep(i === count - 1 ? last : first + i * gap, step));
}

/** The different gaps between marks in their order, each with how often it comes; gaps alike to 1 µm are one. */
export function gapsOf(marks: readonly number[]): { mm: number; times: number }[] {
  const gaps: { mm: number; times: number }[] = [];
  for (let i = 1; i < marks.length; i++) {
    const mm = marks[i]! - marks[i - 1]!;
    const known = gaps.find((gap) => Math.abs(gap.mm - mm) < 1e-3);
    if (known) known.times += 1;
    else gaps.push({ mm, times: 1 });
  }
  return gaps.sort((a, b) => b.times - a.times);
}

/** "5 gaps of 2 1/8 in and 2 of 2 1/4 in: so the last one lands." Empty where all are alike. */
export function driftWords(marks: readonly number[]): Phrase {
  const gaps = gapsOf(marks);
  if (gaps.length < 2) return [];
  return [
    `An equal gap falls between two marks of the tape, so `,
    ...gaps.flatMap(({ mm, times }, i): Phrase => [
      `${i === 0 ? "" : i === gaps.length - 1 ? " and " : ", "}${times} ${times === 1 ? "gap is" : "gaps are"} `,
      { mm },
    ]),
    `. Measured from the start each time, the last mark lands; no mark is off by more than half a step, and no gap by more than one.`,
  ];
}
