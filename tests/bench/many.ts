/** One style over 200 wearers, as the screen drafts them: from the set to the rounded, walked and checked pieces. */
import { draftMany } from "@/lib/many/draft-many";
import { type StyleId } from "@/lib/records/types";
import { ask, person } from "@/tests/unit/many/people";
import { type Measured, ms, median } from "./report";

const WEARERS = 200;
const STYLES: readonly StyleId[] = ["plain", "statement", "leg-of-mutton"];

export function measureMany(): Measured[] {
  const wearers = Array.from({ length: WEARERS }, (_, n) =>
    person(n, { name: `Wearer ${n}`, size: 0.75 + (n % 40) / 80 }),
  );
  return STYLES.map((style) => {
    const times: number[] = [];
    for (let run = 0; run < 6; run++) {
      const from = performance.now();
      const drafted = draftMany(wearers, ask({ style })).filter((row) => row.drafted).length;
      times.push(performance.now() - from);
      if (drafted < WEARERS)
        throw new Error(`${WEARERS - drafted} of the bench's wearers are not drafted for`);
    }
    return {
      what: `${WEARERS} wearers, ${style} (engine, Node; aim: 1 s)`,
      value: `median ${ms(median(times.slice(1)))} of 5`,
    };
  });
}
