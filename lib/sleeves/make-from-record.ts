/** From a sleeve's record to the drawn and checked sleeve: the only way there, for the form and for kept sleeves. */
import {
  type Check,
  type MadeSleeve,
  makeSleeve,
  remakeSleeve,
  roundFigures,
  type SleeveAsk,
} from "@/lib/drafting";
import { mmPerInch, stepOf } from "@/lib/lengths/units";
import { type Fineness, type SleeveAskRecord, type Unit } from "@/lib/records/types";
import { type FigureKey } from "@/lib/sleeves/sleeve-figures";

/**
 * From this girth an arm is taken for a grown one, mm: P5 of women, US Army survey 1989, arm girth at the armpit (seen).
 */
export const grownArmMm = 254.1;

/** Ease over the upper arm where none is typed: 1 1/2 in on a child's arm, 2 1/2 in on a grown one. Common practice, no source. */
export function usualBicepsEase(upperArmMm: number): number {
  return (upperArmMm < grownArmMm ? 1.5 : 2.5) * mmPerInch;
}

/** What the engine is asked, or null where a figure that it needs is not there. */
function askOf({ lengths, frontMarks, backMarks, hemOpens }: SleeveAskRecord): SleeveAsk | null {
  const mm = (key: FigureKey): number | undefined =>
    lengths[key] && lengths[key].typed !== "" ? lengths[key].mm : undefined;
  const length = mm("length");
  const hem = mm("hem");
  const upperArm = mm("upperArm");
  const biceps =
    mm("biceps") ??
    (upperArm === undefined ? undefined : upperArm + (mm("bicepsEase") ?? usualBicepsEase(upperArm)));
  const armhole = armholeOf(mm("armholeFront"), mm("armholeBack"), mm("armholeWhole"));
  const capDepth = mm("capDepth");
  if (length === undefined || hem === undefined || biceps === undefined) return null;
  if (capDepth === undefined && !armhole) return null;
  const notches = { front: mm("notchFront") ?? biceps / 4, back: mm("notchBack") ?? biceps / 4 };
  const optional = {
    capDepth,
    armhole,
    headEase: mm("headEase"),
    elbowDepth: mm("elbowDepth"),
    elbowWidth: mm("elbowWidth"),
    beside: mm("beside"),
    notches: mm("notchFront") === undefined && mm("notchBack") === undefined ? undefined : notches,
    frontMarks: frontMarks ?? undefined,
    backMarks: backMarks ?? undefined,
    upperArm,
    elbowGirth: mm("elbowGirth"),
    wrist: mm("wrist"),
    hand: mm("hand"),
  };
  const known = Object.fromEntries(Object.entries(optional).filter(([, value]) => value !== undefined));
  return { length, biceps, hem, opening: hemOpens, ...known };
}

/** With only the whole known, half each way: what is then said of the halves is left out by `fitting`. */
function armholeOf(front: number | undefined, back: number | undefined, whole: number | undefined) {
  if (front !== undefined && back !== undefined) return { front, back };
  return whole === undefined ? undefined : { front: whole / 2, back: whole / 2 };
}

const ofTheHalves: ReadonlySet<string> = new Set(["cap-front", "cap-back", "balance"]);

/** Leaves out the checks that would judge halves of an armhole nobody measured by halves. */
function fitting(record: SleeveAskRecord, made: MadeSleeve): MadeSleeve {
  if (!made.ok || !record.lengths.armholeWhole) return made;
  return { ...made, checks: made.checks.filter(({ id }: Check) => !ofTheHalves.has(id)) };
}

/** The sleeve in full precision; null where a needed figure is missing. */
export function makeFromRecord(record: SleeveAskRecord): MadeSleeve | null {
  const ask = askOf(record);
  return ask && fitting(record, makeSleeve(ask));
}

export interface MarkedSleeve {
  /** As the figures have it. */
  exact: MadeSleeve & { ok: true };
  /** Drawn again from figures rounded to what a hand can set: the sleeve that will be cut. */
  rounded: MadeSleeve;
  /** mm. */
  step: number;
}

/** The sleeve for the mark-out. Null, or the problems, where there is nothing to mark out. */
export function markedFromRecord(
  record: SleeveAskRecord,
  unit: Unit,
  fineness: Fineness,
): MarkedSleeve | (MadeSleeve & { ok: false }) | null {
  const ask = askOf(record);
  if (!ask) return null;
  const exact = fitting(record, makeSleeve(ask));
  if (!exact.ok) return exact;
  const step = stepOf(unit, fineness);
  const rounded = fitting(record, remakeSleeve(ask, roundFigures(exact.figures, step)));
  return { exact, rounded, step };
}
