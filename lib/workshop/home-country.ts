/** What a first visit can leave unasked: country from the phone's languages, and from that the currency and the unit. */
import { type Unit } from "@/lib/records/types";

/** ISO 4217 code, then the ISO 3166 codes of the countries that share it (ISO 4217 list one, from memory). */
const shared = [
  "EUR AD AT AX BE BG BL CY DE EE ES FI FR GF GP GR HR IE IT LT LU LV MC ME MF MQ MT NL PM PT RE SI SK SM VA XK YT",
  "USD AS BQ EC FM GU IO MH MP PR PW SV TC TL US VG VI",
  "GBP GB GG IM JE",
  "AUD AU CC CX KI NF NR TV",
  "NZD CK NU NZ PN TK",
  "CHF CH LI",
  "DKK DK FO GL",
  "NOK BV NO SJ",
  "XOF BF BJ CI GW ML NE SN TG",
  "XAF CF CG CM GA GQ TD",
  "XCD AG AI DM GD KN LC MS VC",
  "XPF NC PF WF",
  "ILS IL PS",
  "MAD EH MA",
] as const;

/** Countries with a currency of their own, from the same list. */
const own = [
  "AE:AED AF:AFN AL:ALL AM:AMD AO:AOA AR:ARS AW:AWG AZ:AZN BA:BAM BB:BBD BD:BDT BH:BHD BI:BIF BM:BMD BN:BND",
  "BO:BOB BR:BRL BS:BSD BT:BTN BW:BWP BY:BYN BZ:BZD CA:CAD CD:CDF CL:CLP CN:CNY CO:COP CR:CRC CU:CUP CV:CVE",
  "CZ:CZK DJ:DJF DO:DOP DZ:DZD EG:EGP ER:ERN ET:ETB FJ:FJD FK:FKP GE:GEL GH:GHS GI:GIP GM:GMD GN:GNF GT:GTQ",
  "GY:GYD HK:HKD HN:HNL HT:HTG HU:HUF ID:IDR IN:INR IQ:IQD IR:IRR IS:ISK JM:JMD JO:JOD JP:JPY KE:KES KG:KGS",
  "KH:KHR KM:KMF KP:KPW KR:KRW KW:KWD KY:KYD KZ:KZT LA:LAK LB:LBP LK:LKR LR:LRD LS:LSL LY:LYD MD:MDL MG:MGA",
  "MK:MKD MM:MMK MN:MNT MO:MOP MR:MRU MU:MUR MV:MVR MW:MWK MX:MXN MY:MYR MZ:MZN NA:NAD NG:NGN NI:NIO NP:NPR",
  "OM:OMR PA:PAB PE:PEN PG:PGK PH:PHP PK:PKR PL:PLN PY:PYG QA:QAR RO:RON RS:RSD RU:RUB RW:RWF SA:SAR SB:SBD",
  "SC:SCR SD:SDG SE:SEK SG:SGD SH:SHP SL:SLE SO:SOS SR:SRD SS:SSP ST:STN SY:SYP SZ:SZL TH:THB TJ:TJS TM:TMT",
  "TN:TND TO:TOP TR:TRY TT:TTD TW:TWD TZ:TZS UA:UAH UG:UGX UY:UYU UZ:UZS VE:VES VN:VND VU:VUV WS:WST YE:YER",
  "ZA:ZAR ZM:ZMW ZW:ZWG",
] as const;

const currencyByCountry: ReadonlyMap<string, string> = new Map([
  ...shared.flatMap((line) => {
    const [code = "", ...countries] = line.split(" ");
    return countries.map((country) => [country, code] as const);
  }),
  ...own.flatMap((line) => line.split(" ").map((pair) => pair.split(":") as [string, string])),
]);

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

/** A country's name in the language of the app; its code where there is none. */
export function countryName(country: string, locale = "en"): string {
  return new Intl.DisplayNames(locale, { type: "region", fallback: "code" }).of(country) ?? country;
}
