/**
 * The people of the invented workshop. Names are made up. Phone numbers come out of the ranges that Ofcom keeps free for
 * drama (07700 900000 to 900999, 020 7946 0000 to 0999); mail goes to example.com, which RFC 2606 keeps free.
 */
import { type MeasureKey } from "@/lib/figures/body-measures";

export interface DemoSet {
  daysAgo: number;
  by: string;
  /** As typed, in inches. */
  figures: Partial<Record<MeasureKey, string>>;
  note?: string;
}

interface DemoWearer {
  name: string;
  /** Whole months of life; left out for someone grown up. */
  months?: number;
  note?: string;
  /** The first taken first. */
  sets: DemoSet[];
}

export interface DemoClient {
  key: "amara" | "lucja" | "eleni" | "sian" | "maryam" | "thuha" | "zoe" | "josephine";
  name: string;
  phone: string;
  phoneE164: string;
  email?: string;
  address?: string;
  note?: string;
  wearers: DemoWearer[];
}

const mobile = (last: number) => ({ phone: `07700 900${last}`, phoneE164: `+447700900${last}` });

const sleeveKeys = [
  "armscyeGirth",
  "upperArmGirth",
  "elbowGirth",
  "wristGirth",
  "handGirth",
  "upperArmLength",
  "armLength",
] as const satisfies readonly MeasureKey[];
const fullKeys = [
  "shoulderLength",
  "armscyeFront",
  "armscyeBack",
  ...sleeveKeys,
  "scyeDepth",
  "backWidth",
  "bustGirth",
  "cervicalToWaist",
] as const satisfies readonly MeasureKey[];

const taken = (keys: readonly MeasureKey[]) => (text: string) =>
  Object.fromEntries(text.split(", ").map((typed, i) => [keys[i]!, typed])) as DemoSet["figures"];
/** In the order of `sleeveKeys`. */
const sleeveSet = taken(sleeveKeys);
/** In the order of `fullKeys`. */
const fullSet = taken(fullKeys);

const OWNER = "Nadia";
const ASSISTANT = "Bea";

export const demoClients: readonly DemoClient[] = [
  {
    key: "amara",
    name: "Amara Okonjo-Bell",
    ...mobile(112),
    email: "amara@example.com",
    address: "14 Lantern Row\nHollowby",
    note: "Rings best after six.",
    wearers: [
      {
        name: "Ifẹ",
        months: 77,
        note: "Does not like anything tight at the arm.",
        sets: [
          {
            daysAgo: 214,
            by: OWNER,
            figures: fullSet(
              "3 1/4, 5 1/8, 5 1/2, 10 5/8, 7, 7 1/4, 5, 5 7/8, 9 3/8, 15 7/8, 5 1/4, 10, 23 1/4, 10 1/8",
            ),
          },
          {
            daysAgo: 24,
            by: OWNER,
            figures: fullSet(
              "3 3/8, 5 3/8, 5 3/4, 11 1/8, 7 3/8, 7 1/2, 5 1/8, 6, 9 3/4, 16 5/8, 5 1/2, 10 3/8, 24, 10 1/2",
            ),
          },
        ],
      },
      {
        name: "Tẹmi",
        months: 113,
        sets: [
          {
            daysAgo: 214,
            by: OWNER,
            figures: fullSet(
              "3 3/4, 5 3/4, 6 1/4, 12, 7 7/8, 8 1/8, 5 3/8, 6 3/8, 10 3/4, 18 1/4, 6, 11 1/8, 26, 11 1/2",
            ),
          },
          {
            daysAgo: 24,
            by: ASSISTANT,
            figures: fullSet(
              "3 7/8, 6, 6 1/2, 12 1/2, 8 1/4, 8 3/8, 5 1/2, 6 5/8, 11 1/4, 19 1/4, 6 1/4, 11 1/2, 27, 12",
            ),
          },
        ],
      },
    ],
  },
  {
    key: "lucja",
    name: "Łucja Brzózka",
    ...mobile(127),
    wearers: [
      {
        name: "Łucja Brzózka",
        sets: [
          {
            daysAgo: 40,
            by: OWNER,
            figures: fullSet(
              "5 1/4, 7 1/4, 7 3/4, 15, 11 3/4, 10 1/8, 6 1/8, 7 3/8, 12 3/8, 22, 7 1/2, 13 3/4, 36 1/2, 16",
            ),
          },
        ],
      },
    ],
  },
  {
    key: "eleni",
    name: "Ελένη Καρυώτη",
    ...mobile(143),
    note: "Eléni. Her mother brings the cloth.",
    wearers: [
      {
        name: "Νεφέλη",
        months: 54,
        sets: [
          { daysAgo: 160, by: OWNER, figures: sleeveSet("9 3/8, 6 1/4, 6 3/8, 4 1/2, 5 1/8, 8 1/8, 13 1/4") },
          { daysAgo: 10, by: OWNER, figures: sleeveSet("9 3/4, 6 1/2, 6 5/8, 4 5/8, 5 1/4, 8 1/2, 14") },
        ],
      },
    ],
  },
  {
    key: "sian",
    name: "Siân Prydwen",
    ...mobile(158),
    address: "The Schoolhouse\nUpper Fold",
    wearers: [
      {
        name: "Cadi",
        months: 102,
        sets: [
          { daysAgo: 163, by: ASSISTANT, figures: sleeveSet("12, 8, 8 1/8, 5 3/8, 6 3/8, 10 7/8, 18 1/2") },
        ],
      },
      {
        name: "Nel",
        months: 128,
        sets: [
          { daysAgo: 3, by: ASSISTANT, figures: sleeveSet("13, 8 3/4, 8 7/8, 5 5/8, 6 7/8, 12, 20 3/4") },
        ],
      },
    ],
  },
  {
    key: "maryam",
    name: "مريم الشامي",
    ...mobile(171),
    note: "Maryam. Full sleeves, always.",
    wearers: [
      {
        name: "مريم الشامي",
        sets: [
          {
            daysAgo: 45,
            by: OWNER,
            figures: sleeveSet("15 3/4, 12 1/2, 10 1/2, 6 1/4, 7 3/8, 12 1/4, 21 1/2"),
          },
        ],
      },
    ],
  },
  {
    key: "thuha",
    name: "Lương Thu Hà",
    ...mobile(189),
    email: "thuha@example.com",
    wearers: [
      {
        name: "Thu Hà",
        sets: [
          {
            daysAgo: 15,
            by: OWNER,
            figures: fullSet(
              "4 7/8, 6 3/4, 7 1/8, 13 7/8, 10 3/8, 9 3/8, 5 3/4, 7, 11 7/8, 21, 7, 13 1/8, 33, 15",
            ),
            note: "Measured over a thin blouse.",
          },
        ],
      },
    ],
  },
  {
    key: "zoe",
    name: "Zoë van der Meij",
    ...mobile(194),
    wearers: [
      {
        name: "Fenna",
        months: 29,
        sets: [
          { daysAgo: 20, by: OWNER, figures: sleeveSet("8 7/8, 6 1/4, 6 3/8, 4 1/2, 4 7/8, 7 1/4, 11 7/8") },
        ],
      },
    ],
  },
  {
    key: "josephine",
    name: "Joséphine N’Doumbé",
    phone: "020 7946 0163",
    phoneE164: "+442079460163",
    wearers: [
      {
        name: "Joséphine N’Doumbé",
        sets: [
          {
            daysAgo: 70,
            by: OWNER,
            figures: sleeveSet("16 1/2, 13 1/2, 11 1/8, 6 1/2, 7 1/2, 12 1/2, 22 1/4"),
          },
        ],
      },
    ],
  },
];
