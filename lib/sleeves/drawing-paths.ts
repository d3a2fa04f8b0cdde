/** What of a draft is drawn: path strings and places, in millimetres of the paper. */
import {
  bounds,
  type CubicBezier,
  type EdgeName,
  type Piece,
  type Point,
  pointAt,
  type SleeveDraft,
  type SleeveFigures,
} from "@/lib/drafting";
import { type Box } from "@/lib/sleeves/drawing-view";
import { type FigureKey } from "@/lib/sleeves/sleeve-figures";

/** A thousandth of a millimetre: finer than any screen or paper shows. */
const text = (value: number): string => String(Math.round(value * 1000) / 1000);

/** SVG path of a chain of curves. The curves stay cubics. */
export function pathOf(curves: readonly CubicBezier[]): string {
  const pair = ({ x, y }: Point) => `${text(x)} ${text(y)}`;
  const [first] = curves;
  if (!first) return "";
  return `M${pair(first[0])}${curves.map(([, b, c, d]) => `C${pair(b)} ${pair(c)} ${pair(d)}`).join("")}`;
}

/** The closed outline of a piece. */
export function outlineOf(piece: Pick<Piece, "edges">): string {
  return `${pathOf(piece.edges.flatMap((edge) => edge.curves))}Z`;
}

export function edgePath(piece: Pick<Piece, "edges">, name: string): string {
  return pathOf(piece.edges.find((edge) => edge.name === name)?.curves ?? []);
}

export function boxOfCurves(curves: readonly CubicBezier[]): Box {
  const { max, min } = bounds(curves);
  return { x: min.x, y: min.y, w: max.x - min.x, h: max.y - min.y };
}

/** The box of everything that is drawn. */
export function boxOf({ guides, piece }: Pick<SleeveDraft, "guides" | "piece">): Box {
  return boxOfCurves([
    ...piece.edges.flatMap((edge) => edge.curves),
    ...guides.flatMap((guide) => guide.curves),
  ]);
}

export function unionOf(boxes: readonly Box[]): Box {
  const x = Math.min(...boxes.map((box) => box.x));
  const y = Math.min(...boxes.map((box) => box.y));
  return {
    x,
    y,
    w: Math.max(...boxes.map((box) => box.x + box.w)) - x,
    h: Math.max(...boxes.map((box) => box.y + box.h)) - y,
  };
}

/** The notches as triangles cut into the outline, `size` mm deep: one for the front, two for the back. */
export function notchPaths(piece: Piece, size: number): string[] {
  return piece.notches.flatMap(({ at, count, edge }) => {
    const { curves } = piece.edges.find((one) => one.name === edge)!;
    const offsets = count === 1 ? [0] : [-size * 0.9, size * 0.9];
    return offsets.map((offset) => {
      const { direction: d, point: p } = pointAt(curves, at + offset);
      const half = size * 0.6;
      // The outline runs clockwise on the paper, so that the piece lies on the right hand.
      const tip = { x: p.x - d.y * size, y: p.y + d.x * size };
      const corner = (way: number) => `${text(p.x + d.x * half * way)} ${text(p.y + d.y * half * way)}`;
      return `M${corner(-1)}L${text(tip.x)} ${text(tip.y)}L${corner(1)}Z`;
    });
  });
}

/** The grain arrow: a shaft with a head of `size` mm at each end. */
export function grainPath({ grain: { from, to } }: Piece, size: number): string {
  const head = ({ x, y }: Point, way: 1 | -1) =>
    `M${text(x - size / 2)} ${text(y + way * size)}L${text(x)} ${text(y)}L${text(x + size / 2)} ${text(y + way * size)}`;
  return `M${text(from.x)} ${text(from.y)}L${text(to.x)} ${text(to.y)}${head(from, 1)}${head(to, -1)}`;
}

/** A length shown on the drawing, between two of its points. */
export interface Dimension {
  name: "length" | "capDepth" | "biceps" | "elbowWidth" | "hem" | "capFront" | "capBack";
  mm: number;
  from: Point;
  to: Point;
  /** Beside the piece, below it, or on the line itself. */
  place: "left" | "right" | "below" | "on";
}

export function dimensionsOf(figures: SleeveFigures, { lengths, points }: SleeveDraft): Dimension[] {
  const { biceps, capDepth, elbow, hem, length } = figures;
  const wide = Math.max(biceps, hem, elbow?.width ?? 0) / 2;
  const level = (y: number, width: number) => ({ from: { x: -width / 2, y }, to: { x: width / 2, y } });
  return [
    { name: "length", mm: length, from: { x: -wide, y: 0 }, to: { x: -wide, y: length }, place: "left" },
    { name: "capDepth", mm: capDepth, from: { x: wide, y: 0 }, to: { x: wide, y: capDepth }, place: "right" },
    { name: "biceps", mm: biceps, ...level(capDepth, biceps), place: "on" },
    ...(elbow
      ? [{ name: "elbowWidth", mm: elbow.width, ...level(elbow.depth, elbow.width), place: "on" } as const]
      : []),
    { name: "hem", mm: hem, ...level(length, hem), place: "below" },
    {
      name: "capFront",
      mm: lengths.capFront,
      from: points.underarmFront!,
      to: points.crown!,
      place: "on",
    },
    { name: "capBack", mm: lengths.capBack, from: points.underarmBack!, to: points.crown!, place: "on" },
  ];
}

export interface Highlight {
  dimensions: readonly Dimension["name"][];
  edges: readonly EdgeName[];
}

/** What on the drawing a figure of the form is about. */
export function highlightOf(key: FigureKey | null): Highlight {
  switch (key) {
    case null:
      return { dimensions: [], edges: [] };
    case "length":
    case "capDepth":
    case "elbowWidth":
      return { dimensions: [key], edges: [] };
    case "biceps":
    case "upperArm":
    case "bicepsEase":
      return { dimensions: ["biceps"], edges: [] };
    case "hem":
    case "hand":
    case "wrist":
      return { dimensions: ["hem"], edges: ["hem"] };
    case "elbowDepth":
    case "elbowGirth":
      return { dimensions: ["elbowWidth"], edges: [] };
    case "armholeFront":
    case "notchFront":
      return { dimensions: ["capFront"], edges: ["capFront"] };
    case "armholeBack":
    case "notchBack":
      return { dimensions: ["capBack"], edges: ["capBack"] };
    case "armholeWhole":
    case "headEase":
    case "beside":
      return { dimensions: ["capFront", "capBack"], edges: ["capFront", "capBack"] };
  }
}

/** Whether a dimension is always labelled; the halves of the cap only while they are picked out. */
export function alwaysShown({ name }: Dimension): boolean {
  return name !== "capFront" && name !== "capBack";
}

/** Boxes grow by whole steps of this, mm, so that a small change of a figure does not shift the whole drawing. */
const boxStep = 25.4;

/** The box of a draft, widened evenly to the next step: the same one while a figure changes a little. */
export function steadyBox(draft: Pick<SleeveDraft, "guides" | "piece">): Box {
  const { h, w, y } = boxOf(draft);
  const up = (value: number) => Math.ceil(value / boxStep - 1e-9) * boxStep;
  const wide = up(w);
  return { x: -wide / 2, y, w: wide, h: up(h) };
}
