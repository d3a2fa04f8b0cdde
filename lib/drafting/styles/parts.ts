/** What recipes share: the block's seams, the walk of a gathered edge, checks of gathers, rectangles. */
import { INCH } from "@/lib/drafting/guide";
import { chainLength, line } from "@/lib/drafting/measure";
import { edgeOf } from "@/lib/drafting/outline";
import { type Cloth, type Gather, type PatternPiece, type StyleCheck } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { LINE_WIDTH, ratioWords, walk, type WalkedSeam } from "@/lib/drafting/seams";
import { type StyleFigure, type StyleGround } from "@/lib/drafting/styles/context";
import { type Edge, type Piece, type Point } from "@/lib/drafting/types";

/** Places along the block's cap seam taken as one edge from the front underarm point, mm. */
export interface HeadPlaces {
  readonly notchFront: number;
  readonly crown: number;
  readonly notchBack: number;
  readonly end: number;
}

export function headPlaces({ block, figures }: StyleGround): HeadPlaces {
  const { cap, capFront } = block.lengths;
  return {
    notchFront: figures.notches.front,
    crown: capFront,
    notchBack: cap - figures.notches.back,
    end: cap,
  };
}

/**
 * What the head is gathered into between the notches: the armhole less the two stretches below them, which are sewn in
 * flat; with no armhole known, the plain cap's own stretch.
 */
export function headGoal(ground: StyleGround): number {
  const { notchFront, notchBack, end } = headPlaces(ground);
  const { armhole } = ground.ask;
  const seam = armhole ? armhole.front + armhole.back : end;
  return seam - notchFront - (end - notchBack);
}

export function gatherOf(
  id: string,
  [piece, edge]: readonly [string, string],
  words: string,
  full: number,
  pulledTo: number,
): Gather {
  return { id, piece, edge, words, full, pulledTo };
}

/** Up to this many times the pulled-up length by the weight of the cloth. Recalled, not read in a source. */
export const FULLEST: Readonly<Record<Cloth, number>> = { heavy: 1.5, medium: 2, fine: 3 };

/** Under this nothing shows but unevenness. Common practice, no source. */
const LEAST = 1.15;

/** How more and less is brought about, as it reads within a sentence. */
const BY_SLASHES = { more: "open the slashes further", less: "open the slashes less" };

/** Gathers against the cloth's weight. `by` says what to change; where nothing is given, the slashes. */
export function gatherCheck(
  { id, words, full, pulledTo }: Gather,
  cloth: Cloth,
  figure: string,
  by: { readonly more: string; readonly less: string } = BY_SLASHES,
): StyleCheck {
  const ratio = full / pulledTo;
  const most = FULLEST[cloth];
  const start = words[0]!.toUpperCase() + words.slice(1);
  const verdict =
    full < pulledTo - LINE_WIDTH ? "wrong" : ratio < LEAST || ratio > most * 1.1 ? "look" : "good";
  return {
    id: `gather-${id}`,
    verdict,
    figure,
    value: full,
    low: pulledTo * LEAST,
    high: pulledTo * most,
    phrase: say`${start}: ${full} gathered to ${pulledTo}, ${ratioWords(ratio)}; ${cloth} cloth takes up to ${ratioWords(most)}.`,
    remedy:
      verdict === "good"
        ? say`Nothing to change.`
        : verdict === "wrong"
          ? say`It is too short for its seam: ${by.more}, until it measures ${pulledTo} or more.`
          : ratio < LEAST
            ? say`So little hardly shows as gathers: ease it in, or ${by.more}.`
            : say`${cloth === "heavy" ? "Heavy cloth bunches" : "The seam grows thick"} at so much: ${by.less}, until it measures ${pulledTo * most}, or take lighter cloth.`,
    source: "recalled: heavy 1.5 : 1, medium 2 : 1, sheer 3 : 1",
    mark: "memory",
  };
}

/** Both underarm edges of a piece, sewn to each other. */
export function underarmWalk(piece: Piece, id: string, words: string): WalkedSeam {
  return walk({
    id,
    sides: [
      { words: `the front underarm of ${words}`, measured: edgeOf(piece, "underarmFront") },
      { words: "its back underarm", measured: edgeOf(piece, "underarmBack") },
    ],
    joining: { how: "equal" },
  });
}

/** A whole piece of a pattern: cut twice, mirrored, unless said otherwise. */
export function pattern(
  piece: Piece,
  id: string,
  name: string,
  more: Partial<Pick<PatternPiece, "cut" | "onFold" | "lines" | "allowances" | "panels">> = {},
): PatternPiece {
  return {
    ...piece,
    id,
    name,
    cut: { count: 2, mirrored: true },
    lines: [],
    allowances: {},
    panels: [],
    ...more,
  };
}

/** A rectangle, `length` across and `depth` down, grain along its length or its depth. Edges "top", "right", "bottom", "left". */
export function rectangle(length: number, depth: number, grainAlong: "length" | "depth" = "depth"): Piece {
  const corner = (x: number, y: number): Point => ({ x, y });
  const [a, b, c, d] = [
    corner(-length / 2, 0),
    corner(length / 2, 0),
    corner(length / 2, depth),
    corner(-length / 2, depth),
  ];
  const edges: Edge[] = [
    { name: "top", curves: [line(a, b)] },
    { name: "right", curves: [line(b, c)] },
    { name: "bottom", curves: [line(c, d)] },
    { name: "left", curves: [line(d, a)] },
  ];
  const grain =
    grainAlong === "length"
      ? { from: corner(-length / 3, depth / 2), to: corner(length / 3, depth / 2) }
      : { from: corner(0, depth / 5), to: corner(0, (depth * 4) / 5) };
  return { name: "strip", edges, notches: [], grain };
}

export function edgeSize(piece: Piece, edge: string): number {
  return chainLength(edgeOf(piece, edge).curves);
}

/** How wide the cloth is that strips and rings are cut from; what the maker knows already is the usual one. */
export function clothWidthFigure({ clothWidth }: StyleGround): StyleFigure {
  return {
    key: "clothWidth",
    label: "Width of the cloth",
    said: "the width of the cloth",
    does: "Nothing to the look: on narrower cloth there are more joins.",
    kind: "length",
    usual: clothWidth,
    low: Math.min(12 * INCH, clothWidth),
    high: Math.max(120 * INCH, 2 * clothWidth),
  };
}
