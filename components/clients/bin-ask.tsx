"use client";

import { Trash2 } from "lucide-react";
import { Ask } from "@/components/ui/dialog";
import { Button } from "@/components/ui/button";
import { type BinQuestion } from "@/lib/clients/bin-question";

/** The way into the bin: a quiet button, and the question of what goes along. */
export function BinAsk({
  question: { title, say },
  busy,
  onYes,
}: {
  question: BinQuestion;
  busy: boolean;
  onYes: () => void;
}) {
  return (
    <Ask
      trigger={
        <Button variant="quiet" busy={busy} icon={<Trash2 className="size-5" />}>
          Put in the bin
        </Button>
      }
      title={title}
      say={
        <div className="grid gap-2">
          {say.map((sentence) => (
            <p key={sentence}>{sentence}</p>
          ))}
        </div>
      }
      yes="Put in the bin"
      onYes={onYes}
    />
  );
}
