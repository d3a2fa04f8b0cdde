/** How many stand on the list, for the eye and for a screen reader. */
export function countWords({ shown, more, find }: { shown: number; more: boolean; find: string }): string {
  const clients = shown === 1 ? "client" : "clients";
  if (find === "") return more ? `The first ${shown} clients, by name` : `${shown} ${clients}`;
  if (more) return `The first ${shown} clients that match`;
  return `${shown} ${clients} ${shown === 1 ? "matches" : "match"}`;
}

/** The new-client screen with what was looked for already typed: as the name, or as the phone where it is a number. */
export function newClientHref(find: string): string {
  const typed = find.trim();
  if (typed === "") return "/clients/new";
  const field = /\p{L}/u.test(typed) ? "name" : "phone";
  return `/clients/new?${new URLSearchParams({ [field]: typed }).toString()}`;
}

/** Names in a sentence: "Ama", "Ama and Esi", "Ama, Esi and Kofi". */
export function namesInWords(names: readonly string[]): string {
  if (names.length < 2) return names[0] ?? "";
  return `${names.slice(0, -1).join(", ")} and ${names.at(-1)}`;
}

/** Where the list of clients was left: what was looked for, and how many were shown. */
export interface ListPlace {
  find: string;
  limit: number;
}

export const PAGE = 30;

/** Reads a place that was put down as JSON; anything else is the head of the list. */
export function readListPlace(json: string | null): ListPlace {
  const head: ListPlace = { find: "", limit: PAGE };
  if (json === null) return head;
  try {
    const { find, limit } = JSON.parse(json) as Partial<ListPlace>;
    return {
      find: typeof find === "string" ? find : head.find,
      limit: Number.isSafeInteger(limit) && limit! > PAGE ? limit! : PAGE,
    };
  } catch {
    return head;
  }
}
