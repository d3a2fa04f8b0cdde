import { type MeasureKey, bodyMeasure } from "@/lib/figures/body-measures";
import {
  type AdultMeasure,
  type AdultRow,
  type Mark,
  adultMeasures,
  armByAge,
  armByAgeSource,
} from "@/lib/figures/reference-tables";

export interface UsualBounds {
  lowMm: number;
  highMm: number;
  /** Whom the bounds are of: "at 6 years", "of an adult", "of anyone". */
  whose: string;
  source: string;
  mark: Mark;
}

/** Asked about outside P5 less 15 % to P95 plus 15 % (sources: bodies). */
const margin = 0.15;
/** A child's upper-arm length has only its mean by age: a quarter of it each way is common practice, no source. */
const lengthMargin = 0.25;
/** The surveys measured people of 17 and more. */
const adultFrom = 18;
/** P5 and P95 of a normal spread, in standard deviations, where the survey's own percentile is not published. */
const z95 = 1.645;

interface ArmFigures {
  p5Cm: number;
  p95Cm: number;
  upperArmLengthCm: number;
}

/** The row of an age; between two rows (30-39, 50-59, 70-79) on the straight line that joins them. Under 2: none. */
export function armFiguresAt(ageYears: number): ArmFigures | undefined {
  const years = Math.floor(ageYears);
  const at = armByAge.findIndex((r) => years <= r.toAge);
  const row = armByAge[at] ?? armByAge.at(-1)!;
  if (years >= row.fromAge) return row;
  const below = armByAge[at - 1];
  if (!below) return undefined;
  const share = (years - below.toAge) / (row.fromAge - below.toAge);
  const between = (key: keyof ArmFigures) => below[key] + (row[key] - below[key]) * share;
  return { p5Cm: between("p5Cm"), p95Cm: between("p95Cm"), upperArmLengthCm: between("upperArmLengthCm") };
}

function adultBounds({ women, men }: AdultMeasure): UsualBounds {
  const p5 = (r: AdultRow) => r.p5Mm ?? r.meanMm - z95 * r.sdMm;
  const p95 = (r: AdultRow) => r.p95Mm ?? r.meanMm + z95 * r.sdMm;
  const rows = men ? [women, men] : [women];
  const published = rows.every((r) => r.p95Mm !== undefined) && women.p5Mm !== undefined;
  return {
    lowMm: Math.min(...rows.map(p5)) * (1 - margin),
    highMm: Math.max(...rows.map(p95)) * (1 + margin),
    whose: "of an adult",
    source: `US Army survey, ${women.survey}, ${men ? "women and men" : "women"}${published ? "" : "; mean and 1.645 standard deviations"}`,
    mark: published ? "seen" : "calc",
  };
}

/** What is usual for a measure at an age, from the published tables where they reach, else the wide bounds of practice. */
export function usualBounds(figure: MeasureKey, ageYears: number | undefined): UsualBounds {
  const { leastMm, mostMm } = bodyMeasure(figure);
  const ofAnyone: UsualBounds = {
    lowMm: leastMm,
    highMm: mostMm,
    whose: "of anyone",
    source: "common practice, no source",
    mark: "practice",
  };
  if (ageYears === undefined) return ofAnyone;
  const whose = `at ${Math.floor(ageYears)} years`;
  const arm = armFiguresAt(ageYears);
  if (figure === "upperArmGirth" && arm) {
    return {
      lowMm: arm.p5Cm * 10 * (1 - margin),
      highMm: arm.p95Cm * 10 * (1 + margin),
      whose,
      source: armByAgeSource,
      mark: "calc",
    };
  }
  if (ageYears >= adultFrom && figure in adultMeasures)
    return adultBounds(adultMeasures[figure as keyof typeof adultMeasures]);
  if (figure === "upperArmLength" && arm) {
    return {
      lowMm: arm.upperArmLengthCm * 10 * (1 - lengthMargin),
      highMm: arm.upperArmLengthCm * 10 * (1 + lengthMargin),
      whose,
      source: `${armByAgeSource}: mean length, a quarter each way by common practice`,
      mark: "practice",
    };
  }
  return ofAnyone;
}
