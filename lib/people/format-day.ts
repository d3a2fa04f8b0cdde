import { daysBetween, type IsoDate, readDay } from "./iso-date";

export interface DayStyle {
  /**
   * "short": 14 Mar 2026; "long": Saturday 14 March 2026; "weekday": Saturday 14 March; "relative": today, tomorrow,
   * Friday, 14 Mar.
   */
  style?: "short" | "long" | "weekday" | "relative";
  /** Needed for "relative". */
  today?: IsoDate;
  locale?: string;
}

/** A day in words. The same in every time zone. @throws RangeError where the text is not a day. */
export function formatDay(day: IsoDate, { style = "short", today, locale = "en-GB" }: DayStyle = {}): string {
  const { year, month, day: date } = readDay(day);
  const at = new Date(Date.UTC(year, month - 1, date));
  const words = (options: Intl.DateTimeFormatOptions) =>
    new Intl.DateTimeFormat(locale, { timeZone: "UTC", ...options }).format(at);
  if (style === "long") return words({ weekday: "long", day: "numeric", month: "long", year: "numeric" });
  if (style === "weekday") return words({ weekday: "long", day: "numeric", month: "long" });
  if (style === "relative" && today !== undefined) {
    const days = daysBetween(today, day);
    if (days === 0) return "today";
    if (days === 1) return "tomorrow";
    if (days === -1) return "yesterday";
    if (days > 1 && days < 7) return words({ weekday: "long" });
    if (readDay(today).year === year) return words({ day: "numeric", month: "short" });
  }
  return words({ day: "numeric", month: "short", year: "numeric" });
}
