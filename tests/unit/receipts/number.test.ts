import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { receiptNumber, seriesOf } from "@/lib/receipts/number";

describe("receipt numbers", () => {
  it("are a series and a count", () => {
    expect(receiptNumber("7KQ4MX", 12)).toBe("7KQ4MX-0012");
    expect(receiptNumber("7KQ4MX", 12345)).toBe("7KQ4MX-12345");
  });

  it("have a series of six signs that cannot be misread, the same for a device at all times", () => {
    fc.assert(
      fc.property(fc.uuid({ version: 4 }), (device) => {
        // Crockford's base 32 leaves I, L, O and U out (memory).
        expect(seriesOf(device)).toMatch(/^[0-9A-HJKMNP-TV-Z]{6}$/);
        expect(seriesOf(device)).toBe(seriesOf(device));
      }),
    );
  });

  it("differ from device to device", () => {
    // 30 random bits: among 400 devices the chance of a repeat is under 1 in 10,000 (birthday bound, calc).
    const devices = fc.sample(fc.uuid({ version: 4 }), { numRuns: 400, seed: 7 });
    expect(new Set(devices.map(seriesOf)).size).toBe(new Set(devices).size);
  });

  it("never come twice from one device", () => {
    const numbers = Array.from({ length: 12_000 }, (_, i) => receiptNumber("7KQ4MX", i + 1));
    expect(new Set(numbers).size).toBe(numbers.length);
  });
});
