/** The forms that ask about the workshop: the short one at the start, the whole one under Workshop. */
import { z } from "zod";
import { currency } from "@/lib/money/currencies";
import { type Workshop, type WorkshopFields } from "@/lib/records/types";
import { oneLine } from "./begin-fields";

const NAME_AT_MOST = 80;

const shared = {
  name: z
    .string()
    .refine((name) => name.trim() !== "", "Type a name for the workshop; your own name will do.")
    .refine(
      (name) => [...name.trim()].length <= NAME_AT_MOST,
      `Type a name of at most ${NAME_AT_MOST} letters: it has to fit at the head of a receipt.`,
    ),
  currency: z
    .string()
    .refine((code) => currency(code) !== undefined, "Choose the currency that clients pay in."),
  unit: z.enum(["in", "cm"], "Choose inches or centimetres."),
};

export const startSchema = z.object(shared);
export type StartValues = z.infer<typeof startSchema>;

export const workshopSchema = z.object({
  ...shared,
  address: z.string(),
  phone: z.string(),
  country: z.string().regex(/^[A-Z]{2}$/, "Choose the country of the workshop."),
  fineness: z.enum(["8", "16"], "Choose eighths or sixteenths."),
});
export type WorkshopValues = z.infer<typeof workshopSchema>;

export function workshopValues(workshop: Workshop): WorkshopValues {
  const { name, address, phone, country, currency: code, unit, fineness } = workshop;
  return { name, address, phone, country, currency: code, unit, fineness: fineness === 16 ? "16" : "8" };
}

export function workshopFields(values: WorkshopValues): Omit<WorkshopFields, "demo"> {
  return {
    name: oneLine(values.name),
    address: values.address.trim(),
    phone: values.phone.trim(),
    country: values.country,
    currency: values.currency,
    unit: values.unit,
    fineness: values.fineness === "16" ? 16 : 8,
  };
}
