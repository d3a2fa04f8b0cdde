/**
 * The rows of `types.ts` as they are checked when they come from outside, out of a saved copy. A test holds the two
 * against each other. Only the shape is asked for: what a form would question was kept once, and is read back.
 */
import { z } from "zod";
import { type RowOf, type TableName } from "./types";

const text = z.string();
const id = z.guid();
const day = z.iso.date();
const unit = z.enum(["in", "cm"]);
const fineness = z.union([z.literal(8), z.literal(16)]);
const paymentKind = z.enum(["deposit", "payment", "giving-back"]);
const paymentMethod = z.enum(["cash", "transfer", "card"]);

const head = {
  workshopId: id,
  id,
  stamps: z.record(text, z.string().regex(/^[0-9a-f]{12}-[0-9a-f]{4}-.+$/)),
  removedAt: text.nullable(),
};

const typedLength = z.strictObject({ typed: text, mm: z.number() });

const styleId = z.enum([
  "plain",
  "gathered-head",
  "gathered-hem",
  "puff",
  "leg-of-mutton",
  "statement",
  "bishop",
  "bell",
  "flounced",
  "petal",
  "lantern",
  "cap",
  "tiered",
]);

const guideMarks = z.array(z.strictObject({ share: z.number(), out: z.number() })).nullable();

const snapshot = z.strictObject({
  seller: z.strictObject({ name: text, lines: z.array(text) }),
  buyer: z.strictObject({ name: text, lines: z.array(text) }),
  occasion: text,
  currency: text,
  lines: z.array(z.strictObject({ text, quantity: z.int(), unitMinor: z.int(), amountMinor: z.int() })),
  earlier: z.array(z.strictObject({ number: text, paidOn: day, kind: paymentKind, amountMinor: z.int() })),
  payment: z.strictObject({ kind: paymentKind, method: paymentMethod, amountMinor: z.int() }),
  totalMinor: z.int(),
  receivedMinor: z.int(),
  balanceMinor: z.int(),
  cautions: z.array(text),
});

export const rowSchemas = {
  workshops: z.strictObject({
    ...head,
    name: text,
    unit,
    fineness,
    currency: text,
    country: text,
    address: text,
    phone: text,
    demo: z.boolean(),
  }),
  clients: z.strictObject({
    ...head,
    name: text,
    phone: text,
    phoneE164: text.nullable(),
    email: text,
    address: text,
    note: text,
  }),
  wearers: z.strictObject({
    ...head,
    clientId: id,
    name: text,
    birthYear: z.int().nullable(),
    birthMonth: z.int().nullable(),
    ageYears: z.int().nullable(),
    ageOn: day.nullable(),
    note: text,
  }),
  measurementSets: z.strictObject({
    ...head,
    wearerId: id,
    takenOn: day,
    takenBy: text,
    figures: z.array(z.strictObject({ key: text, typed: text, mm: z.number() })),
    note: text,
    correctsId: id.nullable(),
  }),
  sleeves: z.strictObject({
    ...head,
    wearerId: id.nullable(),
    setId: id.nullable(),
    name: text,
    style: styleId,
    ask: z.strictObject({
      lengths: z.record(text, typedLength),
      frontMarks: guideMarks,
      backMarks: guideMarks,
      hemOpens: z.boolean(),
      style: z
        .strictObject({
          figures: z.record(text, z.union([typedLength, z.number()])),
          cloth: z.enum(["fine", "medium", "heavy"]),
        })
        .optional(),
    }),
    fineness,
    note: text,
  }),
  orders: z.strictObject({
    ...head,
    clientId: id,
    occasion: text,
    agreedOn: day,
    dueOn: day.nullable(),
    stage: z.enum(["agreed", "cut", "sewing", "fitting", "ready", "handed-over"]),
    currency: text,
    note: text,
  }),
  garments: z.strictObject({
    ...head,
    orderId: id,
    wearerId: id.nullable(),
    kind: text,
    setId: id.nullable(),
    sleeveId: id.nullable(),
    fittingOn: day.nullable(),
    note: text,
    position: z.int(),
  }),
  priceLines: z.strictObject({
    ...head,
    orderId: id,
    garmentId: id.nullable(),
    text,
    quantity: z.int(),
    unitMinor: z.int(),
    position: z.int(),
  }),
  payments: z.strictObject({
    ...head,
    orderId: id,
    kind: paymentKind,
    method: paymentMethod,
    amountMinor: z.int(),
    paidOn: day,
    note: text,
  }),
  receipts: z.strictObject({
    ...head,
    paymentId: id,
    orderId: id,
    number: text,
    issuedOn: day,
    snapshot,
  }),
  sums: z.strictObject({
    ...head,
    orderId: id.nullable(),
    kind: text,
    name: text,
    inputs: z.record(
      text,
      z.strictObject({
        typed: text,
        mm: z.number().optional(),
        value: z.union([z.number(), text]).optional(),
      }),
    ),
    note: text,
  }),
} satisfies { [T in TableName]: z.ZodType<RowOf<T>> };
