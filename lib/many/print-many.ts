import { type DraftedWearer } from "@/lib/many/draft-many";
import { sleeveFieldsOf } from "@/lib/many/keep-many";
import { type IsoDate } from "@/lib/people/iso-date";
import { type FullSizeDocument } from "@/lib/pdf/full-size-document";
import { type Fineness, type Unit } from "@/lib/records/types";
import { fullSizeDocument } from "@/lib/sleeves/full-size";
import { styleFromRecord } from "@/lib/sleeves/make-style-from-record";

export interface PrintAsk {
  /** mm, or null for none. */
  allowance: number | null;
  unit: Unit;
  fineness: Fineness;
  /** The workshop's name. */
  author: string;
  today: IsoDate;
}

/** What the kept sleeve of one of many prints, in full precision. */
export function printedOne(one: DraftedWearer, ask: PrintAsk): FullSizeDocument {
  const sleeve = sleeveFieldsOf(one, ask.fineness, ask.today);
  const exact = styleFromRecord(sleeve);
  return fullSizeDocument({
    ...ask,
    sleeve,
    // At the very edge of a bound the rounded sleeve can be drawn where the exact one cannot.
    good: exact?.ok ? exact : one.good,
    wearerName: one.wearer.name,
  });
}
