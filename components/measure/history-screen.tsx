"use client";

import { useRouter, useSearchParams } from "next/navigation";
import { NotShown } from "@/components/clients/not-shown";
import { useIdParam } from "@/components/clients/use-id-param";
import { useView, useWorkshop } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { AppLink } from "@/components/ui/app-link";
import { ButtonLink } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Empty } from "@/components/ui/empty";
import { Field, Select } from "@/components/ui/field";
import { Length } from "@/components/ui/fraction";
import { Screen } from "@/components/ui/screen";
import { wearerWords } from "@/lib/clients/age-words";
import { bodyMeasure, fullSet, isMeasureKey, type MeasureKey } from "@/lib/figures/body-measures";
import { ageBand } from "@/lib/measuring/age-band";
import { figureHistory, type PastFigure } from "@/lib/measuring/history";
import { formatDay } from "@/lib/people/format-day";
import { type Fineness, type Unit, type Wearer } from "@/lib/records/types";
import { wearerCardQuery, type WearerCardView } from "@/lib/store/queries/wearers";
import { HistoryChart } from "./history-chart";
import { LengthChange } from "./length-change";

const NOT_HERE = "This wearer is not in the book.";

export function HistoryScreen() {
  const id = useIdParam("wearer");
  const figure = useSearchParams().get("figure") ?? "";
  return id ? (
    <KnownWearer key={id} id={id} figure={isMeasureKey(figure) ? figure : null} />
  ) : (
    <NotShown title="History" state="known" say={NOT_HERE} />
  );
}

function KnownWearer({ id, figure }: { id: string; figure: MeasureKey | null }) {
  const { view, state } = useView(wearerCardQuery, { id });
  if (!view) return <NotShown title="History" state={state} say={NOT_HERE} />;
  return <History view={view} figure={figure} />;
}

function History({ view, figure }: { view: WearerCardView; figure: MeasureKey | null }) {
  const { wearer, sets } = view;
  const router = useRouter();
  const today = useToday();
  const workshop = useWorkshop();
  const unit = workshop?.unit ?? "in";
  const fineness = workshop?.fineness ?? 8;
  const counts = new Map(fullSet.measures.map((key) => [key, figureHistory(sets, key).length]));
  // The one asked for; else the first that has a history.
  const chosen = figure ?? fullSet.measures.find((key) => counts.get(key)) ?? "upperArmGirth";
  const past = figureHistory(sets, chosen);
  const measure = bodyMeasure(chosen);
  const href = `/measure?wearer=${wearer.id}`;

  return (
    <Screen
      title={measure.name}
      sub={`${wearer.name}: ${wearerWords(wearer, today)}`}
      back={{ href: `/wearers/card?id=${wearer.id}`, label: wearer.name }}
    >
      <Field label="Figure">
        <Select
          value={chosen}
          onChange={(event) =>
            router.replace(`/measure/history?wearer=${wearer.id}&figure=${event.target.value}`)
          }
        >
          {fullSet.measures.map((key) => (
            <option key={key} value={key}>
              {bodyMeasure(key).name}
              {counts.get(key) ? ` (${counts.get(key)})` : ", not taken yet"}
            </option>
          ))}
        </Select>
      </Field>
      {past.length === 0 ? (
        <Empty
          say={`The ${measure.name.toLowerCase()} of ${wearer.name} was not taken yet. Each taking adds a dot here.`}
          action={<ButtonLink href={href}>Measure {wearer.name}</ButtonLink>}
        />
      ) : (
        <PastFigures wearer={wearer} measure={chosen} past={past} unit={unit} fineness={fineness} />
      )}
    </Screen>
  );
}

interface PastFiguresProps {
  wearer: Wearer;
  measure: MeasureKey;
  /** Oldest first. */
  past: PastFigure[];
  unit: Unit;
  fineness: Fineness;
}

function PastFigures({ wearer, measure, past, unit, fineness }: PastFiguresProps) {
  const first = past[0]!;
  const last = past.at(-1)!;
  const band = past.length > 1 ? ageBand(measure, wearer, first.takenOn, last.takenOn) : null;
  return (
    <>
      <Card aria-labelledby="through-time">
        <CardHead
          id="through-time"
          title="Through time"
          sub={
            past.length > 1 && (
              <>
                <LengthChange fromMm={first.mm} toMm={last.mm} unit={unit} fineness={fineness} /> since{" "}
                {formatDay(first.takenOn)}
              </>
            )
          }
          end={<Length mm={last.mm} unit={unit} fineness={fineness} size="card" />}
        />
        <HistoryChart points={past.map(({ takenOn, mm }) => ({ on: takenOn, mm }))} unit={unit} band={band} />
        {band && <p className="mt-2 text-sm text-soft">{band.say}</p>}
      </Card>
      <table className="w-full border-collapse">
        <caption className="pb-1 text-start font-figure text-lg font-bold">Each taking</caption>
        <thead>
          <tr className="border-b-2 border-edge text-start">
            <th scope="col" className="py-2 pe-2 text-start">
              Day
            </th>
            <th scope="col" className="py-2 pe-2 text-start">
              Figure
            </th>
            <th scope="col" className="py-2 text-start">
              Change
            </th>
          </tr>
        </thead>
        <tbody>
          {past
            .map(({ setId, takenOn, takenBy, mm }, i) => (
              <tr key={setId} className="border-b border-line">
                <th scope="row" className="py-1 pe-2 text-start font-normal">
                  <AppLink
                    href={`/measure/set?id=${setId}`}
                    className="inline-flex min-h-target items-center"
                  >
                    {formatDay(takenOn)}
                  </AppLink>
                  {takenBy && <span className="block text-sm text-soft">{takenBy}</span>}
                </th>
                <td className="py-1 pe-2 text-lg font-semibold">
                  <Length mm={mm} unit={unit} fineness={fineness} />
                </td>
                <td className="py-1">
                  {i === 0 ? (
                    <span className="text-soft">first</span>
                  ) : (
                    <LengthChange fromMm={past[i - 1]!.mm} toMm={mm} unit={unit} fineness={fineness} />
                  )}
                </td>
              </tr>
            ))
            .reverse()}
        </tbody>
      </table>
    </>
  );
}
