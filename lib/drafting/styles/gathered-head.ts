/** The gathered head: slashed from the head and hinged at a plain lower edge, so that all fullness lies at the shoulder. */
import { INCH } from "@/lib/drafting/guide";
import { type StyleCheck } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import {
  settled,
  type StyleContext,
  type StyleFigure,
  type StyleRecipe,
} from "@/lib/drafting/styles/context";
import {
  curvedHemStep,
  fullSleeve,
  GATHERED_HEAD,
  NARROW_HEM,
  setInGathered,
  sizeOf,
  spreadFigure,
} from "@/lib/drafting/styles/full-sleeve";
import { gatherCheck, gatherOf, headGoal, underarmWalk } from "@/lib/drafting/styles/parts";
import { gatherSteps, joinSteps, spreadSteps } from "@/lib/drafting/styles/spread-steps";
import { count, headWalk } from "@/lib/drafting/styles/statement";

/** All slashes together are opened by so many times the puff wanted: Vincent, The Cutters' Practical Guide, p. 27. */
const TO_THE_PUFF = 3;

export const gatheredHead: StyleRecipe = {
  id: "gathered-head",
  name: "Gathered head",
  look: "Gathers that stand up at the shoulder, and a plain edge below.",
  replaces: GATHERED_HEAD,
  figures: (ground, typed): StyleFigure[] => {
    const scale = sizeOf(ground);
    const slashes = count("slashes", 5);
    const headOpen = spreadFigure("headOpen", 0.875 * INCH * scale);
    const spread = settled(slashes, typed) * settled(headOpen, typed);
    const raise = spreadFigure("raise", 0);
    return [slashes, headOpen, { ...raise, usual: Math.min(raise.high, spread / TO_THE_PUFF) }];
  },
  make: (context) => {
    const { cloth, figures } = context;
    const sleeve = fullSleeve(context, { level: figures.length, allowances: { foot: NARROW_HEM } });
    if (!sleeve.ok) return sleeve;
    const { ask, full, piece } = sleeve;
    const goal = headGoal(context);
    const head = gatherOf(
      "head",
      ["sleeve", "head"],
      "the head from notch to notch",
      full.lengths.head,
      goal,
    );
    return {
      ok: true,
      value: {
        pieces: [piece],
        gathers: [head],
        seams: [headWalk(full, goal, context), underarmWalk(piece, "underarm", "the sleeve")],
        checks: [gatherCheck(head, cloth, "headOpen"), puffCheck(context)],
        steps: [
          ...spreadSteps(ask, full, "the sleeve", [curvedHemStep(piece)]),
          ...gatherSteps([head]),
          ...joinSteps([
            say`Close the underarm seam from the armhole to the hem.`,
            say`Turn the narrow hem up and sew it.`,
            setInGathered,
          ]),
        ],
      },
    };
  },
};

/** What is opened at the head against how far the crown is raised. Half as much again either way is no fault. */
export function puffCheck({ near, values }: StyleContext): StyleCheck {
  const [slashes, open, raise] = [values.slashes!, near(values.headOpen!), near(values.raise!)];
  const spread = slashes * open;
  const low = raise * TO_THE_PUFF * (2 / 3);
  const fits = spread >= low - 1e-6;
  return {
    id: "puff",
    verdict: fits ? "good" : "look",
    figure: "raise",
    value: spread,
    low,
    phrase: say`The slashes are opened by ${spread} in all and the crown raised by ${raise}. The old rule opens about three times the puff wanted: ${raise * TO_THE_PUFF}.`,
    remedy: fits
      ? say`Nothing to change.`
      : say`So high over so little width the head stands up in a point. Raise the crown by ${spread / TO_THE_PUFF}, or open the slashes further.`,
    source: "Vincent, The Cutters’ Practical Guide, ladies’ garments, p. 27, read in part",
    mark: "seen",
  };
}
