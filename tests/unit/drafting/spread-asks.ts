/** Asks for the full styles: gathered head, gathered hem, puff, bishop, bell, lantern. */
import fc from "fast-check";
import { makeStyle, type Phrase, type SleeveAsk } from "@/lib/drafting";
import { inches } from "./helpers";
import { blocks, type Made } from "./style-asks";

export const STYLES = ["gathered-head", "gathered-hem", "puff", "bishop", "bell", "lantern"] as const;
/** Their heads are hinged at the slashes, and eased into the armhole. */
export const HINGED = ["gathered-hem", "bishop", "bell", "lantern"] as const;
export const BANDED = ["gathered-hem", "puff", "bishop"] as const;
export const EIGHTH = inches(1 / 8);

export const child: SleeveAsk = {
  length: inches(8),
  biceps: inches(12),
  hem: inches(11),
  capDepth: inches(6.25),
  armhole: { front: inches(8.6), back: inches(8.8) },
};
export const grown: SleeveAsk = {
  length: 590,
  biceps: 360,
  hem: 230,
  capDepth: 140,
  armhole: { front: 215, back: 220 },
  elbowDepth: 330,
  upperArm: 300,
  wrist: 155,
  hand: 190,
};

export const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
export const shares = fc.array(fc.option(real(0, 1), { nil: undefined, freq: 2 }), {
  minLength: 8,
  maxLength: 8,
});

/** The style over the block with figures anywhere between their bounds; what is refused comes back as it is. */
export function any(style: string, block: SleeveAsk, taken: readonly (number | undefined)[], step?: number) {
  const { shown = [] } = makeStyle({ style, block, values: {} }, step);
  const values: Record<string, number> = {};
  for (const [i, { key, kind, low, high }] of shown.entries()) {
    const share = taken[i];
    if (share === undefined) continue;
    const value = low + (high - low) * share;
    values[key] = kind === "count" ? Math.round(value) : value;
  }
  return makeStyle({ style, block, values }, step);
}

export const overAny = (
  check: (of: Made, style: string, hand: boolean) => void,
  styles: readonly string[] = STYLES,
  numRuns = 100,
) =>
  fc.assert(
    fc.property(fc.constantFrom(...styles), blocks, shares, fc.boolean(), (style, block, taken, hand) => {
      const result = any(style, block, taken, hand ? EIGHTH : undefined);
      if (result.ok) check(result, style, hand);
    }),
    { numRuns },
  );

export const words = (phrase: Phrase) =>
  phrase.map((part) => (typeof part === "string" ? part : "#")).join("");
export const mainOf = (of: Made) => of.parts.pieces[0]!;
export const seamOf = (of: Made, id: string) => of.parts.seams.find((seam) => seam.id === id)!;
export const checkOf = (of: Made, id: string) => of.checks.find((check) => check.id === id);
