"use client";

import { Download, Send } from "lucide-react";
import { useState } from "react";
import { Button, type ButtonVariant } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { copyBook, type MadeCopy } from "@/lib/copy/copy-of-book";
import { canShareFile, downloadFile, shareFile } from "@/lib/copy/save-file";
import { openBook } from "@/lib/store/book";
import { bytesWords } from "@/lib/workshop/room-words";

type Phase =
  | { at: "idle" }
  | { at: "making"; done: number; of: number }
  | { at: "saved"; made: MadeCopy; sent: "sent" | "put-off" | "refused" | null }
  | { at: "failed" };

/** Saves a copy of everything as a file, and offers to send it on. */
export function SaveCopy({ variant, full }: { variant?: ButtonVariant; full?: boolean }) {
  const [phase, setPhase] = useState<Phase>({ at: "idle" });

  const save = async () => {
    setPhase({ at: "making", done: 0, of: 1 });
    try {
      const made = await copyBook(openBook(), (done, of) => setPhase({ at: "making", done, of }));
      downloadFile(made.file);
      setPhase({ at: "saved", made, sent: null });
      // Where even this cannot be written down, the copy is no less saved.
      await openBook()
        .noteCopy(made.note)
        .catch(() => undefined);
    } catch (error) {
      console.error(error);
      setPhase({ at: "failed" });
    }
  };
  const send = async (made: MadeCopy) => setPhase({ at: "saved", made, sent: await shareFile(made.toSend) });

  return (
    <div className="grid gap-3">
      <Button
        variant={variant}
        full={full}
        icon={<Download className="size-5" />}
        busy={phase.at === "making"}
        onClick={() => void save()}
      >
        Save a copy as a file
      </Button>
      {phase.at === "making" && <Progress label="Making the copy" value={phase.done} max={phase.of} />}
      {phase.at === "failed" && (
        <Notice live tone="wrong" title="The copy could not be made.">
          <p>Nothing was lost. Close Notchbook, open it again, and press once more.</p>
        </Notice>
      )}
      {phase.at === "saved" && (
        <Saved made={phase.made} sent={phase.sent} onSend={() => void send(phase.made)} />
      )}
    </div>
  );
}

function Saved({
  made: { file, toSend, entries },
  sent,
  onSend,
}: {
  made: MadeCopy;
  sent: "sent" | "put-off" | "refused" | null;
  onSend: () => void;
}) {
  const canSend = canShareFile(toSend);
  return (
    <Notice
      live
      tone="good"
      title={`The copy is made: ${entries === 1 ? "1 entry" : `${entries} entries`}, ${bytesWords(file.bytes.length)}.`}
      action={
        canSend && (
          <Button icon={<Send className="size-5" />} onClick={onSend}>
            {sent === "sent" ? "Send it once more" : "Send it to a safe place"}
          </Button>
        )
      }
    >
      <p>
        The browser saves it under Downloads, as{" "}
        <span className="font-semibold wrap-anywhere">{file.name}</span>.
      </p>
      {sent === "sent" && <p>It was handed on.</p>}
      {sent === "refused" && <p>The phone would not hand it on. Send the file from Downloads instead.</p>}
      {sent === null && <p>A phone can be lost: keep one copy somewhere else as well.</p>}
    </Notice>
  );
}
