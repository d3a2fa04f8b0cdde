/** The orders of the invented workshop, at every stage; days are counted from today, money is in pence. */
import { type PaymentKind, type PaymentMethod, type Stage } from "@/lib/records/types";
import { type Reach } from "@/lib/sleeves/reach";
import { type DemoClient } from "./demo-people";

interface DemoGarment {
  kind: string;
  /** Which of the client's wearers, from 0. */
  wearer: number;
  fittingIn?: number;
  /** Its sleeve, drafted from the wearer's last set. */
  reach?: Reach;
  note?: string;
}

export interface DemoOrder {
  client: DemoClient["key"];
  occasion: string;
  agreed: number;
  due: number | null;
  stage: Stage;
  garments: DemoGarment[];
  /** What, how many, at how much each; `garment` counts the order's garments from 0. */
  lines: { text: string; quantity: number; unitMinor: number; garment?: number }[];
  /** The first paid first. */
  payments: { kind: PaymentKind; method: PaymentMethod; amountMinor: number; on: number }[];
  note?: string;
}

/** The one agreed first comes first. */
export const demoOrders: readonly DemoOrder[] = [
  {
    client: "josephine",
    occasion: "Choir concert",
    agreed: -70,
    due: -31,
    stage: "handed-over",
    garments: [{ kind: "Long dress", wearer: 0, reach: "long" }],
    lines: [{ text: "Long dress, plain sleeves", quantity: 1, unitMinor: 11_200, garment: 0 }],
    payments: [
      { kind: "deposit", method: "transfer", amountMinor: 5_600, on: -70 },
      { kind: "payment", method: "cash", amountMinor: 5_800, on: -31 },
      { kind: "giving-back", method: "cash", amountMinor: 200, on: -31 },
    ],
  },
  {
    client: "maryam",
    occasion: "Eid",
    agreed: -45,
    due: -9,
    stage: "handed-over",
    garments: [
      { kind: "Kameez", wearer: 0 },
      { kind: "Trousers", wearer: 0 },
    ],
    lines: [
      { text: "Kameez with full sleeves", quantity: 1, unitMinor: 13_800, garment: 0 },
      { text: "Trousers", quantity: 1, unitMinor: 4_200, garment: 1 },
    ],
    payments: [
      { kind: "deposit", method: "cash", amountMinor: 9_000, on: -45 },
      { kind: "payment", method: "cash", amountMinor: 4_000, on: -9 },
    ],
    note: "The rest at the end of the month.",
  },
  {
    client: "lucja",
    occasion: "Cousin’s wedding",
    agreed: -40,
    due: -2,
    stage: "fitting",
    garments: [
      {
        kind: "Dress",
        wearer: 0,
        fittingIn: -4,
        reach: "three-quarter",
        note: "Take in the side seams 1/4 in above the waist.",
      },
    ],
    lines: [
      { text: "Dress, lined", quantity: 1, unitMinor: 14_500, garment: 0 },
      { text: "Hem raised after the fitting", quantity: 1, unitMinor: 1_200 },
    ],
    payments: [{ kind: "deposit", method: "transfer", amountMinor: 7_500, on: -40 }],
  },
  {
    client: "amara",
    occasion: "Naming day",
    agreed: -24,
    due: 3,
    stage: "sewing",
    garments: [
      { kind: "Dress with short sleeves", wearer: 0, fittingIn: 1, reach: "short" },
      { kind: "Dress with short sleeves", wearer: 1, fittingIn: 1, reach: "short" },
    ],
    lines: [
      { text: "Dress, Ifẹ", quantity: 1, unitMinor: 6_800, garment: 0 },
      { text: "Dress, Tẹmi", quantity: 1, unitMinor: 7_400, garment: 1 },
      { text: "Lace edging, a yard", quantity: 3, unitMinor: 450 },
    ],
    payments: [{ kind: "deposit", method: "cash", amountMinor: 8_000, on: -24 }],
    note: "Both from the same cloth, nap down.",
  },
  {
    client: "zoe",
    occasion: "Christening",
    agreed: -20,
    due: 0,
    stage: "ready",
    garments: [{ kind: "Christening dress and bonnet", wearer: 0 }],
    lines: [
      { text: "Christening dress", quantity: 1, unitMinor: 4_600, garment: 0 },
      { text: "Bonnet", quantity: 1, unitMinor: 900 },
    ],
    payments: [{ kind: "deposit", method: "card", amountMinor: 2_800, on: -20 }],
  },
  {
    client: "thuha",
    occasion: "Her own wedding",
    agreed: -15,
    due: 44,
    stage: "agreed",
    garments: [{ kind: "Áo dài", wearer: 0, fittingIn: 5, reach: "long" }],
    lines: [
      { text: "Áo dài, silk found by the client", quantity: 1, unitMinor: 32_000, garment: 0 },
      { text: "Embroidery at the neck", quantity: 1, unitMinor: 6_000 },
    ],
    payments: [{ kind: "deposit", method: "transfer", amountMinor: 19_000, on: -15 }],
  },
  {
    client: "eleni",
    occasion: "Birthday",
    agreed: -10,
    due: 6,
    stage: "cut",
    garments: [{ kind: "Blouse and skirt", wearer: 0 }],
    lines: [{ text: "Blouse and skirt", quantity: 1, unitMinor: 5_200, garment: 0 }],
    payments: [{ kind: "deposit", method: "cash", amountMinor: 2_600, on: -10 }],
  },
  {
    client: "sian",
    occasion: "School play",
    agreed: -3,
    due: 18,
    stage: "agreed",
    garments: [
      { kind: "Tunic", wearer: 0 },
      { kind: "Tunic", wearer: 1 },
    ],
    lines: [
      { text: "Tunic", quantity: 2, unitMinor: 3_900 },
      { text: "Short cape", quantity: 2, unitMinor: 1_500 },
    ],
    payments: [],
    note: "Measure Cadi again before cutting.",
  },
  {
    client: "josephine",
    occasion: "Sunday dress",
    agreed: -1,
    due: null,
    stage: "agreed",
    garments: [{ kind: "Dress", wearer: 0 }],
    lines: [{ text: "Dress", quantity: 1, unitMinor: 9_800, garment: 0 }],
    payments: [],
  },
];
