import { describe, expect, it } from "vitest";
import { svgPathProperties } from "svg-path-properties";
import {
  boxOf,
  dimensionsOf,
  edgePath,
  notchPaths,
  outlineOf,
  pathOf,
  steadyBox,
  unionOf,
} from "@/lib/sleeves/drawing-paths";
import { fitView, panned, pinched, toPaper, toScreen, zoomAt } from "@/lib/sleeves/drawing-view";
import { draggedFigure, nearestHandle, steppedText, withEighth } from "@/lib/sleeves/handles";
import { child, good, record, woman } from "./helpers";

const room = { top: 10, right: 20, bottom: 30, left: 40 };

describe("what is drawn of a draft", () => {
  it("writes paths that are the Béziers: the same length, by another library", () => {
    for (const ask of [child, woman]) {
      const { draft } = good(ask);
      const front = new svgPathProperties(edgePath(draft.piece, "capFront"));
      const back = new svgPathProperties(edgePath(draft.piece, "capBack"));
      // svg-path-properties measures arcs itself; 0.05 mm is a tenth of a pencil line.
      expect(front.getTotalLength()).toBeCloseTo(draft.lengths.capFront, 1);
      expect(back.getTotalLength()).toBeCloseTo(draft.lengths.capBack, 1);
    }
  });

  it("keeps every control point to a thousandth of a millimetre", () => {
    const { draft } = good(woman);
    const curves = draft.piece.edges.flatMap((edge) => [...edge.curves]);
    const numbers = [...outlineOf(draft.piece).matchAll(/-?\d+(?:\.\d+)?/gu)].map(Number);
    const expected = [curves[0]![0], ...curves.flatMap(([, b, c, d]) => [b, c, d])].flatMap(({ x, y }) => [
      x,
      y,
    ]);
    expect(numbers).toHaveLength(expected.length);
    numbers.forEach((value, i) => expect(Math.abs(value - expected[i]!)).toBeLessThan(0.00051));
    expect(pathOf([])).toBe("");
  });

  it("fits the whole sleeve and its guides into what the room leaves, at any size", () => {
    for (const ask of [child, woman]) {
      const { draft } = good(ask);
      for (const size of [
        { width: 320, height: 200 },
        { width: 360, height: 700 },
        { width: 900, height: 500 },
      ]) {
        const view = fitView(steadyBox(draft), size, room);
        const places = [
          ...Object.values(draft.points),
          ...draft.piece.edges.flatMap(({ curves }) => curves.flat()),
        ].map((point) => toScreen(view, point!));
        for (const { x, y } of places) {
          expect(x).toBeGreaterThanOrEqual(room.left - 1e-6);
          expect(x).toBeLessThanOrEqual(size.width - room.right + 1e-6);
          expect(y).toBeGreaterThanOrEqual(room.top - 1e-6);
          expect(y).toBeLessThanOrEqual(size.height - room.bottom + 1e-6);
        }
      }
    }
  });

  it("does not move the paper while a figure changes by a step within the same box", () => {
    const at = (biceps: number) => record({ length: 9.5, capDepth: 6.25, biceps, hem: 11 });
    expect(steadyBox(good(at(11.5)).draft)).toEqual(steadyBox(good(at(11.625)).draft));
  });

  it("cuts one notch on the front and two on the back, into the piece", () => {
    const { draft } = good(child);
    const paths = notchPaths(draft.piece, 6);
    expect(paths).toHaveLength(3);
    const tips = paths.map((d) => [...d.matchAll(/-?\d+(?:\.\d+)?/gu)].map(Number).slice(2, 4));
    expect(tips.map(([x]) => Math.sign(x!))).toEqual([-1, 1, 1]);
    // Inward of the seam: nearer the centre line than the notch's own point.
    expect(Math.abs(tips[0]![0]!)).toBeLessThan(Math.abs(draft.points.notchFront!.x));
  });

  it("labels each length with what the draft has", () => {
    const { draft, figures } = good(woman);
    const byName = Object.fromEntries(dimensionsOf(figures, draft).map((one) => [one.name, one]));
    expect(byName.biceps!.to.x - byName.biceps!.from.x).toBeCloseTo(figures.biceps, 9);
    expect(byName.capDepth!.to.y).toBeCloseTo(figures.capDepth, 9);
    expect(byName.elbowWidth).toBeDefined();
    expect(byName.capFront!.mm).toBe(draft.lengths.capFront);
  });

  it("lays boxes together", () => {
    const boxes = [boxOf(good(child).draft), boxOf(good(woman).draft)];
    const all = unionOf(boxes);
    for (const box of boxes) expect(all.h).toBeGreaterThanOrEqual(box.h);
  });
});

describe("moving the paper", () => {
  const fitted = fitView({ x: -100, y: 0, w: 200, h: 300 }, { width: 360, height: 400 }, room);

  it("keeps the point under the finger while it zooms", () => {
    const at = { x: 123, y: 77 };
    const before = toPaper(fitted, at);
    const after = toPaper(zoomAt(fitted, at, 3, fitted), at);
    expect(after.x).toBeCloseTo(before.x, 9);
    expect(after.y).toBeCloseTo(before.y, 9);
  });

  it("keeps the paper under both fingers of a pinch that does not turn", () => {
    const before = [
      { x: 100, y: 100 },
      { x: 160, y: 180 },
    ] as [never, never];
    const after = [
      { x: 70, y: 60 },
      { x: 190, y: 220 },
    ] as [never, never];
    const view = pinched(fitted, before, after, fitted);
    for (const i of [0, 1]) {
      const under = toPaper(fitted, before[i]!);
      expect(toScreen(view, under).x).toBeCloseTo((after[i]! as { x: number }).x, 6);
      expect(toScreen(view, under).y).toBeCloseTo((after[i]! as { y: number }).y, 6);
    }
  });

  it("neither loses the sleeve nor goes through the paper", () => {
    const far = zoomAt(fitted, { x: 0, y: 0 }, 1e6, fitted);
    const small = zoomAt(fitted, { x: 0, y: 0 }, 1e-6, fitted);
    expect(far.scale / fitted.scale).toBeCloseTo(12, 9);
    expect(small.scale / fitted.scale).toBeCloseTo(0.6, 9);
    expect(panned(fitted, 5, -3)).toEqual({ ...fitted, x: fitted.x + 5, y: fitted.y - 3 });
  });
});

describe("handles and steppers", () => {
  it("changes a width by twice what its end moves, the cap by its crown, to the step", () => {
    const { figures } = good(child);
    expect(draggedFigure("biceps", figures, { x: 3.3, y: 40 }, "in", 8)).toBeCloseTo(304.8 + 6.35, 6);
    expect(draggedFigure("capDepth", figures, { x: 9, y: -6 }, "in", 8)).toBeCloseTo(158.75 + 6.35, 6);
    expect(draggedFigure("length", figures, { x: 0, y: 3.4 }, "cm", 8)).toBe(245);
    expect(draggedFigure("hem", figures, { x: -9999, y: 0 }, "cm", 8)).toBe(1);
  });

  it("takes the handle nearest to the finger", () => {
    const { draft } = good(child);
    const view = { scale: 0.2, x: 180, y: 16 };
    for (const [name, point] of [
      ["biceps", draft.points.underarmBack!],
      ["hem", draft.points.hemBack!],
      ["capDepth", draft.points.crown!],
    ] as const)
      expect(nearestHandle(toScreen(view, point), draft, view)).toBe(name);
  });

  it.each([
    ["6 1/4", 1, "in", "6 3/8"],
    ["6 1/4", -1, "in", "6 1/8"],
    ["6.3", 1, "in", "6 3/8"],
    ["6.3", -1, "in", "6 1/4"],
    ["0", -1, "in", "0"],
    ["15.9", 1, "cm", "16"],
    ["15,95", -1, "cm", "15.9"],
  ] as const)("steps %s by %i in %s to %s", (typed, way, unit, expected) => {
    expect(steppedText(typed, way, unit, 8)).toBe(expected);
  });

  it("steps an empty field from the rule's value, and leaves one it knows nothing of", () => {
    expect(steppedText("", 1, "in", 8, 25.4)).toBe("1 1/8");
    expect(steppedText("", 1, "in", 8)).toBeNull();
    expect(steppedText("6", 1, "in", 16)).toBe("6 1/16");
  });

  it("sets the odd eighths of what is typed", () => {
    expect(withEighth("6", 3)).toBe("6 3/8");
    expect(withEighth("6 7/8", 2)).toBe("6 1/4");
    expect(withEighth("6 7/8", 0)).toBe("6");
    expect(withEighth("", 4)).toBe("1/2");
  });
});
