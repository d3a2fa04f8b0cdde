/**
 * Published body tables, to ask about a figure and never to refuse one.
 *
 * Arm by age: NHANES 2015-16 (CDC, BMX_I and DEMO_I, weighted, pregnant excluded), girls and women; mid-upper-arm circumference and
 * upper-arm length. Mark: calc. The tails are noisy (52 to 120 measured for a year of age), and it is the mid-arm, not the
 * fullest point. `medianCm` is the reference median: WHO child growth standards to 4 years, then Mramba et al., BMJ 2017;358:j3423.
 * Mark: seen.
 *
 * Adults: US Army surveys; ANSUR II = Gordon et al. 2014, NATICK/TR-15/007; ANSUR = Gordon et al. 1989, NATICK/TR-89/044; a
 * digitised copy. Mark: seen.
 */

export type Mark = "seen" | "calc" | "memory" | "practice" | "exact";

/** Centimetres, as published. */
export interface ArmRow {
  /** Whole years, both ends included. */
  fromAge: number;
  toAge: number;
  meanCm: number;
  p5Cm: number;
  p50Cm: number;
  p95Cm: number;
  upperArmLengthCm: number;
  medianCm?: number;
}

const row = (
  fromAge: number,
  toAge: number,
  [meanCm, p5Cm, p50Cm, p95Cm, upperArmLengthCm, medianCm]: [number, number, number, number, number, number?],
): ArmRow => ({
  fromAge,
  toAge,
  meanCm,
  p5Cm,
  p50Cm,
  p95Cm,
  upperArmLengthCm,
  ...(medianCm && { medianCm }),
});

export const armByAge: readonly ArmRow[] = [
  row(2, 2, [16.2, 14.1, 16.1, 18.4, 18.5, 14.9]),
  row(3, 3, [16.8, 15.1, 16.6, 18.5, 19.9, 15.6]),
  row(4, 4, [17.8, 15.4, 17.5, 21.0, 21.8, 16.2]),
  row(5, 5, [18.3, 15.7, 18.0, 21.6, 23.3, 16.8]),
  row(6, 6, [19.4, 16.3, 18.5, 26.3, 24.8, 17.4]),
  row(7, 7, [20.4, 16.9, 19.5, 25.6, 26.1, 18.0]),
  row(8, 8, [20.9, 17.0, 20.2, 26.7, 27.6, 18.7]),
  row(9, 9, [21.3, 18.0, 20.7, 26.5, 28.7, 19.5]),
  row(10, 10, [23.7, 17.4, 23.4, 31.0, 30.8, 20.3]),
  row(11, 11, [24.2, 19.5, 23.1, 32.3, 32.3, 21.3]),
  row(12, 12, [26.0, 19.8, 25.4, 33.4, 33.6, 22.3]),
  row(13, 13, [27.1, 21.8, 26.1, 35.9, 34.8, 23.4]),
  row(14, 14, [27.2, 22.1, 26.4, 36.2, 35.8, 24.2]),
  row(15, 15, [27.7, 22.0, 26.0, 37.1, 35.5, 24.9]),
  row(16, 16, [28.9, 22.4, 28.5, 35.8, 35.3, 25.5]),
  row(17, 17, [30.2, 23.5, 29.8, 38.2, 35.5, 25.8]),
  row(18, 18, [30.6, 23.1, 29.6, 40.7, 35.6, 26.1]),
  row(19, 19, [30.5, 23.3, 29.6, 37.3, 36.0, 26.3]),
  row(20, 29, [31.1, 23.7, 30.2, 41.5, 35.7]),
  row(40, 49, [33.0, 25.3, 32.2, 44.2, 35.9]),
  row(60, 69, [32.4, 24.9, 31.8, 41.4, 36.2]),
  row(80, 120, [29.1, 23.0, 28.7, 37.5, 35.3]),
];

export const armByAgeSource = "NHANES 2015-16, girls and women, mid-upper arm";

/** Millimetres, as published; a percentile that is not published is left out. */
export interface AdultRow {
  survey: "ANSUR II" | "ANSUR 1989";
  meanMm: number;
  sdMm: number;
  p5Mm?: number;
  p95Mm?: number;
}

export interface AdultMeasure {
  women: AdultRow;
  men?: AdultRow;
}

const ii = (meanMm: number, sdMm: number, p5Mm: number, p95Mm: number): AdultRow => ({
  survey: "ANSUR II",
  meanMm,
  sdMm,
  p5Mm,
  p95Mm,
});
const first = (meanMm: number, sdMm: number, p5Mm?: number, p95Mm?: number): AdultRow => ({
  survey: "ANSUR 1989",
  meanMm,
  sdMm,
  ...(p5Mm !== undefined && { p5Mm }),
  ...(p95Mm !== undefined && { p95Mm }),
});

/** By the surveys' own measures that stand for ours: sleeve outseam for arm length, acromion to radiale for upper arm length. */
export const adultMeasures = {
  wristGirth: { women: ii(154.8, 7.8, 142, 168), men: ii(175.9, 9.0, 162, 191) },
  handGirth: { women: ii(186.6, 8.8, 173, 202) },
  armLength: { women: ii(543.6, 29.4, 497, 594), men: ii(593.1, 30.8, 545, 645) },
  shoulderLength: { women: ii(135.4, 10.3, 120, 153), men: ii(149.8, 10.5, 133, 167) },
  upperArmLength: { women: ii(311.2, 17.2, 283, 340), men: ii(335.2, 17.5, 307, 365) },
  armscyeGirth: { women: first(371.3, 23.0), men: first(445.5, 27.1, 402.7) },
  scyeDepth: { women: first(185.7, 14.4, 162.7, 210.4), men: first(212.7, 15.5, 187.0, 237.7) },
  elbowGirth: { women: first(238.3, 13.4, 217.5) },
} as const satisfies Record<string, AdultMeasure>;
