import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { sameForNext, withTodaysSets, withWearer } from "@/lib/orders/garment-choices";
import {
  emptyGarment,
  emptyLine,
  emptyOrder,
  freshName,
  type OrderValues,
  orderSchema,
  orderValues,
  readOrderDraft,
} from "@/lib/orders/order-form";
import { AMOUNT_AT_MOST, liveTotal, readLine } from "@/lib/orders/price-lines";
import { moneyFigure } from "@/lib/money/format-money";
import { orderSums } from "@/lib/money/order-sums";
import { type MeasurementSet, type Sleeve, type Wearer } from "@/lib/records/types";
import { type WearerChoice } from "@/lib/store/queries/orders";
import { dinars, head, order, pounds, yen } from "./support";

const line = (text: string, quantity: string, price: string, rowId = "line-1") => ({
  ...emptyLine(rowId),
  text,
  quantity,
  price,
});

const problemsOf = (values: OrderValues, currency = pounds): Record<string, string> => {
  const read = orderSchema(currency).safeParse(values);
  return Object.fromEntries((read.error?.issues ?? []).map(({ path, message }) => [path.join("."), message]));
};

const filled = (over: Partial<OrderValues> = {}): OrderValues => ({
  ...emptyOrder("o"),
  garments: [{ ...emptyGarment("garment-1"), kind: "Dress" }],
  ...over,
});

describe("the order form", () => {
  it("asks for a garment and for nothing else", () => {
    expect(problemsOf(emptyOrder("o"))).toEqual({
      "garments.0.kind": "Type what is to be sewn, such as Dress or Blouse.",
    });
    expect(problemsOf(filled())).toEqual({});
  });

  it("passes over blank garments and blank lines", () => {
    const values = filled({
      garments: [emptyGarment("a"), { ...emptyGarment("b"), kind: "Dress" }],
      lines: [line("", "1", ""), line("Dress", "2", "45")],
    });
    expect(problemsOf(values)).toEqual({});
  });

  it("asks what a garment is where only its wearer is chosen", () => {
    const values = filled({
      garments: [
        { ...emptyGarment("a"), kind: "Dress" },
        { ...emptyGarment("b"), wearerId: "w" },
      ],
    });
    expect(problemsOf(values)).toHaveProperty("garments.1.kind");
  });

  it.each([
    ["", "1", "45", "lines.0.text", /Type what the price is for/],
    ["Dress", "0", "45", "lines.0.quantity", /whole number from 1 to 9999/],
    ["Dress", "1.5", "45", "lines.0.quantity", /whole number from 1/],
    ["Dress", "", "45", "lines.0.quantity", /whole number from 1/],
    ["Dress", "1", "", "lines.0.price", /or 0 where it is free/],
    ["Dress", "1", "45.5555", "lines.0.price", /2 figures after the point/],
    ["Dress", "1", "-45", "lines.0.price", /type a lower price/],
    ["Dress", "9999", "10001001", "lines.0.price", /type a smaller one/],
  ])("“%s” × “%s” at “%s” says at %s what to type", (text, quantity, price, at, say) => {
    const problems = problemsOf(filled({ lines: [line(text, quantity, price)] }));
    expect(Object.keys(problems)).toEqual([at]);
    expect(problems[at]).toMatch(say);
  });

  it("reads money in the order's own currency", () => {
    const values = filled({ lines: [line("Dress", "1", "1250.5")] });
    expect(problemsOf(values, yen)["lines.0.price"]).toMatch(/JPY has no smaller coins/);
    expect(problemsOf(values, dinars)).toEqual({});
  });

  it("asks for a deposit's amount only where one is taken", () => {
    const values = filled();
    expect(problemsOf(values)).toEqual({});
    const taken = { ...values, deposit: { ...values.deposit, taken: "now" as const } };
    expect(problemsOf(taken)["deposit.amount"]).toMatch(/^Type an amount/);
    expect(problemsOf({ ...taken, deposit: { ...taken.deposit, amount: "0" } })["deposit.amount"]).toBe(
      "Type the amount, more than 0.",
    );
    expect(problemsOf({ ...taken, deposit: { ...taken.deposit, amount: "25" } })).toEqual({});
  });

  it("refuses a day that is none, and a text that goes on and on", () => {
    const problems = problemsOf(filled({ dueOn: "2026-02-30", occasion: "x".repeat(201) }));
    expect(Object.keys(problems).sort()).toEqual(["dueOn", "occasion"]);
  });

  it("brings back what was put down, and nothing that is none of it", () => {
    const values = filled({ lines: [line("Dress", "1", "4o")] });
    expect(readOrderDraft(JSON.parse(JSON.stringify(values)))).toEqual(values);
    expect(readOrderDraft({ ...values, garments: "Dress" })).toBeNull();
    expect(readOrderDraft(null)).toBeNull();
  });

  it("names rows that are not named alike", () => {
    expect(freshName("line", [{ rowId: "line-2" }])).toBe("line-3");
    expect(freshName("line", [])).toBe("line-1");
  });

  it("shows a kept line as it would be typed", () => {
    const kept = {
      ...head,
      id: "l",
      orderId: "o",
      garmentId: null,
      text: "Hem",
      quantity: 2,
      unitMinor: 1205,
      position: 0,
    };
    expect(orderValues(order, [], [kept], pounds).lines[0]).toEqual(line("Hem", "2", "12.05", "l"));
    expect(orderValues(order, [], [{ ...kept, unitMinor: 1205 }], dinars).lines[0]!.price).toBe("1.205");
  });
});

describe("the live total", () => {
  it("is what the kept lines will add up to", () => {
    const priced = fc.record({ quantity: fc.integer({ min: 1, max: 9999 }), unitMinor: fc.nat(1_000_000) });
    fc.assert(
      fc.property(
        fc.array(priced, { maxLength: 20 }),
        fc.constantFrom(pounds, yen, dinars),
        (lines, currency) => {
          const typed = lines.map(({ quantity, unitMinor }, i) =>
            line("Dress", String(quantity), moneyFigure(unitMinor, currency), `line-${i}`),
          );
          expect(liveTotal(typed, currency)).toEqual({
            totalMinor: orderSums(lines, []).totalMinor,
            whole: true,
          });
          const read = typed.map((values) => readLine(values, currency));
          expect(read.map((one) => one.ok && [one.line.quantity, one.line.unitMinor])).toEqual(
            lines.map(({ quantity, unitMinor }) => [quantity, unitMinor]),
          );
        },
      ),
    );
  });

  it("says that it is not whole while a line cannot be read", () => {
    const lines = [line("Dress", "1", "45"), line("Hem", "1", "4x")];
    expect(liveTotal(lines, pounds)).toEqual({ totalMinor: 4500, whole: false });
    expect(liveTotal([line("", "2", "45")], pounds)).toEqual({ totalMinor: 9000, whole: true });
  });

  it("stays exact for a hundred of the largest lines", () => {
    expect(Number.isSafeInteger(AMOUNT_AT_MOST * 100)).toBe(true);
  });

  it("takes figures of other scripts", () => {
    // Arabic-Indic digits, Unicode 0660 to 0669 (memory).
    expect(readLine(line("Dress", "٢", "٤٥"), pounds)).toEqual({
      ok: true,
      line: { text: "Dress", quantity: 2, unitMinor: 4500 },
    });
  });
});

describe("choosing a wearer", () => {
  const set = (id: string, takenOn = "2026-03-01") => ({ id, takenOn }) as MeasurementSet;
  const sleeve = (id: string, wearerId: string | null) => ({ id, wearerId }) as Sleeve;
  const choice = (id: string, sets: MeasurementSet[], sleeves: Sleeve[] = []): WearerChoice => ({
    wearer: { id, name: id } as Wearer,
    sets,
    latestSet: sets[0] ?? null,
    sleeves,
  });
  const people = {
    wearers: [choice("ife", [set("i2"), set("i1")], [sleeve("si", "ife")]), choice("temi", [set("t1")])],
    bareSleeves: [sleeve("bare", null)],
  };
  const dress = { ...emptyGarment("garment-1"), kind: "Dress", note: "Lined" };

  it("takes the last set, and lets go of another's sleeve", () => {
    const forIfe = { ...withWearer(dress, "ife", people), sleeveId: "si" };
    expect(forIfe).toMatchObject({ wearerId: "ife", setId: "i2", kind: "Dress" });
    expect(withWearer(forIfe, "temi", people)).toMatchObject({ setId: "t1", sleeveId: "" });
    expect(withWearer({ ...forIfe, sleeveId: "bare" }, "temi", people).sleeveId).toBe("bare");
    expect(withWearer(forIfe, "", people)).toMatchObject({ wearerId: "", setId: "", sleeveId: "" });
  });

  it("makes the same for whoever has none yet", () => {
    const first = withWearer(dress, "ife", people);
    const second = sameForNext(first, [first], people, "garment-2")!;
    expect(second).toMatchObject({ rowId: "garment-2", wearerId: "temi", setId: "t1", note: "Lined" });
    expect(sameForNext(second, [first, second], people, "garment-3")).toBeUndefined();
  });

  it("works by the set that was taken meanwhile, on the same day", () => {
    const old = { ...withWearer(dress, "ife", people), setId: "i1" };
    expect(withTodaysSets([old], people, "2026-03-01")[0]!.setId).toBe("i2");
    expect(withTodaysSets([old], people, "2026-03-02")[0]!.setId).toBe("i1");
  });
});
