import { say } from "@/lib/drafting/say";
import { mmPerInch as INCH } from "@/lib/lengths/units";
import { elasticOnAChild } from "./care";
import { line, rect } from "./draw";
import { practice, recalled, type SewingSum, type SumCaution } from "./types";

/** Elastic: shorter than the girth it goes round, never so short that it marks the skin. */
export const elastic: SewingSum = {
  id: "elastic",
  name: "Elastic",
  about: "Length to cut, and the casing for it",
  rule: say`Elastic = girth less ${INCH} to ${2 * INCH}, and an overlap to sew it together.`,
  ...recalled,
  fields: [
    {
      key: "girth",
      label: "Girth where it sits",
      kind: "length",
      hint: say`Of the arm, wrist or waist itself, not of the cloth.`,
      least: 50,
      most: 2500,
    },
    {
      key: "less",
      label: "Less",
      kind: "length",
      usual: { in: INCH, cm: 25 },
      hint: say`${INCH} to ${2 * INCH}. On a child begin with the least.`,
      least: 0,
      most: 500,
    },
    {
      key: "overlap",
      label: "Overlap at the join",
      kind: "length",
      usual: { in: INCH / 2, cm: 15 },
      least: 0,
      most: 100,
    },
    {
      key: "wide",
      label: "Width of the elastic",
      kind: "length",
      optional: true,
      hint: say`Tells how deep the casing is.`,
      least: 2,
      most: 150,
    },
    {
      key: "edge",
      label: "Edge that it gathers",
      kind: "length",
      optional: true,
      hint: say`The round of the cloth, tells how full it is.`,
      least: 50,
      most: 10_000,
    },
    {
      key: "who",
      label: "For",
      kind: "choice",
      optional: true,
      options: [
        { value: "child", label: "A child" },
        { value: "grown", label: "A grown-up" },
      ],
    },
  ],
  example: { girth: 190, less: 25, overlap: 15 },
  work(inputs) {
    const girth = inputs.girth as number;
    const less = inputs.less as number;
    const overlap = inputs.overlap as number;
    const wide = inputs.wide as number | undefined;
    const edge = inputs.edge as number | undefined;
    const round = girth - less;
    if (round < girth / 2)
      return {
        ok: false,
        problems: [
          {
            field: "less",
            say: say`Elastic of ${Math.max(0, round)} round ${girth} would not go on, and would cut in. Type at most ${girth / 2}; ${INCH} to ${2 * INCH} is usual.`,
          },
        ],
      };
    if (edge !== undefined && edge < girth)
      return {
        ok: false,
        problems: [
          {
            field: "edge",
            say: say`The edge is shorter than the girth of ${girth}, so it would not go round. Type the whole round of the edge, ${girth} or more.`,
          },
        ],
      };
    const cautions: SumCaution[] = inputs.who === "grown" ? [] : elasticOnAChild();
    if (less > girth / 5)
      cautions.unshift({
        say: say`That is more than a fifth off ${girth}: likely too tight. Try it round the arm, with a finger under it, before it is sewn.`,
        ...practice,
      });
    // A turned casing: the elastic with 1/8 in to run in, and 1/4 in turned under.
    const casing = wide === undefined ? undefined : wide + INCH / 8;
    const cut = round + overlap;
    const high = wide ?? 10;
    return {
      ok: true,
      results: [
        { label: "Cut the elastic", mm: cut, main: true },
        { label: "Round, once joined", mm: round, main: true },
        { label: "Off the girth", text: `${Math.round((less / girth) * 100)} in 100` },
        ...(casing === undefined
          ? []
          : [
              { label: "Casing, stitched", mm: casing, up: true },
              { label: "Allow below the edge for it", mm: casing + INCH / 4, up: true },
            ]),
        ...(edge === undefined
          ? []
          : [{ label: "Edge to elastic", text: `${(edge / round).toFixed(1)} to 1` }]),
      ],
      drawing: {
        box: { x: 0, y: 0, w: Math.max(cut, girth), h: high * 2 },
        paths: [
          { d: rect(0, 0, cut, high), line: "cut" },
          {
            d: line(overlap / 2, 0, overlap / 2, high) + line(cut - overlap / 2, 0, cut - overlap / 2, high),
            line: "stitch",
          },
          { d: line(0, high * 2, girth, high * 2), line: "measure" },
        ],
        labels: [
          { x: cut / 2, y: high / 2, mm: cut },
          { x: girth / 2, y: high * 2, mm: girth },
        ],
        say: say`Elastic ${cut} long above the girth of ${girth}.`,
      },
      steps: [
        say`Cut ${cut}, lap the ends by ${overlap}, and pin.`,
        say`Try it on: a finger goes under easily, and nothing is marked when it comes off.`,
        say`Sew the lap, and spread the gathers evenly.`,
      ],
      cautions,
    };
  },
};
