import { type ReactNode } from "react";
import { TriangleAlert } from "lucide-react";
import { AppLink } from "@/components/ui/app-link";
import { ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { staleness } from "@/lib/figures/staleness";
import { setChoiceWords } from "@/lib/orders/garment-choices";
import { countdownWords } from "@/lib/orders/day-words";
import { ageOn } from "@/lib/people/age";
import { formatDay } from "@/lib/people/format-day";
import { type IsoDate } from "@/lib/people/iso-date";
import { type Garment } from "@/lib/records/types";
import { styleName } from "@/lib/sleeves/style-names";
import { type OrderCardView } from "@/lib/store/queries/orders";

/** What is sewn: for whom, from which figures, with which sleeve, and when it is fitted. */
export function OrderGarments({ view, today }: { view: OrderCardView; today: IsoDate }) {
  const { order, garments } = view;
  return (
    <section aria-labelledby="garments" className="grid gap-3">
      <h2 id="garments" className="font-figure text-lg font-bold">
        What is sewn
      </h2>
      {garments.length === 0 && (
        <p className="text-soft">No garment is set down. “Change” adds what is to be sewn.</p>
      )}
      {garments.length > 0 && (
        <ul className="grid grid-cols-[minmax(0,1fr)] gap-4">
          {garments.map((garment) => (
            <li key={garment.id}>
              <GarmentView garment={garment} view={view} today={today} open={order.stage !== "handed-over"} />
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

function GarmentView({
  garment,
  view: { wearers, sets, sleeves },
  today,
  open,
}: {
  garment: Garment;
  view: OrderCardView;
  today: IsoDate;
  open: boolean;
}) {
  const wearer = wearers.find(({ id }) => id === garment.wearerId);
  const set = sets.find(({ id }) => id === garment.setId);
  const sleeve = sleeves.find(({ id }) => id === garment.sleeveId);
  const stale = open && set && wearer && staleness(set.takenOn, ageOn(wearer, today)?.years, today).say;
  const draft =
    wearer &&
    (set ? `/sleeves/draft?wearer=${wearer.id}&set=${set.id}` : `/sleeves/draft?wearer=${wearer.id}`);
  return (
    <Card aria-label={[garment.kind, wearer?.name].filter(Boolean).join(", ")}>
      <CardHead
        level={3}
        title={garment.kind}
        sub={
          wearer ? (
            <>
              for{" "}
              <AppLink
                href={`/wearers/card?id=${wearer.id}`}
                className="inline-flex min-h-target items-center wrap-anywhere"
              >
                {wearer.name}
              </AppLink>
            </>
          ) : (
            "Nobody named yet"
          )
        }
      />
      <dl className="grid gap-1">
        {wearer && (
          <Fact name="Figures">
            {set ? (
              <AppLink href={`/measure/set?id=${set.id}`} className="inline-flex min-h-target items-center">
                {setChoiceWords(set)}
              </AppLink>
            ) : (
              "Not chosen yet"
            )}
          </Fact>
        )}
        {sleeve && (
          <Fact name="Sleeve">
            <AppLink
              href={`/sleeves/draft?id=${sleeve.id}`}
              className="inline-flex min-h-target items-center wrap-anywhere"
            >
              {sleeve.name}
            </AppLink>
            <span className="block text-soft">{styleName(sleeve.style)}</span>
          </Fact>
        )}
        {garment.fittingOn && (
          <Fact name="Fitting">
            {formatDay(garment.fittingOn, { style: "long" })}
            {open && <>, {countdownWords(garment.fittingOn, today)}</>}
          </Fact>
        )}
      </dl>
      {garment.note && <p className="mt-2 whitespace-pre-wrap wrap-anywhere">{garment.note}</p>}
      {stale && (
        <p className="mt-2 flex items-start gap-2 font-semibold text-thread">
          <TriangleAlert aria-hidden="true" className="mt-[0.2em] size-[1.1em] shrink-0" />
          <span>{stale}</span>
        </p>
      )}
      <div className="mt-3 flex flex-wrap gap-2 empty:hidden">
        {sleeve && <ButtonLink href={`/sleeves/marks?id=${sleeve.id}`}>Marks to draw</ButtonLink>}
        {wearer && open && (!set || stale) && (
          <ButtonLink href={`/measure?wearer=${wearer.id}`}>Measure {wearer.name}</ButtonLink>
        )}
        {!sleeve && draft && open && set && <ButtonLink href={draft}>Draft a sleeve</ButtonLink>}
      </div>
    </Card>
  );
}

function Fact({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="flex flex-wrap items-baseline gap-x-3">
      <dt className="min-w-16 text-soft">{name}</dt>
      <dd className="min-w-0 flex-1 basis-40">{children}</dd>
    </div>
  );
}
