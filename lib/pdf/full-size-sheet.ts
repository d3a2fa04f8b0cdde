/** One sheet of a pattern at full size, as items on its page. Millimetres of the field become points of the page. */
import { BLACK, type Colour, type Item, type PathStep, strokeLine } from "@/lib/pdf/blocks";
import { clip, meets } from "@/lib/pdf/bezier-clip";
import { type ComposedPage } from "@/lib/pdf/compose";
import { type FullSizeDocument } from "@/lib/pdf/full-size-document";
import { drawHead } from "@/lib/pdf/full-size-head-items";
import { type PlacedWords } from "@/lib/pdf/full-size-labels";
import { type Cross, type FullSizeLayout, type Sheet } from "@/lib/pdf/full-size-layout";
import { isClosed, type Mark } from "@/lib/pdf/full-size-marks";
import { strokes } from "@/lib/pdf/full-size-strokes";
import { BAND } from "@/lib/pdf/full-size-tiles";
import { fitted } from "@/lib/pdf/fit-words";
import { longDate } from "@/lib/pdf/long-date";
import { MM } from "@/lib/pdf/papers";
import { fittingSize } from "@/lib/pdf/parts";
import { splitGraphemes } from "@/lib/pdf/text-runs";
import { type Typesetter } from "@/lib/pdf/typesetter";

/** From a place on the field to one on the page. */
export interface Frame {
  readonly x: (mm: number) => number;
  readonly y: (mm: number) => number;
}

const MARGIN = 10 * MM;
/** Half a cross, mm: it stays inside the overlap. */
const ARM = 3;
const SHARED: Colour = [0x77, 0x77, 0x77];

/** `of` is how many sheets the pattern has. */
export function sheetPage(
  layout: FullSizeLayout,
  doc: FullSizeDocument,
  sheet: Sheet,
  of: string,
  set: Typesetter,
): ComposedPage {
  const { rect, page } = sheet;
  const frame: Frame = {
    x: (mm) => MARGIN + (mm - rect.x) * MM,
    y: (mm) => MARGIN + (mm - rect.y) * MM,
  };
  const items: Item[] = [
    ...sharedLines(sheet, frame),
    ...(meets(layout.head.box, sheet.cell) ? drawHead(layout, frame, set) : []),
    ...layout.pieces.flatMap(({ marks, words }) => [
      ...marks.flatMap((mark) => drawMark(mark, sheet, frame)),
      ...words.flatMap((placed) => drawWords(placed, sheet, frame, set)),
    ]),
    ...sheet.crosses.flatMap((cross) => drawCross(cross, sheet, frame, set)),
    ...foot(doc, sheet, of, set, MARGIN + rect.h * MM, rect.w * MM),
  ];
  return { width: page.w * MM, height: page.h * MM, items };
}

/** What of a mark is on the sheet, cut at its edges; dashes go on over the joint where they were. */
function drawMark({ weight, curves }: Mark, { rect }: Sheet, { x, y }: Frame): Item[] {
  const stroke = strokes[weight];
  const runs = clip(curves, rect);
  const whole = runs.length === 1 && runs[0]!.curves.length === curves.length && isClosed(curves);
  return runs.map((run): Item => {
    const start = run.curves[0]![0];
    const steps: PathStep[] = [
      { op: "m", c: [x(start.x), y(start.y)] },
      ...run.curves.map(([, b, c, d]): PathStep => ({
        op: "c",
        c: [x(b.x), y(b.y), x(c.x), y(c.y), x(d.x), y(d.y)],
      })),
    ];
    if (whole && run.from === 0) steps.push({ op: "h", c: [] });
    const period = (stroke.dash ?? []).reduce((sum, length) => sum + length, 0);
    return {
      kind: "path",
      steps,
      stroke: { ...stroke, ...(period > 0 && { phase: (run.from * MM) % period }) },
    };
  });
}

/** A box lies on one sheet whole; where neighbours overlap, they show it too only if it lies on them whole. */
function drawWords({ box, said }: PlacedWords, { cell }: Sheet, { x, y }: Frame, set: Typesetter): Item[] {
  const middle = { x: box.x + box.w / 2, y: box.y + box.h / 2 };
  const here = { x: middle.x, y: middle.y, w: 0, h: 0 };
  if (!meets(here, cell)) return [];
  return fitted(set, said, { x: x(box.x), y: y(box.y), w: box.w * MM, h: box.h * MM }, "centre");
}

/** The lines that the sheets are cut along, on both sheets, through the crosses. */
function sharedLines({ cell, rect, joined }: Sheet, { x, y }: Frame): Item[] {
  const [left, right] = [x(cell.x), x(cell.x + cell.w)];
  const [top, bottom] = [y(cell.y), y(cell.y + cell.h)];
  const [x1, x2] = [x(rect.x), x(rect.x + rect.w)];
  const [y1, y2] = [y(rect.y), y(rect.y + rect.h)];
  const ends = {
    left: [left, y1, left, y2],
    right: [right, y1, right, y2],
    top: [x1, top, x2, top],
    bottom: [x1, bottom, x2, bottom],
  } as const;
  return joined.map((side) => {
    const [a, b, c, d] = ends[side];
    const steps: PathStep[] = [
      { op: "m", c: [a, b] },
      { op: "l", c: [c, d] },
    ];
    return { kind: "path", steps, stroke: { width: 0.35, colour: SHARED } };
  });
}

/** The number stands on the side of the cross that stays when the sheet is cut. */
function drawCross({ n, at }: Cross, { cell }: Sheet, { x, y }: Frame, set: Typesetter): Item[] {
  const steps: PathStep[] = [
    { op: "m", c: [x(at.x - ARM), y(at.y)] },
    { op: "l", c: [x(at.x + ARM), y(at.y)] },
    { op: "m", c: [x(at.x), y(at.y - ARM)] },
    { op: "l", c: [x(at.x), y(at.y + ARM)] },
  ];
  const size = 7.5;
  const words = String(n);
  const width = set.width(words, { size });
  const [above, below] = [y(at.y) - 2.5, y(at.y) + size * 0.72 + 2.5];
  const right = x(at.x) + 2.5;
  const isLeft = at.x > cell.x + cell.w - 1e-6;
  const baseline = at.y < cell.y + 1e-6 ? below : above;
  return [
    { kind: "path", steps, stroke: { width: 0.6, colour: BLACK } },
    {
      kind: "text",
      x: isLeft ? x(at.x) - 2.5 - width : right,
      y: baseline,
      text: words,
      size,
      bold: false,
    },
  ];
}

/** The sheet's name, whose it is, and which of how many. */
function foot(
  doc: FullSizeDocument,
  { name }: Sheet,
  of: string,
  set: Typesetter,
  top: number,
  width: number,
): Item[] {
  const baseline = top + BAND * MM * 0.8;
  const large = { size: 13, bold: true };
  const small = { size: 8.5 };
  const gap = 8;
  const nameWidth = set.width(name, large);
  const ofWidth = set.width(of, small);
  const room = width - nameWidth - ofWidth - 2 * gap;
  const whose = [doc.wearer, doc.title, longDate(doc.date, doc.lang ?? "en-GB")]
    .filter((words) => words.trim() !== "")
    .join(", ");
  const size = fittingSize(set, whose, false, [8.5, 7.5, 6.5], room);
  const at = (text: string, x: number, style: { size: number; bold?: boolean }): Item[] => {
    const [line] = set.lines(text, style, { x, width: width * 2 });
    return (line?.items ?? []).map((item) => (item.kind === "path" ? item : { ...item, y: baseline }));
  };
  return [
    strokeLine(MARGIN, top + 2, MARGIN + width, top + 2, 0.35),
    ...at(name, MARGIN, large),
    ...at(shortened(set, whose, size, room), MARGIN + nameWidth + gap, { size }),
    ...at(of, MARGIN + width - ofWidth, small),
  ];
}

/** The head of the first sheet has it in full. */
function shortened(set: Typesetter, text: string, size: number, width: number): string {
  if (set.width(text, { size }) <= width) return text;
  const letters = splitGraphemes(text);
  let count = letters.length - 1;
  const cut = () => `${letters.slice(0, count).join("").trimEnd()}…`;
  while (count > 0 && set.width(cut(), { size }) > width) count--;
  return cut();
}
