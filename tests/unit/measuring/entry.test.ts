import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { parseLength } from "@/lib/lengths/parse-length";
import {
  addDigit,
  entryOf,
  eraseLast,
  readEntry,
  setPart,
  shownEntry,
  typedAgain,
  unitTyped,
} from "@/lib/measuring/entry";

describe("the pad's text", () => {
  it("grows by digits, without idle zeros, to three", () => {
    expect(addDigit("", 1)).toBe("1");
    expect(addDigit("1", 4)).toBe("14");
    expect(addDigit("0", 6)).toBe("6");
    expect(addDigit("140", 2)).toBe("140");
  });
  it("begins anew after a finished figure", () => {
    expect(addDigit("6 1/4", 7)).toBe("7");
    expect(addDigit("15.9", 7)).toBe("7");
  });
  it("goes on with what a keyboard began", () => {
    expect(addDigit("6 1/", 4)).toBe("6 1/4");
    expect(addDigit("15.", 9)).toBe("15.9");
  });
  it("takes eighths and sixteenths reduced, tenths as they are, none as none", () => {
    expect(setPart("14", 4, 8)).toBe("14 1/2");
    expect(setPart("14", 3, 16)).toBe("14 3/16");
    expect(setPart("15", 9, 10)).toBe("15.9");
    expect(setPart("15", 0, 8)).toBe("15");
    expect(setPart("6 1/4", 5, 8)).toBe("6 5/8");
    expect(setPart("", 4, 8)).toBeNull();
  });
  it("loses the part as one, else a character", () => {
    expect(eraseLast("14 1/2")).toBe("14");
    expect(eraseLast("15.9")).toBe("15");
    expect(eraseLast("14")).toBe("1");
    expect(eraseLast("6 1/")).toBe("6 1");
    expect(eraseLast("")).toBe("");
  });
});

describe("what is shown", () => {
  it("is stacked where it is a whole with a part, else as it stands", () => {
    expect(shownEntry("6 1/4", "in")).toEqual({ whole: 6, over: 1, under: 4 });
    expect(shownEntry("15.9", "cm")).toEqual({ whole: 15, over: 9, under: 10 });
    for (const raw of ["", "6 1/", "6.25", "6 5/4", "15,9"]) expect(shownEntry(raw, "in")).toEqual({ raw });
  });
  it("is what the text reads as, whatever is typed", () => {
    const texts = fc.oneof(
      fc.string({ maxLength: 24 }),
      fc.string({ unit: fc.constantFrom(..."0123456789 /.,-"), maxLength: 10 }),
    );
    fc.assert(
      fc.property(texts, fc.constantFrom("in" as const, "cm" as const), (text, unit) => {
        const shown = shownEntry(text, unit);
        const read = parseLength(text, unit);
        if (!("whole" in shown) || !read.ok) return "raw" in shown ? shown.raw === text : !read.ok;
        const each = unit === "in" ? 25.4 : 10;
        return Math.abs((shown.whole + shown.over / shown.under) * each - read.mm) < 1e-9;
      }),
    );
  });
});

describe("a finished entry", () => {
  it("is kept as typed, and names its unit where the book has another", () => {
    expect(readEntry("6 1/4", "in", "in")).toEqual({ ok: true, typed: "6 1/4", mm: 158.75, unit: "in" });
    expect(readEntry("15.9", "cm", "in")).toEqual({ ok: true, typed: "15.9 cm", mm: 159, unit: "cm" });
    expect(readEntry("6¼", "in", "cm")).toEqual({ ok: true, typed: "6¼ in", mm: 158.75, unit: "in" });
    expect(readEntry("159 mm", "in", "in")).toEqual({ ok: true, typed: "159 mm", mm: 159, unit: "cm" });
  });
  it("is refused with what to type instead", () => {
    expect(readEntry("0", "in", "in")).toEqual({
      ok: false,
      say: "A figure is more than 0. Type what the tape says, or press Skip.",
    });
    expect(readEntry("6 5/4", "in", "in")).toMatchObject({ ok: false });
    expect(readEntry("999", "in", "in")).toMatchObject({ ok: false });
  });
  it("reads as the same length when it is taken again under another unit", () => {
    expect(typedAgain({ typed: "15.9", mm: 159 }, "cm")).toBe("15.9");
    expect(typedAgain({ typed: "15.9", mm: 159 }, "in")).toBe("15.9 cm");
    expect(typedAgain({ typed: "6 1/4", mm: 158.75 }, "cm")).toBe("6 1/4 in");
    expect(typedAgain({ typed: "?", mm: 158.75 }, "in")).toBe("158.75 mm");
    expect(unitTyped("15.9 cm", "in")).toBe("cm");
    expect(unitTyped('6 1/4"', "cm")).toBe("in");
    expect(entryOf("15.9 cm", "cm")).toBe("15.9");
  });
});
