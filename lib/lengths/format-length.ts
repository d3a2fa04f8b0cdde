import { type Fineness, type Unit } from "@/lib/records/types";
import { stepOf } from "@/lib/lengths/units";

export interface LengthParts {
  negative: boolean;
  whole: number;
  /** 0 where there is no fraction. */
  numerator: number;
  /** Inches: reduced, 1 where there is no fraction. Centimetres: 10, the numerator being the odd millimetres. */
  denominator: number;
  unit: Unit;
  /** Without the unit, as it would be typed: `6 1/4`, `15.9`. */
  figure: string;
  /** With the unit: `6 1/4 in`, `15.9 cm`. */
  text: string;
}

/** Float noise of a length that lies half-way between two steps, in steps: such a length goes up. */
const noise = 1e-9;

const commonDivisor = (a: number, b: number): number => (b === 0 ? a : commonDivisor(b, a % b));

/** A length in mm to the nearest step shown (see `stepOf`), taken apart for a stacked fraction. */
export function formatLength(mm: number, unit: Unit, fineness: Fineness = 8): LengthParts {
  const each = unit === "in" ? fineness : 10;
  const steps = Math.floor(Math.abs(mm) / stepOf(unit, fineness) + 0.5 + noise);
  const negative = mm < 0 && steps > 0;
  const whole = Math.floor(steps / each);
  const over = steps % each;
  const divisor = unit === "in" ? commonDivisor(each, over) : 1;
  const numerator = over / divisor;
  const denominator = each / divisor;
  const sign = negative ? "-" : "";
  const figure =
    unit === "cm"
      ? `${sign}${whole}${over === 0 ? "" : `.${over}`}`
      : `${sign}${[whole === 0 && over > 0 ? "" : whole, over === 0 ? "" : `${numerator}/${denominator}`]
          .filter((part) => part !== "")
          .join(" ")}`;
  return { negative, whole, numerator, denominator, unit, figure, text: `${figure} ${unit}` };
}

/** `6 1/4 in` or `15.9 cm`, to the nearest step shown. */
export function formatPlain(mm: number, unit: Unit, fineness: Fineness = 8): string {
  return formatLength(mm, unit, fineness).text;
}
