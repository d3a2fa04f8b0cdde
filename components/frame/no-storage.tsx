"use client";

import { useEffect, useState } from "react";
import { SaveCopy } from "@/components/workshop/save-copy";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { openBook } from "@/lib/store/book";

/** In place of every screen, where the browser lets nothing be kept. */
export function NoStorage({ say }: { say: string }) {
  const [readable, setReadable] = useState(false);
  useEffect(() => {
    let current = true;
    // A phone that is full may refuse to write and still read.
    openBook()
      .changesSince(0, 1)
      .then(
        (changes) => current && setReadable(changes.length > 0),
        () => undefined,
      );
    return () => {
      current = false;
    };
  }, []);
  return (
    <Screen
      title="Nothing can be kept here"
      action={
        <Button variant="main" full onClick={() => location.reload()}>
          Try again
        </Button>
      }
    >
      <Notice tone="wrong" title="The browser does not let Notchbook keep anything on this phone.">
        <p>{say}</p>
      </Notice>
      {readable && (
        <>
          <p>What was kept earlier can still be read. Save it before anything else.</p>
          <SaveCopy />
        </>
      )}
    </Screen>
  );
}
