/** The bishop sleeve: smooth at the head, full and long below, lowest behind the elbow, gathered onto a buttoned cuff. */
import { INCH } from "@/lib/drafting/guide";
import { distance, line, pointAt } from "@/lib/drafting/measure";
import { edgeOf } from "@/lib/drafting/outline";
import { type PatternPiece, type StyleStep } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { bandChecks, bandFigures, bandOpening, bandPiece, bandSeams } from "@/lib/drafting/styles/band";
import {
  settled,
  type StyleContext,
  type StyleFigure,
  type StyleRecipe,
} from "@/lib/drafting/styles/context";
import {
  aboveBand,
  easedHead,
  fullSleeve,
  hingedCount,
  hingedOpening,
  setInEased,
  sizeOf,
  spreadFigure,
} from "@/lib/drafting/styles/full-sleeve";
import { edgeSize, gatherCheck, gatherOf, underarmWalk } from "@/lib/drafting/styles/parts";
import { outlined } from "@/lib/drafting/styles/plain-sleeve";
import { gatherSteps, joinSteps, spreadSteps } from "@/lib/drafting/styles/spread-steps";
import { type Piece, type Point } from "@/lib/drafting/types";

/** Cuff length = hand measurement, depth 3 in, placket 3 in: Ingalls, Text-Book on Domestic Art, 1911 (seen). */
const CUFF = { depth: 3 * INCH, placket: 3 * INCH };

export const bishop: StyleRecipe = {
  id: "bishop",
  name: "Bishop",
  look: "Smooth at the shoulder, widening all the way down, and hanging over a buttoned cuff.",
  replaces: ["elbow", "hem-wrist", "hem-hand", "hem-arm"],
  figures: (ground, typed): StyleFigure[] => {
    const scale = sizeOf(ground);
    const slashes = hingedCount(6);
    const band = bandFigures(ground, CUFF.depth, "cuff");
    const opening = bandOpening(ground, typed, {
      slashes,
      band,
      most: hingedOpening(ground, settled(slashes, typed)),
    });
    const room = ground.figures.length - ground.figures.capDepth;
    return [
      slashes,
      spreadFigure("footOpen", opening, "Wider, more cloth hangs over the cuff and gathers into it."),
      spreadFigure("drop", INCH * scale),
      {
        key: "backDrop",
        label: "Lower the back more by",
        said: "how much more the back is lowered",
        does: "More, the sleeve hangs deeper behind the arm, where it bends.",
        kind: "length",
        usual: 0.75 * INCH * scale,
        low: 0,
        high: 3 * INCH,
      },
      ...band,
      {
        key: "overlap",
        label: "Overlap of the cuff",
        said: "the overlap of the cuff",
        does: "Wider, it takes a larger button.",
        kind: "length",
        usual: INCH * scale,
        low: 0.5 * INCH,
        high: 2 * INCH,
      },
      {
        key: "placket",
        label: "Length of the placket",
        said: "the length of the placket",
        does: "Longer, the hand goes through more easily.",
        kind: "length",
        usual: Math.min(CUFF.placket, room / 3),
        low: 3,
        high: Math.max(6, Math.min(8 * INCH, room / 2)),
      },
    ];
  },
  make: (context) => {
    const { cloth, near, values } = context;
    const level = aboveBand(context);
    if (typeof level !== "number") return level;
    const sleeve = fullSleeve(context, { level });
    if (!sleeve.ok) return sleeve;
    const { ask, ends, full } = sleeve;
    const slit = slitOf(context, sleeve.piece);
    const piece = slitted(sleeve.piece, slit);
    const length = near(values.bandLength!);
    const cuff = bandPiece(length, near(values.bandDepth!), "Cuff", near(values.overlap!));
    const foot = gatherOf(
      "foot",
      ["sleeve", "foot"],
      "the lower edge of the sleeve",
      full.lengths.foot,
      length,
    );
    return {
      ok: true,
      value: {
        pieces: [piece, cuff],
        gathers: [foot],
        seams: [
          easedHead(full, context),
          ...bandSeams(foot, cuff, "cuff"),
          underarmWalk(piece, "underarm", "the sleeve"),
        ],
        checks: [
          gatherCheck(foot, cloth, "footOpen"),
          ...bandChecks(context, { words: "cuff", length, opens: true }),
        ],
        steps: [
          ...ends,
          ...spreadSteps(ask, full, "the sleeve", slitSteps(piece, slit)),
          ...cuffSteps(context, cuff),
          ...joinSteps([
            say`Cut each sleeve open along its placket line and bind the slit.`,
            say`Close the underarm seam from the armhole to the lower edge.`,
          ]),
          ...gatherSteps([foot]),
          ...joinSteps([
            say`Sew the inner layer of the cuff to the gathered edge of the sleeve: its plain end to the front edge of the slit, the mark of the overlap to the back edge, centre to centre. Turn the outer layer over the seam and sew it down.`,
            say`Make a buttonhole in the front end of the cuff, and sew the button on the overlap.`,
            ...setInEased(full, context),
          ]),
        ],
      },
    };
  },
};

/** The slit of the placket: so far along the lower edge from its back end, and from there straight up the sheet. */
interface Slit {
  readonly along: number;
  readonly from: Point;
  readonly to: Point;
}

function slitOf({ near, values }: StyleContext, piece: Piece): Slit {
  const { curves } = edgeOf(piece, "foot");
  const centre = piece.notches.find(({ id }) => id === "footCentre")!.at;
  // The middle of the back half: there it lies in line with the little finger.
  const along = near(centre / 2);
  const from = pointAt(curves, along).point;
  return { along, from, to: { x: from.x, y: from.y - near(values.placket!) } };
}

function slitted(piece: PatternPiece, { along, from, to }: Slit): PatternPiece {
  return {
    ...piece,
    notches: [...piece.notches, { id: "placket", edge: "foot", at: along, count: 1 }],
    lines: [{ kind: "guide", words: "placket", curves: [line(from, to)] }],
  };
}

function slitSteps(piece: PatternPiece, { along, from, to }: Slit): StyleStep[] {
  const up = distance(from, to);
  return [
    {
      stage: "draw",
      act: { act: "work" },
      distance: along,
      phrase: say`With the tape on its edge, measure ${along} along the lower edge from its back end, and make a mark: the foot of the placket.`,
      scene: { ...outlined(piece, 1), points: [{ ...from, words: "placket" }] },
    },
    {
      stage: "draw",
      act: { act: "work" },
      distance: up,
      phrase: say`From this mark draw a line ${up} straight up the sheet: there the sleeve is cut open.`,
      scene: {
        ...outlined(piece, 1),
        fresh: [{ weight: "cut", curves: [line(from, to)] }],
        measured: [{ from, to }],
      },
    },
  ];
}

function cuffSteps({ near, values }: StyleContext, cuff: PatternPiece): StyleStep[] {
  const [length, depth, overlap] = [edgeSize(cuff, "top"), edgeSize(cuff, "left"), near(values.overlap!)];
  return [
    {
      stage: "cut",
      act: { act: "strip", piece: cuff.id },
      distance: length,
      phrase: say`For the cuffs cut two strips, each ${length} long and ${depth} deep; add the seam allowances. Crease each along its middle: the fold is its lower edge.`,
      scene: outlined(cuff, 2),
    },
    {
      stage: "cut",
      act: { act: "work" },
      distance: overlap,
      phrase: say`On one long edge of each cuff make a mark ${overlap} from one end: the overlap. Mark the second cuff at its other end, so that the two are a pair.`,
      scene: outlined(cuff, 2),
    },
    {
      stage: "cut",
      act: { act: "work" },
      distance: (length - overlap) / 4,
      phrase: say`From the plain end make a mark ${(length - overlap) / 4} along the same edge: there the centre of the sleeve comes.`,
      scene: outlined(cuff, 2),
    },
    ...joinSteps([
      say`Stiffen one half of each cuff, fold it along the crease with the right sides together, sew both ends, and turn it right side out.`,
    ]),
  ];
}
