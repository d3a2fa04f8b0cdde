import { say } from "@/lib/drafting/say";
import { arc, rect, spoke } from "./draw";
import { partField, partWords, sectorBox, turnOf } from "./parts";
import { type DrawnPath, geometry, practice, type SewingSum, type SumCaution } from "./types";

interface Layout {
  /** Cloth along the selvedge, mm. */
  length: number;
  how: string;
}

/**
 * How the skirt lies on cloth of this width, `radius` being the outer one as cut: on the cloth folded lengthways where two
 * radii go into the width, else side by side along it. Null where not even one radius goes in.
 */
export function skirtLayout(part: string, radius: number, width: number): Layout | null {
  const two = 2 * radius <= width + 1e-9;
  if (!two && radius > width + 1e-9) return null;
  switch (part) {
    case "whole":
      return two
        ? { length: 2 * radius, how: "Fold the cloth lengthways, then across: cut once through four layers." }
        : {
            length: 4 * radius,
            how: "Two half circles, one after the other, the straight edges along the selvedge.",
          };
    case "three-quarter":
      return two
        ? {
            length: 2 * radius,
            how: "Fold lengthways and across like a whole circle, and leave one quarter uncut.",
          }
        : { length: 3 * radius, how: "A half circle along the selvedge, then a quarter after it." };
    case "half":
      return two
        ? {
            length: radius,
            how: "Fold the cloth lengthways: a quarter circle through two layers, from the fold.",
          }
        : {
            length: 2 * radius,
            how: "Fold the cloth across: a quarter circle through two layers, from the fold.",
          };
    default:
      return { length: radius, how: "One layer, from the corner of cloth and selvedge." };
  }
}

/** Circle and part-circle skirts: the radius at the waist, and the cloth. */
export const circleSkirt: SewingSum = {
  id: "circle-skirt",
  name: "Circle skirt",
  about: "Whole, half or quarter circle: radii and cloth",
  rule: say`Waist radius = waist with its ease ÷ angle. Hem radius = waist radius + length.`,
  ...geometry,
  fields: [
    partField("The skirt is"),
    { key: "waist", label: "Waist", kind: "length", least: 100, most: 2500 },
    {
      key: "ease",
      label: "Ease at the waist",
      kind: "length",
      usual: { in: 0, cm: 0 },
      hint: say`More where the top is eased or gathered on.`,
      least: 0,
      most: 2500,
    },
    { key: "length", label: "Length, waist seam to hem", kind: "length", least: 20, most: 1800 },
    {
      key: "hem",
      label: "Hem",
      kind: "length",
      usual: { in: 12.7, cm: 10 },
      hint: say`Narrow: a round hem does not turn up deep.`,
      least: 0,
      most: 150,
    },
    {
      key: "allowance",
      label: "Seam allowance at the waist",
      kind: "length",
      usual: { in: 12.7, cm: 10 },
      least: 0,
      most: 50,
    },
    {
      key: "width",
      label: "Cloth width",
      kind: "length",
      usual: { in: 1143, cm: 1150 },
      least: 200,
      most: 5000,
    },
  ],
  example: { part: "half", waist: 600, ease: 0, length: 450, hem: 12, allowance: 12, width: 1150 },
  work(inputs) {
    const part = inputs.part as string;
    const length = inputs.length as number;
    const hem = inputs.hem as number;
    const allowance = inputs.allowance as number;
    const width = inputs.width as number;
    const around = (inputs.waist as number) + (inputs.ease as number);
    const turn = turnOf(part);
    const r = around / turn;
    const inside = r - allowance;
    if (inside < 2)
      return {
        ok: false,
        problems: [
          {
            field: "waist",
            say: say`With this waist the radius is ${r}, and the allowance of ${allowance} takes all of it. Type a smaller allowance, or a larger waist.`,
          },
        ],
      };
    const outer = r + length;
    const outside = outer + hem;
    const layout = skirtLayout(part, outside, width);
    const cautions: SumCaution[] = [];
    if (!layout)
      cautions.push({
        say: say`Too narrow a cloth: from corner to edge it takes ${outside}, and the width is ${width}. The longest that goes in is ${Math.max(0, width - r - hem)}; or cut more panels with a seam between, or join a piece at the edge.`,
        ...geometry,
      });
    cautions.push({
      say: say`The waist is cut on the curve and stretches: stay-stitch it before anything else. Let the skirt hang a day before the hem is levelled.`,
      ...practice,
    });
    const start = part === "quarter" || part === "half" ? Math.PI / 2 - turn / 2 : -Math.PI / 2;
    const side = part === "quarter" || part === "half";
    const paths: DrawnPath[] = [
      { d: arc(inside, start, turn), line: "cut" },
      { d: arc(outside, start, turn), line: "cut" },
      { d: arc(r, start, turn), line: "stitch" },
      ...(hem > 0 ? [{ d: arc(outer, start, turn), line: "stitch" } as const] : []),
      ...(part === "whole"
        ? [{ d: rect(-outside, -outside, 2 * outside, 2 * outside), line: "fold" } as const]
        : [start, start + turn].map((a): DrawnPath => ({ d: spoke(inside, outside, a), line: "cut" }))),
      { d: spoke(0, r, side ? Math.PI / 2 : 0.7), line: "measure" },
      { d: spoke(r, outer, side ? Math.PI / 2 : 0.7), line: "measure" },
    ];
    const mid = side ? Math.PI / 2 : 0.7;
    const at = (radius: number) => ({ x: radius * Math.cos(mid), y: radius * Math.sin(mid) });
    return {
      ok: true,
      results: [
        { label: "Radius at the waist", mm: r, main: true },
        { label: "Radius at the hem", mm: outer, main: true },
        ...(layout ? [{ label: "Cloth to buy", mm: layout.length, up: true, main: true }] : []),
        { label: "Cut the waist at", mm: inside },
        { label: "Cut the hem at", mm: outside },
        { label: "Round the hem", mm: outer * turn },
        ...(layout ? [{ label: "On the cloth", text: layout.how }] : []),
      ],
      drawing: {
        box: sectorBox(part, outside),
        paths,
        labels: [
          { ...at(r / 2), mm: r },
          { ...at(r + length / 2), mm: length },
        ],
        say: say`A ${partWords(part)}, radius ${r} at the waist and ${outer} at the hem.`,
      },
      steps: [
        ...(layout ? [[layout.how]] : []),
        say`From the corner of the folds measure ${inside} and ${outside} all along, a hand's breadth at a time, and join the marks.`,
        say`The waist is sewn at ${r}. Add allowance outside every straight side that has a seam.`,
      ],
      cautions,
    };
  },
};
