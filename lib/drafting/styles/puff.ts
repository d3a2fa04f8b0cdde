/** The puff: slashed right through and opened at both ends, gathered into the armhole and into a band. */
import { INCH } from "@/lib/drafting/guide";
import { say } from "@/lib/drafting/say";
import {
  bandChecks,
  bandCutStep,
  bandFigures,
  bandOpening,
  bandPiece,
  bandSeams,
  bandSewSteps,
} from "@/lib/drafting/styles/band";
import { type StyleFigure, type StyleRecipe } from "@/lib/drafting/styles/context";
import {
  aboveBand,
  fullSleeve,
  GATHERED_HEAD,
  setInGathered,
  sizeOf,
  spreadFigure,
} from "@/lib/drafting/styles/full-sleeve";
import { puffCheck } from "@/lib/drafting/styles/gathered-head";
import { gatherCheck, gatherOf, headGoal, underarmWalk } from "@/lib/drafting/styles/parts";
import { gatherSteps, joinSteps, spreadSteps } from "@/lib/drafting/styles/spread-steps";
import { count, headWalk } from "@/lib/drafting/styles/statement";

export const puff: StyleRecipe = {
  id: "puff",
  name: "Puff",
  look: "A round puff, gathered at the shoulder and again into a band.",
  replaces: [...GATHERED_HEAD, "elbow", "hem-wrist", "hem-hand", "hem-arm"],
  figures: (ground, typed): StyleFigure[] => {
    const scale = sizeOf(ground);
    const slashes = count("slashes", 6);
    const band = bandFigures(ground, INCH * scale);
    const opening = bandOpening(ground, typed, { slashes, band, most: INCH * scale });
    return [
      slashes,
      spreadFigure("headOpen", INCH * scale),
      spreadFigure("footOpen", opening, "Wider, the lower edge gathers more closely into the band."),
      spreadFigure("raise", 1.25 * INCH * scale),
      spreadFigure("drop", INCH * scale),
      ...band,
    ];
  },
  make: (context) => {
    const { cloth, near, values } = context;
    const level = aboveBand(context);
    if (typeof level !== "number") return level;
    const sleeve = fullSleeve(context, { level });
    if (!sleeve.ok) return sleeve;
    const { ask, ends, full, piece } = sleeve;
    const length = near(values.bandLength!);
    const band = bandPiece(length, near(values.bandDepth!), "Band");
    const goal = headGoal(context);
    const head = gatherOf(
      "head",
      ["sleeve", "head"],
      "the head from notch to notch",
      full.lengths.head,
      goal,
    );
    const foot = gatherOf(
      "foot",
      ["sleeve", "foot"],
      "the lower edge of the sleeve",
      full.lengths.foot,
      length,
    );
    return {
      ok: true,
      value: {
        pieces: [piece, band],
        gathers: [head, foot],
        seams: [
          headWalk(full, goal, context),
          ...bandSeams(foot, band, "band"),
          underarmWalk(piece, "underarm", "the sleeve"),
        ],
        checks: [
          gatherCheck(head, cloth, "headOpen"),
          gatherCheck(foot, cloth, "footOpen"),
          puffCheck(context),
          ...bandChecks(context, { words: "band", length, opens: false }),
        ],
        steps: [
          ...ends,
          ...spreadSteps(ask, full, "the sleeve"),
          bandCutStep(band, 2),
          ...joinSteps([say`Close the underarm seam from the armhole to the lower edge.`]),
          ...gatherSteps([foot]),
          ...bandSewSteps(),
          ...gatherSteps([head]),
          ...joinSteps([setInGathered]),
        ],
      },
    };
  },
};
