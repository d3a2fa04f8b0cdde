import { make, newId, type Write } from "@/lib/journal/change";
import { type DraftedWearer } from "@/lib/many/draft-many";
import { formatDay } from "@/lib/people/format-day";
import { type IsoDate } from "@/lib/people/iso-date";
import { type Fineness, type SleeveFields } from "@/lib/records/types";
import { suggestedName } from "@/lib/sleeves/sleeve-name";

/** What is kept of each: a sleeve of its own wearer, like any other from now on. */
export function sleeveFieldsOf(
  { good, record, set, wearer }: DraftedWearer,
  fineness: Fineness,
  today: IsoDate,
): SleeveFields {
  return {
    wearerId: wearer.id,
    setId: set.id,
    name: suggestedName(wearer.name, formatDay(today)),
    style: good.style,
    ask: record,
    fineness,
    note: "",
  };
}

/** One write for each sleeve, to be kept together. */
export function keepWrites(
  drafted: readonly DraftedWearer[],
  fineness: Fineness,
  today: IsoDate,
  id: () => string = newId,
): Write[] {
  return drafted.map((one) => make("sleeves", sleeveFieldsOf(one, fineness, today), id()));
}
