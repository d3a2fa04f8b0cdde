import { say } from "@/lib/drafting/say";
import { line, polygon } from "./draw";
import { downToStep, evenMarks, toStep } from "./marks";
import { type DrawnPath, geometry, practice, type SewingSum, type SumCaution, type SumMark } from "./types";

/** More pleats than this are told, not drawn. */
const DRAWN_AT_MOST = 24;

type Kind = "knife" | "box" | "inverted";

interface Pleating {
  kind: Kind;
  count: number;
  /** Outer fold to inner fold, mm. */
  depth: number;
  /** Where each pleat's middle, or a knife pleat's fold, lies on the finished length, mm. */
  middles: readonly number[];
  /** Width of a box pleat's face, mm. */
  face: number;
  end: number;
}

/** Marks on the flat cloth from its cut edge: where each fold is brought to, and where it is folded. */
function pleatMarks({ kind, depth, middles, face, end }: Pleating): SumMark[] {
  const takes = kind === "knife" ? 2 * depth : 4 * depth;
  return middles.flatMap((middle, i): SumMark[] => {
    const at = end + middle + i * takes;
    const n = i + 1;
    if (kind === "knife")
      return [
        { name: `${n}: fold comes to`, mm: at },
        { name: `${n}: fold`, mm: at + 2 * depth },
      ];
    if (kind === "box") {
      const left = at - face / 2;
      return [
        { name: `${n}: left fold comes to`, mm: left },
        { name: `${n}: left fold`, mm: left + 2 * depth },
        { name: `${n}: right fold`, mm: left + 2 * depth + face },
        { name: `${n}: right fold comes to`, mm: left + 4 * depth + face },
      ];
    }
    return [
      { name: `${n}: left fold`, mm: at },
      { name: `${n}: both meet over`, mm: at + 2 * depth },
      { name: `${n}: right fold`, mm: at + 4 * depth },
    ];
  });
}

/** Pleats over a length: how much cloth they take, and where the folds are marked. */
export const pleats: SewingSum = {
  id: "pleats",
  name: "Pleats over a length",
  about: "Knife, box or inverted: cloth and position marks",
  rule: say`A knife pleat takes up twice its depth, a box or inverted pleat four times. Cloth = length + what all take up.`,
  ...geometry,
  fields: [
    {
      key: "kind",
      label: "Pleats",
      kind: "choice",
      usual: "knife",
      options: [
        { value: "knife", label: "Knife" },
        { value: "box", label: "Box" },
        { value: "inverted", label: "Inverted" },
      ],
    },
    {
      key: "length",
      label: "Length when pleated",
      kind: "length",
      hint: say`What it is sewn to.`,
      least: 20,
      most: 20_000,
    },
    { key: "count", label: "How many pleats", kind: "count", least: 1, most: 400 },
    {
      key: "depth",
      label: "Depth of a fold",
      kind: "length",
      hint: say`How far the underlay reaches in, outer fold to inner fold.`,
      least: 2,
      most: 500,
    },
    {
      key: "end",
      label: "Allowance at each end",
      kind: "length",
      usual: { in: 12.7, cm: 15 },
      least: 0,
      most: 300,
    },
    {
      key: "width",
      label: "Cloth width",
      kind: "length",
      optional: true,
      hint: say`Says where joins are needed.`,
      least: 100,
      most: 5000,
    },
  ],
  example: { kind: "knife", length: 240, count: 4, depth: 25, end: 0 },
  work(inputs, step) {
    const kind = inputs.kind as Kind;
    const count = inputs.count as number;
    const width = inputs.width as number | undefined;
    const length = toStep(inputs.length as number, step);
    const end = toStep(inputs.end as number, step);
    const asked = inputs.depth as number;
    // Every fold takes up the same whole number of steps, so that the pleated length lands.
    const depth = Math.max(toStep(asked, step), step);
    const share = length / count;
    const least = Math.max(2 * step, 3);
    if (share < least)
      return {
        ok: false,
        problems: [
          {
            field: "count",
            say: say`So many pleats would show ${share} each, less than can be marked. Type ${String(Math.max(1, Math.floor(length / least)))} or fewer.`,
          },
        ],
      };
    if (kind !== "knife" && depth > share + 1e-9)
      return {
        ok: false,
        problems: [
          {
            field: "depth",
            say: say`Each pleat has ${share} of the length, and a fold deeper than that reaches under the next pleat. Type ${share} or less, or fewer pleats.`,
          },
        ],
      };
    const takes = kind === "knife" ? 2 * depth : 4 * depth;
    const middles = evenMarks(share / 2, length - share / 2, count, step);
    const nearest = Math.min(share, ...middles.slice(1).map((middle, i) => middle - middles[i]!));
    const face = kind === "box" ? 2 * downToStep(Math.min(2 * depth, nearest) / 2, step) : 0;
    const flat = length + count * takes;
    const across = flat + 2 * end;
    const marks = pleatMarks({ kind, count, depth, middles, face, end });
    const cautions: SumCaution[] = [];
    const overlap = kind === "knife" ? depth - share : 2 * depth - share;
    if (overlap > 1e-6)
      cautions.push({
        say: say`Behind, the folds lie over each other by ${overlap}: five layers at the seam and more. Press one sample first; thin cloth only.`,
        ...practice,
      });
    if (width !== undefined && across > width) {
      const pieces = Math.ceil((flat - 1e-9) / Math.max(width - 2 * end, 1));
      cautions.push({
        say: say`The cloth is ${width} wide: it takes ${String(pieces)} widths, joined. Put each join where an inner fold hides it, and measure on from the stitching of the join.`,
        ...practice,
      });
    }
    const steps = [
      ...(Math.abs(depth - asked) > 1e-6
        ? [say`The depth is taken as ${depth}, a mark of the tape, so that all pleats take up the same.`]
        : []),
      say`Cut ${across} across: ${length} pleated, ${String(count)} times ${takes} taken up, and ${end} at each end.`,
      kind === "knife"
        ? say`Fold at each fold mark, and bring it to the mark before it.`
        : kind === "box"
          ? say`Fold at the two fold marks of a pleat, and bring them outwards to the marks beside them: the face is ${face}.`
          : say`Fold at the two fold marks of a pleat, and bring both to the mark between them.`,
      say`Measure every mark from the same cut edge. Each is set to the tape by itself and the take-up is always ${takes}, so the pleated length comes to ${length} exactly.`,
    ];
    return {
      ok: true,
      results: [
        { label: "Cloth across, with both ends", mm: across, main: true },
        { label: "Each pleat takes up", mm: takes, main: true },
        { label: "Each pleat has of the length", mm: share },
        ...(kind === "box" ? [{ label: "Face of a pleat", mm: face }] : []),
        { label: "Underlay, each fold", mm: depth },
        { label: "Cloth to length", text: `${(flat / length).toFixed(2)} to 1` },
        { label: "Marks on the flat cloth", marks, from: "the left cut edge" },
      ],
      drawing: drawPleats(kind, Math.min(count, DRAWN_AT_MOST), share, depth, face),
      steps,
      cautions,
    };
  },
};

/** The pleats seen from the edge of the cloth, as they lie when folded; layers set apart to be seen. */
function drawPleats(kind: Kind, count: number, share: number, depth: number, face: number) {
  const gap = (share * count) / 40;
  const paths: DrawnPath[] = [];
  for (let i = 0; i < count; i++) {
    const from = i * share;
    const c = from + share / 2;
    const to = from + share;
    const [x, y, z] = [0, gap, 2 * gap];
    const route: (readonly [number, number])[] =
      kind === "knife"
        ? [
            [from, z],
            [c + depth, z],
            [c + depth, y],
            [c, y],
            [c, x],
            [to, x],
          ]
        : kind === "box"
          ? [
              [from, z],
              [c - face / 2 + depth, z],
              [c - face / 2 + depth, y],
              [c - face / 2, y],
              [c - face / 2, x],
              [c + face / 2, x],
              [c + face / 2, y],
              [c + face / 2 - depth, y],
              [c + face / 2 - depth, z],
              [to, z],
            ]
          : [
              [from, x],
              [c, x],
              [c, y],
              [c - depth, y],
              [c - depth, z],
              [c + depth, z],
              [c + depth, y],
              [c, y],
              [c, x],
              [to, x],
            ];
    // Open: the path goes back on itself instead of closing across the pleat.
    paths.push({ d: polygon([...route, ...[...route].reverse()]), line: "cut" });
    if (kind === "knife" && i < count - 1) paths.push({ d: line(to, x, to, z), line: "cut" });
  }
  return {
    paths,
    box: { x: 0, y: -3 * gap, w: share * count, h: 6 * gap },
    labels: [{ x: share / 2, y: -2.2 * gap, mm: share }],
    say: say`${String(count)} ${kind} ${count === 1 ? "pleat" : "pleats"} seen from the edge, ${share} each, folds ${depth} deep.`,
  };
}
