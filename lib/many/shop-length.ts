/** A need of cloth as it is asked for in the shop. */
import { formatLength } from "@/lib/lengths/format-length";
import { mmPerInch } from "@/lib/lengths/units";

/** The shop's steps, mm: a tenth of a metre, an eighth of a yard. From memory. */
const METRE_STEP = 100;
const YARD_STEP = 4.5 * mmPerInch;

export interface ShopLength {
  metres: string;
  yards: string;
}

/** What is to be bought so that `need` is there after washing: need/(1 - s), mm. `shrinks` is s, from 0 to below 1. */
export function bought(need: number, shrinks: number): number {
  return need / (1 - shrinks);
}

/** Rounded up to the shop's step in either measure. */
export function shopLength(mm: number): ShopLength {
  const tenths = Math.ceil(mm / METRE_STEP - 1e-9);
  const eighths = Math.ceil(mm / YARD_STEP - 1e-9);
  return {
    metres: `${(tenths / 10).toFixed(1)} m`,
    yards: `${formatLength((eighths / 8) * mmPerInch, "in", 8).figure} yd`,
  };
}
