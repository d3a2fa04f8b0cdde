import { memo } from "react";
import { type PatternPiece } from "@/lib/drafting";
import { type PatternLine } from "@/lib/drafting/pattern";
import { edgePath, grainPath, notchPaths, outlineOf, pathOf } from "@/lib/sleeves/drawing-paths";
import { type Room, type Size, toScreen, type View } from "@/lib/sleeves/drawing-view";
import { type LaidPieces } from "@/lib/sleeves/lay-pieces";
import { cx } from "@/components/ui/cx";
import "./sleeves.css";

/** Room round the pieces for their lines, the words in the corners and the key in the last, px. */
export const piecesRoom: Room = { top: 26, right: 54, bottom: 2, left: 18 };

/** What a name takes below its piece, px. */
export const nameRoom = 30;

export interface PiecesDrawingProps {
  laid: LaidPieces;
  size: Size;
  view: View;
  /** Only the last that could be drawn. */
  faint?: boolean;
  /** What a screen reader is told. */
  label: string;
}

/** All pieces of a style beside each other, as they lie on the table. Lines keep their width at any scale. */
export const PiecesDrawing = memo(function PiecesDrawing(props: PiecesDrawingProps) {
  const {
    faint,
    label,
    laid: { laid },
    size,
    view,
  } = props;
  return (
    <div className={cx("absolute inset-0", faint && "opacity-35")}>
      <svg width={size.width} height={size.height} role="img" aria-label={label} className="block">
        {laid.map(({ box, by, piece }) => (
          <g
            key={piece.id}
            transform={`translate(${view.x} ${view.y}) scale(${view.scale}) translate(${by.x} ${by.y})`}
          >
            <PieceLines piece={piece} mmPerPx={1 / view.scale} small={Math.min(box.w, box.h)} />
          </g>
        ))}
      </svg>
      {laid.map(({ box, piece }) => {
        const at = toScreen(view, { x: box.x + box.w / 2, y: box.y + box.h });
        return (
          <span key={piece.id} className="drawing-label piece-name" style={{ left: at.x, top: at.y + 15 }}>
            {piece.name}
          </span>
        );
      })}
    </div>
  );
});

interface PieceLinesProps {
  piece: PatternPiece;
  mmPerPx: number;
  /** The shorter side of the piece, mm: a notch must not fill it. */
  small: number;
}

function PieceLines({ mmPerPx, piece, small }: PieceLinesProps) {
  const still = { vectorEffect: "non-scaling-stroke" } as const;
  return (
    <>
      {piece.panels.map((panel, i) => (
        <path key={i} d={outlineOf(panel)} className="line-panel" {...still} />
      ))}
      {piece.lines.map(({ curves, kind }, i) => (
        <path key={i} d={pathOf(curves)} className={lineClass[kind]} {...still} />
      ))}
      <path d={grainPath(piece, Math.min(9 * mmPerPx, small * 0.2))} className="line-guide" {...still} />
      <path d={outlineOf(piece)} className="line-cut" data-outline {...still} />
      {piece.onFold !== undefined && (
        <path d={edgePath(piece, piece.onFold)} className="line-on-fold" {...still} />
      )}
      {notchPaths(piece, Math.min(9 * mmPerPx, small * 0.12)).map((d) => (
        <path key={d} d={d} fill="var(--ink)" />
      ))}
    </>
  );
}

const lineClass: Record<PatternLine["kind"], string> = {
  fold: "line-fold",
  placement: "line-placement",
  stitch: "line-stitch",
  guide: "line-guide",
};
