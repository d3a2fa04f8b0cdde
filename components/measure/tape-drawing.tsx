import { cx } from "@/components/ui/cx";
import { Notch } from "@/components/ui/notch";
import { type MeasureKey } from "@/lib/figures/body-measures";
import { figureLines, tapeRuns } from "./tape-paths";

/** The place of a measure with the tape in it. The words beside it say the same, so a screen reader passes it by. */
export function TapeDrawing({ measure, className }: { measure: MeasureKey; className?: string }) {
  const { on, tape, behind, guide, ends = [] } = tapeRuns[measure];
  const { backdrop, body, detail } = figureLines[on];
  const side = on === "front" ? 1 : on === "back" ? 2 : null;
  return (
    <span aria-hidden="true" className={cx("relative block", className)}>
      <svg
        viewBox="0 0 120 132"
        className="block h-full w-full"
        fill="none"
        strokeLinecap="round"
        strokeLinejoin="round"
      >
        {backdrop && <path d={backdrop} className="fill-well stroke-edge" strokeWidth="1.25" />}
        <path d={body} className="fill-card stroke-ink" strokeWidth="1.75" />
        <path d={detail} className="stroke-edge" strokeWidth="1" />
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
        {ends.map(([x, y]) => (
          <circle key={`${x} ${y}`} cx={x} cy={y} r="3.25" className="fill-well stroke-pin" strokeWidth="2" />
        ))}
      </svg>
      {side && (
        <span className="absolute end-0 top-0 text-soft">
          <Notch count={side} label="" />
        </span>
      )}
    </span>
  );
}
