import { say } from "@/lib/drafting/say";
import { mmPerInch as INCH } from "@/lib/lengths/units";
import { smallParts } from "./care";
import { line } from "./draw";
import { driftWords, evenMarks, gapsOf } from "./marks";
import { type DrawnPath, practice, type SewingSum, type SumCaution } from "./types";

/** A ring in path data, for a button. */
const ring = (x: number, y: number, r: number) =>
  `M${x - r} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0z`;

/** Buttons at equal distances between the first and the last. */
export const buttons: SewingSum = {
  id: "buttons",
  name: "Button spacing",
  about: "First and last given, the rest between",
  rule: say`Gap = first to last ÷ (buttons − 1). Each is measured from the edge by itself, so the last one lands.`,
  source: "arithmetic",
  mark: "exact",
  fields: [
    {
      key: "first",
      label: "Edge to the first button",
      kind: "length",
      usual: { in: INCH / 2, cm: 15 },
      hint: say`To its middle.`,
      least: 0,
      most: 3000,
    },
    {
      key: "last",
      label: "Edge to the last button",
      kind: "length",
      hint: say`From the same edge, to its middle.`,
      least: 5,
      most: 3000,
    },
    {
      key: "count",
      label: "How many buttons",
      kind: "count",
      hint: say`First and last among them.`,
      least: 2,
      most: 100,
    },
    {
      key: "diameter",
      label: "Button across",
      kind: "length",
      optional: true,
      hint: say`Tells the length of the buttonhole.`,
      least: 3,
      most: 100,
    },
    {
      key: "thick",
      label: "Button thickness",
      kind: "length",
      usual: { in: INCH / 8, cm: 3 },
      when: ({ diameter }) => diameter !== undefined,
      least: 0,
      most: 30,
    },
    {
      key: "who",
      label: "For someone",
      kind: "choice",
      optional: true,
      options: [
        { value: "small", label: "Under three" },
        { value: "older", label: "Older" },
      ],
    },
  ],
  example: { first: 20, last: 200, count: 5 },
  work(inputs, step) {
    const first = inputs.first as number;
    const last = inputs.last as number;
    const count = inputs.count as number;
    const diameter = inputs.diameter as number | undefined;
    const span = last - first;
    if (span <= 0)
      return {
        ok: false,
        problems: [
          {
            field: "last",
            say: say`The last button is not below the first. Type how far it is from the same edge: more than ${first}.`,
          },
        ],
      };
    const gap = span / (count - 1);
    const least = Math.max(diameter ?? 0, 2 * step, 3);
    if (gap < least) {
      const most = Math.floor(span / least) + 1;
      return {
        ok: false,
        problems: [
          most >= 2
            ? {
                field: "count",
                say: say`So many would stand ${gap} apart and touch. Type ${String(most)} or fewer.`,
              }
            : {
                field: "last",
                say: say`There is no room for two: first and last are ${span} apart. Type a longer way to the last one, ${first + least} or more.`,
              },
        ],
      };
    }
    const at = evenMarks(first, last, count, step);
    const drift = driftWords(at);
    const cautions: SumCaution[] = inputs.who === "older" ? [] : smallParts();
    const hole = diameter === undefined ? undefined : diameter + (inputs.thick as number);
    const r = Math.min(gap / 3, (diameter ?? span / 20) / 2);
    const paths: DrawnPath[] = [
      { d: line(0, -gap / 2, 0, gap / 2), line: "cut" },
      { d: line(0, 0, last + gap / 2, 0), line: "measure" },
      ...at.map((x): DrawnPath => ({ d: ring(x, 0, r), line: "cut" })),
    ];
    const gaps = gapsOf(at);
    return {
      ok: true,
      results: [
        gaps.length === 1
          ? { label: "Gap, middle to middle", mm: gaps[0]!.mm, main: true }
          : { label: "Gap, about", mm: gap, main: true },
        { label: "First to last", mm: at[count - 1]! - at[0]! },
        ...(hole === undefined ? [] : [{ label: "Buttonhole", mm: hole, up: true }]),
        {
          label: "Middle of each button",
          marks: at.map((mm, i) => ({ name: `Button ${i + 1}`, mm })),
          from: "the edge",
        },
      ],
      drawing: {
        box: { x: 0, y: -gap / 2, w: last + gap / 2, h: gap },
        paths,
        labels: [
          { x: first + gap / 2, y: -gap / 2.5, mm: gap },
          { x: last, y: gap / 2, mm: last },
        ],
        say: say`${String(count)} buttons from ${first} to ${last}.`,
      },
      steps: [
        say`Lay the tape along the edge once, and set all ${String(count)} marks without moving it.`,
        ...(drift.length > 0 ? [drift] : []),
        ...(hole === undefined
          ? []
          : [say`Buttonhole: across and thickness, ${hole}. Sew one on a scrap first.`]),
      ],
      cautions: [
        ...cautions,
        ...(count > 2 && diameter !== undefined && gap < 1.5 * diameter
          ? [{ say: say`The buttons stand close, less than half a button between them.`, ...practice }]
          : []),
      ],
    };
  },
};
