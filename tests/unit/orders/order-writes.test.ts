import { describe, expect, it } from "vitest";
import { orderSums } from "@/lib/money/order-sums";
import { emptyGarment, emptyLine, emptyOrder, type OrderValues, orderValues } from "@/lib/orders/order-form";
import { changeOrderWrites, newOrderWrites } from "@/lib/orders/order-writes";
import { decideMoney, emptyMoney, moneySchema, moneyWrites } from "@/lib/orders/take-money";
import { client, countedIds, countedNumbers, fieldsOf, order, pounds, rowsAfter, workshop } from "./support";

const values: OrderValues = {
  ...emptyOrder("o"),
  occasion: "  Naming   day ",
  dueOn: "2026-03-20",
  garments: [
    { ...emptyGarment("garment-1"), kind: " Dress ", wearerId: "ife", setId: "s1", fittingOn: "2026-03-10" },
    emptyGarment("garment-2"),
    { ...emptyGarment("garment-3"), kind: "Blouse" },
  ],
  lines: [
    { ...emptyLine("line-1"), garmentId: "garment-1", text: "Dress, Ife", price: "68" },
    { ...emptyLine("line-2"), garmentId: "garment-2", text: "Lace", quantity: "3", price: "4.50" },
    emptyLine("line-3"),
  ],
  deposit: { taken: "now", amount: "41", method: "transfer" },
};

const newWrites = (over: Partial<OrderValues> = {}) =>
  newOrderWrites(
    {
      values: { ...values, ...over },
      client,
      workshop,
      currency: pounds,
      today: "2026-03-01",
      cautions: ["Mind the cords."],
      receiptId: "r",
      id: countedIds(),
    },
    countedNumbers(),
  );

describe("keeping a new order", () => {
  it("makes all of it in one change", () => {
    const writes = newWrites();
    expect(writes.every(({ makes }) => makes)).toBe(true);
    expect(fieldsOf(writes, "orders")).toEqual([
      {
        id: "o",
        makes: true,
        removedAt: null,
        clientId: "c",
        occasion: "Naming day",
        agreedOn: "2026-03-01",
        dueOn: "2026-03-20",
        stage: "agreed",
        currency: "GBP",
        note: "",
      },
    ]);
    const garments = fieldsOf(writes, "garments");
    expect(garments).toMatchObject([
      { kind: "Dress", wearerId: "ife", setId: "s1", sleeveId: null, fittingOn: "2026-03-10", position: 0 },
      { kind: "Blouse", wearerId: null, setId: null, fittingOn: null, position: 1 },
    ]);
    expect(fieldsOf(writes, "priceLines")).toMatchObject([
      { text: "Dress, Ife", quantity: 1, unitMinor: 6800, garmentId: garments[0]!.id, position: 0 },
      // Its garment was left blank, so it is for the order as a whole.
      { text: "Lace", quantity: 3, unitMinor: 450, garmentId: null, position: 1 },
    ]);
    const ids = writes.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it("makes the deposit's receipt along with it, which adds up", () => {
    const writes = newWrites();
    const [payment] = fieldsOf(writes, "payments");
    expect(payment).toMatchObject({
      kind: "deposit",
      method: "transfer",
      amountMinor: 4100,
      paidOn: "2026-03-01",
    });
    const [receipt] = fieldsOf(writes, "receipts");
    expect(receipt).toMatchObject({
      id: "r",
      paymentId: payment!.id,
      orderId: "o",
      number: "7KQ4MX-0001",
      snapshot: {
        occasion: "Naming day",
        totalMinor: 8150,
        receivedMinor: 4100,
        balanceMinor: 4050,
        cautions: ["Mind the cords."],
        earlier: [],
      },
    });
  });

  it("makes no payment where none was taken, whatever stands in the field", () => {
    const writes = newWrites({ deposit: { ...values.deposit, taken: "later" } });
    expect(writes.filter(({ table }) => table === "payments" || table === "receipts")).toEqual([]);
  });
});

describe("changing an order", () => {
  const made = newWrites();
  const kept = {
    order: { ...order, ...rowsAfter("orders", made)[0]! },
    garments: rowsAfter("garments", made),
    lines: rowsAfter("priceLines", made),
  };
  const shown = orderValues(kept.order, kept.garments, kept.lines, pounds);
  const change = (next: OrderValues) =>
    changeOrderWrites(kept, next, pounds, "2026-03-02T10:00:00.000Z", countedIds());

  it("keeps nothing where nothing differs", () => {
    expect(change(shown)).toEqual([]);
  });

  it("writes only what differs", () => {
    const next = {
      ...shown,
      occasion: "Christening",
      lines: shown.lines.map((line, i) => (i === 0 ? { ...line, price: "70" } : line)),
    };
    expect(change(next).map(({ table, fields }) => [table, fields])).toEqual([
      ["orders", { occasion: "Christening" }],
      ["priceLines", { unitMinor: 7000 }],
    ]);
  });

  it("puts what was left out in the bin, and closes the ranks", () => {
    const next = { ...shown, garments: shown.garments.slice(1) };
    const writes = change(next);
    expect(
      rowsAfter("garments", writes, kept.garments).map(({ kind, position }) => [kind, position]),
    ).toEqual([["Blouse", 0]]);
    // The price stays; its garment is no more.
    expect(rowsAfter("priceLines", writes, kept.lines)[0]!.garmentId).toBeNull();
  });

  it("touches neither payments nor receipts", () => {
    const next = { ...shown, lines: [], garments: [{ ...emptyGarment("garment-9"), kind: "Coat" }] };
    const tables = new Set(change(next).map(({ table }) => table));
    expect(tables).toEqual(new Set(["garments", "priceLines"]));
  });

  it("gives what was typed, whatever was there before", () => {
    const next: OrderValues = {
      ...shown,
      garments: [...shown.garments].reverse(),
      lines: [{ ...emptyLine("line-9"), garmentId: shown.garments[1]!.rowId, text: "Hem", price: "5" }],
    };
    const writes = change(next);
    const after = orderValues(
      rowsAfter("orders", writes, [kept.order])[0]!,
      rowsAfter("garments", writes, kept.garments).sort((a, b) => a.position - b.position),
      rowsAfter("priceLines", writes, kept.lines).sort((a, b) => a.position - b.position),
      pounds,
    );
    expect(after.garments.map(({ kind }) => kind)).toEqual(["Blouse", "Dress"]);
    expect(after.lines).toEqual([{ ...next.lines[0], rowId: "1", price: "5.00" }]);
  });
});

describe("the sheet for money", () => {
  const sums = orderSums([{ quantity: 1, unitMinor: 8150 }], [{ kind: "deposit", amountMinor: 4100 }]);
  const begin = (over: Partial<Parameters<typeof emptyMoney>[0]> = {}) =>
    emptyMoney({ paymentId: "p", sums, today: "2026-03-20", currency: pounds, ...over });
  const problems = (over: object) =>
    moneySchema({ sums, currency: pounds, today: "2026-03-20", locale: "en-GB" })
      .safeParse({ ...begin(), ...over })
      .error?.issues.map(({ path, message }) => [path[0], message]) ?? [];

  it("begins with the balance", () => {
    expect(begin()).toMatchObject({ kind: "payment", amount: "40.50", paidOn: "2026-03-20", method: "cash" });
    const over = orderSums([], [{ kind: "payment", amountMinor: 500 }]);
    expect(begin({ sums: over })).toMatchObject({ kind: "giving-back", amount: "5.00" });
    expect(begin({ kind: "giving-back" })).toMatchObject({ kind: "giving-back", amount: "" });
  });

  it("takes what it begins with, and more than that only after a question", () => {
    expect(problems({})).toEqual([]);
    expect(problems({ amount: "100" })).toEqual([]);
    expect(decideMoney("payment", sums, 10000, pounds, "en-GB")).toMatchObject({
      ok: true,
      say: /Only £40\.50/,
    });
  });

  it.each([
    [{ amount: "" }, "amount", /^Type an amount/],
    [{ amount: "0" }, "amount", /more than 0/],
    [{ amount: "41.01", kind: "giving-back" }, "amount", /Only £41\.00 can be given back/],
    [{ paidOn: "2026-03-21" }, "paidOn", /still to come/],
    [{ paidOn: "" }, "paidOn", /Choose the day/],
  ])("%j says at %s what to type", (over, field, say) => {
    const [first, ...more] = problems(over);
    expect(more).toEqual([]);
    expect(first![0]).toBe(field);
    expect(first![1]).toMatch(say);
  });

  it("keeps the payment and its receipt, dated on the day the money moved", () => {
    const numbers = countedNumbers();
    const writes = moneyWrites(
      {
        orderId: "o",
        workshop,
        client,
        order,
        lines: [{ text: "Dress", quantity: 1, unitMinor: 8150 }],
        earlier: [{ number: "7KQ4MX-0000", paidOn: "2026-03-01", kind: "deposit", amountMinor: 4100 }],
        cautions: [],
        payment: {
          id: "p",
          kind: "payment",
          method: "cash",
          amountMinor: 4050,
          paidOn: "2026-03-19",
          note: "At hers",
        },
        receiptId: "r",
      },
      numbers,
    );
    expect(writes.map(({ table, id }) => [table, id])).toEqual([
      ["payments", "p"],
      ["receipts", "r"],
    ]);
    expect(fieldsOf(writes, "receipts")[0]).toMatchObject({
      issuedOn: "2026-03-19",
      snapshot: { balanceMinor: 0, receivedMinor: 8150, earlier: [{ number: "7KQ4MX-0000" }] },
    });
    // The note is her own.
    expect(JSON.stringify(fieldsOf(writes, "receipts"))).not.toContain("At hers");
  });
});
