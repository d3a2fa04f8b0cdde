/** What stands at the head of the first sheet, and where: words, the two test squares, the plan of the sheets. Millimetres. */
import { type CubicBezier, type Point } from "@/lib/drafting/types";
import { type Rect } from "@/lib/pdf/bezier-clip";
import { setFractions } from "@/lib/pdf/fractions";
import { type FullSizeDocument } from "@/lib/pdf/full-size-document";
import { guessWidth, type Said } from "@/lib/pdf/full-size-labels";
import { rectangle } from "@/lib/pdf/full-size-marks";
import { longDate } from "@/lib/pdf/long-date";

export interface TestSquare {
  readonly box: Rect;
  readonly words: string;
}

export interface Head {
  readonly box: Rect;
  readonly text: Rect;
  readonly said: readonly Said[];
  /** How each kind of line is read. */
  readonly legend: Rect;
  readonly squares: readonly TestSquare[];
  readonly plan: Rect;
  /** The outline of all of it. */
  readonly ink: readonly CubicBezier[];
}

/** Fits an A4 sheet, and the narrowest roll. */
const WIDTH = 174;
const GAP = 4;
const LEGEND = 6;
/** 1 in = 25.4 mm exactly (international yard, 1959). */
const SQUARES = [
  { side: 50, words: "50 mm" },
  { side: 2 * 25.4, words: "2 in" },
];
const TALLEST = Math.max(...SQUARES.map(({ side }) => side));
const MM_A_POINT = 25.4 / 72;
/** Of the letters' size. */
const LINE = 1.32;

export function headOf(doc: FullSizeDocument, { x, y }: Point, tallest: number): Head {
  const said = saidOf(doc);
  const rest = GAP + LEGEND + GAP + TALLEST;
  const textHeight = Math.min(roomFor(said, WIDTH), tallest - rest);
  const text = { x, y, w: WIDTH, h: textHeight };
  const legend = { x, y: y + textHeight + GAP, w: WIDTH, h: LEGEND };
  const foot = legend.y + LEGEND + GAP;
  let left = x;
  const squares = SQUARES.map(({ side, words }): TestSquare => {
    const box = { x: left, y: foot, w: side, h: side };
    left += side + 1.5 * GAP;
    return { box, words };
  });
  const plan = { x: left, y: foot, w: x + WIDTH - left, h: TALLEST };
  const box = { x, y, w: WIDTH, h: textHeight + rest };
  return { box, text, said, legend, squares, plan, ink: rectangle(box) };
}

function saidOf({ allowances, date, lang, style, title, warnings, wearer }: FullSizeDocument): Said[] {
  return [
    { words: title, size: 18, bold: true },
    { words: wearer, size: 13, bold: true },
    { words: [style, longDate(date, lang ?? "en-GB")].filter((words) => words !== "").join(", "), size: 11 },
    { words: setFractions(allowances), size: 11, bold: true },
    ...warnings.map((words) => ({ words: setFractions(words), size: 11, bold: true, notched: true })),
    {
      words:
        "Print at 100 %, not “fit to page”, then measure both squares. If a side is not right, change the size in the printer’s own settings before you cut.",
      size: 10,
    },
    {
      words:
        "Cut each sheet along the thin line on its left and upper side. Lay it on the sheet before it, each cross on the cross with its number, and tape it down.",
      size: 10,
    },
  ].filter(({ words }) => words.trim() !== "");
}

/** Room enough for the words whatever the font: the letters are guessed wide. */
function roomFor(said: readonly Said[], width: number): number {
  return said.reduce((sum, { words, size }) => {
    const lines = Math.ceil((guessWidth(words) * size * MM_A_POINT * 1.05) / width);
    return sum + lines * size * LINE * MM_A_POINT + 1;
  }, 0);
}
