"use client";

import { TriangleAlert } from "lucide-react";
import { type ReactNode, useMemo, useSyncExternalStore } from "react";
import { DayMark, OrderRow } from "@/components/orders/order-row";
import { useView, useWorkshop } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { AppLink } from "@/components/ui/app-link";
import { ButtonLink } from "@/components/ui/button";
import { Card, RowLink, Rows } from "@/components/ui/card";
import { cx } from "@/components/ui/cx";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { dueWords, fittingWords } from "@/lib/orders/day-words";
import { firstSteps } from "@/lib/orders/first-steps";
import { orderName } from "@/lib/orders/order-name";
import { formatDay } from "@/lib/people/format-day";
import { type FittingItem, todayOn, type TodayView } from "@/lib/store/queries/today";
import { FirstPath } from "./first-path";
import { UnfinishedCard } from "./unfinished-card";
import { useUnfinished } from "./use-unfinished";

const never = () => () => undefined;

/** The page was made on another day than it is looked at: the day is named only where the phone knows it. */
const useOnPhone = () =>
  useSyncExternalStore(
    never,
    () => true,
    () => false,
  );

export function TodayScreen() {
  const today = useToday();
  const onPhone = useOnPhone();
  const workshop = useWorkshop();
  const query = useMemo(() => todayOn(today), [today]);
  const { view, state } = useView(query, {});
  const unfinished = useUnfinished();
  const steps = firstSteps(view);
  const next = steps.find((step) => step.state === "next");
  const isNew = state === "known" && !view.anyOrder;

  return (
    <Screen
      wide={view.anyOrder}
      title={onPhone ? formatDay(today, { style: "weekday" }) : "Today"}
      sub={workshop?.name}
      action={
        isNew && next ? (
          <ButtonLink variant="main" full href={next.href}>
            {next.say}
          </ButtonLink>
        ) : (
          <div className="flex flex-wrap gap-2">
            <ButtonLink href="/measure" className="min-h-key flex-1 basis-24">
              Measure
            </ButtonLink>
            <ButtonLink variant="main" href="/orders/new" className="flex-[2] basis-40">
              New order
            </ButtonLink>
          </div>
        )
      }
    >
      {state === "failed" && (
        <Notice
          tone="wrong"
          title="The book on this phone did not answer. Close Notchbook and open it again."
        />
      )}
      {state === "opening" && !view.anyOrder && <Progress label="Opening the book" />}
      <UnfinishedCard drafts={unfinished} />
      {isNew && <FirstPath steps={steps} />}
      {view.anyOrder && <Days view={view} today={today} />}
    </Screen>
  );
}

function Days({
  view: { late, due, fittings, owed, laterCount },
  today,
}: {
  view: TodayView;
  today: string;
}) {
  const hasSide = fittings.length + owed.length > 0;
  const column = "grid min-w-0 grid-cols-[minmax(0,1fr)] content-start gap-4";
  return (
    <div className={cx(column, hasSide ? "lg:grid-cols-2 lg:gap-8" : "lg:max-w-page")}>
      <div className={column}>
        <Part id="late" title="Late" count={late.length} look>
          {late.map((item) => (
            <OrderRow key={item.order.id} item={item} day={dueWords(item.order, today)} money="owed" />
          ))}
        </Part>
        <Part id="due" title="Due in the next 7 days" count={due.length}>
          {due.map((item) => (
            <OrderRow key={item.order.id} item={item} day={dueWords(item.order, today)} money="owed" />
          ))}
        </Part>
        {late.length + due.length === 0 && (
          <p className="rounded border-2 border-dashed border-edge px-4 py-6 text-center">
            Nothing is late, and nothing is due in the next 7 days.
          </p>
        )}
        <LaterLink count={laterCount} more={late.length + due.length > 0} />
      </div>
      {hasSide && (
        <div className={column}>
          <Part id="fittings" title="Fittings" count={fittings.length}>
            {fittings.map((item) => (
              <FittingRow key={item.garment.id} item={item} today={today} />
            ))}
          </Part>
          <Part id="owed" title="Owed" count={owed.length}>
            {owed.map((item) => (
              <OrderRow key={item.order.id} item={item} day={null} />
            ))}
          </Part>
        </div>
      )}
    </div>
  );
}

function LaterLink({ count, more }: { count: number; more: boolean }) {
  if (count === 0) return null;
  const further = more ? " more" : "";
  return (
    <p>
      <AppLink href="/orders" className="inline-flex min-h-target items-center font-semibold">
        {count === 1 ? `1${further} order is open` : `${count}${further} orders are open`}, for later or with
        no day
      </AppLink>
    </p>
  );
}

function FittingRow({
  item: { order, client, garment, wearers },
  today,
}: {
  item: FittingItem;
  today: string;
}) {
  const wearer = wearers.find(({ id }) => id === garment.wearerId);
  const whose =
    wearer && client && wearer.name !== client.name ? `${garment.kind}, ${client.name}` : garment.kind;
  return (
    <RowLink
      href={`/orders/card?id=${order.id}`}
      title={wearer?.name ?? client?.name ?? orderName(order)}
      sub={<span className="wrap-anywhere">{whose}</span>}
      figure={<DayMark words={fittingWords(garment.fittingOn!, today)} />}
    />
  );
}

function Part({
  id,
  title,
  count,
  look,
  children,
}: {
  id: string;
  title: string;
  count: number;
  look?: boolean;
  children: ReactNode;
}) {
  if (count === 0) return null;
  return (
    <div className="grid gap-2">
      <h2 id={id} className="flex items-center gap-2 font-figure text-lg font-bold">
        {look && <TriangleAlert aria-hidden="true" className="size-5 text-pin" />}
        <span className={look ? "text-pin" : undefined}>{title}</span>
        <span className="figures font-semibold text-soft">{count}</span>
      </h2>
      <Card flush aria-labelledby={id}>
        <Rows>{children}</Rows>
      </Card>
    </div>
  );
}
