import { type WorkshopFields } from "@/lib/records/types";
import { type StartValues } from "./workshop-form";

export const oneLine = (text: string): string => text.trim().replace(/\s+/gu, " ");

/** A workshop as it begins. */
export function beginFields(values: StartValues, country: string): WorkshopFields {
  return {
    name: oneLine(values.name),
    unit: values.unit,
    fineness: 8,
    currency: values.currency,
    country,
    address: "",
    phone: "",
    demo: false,
  };
}
