"use client";

import { useRouter, useSearchParams } from "next/navigation";
import { backToClients, NotShown } from "@/components/frame/not-shown";
import { useIdParam } from "@/components/store/use-id-param";
import { useView, useWorkshop } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { ButtonLink } from "@/components/ui/button";
import { Empty } from "@/components/ui/empty";
import { Field, Select } from "@/components/ui/field";
import { Screen } from "@/components/ui/screen";
import { bodyMeasure, isMeasureKey } from "@/lib/figures/body-measures";
import { wearerWords } from "@/lib/clients/age-words";
import { figureHistory, measuresTaken } from "@/lib/measuring/history";
import { wearerCardQuery, type WearerCardView } from "@/lib/store/queries/wearers";
import { HistoryChart } from "./history-chart";
import { HistoryTable } from "./history-table";

const TITLE = "History of a figure";
const NOT_HERE = "This wearer is not in the book.";

export function HistoryScreen() {
  const id = useIdParam("wearer");
  return id ? (
    <HistoryOf key={id} id={id} />
  ) : (
    <NotShown back={backToClients} title={TITLE} state="known" say={NOT_HERE} />
  );
}

function HistoryOf({ id }: { id: string }) {
  const { view, state } = useView(wearerCardQuery, { id });
  if (!view) return <NotShown back={backToClients} title={TITLE} state={state} say={NOT_HERE} />;
  return <KnownHistory view={view} />;
}

function KnownHistory({ view: { wearer, client, sets } }: { view: WearerCardView }) {
  const router = useRouter();
  const asked = useSearchParams().get("figure");
  const today = useToday();
  const { unit, fineness } = useWorkshop() ?? ({ unit: "in", fineness: 8 } as const);
  const taken = measuresTaken(sets);
  const figure = asked !== null && isMeasureKey(asked) ? asked : taken[0];
  const choices = figure && !taken.includes(figure) ? [figure, ...taken] : taken;
  const points = figure ? figureHistory(sets, figure) : [];
  const measure = (
    <ButtonLink variant="main" full href={`/measure?wearer=${wearer.id}`}>
      Measure
    </ButtonLink>
  );

  return (
    <Screen
      title={figure ? bodyMeasure(figure).name : TITLE}
      sub={`${wearer.name}: ${wearerWords(wearer, today)}`}
      back={client ? { href: `/wearers/card?id=${wearer.id}`, label: wearer.name } : backToClients}
      action={points.length > 0 && measure}
    >
      {choices.length > 0 && (
        <Field label="Figure">
          <Select
            value={figure}
            onChange={(event) =>
              router.replace(`/measure/history?wearer=${wearer.id}&figure=${event.target.value}`, {
                scroll: false,
              })
            }
          >
            {choices.map((key) => (
              <option key={key} value={key}>
                {bodyMeasure(key).name}
              </option>
            ))}
          </Select>
        </Field>
      )}
      {points.length > 0 && figure ? (
        <>
          <HistoryChart
            key={figure}
            figure={figure}
            points={points}
            wearer={wearer}
            unit={unit}
            fineness={fineness}
          />
          <HistoryTable points={points} unit={unit} fineness={fineness} />
        </>
      ) : (
        <Empty
          say={
            figure
              ? `The ${bodyMeasure(figure).name.toLowerCase()} of ${wearer.name} was not taken yet.`
              : "Here a figure is seen growing from set to set. None is taken yet."
          }
          action={measure}
        />
      )}
    </Screen>
  );
}
