import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Sum, type Unit } from "@/lib/records/types";
import { sewingSum, sewingSums } from "@/lib/sewing";
import { type BinItem } from "@/lib/store/queries/bin";
import { readCount, readRatio } from "@/lib/sums/read-number";
import {
  emptySumForm,
  formOfSum,
  missingWords,
  readSumForm,
  restoredSumForm,
  sumFields,
  suggestedSumName,
} from "@/lib/sums/sum-form";
import { keptLine, sumShareText } from "@/lib/sums/sum-words";
import { binWords, bringBack, comesBack } from "@/lib/workshop/bin-items";

const ruffle = sewingSum("ruffle")!;
const filled = (unit: Unit = "in") => {
  const form = emptySumForm(ruffle, unit, 8);
  return { ...form, typed: { ...form.typed, seam: "15", ratio: "2½" } };
};
const rowOf = (fields: ReturnType<typeof sumFields>): Sum => ({
  workshopId: "w",
  id: "s",
  stamps: {},
  removedAt: null,
  ...fields,
});

describe("numbers as typed", () => {
  it.each([
    ["2.5", 2.5],
    ["2,5", 2.5],
    ["2 1/2", 2.5],
    ["2½", 2.5],
    ["½", 0.5],
    ["2.5 : 1", 2.5],
    ["2.5x", 2.5],
    ["٢", 2],
  ])("%s is %d times", (text, value) => expect(readRatio(text)).toEqual({ ok: true, value }));
  it.each(["", "two", "1/0", "2 1/2 1/2", "-2", "2.5.5"])("%s is refused with what to type", (text) =>
    expect(readRatio(text)).toMatchObject({ ok: false, say: expect.stringContaining("2 1/2") as string }),
  );
  it("counts are whole", () => {
    expect(readCount(" 12 ")).toEqual({ ok: true, value: 12 });
    expect(readCount("٧")).toEqual({ ok: true, value: 7 });
    expect(readCount("2.5")).toMatchObject({ ok: false, say: expect.stringContaining("whole") as string });
    expect(readCount("a few")).toMatchObject({ ok: false });
  });
  it("never throw", () => {
    fc.assert(
      fc.property(fc.string({ unit: "grapheme" }), (text) => {
        for (const read of [readCount(text), readRatio(text)])
          if (read.ok) expect(Number.isFinite(read.value)).toBe(true);
          else expect(read.say).toContain("ype");
      }),
    );
  });
});

describe("the form of a sum", () => {
  it("says what is missing, what cannot be read, and what cannot be", () => {
    const empty = readSumForm(ruffle, emptySumForm(ruffle, "in", 8), 8);
    expect(empty.worked).toBeNull();
    expect(missingWords(empty.missing)).toBe("“Seam it is sewn to”");
    const bad = readSumForm(ruffle, { ...filled(), typed: { ...filled().typed, seam: "8 5/4" } }, 8);
    expect(bad.errors.seam![0]).toContain("9 1/4");
    expect(bad.record.seam).toEqual({ typed: "8 5/4" });
    const narrow = readSumForm(
      ruffle,
      { ...filled(), typed: { ...filled().typed, width: "2", join: "1" } },
      8,
    );
    expect(narrow.worked?.ok).toBe(false);
    expect(narrow.errors.width).toBeDefined();
  });

  it.each(sewingSums.map((sum) => [sum.id, sum] as const))(
    "%s begins with figures of its own fields",
    (_, sum) => {
      for (const unit of ["in", "cm"] as const) {
        const read = readSumForm(sum, emptySumForm(sum, unit, 8), 8);
        expect(read.errors).toEqual({});
        expect(read.missing.length).toBeGreaterThan(0);
      }
    },
  );

  it("what is kept comes back as typed, in the other unit as the same length", () => {
    const form = { ...filled(), note: " For Ife ", orderId: "o" };
    const read = readSumForm(ruffle, form, 8);
    const suggested = suggestedSumName(ruffle, read, "in", 8);
    expect(suggested).toBe("Ruffle and gathers, 15 in");
    const kept = rowOf(sumFields(ruffle, form, read, suggested));
    expect(kept).toMatchObject({
      orderId: "o",
      kind: "ruffle",
      name: suggested,
      note: "For Ife",
      inputs: { seam: { typed: "15", mm: 381 }, ratio: { typed: "2½", value: 2.5 }, ends: { value: "open" } },
    });
    expect(formOfSum(ruffle, kept, "in", 8).typed).toEqual(form.typed);
    expect(formOfSum(ruffle, kept, "cm", 8).typed).toMatchObject({ seam: "38.1", ratio: "2½" });
    expect(keptLine(kept, "in", 8)).toBe(
      "Strip, joined, before gathering 37 1/2 in · Strips to cut 1 · Cut it 38 in",
    );
    expect(keptLine({ ...kept, kind: "of a later version" }, "in", 8)).toContain("newer Notchbook");
    expect(keptLine({ ...kept, inputs: {} }, "in", 8)).toContain("put right");
  });

  it("a draft comes back over what the form begins with, in the workshop's unit", () => {
    const begin = emptySumForm(ruffle, "cm", 8, "o");
    const back = restoredSumForm(
      ruffle,
      begin,
      { unit: "in", typed: { seam: "15", ratio: "3", depth: "x" } },
      8,
    );
    expect(back.typed).toMatchObject({ seam: "38.1", ratio: "3", depth: "x" });
    expect(back.orderId).toBe("o");
    expect(restoredSumForm(ruffle, begin, null, 8)).toBe(begin);
  });

  it("is sent with what was put in, what it comes to and what to mind", () => {
    const read = readSumForm(ruffle, filled(), 8);
    if (!read.worked?.ok) throw new Error("not worked");
    const text = sumShareText(ruffle, "Frill", read, read.worked, "in", 8);
    expect(text).toMatch(/^Frill\n\nSeam it is sewn to: 15 in\n/);
    expect(text).toContain("Strip, joined, before gathering: 37 1/2 in");
    expect(text).toContain("  half: 7 1/2 in");
    expect(text).not.toMatch(/undefined|NaN|object/);
  });
});

describe("a sum in the bin", () => {
  it("is called by its name, and brings back the order that it is on", () => {
    const at = "2026-03-14T10:00:00.000Z";
    const sum = { table: "sums", row: { id: "s", name: "Frill", orderId: "o", removedAt: at } } as BinItem;
    const order = {
      table: "orders",
      row: { id: "o", clientId: "c", occasion: "Play", removedAt: at },
    } as BinItem;
    expect(binWords(sum)).toEqual({ kind: "Sum", name: "Frill" });
    expect(comesBack(sum, [sum])).toEqual([sum]);
    expect(comesBack(sum, [sum, order])).toEqual([order, sum]);
    expect(bringBack([sum])).toMatchObject([{ table: "sums", id: "s", fields: { removedAt: null } }]);
  });
});
