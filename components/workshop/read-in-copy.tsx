"use client";

import { FileInput } from "lucide-react";
import { useRef, useState } from "react";
import { useWorkshop } from "@/components/store/use-book";
import { Button } from "@/components/ui/button";
import { Ask, Sheet } from "@/components/ui/dialog";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { planReading, type ReadingPlan } from "@/lib/copy/compare-copy";
import { collectBook } from "@/lib/copy/copy-of-book";
import { openCopyFile } from "@/lib/copy/open-file";
import { readIn } from "@/lib/copy/read-in";
import { type SavedCopy } from "@/lib/copy/saved-copy";
import { openBook } from "@/lib/store/book";
import { keepProblem } from "@/lib/store/keep-problem";
import { newPage } from "@/lib/workshop/new-page";
import { CopyPreview } from "./copy-preview";

interface Chosen {
  copy: SavedCopy;
  bytes: Uint8Array<ArrayBuffer>;
  plan: ReadingPlan;
}

type Phase =
  | { at: "idle" }
  | { at: "checking" }
  | { at: "refused"; say: string }
  | { at: "asking"; chosen: Chosen }
  /** The copy is of another workshop: asked once more before this one's book goes. */
  | { at: "asking-again"; chosen: Chosen }
  | { at: "reading"; chosen: Chosen; done: number; of: number };

/** Chooses a saved copy, checks it, says what is in it, and reads it in once told to. */
export function ReadInCopy({ full }: { full?: boolean }) {
  const present = useWorkshop();
  const input = useRef<HTMLInputElement>(null);
  const [phase, setPhase] = useState<Phase>({ at: "idle" });

  const choose = async (file: File) => {
    setPhase({ at: "checking" });
    try {
      const bytes = new Uint8Array(await file.arrayBuffer());
      const read = await openCopyFile(bytes);
      if (!read.ok) return setPhase({ at: "refused", say: read.say });
      const book = openBook();
      const { workshopId } = await book.head();
      const { rows } = await collectBook(book);
      const plan = planReading(read.copy, { workshopId, rows });
      setPhase({ at: "asking", chosen: { copy: read.copy, bytes, plan } });
    } catch (error) {
      console.error(error);
      setPhase({
        at: "refused",
        say: "The file could not be read. Choose it again; if that fails too, restart the phone.",
      });
    }
  };

  const begin = async (chosen: Chosen) => {
    setPhase({ at: "reading", chosen, done: 0, of: 1 });
    const book = openBook();
    try {
      const { copy, bytes, plan } = chosen;
      await readIn(book, copy, bytes, plan, undefined, (done, of) =>
        setPhase({ at: "reading", chosen, done, of }),
      );
      book.tellBookChanged();
      newPage("/");
    } catch (error) {
      setPhase({ at: "refused", say: keepProblem(error).message });
    }
  };

  const chosen = phase.at === "asking" || phase.at === "reading" ? phase.chosen : null;
  return (
    <div className="grid gap-3">
      <input
        ref={input}
        type="file"
        hidden
        data-testid="copy-file"
        onChange={(event) => {
          const file = event.target.files?.[0];
          // The same file may be chosen again after a refusal.
          event.target.value = "";
          if (file) void choose(file);
        }}
      />
      <Button
        full={full}
        icon={<FileInput className="size-5" />}
        busy={phase.at === "checking"}
        onClick={() => input.current?.click()}
      >
        Read in a saved copy
      </Button>
      {phase.at === "checking" && <Progress label="Checking the copy" />}
      {phase.at === "refused" && <Notice live tone="wrong" title={phase.say} />}
      <Sheet
        open={chosen !== null}
        onOpenChange={(open) => {
          if (!open && phase.at === "asking") setPhase({ at: "idle" });
        }}
        title={phase.at === "reading" ? "Reading the copy in" : "What is in this copy"}
      >
        {phase.at === "asking" && (
          <CopyPreview
            {...phase.chosen}
            onYes={() => {
              if (phase.chosen.plan.kind === "other") setPhase({ ...phase, at: "asking-again" });
              else void begin(phase.chosen);
            }}
            onNo={() => setPhase({ at: "idle" })}
          />
        )}
        {phase.at === "reading" && (
          <div className="grid gap-3">
            <Progress label="Keeping what is in it" value={phase.done} max={phase.of} />
            <p>Leave Notchbook open until it is done. Should the phone stop, it goes on at the next start.</p>
          </div>
        )}
      </Sheet>
      {phase.at === "asking-again" && (
        <Ask
          open
          onOpenChange={(open) => {
            if (!open) setPhase((now) => (now.at === "asking-again" ? { ...now, at: "asking" } : now));
          }}
          danger
          title={`Clear the book of ${present?.name ?? "this phone"}?`}
          say={
            <p>
              Everything in it goes from this phone, with what was being typed. Then the copy of{" "}
              {phase.chosen.copy.workshop.name || "the other workshop"} is read in. What is in no copy cannot
              be brought back.
            </p>
          }
          yes="Clear it and read the copy in"
          onYes={() => void begin(phase.chosen)}
        />
      )}
    </div>
  );
}
