/** One figure through time, laid out as points and ticks; drawing them is the screen's part. */
import { formatPlain } from "@/lib/lengths/format-length";
import { mmPerInch } from "@/lib/lengths/units";
import { type BandPoint } from "@/lib/measuring/age-band";
import { daysBetween, type IsoDate, readDay } from "@/lib/people/iso-date";
import { type Unit } from "@/lib/records/types";

export interface ChartAsk {
  /** At least one; oldest first. */
  points: readonly { on: IsoDate; mm: number }[];
  unit: Unit;
  /** The plain area, in the drawing's own units; ticks and words stand outside it. */
  width: number;
  height: number;
  band?: readonly BandPoint[];
}

export interface Chart {
  dots: { x: number; y: number; on: IsoDate; mm: number }[];
  /** SVG path through the dots. */
  line: string;
  yTicks: { y: number; mm: number; text: string }[];
  xTicks: { x: number; text: string }[];
  /** SVG paths; the area only where both its edges are published. */
  band: { area: string | null; middle: string } | null;
}

/** Steps that a tape has, in mm, finest first. */
const steps: Record<Unit, readonly number[]> = {
  in: [1 / 8, 1 / 4, 1 / 2, 1, 2, 4, 8, 16, 32].map((inches) => inches * mmPerInch),
  cm: [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000],
};
const MOST_STEPS = 5;
const monthSteps = [1, 2, 3, 6, 12, 24, 60, 120, 240, 600] as const;
const MOST_DAYS_TICKS = 4;

const two = (n: number): string => (Math.round(n * 100) / 100).toString();
const path = (points: readonly { x: number; y: number }[]): string =>
  points.map(({ x, y }, i) => `${i === 0 ? "M" : "L"}${two(x)} ${two(y)}`).join("");

function lengthAxis(lowMm: number, highMm: number, unit: Unit) {
  const span = Math.max(highMm - lowMm, unit === "in" ? mmPerInch / 2 : 10);
  const step = steps[unit].find((one) => span / one <= MOST_STEPS - 1) ?? steps[unit].at(-1)!;
  const from = Math.floor(lowMm / step + 1e-6);
  // At least two steps, so that a figure that never changed is not drawn on an edge.
  const to = Math.max(Math.ceil(highMm / step - 1e-6), from + 2);
  return { step, from, to };
}

const monthNames = "Jan Feb Mar Apr May Jun Jul Aug Sep Oct Nov Dec".split(" ");

function monthStarts(from: IsoDate, to: IsoDate, step: number): { on: IsoDate; text: string }[] {
  const first = readDay(from);
  const last = readDay(to);
  const starts = [];
  const begin = first.year * 12 + first.month - 1;
  for (let n = Math.ceil(begin / step) * step; n <= last.year * 12 + last.month - 1; n += step) {
    const year = Math.floor(n / 12);
    const month = n % 12;
    const on = `${String(year).padStart(4, "0")}-${String(month + 1).padStart(2, "0")}-01`;
    if (on < from) continue;
    starts.push({ on, text: step >= 12 || month === 0 ? String(year) : monthNames[month]! });
  }
  return starts;
}

/** Month or year starts between two days; where fewer than two fall between, the two days themselves. */
function dayTicks(from: IsoDate, to: IsoDate): { on: IsoDate; text: string }[] {
  for (const step of monthSteps) {
    const starts = monthStarts(from, to, step);
    if (starts.length < 2) break;
    if (starts.length <= MOST_DAYS_TICKS) return starts;
  }
  const words = (on: IsoDate) => {
    const { day, month, year } = readDay(on);
    return `${day} ${monthNames[month - 1]} ${year}`;
  };
  return [from, to].filter((on, i, all) => all.indexOf(on) === i).map((on) => ({ on, text: words(on) }));
}

/** @throws RangeError without a point, or where a date is not a day. */
export function chartOf({ points, unit, width, height, band = [] }: ChartAsk): Chart {
  const first = points[0];
  if (!first) throw new RangeError("a history of no figures");
  const last = points.at(-1)!;
  const lengths = [
    ...points.map(({ mm }) => mm),
    ...band.flatMap(({ lowMm, midMm, highMm }) => [lowMm ?? midMm, highMm ?? midMm]),
  ];
  const { step, from, to } = lengthAxis(Math.min(...lengths), Math.max(...lengths), unit);
  const days = daysBetween(first.on, last.on);
  // One day alone stands in the middle.
  const xOf = (on: IsoDate) => (days === 0 ? width / 2 : (daysBetween(first.on, on) / days) * width);
  const yOf = (mm: number) => height - ((mm / step - from) / (to - from)) * height;
  const at = (on: IsoDate, mm: number) => ({ x: xOf(on), y: yOf(mm) });

  const dots = points.map(({ on, mm }) => ({ ...at(on, mm), on, mm }));
  const edges = band.flatMap(({ on, lowMm, highMm }) =>
    lowMm === undefined || highMm === undefined ? [] : [{ low: at(on, lowMm), high: at(on, highMm) }],
  );
  return {
    dots,
    line: path(dots),
    yTicks: Array.from({ length: to - from + 1 }, (_, i) => {
      const mm = (from + i) * step;
      return { y: yOf(mm), mm, text: formatPlain(mm, unit) };
    }),
    xTicks: dayTicks(first.on, last.on).map(({ on, text }) => ({ x: xOf(on), text })),
    band:
      band.length < 2 || days === 0
        ? null
        : {
            area:
              edges.length < 2
                ? null
                : `${path([...edges.map(({ low }) => low), ...edges.map(({ high }) => high).reverse()])}Z`,
            middle: path(band.map(({ on, midMm }) => at(on, midMm))),
          },
  };
}
