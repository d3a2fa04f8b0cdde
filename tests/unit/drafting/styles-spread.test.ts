/** What holds for every full style: gathered head, gathered hem, puff, bishop, bell, lantern. */
import { Polygon, point } from "@flatten-js/core";
import fc from "fast-check";
import polygonClipping from "polygon-clipping";
import { describe, expect, it } from "vitest";
import { makeStyle, pointAt, recipes } from "@/lib/drafting";
import { chainLength } from "@/lib/drafting/measure";
import { human, inches, sample } from "./helpers";
import { any, checkOf, EIGHTH, mainOf, overAny, real, seamOf, shares, STYLES, words } from "./spread-asks";
import { blocks, edgeOf, made, pieceOf, witnessLength } from "./style-asks";

/** Twice the area enclosed, by the shoelace; clockwise on the paper is positive. */
function shoelace(points: readonly (readonly [number, number])[]): number {
  return points.reduce((sum, [x, y], i) => {
    const [u, v] = points[(i + 1) % points.length]!;
    return sum + x * v - u * y;
  }, 0);
}

describe("each of these styles", () => {
  it("is offered in the product's order, with defaults between their bounds, on any block", () => {
    const order = recipes.map(({ id }) => id);
    expect(order).toEqual([...new Set(order)]);
    const wanted = ["plain", "gathered-head", "gathered-hem", "puff", "leg-of-mutton", "statement", "bishop"];
    expect(order.slice(0, 7)).toEqual(wanted);
    expect(order.slice(-3)).toEqual(["lantern", "cap", "tiered"]);
    fc.assert(
      fc.property(fc.constantFrom(...STYLES), blocks, (style, block) => {
        const { shown } = makeStyle({ style, block, values: {} });
        for (const { usual, low, high, key, does } of shown!) {
          expect(usual, key).toBeGreaterThanOrEqual(low - 1e-9);
          expect(usual, key).toBeLessThanOrEqual(high + 1e-9);
          expect(does).toMatch(/^[A-Z].+\.$/);
        }
      }),
    );
  });

  it("can be made with its defaults, all seams agreeing, on any block of a usual shape", () => {
    fc.assert(
      fc.property(fc.constantFrom(...STYLES), blocks, fc.boolean(), (style, block, hand) => {
        const lean = Math.abs(block.biceps - block.hem) / 2 / (block.length - block.capDepth!);
        fc.pre(lean < 0.3 && block.capDepth! > block.biceps * 0.25);
        const of = made(style, block, {}, hand ? EIGHTH : undefined);
        for (const { id, agrees } of of.parts.seams) expect(agrees, `${style} ${id}`).toBe(true);
      }),
      { numRuns: 150 },
    );
  });

  it("is closed, clockwise, and crosses itself nowhere (polygon-clipping, flatten-js)", () => {
    overAny(({ parts }, style) => {
      for (const { edges, id } of parts.pieces) {
        for (const [i, { curves }] of edges.entries()) {
          const [end, start] = [edges.at(i - 1)!.curves.at(-1)![3], curves[0]![0]];
          expect(Math.hypot(end.x - start.x, end.y - start.y), `${style} ${id}`).toBeLessThan(1e-6);
        }
        const points = edges
          .flatMap(({ curves }) => curves.flatMap((curve) => sample(curve, 16).slice(1)))
          .map(({ x, y }): [number, number] => [x, y]);
        const union = polygonClipping.union([points]);
        expect(
          union.map((rings) => rings.length),
          `${style} ${id}`,
        ).toEqual([1]);
        expect(shoelace(points)).toBeGreaterThan(0);
        expect(Math.abs(shoelace(union[0]![0]!)) / shoelace(points)).toBeCloseTo(1, 6);
        expect(new Polygon(points.map(([x, y]) => point(x, y))).isValid()).toBe(true);
      }
    });
  });

  it("has no corner in its head or its lower edge", () => {
    overAny((of, style) => {
      for (const piece of of.parts.pieces)
        for (const name of ["head", "foot"]) {
          const curves = piece.edges.find((edge) => edge.name === name)?.curves ?? [];
          for (const [i, [, , before, end]] of curves.slice(0, -1).entries()) {
            const [start, after] = curves[i + 1]!;
            const turn =
              Math.atan2(after.y - start.y, after.x - start.x) -
              Math.atan2(end.y - before.y, end.x - before.x);
            expect(Math.abs(Math.sin(turn)), `${style} ${name}`).toBeLessThan(1e-4);
          }
        }
    });
  });

  it("has seams equal within 0.01 mm, by another ruler too (svg-path-properties), and notches on their edges", () => {
    overAny(({ parts }, style) => {
      for (const { how, difference, id } of parts.seams)
        if (how === "equal") expect(Math.abs(difference), `${style} ${id}`).toBeLessThan(0.01);
      for (const piece of parts.pieces) {
        for (const { edge, at } of piece.notches) {
          expect(at).toBeGreaterThan(0);
          expect(at).toBeLessThan(witnessLength(edgeOf(piece, edge)));
        }
        if (!piece.edges.some(({ name }) => name === "underarmFront")) continue;
        const [front, back] = ["underarmFront", "underarmBack"].map((name) =>
          witnessLength(edgeOf(piece, name)),
        );
        expect(Math.abs(front! - back!)).toBeLessThan(0.01);
      }
    });
  });

  it("keeps the head below the notches to 1e-9 mm, and only moves it", () => {
    overAny((of, style) => {
      const { front, back } = of.figures.notches;
      const piece = mainOf(of);
      const at = (id: string) => piece.notches.find((notch) => notch.id === id)!.at;
      const head = edgeOf(piece, "head");
      const old = of.block.piece.edges.slice(0, 2).flatMap(({ curves }) => curves);
      const [length, before] = [chainLength(head), chainLength(old)];
      expect(Math.abs(at("front") - front), style).toBeLessThan(1e-9);
      expect(Math.abs(length - at("back") - back), style).toBeLessThan(1e-9);
      // What is only moved keeps the distance of any two of its points; those are found to 1e-9 mm along the seam.
      const points = (curves: typeof head, from: number, to: number) =>
        [0, 0.3, 0.6, 1].map((share) => pointAt(curves, from + (to - from) * share).point);
      for (const [here, there] of [
        [points(head, 0, front), points(old, 0, front)],
        [points(head, length - back, length), points(old, before - back, before)],
      ] as const)
        for (const [i, p] of here.entries())
          for (const [k, q] of here.entries())
            expect(
              Math.abs(
                Math.hypot(p.x - q.x, p.y - q.y) -
                  Math.hypot(there[i]!.x - there[k]!.x, there[i]!.y - there[k]!.y),
              ),
              style,
            ).toBeLessThan(1e-8);
    });
  });

  it("says the same on both sides of each gather, and what is in its seam is on its piece", () => {
    overAny((of, style) => {
      for (const { id, piece, edge, full, pulledTo } of of.parts.gathers) {
        expect(seamOf(of, id).lengths, `${style} ${id}`).toEqual([full, pulledTo]);
        const whole = pieceOf(of, piece);
        const drawn = witnessLength(edgeOf(whole, edge));
        const { front, back } = of.figures.notches;
        expect(Math.abs(full - (edge === "head" ? drawn - front - back : drawn))).toBeLessThan(0.05);
        expect(checkOf(of, `gather-${id}`)!.value).toBe(full);
      }
    });
  });

  it("has one distance a step, which its words give first", () => {
    overAny(({ parts }, style) => {
      expect(parts.steps.some(({ stage }) => stage === "sew")).toBe(true);
      for (const { distance, phrase, stage } of parts.steps) {
        expect(words(phrase), style).toMatch(/^[A-Z].*\.$/);
        expect(words(phrase), style).not.toMatch(/NaN|undefined|Infinity/);
        if (distance === undefined || stage === "sew") continue;
        expect(phrase.find((part) => typeof part !== "string")).toEqual({ mm: distance });
      }
    });
  });

  it("sets out only whole marks by hand: eighths, save what the tape checks and what is found with it", () => {
    overAny(
      ({ parts }, style, hand) => {
        if (!hand) return;
        for (const { act, distance, stage } of parts.steps) {
          if (distance === undefined || stage !== "draw" || act.act === "check" || "part" in act) continue;
          const marks = distance / EIGHTH;
          expect(Math.abs(marks - Math.round(marks)), `${style} ${act.act}`).toBeLessThan(1e-6);
        }
      },
      STYLES,
      60,
    );
  });

  it("refused, names one of its figures, what is so, and what would do", () => {
    const refused = new Set<string>();
    fc.assert(
      fc.property(fc.constantFrom(...STYLES), blocks, shares, (style, block, taken) => {
        const result = any(style, block, taken);
        if (result.ok) return;
        refused.add(style);
        const keys = result.shown!.map(({ key }) => key);
        for (const { figure, phrase, remedy } of result.problems) {
          expect(keys).toContain(figure);
          expect(words(phrase)).toMatch(/\.$/);
          expect(words(remedy)).toMatch(/^(Open|Make|Set|Type) /);
        }
      }),
      { numRuns: 800, seed: 3 },
    );
    expect([...refused].sort()).toEqual([...STYLES].sort());
  });

  it("what would do, does", () => {
    fc.assert(
      fc.property(fc.constantFrom("gathered-head", "gathered-hem", "bell"), blocks, (style, block) => {
        const key = style === "gathered-head" ? "headOpen" : "footOpen";
        const result = makeStyle({ style, block, values: { [key]: inches(4), slashes: 9 } });
        if (result.ok) return;
        const said = result.problems[0]!.remedy.find((part) => typeof part !== "string");
        // So short a sleeve that no such opening will do is told to slash fewer times.
        if (!said || typeof said === "string" || said.mm < inches(1 / 4)) return;
        expect(makeStyle({ style, block, values: { [key]: said.mm, slashes: 9 } }).ok).toBe(true);
      }),
      { numRuns: 100 },
    );
  });

  it("grows with the wearer: k times the figures, k times the sleeve", () => {
    fc.assert(
      fc.property(fc.constantFrom(...STYLES), blocks, real(1, 1.5), (style, block, k) => {
        const one = makeStyle({ style, block, values: {} });
        fc.pre(one.ok);
        if (!one.ok) return;
        const values = Object.fromEntries(
          one.shown.map(({ key, kind }) => [key, one.values[key]! * (kind === "length" ? k : 1)]),
        );
        const { length, biceps, hem, capDepth } = block;
        const larger = { length: length * k, biceps: biceps * k, hem: hem * k, capDepth: capDepth! * k };
        const other = makeStyle({ style, block: larger, values });
        // An upper bound may be a length that does not grow.
        fc.pre(other.ok);
        if (!other.ok) return;
        for (const piece of one.parts.pieces) {
          const grownPiece = pieceOf(other, piece.id);
          for (const { name, curves } of piece.edges) {
            const [small, large] = [witnessLength(curves), witnessLength(edgeOf(grownPiece, name))];
            expect(Math.abs(large - k * small), `${style} ${name}`).toBeLessThan(1e-5 * large);
          }
        }
      }),
      { numRuns: 80 },
    );
  });

  it("is the mirror of itself on a block with front and back changed over", () => {
    fc.assert(
      fc.property(fc.constantFrom(...STYLES), human, (style, f) => {
        const { length, biceps, hem, capDepth } = f;
        const base = { length, biceps, hem, capDepth };
        // Only the bishop's back hangs lower than its front by its own figure.
        const values: Record<string, number> = style === "bishop" ? { backDrop: 0 } : {};
        const one = makeStyle({ style, block: { ...base, frontMarks: f.front, backMarks: f.back }, values });
        const other = makeStyle({
          style,
          block: { ...base, frontMarks: f.back, backMarks: f.front },
          values,
        });
        expect(one.ok).toBe(other.ok);
        if (!one.ok || !other.ok) return;
        for (const [name, twin] of [
          ["head", "head"],
          ["foot", "foot"],
          ["underarmFront", "underarmBack"],
        ] as const) {
          const here = edgeOf(mainOf(one), name).flat();
          const there = edgeOf(mainOf(other), twin).flat().reverse();
          expect(here.length).toBe(there.length);
          for (const [i, { x, y }] of here.entries())
            expect(Math.hypot(x + there[i]!.x, y - there[i]!.y), `${style} ${name}`).toBeLessThan(1e-6);
        }
      }),
      { numRuns: 80 },
    );
  });
});
