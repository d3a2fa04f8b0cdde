/** What a screen reader says after a key: what is typed, what was taken, what comes next. */
import { bodyMeasure } from "@/lib/figures/body-measures";
import { speakLength } from "@/lib/lengths/speak-length";
import { parseLength } from "@/lib/lengths/parse-length";
import { shownEntry } from "@/lib/measuring/entry";
import { openQuestionsAbout } from "@/lib/measuring/questions";
import { type Known, type Taking } from "@/lib/measuring/taking";
import { type Fineness } from "@/lib/records/types";

const sentence = (words: string): string => `${words[0]!.toUpperCase()}${words.slice(1)}.`;

function entryWords({ entry, unit }: Taking): string {
  const read = parseLength(entry, unit);
  return read.ok && "whole" in shownEntry(entry, unit) ? speakLength(read.mm, unit, 16) : entry;
}

/** Empty where there is nothing to say. Refusals are said by the field itself. */
export function announce(before: Taking, after: Taking, known: Known, fineness: Fineness): string {
  const said: string[] = [];
  const figure = before.at === "review" ? undefined : after.taken[before.at];
  const old = before.at === "review" ? undefined : before.taken[before.at];
  if (figure && (figure.mm !== old?.mm || figure.typed !== old?.typed) && before.at !== "review")
    said.push(
      sentence(
        `${bodyMeasure(before.at).name.toLowerCase()} ${speakLength(figure.mm, figure.unit, fineness)}`,
      ),
    );
  if (after.held && after.at !== "review" && !before.held) {
    for (const { say } of openQuestionsAbout(after, after.at, known))
      said.push(
        say
          .map((part) => (typeof part === "string" ? part : speakLength(part.mm, after.unit, fineness)))
          .join(""),
      );
  } else if (after.at !== before.at) {
    if (after.at === "review") said.push("All figures are through. Look them over.");
    else
      said.push(
        `Now ${bodyMeasure(after.at).name.toLowerCase()}, ${after.keys.indexOf(after.at) + 1} of ${after.keys.length}.`,
      );
  } else if (after.entry !== before.entry)
    said.push(after.entry === "" ? "Empty." : sentence(entryWords(after)));
  else if (after.unit !== before.unit)
    said.push(after.unit === "in" ? "Counting in inches." : "Counting in centimetres.");
  else if (old && !figure) said.push("Taken away.");
  return said.join(" ");
}
