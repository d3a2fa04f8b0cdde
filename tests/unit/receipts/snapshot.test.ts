import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Payment, type PaymentKind, type PaymentMethod } from "@/lib/records/types";
import { rowSchemas } from "@/lib/records/schemas";
import { receiptDocument } from "@/lib/receipts/document";
import { earlierPayments, receiptSnapshot, type SnapshotAsk } from "@/lib/receipts/snapshot";
import { client, order, workshop } from "../orders/support";

const kind = fc.constantFrom<PaymentKind>("deposit", "payment", "giving-back");
const method = fc.constantFrom<PaymentMethod>("cash", "transfer", "card");
const amount = fc.integer({ min: 1, max: 10_000_000 });
const asks: fc.Arbitrary<SnapshotAsk> = fc.record({
  workshop: fc.constant(workshop),
  client: fc.constantFrom(client, null),
  order: fc.record({ occasion: fc.string(), currency: fc.constantFrom("GBP", "JPY", "BHD") }),
  lines: fc.array(
    fc.record({
      text: fc.string(),
      quantity: fc.integer({ min: 1, max: 99 }),
      unitMinor: fc.nat(10_000_000),
    }),
    { maxLength: 8 },
  ),
  earlier: fc.array(
    fc.record({
      number: fc.stringMatching(/^[0-9A-Z]{6}-\d{4}$/),
      paidOn: fc.constantFrom("2026-03-01", "2026-03-20"),
      kind,
      amountMinor: amount,
    }),
    { maxLength: 6 },
  ),
  payment: fc.record({ kind, method, amountMinor: amount }),
  cautions: fc.array(fc.string()),
});

const signed = ({ kind, amountMinor }: { kind: PaymentKind; amountMinor: number }) =>
  kind === "giving-back" ? -amountMinor : amountMinor;
const sum = (amounts: number[]) => amounts.reduce((all, one) => all + one, 0);

describe("a receipt's snapshot", () => {
  it("adds up: total of the lines, received, and the balance between them", () => {
    fc.assert(
      fc.property(asks, (ask) => {
        const snapshot = receiptSnapshot(ask);
        expect(snapshot.lines.every((l) => l.amountMinor === l.quantity * l.unitMinor)).toBe(true);
        expect(snapshot.totalMinor).toBe(sum(snapshot.lines.map(({ amountMinor }) => amountMinor)));
        expect(snapshot.receivedMinor).toBe(sum([...snapshot.earlier, snapshot.payment].map(signed)));
        // total − received + given back
        const moved = [...ask.earlier, ask.payment];
        const taken = sum(moved.filter((m) => m.kind !== "giving-back").map((m) => m.amountMinor));
        const back = sum(moved.filter((m) => m.kind === "giving-back").map((m) => m.amountMinor));
        expect(snapshot.balanceMinor).toBe(snapshot.totalMinor - taken + back);
        expect(snapshot.balanceMinor).toBe(snapshot.totalMinor - snapshot.receivedMinor);
      }),
    );
  });

  it("lists what moved before with its numbers, and is of the shape that a copy reads back", () => {
    fc.assert(
      fc.property(asks, (ask) => {
        const snapshot = receiptSnapshot(ask);
        expect(snapshot.earlier).toEqual(ask.earlier);
        const row = {
          workshopId: "0190a000-0000-7000-8000-000000000001",
          id: "0190a000-0000-7000-8000-000000000002",
          stamps: {},
          removedAt: null,
          paymentId: "0190a000-0000-7000-8000-000000000003",
          orderId: "0190a000-0000-7000-8000-000000000004",
          number: "7KQ4MX-0001",
          issuedOn: "2026-03-20",
          snapshot,
        };
        expect(rowSchemas.receipts.parse(row).snapshot).toEqual(snapshot);
      }),
    );
  });

  it("is a chain: each receipt's balance is the one before less what was received", () => {
    fc.assert(
      fc.property(
        asks,
        fc.array(fc.record({ kind, method, amountMinor: amount }), { minLength: 1 }),
        (ask, paid) => {
          const earlier: SnapshotAsk["earlier"] = [];
          let balance = sum(ask.lines.map(({ quantity, unitMinor }) => quantity * unitMinor));
          for (const [i, payment] of paid.entries()) {
            const snapshot = receiptSnapshot({ ...ask, earlier: [...earlier], payment });
            balance -= signed(payment);
            expect(snapshot.balanceMinor).toBe(balance);
            earlier.push({ number: `7KQ4MX-${i}`, paidOn: "2026-03-01", ...payment });
          }
        },
      ),
    );
  });

  it("keeps nothing of what it was made from: a later change of the order does not reach it", () => {
    const lines = [{ text: "Dress", quantity: 1, unitMinor: 8150 }];
    const cautions = ["Mind the cords."];
    const payment = { kind: "deposit" as const, method: "cash" as const, amountMinor: 100 };
    const snapshot = receiptSnapshot({ workshop, client, order, lines, earlier: [], payment, cautions });
    const before = JSON.stringify(snapshot);
    lines[0]!.unitMinor = 1;
    cautions.push("More.");
    payment.amountMinor = 1;
    expect(JSON.stringify(snapshot)).toBe(before);
  });

  it("names seller and buyer, with the lines of their addresses", () => {
    const payment = { kind: "deposit" as const, method: "cash" as const, amountMinor: 100 };
    const { seller, buyer } = receiptSnapshot({
      workshop,
      client,
      order,
      lines: [],
      earlier: [],
      payment,
      cautions: [],
    });
    expect(seller).toEqual({
      name: "Wren Lane Sewing Room",
      lines: ["2 Wren Lane", "Hollowby", "020 7946 0152"],
    });
    expect(buyer).toEqual({ name: "Amara Bello", lines: ["9 Tallow Street"] });
  });

  it("finds each payment's number; one that has not come to this phone stays empty", () => {
    const payment = (id: string): Payment =>
      ({ id, kind: "deposit", amountMinor: 100, paidOn: "2026-03-01" }) as Payment;
    expect(
      earlierPayments([payment("a"), payment("b")], [{ paymentId: "b", number: "7KQ4MX-0002" }]).map(
        ({ number }) => number,
      ),
    ).toEqual(["", "7KQ4MX-0002"]);
  });
});

describe("a receipt in words", () => {
  const lines = [
    { text: "Dress, Ife", quantity: 1, unitMinor: 6800 },
    { text: "Lace", quantity: 3, unitMinor: 450 },
  ];
  const deposit = {
    number: "7KQ4MX-0001",
    paidOn: "2026-03-01",
    kind: "deposit" as const,
    amountMinor: 4100,
  };
  const say = (over: Partial<SnapshotAsk>) =>
    receiptDocument(
      {
        number: "7KQ4MX-0002",
        issuedOn: "2026-03-20",
        snapshot: receiptSnapshot({
          workshop,
          client,
          order,
          lines,
          earlier: [deposit],
          payment: { kind: "payment", method: "cash", amountMinor: 4050 },
          cautions: [],
          ...over,
        }),
      },
      { lang: "en-GB", unit: "in" },
    );

  it("says the balance was paid", () => {
    expect(say({})).toMatchObject({
      number: "7KQ4MX-0002",
      issuedOn: "2026-03-20",
      title: "Receipt",
      orderTitle: "Naming day",
      lines: [
        { text: "Dress, Ife", quantity: "1", unitText: "£68.00", amountText: "£68.00" },
        { text: "Lace", quantity: "3", unitText: "£4.50", amountText: "£13.50" },
      ],
      totalText: "£81.50",
      payment: { label: "Balance", methodLabel: "Cash", amountText: "£40.50" },
      earlier: [{ date: "2026-03-01", number: "7KQ4MX-0001", label: "Deposit", amountText: "£41.00" }],
      receivedText: "£81.50",
      balanceLabel: "Paid in full, balance",
      balanceText: "£0.00",
      tape: "inch",
    });
  });

  it("says what is still to pay after a deposit", () => {
    const doc = say({ earlier: [], payment: { kind: "deposit", method: "transfer", amountMinor: 4100 } });
    expect(doc).toMatchObject({
      payment: { label: "Deposit", methodLabel: "Bank transfer" },
      balanceLabel: "Balance to pay",
      balanceText: "£40.50",
    });
  });

  it("says that it is a part, while more is to come", () => {
    const doc = say({ payment: { kind: "payment", method: "card", amountMinor: 1 } });
    expect(doc.payment).toEqual({ label: "Part payment", methodLabel: "Card", amountText: "£0.01" });
    expect(doc.balanceText).toBe("£40.49");
  });

  it("says what was given back, and takes it off in later ones", () => {
    const back = { kind: "giving-back" as const, method: "cash" as const, amountMinor: 1000 };
    expect(say({ payment: back })).toMatchObject({
      title: "Money given back",
      payment: { label: "", amountText: "£10.00" },
      receivedText: "£31.00",
      balanceText: "£50.50",
    });
    expect(say({ payment: back })).not.toHaveProperty("thanks");
    const later = say({ earlier: [deposit, { ...back, number: "7KQ4MX-0002", paidOn: "2026-03-02" }] });
    expect(later.earlier[1]).toMatchObject({ label: "Given back", amountText: "-£10.00" });
  });

  it("says what is to be given back where more came in than was agreed", () => {
    expect(say({ lines: [] })).toMatchObject({ balanceLabel: "To be given back", balanceText: "£81.50" });
  });

  it("goes by the currency of the order, not of the workshop", () => {
    expect(say({ order: { ...order, currency: "JPY" } }).totalText).toBe("¥8,150");
  });

  it("stands in for what is not set down", () => {
    expect(say({ client: null, order: { ...order, occasion: "" } })).toMatchObject({
      buyer: { name: "The client", lines: [] },
      orderTitle: "Sewing to order",
    });
  });
});
