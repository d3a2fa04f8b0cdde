/** The plain sleeve: the block as one piece, with its hem. */
import { INCH } from "@/lib/drafting/guide";
import { type StyleStep } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { type StyleContext, type StyleRecipe } from "@/lib/drafting/styles/context";
import { pattern, underarmWalk } from "@/lib/drafting/styles/parts";
import { headed, headSeam, outlined, setIn, work } from "@/lib/drafting/styles/plain-sleeve";
import { joinSteps } from "@/lib/drafting/styles/spread-steps";
import { type Piece } from "@/lib/drafting/types";

export const plain: StyleRecipe = {
  id: "plain",
  name: "Plain",
  look: "Smooth at the shoulder and straight down the arm, short, three-quarter or long as the sleeve length says.",
  figures: () => [
    {
      key: "hemDepth",
      label: "Depth of the hem",
      said: "the depth of the hem",
      does: "Deeper, the edge hangs more heavily and can be let down later.",
      kind: "length",
      // 1 to 1 1/4 in, recalled.
      usual: 1.25 * INCH,
      low: 0.25 * INCH,
      high: 3 * INCH,
    },
  ],
  make: (context) => {
    const hem = context.near(context.values.hemDepth!);
    const piece = pattern(headed(context), "sleeve", "Sleeve", { allowances: { foot: hem } });
    return {
      ok: true,
      value: {
        pieces: [piece],
        gathers: [],
        seams: [...headSeam(context), underarmWalk(piece, "underarm", "the sleeve")],
        checks: [],
        steps: plainSteps(context, piece, hem),
      },
    };
  },
};

function plainSteps(context: StyleContext, piece: Piece, hem: number): StyleStep[] {
  return [
    {
      stage: "cut",
      act: { act: "allow", edge: "foot" },
      distance: hem,
      phrase: say`Below the hem line add ${hem} to turn up. Fold the paper on the hem line before you cut its ends: turned up, the hem is then as wide as the sleeve above it.`,
      scene: outlined(piece),
    },
    work(
      "cut",
      say`Add the seam allowances to the other edges. Cut the sleeve twice in cloth, the second mirrored, with the notches, the crown and the grain marked.`,
      outlined(piece),
    ),
    ...joinSteps([
      say`Close the underarm seam from the armhole to the hem.`,
      say`Turn the hem up and sew it.`,
      ...setIn(context),
    ]),
  ];
}
