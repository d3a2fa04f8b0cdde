/** The checks a cutter makes on a basic sleeve. Each gives its figure, its bounds, where they come from, and what to do. */
import { type SleeveDraft } from "@/lib/drafting/basic-sleeve";
import { INCH } from "@/lib/drafting/guide";
import { say } from "@/lib/drafting/say";
import { walk, LINE_WIDTH } from "@/lib/drafting/seams";
import { FULL_ARMHOLE } from "@/lib/drafting/solve";
import {
  type Edge,
  type EdgeName,
  type FigureName,
  type Phrase,
  type SleeveAsk,
  type SleeveFigures,
} from "@/lib/drafting/types";

export type Verdict = "good" | "look" | "wrong";
/** How sure the bounds are: read in the source, worked out from it, recalled, common practice, or exact. */
export type SourceMark = "seen" | "calc" | "memory" | "practice" | "exact";

export interface Check {
  readonly id: string;
  readonly verdict: Verdict;
  readonly figure: FigureName;
  /** mm. */
  readonly value: number;
  readonly low?: number;
  readonly high?: number;
  /** What is so. */
  readonly phrase: Phrase;
  /** What to do. */
  readonly remedy: Phrase;
  readonly source: string;
  readonly mark: SourceMark;
}

interface Subject {
  readonly ask: SleeveAsk;
  readonly figures: SleeveFigures;
  readonly draft: SleeveDraft;
}

const PRACTICE = { source: "common practice, no source", mark: "practice" } as const;
const INGALLS = { source: "Ingalls, Text-Book on Domestic Art, 1911", mark: "seen" } as const;
const THREADS = { source: "Threads magazine, 2021, and Armstrong as quoted there", mark: "seen" } as const;

/** Upper arm from which the adult's ease is asked for: P5 of women, US Army survey 1989, arm girth at the armpit (seen). */
const GROWN_ARM = 254.1;

const NOTHING = say`Nothing to change.`;

/** All checks that the figures at hand allow, in the order a cutter looks. */
export function checkSleeve(ask: SleeveAsk, figures: SleeveFigures, draft: SleeveDraft): Check[] {
  const subject = { ask, figures, draft };
  return [
    bicepsEase,
    capShape,
    capThird,
    flatCapWidth,
    capWalk,
    headEase,
    balance,
    elbow,
    hemWrist,
    hemHand,
    hemArm,
    underarms,
  ].flatMap((check) => check(subject) ?? []);
}

/** `wrong` under `floor`; `look` outside low..high; a line's width of slack throughout. */
function judge(value: number, low: number, high = Infinity, floor = -Infinity): Verdict {
  if (value < floor - LINE_WIDTH) return "wrong";
  return value < low - LINE_WIDTH || value > high + LINE_WIDTH ? "look" : "good";
}

function bicepsEase({ ask: { upperArm }, figures: { biceps } }: Subject): Check | undefined {
  if (upperArm === undefined) return undefined;
  const ease = biceps - upperArm;
  const grown = upperArm >= GROWN_ARM;
  const [low, high] = grown ? [2 * INCH, 4 * INCH] : [INCH, 4 * INCH];
  const verdict = judge(ease, low, high, 0);
  const read =
    ease < 0
      ? say`The biceps line is ${biceps}, which is ${-ease} less than the arm.`
      : say`The biceps line is ${biceps} and the arm ${upperArm}: ${ease} of ease.`;
  return {
    id: "biceps-ease",
    verdict,
    figure: "biceps",
    value: ease,
    low,
    high,
    phrase: read,
    remedy:
      verdict === "good"
        ? NOTHING
        : ease < low
          ? say`Make the biceps line ${upperArm + low} or wider.`
          : say`That is ample. If no full sleeve is meant, ${upperArm + high} is enough.`,
    ...(grown ? THREADS : PRACTICE),
  };
}

function capShape({ figures: { biceps, capDepth } }: Subject): Check {
  const [low, high] = [0.25 * biceps, 0.55 * biceps];
  const verdict = judge(capDepth, low, high);
  return {
    id: "cap-shape",
    verdict,
    figure: "capDepth",
    value: capDepth,
    low,
    high,
    phrase: say`The cap is ${capDepth} deep over a biceps line of ${biceps}.`,
    remedy:
      verdict === "good"
        ? NOTHING
        : capDepth < low
          ? say`That is flat: easy to move in, with folds under the arm. For a set-in sleeve make the cap ${low} or deeper.`
          : say`That is steep: it hangs well and ties the arm down. Make the cap ${high} or less, or the biceps line wider.`,
    ...PRACTICE,
  };
}

/** "Near" is taken as within a fifth of it. */
function capThird({ ask: { armhole }, figures: { capDepth } }: Subject): Check | undefined {
  if (!armhole) return undefined;
  const third = (armhole.front + armhole.back) / 3;
  const [low, high] = [0.8 * third, 1.2 * third];
  const verdict = judge(capDepth, low, high);
  return {
    id: "cap-third",
    verdict,
    figure: "capDepth",
    value: capDepth,
    low,
    high,
    phrase: say`The cap is ${capDepth} deep; a third of the armhole is ${third}.`,
    remedy:
      verdict === "good"
        ? NOTHING
        : say`Measure the armhole and the arm again. A ${capDepth < low ? "narrower" : "wider"} biceps line brings the cap nearer to a third.`,
    source: "recalled: cap depth near a third of the armhole",
    mark: "memory",
  };
}

/**
 * The old rule is for a cap of a quarter of the armhole (Burton: 4 in for 16). A deeper cap is narrower by
 * nature, so there the rule would only cry wolf.
 */
function flatCapWidth({ ask: { armhole }, figures: { biceps, capDepth } }: Subject): Check | undefined {
  if (!armhole) return undefined;
  const whole = armhole.front + armhole.back;
  if (capDepth > whole / 4 + LINE_WIDTH) return undefined;
  const value = biceps / 2;
  const low = whole / 2;
  const verdict = judge(value, low);
  return {
    id: "flat-cap-width",
    verdict,
    figure: "biceps",
    value,
    low,
    phrase: say`Half the biceps line is ${value} and half the armhole ${low}.`,
    remedy:
      verdict === "good"
        ? NOTHING
        : say`On so flat a cap make half the biceps line ${low + INCH / 2}, never under ${low}.`,
    ...INGALLS,
  };
}

function edgeOf(draft: SleeveDraft, name: EdgeName): Edge {
  return draft.piece.edges.find((edge) => edge.name === name)!;
}

function capWalk({ ask: { armhole }, draft }: Subject): Check[] | undefined {
  if (!armhole) return undefined;
  return (["front", "back"] as const).map((side) => {
    const walked = walk({
      id: `cap-${side}`,
      sides: [
        {
          words: `the ${side} of the cap`,
          measured: edgeOf(draft, side === "front" ? "capFront" : "capBack"),
        },
        { words: `the ${side} armhole`, measured: armhole[side] },
      ],
      joining: { how: "eased" },
    });
    return {
      id: walked.id,
      verdict: walked.agrees ? "good" : "wrong",
      figure: side === "front" ? "armholeFront" : "armholeBack",
      value: walked.difference,
      low: 0,
      phrase: walked.phrase,
      remedy: walked.agrees
        ? walked.remedy
        : say`Make the cap deeper, or raise the ${side} marks, until this half gains ${-walked.difference} and its ease.`,
      source: "the walk: both measured on the draft",
      mark: "exact",
    };
  });
}

function headEase({ ask: { armhole, cloth }, draft }: Subject): Check | undefined {
  if (!armhole) return undefined;
  const whole = armhole.front + armhole.back;
  const value = draft.lengths.cap - whole;
  const scale = Math.min(1, whole / FULL_ARMHOLE);
  const knit = cloth === "knit";
  const [low, high] = knit ? [0, INCH * scale] : [INCH * scale, INCH * 1.5 * scale];
  const verdict = judge(value, low, high, 0);
  return {
    id: "head-ease",
    verdict,
    figure: "headEase",
    value,
    low,
    high,
    phrase:
      value < 0
        ? say`The cap seam is ${draft.lengths.cap}, which is ${-value} shorter than the armhole.`
        : say`The cap seam is ${draft.lengths.cap} and the armhole ${whole}: ${value} to ease in.`,
    remedy:
      verdict === "good"
        ? NOTHING
        : value < low
          ? say`Make the cap deeper or the biceps line wider, until the ease is ${low} or more.`
          : say`More than ${high} puckers in ${knit ? "knit" : "woven"} cloth. Make the cap flatter, or gather the head.`,
    ...(scale < 1 || knit
      ? { source: `${THREADS.source}, less for a small armhole and for knits`, mark: "practice" }
      : THREADS),
  };
}

function balance({ ask: { armhole }, draft: { lengths } }: Subject): Check | undefined {
  if (!armhole) return undefined;
  const front = lengths.capFront - armhole.front;
  const back = lengths.capBack - armhole.back;
  const value = Math.abs(front - back);
  const high = INCH / 2;
  const verdict = judge(value, 0, high);
  const [full, lean] = front > back ? ["front", "back"] : ["back", "front"];
  return {
    id: "balance",
    verdict,
    figure: "armhole",
    value,
    high,
    phrase: say`The ${full} has ${value} more ease than the ${lean}.`,
    remedy:
      verdict === "good"
        ? NOTHING
        : say`Set the shoulder mark ${value / 2} from the crown towards the ${full}, or raise the ${lean} marks.`,
    ...PRACTICE,
  };
}

function elbow({ ask: { elbowGirth }, figures }: Subject): Check | undefined {
  if (elbowGirth === undefined || !figures.elbow) return undefined;
  const value = figures.elbow.width;
  const low = elbowGirth + INCH;
  const verdict = judge(value, low, Infinity, elbowGirth);
  return {
    id: "elbow",
    verdict,
    figure: "elbowWidth",
    value,
    low,
    phrase: say`The elbow line is ${value} and the elbow ${elbowGirth}.`,
    remedy:
      verdict === "good" ? NOTHING : say`Make the elbow line ${low} or wider, or the arm will not bend.`,
    ...INGALLS,
  };
}

/** Long enough to pass the elbow; with no elbow taken, longer than it is wide. */
export function passesElbow({
  ask: { elbowDepth },
  figures: { length, biceps },
}: Pick<Subject, "ask" | "figures">): boolean {
  return length > (elbowDepth ?? 1.2 * biceps);
}

function hemWrist(subject: Subject): Check | undefined {
  const { wrist } = subject.ask;
  if (wrist === undefined || !passesElbow(subject)) return undefined;
  const value = subject.figures.hem;
  const low = wrist + INCH;
  const verdict = judge(value, low, Infinity, wrist);
  return {
    id: "hem-wrist",
    verdict,
    figure: "hem",
    value,
    low,
    phrase: say`The hem is ${value} and the wrist ${wrist}.`,
    remedy: verdict === "good" ? NOTHING : say`Make the hem ${low} or wider.`,
    ...INGALLS,
  };
}

function hemHand({ ask: { hand, opening }, figures: { hem } }: Subject): Check | undefined {
  if (hand === undefined || opening) return undefined;
  const verdict = judge(hem, hand, Infinity, hand);
  return {
    id: "hem-hand",
    verdict,
    figure: "hem",
    value: hem,
    low: hand,
    phrase: say`The hem is ${hem}, the hand ${hand}, and there is no opening.`,
    remedy: verdict === "good" ? NOTHING : say`Make the hem ${hand} or wider, or give it an opening.`,
    ...INGALLS,
  };
}

function hemArm(subject: Subject): Check | undefined {
  const { upperArm } = subject.ask;
  if (upperArm === undefined || passesElbow(subject)) return undefined;
  const { hem } = subject.figures;
  const verdict = judge(hem, upperArm, Infinity, upperArm);
  return {
    id: "hem-arm",
    verdict,
    figure: "hem",
    value: hem,
    low: upperArm,
    phrase: say`The hem lies on the upper arm. It is ${hem} and the arm ${upperArm}.`,
    remedy: verdict === "good" ? NOTHING : say`Make the hem ${upperArm} or wider.`,
    ...PRACTICE,
  };
}

function underarms({ draft }: Subject): Check {
  const walked = walk({
    id: "underarms",
    sides: [
      { words: "the front underarm seam", measured: edgeOf(draft, "underarmFront") },
      { words: "the back one", measured: edgeOf(draft, "underarmBack") },
    ],
    joining: { how: "equal" },
  });
  return {
    id: walked.id,
    verdict: walked.agrees ? "good" : "wrong",
    figure: "length",
    value: walked.difference,
    low: 0,
    high: 0,
    phrase: walked.phrase,
    remedy: walked.remedy,
    source: "the walk: both measured on the draft",
    mark: "exact",
  };
}
