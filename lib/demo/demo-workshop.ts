/** The invented workshop that a visitor can look round in: one change, made from today's day. */
import { make, newId, type Write } from "@/lib/journal/change";
import { type Numbers } from "@/lib/journal/journal";
import { parseLength } from "@/lib/lengths/parse-length";
import { orderCautions, receiptCautions } from "@/lib/orders/order-cautions";
import { moneyWrites } from "@/lib/orders/take-money";
import { ageOn, type BirthFacts } from "@/lib/people/age";
import { type IsoDate, readDay } from "@/lib/people/iso-date";
import {
  type MeasurementSetFields,
  type PriceLineFields,
  type ReceiptFields,
  type ReceiptSnapshot,
  type SleeveFields,
  type SumFields,
  type TakenFigure,
  type WorkshopFields,
} from "@/lib/records/types";
import { askFromSet } from "@/lib/sleeves/ask-from-set";
import { type Reach } from "@/lib/sleeves/reach";
import { emptyForm, readForm } from "@/lib/sleeves/sleeve-form";
import { type DemoOrder, demoOrders } from "./demo-orders";
import { type DemoClient, demoClients, type DemoSet } from "./demo-people";

/** `today` where she is; `id` makes the ids, another one only for tests. */
export interface DemoAsk {
  today: IsoDate;
  workshopId: string;
  numbers: Numbers;
  id?: () => string;
}

const workshop: WorkshopFields = {
  name: "Wren Lane Sewing Room",
  unit: "in",
  fineness: 8,
  currency: "GBP",
  country: "GB",
  address: "2 Wren Lane\nHollowby",
  phone: "020 7946 0152",
  demo: true,
};

/** On no order yet. */
const ruffleSum: SumFields = {
  orderId: null,
  kind: "ruffle",
  name: "Ruffle for a hem, tried out",
  inputs: {
    seam: { typed: "15", mm: 381 },
    ratio: { typed: "2 1/2", value: 2.5 },
    width: { typed: "45", mm: 1143 },
    join: { typed: "1/4", mm: 6.35 },
    ends: { typed: "open", value: "open" },
  },
  note: "",
};

/** A wearer as far as an order needs one. */
interface Placed {
  wearerId: string;
  name: string;
  birth: BirthFacts;
  setId: string;
  figures: TakenFigure[];
}

export function demoWrites(ask: DemoAsk): Write[] {
  const { workshopId } = ask;
  const placed = new Map<DemoClient["key"], { clientId: string; client: DemoClient; wearers: Placed[] }>();
  const writes: Write[] = [make("workshops", workshop, workshopId)];
  for (const client of demoClients) {
    const { people, clientId, wearers } = clientWrites(client, ask);
    writes.push(...people);
    placed.set(client.key, { clientId, client, wearers });
  }
  for (const order of demoOrders) {
    const { client, clientId, wearers } = placed.get(order.client)!;
    writes.push(...orderWrites(order, client, clientId, wearers, ask));
  }
  writes.push(make("sleeves", bareSleeve(), newIdOf(ask)), make("sleeves", statementSleeve(), newIdOf(ask)));
  writes.push(make("sums", ruffleSum, newIdOf(ask)));
  return writes;

  /** One drafted from four figures, for nobody yet. */
  function bareSleeve(): SleeveFields {
    const form = emptyForm("in", 8);
    Object.assign(form.typed, { length: "8", capDepth: "3 1/2", biceps: "12", hem: "11" });
    const note = "From four figures, for nobody yet.";
    return {
      wearerId: null,
      setId: null,
      name: "Child’s sleeve, tried out",
      style: "plain",
      ask: readForm(form).record,
      fineness: 8,
      note,
    };
  }

  /** The same block made full, with the usual figures of the style. */
  function statementSleeve(): SleeveFields {
    const plain = bareSleeve();
    return {
      ...plain,
      name: "Child’s statement sleeve, tried out",
      style: "statement",
      ask: { ...plain.ask, style: { figures: {}, cloth: "medium" } },
      note: "The plain one made full: six slashes, opened at the head.",
    };
  }
}

const newIdOf = ({ id = newId }: DemoAsk): string => id();

function addDays(day: IsoDate, days: number): IsoDate {
  const { year, month, day: date } = readDay(day);
  return new Date(Date.UTC(year, month - 1, date + days)).toISOString().slice(0, 10);
}

function takenFigures(figures: DemoSet["figures"]): TakenFigure[] {
  return Object.entries(figures).map(([key, typed]) => {
    const read = parseLength(typed, "in");
    if (!read.ok) throw new Error(`${key}: ${read.say}`);
    return { key, typed, mm: read.mm };
  });
}

/** Born so many whole months before today; someone grown up was not asked. */
function birthOf(months: number | undefined, today: IsoDate): BirthFacts {
  const unasked = { birthYear: null, birthMonth: null, ageYears: null, ageOn: null };
  if (months === undefined) return unasked;
  const { year, month } = readDay(today);
  const count = year * 12 + month - 1 - months;
  return { ...unasked, birthYear: Math.floor(count / 12), birthMonth: (count % 12) + 1 };
}

function clientWrites(client: DemoClient, ask: DemoAsk) {
  const clientId = newIdOf(ask);
  const { name, phone, phoneE164, email = "", address = "", note = "" } = client;
  const people: Write[] = [make("clients", { name, phone, phoneE164, email, address, note }, clientId)];
  const wearers = client.wearers.map((wearer): Placed => {
    const wearerId = newIdOf(ask);
    const birth = birthOf(wearer.months, ask.today);
    people.push(
      make("wearers", { clientId, name: wearer.name, ...birth, note: wearer.note ?? "" }, wearerId),
    );
    let last: { id: string; fields: MeasurementSetFields } | undefined;
    for (const set of wearer.sets) {
      const fields: MeasurementSetFields = {
        wearerId,
        takenOn: addDays(ask.today, -set.daysAgo),
        takenBy: set.by,
        figures: takenFigures(set.figures),
        note: set.note ?? "",
        correctsId: null,
      };
      last = { id: newIdOf(ask), fields };
      people.push(make("measurementSets", fields, last.id));
    }
    return { wearerId, name: wearer.name, birth, setId: last!.id, figures: last!.fields.figures };
  });
  return { people, clientId, wearers };
}

function sleeveFields(
  { wearerId, name, birth, setId, figures }: Placed,
  reach: Reach,
  today: IsoDate,
): SleeveFields {
  const ageYears = ageOn(birth, today)?.years;
  const { typed, said: _said, ...ways } = askFromSet({ figures, ageYears, reach, unit: "in", fineness: 8 });
  const form = emptyForm("in", 8);
  const { record } = readForm({ ...form, ...ways, typed: { ...form.typed, ...typed } });
  return {
    wearerId,
    setId,
    name: `${name}, ${reach} sleeve`,
    style: "plain",
    ask: record,
    fineness: 8,
    note: "",
  };
}

function orderWrites(
  order: DemoOrder,
  client: DemoClient,
  clientId: string,
  wearers: readonly Placed[],
  ask: DemoAsk,
): Write[] {
  const day = (days: number) => addDays(ask.today, days);
  const orderId = newIdOf(ask);
  const { occasion, stage, note = "" } = order;
  const head = { clientId, occasion, agreedOn: day(order.agreed), stage, currency: workshop.currency, note };
  const writes: Write[] = [
    make("orders", { ...head, dueOn: order.due === null ? null : day(order.due) }, orderId),
  ];
  const garmentIds = order.garments.map((garment, position) => {
    const wearer = wearers[garment.wearer]!;
    let sleeveId: string | null = null;
    if (garment.reach) {
      sleeveId = newIdOf(ask);
      writes.push(make("sleeves", sleeveFields(wearer, garment.reach, ask.today), sleeveId));
    }
    const { wearerId, setId } = wearer;
    const fittingOn = garment.fittingIn === undefined ? null : day(garment.fittingIn);
    const fields = {
      orderId,
      wearerId,
      kind: garment.kind,
      setId,
      sleeveId,
      fittingOn,
      note: garment.note ?? "",
      position,
    };
    const id = newIdOf(ask);
    writes.push(make("garments", fields, id));
    return id;
  });
  const lines = order.lines.map(({ text, quantity, unitMinor, garment }, position): PriceLineFields => {
    const garmentId = garment === undefined ? null : garmentIds[garment]!;
    return { orderId, garmentId, text, quantity, unitMinor, position };
  });
  writes.push(...lines.map((line) => make("priceLines", line, newIdOf(ask))));

  const birthOfWearer = (at: number) => ({ name: wearers[at]!.name, ...wearers[at]!.birth });
  const garments = order.garments.map(({ kind, wearer }) => ({
    kind,
    note: "",
    wearer: birthOfWearer(wearer),
  }));
  const earlier: ReceiptSnapshot["earlier"] = [];
  for (const { on, ...moved } of order.payments) {
    const paidOn = day(on);
    const [payment, receipt] = moneyWrites(
      {
        orderId,
        receiptId: newIdOf(ask),
        workshop,
        client: { name: client.name, address: client.address ?? "" },
        order: head,
        lines,
        earlier,
        payment: { id: newIdOf(ask), ...moved, paidOn, note: "" },
        cautions: receiptCautions(orderCautions(garments, paidOn)),
      },
      ask.numbers,
    );
    writes.push(payment!, receipt!);
    const { number } = receipt!.fields as ReceiptFields;
    earlier.push({ number, paidOn, kind: moved.kind, amountMinor: moved.amountMinor });
  }
  return writes;
}
