import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { currencies, currency, type Currency } from "@/lib/money/currencies";
import { formatMoney, moneyFigure } from "@/lib/money/format-money";
import { parseMoney } from "@/lib/money/parse-money";

const of = (code: string): Currency => {
  const found = currency(code);
  if (!found) throw new Error(code);
  return found;
};
const minor = (text: string, code = "GBP") => {
  const read = parseMoney(text, of(code));
  if (!read.ok) throw new Error(`${text}: ${read.say}`);
  return read.minor;
};
const refusal = (text: string, code = "GBP") => {
  const read = parseMoney(text, of(code));
  if (read.ok) throw new Error(`${text} was taken as ${read.minor}`);
  return read.say;
};

describe("currency", () => {
  // ISO 4217 minor units: JPY 0, most 2, BHD 3 (sources: print, money, numbers).
  it.each([
    ["JPY", 0],
    ["GBP", 2],
    ["NGN", 2],
    ["KES", 2],
    ["INR", 2],
    ["BHD", 3],
    ["KWD", 3],
    ["UGX", 0],
    ["XOF", 0],
  ])("%s has %i decimals", (code, digits) => expect(currency(code)).toMatchObject({ code, digits }));
  it("reads either case, and knows no metal, fund or made-up code", () => {
    expect(currency(" eur ")).toMatchObject({ code: "EUR", name: "Euro" });
    for (const code of ["XAU", "XTS", "XXX", "XDR", "CHE", "CLF", "USN", "ZZZ", ""])
      expect(currency(code)).toBeUndefined();
  });
  it("every one is known to Intl too, an outside witness", () => {
    const known = new Set(Intl.supportedValuesOf("currency"));
    expect(currencies().length).toBeGreaterThan(140);
    // VED is ISO's second code for the bolívar; Intl has VES alone.
    for (const { code } of currencies()) expect(known.has(code) || code === "VED", code).toBe(true);
  });
});

describe("parseMoney", () => {
  it.each([
    ["1250", 125000],
    ["1,250.50", 125050],
    ["1.250,50", 125050],
    ["1 250", 125000],
    ["1 250,5", 125050],
    ["1\u202f250,50", 125050],
    ["1'250.50", 125050],
    ["1’250", 125000],
    ["1,250", 125000],
    ["1.250", 125000],
    ["1,250,000", 125000000],
    ["12,50,000.75", 125000075],
    ["12.5", 1250],
    ["12,5", 1250],
    ["12.", 1200],
    [".50", 50],
    ["£.50", 50],
    ["0,50", 50],
    ["0", 0],
    ["12.500000", 1250],
    ["£1,250.50", 125050],
    ["GBP 12", 1200],
    ["12 gbp", 1200],
    ["12/-", 1200],
    ["12.-", 1200],
    ["١٬٢٥٠٫٥٠", 125050],
    ["१२", 1200],
  ])("%s", (text, n) => expect(minor(text)).toBe(n));

  it.each([
    ["KSh 1,250", "KES", 125000],
    ["Ksh.1250/=", "KES", 125000],
    ["₦5000", "NGN", 500000],
    ["R 12.50", "ZAR", 1250],
    ["Rs. 500", "PKR", 50000],
    ["¥1,250", "JPY", 1250],
    ["1.250", "JPY", 1250],
    ["1,250", "BHD", 1250],
    ["1,250.500", "BHD", 1250500],
    ["2.5", "BHD", 2500],
    ["12.00", "JPY", 12],
  ])("%s in %s", (text, code, n) => expect(minor(text, code)).toBe(n));

  it.each([
    ["12.345678", "GBP", /2 figures after the point.*1250\.50/],
    ["0.125", "GBP", /2 figures/],
    ["12.50", "JPY", /whole number, such as 1250\./],
    ["2.5001", "BHD", /3 figures.*1250\.500/],
    ["-5", "GBP", /without the minus/],
    ["−5", "GBP", /without the minus/],
    ["£-5", "GBP", /without the minus/],
    ["five", "GBP", /figures only/],
    ["12 hats", "GBP", /in GBP\. Type figures only/],
    ["$12", "GBP", /in GBP/],
    ["", "GBP", /Type an amount, such as 1250\.50/],
    ["1,25", "JPY", /whole number/],
    ["1,2,3", "GBP", /without spaces or commas/],
    ["1 2", "GBP", /without spaces/],
    ["1.2.3,4,5", "GBP", /without spaces/],
    [".", "GBP", /Type/],
    ["99999999999999999", "GBP", /too large/],
  ])("%s in %s is refused", (text, code, say) => expect(refusal(text, code)).toMatch(say));

  it("answers any text without throwing, with whole minor units or a sentence", () => {
    const piece = fc.constantFrom(..."0123456789 ., '-£$€/=kR٣");
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: "grapheme" }),
          fc.array(piece, { maxLength: 12 }).map((p) => p.join("")),
        ),
        fc.constantFrom("GBP", "JPY", "BHD"),
        (text, code) => {
          const read = parseMoney(text, of(code));
          if (read.ok) expect(Number.isSafeInteger(read.minor) && read.minor >= 0).toBe(true);
          else expect(read.say).toMatch(/Type .*\.$/);
        },
      ),
      { numRuns: 2000 },
    );
  });
});

describe("formatMoney", () => {
  it("shows the currency's own decimals", () => {
    expect(formatMoney(125050, of("GBP"), "en-GB")).toBe("£1,250.50");
    expect(formatMoney(1250, of("JPY"), "en-GB")).toBe("¥1,250");
    expect(formatMoney(1250, of("BHD"), "en-GB")).toMatch(/1\.250$/);
    expect(formatMoney(-50, of("GBP"), "en-GB")).toBe("-£0.50");
  });
  it("makes no float error up to 2^53", () => {
    expect(formatMoney(Number.MAX_SAFE_INTEGER, of("GBP"), "en-GB")).toBe("£90,071,992,547,409.91");
    expect(formatMoney(Number.MAX_SAFE_INTEGER - 1, of("GBP"), "en-GB")).toBe("£90,071,992,547,409.90");
    expect(() => formatMoney(0.5, of("GBP"))).toThrow(RangeError);
  });
  it("round trip: what is shown reads back as the same amount, in writings of five places", () => {
    fc.assert(
      fc.property(
        fc.maxSafeNat(),
        fc.constantFrom("GBP", "NGN", "INR", "JPY", "BHD", "EUR"),
        fc.constantFrom("en-GB", "de-DE", "fr-FR", "en-IN", "de-CH"),
        (amount, code, locale) => {
          expect(parseMoney(formatMoney(amount, of(code), locale), of(code))).toEqual({
            ok: true,
            minor: amount,
          });
          expect(parseMoney(moneyFigure(amount, of(code)), of(code))).toEqual({ ok: true, minor: amount });
        },
      ),
    );
  });
});
