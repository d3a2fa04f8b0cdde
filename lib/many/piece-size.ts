/** How much room a piece takes on the cloth. */
import { allowanceOf } from "@/lib/drafting/allow";
import { CORNER_LIMIT } from "@/lib/drafting/corner";
import { bounds } from "@/lib/drafting/measure";
import { arriving, leaving, leftOf } from "@/lib/drafting/offset";
import { type PatternPiece } from "@/lib/drafting/pattern";
import { cross } from "@/lib/drafting/ray";
import { moveCurves, turnAbout } from "@/lib/drafting/rigid";
import { type CubicBezier, type Point } from "@/lib/drafting/types";

export interface PieceSize {
  /** Across the cloth, mm. */
  across: number;
  /** Along its length, mm. */
  along: number;
}

/**
 * The upright box round the line a piece is cut along, its grain along the cloth; opened out where it lies on the fold.
 * Never smaller than the cutting line of `allow`, and at most an allowance larger each way: it is not drawn for this.
 * @param usual width of the allowance where an edge has none of its own, mm.
 */
export function pieceSize(piece: PatternPiece, usual: number): PieceSize {
  const { from, to } = piece.grain;
  const upright = turnAbout({ x: 0, y: 0 }, Math.PI / 2 - Math.atan2(to.y - from.y, to.x - from.x));
  const sides = piece.edges.flatMap(({ curves, name }) =>
    moveCurves(curves, upright)
      .filter((curve) => curve.some((point) => apart(point, curve[0])))
      .map((curve) => ({ curve, width: allowanceOf(piece, name, usual), onFold: name === piece.onFold })),
  );
  const boxes = sides.map(({ curve, width }) => grown(bounds([curve]), width));
  const tips = sides.map((side, i) => tipBox(side, sides[(i + 1) % sides.length]!));
  const all = [...boxes, ...tips];
  const across = Math.max(...all.map(({ max }) => max.x)) - Math.min(...all.map(({ min }) => min.x));
  const along = Math.max(...all.map(({ max }) => max.y)) - Math.min(...all.map(({ min }) => min.y));
  const fold = sides.filter(({ onFold }) => onFold).map(({ curve }) => curve);
  if (fold.length === 0) return { across, along };
  const { max, min } = bounds(fold);
  return max.y - min.y >= max.x - min.x ? { across: 2 * across, along } : { across, along: 2 * along };
}

interface Box {
  readonly min: Point;
  readonly max: Point;
}

const apart = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y) > 1e-9;

const grown = ({ max, min }: Box, by: number): Box => ({
  min: { x: min.x - by, y: min.y - by },
  max: { x: max.x + by, y: max.y + by },
});

interface Side {
  readonly curve: CubicBezier;
  readonly width: number;
}

/** Round the point of the allowance at a corner; where it is cut off, its cut is no longer than two allowances. */
function tipBox(side: Side, next: Side): Box {
  const corner = side.curve[3];
  const [e, f] = [arriving(side.curve), leaving(next.curve)];
  const sin = cross(e, f);
  const at: Box = { min: corner, max: corner };
  if (sin <= 1e-6) return at;
  const [a, b] = [leftOf(e), leftOf(f)];
  // The offset lines meet where a·x = the one width and b·x = the other, from the corner.
  const x = (side.width * b.y - next.width * a.y) / sin;
  const y = (next.width * a.x - side.width * b.x) / sin;
  const room = CORNER_LIMIT * Math.max(side.width, next.width);
  const far = Math.hypot(x, y);
  if (far <= room)
    return grown({ min: { x: corner.x + x, y: corner.y + y }, max: { x: corner.x + x, y: corner.y + y } }, 0);
  const cut = { x: corner.x + (x * room) / far, y: corner.y + (y * room) / far };
  return grown({ min: cut, max: cut }, Math.max(side.width, next.width));
}
