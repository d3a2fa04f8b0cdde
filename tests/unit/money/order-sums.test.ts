import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { currency } from "@/lib/money/currencies";
import { decideGivingBack, decideTaking } from "@/lib/money/decide-payment";
import { type MoneyMoved, orderSums, type PricedLine, suggestedDeposit } from "@/lib/money/order-sums";

const pounds = currency("GBP")!;
const line = fc.record({ quantity: fc.integer({ min: 1, max: 99 }), unitMinor: fc.nat(10_000_000) });
const moved = fc.record({
  kind: fc.constantFrom("deposit" as const, "payment" as const, "giving-back" as const),
  amountMinor: fc.integer({ min: 1, max: 10_000_000 }),
});

describe("orderSums", () => {
  it("adds up an order", () => {
    const lines: PricedLine[] = [
      { quantity: 2, unitMinor: 4500 },
      { quantity: 1, unitMinor: 1999 },
    ];
    const payments: MoneyMoved[] = [
      { kind: "deposit", amountMinor: 5500 },
      { kind: "payment", amountMinor: 6000 },
      { kind: "giving-back", amountMinor: 501 },
    ];
    expect(orderSums(lines, payments)).toEqual({
      totalMinor: 10999,
      receivedMinor: 11500,
      givenBackMinor: 501,
      balanceMinor: 0,
      depositMinor: 5500,
    });
  });

  it("an order of nothing comes to nothing", () =>
    expect(orderSums([], [])).toEqual({
      totalMinor: 0,
      receivedMinor: 0,
      givenBackMinor: 0,
      balanceMinor: 0,
      depositMinor: 0,
    }));

  it.each([
    [[{ quantity: 0, unitMinor: 1 }], []],
    [[{ quantity: 1.5, unitMinor: 2 }], []],
    [[{ quantity: 1, unitMinor: -1 }], []],
    [[{ quantity: 1, unitMinor: 0.1 }], []],
    [[{ quantity: 2, unitMinor: Number.MAX_SAFE_INTEGER }], []],
    [[], [{ kind: "payment", amountMinor: 0 }]],
    [[], [{ kind: "giving-back", amountMinor: -5 }]],
  ] as [PricedLine[], MoneyMoved[]][])("refuses %j %j", (lines, payments) =>
    expect(() => orderSums(lines, payments)).toThrow(RangeError),
  );

  it("is integer, and its balance is total − received + given back", () => {
    fc.assert(
      fc.property(fc.array(line), fc.array(moved), (lines, payments) => {
        const sums = orderSums(lines, payments);
        expect(Object.values(sums).every(Number.isSafeInteger)).toBe(true);
        // The witness counts in BigInt, one item at a time.
        let owed = 0n;
        for (const l of lines) for (let i = 0; i < l.quantity; i += 1) owed += BigInt(l.unitMinor);
        for (const p of payments) owed += BigInt(p.kind === "giving-back" ? p.amountMinor : -p.amountMinor);
        expect(BigInt(sums.balanceMinor)).toBe(owed);
        expect(sums.depositMinor).toBeLessThanOrEqual(sums.receivedMinor);
      }),
    );
  });

  it("does not depend on the order of its lists", () => {
    fc.assert(
      fc.property(
        fc
          .array(line)
          .chain((l) => fc.tuple(fc.constant(l), fc.shuffledSubarray(l, { minLength: l.length }))),
        fc
          .array(moved)
          .chain((p) => fc.tuple(fc.constant(p), fc.shuffledSubarray(p, { minLength: p.length }))),
        ([lines, linesAgain], [payments, paymentsAgain]) => {
          expect(orderSums(linesAgain, paymentsAgain)).toEqual(orderSums(lines, payments));
        },
      ),
    );
  });

  it("is the sum of its parts, however they are parted", () => {
    fc.assert(
      fc.property(fc.array(line), fc.array(line), fc.array(moved), fc.array(moved), (l1, l2, p1, p2) => {
        const a = orderSums(l1, p1);
        const b = orderSums(l2, p2);
        const both = orderSums([...l1, ...l2], [...p1, ...p2]);
        for (const key of Object.keys(both) as (keyof typeof both)[]) expect(both[key]).toBe(a[key] + b[key]);
      }),
    );
  });
});

describe("taking and giving back", () => {
  const sums = orderSums([{ quantity: 1, unitMinor: 10000 }], [{ kind: "deposit", amountMinor: 5000 }]);
  it("takes up to the balance, asks above it, refuses nothing", () => {
    expect(decideTaking(sums, 5000, pounds, "en-GB")).toEqual({ ok: true });
    expect(decideTaking(sums, 5001, pounds, "en-GB")).toEqual({
      ok: true,
      say: "Only £50.00 is owed: £50.01 is £0.01 more. Keep it all the same?",
    });
    const paid = orderSums([], [{ kind: "payment", amountMinor: 1 }]);
    expect(decideTaking(paid, 100, pounds, "en-GB").say).toMatch(/Nothing is owed.*£1\.00/);
    expect(decideTaking(sums, 0, pounds).ok).toBe(false);
  });
  it("gives back no more than is held", () => {
    expect(decideGivingBack(sums, 5000, pounds, "en-GB")).toEqual({ ok: true });
    expect(decideGivingBack(sums, 5001, pounds, "en-GB")).toEqual({
      ok: false,
      say: "Only £50.00 can be given back. Type that or less.",
    });
    expect(decideGivingBack(orderSums([], []), 1, pounds).say).toMatch(/Nothing has been received/);
    expect(decideGivingBack(sums, -1, pounds).ok).toBe(false);
  });
  it("what is held never falls below nothing by an allowed giving-back", () => {
    fc.assert(
      fc.property(fc.array(moved), (asked) => {
        const kept: MoneyMoved[] = [];
        for (const one of asked) {
          const now = orderSums([], kept);
          const decision =
            one.kind === "giving-back"
              ? decideGivingBack(now, one.amountMinor, pounds)
              : decideTaking(now, one.amountMinor, pounds);
          if (decision.ok) kept.push(one);
        }
        const { receivedMinor, givenBackMinor } = orderSums([], kept);
        expect(givenBackMinor).toBeLessThanOrEqual(receivedMinor);
      }),
    );
  });
});

describe("suggestedDeposit", () => {
  // Deposit 50 % (sources: print, money, numbers; practice). The rounding up is common practice, no source.
  it.each([
    [10000, 5000],
    [12550, 6300],
    [1235000, 620000],
    [9800, 4900],
    [1, 1],
    [3, 2],
    [0, 0],
  ])("of %i is %i", (total, deposit) => expect(suggestedDeposit(total)).toBe(deposit));
  it("is whole, at least half, at most the total, and within a hundredth of the total above half", () => {
    fc.assert(
      fc.property(fc.maxSafeNat(), (total) => {
        const deposit = suggestedDeposit(total);
        expect(Number.isSafeInteger(deposit)).toBe(true);
        expect(BigInt(deposit) * 2n >= BigInt(total) && deposit <= total).toBe(true);
        expect(deposit - total / 2).toBeLessThanOrEqual(Math.max(1, total / 100));
      }),
    );
  });
});
