import { TriangleAlert } from "lucide-react";
import { AppLink } from "@/components/ui/app-link";
import { Card, CardHead } from "@/components/ui/card";
import { Length } from "@/components/ui/fraction";
import { Tape } from "@/components/ui/tape";
import { type LatestFigure } from "@/lib/clients/latest-figures";
import { formatDay } from "@/lib/people/format-day";
import { type Fineness, type Unit } from "@/lib/records/types";

/** The figures to work by, each leading to its own history. */
export function LatestFiguresCard({
  wearerId,
  figures,
  unit,
  fineness,
}: {
  wearerId: string;
  figures: LatestFigure[];
  unit: Unit;
  fineness: Fineness;
}) {
  return (
    <Card aria-labelledby="figures" className="overflow-clip">
      <CardHead id="figures" title="Latest figures" />
      <ul className="-mx-4 grid grid-cols-[repeat(auto-fill,minmax(min(100%,9.5rem),1fr))]">
        {figures.map(({ key, name, mm, takenOn, stale }) => (
          <li key={key} className="border-t border-line">
            <AppLink
              href={`/measure/history?wearer=${wearerId}&figure=${key}`}
              className="row-link grid h-full min-h-target content-start gap-1 px-4 py-3 text-ink no-underline"
            >
              <Length mm={mm} unit={unit} fineness={fineness} size="card" />
              <span className="font-semibold">{name}</span>
              <span
                className={
                  stale ? "flex items-start gap-1 text-sm font-semibold text-thread" : "text-sm text-soft"
                }
              >
                {stale && <TriangleAlert aria-hidden="true" className="mt-[0.2em] size-[1em] shrink-0" />}
                <span>
                  {formatDay(takenOn, { style: "short" })}
                  {stale && ", old"}
                </span>
              </span>
            </AppLink>
          </li>
        ))}
      </ul>
      <div className="-mx-4 mt-2 -mb-4">
        <Tape unit={unit} />
      </div>
    </Card>
  );
}
