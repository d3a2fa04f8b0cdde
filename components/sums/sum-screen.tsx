"use client";

import { useState } from "react";
import { useSearchParams } from "next/navigation";
import { KeepTrouble } from "@/components/frame/form-notices";
import { NotShown, ScreenOpening } from "@/components/frame/not-shown";
import { useKeep, useView, useWorkshop } from "@/components/store/use-book";
import { useDraft } from "@/components/store/use-draft";
import { useIdParam } from "@/components/store/use-id-param";
import { Button, ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { setRemoved } from "@/lib/journal/change";
import { type Client, type Order, type Sum, type Workshop } from "@/lib/records/types";
import { type SewingSum, sewingSum } from "@/lib/sewing";
import { orderCardQuery } from "@/lib/store/queries/orders";
import { sumQuery } from "@/lib/store/queries/sums";
import { emptySumForm, formOfSum, restoredSumForm, type SumForm } from "@/lib/sums/sum-form";
import { backToSums } from "./places";
import { SumEditor } from "./sum-editor";

const TITLE = "Sewing sum";

/** The address says which: a kept sum, or a new one of a kind, for an order or for none. */
export function SumScreen() {
  const id = useIdParam("id");
  const orderId = useIdParam("order");
  const asked = useSearchParams();
  const sum = sewingSum(asked.get("kind"));
  const workshop = useWorkshop();
  if (!workshop) return <ScreenOpening title={TITLE} />;
  if (id) return <KeptSum key={id} id={id} workshop={workshop} />;
  if (!sum || asked.has("id"))
    return <NotShown title={TITLE} back={backToSums} state="known" say="This sum is not in the book." />;
  const key = `sum:new:${sum.id}:${orderId ?? ""}`;
  if (orderId) return <ForOrder key={key} orderId={orderId} draftKey={key} sum={sum} workshop={workshop} />;
  return <Working key={key} draftKey={key} {...{ sum, workshop }} kept={null} on={null} />;
}

function KeptSum({ id, workshop }: { id: string; workshop: Workshop }) {
  const { view, state } = useView(sumQuery, { id });
  // Kept on this screen: the form begins again from the row as it was kept.
  const [times, setTimes] = useState(0);
  const cameKept = useSearchParams().has("kept");
  if (!view)
    return <NotShown title={TITLE} back={backToSums} state={state} say="This sum is not in the book." />;
  const { sum: kept, order, client } = view;
  const sum = sewingSum(kept.kind);
  if (!sum)
    return (
      <Screen title={kept.name} back={backToSums}>
        <Notice
          tone="look"
          title="This sum was made by a newer Notchbook. Bring this one up to date, with data on, and it opens."
        />
      </Screen>
    );
  if (kept.removedAt !== null) return <BinnedSum sum={kept} />;
  return (
    <Working
      key={times}
      draftKey={`sum:${id}`}
      {...{ sum, kept, workshop }}
      on={order && { order, client }}
      justKept={times > 0 || cameKept}
      onKept={() => setTimes((before) => before + 1)}
    />
  );
}

interface ForOrderProps {
  orderId: string;
  draftKey: string;
  sum: SewingSum;
  workshop: Workshop;
}

function ForOrder({ orderId, ...rest }: ForOrderProps) {
  const { view, state } = useView(orderCardQuery, { id: orderId });
  if (!view)
    return <NotShown title={TITLE} back={backToSums} state={state} say="This order is not in the book." />;
  return <Working {...rest} kept={null} on={{ order: view.order, client: view.client }} />;
}

interface WorkingProps {
  draftKey: string;
  sum: SewingSum;
  kept: Sum | null;
  on: { order: Order; client: Client | null } | null;
  workshop: Workshop;
  justKept?: boolean;
  onKept?(): void;
}

/** Waits for what was being typed, and begins the form with it or with what the book has. */
function Working({ draftKey, justKept = false, kept, on, onKept, sum, workshop }: WorkingProps) {
  const handle = useDraft<SumForm>(draftKey);
  const { fineness, unit } = workshop;
  // What the form begins with must not move under the typing when another row of the book changes.
  const [initial] = useState(() =>
    kept ? formOfSum(sum, kept, unit, fineness) : emptySumForm(sum, unit, fineness, on?.order.id),
  );
  const [seen] = useState(kept);
  if (handle.draft === undefined) return <ScreenOpening title={kept?.name ?? sum.name} />;
  return (
    <SumEditor
      {...{ draftKey, handle, initial, justKept, on, onKept, sum, fineness }}
      begin={restoredSumForm(sum, initial, handle.draft, fineness)}
      kept={seen}
    />
  );
}

function BinnedSum({ sum }: { sum: Sum }) {
  const { busy, keep, problem } = useKeep();
  return (
    <Screen title={sum.name} back={backToSums}>
      <Notice
        live
        title={`${sum.name} is in the bin.`}
        action={
          <>
            <Button busy={busy} onClick={() => void keep([setRemoved("sums", sum, null)])}>
              Bring back
            </Button>
            <ButtonLink href="/sums">All sewing sums</ButtonLink>
          </>
        }
      >
        <KeepTrouble keep={problem} draft={null} />
      </Notice>
    </Screen>
  );
}
