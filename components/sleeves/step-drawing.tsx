"use client";

import { memo } from "react";
import { type Point } from "@/lib/drafting";
import { pathOf } from "@/lib/sleeves/drawing-paths";
import { type Box, fitView, type Room, toScreen } from "@/lib/sleeves/drawing-view";
import { type StepPicture } from "@/lib/sleeves/mark-out";
import { cx } from "@/components/ui/cx";
import { useSize } from "./use-size";
import "./sleeves.css";

export interface StepDrawingProps {
  picture: StepPicture;
  className?: string;
}

const room: Room = { top: 26, right: 26, bottom: 30, left: 26 };

/** What is on the paper by this step, with the new line, its measure and its points picked out. */
export const StepDrawing = memo(function StepDrawing({ className, picture }: StepDrawingProps) {
  const [ref, size] = useSize<HTMLDivElement>();
  const { before, box, fresh, measured, points } = picture;
  const view = size && fitView(steady(box), size, room);
  return (
    <div ref={ref} aria-hidden="true" className={cx("marking-paper border-2 border-edge", className)}>
      {size && view && (
        <svg width={size.width} height={size.height} className="block">
          <g transform={`translate(${view.x} ${view.y}) scale(${view.scale})`}>
            {before.map(({ curves, weight }, i) => (
              <path
                key={i}
                d={pathOf(curves)}
                fill="none"
                stroke={weight === "cut" ? "var(--ink)" : "var(--chalk)"}
                strokeWidth={weight === "cut" ? 2 : 1.25}
                vectorEffect="non-scaling-stroke"
              />
            ))}
            {fresh.map(({ curves }, i) => (
              <path
                key={i}
                d={pathOf(curves)}
                fill="none"
                stroke="var(--ink)"
                strokeWidth="5"
                strokeLinecap="round"
                vectorEffect="non-scaling-stroke"
              />
            ))}
            {measured.map(({ from, to }, i) => (
              <path
                key={i}
                d={`M${from.x} ${from.y}L${to.x} ${to.y}`}
                stroke="var(--ink)"
                strokeWidth="5"
                strokeLinecap="butt"
                strokeDasharray="7 5"
                vectorEffect="non-scaling-stroke"
              />
            ))}
          </g>
          {points.map((point, i) => {
            const at = toScreen(view, point);
            return (
              <g key={i}>
                <circle
                  cx={at.x}
                  cy={at.y}
                  r={point.fresh ? 7 : Math.min(3.5, Math.max(1.5, view.scale * 7))}
                  fill={point.fresh ? "var(--ink)" : "var(--chalk)"}
                  stroke="var(--well)"
                  strokeWidth={point.fresh ? 2 : 0}
                />
                {point.fresh && point.words && (
                  <PointLabel at={at} words={point.words} width={size.width} height={size.height} />
                )}
              </g>
            );
          })}
        </svg>
      )}
      <span className="absolute start-2 top-1 text-fine text-soft">front</span>
      <span className="absolute end-2 top-1 text-fine text-soft">back</span>
    </div>
  );
});

interface PointLabelProps {
  at: Point;
  words: string;
  width: number;
  height: number;
}

/** Kept inside the drawing: at the edges it turns inward, at the foot it stands above its point. */
function PointLabel({ at, height, width, words }: PointLabelProps) {
  const near = words.length * 4.5 + 8;
  const anchor = at.x < near ? "start" : at.x > width - near ? "end" : "middle";
  const below = at.y < height - 30;
  return (
    <text
      x={at.x}
      y={below ? at.y + 23 : at.y - 12}
      textAnchor={anchor}
      fill="var(--ink)"
      stroke="var(--well)"
      strokeWidth="4"
      paintOrder="stroke"
      fontSize="16"
      fontWeight="600"
    >
      {words}
    </text>
  );
}

/** A cap of no height would fit at any size. */
function steady({ h, w, x, y }: Box): Box {
  return { x, y, w: Math.max(w, 1), h: Math.max(h, 1) };
}
