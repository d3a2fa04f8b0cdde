/** Slashing, spreading and redrawing as the hand does it, one distance a step. */
import { INCH } from "@/lib/drafting/guide";
import { line } from "@/lib/drafting/measure";
import { edgeOf, stretchOf } from "@/lib/drafting/outline";
import {
  type Gather,
  type MarkPoint,
  type SceneLine,
  type StepScene,
  type StyleStep,
} from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { type SetMark, type SpreadAsk, type SpreadPiece } from "@/lib/drafting/styles/spread-piece";
import { type Phrase, type Point } from "@/lib/drafting/types";

/** Paper left uncut at a hinge. Common practice, no source. */
const BRIDGE = INCH / 4;
/** Thread left beyond each end of a gathering row, to pull by. Common practice, no source. */
const TAIL = 4 * INCH;

const NOTHING: StepScene = { sheet: 0, fresh: [], measured: [], points: [] };

/** "slash 4", "slashes 3 and 5": counted from 1 at the front. */
function slashWords(slashes: readonly number[]): string {
  const numbers = slashes.map((n) => n + 1);
  return numbers.length === 1 ? `slash ${numbers[0]}` : `slashes ${numbers.join(" and ")}`;
}

/** A piece that does not hang from the cap: how its upper edge is named, and the paper it is spread on. */
export interface PartBelow {
  readonly part: "lower";
  readonly sheet: number;
}

/** Where the heads of the slashes are set out from, and along what. */
function headWords(below: PartBelow | undefined) {
  return below
    ? {
        from: "the centre of the line",
        seam: "it",
        head: "upper edge",
        of: " of the lower part",
        foot: "hem",
      }
    : { from: "the crown", seam: "the cap seam", head: "head", of: "", foot: "lower edge" };
}

/**
 * Steps from setting out the slashes to both new edges. `words` names the piece: "the upper part"; `more` comes between
 * the new edges and the tracing.
 */
export function spreadSteps(
  ask: SpreadAsk,
  full: SpreadPiece,
  words: string,
  more: readonly StyleStep[] = [],
): StyleStep[] {
  return [
    ...slashSteps(ask, full),
    ...openSteps(ask, full, words),
    ...edgeSteps(full, "head"),
    ...edgeSteps(full, "foot", { squared: ask.squared?.includes("foot") }),
    {
      stage: "draw",
      act: { act: "work" },
      phrase: say`Mark the notches where they were, one in front and two behind, and the crown on the new head. Mark the centre of the lower edge, and the grain along the centre line.`,
      scene: { ...outlineScene(full, 1), points: notchPoints(full) },
    },
    ...more,
    {
      stage: "cut",
      act: { act: "work" },
      phrase: say`Trace ${words} on to fresh paper and add the seam allowances. Cut it twice in cloth, the second mirrored.`,
      scene: outlineScene(full, 1),
    },
  ];
}

/** Setting the slashes out on the plain draft. */
export function slashSteps(ask: SpreadAsk, full: SpreadPiece, below?: PartBelow): StyleStep[] {
  const { from, seam, of, foot: edge } = headWords(below);
  const part = below && { part: below.part };
  const head = edgeOf(ask.piece, "head");
  const foot = edgeOf(ask.piece, "foot");
  const steps: StyleStep[] = [];
  const ends = slashEnds(ask, full);
  for (const { slashes, head: alongHead, foot: alongFoot } of full.marks) {
    if (slashes.length === 1) continue;
    steps.push(
      {
        stage: "draw",
        act: { act: "slash-head", slashes, ...part },
        distance: alongHead,
        phrase: say`From ${from}, measure ${alongHead} along ${seam} to each side: the heads of ${slashWords(slashes)}${of}.`,
        scene: {
          ...NOTHING,
          fresh: slashes.map((i) => ({
            weight: "guide",
            curves: stretchOf(
              head,
              Math.min(ask.crown, ends[i]!.headAt),
              Math.max(ask.crown, ends[i]!.headAt),
            ),
          })),
          points: slashes.map((i) => ({ ...ends[i]!.head, words: `${i + 1}` })),
        },
      },
      {
        stage: "draw",
        act: { act: "slash-foot", slashes, ...part },
        distance: alongFoot,
        phrase: say`From the centre of the ${edge}, measure ${alongFoot} to each side: the feet of ${slashWords(slashes)}${of}.`,
        scene: {
          ...NOTHING,
          measured: slashes.map((i) => ({
            from: midOf(foot.curves[0]![0], foot.curves.at(-1)![3]),
            to: ends[i]!.foot,
          })),
          points: slashes.map((i) => ({ ...ends[i]!.foot, words: `${i + 1}` })),
        },
      },
    );
  }
  const centre = full.marks.find(({ slashes }) => slashes.length === 1);
  const all = full.marks.flatMap(({ slashes }) => slashes);
  steps.push({
    stage: "draw",
    act: { act: "work" },
    phrase: [
      ...(all.length > 1
        ? say`Join each head to its foot: the slashes, numbered from the front.`
        : say`The centre line is the slash.`),
      ...(centre && all.length > 1 ? say` The centre line is ${slashWords(centre.slashes)}.` : []),
    ],
    scene: {
      ...NOTHING,
      fresh: ends.map(({ head: a, foot: b }) => ({ weight: "guide", curves: [line(a, b)] })),
    },
  });
  return steps;
}

function midOf(a: Point, b: Point): Point {
  return { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
}

function slashEnds(ask: SpreadAsk, { marks }: SpreadPiece) {
  const foot = edgeOf(ask.piece, "foot").curves;
  const middle = midOf(foot[0]![0], foot.at(-1)![3]);
  const ends: { head: Point; foot: Point; headAt: number }[] = [];
  for (const { slashes, head, foot: out } of marks) {
    for (const [n, i] of slashes.entries()) {
      const way = n === 0 ? -1 : 1;
      const headAt = ask.crown + way * head;
      const [stretch] = [stretchOf(edgeOf(ask.piece, "head"), headAt, Infinity)];
      ends[i] = { headAt, head: stretch[0]![0], foot: { x: middle.x + way * out, y: middle.y } };
    }
  }
  return ends;
}

export function openSteps(
  { headOpen, footOpen }: SpreadAsk,
  full: SpreadPiece,
  words: string,
  below?: PartBelow,
): StyleStep[] {
  const { seam, head } = headWords(below);
  const part = below && { part: below.part };
  const slashes = full.spread.lips.map((_, i) => i);
  const each = slashes.length === 1 ? "the slash" : "each slash";
  const hinged = footOpen === 0 ? "foot" : headOpen === 0 ? "head" : undefined;
  const scene: StepScene = { sheet: below?.sheet ?? 1, fresh: panelLines(full), measured: [], points: [] };
  const steps: StyleStep[] = [
    {
      stage: "cut",
      act: { act: "work" },
      phrase:
        hinged === "foot"
          ? say`Cut ${words} out of the paper. Cut ${each} from the ${head} down, and stop ${BRIDGE} before the lower edge: an uncut bridge is the hinge.`
          : hinged === "head"
            ? say`Cut ${words} out of the paper. Cut ${each} from the lower edge up, and stop ${BRIDGE} before ${seam}: an uncut bridge is the hinge.`
            : say`Cut ${words} out of the paper. Cut ${each} right through, and number the panels from the front.`,
      scene: { ...NOTHING, sheet: 0 },
    },
  ];
  const measured = (end: "head" | "foot") =>
    full.spread.lips.map((lips) => ({ from: lips[end].before, to: lips[end].after }));
  if (headOpen > 0)
    steps.push({
      stage: "draw",
      act: { act: "open", end: "head", slashes, ...part },
      distance: headOpen,
      phrase: say`Draw a centre line on fresh paper and lay the panels on it, the middle ${slashes.length % 2 === 0 ? "one upright" : "slash over it"}. Open ${each} ${headOpen} at the ${head}.`,
      scene: { ...scene, measured: measured("head") },
    });
  if (footOpen > 0)
    steps.push({
      stage: "draw",
      act: { act: "open", end: "foot", slashes, ...part },
      distance: footOpen,
      phrase:
        headOpen > 0
          ? say`Open ${each} ${footOpen} at the lower edge as well. Tape the panels down.`
          : say`Draw a centre line on fresh paper and lay the panels on it, the middle ${slashes.length % 2 === 0 ? "one upright" : "slash over it"}. Open ${each} ${footOpen} at the lower edge, and tape the panels down.`,
      scene: { ...scene, measured: measured("foot") },
    });
  else steps.push({ stage: "draw", act: { act: "work" }, phrase: say`Tape the panels down.`, scene });
  return steps;
}

export function panelLines({ spread }: SpreadPiece): SceneLine[] {
  return spread.panels.map((panel) => ({
    weight: "guide",
    curves: panel.edges.flatMap((edge) => [...edge.curves]),
  }));
}

/** The marks of one edge, then the curve through them, then the tape along it. */
export function edgeSteps(
  full: SpreadPiece,
  edge: "head" | "foot",
  { squared = false, below }: { readonly squared?: boolean; readonly below?: PartBelow } = {},
): StyleStep[] {
  const set = edge === "head" ? full.headSet : full.footSet;
  const curve = edgeOf(full.piece, edge).curves;
  const way = edge === "head" ? "up" : "down";
  const steps: StyleStep[] = [];
  for (const group of alike(set)) steps.push(setStep(group, way));
  const ends: readonly [MarkPoint, MarkPoint] =
    edge === "foot"
      ? [{ named: "footBack" }, { named: "footFront" }]
      : below
        ? [{ named: "topFront" }, { named: "topBack" }]
        : [{ named: "notchFront" }, { named: "notchBack" }];
  const through = [ends[0], ...set.map(({ from }) => from), ends[1]];
  const length = edge === "head" ? full.lengths.head : full.lengths.foot;
  const over = steps.length > 0 ? "through these marks" : "through the middle of each panel";
  const how = `${over}${squared ? ", square to both seams" : ""}`;
  const part = below && { part: below.part };
  const sheet = below?.sheet ?? 1;
  const name = edge === "foot" ? "lower edge" : "upper edge";
  return [
    ...steps,
    {
      stage: "draw",
      act: { act: "curve", edge, through, ...part },
      phrase:
        edge === "head" && !below
          ? say`Draw the new head with the curve, from notch to notch ${over}, running smoothly out of the old seam. Below the notches the old seam stays as it is.`
          : say`Draw the new ${name} with the curve, from underarm to underarm ${how}.`,
      scene: { sheet, fresh: [{ weight: "cut", curves: curve }], measured: [], points: [] },
    },
    {
      stage: "draw",
      act: { act: "check", edge, ...part },
      distance: length,
      phrase:
        edge === "head" && !below
          ? say`Check with the tape on its edge: the new head measures ${length} from notch to notch.`
          : say`Check with the tape on its edge: the new ${name} measures ${length}.`,
      scene: { sheet, fresh: [], measured: [], points: [] },
    },
  ];
}

/** Marks that are set off by the same distance go in one step; those that are not set off need none. */
function alike(set: readonly SetMark[]): SetMark[][] {
  const groups: SetMark[][] = [];
  for (const mark of set) {
    if (mark.by === 0) continue;
    const found = groups.find(([first]) => Math.abs(first!.by - mark.by) < 1e-6);
    if (found) found.push(mark);
    else groups.push([mark]);
  }
  return groups;
}

/** "the middle of the head of panels 3 and 5". */
function markWords(group: readonly SetMark[], end: "head" | "foot"): string {
  const panels = group.flatMap(({ from }) => ("panel" in from ? [from.panel + 1] : []));
  const named = group.some(({ from }) => "named" in from);
  const listed =
    panels.length === 0
      ? []
      : [
          `the middle of the ${end} of ${panels.length === 1 ? `panel ${panels[0]}` : `panels ${panels.slice(0, -1).join(", ")} and ${panels.at(-1)}`}`,
        ];
  return [...listed, ...(named ? [`midway over the middle slash`] : [])].join(", and from ");
}

function setStep(group: readonly SetMark[], way: "up" | "down"): StyleStep {
  const end = way === "up" ? "head" : "foot";
  const { by } = group[0]!;
  const measured = group.map(({ at }) => ({
    from: at,
    to: { x: at.x, y: at.y + (way === "up" ? -by : by) },
  }));
  return {
    stage: "draw",
    act: { act: "set", from: group.map(({ from }) => from), way },
    distance: by,
    phrase: say`Set a mark ${by} straight ${way} the sheet from ${markWords(group, end)}.`,
    scene: { sheet: 1, fresh: [], measured, points: measured.map(({ to }) => ({ ...to, words: "" })) },
  };
}

function notchPoint(piece: SpreadPiece["piece"], id: string): Point {
  const notch = piece.notches.find((one) => one.id === id)!;
  return stretchOf(edgeOf(piece, notch.edge), notch.at, Infinity)[0]![0];
}

function notchPoints({ piece }: SpreadPiece) {
  const words: Record<string, string> = {
    front: "front",
    crown: "crown",
    back: "back",
    footCentre: "centre",
  };
  return piece.notches.map(({ id }) => ({ ...notchPoint(piece, id!), words: words[id!] ?? "" }));
}

function outlineScene({ piece }: SpreadPiece, sheet: number): StepScene {
  return {
    ...NOTHING,
    sheet,
    fresh: [{ weight: "cut", curves: piece.edges.flatMap((edge) => [...edge.curves]) }],
  };
}

/** Two rows of long stitches for each, the threads they need, and how far they are pulled up. */
export function gatherSteps(gathers: readonly Gather[]): StyleStep[] {
  return gathers.flatMap(({ words, full, pulledTo }): StyleStep[] => [
    sewing(
      say`Sew two rows of long stitches along ${words}, one each side of the seam line. Each thread wants ${full + 2 * TAIL}: the ${full} and ${TAIL} to pull by at each end.`,
    ),
    {
      ...sewing(
        say`Pull ${words} up to ${pulledTo}, and spread the gathers evenly to both sides of the middle.`,
      ),
      distance: pulledTo,
    },
  ]);
}

export function joinSteps(phrases: readonly Phrase[]): StyleStep[] {
  return phrases.map(sewing);
}

function sewing(phrase: Phrase): StyleStep {
  return { stage: "sew", act: { act: "work" }, phrase, scene: { ...NOTHING, sheet: 2 } };
}
