/** What the engine is asked for a sleeve's record. */
import { type SleeveAsk } from "@/lib/drafting";
import { mmPerInch } from "@/lib/lengths/units";
import { type SleeveAskRecord } from "@/lib/records/types";
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
export function askOf({ lengths, frontMarks, backMarks, hemOpens }: SleeveAskRecord): SleeveAsk | null {
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
export function fitting<C extends { readonly id: string }>(
  record: SleeveAskRecord,
  checks: readonly C[],
): C[] {
  return checks.filter(({ id }) => !record.lengths.armholeWhole || !ofTheHalves.has(id));
}
