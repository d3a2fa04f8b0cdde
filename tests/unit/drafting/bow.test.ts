import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { bowCurve, fairCurve, tightestBend } from "@/lib/drafting/fair";
import { arc } from "@/lib/drafting/ring";
import { type Point } from "@/lib/drafting";
import { curvature, sample } from "./helpers";

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Points that turn one way: on an ellipse, unevenly spaced, each moved out along its ray by less than would make a hollow. */
const bows = fc
  .record({
    wide: real(40, 300),
    high: real(40, 300),
    start: real(0, 6),
    steps: fc.array(real(0.15, 0.7), { minLength: 2, maxLength: 4 }),
  })
  .map(({ wide, high, start, steps }) => {
    let angle = start;
    const at = (a: number): Point => ({ x: wide * Math.cos(a), y: high * Math.sin(a) });
    const points = [at(start), ...steps.map((step) => at((angle += step)))];
    return { points, arriving: { x: -wide * Math.sin(angle), y: high * Math.cos(angle) } };
  });

describe("a bow", () => {
  it("through points that turn one way turns that way only, and has no corner", () => {
    fc.assert(
      fc.property(bows, ({ points, arriving }) => {
        const curves = bowCurve(points, undefined, arriving);
        for (const [i, curve] of curves.entries()) {
          for (const t of [0, 0.1, 0.3, 0.5, 0.7, 0.9, 1]) expect(curvature(curve, t)).toBeGreaterThan(-1e-9);
          const next = curves[i + 1];
          const [, , c, d] = curve;
          const to = next ? { x: next[1].x - d.x, y: next[1].y - d.y } : arriving;
          const sine =
            ((d.x - c.x) * to.y - (d.y - c.y) * to.x) /
            (Math.hypot(d.x - c.x, d.y - c.y) * Math.hypot(to.x, to.y));
          expect(Math.abs(sine)).toBeLessThan(1e-9);
        }
      }),
    );
  });

  it("keeps to one way where the freely fair curve would swing over it", () => {
    const points = [
      { x: 0, y: 0 },
      { x: -40, y: 30 },
      { x: -200, y: 80 },
    ];
    const least = (draw: typeof bowCurve) =>
      Math.min(
        ...draw(points, undefined, { x: -1, y: 0.3 }).flatMap((curve) =>
          [0, 0.1, 0.3, 0.5, 0.7, 0.9, 1].map((t) => curvature(curve, t)),
        ),
      );
    expect(least(fairCurve)).toBeLessThan(-1e-3);
    expect(least(bowCurve)).toBeGreaterThan(-1e-9);
  });

  it("left free to leave, is the arc of a circle where that is asked for, within a thousandth of its radius", () => {
    for (const turn of [0.3, 1, 1.5]) {
      const end = { x: 100 * Math.sin(turn), y: 100 - 100 * Math.cos(turn) };
      const arriving = { x: Math.cos(turn), y: Math.sin(turn) };
      for (const draw of [bowCurve, fairCurve])
        for (const curve of draw([{ x: 0, y: 0 }, end], undefined, arriving))
          for (const { x, y } of sample(curve, 20))
            expect(Math.abs(Math.hypot(x, y - 100) - 100)).toBeLessThan(0.1);
    }
  });

  it("is as tight as its smallest circle", () => {
    const quarter = (r: number) => arc({ x: 0, y: 0 }, r, 0, Math.PI / 2);
    // The cubics of an arc bend as it does within a hundredth.
    expect(tightestBend([...quarter(80), ...quarter(20)]) / 20).toBeCloseTo(1, 2);
  });
});
