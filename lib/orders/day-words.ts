import { formatDay } from "@/lib/people/format-day";
import { daysBetween, type IsoDate } from "@/lib/people/iso-date";
import { type Order } from "@/lib/records/types";

export interface DayWords {
  say: string;
  late: boolean;
}

/** When an order is due: "2 days late", "due Friday", "due 14 Mar", "No day yet"; null once it is handed over. */
export function dueWords({ dueOn, stage }: Pick<Order, "dueOn" | "stage">, today: IsoDate): DayWords | null {
  if (stage === "handed-over") return null;
  if (dueOn === null) return { say: "No day yet", late: false };
  const days = daysBetween(dueOn, today);
  if (days > 0) return { say: `${days} ${days === 1 ? "day" : "days"} late`, late: true };
  return { say: `due ${formatDay(dueOn, { style: "relative", today })}`, late: false };
}

/** How far off a day is: "4 days ago", "today", "in 19 days". */
export function countdownWords(day: IsoDate, today: IsoDate): string {
  const days = daysBetween(today, day);
  if (days < -1) return `${-days} days ago`;
  return days > 1 ? `in ${days} days` : formatDay(day, { style: "relative", today });
}

/** When a fitting is: "tomorrow", "Friday"; one that is past stands out: "3 days ago". */
export function fittingWords(fittingOn: IsoDate, today: IsoDate): DayWords {
  const days = daysBetween(fittingOn, today);
  if (days > 1) return { say: `${days} days ago`, late: true };
  return { say: formatDay(fittingOn, { style: "relative", today }), late: days > 0 };
}
