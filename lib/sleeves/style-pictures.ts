/** The pictures of a style's steps, which follow those of its block: one paper after the other. */
import { type PatternPiece, type StyleStep } from "@/lib/drafting";
import { edgeOf } from "@/lib/drafting/outline";
import { moveBy, moveCurves } from "@/lib/drafting/rigid";
import { boxOf, boxOfCurves, unionOf } from "@/lib/sleeves/drawing-paths";
import { type Box } from "@/lib/sleeves/drawing-view";
import { layPieces } from "@/lib/sleeves/lay-pieces";
import { type GoodSleeve } from "@/lib/sleeves/make-style-from-record";
import { type DrawnLine, type DrawnPoint, type StepPicture } from "@/lib/sleeves/mark-out";

/** Width to height of the frame that pieces at the machine are laid out for. */
const frame = 1.6;

/** @param block the pictures of the block's steps: its drawing is the first of the papers. */
export function stylePictures(rounded: GoodSleeve, block: readonly StepPicture[]): StepPicture[] {
  const last = block.at(-1)!;
  const boxes = sheetBoxes(rounded.steps);
  boxes.set(0, onBlock(rounded, boxes.get(0)));
  let sheet = 0;
  let lines: DrawnLine[] = [...last.before, ...last.fresh];
  // The marks that the cap was drawn through are done with.
  let points: DrawnPoint[] = [];
  return rounded.steps.map((step, i) => {
    const { distance, phrase, scene, stage } = step;
    if (scene.sheet !== sheet) {
      sheet = scene.sheet;
      lines = [];
      points = [];
    }
    const head = { n: block.length + i + 1, stage, phrase, ...(distance !== undefined && { distance }) };
    const box = boxes.get(sheet);
    if (!box) return { step: head, ...sewnPicture(rounded, step) };
    const now = scene.points.map((point) => ({ ...point, fresh: true }));
    const fresh = scene.fresh.map(({ curves, weight }) => ({ weight, curves }));
    // Panels that lie there already are not new when they are drawn again.
    const known = new Set(lines.map(({ curves }) => JSON.stringify(curves)));
    const picture: StepPicture = {
      step: head,
      before: [...lines],
      fresh: fresh.filter(({ curves }) => !known.has(JSON.stringify(curves))),
      measured: scene.measured.map(({ from, to }) => ({ from, to })),
      points: [...points, ...now],
      box,
    };
    lines = [...lines, ...picture.fresh];
    points = [...points, ...now.map((point) => ({ ...point, fresh: false }))];
    return picture;
  });
}

/** Everything that ever comes on to each sheet, so that its drawing stands still from step to step; none for a bare one. */
function sheetBoxes(steps: readonly StyleStep[]): Map<number, Box> {
  const boxes = new Map<number, Box>();
  for (const { scene } of steps) {
    const spots = [...scene.measured.flatMap(({ from, to }) => [from, to]), ...scene.points];
    const all = [
      ...scene.fresh.filter(({ curves }) => curves.length > 0).map(({ curves }) => boxOfCurves(curves)),
      ...spots.map(({ x, y }) => ({ x, y, w: 0, h: 0 })),
    ];
    const before = boxes.get(scene.sheet);
    if (all.length > 0) boxes.set(scene.sheet, unionOf(before ? [before, ...all] : all));
  }
  return boxes;
}

/** What of the block's drawing the style touches: from the crown down as far as its steps go. */
function onBlock({ draft, figures }: GoodSleeve, touched: Box | undefined): Box {
  const whole = boxOf(draft);
  if (!touched) return whole;
  const lowest = Math.max(figures.capDepth, touched.y + touched.h);
  return unionOf([{ ...whole, h: Math.min(whole.h, lowest - whole.y) }, touched]);
}

/** Nothing is drawn at the machine: the pieces lie there, and the edge that is gathered is picked out. */
function sewnPicture({ gathers, pieces }: GoodSleeve, { phrase }: StyleStep): Omit<StepPicture, "step"> {
  const { box, laid } = layPieces(pieces, frame);
  const text = phrase.filter((part) => typeof part === "string").join("");
  const named = gathers.filter(({ words }) => text.includes(words));
  const outline = (piece: PatternPiece) => piece.edges.flatMap(({ curves }) => [...curves]);
  return {
    before: laid.map(({ by, piece }) => ({
      weight: "cut",
      curves: moveCurves(outline(piece), moveBy(by.x, by.y)),
    })),
    fresh: laid.flatMap(({ by, piece }) =>
      named
        .filter((gather) => gather.piece === piece.id)
        .map((gather) => ({
          weight: "cut" as const,
          curves: moveCurves(edgeOf(piece, gather.edge).curves, moveBy(by.x, by.y)),
        })),
    ),
    measured: [],
    points: [],
    box,
  };
}
