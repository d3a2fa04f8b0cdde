import { describe, expect, it } from "vitest";
import { demoWrites } from "@/lib/demo/demo-workshop";
import { isMeasureKey } from "@/lib/figures/body-measures";
import { askAbout } from "@/lib/figures/ask-about";
import { type Change, type Write } from "@/lib/journal/change";
import { overlay, type Rows } from "@/lib/journal/merge";
import { parseLength } from "@/lib/lengths/parse-length";
import { orderSums } from "@/lib/money/order-sums";
import { ageOn } from "@/lib/people/age";
import { readPhone } from "@/lib/people/phone";
import { rowSchemas } from "@/lib/records/schemas";
import { tableNames } from "@/lib/records/types";
import { styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import { rowsOf } from "@/lib/store/query";
import { todayQuery } from "@/lib/store/queries/today";
import { idOf, WORKSHOP } from "@/tests/support/changes";

/** Days that have caught date arithmetic before: a leap day, a year's end, the day after a short month. */
const days = ["2026-03-14", "2028-02-29", "2026-12-31", "2027-03-01"];

function demo(today: string): { writes: Write[]; rows: Rows } {
  let receipts = 0;
  let ids = 0;
  const numbers = { receipt: () => `7KQ4MX-${String(++receipts).padStart(4, "0")}` };
  const writes = demoWrites({ today, workshopId: WORKSHOP, numbers, id: () => idOf(15, ++ids) });
  const stamp = "018f00000000-0000-3f0c8a52-6d5e-4b7a-9a41-1c2d3e4f5a6b";
  const change: Change = {
    number: 1,
    device: "3f0c8a52-6d5e-4b7a-9a41-1c2d3e4f5a6b",
    workshopId: WORKSHOP,
    schema: 1,
    writtenAt: `${today}T09:00:00.000Z`,
    rows: writes.map(({ table, id, makes, fields }) => ({
      table,
      id,
      makes,
      fields: Object.fromEntries(
        Object.entries(fields).map(([name, value]) => [name, { value, stamp, base: null }]),
      ),
    })),
  };
  return { writes, rows: overlay({}, [change]) };
}

describe.each(days)("the invented workshop on %s", (today) => {
  const { writes, rows } = demo(today);
  const all = <T extends (typeof tableNames)[number]>(table: T) => rowsOf(rows, table);

  it("is made of valid rows, each once, all of them new", () => {
    for (const table of tableNames) {
      expect(all(table).length, table).toBeGreaterThan(0);
      for (const row of all(table))
        expect(() => rowSchemas[table].parse(row), `${table} ${row.id}`).not.toThrow();
    }
    expect(writes.every(({ makes }) => makes)).toBe(true);
    expect(new Set(writes.map(({ id }) => id)).size).toBe(writes.length);
    expect(all("workshops")).toMatchObject([{ id: WORKSHOP, demo: true }]);
  });

  it("has every row stand in one that is there", () => {
    const ids = new Set(writes.map(({ id }) => id));
    for (const { fields } of writes)
      for (const [name, value] of Object.entries(fields))
        if (/^(client|wearer|order|garment|set|sleeve|payment)Id$/.test(name) && value !== null)
          expect(ids.has(value as string), name).toBe(true);
  });

  it("has figures that nothing is asked about, as they are taken one set after the other", () => {
    let grown = 0;
    for (const wearer of all("wearers")) {
      const sets = all("measurementSets")
        .filter((set) => set.wearerId === wearer.id)
        .sort((a, b) => (a.takenOn < b.takenOn ? -1 : 1));
      expect(sets.length).toBeGreaterThan(0);
      for (const [i, set] of sets.entries()) {
        const adult = wearer.birthYear === null ? 34 : undefined;
        const ageYears = ageOn(wearer, set.takenOn)?.years ?? adult;
        const others = Object.fromEntries(set.figures.map(({ key, mm }) => [key, mm]));
        const before = sets[i - 1];
        for (const { key, typed, mm } of set.figures) {
          if (!isMeasureKey(key)) throw new Error(key);
          expect(parseLength(typed, "in")).toMatchObject({ ok: true, mm });
          const held = before?.figures.find((figure) => figure.key === key);
          const previous = held && { mm: held.mm, takenOn: before!.takenOn };
          const asked = askAbout(key, mm, { ageYears, previous, others, today: set.takenOn, unit: "in" });
          expect(asked, `${wearer.name} ${key}`).toEqual([]);
          if (held && mm > held.mm) grown++;
        }
      }
    }
    expect(grown).toBeGreaterThan(20);
  });

  it("has sleeves that can be drawn, with nothing wrong about them", () => {
    for (const sleeve of all("sleeves")) {
      const made = styleFromRecord(sleeve);
      expect(made?.ok, sleeve.name).toBe(true);
      if (made?.ok)
        expect(
          made.checks.filter(({ verdict }) => verdict === "wrong"),
          sleeve.name,
        ).toEqual([]);
    }
  });

  it("has receipts that agree with their payments, and with the order as it stood then", () => {
    const numbers = all("receipts").map(({ number }) => number);
    expect(new Set(numbers).size).toBe(numbers.length);
    expect(numbers.length).toBe(all("payments").length);
    for (const order of all("orders")) {
      const lines = all("priceLines").filter((line) => line.orderId === order.id);
      const receipts = all("receipts")
        .filter((receipt) => receipt.orderId === order.id)
        .sort((a, b) => (a.number < b.number ? -1 : 1));
      const paid = receipts.map(({ paymentId }) => all("payments").find(({ id }) => id === paymentId)!);
      receipts.forEach(({ snapshot, issuedOn }, i) => {
        const sums = orderSums(lines, paid.slice(0, i + 1));
        expect(snapshot.totalMinor).toBe(sums.totalMinor);
        expect(snapshot.totalMinor).toBe(snapshot.lines.reduce((sum, line) => sum + line.amountMinor, 0));
        expect(snapshot.receivedMinor).toBe(sums.receivedMinor - sums.givenBackMinor);
        expect(snapshot.balanceMinor).toBe(snapshot.totalMinor - snapshot.receivedMinor);
        expect(snapshot.payment.amountMinor).toBe(paid[i]!.amountMinor);
        expect(snapshot.earlier.map(({ number }) => number)).toEqual(
          receipts.slice(0, i).map(({ number }) => number),
        );
        expect(issuedOn).toBe(paid[i]!.paidOn);
        expect(issuedOn <= today).toBe(true);
      });
      expect(orderSums(lines, paid).balanceMinor).toBeGreaterThanOrEqual(0);
    }
  });

  it("gives Today something in each of its parts", () => {
    const view = todayQuery.view(rows, { on: today });
    expect(view.late.length).toBeGreaterThan(0);
    expect(view.due.length).toBeGreaterThan(1);
    expect(view.fittings.length).toBeGreaterThan(1);
    expect(view.owed.length).toBeGreaterThan(0);
    expect(view.laterCount).toBeGreaterThan(0);
    expect(new Set(all("orders").map(({ stage }) => stage)).size).toBe(6);
  });

  it("rings nobody: numbers of the ranges kept free for drama, mail to example.com", () => {
    // Ofcom, numbers for use in drama: 07700 900000 to 900999, London 020 7946 0000 to 0999 (memory).
    const free = /^\+44(7700900\d{3}|2079460\d{3})$/;
    for (const { phone, phoneE164, email } of all("clients")) {
      expect(phoneE164).toMatch(free);
      expect(phone.replace(/ /g, "").replace(/^0/, "+44")).toBe(phoneE164);
      const read = readPhone(phone, "GB");
      if (read.e164) expect(read.e164).toBe(phoneE164);
      expect(email === "" || email.endsWith("@example.com")).toBe(true);
    }
    for (const { phone } of all("workshops"))
      expect(phone.replace(/ /g, "").replace(/^0/, "+44")).toMatch(free);
  });
});
