/** A plain short upper sleeve and gathered strips below it, each fuller than the one above. */
import { passesElbow } from "@/lib/drafting/checks";
import { INCH } from "@/lib/drafting/guide";
import { edgeOf } from "@/lib/drafting/outline";
import { type Gather, type PatternPiece, type StyleCheck, type StyleStep } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { walk, type WalkedSeam } from "@/lib/drafting/seams";
import { closedRound } from "@/lib/drafting/styles/closed-round";
import {
  impossible,
  settled,
  type StyleContext,
  type StyleFigure,
  type StyleRecipe,
} from "@/lib/drafting/styles/context";
import {
  clothWidthFigure,
  edgeSize,
  gatherCheck,
  gatherOf,
  pattern,
  rectangle,
  underarmWalk,
} from "@/lib/drafting/styles/parts";
import { downTo, headSeam, outlined, setIn, work } from "@/lib/drafting/styles/plain-sleeve";
import { gatherSteps, joinSteps } from "@/lib/drafting/styles/spread-steps";
import { type Strip, stripOf } from "@/lib/drafting/strip";

/** Taken by the seam at each end of a strip. Common practice, no source. */
const END = INCH / 2;
/** The hem of the last strip: 1 to 1 1/4 in, recalled. */
const HEM = INCH;
const WORDS = ["first", "second", "third", "fourth"] as const;

export const tiered: StyleRecipe = {
  id: "tiered",
  name: "Tiered",
  look: "A plain short top, and below it strips gathered one to the other, each fuller than the one above.",
  replaces: ["elbow", "hem-wrist", "hem-hand", "hem-arm"],
  figures: (ground, typed): StyleFigure[] => {
    const { biceps, capDepth, length } = ground.figures;
    const scale = Math.min(1, biceps / (12 * INCH));
    const upperTo: StyleFigure = {
      key: "upperTo",
      label: "Plain part ends below the crown",
      said: "the level where the plain part ends",
      does: "Lower down, the gathers start further from the shoulder.",
      kind: "length",
      usual: Math.min(length, capDepth + INCH * scale),
      low: Math.min(length, capDepth + 10),
      high: length,
    };
    const tiers: StyleFigure = {
      key: "tiers",
      label: "Tiers",
      said: "the number of tiers",
      does: "More tiers make the sleeve longer and its end wider.",
      kind: "count",
      usual: 2,
      low: 1,
      high: 4,
    };
    const left = length - settled(upperTo, typed);
    return [
      upperTo,
      tiers,
      {
        key: "tierDepth",
        label: "Depth of the first tier",
        said: "the depth of the first tier",
        does: "Deeper, the tiers lie calmer and the sleeve grows longer.",
        kind: "length",
        // Down to the block's hem, where there is arm enough.
        usual: Math.min(20 * INCH, Math.max(2.5 * INCH * scale, left / settled(tiers, typed))),
        low: 0.75 * INCH,
        high: 20 * INCH,
      },
      {
        key: "deepen",
        label: "Each next tier deeper by",
        said: "how much deeper each next tier is",
        does: "More, the tiers grow towards the end of the sleeve.",
        kind: "length",
        usual: 0,
        low: 0,
        high: 6 * INCH,
      },
      {
        key: "fullness",
        label: "Each tier to the edge above it",
        said: "the fullness of each tier",
        does: "Higher, every tier gathers more, and the last one is much wider.",
        kind: "ratio",
        usual: 1.5,
        low: 1.1,
        high: 3,
      },
      clothWidthFigure(ground),
    ];
  },
  make: (context) => {
    const { cloth, figures, near, values } = context;
    const clothWidth = values.clothWidth!;
    const level = Math.min(figures.length, near(values.upperTo!));
    const { piece, steps } = downTo(context, level);
    const upper = pattern(
      {
        ...piece,
        notches: [
          ...piece.notches,
          { id: "footCentre", edge: "foot", at: edgeSize(piece, "foot") / 2, count: 1 },
        ],
      },
      "upper",
      "Upper part",
    );
    const tiers = tiersOf(context, edgeSize(upper, "foot"));
    if (!tiers)
      return impossible(
        "clothWidth",
        "cloth-too-narrow",
        say`The cloth is only ${clothWidth} wide: no strip can be cut across it.`,
        say`Take wider cloth.`,
      );
    return {
      ok: true,
      value: {
        pieces: [upper, ...tiers.map(({ piece: strip }) => strip)],
        gathers: tiers.map(({ gather }) => gather),
        seams: [...headSeam(context), underarmWalk(upper, "underarm", "the upper part"), ...tierSeams(tiers)],
        checks: [
          ...closedRound(context, {
            words: "the lower edge of the upper part",
            round: edgeSize(upper, "foot"),
            level,
            figure: "upperTo",
          }),
          ...tiers.map(({ gather }) => gatherCheck(gather, cloth, "fullness", BY_FULLNESS)),
          ...tiers.map((tier) => joinsCheck(tier, clothWidth)),
          ...reach(context, level, tiers),
        ],
        steps: [...steps, ...tierSteps(context, upper, tiers)],
      },
    };
  },
};

const BY_FULLNESS = { more: "make the tiers fuller", less: "make the tiers less full" };

interface Tier {
  /** "first" */
  readonly word: string;
  readonly depth: number;
  readonly strip: Strip;
  readonly piece: PatternPiece;
  readonly gather: Gather;
}

/** Every tier from the top down, over a plain lower edge of `round` mm; undefined where the cloth is too narrow. */
function tiersOf({ near, values }: StyleContext, round: number): Tier[] | undefined {
  const tiers: Tier[] = [];
  const count = values.tiers!;
  let seam = round;
  for (const [i, word] of WORDS.slice(0, count).entries()) {
    const strip = stripOf({
      seam,
      ratio: values.fullness!,
      clothWidth: values.clothWidth!,
      allowance: END,
      near,
    });
    if (!strip) return undefined;
    const id = `tier-${i + 1}`;
    const depth = near(values.tierDepth!) + i * near(values.deepen!);
    const piece = pattern(
      rectangle(strip.part, depth),
      id,
      `${word[0]!.toUpperCase()}${word.slice(1)} tier`,
      {
        cut: { count: 2 * strip.parts, mirrored: false },
        ...(i === count - 1 && { allowances: { bottom: HEM } }),
      },
    );
    const gather = gatherOf(id, [id, "top"], `the top of the ${word} tier`, strip.total, seam);
    tiers.push({ word, depth, strip, piece, gather });
    seam = strip.total;
  }
  return tiers;
}

function tierSeams(tiers: readonly Tier[]): WalkedSeam[] {
  return tiers.flatMap(({ word, piece, strip, gather }, i) => [
    walk({
      id: gather.id,
      sides: [
        { words: gather.words, measured: strip.parts * edgeSize(piece, "top") },
        {
          words:
            i === 0 ? "the lower edge of the upper part" : `the lower edge of the ${tiers[i - 1]!.word} tier`,
          measured: gather.pulledTo,
        },
      ],
      joining: { how: "gathered" },
    }),
    walk({
      id: `${gather.id}-ends`,
      sides: [
        { words: `one end of the ${word} tier`, measured: edgeOf(piece, "left") },
        { words: "the other", measured: edgeOf(piece, "right") },
      ],
      joining: { how: "equal" },
    }),
  ]);
}

/** More joins than this in a round are seen. Common practice, no source. */
const MOST_JOINS = 6;

function joinsCheck({ word, strip: { parts, part, total }, gather }: Tier, clothWidth: number) {
  return {
    id: `joins-${gather.id}`,
    verdict: parts > MOST_JOINS ? ("look" as const) : ("good" as const),
    figure: "fullness",
    value: total,
    high: MOST_JOINS * (clothWidth - 2 * END),
    phrase:
      parts === 1
        ? say`The ${word} tier is ${total} long, in one strip across cloth ${clothWidth} wide.`
        : say`The ${word} tier is ${total} long: ${`${parts}`} strips of ${part}, joined, from cloth ${clothWidth} wide.`,
    remedy:
      parts > MOST_JOINS
        ? say`That is many joins. Make the tiers less full, or take wider cloth.`
        : say`Nothing to change.`,
    source: "arithmetic: length of the strip against the width of the cloth",
    mark: "exact" as const,
  };
}

/** All tiers together against the arm, where the block is drawn as long as that. */
function reach(context: StyleContext, level: number, tiers: readonly Tier[]): StyleCheck[] {
  const { length } = context.figures;
  if (!passesElbow(context)) return [];
  const value = tiers.reduce((sum, { depth }) => sum + depth, level);
  // Half an inch, so that the rounding of four tiers is not taken for it.
  const long = value > length + INCH / 2;
  return [
    {
      id: "reach",
      verdict: long ? "look" : "good",
      figure: "tierDepth",
      value,
      high: length,
      phrase: say`With its tiers the sleeve is ${value} long; the plain sleeve is ${length}.`,
      remedy: long
        ? say`It will hang over the hand. Make the tiers less deep, or end the plain part higher up.`
        : say`Nothing to change.`,
      source: "common practice, no source",
      mark: "practice",
    },
  ];
}

function tierSteps(context: StyleContext, upper: PatternPiece, tiers: readonly Tier[]): StyleStep[] {
  return [
    work(
      "cut",
      say`Cut the upper part out along its lower edge, mark the middle of that edge, and add the seam allowances. Cut it twice in cloth, the second mirrored.`,
      outlined(upper),
    ),
    ...tiers.map(({ word, depth, strip, piece }, i): StyleStep => {
      const many = `${2 * strip.parts}`;
      const hem = i === tiers.length - 1;
      return {
        stage: "cut",
        act: { act: "strip", piece: piece.id },
        distance: strip.part,
        phrase: hem
          ? say`For the ${word} tier cut ${many} strips across the cloth, each ${strip.part} long and ${depth} deep; add the seam allowances, and ${HEM} below for the hem.`
          : say`For the ${word} tier cut ${many} strips across the cloth, each ${strip.part} long and ${depth} deep; add the seam allowances.`,
        scene: outlined(piece, i + 1),
      };
    }),
    ...joinSteps([say`Close the underarm seam of each upper part.`]),
    ...tiers.flatMap(({ word, strip: { parts }, gather }, i) => [
      ...joinSteps([
        parts === 1
          ? say`Sew the two ends of the strip of the ${word} tier together: a round for each sleeve.`
          : say`For each sleeve, sew ${`${parts}`} strips of the ${word} tier together end to end, and close the round.`,
      ]),
      ...gatherSteps([gather]),
      ...joinSteps([
        say`Sew it to the lower edge of the ${i === 0 ? "upper part" : `${tiers[i - 1]!.word} tier`}: a join to the underarm seam, quarters to quarters.`,
      ]),
    ]),
    ...joinSteps([say`Turn the hem of the ${tiers.at(-1)!.word} tier up and sew it.`, ...setIn(context)]),
  ];
}
