/** Path data in mm for the drawings of sums; y runs downwards, angles from the x axis towards it. */

const n = (value: number): string => String(Math.round(value * 1000) / 1000);

export const line = (x1: number, y1: number, x2: number, y2: number): string =>
  `M${n(x1)} ${n(y1)}L${n(x2)} ${n(y2)}`;

export const rect = (x: number, y: number, w: number, h: number): string =>
  `M${n(x)} ${n(y)}h${n(w)}v${n(h)}h${n(-w)}z`;

export const polygon = (points: readonly (readonly [number, number])[]): string =>
  `M${points.map(([x, y]) => `${n(x)} ${n(y)}`).join("L")}z`;

/** An arc about the origin from angle `a` on by `turn` radians, at most a whole round. Parts never pass half a round. */
export function arc(r: number, a: number, turn: number): string {
  const parts = Math.max(1, Math.ceil(turn / (Math.PI / 2)));
  const at = (angle: number) => `${n(r * Math.cos(angle))} ${n(r * Math.sin(angle))}`;
  const steps = Array.from(
    { length: parts },
    (_, i) => `A${n(r)} ${n(r)} 0 0 1 ${at(a + ((i + 1) * turn) / parts)}`,
  );
  return `M${at(a)}${steps.join("")}`;
}

/** A straight line outward from radius `from` to radius `to`. */
export const spoke = (from: number, to: number, a: number): string =>
  line(from * Math.cos(a), from * Math.sin(a), to * Math.cos(a), to * Math.sin(a));
