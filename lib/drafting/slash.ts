/** Slash and spread: a piece cut into panels that are moved apart, none of them bent. */
import { distance, line } from "@/lib/drafting/measure";
import { along, begunAt, edgeOf, type EdgePlace, moveEdges, type Outline } from "@/lib/drafting/outline";
import { angleOf, moveBy, movePoint, type Rigid, STILL, afterwards, turnAbout } from "@/lib/drafting/rigid";
import { pointAt } from "@/lib/drafting/measure";
import { type Edge, type Notch, type Piece, type Point } from "@/lib/drafting/types";

/** A cut from one place of the outline to another, and how far it is opened at each, mm. */
export interface Slash {
  readonly from: EdgePlace;
  readonly to: EdgePlace;
  /** Opening at `from` and at `to`; 0 there leaves a hinge. */
  readonly head: number;
  readonly foot: number;
}

/** The two sides of an opened slash after the spread; `before` lies on the panel nearer the outline's start. */
export interface Lips {
  readonly head: { readonly before: Point; readonly after: Point };
  readonly foot: { readonly before: Point; readonly after: Point };
}

export interface Spread {
  /** The outline round all panels, bridged by straight lines; its edges keep their names. */
  readonly piece: Piece;
  /** Each panel where it lies now, closed, with the sides of its slashes as edges "slash". */
  readonly panels: readonly Outline[];
  readonly motions: readonly Rigid[];
  readonly lips: readonly Lips[];
}

/**
 * How far the panel after a slash turns against the one before: 2·asin((head − foot) / 2·length), from the isosceles
 * trapezium of the two lips. @throws RangeError where no such trapezium is.
 */
export function slashTurn(length: number, head: number, foot: number): number {
  const half = (head - foot) / (2 * length);
  if (!(Math.abs(half) < 1)) throw new RangeError("A slash cannot be opened wider than twice its length");
  return 2 * Math.asin(half);
}

/** A slash by its two points instead of its places on an outline. */
export interface SlashLine {
  readonly head: Point;
  readonly foot: Point;
}

/**
 * How each panel moves, the first held still: for the span of a spread without its outline.
 * @throws RangeError where a slash is opened wider than twice its length.
 */
export function panelMotions(
  lines: readonly SlashLine[],
  openings: readonly Pick<Slash, "head" | "foot">[],
): Rigid[] {
  const chain: Rigid[] = [STILL];
  for (const [i, { head, foot }] of lines.entries()) {
    chain.push(afterwards(opening(head, foot, openings[i]!), chain[i]!));
  }
  return chain;
}

/** Motion of the panel after a slash, with the panel before it held still. Head and foot as drawn before the spread. */
function opening(head: Point, foot: Point, slash: Pick<Slash, "head" | "foot">): Rigid {
  const length = distance(head, foot);
  const turn = slashTurn(length, slash.head, slash.foot);
  const down = { x: (foot.x - head.x) / length, y: (foot.y - head.y) / length };
  // Away from the panel before, turned half way: the direction both lips move in.
  const [cos, sin] = [Math.cos(turn / 2), Math.sin(turn / 2)];
  const away = { x: cos * down.y + sin * down.x, y: sin * down.y - cos * down.x };
  return afterwards(turnAbout(foot, turn), moveBy(slash.foot * away.x, slash.foot * away.y));
}

/** Where the panels come to lie, without their outlines. */
export type Laid = Pick<Spread, "motions" | "lips">;

/**
 * How the panels lie when each slash is opened. The panel in the middle stays where it is; with a slash in the middle, its
 * two lips move apart evenly and its foot keeps its place.
 */
export function layPanels(
  lines: readonly SlashLine[],
  openings: readonly Pick<Slash, "head" | "foot">[],
): Laid {
  const motions = aboutTheMiddle(panelMotions(lines, openings), lines);
  const lips = lines.map(({ head, foot }, i): Lips => {
    const [one, other] = [motions[i]!, motions[i + 1]!];
    return {
      head: { before: movePoint(head, one), after: movePoint(head, other) },
      foot: { before: movePoint(foot, one), after: movePoint(foot, other) },
    };
  });
  return { motions, lips };
}

/**
 * Cuts `piece` along `slashes` and opens each, as `layPanels` lays them. They must run side by side, in the order of their
 * `from` along the outline.
 */
export function slashAndSpread(piece: Piece, slashes: readonly Slash[]): Spread {
  if (slashes.length === 0) return { piece, panels: [piece], motions: [STILL], lips: [] };
  const ends = slashes.map(({ from, to }) => ({
    head: placePoint(piece, from),
    foot: placePoint(piece, to),
  }));
  const { lips, motions } = layPanels(ends, slashes);
  const stretches = motions.map((_, i) => panelStretches(piece, slashes, i));
  return {
    piece: {
      ...piece,
      edges: wholeRing(piece, slashes, stretches, { lips, motions }),
      notches: piece.notches.map((notch) => carried(notch, slashes)),
    },
    panels: motions.map((motion, i) => ({
      edges: panelEdges(stretches[i]!, [ends[i - 1], ends[i]], motion),
    })),
    motions,
    lips,
  };
}

function placePoint(piece: Piece, { edge, at }: EdgePlace): Point {
  return pointAt(edgeOf(piece, edge).curves, at).point;
}

function aboutTheMiddle(chain: readonly Rigid[], ends: readonly SlashLine[]): Rigid[] {
  const count = ends.length;
  const middle = count / 2;
  if (count % 2 === 0) {
    const back = inverse(chain[middle]!);
    return chain.map((motion, i) => (i === middle ? STILL : afterwards(motion, back)));
  }
  const at = (count - 1) / 2;
  const { foot } = ends[at]!;
  const [one, other] = [chain[at]!, chain[at + 1]!];
  const between = midpoint(movePoint(foot, one), movePoint(foot, other));
  const upright = afterwards(
    turnAbout(between, -(angleOf(one) + angleOf(other)) / 2),
    moveBy(foot.x - between.x, foot.y - between.y),
  );
  return chain.map((motion) => afterwards(motion, upright));
}

function inverse({ cos, sin, dx, dy }: Rigid): Rigid {
  return { cos, sin: -sin, dx: -(cos * dx + sin * dy), dy: sin * dx - cos * dy };
}

export function midpoint(a: Point, b: Point): Point {
  return { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
}

interface Stretches {
  readonly out: readonly Edge[];
  readonly back: readonly Edge[];
}

/** The stretch of the outline that belongs to panel `i` on its way out, and on its way back where it has one. */
function panelStretches(piece: Piece, slashes: readonly Slash[], i: number): Stretches {
  const before = slashes[i - 1];
  const after = slashes[i];
  if (!before) return { out: along(piece, after!.to, after!.from), back: [] };
  if (!after) return { out: along(piece, before.from, before.to), back: [] };
  return { out: along(piece, before.from, after.from), back: along(piece, after.to, before.to) };
}

function panelEdges(
  { out, back }: Stretches,
  [before, after]: readonly [SlashLine | undefined, SlashLine | undefined],
  motion: Rigid,
): Edge[] {
  return moveEdges(
    [
      ...out,
      ...(after ? [{ name: "slash", curves: [line(after.head, after.foot)] }] : []),
      ...back,
      ...(before ? [{ name: "slash", curves: [line(before.foot, before.head)] }] : []),
    ],
    motion,
  );
}

function wholeRing(
  piece: Piece,
  slashes: readonly Slash[],
  stretches: readonly Stretches[],
  { lips, motions }: Laid,
): Edge[] {
  const ring: Edge[] = [];
  for (const [i, motion] of motions.entries()) {
    ring.push(...moveEdges(stretches[i]!.out, motion));
    const slash = slashes[i];
    if (slash && slash.head > 0)
      ring.push({ name: slash.from.edge, curves: [line(lips[i]!.head.before, lips[i]!.head.after)] });
  }
  for (let i = slashes.length - 1; i >= 0; i--) {
    const slash = slashes[i]!;
    if (slash.foot > 0)
      ring.push({ name: slash.to.edge, curves: [line(lips[i]!.foot.after, lips[i]!.foot.before)] });
    ring.push(...moveEdges(stretches[i]!.back, motions[i]!));
  }
  return begunAt(ring, piece.edges[0]!.name);
}

/** A notch stays on its panel; along the edge it has moved on by what was opened before it. */
function carried(notch: Notch, slashes: readonly Slash[]): Notch {
  let { at } = notch;
  for (const { from, to, head, foot } of slashes) {
    if (from.edge === notch.edge && from.at < notch.at) at += head;
    if (to.edge === notch.edge && to.at < notch.at) at += foot;
  }
  return { ...notch, at };
}
