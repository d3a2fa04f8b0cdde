import { memo } from "react";
import { type SleeveDraft } from "@/lib/drafting";
import { boxOf, outlineOf } from "@/lib/sleeves/drawing-paths";

/** A sleeve the size of a word. It says nothing: the row beside it does. */
export const SleeveThumb = memo(function SleeveThumb({ draft }: { draft: SleeveDraft }) {
  const { h, w, x, y } = boxOf(draft);
  const edge = Math.max(w, h) * 0.04;
  return (
    <svg
      aria-hidden="true"
      viewBox={`${x - edge} ${y - edge} ${w + 2 * edge} ${h + 2 * edge}`}
      className="size-16"
    >
      <path
        d={outlineOf(draft.piece)}
        fill="var(--well)"
        stroke="var(--ink)"
        strokeWidth="2"
        strokeLinejoin="round"
        vectorEffect="non-scaling-stroke"
      />
    </svg>
  );
});
