/** Underarm seams ruled straight down, where the plain sleeve runs in towards the hem. */
import { line } from "@/lib/drafting/measure";
import { edgeOf, endOf, startOf } from "@/lib/drafting/outline";
import { type Piece, type Point } from "@/lib/drafting/types";

/**
 * The piece with both underarm seams straight from the underarm points to the level of its foot, square to the cap line
 * or, where the foot is wider than that, out to its ends. Wants edges "underarmBack", "foot" (straight and level) and
 * "underarmFront". Undefined where they are so already.
 */
export function straightSides(piece: Piece): Piece | undefined {
  const back = edgeOf(piece, "underarmBack").curves;
  const front = edgeOf(piece, "underarmFront").curves;
  const [topBack, topFront] = [startOf(back), endOf(front)];
  const [lowBack, lowFront] = [endOf(back), startOf(front)];
  const footBack: Point = { x: Math.max(topBack.x, lowBack.x), y: lowBack.y };
  const footFront: Point = { x: Math.min(topFront.x, lowFront.x), y: lowFront.y };
  const same = footBack.x === lowBack.x && footFront.x === lowFront.x;
  if (same && back.length === 1 && front.length === 1) return undefined;
  const drawn: Record<string, Piece["edges"][number]["curves"]> = {
    underarmBack: [line(topBack, footBack)],
    foot: [line(footBack, footFront)],
    underarmFront: [line(footFront, topFront)],
  };
  return {
    ...piece,
    edges: piece.edges.map((edge) => ({ name: edge.name, curves: drawn[edge.name] ?? edge.curves })),
    notches: piece.notches.filter(({ edge }) => !(edge in drawn)),
  };
}
