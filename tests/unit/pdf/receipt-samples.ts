/** Receipts of invented people, whose figures add up. Money is counted in cents. */
import { type ReceiptDocument } from "@/lib/pdf/receipt-document";

export const money = (cents: number): string =>
  `$${(cents / 100).toLocaleString("en-GB", { minimumFractionDigits: 2 })}`;

export interface SampleLine {
  readonly text: string;
  readonly quantity: number;
  readonly unit: number;
}

export interface Sample {
  readonly lines: readonly SampleLine[];
  readonly earlier: readonly number[];
  readonly now: number;
}

export const totalOf = ({ lines }: Sample): number =>
  lines.reduce((sum, { quantity, unit }) => sum + quantity * unit, 0);
export const receivedOf = ({ earlier, now }: Sample): number =>
  earlier.reduce((sum, cents) => sum + cents, now);

export function receiptOf(sample: Sample, more: Partial<ReceiptDocument> = {}): ReceiptDocument {
  return {
    number: "7KQ4MX-0012",
    issuedOn: "2025-12-01",
    title: "Receipt",
    seller: { name: "Tamsin Okoro-Vale, Seamstress", lines: ["14 Orchard Row, Merrow", "+44 1632 960 118"] },
    buyer: { name: "Ines Calloway", lines: ["Flat 3, 9 Quay Street"] },
    orderTitle: "Two dresses for Easter",
    lines: sample.lines.map(({ text, quantity, unit }) => ({
      text,
      quantity: String(quantity),
      unitText: money(unit),
      amountText: money(quantity * unit),
    })),
    totalText: money(totalOf(sample)),
    payment: { label: "Balance", methodLabel: "Cash", amountText: money(sample.now) },
    earlier: sample.earlier.map((cents, i) => ({
      date: `2025-11-${String(3 + i).padStart(2, "0")}`,
      number: `7KQ4MX-${String(i + 1).padStart(4, "0")}`,
      label: "Deposit",
      amountText: money(cents),
    })),
    receivedText: money(receivedOf(sample)),
    balanceLabel: "Balance to pay",
    balanceText: money(totalOf(sample) - receivedOf(sample)),
    thanks: "Thank you. Wear them well.",
    cautions: ["Loose trims and buttons can come off: keep them from children under three."],
    lang: "en-GB",
    ...more,
  };
}

export const short: Sample = {
  lines: [
    { text: "Girl's dress with puffed sleeves, blue poplin", quantity: 2, unit: 6500 },
    { text: "Lining", quantity: 1, unit: 1800 },
  ],
  earlier: [7000],
  now: 5000,
};

const garments = [
  "Choir gown",
  "Puffed sleeve, pair",
  "Bishop sleeve with cuff",
  "Hem let down",
  "Bodice lining",
];

export const many = (count: number): Sample => ({
  lines: Array.from({ length: count }, (_, i) => ({
    text: `${i + 1}. ${garments[i % garments.length]}${i % 4 === 3 ? ", with the collar taken in and the cloth returned to the client" : ""}`,
    quantity: 1 + (i % 3),
    unit: 1250 + 175 * i,
  })),
  earlier: [20000, 15050],
  now: 12500,
});

const longName =
  "Wilhelmina Aurelia Featherstonehaugh-Montgomery de la Quintana y Vasconcellos-Brandenburg, for the Guild of St Brannock";
const unbroken = "Hochzeitskleiderschneidermeisterinnenwerkstattgemeinschaftsvorsitzende".repeat(2);

export const longNames = receiptOf(short, {
  seller: {
    name: `${longName} Sewing Room`,
    lines: ["Unit 5b, The Old Ropewalk, Lower Harbour Road, St Brannock-under-Hill"],
  },
  buyer: { name: unbroken, lines: [longName] },
  orderTitle: `Robes and dresses for ${longName}`,
});

export const otherAlphabets = receiptOf(
  {
    lines: [
      { text: "Платье с рукавом-фонариком, «крестьянка» №2", quantity: 1, unit: 450000 },
      { text: "Φόρεμα με φουσκωτά μανίκια, γαλάζιο", quantity: 2, unit: 125050 },
      { text: "Áo dài lụa với tay phồng, thêu hoa nhỏ ở cổ tay", quantity: 1, unit: 98000 },
      { text: "Sukienka z bufiastymi rękawami, żółta; šaty ľahké, cămașă țesută", quantity: 3, unit: 4500 },
    ],
    earlier: [300000],
    now: 250000,
  },
  {
    seller: { name: "Швейная комната Ольги Ветровой", lines: ["улица Садовая, 14"] },
    buyer: { name: "Nguyễn Thị Bích Ngọc", lines: ["Đường Hoa Sữa 27", "Ελένη Καλογεράκη (κόρη)"] },
    orderTitle: "Áo cưới và ba chiếc váy — Ευχαριστώ",
    thanks: "Спасибо · Ευχαριστώ · Cảm ơn",
  },
);

export const pictures = receiptOf(short, {
  seller: { name: "أمل الخياطة", lines: ["شارع النخيل 14، الطابق 2"] },
  buyer: { name: "नंदिनी शर्मा", lines: ["บ้านเลขที่ 27 ถนนดอกไม้", "山田さくら様"] },
  orderTitle: "عباءة بأكمام منفوخة Size 12 للعيد",
  thanks: "Thank you 🧵 धन्यवाद शुक्रिया ok",
});
