/** Sleeves side by side: their figures, and how each differs from the first. */
import { type SleeveAskRecord } from "@/lib/records/types";
import { armholeOfRecord } from "@/lib/sleeves/head-line";
import { type GoodSleeve as Good, type StyledSleeve } from "@/lib/sleeves/make-style-from-record";

/** As many as can be told apart when they lie on each other. */
export const mostCompared = 4;

export interface ComparedRow {
  name: string;
  /** mm by sleeve; null where a sleeve has no such figure. */
  values: (number | null)[];
  /** Less the first sleeve's, by sleeve; null for the first, and where either has none. */
  differences: (number | null)[];
}

interface Compared {
  record: SleeveAskRecord;
  made: StyledSleeve | null;
}

const rows: readonly (readonly [string, (made: Good, record: SleeveAskRecord) => number | undefined])[] = [
  ["Sleeve length", ({ figures }) => figures.length],
  ["Cap depth", ({ figures }) => figures.capDepth],
  ["Biceps line", ({ figures }) => figures.biceps],
  ["Elbow line", ({ figures }) => figures.elbow?.width],
  ["Hem round", ({ figures }) => figures.hem],
  ["Cap seam", ({ draft }) => draft.lengths.cap],
  ["Cap, front half", ({ draft }) => draft.lengths.capFront],
  ["Cap, back half", ({ draft }) => draft.lengths.capBack],
  ["Armhole", (_, record) => armholeOfRecord(record)],
  ["Head ease", ({ draft }, record) => minus(draft.lengths.cap, armholeOfRecord(record))],
  ["Underarm seam", ({ draft }) => draft.lengths.underarmFront],
  ["Head before gathering", ({ gathers }) => gathers.find(({ id }) => id === "head")?.full],
];

function minus(a: number, b: number | undefined): number | undefined {
  return b === undefined ? undefined : a - b;
}

export function comparedRows(sleeves: readonly Compared[]): ComparedRow[] {
  return rows.flatMap(([name, read]) => {
    const values = sleeves.map(({ made, record }) => (made?.ok ? (read(made, record) ?? null) : null));
    if (values.every((value) => value === null)) return [];
    const first = values[0] ?? null;
    const differences = values.map((value, i) =>
      i === 0 || value === null || first === null ? null : value - first,
    );
    return [{ name, values, differences }];
  });
}

/** The ids in the address: each once, at most as many as can be compared. */
export function comparedIds(text: string | null): string[] {
  const ids = (text ?? "").split(",").filter((id) => id !== "");
  return [...new Set(ids)].slice(0, mostCompared);
}
