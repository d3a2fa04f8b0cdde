import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { formatLength, formatPlain } from "@/lib/lengths/format-length";
import { phraseText } from "@/lib/lengths/phrase";
import { speakLength } from "@/lib/lengths/speak-length";
import { stepOf } from "@/lib/lengths/units";

// Source of 25.4: 1 in = 25.4 mm exactly, international yard, 1959 (exact).
const inches = (n: number) => n * 25.4;

describe("formatLength", () => {
  it.each([
    [inches(6.25), 8, "6 1/4 in"],
    [inches(0.625), 8, "5/8 in"],
    [inches(6), 8, "6 in"],
    [0, 8, "0 in"],
    [inches(6 + 1 / 16), 8, "6 1/8 in"],
    [inches(6 + 1 / 16), 16, "6 1/16 in"],
    [inches(5.97), 8, "6 in"],
    [inches(-0.5), 8, "-1/2 in"],
    [-0.1, 8, "0 in"],
  ] as const)("%f mm to 1/%i is %s", (mm, fineness, text) =>
    expect(formatPlain(mm, "in", fineness)).toBe(text),
  );

  it.each([
    [159, "15.9 cm"],
    [158.75, "15.9 cm"],
    [160, "16 cm"],
    [4, "0.4 cm"],
    [0, "0 cm"],
    [-12, "-1.2 cm"],
  ])("%f mm is %s", (mm, text) => expect(formatPlain(mm, "cm")).toBe(text));

  it("gives the parts of a stacked fraction", () => {
    expect(formatLength(inches(6.75), "in")).toEqual({
      negative: false,
      whole: 6,
      numerator: 3,
      denominator: 4,
      unit: "in",
      figure: "6 3/4",
      text: "6 3/4 in",
    });
    expect(formatLength(159, "cm")).toMatchObject({
      whole: 15,
      numerator: 9,
      denominator: 10,
      figure: "15.9",
    });
  });

  it("fractions are reduced, below 1, and within half a step of the length", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -5000, max: 5000, noNaN: true }),
        fc.constantFrom("in" as const, "cm" as const),
        fc.constantFrom(8 as const, 16 as const),
        (mm, unit, fineness) => {
          const { negative, whole, numerator, denominator } = formatLength(mm, unit, fineness);
          expect(numerator).toBeLessThan(denominator);
          if (unit === "in") {
            expect(numerator === 0 ? denominator === 1 : numerator % 2 === 1).toBe(true);
            expect(fineness % denominator).toBe(0);
          }
          const back = (negative ? -1 : 1) * (whole + numerator / denominator) * (unit === "in" ? 25.4 : 10);
          // Half a step, and 1e-6 mm for the tie rule's float noise.
          expect(Math.abs(back - mm)).toBeLessThanOrEqual(stepOf(unit, fineness) / 2 + 1e-6);
        },
      ),
    );
  });

  it("a length on a step is shown as that step, whatever float noise it came with", () => {
    fc.assert(
      fc.property(fc.nat(3000), fc.double({ min: -1e-9, max: 1e-9, noNaN: true }), (eighths, off) => {
        const { whole, numerator, denominator } = formatLength((eighths * 25.4) / 8 + off, "in");
        expect(whole * 8 + (numerator * 8) / denominator).toBe(eighths);
      }),
    );
  });
});

describe("stepOf", () => {
  it("is 3.175 mm, 1.5875 mm, or 1 mm", () => {
    expect(stepOf("in")).toBe(3.175);
    expect(stepOf("in", 16)).toBe(1.5875);
    expect(stepOf("cm", 16)).toBe(1);
  });
});

describe("speakLength", () => {
  it.each([
    [6.25, "six and a quarter inches"],
    [0.625, "five eighths of an inch"],
    [6.625, "six and five eighths inches"],
    [6.125, "six and an eighth inches"],
    [1, "one inch"],
    [1.5, "one and a half inches"],
    [0.5, "half an inch"],
    [0.25, "a quarter of an inch"],
    [0.75, "three quarters of an inch"],
    [0, "zero inches"],
    [21, "twenty-one inches"],
    [112, "one hundred and twelve inches"],
    [-0.5, "minus half an inch"],
  ])("%f in", (n, words) => expect(speakLength(inches(n), "in")).toBe(words));
  it("says sixteenths on request", () => {
    expect(speakLength(inches(2 + 3 / 16), "in", 16)).toBe("two and three sixteenths inches");
    expect(speakLength(inches(1 / 16), "in", 16)).toBe("a sixteenth of an inch");
  });
  it.each([
    [159, "fifteen point nine centimetres"],
    [10, "one centimetre"],
    [5, "zero point five centimetres"],
    [300, "thirty centimetres"],
  ])("%f mm", (mm, words) => expect(speakLength(mm, "cm")).toBe(words));
});

describe("phraseText", () => {
  it("sets lengths in the workshop's unit", () => {
    const phrase = ["The wrist is ", { mm: 152.4 }, "."];
    expect(phraseText(phrase, "in")).toBe("The wrist is 6 in.");
    expect(phraseText(phrase, "cm")).toBe("The wrist is 15.2 cm.");
  });
});
