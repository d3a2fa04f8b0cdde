"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { type KeepProblem } from "@/lib/store/keep-problem";
import { type FormDraft } from "@/components/store/use-form-draft";

/** Says quietly that something unfinished is back in the form. */
export function BroughtBack({ draft: { broughtBack, startOver } }: { draft: FormDraft }) {
  const [shown, setShown] = useState(broughtBack);
  if (!shown) return null;
  return (
    <div className="flex flex-wrap items-center justify-between gap-x-4 text-soft">
      <p>What you had begun is back.</p>
      <Button
        variant="quiet"
        onClick={() => {
          startOver();
          setShown(false);
        }}
      >
        Start over
      </Button>
    </div>
  );
}

/** Why something could not be kept, or why typing is not being put down; beside the button. */
export function KeepTrouble({ keep, draft }: { keep: KeepProblem | null; draft: string | null }) {
  if (keep) return <Notice live tone="wrong" title={keep.message} />;
  if (!draft) return null;
  return <Notice live tone="look" title="What you type here is not kept until you press the button." />;
}
