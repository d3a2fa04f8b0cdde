import { formatDay } from "@/lib/people/format-day";
import { type IsoDate } from "@/lib/people/iso-date";
import { type MeasurementSet, type Sleeve } from "@/lib/records/types";
import { type OrderPeopleView, type WearerChoice } from "@/lib/store/queries/orders";
import { type GarmentValues } from "./order-form";

/** A measurement set in a list to choose from: "12 Nov 2026, 9 figures". */
export function setChoiceWords({ takenOn, figures }: Pick<MeasurementSet, "takenOn" | "figures">): string {
  const count = figures.filter(({ typed }) => typed !== "").length;
  return `${formatDay(takenOn, { style: "short" })}, ${count} ${count === 1 ? "figure" : "figures"}`;
}

/** The garment for another wearer: the last set is the one to work by; a sleeve of someone else's is let go. */
export function withWearer(
  garment: GarmentValues,
  wearerId: string,
  people: Pick<OrderPeopleView, "wearers" | "bareSleeves">,
): GarmentValues {
  const choice = people.wearers.find(({ wearer }) => wearer.id === wearerId);
  const sleeveStays = sleevesFor(choice, people.bareSleeves).some(({ id }) => id === garment.sleeveId);
  return {
    ...garment,
    wearerId,
    setId: choice?.latestSet?.id ?? "",
    sleeveId: sleeveStays ? garment.sleeveId : "",
  };
}

/** Sleeves that can be sewn into the garment: the wearer's own, then those of nobody yet. */
export function sleevesFor(choice: WearerChoice | undefined, bareSleeves: readonly Sleeve[]): Sleeve[] {
  return [...(choice?.sleeves ?? []), ...bareSleeves];
}

/** The same garment again, for the first wearer who has none in this order; undefined where everyone has. */
export function sameForNext(
  garment: GarmentValues,
  all: readonly GarmentValues[],
  people: Pick<OrderPeopleView, "wearers" | "bareSleeves">,
  rowId: string,
): GarmentValues | undefined {
  const next = people.wearers.find(({ wearer }) => all.every(({ wearerId }) => wearerId !== wearer.id));
  return next && withWearer({ ...garment, rowId, sleeveId: "" }, next.wearer.id, people);
}

/** What a price for a garment is called: "Dress, Ifẹ". */
export function lineText({ kind }: Pick<GarmentValues, "kind">, wearerName: string | undefined): string {
  return [kind.trim(), wearerName ?? ""].filter((part) => part !== "").join(", ");
}

/**
 * Garments as they come back after a wearer was measured meanwhile: where the last set was taken today, it is the one to
 * work by.
 */
export function withTodaysSets(
  garments: readonly GarmentValues[],
  people: Pick<OrderPeopleView, "wearers">,
  today: IsoDate,
): GarmentValues[] {
  return garments.map((garment) => {
    const latest = people.wearers.find(({ wearer }) => wearer.id === garment.wearerId)?.latestSet;
    return latest?.takenOn === today ? { ...garment, setId: latest.id } : garment;
  });
}
