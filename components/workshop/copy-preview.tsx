"use client";

import { useWorkshop } from "@/components/store/use-book";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { type ReadingPlan } from "@/lib/copy/compare-copy";
import { contentWords, mergeWords } from "@/lib/copy/copy-words";
import { type SavedCopy } from "@/lib/copy/saved-copy";
import { SaveCopy } from "./save-copy";

const dayAndTime = (iso: string) =>
  new Intl.DateTimeFormat("en-GB", { dateStyle: "long", timeStyle: "short" }).format(new Date(iso));

/** What a copy holds and what reading it in would do; nothing happens before the word is given. */
export function CopyPreview({
  copy,
  plan,
  onYes,
  onNo,
}: {
  copy: SavedCopy;
  plan: ReadingPlan;
  onYes: () => void;
  onNo: () => void;
}) {
  const present = useWorkshop();
  const nothingNew = plan.kind === "same" && plan.rows.length === 0 && copy.drafts.length === 0;
  return (
    <div className="grid gap-3">
      <div>
        <p className="font-figure text-lg font-bold wrap-anywhere">
          {copy.workshop.name || "A workshop without a name"}
        </p>
        <p className="text-soft">Saved on {dayAndTime(copy.madeAt)}</p>
      </div>
      <ul className="grid list-disc gap-0.5 ps-5">
        {contentWords(copy).map((words) => (
          <li key={words}>{words}</li>
        ))}
      </ul>

      {plan.kind === "same" && (
        <Notice
          title={nothingNew ? "There is nothing to read in." : "It is put together with this phone's book."}
        >
          {mergeWords(plan).map((words) => (
            <p key={words}>{words}</p>
          ))}
        </Notice>
      )}
      {plan.kind === "other" && (
        <Notice
          tone="look"
          title={`It is of another workshop than ${present?.name ?? "the one on this phone"}.`}
        >
          <p>To read it in, the book on this phone has to be cleared. Save a copy of that one first.</p>
          <SaveCopy />
        </Notice>
      )}

      <div className="mt-2 grid gap-2">
        {plan.kind === "other" ? (
          <Button variant="danger" full onClick={onYes}>
            Clear this phone and read it in
          </Button>
        ) : (
          !nothingNew && (
            <Button variant="main" full onClick={onYes}>
              {plan.kind === "same" ? "Put the two together" : "Read it in"}
            </Button>
          )
        )}
        <Button full onClick={onNo}>
          {nothingNew ? "Good" : "Leave it"}
        </Button>
      </div>
    </div>
  );
}
