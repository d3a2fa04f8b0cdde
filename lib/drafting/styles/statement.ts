/** The two-part statement sleeve: a full upper part, gathered into the armhole and onto a plain lower part. */
import { cutAcross } from "@/lib/drafting/cut-across";
import { INCH } from "@/lib/drafting/guide";
import { line } from "@/lib/drafting/measure";
import { edgeOf, endOf, startOf } from "@/lib/drafting/outline";
import { type StyleStep } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { walk } from "@/lib/drafting/seams";
import {
  impossible,
  type StyleContext,
  type StyleFigure,
  type StyleRecipe,
} from "@/lib/drafting/styles/context";
import {
  edgeSize,
  gatherCheck,
  gatherOf,
  headGoal,
  headPlaces,
  pattern,
  underarmWalk,
} from "@/lib/drafting/styles/parts";
import {
  type SpreadAsk,
  type SpreadPiece,
  spreadPiece,
  turnOf,
  withHead,
} from "@/lib/drafting/styles/spread-piece";
import { gatherSteps, joinSteps, spreadSteps } from "@/lib/drafting/styles/spread-steps";
import { type Piece } from "@/lib/drafting/types";

/** Beyond this the two underarm ends of the upper part come round towards each other. */
export const WIDEST_TURN = (Math.PI * 5) / 6;

export const statement: StyleRecipe = {
  id: "statement",
  name: "Two-part statement sleeve",
  look: "A great round puff from the shoulder, gathered onto a plain sleeve below it.",
  figures: ({ figures: { biceps, length, capDepth } }): StyleFigure[] => {
    // Practice is given for a child's sleeve of 12 in across; smaller ones take less, larger ones keep it.
    const scale = Math.min(1, biceps / (12 * INCH));
    const below = length - capDepth;
    return [
      {
        key: "cutBelow",
        label: "Cut below the cap line",
        said: "the cut below the cap line",
        does: "Lower down, more of the arm lies in the puff.",
        kind: "length",
        usual: Math.min(1.25 * INCH * scale, below / 2),
        low: 6,
        high: below - 10,
      },
      count("slashes", 6),
      {
        key: "headOpen",
        label: "Opening at the head",
        said: "the opening of each slash at the head",
        does: "Wider, the head is fuller and gathers more closely.",
        kind: "length",
        usual: 1.25 * INCH * scale,
        low: 0,
        high: 4 * INCH,
      },
      {
        key: "footOpen",
        label: "Opening at the lower edge",
        said: "the opening of each slash at the lower edge",
        does: "Wider, the lower edge gathers more onto the lower part.",
        kind: "length",
        usual: 0.5 * INCH * scale,
        low: 0,
        high: 4 * INCH,
      },
      {
        key: "raise",
        label: "Raise the crown",
        said: "the raise of the crown",
        does: "Higher, the head stands up from the shoulder.",
        kind: "length",
        usual: 1.25 * INCH * scale,
        low: 0,
        high: 6 * INCH,
      },
      {
        key: "drop",
        label: "Lower the edge for pouching",
        said: "the pouch of the lower edge",
        does: "Lower, the puff bags over the seam below it.",
        kind: "length",
        usual: INCH * scale,
        low: 0,
        high: 4 * INCH,
      },
    ];
  },
  make: (context) => {
    const { block, cloth, figures, near, values } = context;
    const level = figures.capDepth + near(values.cutBelow!);
    if (level > figures.length - 5)
      return impossible(
        "cutBelow",
        "cut-off-sleeve",
        say`The cut would lie ${level} below the crown, and the sleeve is ${figures.length} long.`,
        say`Cut it ${figures.length - figures.capDepth - 10} below the cap line or higher, or make the sleeve longer.`,
      );
    const parts = cutAcross(withHead(block.piece), level);
    const places = headPlaces(context);
    const ask: SpreadAsk = {
      piece: parts.upper,
      ...places,
      slashes: values.slashes!,
      headOpen: near(values.headOpen!),
      footOpen: near(values.footOpen!),
      raise: values.raise!,
      drop: values.drop!,
      near,
    };
    const stopped = tooFar(ask);
    if (stopped) return stopped;
    const full = spreadPiece(ask);
    const upper = pattern(full.piece, "upper", "Upper part", { panels: full.spread.panels });
    const lower = pattern(
      {
        ...parts.lower,
        notches: [{ id: "footCentre", edge: "top", at: edgeSize(parts.lower, "top") / 2, count: 1 }],
      },
      "lower",
      "Lower part",
    );
    const goal = headGoal(context);
    const top = edgeSize(lower, "top");
    const gathers = [
      gatherOf("head", ["upper", "head"], "the head from notch to notch", full.lengths.head, goal),
      gatherOf("foot", ["upper", "foot"], "the lower edge of the upper part", full.lengths.foot, top),
    ];
    return {
      ok: true,
      value: {
        pieces: [upper, lower],
        gathers,
        seams: [
          headWalk(full, goal, context),
          walk({
            id: "foot",
            sides: [
              { words: "the lower edge of the upper part", measured: full.lengths.foot },
              { words: "the top of the lower part", measured: top },
            ],
            joining: { how: "gathered" },
          }),
          underarmWalk(upper, "underarm-upper", "the upper part"),
          underarmWalk(lower, "underarm-lower", "the lower part"),
        ],
        checks: [gatherCheck(gathers[0]!, cloth, "headOpen"), gatherCheck(gathers[1]!, cloth, "footOpen")],
        steps: [
          acrossStep(context, level, parts.lower),
          ...spreadSteps(ask, full, "the upper part"),
          ...gatherSteps(gathers),
          ...joinSteps([
            say`Join the upper part to the lower part: centre to centre, underarm to underarm, the gathers spread evenly.`,
            say`Close the underarm seam from the armhole to the hem.`,
          ]),
        ],
      },
    };
  },
};

export function count(key: string, usual: number): StyleFigure {
  return {
    key,
    label: "Slashes",
    said: "the number of slashes",
    does: "More slashes spread the fullness more evenly; fewer are quicker to draw.",
    kind: "count",
    usual,
    low: 1,
    high: 15,
  };
}

/** Why the slashes cannot be opened so far; undefined where they can. */
export function tooFar(ask: SpreadAsk) {
  const turn = turnOf(ask);
  if (turn <= WIDEST_TURN) return undefined;
  const wide = ask.headOpen > ask.footOpen ? "head" : "foot";
  const figure = wide === "head" ? "headOpen" : "footOpen";
  const other = wide === "head" ? "lower edge" : "head";
  const open = Math.max(ask.headOpen, ask.footOpen);
  const hinged = Math.min(ask.headOpen, ask.footOpen) === 0;
  return impossible(
    figure,
    "turned-in",
    say`Opened by ${open} at the ${wide === "head" ? "head" : "lower edge"}, the ${ask.slashes} panels turn so far that the piece bends round into itself.`,
    !Number.isFinite(turn)
      ? say`Open them less, or slash fewer times.`
      : hinged
        ? say`Open them ${open * (WIDEST_TURN / turn) * 0.95} or less, or slash fewer times.`
        : say`Open them ${open * (WIDEST_TURN / turn) * 0.95} or less, slash fewer times, or open the ${other} more.`,
  );
}

export function headWalk(full: SpreadPiece, goal: number, { ask }: StyleContext) {
  return walk({
    id: "head",
    sides: [
      { words: "the head from notch to notch", measured: full.lengths.head },
      { words: ask.armhole ? "the armhole between the notches" : "the plain cap seam there", measured: goal },
    ],
    joining: { how: "gathered" },
  });
}

/** The first step of a style in two parts. */
export function acrossStep({ block }: StyleContext, level: number, lower: Piece): StyleStep {
  const top = edgeOf(lower, "top").curves;
  const crown = block.points.crown!;
  return {
    stage: "draw",
    act: { act: "across" },
    distance: level,
    phrase: say`From the crown, measure ${level} down the centre line. There, square across to both underarm seams: the line to cut the sleeve in two.`,
    scene: {
      sheet: 0,
      fresh: [{ weight: "guide", curves: [line(startOf(top), endOf(top))] }],
      measured: [{ from: crown, to: { x: 0, y: level } }],
      points: [],
    },
  };
}
