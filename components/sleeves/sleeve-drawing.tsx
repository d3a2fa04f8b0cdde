import { memo } from "react";
import { type Point, type SleeveDraft, type SleeveFigures } from "@/lib/drafting";
import { type Fineness, type Unit } from "@/lib/records/types";
import {
  alwaysShown,
  type Dimension,
  dimensionsOf,
  edgePath,
  grainPath,
  highlightOf,
  notchPaths,
  outlineOf,
  pathOf,
} from "@/lib/sleeves/drawing-paths";
import { type Room, type Size, toScreen, type View } from "@/lib/sleeves/drawing-view";
import { type FigureKey } from "@/lib/sleeves/sleeve-figures";
import { cx } from "@/components/ui/cx";
import { DrawingFigure } from "./drawing-figure";
import "./sleeves.css";

/** What the labels beside the sleeve take, px. */
export const labelRoom: Room = { top: 16, right: 50, bottom: 36, left: 50 };

export interface SleeveDrawingProps {
  figures: SleeveFigures;
  draft: SleeveDraft;
  size: Size;
  view: View;
  unit: Unit;
  fineness: Fineness;
  /** The figure in hand, picked out. */
  focus: FigureKey | null;
  /** Only the last that could be drawn. */
  faint?: boolean;
  /** Each length by its name in place of its figure, for an example. */
  named?: boolean;
  /** What a screen reader is told. */
  label: string;
}

/** The sleeve as on marking paper, with its lengths. Lines keep their width at any scale. */
export const SleeveDrawing = memo(function SleeveDrawing(props: SleeveDrawingProps) {
  const { draft, faint, fineness, figures, focus, label, named, size, unit, view } = props;
  const picked = highlightOf(focus);
  const mmPerPx = 1 / view.scale;
  const dimensions = dimensionsOf(figures, draft).filter(
    (one) => alwaysShown(one) || picked.dimensions.includes(one.name),
  );
  const { piece } = draft;
  // On a long sleeve shown small a notch must not fill its cap.
  const notch = Math.min(9 * mmPerPx, figures.capDepth * 0.12);
  return (
    <div className={cx("absolute inset-0", faint && "opacity-35", named && "drawing-example")}>
      <svg width={size.width} height={size.height} role="img" aria-label={label} className="block">
        <g transform={`translate(${view.x} ${view.y}) scale(${view.scale})`}>
          {draft.guides.map(({ curves, name }, i) => (
            <path
              key={`${name}${i}`}
              d={pathOf(curves)}
              className="line-guide"
              vectorEffect="non-scaling-stroke"
            />
          ))}
          <path d={grainPath(piece, 9 * mmPerPx)} className="line-guide" vectorEffect="non-scaling-stroke" />
          {picked.edges.map((name) => (
            <path
              key={name}
              d={edgePath(piece, name)}
              className="line-picked"
              vectorEffect="non-scaling-stroke"
            />
          ))}
          <path d={outlineOf(piece)} className="line-cut" vectorEffect="non-scaling-stroke" data-outline />
          {notchPaths(piece, notch).map((d) => (
            <path key={d} d={d} fill="var(--ink)" />
          ))}
        </g>
        {dimensions.map((one) => (
          <path
            key={one.name}
            d={measureLine(one, view)}
            className="line-measure"
            data-picked={picked.dimensions.includes(one.name) || undefined}
          />
        ))}
        <Dots draft={draft} view={view} />
      </svg>
      {dimensions.map((one) => {
        const at = labelPlace(one, view, figures);
        return (
          <span
            key={one.name}
            className="drawing-label"
            data-picked={picked.dimensions.includes(one.name) || undefined}
            style={{ left: at.x, top: at.y }}
          >
            {named ? (
              <span aria-hidden="true">{dimensionNames[one.name]}</span>
            ) : (
              <DrawingFigure mm={one.mm} unit={unit} fineness={fineness} />
            )}
          </span>
        );
      })}
    </div>
  );
});

/** The crown, the underarm points and the marks that the cap seam runs through. */
function Dots({ draft, view }: { draft: SleeveDraft; view: View }) {
  const names = Object.keys(draft.points).filter((name) => /^(crown|underarm|mark)/u.test(name));
  return names.map((name) => {
    const { x, y } = toScreen(view, draft.points[name as keyof SleeveDraft["points"]]!);
    const big = !name.startsWith("mark");
    return (
      <circle
        key={name}
        cx={x}
        cy={y}
        r={big ? 4 : Math.min(3, Math.max(1.75, view.scale * 6))}
        fill={big ? "var(--ink)" : "var(--chalk)"}
      />
    );
  });
}

const dimensionNames: Record<Dimension["name"], string> = {
  length: "length",
  capDepth: "cap",
  biceps: "biceps line",
  elbowWidth: "elbow",
  hem: "hem",
  capFront: "front",
  capBack: "back",
};

const beside = 18;

function measureLine({ from, name, place, to }: Dimension, view: View): string {
  const [a, b] = [toScreen(view, from), toScreen(view, to)];
  if (place === "left" || place === "right") {
    const x = a.x + (place === "left" ? -beside : beside);
    return `M${x} ${a.y}V${b.y}M${x - 4} ${a.y}h8M${x - 4} ${b.y}h8`;
  }
  if (place === "below")
    return `M${a.x} ${a.y + beside}H${b.x}M${a.x} ${a.y + beside - 4}v8M${b.x} ${a.y + beside - 4}v8`;
  if (name === "capFront" || name === "capBack") return "";
  return `M${a.x} ${a.y}H${b.x}`;
}

function labelPlace(
  { from, name, place, to }: Dimension,
  view: View,
  { biceps, capDepth }: SleeveFigures,
): Point {
  const [a, b] = [toScreen(view, from), toScreen(view, to)];
  const middle = { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
  if (place === "left") return { x: a.x - beside - 8, y: middle.y };
  if (place === "right") return { x: a.x + beside + 8, y: middle.y };
  if (place === "below") return { x: middle.x, y: middle.y + beside + 2 };
  // The halves of the cap stand inside it, below their curve.
  if (name === "capFront" || name === "capBack") {
    const side = name === "capFront" ? -1 : 1;
    return toScreen(view, { x: (side * biceps) / 5, y: capDepth * 0.62 });
  }
  return { x: middle.x, y: middle.y + 17 };
}
