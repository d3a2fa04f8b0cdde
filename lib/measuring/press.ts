/** What each key does to a set that is being taken. Pure; never throws, whatever is pressed in whatever order. */
import { type MeasureKey } from "@/lib/figures/body-measures";
import {
  addDigit,
  ENTRY_AT_MOST,
  entryOf,
  eraseLast,
  readEntry,
  setPart,
  typedAgain,
  unitTyped,
} from "@/lib/measuring/entry";
import { meantFigure, openQuestionsAbout } from "@/lib/measuring/questions";
import { type Known, type TakenHere, type Taking, withKeys } from "@/lib/measuring/taking";
import { type Unit } from "@/lib/records/types";

export type Press =
  | { do: "digit"; digit: number }
  /** Eighths, sixteenths or tenths: finishes the figure. 0 finishes it as a whole. */
  | { do: "part"; over: number; under: 8 | 16 | 10 }
  | { do: "type"; text: string }
  | { do: "erase" | "clear" | "next" | "same" | "skip" | "back" }
  | { do: "go"; to: MeasureKey | "review" }
  | { do: "unit"; unit: Unit }
  /** Answers to a question: it is right, take it again, take it in the unit that was meant. */
  | { do: "right" | "again" | "meant" }
  | { do: "settle"; sign: string }
  | { do: "add"; key: MeasureKey }
  | { do: "say"; patch: Partial<Pick<Taking, "takenOn" | "takenBy" | "note">> };

export function press(taking: Taking, key: Press, known: Known): Taking {
  switch (key.do) {
    case "say":
      return { ...taking, ...key.patch };
    case "unit":
      return { ...taking, unit: key.unit, problem: null };
    case "settle":
      return { ...taking, settled: [...new Set([...taking.settled, key.sign])] };
    case "add":
      return goTo(withKeys(taking, [key.key]), key.key, known);
    case "go":
      return goTo(taking, key.to, known);
    case "back":
      return goTo(taking, beforeThis(taking), known);
  }
  if (taking.at === "review") return taking;
  if (taking.held) return answer(taking, taking.at, key.do, known);
  return onPad(taking, taking.at, key, known);
}

function onPad(taking: Taking, at: MeasureKey, key: Press, known: Known): Taking {
  const { entry, taken } = taking;
  const typing = (text: string): Taking => ({ ...taking, entry: text, problem: null });
  switch (key.do) {
    case "digit":
      return typing(addDigit(entry, key.digit));
    case "type":
      return typing(key.text.slice(0, ENTRY_AT_MOST).trimStart());
    case "part": {
      const text = setPart(entry, key.over, key.under);
      if (text !== null) return finish({ ...taking, entry: text }, at, known);
      const [whole, part] = key.under === 10 ? ["centimetres", "millimetres"] : ["inches", "part of an inch"];
      return { ...taking, problem: `First the whole ${whole}, then the ${part}.` };
    }
    case "erase":
      if (entry !== "") return typing(eraseLast(entry));
      return taken[at] ? typing(eraseLast(entryOf(taken[at].typed, taking.unit))) : taking;
    case "clear":
      return entry !== "" ? typing("") : without(taking, at);
    case "same": {
      const figure = known.previous[at];
      return figure ? take(taking, at, sameFigure(figure, known), known) : taking;
    }
    case "next":
      if (entry !== "") return finish(taking, at, known);
      if (taken[at]) return moveOn(taking);
      return { ...taking, problem: "Type the figure first, or press Skip." };
    case "skip":
      if (entry !== "") return finish(taking, at, known);
      if (taken[at]) return moveOn(taking);
      return moveOn({ ...taking, skipped: [...new Set([...taking.skipped, at])] });
    default:
      return taking;
  }
}

function answer(taking: Taking, at: MeasureKey, what: Press["do"], known: Known): Taking {
  if (what === "again") return { ...without(taking, at), held: false };
  if (what === "right") {
    const signs = openQuestionsAbout(taking, at, known).map(({ sign }) => sign);
    return moveOn({ ...taking, held: false, settled: [...new Set([...taking.settled, ...signs])] });
  }
  if (what === "meant") {
    const figure = meantFigure(taking, at, known);
    return figure ? take(taking, at, figure, known) : taking;
  }
  // Left without an answer, the question waits at the review.
  return what === "next" || what === "skip" ? moveOn({ ...taking, held: false }) : taking;
}

function sameFigure(figure: { typed: string; mm: number }, { bookUnit }: Known): TakenHere {
  const typed = typedAgain(figure, bookUnit);
  return { typed, mm: figure.mm, unit: unitTyped(typed, bookUnit) };
}

function without(taking: Taking, at: MeasureKey): Taking {
  const taken = { ...taking.taken };
  delete taken[at];
  return { ...taking, taken, entry: "", problem: null };
}

/** Reads the entry into the figure, or says why not. */
function put(taking: Taking, at: MeasureKey, known: Known): Taking {
  const read = readEntry(taking.entry, taking.unit, known.bookUnit);
  if (!read.ok) return { ...taking, problem: read.say };
  const { typed, mm, unit } = read;
  return withFigure(taking, at, { typed, mm, unit });
}

function withFigure(taking: Taking, at: MeasureKey, figure: TakenHere): Taking {
  return {
    ...taking,
    entry: "",
    problem: null,
    taken: { ...taking.taken, [at]: figure },
    skipped: taking.skipped.filter((key) => key !== at),
  };
}

function finish(taking: Taking, at: MeasureKey, known: Known): Taking {
  return askOrMoveOn(put(taking, at, known), at, known);
}

function take(taking: Taking, at: MeasureKey, figure: TakenHere, known: Known): Taking {
  return askOrMoveOn(withFigure(taking, at, figure), at, known);
}

function askOrMoveOn(taking: Taking, at: MeasureKey, known: Known): Taking {
  if (taking.problem !== null) return taking;
  if (openQuestionsAbout(taking, at, known).length > 0) return { ...taking, held: true };
  return moveOn({ ...taking, held: false });
}

/** To the next figure that is neither taken nor skipped, round from here; after the last one, to the review. */
function moveOn(taking: Taking): Taking {
  const here = taking.keys.indexOf(taking.at as MeasureKey) + 1;
  const round = [...taking.keys.slice(here), ...taking.keys.slice(0, here)];
  const next = round.find((key) => !taking.taken[key] && !taking.skipped.includes(key));
  return { ...taking, at: next ?? "review", entry: "", problem: null, held: false };
}

function beforeThis({ keys, at }: Taking): MeasureKey | "review" {
  if (at === "review") return keys.at(-1) ?? "review";
  return keys[Math.max(0, keys.indexOf(at) - 1)] ?? at;
}

/** To another figure. What was being typed is taken first; where it cannot be read, one stays with it. */
function goTo(taking: Taking, to: MeasureKey | "review", known: Known): Taking {
  if (to !== "review" && !taking.keys.includes(to)) return taking;
  const settled = taking.at !== "review" && taking.entry !== "" ? put(taking, taking.at, known) : taking;
  if (settled.problem !== null && settled.entry !== "") return settled;
  return { ...settled, at: to, held: false, problem: null };
}
