"use client";

import { DrawingFigure } from "@/components/sleeves/drawing-figure";
import { useSize } from "@/components/sleeves/use-size";
import { cx } from "@/components/ui/cx";
import { phraseText } from "@/lib/lengths/phrase";
import { type Fineness, type Unit } from "@/lib/records/types";
import { type SumDrawing as Drawn } from "@/lib/sewing";
import { fitView, type Room, toScreen } from "@/lib/sleeves/drawing-view";
import "@/components/sleeves/sleeves.css";
import "./sums.css";

const room: Room = { top: 16, right: 16, bottom: 16, left: 16 };

export interface SumDrawingProps {
  drawing: Drawn;
  unit: Unit;
  fineness: Fineness;
  /** It does not show what is typed: that cannot be drawn. */
  faint: boolean;
}

/** What a sum comes to, drawn to its own scale. */
export function SumDrawing({ drawing, faint, fineness, unit }: SumDrawingProps) {
  const [ref, size] = useSize<HTMLDivElement>();
  const { box, labels, paths, say } = drawing;
  const view = size && fitView(box, size, room);
  return (
    <div ref={ref} role="img" aria-label={phraseText([...say], unit, fineness)} className="marking-paper">
      {size && view && (
        <div aria-hidden="true" className={cx("absolute inset-0", faint && "opacity-40")}>
          <svg width={size.width} height={size.height} className="block">
            <g transform={`translate(${view.x} ${view.y}) scale(${view.scale})`}>
              {paths.map(({ d, line }, i) => (
                <path key={i} d={d} className={`sum-${line}`} vectorEffect="non-scaling-stroke" />
              ))}
            </g>
          </svg>
          {labels.map(({ mm, text, x, y }, i) => {
            const at = toScreen(view, { x, y });
            // Kept on the paper: at its edges a label is moved inwards.
            const left = Math.min(size.width - 34, Math.max(34, at.x));
            const top = Math.min(size.height - 16, Math.max(16, at.y));
            return (
              <span key={i} className="drawing-label" style={{ left, top }}>
                {mm === undefined ? text : <DrawingFigure mm={mm} unit={unit} fineness={fineness} />}
              </span>
            );
          })}
        </div>
      )}
      <span aria-hidden="true" className="absolute end-2 bottom-1 text-fine text-soft">
        {unit}
      </span>
    </div>
  );
}
