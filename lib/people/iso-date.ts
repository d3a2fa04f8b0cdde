/** A day as `2026-03-14`. Days are counted without a clock or a time zone. */
export type IsoDate = string;

export interface Day {
  year: number;
  /** 1 to 12. */
  month: number;
  day: number;
}

/** @throws RangeError where the text is not a day of the calendar. */
export function readDay(date: IsoDate): Day {
  const [, y, m, d] = /^(\d{4})-(\d{2})-(\d{2})$/u.exec(date) ?? [];
  const day = { year: Number(y), month: Number(m), day: Number(d) };
  const utc = new Date(Date.UTC(day.year, day.month - 1, day.day));
  if (y === undefined || utc.getUTCMonth() !== day.month - 1 || utc.getUTCDate() !== day.day) {
    throw new RangeError(`not a day: ${date}`);
  }
  return day;
}

/** Whole calendar months from one day to a later one; below 0 where it is earlier (then counted whole, too). */
export function monthsBetween(from: IsoDate, to: IsoDate): number {
  if (to < from) return -monthsBetween(to, from) || 0;
  const a = readDay(from);
  const b = readDay(to);
  return (b.year - a.year) * 12 + b.month - a.month - (b.day < a.day ? 1 : 0);
}

/** Days from one day to another; below 0 where the second is earlier. */
export function daysBetween(from: IsoDate, to: IsoDate): number {
  const utc = ({ year, month, day }: Day) => Date.UTC(year, month - 1, day);
  return Math.round((utc(readDay(to)) - utc(readDay(from))) / 86_400_000);
}
