"use client";

import { BinAsk } from "@/components/clients/bin-ask";
import { KeepTrouble } from "@/components/frame/form-notices";
import { backToClients, NotShown } from "@/components/frame/not-shown";
import { useIdParam } from "@/components/store/use-id-param";
import { useKeep, useView, useWorkshop } from "@/components/store/use-book";
import { useDraft } from "@/components/store/use-draft";
import { useToday } from "@/components/store/use-today";
import { Button, ButtonLink } from "@/components/ui/button";
import { Empty } from "@/components/ui/empty";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { wearerWords } from "@/lib/clients/age-words";
import { wearerBinQuestion } from "@/lib/clients/bin-question";
import { latestFigures } from "@/lib/clients/latest-figures";
import { setRemoved } from "@/lib/journal/change";
import { ageOn } from "@/lib/people/age";
import { formatDay } from "@/lib/people/format-day";
import { todayIso } from "@/lib/people/today";
import { wearerCardQuery, type WearerCardView } from "@/lib/store/queries/wearers";
import { LatestFiguresCard } from "./latest-figures-card";
import { WearerSets } from "./wearer-sets";
import { WearerWork } from "./wearer-work";

const NOT_HERE = "This wearer is not in the book.";

export function WearerCardScreen() {
  const id = useIdParam("id");
  return id ? (
    <WearerCard key={id} id={id} />
  ) : (
    <NotShown back={backToClients} title="Wearer" state="known" say={NOT_HERE} />
  );
}

function WearerCard({ id }: { id: string }) {
  const { view, state } = useView(wearerCardQuery, { id });
  if (!view) return <NotShown back={backToClients} title="Wearer" state={state} say={NOT_HERE} />;
  return view.wearer.removedAt === null ? <LiveWearer view={view} /> : <BinnedWearer view={view} />;
}

const backTo = ({ client, wearer }: WearerCardView) =>
  client ? { href: `/clients/card?id=${wearer.clientId}`, label: client.name } : backToClients;

function LiveWearer({ view }: { view: WearerCardView }) {
  const { wearer, client, sets, allSets, sleeves, openGarments } = view;
  const today = useToday();
  const workshop = useWorkshop();
  const { keep, busy, problem } = useKeep();
  // The tape screen puts its taking down under this key until the set is kept.
  const halfTaken = useDraft<unknown>(`measure:${wearer.id}`);
  const begun = Boolean(halfTaken.draft);
  const { figures, staleSay } = latestFigures(sets, ageOn(wearer, today)?.years, today);
  const measure = `/measure?wearer=${wearer.id}`;

  return (
    <Screen
      title={wearer.name}
      sub={wearerWords(wearer, today)}
      back={backTo(view)}
      tools={<ButtonLink href={`/wearers/change?id=${wearer.id}`}>Change</ButtonLink>}
      action={
        <ButtonLink variant="main" full href={measure}>
          {begun ? "Go on measuring" : "Measure"}
        </ButtonLink>
      }
    >
      {client?.removedAt && (
        <Notice
          tone="look"
          title={`${client.name}, the client, is in the bin.`}
          action={<ButtonLink href={`/clients/card?id=${client.id}`}>Bring the client back</ButtonLink>}
        />
      )}
      {begun && (
        <Notice title="A set is half taken.">
          <p>
            Last touched {formatDay(todayIso(new Date(halfTaken.savedAt!)), { style: "long" })}. “Go on
            measuring” takes it up where it was left.
          </p>
        </Notice>
      )}
      {wearer.note && <p className="wrap-anywhere whitespace-pre-line">{wearer.note}</p>}
      {staleSay && <Notice tone="look" title={staleSay} />}
      {figures.length > 0 ? (
        <LatestFiguresCard
          wearerId={wearer.id}
          figures={figures}
          unit={workshop?.unit ?? "in"}
          fineness={workshop?.fineness ?? 8}
        />
      ) : (
        <Empty
          say="Here stand the latest figures. A sleeve set is seven of them, and takes a minute."
          action={begun ? undefined : <ButtonLink href={measure}>Take the first set</ButtonLink>}
        />
      )}
      <WearerWork wearer={wearer} sleeves={sleeves} openGarments={openGarments} />
      <WearerSets sets={allSets} />
      <div className="grid justify-items-start gap-2">
        <KeepTrouble keep={problem} draft={null} />
        <BinAsk
          question={wearerBinQuestion(
            wearer,
            allSets.length,
            sleeves.length,
            openGarments.map(({ garment }) => garment.kind),
          )}
          busy={busy}
          onYes={() => void keep([setRemoved("wearers", wearer, new Date().toISOString())])}
        />
      </div>
    </Screen>
  );
}

function BinnedWearer({ view }: { view: WearerCardView }) {
  const { wearer } = view;
  const { keep, busy, problem } = useKeep();
  return (
    <Screen title={wearer.name} back={backTo(view)}>
      <Notice
        live
        title={`${wearer.name} is in the bin, with all figures.`}
        action={
          <>
            <Button busy={busy} onClick={() => void keep([setRemoved("wearers", wearer, null)])}>
              Bring back
            </Button>
            <ButtonLink href={backTo(view).href}>{backTo(view).label}</ButtonLink>
          </>
        }
      >
        <KeepTrouble keep={problem} draft={null} />
      </Notice>
    </Screen>
  );
}
