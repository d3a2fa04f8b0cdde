import { type Fineness, type Unit } from "@/lib/records/types";
import { formatPlain } from "@/lib/lengths/format-length";

/** A sentence with lengths left in mm, so that a screen can set them in the workshop's unit. */
export type Phrase = (string | { mm: number })[];

/** The phrase as one plain string, lengths to the step shown. */
export function phraseText(phrase: Phrase, unit: Unit, fineness: Fineness = 8): string {
  return phrase
    .map((part) => (typeof part === "string" ? part : formatPlain(part.mm, unit, fineness)))
    .join("");
}
