import { type TodayView } from "@/lib/store/queries/today";

export interface FirstStep {
  say: string;
  why: string;
  href: string;
  /** "next" is the one to do now. */
  state: "done" | "next" | "later";
}

/** How a new book is begun: a client, her figures, a sleeve, an order; each leads to where it is done. */
export function firstSteps({
  anyOrder,
  newest: { client, set, sleeve },
}: Pick<TodayView, "anyOrder" | "newest">): FirstStep[] {
  const steps = [
    {
      done: client !== null,
      say: "Add a client",
      why: "Who orders, and everyone you sew for.",
      href: "/clients/new",
    },
    {
      done: set !== null,
      say: "Measure",
      why: "One figure at a time, with the keys at your thumb.",
      href: client ? `/measure?client=${client.id}` : "/measure",
    },
    {
      done: sleeve !== null,
      say: "Draft a sleeve",
      why: "It says before cutting whether it goes into the armhole.",
      href: set ? `/sleeves/draft?wearer=${set.wearerId}` : "/sleeves/draft",
    },
    {
      done: anyOrder,
      say: "Take an order",
      why: "Garments, price, deposit and the day it is due.",
      href: client ? `/orders/new?client=${client.id}` : "/orders/new",
    },
  ];
  const next = steps.findIndex(({ done }) => !done);
  return steps.map(({ done, ...step }, i) => ({
    ...step,
    state: done ? "done" : i === next ? "next" : "later",
  }));
}
