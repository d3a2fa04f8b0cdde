/**
 * What each style is called, for the many places where a sleeve is only named: they need not fetch the drafting engine,
 * whose recipes hold the same names. A test holds the two against each other.
 */
import { type StyleId } from "@/lib/records/types";

const names: Readonly<Record<StyleId, string>> = {
  plain: "Plain",
  "gathered-head": "Gathered head",
  "gathered-hem": "Gathered hem",
  puff: "Puff",
  "leg-of-mutton": "Leg-of-mutton",
  statement: "Two-part statement sleeve",
  bishop: "Bishop",
  bell: "Bell",
  flounced: "Flounced",
  petal: "Petal",
  lantern: "Lantern",
  cap: "Cap",
  tiered: "Tiered",
};

export function styleName(id: StyleId): string {
  return names[id];
}
