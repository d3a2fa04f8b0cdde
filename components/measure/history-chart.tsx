import { Card, CardHead } from "@/components/ui/card";
import { Length } from "@/components/ui/fraction";
import { bodyMeasure, type MeasureKey } from "@/lib/figures/body-measures";
import { ageBand } from "@/lib/measuring/age-band";
import { chartOf } from "@/lib/measuring/chart";
import { type HistoryPoint } from "@/lib/measuring/history";
import { type BirthFacts } from "@/lib/people/age";
import { formatDay } from "@/lib/people/format-day";
import { type Fineness, type Unit } from "@/lib/records/types";

const width = 250;
const height = 170;
/** Room for the words on the axes. */
const left = 74;
const below = 28;

/** The figure through time, with the published ones of the age faintly behind; the table says the same in words. */
export function HistoryChart({
  figure,
  points,
  wearer,
  unit,
  fineness,
}: {
  figure: MeasureKey;
  /** At least one, oldest first. */
  points: readonly HistoryPoint[];
  wearer: BirthFacts;
  unit: Unit;
  fineness: Fineness;
}) {
  const last = points.at(-1)!;
  const band = points.length > 1 ? ageBand(figure, wearer, points[0]!.on, last.on) : null;
  const chart = chartOf({ points, unit, width, height, band: band?.points });
  return (
    <Card aria-labelledby="chart">
      <CardHead
        id="chart"
        title="Last taken"
        sub={formatDay(last.on, { style: "long" })}
        end={<Length mm={last.mm} unit={unit} fineness={fineness} size="card" />}
      />
      <svg
        role="img"
        aria-label={`${bodyMeasure(figure).name} through time. The table below has each figure.`}
        viewBox={`${-left} -12 ${width + left + 14} ${height + below + 12}`}
        className="w-full max-w-[34rem]"
        fill="none"
      >
        {chart.band?.area && <path d={chart.band.area} className="fill-chalk" opacity="0.14" />}
        {chart.yTicks.map(({ y, mm, text }) => (
          <g key={mm}>
            <path d={`M0 ${y}H${width}`} className="stroke-line" />
            <text x="-8" y={y + 4.5} textAnchor="end" fontSize="14" className="figures fill-soft">
              {text}
            </text>
          </g>
        ))}
        {chart.xTicks.map(({ x, text }, i) => (
          <g key={x}>
            <path d={`M${x} ${height}v5`} className="stroke-edge" strokeWidth="1.5" />
            <text
              x={x}
              y={height + 20}
              textAnchor={anchorOf(x, i, chart.xTicks.length)}
              fontSize="14"
              className="figures fill-soft"
            >
              {text}
            </text>
          </g>
        ))}
        <path d={`M0 0V${height}H${width}`} className="stroke-edge" strokeWidth="2" />
        {chart.band && (
          <path
            d={chart.band.middle}
            className="stroke-chalk"
            strokeWidth="1.5"
            strokeDasharray="5 4"
            opacity="0.75"
          />
        )}
        <path d={chart.line} className="stroke-ink" strokeWidth="2.5" strokeLinejoin="round" />
        {chart.dots.map(({ x, y }, i) => (
          <circle
            key={points[i]!.setId}
            cx={x}
            cy={y}
            r={i === chart.dots.length - 1 ? 6 : 4.5}
            className="fill-pin stroke-card"
            strokeWidth="2"
          />
        ))}
      </svg>
      {band && <p className="mt-2 text-sm text-soft">{band.say}</p>}
    </Card>
  );
}

/** Words at either end of the axis stay within the drawing. */
function anchorOf(x: number, i: number, all: number): "start" | "middle" | "end" {
  if (all > 1 && i === 0 && x < 20) return "start";
  return all > 1 && i === all - 1 && x > width - 20 ? "end" : "middle";
}
