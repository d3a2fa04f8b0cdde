/** Marks on sheets: the figures, what to look out for, then each step with its drawing. */
import { type Block, moved, overlay, row, rule, space, stack } from "@/lib/pdf/blocks";
import { compose } from "@/lib/pdf/compose";
import { setFractions } from "@/lib/pdf/fractions";
import { longDate } from "@/lib/pdf/long-date";
import { type MarksDocument, type MarksStep } from "@/lib/pdf/marks-document";
import { type Group } from "@/lib/pdf/paginate";
import { inner, type MarksPaper, marksPapers, MM } from "@/lib/pdf/papers";
import { abreast, notched, pair, present, textLines } from "@/lib/pdf/parts";
import { tape } from "@/lib/pdf/signs";
import { drawStep } from "@/lib/pdf/step-drawing";
import { type TextStyle, type Typesetter, typesetter } from "@/lib/pdf/typesetter";
import { type PrintTools, writePdf } from "@/lib/pdf/write-pdf";

interface Desk {
  readonly doc: MarksDocument;
  readonly set: Typesetter;
  readonly width: number;
  readonly base: number;
  /** Steps side by side. */
  readonly columns: number;
  readonly drawingHeight: number;
  readonly plain: TextStyle;
  readonly strong: TextStyle;
  readonly label: TextStyle;
}

const layouts: Record<MarksPaper, Pick<Desk, "base" | "columns" | "drawingHeight">> = {
  a4: { base: 11.5, columns: 2, drawingHeight: 43 * MM },
  letter: { base: 11.5, columns: 2, drawingHeight: 39 * MM },
  a5: { base: 11, columns: 1, drawingHeight: 35 * MM },
};

const verdicts = { good: "Good", look: "Look", wrong: "Wrong" } as const;

/** The file. @throws Error where the painter cannot draw. */
export function marksPdf(said: MarksDocument, paper: MarksPaper, tools: PrintTools): Promise<ArrayBuffer> {
  const doc = withFractions(said);
  const sheet = marksPapers[paper];
  const layout = layouts[paper];
  const { base } = layout;
  const desk: Desk = {
    doc,
    set: typesetter(tools.fonts, tools.painter),
    width: inner(sheet),
    ...layout,
    plain: { size: base },
    strong: { size: base, bold: true },
    label: { size: base * 0.86, bold: true },
  };
  const groups = [head(desk), ...figures(desk), ...warnings(desk), ...steps(desk), ...checks(desk)];
  const { set, width, plain, strong } = desk;
  const pages = compose(groups, sheet, {
    head: () =>
      stack([
        ...pair(set, [`${doc.title}, continued`, strong], [doc.wearer, plain], width),
        space(base * 0.6),
      ]),
    foot: (page, of) =>
      stack([
        space(base * 0.6),
        ...pair(set, [longDate(doc.date, lang(doc)), plain], [`Page ${page} of ${of}`, plain], width),
      ]),
  });
  const facts = {
    title: present([doc.title, doc.wearer]).join(", "),
    author: doc.author ?? "",
    subject: doc.subtitle,
    lang: lang(doc),
  };
  return writePdf(pages, facts, tools);
}

const withFractions = (doc: MarksDocument): MarksDocument => ({
  ...doc,
  subtitle: setFractions(doc.subtitle),
  figures: doc.figures.map((figure) => ({ ...figure, text: setFractions(figure.text) })),
  warnings: doc.warnings.map(setFractions),
  steps: doc.steps.map((step) => ({ ...step, text: setFractions(step.text) })),
  checks: doc.checks.map((check) => ({ ...check, text: setFractions(check.text) })),
});

const lang = (doc: MarksDocument): string => doc.lang ?? "en-GB";

function head({ doc, set, width, base, plain, strong }: Desk): Group {
  const title = { size: base * 2, bold: true };
  return {
    parts: [
      tape(width, doc.tape ?? "cm"),
      space(base * 0.8),
      ...set.lines(doc.title, title, { x: 0, width }),
      ...textLines(set, [doc.subtitle], plain, width),
      ...pair(set, [doc.wearer, strong], [longDate(doc.date, lang(doc)), plain], width),
    ],
  };
}

/** Two columns, read down: the names are short and the sheet is wide. */
function figures({ doc, set, width, base, plain }: Desk): Group[] {
  const gap = base * 2;
  const room = (width - gap) / 2;
  const figure = { size: base * 1.2, bold: true };
  const cell = ({ name, text }: { name: string; text: string }) =>
    stack([...pair(set, [name, plain], [text, figure], room), space(base * 0.1), rule(0, room, 0.3)]);
  const rows = Math.ceil(doc.figures.length / 2);
  return Array.from({ length: rows }, (_, i): Group => {
    const left = doc.figures[i];
    const right = doc.figures[i + rows];
    const cells = [...(left ? [cell(left)] : []), ...(right ? [moved(cell(right), room + gap)] : [])];
    return { gap: i === 0 ? base : base * 0.25, parts: [overlay(...cells)] };
  });
}

function warnings({ doc, set, width, base, strong, label }: Desk): Group[] {
  return present(doc.warnings).map((text, i): Group => ({
    gap: base * (i > 0 ? 0.25 : 1.1),
    parts: [
      ...(i > 0 ? [] : set.lines("Before you draw", label, { x: 0, width })),
      ...notched(set, text, strong, width),
    ],
  }));
}

function steps(desk: Desk): Group[] {
  const { doc, set, width, base, columns, plain } = desk;
  const gap = base * 1.8;
  const room = (width - gap * (columns - 1)) / columns;
  const note = set.lines(
    "The heavy line is the one to draw now. Thin lines are there already; blue ones only guide. The drawings are not to size.",
    { size: plain.size * 0.92 },
    { x: 0, width },
  );
  const groups: Group[] = [];
  for (let i = 0; i < doc.steps.length; i += columns) {
    const cards = doc.steps
      .slice(i, i + columns)
      .map((step, column) => moved(stepCard(desk, step, room), column * (room + gap)));
    groups.push({
      gap: base * (i > 0 ? 0.5 : 1.2),
      parts: [...(i > 0 ? [] : [...note, space(base * 0.5)]), overlay(...cards)],
    });
  }
  return groups;
}

function stepCard(
  { set, base, plain, drawingHeight }: Desk,
  { n, text, drawing }: MarksStep,
  width: number,
): Block {
  const number = { size: base * 1.7, bold: true };
  const numberWidth = Math.max(base * 2.4, set.width(String(n), number) + base * 0.6);
  const drawingWidth = width * 0.4;
  const words = abreast(
    set.lines(String(n), number, { x: 0, width: numberWidth }),
    set.lines(text, plain, { x: numberWidth, width: width - numberWidth - drawingWidth - base * 0.6 }),
  );
  const picture = moved(drawStep(drawing, drawingWidth, drawingHeight, set), width - drawingWidth);
  return stack([rule(0, width, 0.9), space(base * 0.4), overlay(words, picture)]);
}

function checks({ doc, set, width, base, plain, strong, label }: Desk): Group[] {
  const column = Math.max(...Object.values(verdicts).map((word) => set.width(word, strong))) + base;
  return doc.checks.map(({ text, verdict }, i): Group => ({
    gap: base * (i > 0 ? 0.3 : 1.2),
    parts: [
      ...(i > 0
        ? []
        : [...set.lines("Checks", label, { x: 0, width }), rule(0, width, 0.9), space(base * 0.3)]),
      ...row([
        set.lines(verdicts[verdict], strong, { x: 0, width: column }),
        set.lines(text, plain, { x: column, width: width - column }),
      ]),
    ],
  }));
}
