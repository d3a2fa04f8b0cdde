"use client";

import { useState } from "react";
import { useBookState, useWorkshop } from "@/components/store/use-book";
import { useDraft } from "@/components/store/use-draft";
import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { guessCountry, guessCurrency, guessUnit } from "@/lib/workshop/home-country";
import { type StartValues } from "@/lib/workshop/workshop-form";
import { SleeveDrawing } from "./sleeve-drawing";
import { START_DRAFT, StartForm } from "./start-form";

/** The first visit: what this is in a line, and the three things that it has to know. */
export function StartScreen() {
  const state = useBookState();
  return (
    <main
      id="main"
      tabIndex={-1}
      className="screen mx-auto max-w-page lg:grid lg:max-w-wide lg:grid-cols-2 lg:items-center lg:gap-12"
    >
      <header className="mb-5 text-center">
        <SleeveDrawing />
        <h1 className="mt-2 font-figure text-2xl font-bold">Notchbook</h1>
        <p className="mx-auto max-w-[24rem] text-balance lg:text-lg">
          A dressmaker’s book on this phone: clients, figures, sleeves that fit, orders and money. It works
          without data.
        </p>
      </header>
      <div className="grid w-full max-w-page flex-1 grid-cols-[minmax(0,1fr)] content-start gap-4">
        {state.phase !== "open" ? (
          <Progress label="Opening" />
        ) : state.head.next > 1 ? (
          <HasBegun />
        ) : (
          <Begin workshopId={state.head.workshopId} />
        )}
      </div>
    </main>
  );
}

function HasBegun() {
  const workshop = useWorkshop();
  return (
    <>
      <Notice
        tone="good"
        title={workshop ? `The book of ${workshop.name} is on this phone.` : "A book is on this phone."}
      >
        {workshop?.demo && <p>It is an invented workshop. Your own is begun under Workshop.</p>}
      </Notice>
      <ButtonLink href="/" variant="main" full>
        Open the book
      </ButtonLink>
    </>
  );
}

/** Only once the journal has been read, so never where the page is made. */
function Begin({ workshopId }: { workshopId: string }) {
  const handle = useDraft<StartValues>(START_DRAFT);
  const [country] = useState(() => guessCountry(navigator.languages));
  if (handle.draft === undefined) return <Progress label="Opening" />;
  const initial: StartValues = { name: "", currency: guessCurrency(country), unit: guessUnit(country) };
  return <StartForm workshopId={workshopId} country={country} initial={initial} handle={handle} />;
}
