import {
  type CountryCode,
  getCountryCallingCode,
  isSupportedCountry,
  parsePhoneNumberFromString,
} from "libphonenumber-js/min";
import { westernDigits } from "@/lib/lengths/western-digits";

export interface ReadPhone {
  /** To the letter. */
  typed: string;
  /** E.164, `^\+[1-9]\d{1,14}$`; absent where the number could not be read. */
  e164?: string;
  /** As people of `country` write it, or with its country code if it is from elsewhere; else as typed. */
  display: string;
  /** What to look at, where the number could not be read; it is kept as typed all the same. */
  say?: string;
}

/**
 * Reads a phone number as typed by someone in `country` (ISO 3166 alpha-2). Never throws, refuses nothing; empty text is
 * answered without a remark.
 */
export function readPhone(text: string, country: string): ReadPhone {
  const plain = westernDigits(text).trim();
  if (plain === "") return { typed: text, display: "" };
  const home: CountryCode | undefined = isSupportedCountry(country) ? country : undefined;
  const number = parsePhoneNumberFromString(plain, { defaultCountry: home, extract: false });
  if (number?.isValid()) {
    // Countries that share a calling code (+1, +44, +7) need the whole tables to be told apart; the code alone does here.
    const abroad = home === undefined || number.countryCallingCode !== getCountryCallingCode(home);
    return {
      typed: text,
      e164: number.number,
      display: abroad ? number.formatInternational() : number.formatNational(),
    };
  }
  return {
    typed: text,
    display: text.trim(),
    say: "This does not read as a whole phone number, and is kept as typed. Type all its figures, from another country with + and the country code.",
  };
}
