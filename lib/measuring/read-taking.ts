/** A half-taken set as it comes back off the phone: perhaps put down by an older Notchbook. */
import { z } from "zod";
import { isMeasureKey, type MeasureKey } from "@/lib/figures/body-measures";
import { type Taking } from "@/lib/measuring/taking";

const measureKey = z.custom<MeasureKey>((value) => typeof value === "string" && isMeasureKey(value));
const unit = z.enum(["in", "cm"]);

const takingSchema = z
  .object({
    shape: z.literal(1),
    setId: z.guid(),
    wearerId: z.guid(),
    correctsId: z.guid().nullable(),
    unit,
    keys: z.array(measureKey),
    at: z.union([measureKey, z.literal("review")]),
    held: z.boolean(),
    entry: z.string(),
    problem: z.string().nullable(),
    taken: z.partialRecord(measureKey, z.object({ typed: z.string(), mm: z.number(), unit })),
    skipped: z.array(measureKey),
    settled: z.array(z.string()),
    startedAt: z.iso.datetime(),
    takenOn: z.string(),
    takenBy: z.string(),
    note: z.string(),
  })
  .refine(({ at, keys }) => at === "review" || keys.includes(at));

/** Null where it cannot be read. */
export function readTaking(value: unknown): Taking | null {
  const read = takingSchema.safeParse(value);
  return read.success ? (read.data satisfies Taking) : null;
}
