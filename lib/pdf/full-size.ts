/** Patterns at full size as a PDF: one wearer's sheets, or those of many with a page of contents before them. */
import { type Block, moved, row, rule, space, stack } from "@/lib/pdf/blocks";
import { compose, type ComposedPage } from "@/lib/pdf/compose";
import { type FullSizeDocument, type FullSizeJob, type TitledList } from "@/lib/pdf/full-size-document";
import { type FullSizeLayout, layOut } from "@/lib/pdf/full-size-layout";
import { sheetPage } from "@/lib/pdf/full-size-sheet";
import { longDate } from "@/lib/pdf/long-date";
import { type Group } from "@/lib/pdf/paginate";
import { type FullSizePaper, fullSizePaper, inner } from "@/lib/pdf/papers";
import { present } from "@/lib/pdf/parts";
import { printProblem } from "@/lib/pdf/pdf-api";
import { type Typesetter, typesetter } from "@/lib/pdf/typesetter";
import { type PrintTools, writePdf } from "@/lib/pdf/write-pdf";

/** More in one file, and a cheap phone has no memory for it. */
export const MOST_TOGETHER = 1200;

interface Laid {
  readonly doc: FullSizeDocument;
  readonly layout: FullSizeLayout;
}

/**
 * The file. Several documents get a page of contents.
 * @throws PrintProblem where there is nothing to print or too much of it.
 */
export function fullSizePdf(
  { docs, lists = [], paper, only }: FullSizeJob,
  tools: PrintTools,
): Promise<ArrayBuffer> {
  const [first] = docs;
  if (!first) throw printProblem("There is nothing to print. Choose a sleeve first.");
  const set = typesetter(tools.fonts, tools.painter);
  const laid = docs.map((doc): Laid => ({ doc, layout: layOut(doc, paper) }));
  const count = laid.reduce((sum, { layout }) => sum + layout.sheets.length, 0);
  if (count > MOST_TOGETHER)
    throw printProblem(
      `Together these take ${count} sheets, more than one file can hold. Print them for fewer wearers at a time, or on larger paper.`,
    );
  const pages = docs.length === 1 ? chosenPages(laid[0]!, only, set) : manyPages({ laid, lists, paper }, set);
  const facts = {
    title: docs.length === 1 ? present([first.title, first.wearer]).join(", ") : contentsTitle(docs),
    author: first.author ?? "",
    subject: "Pattern at full size",
    lang: first.lang ?? "en-GB",
  };
  return writePdf(pages, facts, tools);
}

function chosenPages({ doc, layout }: Laid, only: FullSizeJob["only"], set: Typesetter): ComposedPage[] {
  const wanted = only && new Set(only);
  const { sheets } = layout;
  const pages = sheets.flatMap((sheet, i) =>
    wanted && !wanted.has(sheet.name)
      ? []
      : [sheetPage(layout, doc, sheet, `Sheet ${i + 1} of ${sheets.length}`, set)],
  );
  if (pages.length === 0) throw printProblem("No sheet is chosen. Choose one or more on the plan.");
  return pages;
}

interface Many {
  readonly laid: readonly Laid[];
  readonly lists: readonly TitledList[];
  readonly paper: FullSizePaper;
}

function manyPages(many: Many, set: Typesetter): ComposedPage[] {
  const { laid } = many;
  // The page numbers in the contents depend on how many pages the contents take.
  let before = contents(many, 1, set).length;
  let front = contents(many, before, set);
  if (front.length !== before) front = contents(many, (before = front.length), set);
  const of = before + laid.reduce((sum, { layout }) => sum + layout.sheets.length, 0);
  let page = before;
  const sheets = laid.flatMap(({ doc, layout }) =>
    layout.sheets.map((sheet) => sheetPage(layout, doc, sheet, `Page ${++page} of ${of}`, set)),
  );
  return [...front, ...sheets];
}

const contentsTitle = (docs: readonly FullSizeDocument[]): string =>
  `${new Set(docs.map(({ style }) => style)).size === 1 ? docs[0]!.style : "Sleeves"} for ${docs.length}`;

const HEADS = ["Wearer", "Sleeve", "Pages"] as const;
const BASE = 11;

/** `before` is how many pages the contents take. */
function contents({ laid, lists, paper: on }: Many, before: number, set: Typesetter): ComposedPage[] {
  const paper = fullSizePaper(on);
  const width = inner(paper);
  const docs = laid.map(({ doc }) => doc);
  const lang = docs[0]!.lang ?? "en-GB";
  const gap = BASE;
  const pagesWidth = BASE * 9;
  const half = (width - pagesWidth - 2 * gap) / 2;
  const cells = (texts: readonly [string, string, string], bold: boolean): Block[] =>
    row([
      set.lines(texts[0], { size: BASE, bold: true }, { x: 0, width: half }),
      set.lines(texts[1], { size: BASE, bold }, { x: half + gap, width: half }),
      set.lines(texts[2], { size: BASE, bold }, { x: width - pagesWidth, width: pagesWidth, align: "right" }),
    ]);
  const head = stack([...cells(HEADS, true), rule(0, width, 0.9), space(BASE * 0.3)]);
  let next = before + 1;
  const rows = laid.map(({ doc, layout }, i): Group => {
    const [from, to] = [next, next + layout.sheets.length - 1];
    next = to + 1;
    const pages = from === to ? String(from) : `${from} to ${to}`;
    const failing = doc.warnings.length > 0 ? ["Look at its first sheet: there is a warning."] : [];
    return {
      gap: i > 0 ? BASE * 0.3 : BASE,
      repeat: head,
      parts: [
        ...(i > 0 ? [] : [head]),
        ...cells(
          [doc.wearer || doc.title, present([doc.title, doc.style, ...failing]).join("\n"), pages],
          false,
        ),
        rule(0, width, 0.3),
      ],
    };
  });
  const title = contentsTitle(docs);
  const intro: Group = {
    parts: [
      ...set.lines(title, { size: BASE * 1.8, bold: true }, { x: 0, width }),
      ...set.lines(
        `${longDate(docs[0]!.date, lang)}. Sheets of ${paper.name} at full size; each wearer’s begin with two squares to measure.`,
        { size: BASE },
        { x: 0, width },
      ),
    ],
  };
  return compose([intro, ...rows, ...lists.map((list) => listed(list, width, set))], paper, {
    head: () =>
      stack([
        ...set.lines(`${title}, continued`, { size: BASE, bold: true }, { x: 0, width }),
        space(BASE * 0.6),
      ]),
    foot: (page) =>
      moved(stack(set.lines(`Page ${page}`, { size: BASE }, { x: 0, width, align: "right" })), 0, BASE * 0.6),
  });
}

/** A title that stays with its first line. */
function listed({ lines, title }: TitledList, width: number, set: Typesetter): Group {
  const blocks = (text: string, bold: boolean) => set.lines(text, { size: BASE, bold }, { x: 0, width });
  const [first = "", ...rest] = lines;
  return {
    gap: BASE * 1.2,
    parts: [
      stack([...blocks(title, true), ...(first ? blocks(first, false) : [])]),
      ...rest.flatMap((line) => blocks(line, false)),
    ],
  };
}
