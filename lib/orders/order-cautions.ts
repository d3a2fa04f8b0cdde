import { ageOn, type BirthFacts } from "@/lib/people/age";
import { type Caution, cautionsFor } from "@/lib/people/cautions";
import { type IsoDate } from "@/lib/people/iso-date";

export interface CautionedGarment {
  kind: string;
  note: string;
  wearer: ({ name: string } & BirthFacts) | null;
}

export interface OrderCaution extends Caution {
  /** Whom it is about, each once; empty where no wearer is named. */
  names: string[];
}

/** What to mind about an order's garments on a day, each caution once, with everyone whom it is about. */
export function orderCautions(garments: readonly CautionedGarment[], on: IsoDate): OrderCaution[] {
  const bySay = new Map<string, OrderCaution>();
  for (const { kind, note, wearer } of garments) {
    // Nothing is cut as yet where not even a kind is set down.
    if (kind.trim() === "") continue;
    for (const caution of cautionsFor(`${kind} ${note}`, wearer ? ageOn(wearer, on) : undefined)) {
      const held = bySay.get(caution.say) ?? { ...caution, names: [] };
      if (wearer && !held.names.includes(wearer.name)) held.names.push(wearer.name);
      bySay.set(caution.say, held);
    }
  }
  return [...bySay.values()];
}

/** Those that a buyer should read too, for the receipt: the rules with a text, not the maker's own care at the table. */
export function receiptCautions(cautions: readonly Caution[]): string[] {
  return cautions.filter(({ mark }) => mark === "seen").map(({ say, source }) => `${say} (${source})`);
}
