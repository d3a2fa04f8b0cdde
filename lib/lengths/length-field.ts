import { z } from "zod";
import { type Unit } from "@/lib/records/types";
import { type LengthLimits, parseLength } from "@/lib/lengths/parse-length";

/** A form field that reads a typed length: a string in, `{ typed, mm }` out, the refusal's sentence as the message. */
export function lengthField(unit: Unit, limits: LengthLimits = {}) {
  return z.string().transform((text, context): { typed: string; mm: number } => {
    const read = parseLength(text, unit, limits);
    if (read.ok) return { typed: read.typed, mm: read.mm };
    context.issues.push({ code: "custom", message: read.say, input: text });
    return z.NEVER;
  });
}
