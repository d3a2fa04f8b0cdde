import { formatDay } from "@/lib/people/format-day";
import { type IsoDate } from "@/lib/people/iso-date";
import { todayIso } from "@/lib/people/today";

/** When a taking was begun, where she is: "14:20" today, "yesterday, 14:20", "9 Mar, 14:20". */
export function begunWords(startedAt: string, today: IsoDate): string {
  const at = new Date(startedAt);
  const two = (n: number) => String(n).padStart(2, "0");
  const time = `${two(at.getHours())}:${two(at.getMinutes())}`;
  const day = todayIso(at);
  return day === today ? time : `${formatDay(day, { style: "relative", today })}, ${time}`;
}
