/** What is in a copy, and what reading it in would do, in words. */
import { type ReadingPlan } from "./compare-copy";
import { type RowHead } from "@/lib/records/types";
import { type SavedCopy } from "./saved-copy";

const count = (n: number, one: string): string => `${n} ${n === 1 ? one : `${one}s`}`;

/** "12 clients", "30 wearers", …; what there is none of is left out, the bin's are counted apart. */
export function contentWords({ tables, drafts }: SavedCopy): string[] {
  const kinds = [
    ["clients", "client"],
    ["wearers", "wearer"],
    ["measurementSets", "measurement set"],
    ["sleeves", "sleeve"],
    ["sums", "sewing sum"],
    ["orders", "order"],
    ["payments", "payment"],
    ["receipts", "receipt"],
  ] as const;
  const rows = (name: (typeof kinds)[number][0]): readonly RowHead[] => tables[name];
  const binned = kinds.flatMap(([name]) => rows(name).filter(({ removedAt }) => removedAt !== null));
  const words = [
    ...kinds.map(
      ([name, one]) => [rows(name).filter(({ removedAt }) => removedAt === null).length, one] as const,
    ),
    [binned.length, "thing", " in the bin"] as const,
    [drafts.length, "thing", " begun and not kept yet"] as const,
  ]
    .filter(([n]) => n > 0)
    .map(([n, one, where = ""]) => count(n, one) + where);
  return words.length > 0 ? words : ["the workshop itself, and nothing in it yet"];
}

/** What merging into the same workshop's book does. */
export function mergeWords({ counts: { fresh, changed, same } }: ReadingPlan): string[] {
  const entries = (n: number) => (n === 1 ? "1 entry" : `${n} entries`);
  if (fresh + changed === 0) return ["Everything in it is in this phone’s book already."];
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
