import { type Write } from "@/lib/journal/change";
import { currency } from "@/lib/money/currencies";
import { type Client, type Order, type RowOf, type TableName, type Workshop } from "@/lib/records/types";

export const pounds = currency("GBP")!;
export const yen = currency("JPY")!;
export const dinars = currency("BHD")!;

export const head = { workshopId: "w", stamps: {}, removedAt: null };

export const workshop: Workshop = {
  ...head,
  id: "w",
  name: "Wren Lane Sewing Room",
  unit: "in",
  fineness: 8,
  currency: "GBP",
  country: "GB",
  address: "2 Wren Lane\n\n Hollowby ",
  phone: "020 7946 0152",
  demo: false,
};

export const client: Client = {
  ...head,
  id: "c",
  name: "Amara Bello",
  phone: "",
  phoneE164: null,
  email: "",
  address: "9 Tallow Street",
  note: "",
};

export const order: Order = {
  ...head,
  id: "o",
  clientId: "c",
  occasion: "Naming day",
  agreedOn: "2026-03-01",
  dueOn: "2026-03-20",
  stage: "agreed",
  currency: "GBP",
  note: "",
};

/** Ids "1", "2", "3" …, one after the other. */
export function countedIds(): () => string {
  let n = 0;
  return () => String(++n);
}

export const countedNumbers = () => {
  let n = 0;
  return { receipt: () => `7KQ4MX-${String(++n).padStart(4, "0")}` };
};

/** Fields of the writes to one table, in their order. */
export function fieldsOf<T extends TableName>(writes: readonly Write[], table: T) {
  return writes.flatMap((write) =>
    write.table === table
      ? [{ id: write.id, makes: write.makes, ...(write.fields as Partial<RowOf<T>>) }]
      : [],
  );
}

/** The rows after writes that make and edit them. */
export function rowsAfter<T extends TableName>(
  table: T,
  writes: readonly Write[],
  before: RowOf<T>[] = [],
): RowOf<T>[] {
  const rows = new Map(before.map((row) => [row.id, row]));
  for (const write of writes) {
    if (write.table !== table) continue;
    rows.set(write.id, { ...head, ...rows.get(write.id), id: write.id, ...write.fields } as RowOf<T>);
  }
  return [...rows.values()].filter((row) => row.removedAt === null);
}
