import { memo } from "react";
import { type SewingSum, workSum } from "@/lib/sewing";

const weights = { cut: 2, stitch: 1.5, fold: 1, measure: 1 } as const;

/** What a sum draws, the size of a word. It says nothing: the row beside it does. */
export const SumThumb = memo(function SumThumb({ sum }: { sum: SewingSum }) {
  const worked = workSum(sum, sum.example);
  if (!worked.ok) return null;
  const { box, paths } = worked.drawing;
  const edge = Math.max(box.w, box.h) * 0.05;
  return (
    <svg
      aria-hidden="true"
      viewBox={`${box.x - edge} ${box.y - edge} ${box.w + 2 * edge} ${box.h + 2 * edge}`}
      className="size-14"
    >
      {paths
        .filter(({ line }) => line === "cut" || line === "stitch")
        .map(({ d, line }, i) => (
          <path
            key={i}
            d={d}
            fill="none"
            stroke={line === "cut" ? "var(--ink)" : "var(--chalk)"}
            strokeWidth={weights[line]}
            strokeDasharray={line === "stitch" ? "4 3" : undefined}
            strokeLinejoin="round"
            vectorEffect="non-scaling-stroke"
          />
        ))}
    </svg>
  );
});
