import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Clock, newClock, observe, readStamp, tick, writeStamp } from "@/lib/clock/stamp";

const device = "0b8a2c1e-5a5e-4c53-9f0e-6f6f1d1e2a3b";
const wallClock = fc.integer({ min: 0, max: 2 ** 45 });

describe("C2 stamps", () => {
  it("sort as text in the order they were given, whatever the wall clock does", () => {
    fc.assert(
      fc.property(fc.array(wallClock, { minLength: 2, maxLength: 60 }), (times) => {
        let clock: Clock = newClock;
        let before = "";
        for (const now of times) {
          clock = tick(clock, now);
          const stamp = writeStamp(clock, device);
          expect(stamp > before).toBe(true);
          before = stamp;
        }
      }),
    );
  });

  it("borrow the next millisecond when a millisecond's counter is full", () => {
    const full = { ms: 5, counter: 0xffff };
    const next = tick(full, 5);
    expect(writeStamp(next, device) > writeStamp(full, device)).toBe(true);
    expect(next).toEqual({ ms: 6, counter: 0 });
  });

  it("are read back as they were written", () => {
    fc.assert(
      fc.property(wallClock, fc.integer({ min: 0, max: 0xffff }), (ms, counter) => {
        expect(readStamp(writeStamp({ ms, counter }, device))).toEqual({ ms, counter, device });
      }),
    );
    expect(() => readStamp("yesterday")).toThrow("Not a stamp");
  });

  it("given after one was seen sort after it, and the clock never runs back", () => {
    fc.assert(
      fc.property(wallClock, wallClock, wallClock, (mine, seen, now) => {
        const seenStamp = writeStamp({ ms: seen, counter: 3 }, device);
        const after = tick(observe({ ms: mine, counter: 0 }, seenStamp), now);
        expect(writeStamp(after, device) > seenStamp).toBe(true);
        expect(after.ms).toBeGreaterThanOrEqual(mine);
      }),
    );
  });
});
