import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fullSet, sleeveSet } from "@/lib/figures/body-measures";
import { phraseText } from "@/lib/lengths/phrase";
import { parseLength } from "@/lib/lengths/parse-length";
import { shownEntry } from "@/lib/measuring/entry";
import { type Press, press } from "@/lib/measuring/press";
import { allOpenQuestions } from "@/lib/measuring/questions";
import { readTaking } from "@/lib/measuring/read-taking";
import { beginCorrection, holdsSomething, type Known, takenCount, type Taking } from "@/lib/measuring/taking";
import { fresh, ids, nothingKnown, pressAll, setOf, tap } from "./support";

// A grown arm, invented, inside every table's bounds (ANSUR, NHANES; see sources), in eighths of an inch.
const grownArm: [number, number][] = [
  [15, 4],
  [12, 0],
  [9, 4],
  [6, 2],
  [7, 3],
  [12, 6],
  [21, 4],
];

describe("a sleeve set", () => {
  it("moves on by itself: digits, one key of eighths, next figure; then the review", () => {
    let taking = fresh();
    expect(taking.at).toBe("armscyeGirth");
    let taps = 0;
    for (const [whole, eighths] of grownArm) {
      const presses = tap(whole, eighths);
      taps += presses.length;
      taking = pressAll(taking, presses);
    }
    expect(taking.at).toBe("review");
    expect(takenCount(taking)).toBe(7);
    expect(taking.taken.wristGirth).toEqual({ typed: "6 1/4", mm: 158.75, unit: "in" });
    expect(taking.taken.upperArmGirth?.typed).toBe("12");
    expect(taking.taken.upperArmGirth?.mm).toBeCloseTo(304.8, 9);
    // Two digits at the most and one key: never more than three taps a figure.
    expect(taps).toBeLessThanOrEqual(3 * 7);
  });

  it("counts in centimetres with a key of tenths", () => {
    const taking = pressAll(fresh({ unit: "cm" }), tap(39, 4, 10), { ...nothingKnown, bookUnit: "cm" });
    expect(taking.taken.armscyeGirth).toEqual({ typed: "39.4", mm: 394, unit: "cm" });
    expect(taking.at).toBe("upperArmGirth");
  });

  it("asks for the whole number before the part", () => {
    const taking = press(fresh(), { do: "part", over: 1, under: 8 }, nothingKnown);
    expect(taking.problem).toBe("First the whole inches, then the part of an inch.");
    expect(taking.at).toBe("armscyeGirth");
  });

  it("moves on with Next, and says what to do where nothing is typed", () => {
    const typed = pressAll(fresh(), [{ do: "type", text: "15 1/2" }, { do: "next" }]);
    expect(typed.taken.armscyeGirth?.mm).toBeCloseTo(393.7, 9);
    expect(typed.at).toBe("upperArmGirth");
    expect(press(fresh(), { do: "next" }, nothingKnown).problem).toBe(
      "Type the figure first, or press Skip.",
    );
  });

  it("keeps to a figure that cannot be read, with the text and a sentence", () => {
    const taking = pressAll(fresh(), [{ do: "type", text: "15 5/4" }, { do: "next" }]);
    expect(taking).toMatchObject({ at: "armscyeGirth", entry: "15 5/4" });
    expect(taking.problem).toContain("type 16 1/4");
    for (const away of [{ do: "back" }, { do: "skip" }, { do: "go", to: "review" }] as Press[])
      expect(press(taking, away, nothingKnown)).toMatchObject({ at: "armscyeGirth", entry: "15 5/4" });
  });

  it("takes what is being typed before it goes to another figure", () => {
    const taking = pressAll(fresh(), [
      { do: "digit", digit: 1 },
      { do: "digit", digit: 5 },
      { do: "go", to: "handGirth" },
    ]);
    expect(taking.at).toBe("handGirth");
    expect(taking.taken.armscyeGirth?.typed).toBe("15");
  });

  it("goes round to what was left out, not to what was skipped, then to the review", () => {
    let taking = pressAll(fresh(), [{ do: "go", to: "armLength" }, ...tap(21, 4)]);
    expect(taking.at).toBe("armscyeGirth");
    taking = pressAll(taking, [{ do: "skip" }, ...tap(12, 0), ...tap(9, 4), ...tap(6, 2), ...tap(7, 3)]);
    expect(taking.at).toBe("upperArmLength");
    taking = pressAll(taking, tap(12, 6));
    expect(taking.at).toBe("review");
    expect(taking.skipped).toEqual(["armscyeGirth"]);
  });

  it("puts a figure right from the review and comes back to it", () => {
    const all = grownArm.reduce((state, [whole, over]) => pressAll(state, tap(whole, over)), fresh());
    const taking = pressAll(all, [{ do: "go", to: "wristGirth" }, ...tap(6, 3)]);
    expect(taking.at).toBe("review");
    expect(taking.taken.wristGirth?.typed).toBe("6 3/8");
  });

  it("erases a taken figure's part first, and clears in two steps", () => {
    const at = pressAll(fresh(), [...tap(15, 4), { do: "back" }]);
    expect(at).toMatchObject({ at: "armscyeGirth", entry: "" });
    expect(press(at, { do: "erase" }, nothingKnown).entry).toBe("15");
    expect(press(at, { do: "clear" }, nothingKnown).taken).toEqual({});
    const typing = pressAll(at, [{ do: "digit", digit: 1 }, { do: "clear" }]);
    expect(typing).toMatchObject({ entry: "", taken: { armscyeGirth: { typed: "15 1/2" } } });
  });
});

describe("last time's figure", () => {
  const known: Known = {
    ...nothingKnown,
    previous: { armscyeGirth: { typed: "39.4", mm: 394, takenOn: "2025-09-01" } },
  };
  it("is taken by one key, with its unit where the book has changed", () => {
    const taking = press(fresh(), { do: "same" }, known);
    expect(taking.taken.armscyeGirth).toEqual({ typed: "39.4 cm", mm: 394, unit: "cm" });
    expect(taking.at).toBe("upperArmGirth");
  });
  it("is not there where none is known", () => {
    const before = fresh();
    expect(press(before, { do: "same" }, nothingKnown)).toBe(before);
  });
});

describe("questions", () => {
  const grown: Known = { ...nothingKnown, ageYears: 30 };

  it("hold the figure until they are answered, and never block it", () => {
    // ANSUR 1989 scye girth, women 371.3 (23.0), men 445.5 (27.1) mm (seen): 40 in is far outside.
    const asked = pressAll(fresh(), tap(40, 0), grown);
    expect(asked).toMatchObject({ at: "armscyeGirth", held: true });
    expect(asked.taken.armscyeGirth?.typed).toBe("40");
    expect(allOpenQuestions(asked, grown)).toHaveLength(1);

    const right = press(asked, { do: "right" }, grown);
    expect(right).toMatchObject({ at: "upperArmGirth", held: false });
    expect(allOpenQuestions(right, grown)).toEqual([]);

    const again = press(asked, { do: "again" }, grown);
    expect(again).toMatchObject({ at: "armscyeGirth", held: false, entry: "", taken: {} });

    const later = press(asked, { do: "go", to: "review" }, grown);
    expect(allOpenQuestions(later, grown).map(({ key }) => key)).toEqual(["armscyeGirth"]);
    const [open] = allOpenQuestions(later, grown);
    expect(allOpenQuestions(press(later, { do: "settle", sign: open!.sign }, grown), grown)).toEqual([]);
  });

  it("are asked anew when the figure changes", () => {
    const right = pressAll(fresh(), [...tap(40, 0), { do: "right" }], grown);
    const other = pressAll(right, [{ do: "go", to: "armscyeGirth" }, ...tap(41, 0)], grown);
    expect(other.held).toBe(true);
  });

  it("offer the unit that was meant, in one tap", () => {
    // 39 typed as inches by someone reading centimetres: 39 cm is within ANSUR 1989 scye girth (seen).
    const asked = pressAll(fresh(), tap(39, 0), grown);
    expect(allOpenQuestions(asked, grown)[0]).toMatchObject({ kind: "unit" });
    const meant = press(asked, { do: "meant" }, grown);
    expect(meant.taken.armscyeGirth).toEqual({ typed: "39 cm", mm: 390, unit: "cm" });
    expect(meant.at).toBe("upperArmGirth");
  });

  it("about two figures out of order are one question, from whichever side", () => {
    // Wrist over hand: the order of the US Army surveys (seen).
    const taking = pressAll(fresh(), [
      { do: "go", to: "wristGirth" },
      ...tap(7, 4),
      { do: "go", to: "handGirth" },
      ...tap(7, 0),
    ]);
    expect(taking).toMatchObject({ at: "handGirth", held: true });
    expect(allOpenQuestions(taking, nothingKnown)).toHaveLength(1);
    expect(allOpenQuestions(press(taking, { do: "right" }, nothingKnown), nothingKnown)).toEqual([]);
  });

  it("name last time's day in words", () => {
    const known: Known = {
      ...grown,
      previous: { wristGirth: { typed: "5", mm: 127, takenOn: "2026-03-01" } },
    };
    const asked = pressAll(fresh(), [{ do: "go", to: "wristGirth" }, ...tap(6, 4)], known);
    expect(phraseText(allOpenQuestions(asked, known)[0]!.say, "in")).toContain(
      "Last time, 1 Mar 2026, the wrist girth",
    );
  });

  it("do not ask again about what is usual for her", () => {
    const known: Known = {
      ...grown,
      previous: { upperArmGirth: { typed: "20", mm: 508, takenOn: "2025-09-01" } },
    };
    const at = press(fresh(), { do: "go", to: "upperArmGirth" }, known);
    expect(pressAll(at, tap(20, 0), known).held).toBe(false);
    expect(pressAll(at, tap(20, 0), grown).held).toBe(true);
  });
});

describe("putting a set right", () => {
  const old = setOf({
    id: ids.old,
    figures: [
      { key: "wristGirth", typed: "6 1/4", mm: 158.75 },
      { key: "armLength", typed: "21", mm: 533.4 },
    ],
    note: "Left arm",
  });
  it("begins at the review with the old set's figures, day and note", () => {
    const taking = beginCorrection(old, { setId: ids.set, unit: "in", now: "2026-03-14T14:20:00.000Z" });
    expect(taking).toMatchObject({
      at: "review",
      correctsId: ids.old,
      takenOn: "2025-09-01",
      note: "Left arm",
      keys: ["wristGirth", "armLength"],
    });
    const added = pressAll(taking, [{ do: "add", key: "handGirth" }, ...tap(7, 3)]);
    expect(added).toMatchObject({ at: "review", keys: ["wristGirth", "handGirth", "armLength"] });
    expect(old.figures).toHaveLength(2);
  });
});

describe("whatever is pressed", () => {
  const measure = fc.constantFrom(...fullSet.measures);
  const anyPress: fc.Arbitrary<Press> = fc.oneof(
    {
      weight: 6,
      arbitrary: fc.record({ do: fc.constant("digit" as const), digit: fc.integer({ min: 0, max: 9 }) }),
    },
    {
      weight: 3,
      arbitrary: fc.record({
        do: fc.constant("part" as const),
        over: fc.integer({ min: 0, max: 7 }),
        under: fc.constantFrom(8 as const, 16 as const, 10 as const),
      }),
    },
    fc.record({ do: fc.constant("type" as const), text: fc.string({ maxLength: 30 }) }),
    {
      weight: 3,
      arbitrary: fc
        .constantFrom(
          ...(["erase", "clear", "next", "same", "skip", "back", "right", "again", "meant"] as const),
        )
        .map((what) => ({ do: what })),
    },
    fc.record({ do: fc.constant("go" as const), to: fc.oneof(measure, fc.constant("review" as const)) }),
    fc.record({ do: fc.constant("unit" as const), unit: fc.constantFrom("in" as const, "cm" as const) }),
    fc.record({ do: fc.constant("add" as const), key: measure }),
    fc.record({ do: fc.constant("settle" as const), sign: fc.string() }),
  );
  const anyKnown: fc.Arbitrary<Known> = fc.record({
    previous: fc.constantFrom({}, { wristGirth: { typed: "6", mm: 152.4, takenOn: "2025-09-01" } }),
    ageYears: fc.option(fc.integer({ min: 0, max: 90 }), { nil: undefined }),
    on: fc.constant("2026-03-14"),
    bookUnit: fc.constantFrom("in" as const, "cm" as const),
  });

  const sound = (taking: Taking, known: Known): void => {
    expect(taking.at === "review" || taking.keys.includes(taking.at)).toBe(true);
    if (taking.held) expect(taking.at !== "review" && taking.taken[taking.at]).toBeTruthy();
    for (const { typed, mm } of Object.values(taking.taken)) {
      const read = parseLength(typed, known.bookUnit);
      expect(read.ok && Math.abs(read.mm - mm) < 1e-6).toBe(true);
    }
    const shown = shownEntry(taking.entry, taking.unit);
    const read = parseLength(taking.entry, taking.unit);
    if ("whole" in shown && read.ok)
      expect((shown.whole + shown.over / shown.under) * (taking.unit === "in" ? 25.4 : 10)).toBeCloseTo(
        read.mm,
        9,
      );
  };

  it("it never throws, stays on a figure of the set, and every figure reads as its millimetres", () => {
    fc.assert(
      fc.property(fc.array(anyPress, { maxLength: 60 }), anyKnown, (presses, known) => {
        let taking = fresh({ keys: sleeveSet.measures });
        for (const one of presses) {
          taking = press(taking, one, known);
          sound(taking, known);
        }
        // What is put down on the phone comes back as it was.
        expect(readTaking(JSON.parse(JSON.stringify(taking)))).toEqual(taking);
      }),
      { numRuns: 300 },
    );
  });

  it("a taken figure is lost by Clear and Take again alone", () => {
    fc.assert(
      fc.property(fc.array(anyPress, { maxLength: 60 }), anyKnown, (presses, known) => {
        let taking = fresh();
        for (const one of presses) {
          const after = press(taking, one, known);
          if (one.do !== "clear" && one.do !== "again")
            for (const key of taking.keys) if (taking.taken[key]) expect(after.taken[key]).toBeDefined();
          taking = after;
        }
      }),
    );
  });
});

describe("what comes back off the phone", () => {
  it("is refused where it is not a taking", () => {
    for (const bad of [null, 7, {}, { ...fresh(), shape: 2 }, { ...fresh(), at: "bustGirth" }])
      expect(readTaking(bad)).toBeNull();
  });
  it("is worth nothing while nothing is in it", () => {
    expect(holdsSomething(fresh())).toBe(false);
    expect(holdsSomething(pressAll(fresh(), [{ do: "digit", digit: 1 }]))).toBe(true);
  });
});
