/** What the app may use of the drafting engine. Pure: lengths in mm, nothing rounded, nothing read or written. */
export type {
  CubicBezier,
  EdgeName,
  FigureName,
  GuideMark,
  Phrase,
  Piece,
  Point,
  Result,
  Side,
  SleeveAsk,
  SleeveFigures,
} from "@/lib/drafting/types";
export type { LineName, PointName, SleeveDraft } from "@/lib/drafting/basic-sleeve";
export type { Check, Verdict } from "@/lib/drafting/checks";
export type { MadeStyle } from "@/lib/drafting/make-style";
export type {
  Cloth,
  Gather,
  PatternPiece,
  StyleCheck,
  StyleProblem,
  StyleStep,
} from "@/lib/drafting/pattern";
export type { StyleFigure } from "@/lib/drafting/styles/context";
export { makeStyle } from "@/lib/drafting/make-style";
export { recipes } from "@/lib/drafting/styles";
export type { MarkStep } from "@/lib/drafting/mark-steps";
export { draftBasicSleeve } from "@/lib/drafting/basic-sleeve";
export { defaultBeside, defaultMarks, defaultNotches, INCH } from "@/lib/drafting/guide";
export { makeSleeve, remakeSleeve } from "@/lib/drafting/make-sleeve";
export { markSteps } from "@/lib/drafting/mark-steps";
export { area, bounds, edgeLength, pointAt, splitAt } from "@/lib/drafting/measure";
export { roundFigures } from "@/lib/drafting/round";
export { walk } from "@/lib/drafting/seams";
export { capDepthShares, solveCapDepth, usualHeadEase } from "@/lib/drafting/solve";
