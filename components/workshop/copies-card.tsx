"use client";

import { useNow } from "@/components/frame/use-now";
import { Card, CardHead } from "@/components/ui/card";
import { type Head } from "@/lib/journal/journal";
import { copyWords } from "@/lib/workshop/kept-words";
import { ReadInCopy } from "./read-in-copy";
import { SaveCopy } from "./save-copy";

/** Copies of everything: what the last one has, saving one, and reading one in. */
export function CopiesCard({ head, demo }: { head: Head | null; demo: boolean }) {
  const now = useNow();
  return (
    <Card id="copy" aria-labelledby="copy-title" className="scroll-mt-4">
      <CardHead title="A copy of everything" id="copy-title" />
      <div className="grid gap-3">
        {head && !demo && <p className="font-semibold">{copyWords(head, now)}</p>}
        <p className="text-soft">
          One file with every client, figure, sleeve, order and receipt. It can be read back at any time, on
          this phone or on another one.
        </p>
        <SaveCopy variant="plain" full />
        <ReadInCopy full />
        <p className="text-sm text-soft">
          Whoever has the file can read it: send it only to a place of your own.
        </p>
      </div>
    </Card>
  );
}
