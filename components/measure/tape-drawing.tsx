import { cx } from "@/components/ui/cx";
import { type MeasureKey } from "@/lib/figures/body-measures";
import { figureLines, tapeRuns } from "./tape-paths";

/** The place of a measure with the tape in it. The words beside it say the same, so a screen reader passes it by. */
export function TapeDrawing({ measure, className }: { measure: MeasureKey; className?: string }) {
  const { on, tape, behind, guide, ends = [] } = tapeRuns[measure];
  const { backdrop, body, detail, notches, box = [0, 0, 120, 132] } = figureLines[on];
  const [x, y, width, height] = box;
  const viewBox = box.join(" ");
  return (
    <svg
      aria-hidden="true"
      viewBox={viewBox}
      className={cx("block w-full", className)}
      fill="none"
      strokeLinecap="round"
      strokeLinejoin="round"
    >
      {/* An inner one clips what is cut off by the frame; the outer one would show it in its margins. */}
      <svg x={x} y={y} width={width} height={height} viewBox={viewBox}>
        {backdrop && <path d={backdrop} className="fill-well stroke-edge" strokeWidth="1.25" />}
        <path d={body} className="fill-card stroke-ink" strokeWidth="1.75" />
        <path d={detail} className="stroke-edge" strokeWidth="1" />
        {notches && <path d={notches} className="fill-paper stroke-ink" strokeWidth="1.5" />}
        {guide && <path d={guide} className="stroke-chalk" strokeWidth="1.5" strokeDasharray="4 3.5" />}
        {behind && <path d={behind} className="stroke-pin" strokeWidth="1.5" strokeDasharray="3 3" />}
        <path d={tape} className="stroke-pin" strokeWidth="5.5" strokeLinecap="butt" />
        <path
          d={tape}
          className="stroke-well"
          strokeWidth="3"
          strokeLinecap="butt"
          strokeDasharray="0.9 3.1"
          strokeDashoffset="-1.5"
        />
        {ends.map(([atX, atY]) => (
          <circle
            key={`${atX} ${atY}`}
            cx={atX}
            cy={atY}
            r="3.25"
            className="fill-well stroke-pin"
            strokeWidth="2"
          />
        ))}
      </svg>
    </svg>
  );
}
