import { memo, useMemo } from "react";
import { type PatternPiece } from "@/lib/drafting";
import { outlineOf } from "@/lib/sleeves/drawing-paths";
import { layPieces } from "@/lib/sleeves/lay-pieces";

/** Between the pieces, mm. */
const GAP = 25;

/** The pieces of a sleeve, the size of a word. It says nothing: the row beside it does. */
export const SleeveThumb = memo(function SleeveThumb({ pieces }: { pieces: readonly PatternPiece[] }) {
  const { box, laid } = useMemo(() => layPieces(pieces, 1, GAP), [pieces]);
  const edge = Math.max(box.w, box.h) * 0.04;
  return (
    <svg
      aria-hidden="true"
      viewBox={`${box.x - edge} ${box.y - edge} ${box.w + 2 * edge} ${box.h + 2 * edge}`}
      className="size-16"
    >
      {laid.map(({ by, piece }) => (
        <path
          key={piece.id}
          d={outlineOf(piece)}
          transform={`translate(${by.x} ${by.y})`}
          fill="var(--well)"
          stroke="var(--ink)"
          strokeWidth="2"
          strokeLinejoin="round"
          vectorEffect="non-scaling-stroke"
        />
      ))}
    </svg>
  );
});
