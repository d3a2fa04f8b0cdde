/** What the styles with a plain head share: the sleeve as it was drafted, down to a level, and how it is set in. */
import { cutAcross } from "@/lib/drafting/cut-across";
import { line } from "@/lib/drafting/measure";
import { edgeOf, endOf, startOf } from "@/lib/drafting/outline";
import { type StepScene, type StepStage, type StyleStep } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { LINE_WIDTH, walk, type WalkedSeam } from "@/lib/drafting/seams";
import { type StyleGround } from "@/lib/drafting/styles/context";
import { headPlaces } from "@/lib/drafting/styles/parts";
import { withHead } from "@/lib/drafting/styles/spread-piece";
import { type Phrase, type Piece } from "@/lib/drafting/types";

/** The block with its cap seam as one edge "head" and its hem as "foot"; notches "front", "crown" and "back" on the head. */
export function headed(ground: StyleGround): Piece {
  const { notchFront, crown, notchBack } = headPlaces(ground);
  return {
    ...withHead(ground.block.piece),
    notches: [
      { id: "front", edge: "head", at: notchFront, count: 1 },
      { id: "crown", edge: "head", at: crown, count: 1 },
      { id: "back", edge: "head", at: notchBack, count: 2 },
    ],
  };
}

/** The sleeve down to `level` below the crown, and the step that draws its end; none where that is the hem. */
export function downTo(
  ground: StyleGround,
  level: number,
): { readonly piece: Piece; readonly steps: readonly StyleStep[] } {
  const whole = headed(ground);
  if (level > ground.figures.length - 1e-6) return { piece: whole, steps: [] };
  const { upper } = cutAcross(whole, level);
  const foot = edgeOf(upper, "foot").curves;
  return {
    piece: upper,
    steps: [
      {
        stage: "draw",
        act: { act: "across" },
        distance: level,
        phrase: say`From the crown, measure ${level} down the centre line. There, square across to both underarm seams: the sleeve ends at this line.`,
        scene: {
          ...EMPTY,
          fresh: [{ weight: "cut", curves: [line(startOf(foot), endOf(foot))] }],
          measured: [{ from: { x: 0, y: 0 }, to: { x: 0, y: level } }],
        },
      },
    ],
  };
}

/** The walk of the head against the armhole, where that is known. */
export function headSeam({ ask: { armhole }, block }: StyleGround): WalkedSeam[] {
  if (!armhole) return [];
  return [
    walk({
      id: "head",
      sides: [
        { words: "the head", measured: block.lengths.cap },
        { words: "the armhole", measured: armhole.front + armhole.back },
      ],
      joining: { how: "eased" },
    }),
  ];
}

/** The last words of every style whose head goes in as it was drafted. */
export function setIn({ ask: { armhole }, block }: StyleGround): Phrase[] {
  const ease = armhole ? block.lengths.cap - armhole.front - armhole.back : 0;
  return [
    ease > LINE_WIDTH
      ? say`Sew one row of long stitches along the head from notch to notch, and ease in the ${ease} with it.`
      : say`Sew one row of long stitches along the head from notch to notch, to ease it by.`,
    say`Set the sleeve into the armhole: underarm to underarm, notches to notches, crown to the shoulder seam.`,
  ];
}

export const EMPTY: StepScene = { sheet: 0, fresh: [], measured: [], points: [] };

/** A step without a distance. */
export function work(stage: StepStage, phrase: Phrase, scene: Partial<StepScene> = {}): StyleStep {
  return { stage, act: { act: "work" }, phrase, scene: { ...EMPTY, ...scene } };
}

/** The outline of a piece on its sheet. */
export function outlined({ edges }: Pick<Piece, "edges">, sheet = 0): StepScene {
  return { ...EMPTY, sheet, fresh: [{ weight: "cut", curves: edges.flatMap(({ curves }) => [...curves]) }] };
}
