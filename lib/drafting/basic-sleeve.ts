/** Draws the basic sleeve from its figures: drafting rules 1 to 3 of "The basic sleeve". */
import { type CapFault, capSeam } from "@/lib/drafting/cap-seam";
import { across, guideLine, halfKnots, type GuideLine } from "@/lib/drafting/guide";
import { chainLength, distance, line, pointAt, reversed } from "@/lib/drafting/measure";
import { ordinal, say } from "@/lib/drafting/say";
import {
  type CubicBezier,
  type DraftProblem,
  type Edge,
  type Piece,
  type Point,
  type Result,
  type Side,
  type SleeveFigures,
} from "@/lib/drafting/types";

type Half = "Front" | "Back";
export type PointName =
  | "crown"
  | "capCentre"
  | "elbowCentre"
  | "hemCentre"
  | "grainTop"
  | "grainFoot"
  | `underarm${Half}`
  | `elbow${Half}`
  | `hem${Half}`
  | `beside${Half}`
  | `foot${Half}${number}`
  | `mark${Half}${number}`
  | `notch${Half}`;

export type LineName =
  | "centre"
  | "crownLine"
  | "capLine"
  | "elbowLine"
  | "hemLine"
  | `guide${Half}`
  | `cap${Half}`
  | `underarm${Half}`
  | "grain";

export interface SleeveDraft {
  readonly piece: Piece;
  readonly points: Readonly<Partial<Record<PointName, Point>>>;
  /** Construction lines, for drawing. */
  readonly guides: readonly { readonly name: LineName; readonly curves: readonly CubicBezier[] }[];
  /** Measured on the Béziers, mm. */
  readonly lengths: {
    readonly capFront: number;
    readonly capBack: number;
    readonly cap: number;
    readonly underarmFront: number;
    readonly underarmBack: number;
    readonly hem: number;
  };
}

export function half(side: Side): Half {
  return side === "front" ? "Front" : "Back";
}

/** Draws the sleeve. Fails, naming the mark, where no fair cap seam runs through the marks. */
export function draftBasicSleeve(figures: SleeveFigures): Result<SleeveDraft> {
  const front = capHalf(figures, "front");
  const back = capHalf(figures, "back");
  if (!front.ok || !back.ok) {
    return { ok: false, problems: [front, back].flatMap((side) => (side.ok ? [] : side.problems)) };
  }
  const capFront = front.value;
  const capBack = reversed(back.value);
  const frontSide = underarm(figures, "front");
  const backSide = underarm(figures, "back");
  const edges: Edge[] = [
    { name: "capFront", curves: capFront },
    { name: "capBack", curves: capBack },
    { name: "underarmBack", curves: chainOf(backSide) },
    { name: "hem", curves: [line(backSide.at(-1)!, frontSide.at(-1)!)] },
    { name: "underarmFront", curves: chainOf([...frontSide].reverse()) },
  ];
  const [lengthFront, lengthBack, underarmBack, hem, underarmFront] = edges.map((edge) =>
    chainLength(edge.curves),
  );
  const room = Math.min(figures.capDepth, figures.length - figures.capDepth) / 4;
  const grain = { from: { x: 0, y: room }, to: { x: 0, y: figures.length - room } };
  const notchBack = lengthBack! - figures.notches.back;
  const piece: Piece = {
    name: "sleeve",
    edges,
    notches: [
      { edge: "capFront", at: figures.notches.front, count: 1 },
      { edge: "capBack", at: notchBack, count: 2 },
    ],
    grain,
  };
  const guideLines = { front: guideLine(figures, "front"), back: guideLine(figures, "back") };
  const points: Partial<Record<PointName, Point>> = {
    ...linePoints(figures),
    ...markPoints(guideLines.front, "Front"),
    ...markPoints(guideLines.back, "Back"),
    notchFront: pointAt(capFront, figures.notches.front).point,
    notchBack: pointAt(capBack, notchBack).point,
    grainTop: grain.from,
    grainFoot: grain.to,
  };
  return {
    ok: true,
    value: {
      piece,
      points,
      guides: guidesOf(figures, points, guideLines),
      lengths: {
        capFront: lengthFront!,
        capBack: lengthBack!,
        cap: lengthFront! + lengthBack!,
        underarmFront: underarmFront!,
        underarmBack: underarmBack!,
        hem: hem!,
      },
    },
  };
}

/** One half of the cap seam on the paper, from the underarm point up to the crown. */
export function capHalf(figures: SleeveFigures, side: Side): Result<CubicBezier[]> {
  const seam = capSeam(halfKnots(figures, side));
  if ("fault" in seam) return { ok: false, problems: [markProblem(seam.fault, side)] };
  const wide = figures.biceps / 2;
  const place = ({ x, y }: Point): Point => ({
    x: side === "front" ? x - wide : wide - x,
    y: figures.capDepth - y,
  });
  return {
    ok: true,
    value: seam.chain.map(([a, b, c, d]): CubicBezier => [place(a), place(b), place(c), place(d)]),
  };
}

/** Underarm point, elbow where there is one, hem. */
function underarm(figures: SleeveFigures, side: Side): Point[] {
  const s = across(side);
  const { biceps, capDepth, elbow, hem, length } = figures;
  return [
    { x: (s * biceps) / 2, y: capDepth },
    ...(elbow ? [{ x: (s * elbow.width) / 2, y: elbow.depth }] : []),
    { x: (s * hem) / 2, y: length },
  ];
}

function chainOf(points: readonly Point[]): CubicBezier[] {
  return points.slice(1).map((point, i) => line(points[i]!, point));
}

function linePoints({
  length,
  capDepth,
  biceps,
  hem,
  elbow,
  beside,
}: SleeveFigures): Partial<Record<PointName, Point>> {
  return {
    crown: { x: 0, y: 0 },
    capCentre: { x: 0, y: capDepth },
    hemCentre: { x: 0, y: length },
    underarmFront: { x: -biceps / 2, y: capDepth },
    underarmBack: { x: biceps / 2, y: capDepth },
    hemFront: { x: -hem / 2, y: length },
    hemBack: { x: hem / 2, y: length },
    besideFront: { x: -beside, y: 0 },
    besideBack: { x: beside, y: 0 },
    ...(elbow && {
      elbowCentre: { x: 0, y: elbow.depth },
      elbowFront: { x: -elbow.width / 2, y: elbow.depth },
      elbowBack: { x: elbow.width / 2, y: elbow.depth },
    }),
  };
}

function markPoints(guide: GuideLine, name: Half): Partial<Record<PointName, Point>> {
  const points: Partial<Record<PointName, Point>> = {};
  for (const [i, foot] of guide.feet.entries()) {
    points[`foot${name}${i + 1}`] = foot;
    points[`mark${name}${i + 1}`] = guide.marks[i]!;
  }
  return points;
}

function guidesOf(
  figures: SleeveFigures,
  points: Partial<Record<PointName, Point>>,
  guideLines: Record<Side, GuideLine>,
): SleeveDraft["guides"] {
  const between = (name: LineName, from: PointName, to: PointName) => ({
    name,
    curves: [line(points[from]!, points[to]!)],
  });
  return [
    between("centre", "crown", "hemCentre"),
    between("crownLine", "besideFront", "besideBack"),
    between("capLine", "underarmFront", "underarmBack"),
    ...(figures.elbow ? [between("elbowLine", "elbowFront", "elbowBack")] : []),
    between("hemLine", "hemFront", "hemBack"),
    { name: "guideFront", curves: [line(guideLines.front.underarm, guideLines.front.top)] },
    { name: "guideBack", curves: [line(guideLines.back.underarm, guideLines.back.top)] },
    ...(["front", "back"] as const).flatMap((side) =>
      guideLines[side].feet.flatMap((foot, i) =>
        distance(foot, guideLines[side].marks[i]!) > 0
          ? [{ name: `guide${half(side)}` as const, curves: [line(foot, guideLines[side].marks[i]!)] }]
          : [],
      ),
    ),
  ];
}

function markProblem({ kind, index }: CapFault, side: Side): DraftProblem {
  const mark = Math.max(0, index - 1);
  const which = `the ${ordinal(mark)} ${side} mark, counted from the underarm`;
  const texts: Record<CapFault["kind"], [string, string]> = {
    "above-crown": [
      `stands level with the crown or above it`,
      `Raise it less, set it lower on the guide line, or make the cap deeper.`,
    ],
    "below-cap-line": [
      `falls on the cap line or below it`,
      `Hollow it less, set it higher on the guide line, or make the cap deeper.`,
    ],
    overhang: [
      `makes the cap seam lean outward past the upright`,
      `Raise it less, hollow the mark below it less, or set the two further apart.`,
    ],
    wiggle: [
      `puts a second hollow in the cap seam`,
      `Raise it more, or raise the marks on either side of it less.`,
    ],
    flat: [
      `leaves a flat with a corner beside it in the cap seam`,
      `Move it a little further out or in, or set it further from its neighbours.`,
    ],
  };
  const [wrong, remedy] = texts[kind];
  return {
    id: `mark-${kind}`,
    figure: side === "front" ? "frontMarks" : "backMarks",
    mark: { side, index: mark },
    phrase: say`${which[0]!.toUpperCase()}${which.slice(1)}, ${wrong}.`,
    remedy: say`${remedy}`,
  };
}
