import { cx } from "@/components/ui/cx";
import { type Unit } from "@/lib/records/types";

export type TapeProps = {
  /** The workshop's unit: inches are ticked in eighths, centimetres in millimetres. */
  unit: Unit;
  /** Across, or down the side of a card. Default "across". */
  run?: "across" | "down";
  className?: string;
};

/** How far each tick reaches. A picture of a tape, not one to measure by: a screen does not know its own size. */
const INCH = [1, 0.35, 0.5, 0.35, 0.7, 0.35, 0.5, 0.35] as const;
const CENTIMETRE = [1, 0.35, 0.35, 0.35, 0.35, 0.7, 0.35, 0.35, 0.35, 0.35] as const;

/**
 * A ruled edge beside something measured, with the real division of the unit. It fills the run it is given and
 * says nothing to a screen reader: the figure beside it does.
 */
export function Tape({ unit, run = "across", className }: TapeProps) {
  const ticks = unit === "in" ? INCH : CENTIMETRE;
  const step = 6;
  const depth = 14;
  const length = ticks.length * step;
  const across = run === "across";
  const d = ticks
    .map((tick, i) => {
      const at = i * step + step / 2;
      return across ? `M${at} 0v${tick * depth}` : `M0 ${at}h${tick * depth}`;
    })
    .join("");
  const [width, height] = across ? [length, depth] : [depth, length];
  // The pattern's id is the same for every tape of the same kind; they draw the same thing, so sharing it is right.
  const id = `tape-${unit}-${run}`;
  return (
    <svg
      aria-hidden="true"
      className={cx("tape block", across ? "h-3.5 w-full border-t-2" : "h-full w-3.5 border-s-2", className)}
      style={{ borderColor: "currentColor" }}
    >
      <defs>
        <pattern
          id={id}
          width={`${width / 16}rem`}
          height={`${height / 16}rem`}
          viewBox={`0 0 ${width} ${height}`}
          patternUnits="userSpaceOnUse"
        >
          <path d={d} stroke="currentColor" strokeWidth="1.5" fill="none" />
        </pattern>
      </defs>
      <rect width="100%" height="100%" fill={`url(#${id})`} />
    </svg>
  );
}
