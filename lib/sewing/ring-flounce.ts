import { say } from "@/lib/drafting/say";
import { arc, spoke } from "./draw";
import { partField, partWords, sectorBox, turnOf } from "./parts";
import { type DrawnPath, geometry, practice, type SewingSum, type SumCaution } from "./types";

const RINGS_AT_MOST = 40;
/** The least radius that is left to cut inside by, mm. */
const LEAST_HOLE = 2;

/** A flounce cut as part of a ring: the inner edge meets the seam flat, the outer falls in folds. */
export const ringFlounce: SewingSum = {
  id: "ring-flounce",
  name: "Ring flounce",
  about: "Flat at the seam, full at the edge: the radii to draw",
  rule: say`Radius = seam ÷ angle, the seam shared by as many rings as there are. Outer radius = radius + depth.`,
  ...geometry,
  fields: [
    {
      key: "seam",
      label: "Seam it is sewn to",
      kind: "length",
      hint: say`The inner edge, along the stitching.`,
      least: 20,
      most: 20_000,
    },
    {
      key: "depth",
      label: "Depth of the flounce",
      kind: "length",
      hint: say`Seam to edge, finished.`,
      least: 5,
      most: 1500,
    },
    partField("Each ring is"),
    {
      key: "rings",
      label: "Rings joined",
      kind: "count",
      optional: true,
      hint: say`More rings, fuller edge. Left empty: as few as the cloth's width allows.`,
      least: 1,
      most: RINGS_AT_MOST,
    },
    {
      key: "allowance",
      label: "Allowance at the seam and the joins",
      kind: "length",
      usual: { in: 6.35, cm: 10 },
      least: 0,
      most: 50,
    },
    {
      key: "hem",
      label: "Hem at the outer edge",
      kind: "length",
      usual: { in: 6.35, cm: 5 },
      least: 0,
      most: 100,
    },
    {
      key: "width",
      label: "Cloth width",
      kind: "length",
      optional: true,
      usual: { in: 1143, cm: 1150 },
      least: 50,
      most: 5000,
    },
  ],
  example: { seam: 400, depth: 110, part: "whole", rings: 1, allowance: 6, hem: 6 },
  work(inputs) {
    const seam = inputs.seam as number;
    const depth = inputs.depth as number;
    const part = inputs.part as string;
    const allowance = inputs.allowance as number;
    const hem = inputs.hem as number;
    const width = inputs.width as number | undefined;
    const turn = turnOf(part);
    // A whole ring is slit and sewn up again out of its own round; to part of one the allowance is added outside.
    const lost = part === "whole" ? 2 * allowance : 0;
    const radius = (rings: number) => (seam / rings + lost) / turn;
    const outerCut = (rings: number) => radius(rings) + depth + hem;
    const across = (rings: number) => outerCut(rings) * (part === "quarter" ? 1 : part === "half" ? 1 : 2);
    const fits = (rings: number) => width === undefined || across(rings) <= width + 1e-9;
    let rings = inputs.rings as number | undefined;
    if (rings === undefined) {
      rings = 1;
      while (rings < RINGS_AT_MOST && !fits(rings) && radius(rings + 1) - allowance >= LEAST_HOLE) rings++;
      if (!fits(rings)) rings = 1;
    }
    const r = radius(rings);
    const outer = r + depth;
    const inside = r - allowance;
    if (inside < LEAST_HOLE) {
      const most = Math.floor(seam / (turn * (allowance + LEAST_HOLE) - lost));
      return {
        ok: false,
        problems: [
          most >= 1 && inputs.rings !== undefined
            ? {
                field: "rings",
                say: say`So many rings leave no hole to sew to: the radius would be ${r}. Type ${String(most)} or fewer.`,
              }
            : {
                field: "seam",
                say: say`That seam is too short for this ring: its radius would be ${r}, and the allowance is ${allowance}. Type a longer seam, a smaller allowance, or choose a smaller part of a ring.`,
              },
        ],
      };
    }
    const edge = outer * turn * rings;
    const cautions: SumCaution[] = [];
    if (!fits(rings) && width !== undefined) {
      const better = Array.from({ length: RINGS_AT_MOST }, (_, i) => i + 1).find(
        (n) => n > rings && fits(n) && radius(n) - allowance >= LEAST_HOLE,
      );
      cautions.push({
        say: better
          ? say`A ring takes ${across(rings)} of cloth and the width is ${width}. ${String(better)} rings would fit, and the edge be fuller.`
          : say`A ring takes ${across(rings)} of cloth and the width is ${width}. Make the flounce shallower, or cut it in smaller parts of a ring.`,
        ...geometry,
      });
    }
    cautions.push({
      say: say`Parts of the edge lie on the bias and drop. Let it hang before the hem is levelled, and clip the seam allowance so that the inner edge opens out.`,
      ...practice,
    });
    const start = part === "whole" ? -Math.PI / 2 : Math.PI / 2 - turn / 2;
    const ends = [start, start + turn];
    const paths: DrawnPath[] = [
      { d: arc(r - allowance, start, turn), line: "cut" },
      { d: arc(outer + hem, start, turn), line: "cut" },
      ...ends.map((a): DrawnPath => ({ d: spoke(r - allowance, outer + hem, a), line: "cut" })),
      { d: arc(r, start, turn), line: "stitch" },
      ...(hem > 0 ? [{ d: arc(outer, start, turn), line: "stitch" } as const] : []),
      { d: spoke(0, r, Math.PI / 2), line: "measure" },
    ];
    return {
      ok: true,
      results: [
        { label: "Radius at the seam", mm: r, main: true },
        { label: "Radius at the edge", mm: outer, main: true },
        { label: "Rings", count: rings, main: true },
        { label: "Draw and cut inside at", mm: inside },
        { label: "Draw and cut outside at", mm: outer + hem },
        { label: "Lower edge in all", mm: edge },
        { label: "Edge to seam", text: `${(edge / seam).toFixed(1)} times` },
        { label: "Cloth across one ring", mm: across(rings), up: true },
      ],
      drawing: {
        box: sectorBox(part, outer + hem),
        paths,
        labels: [
          { x: 0, y: r / 2, mm: r },
          { x: 0, y: r + depth / 2, mm: depth },
        ],
        say: say`A ${partWords(part)} with radius ${r} at the seam and ${outer} at the edge.`,
      },
      steps: [
        say`From one point draw ${inside} and ${outer + hem} to cut by; the seam line lies between them at ${r}.`,
        rings > 1
          ? say`Cut ${String(rings)} and join them end to end.`
          : say`Cut one${part === "whole" ? ", and slit it straight down the grain" : ""}.`,
        say`Stay-stitch the inner edge, clip it, and open it out along the seam of ${seam}.`,
      ],
      cautions,
    };
  },
};
