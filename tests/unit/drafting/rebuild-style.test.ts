/**
 * A statement sleeve and a leg-of-mutton drawn by a script that stands in for the hand: it reads the printed steps, rounded
 * to eighths, and nothing else; what it draws is laid on what was drafted.
 */
import {
  applyToPoint,
  compose,
  identity,
  inverse,
  type Matrix,
  rotate,
  translate,
} from "transformation-matrix";
import { describe, expect, it } from "vitest";
import { markSteps, type PatternPiece, type Point, type SleeveAsk, type StyleStep } from "@/lib/drafting";
import { EIGHTH, handCurve, print, read, redraw, tape, tapeAt } from "./hand";
import { inches, sample, value } from "./helpers";
import { edgeOf, made, type Made, pieceOf } from "./style-asks";

const child: SleeveAsk = { length: inches(8), biceps: inches(12), hem: inches(11), capDepth: inches(6.25) };
const woman: SleeveAsk = { length: 590, biceps: 350, hem: 230, capDepth: 140, elbowDepth: 335 };

type Act = StyleStep["act"];
type ActOf<K extends Act["act"]> = Extract<Act, { act: K }>;

/** The paper after the block's own steps: the whole cap seam from the front underarm point to the back one. */
function blockOnPaper(of: Made) {
  const steps = value(markSteps(of.figures));
  const { at, curves } = redraw(steps);
  const [front, back] = curves.map((names) => handCurve(names.map(at)));
  const notches = steps.filter(({ kind }) => kind === "notch").map(({ phrase }) => read(print(phrase))[0]!);
  const side = (name: "Front" | "Back") =>
    steps
      .filter(({ kind }) => kind === "join")
      .flatMap(({ through }) => through)
      .find(([first]) => first === `underarm${name}`)!
      .map(at);
  return {
    seam: [...front!, ...[...back!].reverse().slice(1)],
    crown: tape(front!),
    notchFront: notches[0]!,
    notchBack: tape(front!) + tape(back!) - notches[1]!,
    sides: { front: side("Front"), back: side("Back") },
  };
}

/** Where a level line meets an underarm seam. */
function levelOn(side: readonly Point[], y: number): Point {
  for (let i = 0; i + 1 < side.length; i++) {
    const [a, b] = [side[i]!, side[i + 1]!];
    if ((a.y - y) * (b.y - y) <= 0) return { x: a.x + ((b.x - a.x) * (y - a.y)) / (b.y - a.y), y };
  }
  throw new Error("the line does not meet the seam");
}

/** The panel after a slash, laid so that both its ends stand so far from those of the panel before. */
function laid(head: Point, foot: Point, a: number, b: number): Matrix {
  const length = Math.hypot(head.x - foot.x, head.y - foot.y);
  const turn = 2 * Math.asin((a - b) / (2 * length));
  const away = Math.atan2(foot.y - head.y, foot.x - head.x) - Math.PI / 2 + turn / 2;
  return compose(
    translate(b * Math.cos(away), b * Math.sin(away)),
    translate(foot.x, foot.y),
    rotate(turn),
    translate(-foot.x, -foot.y),
  );
}

function byHand(of: Made) {
  const block = blockOnPaper(of);
  const count = of.values.slashes!;
  const heads = new Array<number>(count).fill(block.crown);
  const feet = new Array<number>(count).fill(0);
  let level = 0;
  const openings = { head: 0, foot: undefined as number | undefined };
  const up = new Map<string, number>();
  const checks: Record<string, number> = {};
  const through: Record<string, ActOf<"curve">["through"]> = {};
  for (const { act, phrase } of of.parts.steps) {
    const [distance] = read(print(phrase));
    if (act.act === "across") level = distance!;
    if (act.act === "slash-head")
      for (const [i, n] of act.slashes.entries()) heads[n] = block.crown + (i === 0 ? -1 : 1) * distance!;
    if (act.act === "slash-foot")
      for (const [i, n] of act.slashes.entries()) feet[n] = (i === 0 ? -1 : 1) * distance!;
    if (act.act === "open") openings[act.end] = distance!;
    if (act.act === "set")
      for (const from of act.from) up.set(JSON.stringify(from), act.way === "up" ? -distance! : distance!);
    if (act.act === "curve") through[act.edge] = act.through;
    if (act.act === "check") checks[act.edge] = distance!;
  }
  const seamPoint = (at: number) => tapeAt(block.seam, at).point;
  const ends = heads.map((at, i) => ({ head: seamPoint(at), foot: { x: feet[i]!, y: level } }));
  const corners = { front: levelOn(block.sides.front, level), back: levelOn(block.sides.back, level) };
  const chainFor = (foot: number) => {
    const chain: Matrix[] = [identity()];
    for (const [i, end] of ends.entries())
      chain.push(compose(chain[i]!, laid(end.head, end.foot, openings.head, foot)));
    return chain;
  };
  // With hinges at the underarm the feet open by themselves, as far as the arch needs to reach across.
  let foot = openings.foot ?? 0;
  if (openings.foot === undefined) {
    let [low, high] = [0, openings.head];
    const wanted = corners.back.x - corners.front.x;
    for (let i = 0; i < 60; i++) {
      foot = (low + high) / 2;
      const end = applyToPoint(chainFor(foot).at(-1)!, corners.back);
      if (Math.hypot(end.x - corners.front.x, end.y - corners.front.y) < wanted) low = foot;
      else high = foot;
    }
  }
  const motions = settled(chainFor(foot), ends, openings.foot === undefined ? corners : undefined);
  const markOf = (from: ActOf<"curve">["through"][number], end: "head" | "foot"): Point => {
    if ("named" in from) {
      if (from.named === "notchFront") return applyToPoint(motions[0]!, seamPoint(block.notchFront));
      if (from.named === "notchBack") return applyToPoint(motions.at(-1)!, seamPoint(block.notchBack));
      if (from.named === "footFront") return applyToPoint(motions[0]!, corners.front);
      if (from.named === "footBack") return applyToPoint(motions.at(-1)!, corners.back);
      const middle = (count - 1) / 2;
      const [one, other] = [motions[middle]!, motions[middle + 1]!].map((m) =>
        applyToPoint(m, ends[middle]![end]),
      );
      return { x: (one!.x + other!.x) / 2, y: (one!.y + other!.y) / 2 };
    }
    const { panel } = from;
    const place = (i: number) => (end === "head" ? heads[i]! : feet[i]!);
    const edges = end === "head" ? [block.notchFront, block.notchBack] : [corners.front.x, corners.back.x];
    const before = panel === 0 ? edges[0]! : place(panel - 1);
    const after = panel === count ? edges[1]! : place(panel);
    const middle = (before + after) / 2;
    return applyToPoint(motions[panel]!, end === "head" ? seamPoint(middle) : { x: middle, y: level });
  };
  const marks = (edge: "head" | "foot") =>
    through[edge]!.map((from) => {
      const { x, y } = markOf(from, edge);
      return { x, y: y + (up.get(JSON.stringify(from)) ?? 0) };
    });
  const turned = ({ x, y }: Point, motion: Matrix) => {
    const origin = applyToPoint(motion, { x: 0, y: 0 });
    const to = applyToPoint(motion, { x, y });
    return { x: to.x - origin.x, y: to.y - origin.y };
  };
  const [first, last] = [motions[0]!, motions.at(-1)!];
  return {
    headMarks: marks("head"),
    head: handCurve(
      marks("head"),
      turned(tapeAt(block.seam, block.notchFront).direction, first),
      turned(tapeAt(block.seam, block.notchBack).direction, last),
    ),
    foot: through.foot
      ? handCurve(marks("foot"), turned({ x: -1, y: 0 }, last), turned({ x: -1, y: 0 }, first))
      : undefined,
    checks,
  };
}

/** The middle panel, or the middle slash, stands upright over the centre line; an arch stands on its two hinges. */
function settled(
  chain: Matrix[],
  ends: readonly { head: Point; foot: Point }[],
  hinges?: { front: Point; back: Point },
): Matrix[] {
  if (hinges) {
    const back = applyToPoint(chain.at(-1)!, hinges.back);
    const turn = -Math.atan2(back.y - hinges.front.y, back.x - hinges.front.x);
    const onto = compose(
      translate(hinges.front.x, hinges.front.y),
      rotate(turn),
      translate(-hinges.front.x, -hinges.front.y),
    );
    return chain.map((m) => compose(onto, m));
  }
  const count = ends.length;
  if (count % 2 === 0) return chain.map((m) => compose(inverse(chain[count / 2]!), m));
  const [one, other] = [chain[(count - 1) / 2]!, chain[(count + 1) / 2]!];
  const { foot } = ends[(count - 1) / 2]!;
  const [p, q] = [applyToPoint(one, foot), applyToPoint(other, foot)];
  const middle = { x: (p.x + q.x) / 2, y: (p.y + q.y) / 2 };
  const angle = (m: Matrix) => Math.atan2(m.b, m.a);
  const upright = compose(
    translate(foot.x, foot.y),
    rotate(-(angle(one) + angle(other)) / 2),
    translate(-middle.x, -middle.y),
  );
  return chain.map((m) => compose(upright, m));
}

/** The greatest distance from a point of one line to the other. */
function apart(one: readonly Point[], other: readonly Point[]): number {
  return Math.max(...one.map((p) => Math.min(...other.map((q) => Math.hypot(p.x - q.x, p.y - q.y)))));
}

describe.each([
  ["a child's statement sleeve", "statement", child, {}],
  ["one with an odd number of slashes", "statement", child, { slashes: 5, raise: inches(1.5) }],
  ["a woman's leg-of-mutton", "leg-of-mutton", woman, {}],
  ["one with four cuts", "leg-of-mutton", woman, { slashes: 4, headOpen: 40 }],
] as const)("%s, drawn from its printed steps", (_, style, block, values) => {
  const both = (): { piece: PatternPiece; hand: ReturnType<typeof byHand> } => {
    const drafted = made(style, block, values, EIGHTH);
    return { piece: pieceOf(drafted, style === "statement" ? "upper" : "sleeve"), hand: byHand(drafted) };
  };

  it("has its marks where they were drafted, within 2 mm", () => {
    const { hand, piece } = both();
    const head = edgeOf(piece, "head").flatMap((curve) => sample(curve, 40));
    // The cap seam is a hand's own curve, so that places along it may shift by a pencil line or two.
    for (const mark of hand.headMarks)
      expect(Math.min(...head.map((p) => Math.hypot(p.x - mark.x, p.y - mark.y)))).toBeLessThan(2);
  });

  it("has the drafted head within 1/8 in, and measures what the sheet says", () => {
    const { hand, piece } = both();
    const at = (id: string) => piece.notches.find((notch) => notch.id === id)!.at;
    const drawn = edgeOf(piece, "head").flatMap((curve) => sample(curve, 40));
    expect(apart(hand.head, drawn)).toBeLessThan(inches(1 / 8));
    const drafted = at("back") - at("front");
    expect(Math.abs(tape(hand.head) - drafted)).toBeLessThan(inches(1 / 8) + 0.005 * drafted);
    expect(Math.abs(hand.checks.head! - drafted)).toBeLessThanOrEqual(EIGHTH / 2 + 1e-6);
  });

  it("has the drafted lower edge, where it was drawn anew", () => {
    const { hand, piece } = both();
    if (!hand.foot) {
      expect(style).toBe("leg-of-mutton");
      return;
    }
    const drawn = edgeOf(piece, "foot").flatMap((curve) => sample(curve, 40));
    expect(apart(hand.foot, drawn)).toBeLessThan(inches(1 / 8));
    expect(Math.abs(tape(hand.foot) - hand.checks.foot!)).toBeLessThan(inches(1 / 8));
  });
});
