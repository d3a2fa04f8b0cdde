"use client";

import { Check, Undo2 } from "lucide-react";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { cx } from "@/components/ui/cx";
import { stageWords } from "@/lib/clients/order-words";
import { countdownWords, dueWords } from "@/lib/orders/day-words";
import { stages } from "@/lib/orders/stages";
import { formatDay } from "@/lib/people/format-day";
import { type IsoDate } from "@/lib/people/iso-date";
import { type Order, type Stage } from "@/lib/records/types";

export interface StageCardProps {
  order: Order;
  today: IsoDate;
  /** The stage before the last move, while that can be taken back. */
  before: Stage | null;
  busy: boolean;
  onMove: (to: Stage) => void;
}

const key =
  "relative flex h-full min-h-key w-full items-center justify-center gap-1 rounded border-2 px-1 py-2 text-center text-sm touch-manipulation";

/** How far an order is: any stage by one tap, and the last tap taken back. */
export function StageCard({ order, today, before, busy, onMove }: StageCardProps) {
  const at = stages.indexOf(order.stage);
  const due = dueWords(order, today);
  return (
    <Card aria-labelledby="stage">
      <CardHead
        id="stage"
        title={stageWords(order.stage)}
        sub={order.dueOn && <>Due {formatDay(order.dueOn, { style: "long" })}</>}
        end={
          due && (
            <p className={cx("text-lg font-bold", due.late && "text-pin")}>
              {due.late || order.dueOn === null ? due.say : countdownWords(order.dueOn, today)}
            </p>
          )
        }
      />
      <ol
        className="grid auto-rows-fr grid-cols-[repeat(auto-fit,minmax(min(100%,5.5rem),1fr))] gap-2"
        aria-label="Stages"
      >
        {stages.map((stage, i) => (
          <li key={stage}>
            <button
              type="button"
              disabled={busy}
              aria-current={i === at ? "step" : undefined}
              onClick={i === at ? undefined : () => onMove(stage)}
              className={cx(
                key,
                i === at && "border-ink bg-ink font-semibold text-onink",
                i < at && "border-edge bg-well font-semibold text-ink",
                i > at && "border-dashed border-edge bg-well text-soft hover:border-ink",
              )}
            >
              {i < at && (
                <>
                  <Check aria-hidden="true" className="size-[1.1em] shrink-0" />
                  <span className="sr-only">Done: </span>
                </>
              )}
              {stageWords(stage)}
            </button>
          </li>
        ))}
      </ol>
      <div role="status">
        {before && before !== order.stage && (
          <div className="mt-3 flex flex-wrap items-center justify-between gap-x-4">
            <p>
              From {stageWords(before).toLowerCase()} to {stageWords(order.stage).toLowerCase()}.
            </p>
            <Button icon={<Undo2 className="size-5" />} busy={busy} onClick={() => onMove(before)}>
              Undo
            </Button>
          </div>
        )}
      </div>
    </Card>
  );
}
