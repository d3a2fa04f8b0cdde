/** The mark-out: the draft as a hand draws it, one distance a step, each from a point already on the paper. */
import {
  draftBasicSleeve,
  half,
  type LineName,
  type PointName,
  type SleeveDraft,
} from "@/lib/drafting/basic-sleeve";
import { guideLine } from "@/lib/drafting/guide";
import { crossings, distance, line } from "@/lib/drafting/measure";
import { ordinal, say } from "@/lib/drafting/say";
import {
  type CubicBezier,
  type Phrase,
  type Point,
  type Result,
  type Side,
  type SleeveFigures,
} from "@/lib/drafting/types";

/** How one point is set: along a drawn line towards a point, or square to a drawn line on one side of it. */
export type Move =
  | {
      readonly makes: PointName;
      readonly from: PointName;
      readonly how: "along";
      readonly line: LineName;
      readonly toward?: PointName;
    }
  | {
      readonly makes: PointName;
      readonly from: PointName;
      readonly how: "square";
      readonly line: LineName;
      /** Off the centre line: front or back. Off a guide line: raised is away from the sleeve, hollowed is into it. */
      readonly side: "front" | "back" | "raised" | "hollowed";
    };

export interface DrawnLine {
  readonly name: LineName;
  readonly curves: readonly CubicBezier[];
}

export interface MarkStep {
  /** From 1. */
  readonly n: number;
  readonly kind: "start" | "along" | "square" | "join" | "curve" | "notch" | "grain" | "check";
  /** mm; the one distance of the step. None where points are only joined. */
  readonly distance?: number;
  /** Two where front and back are set alike. */
  readonly moves: readonly Move[];
  readonly bothSides: boolean;
  /** Points a line or curve of this step runs through, in order. */
  readonly through: readonly (readonly PointName[])[];
  /** A curve's second measure: where it crosses the guide line, mm up from the underarm point. */
  readonly crossesAt?: number;
  readonly phrase: Phrase;
  /** What this step adds to the drawing. */
  readonly draws: readonly DrawnLine[];
}

type NewStep = Omit<MarkStep, "n" | "bothSides" | "through" | "moves" | "draws"> &
  Partial<Pick<MarkStep, "through" | "moves" | "draws">>;

const SIDES = ["front", "back"] as const;

/**
 * Ordered steps that draw the sleeve of `figures`, which should have been through `roundFigures`. Fails where
 * the sleeve itself cannot be drawn.
 */
export function markSteps(figures: SleeveFigures): Result<MarkStep[]> {
  const drawn = draftBasicSleeve(figures);
  if (!drawn.ok) return drawn;
  const draft = drawn.value;
  const steps = [
    ...frame(figures, draft),
    ...guides(figures, draft),
    ...marks(figures, draft),
    ...SIDES.flatMap((side) => capSteps(figures, draft, side)),
    ...finish(figures, draft),
  ];
  return {
    ok: true,
    value: steps.map((step, i) => ({
      moves: [],
      through: [],
      draws: [],
      ...step,
      n: i + 1,
      bothSides: (step.moves?.length ?? 0) > 1,
    })),
  };
}

function segment(draft: SleeveDraft, name: LineName, from: PointName, to: PointName): DrawnLine {
  return { name, curves: [line(draft.points[from]!, draft.points[to]!)] };
}

function squareAcross(from: PointName, to: "underarm" | "elbow" | "hem" | "beside"): Move[] {
  return SIDES.map((side) => ({
    makes: `${to}${half(side)}` as const,
    from,
    how: "square",
    line: "centre",
    side,
  }));
}

function downCentre(makes: PointName): Move[] {
  return [{ makes, from: "crown", how: "along", line: "centre", toward: "hemCentre" }];
}

function frame({ length, capDepth, biceps, elbow, hem }: SleeveFigures, draft: SleeveDraft): NewStep[] {
  const seam = (side: Side): PointName[] => [
    `underarm${half(side)}`,
    ...(elbow ? [`elbow${half(side)}` as const] : []),
    `hem${half(side)}`,
  ];
  const centre = segment(draft, "centre", "crown", "hemCentre");
  return [
    {
      kind: "start",
      distance: length,
      moves: [{ makes: "hemCentre", from: "crown", how: "along", line: "centre" }],
      phrase: say`Draw a line down the paper, ${length} long. Its top is the crown, its foot the hem.`,
      draws: [centre],
    },
    {
      kind: "along",
      distance: capDepth,
      moves: downCentre("capCentre"),
      phrase: say`From the crown, measure the cap depth down the centre line: ${capDepth}.`,
    },
    {
      kind: "square",
      distance: biceps / 2,
      moves: squareAcross("capCentre", "underarm"),
      phrase: say`There, square across ${biceps / 2} each way for the cap line. Its ends are the underarm points.`,
      draws: [segment(draft, "capLine", "underarmFront", "underarmBack")],
    },
    ...(elbow
      ? ([
          {
            kind: "along",
            distance: elbow.depth,
            moves: downCentre("elbowCentre"),
            phrase: say`From the crown, measure down the centre line to the elbow: ${elbow.depth}.`,
          },
          {
            kind: "square",
            distance: elbow.width / 2,
            moves: squareAcross("elbowCentre", "elbow"),
            phrase: say`There, square across ${elbow.width / 2} each way for the elbow line.`,
            draws: [segment(draft, "elbowLine", "elbowFront", "elbowBack")],
          },
        ] satisfies NewStep[])
      : []),
    {
      kind: "square",
      distance: hem / 2,
      moves: squareAcross("hemCentre", "hem"),
      phrase: say`At the foot, square across ${hem / 2} each way for the hem.`,
      draws: [segment(draft, "hemLine", "hemFront", "hemBack")],
    },
    {
      kind: "join",
      through: SIDES.map(seam),
      phrase: elbow
        ? say`Join each underarm point to the elbow line, and on to the hem: the underarm seams.`
        : say`Join each underarm point to the hem: the underarm seams.`,
      draws: SIDES.map((side) => ({
        name: `underarm${half(side)}`,
        curves: draft.piece.edges.find((edge) => edge.name === `underarm${half(side)}`)!.curves,
      })),
    },
  ];
}

/** The name of a guide line's top: with no room beside the crown it is the crown. */
function guideTop(figures: SleeveFigures, side: Side): PointName {
  return figures.beside === 0 ? "crown" : `beside${half(side)}`;
}

function guides(figures: SleeveFigures, draft: SleeveDraft): NewStep[] {
  const { beside } = figures;
  return [
    ...(beside === 0
      ? []
      : ([
          {
            kind: "square",
            distance: beside,
            moves: squareAcross("crown", "beside"),
            phrase: say`At the crown, square across ${beside} each way.`,
            draws: [segment(draft, "crownLine", "besideFront", "besideBack")],
          },
        ] satisfies NewStep[])),
    {
      kind: "join",
      through: SIDES.map((side): PointName[] => [`underarm${half(side)}`, guideTop(figures, side)]),
      phrase: say`Join each underarm point to ${beside === 0 ? "the crown" : "the mark beside the crown on its own side"}: the guide lines.`,
      draws: SIDES.map((side) =>
        segment(draft, `guide${half(side)}`, `underarm${half(side)}`, guideTop(figures, side)),
      ),
    },
  ];
}

/** Front and back go in one step wherever they are set alike. */
function marks(figures: SleeveFigures, draft: SleeveDraft): NewStep[] {
  const steps: NewStep[] = [];
  const most = Math.max(figures.front.length, figures.back.length);
  for (let i = 0; i < most; i++) {
    const sides = SIDES.filter((side) => figures[side][i] !== undefined);
    const along = new Map(
      sides.map((side) => [side, figures[side][i]!.share * guideLine(figures, side).length]),
    );
    for (const group of alike(sides, (side) => along.get(side)!)) {
      const up = along.get(group[0]!)!;
      steps.push({
        kind: "along",
        distance: up,
        moves: group.map((side) => ({
          makes: figures[side][i]!.out === 0 ? `mark${half(side)}${i + 1}` : `foot${half(side)}${i + 1}`,
          from: `underarm${half(side)}`,
          how: "along",
          line: `guide${half(side)}`,
          toward: guideTop(figures, side),
        })),
        phrase:
          group.length === 2
            ? say`From each underarm point, measure ${up} up the guide line for the ${ordinal(i)} mark.`
            : say`From the ${group[0]!} underarm point, measure ${up} up the guide line for the ${ordinal(i)} mark.`,
      });
    }
    const moved = sides.filter((side) => figures[side][i]!.out !== 0);
    for (const group of alike(moved, (side) => figures[side][i]!.out)) {
      const { out } = figures[group[0]!][i]!;
      const where = group.length === 2 ? "on both sides" : `on the ${group[0]!}`;
      steps.push({
        kind: "square",
        distance: Math.abs(out),
        moves: group.map((side) => ({
          makes: `mark${half(side)}${i + 1}`,
          from: `foot${half(side)}${i + 1}`,
          how: "square",
          line: `guide${half(side)}`,
          side: out > 0 ? "raised" : "hollowed",
        })),
        phrase:
          out > 0
            ? say`From the ${ordinal(i)} mark ${where}, raise ${out}: out from the sleeve, square to the guide line.`
            : say`From the ${ordinal(i)} mark ${where}, hollow ${-out}: into the sleeve, square to the guide line.`,
        draws: group.map((side) =>
          segment(draft, `guide${half(side)}`, `foot${half(side)}${i + 1}`, `mark${half(side)}${i + 1}`),
        ),
      });
    }
  }
  return steps;
}

/** One group where all values agree to a hair, else one each. */
function alike(sides: readonly Side[], value: (side: Side) => number): Side[][] {
  const [first, second] = sides;
  if (first && second && Math.abs(value(first) - value(second)) < 1e-6) return [[first, second]];
  return sides.map((side) => [side]);
}

function capSteps(figures: SleeveFigures, draft: SleeveDraft, side: Side): NewStep[] {
  const name = half(side);
  const edge = draft.piece.edges.find((e) => e.name === `cap${name}`)!;
  const guide = guideLine(figures, side);
  // Near its top the guide line runs so close under the seam that a crossing there says nothing to a hand.
  const top = (figures[side].at(-1)?.share ?? 1) * guide.length;
  const met = crossings(edge.curves, guide.underarm, guide.top)
    .map((point) => distance(guide.underarm, point))
    .filter((up) => up < top);
  const crossesAt = met.length === 1 ? met[0] : undefined;
  const length = side === "front" ? draft.lengths.capFront : draft.lengths.capBack;
  const through: PointName[] = [
    `underarm${name}`,
    ...figures[side].map((_, i): PointName => `mark${name}${i + 1}`),
    "crown",
  ];
  return [
    {
      kind: "curve",
      through: [through],
      ...(crossesAt !== undefined && { crossesAt }),
      phrase: [
        ...say`Draw the ${side} of the cap seam with the curve: level out of the underarm point, through the marks, level into the crown.`,
        ...(crossesAt === undefined
          ? []
          : say` It crosses the guide line ${crossesAt} up from the underarm point.`),
      ],
      draws: [{ name: `cap${name}`, curves: edge.curves }],
    },
    {
      kind: "check",
      distance: length,
      through: [through],
      phrase: say`Check with the tape on its edge: the ${side} of the cap measures ${length}.`,
    },
  ];
}

function finish(figures: SleeveFigures, draft: SleeveDraft): NewStep[] {
  const { lengths, points, piece } = draft;
  return [
    ...SIDES.map((side): NewStep => {
      const notch = figures.notches[side];
      const count = side === "front" ? "one notch" : "two notches close together";
      return {
        kind: "notch",
        distance: notch,
        moves: [
          {
            makes: `notch${half(side)}`,
            from: `underarm${half(side)}`,
            how: "along",
            line: `cap${half(side)}`,
            toward: "crown",
          },
        ],
        phrase: say`From the ${side} underarm point, measure ${notch} up the cap seam and mark ${count}.`,
        draws: [{ name: `cap${half(side)}`, curves: [tick(points, side)] }],
      };
    }),
    {
      kind: "grain",
      through: [["grainTop", "grainFoot"]],
      phrase: say`Mark the centre line as the grain line, with an arrow at each end.`,
      draws: [{ name: "grain", curves: [line(piece.grain.from, piece.grain.to)] }],
    },
    {
      kind: "check",
      distance: lengths.underarmFront,
      phrase: say`Check with the tape: each underarm seam measures ${lengths.underarmFront}.`,
    },
  ];
}

/** A short stroke into the sleeve where the notch goes, drawn towards the middle of the cap line. */
function tick(points: SleeveDraft["points"], side: Side): CubicBezier {
  const at = points[`notch${half(side)}`]!;
  const middle = points.capCentre!;
  const size = distance(at, middle);
  const into: Point = { x: at.x + ((middle.x - at.x) * 6) / size, y: at.y + ((middle.y - at.y) * 6) / size };
  return line(at, into);
}
