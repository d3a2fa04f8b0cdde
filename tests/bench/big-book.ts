/** A book of many years, invented from a seed: `clients` clients with a wearer each and four orders on average. */
import { writeStamp } from "@/lib/clock/stamp";
import { type RowChange } from "@/lib/journal/change";
import { evenNumbers } from "@/tests/support/even-numbers";
import { type FieldsByTable, type Stage, type TableName } from "@/lib/records/types";

const first = [
  "Ana",
  "Beatrix",
  "Chidera",
  "Dilnoza",
  "Élodie",
  "Farah",
  "Grażyna",
  "Hana",
  "Ioana",
  "Jovana",
  "Kaveri",
  "Lucja",
  "Mirembe",
  "Nadège",
  "Oksana",
  "Pilar",
];
const last = [
  "Abela",
  "Brannock",
  "Cauchi",
  "Dromey",
  "Estabry",
  "Farrugia",
  "Grech",
  "Holloway",
  "Ilves",
  "Jastrow",
  "Kerslake",
  "Lindqvaer",
  "Mifsud",
  "Norgrove",
  "Okpara",
  "Pelham",
];

export interface BigBookOptions {
  clients: number;
  orders: number;
  today: string;
  seed: number;
}

/** Rows as changes that make them; ids sort by age. About 3 in 100 orders are open and 1 in 100 owed. */
export function bigBook({ clients, orders, today, seed }: BigBookOptions): RowChange[] {
  const luck = evenNumbers(seed);
  const pick = <T>(items: readonly T[]): T => items[Math.floor(luck() * items.length)]!;
  let n = 0;
  const start = Date.parse(`${today}T08:00:00Z`) - 8 * 365 * 86_400_000;
  const id = () => {
    const ms = (start + n++ * 60_000).toString(16).padStart(12, "0");
    const tail = Math.floor(luck() * 2 ** 40)
      .toString(16)
      .padStart(12, "0");
    return `${ms.slice(0, 8)}-${ms.slice(8)}-7000-8000-${tail}`;
  };
  const day = (offset: number) =>
    new Date(Date.parse(`${today}T00:00:00Z`) + offset * 86_400_000).toISOString().slice(0, 10);
  const stamp = writeStamp({ ms: start, counter: 0 }, "00000000-0000-4000-8000-000000000000");
  const rows: RowChange[] = [];
  const make = <T extends TableName>(table: T, fields: FieldsByTable[T]): string => {
    const made: RowChange = { table, id: id(), makes: true, fields: {} };
    for (const [name, value] of Object.entries({ ...fields, removedAt: null }))
      made.fields[name] = { value, stamp, base: null };
    rows.push(made);
    return made.id;
  };
  const people: { client: string; wearer: string }[] = [];
  for (let i = 0; i < clients; i++) {
    const name = `${pick(first)} ${pick(last)} ${i}`;
    const client = make("clients", {
      name,
      phone: `0770 090 ${String(i).padStart(4, "0")}`,
      phoneE164: null,
      email: "",
      address: "",
      note: "",
    });
    const wearer = make("wearers", {
      clientId: client,
      name: pick(first),
      birthYear: 2012 + (i % 14),
      birthMonth: 1 + (i % 12),
      ageYears: null,
      ageOn: null,
      note: "",
    });
    people.push({ client, wearer });
  }
  for (let i = 0; i < orders; i++) {
    const { client, wearer } = pick(people);
    const open = luck() < 0.03;
    const owed = !open && luck() < 0.01;
    const stage: Stage = open
      ? pick(["agreed", "cut", "sewing", "fitting", "ready"] as const)
      : "handed-over";
    const due = open ? Math.floor(luck() * 60) - 10 : -Math.floor(luck() * 2800) - 20;
    const price = 3000 + Math.floor(luck() * 20) * 500;
    const order = make("orders", {
      clientId: client,
      occasion: pick(["School play", "Naming day", "Wedding", "Choir"]),
      agreedOn: day(due - 20),
      dueOn: day(due),
      stage,
      currency: "EUR",
      note: "",
    });
    make("garments", {
      orderId: order,
      wearerId: wearer,
      kind: pick(["Dress", "Blouse", "Skirt"]),
      setId: null,
      sleeveId: null,
      fittingOn: open && luck() < 0.4 ? day(due - 5) : null,
      note: "",
      position: 0,
    });
    make("priceLines", {
      orderId: order,
      garmentId: null,
      text: "Making",
      quantity: 1,
      unitMinor: price,
      position: 0,
    });
    make("payments", {
      orderId: order,
      kind: "deposit",
      method: "cash",
      amountMinor: price / 2,
      paidOn: day(due - 20),
      note: "",
    });
    if (!open && !owed)
      make("payments", {
        orderId: order,
        kind: "payment",
        method: "cash",
        amountMinor: price / 2,
        paidOn: day(due),
        note: "",
      });
  }
  return rows;
}
