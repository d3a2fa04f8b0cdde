import { describe, expect, it } from "vitest";
import { setFractions } from "@/lib/pdf/fractions";
import { longDate } from "@/lib/pdf/long-date";
import { directionOf, splitGraphemes, splitRuns, tidy } from "@/lib/pdf/text-runs";
import { printFonts } from "./print-tools";

const runs = (text: string) =>
  splitRuns(text, printFonts.covers).map(({ kind, text: part }) => `${kind}:${part}`);

describe("cutting a line into runs", () => {
  it.each([
    ["Latin", "Ines’s dress – 2 × ½ yard, £12"],
    ["Latin with marks", "Đường Hoa Sữa, ľahké, żółta, Nguyễn, Ħ, ő"],
    ["Greek", "Ελένη Καλογεράκη, ἀγάπη"],
    ["Cyrillic", "Швейная комната, Їжак, Љубав"],
    ["signs of currencies", "₦ ₹ ₵ ₫ ₱ ₺ ₽ ₴ ₸ ₡ ₮ € £ ¥ ¢"],
    ["fractions and arrows", "½ ¼ ¾ ⅛ ⅜ ⅝ ⅞ ³⁄₁₆ × ← ↑ → ↓ − ✓"],
  ])("sets %s as text", (_, text) => {
    expect(runs(text)).toEqual([`text:${text}`]);
  });

  it.each([
    ["Devanagari", "नंदिनी"],
    ["Thai", "ดอกไม้"],
    ["Japanese", "山田さくら"],
    ["emoji joined by joiners", "👩🏽‍🦰🧵"],
    ["a letter with a mark that has no letter of its own", "x̂"],
    ["a sign the font lacks", "₿"],
  ])("draws %s as one picture", (_, text) => {
    expect(runs(`Dress ${text} 27`)).toEqual(["text:Dress ", `picture:${text}`, "text: 27"]);
  });

  it("sets a mark that composes with its letter as text", () => {
    expect(runs("Nguye\u0302\u0303n")).toEqual(["text:Nguyễn"]);
  });

  it("keeps the gap between two words of one script in their picture", () => {
    expect(runs("नंदिनी शर्मा, Pune")).toEqual(["picture:नंदिनी शर्मा", "text:, Pune"]);
  });

  it("never cuts a grapheme", () => {
    const text = "a👩🏽‍🦰नि x̂ é";
    const letters = new Set(splitGraphemes(text));
    for (const { text: part } of splitRuns(text, printFonts.covers))
      for (const letter of splitGraphemes(part)) expect(letters).toContain(letter);
  });

  it("draws a line with right-to-left letters whole", () => {
    expect(runs("عباءة Size 12")).toEqual(["picture:عباءة Size 12"]);
    expect(runs("Dress for אמל")).toEqual(["picture:Dress for אמל"]);
  });

  it("leaves out what cannot be seen, and breaks no run over it", () => {
    expect(runs("Or\u00adchard\u200b\u2060 Row\ufeff")).toEqual(["text:Orchard Row"]);
    expect(runs("a\u0000b\u0007c")).toEqual(["text:abc"]);
    expect(runs("")).toEqual([]);
  });

  it("reads hyphens and spaces of every kind back as one kind", () => {
    expect(runs("Okoro\u2011Vale\u00a0\u202f7\u2003in")).toEqual(["text:Okoro-Vale  7 in"]);
    expect(tidy("a\r\nb\u2028c")).toBe("a\nb\nc");
  });

  it("takes a paragraph's direction from its first letter or mark", () => {
    expect(directionOf("12 عباءة Size")).toBe("rtl");
    expect(directionOf("Size عباءة")).toBe("ltr");
    expect(directionOf("\u200fSize")).toBe("rtl");
    expect(directionOf("12.50")).toBe("ltr");
  });
});

describe("fractions", () => {
  it.each([
    ["6 1/4 in", "6 ¼ in"],
    ["7/8", "⅞"],
    ["2 3/16 in", "2 ³⁄₁₆ in"],
    ["on 1/12/2025", "on 1/12/2025"],
    ["tel. 01632/960118", "tel. 01632/960118"],
    ["1/5 of the armhole", "1/5 of the armhole"],
  ])("%s", (typed, set) => {
    expect(setFractions(typed)).toBe(set);
    expect(runs(set)).toEqual([`text:${set}`]);
  });
});

describe("dates", () => {
  it("are the same day everywhere, in the reader's words", () => {
    expect(longDate("2025-12-01", "en-GB")).toBe("1 December 2025");
    expect(longDate("2025-01-31", "fr")).toBe("31 janvier 2025");
  });
  it("survive a language that is none and a date that is none", () => {
    expect(longDate("2025-12-01", "not a language")).toBe("1 December 2025");
    expect(longDate("last week", "en")).toBe("last week");
    expect(longDate("2025-99-99", "en")).toBe("2025-99-99");
  });
});
