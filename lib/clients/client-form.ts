import { z } from "zod";
import {
  isBlankWearer,
  NAME_AT_MOST,
  wearerFields,
  wearerProblems,
  wearerShape,
  type WearerValues,
} from "@/lib/clients/wearer-form";
import { type IsoDate } from "@/lib/people/iso-date";
import { type Client, type ClientFields, type WearerFields } from "@/lib/records/types";

/** What the form holds of a client, as typed. */
export interface ClientValues {
  name: string;
  phone: string;
  email: string;
  address: string;
  note: string;
}

/** A new client with the first wearers. */
export interface NewClientValues extends ClientValues {
  /** Sewn for too. */
  self: boolean;
  wearers: WearerValues[];
}

export const emptyClient: ClientValues = { name: "", phone: "", email: "", address: "", note: "" };

const clientShape = z.object({
  name: z
    .string()
    .refine((name) => name.trim() !== "", "Type the client's name.")
    .refine(
      (name) => name.trim().length <= NAME_AT_MOST,
      `Type a name of at most ${NAME_AT_MOST} letters; the rest can stand in the note.`,
    ),
  phone: z.string(),
  // Only what can never be an address is refused: a letter will show whether it arrives.
  email: z
    .string()
    .refine(
      (email) => email.trim() === "" || /^[^\s@]+@[^\s@]+$/u.test(email.trim()),
      "Type the address with one @ and no spaces, such as name@example.com, or leave it empty.",
    ),
  address: z.string(),
  note: z.string(),
});

export const clientSchema = clientShape;

/** As `clientSchema`, with the wearers; a wearer with nothing typed is passed over. */
export const newClientSchema = (today: IsoDate) =>
  clientShape
    .extend({ self: z.boolean(), wearers: z.array(wearerShape) })
    .superRefine(({ wearers }, context) => {
      wearers.forEach((wearer, i) => {
        if (isBlankWearer(wearer)) return;
        for (const { field, say } of wearerProblems(wearer, today))
          context.addIssue({ code: "custom", path: ["wearers", i, field], message: say });
      });
    });

/** The row's fields. `phoneE164` is what the phone reads as, or null. */
export function clientFields(values: ClientValues, phoneE164: string | null): ClientFields {
  return {
    name: values.name.trim().replace(/\s+/gu, " "),
    phone: values.phone.trim(),
    phoneE164,
    email: values.email.trim(),
    address: values.address.trim(),
    note: values.note.trim(),
  };
}

/** A kept client as the form shows it. */
export function clientValues({ name, phone, email, address, note }: Client): ClientValues {
  return { name, phone, email, address, note };
}

/** The wearers kept with a new client: the client's own self first, as grown up, then those typed. */
export function firstWearers(values: NewClientValues, clientId: string): WearerFields[] {
  const self: WearerValues[] = values.self
    ? [{ name: values.name, known: "grown", month: "", year: "", age: "", on: "", note: "" }]
    : [];
  return [...self, ...values.wearers.filter((wearer) => !isBlankWearer(wearer))].map((wearer) =>
    wearerFields(wearer, clientId),
  );
}
