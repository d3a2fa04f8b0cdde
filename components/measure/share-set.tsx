"use client";

import { useId, useState } from "react";
import { Share2 } from "lucide-react";
import { Button } from "@/components/ui/button";
import { TextArea } from "@/components/ui/field";

/** Sends the figures as plain text by whatever the phone has; else copies them; else shows them to be copied by hand. */
export function ShareSet({ text }: { text: string }) {
  const [state, setState] = useState<"idle" | "copied" | "by-hand">("idle");
  const id = useId();

  const share = async () => {
    if (navigator.share) {
      try {
        await navigator.share({ text });
        return;
      } catch (error) {
        // Closed by her: nothing to say. Anything else: copy instead.
        if (error instanceof DOMException && error.name === "AbortError") return;
      }
    }
    try {
      await navigator.clipboard.writeText(text);
      setState("copied");
    } catch {
      setState("by-hand");
    }
  };

  return (
    <div className="grid justify-items-start gap-2">
      <Button icon={<Share2 className="size-5" />} onClick={() => void share()}>
        Share as text
      </Button>
      <p role="status">{state === "copied" && "Copied. Paste it into a message."}</p>
      {state === "by-hand" && (
        <>
          <label htmlFor={id} className="font-semibold">
            Hold on the text to copy it
          </label>
          <TextArea id={id} readOnly value={text} onFocus={(event) => event.target.select()} />
        </>
      )}
    </div>
  );
}
