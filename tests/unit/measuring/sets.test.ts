import { describe, expect, it } from "vitest";
import { tapeRuns } from "@/components/measure/tape-paths";
import { bodyMeasures } from "@/lib/figures/body-measures";
import { begunWords } from "@/lib/measuring/begun-words";
import { figureHistory, measuresTaken } from "@/lib/measuring/history";
import { knownOf } from "@/lib/measuring/known";
import { reviewProblems, setFields } from "@/lib/measuring/keep-set";
import { previousFigures } from "@/lib/measuring/previous";
import { announce } from "@/lib/measuring/say";
import { shareText } from "@/lib/measuring/share-text";
import { beginCorrection } from "@/lib/measuring/taking";
import { press } from "@/lib/measuring/press";
import { fresh, ids, nothingKnown, pressAll, setOf, tap } from "./support";

const figure = (key: string, typed: string, mm: number) => ({ key, typed, mm });
const id = (n: number) => `018f0000-0000-7000-8000-00000000010${n}`;

describe("last time's figures", () => {
  const march = setOf({ id: id(1), takenOn: "2026-03-01", figures: [figure("wristGirth", "6", 152.4)] });
  const autumn = setOf({
    id: id(2),
    takenOn: "2025-09-01",
    figures: [figure("wristGirth", "5 3/4", 146.05), figure("armLength", "20", 508), figure("other", "1", 1)],
  });
  const sameDay = setOf({
    id: id(3),
    takenOn: "2026-03-01",
    figures: [figure("wristGirth", "6 1/8", 155.575)],
  });

  it("are the newest of each measure", () => {
    expect(previousFigures([march, autumn])).toEqual({
      wristGirth: { typed: "6", mm: 152.4, takenOn: "2026-03-01" },
      armLength: { typed: "20", mm: 508, takenOn: "2025-09-01" },
    });
  });
  it("are only of sets before the one asked about, of one day only those made earlier", () => {
    expect(previousFigures([march, autumn], march).wristGirth?.typed).toBe("5 3/4");
    expect(previousFigures([sameDay, march], sameDay).wristGirth?.typed).toBe("6");
    expect(previousFigures([sameDay, march], march)).toEqual({});
  });
});

describe("keeping a set", () => {
  const today = "2026-03-14";
  const taken = pressAll(fresh(), [
    ...tap(15, 4),
    { do: "skip" },
    { do: "say", patch: { takenBy: " Efua ", note: " Sleeve for the play\n" } },
  ]);

  it("makes a row of the figures taken, in tape order, without what was skipped", () => {
    expect(setFields(taken)).toEqual({
      wearerId: ids.wearer,
      takenOn: today,
      takenBy: "Efua",
      figures: [{ key: "armscyeGirth", typed: "15 1/2", mm: 393.7 }],
      note: "Sleeve for the play",
      correctsId: null,
    });
    expect(reviewProblems(taken, today, null)).toEqual({});
  });
  it("asks for a figure, and for a day that has been", () => {
    expect(reviewProblems(fresh(), today, null).figures).toContain("No figure is taken yet");
    const on = (takenOn: string) => reviewProblems({ ...taken, takenOn }, today, null).takenOn;
    expect(on("")).toContain("Choose the day");
    expect(on("2026-02-30")).toContain("Choose the day");
    expect(on("2026-03-15")).toContain("still to come");
  });
  it("asks for a change where a set is put right", () => {
    const old = setOf({ id: ids.old, figures: [figure("wristGirth", "6 1/4", 158.75)] });
    const same = beginCorrection(old, { setId: ids.set, unit: "in", now: "2026-03-14T14:20:00.000Z" });
    expect(reviewProblems(same, today, old).figures).toContain("Nothing is changed yet");
    const right = pressAll(same, [{ do: "go", to: "wristGirth" }, ...tap(6, 3)]);
    expect(reviewProblems(right, today, old)).toEqual({});
    expect(setFields(right)).toMatchObject({
      correctsId: ids.old,
      figures: [{ key: "wristGirth", typed: "6 3/8" }],
    });
  });
});

describe("what a screen reader says", () => {
  const say = (before: ReturnType<typeof fresh>, key: Parameters<typeof press>[1], known = nothingKnown) =>
    announce(before, press(before, key, known), known, 8);
  const fourteen = pressAll(fresh(), [
    { do: "digit", digit: 1 },
    { do: "digit", digit: 5 },
  ]);
  it("says what is typed, then what was taken and what comes next", () => {
    expect(say(fresh(), { do: "digit", digit: 6 })).toBe("Six inches.");
    expect(say(fourteen, { do: "part", over: 4, under: 8 })).toBe(
      "Armscye girth fifteen and a half inches. Now upper arm girth, 2 of 7.",
    );
    expect(say(fourteen, { do: "clear" })).toBe("Empty.");
    expect(say(fresh(), { do: "unit", unit: "cm" })).toBe("Counting in centimetres.");
  });
  it("says the question", () => {
    const forty = pressAll(fresh(), [
      { do: "digit", digit: 4 },
      { do: "digit", digit: 0 },
    ]);
    const said = say(forty, { do: "next" }, { ...nothingKnown, ageYears: 30 });
    expect(said).toContain("Armscye girth forty inches.");
    expect(said).toContain("Did you mean 40 cm?");
    expect(said).not.toContain("Now upper arm");
  });
});

describe("a set to send", () => {
  it("is plain lines in the workshop's unit", () => {
    const set = setOf({
      id: id(1),
      takenOn: "2026-03-14",
      figures: [figure("wristGirth", "6 1/4", 158.75), figure("armLength", "54 cm", 540)],
      note: "Left arm",
    });
    expect(shareText(set, "Ama", "in", 8)).toBe(
      "Figures of Ama\nTaken 14 Mar 2026, by Efua\n\nWrist girth: 6 1/4 in\nArm length: 21 1/4 in\n\nLeft arm",
    );
  });
});

describe("what the book says on the day", () => {
  const born = { birthYear: 2020, birthMonth: 1, ageYears: null, ageOn: null };
  const spring = setOf({ id: id(4), takenOn: "2026-03-01", figures: [figure("wristGirth", "6", 152.4)] });
  it("is of today for a new set, and of the old day for one that is put right", () => {
    const ask = { wearer: born, standing: [spring], today: "2027-03-14", bookUnit: "in" as const };
    expect(knownOf(ask)).toMatchObject({
      on: "2027-03-14",
      ageYears: 7,
      previous: { wristGirth: { typed: "6" } },
    });
    expect(knownOf({ ...ask, before: spring })).toMatchObject({
      on: "2026-03-01",
      ageYears: 6,
      previous: {},
    });
  });
  it("has a history of each figure, oldest first, and the measures that were ever taken", () => {
    const autumn = setOf({
      id: id(5),
      takenOn: "2026-09-01",
      figures: [figure("wristGirth", "6 1/8", 155.575)],
    });
    const arm = setOf({ id: id(6), takenOn: "2026-10-01", figures: [figure("armLength", "20", 508)] });
    const standing = [arm, autumn, spring];
    expect(figureHistory(standing, "wristGirth").map(({ on, mm }) => [on, mm])).toEqual([
      ["2026-03-01", 152.4],
      ["2026-09-01", 155.575],
    ]);
    expect(measuresTaken(standing)).toEqual(["wristGirth", "armLength"]);
  });
  it("says when a half-taken set was begun, by the phone's own clock", () => {
    const at = new Date(2026, 2, 14, 14, 5);
    expect(begunWords(at.toISOString(), "2026-03-14")).toBe("14:05");
    expect(begunWords(at.toISOString(), "2026-03-15")).toBe("yesterday, 14:05");
  });
});

describe("the drawings", () => {
  it("has one for each measure, its tape held at both ends of a length and closed behind a girth", () => {
    for (const { key, kind } of bodyMeasures) {
      const { tape, ends, behind } = tapeRuns[key];
      expect(tape).toMatch(/^M[\d.]+ [\d.]+/);
      expect(kind === "length" ? ends?.length : behind !== undefined && ends === undefined).toBe(
        kind === "length" ? 2 : true,
      );
    }
  });
});
