/**
 * One schema for the phone's database and the server's. Every table carries its workshop first in its key, so
 * that a distributed PostgreSQL can shard by it; ids are UUIDv7 made where the row was made; `stamps` holds one
 * stamp for each written field (sync contract C1, C2). There are no foreign keys: rows arrive one by one from
 * other devices, a child may come before its parent, and nothing is ever deleted under another row.
 */
import {
  bigint,
  boolean,
  date,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  uuid,
} from "drizzle-orm/pg-core";
import {
  type PaymentKind,
  type PaymentMethod,
  type ReceiptSnapshot,
  type SleeveAskRecord,
  type Stage,
  type StyleId,
  type SumInput,
  type TakenFigure,
  type Unit,
  type Fineness,
} from "@/lib/records/types";

const head = () => ({
  workshopId: uuid("workshop_id").notNull(),
  id: uuid("id").notNull(),
  stamps: jsonb("stamps").$type<Record<string, string>>().notNull(),
  removedAt: text("removed_at"),
});

const money = (name: string) => bigint(name, { mode: "number" });
const day = (name: string) => date(name, { mode: "string" });

export const workshops = pgTable(
  "workshops",
  {
    ...head(),
    name: text("name").notNull(),
    unit: text("unit").$type<Unit>().notNull(),
    fineness: integer("fineness").$type<Fineness>().notNull(),
    currency: text("currency").notNull(),
    country: text("country").notNull(),
    address: text("address").notNull(),
    phone: text("phone").notNull(),
    demo: boolean("demo").notNull(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.id] })],
);

export const clients = pgTable(
  "clients",
  {
    ...head(),
    name: text("name").notNull(),
    phone: text("phone").notNull(),
    phoneE164: text("phone_e164"),
    email: text("email").notNull(),
    address: text("address").notNull(),
    note: text("note").notNull(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.id] })],
);

export const wearers = pgTable(
  "wearers",
  {
    ...head(),
    clientId: uuid("client_id").notNull(),
    name: text("name").notNull(),
    birthYear: integer("birth_year"),
    birthMonth: integer("birth_month"),
    ageYears: integer("age_years"),
    ageOn: day("age_on"),
    note: text("note").notNull(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.id] }), index().on(t.workshopId, t.clientId)],
);

export const measurementSets = pgTable(
  "measurement_sets",
  {
    ...head(),
    wearerId: uuid("wearer_id").notNull(),
    takenOn: day("taken_on").notNull(),
    takenBy: text("taken_by").notNull(),
    figures: jsonb("figures").$type<TakenFigure[]>().notNull(),
    note: text("note").notNull(),
    correctsId: uuid("corrects_id"),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.id] }), index().on(t.workshopId, t.wearerId)],
);

export const sleeves = pgTable(
  "sleeves",
  {
    ...head(),
    wearerId: uuid("wearer_id"),
    setId: uuid("set_id"),
    name: text("name").notNull(),
    style: text("style").$type<StyleId>().notNull(),
    ask: jsonb("ask").$type<SleeveAskRecord>().notNull(),
    fineness: integer("fineness").$type<Fineness>().notNull(),
    note: text("note").notNull(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.id] }), index().on(t.workshopId, t.wearerId)],
);

export const orders = pgTable(
  "orders",
  {
    ...head(),
    clientId: uuid("client_id").notNull(),
    occasion: text("occasion").notNull(),
    agreedOn: day("agreed_on").notNull(),
    dueOn: day("due_on"),
    stage: text("stage").$type<Stage>().notNull(),
    currency: text("currency").notNull(),
    note: text("note").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.workshopId, t.id] }),
    index().on(t.workshopId, t.clientId),
    index().on(t.workshopId, t.stage, t.dueOn),
  ],
);

export const garments = pgTable(
  "garments",
  {
    ...head(),
    orderId: uuid("order_id").notNull(),
    wearerId: uuid("wearer_id"),
    kind: text("kind").notNull(),
    setId: uuid("set_id"),
    sleeveId: uuid("sleeve_id"),
    fittingOn: day("fitting_on"),
    note: text("note").notNull(),
    position: integer("position").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.workshopId, t.id] }),
    index().on(t.workshopId, t.orderId),
    index().on(t.workshopId, t.fittingOn),
  ],
);

export const priceLines = pgTable(
  "price_lines",
  {
    ...head(),
    orderId: uuid("order_id").notNull(),
    garmentId: uuid("garment_id"),
    text: text("text").notNull(),
    quantity: integer("quantity").notNull(),
    unitMinor: money("unit_minor").notNull(),
    position: integer("position").notNull(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.id] }), index().on(t.workshopId, t.orderId)],
);

export const payments = pgTable(
  "payments",
  {
    ...head(),
    orderId: uuid("order_id").notNull(),
    kind: text("kind").$type<PaymentKind>().notNull(),
    method: text("method").$type<PaymentMethod>().notNull(),
    amountMinor: money("amount_minor").notNull(),
    paidOn: day("paid_on").notNull(),
    note: text("note").notNull(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.id] }), index().on(t.workshopId, t.orderId)],
);

export const receipts = pgTable(
  "receipts",
  {
    ...head(),
    paymentId: uuid("payment_id").notNull(),
    orderId: uuid("order_id").notNull(),
    number: text("number").notNull(),
    issuedOn: day("issued_on").notNull(),
    snapshot: jsonb("snapshot").$type<ReceiptSnapshot>().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.workshopId, t.id] }),
    index().on(t.workshopId, t.orderId),
    index().on(t.workshopId, t.number),
  ],
);

export const sums = pgTable(
  "sums",
  {
    ...head(),
    orderId: uuid("order_id"),
    kind: text("kind").notNull(),
    name: text("name").notNull(),
    inputs: jsonb("inputs").$type<Record<string, SumInput>>().notNull(),
    note: text("note").notNull(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.id] }), index().on(t.workshopId, t.orderId)],
);

/** The tables of a workshop's book, by the names that changes use. */
export const bookTables = {
  workshops,
  clients,
  wearers,
  measurementSets,
  sleeves,
  orders,
  garments,
  priceLines,
  payments,
  receipts,
  sums,
};

/** Worked out from the rows above as they are written; never synced, made again at any time. */
export const clientIndex = pgTable(
  "client_index",
  {
    workshopId: uuid("workshop_id").notNull(),
    clientId: uuid("client_id").notNull(),
    /** Folded name, phones and wearers' names, to search in. */
    text: text("text").notNull(),
    /** Folded name, to sort by. */
    sortKey: text("sort_key").notNull(),
    removed: boolean("removed").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.workshopId, t.clientId] }),
    index().on(t.workshopId, t.removed, t.sortKey),
  ],
);

/** Worked out, like `client_index`: what an order comes to and what is still owed. */
export const orderSums = pgTable(
  "order_sums",
  {
    workshopId: uuid("workshop_id").notNull(),
    orderId: uuid("order_id").notNull(),
    totalMinor: money("total_minor").notNull(),
    balanceMinor: money("balance_minor").notNull(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.orderId] }), index().on(t.workshopId, t.balanceMinor)],
);

/** How far this database has followed the journal; moves in the transaction of the effect. */
export const journalMarks = pgTable("journal_marks", {
  device: uuid("device").primaryKey(),
  applied: integer("applied").notNull(),
  /** Rows of each table after that change: a reopened database that counts otherwise is spoilt. */
  counts: jsonb("counts").$type<Record<string, number>>().notNull(),
});
