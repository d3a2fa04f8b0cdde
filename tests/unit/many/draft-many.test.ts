import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type MeasureKey, sleeveSet } from "@/lib/figures/body-measures";
import { phraseText } from "@/lib/lengths/phrase";
import { draftedOf, draftMany, draftOne, failingFirst, type ManyRow } from "@/lib/many/draft-many";
import { inTurns } from "@/lib/many/in-turns";
import { keepWrites } from "@/lib/many/keep-many";
import { type ManyWearer } from "@/lib/many/many-wearer";
import { missingMeasures } from "@/lib/many/missing-measures";
import { printedOne } from "@/lib/many/print-many";
import { type StyleId } from "@/lib/records/types";
import { askFromSet } from "@/lib/sleeves/ask-from-set";
import { reaches } from "@/lib/sleeves/reach";
import { styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import { styleChoices } from "@/lib/sleeves/styles";
import { ask, person, TODAY, unmeasured } from "./people";

const why = (row: ManyRow) => (row.drafted ? "" : phraseText(row.why, "in", 8));

const choir: ManyWearer[] = [
  person(0, { name: "Ama" }),
  unmeasured(1, "Bibi"),
  person(2, { name: "Cadi", without: ["armLength", "handGirth", "wristGirth"] }),
  person(3, { name: "Dilys", age: 8, size: 0.8, takenOn: "2025-09-01" }),
  person(4, { name: "Ẹniọlá", size: 1.2 }),
];

describe("one style over many wearers", () => {
  it("names each who fails with the reason, and the others go on", () => {
    const rows = draftMany(choir, ask());
    expect(rows.map(({ wearer }) => wearer.name)).toEqual(["Ama", "Bibi", "Cadi", "Dilys", "Ẹniọlá"]);
    expect(rows.map((row) => (row.drafted ? "drafted" : row.cause))).toEqual([
      "drafted",
      "no-set",
      "missing",
      "old",
      "drafted",
    ]);
    expect(why(rows[1]!)).toBe("There are no measurements yet. Measure first.");
    expect(why(rows[2]!)).toBe(
      "The set of 1 Mar 2026 has no hand girth and arm length. Measure again: this sleeve needs them.",
    );
    expect(why(rows[3]!)).toMatch(/^These figures are 6 months old, and a child of 8 grows\. Measure again/u);
  });

  it("drafts a child's old figures where she is told to, and says that they are old", () => {
    const [row] = draftedOf(draftMany([choir[3]!], ask({ oldToo: true })));
    expect(row!.verdict).not.toBe("good");
    expect(row!.reasons.map((reason) => phraseText(reason, "in")).join(" ")).toMatch(/6 months old/u);
  });

  it("only looks twice at a grown wearer's old figures", () => {
    const [row] = draftMany([person(0, { name: "Ama", age: 40, takenOn: "2024-01-01" })], ask());
    expect(row!.drafted && row!.reasons.length).toBeGreaterThan(0);
  });

  it("says what the engine says, and its remedy, for the one whose figures cannot be drawn", () => {
    const typed = { puff: { headOpen: "1000" } };
    const { styleTyped } = ask({ styleTyped: typed });
    const rows = draftMany(choir.slice(0, 1), ask({ style: "puff", styleTyped, reach: "short" }));
    const tiny = person(9, { name: "Wee", size: 0.12 });
    const mixed = draftMany([tiny, choir[0]!], ask({ reach: "short", style: "statement" }));
    const failing = [...rows, ...mixed].filter((row) => !row.drafted);
    expect(failing.length).toBeGreaterThan(0);
    for (const row of failing) expect(why(row).split(". ").length).toBeGreaterThan(1);
    expect(mixed[1]!.drafted).toBe(true);
  });

  it.each(styleChoices.map(({ id }) => id))(
    "drafts %s as the drafting form would, for each alone",
    (style) => {
      const asked = ask({ style, reach: "short" });
      const together = draftMany(choir, asked);
      for (const [i, one] of choir.entries()) expect(draftMany([one], asked)).toEqual([together[i]]);
      for (const { good, record } of draftedOf(together)) {
        const kept = styleFromRecord({ style, ask: record }, "in", 8);
        expect(kept?.ok && kept.figures).toEqual(good.figures);
        expect((good.figures.length / 3.175) % 1).toBeCloseTo(0, 6);
      }
    },
  );

  it("puts who fails first, and loses nobody", () => {
    const rows = failingFirst(draftMany(choir, ask()));
    expect(rows.slice(0, 3).map(({ wearer }) => wearer.name)).toEqual(["Bibi", "Cadi", "Dilys"]);
    expect(rows).toHaveLength(5);
  });
});

describe("in turns", () => {
  const turns = (signal?: AbortSignal) => {
    let ms = 0;
    const seen: number[] = [];
    const onTurn = (done: number) => void seen.push(done);
    const pause = () => Promise.resolve();
    return { seen, how: { now: () => (ms += 5), pause, onTurn, ...(signal && { signal }), turnMs: 12 } };
  };
  const work = (one: ManyWearer) => draftOne(one, ask());

  it("gives the same rows, and says how far it is", async () => {
    const { how, seen } = turns();
    expect(await inTurns(choir, work, how)).toEqual(draftMany(choir, ask()));
    expect(seen).toEqual([3]);
    expect(await inTurns([], work, how)).toEqual([]);
  });

  it("stops where it is called off", async () => {
    const off = new AbortController();
    const { how } = turns(off.signal);
    expect(await inTurns(choir, work, { ...how, onTurn: () => off.abort() })).toBeNull();
  });
});

describe("what a set lacks", () => {
  it("is named exactly where the form would lack a figure", () => {
    const keys: MeasureKey[] = [...sleeveSet.measures, "armscyeFront", "armscyeBack"];
    fc.assert(
      fc.property(fc.subarray(keys), fc.constantFrom(...reaches.map(({ value }) => value)), (has, reach) => {
        const figures = has.map((key) => ({ key, typed: "10", mm: 254 }));
        const { capBy, typed } = askFromSet({ figures, reach, unit: "in", fineness: 8 });
        const complete =
          capBy === "armhole" && Boolean(typed.upperArm) && Boolean(typed.hem) && Boolean(typed.length);
        expect(missingMeasures(figures, reach).length === 0).toBe(complete);
        const measured = [...figures, ...missingMeasures(figures, reach).map((key) => ({ key }))];
        expect(missingMeasures(measured, reach)).toEqual([]);
      }),
    );
  });
});

describe("what becomes of them", () => {
  const drafted = draftedOf(draftMany(choir, ask({ style: "gathered-head" as StyleId })));

  it("is a sleeve of each own wearer and set", () => {
    let n = 0;
    const writes = keepWrites(drafted, 8, TODAY, () => `s${n++}`);
    expect(writes.map(({ fields, id, makes, table }) => ({ fields, id, makes, table }))).toMatchObject([
      {
        table: "sleeves",
        id: "s0",
        makes: true,
        fields: { wearerId: "wearer-0", setId: "set-0", style: "gathered-head" },
      },
      { table: "sleeves", id: "s1", makes: true, fields: { wearerId: "wearer-4", setId: "set-4" } },
    ]);
    expect(writes[0]!.fields).toMatchObject({ name: "Ama’s sleeve, 14 Mar 2026" });
  });

  it("is a pattern of each, under her name", () => {
    const how = { allowance: 6, unit: "in", fineness: 8, author: "Us", today: TODAY } as const;
    const docs = drafted.map((one) => printedOne(one, how));
    expect(docs.map(({ wearer }) => wearer)).toEqual(["Ama", "Ẹniọlá"]);
    for (const { pieces } of docs) expect(pieces.length).toBeGreaterThan(0);
  });
});
