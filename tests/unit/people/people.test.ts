import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ageOn, type BirthFacts, isChild, isUnderThree } from "@/lib/people/age";
import { cautionsFor, handOverCaution } from "@/lib/people/cautions";
import { countries } from "@/lib/people/countries";
import { daysBetween, monthsBetween, readDay } from "@/lib/people/iso-date";
import { readPhone } from "@/lib/people/phone";

const nothing: BirthFacts = { birthYear: null, birthMonth: null, ageYears: null, ageOn: null };
const born = (birthYear: number, birthMonth: number): BirthFacts => ({ ...nothing, birthYear, birthMonth });
const told = (ageYears: number, on: string): BirthFacts => ({ ...nothing, ageYears, ageOn: on });
const isoDay = fc
  .integer({ min: 0, max: 20000 })
  .map((n) => new Date(Date.UTC(1990, 0, 1 + n)).toISOString().slice(0, 10));

describe("days", () => {
  it("counts whole months and days", () => {
    expect(monthsBetween("2025-01-31", "2025-02-28")).toBe(0);
    expect(monthsBetween("2025-01-31", "2025-03-01")).toBe(1);
    expect(monthsBetween("2025-03-14", "2026-03-14")).toBe(12);
    expect(monthsBetween("2026-03-14", "2025-03-15")).toBe(-11);
    expect(daysBetween("2024-02-28", "2024-03-01")).toBe(2);
    expect(daysBetween("2024-03-01", "2024-02-28")).toBe(-2);
  });
  it.each(["2025-02-29", "2025-13-01", "2025-1-1", "", "14/03/2026"])("%s is not a day", (text) =>
    expect(() => readDay(text)).toThrow(RangeError),
  );
});

describe("ageOn", () => {
  it.each([
    [born(2019, 6), "2026-06-15", { years: 6, months: 83, certain: false }],
    [born(2019, 6), "2026-07-01", { years: 7, months: 84, certain: true }],
    [born(2019, 6), "2026-05-31", { years: 6, months: 82, certain: true }],
    [born(2026, 3), "2026-03-14", { years: 0, months: 0, certain: true }],
    [told(7, "2025-03-14"), "2025-03-14", { years: 7, certain: true }],
    [told(7, "2025-03-14"), "2026-03-13", { years: 7, certain: false }],
    [told(7, "2025-03-14"), "2026-03-14", { years: 8, certain: false }],
    [told(7, "2025-03-14"), "2025-03-01", { years: 6, certain: false }],
    [{ ...nothing, birthYear: 2019 }, "2026-03-14", { years: 6, certain: false }],
  ])("%j on %s", (wearer, on, age) => expect(ageOn(wearer, on)).toEqual(age));
  it.each([
    [nothing, "2026-03-14"],
    [born(2026, 4), "2026-03-14"],
    [told(1, "2026-03-14"), "2020-03-14"],
  ])("%j on %s is not known", (wearer, on) => expect(ageOn(wearer, on)).toBeUndefined());

  it("is never more than the true age, at most a year less, and right where it is certain", () => {
    fc.assert(
      fc.property(isoDay, isoDay, (birthday, on) => {
        fc.pre(birthday <= on);
        const trueYears = Math.floor(monthsBetween(birthday, on) / 12);
        const { year, month } = readDay(birthday);
        const age = ageOn(born(year, month), on)!;
        expect(age.years === trueYears || (!age.certain && age.years === trueYears - 1)).toBe(true);
        expect(monthsBetween(birthday, on) - age.months!).toBeGreaterThanOrEqual(0);
        expect(monthsBetween(birthday, on) - age.months!).toBeLessThanOrEqual(1);
      }),
    );
  });
  it("from an age told it is never more than the true age, and at most a year less", () => {
    fc.assert(
      fc.property(isoDay, isoDay, isoDay, (birthday, on, toldOn) => {
        fc.pre(birthday <= on && birthday <= toldOn);
        const yearsAt = (d: string) => Math.floor(monthsBetween(birthday, d) / 12);
        const age = ageOn(told(yearsAt(toldOn), toldOn), on)!;
        expect([yearsAt(on), yearsAt(on) - 1]).toContain(age.years);
      }),
    );
  });
  it("knows a child, and one under three", () => {
    expect(isChild({ years: 13, certain: true })).toBe(true);
    expect(isChild({ years: 14, certain: true })).toBe(false);
    expect(isUnderThree(ageOn(born(2023, 4), "2026-03-14")!)).toBe(true);
    expect(isUnderThree(ageOn(born(2023, 2), "2026-03-14")!)).toBe(false);
  });
});

describe("cautionsFor", () => {
  const keys = (garment: string, years?: number) =>
    cautionsFor(garment, years === undefined ? undefined : { years, certain: true }).map((c) => c.key);
  it.each([
    // EN 14682 to 14 years; 16 CFR 1501 under 36 months; 16 CFR 1615, 1616 nightwear; 16 CFR 1120 outerwear 2T-12, 2T-16 (sources: care, seen).
    ["Dress", 30, []],
    ["Dress", 8, ["cords"]],
    ["Dress", 2, ["small-parts", "cords"]],
    ["Nightdress with puff sleeves", 6, ["cords", "nightwear", "elastic"]],
    ["Nightdress", 30, []],
    ["Hooded coat", 10, ["cords", "outerwear-cords", "waist-cords"]],
    ["Jacket", 15, ["waist-cords"]],
    ["Raincoat", 1, ["small-parts", "cords"]],
    ["Waistcoat", 10, ["cords"]],
    ["Petticoat, cape sleeve", 10, ["cords"]],
    ["Choir robe", 10, ["cords"]],
    ["Jacket", 17, []],
    ["Christening gown", undefined, ["small-parts", "cords"]],
    ["School dress", undefined, ["cords"]],
    ["Dress", undefined, []],
  ])("%s at %s: %j", (garment, years, expected) => expect(keys(garment, years)).toEqual(expected));
  it("under 7 and over differ at the neck", () => {
    expect(cautionsFor("Dress", { years: 6, certain: true })[0]!.say).toMatch(/no cords at the hood or neck/);
    expect(cautionsFor("Dress", { years: 7, certain: true })[0]!.say).toMatch(/free ends/);
  });
  it("every rule of law names itself and leaves the word to local law", () => {
    for (const years of [1, 4, 9, 15]) {
      for (const c of cautionsFor("Hooded night jacket, elastic", { years, certain: true })) {
        if (c.mark === "seen") expect(c.say).toMatch(/Local law decides\.$/);
        expect(c.source).not.toBe("");
      }
    }
    expect(handOverCaution.say).toMatch(/pins/);
  });
});

describe("readPhone", () => {
  // E.164: ^\+[1-9]\d{1,14}$ (sources: print, money, numbers).
  const e164 = /^\+[1-9]\d{1,14}$/;
  it.each([
    // Numbers set aside for fiction (GB, US) or the metadata's own examples (KE, NG).
    ["020 7946 0018", "GB", "+442079460018", "020 7946 0018"],
    ["+44 20 7946 0018", "KE", "+442079460018", "+44 20 7946 0018"],
    ["(202) 555-0143", "US", "+12025550143", "(202) 555-0143"],
    ["0712-123-456", "KE", "+254712123456", "0712 123456"],
    ["٠٧١٢ ١٢٣ ٤٥٦", "KE", "+254712123456", "0712 123456"],
    ["0802 123 4567", "NG", "+2348021234567", "0802 123 4567"],
  ])("%s in %s", (text, country, number, display) =>
    expect(readPhone(text, country)).toEqual({ typed: text, e164: number, display }),
  );
  it.each([
    ["12", "GB"],
    ["ask her sister", "GB"],
    ["0712 12", "KE"],
    ["0712 123 456", "ZZ"],
    ["020 7946 0018 or 0712 123456", "GB"],
  ])("%s in %s is kept as typed, and said so", (text, country) => {
    const read = readPhone(text, country);
    expect(read).toMatchObject({ typed: text, display: text });
    expect(read.e164).toBeUndefined();
    expect(read.say).toMatch(/kept as typed\. Type /);
  });
  it("has nothing to say to an empty field", () =>
    expect(readPhone("  ", "GB")).toEqual({ typed: "  ", display: "" }));
  it("never throws, keeps what was typed, and gives E.164 or a sentence", () => {
    const piece = fc.constantFrom(..."0123456789 +-()./x٣");
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: "grapheme" }),
          fc.array(piece, { maxLength: 18 }).map((p) => p.join("")),
        ),
        fc.constantFrom("GB", "KE", "US", "NG", "IN", "", "xx"),
        (text, country) => {
          const read = readPhone(text, country);
          expect(read.typed).toBe(text);
          if (read.e164 !== undefined) expect(read.e164).toMatch(e164);
          else if (text.trim() !== "") expect(read.say).toBeDefined();
        },
      ),
      { numRuns: 1000 },
    );
  });
});

describe("countries", () => {
  it("lists every country by name, with its calling code", () => {
    const all = countries();
    expect(all.length).toBeGreaterThan(230);
    expect(all).toContainEqual({ code: "KE", name: "Kenya", callingCode: "254" });
    expect(all.map((c) => c.name)).toEqual(all.map((c) => c.name).sort((a, b) => a.localeCompare(b, "en")));
    expect(countries("fr").find((c) => c.code === "DE")!.name).toBe("Allemagne");
  });
});
