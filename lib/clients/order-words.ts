import { type Stage } from "@/lib/records/types";

const stages: Record<Stage, string> = {
  agreed: "Agreed",
  cut: "Cut",
  sewing: "Sewing",
  fitting: "Fitting",
  ready: "Ready",
  "handed-over": "Handed over",
};

export const stageWords = (stage: Stage): string => stages[stage];

/** What the sum beside an order is: what is to come in, what is to go back, or that nothing is. */
export function balanceWords({
  totalMinor,
  balanceMinor,
}: {
  totalMinor: number;
  balanceMinor: number;
}): string {
  if (balanceMinor > 0) return "to come";
  if (balanceMinor < 0) return "to give back";
  return totalMinor === 0 ? "No price yet" : "Paid";
}
