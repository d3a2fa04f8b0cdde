/** Every sewing sum, and the one way to work one. */
import { say } from "@/lib/drafting/say";
import { biasStrip } from "./bias-strip";
import { buttons } from "./buttons";
import { circleSkirt } from "./circle-skirt";
import { cuffBand } from "./cuff-band";
import { elastic } from "./elastic";
import { pleats } from "./pleats";
import { ringFlounce } from "./ring-flounce";
import { ruffle } from "./ruffle";
import { type SewingSum, type SumField, type SumInputs, type SumProblem, type SumWorked } from "./types";

export type {
  SewingSum,
  SumDrawing,
  SumField,
  SumId,
  SumInputs,
  SumProblem,
  SumResult,
  SumWorked,
} from "./types";
export { upToStep } from "./marks";

export const sewingSums: readonly SewingSum[] = [
  ruffle,
  ringFlounce,
  circleSkirt,
  pleats,
  elastic,
  biasStrip,
  buttons,
  cuffBand,
];

/** The sum with this id; undefined where there is none, for example one of a newer version. */
export const sewingSum = (id: string | null): SewingSum | undefined =>
  sewingSums.find((sum) => sum.id === id);

/** The fields that are asked for, as far as it is filled in. */
export const fieldsAsked = (sum: SewingSum, inputs: SumInputs): SumField[] =>
  sum.fields.filter(({ when }) => when?.(inputs) ?? true);

function problemOf(field: SumField, value: number | string | undefined): SumProblem | null {
  const { key, label } = field;
  if (value === undefined || value === "")
    return field.optional
      ? null
      : { field: key, say: say`${field.kind === "choice" ? "Choose" : "Type"} ${lower(label)}.` };
  if (field.kind === "choice")
    return field.options.some((option) => option.value === value)
      ? null
      : {
          field: key,
          say: say`Choose one of ${field.options.map((option) => lower(option.label)).join(", ")}.`,
        };
  if (typeof value !== "number" || !Number.isFinite(value))
    return { field: key, say: say`Type ${lower(label)} as a number.` };
  if (field.kind === "count" && !Number.isInteger(value))
    return {
      field: key,
      say: say`Type a whole number, such as ${String(Math.max(field.least, Math.round(value)))}.`,
    };
  const bound = (at: number) => (field.kind === "length" ? at : String(at));
  if (value < field.least)
    return { field: key, say: say`That is too little. Type ${bound(field.least)} or more.` };
  if (value > field.most)
    return { field: key, say: say`That is too much. Type ${bound(field.most)} or less.` };
  return null;
}

const lower = (label: string): string => label.charAt(0).toLowerCase() + label.slice(1);

/**
 * Works a sum. Never throws for what is put in: what is missing, out of bounds or cannot be is told field by field.
 * @param inputs lengths in mm; see `SumInputs`. What is not asked for is not looked at.
 * @param step see `SewingSum.work`. Default 0: full precision.
 */
export function workSum(sum: SewingSum, inputs: SumInputs, step = 0): SumWorked {
  const asked = fieldsAsked(sum, inputs);
  const problems = asked.flatMap((field) => problemOf(field, inputs[field.key]) ?? []);
  if (problems.length > 0) return { ok: false, problems };
  return sum.work(Object.fromEntries(asked.map(({ key }) => [key, inputs[key]])), step);
}
