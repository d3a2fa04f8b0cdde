/** The styles that are cut and joined, not spread: plain, cap, petal, flounced, tiered. */
import fc from "fast-check";
import polygonClipping from "polygon-clipping";
import { describe, expect, it } from "vitest";
import { INCH, makeStyle, recipes, type Phrase, type Point, type SleeveAsk } from "@/lib/drafting";
import { curvature, human, inches, sample } from "./helpers";
import { blocks, edgeOf, made, type Made, pieceOf, witnessLength } from "./style-asks";

const STYLES = ["plain", "cap", "petal", "flounced", "tiered"] as const;
const EIGHTH = inches(1 / 8);

/** The child's block of the hand practice, with its armhole. */
const child: SleeveAsk = {
  length: inches(8),
  biceps: inches(12),
  hem: inches(11),
  capDepth: inches(6.25),
  armhole: { front: inches(8.6), back: inches(8.8) },
};
const grown: SleeveAsk = { length: 590, biceps: 360, hem: 220, capDepth: 140 };

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** For each figure either its default, or so far between its bounds. */
const shares = fc.array(fc.option(real(0, 1), { nil: undefined, freq: 2 }), { minLength: 6, maxLength: 6 });

/** The style over the block with figures anywhere between their bounds; what is refused comes back as it is. */
function any(style: string, block: SleeveAsk, taken: readonly (number | undefined)[], step?: number) {
  const start = makeStyle({ style, block, values: {} }, step);
  const shown = start.shown ?? [];
  const values: Record<string, number> = {};
  for (const [i, { key, kind, low, high }] of shown.entries()) {
    const share = taken[i];
    if (share === undefined) continue;
    const value = low + (high - low) * share;
    values[key] = kind === "count" ? Math.round(value) : value;
  }
  return { result: makeStyle({ style, block, values }, step), values };
}

const overAny = (
  check: (of: Made, style: string) => void,
  styles: readonly string[] = STYLES,
  numRuns = 80,
) =>
  fc.assert(
    fc.property(fc.constantFrom(...styles), blocks, shares, fc.boolean(), (style, block, taken, hand) => {
      const { result } = any(style, block, taken, hand ? EIGHTH : undefined);
      if (result.ok) check(result, style);
    }),
    { numRuns },
  );

const words = (phrase: Phrase) => phrase.map((part) => (typeof part === "string" ? part : "#")).join("");

describe("each of these styles", () => {
  it("is offered, with figures whose defaults lie within their bounds, on any block", () => {
    fc.assert(
      fc.property(fc.constantFrom(...STYLES), blocks, (style, block) => {
        expect(recipes.some(({ id }) => id === style)).toBe(true);
        const { shown } = makeStyle({ style, block, values: {} });
        for (const { usual, low, high, key } of shown!) {
          expect(usual, key).toBeGreaterThanOrEqual(low - 1e-9);
          expect(usual, key).toBeLessThanOrEqual(high + 1e-9);
        }
      }),
    );
  });

  it("can be made with its defaults on any block whose underarm seams do not lie nearly level", () => {
    fc.assert(
      fc.property(fc.constantFrom(...STYLES), blocks, fc.boolean(), (style, block, hand) => {
        const lean = Math.abs(block.biceps - block.hem) / 2 / (block.length - block.capDepth!);
        fc.pre(lean < 0.3);
        const result = makeStyle({ style, block, values: {} }, hand ? EIGHTH : undefined);
        expect(result.ok ? [] : result.problems).toEqual([]);
      }),
      { numRuns: 200 },
    );
  });

  it("says what is in the way and what would do, and names one of its figures or the block's", () => {
    let refused = 0;
    fc.assert(
      fc.property(fc.constantFrom(...STYLES), blocks, shares, (style, block, taken) => {
        const { result } = any(style, block, taken);
        if (result.ok) return;
        refused += 1;
        const keys = [...(result.shown ?? []).map(({ key }) => key), "hem"];
        for (const { figure, phrase, remedy } of result.problems) {
          expect(keys).toContain(figure);
          expect(words(phrase)).toMatch(/\.$/);
          expect(words(remedy)).toMatch(/^(Make|Let|Bring|Take|Type)/);
        }
      }),
      { numRuns: 200, seed: 7 },
    );
    expect(refused).toBeGreaterThan(0);
  });

  it("has pieces that are closed, run clockwise and cross themselves nowhere (polygon-clipping)", () => {
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
        // Nothing is lost or counted twice.
        expect(Math.abs(shoelace(union[0]![0]!)) / shoelace(points)).toBeCloseTo(1, 6);
      }
    });
  });

  it("has seams that are equal within 0.01 mm, and notches that lie on their edges", () => {
    overAny(({ parts }, style) => {
      for (const { how, difference, id, agrees } of parts.seams) {
        expect(agrees, `${style} ${id}`).toBe(true);
        if (how === "equal") expect(Math.abs(difference), `${style} ${id}`).toBeLessThan(0.01);
      }
      for (const piece of parts.pieces)
        for (const { edge, at } of piece.notches) {
          expect(at).toBeGreaterThan(0);
          expect(at).toBeLessThan(witnessLength(edgeOf(piece, edge)) + 1e-3);
        }
    });
  });

  it("keeps the head of the block to the last digit where it is set in as drafted", () => {
    overAny(
      (of) => {
        const head = edgeOf(of.parts.pieces[0]!, "head");
        const block = of.block.piece.edges.slice(0, 2).flatMap(({ curves }) => [...curves]);
        expect(head).toEqual(block);
      },
      ["plain", "flounced", "tiered"],
    );
  });

  it("has one distance a step, which its words give first", () => {
    overAny(({ parts }, style) => {
      for (const { distance, phrase, stage } of parts.steps) {
        expect(words(phrase), style).not.toMatch(/NaN|undefined|Infinity/);
        if (distance === undefined || stage === "sew") continue;
        const first = phrase.find((part) => typeof part !== "string");
        expect(first).toEqual({ mm: distance });
      }
    });
  });

  it("grows with its block and its lengths", () => {
    fc.assert(
      fc.property(fc.constantFrom(...STYLES), blocks, real(1, 1.6), (style, block, k) => {
        const one = makeStyle({ style, block, values: {}, clothWidth: 1e5 });
        fc.pre(one.ok);
        if (!one.ok) return;
        const values = Object.fromEntries(
          one.shown.map(({ key, kind }) => [key, one.values[key]! * (kind === "length" ? k : 1)]),
        );
        const { length, biceps, hem, capDepth } = block;
        const larger = { length: length * k, biceps: biceps * k, hem: hem * k, capDepth: capDepth! * k };
        const other = makeStyle({ style, block: larger, values, clothWidth: 1e5 });
        // A figure's upper bound may be a length that does not grow.
        fc.pre(other.ok);
        if (!other.ok) return;
        for (const piece of one.parts.pieces) {
          const grownPiece = other.parts.pieces.find(({ id }) => id === piece.id)!;
          // A flounce in fewer parts, where the gap for its allowances matters less.
          if (grownPiece.cut.count !== piece.cut.count) continue;
          for (const { name, curves } of piece.edges)
            expect(witnessLength(edgeOf(grownPiece, name)) / witnessLength(curves)).toBeCloseTo(k, 5);
        }
      }),
      { numRuns: 60 },
    );
  });
});

describe("the cap sleeve", () => {
  it("ends so far from the underarm, is so deep, and its lower edge turns one way without a corner", () => {
    overAny(
      (of) => {
        const piece = pieceOf(of, "cap");
        const foot = edgeOf(piece, "foot");
        expect(foot).toHaveLength(2);
        const centre = foot[0]![3];
        expect(centre.x).toBeCloseTo(0, 9);
        // Level where the halves meet.
        expect(foot[0]![2].y).toBeCloseTo(centre.y, 9);
        expect(foot[1]![1].y).toBeCloseTo(centre.y, 9);
        const bends = foot.flatMap((curve) => [0.02, 0.25, 0.5, 0.75, 0.98].map((t) => curvature(curve, t)));
        // Straight within the 1/16 in that a rounded depth may fall short by, or a bow downwards.
        const wide = Math.abs(foot[0]![0].x);
        for (const bend of bends) expect(bend).toBeGreaterThan((-8 * 1.6 * 2) / wide ** 2);
        const cap = of.block.lengths.cap;
        const left = witnessLength(edgeOf(piece, "head"));
        const hand = of.parts.steps.find(({ act }) => act.act === "seam-marks")!;
        expect(left).toBeCloseTo(cap - 2 * hand.distance!, 3);
      },
      ["cap"],
    );
  });

  it("is cut four times: sleeves and their facings", () => {
    expect(pieceOf(made("cap", child), "cap").cut).toEqual({ count: 4, mirrored: true });
  });

  it.each([
    ["too shallow", 60, 0],
    ["too deep", 200, 0],
  ])("%s says which depth would do, and that depth does", (_, depth) => {
    const result = makeStyle({ style: "cap", block: child, values: { ends: inches(3), depth } });
    if (result.ok) throw new Error("expected a refusal");
    expect(result.problems.map(({ figure }) => figure)).toEqual(["depth"]);
    const [said] = lengths(result.problems[0]!.remedy);
    // As a hand would type it, to the nearest eighth.
    const typed = Math.round(said! / EIGHTH) * EIGHTH;
    made("cap", child, { ends: inches(3), depth: typed });
  });

  it("is not judged by a hem and an underarm seam that it has not got", () => {
    const of = made("cap", { ...child, hand: inches(19), upperArm: inches(14) });
    const ids = of.checks.map(({ id }) => id);
    for (const gone of ["hem-hand", "hem-arm", "biceps-ease", "underarms"]) expect(ids).not.toContain(gone);
    expect(ids).toContain("head-ease");
  });

  it("comes out of its printed steps: another hand's curve through the marks is as long within 1/16 in", () => {
    for (const block of [child, grown]) {
      const of = made("cap", block, {}, EIGHTH);
      const [ends, depth] = ["seam-marks", "centre-mark"].map(
        (act) => printed(of.parts.steps.find((step) => step.act.act === act)!.phrase)[0]!,
      );
      const seam = of.block.piece.edges.slice(0, 2).flatMap(({ curves }) => [...curves]);
      const front = walkAlong(seam, ends!);
      const back = walkAlong(seam, of.block.lengths.cap - ends!);
      const centre = { x: 0, y: depth! };
      // Circles that are level at the centre.
      const length = levelArc(front, centre) + levelArc(back, centre);
      const drawn = witnessLength(edgeOf(pieceOf(of, "cap"), "foot"));
      expect(Math.abs(length - drawn)).toBeLessThan(inches(1 / 16));
    }
  });
});

describe("the petal sleeve", () => {
  it("crosses at the mark, meets the underarm seams square, and has no hollow and no corner in its edges", () => {
    overAny(
      (of) => {
        const crossing = of.parts.steps.find(({ act }) => act.act === "centre-mark")!.distance!;
        for (const [id, seam] of [
          ["front", "underarmFront"],
          ["back", "underarmBack"],
        ] as const) {
          const piece = pieceOf(of, id);
          const free = edgeOf(piece, "petal");
          expect(free).toHaveLength(2);
          expect(free[0]![3].x).toBeCloseTo(0, 9);
          expect(free[0]![3].y).toBeCloseTo(crossing, 9);
          const low = edgeOf(piece, seam);
          const [c, d] = id === "front" ? [free[1]![2], free[1]![3]] : [free[0]![1], free[0]![0]];
          const [e, f] = id === "front" ? [low[0]![0], low[0]![1]] : [low.at(-1)![3], low.at(-1)![2]];
          const dot = (d.x - c.x) * (f.x - e.x) + (d.y - c.y) * (f.y - e.y);
          const size = Math.hypot(d.x - c.x, d.y - c.y) * Math.hypot(f.x - e.x, f.y - e.y);
          expect(dot / size).toBeCloseTo(0, 6);
          for (const curve of free)
            for (const t of [0, 0.25, 0.5, 0.75, 1]) {
              // Clockwise on the paper a bow outwards bends to the right.
              expect(curvature(curve, t)).toBeGreaterThan(-1e-6);
              // No tighter than 1 in on 12 in: a corner.
              const head = of.block.piece.edges[0]!.curves[0]![0];
              expect(
                1 / curvature(curve, t) > (2 * Math.abs(head.x)) / 12 - 1e-6 || curvature(curve, t) < 1e-6,
              ).toBe(true);
            }
        }
      },
      ["petal"],
      150,
    );
  });

  it("laid over each other the two heads are the block's cap seam, point for point", () => {
    const of = made("petal", child);
    const overlap = of.values.overlap!;
    const [front, back] = [edgeOf(pieceOf(of, "front"), "head"), edgeOf(pieceOf(of, "back"), "head")];
    const { cap } = of.block.lengths;
    expect(witnessLength(front) + witnessLength(back) - 2 * overlap).toBeCloseTo(cap, 3);
    const seam = of.block.piece.edges.slice(0, 2).flatMap(({ curves }) => [...curves]);
    for (const share of [0.1, 0.3, 0.5]) {
      expect(gap(walkAlong(front, share * cap), walkAlong(seam, share * cap))).toBeLessThan(1e-3);
      const start = cap - witnessLength(back);
      expect(
        gap(walkAlong(back, (1 - share) * cap - start), walkAlong(seam, (1 - share) * cap)),
      ).toBeLessThan(1e-3);
    }
    // Below the notches nothing is touched.
    expect(front[0]).toEqual(seam[0]);
    expect(back.at(-1)).toEqual(seam.at(-1));
  });

  it("is the mirror of itself on a block with front and back changed over", () => {
    fc.assert(
      fc.property(human, (f) => {
        const { length, biceps, hem, capDepth } = f;
        const base = { length, biceps, hem, capDepth };
        const one = makeStyle({
          style: "petal",
          block: { ...base, frontMarks: f.front, backMarks: f.back },
          values: {},
        });
        const other = makeStyle({
          style: "petal",
          block: { ...base, frontMarks: f.back, backMarks: f.front },
          values: {},
        });
        expect(one.ok).toBe(other.ok);
        if (!one.ok || !other.ok) return;
        const front = edgeOf(pieceOf(one, "front"), "petal").flat();
        const back = edgeOf(pieceOf(other, "back"), "petal").flat().reverse();
        for (const [i, { x, y }] of front.entries()) expect(gap({ x: -x, y }, back[i]!)).toBeLessThan(1e-6);
      }),
      { numRuns: 60 },
    );
  });

  it.each([
    ["hollow", 60],
    ["cornered", 190],
  ])("%s says where the petals may cross, and both ends of that will do", (_, crossing) => {
    const result = makeStyle({ style: "petal", block: child, values: { crossing } });
    if (result.ok) throw new Error("expected a refusal");
    expect(result.problems[0]!.figure).toBe("crossing");
    for (const said of lengths(result.problems[0]!.remedy))
      made("petal", child, { crossing: Math.round(said / EIGHTH) * EIGHTH });
  });

  it("names the hem where the underarm seams lean too far", () => {
    const result = makeStyle({ style: "petal", block: { ...child, hem: inches(5) }, values: {} });
    expect(result.ok ? [] : result.problems.map(({ figure }) => figure)).toEqual(["hem"]);
  });
});

describe("the flounced sleeve", () => {
  it("has a flounce whose inner edges together are the lower edge of the sleeve (svg-path-properties)", () => {
    overAny(
      (of) => {
        const [sleeve, flounce] = [pieceOf(of, "sleeve"), pieceOf(of, "flounce")];
        const parts = flounce.cut.count / 2;
        const inner = parts * witnessLength(edgeOf(flounce, "inner"));
        expect(Math.abs(inner - witnessLength(edgeOf(sleeve, "foot")))).toBeLessThan(0.01);
        // An inch between the ends for their allowances, and no arc too tight to sew.
        const [left, right] = [edgeOf(flounce, "inner")[0]![0], edgeOf(flounce, "inner").at(-1)![3]];
        const radius = Math.hypot(left.x, left.y);
        expect(radius).toBeGreaterThan(inches(1) - EIGHTH / 2 - 1e-6);
        expect(2 * Math.PI * radius - inner / parts).toBeGreaterThan(inches(1) - 1e-3);
        expect(Math.abs(left.x + right.x)).toBeLessThan(1e-6);
      },
      ["flounced"],
    );
  });

  it("has the fullness that was asked, as long as nothing is rounded", () => {
    fc.assert(
      fc.property(blocks, real(1.1, 3), (block, fullness) => {
        const result = makeStyle({ style: "flounced", block, values: { fullness, depth: 80 } });
        fc.pre(result.ok);
        if (!result.ok) return;
        const flounce = pieceOf(result, "flounce");
        const ratio = witnessLength(edgeOf(flounce, "outer")) / witnessLength(edgeOf(flounce, "inner"));
        expect(ratio).toBeCloseTo(fullness, 4);
      }),
    );
  });

  it("is rebuilt from its printed steps alone: two arcs and an end", () => {
    for (const [block, values] of [
      [child, {}],
      [child, { fullness: 3.2 }],
      [grown, { depth: inches(6), fullness: 2.4 }],
    ] as const) {
      const of = made("flounced", block, values, EIGHTH);
      const [radius, depth, along] = ["inner", "outer", "end"].map(
        (part) =>
          printed(of.parts.steps.find(({ act }) => act.act === "ring" && act.part === part)!.phrase)[0]!,
      );
      const turn = along! / radius!;
      const flounce = pieceOf(of, "flounce");
      const [inner, outer] = [edgeOf(flounce, "inner"), edgeOf(flounce, "outer")];
      // Radius and depth are marks: the same to the last digit. The tape along the arc is read to the nearest mark.
      expect(Math.hypot(inner[0]![0].x, inner[0]![0].y)).toBeCloseTo(radius!, 9);
      expect(Math.hypot(outer[0]![0].x, outer[0]![0].y)).toBeCloseTo(radius! + depth!, 9);
      const chord = (r: number) => 2 * r * Math.sin(turn / 2);
      const drawn = gap(inner[0]![0], inner.at(-1)![3]);
      expect(Math.abs(chord(radius!) - drawn)).toBeLessThan(EIGHTH / 2);
      expect(Math.abs(witnessLength(outer) - (radius! + depth!) * turn)).toBeLessThan(
        ((EIGHTH / 2) * (radius! + depth!)) / radius!,
      );
    }
  });

  it("too tight to sew names its fullness, and both ways out of it work", () => {
    const result = makeStyle({ style: "flounced", block: child, values: { fullness: 6, depth: inches(2) } });
    if (result.ok) throw new Error("expected a refusal");
    const [{ figure, remedy }] = result.problems as [(typeof result.problems)[number]];
    expect(figure).toBe("fullness");
    const most = Number(/fullness ([\d.]+)/.exec(words(remedy))![1]);
    made("flounced", child, { fullness: most, depth: inches(2) });
    made("flounced", child, { fullness: 6, depth: lengths(remedy)[0]! });
  });

  it("is cut in more parts on narrow cloth, and refused where none would lie on it", () => {
    const cut = (clothWidth: number) => {
      const result = makeStyle({
        style: "flounced",
        block: child,
        values: { depth: inches(5), fullness: 2 },
        clothWidth,
      });
      return result.ok ? pieceOf(result, "flounce").cut.count / 2 : result.problems[0]!.figure;
    };
    expect(cut(1143)).toBe(1);
    expect(cut(200)).toBeGreaterThan(1);
    expect(cut(60)).toBe("depth");
  });

  it("is checked where it runs closed round the arm, not at the block's hem", () => {
    const of = made("flounced", { ...child, hand: inches(11.7) }, { joinAt: inches(7) });
    expect(of.checks.map(({ id }) => id)).not.toContain("hem-hand");
    // 11 4/7 in there: the hem and biceps line are 11 and 12 in, 7 in down lies 3/7 of the way between them.
    const check = of.checks.find(({ id }) => id === "round-hand")!;
    expect(check.value).toBeCloseTo(inches(12 - 3 / 7), 6);
    expect(check.verdict).toBe("wrong");
  });
});

describe("the tiered sleeve", () => {
  it("gathers each tier into the edge above it, and both sides of each say the same", () => {
    overAny(
      (of) => {
        let above = witnessLength(edgeOf(pieceOf(of, "upper"), "foot"));
        expect(of.parts.gathers).toHaveLength(of.values.tiers!);
        for (const { piece: id, edge, full, pulledTo } of of.parts.gathers) {
          const piece = pieceOf(of, id);
          const total = (piece.cut.count / 2) * witnessLength(edgeOf(piece, edge));
          expect(total).toBeCloseTo(full, 3);
          expect(pulledTo).toBeCloseTo(above, 3);
          // Half a mark for each part at the most.
          expect(Math.abs(full - of.values.fullness! * pulledTo)).toBeLessThanOrEqual(
            (EIGHTH / 2) * (piece.cut.count / 2) + 1e-6,
          );
          const walked = of.parts.seams.find(({ id: seam }) => seam === id)!;
          expect(walked.lengths[0]).toBeCloseTo(full, 6);
          expect(walked.lengths[1]).toBeCloseTo(pulledTo, 6);
          // A part and its two seams of 1/2 in lie within the cloth's 45 in.
          expect(witnessLength(edgeOf(piece, "top"))).toBeLessThanOrEqual(inches(44) + 1e-3);
          above = total;
        }
      },
      ["tiered"],
    );
  });

  it("is rebuilt from its printed steps alone: so many strips of such a length and depth", () => {
    const of = made("tiered", child, { tiers: 4, fullness: 1.8, deepen: inches(0.5) }, EIGHTH);
    const strips = of.parts.steps.filter(({ act }) => act.act === "strip");
    expect(strips).toHaveLength(4);
    for (const { act, phrase } of strips) {
      const piece = pieceOf(of, act.act === "strip" ? act.piece : "");
      const [length, depth] = printed(phrase);
      expect(witnessLength(edgeOf(piece, "top"))).toBeCloseTo(length!, 6);
      expect(witnessLength(edgeOf(piece, "left"))).toBeCloseTo(depth!, 6);
      expect(Number(/cut (\d+) strips/.exec(words(phrase))![1])).toBe(piece.cut.count);
    }
    // The last of them is longer than the cloth is wide.
    expect(pieceOf(of, "tier-4").cut.count).toBeGreaterThan(2);
  });

  it("holds each gather against the weight of the cloth (recalled: heavy 1.5, medium 2, sheer 3)", () => {
    const verdict = (cloth: "fine" | "medium" | "heavy", fullness: number) => {
      const result = makeStyle({ style: "tiered", block: child, values: { fullness }, cloth });
      if (!result.ok) throw new Error("expected pieces");
      return result.checks.find(({ id }) => id === "gather-tier-1")!.verdict;
    };
    expect(verdict("heavy", 1.5)).toBe("good");
    expect(verdict("heavy", 2)).toBe("look");
    expect(verdict("medium", 2)).toBe("good");
    expect(verdict("medium", 3)).toBe("look");
    expect(verdict("fine", 3)).toBe("good");
  });

  it("reaches down to the block's hem by default, however many tiers", () => {
    for (const tiers of [2, 3, 4]) {
      const check = made("tiered", grown, { tiers }).checks.find(({ id }) => id === "reach")!;
      expect(check.value).toBeCloseTo(grown.length, 6);
      expect(check.verdict).toBe("good");
    }
    const long = made("tiered", grown, { tiers: 4, tierDepth: 200 });
    expect(long.checks.find(({ id }) => id === "reach")!.verdict).toBe("look");
  });

  it("names the width of the cloth where no strip can be cut from it", () => {
    const result = makeStyle({ style: "tiered", block: child, values: {}, clothWidth: 60 });
    expect(result.ok ? [] : result.problems.map(({ figure }) => figure)).toEqual(["clothWidth"]);
  });
});

describe("the plain sleeve", () => {
  it("is the block with its hem turned up, and refuses a hem out of bounds by its name", () => {
    const of = made("plain", child, { hemDepth: inches(1) });
    const sleeve = pieceOf(of, "sleeve");
    expect(sleeve.allowances).toEqual({ foot: inches(1) });
    expect(edgeOf(sleeve, "foot")).toEqual(edgeOf(of.block.piece, "hem"));
    const result = makeStyle({ style: "plain", block: child, values: { hemDepth: inches(9) } });
    expect(result.ok ? [] : result.problems.map(({ figure }) => figure)).toEqual(["hemDepth"]);
  });
});

/** The lengths of a sheet in eighths, as they stand in its words. */
function printed(phrase: Phrase): number[] {
  return lengths(phrase).map((mm) => (Math.round((mm / INCH) * 8) / 8) * INCH);
}

function lengths(phrase: Phrase): number[] {
  return phrase.flatMap((part) => (typeof part === "string" ? [] : [part.mm]));
}

const gap = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y);

/** The point so far along a chain, by a fine polyline: good to about 1e-4 mm. */
function walkAlong(curves: Parameters<typeof witnessLength>[0], at: number): Point {
  let left = at;
  for (const curve of curves) {
    const points = sample(curve, 2000);
    for (let i = 1; i < points.length; i++) {
      const step = gap(points[i - 1]!, points[i]!);
      if (left <= step) {
        const t = left / step;
        const [a, b] = [points[i - 1]!, points[i]!];
        return { x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t };
      }
      left -= step;
    }
  }
  return curves.at(-1)![3];
}

/** The arc of a circle from a point to the centre line, level there. */
function levelArc(end: Point, centre: Point): number {
  const chord = gap(end, centre);
  const angle = Math.atan2(Math.abs(centre.y - end.y), Math.abs(end.x - centre.x));
  return angle < 1e-9 ? chord : (chord * angle) / Math.sin(angle);
}

function shoelace(points: readonly (readonly [number, number])[]): number {
  return points.reduce((sum, [x, y], i) => {
    const [u, v] = points[(i + 1) % points.length]!;
    return sum + (x * v - u * y) / 2;
  }, 0);
}
