"use client";

import { Ask } from "@/components/ui/dialog";
import { Button } from "@/components/ui/button";
import { Card, CardHead, Row, Rows } from "@/components/ui/card";
import { Length } from "@/components/ui/fraction";
import { Screen } from "@/components/ui/screen";
import { bodyMeasure } from "@/lib/figures/body-measures";
import { begunWords } from "@/lib/measuring/begun-words";
import { takenCount, type Taking } from "@/lib/measuring/taking";
import { type Fineness } from "@/lib/records/types";

export interface ResumeOfferProps {
  wearer: string;
  back: { href: string; label: string };
  found: Taking;
  today: string;
  fineness: Fineness;
  onGoOn: () => void;
  onStartOver: () => void;
}

/** A set that was left half-taken: nothing of it is lost. */
export function ResumeOffer({ wearer, back, found, today, fineness, onGoOn, onStartOver }: ResumeOfferProps) {
  const taken = takenCount(found);
  const startOver = <Button full>Start over</Button>;
  return (
    <Screen
      title={`Measure ${wearer}`}
      back={back}
      action={
        <>
          {taken === 0 ? (
            <Button full onClick={onStartOver}>
              Start over
            </Button>
          ) : (
            <Ask
              trigger={startOver}
              title="Throw the half-taken figures away?"
              say={
                <p>
                  {taken === 1 ? "The figure that is" : `The ${taken} figures that are`} taken would be gone
                  for good.
                </p>
              }
              yes="Throw them away"
              no="Keep them"
              danger
              onYes={onStartOver}
            />
          )}
          <Button variant="main" full onClick={onGoOn}>
            Go on
          </Button>
        </>
      }
    >
      <Card flush aria-labelledby="half">
        <div className="px-4">
          <CardHead
            id="half"
            title={`Half-taken set from ${begunWords(found.startedAt, today)}`}
            sub={`${taken} of ${found.keys.length} figures are on this phone.`}
          />
        </div>
        <Rows>
          {found.keys.map((key) => {
            const figure = found.taken[key];
            return (
              <Row
                key={key}
                title={bodyMeasure(key).name}
                sub={figure ? undefined : found.skipped.includes(key) ? "Skipped" : "Still to take"}
                figure={figure && <Length mm={figure.mm} unit={figure.unit} fineness={fineness} />}
              />
            );
          })}
        </Rows>
      </Card>
    </Screen>
  );
}
