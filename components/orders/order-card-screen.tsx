"use client";

import { useRouter, useSearchParams } from "next/navigation";
import { useState } from "react";
import { BinAsk } from "@/components/clients/bin-ask";
import { KeepTrouble } from "@/components/frame/form-notices";
import { useIdParam } from "@/components/store/use-id-param";
import { TakeMoneySheet } from "@/components/money/take-money-sheet";
import { useKeep, useView } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { AppLink } from "@/components/ui/app-link";
import { Button, ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { edit, setRemoved } from "@/lib/journal/change";
import { orderBinQuestion } from "@/lib/orders/bin-order";
import { orderCautions } from "@/lib/orders/order-cautions";
import { orderName } from "@/lib/orders/order-name";
import { sayMoney } from "@/lib/orders/say-money";
import { moveWords, nextAct } from "@/lib/orders/stages";
import { type Stage } from "@/lib/records/types";
import { orderCardQuery, type OrderCardView } from "@/lib/store/queries/orders";
import { CautionsNotice } from "./cautions-notice";
import { HandOverSheet } from "./hand-over-sheet";
import { OrderGarments } from "./order-garments";
import { BalanceCard, Payments, PriceLines } from "./order-money";
import { backToOrders, NotShown } from "@/components/frame/not-shown";
import { OrderSums } from "@/components/sums/order-sums";
import { StageCard } from "./stage-card";

const NOT_HERE = "This order is not in the book.";

export function OrderCardScreen() {
  const id = useIdParam("id");
  return id ? (
    <OrderCard key={id} id={id} />
  ) : (
    <NotShown back={backToOrders} title="Order" state="known" say={NOT_HERE} />
  );
}

function OrderCard({ id }: { id: string }) {
  const { view, state } = useView(orderCardQuery, { id });
  if (!view) return <NotShown back={backToOrders} title="Order" state={state} say={NOT_HERE} />;
  return view.order.removedAt === null ? <LiveOrder view={view} /> : <BinnedOrder view={view} />;
}

function LiveOrder({ view }: { view: OrderCardView }) {
  const { order, client, garments, wearers, sums } = view;
  const today = useToday();
  const { keep, busy, problem } = useKeep();
  const [before, setBefore] = useState<Stage | null>(null);
  const [handingOver, setHandingOver] = useState(false);
  const router = useRouter();
  // Today leads back to a sheet that was left half filled in.
  const asked = useSearchParams().get("money");
  const [money, setMoney] = useState<"take" | "give-back" | null>(
    asked === "take" || asked === "give-back" ? asked : null,
  );
  const say = (minor: number) => sayMoney(minor, order.currency);

  const become = async (to: Stage) => {
    const from = order.stage;
    if (await keep([edit("orders", order, { stage: to })])) setBefore(to === before ? null : from);
  };
  const moveTo = (to: Stage) => {
    if (to === "handed-over" && before !== "handed-over") setHandingOver(true);
    else void become(to);
  };
  const act = nextAct(order.stage, sums.balanceMinor);
  const cautions =
    order.stage === "handed-over"
      ? []
      : orderCautions(
          garments.map(({ kind, note, wearerId }) => ({
            kind,
            note,
            wearer: wearers.find(({ id }) => id === wearerId) ?? null,
          })),
          today,
        );

  return (
    <Screen
      title={orderName(order)}
      sub={
        client && (
          <AppLink
            href={`/clients/card?id=${client.id}`}
            className="inline-flex min-h-target items-center wrap-anywhere"
          >
            {client.name}
          </AppLink>
        )
      }
      back={backToOrders}
      tools={<ButtonLink href={`/orders/change?id=${order.id}`}>Change</ButtonLink>}
      action={
        act && (
          <>
            <KeepTrouble keep={problem} draft={null} />
            {act.do === "move" && (
              <Button variant="main" full busy={busy} onClick={() => moveTo(act.to)}>
                {moveWords(act.to)}
              </Button>
            )}
            {act.do === "take" && (
              <Button variant="main" full onClick={() => setMoney("take")}>
                Take {say(sums.balanceMinor)}
              </Button>
            )}
            {act.do === "give-back" && (
              <Button variant="main" full onClick={() => setMoney("give-back")}>
                Give {say(-sums.balanceMinor)} back
              </Button>
            )}
          </>
        )
      }
    >
      <StageCard order={order} today={today} before={before} busy={busy} onMove={moveTo} />
      {!act && <KeepTrouble keep={problem} draft={null} />}
      <BalanceCard view={view} onTake={() => setMoney("take")} onGiveBack={() => setMoney("give-back")} />
      <OrderGarments view={view} today={today} />
      <OrderSums view={view} />
      <CautionsNotice cautions={cautions} folded={order.stage !== "agreed"} />
      <PriceLines view={view} />
      <Payments view={view} />
      {order.note && (
        <section aria-labelledby="note" className="grid gap-1">
          <h2 id="note" className="font-figure text-lg font-bold">
            Note
          </h2>
          <p className="whitespace-pre-wrap wrap-anywhere">{order.note}</p>
        </section>
      )}
      <div>
        <BinAsk
          question={orderBinQuestion(view, say)}
          busy={busy}
          onYes={() => void keep([setRemoved("orders", order, new Date().toISOString())])}
        />
      </div>
      <HandOverSheet
        open={handingOver}
        onOpenChange={setHandingOver}
        balanceMinor={sums.balanceMinor}
        currency={order.currency}
        onHandOver={() => void become("handed-over")}
        onTakeMoney={() => setMoney("take")}
      />
      <TakeMoneySheet
        view={view}
        kind={money === "give-back" ? "giving-back" : undefined}
        open={money !== null}
        onOpenChange={(open) => {
          if (open) return;
          setMoney(null);
          if (asked) router.replace(`/orders/card?id=${order.id}`);
        }}
      />
    </Screen>
  );
}

function BinnedOrder({ view: { order, client } }: { view: OrderCardView }) {
  const { keep, busy, problem } = useKeep();
  const clientToo = client !== null && client.removedAt !== null;
  const bringBack = () =>
    void keep([
      ...(clientToo ? [setRemoved("clients", client, null)] : []),
      setRemoved("orders", order, null),
    ]);
  return (
    <Screen title={orderName(order)} back={backToOrders}>
      <Notice
        live
        title="This order is in the bin."
        action={
          <>
            <Button busy={busy} onClick={bringBack}>
              {clientToo ? `Bring back, with ${client.name}` : "Bring back"}
            </Button>
            <ButtonLink href="/orders">All orders</ButtonLink>
          </>
        }
      >
        <KeepTrouble keep={problem} draft={null} />
      </Notice>
    </Screen>
  );
}
