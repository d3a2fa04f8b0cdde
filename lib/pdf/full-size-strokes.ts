/** How each kind of line is drawn at full size, on paper and in a drawing file alike: points. */
import { BLACK, type Colour } from "@/lib/pdf/blocks";
import { type Weight } from "@/lib/pdf/full-size-marks";
import { CHALK } from "@/lib/pdf/signs";

export interface StrokeStyle {
  readonly width: number;
  readonly colour: Colour;
  readonly dash?: readonly number[];
}

export const strokes: Record<Weight, StrokeStyle> = {
  cut: { width: 1.6, colour: BLACK },
  sew: { width: 0.8, colour: BLACK, dash: [9, 4] },
  notch: { width: 1.2, colour: BLACK },
  grain: { width: 0.8, colour: BLACK },
  fold: { width: 1, colour: BLACK, dash: [16, 4, 2.5, 4] },
  placement: { width: 0.8, colour: BLACK, dash: [2.5, 2.5] },
  guide: { width: 0.6, colour: CHALK },
};

/** What a line of each kind is for, in the order of the legend. */
export const meanings: readonly (readonly [Weight, string])[] = [
  ["cut", "Cut"],
  ["sew", "Sew"],
  ["fold", "Fold"],
  ["placement", "Place"],
  ["guide", "Guide"],
  ["notch", "Notch"],
  ["grain", "Straight grain"],
];
