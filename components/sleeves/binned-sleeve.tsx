"use client";

import { KeepTrouble } from "@/components/frame/form-notices";
import { useKeep } from "@/components/store/use-book";
import { Button, ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { setRemoved } from "@/lib/journal/change";
import { type Sleeve } from "@/lib/records/types";
import { backToSleeves } from "@/components/frame/not-shown";

/** A sleeve in the bin, with the way back. */
export function BinnedSleeve({ sleeve }: { sleeve: Sleeve }) {
  const { busy, keep, problem } = useKeep();
  return (
    <Screen title={sleeve.name} back={backToSleeves}>
      <Notice
        live
        title={`${sleeve.name} is in the bin.`}
        action={
          <>
            <Button busy={busy} onClick={() => void keep([setRemoved("sleeves", sleeve, null)])}>
              Bring back
            </Button>
            <ButtonLink href="/sleeves">All sleeves</ButtonLink>
          </>
        }
      >
        <KeepTrouble keep={problem} draft={null} />
      </Notice>
    </Screen>
  );
}
