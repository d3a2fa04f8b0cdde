/** The second form of a pattern at full size: one drawing in millimetres, for whoever cuts or draws by machine. */
import { type Point } from "@/lib/drafting/types";
import { type FullSizeDocument } from "@/lib/pdf/full-size-document";
import { headOf } from "@/lib/pdf/full-size-head";
import { guessWidth, type PlacedWords, wordsOf } from "@/lib/pdf/full-size-labels";
import { boxOf, isClosed, type Mark, marksOf, moveMarks } from "@/lib/pdf/full-size-marks";
import { nest } from "@/lib/pdf/full-size-nest";
import { strokes } from "@/lib/pdf/full-size-strokes";
import { longDate } from "@/lib/pdf/long-date";

const MM_A_POINT = 25.4 / 72;
/** As wide as a table, where no piece is wider; mm. */
const WIDTH = 1000;
const GAP = 10;

/** A thousandth of a millimetre. */
const text = (value: number): string => String(Math.round(value * 1000) / 1000);
const pair = ({ x, y }: Point): string => `${text(x)} ${text(y)}`;

const escaped = (words: string): string =>
  words
    .replace(/[^\P{Cc}\n]/gu, " ")
    .replace(/[&<>"]/gu, (sign) => ({ "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" })[sign]!);

/** The file's text. Each piece is a group with a title; curves stay cubics. */
export function fullSizeSvg(doc: FullSizeDocument): string {
  const parts = doc.pieces.map((piece) => {
    const marks = marksOf(piece);
    return { piece, marks, box: boxOf(marks) };
  });
  const head = headOf(doc, { x: 0, y: 0 }, Infinity);
  const sizes = [head.box, ...parts.map(({ box }) => box)];
  const width = Math.max(WIDTH, ...sizes.map(({ w }) => w + 2 * GAP));
  const { places, w, h } = nest(sizes, width, GAP, GAP);
  const everywhere = { x: 0, y: 0, w, h };
  const groups = parts.map(({ piece, marks, box }, i) => {
    const place = places[i + 1]!;
    const by = { x: place.x - box.x, y: place.y - box.y };
    const there = moveMarks(marks, by);
    const words = wordsOf(piece, doc, there, by, { roomAt: () => everywhere, isPrinted: () => true });
    return [
      `<g id="piece-${escaped(piece.id.replace(/[^\w-]/gu, "-"))}">`,
      `<title>${escaped(`${piece.name}, ${piece.cutWords}`)}</title>`,
      ...there.map(path),
      ...words.map(said),
      "</g>",
    ].join("\n");
  });
  const { date, lang = "en-GB", title, wearer } = doc;
  const name = [title, wearer, longDate(date, lang)].filter((words) => words.trim() !== "").join(", ");
  const size = `width="${text(w)}mm" height="${text(h)}mm" viewBox="0 0 ${text(w)} ${text(h)}"`;
  return [
    `<?xml version="1.0" encoding="UTF-8"?>`,
    `<svg xmlns="http://www.w3.org/2000/svg" version="1.1" ${size} xml:lang="${escaped(lang)}">`,
    `<title>${escaped(name)}</title>`,
    `<desc>${escaped([doc.style, doc.allowances, ...doc.warnings].join(" "))}</desc>`,
    headGroup(doc, head, places[0]!),
    ...groups,
    "</svg>",
    "",
  ].join("\n");
}

function path({ weight, curves }: Mark): string {
  const { colour, dash, width } = strokes[weight];
  const d = `M${pair(curves[0]![0])}${curves.map(([, b, c, e]) => `C${pair(b)} ${pair(c)} ${pair(e)}`).join("")}`;
  const dashes = dash
    ? ` stroke-dasharray="${dash.map((length) => text(length * MM_A_POINT)).join(" ")}"`
    : "";
  return `<path class="${weight}" d="${d}${isClosed(curves) ? "Z" : ""}" fill="none" stroke="rgb(${colour.join(",")})" stroke-width="${text(width * MM_A_POINT)}" stroke-linejoin="round"${dashes}/>`;
}

const line = (words: string, x: number, y: number, size: number, bold: boolean, anchor: string): string =>
  `<text x="${text(x)}" y="${text(y)}" font-family="sans-serif" font-size="${text(size)}"${bold ? ' font-weight="700"' : ""} text-anchor="${anchor}">${escaped(words)}</text>`;

/** Lines in the middle of their box, small enough for its width. */
function said({ box, said: lines }: PlacedWords): string {
  const heights = lines.map(({ size }) => size * MM_A_POINT * 1.3);
  let y = box.y + (box.h - heights.reduce((sum, height) => sum + height, 0)) / 2;
  return lines
    .map(({ bold = false, size, words }, i) => {
      const fit = Math.min(size * MM_A_POINT, box.w / guessWidth(words));
      y += heights[i]!;
      return line(words, box.x + box.w / 2, y - heights[i]! * 0.25, fit, bold, "middle");
    })
    .join("\n");
}

/** Whose, what, when, and the squares to measure. */
function headGroup(doc: FullSizeDocument, { squares }: ReturnType<typeof headOf>, at: Point): string {
  const { allowances, date, lang = "en-GB", style, title, warnings, wearer } = doc;
  const lines = [
    { words: [title, wearer].filter((words) => words !== "").join(", "), size: 6, bold: true },
    { words: [style, longDate(date, lang)].join(", "), size: 4, bold: false },
    { words: allowances, size: 4, bold: true },
    ...warnings.map((words) => ({ words, size: 4, bold: true })),
  ].filter(({ words }) => words !== "");
  const up = squares[0]!.box;
  let y = at.y;
  return [
    `<g id="head">`,
    `<title>Measure the squares before you cut</title>`,
    ...lines.map(({ bold, size, words }) => {
      y += size * 1.4;
      return line(words, at.x, y - size * 0.4, size, bold, "start");
    }),
    ...squares.map(({ box, words }) => {
      const [x, top] = [at.x + box.x - up.x, at.y + box.y];
      const rect = `<rect class="square" x="${text(x)}" y="${text(top)}" width="${text(box.w)}" height="${text(box.h)}" fill="none" stroke="#000" stroke-width="0.2"/>`;
      return `${rect}\n${line(words, x + box.w / 2, top + box.h / 2, 5, true, "middle")}`;
    }),
    "</g>",
  ].join("\n");
}
