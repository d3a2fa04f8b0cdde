/** The head of the first sheet, drawn: words, what the lines mean, test squares, the plan of the sheets. */
import { BLACK, type Colour, type Item, type PathStep, shape } from "@/lib/pdf/blocks";
import { type Rect } from "@/lib/pdf/bezier-clip";
import { fitted } from "@/lib/pdf/fit-words";
import { type FullSizeLayout } from "@/lib/pdf/full-size-layout";
import { moveChain, outlinesOf, type Weight } from "@/lib/pdf/full-size-marks";
import { meanings, strokes } from "@/lib/pdf/full-size-strokes";
import { type Frame } from "@/lib/pdf/full-size-sheet";
import { MM } from "@/lib/pdf/papers";
import { CARD } from "@/lib/pdf/signs";
import { type Typesetter } from "@/lib/pdf/typesetter";

const PLAIN_PAPER =
  "A place on the plan without a name, inside a piece, has nothing on it and is not printed: lay plain paper there.";
const LEFT_OUT: Colour = [0x99, 0x99, 0x99];

export function drawHead(layout: FullSizeLayout, frame: Frame, set: Typesetter): Item[] {
  const { text, said, legend, squares, plan } = layout.head;
  const used = new Set(layout.pieces.flatMap(({ marks }) => marks.map(({ weight }) => weight)));
  const words = layout.plain.length > 0 ? [...said, { words: PLAIN_PAPER, size: 10 }] : said;
  return [
    ...fitted(set, words, boxOn(text, frame), "left"),
    ...drawLegend(used, boxOn(legend, frame), set),
    ...squares.flatMap(({ box, words }): Item[] => {
      const at = boxOn(box, frame);
      const corners = [at.x, at.y, at.x + at.w, at.y, at.x + at.w, at.y + at.h, at.x, at.y + at.h];
      return [
        shape(corners, { stroke: { width: 0.5, colour: BLACK } }),
        ...fitted(
          set,
          [
            { words, size: 15, bold: true },
            { words: "a side, line to line", size: 9 },
          ],
          at,
          "centre",
        ),
      ];
    }),
    ...drawPlan(layout, boxOn(plan, frame), set),
  ];
}

const boxOn = ({ x, y, w, h }: Rect, frame: Frame): Rect => ({
  x: frame.x(x),
  y: frame.y(y),
  w: w * MM,
  h: h * MM,
});

/** A sample of each kind of line on these sheets, its word after it. */
function drawLegend(used: ReadonlySet<Weight>, { x, y, w, h }: Rect, set: Typesetter): Item[] {
  const [sample, gap, between] = [30, 4, 12];
  const shown = meanings.filter(([weight]) => used.has(weight));
  const widthAt = (size: number) =>
    shown.reduce((sum, [, word]) => sum + sample + gap + set.width(word, { size }) + between, -between);
  const size = [10, 9, 8, 7, 6].find((one) => widthAt(one) <= w) ?? 5;
  const middle = y + h / 2;
  let left = x;
  return shown.flatMap(([weight, word]): Item[] => {
    const ends =
      weight === "notch"
        ? [left + sample / 2, middle - 4, left + sample / 2, middle + 4]
        : [left, middle, left + sample, middle];
    const steps: PathStep[] = [
      { op: "m", c: ends.slice(0, 2) },
      { op: "l", c: ends.slice(2) },
    ];
    if (weight === "grain")
      for (const [at, way] of [
        [left, 1],
        [left + sample, -1],
      ] as const)
        for (const side of [-3, 3])
          steps.push({ op: "m", c: [at + way * 6, middle + side] }, { op: "l", c: [at, middle] });
    const text: Item = {
      kind: "text",
      x: left + sample + gap,
      y: middle + size * 0.34,
      text: word,
      size,
      bold: false,
    };
    left += sample + gap + set.width(word, { size }) + between;
    return [{ kind: "path", steps, stroke: strokes[weight] }, text];
  });
}

/** The sheets that are printed, by name, over the outlines of the pieces. */
function drawPlan({ field, pieces, plain, sheets }: FullSizeLayout, box: Rect, set: Typesetter): Item[] {
  const right = Math.max(field.w, ...sheets.map(({ rect }) => rect.x + rect.w));
  const bottom = Math.max(field.h, ...sheets.map(({ rect }) => rect.y + rect.h));
  const scale = Math.min(box.w / right, box.h / bottom);
  const at = (x: number, y: number) => [box.x + x * scale, box.y + y * scale] as const;
  const corners = ({ x, y, w, h }: Rect) => [
    ...at(x, y),
    ...at(x + w, y),
    ...at(x + w, y + h),
    ...at(x, y + h),
  ];
  const cells = sheets.map(({ cell }) =>
    shape(corners(cell), { fill: CARD, stroke: { width: 0.5, colour: BLACK } }),
  );
  const empty = plain.map((cell) =>
    shape(corners(cell), { stroke: { width: 0.5, colour: LEFT_OUT, dash: [1.5, 1.5] } }),
  );
  const outlines = pieces.flatMap(({ piece, by }) =>
    outlinesOf(piece).map((curves): Item => {
      const moved = moveChain(curves, by);
      const steps: PathStep[] = [{ op: "m", c: at(moved[0]![0].x, moved[0]![0].y) }];
      for (const [, b, c, d] of moved)
        steps.push({ op: "c", c: [...at(b.x, b.y), ...at(c.x, c.y), ...at(d.x, d.y)] });
      return { kind: "path", steps, stroke: { width: 0.8, colour: BLACK } };
    }),
  );
  return [...empty, ...cells, ...outlines, ...planNames(sheets, scale, at, set)];
}

/** Names as large as the cells allow; where they are too small for every name, every second, third ... row and column. */
function planNames(
  sheets: FullSizeLayout["sheets"],
  scale: number,
  at: (x: number, y: number) => readonly [number, number],
  set: Typesetter,
): Item[] {
  const smallest = Math.min(...sheets.map(({ cell }) => Math.min(cell.w, cell.h))) * scale;
  const longest = Math.max(...sheets.map(({ name }) => set.width(name, { size: 1, bold: true })));
  const size = Math.min(Math.max((smallest * 0.8) / longest, 4), 10);
  const every = Math.max(1, Math.ceil((longest * size) / (smallest * 0.9)));
  return sheets
    .filter(({ spot: [row, column] }) => row % every === 0 && column % every === 0)
    .map(({ cell, name }): Item => {
      const [x, y] = at(cell.x + cell.w / 2, cell.y + cell.h / 2);
      const width = set.width(name, { size, bold: true });
      return { kind: "text", x: x - width / 2, y: y + size * 0.35, text: name, size, bold: true };
    });
}
