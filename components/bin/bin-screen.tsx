"use client";

import { Undo2 } from "lucide-react";
import { useState } from "react";
import { useNow } from "@/components/frame/use-now";
import { useKeep, useView } from "@/components/store/use-book";
import { Button } from "@/components/ui/button";
import { Card, Row, Rows } from "@/components/ui/card";
import { Empty } from "@/components/ui/empty";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { binQuery } from "@/lib/store/queries/bin";
import { alongWords, binWords, bringBack, comesBack } from "@/lib/workshop/bin-items";
import { sinceWords } from "@/lib/workshop/since-words";

const back = { href: "/settings", label: "Workshop" };

/** What was put in the bin, the last first; all of it can be brought back. */
export function BinScreen() {
  const { view: items, state } = useView(binQuery, {});
  const { keep, problem } = useKeep();
  const [done, setDone] = useState<string | null>(null);
  const now = useNow();

  const bring = async (id: string) => {
    const item = items.find(({ row }) => row.id === id);
    if (!item) return;
    const all = comesBack(item, items);
    if (await keep(bringBack(all))) setDone(all.map((one) => binWords(one).name).join(", "));
  };

  return (
    <Screen title="The bin" sub="Nothing in it is erased." back={back}>
      <div role="status" className="empty:hidden">
        {done && <Notice tone="good" title={`Brought back: ${done}.`} />}
      </div>
      {problem && <Notice live tone="wrong" title={problem.message} />}
      {state === "failed" && items.length === 0 && (
        <Notice
          tone="wrong"
          title="The book on this phone did not answer. Close Notchbook and open it again."
        />
      )}
      {state === "opening" && items.length === 0 && <Progress label="Opening the book" />}
      {state === "known" && items.length === 0 && (
        <Empty say="The bin is empty. A client, wearer, order, sleeve or sum that you put in the bin stands here until you bring it back." />
      )}
      {items.length > 0 && (
        <Card flush notches={0} aria-label="In the bin">
          <Rows>
            {items.map((item) => {
              const { kind, name } = binWords(item);
              const along = alongWords(comesBack(item, items), item);
              return (
                <Row
                  key={item.row.id}
                  title={name}
                  sub={`${kind}, put here ${when(item.row.removedAt!, now)}${along ? `. ${along}` : ""}`}
                >
                  <Button icon={<Undo2 className="size-5" />} onClick={() => void bring(item.row.id)}>
                    Bring back <span className="sr-only">{name}</span>
                  </Button>
                </Row>
              );
            })}
          </Rows>
        </Card>
      )}
    </Screen>
  );
}

function when(at: string, now: Date): string {
  const words = sinceWords(new Date(at), now);
  return /\d:\d/.test(words) ? `today, ${words}` : words;
}
