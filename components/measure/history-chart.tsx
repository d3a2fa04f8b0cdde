import { type AgeBand } from "@/lib/measuring/age-band";
import { chartOf } from "@/lib/measuring/chart";
import { type IsoDate } from "@/lib/people/iso-date";
import { type Unit } from "@/lib/records/types";

const WIDTH = 258;
const HEIGHT = 168;
const LEFT = 70;
const TOP = 14;
const RIGHT = 16;
const BOTTOM = 30;

/** The figure through time. The table below it says the same in words, so a screen reader passes it by. */
export function HistoryChart({
  points,
  unit,
  band,
}: {
  points: readonly { on: IsoDate; mm: number }[];
  unit: Unit;
  band: AgeBand | null;
}) {
  const chart = chartOf({ points, unit, width: WIDTH, height: HEIGHT, band: band?.points });
  return (
    <svg
      aria-hidden="true"
      viewBox={`${-LEFT} ${-TOP} ${LEFT + WIDTH + RIGHT} ${TOP + HEIGHT + BOTTOM}`}
      className="block w-full max-w-[36rem] figures"
      fill="none"
    >
      {chart.yTicks.map(({ y, mm, text }) => (
        <g key={mm}>
          <path d={`M0 ${y}H${WIDTH}`} className="stroke-line" strokeWidth="1" />
          <path d={`M-7 ${y}H0`} className="stroke-edge" strokeWidth="2" />
          <text x={-11} y={y + 4.5} textAnchor="end" fontSize="14" className="fill-soft">
            {text}
          </text>
        </g>
      ))}
      {chart.band?.area && <path d={chart.band.area} className="fill-chalk" opacity="0.14" />}
      {chart.band && (
        <path
          d={chart.band.middle}
          className="stroke-chalk"
          strokeWidth="1.5"
          strokeDasharray="5 4"
          opacity="0.7"
        />
      )}
      <path d={`M0 0V${HEIGHT}`} className="stroke-edge" strokeWidth="2" />
      {chart.xTicks.map(({ x, text }, i) => (
        <g key={text}>
          <path d={`M${x} ${HEIGHT}v6`} className="stroke-edge" strokeWidth="1.5" />
          <text
            x={x}
            y={HEIGHT + 21}
            textAnchor={
              text.length < 8
                ? "middle"
                : i === 0 && chart.xTicks.length > 1
                  ? "start"
                  : chart.xTicks.length > 1
                    ? "end"
                    : "middle"
            }
            fontSize="14"
            className="fill-soft"
          >
            {text}
          </text>
        </g>
      ))}
      <path d={chart.line} className="stroke-ink" strokeWidth="2.5" strokeLinejoin="round" />
      {chart.dots.map(({ x, y, on }, i) => (
        <circle key={`${on} ${i}`} cx={x} cy={y} r="5" className="fill-well stroke-pin" strokeWidth="3" />
      ))}
    </svg>
  );
}
