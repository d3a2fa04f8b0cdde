/** What is said of a sleeve before anything else: whether it goes into the armhole. */
import { type Check, type Gather, type StyleCheck, type Verdict } from "@/lib/drafting";
import { ratioWords } from "@/lib/drafting/seams";
import { type Phrase } from "@/lib/lengths/phrase";
import { type SleeveAskRecord } from "@/lib/records/types";
import { failingSeams, type GoodSleeve, type StyledSleeve } from "@/lib/sleeves/make-style-from-record";

export interface HeadLine {
  /** "plain": nothing is known of the armhole. */
  verdict: Verdict | "plain";
  phrase: Phrase;
}

/** mm of the armhole that the record knows. */
export function armholeOfRecord({ lengths }: SleeveAskRecord): number | undefined {
  const { armholeBack, armholeFront, armholeWhole } = lengths;
  if (armholeFront && armholeBack) return armholeFront.mm + armholeBack.mm;
  return armholeWhole?.mm;
}

export function headLine(made: StyledSleeve, record: SleeveAskRecord): HeadLine {
  if (!made.ok)
    return { verdict: "wrong", phrase: ["Cannot be drawn. ", ...(made.problems[0]?.phrase ?? [])] };
  const head = made.gathers.find(({ id }) => id === "head");
  const line = head ? gatheredHead(made, record, head) : easedHead(made, record);
  if (line.verdict === "wrong") return line;
  const [failing] = failingSeams(made);
  if (failing) return { verdict: "wrong", phrase: ["Does not go together: ", ...failing.phrase] };
  return line;
}

const starting = (words: string): string => `${words[0]!.toUpperCase()}${words.slice(1)}`;

/** "1.7 : 1", not to be broken. */
export function ratioOf({ full, pulledTo }: Pick<Gather, "full" | "pulledTo">): string {
  return ratioWords(full / pulledTo).replaceAll(" ", "\u00A0");
}

/** The fullness is gathered away, so that it is the gathers that say whether it goes in. */
function gatheredHead({ checks }: GoodSleeve, record: SleeveAskRecord, head: Gather): HeadLine {
  const into: Phrase = [", ", { mm: head.full }, " into ", { mm: head.pulledTo }];
  const check = checks.find(({ id }) => id === "gather-head");
  if (check?.verdict === "wrong")
    return {
      verdict: "wrong",
      phrase: [
        "Does not go in: the head ",
        { mm: head.full },
        " is too short for ",
        { mm: head.pulledTo },
        ".",
      ],
    };
  if (armholeOfRecord(record) === undefined)
    return {
      verdict: "plain",
      phrase: [`Head gathered ${ratioOf(head)}. Type the armhole below to see whether it goes in.`],
    };
  const look = check?.verdict === "look";
  const how = look ? (head.full < (check.low ?? 0) ? " – hardly gathered" : " – much for the cloth") : "";
  return {
    verdict: look ? "look" : "good",
    phrase: [`Goes in: head gathered ${ratioOf(head)}`, ...into, `${how}.`],
  };
}

/** The cap is eased into the armhole. */
function easedHead(made: GoodSleeve, record: SleeveAskRecord): HeadLine {
  // A style's own seam may be a part of both: a cap sleeve has nothing under the arm.
  const seam = made.seams.find(({ id }) => id === "head");
  const [cap, armhole] = seam?.lengths ?? [made.draft.lengths.cap, armholeOfRecord(record)];
  if (armhole === undefined)
    return {
      verdict: "plain",
      phrase: ["Cap seam ", { mm: cap }, ". Type the armhole below to see whether it goes in."],
    };
  const measured: Phrase = [": cap ", { mm: cap }, ", armhole ", { mm: armhole }, ", "];
  const ease = cap - armhole;
  const found = (id: string) => made.checks.find((check) => check.id === id);
  const head = found("head-ease");
  if (head?.verdict === "wrong")
    return {
      verdict: "wrong",
      phrase: ["Does not go into the armhole", ...measured, { mm: -ease }, " too short."],
    };
  const half = [found("cap-front"), found("cap-back")].find((check) => check?.verdict === "wrong");
  if (half)
    return {
      verdict: "wrong",
      phrase: [
        `Does not go into the armhole: the ${half.id === "cap-front" ? "front" : "back"} of the cap is `,
        { mm: Math.abs(half.value) },
        " shorter than its half of the armhole.",
      ],
    };
  const look = head?.verdict === "look";
  const verdict = look ? "look" : "good";
  const how = look ? (ease < (head.low ?? 0) ? " – little" : " – much") : "";
  const [gather] = made.gathers;
  if (gather)
    return {
      verdict,
      phrase: [
        "Goes in, ease ",
        { mm: ease },
        `${how}. ${starting(gather.words)} gathered ${ratioOf(gather)}.`,
      ],
    };
  return { verdict, phrase: ["Goes into the armhole", ...measured, "ease ", { mm: ease }, `${how}.`] };
}

/** Checks sorted for reading: what is wrong first. The cutter's order stands within each. */
export function sortedChecks(checks: readonly StyleCheck[]): Record<Verdict, StyleCheck[]> {
  const of = (verdict: Verdict) => checks.filter((check) => check.verdict === verdict);
  return { wrong: of("wrong"), look: of("look"), good: of("good") };
}

/** "1 wrong, 2 to look at, 8 good". */
export function countLine(checks: readonly StyleCheck[]): string {
  const { good, look, wrong } = sortedChecks(checks);
  return [
    wrong.length > 0 && `${wrong.length} wrong`,
    look.length > 0 && `${look.length} to look at`,
    good.length > 0 && `${good.length} good`,
  ]
    .filter(Boolean)
    .join(", ");
}

const markWords = {
  seen: "read in the source",
  calc: "worked out from the source",
  memory: "from memory",
  practice: "common practice, no source",
  exact: "exact",
} as const;

/** Where a check's bounds come from, and how sure they are. */
export function sourceLine({ mark, source }: Pick<Check, "source" | "mark">): string {
  const words = markWords[mark];
  return source.includes(words) ? source : `${source} (${words})`;
}

/** The bounds of a check: "between … and …", "… or more", "… or less"; empty where it has none to show. */
export function boundsPhrase({ high, low }: Pick<Check, "low" | "high">): Phrase {
  const least = low !== undefined && Number.isFinite(low) ? low : undefined;
  const most = high !== undefined && Number.isFinite(high) ? high : undefined;
  if (least !== undefined && most !== undefined)
    return most - least < 1e-9 ? [] : ["Between ", { mm: least }, " and ", { mm: most }, "."];
  if (least !== undefined) return [{ mm: least }, " or more."];
  if (most !== undefined) return [{ mm: most }, " or less."];
  return [];
}
