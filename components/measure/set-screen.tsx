"use client";

import { backToClients, NotShown } from "@/components/frame/not-shown";
import { useIdParam } from "@/components/store/use-id-param";
import { useView, useWorkshop } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { AppLink } from "@/components/ui/app-link";
import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { allQuestions } from "@/lib/measuring/questions";
import { knownOf } from "@/lib/measuring/known";
import { shareText } from "@/lib/measuring/share-text";
import { fullSet } from "@/lib/figures/body-measures";
import { staleness } from "@/lib/figures/staleness";
import { ageOn } from "@/lib/people/age";
import { formatDay } from "@/lib/people/format-day";
import { setCardQuery, type SetCardView, wearerCardQuery } from "@/lib/store/queries/wearers";
import { QuestionNote } from "./question-note";
import { SetFigures } from "./set-figures";
import { ShareButton } from "./share-button";

const TITLE = "Measurement set";
const ageUnknown = { birthYear: null, birthMonth: null, ageYears: null, ageOn: null };
const NOT_HERE = "This measurement set is not in the book.";

export function SetScreen() {
  const id = useIdParam("id");
  return id ? (
    <SetCard key={id} id={id} />
  ) : (
    <NotShown back={backToClients} title={TITLE} state="known" say={NOT_HERE} />
  );
}

function SetCard({ id }: { id: string }) {
  const { view, state } = useView(setCardQuery, { id });
  if (!view) return <NotShown back={backToClients} title={TITLE} state={state} say={NOT_HERE} />;
  return <KnownSet view={view} />;
}

function KnownSet({ view: { set, wearer, client, correctedBy, corrects } }: { view: SetCardView }) {
  const { view: card } = useView(wearerCardQuery, { id: set.wearerId });
  const { unit, fineness } = useWorkshop() ?? ({ unit: "in", fineness: 8 } as const);
  const standing = card?.sets ?? [];
  const today = useToday();
  const known = knownOf({ wearer: wearer ?? ageUnknown, standing, before: set, today, bookUnit: unit });
  const figures = Object.fromEntries(set.figures.map(({ key, mm }) => [key, { mm }]));
  const questions = allQuestions(figures, fullSet.measures, known);
  const stale = staleness(set.takenOn, ageOn(wearer ?? ageUnknown, today)?.years, today).say;
  const name = wearer?.name ?? "Wearer";

  return (
    <Screen
      title={`Figures of ${name}`}
      sub={[formatDay(set.takenOn, { style: "long" }), set.takenBy && `by ${set.takenBy}`]
        .filter(Boolean)
        .join(", ")}
      back={wearer ? { href: `/wearers/card?id=${wearer.id}`, label: wearer.name } : backToClients}
      action={
        correctedBy ? (
          <ButtonLink variant="main" full href={`/measure/set?id=${correctedBy.id}`}>
            Open the later set
          </ButtonLink>
        ) : (
          <ButtonLink variant="main" full href={`/sleeves/draft?set=${set.id}`}>
            Draft a sleeve from it
          </ButtonLink>
        )
      }
    >
      {correctedBy && (
        <Notice tone="look" title="A later set puts this one right.">
          <p>
            This one stays as it was taken. Work from the set of{" "}
            {formatDay(correctedBy.takenOn, { style: "long" })}.
          </p>
        </Notice>
      )}
      {corrects && (
        <p>
          Puts right{" "}
          <AppLink href={`/measure/set?id=${corrects.id}`}>
            the set of {formatDay(corrects.takenOn, { style: "long" })}
          </AppLink>
          , which stays in the book.
        </p>
      )}
      {stale && !correctedBy && <Notice tone="look" title={stale} />}
      <SetFigures set={set} previous={known.previous} corrects={corrects} unit={unit} fineness={fineness} />
      {set.note && <p className="wrap-anywhere whitespace-pre-line">{set.note}</p>}
      {questions.length > 0 && (
        <section aria-labelledby="questions" className="grid gap-3">
          <h2 id="questions" className="font-figure text-lg font-bold">
            Worth a second look
          </h2>
          <ul className="grid gap-3">
            {questions.map((question) => (
              <li key={question.sign}>
                <QuestionNote question={question} unit={unit} fineness={fineness} />
              </li>
            ))}
          </ul>
        </section>
      )}
      <div className="grid gap-2 sm:grid-cols-2">
        {!correctedBy && wearer && (
          <ButtonLink full href={`/measure?wearer=${wearer.id}&corrects=${set.id}`}>
            Put a figure right
          </ButtonLink>
        )}
        <ShareButton text={shareText(set, name, unit, fineness)} title={`Figures of ${name}`} />
      </div>
      {client && (
        <p className="text-soft">
          For <AppLink href={`/clients/card?id=${client.id}`}>{client.name}</AppLink>. Send figures only to
          those who sew from them.
        </p>
      )}
    </Screen>
  );
}
