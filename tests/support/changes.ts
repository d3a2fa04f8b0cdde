/** Random but valid changes of one device, for properties of merge, journal and databases. */
import fc from "fast-check";
import { writeStamp } from "@/lib/clock/stamp";
import { type Change, type RowChange, SCHEMA_NUMBER } from "@/lib/journal/change";
import { type FieldsByTable, type SumInput, type TableName } from "@/lib/records/types";

export const WORKSHOP = "01890000-0000-7000-8000-000000000001";
export const DEVICE = "3f0c8a52-6d5e-4b7a-9a41-1c2d3e4f5a6b";

/** The nth id of a table; UUIDv7-shaped, sorting by `n`. */
export const idOf = (table: number, n: number): string =>
  `0189${table.toString(16).padStart(4, "0")}-0000-7000-8000-${n.toString(16).padStart(12, "0")}`;

const clientId = fc.integer({ min: 0, max: 5 }).map((n) => idOf(1, n));
const wearerId = fc.integer({ min: 0, max: 7 }).map((n) => idOf(2, n));
const orderId = fc.integer({ min: 0, max: 6 }).map((n) => idOf(5, n));
const lineId = fc.integer({ min: 0, max: 9 }).map((n) => idOf(7, n));
const paymentId = fc.integer({ min: 0, max: 9 }).map((n) => idOf(8, n));
const sumId = fc.integer({ min: 0, max: 5 }).map((n) => idOf(10, n));
const day = fc
  .integer({ min: 0, max: 60 })
  .map((n) => new Date(Date.UTC(2026, 2, 1 + n)).toISOString().slice(0, 10));
const name = fc.constantFrom(
  "Ana Brdar",
  "Ánna Břdar",
  "Łucja Øst",
  "Zoë",
  "مريم",
  "Émile-Ann",
  "Bo 2nd",
  "an",
);
const removedAt = fc.option(
  day.map((on) => `${on}T10:00:00.000Z`),
  { freq: 4, nil: null },
);

type Made<T extends TableName> = {
  table: T;
  id: string;
  fields: FieldsByTable[T] & { removedAt: string | null };
};

const client: fc.Arbitrary<Made<"clients">> = fc.record({
  table: fc.constant("clients" as const),
  id: clientId,
  fields: fc.record({
    name,
    phone: fc.constantFrom("", "020 7946 0018", "+356 2100 0000"),
    phoneE164: fc.constantFrom(null, "+442079460018"),
    email: fc.constant(""),
    address: fc.constant(""),
    note: fc.string({ maxLength: 8 }),
    removedAt,
  }),
});
const wearer: fc.Arbitrary<Made<"wearers">> = fc.record({
  table: fc.constant("wearers" as const),
  id: wearerId,
  fields: fc.record({
    clientId,
    name,
    birthYear: fc.constantFrom(null, 2019),
    birthMonth: fc.constantFrom(null, 4),
    ageYears: fc.constant(null),
    ageOn: fc.constant(null),
    note: fc.constant(""),
    removedAt,
  }),
});
const order: fc.Arbitrary<Made<"orders">> = fc.record({
  table: fc.constant("orders" as const),
  id: orderId,
  fields: fc.record({
    clientId,
    occasion: fc.constantFrom("School play", "Naming day"),
    agreedOn: day,
    dueOn: fc.option(day, { nil: null }),
    stage: fc.constantFrom("agreed", "cut", "sewing", "fitting", "ready", "handed-over"),
    currency: fc.constant("EUR"),
    note: fc.constant(""),
    removedAt,
  }),
});
const line: fc.Arbitrary<Made<"priceLines">> = fc.record({
  table: fc.constant("priceLines" as const),
  id: lineId,
  fields: fc.record({
    orderId,
    garmentId: fc.constant(null),
    text: fc.constantFrom("Dress", "Hem"),
    quantity: fc.integer({ min: 1, max: 3 }),
    unitMinor: fc.integer({ min: 0, max: 9_000 }),
    position: fc.integer({ min: 0, max: 3 }),
    removedAt,
  }),
});
const payment: fc.Arbitrary<Made<"payments">> = fc.record({
  table: fc.constant("payments" as const),
  id: paymentId,
  fields: fc.record({
    orderId,
    kind: fc.constantFrom("deposit", "payment", "giving-back"),
    method: fc.constantFrom("cash", "transfer", "card"),
    amountMinor: fc.integer({ min: 1, max: 9_000 }),
    paidOn: day,
    note: fc.constant(""),
    removedAt: fc.constant(null),
  }),
});

const sum: fc.Arbitrary<Made<"sums">> = fc.record({
  table: fc.constant("sums" as const),
  id: sumId,
  fields: fc.record({
    orderId: fc.option(orderId, { nil: null }),
    kind: fc.constantFrom("ruffle", "cuff-band", "of a later version"),
    name: fc.constantFrom("", "Collar frill"),
    inputs: fc.constantFrom<Record<string, SumInput>[]>(
      {},
      { seam: { typed: "15", mm: 381 }, ratio: { typed: "2½", value: 2.5 }, cloth: { typed: "" } },
      { shape: { typed: "half", value: "half" } },
    ),
    note: fc.constant(""),
    removedAt,
  }),
});

const made = fc.oneof(client, wearer, order, line, payment, sum);

/**
 * Changes of one device, numbered from 1. A row is made by its first change, and edited (all fields or some of
 * them) by later ones; payments are made once. Stamps grow, with repeats of old ones thrown in where `shuffled`.
 */
export const changesOf = (options: { max: number }): fc.Arbitrary<Change[]> =>
  fc
    .array(fc.tuple(fc.array(made, { minLength: 1, maxLength: 4 }), fc.integer({ min: 1, max: 4 })), {
      minLength: 1,
      maxLength: options.max,
    })
    .map((writes) => {
      const known = new Set<string>();
      return writes.map(([rows, keepEvery], i): Change => {
        const stamp = writeStamp({ ms: 1_800_000_000_000 + i, counter: 0 }, DEVICE);
        const rowChanges: RowChange[] = [];
        for (const row of rows) {
          if (rowChanges.some((other) => other.id === row.id)) continue;
          const makes = !known.has(row.id);
          if (!makes && row.table === "payments") continue;
          known.add(row.id);
          const fields = Object.entries(row.fields).filter((_, n) => makes || n % keepEvery === 0);
          rowChanges.push({
            table: row.table,
            id: row.id,
            makes,
            fields: Object.fromEntries(fields.map(([key, value]) => [key, { value, stamp, base: null }])),
          });
        }
        return {
          number: i + 1,
          device: DEVICE,
          workshopId: WORKSHOP,
          schema: SCHEMA_NUMBER,
          writtenAt: "2026-03-01T09:00:00.000Z",
          rows: rowChanges,
        };
      });
    });
