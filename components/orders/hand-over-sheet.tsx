"use client";

import { Button } from "@/components/ui/button";
import { Sheet } from "@/components/ui/dialog";
import { Notice } from "@/components/ui/notice";
import { sayMoney } from "@/lib/orders/say-money";
import { handOverCaution } from "@/lib/people/cautions";

export interface HandOverSheetProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  balanceMinor: number;
  currency: string;
  onHandOver: () => void;
  onTakeMoney: () => void;
}

/** Before a garment leaves the house: the pins, and the money. */
export function HandOverSheet(props: HandOverSheetProps) {
  const { open, onOpenChange, balanceMinor, currency, onHandOver, onTakeMoney } = props;
  const owed = balanceMinor > 0;
  const close = (then: () => void) => () => {
    onOpenChange(false);
    then();
  };
  return (
    <Sheet open={open} onOpenChange={onOpenChange} title="Hand over?">
      <Notice tone="look" title={handOverCaution.say}>
        <p className="text-sm text-soft">From: {handOverCaution.source}</p>
      </Notice>
      {owed && (
        <p className="text-lg font-semibold">{sayMoney(balanceMinor, currency)} is still to be paid.</p>
      )}
      {balanceMinor < 0 && (
        <p className="text-lg font-semibold">{sayMoney(-balanceMinor, currency)} is to be given back.</p>
      )}
      <div className="mt-2 grid gap-2">
        {owed && (
          <Button variant="main" full onClick={close(onTakeMoney)}>
            Take the money first
          </Button>
        )}
        <Button variant={owed ? "plain" : "main"} full onClick={close(onHandOver)}>
          {owed ? "Hand over, the rest to come" : "Felt over, hand over"}
        </Button>
      </div>
    </Sheet>
  );
}
