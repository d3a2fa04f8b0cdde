import { describe, expect, it } from "vitest";
import { phraseText } from "@/lib/lengths/phrase";
import { comparedIds, comparedRows } from "@/lib/sleeves/compare";
import { boundsPhrase, countLine, headLine, sourceLine } from "@/lib/sleeves/head-line";
import { styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import { suggestedName } from "@/lib/sleeves/sleeve-name";
import { child, good, record, woman } from "./helpers";

const says = (ask: typeof child, unit: "in" | "cm" = "in") => {
  const line = headLine(styleFromRecord({ style: "plain", ask })!, ask);
  return [line.verdict, phraseText(line.phrase, unit)];
};

describe("whether it goes in, said first", () => {
  it("gives cap, armhole and ease", () => {
    const [verdict, text] = says(woman);
    expect(verdict).toBe("good");
    expect(text).toBe("Goes into the armhole: cap 17 1/2 in, armhole 16 1/4 in, ease 1 1/4 in.");
  });

  it("says by how much a cap is too short, in either unit", () => {
    const short = { ...child, lengths: { ...child.lengths, ...record({ armholeWhole: 20 }).lengths } };
    expect(says(short)[0]).toBe("wrong");
    expect(says(short)[1]).toMatch(
      /^Does not go into the armhole: cap 18 5\/8 in, armhole 20 in, .* too short\.$/u,
    );
    expect(says(short, "cm")[1]).toMatch(/armhole 50\.8 cm/u);
  });

  it("says which half fails where the whole would do", () => {
    const lopsided = record({
      length: 9.5,
      capDepth: 6.25,
      biceps: 12,
      hem: 11,
      armholeFront: 10,
      armholeBack: 7,
    });
    expect(says(lopsided)[1]).toMatch(/the front of the cap is .* shorter than its half/u);
  });

  it("says what is in the way, or what is still to be typed", () => {
    expect(says(record({ length: 4, capDepth: 6, biceps: 12, hem: 11 }))[1]).toMatch(/^Cannot be drawn\. /u);
    expect(says(child)).toEqual([
      "plain",
      "Cap seam 18 5/8 in. Type the armhole below to see whether it goes in.",
    ]);
  });

  it("judges no halves that nobody measured", () => {
    const whole = record({ length: 9.5, armholeWhole: 17, biceps: 12, hem: 11 });
    const ids = good(whole).checks.map(({ id }) => id);
    expect(ids).toContain("head-ease");
    expect(ids).not.toContain("cap-front");
    expect(ids).not.toContain("balance");
  });
});

describe("checks in words", () => {
  it("counts them, worst first", () => {
    const { checks } = good(woman);
    expect(countLine(checks)).toMatch(/good$/u);
    expect(countLine([])).toBe("");
  });

  it("gives bounds and source, and does not say a source twice", () => {
    expect(phraseText(boundsPhrase({ low: 50.8, high: 101.6 }), "in")).toBe("Between 2 in and 4 in.");
    expect(phraseText(boundsPhrase({ low: 50.8, high: Infinity }), "in")).toBe("2 in or more.");
    expect(phraseText(boundsPhrase({ high: 12.7 }), "in")).toBe("1/2 in or less.");
    expect(boundsPhrase({ low: 0, high: 0 })).toEqual([]);
    expect(sourceLine({ source: "common practice, no source", mark: "practice" })).toBe(
      "common practice, no source",
    );
    expect(sourceLine({ source: "Ingalls", mark: "seen" })).toBe("Ingalls (read in the source)");
  });
});

describe("sleeves side by side", () => {
  it("sets each against the first, and says where one has no such figure", () => {
    const rows = comparedRows(
      [child, woman].map((ask) => ({ record: ask, made: styleFromRecord({ style: "plain", ask }) })),
    );
    const row = (name: string) => rows.find((one) => one.name === name)!;
    expect(row("Sleeve length").differences[0]).toBeNull();
    expect(row("Sleeve length").differences[1]).toBeCloseTo((21.4 - 9.5) * 25.4, 9);
    expect(row("Armhole").values[0]).toBeNull();
    expect(row("Armhole").differences[1]).toBeNull();
  });

  it("takes at most four, each once", () => {
    expect(comparedIds("a,b,a,,c,d,e")).toEqual(["a", "b", "c", "d"]);
    expect(comparedIds(null)).toEqual([]);
  });
});

describe("a sleeve's name", () => {
  it.each([
    ["Mina", "Mina’s sleeve, 3 Mar 2026"],
    ["Anders", "Anders’ sleeve, 3 Mar 2026"],
    [" ", "Sleeve, 3 Mar 2026"],
    [null, "Sleeve, 3 Mar 2026"],
  ])("%j", (name, expected) => expect(suggestedName(name, "3 Mar 2026")).toBe(expected));
});
