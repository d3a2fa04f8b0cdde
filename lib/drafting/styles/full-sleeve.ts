/** What the full styles in one piece share: the sleeve down to a level, slashed, spread and drawn anew, and its figures. */
import { INCH } from "@/lib/drafting/guide";
import { type PatternPiece, type StyleResult, type StyleStep } from "@/lib/drafting/pattern";
import { edgeOf } from "@/lib/drafting/outline";
import { say } from "@/lib/drafting/say";
import { LINE_WIDTH, walk, type WalkedSeam } from "@/lib/drafting/seams";
import {
  impossible,
  type StyleContext,
  type StyleFigure,
  type StyleGround,
} from "@/lib/drafting/styles/context";
import { FULLEST, headGoal, headPlaces, pattern } from "@/lib/drafting/styles/parts";
import { downTo, EMPTY, outlined } from "@/lib/drafting/styles/plain-sleeve";
import {
  type SpreadAsk,
  type SpreadPiece,
  spreadPiece,
  spreadLengths,
} from "@/lib/drafting/styles/spread-piece";
import { count, tooFar } from "@/lib/drafting/styles/statement";
import { straightSides } from "@/lib/drafting/straight-sides";
import { type Phrase, type Piece } from "@/lib/drafting/types";

/** How many slashes where the head is hinged: over fewer hinges than three no curve runs smoothly. */
export function hingedCount(usual: number): StyleFigure {
  return { ...count("slashes", usual), low: 3 };
}

/**
 * What each slash is opened by as a rule where the head is hinged, mm: the practice's 1 1/4 in, and all together no further
 * than the sleeve is long, or a short one's head turns hollow.
 */
export function hingedOpening(ground: StyleGround, slashes: number): number {
  return Math.min(1.25 * INCH * sizeOf(ground), ground.figures.length / slashes);
}

/** Practice is given for a child's sleeve of 12 in across: smaller ones take less, larger ones keep it. */
export function sizeOf({ figures: { biceps } }: StyleGround): number {
  return Math.min(1, biceps / (12 * INCH));
}

/**
 * What each slash is opened by as a rule, mm: the practice's own `most`, and no more than cloth of this weight takes where
 * an edge of `before` is gathered into `into`.
 */
export function usualOpening(
  { cloth }: StyleGround,
  { most, before, into, slashes }: { most: number; before: number; into: number; slashes: number },
): number {
  const room = (0.95 * FULLEST[cloth] * into - before) / slashes;
  return Math.max(LEAST_OPENING, Math.min(most, room));
}

const LEAST_OPENING = 0.25 * INCH;

const SAID = {
  headOpen: [
    "Opening at the head",
    "the opening of each slash at the head",
    "Wider, the head is fuller and gathers more closely.",
    LEAST_OPENING,
    4 * INCH,
  ],
  footOpen: [
    "Opening at the lower edge",
    "the opening of each slash at the lower edge",
    "Wider, the lower edge is fuller.",
    LEAST_OPENING,
    4 * INCH,
  ],
  raise: [
    "Raise the crown",
    "the raise of the crown",
    "Higher, the head stands up from the shoulder.",
    0,
    5 * INCH,
  ],
  drop: [
    "Lower the edge for pouching",
    "the pouch of the lower edge",
    "Lower, the sleeve bags over the seam below it.",
    0,
    4 * INCH,
  ],
} as const;

/** A figure of the spread with its usual value, mm. */
export function spreadFigure(key: keyof typeof SAID, usual: number, does?: string): StyleFigure {
  const [label, said, look, low, high] = SAID[key];
  return { key, label, said, does: does ?? look, kind: "length", usual, low, high };
}

export interface FullSleeve {
  readonly ok: true;
  readonly ask: SpreadAsk;
  readonly full: SpreadPiece;
  readonly piece: PatternPiece;
  /** Those that end the sleeve at its level. */
  readonly ends: readonly StyleStep[];
}

/** How the sleeve is made full; figures of the recipe that are left out are nought. */
export type Fullness = Pick<SpreadAsk, "squared"> & {
  /** Ends so far below the crown, mm. */
  readonly level: number;
  /** Its underarm seams do not run in. */
  readonly straight?: boolean;
  readonly allowances?: PatternPiece["allowances"];
};

/** The one piece "sleeve" from the figures slashes, headOpen, footOpen, raise, drop and backDrop; or why it cannot be. */
export function fullSleeve(
  context: StyleContext,
  { level, straight, squared, allowances }: Fullness,
): FullSleeve | Extract<StyleResult, { ok: false }> {
  const { near, values } = context;
  const { piece, steps } = downTo(context, level);
  const ruled = straight ? straightSides(piece) : undefined;
  const ask: SpreadAsk = {
    piece: ruled ?? piece,
    ...headPlaces(context),
    slashes: values.slashes!,
    headOpen: near(values.headOpen ?? 0),
    footOpen: near(values.footOpen ?? 0),
    raise: values.raise ?? 0,
    drop: values.drop ?? 0,
    backDrop: values.backDrop ?? 0,
    ...(squared && { squared }),
    near,
  };
  const stopped = tooFar(ask);
  if (stopped) return stopped;
  const drawn = ask.headOpen === 0 ? keptHead(ask) : ask;
  const full = spreadPiece(drawn);
  return {
    ok: true,
    ask: drawn,
    full,
    piece: pattern(full.piece, "sleeve", "Sleeve", {
      panels: full.spread.panels,
      allowances: allowances ?? {},
    }),
    ends: [...steps, ...(ruled ? [ruledStep(ruled, "down to the level of the lower edge")] : [])],
  };
}

/** A head is as long as it was within this share of its length, and raised by no more than that one for it. */
const KEPT = { within: 1 / 2000, lift: 1 / 10, step: 1 / 1000 };

/**
 * A smooth curve over hinges cuts off corners. Where the head would come out shorter than it was, its crown is raised, by
 * no more than it takes: hinged there, it is to go into the armhole as before. On a cap so flat that its head turns
 * hollow no raise helps, and it is left for the walk to show.
 */
export function keptHead(ask: SpreadAsk): SpreadAsk {
  const before = ask.notchBack - ask.notchFront;
  const raised = (steps: number): SpreadAsk => ({ ...ask, raise: ask.near(steps * KEPT.step * before) });
  const keeps = (steps: number) => spreadLengths(raised(steps)).head >= before * (1 - KEPT.within);
  let [low, high] = [0, Math.round(KEPT.lift / KEPT.step)];
  if (keeps(low)) return raised(low);
  if (!keeps(high)) return ask;
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (keeps(middle)) high = middle;
    else low = middle;
  }
  return raised(high);
}

/** No distance: by the ruler, square to the cap line. */
export function ruledStep(ruled: Piece, words: string): StyleStep {
  const fresh = ["underarmBack", "foot", "underarmFront"].map((name) => ({
    weight: "guide" as const,
    curves: edgeOf(ruled, name).curves,
  }));
  return {
    stage: "draw",
    act: { act: "straight-sides" },
    phrase: say`Rule both underarm seams again, ${words}: straight from the underarm points, square to the cap line, or out to the old ends where those lie further out.`,
    scene: { ...EMPTY, fresh },
  };
}

/** The head against what it goes into between the notches, where it is not gathered. */
export function easedHead(full: SpreadPiece, ground: StyleGround): WalkedSeam {
  return walk({
    id: "head",
    sides: [
      { words: "the head from notch to notch", measured: full.lengths.head },
      {
        words: ground.ask.armhole ? "the armhole between the notches" : "the plain cap seam there",
        measured: headGoal(ground),
      },
    ],
    joining: { how: "eased" },
  });
}

/** The last words where the head is eased in. */
export function setInEased(full: SpreadPiece, ground: StyleGround): Phrase[] {
  const ease = ground.ask.armhole ? full.lengths.head - headGoal(ground) : 0;
  return [
    ease > LINE_WIDTH
      ? say`Sew one row of long stitches along the head from notch to notch, and ease in the ${ease} with it.`
      : say`Sew one row of long stitches along the head from notch to notch, to ease it by.`,
    say`Set the sleeve into the armhole: underarm to underarm, notches to notches, crown to the shoulder seam.`,
  ];
}

/** Checks of the block's cap that say nothing about a gathered head; its own walk takes their place. */
export const GATHERED_HEAD: readonly string[] = ["cap-front", "cap-back", "head-ease", "balance"];

export const setInGathered: Phrase = say`Set the sleeve into the armhole: underarm to underarm, notches to notches, crown to the shoulder seam; below the notches it goes in flat.`;

/** A curved edge takes a narrow hem, or it puckers: 1/2 in. Common practice, no source. */
export const NARROW_HEM = INCH / 2;

export function curvedHemStep(piece: Piece, sheet = 1): StyleStep {
  return {
    stage: "cut",
    act: { act: "allow", edge: "foot" },
    distance: NARROW_HEM,
    phrase: say`Below the lower edge add ${NARROW_HEM} for a narrow hem: the edge is a curve, and a deep hem would pucker.`,
    scene: outlined(piece, sheet),
  };
}

/** Where the sleeve ends above a band of the depth `bandDepth`; or why there is no room for it. */
export function aboveBand({
  figures,
  near,
  values,
}: StyleContext): number | Extract<StyleResult, { ok: false }> {
  const depth = near(values.bandDepth!);
  const level = figures.length - depth;
  const least = figures.capDepth + LEAST_UNDERARM;
  if (level >= least - 1e-6 && depth > 0) return level;
  const room = figures.length - least;
  return impossible(
    "bandDepth",
    "band-too-deep",
    say`Over a band ${depth} deep the sleeve would end ${level} below the crown, and its cap is ${figures.capDepth} deep.`,
    room > 6
      ? say`Make the band ${room} deep or less, or the sleeve longer.`
      : say`Make the sleeve ${least + INCH} or longer.`,
  );
}

/** Underarm seam that must be left above a band, mm. */
export const LEAST_UNDERARM = 10;
