import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { lengthField } from "@/lib/lengths/length-field";
import { parseLength } from "@/lib/lengths/parse-length";
import { formatLength } from "@/lib/lengths/format-length";
import { westernDigits } from "@/lib/lengths/western-digits";

// Source of 25.4: 1 in = 25.4 mm exactly, international yard, 1959 (sources: print, money, numbers; exact).
const inches = (n: number) => n * 25.4;

const mmOf = (text: string, unit: "in" | "cm" = "in") => {
  const read = parseLength(text, unit);
  if (!read.ok) throw new Error(`${text}: ${read.say}`);
  return read.mm;
};
const refusal = (text: string, unit: "in" | "cm" = "in") => {
  const read = parseLength(text, unit);
  if (read.ok) throw new Error(`${text} was taken as ${read.mm}`);
  return read.say;
};

describe("parseLength: what is taken", () => {
  it.each([
    "6 1/4",
    "6¼",
    "6 ¼",
    "6-1/4",
    "6 - 1/4",
    "6–¼",
    "6.25",
    "6,25",
    '6 1/4"',
    "6 1/4″",
    "6 1/4”",
    "6 1/4''",
    "6 1/4 in",
    "6 1/4 in.",
    "6 1/4 inches",
    "6¼in",
    "6 1⁄4",
    "6¹⁄₄",
    "6 1 / 4",
    "6\u00a01/4",
    "6\u202f1/4\u00a0in",
    "  6 1/4  ",
    "٦٫٢٥",
    "٦ ١/٤",
    "६ १/४",
    "६.२५",
    "６ １／４",
    "6 2/8",
    "6 1/4 IN",
    "158.75 mm",
    "15.875 cm",
  ])("%s is 6 1/4 in", (text) => expect(mmOf(text)).toBeCloseTo(inches(6.25), 9));

  it.each([
    ["⅛", 1 / 8],
    ["⅜", 3 / 8],
    ["⅝", 5 / 8],
    ["⅞", 7 / 8],
    ["½", 1 / 2],
    ["¾", 3 / 4],
    ["3/16", 3 / 16],
    [".5", 0.5],
    ["6.", 6],
    ["0", 0],
    ["12", 12],
    ["12⅞", 12 + 7 / 8],
  ])("%s", (text, n) => expect(mmOf(text)).toBeCloseTo(inches(n), 9));

  it("reads a bare number in the workshop's unit, and a named unit whatever the workshop's", () => {
    expect(mmOf("15.9", "cm")).toBeCloseTo(159, 9);
    expect(mmOf("15,9 cm", "in")).toBeCloseTo(159, 9);
    expect(mmOf("159mm", "in")).toBe(159);
    expect(mmOf("6 1/4 in", "cm")).toBeCloseTo(158.75, 9);
    expect(mmOf("15 1/2", "cm")).toBeCloseTo(155, 9);
    expect(mmOf("1.5 m", "in")).toBe(1500);
    expect(mmOf("2 1/2 yd", "cm")).toBeCloseTo(2286, 9); // 36 in to the yard, exact
  });

  it("keeps what was typed, to the letter", () => {
    expect(parseLength(" 6¼ in ", "in")).toEqual({ ok: true, mm: 158.75, typed: " 6¼ in " });
  });
});

describe("parseLength: what is refused, and what to type instead", () => {
  it.each([
    ["8 5/4", /type 9 1\/4/],
    ["8 4/4", /type 9\./],
    ["5/4", /type 1 1\/4/],
    ["1/0", /0 below the line.*1\/8/],
    ["6 1/0", /0 below the line/],
    ["-3", /without the minus/],
    ["−3", /without the minus/],
    ["- 3 cm", /without the minus/],
    ["-¼", /without the minus/],
    ["6 1/4 1/2", /more than one fraction/],
    ["abc", /Type a number, such as 6 1\/4/],
    ["", /Type a length, such as 6 1\/4/],
    ["   ", /Type a length/],
    ["6.5 1/2", /either a fraction or decimals/],
    ["6 4", /two numbers/],
    ["6.2.5", /one number/],
    ["1,250.5", /one number/],
    ["6 ells", /in, cm or mm/],
    ["6 ft 2 in", /Type/],
    ["1/", /Type/],
    ["/", /Type/],
    [".", /Type/],
    ["6 1/4 in 2 cm", /Type/],
    ["5001 mm", /longer than 196 7\/8 in/],
    ["200", /longer than/],
    ["9".repeat(400), /longer than/],
  ])("%s", (text, say) => expect(refusal(text)).toMatch(say));

  it("gives an example in the workshop's unit", () =>
    expect(refusal("", "cm")).toBe("Type a length, such as 15.9."));
  it("takes 5 m and refuses the next millimetre", () => {
    expect(mmOf("5 m")).toBe(5000);
    expect(refusal("500.1", "cm")).toMatch(/longer than 500 cm/);
  });
  it("keeps to a form's own limits", () => {
    expect(parseLength("0", "cm", { leastMm: 1 }).ok).toBe(false);
    expect(parseLength("30 m", "cm", { mostMm: 50_000 })).toMatchObject({ ok: true, mm: 30_000 });
  });
});

describe("parseLength: properties", () => {
  it("answers any text without throwing, and only ever with a length in bounds or a sentence", () => {
    const piece = fc.constantFrom(..."0123456789 /.,-¼½⅞⁄\"'incm٣५", " ", "in", "cm");
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: "grapheme" }),
          fc.array(piece, { maxLength: 14 }).map((p) => p.join("")),
        ),
        fc.constantFrom("in" as const, "cm" as const),
        (text, unit) => {
          const read = parseLength(text, unit);
          if (read.ok) {
            expect(read.mm).toBeGreaterThanOrEqual(0);
            expect(read.mm).toBeLessThanOrEqual(5000);
            expect(read.typed).toBe(text);
          } else expect(read.say).toMatch(/[Tt]ype .*\.$/s);
        },
      ),
      { numRuns: 2000 },
    );
  });

  it("round trip: what is shown reads back as the same step", () => {
    fc.assert(
      fc.property(
        fc.nat(5000 * 4),
        fc.constantFrom("in" as const, "cm" as const),
        fc.constantFrom(8 as const, 16 as const),
        (q, unit, fineness) => {
          const mm = q / 4;
          const shown = formatLength(mm, unit, fineness);
          // Showing 5 m itself in inches goes up past the limit; the reading is given room for one step.
          for (const text of [shown.text, shown.figure]) {
            const read = parseLength(text, unit, { mostMm: 5010 });
            expect(read.ok && formatLength(read.mm, unit, fineness).text).toBe(shown.text);
            // 1/2 of 1/8 in is 1.5875 mm; half a millimetre under cm. Tolerance 1e-6 mm for the float sum.
            if (read.ok)
              expect(Math.abs(read.mm - mm)).toBeLessThanOrEqual(
                (unit === "in" ? 25.4 / fineness : 1) / 2 + 1e-6,
              );
          }
        },
      ),
    );
  });
});

describe("westernDigits", () => {
  it("agrees with the numbering of Intl for many scripts", () => {
    for (const system of [
      "arab",
      "arabext",
      "deva",
      "beng",
      "thai",
      "mymr",
      "fullwide",
      "mathbold",
      "mathsans",
    ]) {
      const written = new Intl.NumberFormat(`en-u-nu-${system}`, { useGrouping: false }).format(9876543210);
      expect(westernDigits(written), system).toBe("9876543210");
    }
  });
});

describe("lengthField", () => {
  it("gives typed and mm, or the sentence", () => {
    expect(lengthField("in").parse("6¼")).toEqual({ typed: "6¼", mm: 158.75 });
    expect(lengthField("in").safeParse("8 5/4").error?.issues[0]?.message).toMatch(/type 9 1\/4/);
    expect(lengthField("cm", { leastMm: 1 }).safeParse("0").success).toBe(false);
  });
});
