/**
 * The rows of a workshop's book, as every store holds them. `db/schema.ts` has the same columns; a test
 * compares the two. Money is in integer minor units, lengths in millimetres beside what was typed, days as
 * ISO dates (`2026-03-14`), moments as ISO date-times.
 */

export type Unit = "in" | "cm";
/** How finely marks are set out: eighths or sixteenths of an inch; whole millimetres under `cm`. */
export type Fineness = 8 | 16;

/** What sync needs on every row (sync contract C1, C2): a UUIDv7, and one stamp for each written field. */
export interface RowHead {
  workshopId: string;
  id: string;
  stamps: Record<string, string>;
  /** When it was put in the bin, or null. */
  removedAt: string | null;
}

export interface WorkshopFields {
  name: string;
  unit: Unit;
  fineness: Fineness;
  /** ISO 4217 code. */
  currency: string;
  /** ISO 3166 alpha-2 code; reads phone numbers. */
  country: string;
  address: string;
  phone: string;
  /** True for the invented workshop that a visitor can look round in. */
  demo: boolean;
}

export interface ClientFields {
  name: string;
  /** As typed. */
  phone: string;
  /** E.164 where the number could be read. */
  phoneE164: string | null;
  email: string;
  address: string;
  note: string;
}

export interface WearerFields {
  clientId: string;
  name: string;
  birthYear: number | null;
  birthMonth: number | null;
  /** Where the birth month is not known: an age in whole years, on a day. */
  ageYears: number | null;
  ageOn: string | null;
  note: string;
}

/** One figure of a measurement set; `key` names a body measure of `lib/figures`. */
export interface TakenFigure {
  key: string;
  typed: string;
  mm: number;
}

export interface MeasurementSetFields {
  wearerId: string;
  takenOn: string;
  takenBy: string;
  figures: TakenFigure[];
  note: string;
  /** The set that this one puts right, or null. */
  correctsId: string | null;
}

/** A figure as typed beside its millimetres; an empty `typed` means that the figure was left out. */
export interface TypedLength {
  typed: string;
  mm: number;
}

/** The styles that a sleeve can have; `lib/drafting` has a recipe for each. */
export type StyleId =
  | "plain"
  | "gathered-head"
  | "gathered-hem"
  | "puff"
  | "leg-of-mutton"
  | "statement"
  | "bishop"
  | "bell"
  | "flounced"
  | "petal"
  | "lantern"
  | "cap"
  | "tiered";

export interface SleeveFields {
  wearerId: string | null;
  setId: string | null;
  name: string;
  style: StyleId;
  /** What the drafting form holds: lengths by figure name, and the guide marks as set. */
  ask: SleeveAskRecord;
  fineness: Fineness;
  note: string;
}

export interface SleeveAskRecord {
  lengths: Record<string, TypedLength>;
  /** Guide marks where changed by hand; null keeps the rule's own. Shares of the guide line, mm square to it. */
  frontMarks: { share: number; out: number }[] | null;
  backMarks: { share: number; out: number }[] | null;
  hemOpens: boolean;
  /** What the style asks for beyond the plain sleeve: lengths and ratios by name, and the cloth's weight. */
  style?: { figures: Record<string, TypedLength | number>; cloth: "fine" | "medium" | "heavy" };
}

export type Stage = "agreed" | "cut" | "sewing" | "fitting" | "ready" | "handed-over";

export interface OrderFields {
  clientId: string;
  /** What it is for: "Naming day", "School play". */
  occasion: string;
  agreedOn: string;
  dueOn: string | null;
  stage: Stage;
  currency: string;
  note: string;
}

export interface GarmentFields {
  orderId: string;
  wearerId: string | null;
  kind: string;
  setId: string | null;
  sleeveId: string | null;
  fittingOn: string | null;
  note: string;
  position: number;
}

export interface PriceLineFields {
  orderId: string;
  garmentId: string | null;
  text: string;
  quantity: number;
  unitMinor: number;
  position: number;
}

export type PaymentKind = "deposit" | "payment" | "giving-back";
export type PaymentMethod = "cash" | "transfer" | "card";

export interface PaymentFields {
  orderId: string;
  kind: PaymentKind;
  method: PaymentMethod;
  amountMinor: number;
  paidOn: string;
  note: string;
}

/** A receipt is a snapshot: it prints the same for ever, whatever is changed on the order afterwards. */
export interface ReceiptSnapshot {
  seller: { name: string; lines: string[] };
  buyer: { name: string; lines: string[] };
  occasion: string;
  currency: string;
  lines: { text: string; quantity: number; unitMinor: number; amountMinor: number }[];
  earlier: { number: string; paidOn: string; kind: PaymentKind; amountMinor: number }[];
  payment: { kind: PaymentKind; method: PaymentMethod; amountMinor: number };
  totalMinor: number;
  receivedMinor: number;
  balanceMinor: number;
  cautions: string[];
}

export interface ReceiptFields {
  paymentId: string;
  orderId: string;
  number: string;
  issuedOn: string;
  snapshot: ReceiptSnapshot;
}

/**
 * One answer to a question of a sewing sum, as typed: a length with its millimetres, or the number or the choice that
 * it came to. Neither where it was left out.
 */
export interface SumInput {
  typed: string;
  mm?: number;
  value?: number | string;
}

/** A kept sewing sum. Only what was put in is kept; what comes out is worked out again. */
export interface SumFields {
  /** The order that it is on, or null. */
  orderId: string | null;
  /** Names a sum of `lib/sewing`. */
  kind: string;
  name: string;
  inputs: Record<string, SumInput>;
  note: string;
}

export interface FieldsByTable {
  workshops: WorkshopFields;
  clients: ClientFields;
  wearers: WearerFields;
  measurementSets: MeasurementSetFields;
  sleeves: SleeveFields;
  orders: OrderFields;
  garments: GarmentFields;
  priceLines: PriceLineFields;
  payments: PaymentFields;
  receipts: ReceiptFields;
  sums: SumFields;
}

export type TableName = keyof FieldsByTable;
export type RowOf<T extends TableName> = RowHead & FieldsByTable[T];

export type Workshop = RowOf<"workshops">;
export type Client = RowOf<"clients">;
export type Wearer = RowOf<"wearers">;
export type MeasurementSet = RowOf<"measurementSets">;
export type Sleeve = RowOf<"sleeves">;
export type Order = RowOf<"orders">;
export type Garment = RowOf<"garments">;
export type PriceLine = RowOf<"priceLines">;
export type Payment = RowOf<"payments">;
export type Receipt = RowOf<"receipts">;
export type Sum = RowOf<"sums">;

export const tableNames = [
  "workshops",
  "clients",
  "wearers",
  "measurementSets",
  "sleeves",
  "orders",
  "garments",
  "priceLines",
  "payments",
  "receipts",
  "sums",
] as const satisfies readonly TableName[];

/** Only ever added to; put right by adding (sync contract P3). */
export const addOnlyTables: ReadonlySet<TableName> = new Set(["measurementSets", "payments", "receipts"]);
