import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  clientFields,
  clientSchema,
  clientValues,
  emptyClient,
  firstWearers,
  newClientSchema,
  type NewClientValues,
} from "@/lib/clients/client-form";
import {
  emptyWearer,
  isBlankWearer,
  wearerFields,
  wearerProblems,
  wearerSchema,
  wearerValues,
  type WearerValues,
} from "@/lib/clients/wearer-form";
import { type Client, type Wearer } from "@/lib/records/types";

const today = "2026-03-14";
const typed = (part: Partial<WearerValues>): WearerValues => ({
  ...emptyWearer(today),
  name: "Esi",
  ...part,
});
const saysOf = (part: Partial<WearerValues>) =>
  wearerProblems(typed(part), today).map(({ field, say }) => `${field}: ${say}`);
const head = { workshopId: "w", id: "i", stamps: {}, removedAt: null };

describe("a wearer as typed", () => {
  it.each<Partial<WearerValues>>([
    { year: "2019", month: "6" },
    { year: "2019" },
    { year: "2026", month: "3" },
    { year: "1904" },
    { year: "٢٠١٩" },
    { known: "told", age: "7" },
    { known: "told", age: "0", on: "2025-01-01" },
    { known: "grown" },
  ])("takes %j", (part) => expect(saysOf(part)).toEqual([]));

  it.each<[Partial<WearerValues>, RegExp]>([
    [{ name: "  ", known: "grown" }, /^name: Type the name/],
    [{ name: "x".repeat(121), known: "grown" }, /^name: .*at most 120 letters/],
    [{ month: "6" }, /^year: Type the year of birth, or choose another way/],
    [{ year: "19" }, /^year: Type the year with all four figures/],
    [{ year: "two thousand" }, /^year: Type the year with all four figures/],
    [{ year: "2027" }, /^year: 2027 is still to come.*at the latest 2026/],
    [{ year: "1886" }, /^year: Born in 1886 would be 140 years old/],
    [{ year: "2026", month: "4" }, /^month: April 2026 is still to come/],
    [{ known: "told" }, /^age: Type the age in whole years/],
    [{ known: "told", age: "7 1/2" }, /^age: Type the age in whole years/],
    [{ known: "told", age: "-3" }, /^age: Type the age in whole years/],
    [{ known: "told", age: "140" }, /^age: 140 years is more than anyone has lived/],
    [{ known: "told", age: "7", on: "" }, /^on: Choose the day/],
    [{ known: "told", age: "7", on: "2026-02-30" }, /^on: Choose the day/],
    [{ known: "told", age: "7", on: "2026-03-15" }, /^on: That day is still to come/],
    [{ known: "told", age: "60", on: "1930-03-14" }, /^on: At this age on that day/],
  ])("says what to type instead of %j", (part, say) => {
    const says = saysOf(part);
    expect(says).toHaveLength(1);
    expect(says[0]).toMatch(say);
    expect(wearerSchema(today).safeParse(typed(part)).success).toBe(false);
  });

  it("minds only the way of setting down the age that is chosen", () =>
    expect(saysOf({ known: "grown", year: "2099", age: "200" })).toEqual([]));

  it("keeps each way of knowing the age, and shows it again as it was typed", () => {
    const ways = fc.oneof(
      fc.record({
        known: fc.constant("born" as const),
        year: fc.integer({ min: 1904, max: 2025 }),
        month: fc.integer({ min: 0, max: 12 }),
      }),
      fc.record({ known: fc.constant("told" as const), age: fc.integer({ min: 0, max: 100 }) }),
      fc.record({ known: fc.constant("grown" as const) }),
    );
    fc.assert(
      fc.property(ways, (way) => {
        const values = typed({
          known: way.known,
          ...(way.known === "born" && {
            year: String(way.year),
            month: way.month === 0 ? "" : String(way.month),
          }),
          ...(way.known === "told" && { age: String(way.age), on: "2026-01-02" }),
        });
        expect(wearerProblems(values, today)).toEqual([]);
        const row: Wearer = { ...head, ...wearerFields(values, "c") };
        expect(wearerValues(row, today)).toEqual(values);
      }),
    );
  });

  it("drops what stands under a way not chosen", () =>
    expect(wearerFields(typed({ known: "told", age: "7", year: "2001", month: "2" }), "c")).toMatchObject({
      birthYear: null,
      birthMonth: null,
      ageYears: 7,
      ageOn: today,
    }));

  it("knows a row with nothing typed", () => {
    expect(isBlankWearer(emptyWearer(today))).toBe(true);
    expect(isBlankWearer({ ...emptyWearer(today), known: "grown" })).toBe(true);
    expect(isBlankWearer({ ...emptyWearer(today), year: "2019" })).toBe(false);
  });
});

describe("a client as typed", () => {
  const sayOf = (part: Partial<typeof emptyClient>) =>
    clientSchema
      .safeParse({ ...emptyClient, name: "Ama", ...part })
      .error?.issues.map(({ message }) => message);

  it.each(["", "ama@example.com", " ama@example.com ", "Ama.O'Neil+cloth@mail.example"])(
    "takes the email %j",
    (email) => expect(sayOf({ email })).toBeUndefined(),
  );
  it.each(["ama", "ama@", "@example.com", "ama @example.com", "a@b@c"])(
    "asks again for the email %j",
    (email) => expect(sayOf({ email })).toEqual([expect.stringMatching(/^Type the address with one @/)]),
  );
  it("needs a name", () => expect(sayOf({ name: " " })).toEqual(["Type the client's name."]));
  it("never refuses a phone", () => expect(sayOf({ phone: "ask at the shop, 3rd door" })).toBeUndefined());

  it("keeps what was typed, trimmed, and shows it again", () => {
    const fields = clientFields(
      { ...emptyClient, name: " Ama  Boateng ", phone: " 024 123 ", note: " a\nb " },
      null,
    );
    expect(fields).toMatchObject({ name: "Ama Boateng", phone: "024 123", phoneE164: null, note: "a\nb" });
    const row: Client = { ...head, ...fields };
    expect(clientFields(clientValues(row), null)).toEqual(fields);
  });

  const fresh = (part: Partial<NewClientValues>): NewClientValues => ({
    ...emptyClient,
    name: "Ama Boateng",
    self: false,
    wearers: [],
    ...part,
  });
  it("points at the wearer that is wrong, and passes over a blank one", () => {
    const issues = newClientSchema(today).safeParse(
      fresh({ wearers: [emptyWearer(today), typed({ year: "19" }), typed({ name: "", year: "2019" })] }),
    ).error!.issues;
    expect(issues.map(({ path }) => path.join("."))).toEqual(["wearers.1.year", "wearers.2.name"]);
  });
  it("makes the client a wearer too, under the same name, and leaves blank ones out", () => {
    const made = firstWearers(
      fresh({ self: true, wearers: [emptyWearer(today), typed({ year: "2019" })] }),
      "c",
    );
    expect(made.map(({ name, birthYear, clientId }) => [name, birthYear, clientId])).toEqual([
      ["Ama Boateng", null, "c"],
      ["Esi", 2019, "c"],
    ]);
  });
});
