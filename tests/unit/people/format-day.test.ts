import { describe, expect, it } from "vitest";
import { formatDay } from "@/lib/people/format-day";
import { todayIso } from "@/lib/people/today";

describe("a day in words", () => {
  it.each([
    ["2026-12-01", "today"],
    ["2026-12-02", "tomorrow"],
    ["2026-11-30", "yesterday"],
    ["2026-12-04", "Friday"],
    ["2026-12-08", "8 Dec"],
    ["2027-01-08", "8 Jan 2027"],
    ["2026-11-02", "2 Nov"],
  ])("%s on 1 December 2026 is %s", (day, words) => {
    expect(formatDay(day, { style: "relative", today: "2026-12-01" })).toBe(words);
  });

  it("is refused where it is no day", () => {
    expect(() => formatDay("2026-02-30")).toThrow(RangeError);
  });

  it("is the phone's own day, late in the evening too", () => {
    expect(todayIso(new Date(2026, 11, 1, 23, 59))).toBe("2026-12-01");
  });
});
