import { say } from "@/lib/drafting/say";
import { mmPerInch as INCH } from "@/lib/lengths/units";
import { line, rect } from "./draw";
import { evenMarks, toStep } from "./marks";
import { type DrawnPath, recalled, type SewingSum, type SumCaution } from "./types";

/** More strips than this are told, not drawn. */
const DRAWN_AT_MOST = 6;

/** Ruffle and gathers: the strips to cut, joined end to end and pulled up to a seam. */
export const ruffle: SewingSum = {
  id: "ruffle",
  name: "Ruffle and gathers",
  about: "Strips to cut and join, pulled up to a seam",
  rule: say`Strip = seam × fullness. Each strip loses one join allowance at both its ends; ${15 * INCH} at 2½ is ${37.5 * INCH}.`,
  source: "arithmetic",
  mark: "exact",
  fields: [
    {
      key: "seam",
      label: "Seam it is sewn to",
      kind: "length",
      hint: say`The finished length, once gathered.`,
      least: 10,
      most: 30_000,
    },
    {
      key: "ratio",
      label: "Fullness",
      kind: "ratio",
      usual: 2,
      hint: say`How many times the seam. Heavy cloth 1½, medium 2, sheer 3.`,
      least: 1,
      most: 8,
    },
    {
      key: "width",
      label: "Cloth width",
      kind: "length",
      usual: { in: 1143, cm: 1150 },
      hint: say`What can be cut across, without the selvedges.`,
      least: 50,
      most: 5000,
    },
    {
      key: "join",
      label: "Allowance at each join",
      kind: "length",
      usual: { in: 6.35, cm: 10 },
      hint: say`On each of the two ends that meet; on open ends too.`,
      least: 0,
      most: 100,
    },
    {
      key: "ends",
      label: "The strip is",
      kind: "choice",
      usual: "open",
      options: [
        { value: "open", label: "Open at both ends" },
        { value: "round", label: "Joined in a round" },
      ],
    },
    {
      key: "depth",
      label: "Depth of one strip, cut",
      kind: "length",
      optional: true,
      hint: say`With hem and seam allowance. Tells how much cloth it takes.`,
      least: 5,
      most: 2000,
    },
  ],
  example: { seam: 700, ratio: 2, width: 600, join: 12, ends: "open", depth: 110 },
  work(inputs, step) {
    const seam = inputs.seam as number;
    const ratio = inputs.ratio as number;
    const width = inputs.width as number;
    const join = inputs.join as number;
    const depth = inputs.depth as number | undefined;
    const round = inputs.ends === "round";
    const sewn = width - 2 * join;
    if (sewn <= join)
      return {
        ok: false,
        problems: [
          {
            field: "width",
            say: say`Cloth ${width} wide has next to nothing left between two allowances of ${join}. Type a wider cloth, or a smaller allowance.`,
          },
        ],
      };
    const full = seam * ratio;
    // What is over by float noise is no strip of its own.
    const strips = Math.max(1, Math.ceil(full / sewn - 1e-9));
    const joins = round ? strips : strips - 1;
    const last = full - (strips - 1) * sewn + 2 * join;
    const alike = full / strips + 2 * join;
    const cautions: SumCaution[] = [];
    if (ratio > 3)
      cautions.push({
        say: say`More than three times is hard to pull up and stands out stiffly, save in the thinnest cloth. Try it on a hand's breadth first.`,
        ...recalled,
      });
    if (ratio < 1.5)
      cautions.push({
        say: say`Less than one and a half times hardly shows as gathers; it looks like ease.`,
        ...recalled,
      });

    const quarters = (length: number) =>
      evenMarks(0, toStep(length, step), 5, step)
        .slice(1, 4)
        .map((mm, i) => ({ name: ["first quarter", "half", "third quarter"][i]!, mm }));
    const drawn = Math.min(strips, DRAWN_AT_MOST);
    const high = depth ?? Math.min(100, width / 8);
    const paths: DrawnPath[] = [{ d: rect(0, 0, width, drawn * high), line: "measure" }];
    for (let i = 0; i < drawn; i++) {
      const long = i === strips - 1 ? last : width;
      paths.push({ d: rect(0, i * high, long, high), line: "cut" });
      if (join > 0)
        paths.push({
          d:
            line(join, i * high, join, (i + 1) * high) +
            line(long - join, i * high, long - join, (i + 1) * high),
          line: "stitch",
        });
    }
    return {
      ok: true,
      results: [
        { label: "Strip, joined, before gathering", mm: full, main: true },
        { label: "Strips to cut", count: strips, main: true },
        { label: "Joins", count: joins },
        ...(strips > 1 ? [{ label: `Strips of the whole width: ${strips - 1}, each`, mm: width }] : []),
        { label: strips > 1 ? "Last strip, cut" : "Cut it", mm: last, up: true, main: true },
        { label: "Left of its width", mm: width - last },
        ...(strips > 1 ? [{ label: `Or all ${strips} alike, each cut`, mm: alike, up: true }] : []),
        ...(depth === undefined ? [] : [{ label: "Cloth it takes", mm: strips * depth, up: true }]),
        { label: "Quarters of the seam", marks: quarters(seam), from: "one end" },
        {
          label: "Quarters of the strip",
          marks: quarters(full),
          from: "one end, joined and without the allowance",
        },
      ],
      drawing: {
        box: { x: 0, y: 0, w: width, h: drawn * high },
        paths,
        labels: [
          { x: width / 2, y: high / 2, mm: strips > 1 ? width : last },
          ...(strips > 1 && drawn === strips
            ? [{ x: Math.max(last / 2, width * 0.08), y: (drawn - 0.5) * high, mm: last }]
            : []),
          ...(drawn < strips
            ? [{ x: width / 2, y: (drawn - 0.5) * high, text: `and ${strips - drawn} more` }]
            : []),
        ],
        say: say`${String(strips)} ${strips === 1 ? "strip" : "strips"} across cloth ${width} wide, the last ${last} long.`,
      },
      steps: [
        strips === 1
          ? say`Cut one strip ${last} long.`
          : say`Cut ${String(strips - 1)} ${strips === 2 ? "strip" : "strips"} of the whole width and one of ${last}. Cut up to the next mark, never down: gathers take up a little more, never a little less.`,
        ...(joins > 0
          ? [
              say`Join ${round ? "them in a round" : "them end to end"}: ${String(joins)} ${joins === 1 ? "join" : "joins"}, ${join} on each end.`,
            ]
          : []),
        say`Mark the quarters on strip and seam, pull up to ${seam}, and match them.`,
      ],
      cautions,
    };
  },
};
