import { fold } from "@/lib/search/fold";
import { westernDigits } from "@/lib/lengths/western-digits";

/** What a client is searched by. */
export interface Searchable {
  name: string;
  /** As typed, and in E.164 where known; blanks and nulls are passed over. */
  phones: readonly (string | null)[];
  wearerNames: readonly string[];
}

const figuresOf = (text: string): string => westernDigits(text).replace(/\D/gu, "");

/** The folded text that `matchesAll` searches: names, then each phone as its bare figures. */
export function searchText({ name, phones, wearerNames }: Searchable): string {
  const figures = phones.map((phone) => figuresOf(phone ?? "")).filter((phone) => phone !== "");
  return [...[name, ...wearerNames].map(fold).filter((part) => part !== ""), ...new Set(figures)].join(" ");
}

/** Figures as a phone number is written, with its spaces, dashes, dots, brackets and +. */
const phoneLike = /(?<![\p{L}\p{M}\p{N}])\d[\d\s().+/‐-―−-]*(?![\p{L}\p{M}\p{N}])/gu;

/**
 * Whether every word of `query` begins some word of `haystack`, in any order. Figures are taken together, whatever stands between
 * them, and are found anywhere in a phone number; or else each of them begins a word. An empty query matches.
 * @param haystack folded, as `searchText` makes it.
 */
export function matchesAll(haystack: string, query: string): boolean {
  const words = haystack.split(" ");
  const begins = (part: string) => words.some((word) => word.startsWith(part));
  const asked = westernDigits(query);
  const runs = asked.match(phoneLike) ?? [];
  const rest = fold(asked.replace(phoneLike, " "));
  return (
    rest.split(" ").every(begins) &&
    runs.every((run) => {
      const figures = figuresOf(run);
      return (
        words.some((word) => /^\d+$/u.test(word) && word.includes(figures)) ||
        fold(run).split(" ").every(begins)
      );
    })
  );
}
