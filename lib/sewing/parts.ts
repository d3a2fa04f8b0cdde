/** Parts of a circle, as a cutter names them. */
import { type SumField } from "./types";

const parts = [
  { value: "whole", label: "Whole circle", share: 1 },
  { value: "three-quarter", label: "Three quarters", share: 0.75 },
  { value: "half", label: "Half circle", share: 0.5 },
  { value: "quarter", label: "Quarter circle", share: 0.25 },
] as const;

/** How far the part goes round, radians. @throws where there is no such part. */
export function turnOf(part: string): number {
  return 2 * Math.PI * partOf(part).share;
}

const partOf = (part: string) => {
  const found = parts.find(({ value }) => value === part);
  if (!found) throw new RangeError(`No part of a circle: ${part}`);
  return found;
};

/** "half circle". */
export const partWords = (part: string): string => partOf(part).label.toLowerCase();

/** What a part of a circle fills, its middle downwards, mm; with the point that it is drawn from. */
export function sectorBox(part: string, r: number): { x: number; y: number; w: number; h: number } {
  if (part === "half") return { x: -r, y: 0, w: 2 * r, h: r };
  if (part === "quarter") return { x: -r * Math.SQRT1_2, y: 0, w: r * Math.SQRT2, h: r };
  return { x: -r, y: -r, w: 2 * r, h: 2 * r };
}

export const partField = (label: string, usual: (typeof parts)[number]["value"] = "whole"): SumField => ({
  key: "part",
  label,
  kind: "choice",
  usual,
  options: parts.map(({ value, label }) => ({ value, label })),
});
