import { namesInWords } from "@/lib/clients/list-words";
import { formatDay } from "@/lib/people/format-day";
import { type Garment, type Order, type Wearer } from "@/lib/records/types";

/** What an order is called: its occasion, or the day it was agreed on. */
export function orderName({ occasion, agreedOn }: Pick<Order, "occasion" | "agreedOn">): string {
  return occasion || `Order of ${formatDay(agreedOn, { style: "short" })}`;
}

/**
 * What is sewn, and for whom: "for Ifẹ and Tẹmi" where the client orders for others, "Dress and blouse" where
 * nobody is named or it is for the client alone; empty where nothing is set down.
 */
export function forWhom(
  clientName: string,
  wearers: readonly Pick<Wearer, "name">[],
  garments: readonly Pick<Garment, "kind">[],
): string {
  const names = wearers.map(({ name }) => name);
  if (names.length > 0 && !(names.length === 1 && names[0] === clientName))
    return `for ${namesInWords(names)}`;
  const kinds = [...new Set(garments.map(({ kind }) => kind).filter((kind) => kind !== ""))];
  return namesInWords(kinds.map((kind, i) => (i === 0 ? kind : kind.toLowerCase())));
}
