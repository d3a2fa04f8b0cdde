import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fold } from "@/lib/search/fold";
import { matchesAll, searchText } from "@/lib/search/match";

describe("fold", () => {
  it.each([
    ["Zoë", "zoe"],
    ["ÅSE Strauß-Øster", "ase strauss oster"],
    ["Łucja Đặng", "lucja dang"],
    ["Ælfþryð", "aelfthryd"],
    ["İpek Işık", "ipek isik"],
    ["Ọláyínká Ṣadé", "olayinka sade"],
    ["O’Dara  D'Lune", "odara dlune"],
    ["Ｗｉｄｅ", "wide"],
    ["ΝΊΚΟΣ", "νικοσ"],
    ["مُنى", "منى"],
    ["रितु", "रितु"],
    ["٣ ni", "3 ni"],
    ["  --  ", ""],
  ])("%s", (text, folded) => expect(fold(text)).toBe(folded));
  it("folding twice is the same as once, whatever the text", () => {
    fc.assert(
      fc.property(fc.string({ unit: "grapheme" }), (text) => {
        const once = fold(text);
        expect(fold(once)).toBe(once);
        expect(once).toMatch(/^(?:[\p{L}\p{M}\p{N}]+(?: [\p{L}\p{M}\p{N}]+)*)?$/u);
      }),
      { numRuns: 2000 },
    );
  });
  it("case and composed or taken-apart letters make no difference", () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom(..."aéÉñÑüÜøØłžß ọẹ") }), (text) => {
        expect(fold(text.normalize("NFD"))).toBe(fold(text.normalize("NFC")));
        expect(fold(text.toUpperCase())).toBe(fold(text));
      }),
    );
  });
});

describe("matchesAll", () => {
  const text = searchText({
    name: "Zoë Ångmark",
    phones: ["0712-123 456", "+254712123456", null, ""],
    wearerNames: ["Anne-Marie", "Bó"],
  });
  it("is folded names, then figures", () =>
    expect(text).toBe("zoe angmark anne marie bo 0712123456 254712123456"));
  it.each([
    "",
    "  ",
    "zoe",
    "ZOË",
    "ang zo",
    "marie zo",
    "anne-m",
    "bo",
    "0712",
    "0712 123",
    "+254 (712) 123-456",
    "3456",
    "ang 0712 12",
    "0712 ang 456",
    "٠٧١٢",
  ])("finds %j", (query) => expect(matchesAll(text, query)).toBe(true));
  it.each(["oe", "mark", "zoe x", "0713", "zoe 999", "456712"])("does not find %j", (query) =>
    expect(matchesAll(text, query)).toBe(false),
  );
  it("figures in a name are found too", () => {
    const numbered = searchText({ name: "Form 2b 12", phones: [], wearerNames: ["Anna2"] });
    for (const query of ["2b", "12 form", "anna2"]) expect(matchesAll(numbered, query), query).toBe(true);
  });
  it("every beginning of every word is found, in any order", () => {
    const word = fc.string({ unit: fc.constantFrom(..."abcdéøßñ"), minLength: 1, maxLength: 8 });
    fc.assert(
      fc.property(fc.array(fc.tuple(word, fc.nat(7)), { minLength: 1, maxLength: 5 }), (words) => {
        const haystack = searchText({ name: words.map(([w]) => w).join(" "), phones: [], wearerNames: [] });
        const query = words
          .map(([w, n]) => w.slice(0, n + 1))
          .reverse()
          .join("  ");
        expect(matchesAll(haystack, query)).toBe(true);
        expect(matchesAll(haystack, `${query} z`)).toBe(false);
      }),
    );
  });
  it("any run of a phone's figures is found, however it is spaced", () => {
    fc.assert(
      fc.property(
        fc.string({ unit: fc.constantFrom(..."0123456789"), minLength: 6, maxLength: 12 }),
        fc.nat(5),
        fc.constantFrom(" ", "-", ".", "", "/"),
        (phone, from, between) => {
          const query = [...phone.slice(from)].join(between);
          expect(matchesAll(searchText({ name: "A", phones: [phone], wearerNames: [] }), query)).toBe(true);
        },
      ),
    );
  });
});
