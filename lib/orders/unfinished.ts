import { readTaking } from "@/lib/measuring/read-taking";
import { takenCount } from "@/lib/measuring/taking";
import { validate } from "uuid";

/** Something begun and not kept, read from the name of its draft and, where it is a set, from what is in it. */
export type Unfinished =
  | { kind: "set"; wearerId: string; taken: number; of: number; href: string }
  | { kind: "new-order"; clientId: string; href: string }
  | { kind: "change-order" | "money" | "giving-back"; orderId: string; href: string };

/** Null where the draft is of something else, or cannot be gone on with. */
export function readUnfinished(key: string, value: unknown): Unfinished | null {
  if (key.startsWith("measure:")) {
    const taking = readTaking(value);
    if (!taking) return null;
    const { wearerId, correctsId, keys } = taking;
    const corrects = correctsId === null ? "" : `&corrects=${correctsId}`;
    return {
      kind: "set",
      wearerId,
      taken: takenCount(taking),
      of: keys.length,
      href: `/measure?wearer=${wearerId}${corrects}`,
    };
  }
  const [, what, id] = /^order:(new|change|money|giving-back):(.+)$/u.exec(key) ?? [];
  if (id === undefined || !validate(id)) return null;
  switch (what) {
    case "new":
      return { kind: "new-order", clientId: id, href: `/orders/new?client=${id}` };
    case "change":
      return { kind: "change-order", orderId: id, href: `/orders/change?id=${id}` };
    case "money":
      return { kind: "money", orderId: id, href: `/orders/card?id=${id}&money=take` };
    default:
      return { kind: "giving-back", orderId: id, href: `/orders/card?id=${id}&money=give-back` };
  }
}
