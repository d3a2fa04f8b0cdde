import { type IsoDate } from "./iso-date";

/** Today's day where the phone is. */
export function todayIso(now: Date = new Date()): IsoDate {
  const two = (n: number) => String(n).padStart(2, "0");
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
