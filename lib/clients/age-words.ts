import { ageOn, type BirthFacts, isChild } from "@/lib/people/age";
import { type IsoDate } from "@/lib/people/iso-date";

const years = (n: number): string => `${n} ${n === 1 ? "year" : "years"}`;

/** An age in words, no surer than what is known: "6 years", "6 or 7 years", "14 to 15 months"; null where nothing is. */
export function ageWords(facts: BirthFacts, today: IsoDate): string | null {
  const age = ageOn(facts, today);
  if (!age) return null;
  if (age.months !== undefined && age.months < 24)
    return age.months === 0 ? "under 2 months" : `${age.months} to ${age.months + 1} months`;
  if (age.years === 0) return age.certain ? "under 1 year" : "under 2 years";
  return age.certain ? years(age.years) : `${age.years} or ${years(age.years + 1)}`;
}

/** What stands below a wearer's name: "Child, 6 years", "34 years", "Age not asked". */
export function wearerWords(facts: BirthFacts, today: IsoDate): string {
  const words = ageWords(facts, today);
  if (words === null) return "Age not asked";
  return isChild(ageOn(facts, today)!) ? `Child, ${words}` : words;
}
