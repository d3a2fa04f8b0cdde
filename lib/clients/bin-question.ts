import { type OrderSums } from "@/lib/money/order-sums";
import { type Client, type Order, type Wearer } from "@/lib/records/types";

/** What a question before the bin says: the question, and what goes along, a sentence each. */
export interface BinQuestion {
  title: string;
  say: string[];
}

type Counted = { order: Pick<Order, "stage" | "currency">; sums: Pick<OrderSums, "balanceMinor"> };

/** Minor units and an ISO 4217 code, in words. */
type SayMoney = (minor: number, currency: string) => string;

const count = (n: number, one: string, many = `${one}s`): string => `${n} ${n === 1 ? one : many}`;

function openWords(open: number, all: number): string {
  if (open === 0) return "";
  return open === all ? " not handed over" : `, ${open} of them not handed over`;
}

/** Sums of one sign, each currency by itself. */
function amounts(orders: readonly Counted[], sign: 1 | -1, money: SayMoney): string[] {
  const byCurrency = new Map<string, number>();
  for (const { order, sums } of orders) {
    const minor = sums.balanceMinor * sign;
    if (minor > 0) byCurrency.set(order.currency, (byCurrency.get(order.currency) ?? 0) + minor);
  }
  return [...byCurrency].map(([code, minor]) => money(minor, code));
}

/** Before a client is put in the bin: what goes along, and what money stands out. */
export function clientBinQuestion(
  client: Pick<Client, "name">,
  wearers: number,
  orders: readonly Counted[],
  money: SayMoney,
): BinQuestion {
  const open = orders.filter(({ order }) => order.stage !== "handed-over").length;
  const owed = amounts(orders, 1, money);
  const back = amounts(orders, -1, money);
  const parts = [
    ...(wearers > 0 ? [`${count(wearers, "wearer")} with all figures`] : []),
    ...(orders.length > 0 ? [`${count(orders.length, "order")}${openWords(open, orders.length)}`] : []),
  ];
  return {
    title: `Put ${client.name} in the bin?`,
    say: [
      ...(parts.length > 0 ? [`With this client go ${parts.join(" and ")}.`] : []),
      ...owed.map((amount) => `${amount} is still to come in.`),
      ...back.map((amount) => `${amount} is still to be given back.`),
      "All of it can be brought back from the bin.",
    ],
  };
}

/** Before a wearer is put in the bin. `openGarments`: kinds of garments in orders not handed over. */
export function wearerBinQuestion(
  wearer: Pick<Wearer, "name">,
  sets: number,
  sleeves: number,
  openGarments: readonly string[],
): BinQuestion {
  return {
    title: `Put ${wearer.name} in the bin?`,
    say: [
      ...(sets > 0 ? [`${count(sets, "measurement set")} ${sets === 1 ? "goes" : "go"} along.`] : []),
      ...(openGarments.length > 0
        ? [
            `${count(openGarments.length, "garment")} for ${wearer.name} ${
              openGarments.length === 1 ? "is" : "are"
            } not handed over yet: ${openGarments.join(", ")}. The orders stay.`,
          ]
        : []),
      ...(sleeves > 0 ? [`${count(sleeves, "sleeve")} stay${sleeves === 1 ? "s" : ""} under Sleeves.`] : []),
      "All of it can be brought back from the bin.",
    ],
  };
}

/** Orders that went into the bin in the same change as their client, and come back with it. */
export function wentWithClient<T extends Pick<Order, "clientId" | "removedAt">>(
  client: Pick<Client, "id" | "removedAt">,
  orders: readonly T[],
): T[] {
  return client.removedAt === null
    ? []
    : orders.filter((order) => order.clientId === client.id && order.removedAt === client.removedAt);
}
