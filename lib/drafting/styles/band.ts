/** A band that a full lower edge is gathered into: closed round the arm, cut double and folded along its middle. */
import { passesElbow } from "@/lib/drafting/checks";
import { INCH } from "@/lib/drafting/guide";
import { line } from "@/lib/drafting/measure";
import { edgeOf } from "@/lib/drafting/outline";
import { type Gather, type PatternPiece, type StyleCheck, type StyleStep } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { walk, type WalkedSeam } from "@/lib/drafting/seams";
import {
  settled,
  type StyleContext,
  type StyleFigure,
  type StyleGround,
  type Typed,
} from "@/lib/drafting/styles/context";
import { LEAST_UNDERARM, sizeOf, usualOpening } from "@/lib/drafting/styles/full-sleeve";
import { edgeSize, pattern, rectangle } from "@/lib/drafting/styles/parts";
import { outlined } from "@/lib/drafting/styles/plain-sleeve";
import { joinSteps } from "@/lib/drafting/styles/spread-steps";
import { type Piece, type Point } from "@/lib/drafting/types";

/** Round the arm or the wrist, so that the band does not bind: 1 in. Common practice, no source. */
const EASE = INCH;
/** A length read off in eighths of an inch is taken, though it was rounded. */
const SLACK = INCH / 16 + 1e-6;
/** Whether a sleeve of that depth below the crown ends below the elbow. */
function belowElbow({ ask, figures }: StyleGround, level: number): boolean {
  return passesElbow({ ask, figures: { ...figures, length: level } });
}

/** Round of the plain sleeve at its hem, the arm, the wrist or the hand: what a band is made to, with its ease. */
function usualLength(ground: StyleGround): number {
  const { ask, figures } = ground;
  const ease = EASE * sizeOf(ground);
  const { hand, upperArm, wrist } = ask;
  if (belowElbow(ground, figures.length)) return hand ?? (wrist === undefined ? figures.hem : wrist + ease);
  return upperArm === undefined ? figures.hem : Math.max(upperArm + ease, hand ?? 0);
}

/** Depth and length of the band; the sleeve above it is shortened by its depth. */
export function bandFigures(
  ground: StyleGround,
  depth: number,
  words: "band" | "cuff" = "band",
): StyleFigure[] {
  const { capDepth, length } = ground.figures;
  const room = length - capDepth;
  const high = Math.max(8, Math.min(6 * INCH, room - LEAST_UNDERARM - 3));
  const wanted = usualLength(ground);
  return [
    {
      key: "bandDepth",
      label: words === "cuff" ? "Depth of the cuff" : "Depth of the band",
      said: `the finished depth of the ${words}`,
      does: `Deeper, more of the arm lies in the ${words}; the sleeve above it is shortened by as much.`,
      kind: "length",
      usual: Math.min(depth, Math.max(6, Math.min(high, room / 3))),
      low: 6,
      high,
    },
    {
      key: "bandLength",
      label: words === "cuff" ? "Length of the cuff" : "Length of the band",
      said: `the length of the ${words}`,
      does: "Shorter, it lies closer and the gathers are closer too.",
      kind: "length",
      usual: Math.min(1000, Math.max(60, wanted)),
      low: 60,
      high: 1000,
    },
  ];
}

/** The usual opening of each slash at the foot, mm, for the band and the number of slashes that were typed. */
export function bandOpening(
  ground: StyleGround,
  typed: Typed,
  {
    slashes,
    band,
    most,
  }: { readonly slashes: StyleFigure; readonly band: readonly StyleFigure[]; readonly most: number },
): number {
  const [depth, length] = band;
  const { biceps, capDepth, hem, length: whole } = ground.figures;
  // Round of the plain sleeve where the band begins, by straight underarm seams.
  const up = settled(depth!, typed) / (whole - capDepth);
  return usualOpening(ground, {
    most,
    before: hem + (biceps - hem) * up,
    into: settled(length!, typed),
    slashes: settled(slashes, typed),
  });
}

/** The band as cut, `overlap` mm longer than its seam; a fold line along its middle. Edges as in `rectangle`. */
export function bandPiece(length: number, depth: number, name: "Band" | "Cuff", overlap = 0): PatternPiece {
  const piece = rectangle(length + overlap, 2 * depth, "length");
  const marks =
    overlap > 0
      ? // The sleeve is open in the middle of its back half: a quarter from there lies its centre, and all of it before the overlap.
        [
          { id: "footCentre", at: length / 4 },
          { id: "overlap", at: length },
        ]
      : [{ id: "footCentre", at: length / 2 }];
  const ends = [-1, 1].map((side): Point => ({ x: (side * (length + overlap)) / 2, y: depth }));
  return pattern(
    { ...piece, notches: marks.map((mark) => ({ ...mark, edge: "top", count: 1 })) },
    name.toLowerCase(),
    name,
    {
      cut: { count: 2, mirrored: overlap > 0 },
      lines: [{ kind: "fold", words: "fold", curves: [line(ends[0]!, ends[1]!)] }],
    },
  );
}

/** The gathered edge of the sleeve into the seam of the band, and the band's own ends to each other. */
export function bandSeams(gather: Gather, band: PatternPiece, seam: Piece["name"]): WalkedSeam[] {
  return [
    walk({
      id: gather.id,
      sides: [
        { words: gather.words, measured: gather.full },
        { words: `the ${seam}`, measured: gather.pulledTo },
      ],
      joining: { how: "gathered" },
    }),
    walk({
      id: `${seam}-ends`,
      sides: [
        { words: `one end of the ${seam}`, measured: edgeOf(band, "left") },
        { words: "the other", measured: edgeOf(band, "right") },
      ],
      joining: { how: "equal" },
    }),
  ];
}

interface Round {
  readonly words: "band" | "cuff";
  readonly length: number;
  /** The cuff has a placket, so that the hand need not pass through it closed. */
  readonly opens: boolean;
}

/** The band against what must pass through it and what it lies on, as far as these were measured. */
export function bandChecks(context: StyleContext, { words, length, opens }: Round): StyleCheck[] {
  const { ask, figures } = context;
  const long = belowElbow(context, figures.length);
  const against = (id: string, low: number, of: string, remedy: string, seen: boolean): StyleCheck => {
    const fits = length >= low - SLACK;
    return {
      id: `${words}-${id}`,
      verdict: fits ? "good" : "wrong",
      figure: "bandLength",
      value: length,
      low,
      phrase: say`The ${words} is ${length} long, and ${of} ${low} round.`,
      remedy: fits ? say`Nothing to change.` : say`Make the ${words} ${low} or longer${remedy}.`,
      ...(seen
        ? { source: "Ingalls, Text-Book on Domestic Art, 1911", mark: "seen" as const }
        : { source: "common practice, no source", mark: "practice" as const }),
    };
  };
  const checks: StyleCheck[] = [];
  const closed = !opens && !ask.opening;
  if (ask.hand !== undefined && closed)
    checks.push(against("hand", ask.hand, "the hand is", ", or give the sleeve an opening", true));
  if (ask.wrist !== undefined && long) checks.push(against("wrist", ask.wrist, "the wrist is", "", false));
  if (ask.upperArm !== undefined && !long)
    checks.push(against("arm", ask.upperArm, "the upper arm is", "", false));
  return checks;
}

/** Cutting the band: its seams join two lengths of the cloth, so it is cut as wide as both its faces. */
export function bandCutStep(band: PatternPiece, sheet: number): StyleStep {
  const [length, depth] = [edgeSize(band, "top"), edgeSize(band, "left")];
  return {
    stage: "cut",
    act: { act: "strip", piece: band.id },
    distance: length,
    phrase: say`For the bands cut two strips, each ${length} long and ${depth} deep; add the seam allowances. Crease each along its middle: the fold is its lower edge.`,
    scene: outlined(band, sheet),
  };
}

/** Sewing a band without an opening to a gathered sleeve. */
export function bandSewSteps(): StyleStep[] {
  return joinSteps([
    say`Sew the two ends of each band together: a round for each sleeve.`,
    say`Sew one long edge of the band to the gathered edge of the sleeve, right sides together: its join to the underarm seam, the point across from it to the centre mark.`,
    say`Fold the band to the inside along its crease, turn its other edge in, and sew it down over the seam.`,
  ]);
}
