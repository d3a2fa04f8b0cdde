"use client";

import { type FullSizeLayout } from "@/lib/pdf/full-size-layout";
import { moveChain, outlinesOf } from "@/lib/pdf/full-size-marks";
import { Button } from "@/components/ui/button";
import { pathOf } from "@/lib/sleeves/drawing-paths";
import "./sleeves.css";

export interface SheetPlanProps {
  layout: FullSizeLayout;
  chosen: ReadonlySet<string>;
  onChoose(chosen: Set<string>): void;
}

/** The sheets over the outlines: tap one in the drawing, or its name below, to print it or leave it out. */
export function SheetPlan({ chosen, layout, onChoose }: SheetPlanProps) {
  const { field, pieces, sheets } = layout;
  const width = Math.max(field.w, ...sheets.map(({ rect }) => rect.x + rect.w));
  const height = Math.max(field.h, ...sheets.map(({ rect }) => rect.y + rect.h));
  const letters = Math.min(...sheets.map(({ cell }) => Math.min(cell.w * 0.26, cell.h * 0.4)), height / 4);
  const toggle = (name: string) => {
    const next = new Set(chosen);
    if (!next.delete(name)) next.add(name);
    onChoose(next);
  };
  return (
    <div className="grid gap-3">
      <svg
        aria-hidden="true"
        viewBox={`${-width * 0.01} ${-width * 0.01} ${width * 1.02} ${height + width * 0.02}`}
        className="sheet-plan"
      >
        {sheets.map(({ cell, name }) => (
          <g
            key={name}
            className="sheet-cell"
            data-chosen={chosen.has(name) || undefined}
            onClick={sheets.length > 1 ? () => toggle(name) : undefined}
          >
            <rect x={cell.x} y={cell.y} width={cell.w} height={cell.h} />
            <text
              x={cell.x + cell.w / 2}
              y={cell.y + cell.h / 2}
              fontSize={letters}
              textAnchor="middle"
              dominantBaseline="central"
            >
              {name}
            </text>
          </g>
        ))}
        {pieces.map(({ by, piece }) =>
          outlinesOf(piece).map((curves, i) => (
            <path key={`${piece.id} ${i}`} d={pathOf(moveChain(curves, by))} className="sheet-outline" />
          )),
        )}
      </svg>
      {sheets.length > 1 && (
        <fieldset className="grid gap-2">
          <legend className="mb-1 font-semibold">{layout.isRoll ? "Strips" : "Sheets"} to print</legend>
          <div className="sheet-names">
            {sheets.map(({ name }) => (
              <label key={name} className="sheet-name">
                <input
                  type="checkbox"
                  className="size-6 shrink-0 accent-ink"
                  checked={chosen.has(name)}
                  onChange={() => toggle(name)}
                />
                <span>{name}</span>
              </label>
            ))}
          </div>
          <div className="flex flex-wrap gap-2">
            <Button onClick={() => onChoose(new Set(sheets.map(({ name }) => name)))}>All</Button>
            <Button onClick={() => onChoose(new Set())}>None</Button>
          </div>
        </fieldset>
      )}
    </div>
  );
}
