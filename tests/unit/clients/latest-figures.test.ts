import { describe, expect, it } from "vitest";
import { latestFigures } from "@/lib/clients/latest-figures";

const taken = (takenOn: string, figures: Record<string, number>) => ({
  takenOn,
  figures: Object.entries(figures).map(([key, mm]) => ({ key, mm, typed: "" })),
});
const today = "2026-03-14";
const short = taken("2026-03-01", { upperArmGirth: 210, notAMeasure: 5 });
const full = taken("2025-09-01", { bustGirth: 640, upperArmGirth: 200, armscyeGirth: 300 });

describe("the latest figures", () => {
  it("takes each measure from its last set, in the order of the full set, and no other keys", () =>
    expect(
      latestFigures([short, full], 30, today).figures.map(({ key, mm, takenOn }) => [key, mm, takenOn]),
    ).toEqual([
      ["armscyeGirth", 300, "2025-09-01"],
      ["upperArmGirth", 210, "2026-03-01"],
      ["bustGirth", 640, "2025-09-01"],
    ]));
  // How long figures are good for: common practice, no source (lib/figures/staleness).
  it("marks what is too old at the age, and says what to do about the oldest", () => {
    const child = latestFigures([short, full], 6, today);
    expect(child.figures.map(({ stale }) => stale)).toEqual([true, false, true]);
    expect(child.staleSay).toBe(
      "Some of these figures are 6 months old, and a child of 6 grows. Measure again before cutting.",
    );
    expect(latestFigures([full], 6, today).staleSay).toMatch(/^These figures are 6 months old/);
    expect(latestFigures([short, full], 30, today).staleSay).toBeNull();
  });
  it("has nothing to show of no sets", () =>
    expect(latestFigures([], 6, today)).toEqual({ figures: [], staleSay: null }));
});
