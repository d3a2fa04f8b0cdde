import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type AskContext, askAbout } from "@/lib/figures/ask-about";
import { fullSet, type MeasureKey } from "@/lib/figures/body-measures";
import { compareSets } from "@/lib/figures/compare-sets";
import { staleness } from "@/lib/figures/staleness";
import { phraseText } from "@/lib/lengths/phrase";

const today = "2026-03-14";
const ask = (figure: MeasureKey, mm: number, context: Partial<AskContext> = {}) =>
  askAbout(figure, mm, { others: {}, today, ...context }).map((q) => ({
    kind: q.kind,
    text: phraseText(q.say, "cm"),
    mark: q.mark,
    source: q.source,
  }));
const kinds = (...args: Parameters<typeof ask>) => ask(...args).map((q) => q.kind);

describe("askAbout: bounds of the age", () => {
  // NHANES 2015-16 at 6 years: P5 16.3, P95 26.3 cm (calc); less and plus 15 %: 13.9 and 30.2 cm.
  it("asks nothing inside them", () => {
    for (const mm of [139, 185, 302]) expect(ask("upperArmGirth", mm, { ageYears: 6 })).toEqual([]);
  });
  it("asks outside them, with the figure, the bounds, the source, and what to do", () => {
    const [q] = ask("upperArmGirth", 310, { ageYears: 6 });
    expect(q).toEqual({
      kind: "bounds",
      text: "The upper arm girth at 6 years is usually 13.9 cm to 30.2 cm. This is 31 cm. Measure it once more, and keep it if the tape says the same.",
      mark: "calc",
      source: "NHANES 2015-16, girls and women, mid-upper arm",
    });
    expect(kinds("upperArmGirth", 130, { ageYears: 6 })).toEqual(["bounds"]);
    expect(ask("upperArmGirth", 130, { ageYears: 2 })).toEqual([]);
  });
});

describe("askAbout: a unit mistaken", () => {
  it("inches for centimetres", () => {
    expect(ask("upperArmGirth", 15.9 * 25.4, { ageYears: 6 })).toEqual([
      {
        kind: "unit",
        text: "15.9 in is 40.4 cm. Did you mean 15.9 cm?",
        mark: "exact",
        source: "1 in = 25.4 mm",
      },
    ]);
  });
  it("centimetres for inches, and centimetres for millimetres", () => {
    expect(ask("upperArmGirth", 62.5, { ageYears: 6 })[0]!.text).toBe(
      "6.25 cm is 2 1/2 in. Did you mean 6.25 in?",
    );
    expect(ask("upperArmGirth", 1590, { ageYears: 6 })[0]!.text).toBe(
      "159 cm is too long for upper arm girth. Did you mean 159 mm?",
    );
  });
  it("keeps to the unit that was typed, where that is known", () => {
    expect(kinds("upperArmGirth", 62.5, { ageYears: 6, unit: "in" })).toEqual(["bounds"]);
    expect(kinds("upperArmGirth", 62.5, { ageYears: 6, unit: "cm" })).toEqual(["unit"]);
  });
  it("is found by last time's figure where no table reaches", () => {
    const previous = { mm: 360, takenOn: "2026-01-10" };
    expect(ask("backWidth", 36.2 * 25.4, { previous })[0]!.text).toBe(
      "36.2 in is 91.9 cm. Did you mean 36.2 cm?",
    );
    expect(kinds("backWidth", 142, { previous })).toEqual(["unit"]);
  });
});

describe("askAbout: the order of the girths", () => {
  // wrist < hand < upper arm < armscye (sources: bodies, use).
  const others = { wristGirth: 150, handGirth: 185, armscyeGirth: 370 };
  it("asks where it is broken, against each that breaks it", () => {
    expect(ask("upperArmGirth", 260, { others, ageYears: 30 })).toEqual([]);
    expect(ask("handGirth", 145, { others: { wristGirth: 150 } })[0]!.text).toBe(
      "The hand girth, 14.5 cm, is usually more than the wrist girth, 15 cm. Look at both.",
    );
    expect(kinds("upperArmGirth", 371, { others })).toEqual(["order"]);
    expect(kinds("wristGirth", 186, { others: { handGirth: 185, upperArmGirth: 184 } })).toEqual([
      "order",
      "order",
    ]);
    expect(kinds("handGirth", 150, { others })).toEqual(["order"]);
  });
  it("is silent about the measures that are in no order", () =>
    expect(ask("armLength", 300, { others })).toEqual([]));
  it("asks about one of a pair if and only if it asks about the other", () => {
    const chain = ["wristGirth", "handGirth", "upperArmGirth", "armscyeGirth"] as const;
    fc.assert(
      fc.property(
        fc.constantFrom(...chain),
        fc.constantFrom(...chain),
        fc.integer({ min: 130, max: 260 }),
        fc.integer({ min: 130, max: 260 }),
        (a, b, x, y) => {
          fc.pre(a !== b);
          const right = chain.indexOf(a) < chain.indexOf(b) ? x < y : x > y;
          expect(kinds(a, x, { others: { [b]: y } }).includes("order")).toBe(!right);
          expect(kinds(b, y, { others: { [a]: x } }).includes("order")).toBe(!right);
        },
      ),
    );
  });
});

describe("askAbout: the halves of the armscye (common practice, no source)", () => {
  it("asks where they miss the whole by more than half an inch", () => {
    const others = { armscyeFront: 180, armscyeBack: 190 };
    expect(ask("armscyeGirth", 382, { others })).toEqual([]);
    expect(kinds("armscyeGirth", 384, { others })).toEqual(["halves"]);
    expect(kinds("armscyeBack", 160, { others: { armscyeGirth: 370, armscyeFront: 180 } })).toEqual([
      "halves",
    ]);
  });
});

describe("askAbout: change since last time (common practice, no source)", () => {
  const previous = { mm: 400, takenOn: "2025-12-14" };
  it("a child's length does not shrink", () => {
    expect(ask("armLength", 380, { ageYears: 8, previous })[0]!.text).toBe(
      "Last time, 14 Dec 2025, the arm length was 40 cm; now it is 38 cm. A child's arm and back do not get shorter: measure it once more.",
    );
    expect(ask("armLength", 392, { ageYears: 8, previous })).toEqual([]);
    expect(ask("armLength", 415, { ageYears: 8, previous })).toEqual([]);
    expect(kinds("armLength", 450, { ageYears: 8, previous })).toEqual(["change"]);
  });
  it("a year allows more than a week", () => {
    const girth = { mm: 200, takenOn: "2026-03-07" };
    expect(kinds("upperArmGirth", 225, { ageYears: 8, previous: girth })).toEqual(["change"]);
    expect(
      kinds("upperArmGirth", 225, { ageYears: 8, previous: { ...girth, takenOn: "2025-03-07" } }),
    ).toEqual([]);
  });
  it("an adult's arm keeps its length", () => {
    const long = { mm: 560, takenOn: "2020-01-01" };
    expect(kinds("armLength", 600, { ageYears: 40, previous: long })).toEqual(["change"]);
    expect(ask("armLength", 570, { ageYears: 40, previous: long })).toEqual([]);
  });
  it("a set from a day to come, as a phone with a wrong clock writes it, is taken as today's", () => {
    expect(ask("armLength", 400, { ageYears: 8, previous: { mm: 400, takenOn: "2027-01-01" } })).toEqual([]);
  });
});

it("askAbout never throws on a number, and every question has a source and a mark", () => {
  fc.assert(
    fc.property(
      fc.constantFrom(...fullSet.measures),
      fc.double({ min: -100, max: 6000, noNaN: true }),
      fc.option(fc.integer({ min: 0, max: 110 }), { nil: undefined }),
      fc.option(fc.double({ min: 10, max: 3000, noNaN: true }), { nil: undefined }),
      (figure, mm, ageYears, before) => {
        const previous = before === undefined ? undefined : { mm: before, takenOn: "2025-11-01" };
        const questions = askAbout(figure, mm, {
          today,
          others: { wristGirth: 150, armscyeGirth: 350 },
          ...(ageYears !== undefined && { ageYears }),
          ...(previous && { previous }),
        });
        for (const q of questions) {
          expect(q.source).not.toBe("");
          expect(phraseText(q.say, "in")).toMatch(/[.?]$/);
        }
        if (mm <= 0) expect(questions.length).toBeGreaterThan(0);
      },
    ),
  );
});

describe("staleness (months by age: common practice, no source)", () => {
  it.each([
    ["2026-02-14", 4, false],
    ["2025-12-14", 4, true],
    ["2025-12-15", 4, false],
    ["2025-12-14", 9, false],
    ["2025-11-14", 9, true],
    ["2025-10-01", 15, false],
    ["2025-09-14", 15, true],
    ["2025-04-01", 40, false],
    ["2025-03-14", 40, true],
    ["2025-09-14", undefined, true],
    ["2026-06-01", 4, false],
  ])("taken %s at age %s: stale %s", (takenOn, age, stale) => {
    const answer = staleness(takenOn, age, today);
    expect(answer.stale).toBe(stale);
    expect(answer.say !== undefined).toBe(stale);
  });
  it("says how old they are and what to do", () => {
    expect(staleness("2025-09-10", 6, today).say).toBe(
      "These figures are 6 months old, and a child of 6 grows. Measure again before cutting.",
    );
  });
  it("once stale, stays stale", () => {
    fc.assert(
      fc.property(fc.nat(90), fc.nat(900), fc.nat(900), (age, first, more) => {
        const day = (n: number) => new Date(Date.UTC(2024, 0, 1 + n)).toISOString().slice(0, 10);
        if (staleness(day(0), age, day(first)).stale)
          expect(staleness(day(0), age, day(first + more)).stale).toBe(true);
      }),
    );
  });
});

describe("compareSets", () => {
  const older = {
    takenOn: "2025-03-14",
    figures: [
      { key: "wristGirth", mm: 120 },
      { key: "armLength", mm: 380 },
      { key: "unknown", mm: 1 },
    ],
  };
  const newer = {
    takenOn: today,
    figures: [
      { key: "armLength", mm: 395 },
      { key: "bustGirth", mm: 600 },
    ],
  };
  it("puts the earlier first, in the order of the full set", () => {
    const expected = {
      days: 365,
      rows: [
        { key: "wristGirth", beforeMm: 120 },
        { key: "armLength", beforeMm: 380, afterMm: 395, changeMm: 15 },
        { key: "bustGirth", afterMm: 600 },
      ],
    };
    expect(compareSets(older, newer)).toEqual(expected);
    expect(compareSets(newer, older)).toEqual(expected);
  });
});
