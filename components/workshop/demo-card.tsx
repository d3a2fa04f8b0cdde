"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { Ask } from "@/components/ui/dialog";
import { Notice } from "@/components/ui/notice";
import { useClearing } from "./use-clearing";

/** The way out of the invented workshop. */
export function DemoCard() {
  const [asking, setAsking] = useState(false);
  const { clear, busy, problem } = useClearing();
  return (
    <Card id="demo" aria-labelledby="demo-title" className="scroll-mt-4">
      <CardHead title="This workshop is invented" id="demo-title" />
      <div className="grid gap-3">
        <p>
          Its clients and their figures were made up to look round in. Try whatever you like: nothing here is
          real.
        </p>
        {problem && <Notice live tone="wrong" title={problem} />}
        <Button variant="main" full busy={busy} onClick={() => setAsking(true)}>
          Begin my own workshop
        </Button>
      </div>
      <Ask
        open={asking}
        onOpenChange={setAsking}
        title="Leave the invented workshop?"
        say={
          <p>All of it goes from this phone, with what you tried in it, and your own book begins empty.</p>
        }
        yes="Clear it and begin my own"
        no="Look round some more"
        onYes={() => void clear()}
      />
    </Card>
  );
}
