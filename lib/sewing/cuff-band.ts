import { say } from "@/lib/drafting/say";
import { mmPerInch as INCH } from "@/lib/lengths/units";
import { line, rect } from "./draw";
import { type DrawnPath, practice, type SewingSum, type SumCaution } from "./types";

/** A cuff that opens, or a band that is closed in a round. */
export const cuffBand: SewingSum = {
  id: "cuff-band",
  name: "Cuff and band",
  about: "Cuff that opens, or band in a round",
  rule: say`Cuff = hand measurement with ease and overlap; ${3 * INCH} deep, with a placket of ${3 * INCH}.`,
  source: "Ingalls, Text-Book on Domestic Art, 1911",
  mark: "seen",
  fields: [
    {
      key: "kind",
      label: "It is",
      kind: "choice",
      usual: "cuff",
      options: [
        { value: "cuff", label: "A cuff that opens" },
        { value: "band", label: "A closed band" },
      ],
    },
    {
      key: "by",
      label: "Measured round",
      kind: "choice",
      usual: "hand",
      options: [
        { value: "hand", label: "The hand" },
        { value: "wrist", label: "The wrist" },
        { value: "arm", label: "The arm" },
      ],
    },
    {
      key: "girth",
      label: "Girth",
      kind: "length",
      hint: say`The hand: round the knuckles, thumb laid in.`,
      least: 50,
      most: 900,
    },
    {
      key: "ease",
      label: "Ease",
      kind: "length",
      usual: { in: 0, cm: 0 },
      hint: say`By the hand none is needed; by the wrist or arm ${INCH / 2} to ${INCH}.`,
      least: 0,
      most: 200,
    },
    {
      key: "overlap",
      label: "Overlap",
      kind: "length",
      usual: { in: INCH, cm: 25 },
      hint: say`What laps under for the button.`,
      when: ({ kind }) => kind !== "band",
      least: 0,
      most: 150,
    },
    {
      key: "depth",
      label: "Depth",
      kind: "length",
      usual: { in: 3 * INCH, cm: 75 },
      hint: say`Finished.`,
      least: 5,
      most: 400,
    },
    {
      key: "placket",
      label: "Placket",
      kind: "length",
      usual: { in: 3 * INCH, cm: 75 },
      hint: say`The slit above the cuff.`,
      when: ({ kind }) => kind !== "band",
      least: 0,
      most: 400,
    },
    {
      key: "allowance",
      label: "Seam allowance",
      kind: "length",
      usual: { in: INCH / 4, cm: 10 },
      least: 0,
      most: 50,
    },
    {
      key: "cut",
      label: "Cut",
      kind: "choice",
      usual: "fold",
      options: [
        { value: "fold", label: "In one, with a fold" },
        { value: "two", label: "Outside and facing" },
      ],
    },
    {
      key: "edge",
      label: "Sleeve edge gathered into it",
      kind: "length",
      optional: true,
      hint: say`Tells how full it is.`,
      least: 50,
      most: 3000,
    },
  ],
  example: {
    kind: "cuff",
    by: "hand",
    girth: 180,
    ease: 0,
    overlap: 25,
    depth: 75,
    placket: 75,
    allowance: 8,
    cut: "fold",
  },
  work(inputs) {
    const girth = inputs.girth as number;
    const allowance = inputs.allowance as number;
    const depth = inputs.depth as number;
    const edge = inputs.edge as number | undefined;
    const band = inputs.kind === "band";
    const overlap = band ? 0 : (inputs.overlap as number);
    const placket = band ? 0 : (inputs.placket as number);
    const closed = girth + (inputs.ease as number);
    const length = closed + overlap;
    if (edge !== undefined && edge < closed)
      return {
        ok: false,
        problems: [
          {
            field: "edge",
            say: say`The edge is shorter than the ${band ? "band" : "cuff"} it is sewn to, ${closed}. Type ${closed} or more, or leave it empty.`,
          },
        ],
      };
    const folded = inputs.cut === "fold";
    const cutLong = length + 2 * allowance;
    const cutDeep = (folded ? 2 * depth : depth) + 2 * allowance;
    const cautions: SumCaution[] = [];
    if (band && inputs.by === "wrist")
      cautions.push({
        say: say`A closed band has to go over the hand: measure the hand and type its girth.`,
        ...practice,
      });
    if (!band && inputs.by === "hand" && (inputs.ease as number) > INCH)
      cautions.push({
        say: say`The hand is wider than the wrist already; with so much ease the cuff slips over the hand.`,
        ...practice,
      });
    if (!band && placket === 0)
      cautions.push({
        say: say`Without a placket the cuff only opens as far as its own depth.`,
        ...practice,
      });
    const a = allowance;
    const paths: DrawnPath[] = [
      { d: rect(0, 0, cutLong, cutDeep), line: "cut" },
      ...(a > 0 ? [{ d: rect(a, a, length, cutDeep - 2 * a), line: "stitch" } as const] : []),
      ...(folded ? [{ d: line(0, cutDeep / 2, cutLong, cutDeep / 2), line: "fold" } as const] : []),
      ...(overlap > 0 ? [{ d: line(a + closed, a, a + closed, cutDeep - a), line: "measure" } as const] : []),
    ];
    return {
      ok: true,
      results: [
        { label: band ? "Band, finished" : "Cuff, finished", mm: length, main: true },
        { label: "Depth, finished", mm: depth },
        { label: "Cut it long", mm: cutLong, main: true },
        { label: "Cut it deep", mm: cutDeep, main: true },
        { label: "Pieces for two sleeves", count: folded ? 2 : 4 },
        ...(band
          ? []
          : [
              { label: "Closed, button to hole", mm: closed },
              { label: "Placket", mm: placket },
            ]),
        ...(edge === undefined
          ? []
          : [
              { label: "Gather the edge to", mm: closed },
              { label: "Edge to cuff", text: `${(edge / closed).toFixed(1)} to 1` },
            ]),
      ],
      drawing: {
        box: { x: 0, y: 0, w: cutLong, h: cutDeep },
        paths,
        labels: [
          { x: a + closed / 2, y: folded ? cutDeep * 0.28 : cutDeep / 2, mm: closed },
          ...(overlap > 0 ? [{ x: a + closed + overlap / 2, y: cutDeep * 0.75, mm: overlap }] : []),
        ],
        say: say`A ${band ? "band" : "cuff"} cut ${cutLong} by ${cutDeep}${folded ? ", folded along the middle" : ""}.`,
      },
      steps: [
        say`Cut ${folded ? "two" : "four"}, ${cutLong} by ${cutDeep}${folded ? ", and press the fold" : ""}.`,
        ...(band
          ? [say`Sew the ends together with ${a}, then set it on.`]
          : [say`Slit the sleeve ${placket} from the edge and finish the placket first.`]),
        ...(edge === undefined ? [] : [say`Gather the edge of ${edge} to ${closed} before it is set on.`]),
      ],
      cautions,
    };
  },
};
