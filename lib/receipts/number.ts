/**
 * Receipt numbers. Two phones of one workshop number their receipts without asking each other, so each has a
 * series of its own: six signs drawn from its device id (random, 122 bits), then a count that the journal moves
 * on in the transaction that keeps the receipt. Signs are Crockford's base 32: no I, L, O or U to misread.
 */

const SIGNS = "0123456789ABCDEFGHJKMNPQRSTVWXYZ";
const SERIES_LENGTH = 6;

/** The series of a device, as `7KQ4MX`. `device` is a version 4 UUID, random in its first 48 bits. */
export function seriesOf(device: string): string {
  let bits = parseInt(device.replaceAll("-", "").slice(0, 12), 16);
  let series = "";
  for (let i = 0; i < SERIES_LENGTH; i++) {
    series += SIGNS[bits % 32];
    bits = Math.floor(bits / 32);
  }
  return series;
}

/** A receipt's number, as `7KQ4MX-0012`. */
export function receiptNumber(series: string, count: number): string {
  return `${series}-${String(count).padStart(4, "0")}`;
}
