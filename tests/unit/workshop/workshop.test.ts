import { beginFields } from "@/lib/workshop/begin-fields";
import { describe, expect, it } from "vitest";
import { currency } from "@/lib/money/currencies";
import { countries } from "@/lib/people/countries";
import { type Client, type Order, type Sleeve, type Wearer } from "@/lib/records/types";
import { type BookState } from "@/lib/store/book";
import { type DatabaseState } from "@/lib/store/channels";
import { type BinItem } from "@/lib/store/queries/bin";
import { alongWords, binWords, bringBack, comesBack } from "@/lib/workshop/bin-items";
import { guessCountry, guessCurrency, guessUnit } from "@/lib/workshop/home-country";
import { changesSinceCopy, copyWords, keptWords } from "@/lib/workshop/kept-words";
import { bytesWords, isRoomShort, roomWords } from "@/lib/workshop/room-words";
import { sinceWords } from "@/lib/workshop/since-words";
import { startSchema, workshopFields, workshopSchema, workshopValues } from "@/lib/workshop/workshop-form";

describe("what a first visit is not asked", () => {
  it("takes the country of the first language that names one", () => {
    expect(guessCountry(["en", "fr-CA", "de-AT"])).toBe("CA");
    expect(guessCountry(["mt"])).toBe("MT");
    expect(guessCountry(["yo"])).toBe("NG");
    expect(guessCountry(["en-001", "sw-KE"])).toBe("KE");
    expect(guessCountry(["not a language", "hi-IN"])).toBe("IN");
    expect(guessCountry([])).toBe("GB");
  });

  it("knows a currency that people pay in for every country that has phones", () => {
    for (const { code } of countries()) expect(currency(guessCurrency(code)), code).toBeDefined();
    // Seven of ISO 4217's own pairs (memory), one of each kind of line.
    const pairs = { MT: "EUR", US: "USD", NG: "NGN", CI: "XOF", GD: "XCD", ZA: "ZAR", VN: "VND" };
    for (const [country, code] of Object.entries(pairs)) expect(guessCurrency(country)).toBe(code);
  });

  it("guesses a unit for any country", () => {
    expect(guessUnit("US")).toBe("in");
    expect(guessUnit("MT")).toBe("cm");
  });
});

describe("the workshop's forms", () => {
  const say = (values: unknown, schema: typeof startSchema | typeof workshopSchema = startSchema) => {
    const read = schema.safeParse(values);
    return read.success ? [] : read.error.issues.map(({ path, message }) => `${path.join(".")}: ${message}`);
  };
  const good = { name: "Ana's", currency: "EUR", unit: "cm" };

  it("ask for a name in a sentence, and take any script", () => {
    expect(say(good)).toEqual([]);
    expect(say({ ...good, name: "ورشة مريم" })).toEqual([]);
    expect(say({ ...good, name: "   " })).toEqual([
      "name: Type a name for the workshop; your own name will do.",
    ]);
    expect(say({ ...good, name: "x".repeat(81) })[0]).toMatch(/at most 80 letters/);
    expect(say({ ...good, currency: "XXX" })[0]).toMatch(/Choose the currency/);
    expect(say({ ...good, unit: "ell" })[0]).toMatch(/Choose inches or centimetres/);
  });

  it("give the row's fields, tidied, and take them back unchanged", () => {
    const begun = beginFields({ ...good, name: "  Ana's \n sewing  ", unit: "cm" }, "MT");
    expect(begun).toMatchObject({ name: "Ana's sewing", country: "MT", fineness: 8, demo: false });
    const row = { ...begun, fineness: 16 as const, workshopId: "w", id: "w", stamps: {}, removedAt: null };
    const values = workshopValues(row);
    expect(workshopSchema.safeParse(values).success).toBe(true);
    expect({ ...workshopFields(values), demo: false }).toEqual({ ...begun, fineness: 16 });
    expect(workshopFields({ ...values, address: " 1 Lane\nTown " }).address).toBe("1 Lane\nTown");
  });
});

describe("when something was", () => {
  const now = new Date(2026, 2, 14, 15, 0);
  it.each([
    [new Date(2026, 2, 14, 14, 20), "14:20"],
    [new Date(2026, 2, 14, 0, 0), "00:00"],
    [new Date(2026, 2, 13, 23, 59), "yesterday"],
    [new Date(2026, 2, 10, 9, 0), "Tuesday"],
    [new Date(2026, 2, 8, 9, 0), "Sunday"],
    [new Date(2026, 2, 7, 9, 0), "7 March"],
    [new Date(2025, 11, 31, 9, 0), "31 December 2025"],
    [new Date(2026, 2, 15, 9, 0), "15 March"],
  ])("%s is %s", (at, words) => expect(sinceWords(at, now)).toBe(words));
});

describe("the line of what is kept", () => {
  const now = new Date(2026, 2, 14, 15, 0);
  const head = (next: number, lastCopy: { number: number; at: string } | null = null) => ({
    device: "d",
    book: "b",
    workshopId: "w",
    next,
    nextReceipt: 1,
    clock: { ms: 0, counter: 0 },
    confirmed: 0,
    generation: 1,
    lastCopy,
  });
  const tuesday = new Date(2026, 2, 10, 9, 0).toISOString();
  const said = (
    database: DatabaseState,
    next = 42,
    lastCopy: { number: number; at: string } | null = null,
  ) => {
    const state: BookState = { phase: "open", head: head(next, lastCopy), database };
    return keptWords(state, { demo: false, now })?.said;
  };
  const ready: DatabaseState = { phase: "ready", applied: 41, rebuilt: false };

  it("L4 says how many changes no copy has, and since when", () => {
    expect(said(ready, 102, { number: 60, at: tuesday })).toBe(
      "Kept on this phone · copy of Tuesday, 41 since",
    );
    expect(said(ready, 2)).toBe("Kept on this phone · 1 change, no copy yet");
    expect(said(ready, 61, { number: 60, at: tuesday })).toBe(
      "Kept on this phone · all in the copy of Tuesday",
    );
    expect(changesSinceCopy(head(102, { number: 60, at: tuesday }))).toBe(41);
    expect(copyWords(head(62, { number: 60, at: tuesday }), now)).toBe(
      "Last copy: Tuesday. 1 change since then is in no copy.",
    );
  });

  it("says what the phone is at, and never more than is true", () => {
    expect(said({ phase: "waiting" })).toBe("Kept on this phone · opening the book");
    expect(said({ phase: "opening" })).toBe("Kept on this phone · opening the book");
    expect(said({ phase: "reading", done: 120, of: 400 })).toBe(
      "Kept on this phone · reading 120 of 400 changes",
    );
    expect(said({ phase: "failed", say: "x" })).toBe("Kept on this phone · the book does not open");
    expect(said(ready, 1)).toBeUndefined();
    expect(keptWords({ phase: "reading-journal" }, { demo: false, now })).toBeNull();
    expect(keptWords({ phase: "no-storage", say: "x" }, { demo: false, now })).toBeNull();
    const open: BookState = { phase: "open", head: head(9), database: ready };
    expect(keptWords(open, { demo: true, now })?.said).toContain("invented");
  });
});

describe("room in words", () => {
  it("counts as people do", () => {
    expect(bytesWords(300)).toBe("less than 1 kB");
    expect(bytesWords(34_000)).toBe("34 kB");
    expect(bytesWords(8_240_000)).toBe("8.2 MB");
    expect(bytesWords(3_100_000_000)).toBe("3.1 GB");
    expect(roomWords(24_000_000, 3_124_000_000)).toBe("Notchbook takes 24 MB; about 3.1 GB are left for it.");
    expect(roomWords(undefined, undefined)).toMatch(/does not say/);
    expect(isRoomShort(90_000_000, 100_000_000)).toBe(true);
    expect(isRoomShort(undefined, undefined)).toBe(false);
  });
});

describe("the bin", () => {
  const at = "2026-03-14T10:00:00.000Z";
  const rowHead = (id: string, removedAt = at) => ({
    workshopId: "w",
    id,
    stamps: { removedAt: "s" },
    removedAt,
  });
  const client: BinItem = { table: "clients", row: { ...rowHead("c"), name: "Ana" } as unknown as Client };
  const wearer: BinItem = {
    table: "wearers",
    row: { ...rowHead("v"), clientId: "c", name: "Zo" } as unknown as Wearer,
  };
  const sleeve: BinItem = {
    table: "sleeves",
    row: { ...rowHead("s"), wearerId: "v", name: "Short" } as unknown as Sleeve,
  };
  const along: BinItem = {
    table: "orders",
    row: { ...rowHead("o"), clientId: "c", occasion: "Play" } as unknown as Order,
  };
  const earlier: BinItem = {
    table: "orders",
    row: {
      ...rowHead("p", "2026-01-01T10:00:00.000Z"),
      clientId: "c",
      occasion: "",
      agreedOn: "2025-12-24",
    } as unknown as Order,
  };

  it("brings a thing back alone where what it stands in is there", () => {
    expect(comesBack(sleeve, [sleeve])).toEqual([sleeve]);
    expect(comesBack(earlier, [earlier])).toEqual([earlier]);
  });

  it("brings back what it stands in first, and a client's orders that went in along", () => {
    expect(comesBack(sleeve, [sleeve, wearer, client])).toEqual([client, wearer, sleeve]);
    expect(comesBack(client, [client, along, earlier])).toEqual([client, along]);
    expect(alongWords(comesBack(along, [along, client]), along)).toBe("With it comes client Ana.");
    expect(alongWords([sleeve], sleeve)).toBe("");
    expect(binWords(earlier)).toEqual({ kind: "Order", name: "Order of 24 Dec 2025" });
    expect(bringBack([client, along])).toMatchObject([
      { table: "clients", id: "c", makes: false, fields: { removedAt: null } },
      { table: "orders", id: "o", makes: false, fields: { removedAt: null } },
    ]);
  });
});
