/** The cautions of `lib/people`, as a sum says them. */
import { type Caution, cautionsFor } from "@/lib/people/cautions";
import { type SumCaution } from "./types";

function cautionOf(key: Caution["key"], garment: string, years: number): SumCaution[] {
  return cautionsFor(garment, { years, certain: true })
    .filter((caution) => caution.key === key)
    .map(({ say, source, mark }) => ({ say: [say], source, mark }));
}

/** Elastic on a child's arm. */
export const elasticOnAChild = (): SumCaution[] => cautionOf("elastic", "elastic", 6);

/** Buttons for someone under three. */
export const smallParts = (): SumCaution[] => cautionOf("small-parts", "buttons", 2);
