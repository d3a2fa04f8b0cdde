import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { draftBasicSleeve, type CubicBezier, type SleeveDraft, type SleeveFigures } from "@/lib/drafting";
import { anyMarks, child, curvature, draft, edge, figures, human, inches, sample } from "./helpers";

const halves = (d: SleeveDraft) => [edge(d, "capFront").curves, edge(d, "capBack").curves];

function direction(curve: CubicBezier, end: "start" | "end"): number {
  const [p, q] = end === "start" ? [curve[0], curve[1]] : [curve[2], curve[3]];
  return Math.atan2(q.y - p.y, q.x - p.x);
}

/** Everything "The basic sleeve", rule 3, asks of a cap seam. */
function expectFair(d: SleeveDraft): void {
  const whole = halves(d).flat();
  for (const [i, curve] of whole.entries()) {
    const next = whole[i + 1];
    if (!next) continue;
    expect(curve[3]).toEqual(next[0]);
    // 1e-9 rad: the two handles of a join are set from one and the same slope.
    expect(Math.abs(direction(curve, "end") - direction(next, "start"))).toBeLessThan(1e-9);
  }
  const [front, back] = halves(d);
  // Level at the crown and at the underarm, to 1e-9 rad.
  for (const angle of [direction(front!.at(-1)!, "end"), direction(back![0]!, "start")]) {
    expect(Math.abs(angle)).toBeLessThan(1e-9);
  }
  for (const angle of [direction(front![0]!, "start"), direction(back!.at(-1)!, "end")]) {
    expect(Math.abs(angle)).toBeLessThan(1e-9);
  }
  for (const half of [front!, back!]) {
    const signs = half
      .flatMap((curve) => Array.from({ length: 41 }, (_, i) => curvature(curve, i / 40)))
      // Flatter than a circle of a kilometre is straight.
      .filter((k) => Math.abs(k) > 1e-6)
      .map(Math.sign);
    expect(signs.filter((s, i) => i > 0 && s !== signs[i - 1]).length).toBeLessThanOrEqual(1);
    const points = half.flatMap((curve) => sample(curve, 40));
    // Nothing above the crown or back over itself, to 1e-9 mm of float noise.
    for (const [i, p] of points.entries()) {
      expect(p.y).toBeGreaterThanOrEqual(-1e-9);
      if (i > 0) expect(p.x).toBeGreaterThanOrEqual(points[i - 1]!.x - 1e-9);
    }
  }
}

describe("cap seam", () => {
  it("is fair on the child's sleeve", () => expectFair(draft(child)));

  it("is fair with the default marks, infant to large adult, flat to deep", () => {
    fc.assert(
      fc.property(human, (f) => expectFair(draft(f))),
      { numRuns: 200 },
    );
  });

  it("with any marks is either fair or refused naming a mark", () => {
    let fair = 0;
    let refused = 0;
    fc.assert(
      fc.property(anyMarks, (f) => {
        const result = draftBasicSleeve(f);
        if (result.ok) {
          fair++;
          expectFair(result.value);
        } else {
          refused++;
          for (const problem of result.problems) {
            expect(problem.mark).toBeDefined();
            expect(f[problem.mark!.side][problem.mark!.index]).toBeDefined();
            expect(problem.figure).toBe(problem.mark!.side === "front" ? "frontMarks" : "backMarks");
          }
        }
      }),
      { numRuns: 600, interruptAfterTimeLimit: 60_000 },
    );
    // Both kinds must have been met, or the property says nothing.
    expect(fair).toBeGreaterThan(20);
    expect(refused).toBeGreaterThan(20);
  });

  it("runs through every mark", () => {
    const d = draft(child);
    const ends = halves(d).flatMap((half) => half.flatMap((c) => [c[0], c[3]]));
    for (const name of [
      "markFront1",
      "markFront2",
      "markFront3",
      "markBack1",
      "markBack2",
      "markBack3",
    ] as const) {
      const mark = d.points[name]!;
      // 1e-9 mm: the same sum in another order.
      expect(Math.min(...ends.map((p) => Math.hypot(p.x - mark.x, p.y - mark.y)))).toBeLessThan(1e-9);
    }
  });

  it("shows no jump in how hard it bends: at the child's joins the two curvatures agree within 20 %", () => {
    for (const half of halves(draft(child))) {
      for (const [i, curve] of half.slice(0, -1).entries()) {
        const [before, after] = [curvature(curve, 1), curvature(half[i + 1]!, 0)];
        expect(Math.abs(before - after)).toBeLessThan(0.2 * Math.max(Math.abs(before), Math.abs(after)));
      }
    }
  });

  it("grows with the cap depth and with the biceps line", () => {
    const step = fc.double({ min: 1, max: 60, noNaN: true });
    fc.assert(
      fc.property(human, step, (f, more) => {
        const { cap } = draft(f).lengths;
        expect(draft(figures(f.biceps, f.capDepth + more)).lengths.cap).toBeGreaterThan(cap);
        expect(draft(figures(f.biceps + more, f.capDepth)).lengths.cap).toBeGreaterThan(cap);
      }),
    );
  });

  it("is mirrored when front and back change places", () => {
    fc.assert(
      fc.property(human, (f) => {
        const [front, back] = halves(draft(f));
        const [swappedFront, swappedBack] = halves(draft({ ...f, front: f.back, back: f.front }));
        const mirror = (half: readonly CubicBezier[]) =>
          half.map((curve) => [...curve].reverse().map(({ x, y }) => ({ x: -x, y }))).reverse();
        // Within 1e-9 mm.
        expectNear(mirror(back!), swappedFront!);
        expectNear(mirror(front!), swappedBack!);
      }),
    );
  });

  it("scales with its figures", () => {
    fc.assert(
      fc.property(human, fc.double({ min: 0.5, max: 2, noNaN: true }), (f, k) => {
        const scaled: SleeveFigures = {
          ...figures(f.biceps * k, f.capDepth * k, f.length * k, f.hem * k),
        };
        const [a, b] = [draft(f).lengths, draft(scaled).lengths];
        // 1e-9 of the length: float noise only.
        for (const key of ["capFront", "capBack", "underarmFront", "hem"] as const) {
          expect(Math.abs(b[key] - a[key] * k)).toBeLessThan(1e-9 * a[key] * k + 1e-9);
        }
      }),
    );
  });
});

function expectNear(a: readonly (readonly { x: number; y: number }[])[], b: readonly CubicBezier[]): void {
  for (const [i, curve] of a.entries()) {
    for (const [j, p] of curve.entries()) {
      expect(Math.hypot(p.x - b[i]![j]!.x, p.y - b[i]![j]!.y)).toBeLessThan(1e-9);
    }
  }
}

describe("marks that give no fair seam are named", () => {
  const withFront = (outs: number[], shares = [0.25, 0.55, 0.8]) =>
    draftBasicSleeve({ ...child, front: outs.map((out, i) => ({ share: shares[i]!, out: inches(out) })) });

  it.each([
    ["mark-above-crown", [-0.5, 0.5, 2.5], 2],
    ["mark-below-cap-line", [-2.6, 0.5, 0.75], 0],
    ["mark-overhang", [-2, 2, 1.2], 1],
    ["mark-wiggle", [0.5, -0.3, 0.9], 1],
  ])("%s", (id, outs, index) => {
    const result = withFront(outs);
    expect(result.ok).toBe(false);
    if (result.ok) return;
    expect(result.problems).toHaveLength(1);
    expect(result.problems[0]).toMatchObject({ id, figure: "frontMarks", mark: { side: "front", index } });
    expect(result.problems[0]!.remedy.length).toBeGreaterThan(0);
  });
});
