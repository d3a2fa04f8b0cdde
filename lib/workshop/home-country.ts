/** What a first visit can leave unasked: country from the phone's languages, and from that the currency and the unit. */
import { type Unit } from "@/lib/records/types";

/** ISO 4217 code, then the ISO 3166 codes of the countries that pay in it (ISO 4217 list one, from memory). */
const countriesByCurrency: Readonly<Record<string, string>> = {
  EUR: "AD AT AX BE BG BL CY DE EE ES FI FR GF GP GR HR IE IT LT LU LV MC ME MF MQ MT NL PM PT RE SI SK SM VA XK YT",
  USD: "AS BQ EC FM GU IO MH MP PR PW SV TC TL US VG VI",
  GBP: "GB GG IM JE",
  AUD: "AU CC CX KI NF NR TV",
  NZD: "CK NU NZ PN TK",
  CHF: "CH LI",
  DKK: "DK FO GL",
  NOK: "BV NO SJ",
  XOF: "BF BJ CI GW ML NE SN TG",
  XAF: "CF CG CM GA GQ TD",
  XCD: "AG AI DM GD KN LC MS VC",
  XPF: "NC PF WF",
  ILS: "IL PS",
  MAD: "EH MA",
  AED: "AE",
  AFN: "AF",
  ALL: "AL",
  AMD: "AM",
  AOA: "AO",
  ARS: "AR",
  AWG: "AW",
  AZN: "AZ",
  BAM: "BA",
  BBD: "BB",
  BDT: "BD",
  BHD: "BH",
  BIF: "BI",
  BMD: "BM",
  BND: "BN",
  BOB: "BO",
  BRL: "BR",
  BSD: "BS",
  BTN: "BT",
  BWP: "BW",
  BYN: "BY",
  BZD: "BZ",
  CAD: "CA",
  CDF: "CD",
  CLP: "CL",
  CNY: "CN",
  COP: "CO",
  CRC: "CR",
  CUP: "CU",
  CVE: "CV",
  CZK: "CZ",
  DJF: "DJ",
  DOP: "DO",
  DZD: "DZ",
  EGP: "EG",
  ERN: "ER",
  ETB: "ET",
  FJD: "FJ",
  FKP: "FK",
  GEL: "GE",
  GHS: "GH",
  GIP: "GI",
  GMD: "GM",
  GNF: "GN",
  GTQ: "GT",
  GYD: "GY",
  HKD: "HK",
  HNL: "HN",
  HTG: "HT",
  HUF: "HU",
  IDR: "ID",
  INR: "IN",
  IQD: "IQ",
  IRR: "IR",
  ISK: "IS",
  JMD: "JM",
  JOD: "JO",
  JPY: "JP",
  KES: "KE",
  KGS: "KG",
  KHR: "KH",
  KMF: "KM",
  KPW: "KP",
  KRW: "KR",
  KWD: "KW",
  KYD: "KY",
  KZT: "KZ",
  LAK: "LA",
  LBP: "LB",
  LKR: "LK",
  LRD: "LR",
  LSL: "LS",
  LYD: "LY",
  MDL: "MD",
  MGA: "MG",
  MKD: "MK",
  MMK: "MM",
  MNT: "MN",
  MOP: "MO",
  MRU: "MR",
  MUR: "MU",
  MVR: "MV",
  MWK: "MW",
  MXN: "MX",
  MYR: "MY",
  MZN: "MZ",
  NAD: "NA",
  NGN: "NG",
  NIO: "NI",
  NPR: "NP",
  OMR: "OM",
  PAB: "PA",
  PEN: "PE",
  PGK: "PG",
  PHP: "PH",
  PKR: "PK",
  PLN: "PL",
  PYG: "PY",
  QAR: "QA",
  RON: "RO",
  RSD: "RS",
  RUB: "RU",
  RWF: "RW",
  SAR: "SA",
  SBD: "SB",
  SCR: "SC",
  SDG: "SD",
  SEK: "SE",
  SGD: "SG",
  SHP: "SH",
  SLE: "SL",
  SOS: "SO",
  SRD: "SR",
  SSP: "SS",
  STN: "ST",
  SYP: "SY",
  SZL: "SZ",
  THB: "TH",
  TJS: "TJ",
  TMT: "TM",
  TND: "TN",
  TOP: "TO",
  TRY: "TR",
  TTD: "TT",
  TWD: "TW",
  TZS: "TZ",
  UAH: "UA",
  UGX: "UG",
  UYU: "UY",
  UZS: "UZ",
  VES: "VE",
  VND: "VN",
  VUV: "VU",
  WST: "WS",
  YER: "YE",
  ZAR: "ZA",
  ZMW: "ZM",
  ZWG: "ZW",
};

const currencyByCountry: ReadonlyMap<string, string> = new Map(
  Object.entries(countriesByCurrency).flatMap(([code, countries]) =>
    countries.split(" ").map((country) => [country, code] as const),
  ),
);

/** Where home dressmakers' tapes are read in inches: common practice, no source. Only a first choice, asked for at once. */
const inInches = new Set(
  "AG BB BD BS BZ CA DM GB GD GG GH GM GY IM IN JE JM KN LC LK LR MM NG NP PK SL TT US VC".split(" "),
);

const FALLBACK = "GB";

/** The country of the first language that names one, else the likeliest one of the first language. ISO 3166 alpha-2. */
export function guessCountry(languages: readonly string[]): string {
  const locales = languages.flatMap((tag) => {
    try {
      return [new Intl.Locale(tag)];
    } catch {
      return [];
    }
  });
  const named = locales.find(({ region }) => region && currencyByCountry.has(region));
  const likely = named?.region ?? locales[0]?.maximize().region;
  return likely && currencyByCountry.has(likely) ? likely : FALLBACK;
}

/** ISO 4217 code of what people of a country pay in. */
export function guessCurrency(country: string): string {
  return currencyByCountry.get(country) ?? "EUR";
}

export function guessUnit(country: string): Unit {
  return inInches.has(country) ? "in" : "cm";
}
