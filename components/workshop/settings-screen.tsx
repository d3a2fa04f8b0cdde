"use client";

import { useState } from "react";
import { useBookState, useView } from "@/components/store/use-book";
import { Card, CardHead, RowLink, Rows } from "@/components/ui/card";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { workshopQuery } from "@/lib/store/queries/workshop";
import { AboutCard } from "./about-card";
import { ClearCard } from "./clear-card";
import { CopiesCard } from "./copies-card";
import { DemoCard } from "./demo-card";
import { LookCard } from "./look-card";
import { PhoneCard } from "./phone-card";
import { WorkshopForm } from "./workshop-form";

const KEEP = "workshop";

/** The workshop itself, the copies of its book, and this phone. */
export function SettingsScreen() {
  const state = useBookState();
  const { view: workshop } = useView(workshopQuery, {});
  const [kept, setKept] = useState(0);
  const head = state.phase === "open" ? state.head : null;
  return (
    <Screen title="Workshop" wide>
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-4 lg:grid-cols-2">
        <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
          {workshop?.demo && <DemoCard />}
          <Card aria-labelledby={KEEP}>
            <CardHead
              title="The workshop"
              id={KEEP}
              sub="Name, address and phone stand at the head of every receipt."
            />
            {workshop ? (
              // A new form after each keeping: it begins from what was kept.
              <WorkshopForm
                key={kept}
                workshop={workshop}
                keptBefore={kept > 0}
                onKept={() => setKept(kept + 1)}
              />
            ) : (
              <Progress label="Opening the book" />
            )}
          </Card>
        </div>
        <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
          <CopiesCard head={head} demo={workshop?.demo ?? false} />
          <Card flush aria-label="The bin">
            <Rows>
              <RowLink href="/bin" title="The bin" sub="What was put there, and how to bring it back" />
            </Rows>
          </Card>
          <LookCard />
          <PhoneCard />
          <AboutCard head={head} />
          <ClearCard head={head} demo={workshop?.demo ?? false} />
        </div>
      </div>
    </Screen>
  );
}
