"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Ask, Sheet } from "@/components/ui/dialog";
import { Notice } from "@/components/ui/notice";
import { type Head } from "@/lib/journal/journal";
import { changesSinceCopy } from "@/lib/workshop/kept-words";
import { SaveCopy } from "./save-copy";
import { useClearing } from "./use-clearing";

/** The only way by which anything is erased for good: everything at once, asked twice, a copy offered first. */
export function ClearCard({ head, demo }: { head: Head | null; demo: boolean }) {
  const [step, setStep] = useState<"none" | "first" | "second">("none");
  const { clear, busy, problem } = useClearing();
  const missing = head ? changesSinceCopy(head) : 0;
  return (
    <Card notches={0} aria-labelledby="clear-title">
      <CardHead title="Clear this phone" id="clear-title" />
      <div className="grid gap-3">
        <p>
          Erases every client, figure, order and receipt from this phone, for good: before it is sold or given
          away.
        </p>
        {problem && <Notice live tone="wrong" title={problem} />}
        <Button className="justify-self-start" busy={busy} onClick={() => setStep("first")}>
          Clear everything on this phone
        </Button>
      </div>
      <Sheet
        open={step === "first"}
        onOpenChange={(open) => setStep((now) => (open ? "first" : now === "first" ? "none" : now))}
        title="Save a copy first?"
        say={
          demo
            ? "The workshop is invented; there is nothing in it to save."
            : missing > 0
              ? `${missing} ${missing === 1 ? "change is" : "changes are"} in no copy. Once cleared, only a saved copy brings anything back.`
              : "Everything is in the last copy. Make sure that you still have the file."
        }
      >
        <div className="grid gap-2">
          {!demo && <SaveCopy variant="main" full />}
          <Button full onClick={() => setStep("second")}>
            Go on to clearing
          </Button>
        </div>
      </Sheet>
      <Ask
        open={step === "second"}
        onOpenChange={(open) => {
          if (!open) setStep("none");
        }}
        danger
        title="Clear everything on this phone?"
        say={
          <p>
            The whole book goes, for good, and what was being typed with it. Notchbook itself stays on the
            phone.
          </p>
        }
        yes="Clear everything"
        no="Keep it all"
        onYes={() => void clear()}
      />
    </Card>
  );
}
