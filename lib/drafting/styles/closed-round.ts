/** A seam that runs closed round the arm: the hand goes through it, or the arm fills it. */
import { passesElbow } from "@/lib/drafting/checks";
import { type StyleCheck } from "@/lib/drafting/pattern";
import { say } from "@/lib/drafting/say";
import { LINE_WIDTH } from "@/lib/drafting/seams";
import { type StyleGround } from "@/lib/drafting/styles/context";

/**
 * The round of such a seam against the hand, and above the elbow against the upper arm, as far as these are known. `level`
 * is its depth below the crown, `figure` the figure that sets it.
 */
export function closedRound(
  { ask, figures }: StyleGround,
  { words, round, level, figure }: { words: string; round: number; level: number; figure: string },
): StyleCheck[] {
  const onUpperArm = !passesElbow({ ask, figures: { ...figures, length: level } });
  const start = words[0]!.toUpperCase() + words.slice(1);
  const against = (id: string, low: number, of: string): StyleCheck => {
    const fits = round >= low - LINE_WIDTH;
    return {
      id: `round-${id}`,
      verdict: fits ? "good" : "wrong",
      figure,
      value: round,
      low,
      phrase: say`${start} runs closed round the arm. It measures ${round}, and ${of} ${low}.`,
      remedy: fits
        ? say`Nothing to change.`
        : say`Make the hem ${low} or wider, or join it higher up, where the sleeve is wider.`,
      source: "common practice, no source",
      mark: "practice",
    };
  };
  return [
    ...(ask.hand !== undefined && !ask.opening ? [against("hand", ask.hand, "the hand")] : []),
    ...(ask.upperArm !== undefined && onUpperArm ? [against("arm", ask.upperArm, "the upper arm")] : []),
  ];
}
