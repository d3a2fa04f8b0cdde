/** The signs of the house on paper: the notch and the tape. */
import {
  BLACK,
  type Block,
  type Colour,
  type Item,
  moved,
  type PathStep,
  shape,
  strokeLine,
} from "@/lib/pdf/blocks";
import { MM } from "@/lib/pdf/papers";

export type TapeUnit = "inch" | "cm";

/** Manila card: light enough to cost no toner worth naming, and to keep black text at more than 15 : 1. */
export const CARD: Colour = [0xfb, 0xf1, 0xd6];
export const CHALK: Colour = [0x1b, 0x44, 0x88];

const NOTCH_WIDTH = 9;
const NOTCH_DEPTH = 7;

/** A notch cut down from (x, y), its middle at x. */
export const notch = (x: number, y: number, size = 1): Item =>
  shape([x - (NOTCH_WIDTH / 2) * size, y, x + (NOTCH_WIDTH / 2) * size, y, x, y + NOTCH_DEPTH * size], {
    fill: BLACK,
  });

/** A level tape: ticks of true length apart, standing on a heavy rule. */
export function tape(width: number, unit: TapeUnit): Block {
  const { step, lengths } =
    unit === "inch"
      ? { step: 9, lengths: [8, 2.6, 3.8, 2.6, 5.4, 2.6, 3.8, 2.6] } // eighths
      : { step: MM, lengths: [8, 2.6, 2.6, 2.6, 2.6, 5.4, 2.6, 2.6, 2.6, 2.6] };
  const foot = 8;
  const thickness = 1.4;
  const ticks: PathStep[] = [];
  for (let i = 0; i * step <= width; i++) {
    const x = Math.min(Math.max(i * step, 0.25), width - 0.25);
    ticks.push({ op: "m", c: [x, foot - lengths[i % lengths.length]!] }, { op: "l", c: [x, foot] });
  }
  return {
    height: foot + thickness,
    items: [
      { kind: "path", steps: ticks, stroke: { width: 0.5, colour: BLACK } },
      strokeLine(0, foot + thickness / 2, width, foot + thickness / 2, thickness),
    ],
  };
}

/** A card around a block, as wide as `width`, a notch cut into its upper edge. */
export function card(block: Block, width: number, padding: number, fill?: Colour): Block {
  const height = block.height + 2 * padding;
  const half = NOTCH_WIDTH * 0.7;
  const notchAt = padding + half;
  const line = 1.2;
  const inset = line / 2;
  const outline = shape(
    [
      ...[inset, inset],
      ...[notchAt - half, inset],
      ...[notchAt, inset + NOTCH_DEPTH * 1.3],
      ...[notchAt + half, inset],
      ...[width - inset, inset],
      ...[width - inset, height - inset],
      ...[inset, height - inset],
    ],
    { fill, stroke: { width: line, colour: BLACK } },
  );
  return { height, items: [outline, ...moved(block, padding, padding).items] };
}
