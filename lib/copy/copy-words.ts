/** What is in a copy, and what reading it in would do, in words. */
import { type ReadingPlan } from "./compare-copy";
import { type SavedCopy } from "./saved-copy";

const count = (n: number, one: string): string => `${n} ${n === 1 ? one : `${one}s`}`;

/** "12 clients, 30 wearers, …"; the bin's are counted apart. */
export function contentWords({ tables, drafts }: SavedCopy): string[] {
  const kinds = [
    ["clients", "client"],
    ["wearers", "wearer"],
    ["measurementSets", "measurement set"],
    ["sleeves", "sleeve"],
    ["orders", "order"],
    ["payments", "payment"],
    ["receipts", "receipt"],
  ] as const;
  const live = kinds.map(([name, one]) =>
    count(tables[name].filter((row: { removedAt: string | null }) => row.removedAt === null).length, one),
  );
  const binned = kinds.reduce(
    (sum, [name]) =>
      sum + tables[name].filter((row: { removedAt: string | null }) => row.removedAt !== null).length,
    0,
  );
  return [
    ...live,
    ...(binned > 0 ? [`${count(binned, "thing")} in the bin`] : []),
    ...(drafts.length > 0 ? [`${count(drafts.length, "thing")} begun and not kept yet`] : []),
  ];
}

/** What merging into the same workshop's book does. */
export function mergeWords({ counts: { fresh, changed, same } }: ReadingPlan): string[] {
  const entries = (n: number) => (n === 1 ? "1 entry" : `${n} entries`);
  if (fresh + changed === 0) return [`All ${entries(same)} of it are in this phone's book already.`];
  return [
    ...(fresh > 0 ? [`${entries(fresh)} ${fresh === 1 ? "is" : "are"} new here.`] : []),
    ...(changed > 0
      ? [
          `${entries(changed)} ${changed === 1 ? "has" : "have"} something later in the copy, which then stands.`,
        ]
      : []),
    ...(same > 0 ? [`${entries(same)} ${same === 1 ? "stays as it is" : "stay as they are"}.`] : []),
    "Nothing that is only on this phone is lost.",
  ];
}
