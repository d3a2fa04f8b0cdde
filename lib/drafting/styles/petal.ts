/** The petal sleeve: a front and a back petal that lie over each other at the head and part at the centre. */
import { INCH } from "@/lib/drafting/guide";
import { chainLength, pointAt, reversed } from "@/lib/drafting/measure";
import { edgeOf, stretchOf } from "@/lib/drafting/outline";
import { type MarkPoint, type PatternPiece, type StyleStep } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { walk, type WalkedSeam } from "@/lib/drafting/seams";
import {
  settled,
  type StyleContext,
  type StyleFigure,
  type StyleRecipe,
} from "@/lib/drafting/styles/context";
import { edgeSize, headPlaces, pattern } from "@/lib/drafting/styles/parts";
import {
  crossings,
  freeEdge,
  type Marks,
  outOfReach,
  underarmNeeded,
} from "@/lib/drafting/styles/petal-edge";
import { downTo, EMPTY, headSeam, outlined, setIn, work } from "@/lib/drafting/styles/plain-sleeve";
import { joinSteps } from "@/lib/drafting/styles/spread-steps";
import { type Side } from "@/lib/drafting/types";

/** The free edge is a narrow hem: it is a curve. Common practice, no source. */
const NARROW_HEM = INCH / 4;
export const petal: StyleRecipe = {
  id: "petal",
  name: "Petal",
  look: "Two petals cross over the top of the arm and open below, like the leaves of a tulip.",
  // It opens at the centre, and ends where its own figures say.
  replaces: ["elbow", "hem-wrist", "hem-hand", "hem-arm"],
  figures: (ground, typed): StyleFigure[] => {
    const { biceps, capDepth, length } = ground.figures;
    const { capFront, capBack } = ground.block.lengths;
    const scale = Math.min(1, biceps / (12 * INCH));
    const under = length - capDepth;
    const half = Math.min(capFront, capBack);
    const { crown } = headPlaces(ground);
    const overlap: StyleFigure = {
      key: "overlap",
      label: "Each petal past the crown",
      said: "how far each petal runs past the crown",
      does: "Further, the petals cover each other more and show less of the arm.",
      kind: "length",
      usual: half * 0.35,
      low: 10,
      high: half * 0.7,
    };
    const past = settled(overlap, typed);
    const short = Math.min(under, 1.5 * INCH * scale);
    const needed = underarmNeeded({ sleeve: downTo(ground, capDepth + short).piece, crown, overlap: past });
    const side: StyleFigure = {
      key: "side",
      label: "Underarm below the cap line",
      said: "the depth below the cap line",
      does: "Longer, the petals reach further down under the arm.",
      kind: "length",
      usual: Math.min(under, Math.max(short, needed - capDepth)),
      low: 10,
      high: under,
    };
    const { least, most } = crossings({
      sleeve: downTo(ground, capDepth + settled(side, typed)).piece,
      crown,
      overlap: past,
    });
    return [
      side,
      overlap,
      {
        key: "crossing",
        label: "Petals cross below the crown",
        said: "the depth at which the petals cross",
        does: "Deeper, the sleeve opens lower down the arm.",
        kind: "length",
        // There the edge bends most evenly on short sleeves.
        usual: Math.min(length, Math.max(20, least + 0.4 * (most - least))),
        low: 20,
        high: length,
      },
    ];
  },
  make: (context) => {
    const { figures, near, values } = context;
    const level = Math.min(figures.length, figures.capDepth + near(values.side!));
    const { piece: sleeve, steps } = downTo(context, level);
    const marks: Marks = {
      sleeve,
      crown: headPlaces(context).crown,
      overlap: near(values.overlap!),
      crossing: near(values.crossing!),
    };
    const stopped = outOfReach(marks);
    if (stopped) return stopped;
    const front = petalPiece(marks, "front");
    const back = petalPiece(marks, "back");
    return {
      ok: true,
      value: {
        pieces: [front, back],
        gathers: [],
        seams: petalSeams(context, front, back, marks.overlap),
        checks: [],
        steps: [...steps, ...petalSteps(context, front, back, marks)],
      },
    };
  },
};

function petalPiece(marks: Marks, side: Side): PatternPiece {
  const { sleeve, crown, overlap, crossing } = marks;
  const head = edgeOf(sleeve, "head");
  const free = freeEdge(marks, side);
  const front = side === "front";
  const from = front ? 0 : crown - overlap;
  const curves = stretchOf(head, from, front ? crown + overlap : Infinity);
  const size = chainLength(curves);
  const over = { id: "over", edge: "head", at: front ? crown - overlap : crown + overlap, count: 1 as const };
  return pattern(
    {
      name: side,
      edges: front
        ? [{ name: "head", curves }, { name: "petal", curves: free }, edgeOf(sleeve, "underarmFront")]
        : [
            { name: "head", curves },
            edgeOf(sleeve, "underarmBack"),
            { name: "petal", curves: reversed(free) },
          ],
      notches: [...sleeve.notches, over]
        .map((notch) => ({ ...notch, at: notch.at - from }))
        .filter(({ at }) => at > 1 && at < size - 1),
      grain: { from: { x: 0, y: crossing / 6 }, to: { x: 0, y: (crossing * 5) / 6 } },
    },
    side,
    front ? "Front petal" : "Back petal",
    { allowances: { petal: NARROW_HEM } },
  );
}

function petalSeams(
  context: StyleContext,
  front: PatternPiece,
  back: PatternPiece,
  overlap: number,
): WalkedSeam[] {
  const [frontHead, backHead] = [edgeOf(front, "head"), edgeOf(back, "head")];
  const frontSize = edgeSize(front, "head");
  return [
    ...headSeam(context),
    walk({
      id: "petals",
      sides: [
        {
          words: "the heads of both petals, laid over each other,",
          measured: frontSize + edgeSize(back, "head") - 2 * overlap,
        },
        { words: "the plain cap seam", measured: context.block.lengths.cap },
      ],
      joining: { how: "equal" },
    }),
    walk({
      id: "overlap",
      sides: [
        {
          words: "the covered stretch of the front petal",
          measured: chainLength(stretchOf(frontHead, frontSize - 2 * overlap, Infinity)),
        },
        {
          words: "that of the back petal",
          measured: chainLength(stretchOf(backHead, 0, 2 * overlap)),
        },
      ],
      joining: { how: "equal" },
    }),
    walk({
      id: "underarm",
      sides: [
        { words: "the underarm of the front petal", measured: edgeOf(front, "underarmFront") },
        { words: "that of the back petal", measured: edgeOf(back, "underarmBack") },
      ],
      joining: { how: "equal" },
    }),
  ];
}

function petalSteps(
  context: StyleContext,
  front: PatternPiece,
  back: PatternPiece,
  { sleeve, crown, overlap, crossing }: Marks,
): StyleStep[] {
  const head = edgeOf(sleeve, "head").curves;
  const marks = [-overlap, overlap].map((by) => pointAt(head, crown + by).point);
  const centre = { x: 0, y: crossing };
  return [
    {
      stage: "draw",
      act: { act: "seam-marks", from: "crown" },
      distance: overlap,
      phrase: say`With the tape on its edge, measure ${overlap} along the cap seam from the crown to each side, and make marks. The back petal will end at the front mark, the front petal at the back one.`,
      scene: { ...EMPTY, points: marks.map((point) => ({ ...point, words: "end" })) },
    },
    {
      stage: "draw",
      act: { act: "centre-mark" },
      distance: crossing,
      phrase: say`From the crown, measure ${crossing} down the centre line, and make a mark: the petals cross there.`,
      scene: {
        ...EMPTY,
        measured: [{ from: { x: 0, y: 0 }, to: centre }],
        points: [{ ...centre, words: "crossing" }],
      },
    },
    edgeStep(front, "front"),
    edgeStep(back, "back"),
    work(
      "cut",
      say`Trace each petal on to fresh paper of its own: its underarm seam, the cap seam as far as it runs, and its edge. Mark on it the crown, the notches, the place where the other petal ends, and the grain along the centre line.`,
      outlined(front, 1),
    ),
    {
      stage: "cut",
      act: { act: "allow", edge: "petal" },
      distance: NARROW_HEM,
      phrase: say`Add ${NARROW_HEM} outside the curved edges, for a narrow hem, and the seam allowances to the others. Cut each petal twice in cloth, the second mirrored.`,
      scene: outlined(front, 1),
    },
    ...joinSteps([
      say`Sew each front petal to its back petal along the underarm seam.`,
      say`Sew a narrow hem along the curved edge, from the end of one head round under the arm to the end of the other.`,
      say`Lay the front petal over the back one, crown on crown, and the end of each head to its mark on the other. Sew the heads together close to the edge. From here on they are one.`,
      ...setIn(context),
    ]),
  ];
}

function edgeStep(piece: PatternPiece, side: Side): StyleStep {
  const front = side === "front";
  const other = front ? "back" : "front";
  const through: MarkPoint[] = [
    { named: front ? "seamBack" : "seamFront" },
    { named: "centre" },
    { named: front ? "footFront" : "footBack" },
  ];
  return {
    stage: "draw",
    act: { act: "curve", edge: front ? "petalFront" : "petalBack", through },
    phrase: say`Draw the edge of the ${side} petal with the curve: from the ${other} mark on the cap seam, round through the mark on the centre line, to the lower end of the ${side} underarm seam, which it meets square.`,
    scene: { ...EMPTY, fresh: [{ weight: "cut", curves: edgeOf(piece, "petal").curves }] },
  };
}
