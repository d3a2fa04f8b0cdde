"use client";

import { useCallback, useDeferredValue, useMemo, useState, useSyncExternalStore } from "react";
import { FileDown } from "lucide-react";
import { ShareDocument } from "@/components/share-document";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Check, Choice, Field, TextInput } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { formatLength, formatPlain } from "@/lib/lengths/format-length";
import { parseLength } from "@/lib/lengths/parse-length";
import { type FullSizeDocument } from "@/lib/pdf/full-size-document";
import { type FullSizeLayout, layOut } from "@/lib/pdf/full-size-layout";
import { saveFile } from "@/lib/pdf/hand-over";
import { type FullSizePaper, isFullSizePaper, ROLL_LIMITS, rollWidths } from "@/lib/pdf/papers";
import { type OnProgress, sayPrintProblem } from "@/lib/pdf/pdf-api";
import { rememberedPaper, rememberPaper } from "@/lib/pdf/remember-paper";
import { type Fineness, type Unit } from "@/lib/records/types";
import { SheetPlan } from "./sheet-plan";

export interface FullSizeSheetProps {
  /** Makes the document; `allowance` in mm, null for none. The same function for the same pieces. */
  build(allowance: number | null): FullSizeDocument;
  /** What it is called, for the files. */
  name: string;
  unit: Unit;
  fineness: Fineness;
  /** mm. */
  usualAllowance: number;
}

const NAME = "pattern at full size";
const PAPER_KEY = "notchbook-paper-full-size";
const OWN = "own";
const FIRST: FullSizePaper = "a4";
const never = () => () => undefined;
const common: readonly FullSizePaper[] = [
  "a4",
  "letter",
  "a3",
  ...rollWidths.map((width): FullSizePaper => `roll-${width}`),
];

const papers = [
  { value: "a4", label: "A4" },
  { value: "letter", label: "Letter" },
  { value: "a3", label: "A3" },
  ...rollWidths.map((width) => ({ value: `roll-${width}`, label: "Roll", sub: `${width} mm wide` })),
  { value: OWN, label: "Roll", sub: "of another width" },
];

/** Paper, allowances and sheets, then the pattern as a PDF or a drawing. */
export function FullSizeSheet({ build, fineness, name, unit, usualAllowance }: FullSizeSheetProps) {
  const paper = usePaper(unit);
  const [allowed, setAllowed] = useState(true);
  const [typed, setTyped] = useState(() => formatLength(usualAllowance, unit, fineness).figure);
  const allowance = parseLength(typed, unit, { leastMm: 0, mostMm: 100 });
  const width = !allowed ? null : allowance.ok ? allowance.mm : undefined;
  // What is drawn may lag behind the keys.
  const wanted = useDeferredValue(paper.value);
  const shown = useMemo(
    () => (width === undefined || wanted === null ? null : laid(build, width, wanted)),
    [build, width, wanted],
  );
  return (
    <>
      <Card aria-labelledby="paper-title">
        <CardHead id="paper-title" title="Paper and allowances" />
        <div className="grid gap-5">
          <Choice
            label="Paper"
            name="full-size-paper"
            options={papers}
            value={paper.kind}
            onChange={(event) => paper.choose(event.target.value)}
          />
          {paper.kind === OWN && (
            <Field label="Width of the roll" error={paper.error}>
              <TextInput
                figure
                after={unit}
                value={paper.typed}
                onChange={(event) => paper.type(event.target.value)}
              />
            </Field>
          )}
          <Check
            label="Draw the seam allowances"
            checked={allowed}
            onChange={(event) => setAllowed(event.target.checked)}
            hint="Left out, only the line to sew is drawn, and you add them on the cloth."
          />
          {allowed && (
            <Field
              label="Allowance"
              error={allowance.ok ? undefined : allowance.say}
              hint="A hem, or another edge that has its own, keeps it."
            >
              <TextInput
                figure
                after={unit}
                value={typed}
                onChange={(event) => setTyped(event.target.value)}
              />
            </Field>
          )}
        </div>
      </Card>
      {shown && "say" in shown && <Notice tone="wrong" live title={shown.say} />}
      {shown && "layout" in shown && (
        <Sheets key={`${wanted} ${width}`} {...shown} paper={wanted!} {...{ name, unit }} />
      )}
    </>
  );
}

/** The paper chosen, else the one of last time, else A4; null while a width that is typed cannot be one. */
function usePaper(unit: Unit) {
  const last = useSyncExternalStore(
    never,
    () => rememberedPaper(PAPER_KEY),
    () => null,
  );
  const [chosen, setChosen] = useState<string | null>(null);
  const [own, setOwn] = useState<string | null>(null);
  const remembered = last !== null && isFullSizePaper(last) ? last : FIRST;
  const kind = chosen ?? (common.includes(remembered) ? remembered : OWN);
  const lastWidth = common.includes(remembered) ? rollWidths[0] : Number(remembered.slice("roll-".length));
  const typed = own ?? formatLength(lastWidth, unit, 16).figure;
  const read = parseLength(typed, unit, { leastMm: ROLL_LIMITS.least, mostMm: ROLL_LIMITS.most });
  // Untouched, the width is the very one remembered, not the figure shown for it.
  const width = own === null ? lastWidth : read.ok ? Math.round(read.mm * 10) / 10 : undefined;
  const value: FullSizePaper | null =
    kind !== OWN ? (kind as FullSizePaper) : width === undefined ? null : `roll-${width}`;
  const remember = (paper: string) => rememberPaper(PAPER_KEY, paper);
  return {
    kind,
    value,
    typed,
    error: own === null || read.ok ? undefined : read.say,
    choose: (next: string) => {
      setChosen(next);
      if (next !== OWN) remember(next);
    },
    type: (text: string) => {
      setOwn(text);
      const now = parseLength(text, unit, { leastMm: ROLL_LIMITS.least, mostMm: ROLL_LIMITS.most });
      if (now.ok) remember(`roll-${Math.round(now.mm * 10) / 10}`);
    },
  };
}

type Shown = { doc: FullSizeDocument; layout: FullSizeLayout } | { say: string };

function laid(build: FullSizeSheetProps["build"], width: number | null, paper: FullSizePaper): Shown {
  try {
    const doc = build(width);
    return { doc, layout: layOut(doc, paper) };
  } catch (error) {
    console.error("A pattern could not be laid out.", error);
    return { say: sayPrintProblem(error) };
  }
}

interface SheetsProps {
  doc: FullSizeDocument;
  layout: FullSizeLayout;
  paper: FullSizePaper;
  name: string;
  unit: Unit;
}

function Sheets({ doc, layout, name, paper, unit }: SheetsProps) {
  const { sheets } = layout;
  const [chosen, setChosen] = useState(() => new Set(sheets.map((sheet) => sheet.name)));
  const [saved, setSaved] = useState("");
  const all = chosen.size === sheets.length;
  const make = useCallback(
    async (_: FullSizePaper, onProgress: OnProgress) => {
      const { makeFullSize } = await import("@/lib/pdf/client");
      return makeFullSize({ docs: [doc], paper, ...(!all && { only: [...chosen] }) }, onProgress);
    },
    [doc, paper, all, chosen],
  );
  const fileName = `Pattern of ${name}`.replace(/[\\/:*?"<>|\p{Cc}]/gu, " ").trim();
  const saveDrawing = async () => {
    const { fullSizeSvg } = await import("@/lib/pdf/full-size-svg");
    const file = new File([fullSizeSvg(doc)], `${fileName}.svg`, { type: "image/svg+xml" });
    saveFile(file);
    setSaved(file.name);
  };
  return (
    <>
      <Card aria-labelledby="sheets-title">
        <CardHead id="sheets-title" title={countWords(layout, unit)} sub={chosenWords(chosen.size, layout)} />
        <SheetPlan layout={layout} chosen={chosen} onChoose={setChosen} />
      </Card>
      <Card aria-labelledby="make-title">
        <CardHead id="make-title" title="Print or share" />
        {doc.warnings.length > 0 && (
          <Notice tone="look" title={doc.warnings[0]} className="mb-3">
            {doc.warnings.slice(1).map((words) => (
              <p key={words}>{words}</p>
            ))}
          </Notice>
        )}
        {chosen.size === 0 ? (
          <p>Choose one sheet or more to print.</p>
        ) : (
          <ShareDocument
            key={[...chosen].join()}
            name={NAME}
            make={make}
            fileName={fileName}
            papers={[{ value: paper, label: layout.paper }]}
            rememberAs="full-size"
          />
        )}
        <div className="mt-4 grid justify-items-start gap-2 border-t border-line pt-4">
          <Button icon={<FileDown className="size-5" />} onClick={() => void saveDrawing()}>
            Save as a drawing (SVG)
          </Button>
          <p className="text-sm text-soft">
            All pieces in one drawing in millimetres, for a plotter or a cutter.
          </p>
          <div role="status">
            {saved && <Notice tone="good" title={`Saved as ${saved}, in your downloads.`} />}
          </div>
        </div>
      </Card>
    </>
  );
}

function countWords({ isRoll, paper, sheets }: FullSizeLayout, unit: Unit): string {
  const count = sheets.length;
  if (!isRoll) return `${count} ${count === 1 ? "sheet" : "sheets"} of ${paper}`;
  const length = sheets.reduce((sum, { page }) => sum + page.h, 0);
  return `${formatPlain(length, unit)} of the roll${count > 1 ? `, in ${count} strips` : ""}`;
}

function chosenWords(chosen: number, { isRoll, sheets }: FullSizeLayout): string | undefined {
  const one = isRoll ? "strip" : "sheet";
  if (sheets.length === 1) return undefined;
  if (chosen === sheets.length) return `Tap a ${one} to leave it out.`;
  return `${chosen} of ${sheets.length} chosen.`;
}
