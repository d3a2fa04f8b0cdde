import { westernDigits } from "@/lib/lengths/western-digits";

export interface PhoneLinks {
  call: string;
  message: string;
}

/** The shortest numbers that can be rung have three figures. */
const FEWEST_FIGURES = 3;

/** What rings a client and what writes to one; null where nothing typed can be dialled. */
export function phoneLinks(phone: string, e164: string | null): PhoneLinks | null {
  const number =
    e164 ??
    westernDigits(phone)
      .replace(/[^\d+]/gu, "")
      .replace(/(?!^)\+/gu, "");
  if (number.replace(/\D/gu, "").length < FEWEST_FIGURES) return null;
  return { call: `tel:${number}`, message: `sms:${number}` };
}
