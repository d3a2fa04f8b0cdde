import { westernDigits } from "@/lib/lengths/western-digits";
import { type Client } from "@/lib/records/types";
import { fold } from "@/lib/search/fold";

export interface TypedClient {
  name: string;
  phone: string;
  phoneE164: string | null;
}

export interface SimilarClient {
  client: Client;
  same: "name" | "phone" | "both";
}

/** Fewer figures than this are no number of anyone's own. */
const FEWEST_FIGURES = 6;

const nameKey = (name: string): string => fold(name).split(" ").sort().join(" ");
const figuresOf = (phone: string): string => westernDigits(phone).replace(/\D/gu, "");

function samePhone(typed: TypedClient, client: Client): boolean {
  if (typed.phoneE164 !== null && client.phoneE164 !== null) return typed.phoneE164 === client.phoneE164;
  const figures = figuresOf(typed.phone);
  return figures.length >= FEWEST_FIGURES && figures === figuresOf(client.phone);
}

/**
 * Clients who may be the one being typed: the same words in the name, whatever their order and accents, or the same
 * phone number. `exceptId` is the client being changed.
 */
export function similarClients(
  typed: TypedClient,
  clients: readonly Client[],
  exceptId: string | null = null,
): SimilarClient[] {
  const name = nameKey(typed.name);
  return clients.flatMap((client): SimilarClient[] => {
    if (client.id === exceptId || client.removedAt !== null) return [];
    const byName = name !== "" && nameKey(client.name) === name;
    const byPhone = samePhone(typed, client);
    if (!byName && !byPhone) return [];
    return [{ client, same: byName && byPhone ? "both" : byName ? "name" : "phone" }];
  });
}

/** What to say of one of them. */
export function similarWords({ client, same }: SimilarClient): string {
  if (same === "name") return client.phone ? `The same name; phone ${client.phone}` : "The same name";
  return same === "both" ? "The same name and phone number" : `The same phone number, ${client.phone}`;
}
