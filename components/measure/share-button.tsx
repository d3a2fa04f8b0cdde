"use client";

import { Share2 } from "lucide-react";
import { useState } from "react";
import { Button } from "@/components/ui/button";

type Outcome = "copied" | "failed";

/** Hands the figures to the phone's own way of sending; where there is none, to the clipboard. */
async function send(title: string, text: string): Promise<Outcome | null> {
  try {
    if ("share" in navigator) {
      await navigator.share({ title, text });
      return null;
    }
  } catch (error) {
    // She closed the phone's own sheet.
    if (error instanceof DOMException && error.name === "AbortError") return null;
  }
  try {
    await navigator.clipboard.writeText(text);
    return "copied";
  } catch {
    return "failed";
  }
}

const words: Record<Outcome, string> = {
  copied: "Copied. Paste it into a message.",
  failed: "The phone did not let it be copied. Hold a finger on the text below, and copy it.",
};

export function ShareButton({ title, text }: { title: string; text: string }) {
  const [outcome, setOutcome] = useState<Outcome | null>(null);
  return (
    <div className="grid content-start gap-2">
      <Button
        full
        icon={<Share2 className="size-5" />}
        onClick={() => void send(title, text).then((done) => setOutcome(done))}
      >
        Send as text
      </Button>
      <p role="status" className="empty:hidden">
        {outcome && words[outcome]}
      </p>
      {outcome === "failed" && (
        <pre className="rounded border-2 border-edge bg-well p-3 font-sans whitespace-pre-wrap select-all">
          {text}
        </pre>
      )}
    </div>
  );
}
