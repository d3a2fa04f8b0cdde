import { Mail, MessageSquare, Phone } from "lucide-react";
import { ButtonLink } from "@/components/ui/button";
import { Card } from "@/components/ui/card";
import { phoneLinks } from "@/lib/clients/phone-links";
import { type Client } from "@/lib/records/types";

/** How to reach a client, and what to mind. */
export function ContactCard({ client }: { client: Client }) {
  const { name, phone, phoneE164, email, address, note } = client;
  const links = phoneLinks(phone, phoneE164);
  if ([phone, email, address, note].every((text) => text === "")) return null;
  return (
    <Card aria-label={`To reach ${name}`} className="grid gap-3">
      {phone && <p className="figures text-lg font-semibold wrap-anywhere">{phone}</p>}
      {(links || email) && (
        <div className="flex flex-wrap gap-2">
          {links && (
            <>
              <ButtonLink href={links.call} icon={<Phone className="size-5" />} aria-label={`Call ${name}`}>
                Call
              </ButtonLink>
              <ButtonLink
                href={links.message}
                icon={<MessageSquare className="size-5" />}
                aria-label={`Write a message to ${name}`}
              >
                Message
              </ButtonLink>
            </>
          )}
          {email && (
            <ButtonLink
              href={`mailto:${encodeURIComponent(email).replace("%40", "@")}`}
              icon={<Mail className="size-5" />}
              aria-label={`Write to ${email}`}
            >
              Email
            </ButtonLink>
          )}
        </div>
      )}
      {address && <p className="wrap-anywhere whitespace-pre-line">{address}</p>}
      {note && <p className="wrap-anywhere whitespace-pre-line text-soft">{note}</p>}
    </Card>
  );
}
