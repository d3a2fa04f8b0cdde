/** The published figures of girls by age, laid along the days of a history, to be drawn faintly behind a child's own. */
import { type MeasureKey } from "@/lib/figures/body-measures";
import { armByAge, armByAgeSource } from "@/lib/figures/reference-tables";
import { type BirthFacts } from "@/lib/people/age";
import { daysBetween, type IsoDate } from "@/lib/people/iso-date";

export interface BandPoint {
  on: IsoDate;
  midMm: number;
  lowMm?: number;
  highMm?: number;
}

export interface AgeBand {
  points: BandPoint[];
  /** What it shows and where it comes from, a sentence. */
  say: string;
}

const DAYS_A_YEAR = 365.25;
const childUnder = 18;

/** Age in years with its part, as near as is known: the middle of the month, the year, or the year of age. */
function ageInYears(facts: BirthFacts, on: IsoDate): number | undefined {
  if (facts.birthYear !== null) {
    const month = String(facts.birthMonth ?? 7).padStart(2, "0");
    const day = facts.birthMonth === null ? "01" : "15";
    return daysBetween(`${String(facts.birthYear).padStart(4, "0")}-${month}-${day}`, on) / DAYS_A_YEAR;
  }
  if (facts.ageYears !== null && facts.ageOn !== null)
    return facts.ageYears + 0.5 + daysBetween(facts.ageOn, on) / DAYS_A_YEAR;
  return undefined;
}

/** A year's figures stand for its middle; between two middles on the straight line that joins them. */
function armAt(age: number) {
  const first = armByAge[0]!;
  if (age < first.fromAge || age >= childUnder) return undefined;
  const middle = Math.max(first.fromAge, age - 0.5);
  const below = armByAge.find((row) => row.toAge === Math.floor(middle))!;
  const above = armByAge.find((row) => row.toAge === Math.floor(middle) + 1) ?? below;
  const share = middle - Math.floor(middle);
  const mm = (key: "p5Cm" | "p50Cm" | "p95Cm" | "upperArmLengthCm") =>
    (below[key] + (above[key] - below[key]) * share) * 10;
  return { low: mm("p5Cm"), mid: mm("p50Cm"), high: mm("p95Cm"), length: mm("upperArmLengthCm") };
}

const addDays = (on: IsoDate, days: number): IsoDate =>
  new Date(Date.parse(`${on}T00:00:00Z`) + days * 86_400_000).toISOString().slice(0, 10);

/** How many stretches the band is drawn in. */
const STRETCHES = 24;

/**
 * @returns null where no published figures by age reach: another measure, a grown wearer, under 2, or no age known.
 * @throws RangeError where a date is not a day.
 */
export function ageBand(figure: MeasureKey, facts: BirthFacts, from: IsoDate, to: IsoDate): AgeBand | null {
  if (figure !== "upperArmGirth" && figure !== "upperArmLength") return null;
  const days = Math.max(1, daysBetween(from, to));
  const points: BandPoint[] = [];
  for (let i = 0; i <= STRETCHES; i++) {
    const on = addDays(from, Math.round((days * i) / STRETCHES));
    const age = ageInYears(facts, on);
    const arm = age === undefined ? undefined : armAt(age);
    if (!arm || points.at(-1)?.on === on) continue;
    points.push(
      figure === "upperArmGirth"
        ? { on, lowMm: arm.low, midMm: arm.mid, highMm: arm.high }
        : { on, midMm: arm.length },
    );
  }
  if (points.length < 2) return null;
  const say =
    figure === "upperArmGirth"
      ? `The faint band holds nine in ten girls of the age, the dashed line is the middle one (${armByAgeSource}).`
      : `The dashed line is the mean of girls of the age (${armByAgeSource.replace("mid-upper arm", "upper-arm length")}).`;
  return { points, say };
}
