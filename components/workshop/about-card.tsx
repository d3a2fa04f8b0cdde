"use client";

import { Card, CardHead } from "@/components/ui/card";
import { SCHEMA_NUMBER } from "@/lib/journal/change";
import { type Head } from "@/lib/journal/journal";
import { seriesOf } from "@/lib/receipts/number";

/** Where things are, and which Notchbook this is. */
export function AboutCard({ head }: { head: Head | null }) {
  const said: [string, string][] = [
    ["Build", process.env.NOTCHBOOK_BUILD_ID ?? "development"],
    ["Book’s schema", String(SCHEMA_NUMBER)],
    ...(head
      ? ([
          ["Receipts of this phone", `${seriesOf(head.device)}-0001 and on`],
          ["Changes kept", String(head.next - 1)],
        ] as [string, string][])
      : []),
  ];
  return (
    <Card aria-labelledby="about-title">
      <CardHead title="Where things are" id="about-title" />
      <div className="grid gap-3">
        <p>
          The book is kept in this browser, on this phone, and nowhere else. Nothing is sent anywhere unless
          you send a copy or a receipt. Clearing the browser’s data for this site would erase it.
        </p>
        <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1 text-sm">
          {said.map(([name, value]) => (
            <div key={name} className="contents">
              <dt className="text-soft">{name}</dt>
              <dd className="wrap-anywhere">{value}</dd>
            </div>
          ))}
        </dl>
      </div>
    </Card>
  );
}
