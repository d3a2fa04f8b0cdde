/** The full styles in one piece and the lantern: gathered head, gathered hem, puff, bishop, bell, lantern. */
import { Polygon, point } from "@flatten-js/core";
import fc from "fast-check";
import polygonClipping from "polygon-clipping";
import { describe, expect, it } from "vitest";
import { makeStyle, pointAt, recipes, type Phrase, type SleeveAsk } from "@/lib/drafting";
import { chainLength } from "@/lib/drafting/measure";
import { human, inches, sample } from "./helpers";
import { blocks, edgeOf, made, type Made, pieceOf, witnessLength } from "./style-asks";

const STYLES = ["gathered-head", "gathered-hem", "puff", "bishop", "bell", "lantern"] as const;
/** Their heads are hinged at the slashes, and eased into the armhole. */
const HINGED = ["gathered-hem", "bishop", "bell", "lantern"] as const;
const BANDED = ["gathered-hem", "puff", "bishop"] as const;
const EIGHTH = inches(1 / 8);

const child: SleeveAsk = {
  length: inches(8),
  biceps: inches(12),
  hem: inches(11),
  capDepth: inches(6.25),
  armhole: { front: inches(8.6), back: inches(8.8) },
};
const grown: SleeveAsk = {
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

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const shares = fc.array(fc.option(real(0, 1), { nil: undefined, freq: 2 }), { minLength: 8, maxLength: 8 });

/** The style over the block with figures anywhere between their bounds; what is refused comes back as it is. */
function any(style: string, block: SleeveAsk, taken: readonly (number | undefined)[], step?: number) {
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

const overAny = (
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

const words = (phrase: Phrase) => phrase.map((part) => (typeof part === "string" ? part : "#")).join("");
const mainOf = (of: Made) => of.parts.pieces[0]!;
const seamOf = (of: Made, id: string) => of.parts.seams.find((seam) => seam.id === id)!;
const checkOf = (of: Made, id: string) => of.checks.find((check) => check.id === id);

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
      { numRuns: 300, seed: 3 },
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

describe("a hinged edge", () => {
  it("keeps its length: the head goes into the armhole as it did before, up to 1 mm more", () => {
    fc.assert(
      fc.property(fc.constantFrom(...HINGED), blocks, (style, block) => {
        fc.pre(block.capDepth! > block.biceps * 0.25);
        const result = makeStyle({ style, block, values: {} });
        if (!result.ok) return;
        const { difference, agrees } = seamOf(result, "head");
        expect(agrees).toBe(true);
        expect(difference).toBeLessThan(1);
      }),
    );
  });

  it("keeps its length: the lower edge of the gathered head within 2 %", () => {
    fc.assert(
      fc.property(blocks, (block) => {
        const result = makeStyle({ style: "gathered-head", block, values: {} });
        if (!result.ok) return;
        expect(Math.abs(witnessLength(edgeOf(mainOf(result), "foot")) / block.hem - 1)).toBeLessThan(0.02);
      }),
    );
  });
});

describe("the gathered head", () => {
  it("opens three times the puff wanted, the lower edge fixed (Vincent, Cutters’ Practical Guide, p. 27; seen in part)", () => {
    // Puff 1/2 in: spread 1 1/2 in, and the same raised at the crown.
    const of = made("gathered-head", grown, { slashes: 3, headOpen: inches(0.5) });
    expect(of.values.raise).toBeCloseTo(inches(0.5), 9);
    expect(checkOf(of, "puff")).toMatchObject({ verdict: "good", mark: "seen" });
    expect(checkOf(of, "puff")!.source).toMatch(/Vincent.*in part/);
    expect(witnessLength(edgeOf(mainOf(of), "foot"))).toBeCloseTo(grown.hem, 0);
  });

  it("raised far over a small opening stands in a point, and is told how high will do", () => {
    const values = { slashes: 3, headOpen: inches(0.5), raise: inches(2) };
    const check = checkOf(made("gathered-head", grown, values), "puff")!;
    expect(check.verdict).toBe("look");
    const said = check.remedy.find((part) => typeof part !== "string") as { mm: number };
    expect(said.mm).toBeCloseTo(inches(0.5), 9);
    expect(checkOf(made("gathered-head", grown, { ...values, raise: said.mm }), "puff")!.verdict).toBe(
      "good",
    );
  });

  it("is not judged by the ease of a head that is not gathered", () => {
    const ids = made("gathered-head", { ...grown, armhole: { front: 300, back: 300 } }).checks.map(
      ({ id }) => id,
    );
    for (const id of ["cap-front", "cap-back", "head-ease", "balance"]) expect(ids).not.toContain(id);
    expect(ids).toContain("gather-head");
  });

  it("gathers into exactly the armhole less the two stretches that go in flat", () => {
    const { gathers } = made("gathered-head", child).parts;
    // 17.4 in of armhole, 3 in at each side below the notches.
    expect(gathers[0]!.pulledTo).toBeCloseTo(inches(11.4), 9);
  });
});

describe("a band", () => {
  it.each(BANDED)("of the %s shortens the sleeve by its depth, and is cut double with a fold", (style) => {
    const of = made(style, grown);
    const band = of.parts.pieces[1]!;
    const depth = of.values.bandDepth!;
    expect(witnessLength(edgeOf(band, "left"))).toBeCloseTo(2 * depth, 3);
    expect(band.lines.find(({ kind }) => kind === "fold")!.curves[0]![0].y).toBeCloseTo(depth, 9);
    const across = of.parts.steps.find(({ act }) => act.act === "across")!;
    expect(across.distance).toBeCloseTo(grown.length - depth, 9);
  });

  it.each(BANDED)("of the %s too deep for the sleeve names its depth", (style) => {
    const short = { ...child, length: inches(6.25) + 24 };
    const bounds = makeStyle({ style, block: short, values: {} }).shown!.find(
      ({ key }) => key === "bandDepth",
    )!;
    expect(bounds.high).toBeLessThan(14);
    const result = makeStyle({ style, block: short, values: { bandDepth: inches(2) } });
    if (result.ok) throw new Error("expected a refusal");
    expect(result.problems[0]!.figure).toBe("bandDepth");
  });

  it("is as long as the hand by default on a long sleeve, and the arm with its ease on a short one", () => {
    expect(made("gathered-hem", grown).values.bandLength).toBe(190);
    const short = { ...grown, length: 220, hem: 330, elbowDepth: undefined };
    expect(made("puff", short).values.bandLength).toBeCloseTo(300 + inches(1), 9);
    expect(made("puff", { ...child, upperArm: undefined }).values.bandLength).toBeCloseTo(child.hem, 9);
  });

  it("shorter than the hand is wrong, unless it opens (Ingalls, Text-Book on Domestic Art; seen)", () => {
    const tight = { bandLength: 170 };
    const check = checkOf(made("gathered-hem", grown, tight), "band-hand")!;
    expect(check).toMatchObject({ verdict: "wrong", figure: "bandLength", low: 190, mark: "seen" });
    expect(words(check.remedy)).toMatch(/^Make the band # or longer, or give the sleeve an opening/);
    expect(checkOf(made("gathered-hem", { ...grown, opening: true }, tight), "band-hand")).toBeUndefined();
    expect(checkOf(made("bishop", grown, tight), "cuff-hand")).toBeUndefined();
    // By hand, to the eighth of an inch: a hand of 190 mm makes a band of 7 1/2 in.
    expect(checkOf(made("gathered-hem", grown, {}, EIGHTH), "band-hand")!.verdict).toBe("good");
  });

  it("longer than the edge that is gathered into it is seen in the walk", () => {
    const of = made("gathered-hem", grown, { bandLength: 700 });
    expect(seamOf(of, "foot").agrees).toBe(false);
    expect(checkOf(of, "gather-foot")!.verdict).toBe("wrong");
  });

  it("has gathers that the cloth takes by default, in each weight (recalled: 1.5, 2, 3)", () => {
    for (const style of BANDED)
      for (const cloth of ["fine", "medium", "heavy"] as const) {
        const result = makeStyle({ style, block: grown, values: {}, cloth });
        if (!result.ok) throw new Error(JSON.stringify(result.problems));
        const { verdict, phrase } = checkOf(result, "gather-foot")!;
        // A long sleeve is already wider than 1.3 cuffs: in heavy cloth even the least opening may be much.
        if (cloth !== "heavy") expect(verdict, `${style} ${cloth} ${JSON.stringify(phrase)}`).toBe("good");
      }
  });
});

describe("the bishop", () => {
  it("has a cuff as long as the hand and 3 in deep, and a placket of 3 in (Ingalls, Text-Book on Domestic Art; seen)", () => {
    const of = made("bishop", grown);
    expect(of.values).toMatchObject({ bandLength: 190, bandDepth: inches(3), placket: inches(3) });
    const cuff = pieceOf(of, "cuff");
    expect(witnessLength(edgeOf(cuff, "top"))).toBeCloseTo(190 + of.values.overlap!, 3);
    expect(witnessLength(edgeOf(cuff, "left"))).toBeCloseTo(inches(6), 3);
    // What is gathered goes into the cuff without its overlap.
    expect(of.parts.gathers[0]!.pulledTo).toBe(190);
    expect(cuff.notches.find(({ id }) => id === "overlap")!.at).toBe(190);
  });

  it("has its placket in the back half, on the grain, inside the sleeve", () => {
    fc.assert(
      fc.property(blocks, (block) => {
        const result = makeStyle({ style: "bishop", block, values: {} });
        if (!result.ok) return;
        const piece = pieceOf(result, "sleeve");
        const [from, , , to] = piece.lines[0]!.curves[0]!;
        expect(from.x).toBeCloseTo(to.x, 9);
        expect(from.x).toBeGreaterThan(0);
        const ring = piece.edges.flatMap(({ curves }) =>
          curves.flatMap((curve) => sample(curve, 16).slice(1)),
        );
        expect(new Polygon(ring.map(({ x, y }) => point(x, y))).contains(point(to.x, to.y + 1e-3))).toBe(
          true,
        );
      }),
    );
  });

  it("hangs lower at the middle of the back than of the front, by its figure", () => {
    // Seven panels: marks at the same places of both halves are set off alike save for the figure.
    const of = made("bishop", grown, { slashes: 7, drop: inches(1), backDrop: inches(0.75) });
    const set = of.parts.steps.flatMap(({ act, distance }) =>
      act.act === "set" && act.way === "down" ? act.from.map((from) => ({ from, distance: distance! })) : [],
    );
    const by = (panel: number) =>
      set.find(({ from }) => "panel" in from && from.panel === panel)?.distance ?? 0;
    // Panels 1 and 6 lie at 5/8 of either half, where the swell of the figure is 3/4 of the way down: sin² 67.5°.
    expect(by(6) - by(1)).toBeCloseTo(inches(0.75) * Math.sin((Math.PI * 3) / 8) ** 2, 6);
    expect(by(5)).toBeGreaterThan(by(2));
  });
});

describe("the bell", () => {
  it("is gathered nowhere, and its lower edge leaves both underarm seams square", () => {
    overAny(
      (of) => {
        expect(of.parts.gathers).toEqual([]);
        const piece = mainOf(of);
        const foot = edgeOf(piece, "foot");
        const across = ([a, b, c, d]: (typeof foot)[number], end: boolean) =>
          end ? { x: d.x - c.x, y: d.y - c.y } : { x: b.x - a.x, y: b.y - a.y };
        const pairs = [
          [across(edgeOf(piece, "underarmBack").at(-1)!, true), across(foot[0]!, false)],
          [across(foot.at(-1)!, true), across(edgeOf(piece, "underarmFront")[0]!, false)],
        ] as const;
        for (const [u, v] of pairs)
          expect((u.x * v.x + u.y * v.y) / Math.hypot(u.x, u.y) / Math.hypot(v.x, v.y)).toBeCloseTo(0, 6);
      },
      ["bell"],
    );
  });

  it("turned by t, opens 2 r sin(t/2) at the foot of each slash (exact)", () => {
    const of = made("bell", grown, { slashes: 3, footOpen: 50 });
    const { panels } = pieceOf(of, "sleeve");
    expect(panels).toHaveLength(4);
    for (const [i, panel] of panels.slice(0, -1).entries()) {
      const lip = panel.edges.filter(({ name }) => name === "slash")[0]!.curves[0]!;
      const next = panels[i + 1]!.edges.filter(({ name }) => name === "slash").at(-1)!.curves[0]!;
      const [head, foot, foot2, head2] = [lip[0], lip[3], next[0], next[3]];
      expect(Math.hypot(head.x - head2.x, head.y - head2.y)).toBeLessThan(1e-6);
      const r = Math.hypot(foot.x - head.x, foot.y - head.y);
      const t = Math.atan2(foot.y - head.y, foot.x - head.x) - Math.atan2(foot2.y - head.y, foot2.x - head.x);
      expect(2 * r * Math.sin(Math.abs(t) / 2)).toBeCloseTo(50, 6);
    }
  });

  it("takes a narrow hem, for its edge is a curve (common practice, no source)", () => {
    const of = made("bell", child);
    expect(mainOf(of).allowances.foot).toBe(inches(0.5));
    expect(of.parts.steps.find(({ act }) => act.act === "allow")!.distance).toBe(inches(0.5));
  });
});

describe("the lantern", () => {
  it("has both edges along the joint equal within 0.01 mm, by another ruler (svg-path-properties)", () => {
    overAny(
      (of) => {
        const upper = witnessLength(edgeOf(pieceOf(of, "upper"), "foot"));
        const lower = witnessLength(edgeOf(pieceOf(of, "lower"), "head"));
        expect(Math.abs(upper - lower)).toBeLessThan(0.01);
      },
      ["lantern"],
      150,
    );
  });

  it("is as long as the block down the centre, widest at the joint, and keeps its hem within 4 %", () => {
    const of = made("lantern", grown);
    const joint = seamOf(of, "joint").lengths[0];
    expect(joint).toBeGreaterThan(grown.biceps + 6 * of.values.footOpen! * 0.9);
    const hem = witnessLength(edgeOf(pieceOf(of, "lower"), "foot"));
    expect(Math.abs(hem / grown.hem - 1)).toBeLessThan(0.04);
    expect(joint).toBeGreaterThan(hem * 1.5);
    const depth = (id: string, from: string, to: string) => {
      const middle = (name: string) =>
        edgeOf(pieceOf(of, id), name)
          .flatMap((curve) => sample(curve, 200))
          .reduce((a, b) => (Math.abs(a.x) < Math.abs(b.x) ? a : b)).y;
      return middle(to) - middle(from);
    };
    expect(depth("upper", "head", "foot") + depth("lower", "head", "foot")).toBeCloseTo(grown.length, 0);
  });

  it("checks the hem as it is drawn against the hand (Ingalls, Text-Book on Domestic Art; seen)", () => {
    expect(checkOf(made("lantern", grown), "hem-hand")).toMatchObject({ verdict: "good", mark: "seen" });
    const of = made("lantern", { ...grown, hem: 180 });
    const check = checkOf(of, "hem-hand")!;
    expect(check.verdict).toBe("wrong");
    const said = check.remedy.find((part) => typeof part !== "string") as { mm: number };
    expect(checkOf(made("lantern", { ...grown, hem: said.mm + 1 }), "hem-hand")!.verdict).toBe("good");
  });

  it("names the opening where the part below is too short to be drawn in so sharply", () => {
    const result = makeStyle({
      style: "lantern",
      block: child,
      values: { widestAt: inches(7.25), footOpen: inches(1.25) },
    });
    if (result.ok) throw new Error("expected a refusal");
    expect(result.problems[0]).toMatchObject({ id: "lower-part-too-short", figure: "footOpen" });
  });
});
