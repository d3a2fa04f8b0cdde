/** The lantern: widening to a line round the arm, and drawn in again below it; the two parts meet there edge to edge. */
import { cutAcross } from "@/lib/drafting/cut-across";
import { edgeOf } from "@/lib/drafting/outline";
import { type StyleCheck, type StyleStep } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { LINE_WIDTH, walk } from "@/lib/drafting/seams";
import { findRoot } from "@/lib/drafting/solve";
import { straightSides } from "@/lib/drafting/straight-sides";
import {
  impossible,
  settled,
  type StyleContext,
  type StyleFigure,
  type StyleRecipe,
} from "@/lib/drafting/styles/context";
import {
  curvedHemStep,
  easedHead,
  hingedCount,
  hingedOpening,
  keptHead,
  NARROW_HEM,
  ruledStep,
  setInEased,
  spreadFigure,
} from "@/lib/drafting/styles/full-sleeve";
import { edgeSize, headPlaces, pattern, underarmWalk } from "@/lib/drafting/styles/parts";
import { headed, outlined, work } from "@/lib/drafting/styles/plain-sleeve";
import {
  type SpreadAsk,
  type SpreadPiece,
  spreadPiece,
  turnOf,
  spreadLengths,
  slashLines,
} from "@/lib/drafting/styles/spread-piece";
import {
  edgeSteps,
  joinSteps,
  openSteps,
  type PartBelow,
  slashSteps,
  spreadSteps,
} from "@/lib/drafting/styles/spread-steps";
import { acrossStep, tooFar, WIDEST_TURN } from "@/lib/drafting/styles/statement";
import { type Piece } from "@/lib/drafting/types";

/** Turns of the lower part that its usual figures stay under, radians. */
const USUAL_TURN = 1.2;
/** Both edges along the joint measure the same within this, mm. */
const SAME = 0.01;
const BELOW: PartBelow = { part: "lower", sheet: 2 };

export const lantern: StyleRecipe = {
  id: "lantern",
  name: "Lantern",
  look: "Smooth at the shoulder, standing out to a ridge round the arm, and drawn in again to the hem.",
  // Its hem is measured on the new draft.
  replaces: ["hem-hand"],
  figures: (ground, typed): StyleFigure[] => {
    const { capDepth, length } = ground.figures;
    const room = length - capDepth;
    const widestAt: StyleFigure = {
      key: "widestAt",
      label: "Widest line below the crown",
      said: "the level of the widest line",
      does: "Lower down, the ridge comes nearer the hand and the part below it turns in more sharply.",
      kind: "length",
      usual: capDepth + room / 2,
      low: capDepth + Math.min(10, room / 3),
      high: length - Math.min(15, room / 3),
    };
    const slashes = hingedCount(6);
    const below = length - settled(widestAt, typed);
    const number = settled(slashes, typed);
    const usual = Math.min(hingedOpening(ground, number), (USUAL_TURN * below) / number);
    return [
      widestAt,
      slashes,
      {
        ...spreadFigure("footOpen", Math.max(2, usual)),
        label: "Opening at the widest line",
        said: "the opening of each slash at the widest line",
        does: "Wider, the ridge stands out further from the arm.",
        low: 2,
      },
    ];
  },
  make: (context) => {
    const { figures, near, values } = context;
    const level = near(values.widestAt!);
    const parts =
      level > figures.capDepth + 2 && level < figures.length - 2
        ? cutAcross(headed(context), level)
        : undefined;
    if (!parts)
      return impossible(
        "widestAt",
        "widest-line-off",
        say`The widest line would lie ${level} below the crown; the cap is ${figures.capDepth} deep and the sleeve ${figures.length} long.`,
        say`Set it between the cap line and the hem, or make the sleeve longer.`,
      );
    const ruled = straightSides(parts.upper);
    const ask: SpreadAsk = {
      piece: ruled ?? parts.upper,
      ...headPlaces(context),
      slashes: values.slashes!,
      headOpen: 0,
      footOpen: near(values.footOpen!),
      raise: 0,
      drop: 0,
      squared: ["foot"],
      near,
    };
    const stopped = tooFar(ask);
    if (stopped) return stopped;
    const upperAsk = keptHead(ask);
    const full = spreadPiece(upperAsk);
    const lowerAsk = meeting(lowerPart(parts.lower), ask, full.lengths.foot);
    if (!lowerAsk) return noLower(figures.length - level, full.lengths.foot);
    const low = spreadPiece(lowerAsk);
    const upper = pattern(full.piece, "upper", "Upper part", { panels: full.spread.panels });
    const lower = pattern(withCentres(low), "lower", "Lower part", {
      panels: low.spread.panels,
      allowances: { foot: NARROW_HEM },
    });
    return {
      ok: true,
      value: {
        pieces: [upper, lower],
        gathers: [],
        seams: [
          easedHead(full, context),
          walk({
            id: "joint",
            sides: [
              { words: "the lower edge of the upper part", measured: edgeOf(upper, "foot") },
              { words: "the upper edge of the lower part", measured: edgeOf(lower, "head") },
            ],
            joining: { how: "equal" },
          }),
          underarmWalk(upper, "underarm-upper", "the upper part"),
          underarmWalk(lower, "underarm-lower", "the lower part"),
        ],
        checks: hemHand(context, low.lengths.foot),
        steps: [
          acrossStep(context, level, parts.lower),
          ...slashSteps(lowerAsk, low, BELOW),
          ...(ruled ? [ruledStep(ruled, "down to this line")] : []),
          work("draw", say`What lies above the line is the upper part, and the line is now its lower edge.`),
          ...spreadSteps(upperAsk, full, "the upper part"),
          ...lowerSteps(lowerAsk, low),
          ...joinSteps([
            say`Sew the upper part to the lower part: centre to centre, edge to edge. Clip the seam allowances, so that the ridge stands.`,
            say`Close the underarm seam from the armhole to the hem.`,
            say`Turn the narrow hem up and sew it.`,
            ...setInEased(full, context),
          ]),
        ],
      },
    };
  },
};

/** The lower part as `spreadPiece` asks for it: its top named "head". */
function lowerPart(lower: Piece): Piece {
  return {
    ...lower,
    edges: lower.edges.map(({ name, curves }) => ({ name: name === "top" ? "head" : name, curves })),
    notches: [],
  };
}

/** The lower part opened at its top until that measures `wanted`, mm, hinged at the hem; undefined where it cannot be. */
function meeting(piece: Piece, { near, slashes }: SpreadAsk, wanted: number): SpreadAsk | undefined {
  const top = edgeSize(piece, "head");
  const asked = (headOpen: number): SpreadAsk => ({
    piece,
    notchFront: 0,
    crown: top / 2,
    notchBack: top,
    slashes,
    headOpen,
    footOpen: 0,
    raise: 0,
    drop: 0,
    squared: ["head", "foot"],
    near,
  });
  const lines = slashLines(asked(0));
  const miss = (headOpen: number) => {
    const ask = asked(headOpen);
    return turnOf(ask, lines) > WIDEST_TURN ? wanted : spreadLengths(ask).head - wanted;
  };
  if (miss(0) > 0) return undefined;
  // All the slashes together open by nearly what the edge wants more: looked for round there, and all the way only else.
  const even = (wanted - top) / slashes;
  const close = even > 0 && miss(0.7 * even) < 0 && miss(1.1 * even) > 0;
  const [low, high] = close ? [0.7 * even, 1.1 * even] : [0, wanted];
  const ask = asked(findRoot(miss, low, high, SAME / (4 * slashes)));
  return Math.abs(miss(ask.headOpen)) < SAME / 2 ? ask : undefined;
}

function noLower(depth: number, wanted: number) {
  return impossible(
    "footOpen",
    "lower-part-too-short",
    say`The widest line would measure ${wanted}, and the part below it is only ${depth} deep: it cannot be drawn in so sharply.`,
    say`Open the slashes less, set the widest line higher up, or make the sleeve longer and its hem wider.`,
  );
}

/** Centre notches only: the lower part has no cap. */
function withCentres({ piece }: SpreadPiece): Piece {
  return {
    ...piece,
    notches: piece.notches
      .filter(({ id }) => id === "crown")
      .map((notch) => ({ ...notch, id: "footCentre" })),
  };
}

/** The hem as it is drawn against the hand, where there is no opening. */
function hemHand({ ask: { hand, opening }, figures }: StyleContext, round: number): StyleCheck[] {
  if (hand === undefined || opening) return [];
  const fits = round >= hand - LINE_WIDTH;
  return [
    {
      id: "hem-hand",
      verdict: fits ? "good" : "wrong",
      figure: "hem",
      value: round,
      low: hand,
      phrase: say`The hem is ${round}, the hand ${hand}, and there is no opening.`,
      remedy: fits
        ? say`Nothing to change.`
        : say`Make the hem ${figures.hem + hand - round} or wider, or give it an opening.`,
      source: "Ingalls, Text-Book on Domestic Art, 1911",
      mark: "seen",
    },
  ];
}

function lowerSteps(ask: SpreadAsk, low: SpreadPiece): StyleStep[] {
  return [
    ...openSteps(ask, low, "the lower part", BELOW),
    ...edgeSteps(low, "head", { squared: true, below: BELOW }),
    work(
      "draw",
      say`It must measure as much as the lower edge of the upper part. If it does not, open or close all its slashes a little, all alike, and draw it again.`,
      { sheet: BELOW.sheet },
    ),
    ...edgeSteps(low, "foot", { squared: true, below: BELOW }),
    work(
      "draw",
      say`Mark the centre of its upper edge, and the grain along the centre line.`,
      outlined(low.piece, BELOW.sheet),
    ),
    curvedHemStep(low.piece, BELOW.sheet),
    work(
      "cut",
      say`Trace the lower part on to fresh paper and add the other seam allowances. Cut it twice in cloth, the second mirrored.`,
      outlined(low.piece, BELOW.sheet),
    ),
  ];
}
