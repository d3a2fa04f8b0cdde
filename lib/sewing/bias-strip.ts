import { say } from "@/lib/drafting/say";
import { mmPerInch as INCH } from "@/lib/lengths/units";
import { line, rect } from "./draw";
import { upToStep } from "./marks";
import { type DrawnPath, geometry, type SewingSum } from "./types";

const DRAWN_AT_MOST = 30;
const ROOT2 = Math.SQRT2;

/** Float noise of a strip that goes in exactly. */
const noise = 1e-9;

/**
 * What a continuous strip `wide` across comes to out of a square with this side, mm. Both seams of the method run along
 * legs of the two halves, so they leave what a square with the side less two allowances leaves; it is cut in whole rounds.
 */
export function stripFromSquare(
  side: number,
  wide: number,
  allowance: number,
): { rounds: number; length: number } {
  const left = Math.max(0, side - 2 * allowance);
  const rounds = Math.floor(left / ROOT2 / wide + noise);
  return { rounds, length: rounds * left * ROOT2 };
}

/** The smallest square that gives so much, mm: the best of all numbers of rounds. */
export function squareForStrip(length: number, wide: number, allowance: number): number {
  const middle = Math.sqrt(length / (2 * wide));
  const tried = [Math.floor(middle), Math.ceil(middle)].filter((rounds) => rounds >= 1);
  const side = (rounds: number) => Math.max(rounds * wide * ROOT2, length / (rounds * ROOT2)) + 2 * allowance;
  return Math.min(...(tried.length > 0 ? tried : [1]).map(side));
}

/** One long bias strip out of a square of cloth. */
export const biasStrip: SewingSum = {
  id: "bias-strip",
  name: "Bias strip from a square",
  about: "One long strip for binding, or the square for it",
  rule: say`Strip = side × side ÷ strip width, less what the two seams and the last part of a round take.`,
  ...geometry,
  fields: [
    {
      key: "from",
      label: "Known is",
      kind: "choice",
      usual: "length",
      options: [
        { value: "length", label: "The strip wanted" },
        { value: "square", label: "The square" },
      ],
    },
    {
      key: "length",
      label: "Strip wanted",
      kind: "length",
      hint: say`With the joins of the binding itself, and a little over.`,
      when: ({ from }) => from !== "square",
      least: 50,
      most: 100_000,
    },
    {
      key: "side",
      label: "Side of the square",
      kind: "length",
      when: ({ from }) => from === "square",
      least: 50,
      most: 3000,
    },
    {
      key: "wide",
      label: "Width of the strip, cut",
      kind: "length",
      usual: { in: 1.5 * INCH, cm: 40 },
      hint: say`Four times the finished width for a binding folded twice.`,
      least: 5,
      most: 300,
    },
    {
      key: "allowance",
      label: "Allowance of the two seams",
      kind: "length",
      usual: { in: INCH / 4, cm: 6 },
      least: 0,
      most: 30,
    },
  ],
  example: { from: "square", side: 300, wide: 40, allowance: 6 },
  work(inputs, step) {
    const wide = inputs.wide as number;
    const allowance = inputs.allowance as number;
    const wanted = inputs.from === "square" ? undefined : (inputs.length as number);
    // A square is cut up to the next mark: then the strip is never too short.
    const side =
      wanted === undefined
        ? (inputs.side as number)
        : upToStep(squareForStrip(wanted, wide, allowance), step);
    const { rounds, length } = stripFromSquare(side, wide, allowance);
    if (rounds < 1)
      return {
        ok: false,
        problems: [
          {
            field: "side",
            say: say`No whole strip ${wide} wide goes into that square. Type a side of ${wide * ROOT2 + 2 * allowance} or more, or a narrower strip.`,
          },
        ],
      };
    const paths: DrawnPath[] = [
      { d: rect(0, 0, side, side), line: "cut" },
      { d: line(0, side, side, 0), line: "stitch" },
    ];
    const each = wide * ROOT2;
    const strips = Math.floor(side / each);
    if (2 * strips <= DRAWN_AT_MOST)
      for (let i = 1; i <= strips; i++) {
        const at = i * each;
        if (at < side) {
          paths.push({ d: line(0, side - at, side - at, 0), line: "fold" });
          paths.push({ d: line(at, side, side, at), line: "fold" });
        }
      }
    return {
      ok: true,
      results: [
        ...(wanted === undefined
          ? [{ label: "Strip in one piece", mm: length, main: true }]
          : [
              { label: "Square to cut, each side", mm: side, main: true },
              { label: "Strip that it gives", mm: length },
            ]),
        { label: "Rounds of the tube", count: rounds, main: true },
        { label: "By the bare rule, no seams", mm: (side * side) / wide },
        { label: "Lost to seams and the last round", mm: (side * side) / wide - length },
        { label: "Lines apart on the bias", mm: wide },
      ],
      drawing: {
        box: { x: 0, y: 0, w: side, h: side },
        paths,
        labels: [
          { x: side / 2, y: side, mm: side },
          { x: side / 2, y: side / 2, text: "cut, true bias" },
        ],
        say: say`A square with side ${side}, cut from corner to corner.`,
      },
      steps: [
        say`Cut the square ${side} each way on the straight grain, then from corner to corner.`,
        say`Join two straight edges, right sides together, with ${allowance}: the slanting edges now run along the outside.`,
        say`Draw lines ${wide} apart along the slanting edge: ${String(rounds)} whole ${rounds === 1 ? "strip" : "strips"}.`,
        say`Pin the other two straight edges into a tube, one line on by a strip's width, sew with ${allowance}, and cut along the line round and round.`,
      ],
      cautions: [],
    };
  },
};
