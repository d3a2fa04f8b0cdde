"use client";

import { useEffect, useRef } from "react";
import { Check, TriangleAlert } from "lucide-react";
import { Length } from "@/components/ui/fraction";
import { bodyMeasure, type MeasureKey } from "@/lib/figures/body-measures";
import { type Taking } from "@/lib/measuring/taking";
import { type Fineness } from "@/lib/records/types";

export interface PadStripProps {
  taking: Taking;
  fineness: Fineness;
  asked: ReadonlySet<MeasureKey>;
  onDisk: (key: MeasureKey) => boolean;
  onGo: (key: MeasureKey) => void;
}

/** All figures of the set in tape order: what is taken, what is on the phone, what is asked about. */
export function PadStrip({ taking, fineness, asked, onDisk, onGo }: PadStripProps) {
  const strip = useRef<HTMLOListElement>(null);
  useEffect(() => {
    const list = strip.current;
    const here = list?.querySelector<HTMLElement>("[aria-current]");
    // Never by scrollIntoView: that would move the whole screen under the thumb.
    if (list && here) list.scrollLeft = here.offsetLeft - (list.clientWidth - here.offsetWidth) / 2;
  }, [taking.at]);
  return (
    <nav aria-label="Figures of this set" className="min-w-0 [grid-area:strip]">
      <ol ref={strip} className="pad-strip">
        {taking.keys.map((key) => {
          const figure = taking.taken[key];
          const current = taking.at === key;
          return (
            <li key={key}>
              <button
                type="button"
                className="pad-chip"
                aria-current={current ? "step" : undefined}
                onClick={() => onGo(key)}
              >
                {current && <span aria-hidden="true" className="pad-chip-notch" />}
                <span>{bodyMeasure(key).name}</span>
                <span className="flex min-h-6 items-center gap-1">
                  {figure && <Length mm={figure.mm} unit={figure.unit} fineness={fineness} />}
                  {figure && onDisk(key) && (
                    <>
                      <Check aria-hidden="true" className="size-4" />
                      <span className="sr-only">, kept on this phone</span>
                    </>
                  )}
                  {asked.has(key) && (
                    <>
                      <TriangleAlert aria-hidden="true" className="size-4" />
                      <span className="sr-only">, to look at once more</span>
                    </>
                  )}
                  {!figure && (taking.skipped.includes(key) ? "skipped" : <span aria-hidden="true">–</span>)}
                  {!figure && !taking.skipped.includes(key) && <span className="sr-only">, not taken</span>}
                </span>
              </button>
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
