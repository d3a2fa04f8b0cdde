import { describe, expect, it } from "vitest";
import { orderBinQuestion } from "@/lib/orders/bin-order";
import { countdownWords, dueWords, fittingWords } from "@/lib/orders/day-words";
import { ordersCountWords, readOrdersPlace } from "@/lib/orders/list-place";
import { orderCautions, receiptCautions } from "@/lib/orders/order-cautions";
import { forWhom, orderName } from "@/lib/orders/order-name";
import { sayMoney } from "@/lib/orders/say-money";
import { nextAct, nextStage, stages } from "@/lib/orders/stages";
import { orderSums } from "@/lib/money/order-sums";
import { type OrderWithMoney } from "@/lib/store/queries/order-money";
import { order } from "./support";

const today = "2026-12-01";

describe("when an order is due", () => {
  it.each([
    ["2026-11-29", "2 days late", true],
    ["2026-11-30", "1 day late", true],
    ["2026-12-01", "due today", false],
    ["2026-12-02", "due tomorrow", false],
    ["2026-12-04", "due Friday", false],
    ["2026-12-08", "due 8 Dec", false],
    ["2027-01-02", "due 2 Jan 2027", false],
    [null, "No day yet", false],
  ])("%s on 1 December 2026: %s", (dueOn, say, late) => {
    expect(dueWords({ dueOn, stage: "sewing" }, today)).toEqual({ say, late });
  });

  it("is not said once it is handed over", () => {
    expect(dueWords({ dueOn: "2026-11-01", stage: "handed-over" }, today)).toBeNull();
  });

  it.each([
    ["2026-12-01", "today", false],
    ["2026-12-03", "Thursday", false],
    ["2026-11-30", "yesterday", true],
    ["2026-11-27", "4 days ago", true],
  ])("a fitting on %s: %s", (on, say, late) => {
    expect(fittingWords(on, today)).toEqual({ say, late });
  });
});

describe("how far off a day is", () => {
  it.each([
    ["2026-11-27", "4 days ago"],
    ["2026-11-30", "yesterday"],
    ["2026-12-01", "today"],
    ["2026-12-02", "tomorrow"],
    ["2026-12-03", "in 2 days"],
    ["2027-01-02", "in 32 days"],
  ])("%s: %s", (day, say) => {
    expect(countdownWords(day, today)).toBe(say);
  });
});

describe("the stages", () => {
  it("lead on one by one, to the last", () => {
    const walked = ["agreed"];
    for (let at = nextStage("agreed"); at; at = nextStage(at)) walked.push(at);
    expect(walked).toEqual([...stages]);
  });

  it.each([
    ["agreed", 5000, { do: "move", to: "cut" }],
    ["fitting", 5000, { do: "move", to: "ready" }],
    ["ready", 5000, { do: "take" }],
    ["ready", 0, { do: "move", to: "handed-over" }],
    ["ready", -100, { do: "move", to: "handed-over" }],
    ["handed-over", 5000, { do: "take" }],
    ["handed-over", -100, { do: "give-back" }],
    ["handed-over", 0, null],
  ] as const)("%s with %i owed: next is %j", (stage, balance, act) => {
    expect(nextAct(stage, balance)).toEqual(act);
  });
});

describe("what an order is called", () => {
  it("is its occasion, or its day", () => {
    expect(orderName(order)).toBe("Naming day");
    expect(orderName({ ...order, occasion: "" })).toBe("Order of 1 Mar 2026");
  });

  it("says for whom, or what, and nothing twice", () => {
    const named = (...names: string[]) => names.map((name) => ({ name }));
    expect(forWhom("Amara", named("Ife", "Temi"), [])).toBe("for Ife and Temi");
    expect(forWhom("Amara", named("Amara"), [{ kind: "Dress" }, { kind: "Blouse" }])).toBe(
      "Dress and blouse",
    );
    expect(forWhom("Amara", [], [{ kind: "Dress" }, { kind: "Dress" }])).toBe("Dress");
    expect(forWhom("Amara", [], [])).toBe("");
  });

  it("counts what stands on the list", () => {
    expect(ordersCountWords("open", 1, false)).toBe("1 order not handed over");
    expect(ordersCountWords("open", 2, false)).toBe("2 orders not handed over, the soonest due first");
    expect(ordersCountWords("all", 30, true)).toBe("The first 30 orders, the newest first");
  });

  it("says money of a code that nobody pays in by its bare figure", () => {
    expect(sayMoney(12550, "GBP", "en-GB")).toBe("£125.50");
    expect(sayMoney(12550, "XAU", "en-GB")).toBe("12550 XAU");
  });
});

describe("where the list was left", () => {
  it.each([
    [null, { show: "open", limit: 30 }],
    ["{", { show: "open", limit: 30 }],
    ['{"show":"late","limit":-1}', { show: "open", limit: 30 }],
    ['{"show":"owing","limit":90}', { show: "owing", limit: 90 }],
  ])("%s", (json, place) => {
    expect(readOrdersPlace(json)).toEqual(place);
  });
});

describe("cautions of an order", () => {
  const born = (name: string, birthYear: number) => ({
    name,
    birthYear,
    birthMonth: 1,
    ageYears: null,
    ageOn: null,
  });

  it("are said once, with everyone whom they are about", () => {
    const found = orderCautions(
      [
        { kind: "Dress", note: "", wearer: born("Ife", 2022) },
        { kind: "Puff blouse", note: "", wearer: born("Temi", 2021) },
        { kind: "Dress", note: "", wearer: born("Amara", 1990) },
      ],
      today,
    );
    expect(found.map(({ key, names }) => [key, names])).toEqual([
      ["cords", ["Ife", "Temi"]],
      ["elastic", ["Temi"]],
    ]);
    expect(found[0]!.say).toMatch(/Local law decides\.$/);
  });

  it("ask for a kind: nothing is said of a garment that nobody has named", () => {
    expect(orderCautions([{ kind: " ", note: "for a baby", wearer: null }], today)).toEqual([]);
    expect(orderCautions([{ kind: "Christening dress", note: "", wearer: null }], today)[0]?.names).toEqual(
      [],
    );
  });

  it("go onto a receipt with their text, the maker's own care left out", () => {
    const [text, ...more] = receiptCautions(
      orderCautions([{ kind: "Puff dress", note: "", wearer: born("Ife", 2022) }], today),
    );
    // EN 14682, as summed up by test houses (sources: care; seen).
    expect(text).toMatch(/no cords at the hood or neck\. Local law decides\. \(EN 14682/);
    expect(more).toEqual([]);
  });
});

describe("before an order goes into the bin", () => {
  const money = (minor: number) => sayMoney(minor, "GBP", "en-GB");
  const withMoney = (lines: [number, number][], paid: number[]): OrderWithMoney => {
    const payments = paid.map((amountMinor) => ({ kind: "payment" as const, amountMinor }));
    return {
      order,
      lines: [],
      payments: payments as OrderWithMoney["payments"],
      sums: orderSums(
        lines.map(([quantity, unitMinor]) => ({ quantity, unitMinor })),
        payments,
      ),
    };
  };

  it("says what money stands out", () => {
    const { title, say } = orderBinQuestion(withMoney([[2, 5000]], [4000]), money);
    expect(title).toBe("Put “Naming day” in the bin?");
    expect(say).toContain("£40.00 was received on it. The receipts stay in the book.");
    expect(say).toContain("£60.00 is still to come in.");
  });

  it("says what is to be given back, and nothing of money where there is none", () => {
    expect(orderBinQuestion(withMoney([], [4000]), money).say).toContain("£40.00 is still to be given back.");
    expect(orderBinQuestion(withMoney([], []), money).say.join(" ")).not.toMatch(/£/);
  });
});
