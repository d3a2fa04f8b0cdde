"use client";

import { useEffect, useState } from "react";
import { useBookState } from "@/components/store/use-book";
import { Button } from "@/components/ui/button";
import { Ask } from "@/components/ui/dialog";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { planReading } from "@/lib/copy/compare-copy";
import { collectBook } from "@/lib/copy/copy-of-book";
import { openCopyFile } from "@/lib/copy/open-file";
import {
  forgetUnfinished,
  readIn,
  unfinishedReading,
  type UnfinishedReading as Unfinished,
} from "@/lib/copy/read-in";
import { openBook } from "@/lib/store/book";
import { keepProblem } from "@/lib/store/keep-problem";
import { newPage } from "@/lib/workshop/new-page";

type Phase =
  | { at: "none" }
  | { at: "found"; reading: Unfinished; say?: string }
  | { at: "going-on"; done: number; of: number };

/** Says that a copy was only read in half-way, and goes on with it. */
export function UnfinishedReading() {
  const state = useBookState();
  const open = state.phase === "open";
  const [phase, setPhase] = useState<Phase>({ at: "none" });
  const [leaving, setLeaving] = useState(false);

  useEffect(() => {
    if (!open) return;
    let current = true;
    const look = async () => {
      const reading = await unfinishedReading();
      if (!reading || !current) return;
      // Where the clearing before it was never done, nothing has happened to this book.
      if ((await openBook().head()).workshopId !== reading.workshopId) await forgetUnfinished();
      else if (current) setPhase({ at: "found", reading });
    };
    look().catch(() => undefined);
    return () => {
      current = false;
    };
  }, [open]);

  const goOn = async (reading: Unfinished) => {
    setPhase({ at: "going-on", done: 0, of: 1 });
    const book = openBook();
    try {
      const read = await openCopyFile(reading.bytes);
      if (!read.ok) return setPhase({ at: "found", reading, say: read.say });
      const { rows } = await collectBook(book);
      const plan = planReading(read.copy, { workshopId: reading.workshopId, rows });
      await readIn(book, read.copy, reading.bytes, plan, reading.whole, (done, of) =>
        setPhase({ at: "going-on", done, of }),
      );
      book.tellBookChanged();
      newPage("/");
    } catch (error) {
      setPhase({ at: "found", reading, say: keepProblem(error).message });
    }
  };

  if (phase.at === "none") return null;
  return (
    <div className="banner">
      {phase.at === "going-on" ? (
        <Notice title="The copy is being read in">
          <Progress label="Keeping what is in it" value={phase.done} max={phase.of} />
        </Notice>
      ) : (
        <Notice
          live
          tone="look"
          title={`The copy of ${phase.reading.workshopName || "the workshop"} was not read in to its end`}
          action={
            <>
              <Button onClick={() => void goOn(phase.reading)}>Go on reading it in</Button>
              <Button variant="quiet" onClick={() => setLeaving(true)}>
                Leave it half-way
              </Button>
            </>
          }
        >
          <p>
            Until then part of it is missing here. The file is still at hand; nothing has to be looked for.
          </p>
          {phase.say && <p className="font-semibold text-pin">{phase.say}</p>}
        </Notice>
      )}
      <Ask
        open={leaving}
        onOpenChange={setLeaving}
        title="Leave it half-way?"
        say={
          <p>
            What was read in stays; the rest of the copy is not in the book. You can read the file in again
            later.
          </p>
        }
        yes="Leave it so"
        onYes={() => {
          setPhase({ at: "none" });
          void forgetUnfinished();
        }}
      />
    </div>
  );
}
