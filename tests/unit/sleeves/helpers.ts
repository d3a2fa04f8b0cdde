import { type SleeveAskRecord, type StyleId, type Unit } from "@/lib/records/types";
import { type GoodSleeve, markedFromRecord, styleFromRecord } from "@/lib/sleeves/make-style-from-record";
import { type FigureKey } from "@/lib/sleeves/sleeve-figures";

/** Lengths in inches, as typed in an inch workshop. */
export function record(
  inches: Partial<Record<FigureKey, number>>,
  more: Partial<SleeveAskRecord> = {},
): SleeveAskRecord {
  const lengths = Object.fromEntries(
    Object.entries(inches).map(([key, value]) => [key, { typed: String(value), mm: value * 25.4 }]),
  );
  return { lengths, frontMarks: null, backMarks: null, hemOpens: false, ...more };
}

/** The child's sleeve of the hand practice: B 12, C 6 1/4 in (practice); length and hem are ours. */
export const child = record({ length: 9.5, capDepth: 6.25, biceps: 12, hem: 11 });

/** A woman's long sleeve; P50 of the US Army surveys (seen) for arm, wrist, hand and elbow, the rest ours. */
export const woman = record({
  length: 21.4,
  armholeFront: 8,
  armholeBack: 8.25,
  upperArm: 11.4,
  hem: 8,
  hand: 7.36,
  wrist: 6.06,
  elbowDepth: 12.25,
  elbowGirth: 9.35,
});

export function good(ask: SleeveAskRecord, style: StyleId = "plain"): GoodSleeve {
  const made = styleFromRecord({ style, ask });
  if (!made?.ok) throw new Error(JSON.stringify(made));
  return made;
}

export function marked(ask: SleeveAskRecord, unit: Unit = "in", style: StyleId = "plain") {
  const found = markedFromRecord({ style, ask }, unit, 8);
  if (!found || !("exact" in found) || !found.rounded.ok) throw new Error(JSON.stringify(found));
  return { exact: found.exact, rounded: found.rounded, step: found.step };
}
