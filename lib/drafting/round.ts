/** Rounding to marks a hand can set. The draft shown with the steps is drawn again from these figures. */
import { guideLine } from "@/lib/drafting/guide";
import { type GuideMark, type Side, type SleeveFigures } from "@/lib/drafting/types";

/**
 * The figures with every distance a hand measures rounded to `step` mm (1/8 in = 3.175, 1/16 in = 1.5875, or 1): depths
 * and lengths, widths by their halves, and for each guide mark its distance up the guide line and out from it. No distance
 * moves by more than half a step, save that marks are kept one step apart and on the line.
 */
export function roundFigures(figures: SleeveFigures, step: number): SleeveFigures {
  const near = (value: number) => Math.round(value / step) * step;
  const width = (value: number) => 2 * near(value / 2);
  const { elbow, notches } = figures;
  const lines = {
    biceps: width(figures.biceps),
    capDepth: near(figures.capDepth),
    beside: near(figures.beside),
  };
  const marks = (side: Side): GuideMark[] => {
    const before = guideLine(figures, side).length;
    const after = guideLine({ ...lines, front: [], back: [] }, side).length;
    const last = figures[side].length - 1;
    let reached = 0;
    return figures[side].map(({ share, out }, i) => {
      const top = (Math.ceil(after / step) - 1 - (last - i)) * step;
      const along = Math.min(top, Math.max(reached + step, near(share * before)));
      reached = along;
      return { share: along / after, out: near(out) };
    });
  };
  return {
    ...lines,
    length: near(figures.length),
    hem: width(figures.hem),
    ...(elbow && { elbow: { depth: near(elbow.depth), width: width(elbow.width) } }),
    front: marks("front"),
    back: marks("back"),
    notches: { front: near(notches.front), back: near(notches.back) },
  };
}
