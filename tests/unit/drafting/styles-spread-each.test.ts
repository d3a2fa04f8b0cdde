/** The full styles one by one: gathered head, gathered hem, puff, bishop, bell, lantern. */
import { Polygon, point } from "@flatten-js/core";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { makeStyle } from "@/lib/drafting";
import { inches, sample } from "./helpers";
import { BANDED, checkOf, child, EIGHTH, grown, HINGED, mainOf, overAny, seamOf, words } from "./spread-asks";
import { blocks, edgeOf, made, pieceOf, witnessLength } from "./style-asks";

describe("a hinged edge", () => {
  it("keeps its length: the head goes into the armhole as it did before, up to 1 mm more", () => {
    fc.assert(
      fc.property(fc.constantFrom(...HINGED), blocks, (style, block) => {
        const lean = Math.abs(block.biceps - block.hem) / 2 / (block.length - block.capDepth!);
        fc.pre(lean < 0.3 && block.capDepth! > block.biceps * 0.25);
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
