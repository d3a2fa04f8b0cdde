import {
  sewingSum,
  type SumId,
  type SumInputs,
  type SumProblem,
  type SumWorked,
  workSum,
} from "@/lib/sewing";

export const IN = 25.4;

type Good = SumWorked & { ok: true };

export function worked(id: SumId, inputs: SumInputs, step = 0): Good {
  const made = workSum(sewingSum(id)!, inputs, step);
  if (!made.ok) throw new Error(JSON.stringify(made.problems));
  return made;
}

export function problems(id: SumId, inputs: SumInputs, step = 0): readonly SumProblem[] {
  const made = workSum(sewingSum(id)!, inputs, step);
  if (made.ok) throw new Error(`${id} works with these figures`);
  return made.problems;
}

/** The length of the one result whose label matches. */
export function mm(made: Good, label: RegExp): number {
  const found = made.results.filter((result) => label.test(result.label) && "mm" in result);
  if (found.length !== 1) throw new Error(`${found.length} lengths match ${label}`);
  return (found[0] as { mm: number }).mm;
}

export function count(made: Good, label: RegExp): number {
  const found = made.results.find((result) => label.test(result.label) && "count" in result);
  return (found as { count: number }).count;
}

/** The positions of each row of marks. */
export function markGroups(made: Good): number[][] {
  return made.results.flatMap((result) => ("marks" in result ? [result.marks.map((mark) => mark.mm)] : []));
}
