/** A receipt on a sheet or a till roll. */
import { type Block, type Line, overlay, row, rule, space, stack } from "@/lib/pdf/blocks";
import { compose, type Furniture } from "@/lib/pdf/compose";
import { longDate } from "@/lib/pdf/long-date";
import { type Group } from "@/lib/pdf/paginate";
import { inner, type Paper, type ReceiptPaper, receiptPapers } from "@/lib/pdf/papers";
import { abreast, fittingSize, notched, pair, present, textLines } from "@/lib/pdf/parts";
import { type ReceiptDocument, type ReceiptLine } from "@/lib/pdf/receipt-document";
import { card, CARD, tape } from "@/lib/pdf/signs";
import { type TextStyle, type Typesetter, typesetter } from "@/lib/pdf/typesetter";
import { type PrintTools, writePdf } from "@/lib/pdf/write-pdf";

const words = {
  Receipt: { from: "Received from", amount: "Amount received", now: "This payment" },
  "Money given back": { from: "Given back to", amount: "Amount given back", now: "Given back now" },
} as const;

const baseSizes: Record<ReceiptPaper, number> = { a5: 10, a4: 11.5, roll80: 10.5, roll58: 9.5 };

interface Desk {
  readonly doc: ReceiptDocument;
  readonly set: Typesetter;
  readonly width: number;
  readonly base: number;
  readonly isRoll: boolean;
  readonly plain: TextStyle;
  readonly strong: TextStyle;
  /** The small words over a thing. */
  readonly label: TextStyle;
}

/** The file. @throws Error where the painter cannot draw. */
export function receiptPdf(
  doc: ReceiptDocument,
  paper: ReceiptPaper,
  tools: PrintTools,
): Promise<ArrayBuffer> {
  const sheet: Paper = receiptPapers[paper];
  const base = baseSizes[paper];
  const desk: Desk = {
    doc,
    set: typesetter(tools.fonts, tools.painter),
    width: inner(sheet),
    base,
    isRoll: sheet.height === undefined,
    plain: { size: base },
    strong: { size: base, bold: true },
    label: { size: base * 0.86, bold: true },
  };
  const groups = [
    head(desk),
    parties(desk),
    amountCard(desk),
    ...items(desk),
    ...sums(desk),
    ...closing(desk),
  ];
  const pages = compose(groups, sheet, furniture(desk));
  const facts = {
    title: `${doc.title} ${doc.number}`,
    author: doc.seller.name,
    subject: doc.orderTitle,
    lang: doc.lang,
  };
  return writePdf(pages, facts, tools);
}

function head({ doc, set, width, base, isRoll, plain, strong }: Desk): Group {
  const edge = [tape(width, doc.tape ?? "cm"), space(base * 0.9)];
  const date = longDate(doc.issuedOn, doc.lang);
  const name = (room: number, sizes: number[]): Line[] => {
    const size = fittingSize(set, doc.seller.name, true, sizes, room);
    return set.lines(doc.seller.name, { size, bold: true }, { x: 0, width: room });
  };
  const titleStyle = { size: base * 1.5, bold: true };
  if (isRoll)
    return {
      parts: [
        ...edge,
        ...name(width, [base * 1.9, base * 1.6, base * 1.35]),
        ...textLines(set, doc.seller.lines, plain, width),
        space(base * 0.7),
        rule(0, width, 0.8),
        space(base * 0.5),
        ...set.lines(doc.title, titleStyle, { x: 0, width }),
        ...pair(set, ["Number", plain], [doc.number, strong], width),
        ...pair(set, ["Date", plain], [date, plain], width),
      ],
    };
  const rightWidth = Math.min(
    width * 0.45,
    Math.max(set.width(doc.title, titleStyle), set.width(doc.number, strong), set.width(date, plain)),
  );
  const leftWidth = width - rightWidth - base * 2;
  const right = { x: width - rightWidth, width: rightWidth, align: "right" } as const;
  return {
    parts: [
      ...edge,
      abreast(
        [
          ...name(leftWidth, [base * 2.3, base * 2, base * 1.7, base * 1.5]),
          ...textLines(set, doc.seller.lines, plain, leftWidth),
        ],
        [
          ...set.lines(doc.title, titleStyle, right),
          ...set.lines(doc.number, strong, right),
          ...set.lines(date, plain, right),
        ],
      ),
    ],
  };
}

function parties({ doc, set, width, base, isRoll, plain, label }: Desk): Group {
  const who = { size: base * 1.2, bold: true };
  const from = (room: number) => [
    ...set.lines(words[doc.title].from, label, { x: 0, width: room }),
    ...set.lines(doc.buyer.name, who, { x: 0, width: room }),
    ...textLines(set, doc.buyer.lines, plain, room),
  ];
  const whatFor = (x: number, room: number) => [
    ...set.lines("For", label, { x, width: room }),
    ...set.lines(doc.orderTitle, isRoll ? { size: base, bold: true } : who, { x, width: room }),
  ];
  if (isRoll) return { gap: base * 0.8, parts: [...from(width), space(base * 0.6), ...whatFor(0, width)] };
  const room = (width - base * 2) / 2;
  return { gap: base * 1.6, parts: row([from(room), whatFor(width - room, room)]) };
}

/** "Deposit, cash". */
const howPaid = ({ label, methodLabel }: Desk["doc"]["payment"]): string =>
  label ? present([label, methodLabel.toLowerCase()]).join(", ") : methodLabel;

function amountCard({ doc, set, width, base, isRoll, plain, strong }: Desk): Group {
  const { amountText } = doc.payment;
  const padding = base * (isRoll ? 0.8 : 1.1);
  const room = width - 2 * padding;
  const how = howPaid(doc.payment);
  const sizes = [3, 2.6, 2.2, 1.8, 1.5, 1.25].map((times) => times * base);
  const build = (): Block => {
    const said = (x: number, width: number) => [
      // Clear of the notch.
      ...set.lines(words[doc.title].amount, strong, { x, width }),
      ...set.lines(how, plain, { x, width }),
    ];
    const size = fittingSize(set, amountText, true, sizes, isRoll ? room : room * 0.62);
    const figure = { size, bold: true };
    if (isRoll)
      return stack([
        space(base * 0.55),
        ...said(0, room),
        space(base * 0.2),
        ...set.lines(amountText, figure, { x: 0, width: room, align: "right" }),
      ]);
    const figureWidth = Math.min(room * 0.62, set.width(amountText, figure));
    const left = stack(said(base * 1.9, room - figureWidth - base * 3));
    const right = stack(
      set.lines(amountText, figure, { x: room - figureWidth, width: figureWidth, align: "right" }),
    );
    const height = Math.max(left.height, right.height);
    const centred = (block: Block) => stack([space((height - block.height) / 2), block]);
    return overlay(centred(left), centred(right));
  };
  return { gap: base * 1.3, parts: [card(build(), width, padding, isRoll ? undefined : CARD)] };
}

/** The rows of what was sewn, the total kept with the last. */
function items(desk: Desk): Group[] {
  const { doc, set, width, base, isRoll, strong } = desk;
  const table = isRoll ? rollTable(desk) : sheetTable(desk);
  const total = [
    space(base * 0.35),
    rule(0, width, 0.9),
    space(base * 0.35),
    ...pair(set, ["Total", strong], [doc.totalText, strong], width),
  ];
  const last = doc.lines.length - 1;
  const groups = doc.lines.map((line, i): Group => {
    const first = i === 0;
    const parts = [
      ...(first ? [table.head] : [rule(0, width, 0.3)]),
      space(base * 0.3),
      ...table.row(line),
      space(base * 0.3),
      ...(i === last ? total : []),
    ];
    return first ? { gap: base * 1.3, parts } : { parts, repeat: table.head };
  });
  return groups.length > 0 ? groups : [{ gap: base * 1.3, parts: total }];
}

const isSingle = ({ quantity }: ReceiptLine) => quantity.trim() === "1";

interface Table {
  readonly head: Block;
  row(line: ReceiptLine): Block[];
}

function rollTable({ doc, set, width, base, plain, label }: Desk): Table {
  return {
    head: stack([...set.lines("What it is for", label, { x: 0, width }), rule(0, width, 0.9)]),
    row: (line) =>
      doc.lines.every(isSingle)
        ? pair(set, [line.text, plain], [line.amountText, plain], width)
        : [
            ...set.lines(line.text, plain, { x: 0, width }),
            ...pair(set, [`${line.quantity} × ${line.unitText}`, plain], [line.amountText, plain], width),
            space(base * 0.1),
          ],
  };
}

function sheetTable({ doc, set, width, base, plain, label }: Desk): Table {
  const figures: { title: string; of: (line: ReceiptLine) => string; most: number }[] = [
    ...(doc.lines.every(isSingle)
      ? []
      : [
          { title: "Quantity", of: (line: ReceiptLine) => line.quantity, most: 0.16 },
          { title: "Each", of: (line: ReceiptLine) => line.unitText, most: 0.22 },
        ]),
    { title: "Amount", of: (line) => line.amountText, most: 0.24 },
  ];
  const gap = base * 1.2;
  let right = width;
  const columns = figures
    .toReversed()
    .map(({ title, of, most }) => {
      const widest = Math.max(
        set.width(title, label),
        ...doc.lines.map((line) => set.width(of(line), plain)),
      );
      const columnWidth = Math.min(widest, most * width);
      const x = right - columnWidth;
      right = x - gap;
      return { title, of, column: { x, width: columnWidth, align: "right" } as const };
    })
    .toReversed();
  const text = { x: 0, width: right };
  return {
    head: stack([
      ...row([
        set.lines("What it is for", label, text),
        ...columns.map(({ title, column }) => set.lines(title, label, column)),
      ]),
      space(base * 0.15),
      rule(0, width, 0.9),
    ]),
    row: (line) =>
      row([
        set.lines(line.text, plain, text),
        ...columns.map(({ of, column }) => set.lines(of(line), plain, column)),
      ]),
  };
}

function sums({ doc, set, width, base, plain, strong, label, isRoll }: Desk): Group[] {
  const { payment } = doc;
  const before = doc.earlier.map(({ date, number, label: what, amountText }, i): Group => {
    const text = present([longDate(date, doc.lang), what, number]).join(", ");
    const parts = pair(set, [text, plain], [amountText, plain], width);
    return i > 0
      ? { parts }
      : { gap: base * 1.1, parts: [...set.lines("Paid before", label, { x: 0, width }), ...parts] };
  });
  const now = present([words[doc.title].now, howPaid(payment)]).join(": ");
  const balanceSizes = (isRoll ? [1.35, 1.15, 1] : [1.6, 1.3, 1]).map((times) => times * base);
  const size = fittingSize(set, `${doc.balanceLabel} ${doc.balanceText}`, true, balanceSizes, width - base);
  const balance = { size, bold: true };
  const end: Group = {
    gap: base * 0.5,
    parts: [
      ...pair(set, [now, plain], [payment.amountText, plain], width),
      ...pair(set, ["Received in all", strong], [doc.receivedText, strong], width),
      space(base * 0.4),
      rule(0, width, 0.9),
      space(base * 0.5),
      ...pair(set, [doc.balanceLabel, balance], [doc.balanceText, balance], width),
      space(base * 0.3),
      rule(0, width, 0.9),
      space(1.4),
      rule(0, width, 0.9),
    ],
  };
  return [...before, end];
}

function closing({ doc, set, width, base, isRoll, plain, label }: Desk): Group[] {
  const thanks = present([doc.thanks ?? ""]).map((text): Group => ({
    gap: base * 1.3,
    parts: set.lines(text, { size: base * 1.1, bold: true }, { x: 0, width }),
  }));
  const cautions = present(doc.cautions).map((text, i): Group => ({
    gap: base * (i > 0 ? 0.25 : 1.2),
    parts: [
      ...(i > 0 ? [] : set.lines("Take care", label, { x: 0, width })),
      ...notched(set, text, { size: plain.size * 0.92 }, width),
    ],
  }));
  const edge: Group[] = isRoll ? [{ gap: base * 1.2, parts: [tape(width, doc.tape ?? "cm")] }] : [];
  return [...thanks, ...cautions, ...edge];
}

function furniture({ doc, set, width, base, plain, strong }: Desk): Furniture {
  return {
    head: () =>
      stack([
        ...pair(set, [`${doc.title} ${doc.number}, continued`, strong], [doc.seller.name, plain], width),
        space(base * 0.4),
        rule(0, width, 0.9),
        space(base),
      ]),
    foot: (page, of) =>
      stack([space(base), ...pair(set, [doc.number, plain], [`Page ${page} of ${of}`, plain], width)]),
  };
}
