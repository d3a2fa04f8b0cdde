import { getCountries, getCountryCallingCode } from "libphonenumber-js/min";

export interface Country {
  /** ISO 3166 alpha-2. */
  code: string;
  name: string;
  /** Without the +. */
  callingCode: string;
}

/** Every country that has phone numbers, by name in `locale`. */
export function countries(locale = "en"): Country[] {
  const names = new Intl.DisplayNames(locale, { type: "region", fallback: "code" });
  return getCountries()
    .map((code) => ({
      code,
      name: names.of(code) ?? code,
      callingCode: getCountryCallingCode(code) as string,
    }))
    .sort((a, b) => a.name.localeCompare(b.name, locale));
}
