/** Blocks: what stands on paper, as plain values measured from their own top left corner, y down. */

export type Colour = readonly [red: number, green: number, blue: number];

export interface PathStep {
  /** Move, line, cubic curve, close: the letters of the PDF operators. */
  readonly op: "m" | "l" | "c" | "h";
  readonly c: readonly number[];
}

export type Item =
  | {
      readonly kind: "text" | "picture";
      readonly x: number;
      /** Of the baseline. */
      readonly y: number;
      readonly text: string;
      readonly size: number;
      readonly bold: boolean;
    }
  | {
      readonly kind: "path";
      readonly steps: readonly PathStep[];
      readonly fill?: Colour;
      readonly stroke?: {
        readonly width: number;
        readonly colour: Colour;
        readonly dash?: readonly number[];
        /** How far into the dashes the line starts, points. */
        readonly phase?: number;
      };
    };

export interface Block {
  readonly height: number;
  readonly items: readonly Item[];
}

/** A line of text; `baseline` is measured from its top. */
export interface Line extends Block {
  readonly baseline: number;
  readonly width: number;
}

export const BLACK: Colour = [0, 0, 0];

export const space = (height: number): Block => ({ height, items: [] });

function shift(item: Item, dx: number, dy: number): Item {
  if (item.kind !== "path") return { ...item, x: item.x + dx, y: item.y + dy };
  return {
    ...item,
    steps: item.steps.map(({ op, c }) => ({ op, c: c.map((value, i) => value + (i % 2 ? dy : dx)) })),
  };
}

export const shiftAll = (items: readonly Item[], dx: number, dy: number): Item[] =>
  items.map((item) => shift(item, dx, dy));

export const moved = (block: Block, dx: number, dy = 0): Block => ({
  height: block.height + dy,
  items: shiftAll(block.items, dx, dy),
});

/** One below the other. */
export function stack(blocks: readonly Block[]): Block {
  let height = 0;
  const items: Item[] = [];
  for (const block of blocks) {
    items.push(...shiftAll(block.items, 0, height));
    height += block.height;
  }
  return { height, items };
}

/** On top of one another, as high as the highest. */
export const overlay = (...blocks: readonly Block[]): Block => ({
  height: Math.max(0, ...blocks.map(({ height }) => height)),
  items: blocks.flatMap(({ items }) => items),
});

/**
 * Cells side by side, line by line on common baselines: one block for each line, so that a row too high for
 * its page can still be cut between lines. Each cell's lines are already where they belong across.
 */
export function row(cells: readonly (readonly Line[])[]): Block[] {
  const count = Math.max(...cells.map((lines) => lines.length));
  return Array.from({ length: count }, (_, i) => {
    const lines = cells.flatMap((cell) => cell[i] ?? []);
    const baseline = Math.max(...lines.map((line) => line.baseline));
    const below = Math.max(...lines.map((line) => line.height - line.baseline));
    return {
      height: baseline + below,
      items: lines.flatMap((line) => shiftAll(line.items, 0, baseline - line.baseline)),
    };
  });
}

/** A level rule, as a block of its own thickness. */
export const rule = (x: number, width: number, thickness: number): Block => ({
  height: thickness,
  items: [strokeLine(x, thickness / 2, x + width, thickness / 2, thickness)],
});

export const strokeLine = (x1: number, y1: number, x2: number, y2: number, width: number): Item => ({
  kind: "path",
  steps: [
    { op: "m", c: [x1, y1] },
    { op: "l", c: [x2, y2] },
  ],
  stroke: { width, colour: BLACK },
});

/** A closed shape through the corners, given as x, y, x, y. */
export const shape = (
  corners: readonly number[],
  paint: Pick<Extract<Item, { kind: "path" }>, "fill" | "stroke">,
): Item => {
  const steps: PathStep[] = [];
  for (let i = 0; i < corners.length; i += 2)
    steps.push({ op: i === 0 ? "m" : "l", c: [corners[i]!, corners[i + 1]!] });
  return { kind: "path", steps: [...steps, { op: "h", c: [] }], ...paint };
};
