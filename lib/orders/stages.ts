import { type Stage } from "@/lib/records/types";

/** Every stage, in the order of the work. */
export const stages = [
  "agreed",
  "cut",
  "sewing",
  "fitting",
  "ready",
  "handed-over",
] as const satisfies readonly Stage[];

/** The stage after one, or null after the last. */
export function nextStage(stage: Stage): Stage | null {
  return stages[stages.indexOf(stage) + 1] ?? null;
}

const moves: Record<Stage, string> = {
  agreed: "Back to agreed",
  cut: "The cloth is cut",
  sewing: "Begin sewing",
  fitting: "Ready to be fitted",
  ready: "Ready to hand over",
  "handed-over": "Hand over",
};

/** What the key says that moves an order on to a stage. */
export const moveWords = (to: Stage): string => moves[to];

/** The one thing most likely to be done next with an order: move it on, or see to the money. */
export type NextAct = { do: "move"; to: Stage } | { do: "take" } | { do: "give-back" } | null;

/** Before the last stage the money comes first: once the garment is out of the house it is harder to ask for. */
export function nextAct(stage: Stage, balanceMinor: number): NextAct {
  if ((stage === "ready" || stage === "handed-over") && balanceMinor > 0) return { do: "take" };
  const to = nextStage(stage);
  if (to) return { do: "move", to };
  return balanceMinor < 0 ? { do: "give-back" } : null;
}
