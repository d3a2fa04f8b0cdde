"use client";

import { Plus } from "lucide-react";
import { AppLink } from "@/components/ui/app-link";
import { ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Empty } from "@/components/ui/empty";
import { FiguresAge } from "@/components/wearers/figures-age";
import { wearerWords } from "@/lib/clients/age-words";
import { type WearerSummary } from "@/lib/store/queries/clients";

/** Everyone whom a client orders for, each with the next two things to do. */
export function ClientWearers({
  clientId,
  wearers,
  today,
}: {
  clientId: string;
  wearers: WearerSummary[];
  today: string;
}) {
  const add = `/wearers/new?client=${clientId}`;
  return (
    <section aria-labelledby="wearers" className="grid gap-3">
      <div className="flex flex-wrap items-center justify-between gap-2">
        <h2 id="wearers" className="font-figure text-lg font-bold">
          Wearers
        </h2>
        {wearers.length > 0 && (
          <ButtonLink href={add} icon={<Plus className="size-5" />}>
            Add a wearer
          </ButtonLink>
        )}
      </div>
      {wearers.length === 0 && (
        <Empty
          say="Here stand the people you sew for: the client, a daughter, a whole choir."
          action={<ButtonLink href={add}>Add a wearer</ButtonLink>}
        />
      )}
      {wearers.length > 0 && (
        <ul className="grid gap-4">
          {wearers.map((summary) => (
            <li key={summary.wearer.id}>
              <WearerCard {...summary} today={today} />
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

function WearerCard({ wearer, latestSet, sleeves, today }: WearerSummary & { today: string }) {
  const heading = `wearer-${wearer.id}`;
  return (
    <Card aria-labelledby={heading}>
      <CardHead
        id={heading}
        level={3}
        title={
          <AppLink href={`/wearers/card?id=${wearer.id}`} className="inline-flex min-h-target items-center">
            {wearer.name}
          </AppLink>
        }
        sub={wearerWords(wearer, today)}
      />
      <div className="grid gap-3">
        <FiguresAge wearer={wearer} latestSet={latestSet} today={today} />
        {sleeves.length > 0 && (
          <p>{sleeves.length === 1 ? "1 sleeve drafted" : `${sleeves.length} sleeves drafted`}</p>
        )}
        <div className="flex flex-wrap gap-2">
          <ButtonLink href={`/measure?wearer=${wearer.id}`} aria-label={`Measure ${wearer.name}`}>
            Measure
          </ButtonLink>
          <ButtonLink
            href={`/sleeves/draft?wearer=${wearer.id}`}
            aria-label={`Draft a sleeve for ${wearer.name}`}
          >
            Draft a sleeve
          </ButtonLink>
        </div>
      </div>
    </Card>
  );
}
