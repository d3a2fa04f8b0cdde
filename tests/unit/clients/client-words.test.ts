import { describe, expect, it } from "vitest";
import { ageWords, wearerWords } from "@/lib/clients/age-words";
import { clientBinQuestion, wearerBinQuestion, wentWithClient } from "@/lib/clients/bin-question";
import { countWords, namesInWords, newClientHref, PAGE, readListPlace } from "@/lib/clients/list-words";
import { balanceWords } from "@/lib/clients/order-words";
import { phoneLinks } from "@/lib/clients/phone-links";
import { setWords } from "@/lib/clients/set-words";
import { type BirthFacts } from "@/lib/people/age";
import { type Stage } from "@/lib/records/types";

const nothing: BirthFacts = { birthYear: null, birthMonth: null, ageYears: null, ageOn: null };
const born = (birthYear: number, birthMonth: number | null): BirthFacts => ({
  ...nothing,
  birthYear,
  birthMonth,
});
const told = (ageYears: number, on: string): BirthFacts => ({ ...nothing, ageYears, ageOn: on });

describe("age in words", () => {
  it.each([
    [born(2019, 6), "2026-05-31", "6 years", "Child, 6 years"],
    [born(2019, 6), "2026-06-10", "6 or 7 years", "Child, 6 or 7 years"],
    [born(2019, 6), "2026-07-01", "7 years", "Child, 7 years"],
    [born(2025, 1), "2026-03-14", "13 to 14 months", "Child, 13 to 14 months"],
    [born(2024, 2), "2026-03-14", "2 years", "Child, 2 years"],
    [born(2026, 3), "2026-03-14", "under 2 months", "Child, under 2 months"],
    [born(1990, null), "2026-03-14", "35 or 36 years", "35 or 36 years"],
    [told(0, "2026-03-14"), "2026-03-14", "under 1 year", "Child, under 1 year"],
    [told(0, "2026-01-14"), "2026-03-14", "under 2 years", "Child, under 2 years"],
    [told(1, "2026-03-14"), "2026-03-14", "1 year", "Child, 1 year"],
    [told(7, "2025-03-14"), "2026-03-20", "8 or 9 years", "Child, 8 or 9 years"],
    [told(14, "2026-03-14"), "2026-03-14", "14 years", "14 years"],
  ])("%j on %s is %s", (facts, today, age, whole) => {
    expect(ageWords(facts, today)).toBe(age);
    expect(wearerWords(facts, today)).toBe(whole);
  });
  it("claims nothing where nothing is known", () => {
    expect(ageWords(nothing, "2026-03-14")).toBeNull();
    expect(wearerWords(nothing, "2026-03-14")).toBe("Age not asked");
  });
});

describe("links to ring and to write", () => {
  it("takes the number that was read before what was typed", () =>
    expect(phoneLinks("024 123 4567", "+233241234567")).toEqual({
      call: "tel:+233241234567",
      message: "sms:+233241234567",
    }));
  it.each([
    ["024-123 45 67", "tel:0241234567"],
    ["+233 (0)24 123", "tel:+233024123"],
    ["ring +1 sister 555", "tel:+1555"],
    ["٠٢٤ ١٢٣", "tel:024123"],
  ])("dials the figures of %s", (typed, call) => expect(phoneLinks(typed, null)?.call).toBe(call));
  it.each(["", "ask her mother", "12"])("has no link for %j", (typed) =>
    expect(phoneLinks(typed, null)).toBeNull(),
  );
});

describe("the list's words", () => {
  it("counts", () => {
    expect(countWords({ shown: 1, more: false, find: "" })).toBe("1 client");
    expect(countWords({ shown: 12, more: false, find: "" })).toBe("12 clients");
    expect(countWords({ shown: 30, more: true, find: "" })).toBe("The first 30 clients, by name");
    expect(countWords({ shown: 1, more: false, find: "a" })).toBe("1 client matches");
    expect(countWords({ shown: 0, more: false, find: "a" })).toBe("0 clients match");
    expect(countWords({ shown: 30, more: true, find: "a" })).toBe("The first 30 clients that match");
  });
  it("carries what was looked for to the new client", () => {
    expect(newClientHref("  ")).toBe("/clients/new");
    expect(newClientHref(" Adwoa & Co ")).toBe("/clients/new?name=Adwoa+%26+Co");
    expect(newClientHref("024 123")).toBe("/clients/new?phone=024+123");
  });
  it("joins names", () => {
    expect([[], ["Ama"], ["Ama", "Esi"], ["Ama", "Esi", "Kofi"]].map(namesInWords)).toEqual([
      "",
      "Ama",
      "Ama and Esi",
      "Ama, Esi and Kofi",
    ]);
  });
  it("reads back where the list was left, and makes nothing of rubbish", () => {
    expect(readListPlace(JSON.stringify({ find: "ama", limit: 90 }))).toEqual({ find: "ama", limit: 90 });
    for (const rubbish of [null, "", "{", "null", "[]", '{"find":3,"limit":-1}', '{"limit":1.5}'])
      expect(readListPlace(rubbish)).toEqual({ find: "", limit: PAGE });
  });
});

describe("what goes into the bin", () => {
  const order = (stage: Stage, balanceMinor: number, currency = "EUR") => ({
    order: { stage, currency },
    sums: { balanceMinor },
  });
  const money = (minor: number, code: string) => `${minor} ${code}`;
  it("says only that it can be undone where nothing goes along", () =>
    expect(clientBinQuestion({ name: "Ama" }, 0, [], money)).toEqual({
      title: "Put Ama in the bin?",
      say: ["All of it can be brought back from the bin."],
    }));
  it("names wearers, orders not handed over, and money by currency, both ways", () => {
    const { say } = clientBinQuestion(
      { name: "Ama" },
      2,
      [
        order("agreed", 12000),
        order("handed-over", 550),
        order("handed-over", -300),
        order("cut", 900, "JPY"),
      ],
      money,
    );
    expect(say[0]).toBe(
      "With this client go 2 wearers with all figures and 4 orders, 2 of them not handed over.",
    );
    expect(say[1]).toBe("12550 EUR is still to come in.");
    expect(say[2]).toBe("900 JPY is still to come in.");
    expect(say[3]).toBe("300 EUR is still to be given back.");
    expect(say).toHaveLength(5);
  });
  it("counts one as one", () =>
    expect(clientBinQuestion({ name: "Ama" }, 1, [order("sewing", 0)], money).say[0]).toBe(
      "With this client go 1 wearer with all figures and 1 order not handed over.",
    ));
  it("says what stays of a wearer's work", () =>
    expect(wearerBinQuestion({ name: "Esi" }, 3, 1, ["dress", "blouse"]).say).toEqual([
      "3 measurement sets go along.",
      "2 garments for Esi are not handed over yet: dress, blouse. The orders stay.",
      "1 sleeve stays under Sleeves.",
      "All of it can be brought back from the bin.",
    ]));
  it("brings back with a client only what went with it", () => {
    const at = "2026-03-14T10:00:00.000Z";
    const orders = [
      { id: "a", clientId: "c", removedAt: at },
      { id: "b", clientId: "c", removedAt: "2026-01-01T10:00:00.000Z" },
      { id: "d", clientId: "c", removedAt: null },
      { id: "e", clientId: "other", removedAt: at },
    ];
    expect(wentWithClient({ id: "c", removedAt: at }, orders).map(({ id }) => id)).toEqual(["a"]);
    expect(wentWithClient({ id: "c", removedAt: null }, orders)).toEqual([]);
  });
});

describe("a measurement set in the list", () => {
  const figure = (typed: string) => ({ key: "wristGirth", typed, mm: 150 });
  const set = {
    id: "a",
    figures: [figure("6"), figure("6 1/4"), figure("")],
    takenBy: "Efua",
    correctsId: null,
  };
  it("counts the figures that were taken, and says who took them", () => {
    expect(setWords(set, [set])).toEqual({ sub: "2 figures, taken by Efua", mark: null });
    expect(setWords({ ...set, figures: [figure("6")], takenBy: "" }, []).sub).toBe("1 figure");
  });
  it("says that it was put right, before that it puts another right", () => {
    const second = { ...set, id: "b", correctsId: "a" };
    const third = { ...set, id: "c", correctsId: "b" };
    expect(setWords(set, [set, second]).mark).toBe("Put right by a later set");
    expect(setWords(second, [set, second]).mark).toBe("Puts an earlier set right");
    expect(setWords(second, [set, second, third]).mark).toBe("Put right by a later set");
  });
});

describe("an order's balance in words", () => {
  it.each([
    [0, 0, "No price yet"],
    [500, 0, "Paid"],
    [500, 200, "to come"],
    [500, -100, "to give back"],
  ])("total %d, balance %d: %s", (totalMinor, balanceMinor, words) =>
    expect(balanceWords({ totalMinor, balanceMinor })).toBe(words),
  );
});
