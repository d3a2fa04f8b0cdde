/** A sleeve's pieces as they are printed at full size. */
import { allow } from "@/lib/drafting/allow";
import { type PatternPiece } from "@/lib/drafting/pattern";
import { type Edge } from "@/lib/drafting/types";
import { formatPlain } from "@/lib/lengths/format-length";
import { type Phrase, phraseText } from "@/lib/lengths/phrase";
import { mmPerInch } from "@/lib/lengths/units";
import { type IsoDate } from "@/lib/people/iso-date";
import {
  type Chain,
  type FullSizeDocument,
  type FullSizeLine,
  type FullSizePiece,
  type Stroke,
} from "@/lib/pdf/full-size-document";
import { type Sleeve, type Unit } from "@/lib/records/types";
import { failingSeams, type GoodSleeve, piecesOf } from "@/lib/sleeves/make-style-from-record";

export interface FullSizeAsk {
  readonly sleeve: Pick<Sleeve, "name" | "fineness">;
  readonly good: GoodSleeve;
  /** Width of the allowance where an edge has none of its own, mm; null leaves all allowances out. */
  readonly allowance: number | null;
  readonly unit: Unit;
  readonly wearerName: string;
  /** The workshop's name. */
  readonly author: string;
  readonly today: IsoDate;
}

/** 1/4 in, and the nearest millimetre to it. Common practice, no source. */
export const usualAllowance = (unit: Unit): number => (unit === "in" ? mmPerInch / 4 : 6);

/** A notch where no allowance is drawn goes this far into the piece, mm. */
const NOTCH = 6;

/** Pure: the same sleeve gives the same document. A seam or a check that fails is said on the first sheet. */
export function fullSizeDocument(ask: FullSizeAsk): FullSizeDocument {
  const { allowance, author, good, sleeve, today, unit, wearerName } = ask;
  const { pieces, style } = piecesOf(good);
  const text = (phrase: readonly (string | { readonly mm: number })[]) =>
    phraseText([...phrase] as Phrase, unit, sleeve.fineness);
  const failing = [...failingSeams(good), ...good.checks.filter(({ verdict }) => verdict === "wrong")];
  return {
    title: sleeve.name,
    style,
    wearer: wearerName,
    date: today,
    allowances: allowanceWords(pieces, ask),
    warnings: [
      ...(failing.length > 0 ? ["This sleeve fails. Change it before cloth is cut."] : []),
      ...failing.map(({ phrase, remedy }) => `${text(phrase)} ${text(remedy)}`),
    ],
    pieces: pieces.map((piece) => printed(piece, allowance)),
    author,
    lang: "en-GB",
  };
}

function allowanceWords(pieces: readonly PatternPiece[], { allowance, sleeve, unit }: FullSizeAsk): string {
  if (allowance === null) return "No allowances are drawn: add them outside the line you sew.";
  const width = (mm: number) => formatPlain(mm, unit, sleeve.fineness);
  const own = pieces.flatMap(({ allowances, edges, name, onFold }) =>
    edges
      .filter((edge) => edge.name !== onFold && (allowances[edge.name] ?? allowance) !== allowance)
      .map((edge) => `${name}, ${edgeWords(edge.name)} ${width(allowances[edge.name]!)}`),
  );
  return own.length === 0
    ? `Allowances drawn: ${width(allowance)}.`
    : `Allowances drawn: ${width(allowance)}, but ${own.join("; ")}.`;
}

/** "capFront" reads "cap front". */
const edgeWords = (name: string): string => name.replace(/(?=[A-Z])/gu, " ").toLowerCase();

function printed(piece: PatternPiece, allowance: number | null): FullSizePiece {
  const { cut, edges, grain, id, lines, name, onFold } = piece;
  const allowed = allow(allowance === null ? { ...piece, allowances: {} } : piece, allowance ?? NOTCH);
  const strokes = allowed.notches.flatMap((notch) => notch.strokes);
  const fold = edges.find((edge) => edge.name === onFold);
  const foldLine: FullSizeLine[] = fold
    ? [{ kind: "fold", words: "Lay on the fold", curves: fold.curves }]
    : [];
  return {
    id,
    name,
    cutWords: cutWords(cut, onFold !== undefined),
    stitch: [withoutFold(edges, onFold)],
    ...(allowance !== null && { cutting: [withoutFold(allowed.cutting.edges, onFold)] }),
    notches: strokes.map(({ inner, outer }): Stroke => {
      if (allowance !== null) return [inner, outer];
      return [inner, { x: 2 * inner.x - outer.x, y: 2 * inner.y - outer.y }];
    }),
    grain,
    lines: [...foldLine, ...lines],
    labels: [],
  };
}

function cutWords({ count, mirrored }: PatternPiece["cut"], onFold: boolean): string {
  const times = `Cut ${count}${onFold ? " on the fold" : ""}`;
  return mirrored && count > 1 ? `${times}, mirrored` : times;
}

/** The outline from the end of the fold round to its start: the fold itself is drawn as a fold. */
function withoutFold(edges: readonly Edge[], onFold: string | undefined): Chain {
  const at = edges.findIndex(({ name }) => name === onFold);
  const ring = at < 0 ? edges : [...edges.slice(at + 1), ...edges.slice(0, at)];
  return ring.flatMap(({ curves }) => [...curves]);
}
