/** The gathered hem: a smooth head, slashed from the lower edge and hinged at the head, gathered into a band. */
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
import { settled, type StyleFigure, type StyleRecipe } from "@/lib/drafting/styles/context";
import {
  aboveBand,
  easedHead,
  fullSleeve,
  hingedCount,
  hingedOpening,
  setInEased,
  sizeOf,
  spreadFigure,
} from "@/lib/drafting/styles/full-sleeve";
import { gatherCheck, gatherOf, underarmWalk } from "@/lib/drafting/styles/parts";
import { gatherSteps, joinSteps, spreadSteps } from "@/lib/drafting/styles/spread-steps";

export const gatheredHem: StyleRecipe = {
  id: "gathered-hem",
  name: "Gathered hem",
  look: "Smooth at the shoulder, full below, and gathered into a band.",
  // The band takes the place of the hem, and the sleeve is wider above it than the block.
  replaces: ["elbow", "hem-wrist", "hem-hand", "hem-arm"],
  figures: (ground, typed): StyleFigure[] => {
    const scale = sizeOf(ground);
    const slashes = hingedCount(5);
    const band = bandFigures(ground, INCH * scale);
    const opening = bandOpening(ground, typed, {
      slashes,
      band,
      most: hingedOpening(ground, settled(slashes, typed)),
    });
    return [
      slashes,
      spreadFigure("footOpen", opening, "Wider, the lower edge gathers more closely into the band."),
      spreadFigure("drop", INCH * scale),
      ...band,
    ];
  },
  make: (context) => {
    const { cloth, near, values } = context;
    const ends = aboveBand(context);
    if (typeof ends !== "number") return ends;
    const sleeve = fullSleeve(context, { level: ends });
    if (!sleeve.ok) return sleeve;
    const { ask, full, piece } = sleeve;
    const length = near(values.bandLength!);
    const band = bandPiece(length, near(values.bandDepth!), "Band");
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
        gathers: [foot],
        seams: [
          easedHead(full, context),
          ...bandSeams(foot, band, "band"),
          underarmWalk(piece, "underarm", "the sleeve"),
        ],
        checks: [
          gatherCheck(foot, cloth, "footOpen"),
          ...bandChecks(context, { words: "band", length, opens: false }),
        ],
        steps: [
          ...sleeve.ends,
          ...spreadSteps(ask, full, "the sleeve"),
          bandCutStep(band, 2),
          ...joinSteps([say`Close the underarm seam from the armhole to the lower edge.`]),
          ...gatherSteps([foot]),
          ...bandSewSteps(),
          ...joinSteps(setInEased(full, context)),
        ],
      },
    };
  },
};
