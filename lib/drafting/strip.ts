/** Strips for gathering, cut across the cloth and joined where one width is not enough. */

export interface StripAsk {
  /** What the strip is gathered into, mm. */
  readonly seam: number;
  /** How many times as long the strip is. */
  readonly ratio: number;
  readonly clothWidth: number;
  /** Taken by the seam at each end of a part, mm. */
  readonly allowance: number;
  /** Rounds the length of a part to what the hand sets out. */
  near(mm: number): number;
}

export interface Strip {
  /** Equal parts, sewn end to end; the last join closes the round. */
  readonly parts: number;
  /** Of one part between its end seams, mm. */
  readonly part: number;
  /** Of all parts joined, mm. */
  readonly total: number;
}

/** Shorter parts than this are patchwork, mm. */
const LEAST_PART = 50;

/** A strip of `ratio` times the seam, in as few equal parts as the cloth's width allows; undefined where it allows none. */
export function stripOf({ seam, ratio, clothWidth, allowance, near }: StripAsk): Strip | undefined {
  const most = clothWidth - 2 * allowance;
  if (most < LEAST_PART) return undefined;
  const wanted = seam * ratio;
  let parts = Math.max(1, Math.ceil(wanted / most - 1e-9));
  // Rounded up to the mark, a part may just be too long.
  if (near(wanted / parts) > most + 1e-9) parts += 1;
  const part = near(wanted / parts);
  return { parts, part, total: part * parts };
}
