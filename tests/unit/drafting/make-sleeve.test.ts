import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { makeSleeve, walk, type Check, type SleeveAsk } from "@/lib/drafting";
import { inches } from "./helpers";

const good: SleeveAsk = {
  length: 560,
  biceps: 355,
  hem: 225,
  armhole: { front: 205, back: 210 },
  headEase: 32,
  upperArm: 300,
  elbowDepth: 330,
  elbowGirth: 245,
  wrist: 155,
  hand: 190,
};

function made(ask: SleeveAsk) {
  const sleeve = makeSleeve(ask);
  if (!sleeve.ok) throw new Error(JSON.stringify(sleeve.problems));
  return sleeve;
}

const check = (ask: SleeveAsk, id: string): Check => made(ask).checks.find((c) => c.id === id)!;

const FIELDS = [
  "length",
  "biceps",
  "hem",
  "capDepth",
  "armhole",
  "headEase",
  "frontMarks",
  "backMarks",
  "elbowDepth",
  "elbowWidth",
  "upperArm",
  "notches",
] as const;

describe("makeSleeve", () => {
  it("finds every check good on a sound sleeve", () => {
    expect(made(good).checks.filter(({ verdict }) => verdict !== "good")).toEqual([]);
    expect(made(good).checks.map(({ id }) => id)).toEqual([
      "biceps-ease",
      "cap-shape",
      "cap-third",
      "cap-front",
      "cap-back",
      "head-ease",
      "balance",
      "elbow",
      "hem-wrist",
      "hem-hand",
      "underarms",
    ]);
  });

  it("needs no body figures: bare length, biceps, hem and cap depth do", () => {
    const { checks } = made({
      length: inches(8),
      biceps: inches(12),
      hem: inches(11),
      capDepth: inches(6.25),
    });
    expect(checks.map(({ id }) => id)).toEqual(["cap-shape", "underarms"]);
  });

  it.each<[string, string, Partial<SleeveAsk>]>([
    ["length-range", "length", { length: 22 }],
    ["length-range", "length", { length: NaN }],
    ["biceps-range", "biceps", { biceps: -3 }],
    ["hem-range", "hem", { hem: Infinity }],
    ["headEase-range", "headEase", { headEase: -1 }],
    ["armholeBack-range", "armholeBack", { armhole: { front: 200, back: 8 } }],
    ["hand-range", "hand", { hand: 0 }],
    ["beside-range", "beside", { beside: 90 }],
    ["cap-depth-missing", "capDepth", { armhole: undefined }],
    ["length-under-cap", "length", { length: 100 }],
    ["elbow-in-cap", "elbowDepth", { elbowDepth: 90 }],
    [
      "mark-order",
      "frontMarks",
      {
        frontMarks: [
          { share: 0.6, out: 0 },
          { share: 0.4, out: 10 },
        ],
      },
    ],
    ["mark-order", "backMarks", { backMarks: [{ share: NaN, out: 0 }] }],
    ["mark-far", "backMarks", { backMarks: [{ share: 0.5, out: 200 }] }],
    ["notch-off-seam", "notches", { notches: { front: 90, back: 700 } }],
    ["biceps-too-wide", "biceps", { biceps: 700 }],
  ])("%s stands beside %s", (id, figure, change) => {
    const sleeve = makeSleeve({ ...good, ...change });
    expect(sleeve.ok).toBe(false);
    if (sleeve.ok) return;
    expect(sleeve.problems[0]).toMatchObject({ id, figure });
    expect(sleeve.problems[0]!.remedy.length).toBeGreaterThan(0);
  });

  it("answers whatever a form can send, and never with a figure that is not a number", () => {
    const wild = fc.oneof(
      { weight: 6, arbitrary: fc.double({ min: 50, max: 700, noNaN: true }) },
      { weight: 1, arbitrary: fc.double() },
    );
    const maybe = <T>(a: fc.Arbitrary<T>) => fc.option(a, { nil: undefined });
    const marks = fc.array(
      fc.record({ share: fc.double({ min: -0.1, max: 1.1 }), out: fc.double({ min: -60, max: 60 }) }),
      {
        maxLength: 5,
      },
    );
    const wildAsk = fc.record({
      length: wild,
      biceps: wild,
      hem: wild,
      capDepth: maybe(wild),
      armhole: maybe(fc.record({ front: wild, back: wild })),
      headEase: maybe(fc.double({ min: -10, max: 100 })),
      frontMarks: maybe(marks),
      backMarks: maybe(marks),
      elbowDepth: maybe(wild),
      elbowWidth: maybe(wild),
      upperArm: maybe(wild),
      notches: maybe(fc.record({ front: wild, back: wild })),
    });
    const change = fc
      .tuple(wildAsk, fc.shuffledSubarray([...FIELDS], { maxLength: 3 }))
      .map(([ask, keys]): Partial<SleeveAsk> => Object.fromEntries(keys.map((key) => [key, ask[key]])));
    let drawn = 0;
    fc.assert(
      fc.property(change, (c) => {
        const sleeve = makeSleeve({ ...good, ...c });
        if (!sleeve.ok) {
          expect(JSON.stringify(sleeve.problems)).not.toContain("null");
          expect(sleeve.problems.length).toBeGreaterThan(0);
          return;
        }
        drawn++;
        const numbers = JSON.stringify([
          sleeve.figures,
          sleeve.draft,
          sleeve.checks.map((c) => [c.value, c.phrase, c.remedy]),
        ]);
        // JSON writes NaN and Infinity as null.
        expect(numbers).not.toContain("null");
      }),
      { numRuns: 1000 },
    );
    expect(drawn).toBeGreaterThan(20);
  });
});

describe("checks", () => {
  const capGiven = { ...good, capDepth: 135 };
  it.each<[string, string, SleeveAsk]>([
    ["biceps-ease", "look", { ...capGiven, upperArm: 320 }],
    ["biceps-ease", "wrong", { ...capGiven, upperArm: 360 }],
    ["cap-shape", "look", { ...good, capDepth: 80 }],
    ["cap-shape", "look", { ...good, capDepth: 200 }],
    ["cap-third", "look", { ...good, capDepth: 105 }],
    ["cap-front", "wrong", { ...capGiven, armhole: { front: 260, back: 205 } }],
    ["cap-back", "wrong", { ...capGiven, armhole: { front: 205, back: 260 } }],
    ["head-ease", "wrong", { ...capGiven, armhole: { front: 260, back: 260 } }],
    ["head-ease", "look", { ...capGiven, armhole: { front: 190, back: 190 } }],
    ["balance", "look", { ...capGiven, armhole: { front: 195, back: 215 } }],
    ["elbow", "look", { ...capGiven, elbowWidth: 260 }],
    ["elbow", "wrong", { ...capGiven, elbowWidth: 240 }],
    ["hem-wrist", "look", { ...capGiven, opening: true, hem: 170 }],
    ["hem-wrist", "wrong", { ...capGiven, opening: true, hem: 150 }],
    ["hem-hand", "wrong", { ...capGiven, hem: 185 }],
    ["hem-arm", "wrong", { ...capGiven, length: 220, hem: 290 }],
  ])("%s is %s", (id, verdict, ask) => {
    expect(check(ask, id).verdict).toBe(verdict);
    expect(check(ask, id).remedy).not.toEqual(["Nothing to change."]);
  });

  it("asks nothing of the hand where the hem opens", () => {
    expect(check({ ...good, hem: 185, opening: true }, "hem-hand")).toBeUndefined();
  });

  it("asks less ease of a child's arm, as common practice", () => {
    const ask = {
      length: 200,
      biceps: inches(9),
      hem: inches(9),
      capDepth: inches(3.5),
      upperArm: inches(7.5),
    };
    expect(check(ask, "biceps-ease")).toMatchObject({ verdict: "good", mark: "practice" });
  });

  it("moves the crown by half the difference, and then the halves balance", () => {
    const ask = { ...capGiven, armhole: { front: 195, back: 215 } };
    const before = check(ask, "balance");
    const shift = before.remedy.find((part) => typeof part === "object")!.mm;
    // 1e-9 mm: the remedy is half of what is read.
    expect(shift).toBeCloseTo(before.value / 2, 9);
    const moved = { ...capGiven, armhole: { front: 195 + shift, back: 215 - shift } };
    expect(check(moved, "balance").value).toBeLessThan(1e-9);
  });

  it.each<[string, (mm: number) => Partial<SleeveAsk>, SleeveAsk]>([
    ["biceps-ease", (mm) => ({ biceps: mm }), { ...capGiven, upperArm: 320 }],
    ["elbow", (mm) => ({ elbowWidth: mm }), { ...capGiven, elbowWidth: 240 }],
    ["hem-wrist", (mm) => ({ hem: mm }), { ...capGiven, opening: true, hem: 150 }],
    ["hem-hand", (mm) => ({ hem: mm }), { ...capGiven, hem: 185 }],
    ["cap-shape", (mm) => ({ capDepth: mm }), { ...good, capDepth: 80 }],
  ])("%s is good once its own remedy is followed", (id, change, ask) => {
    const before = check(ask, id);
    expect(before.verdict).not.toBe("good");
    const { mm } = before.remedy.find((part) => typeof part === "object")!;
    expect(check({ ...ask, ...change(mm) }, id).verdict).toBe("good");
  });
});

describe("walk", () => {
  const sides = (a: number, b: number) =>
    [
      { words: "the cap", measured: a },
      { words: "the armhole", measured: b },
    ] as const;
  it("wants equal seams equal to a line's width, half a millimetre", () => {
    expect(walk({ id: "s", sides: sides(100.4, 100), joining: { how: "equal" } }).agrees).toBe(true);
    expect(walk({ id: "s", sides: sides(100.6, 100), joining: { how: "equal" } })).toMatchObject({
      agrees: false,
    });
  });
  it("lets an eased seam be longer, never shorter", () => {
    expect(walk({ id: "s", sides: sides(130, 100), joining: { how: "eased" } }).agrees).toBe(true);
    expect(walk({ id: "s", sides: sides(99, 100), joining: { how: "eased" } }).agrees).toBe(false);
  });
  it("holds an eased seam to the ease asked for, and says by how much it is out", () => {
    const walked = walk({ id: "s", sides: sides(130, 100), joining: { how: "eased", by: 25 } });
    expect(walked.agrees).toBe(false);
    expect(walked.remedy).toEqual(["Shorten the cap by ", { mm: 5 }, "."]);
  });
});
