/** The bell: a smooth head, slashed from the lower edge and hinged at the head, hanging wide with no gathers. */
import { say } from "@/lib/drafting/say";
import { settled, type StyleFigure, type StyleRecipe } from "@/lib/drafting/styles/context";
import {
  curvedHemStep,
  easedHead,
  fullSleeve,
  hingedCount,
  hingedOpening,
  NARROW_HEM,
  setInEased,
  spreadFigure,
} from "@/lib/drafting/styles/full-sleeve";
import { underarmWalk } from "@/lib/drafting/styles/parts";
import { joinSteps, spreadSteps } from "@/lib/drafting/styles/spread-steps";

export const bell: StyleRecipe = {
  id: "bell",
  name: "Bell",
  look: "Smooth at the shoulder, and wide at a round lower edge that hangs in soft folds.",
  // Its lower edge is far wider than the block's.
  replaces: ["elbow", "hem-wrist", "hem-hand", "hem-arm"],
  figures: (ground, typed): StyleFigure[] => {
    const slashes = hingedCount(6);
    const opening = hingedOpening(ground, settled(slashes, typed));
    return [slashes, spreadFigure("footOpen", opening, "Wider, the lower edge swings out in deeper folds.")];
  },
  make: (context) => {
    const sleeve = fullSleeve(context, {
      level: context.figures.length,
      straight: true,
      squared: ["foot"],
      allowances: { foot: NARROW_HEM },
    });
    if (!sleeve.ok) return sleeve;
    const { ask, ends, full, piece } = sleeve;
    return {
      ok: true,
      value: {
        pieces: [piece],
        gathers: [],
        seams: [easedHead(full, context), underarmWalk(piece, "underarm", "the sleeve")],
        checks: [],
        steps: [
          ...ends,
          ...spreadSteps(ask, full, "the sleeve", [curvedHemStep(piece)]),
          ...joinSteps([
            say`Close the underarm seam from the armhole to the hem.`,
            say`Hang the sleeve up overnight: the lower edge stretches where it lies on the bias. Even it, turn the narrow hem up and sew it.`,
            ...setInEased(full, context),
          ]),
        ],
      },
    };
  },
};
